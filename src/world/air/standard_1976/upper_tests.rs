//! Against U.S. Standard Atmosphere, 1976 (NOAA-S/T 76-1562), Table I, above 86 km.

use super::upper_table::SEGMENTS;
use super::{JOINT, TOP, at, lower, temperature, upper};

/// Geometric altitude in km, K, Pa, kg/m³.
const TABLE_1: [(f64, f64, f64, f64); 22] = [
    (90.0, 186.87, 1.8359e-01, 3.416e-06),
    (92.0, 186.96, 1.2887e-01, 2.393e-06),
    (95.0, 188.42, 7.5966e-02, 1.393e-06),
    (100.0, 195.08, 3.2011e-02, 5.604e-07),
    (110.0, 240.00, 7.1042e-03, 9.708e-08),
    (120.0, 360.00, 2.5382e-03, 2.222e-08),
    (130.0, 469.27, 1.2505e-03, 8.152e-09),
    (150.0, 634.39, 4.5422e-04, 2.076e-09),
    (180.0, 790.07, 1.5271e-04, 5.194e-10),
    (200.0, 854.56, 8.4736e-05, 2.541e-10),
    (230.0, 915.78, 3.9276e-05, 1.029e-10),
    (250.0, 941.33, 2.4767e-05, 6.073e-11),
    (300.0, 976.01, 8.7704e-06, 1.916e-11),
    (350.0, 990.06, 3.4498e-06, 7.014e-12),
    (400.0, 995.83, 1.4518e-06, 2.803e-12),
    (450.0, 998.22, 6.4468e-07, 1.184e-12),
    (500.0, 999.24, 3.0236e-07, 5.215e-13),
    (600.0, 999.85, 8.2130e-08, 1.137e-13),
    (700.0, 999.97, 3.1908e-08, 3.070e-14),
    (800.0, 999.99, 1.7036e-08, 1.136e-14),
    (900.0, 1000.00, 1.0873e-08, 5.759e-15),
    (1000.0, 1000.00, 7.5138e-09, 3.561e-15),
];

#[test]
fn agrees_with_table_1_above_86_km() {
    for (km, kelvin, pressure, density) in TABLE_1 {
        let air = at(km * 1e3).unwrap();
        // Half of the last digit printed: 0.005 K, and one in four digits of density.
        assert!((temperature(km * 1e3).unwrap() - kelvin).abs() <= 0.005, "T at {km} km");
        let miss = (air.pressure / pressure - 1.0_f64).abs();
        assert!(miss <= 6e-5, "p at {km} km: {miss:e} off");
        let miss = (air.density / density - 1.0_f64).abs();
        assert!(miss <= 3.2e-4, "density at {km} km: {miss:e} off");
    }
}

#[test]
fn joins_the_closed_forms() {
    // The number densities that the standard states at 86 km are rounded: 1.2e-5 is their miss.
    let (below, above) = (lower::at(JOINT), upper::at(JOINT).unwrap());
    assert!((above.pressure / below.pressure - 1.0_f64).abs() < 1.5e-5);
    assert!((above.density / below.density - 1.0_f64).abs() < 1.5e-5);
    assert!((above.sound_speed / below.sound_speed - 1.0_f64).abs() < 1e-9);
}

#[test]
fn segments_join_within_what_the_standard_leaves_open() {
    for pair in SEGMENTS.windows(2) {
        let [low, high] = pair else { unreachable!() };
        let cells = low.rows.len() - 1;
        assert_eq!(low.bottom + low.step * cells as f64, high.bottom);
        // Hydrogen that begins at 150 km: 7.3e-6 of the pressure. Temperature at 110 km: 1.2e-6.
        let (end, start) = (low.rows[cells], high.rows[0]);
        assert!((end[0] - start[0]).abs() < 2e-6, "density at {}", high.bottom);
        assert!((end[2] - start[2]).abs() < 8e-6, "pressure at {}", high.bottom);
    }
    let last = SEGMENTS.last().unwrap();
    assert_eq!(last.bottom + last.step * (last.rows.len() - 1) as f64, TOP);
}

#[test]
fn pressure_carries_the_weight_of_the_air_above() {
    // dp = −ρ g dZ by differences, where every gas is in equilibrium on its own: lower down the
    // standard's transport terms leave up to 2 % of it open, and high up helium's thermal diffusion some.
    for (km, open) in [(150.5, 1e-4), (250.0, 1e-4), (400.0, 1e-4), (800.0, 2e-3)] {
        let altitude: f64 = km * 1e3;
        let slope = (at(altitude + 10.0).unwrap().pressure - at(altitude - 10.0).unwrap().pressure) / 20.0;
        let ratio = lower::EFFECTIVE_RADIUS / (lower::EFFECTIVE_RADIUS + altitude);
        let weight = at(altitude).unwrap().density * 9.80665 * ratio * ratio;
        assert!((-slope / weight - 1.0).abs() < open, "at {km} km: {slope:e} against {weight:e}");
    }
}

#[test]
fn falls_everywhere() {
    let mut last = at(JOINT).unwrap();
    for step in 1..=4570 {
        let next = at(JOINT + f64::from(step) * 200.0).unwrap();
        assert!(next.density < last.density && next.pressure < last.pressure);
        last = next;
    }
}
