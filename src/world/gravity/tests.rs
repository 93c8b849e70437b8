//! Zonal gravity against closed forms, numerical gradients and the normal gravity of WGS 84.

use super::{Central, Gravity};
use crate::math::Vector;
use crate::world::slope::{Slope, assert_slope};
use crate::world::{Ellipsoid, Geodetic, Spin};

const MU: f64 = 3.986004418e14;
const A: f64 = 6378137.0;
const J2: f64 = 1.08262668e-3;

#[test]
fn uniform_gravity_points_down_and_does_work_by_height() {
    let gravity = Gravity::Uniform(1.62);
    let at = Vector::new(10.0, -20.0, 100.0);
    assert_eq!(gravity.acceleration(at), Vector::new(0.0, 0.0, -1.62));
    assert_eq!(gravity.potential_energy(at), 162.0);
}

#[test]
fn a_point_mass_attracts_by_the_inverse_square() {
    // USSA 1976, eq. 17 in another guise: the circular speed at 6378.137 km is 7905.366 m/s.
    let gravity = Gravity::Central(Central::new(MU, A, &[]));
    let pull = gravity.acceleration(Vector::new(0.0, 0.0, -A));
    assert_eq!((pull.x(), pull.y()), (0.0, 0.0));
    assert!(((pull.z() * A).sqrt() - 7905.366).abs() < 1e-3);
}

#[test]
fn j2_on_the_equator_and_on_the_axis() {
    // Closed forms: 1 + 3/2·J2·(a/r)² on the equator and 1 − 3·J2·(a/r)² on the axis.
    let gravity = Central::new(MU, A, &[J2]);
    let r = 7.0e6;
    let ratio = (A / r) * (A / r);
    let equator = gravity.acceleration(Vector::new(0.0, r, 0.0));
    let axis = gravity.acceleration(Vector::new(0.0, 0.0, r));
    assert!((equator.y() / (-MU / r / r * (1.0 + 1.5 * J2 * ratio)) - 1.0).abs() < 1e-15);
    assert_eq!((equator.x(), equator.z()), (0.0, 0.0));
    assert!((axis.z() / (-MU / r / r * (1.0 - 3.0 * J2 * ratio)) - 1.0).abs() < 1e-15);
}

#[test]
fn acceleration_is_the_gradient_of_the_potential() {
    // Zonals far larger than any body's, so that each of them shows.
    for zonals in [&[][..], &[0.1], &[0.0, 0.1], &[0.0, 0.0, 0.1], &[J2, -2.5e-6, -1.6e-6]] {
        let gravity = Gravity::Central(Central::new(MU, A, zonals));
        for position in [[4.0e6, -5.0e6, 3.0e6], [1.0e3, 7.0e6, -1.0e6], [2.0e6, 1.0e6, -6.5e6]] {
            let acceleration = gravity.acceleration(Vector(position));
            for axis in 0..3 {
                let step = 10.0;
                let energy = |shift: f64| {
                    let mut moved = position;
                    moved[axis] += shift;
                    gravity.potential_energy(Vector(moved))
                };
                // Fourth-order differences; their rounding is 6e7·1e-16/10 ≈ 1e-9 m/s².
                let slope = (8.0 * (energy(step) - energy(-step)) - energy(2.0 * step) + energy(-2.0 * step))
                    / (12.0 * step);
                let miss = (acceleration.0[axis] + slope).abs();
                assert!(miss < 1e-8, "{zonals:?} at {position:?}, axis {axis}: {miss:e}");
            }
        }
    }
}

#[test]
fn normal_gravity_of_wgs_84() {
    // NGA.STND.0036 (WGS 84): 9.7803253359 m/s² at the equator, 9.8321849379 m/s² at the pole, and
    // 9.80619777 m/s² at 45° by Somigliana's formula. The field of the ellipsoid has J2n by Heiskanen &
    // Moritz, Physical Geodesy (1967), eq. 2-92; what is left out, J6 = 6.08e-9, makes 7·J6·g =
    // 4.2e-7 m/s² at the pole and less elsewhere.
    let ellipsoid = Ellipsoid { equatorial_radius: A, flattening: 1.0 / 298.257223563 };
    let j2 = 1.082629821e-3;
    let e2 = ellipsoid.eccentricity_squared();
    let j4 = -3.0 * e2 * e2 / 35.0 * (10.0 * j2 / e2 - 1.0);
    let field = Central::new(MU, A, &[j2, 0.0, j4]);
    let spin = Spin { rate: 7.292115e-5, angle: 0.0 };
    for (degrees, published) in [(0.0_f64, 9.7803253359), (45.0, 9.80619777), (90.0, 9.8321849379)] {
        let foot = Geodetic { latitude: degrees.to_radians(), longitude: 0.3, altitude: 0.0 };
        let position = ellipsoid.position(foot);
        let weight = field.acceleration(position) + spin.centrifugal(position);
        assert!((weight.length() - published).abs() < 5e-7, "{} at {degrees} deg", weight.length());
        // Gravity of an equipotential ellipsoid stands upright on it.
        let tilt = weight.cross(ellipsoid.local(position).axes.up).length() / published;
        assert!(tilt < 3e-8, "{tilt:e} rad from the vertical at {degrees} deg");
    }
}

#[test]
fn derivatives_are_carried() {
    let field = Central::new(Slope::from(MU), Slope::from(A), &[Slope::from(J2)]);
    let along = |x: Slope| Vector::new(x, Slope::from(-5.0e6), Slope::from(3.0e6));
    for axis in 0..3 {
        assert_slope(|x| field.acceleration(along(x)).0[axis], 4.0e6, 100.0, 1e-6);
    }
    let by_j2 = |j2: Slope| {
        let field = Central::new(Slope::from(MU), Slope::from(A), &[j2]);
        field.acceleration(along(Slope::from(4.0e6))).z()
    };
    assert_slope(by_j2, J2, 1e-4, 1e-9);
}
