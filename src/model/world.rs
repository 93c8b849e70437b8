//! The force environment.

use schemars::JsonSchema;
use serde::Serialize;

use super::{Place, Value};

#[derive(Clone, Debug, PartialEq, Serialize, JsonSchema)]
pub struct World {
    pub name: String,
    pub place: Place,
    pub gravity: Gravity,
    pub surface: Surface,
    /// Rate of rotation about the polar axis, rad/s.
    pub spin: Value,
    pub air: Air,
}

#[derive(Clone, Debug, PartialEq, Serialize, JsonSchema)]
#[serde(tag = "kind", rename_all = "snake_case", deny_unknown_fields)]
pub enum Gravity {
    /// Downward everywhere; flat worlds only, m/s².
    Uniform { size: Value },
    /// A point mass with optional oblateness; `mu` in m³/s².
    Central { mu: Value, j2: Option<Value> },
}

#[derive(Clone, Debug, PartialEq, Serialize, JsonSchema)]
#[serde(tag = "kind", rename_all = "snake_case", deny_unknown_fields)]
pub enum Surface {
    Flat,
    /// Equatorial radius in m; a sphere has flattening zero.
    Ellipsoid {
        equatorial_radius: Value,
        flattening: Value,
    },
}

#[derive(Clone, Debug, PartialEq, Serialize, JsonSchema)]
#[serde(tag = "kind", rename_all = "snake_case", deny_unknown_fields)]
pub enum Air {
    None,
    /// U.S. Standard Atmosphere, 1976, from the ground to 1000 km.
    Standard1976,
    /// density·exp(−altitude/scale_height), pressure likewise, one speed of sound.
    Exponential {
        density: Value,
        pressure: Value,
        scale_height: Value,
        sound_speed: Value,
    },
}
