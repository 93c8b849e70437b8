//! An ellipsoid of revolution, and the way between its geodetic coordinates and Cartesian ones.

use super::{Axes, Local};
use crate::math::{Scalar, Vector};
use crate::world::root::root;

/// Steps of Bowring's iteration; from its start within a few thousand kilometres of the surface the
/// second one already reaches rounding, derivatives included.
const STEPS: usize = 3;

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
    /// Distance from the axis, m.
    axial: S,
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
        let longitude = if foot.axial.real() > 0.0 { position.y().atan2(position.x()) } else { S::zero() };
        Geodetic { latitude: foot.sin.atan2(foot.cos), longitude, altitude: foot.altitude }
    }

    /// Altitude and local axes at a position, without angles. The ellipsoid being one of revolution,
    /// an inertial position gives inertial axes and a body-fixed one gives body-fixed axes.
    #[inline]
    pub fn local(&self, position: Vector<S>) -> Local<S> {
        let Foot { axial, sin, cos, altitude, to_axis } = self.foot(position);
        let [x, y, _] = position.0;
        // cos φ·cos λ as x/(N + h): smooth across the axis, where cos λ is not.
        let up = Vector::new(x / to_axis, y / to_axis, sin);
        let (cos_longitude, sin_longitude) =
            if axial.real() > 0.0 { (x / axial, y / axial) } else { (S::one(), S::zero()) };
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
        // Focal offsets of the evolute: e²·a and e′²·b.
        let (inner, outer) = (e2 * a, e2 * a / squeeze);
        let (mut sin, mut cos) = if r.real() > 0.0 {
            // Tangent of the reduced latitude: (z·b/(p·a))·(1 + e′²·b/r).
            normalised(z * squeeze * (S::one() + outer / r), axial)
        } else {
            (S::zero(), S::one())
        };
        for step in 0..STEPS {
            let up = z + outer * sin.square() * sin;
            let out = axial - inner * cos.square() * cos;
            (sin, cos) = normalised(up, if out.real() > 0.0 { out } else { S::zero() });
            if step + 1 < STEPS {
                (sin, cos) = normalised(sin * squeeze, cos);
            }
        }
        let w = (S::one() - e2 * sin.square()).sqrt();
        // Stationary in the latitude, so that what is left of its error counts only squared.
        let altitude = axial * cos + z * sin - a * w;
        Foot { axial, sin, cos, altitude, to_axis: a / w + altitude }
    }
}

/// Sine and cosine of the angle whose tangent is `opposite`/`adjacent`, `adjacent` not negative.
fn normalised<S: Scalar>(opposite: S, adjacent: S) -> (S, S) {
    let hypotenuse = root(opposite.square() + adjacent.square());
    if hypotenuse.real() > 0.0 {
        (opposite / hypotenuse, adjacent / hypotenuse)
    } else {
        (S::zero(), S::one())
    }
}
