//! U.S. Standard Atmosphere, 1976 (NOAA-S/T 76-1562), from its ground to its top at 1000 km.
//!
//! Below 86 km the closed forms of the standard; above, a table of the solution of its six-species
//! equations, read with a cubic of continuous slope. Equation and table numbers are the standard's.

mod lower;
mod temperature;
mod upper;
mod upper_table;

use super::AirState;
use crate::math::Scalar;

pub(super) use temperature::temperature;

/// Geometric altitude in m where the closed forms end.
const JOINT: f64 = 86_000.0;

/// Geometric altitude in m where the standard ends.
pub(super) const TOP: f64 = 1.0e6;

/// The bases of the layers below 86 km, that joint, the one place above it where the slope of the density
/// jumps (mixed air ends, and with it one mean molar mass), and the top. The other seams of the table
/// have continuous slopes, in air too thin for the rest to be felt.
pub(super) const LAYER_ALTITUDES: [f64; 9] = [
    lower::geometric(11_000.0),
    lower::geometric(20_000.0),
    lower::geometric(32_000.0),
    lower::geometric(47_000.0),
    lower::geometric(51_000.0),
    lower::geometric(71_000.0),
    JOINT,
    100_000.0,
    TOP,
];

/// The air at a geodetic altitude in m, or nothing above [`TOP`].
#[inline]
pub(super) fn at<S: Scalar>(altitude: S) -> Option<AirState<S>> {
    match altitude.real() {
        z if z < JOINT => Some(lower::at(altitude)),
        z if z <= TOP => upper::at(altitude),
        _ => None,
    }
}

/// The air at a geodetic altitude in m by the formula of one layer, the lowest being 0.
#[inline]
pub(super) fn within<S: Scalar>(layer: usize, altitude: S) -> Option<AirState<S>> {
    match LAYER_ALTITUDES.get(layer) {
        Some(top) if *top <= JOINT => Some(lower::within(layer, altitude)),
        Some(_) => upper::at(altitude),
        None => None,
    }
}

#[cfg(test)]
mod lower_tests;
#[cfg(test)]
mod upper_tests;
