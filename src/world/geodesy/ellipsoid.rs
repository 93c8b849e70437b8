//! An ellipsoid of revolution, and the way between its geodetic coordinates and Cartesian ones.

use super::{Axes, Local};
use crate::math::{Scalar, Vector};
use crate::world::root::root;

/// Steps of Bowring's iteration: two leave rounding alone for the flattening of the Earth or Mars, and
/// 10⁻¹¹ rad of latitude for one of a tenth.
const STEPS: usize = 2;

/// An ellipsoid of revolution about the z axis, centred at the origin. A sphere has flattening zero.
#[derive(Clone, Copy, Debug)]
pub struct Ellipsoid<S> {
    /// m
    pub equatorial_radius: S,
    pub flattening: S,
}

/// Geodetic coordinates: the latitude is that of the ellipsoid's normal.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Geodetic<S> {
    /// rad, −π/2 to π/2.
    pub latitude: S,
    /// rad east, in (−π, π]; zero on the axis.
    pub longitude: S,
    /// Height above the ellipsoid, m.
    pub altitude: S,
}

/// What the normal through a point tells, without any angle worked out.
struct Foot<S> {
    sin: S,
    cos: S,
    altitude: S,
    /// Distance to the axis along the normal (N + h), m.
    to_axis: S,
}

impl<S: Scalar> Ellipsoid<S> {
    pub fn polar_radius(&self) -> S {
        self.equatorial_radius * (S::one() - self.flattening)
    }

    /// First eccentricity squared, f(2 − f).
    pub fn eccentricity_squared(&self) -> S {
        self.flattening * (-self.flattening + 2.0)
    }

    /// Radius of curvature in the prime vertical, N, m, for the sine of a geodetic latitude.
    fn normal_radius(&self, sin: S) -> S {
        self.equatorial_radius / (S::one() - self.eccentricity_squared() * sin.square()).sqrt()
    }

    /// Body-fixed Cartesian position in m.
    pub fn position(&self, at: Geodetic<S>) -> Vector<S> {
        let (sin, cos) = (at.latitude.sin(), at.latitude.cos());
        let normal = self.normal_radius(sin);
        let axial = (normal + at.altitude) * cos;
        let z = (normal * (S::one() - self.eccentricity_squared()) + at.altitude) * sin;
        Vector::new(axial * at.longitude.cos(), axial * at.longitude.sin(), z)
    }

    /// Geodetic coordinates of a body-fixed position.
    ///
    /// On the axis the longitude is zero and has no derivative. Meaningless, but finite, within
    /// e²·a (43 km for the Earth) of the centre.
    pub fn geodetic(&self, position: Vector<S>) -> Geodetic<S> {
        let foot = self.foot(position);
        let [x, y, _] = position.0;
        let on_axis = x.real() == 0.0 && y.real() == 0.0;
        let longitude = if on_axis { S::zero() } else { y.atan2(x) };
        Geodetic { latitude: foot.sin.atan2(foot.cos), longitude, altitude: foot.altitude }
    }

    /// Altitude and local axes at a position, without angles. The ellipsoid being one of revolution,
    /// an inertial position gives inertial axes and a body-fixed one gives body-fixed axes.
    #[inline]
    pub fn local(&self, position: Vector<S>) -> Local<S> {
        let Foot { sin, cos, altitude, to_axis } = self.foot(position);
        let [x, y, _] = position.0;
        // cos φ·cos λ as x/(N + h): smooth across the axis, where cos λ is not.
        let inward = S::one() / to_axis;
        let up = Vector::new(x * inward, y * inward, sin);
        let (sin_longitude, cos_longitude) = normalised(y, x);
        let north = Vector::new(-(sin * cos_longitude), -(sin * sin_longitude), cos);
        let east = Vector::new(-sin_longitude, cos_longitude, S::zero());
        Local { altitude, axes: Axes { up, north, east } }
    }

    /// Distance of the surface from the centre in m, at a geodetic latitude in rad.
    pub fn surface_radius(&self, latitude: S) -> S {
        self.position(Geodetic { latitude, longitude: S::zero(), altitude: S::zero() }).length()
    }

    /// Geocentric latitude in rad of the surface point at a geodetic latitude: atan((1 − e²)·tan φ).
    pub fn geocentric_latitude(&self, latitude: S) -> S {
        let squeeze = S::one() - self.eccentricity_squared();
        (squeeze * latitude.sin()).atan2(latitude.cos())
    }

    /// B. R. Bowring, "Transformation from spatial to geographical coordinates", *Survey Review* 23
    /// (1976) 323–327, with the start of his "The accuracy of geodetic latitude and height equations",
    /// *Survey Review* 28 (1985) 202–206. Sines and cosines are kept as normalised pairs, so that no
    /// trigonometric function is called and the poles are ordinary points.
    fn foot(&self, position: Vector<S>) -> Foot<S> {
        let a = self.equatorial_radius;
        let e2 = self.eccentricity_squared();
        let squeeze = S::one() - self.flattening;
        let [x, y, z] = position.0;
        let axial = root(x.square() + y.square());
        let r = root(axial.square() + z.square());
        // Semi-axes of the evolute: e²·a and e′²·b.
        let (inner, outer) = (e2 * a, e2 * a / squeeze);
        // The next guess at the normal, as a pair in the ratio of its sine and cosine.
        let refined = |(sin, cos): (S, S)| {
            let out = axial - inner * cos.square() * cos;
            (z + outer * sin.square() * sin, if out.real() > 0.0 { out } else { S::zero() })
        };
        let mut reduced = if r.real() > 0.0 {
            normalised(z * squeeze * (S::one() + outer / r), axial)
        } else {
            (S::zero(), S::one())
        };
        for _ in 1..STEPS {
            let (up, out) = refined(reduced);
            reduced = normalised(up * squeeze, out);
        }
        let (up, out) = refined(reduced);
        let (sin, cos) = normalised(up, out);
        let w = (S::one() - e2 * sin.square()).sqrt();
        // Stationary in the latitude, so that what is left of its error counts only squared.
        let altitude = axial * cos + z * sin - a * w;
        Foot { sin, cos, altitude, to_axis: a / w + altitude }
    }
}

/// Sine and cosine of the angle from x of the point (`adjacent`, `opposite`); the angle zero if that is the
/// origin.
fn normalised<S: Scalar>(opposite: S, adjacent: S) -> (S, S) {
    let hypotenuse = root(opposite.square() + adjacent.square());
    if hypotenuse.real() > 0.0 {
        let inverse = S::one() / hypotenuse;
        (opposite * inverse, adjacent * inverse)
    } else {
        (S::zero(), S::one())
    }
}
