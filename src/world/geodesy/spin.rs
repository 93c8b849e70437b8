//! Rotation of a body about its pole, between the inertial and the body-fixed frame.

use crate::math::{Scalar, Vector};

/// Uniform rotation about the z axis, shared by both frames.
#[derive(Clone, Copy, Debug)]
pub struct Spin<S> {
    /// rad/s
    pub rate: S,
    /// Angle in rad from inertial x to body-fixed x at time zero.
    pub angle: S,
}

impl<S: Scalar> Spin<S> {
    /// The turn from one frame to the other at a time in s.
    #[inline]
    pub fn at(&self, time: S) -> Rotation<S> {
        let angle = self.angle + self.rate * time;
        Rotation { sin: angle.sin(), cos: angle.cos() }
    }

    /// Inertial velocity in m/s of the body's own matter at a position in m; the components are in the
    /// frame of the position.
    #[inline]
    pub fn velocity(&self, position: Vector<S>) -> Vector<S> {
        Vector::new(-(self.rate * position.y()), self.rate * position.x(), S::zero())
    }

    /// Centrifugal acceleration in m/s²: ω² times the distance from the axis, outward.
    pub fn centrifugal(&self, position: Vector<S>) -> Vector<S> {
        let square = self.rate.square();
        Vector::new(square * position.x(), square * position.y(), S::zero())
    }
}

/// The turn between the inertial and the body-fixed frame at one instant.
///
/// It turns components only: for a body-fixed velocity take away [`Spin::velocity`] as well.
#[derive(Clone, Copy, Debug)]
pub struct Rotation<S> {
    sin: S,
    cos: S,
}

impl<S: Scalar> Rotation<S> {
    #[inline]
    pub fn to_fixed(&self, inertial: Vector<S>) -> Vector<S> {
        let [x, y, z] = inertial.0;
        Vector::new(self.cos * x + self.sin * y, self.cos * y - self.sin * x, z)
    }

    #[inline]
    pub fn to_inertial(&self, fixed: Vector<S>) -> Vector<S> {
        let [x, y, z] = fixed.0;
        Vector::new(self.cos * x - self.sin * y, self.sin * x + self.cos * y, z)
    }
}
