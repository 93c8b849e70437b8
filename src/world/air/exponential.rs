//! Air that thins by the same factor for every equal climb.

use super::AirState;
use crate::math::Scalar;

/// Density and pressure fall as exp(−altitude/scale height); the speed of sound is the same
/// everywhere.
#[derive(Clone, Copy, Debug)]
pub struct Exponential<S> {
    /// kg/m³ at altitude zero.
    pub density: S,
    /// Pa at altitude zero.
    pub pressure: S,
    /// m
    pub scale_height: S,
    /// m/s
    pub sound_speed: S,
}

impl<S: Scalar> Exponential<S> {
    /// The air at an altitude in m.
    #[inline]
    pub fn at(&self, altitude: S) -> AirState<S> {
        let thinned = (-(altitude / self.scale_height)).exp();
        AirState {
            density: self.density * thinned,
            pressure: self.pressure * thinned,
            sound_speed: self.sound_speed,
        }
    }
}
