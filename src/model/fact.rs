//! Facts: where each number comes from and why.

use schemars::JsonSchema;
use serde::Serialize;

use crate::quantity::Dimension;

/// Index into [`super::Model::facts`].
#[derive(Clone, Copy, Debug, PartialEq, Eq, PartialOrd, Ord, Serialize, JsonSchema)]
pub struct FactId(pub u32);

/// A number in SI units and the fact that states it.
#[derive(Clone, Copy, Debug, PartialEq, Serialize, JsonSchema)]
pub struct Value {
    pub si: f64,
    pub fact: FactId,
}

/// A place in a source file, as people count, and in bytes for programs.
#[derive(Clone, Debug, PartialEq, Eq, Serialize, JsonSchema)]
pub struct Place {
    /// Relative to the project's folder, or `builtin`.
    pub file: String,
    pub line: u32,
    pub column: u32,
    pub start: u32,
    pub end: u32,
}

/// Who says so.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Serialize, JsonSchema)]
#[serde(rename_all = "snake_case")]
pub enum Origin {
    /// Written in the source.
    Stated,
    /// Follows from stated facts (such as an exit area from two values of thrust).
    Derived,
    /// Nobody wrote it; the report lists it among the assumptions.
    Default,
    /// A `given`: a named value that facts may use, and that shapes nothing by itself.
    Given,
}

/// One number of the model under its address.
#[derive(Clone, Debug, PartialEq, Serialize, JsonSchema)]
pub struct Fact {
    /// Such as `Sorrel.dry` or `Climb.pitch.rate`; facts of the mission stand bare (`payload`).
    pub path: String,
    pub si: f64,
    pub dimension: Dimension,
    /// The author's unit, empty where there is none; a default has its customary unit.
    pub unit: String,
    /// The value as the author wrote it, such as `43.0 kN` or `2 * lean`.
    pub written: String,
    pub origin: Origin,
    /// The definition's place; for a default, the place of the block that lacks it.
    pub place: Place,
    pub because: Option<String>,
}
