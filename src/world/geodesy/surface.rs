//! The ground: where it is, which way is up, and how far apart two points of it are.

use super::{Ellipsoid, Geodetic};
use crate::math::{Scalar, Vector};
use crate::world::root::root;

/// Orthonormal local axes at a point.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Axes<S> {
    /// Along the ellipsoid's normal, outward.
    pub up: Vector<S>,
    pub north: Vector<S>,
    pub east: Vector<S>,
}

impl<S: Scalar> Axes<S> {
    /// Unit vector at an elevation above the horizontal and a heading clockwise from north, both in rad.
    pub fn direction(&self, elevation: S, heading: S) -> Vector<S> {
        let level = elevation.cos();
        self.up * elevation.sin() + self.north * (level * heading.cos()) + self.east * (level * heading.sin())
    }
}

/// Altitude in m and local axes.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Local<S> {
    pub altitude: S,
    pub axes: Axes<S>,
}

/// The shape of the ground.
#[derive(Clone, Copy, Debug)]
pub enum Surface<S> {
    /// The plane z = 0: x east, y north, z up.
    Flat,
    Ellipsoid(Ellipsoid<S>),
}

impl<S: Scalar> Surface<S> {
    /// Altitude and local axes at a position in m, in the frame of the position.
    #[inline]
    pub fn local(&self, position: Vector<S>) -> Local<S> {
        match self {
            Surface::Ellipsoid(ellipsoid) => ellipsoid.local(position),
            Surface::Flat => {
                let (zero, one) = (S::zero(), S::one());
                let east = Vector::new(one, zero, zero);
                let north = Vector::new(zero, one, zero);
                let up = Vector::new(zero, zero, one);
                Local { altitude: position.z(), axes: Axes { up, north, east } }
            }
        }
    }

    /// Body-fixed position in m. On a flat world the point above the origin, whatever the angles.
    pub fn position(&self, at: Geodetic<S>) -> Vector<S> {
        match self {
            Surface::Ellipsoid(ellipsoid) => ellipsoid.position(at),
            Surface::Flat => Vector::new(S::zero(), S::zero(), at.altitude),
        }
    }

    /// Distance in m along the ground between the points under two body-fixed positions: on a round
    /// world the angle between the positions, seen from the centre, times the equatorial radius; on a
    /// flat one the horizontal distance.
    pub fn downrange(&self, from: Vector<S>, to: Vector<S>) -> S {
        match self {
            Surface::Ellipsoid(ellipsoid) => central_angle(from, to) * ellipsoid.equatorial_radius,
            Surface::Flat => {
                let gap = to - from;
                root(gap.x().square() + gap.y().square())
            }
        }
    }
}

/// Angle in rad between two directions, as the arc tangent of cross over dot product, which keeps its
/// digits for small and for opposite angles. Where it is zero it has no derivative.
fn central_angle<S: Scalar>(from: Vector<S>, to: Vector<S>) -> S {
    let cross = from.cross(to);
    root(cross.dot(cross)).atan2(from.dot(to))
}
