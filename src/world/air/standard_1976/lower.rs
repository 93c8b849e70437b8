//! The seven layers below 86 km, where the molecular-scale temperature is linear in geopotential altitude.

use crate::math::Scalar;
use crate::world::air::AirState;

/// Effective radius of the Earth in m, section 1.2.4: the standard's own, not that of an ellipsoid.
pub(super) const EFFECTIVE_RADIUS: f64 = 6_356_766.0;

/// Gas constant, J/(kmol K), table 2; the standard keeps its own.
const GAS_CONSTANT: f64 = 8314.32;

/// Mean molar mass of air at sea level, kg/kmol.
const MOLAR_MASS: f64 = 28.9644;

/// g0′·M0/R*, the fall of ln(pressure) a metre times the temperature, K/m.
const HYDROSTATIC: f64 = 9.80665 * MOLAR_MASS / GAS_CONSTANT;

/// R*/M0, J/(kg K).
const SPECIFIC_GAS_CONSTANT: f64 = GAS_CONSTANT / MOLAR_MASS;

/// Ratio of specific heats.
const GAMMA: f64 = 1.4;

/// A layer of constant lapse rate, table 4.
pub(super) struct Layer {
    /// Geopotential altitude of its base, m.
    pub(super) base: f64,
    /// Molecular-scale temperature at its base, K.
    pub(super) temperature: f64,
    /// K/m
    pub(super) lapse: f64,
    /// At its base, Pa: each follows from the layer below (eqs. 33a and 33b), which a test repeats.
    pub(super) pressure: f64,
}

const fn layer(base: f64, temperature: f64, lapse: f64, pressure: f64) -> Layer {
    Layer { base, temperature, lapse, pressure }
}

const GROUND: Layer = layer(0.0, 288.15, -6.5e-3, 101_325.0);

/// The layers above the lowest one, highest first.
const HIGHER: [Layer; 6] = [
    layer(71_000.0, 214.65, -2.0e-3, 3.956_420_428_040_728_7),
    layer(51_000.0, 270.65, -2.8e-3, 66.938_873_118_687_27),
    layer(47_000.0, 270.65, 0.0, 110.906_305_554_965_88),
    layer(32_000.0, 228.65, 2.8e-3, 868.018_684_755_227_4),
    layer(20_000.0, 216.65, 1.0e-3, 5_474.888_669_677_78),
    layer(11_000.0, 216.65, 0.0, 22_632.063_973_462_93),
];

/// The layer at a geopotential altitude; the lowest one goes on downwards.
pub(super) fn layer_at(geopotential: f64) -> &'static Layer {
    HIGHER.iter().find(|layer| geopotential >= layer.base).unwrap_or(&GROUND)
}

/// Geopotential altitude in m of a geometric one, eq. 18.
pub(super) fn geopotential<S: Scalar>(geometric: S) -> S {
    geometric * EFFECTIVE_RADIUS / (geometric + EFFECTIVE_RADIUS)
}

/// Geometric altitude in m of a geopotential one, eq. 19.
pub(super) const fn geometric(geopotential: f64) -> f64 {
    EFFECTIVE_RADIUS * geopotential / (EFFECTIVE_RADIUS - geopotential)
}

/// Molecular-scale temperature in K at a geopotential altitude, eq. 23.
pub(super) fn molecular_temperature<S: Scalar>(geopotential: S) -> S {
    let layer = layer_at(geopotential.real());
    (geopotential - layer.base) * layer.lapse + layer.temperature
}

/// Speed of sound in m/s for a molecular-scale temperature in K, eq. 50.
pub(super) fn sound_speed<S: Scalar>(temperature: S) -> S {
    (temperature * (GAMMA * SPECIFIC_GAS_CONSTANT)).sqrt()
}

/// The air at a geometric altitude in m, up to 86 km.
#[inline]
pub(super) fn at<S: Scalar>(altitude: S) -> AirState<S> {
    let height = geopotential(altitude);
    of_layer(layer_at(height.real()), height)
}

/// The air at a geometric altitude in m by the formula of one layer, the lowest being 0, wherever
/// the altitude is.
#[inline]
pub(super) fn within<S: Scalar>(layer: usize, altitude: S) -> AirState<S> {
    let layer = layer.checked_sub(1).and_then(|above| HIGHER.iter().rev().nth(above)).unwrap_or(&GROUND);
    of_layer(layer, geopotential(altitude))
}

fn of_layer<S: Scalar>(layer: &Layer, height: S) -> AirState<S> {
    let above = height - layer.base;
    let temperature = above * layer.lapse + layer.temperature;
    let ratio = if layer.lapse == 0.0 {
        (above * (-HYDROSTATIC / layer.temperature)).exp()
    } else {
        (temperature / layer.temperature).power(-HYDROSTATIC / layer.lapse)
    };
    let pressure = ratio * layer.pressure;
    AirState {
        density: pressure / (temperature * SPECIFIC_GAS_CONSTANT),
        pressure,
        sound_speed: sound_speed(temperature),
    }
}
