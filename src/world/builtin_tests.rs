//! The text of the built-in worlds; what it means is tested where it is checked.

use super::BUILTIN;

#[test]
fn every_fact_says_why() {
    let facts: Vec<_> = BUILTIN.lines().filter(|line| line.starts_with("    ")).collect();
    assert_eq!(facts.len(), 18);
    for fact in facts {
        assert!(fact.contains(" because \""), "{fact}");
    }
}

#[test]
fn earth_is_that_of_wgs_84() {
    // NGA.STND.0036 (WGS 84), defining parameters.
    for fact in [
        "gravity central 3.986004418e14 m^3/s^2",
        "equatorial_radius 6378137 m",
        "flattening 1 / 298.257223563",
        "spin 7.292115e-5 rad/s",
    ] {
        assert!(BUILTIN.contains(fact), "{fact}");
    }
}
