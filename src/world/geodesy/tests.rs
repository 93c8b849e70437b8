//! Geodesy against WGS 84, worked examples and round trips.

use std::f64::consts::{FRAC_PI_2, PI, TAU};

use super::{Ellipsoid, Geodetic, Spin, Surface};
use crate::math::{Scalar, Vector};
use crate::world::slope::{Slope, assert_slope};

const EARTH: Ellipsoid<f64> = Ellipsoid { equatorial_radius: 6378137.0, flattening: 1.0 / 298.257223563 };
const SPHERE: Ellipsoid<f64> = Ellipsoid { equatorial_radius: 1737400.0, flattening: 0.0 };
/// As flat as Saturn.
const FLAT: Ellipsoid<f64> = Ellipsoid { equatorial_radius: 6.0e7, flattening: 0.1 };

fn at(latitude: f64, longitude: f64, altitude: f64) -> Geodetic<f64> {
    Geodetic { latitude: latitude.to_radians(), longitude: longitude.to_radians(), altitude }
}

#[test]
fn wgs_84_derived_constants() {
    // NGA.STND.0036: b 6356752.3142 m, e² 6.69437999014e-3.
    assert!((EARTH.polar_radius() - 6356752.3142).abs() < 5e-5);
    assert!((EARTH.eccentricity_squared() - 6.69437999014e-3).abs() < 5e-15);
}

#[test]
fn geodetic_to_cartesian() {
    // Closed form on WGS 84, worked in extended precision: latitude and longitude 45°, 1000 m.
    let position = EARTH.position(at(45.0, 45.0, 1000.0));
    assert!((position.x() - 3194919.1451).abs() < 1e-4);
    assert!((position.y() - 3194919.1451).abs() < 1e-4);
    assert!((position.z() - 4488055.5156).abs() < 1e-4);
}

#[test]
fn cartesian_to_geodetic() {
    // Vallado, Fundamentals of Astrodynamics and Applications, Example 3-3 (ECEF to latitude and longitude).
    let ellipsoid =
        Ellipsoid { equatorial_radius: 6378136.3, flattening: 1.0 - (1.0 - 0.006694385_f64).sqrt() };
    let found = ellipsoid.geodetic(Vector::new(6524834.0, 6862875.0, 6448296.0));
    assert!((found.latitude.to_degrees() - 34.3524952).abs() < 1e-7);
    assert!((found.longitude.to_degrees() - 46.4464).abs() < 5e-5);
    assert!((found.altitude - 5085220.0).abs() < 5.0);
}

#[test]
fn there_and_back() {
    // Latitudes in rad: a unit or two in the last place, but for what two steps leave of a great flattening.
    for (ellipsoid, angle) in [(EARTH, 4e-16), (SPHERE, 4e-16), (FLAT, 1e-11)] {
        for altitude in [-10_000.0, 0.0, 45.0, 400e3, 2000e3, 36_000e3] {
            for degrees in [-90.0, -89.999999, -60.0, -1e-7, 0.0, 1e-9, 28.5, 45.0, 71.3, 89.99, 90.0] {
                let wanted = at(degrees, -115.2, altitude);
                let position = ellipsoid.position(wanted);
                let found = ellipsoid.geodetic(position);
                let scale = position.length();
                // A few units in the last place of the distance from the centre.
                assert!((found.altitude - altitude).abs() < 1e-15 * scale, "{degrees} {altitude}");
                assert!((found.latitude - wanted.latitude).abs() < angle, "{degrees} {altitude}");
                let again = ellipsoid.position(found);
                assert!((again - position).length() < (1e-15 + angle) * scale, "{degrees} {altitude}");
            }
        }
    }
}

#[test]
fn axes_are_those_of_the_angles() {
    let place = at(-33.0, 151.0, 12e3);
    let local = EARTH.local(EARTH.position(place));
    let (sin, cos) = (Scalar::sin(place.latitude), Scalar::cos(place.latitude));
    let (sin_l, cos_l) = (Scalar::sin(place.longitude), Scalar::cos(place.longitude));
    let expected = [
        (local.axes.up, [cos * cos_l, cos * sin_l, sin]),
        (local.axes.north, [-sin * cos_l, -sin * sin_l, cos]),
        (local.axes.east, [-sin_l, cos_l, 0.0]),
    ];
    for (axis, components) in expected {
        assert!((axis - Vector(components)).length() < 1e-15);
    }
    assert!((local.altitude - 12e3).abs() < 2e-9);
    let towards = local.axes.direction(0.3, 1.2);
    assert!((towards.dot(local.axes.up) - Scalar::sin(0.3)).abs() < 1e-15);
    let heading = Scalar::atan2(towards.dot(local.axes.east), towards.dot(local.axes.north));
    assert!((heading - 1.2).abs() < 1e-15);
}

#[test]
fn poles_and_centre_are_ordinary() {
    for (sign, z) in [(1.0, 6_400_000.0), (-1.0, -6_400_000.0)] {
        let place = EARTH.geodetic(Vector::new(0.0, 0.0, z));
        assert_eq!((place.latitude, place.longitude), (sign * FRAC_PI_2, 0.0));
        assert!((place.altitude - (6_400_000.0 - EARTH.polar_radius())).abs() < 2e-9);
        let local = EARTH.local(Vector::new(0.0, 0.0, z));
        assert_eq!(local.axes.up, Vector::new(0.0, 0.0, sign));
        assert_eq!(local.axes.east, Vector::new(0.0, 1.0, 0.0));
        assert_eq!(local.axes.east.cross(local.axes.north), local.axes.up);
    }
    for position in [[0.0, 0.0, 0.0], [1.0, 0.0, 0.0], [0.0, -2.0e4, 3.0e4]] {
        let place = EARTH.geodetic(Vector(position));
        assert!(place.altitude.is_finite() && place.latitude.is_finite());
    }
}

#[test]
fn latitudes_and_radii() {
    // Closed form on WGS 84: geodetic 45° is geocentric 44.807576784°.
    let geocentric = EARTH.geocentric_latitude(45f64.to_radians()).to_degrees();
    assert!((geocentric - 44.807576784).abs() < 1e-9);
    assert!((EARTH.surface_radius(0.0) - EARTH.equatorial_radius).abs() < 1e-9);
    assert!((EARTH.surface_radius(FRAC_PI_2) - EARTH.polar_radius()).abs() < 1e-9);
}

#[test]
fn downrange_is_a_great_circle() {
    let surface = Surface::Ellipsoid(SPHERE);
    let from = SPHERE.position(at(0.0, 10.0, 0.0));
    let quarter = SPHERE.equatorial_radius * FRAC_PI_2;
    assert!((surface.downrange(from, SPHERE.position(at(90.0, 0.0, 5e3))) - quarter).abs() < 1e-8);
    assert!((surface.downrange(from, SPHERE.position(at(0.0, -80.0, 0.0))) - quarter).abs() < 1e-8);
    // Small and opposite angles keep their digits.
    let near = SPHERE.position(at(0.0, 10.0 + 1e-7, 0.0));
    let expected = SPHERE.equatorial_radius * 1e-7_f64.to_radians();
    assert!((surface.downrange(from, near) - expected).abs() < 1e-9);
    assert!((surface.downrange(from, -from) - SPHERE.equatorial_radius * PI).abs() < 1e-8);
    assert_eq!(surface.downrange(from, from), 0.0);
    let flat = Surface::<f64>::Flat;
    let apart = flat.downrange(Vector::new(1.0, 1.0, 50.0), Vector::new(4.0, 5.0, 0.0));
    assert_eq!(apart, 5.0);
}

#[test]
fn surface_speeds() {
    // WGS 84: 465.10108 m/s at the equator, 409.05064 m/s at a geodetic 28.5°, 86164.1006 s a turn.
    let spin = Spin { rate: 7.292115e-5, angle: 0.0 };
    let speed = |latitude| spin.velocity(EARTH.position(at(latitude, 80.0, 0.0))).length();
    assert!((speed(0.0) - 465.10108).abs() < 1e-5);
    assert!((speed(28.5) - 409.05064).abs() < 1e-5);
    assert!((TAU / spin.rate - 86164.1006).abs() < 1e-4);
}

#[test]
fn frames_turn_with_the_body() {
    let spin = Spin { rate: 0.01, angle: 0.5 };
    let turn = spin.at(30.0);
    let position = Vector::new(3.0, -4.0, 5.0);
    assert!((turn.to_fixed(turn.to_inertial(position)) - position).length() < 1e-15);
    // A body-fixed point moves at the velocity of the body's matter.
    let inertial = |time: f64| spin.at(time).to_inertial(position);
    let velocity = (inertial(30.001) - inertial(29.999)) * 500.0;
    assert!((velocity - spin.velocity(inertial(30.0))).length() < 1e-9);
    // x of the body stands at the angle in the inertial frame.
    let x = spin.at(0.0).to_inertial(Vector::new(1.0, 0.0, 0.0));
    assert!((Scalar::atan2(x.y(), x.x()) - 0.5).abs() < 1e-15);
}

#[test]
fn derivatives_are_carried() {
    let earth = Ellipsoid {
        equatorial_radius: Slope::from(EARTH.equatorial_radius),
        flattening: Slope::from(EARTH.flattening),
    };
    let along = |z: Slope| Vector::new(Slope::from(-4.0e6), Slope::from(2.0e6), z);
    assert_slope(|z| earth.geodetic(along(z)).latitude, 5.5e6, 1e3, 1e-7);
    assert_slope(|z| earth.geodetic(along(z)).altitude, 5.5e6, 1e3, 1e-7);
    assert_slope(|z| earth.local(along(z)).axes.north.x(), 5.5e6, 1e3, 1e-6);
    let flatter =
        |f: Slope| Ellipsoid { flattening: f, ..earth }.geodetic(along(Slope::from(5.5e6))).altitude;
    assert_slope(flatter, EARTH.flattening, 1e-5, 1e-7);
}

#[test]
fn derivatives_hold_across_the_axis() {
    let earth = Ellipsoid {
        equatorial_radius: Slope::from(EARTH.equatorial_radius),
        flattening: Slope::from(EARTH.flattening),
    };
    let across = |x: f64| Vector::new(Slope::variable(x), Slope::zero(), Slope::from(6.5e6));
    for x in [0.0, 1e-9, 1.0] {
        let local = earth.local(across(x));
        // The normal tilts by 1/(N + h), N = a²/b at the pole.
        let curvature =
            EARTH.equatorial_radius.square() / EARTH.polar_radius() + 6.5e6 - EARTH.polar_radius();
        assert!((local.axes.up.x().slope * curvature - 1.0).abs() < 1e-9, "at x = {x}");
        assert!(local.altitude.slope.abs() < 1e-6 && local.axes.up.z().slope.abs() < 1e-6);
    }
}
