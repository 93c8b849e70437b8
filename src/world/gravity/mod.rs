//! Gravity: uniform, or a point mass with zonal harmonics.

mod central;

pub use central::{Central, MAX_DEGREE};

use crate::math::{Scalar, Vector};

#[cfg(test)]
mod tests;

/// A field of gravity. Lengths in m, times in s.
#[derive(Clone, Copy, Debug)]
pub enum Gravity<S> {
    /// Of this size in m/s², towards −z: the z axis of a flat world is up.
    Uniform(S),
    /// About a body whose centre is the origin and whose pole is the z axis.
    Central(Central<S>),
}

impl<S: Scalar> Gravity<S> {
    /// Acceleration in m/s² at an inertial position in m.
    ///
    /// Not finite at the centre of a body.
    #[inline]
    pub fn acceleration(&self, position: Vector<S>) -> Vector<S> {
        match self {
            Gravity::Uniform(size) => Vector::new(S::zero(), S::zero(), -*size),
            Gravity::Central(central) => central.acceleration(position),
        }
    }

    /// Potential energy a kilogram, J/kg: zero at z = 0 of a flat world and infinitely far from a body.
    pub fn potential_energy(&self, position: Vector<S>) -> S {
        match self {
            Gravity::Uniform(size) => *size * position.z(),
            Gravity::Central(central) => -central.potential(position),
        }
    }
}
