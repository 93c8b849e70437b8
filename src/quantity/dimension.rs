//! Physical dimensions as exponents of the base quantities, angle among them.

use serde::{Deserialize, Serialize};

/// Exponents of length, mass, time, temperature and angle.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq, Hash, Serialize, Deserialize, schemars::JsonSchema)]
pub struct Dimension {
    pub length: i8,
    pub mass: i8,
    pub time: i8,
    pub temperature: i8,
    pub angle: i8,
}
