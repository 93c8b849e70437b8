//! Air: its density, pressure, speed of sound and temperature by altitude.

mod exponential;
mod standard_1976;

pub use exponential::Exponential;

use crate::math::Scalar;

#[cfg(test)]
mod tests;

/// The air at one altitude.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct AirState<S> {
    /// kg/m³
    pub density: S,
    /// Pa
    pub pressure: S,
    /// m/s
    pub sound_speed: S,
}

/// A model of the air.
#[derive(Clone, Copy, Debug)]
pub enum Air<S> {
    None,
    /// U.S. Standard Atmosphere, 1976, from 5 km below the ellipsoid to 1000 km above it.
    Standard1976,
    Exponential(Exponential<S>),
}

impl<S: Scalar> Air<S> {
    /// The air at a geodetic altitude in m; nothing where there is no air, or none of the model's.
    ///
    /// Below its lowest layer a model goes on as it is there.
    #[inline]
    pub fn at(&self, altitude: S) -> Option<AirState<S>> {
        match self {
            Air::None => None,
            Air::Standard1976 => standard_1976::at(altitude),
            Air::Exponential(exponential) => Some(exponential.at(altitude)),
        }
    }

    /// Kinetic temperature in K at a geodetic altitude in m, from the model that states one.
    pub fn temperature(&self, altitude: S) -> Option<S> {
        match self {
            Air::Standard1976 => standard_1976::temperature(altitude),
            Air::None | Air::Exponential(_) => None,
        }
    }

    /// Which layer an altitude in m lies in: the number of [`Air::layer_altitudes`] not above it.
    pub fn layer(&self, altitude: f64) -> usize {
        self.layer_altitudes().partition_point(|layer| *layer <= altitude)
    }

    /// The air at an altitude in m by the formula of one layer, which goes on smoothly beyond the
    /// layer's ends: so an integration sees no kink before it has cut its step there.
    #[inline]
    pub fn within(&self, layer: usize, altitude: S) -> Option<AirState<S>> {
        match self {
            Air::Standard1976 => standard_1976::within(layer, altitude),
            Air::None | Air::Exponential(_) => self.at(altitude),
        }
    }

    /// Geodetic altitudes in m, ascending, where a formula gives way to another. Some derivative of
    /// the air jumps there, so a step of the integration ends there.
    pub fn layer_altitudes(&self) -> &'static [f64] {
        match self {
            Air::Standard1976 => &standard_1976::LAYER_ALTITUDES,
            Air::None | Air::Exponential(_) => &[],
        }
    }

    /// Geodetic altitude in m above which the model knows no air, if it has such an end.
    pub fn top(&self) -> Option<f64> {
        match self {
            Air::Standard1976 => Some(standard_1976::TOP),
            Air::None | Air::Exponential(_) => None,
        }
    }
}
