//! Kinetic temperature, which a thermometer would show.

use super::lower::{EFFECTIVE_RADIUS, geopotential, molecular_temperature};
use super::{JOINT, TOP};
use crate::math::Scalar;

/// Where molar mass begins to fall, m, and the step of [`MOLAR_MASS_RATIOS`].
const RATIO_BOTTOM: f64 = 80_000.0;
const RATIO_STEP: f64 = 500.0;

/// M/M0 every 500 m of geometric altitude from 80 km to 86 km, table 8.
const MOLAR_MASS_RATIOS: [f64; 13] = [
    1.000_000, 0.999_996, 0.999_989, 0.999_971, 0.999_941, 0.999_909, 0.999_870, 0.999_829, 0.999_786,
    0.999_741, 0.999_694, 0.999_641, 0.999_579,
];

/// Kinetic temperature in K at a geometric altitude in m, or nothing above the top.
pub(in crate::world::air) fn temperature<S: Scalar>(altitude: S) -> Option<S> {
    match altitude.real() {
        z if z < JOINT => Some(molecular_temperature(geopotential(altitude)) * molar_mass_ratio(altitude)),
        z if z <= TOP => Some(upper(altitude)),
        _ => None,
    }
}

/// Linear between the entries of the table.
fn molar_mass_ratio<S: Scalar>(altitude: S) -> S {
    let steps = (altitude - RATIO_BOTTOM) / RATIO_STEP;
    let cell = steps.real().max(0.0) as usize;
    match MOLAR_MASS_RATIOS.get(cell..cell + 2) {
        Some([low, high]) if steps.real() > 0.0 => (steps - cell as f64) * (high - low) + *low,
        _ => S::one(),
    }
}

/// Eqs. 25, 27, 29 and 31.
fn upper<S: Scalar>(altitude: S) -> S {
    let km = altitude / 1e3;
    match km.real() {
        z if z <= 91.0 => S::from(186.8673),
        z if z <= 110.0 => {
            let x = (km - 91.0) / 19.9429;
            S::from(263.1905) - (S::one() - x.square()).sqrt() * 76.3232
        }
        z if z <= 120.0 => (km - 110.0) * 12.0 + 240.0,
        _ => {
            let radius = EFFECTIVE_RADIUS / 1e3;
            let reduced = (km - 120.0) * (radius + 120.0) / (km + radius);
            S::from(1000.0) - (reduced * -0.01875).exp() * 640.0
        }
    }
}
