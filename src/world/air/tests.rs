//! The models of the air seen from outside.

use super::{Air, Exponential};
use crate::math::Scalar;
use crate::world::slope::{Slope, assert_slope};

#[test]
fn no_air() {
    let air = Air::<f64>::None;
    assert!(air.at(0.0).is_none() && air.temperature(0.0).is_none() && air.top().is_none());
    assert!(air.layer_altitudes().is_empty());
}

#[test]
fn exponential_air_falls_by_e_each_scale_height() {
    let model = Exponential { density: 0.02, pressure: 600.0, scale_height: 11e3, sound_speed: 240.0 };
    let air = Air::Exponential(model).at(22e3).unwrap();
    assert!((air.density - 0.02 * Scalar::exp(-2.0)).abs() < 1e-17);
    assert!((air.pressure - 600.0 * Scalar::exp(-2.0)).abs() < 1e-12);
    assert_eq!(air.sound_speed, 240.0);
}

#[test]
fn derivatives_are_carried() {
    let air = Air::<Slope>::Standard1976;
    for altitude in [-2e3, 4e3, 15e3, 25e3, 40e3, 49e3, 60e3, 80e3, 93.2e3, 104.9e3, 133.3e3, 444e3] {
        assert_slope(|z| air.at(z).unwrap().density, altitude, 1.0, 1e-6);
        assert_slope(|z| air.at(z).unwrap().pressure, altitude, 1.0, 1e-6);
    }
    for altitude in [4e3, 60e3, 83.3e3, 100e3, 115e3, 300e3] {
        assert_slope(|z| air.temperature(z).unwrap(), altitude, 1.0, 1e-6);
    }
    assert_slope(|z| air.at(z).unwrap().sound_speed, 4e3, 1.0, 1e-6);
}

#[test]
fn slopes_are_continuous_within_the_table() {
    // At knots of the table, away from the seams that the standard itself leaves.
    for altitude in [90_000.0, 105_000.0, 140_000.0, 210_000.0, 720_000.0] {
        let slope = |z: f64| Air::Standard1976.at(Slope::variable(z)).unwrap().density.slope;
        let (below, above) = (slope(altitude - 1e-3), slope(altitude + 1e-3));
        assert!((above / below - 1.0).abs() < 1e-6, "{below:e} and {above:e} at {altitude} m");
    }
}
