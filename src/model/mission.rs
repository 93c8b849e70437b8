//! The mission: who flies where, from what state, through which phases, and what is asked of it.

use schemars::JsonSchema;
use serde::Serialize;

use super::{Fact, FactId, Formula, Phase, Place, Value, Vehicle, World};
use crate::quantity::Dimension;

/// Version of the model's JSON form.
pub const FORMAT: &str = "stagewright-model/1";

/// A whole checked source.
#[derive(Clone, Debug, PartialEq, Serialize, JsonSchema)]
pub struct Model {
    pub format: String,
    pub missions: Vec<Mission>,
    /// Every number of every mission, in the order of the source.
    pub facts: Vec<Fact>,
}

#[derive(Clone, Debug, PartialEq, Serialize, JsonSchema)]
pub struct Mission {
    pub name: String,
    pub place: Place,
    pub world: World,
    pub vehicle: Vehicle,
    pub start: Start,
    pub epoch: Option<Epoch>,
    /// kg
    pub payload: Value,
    /// kg, carried to the end with the payload.
    pub adapter: Option<Value>,
    pub phases: Vec<Phase>,
    pub demands: Vec<Demand>,
    pub figures: Vec<Figure>,
    pub aims: Vec<Aim>,
    pub knobs: Vec<Knob>,
    pub objective: Option<Objective>,
    pub headline: Option<Headline>,
    /// Facts that this mission uses, `given` included, in the order of the source.
    pub facts: Vec<FactId>,
}

/// The state at the start; angles in rad, lengths in m, speeds in m/s.
#[derive(Clone, Debug, PartialEq, Serialize, JsonSchema)]
#[serde(tag = "kind", rename_all = "snake_case", deny_unknown_fields)]
pub enum Start {
    /// At rest in the body-fixed frame. Latitude and longitude are zero on a flat world.
    Pad { latitude: Value, longitude: Value, altitude: Value },
    /// Perigee and apogee as altitudes above the equatorial radius.
    Orbit { perigee: Value, apogee: Value, inclination: Value, node: Value, argument: Value, anomaly: Value },
    /// Inertial; on a flat world x is east, y north, z up.
    State { position: [Value; 3], velocity: [Value; 3] },
}

/// An instant of UTC.
#[derive(Clone, Debug, PartialEq, Serialize, JsonSchema)]
pub struct Epoch {
    pub written: String,
    /// Julian date, days.
    pub julian_date: f64,
    pub place: Place,
}

#[derive(Clone, Debug, PartialEq, Serialize, JsonSchema)]
pub struct Demand {
    /// The author's identifier, or the quantity as written.
    pub name: String,
    /// The quantity as written.
    pub written: String,
    pub quantity: Formula,
    pub dimension: Dimension,
    /// The unit in which to show it: that of the limit as the author wrote it.
    pub unit: String,
    pub requirement: Requirement,
    pub because: Option<String>,
    pub place: Place,
}

#[derive(Clone, Debug, PartialEq, Serialize, JsonSchema)]
#[serde(tag = "kind", rename_all = "snake_case", deny_unknown_fields)]
pub enum Requirement {
    AtLeast { limit: Formula },
    AtMost { limit: Formula },
    Between { low: Formula, high: Formula },
    Within { target: Formula, tolerance: Formula },
}

#[derive(Clone, Debug, PartialEq, Serialize, JsonSchema)]
pub struct Figure {
    pub name: String,
    pub written: String,
    pub value: Formula,
    pub dimension: Dimension,
    pub unit: String,
    pub because: Option<String>,
    pub place: Place,
}

/// What the knobs shall bring about.
#[derive(Clone, Debug, PartialEq, Serialize, JsonSchema)]
pub struct Aim {
    pub written: String,
    pub quantity: Formula,
    pub target: Formula,
    pub tolerance: Formula,
    pub dimension: Dimension,
    pub unit: String,
    pub place: Place,
}

/// Frees a fact between bounds.
#[derive(Clone, Debug, PartialEq, Serialize, JsonSchema)]
pub struct Knob {
    pub fact: FactId,
    pub low: f64,
    pub high: f64,
    pub place: Place,
}

#[derive(Clone, Debug, PartialEq, Serialize, JsonSchema)]
pub struct Objective {
    pub most: bool,
    pub written: String,
    pub quantity: Formula,
    pub dimension: Dimension,
    pub unit: String,
}

/// What comparison and exchange ratios speak of first.
#[derive(Clone, Debug, PartialEq, Serialize, JsonSchema)]
#[serde(tag = "kind", rename_all = "snake_case", deny_unknown_fields)]
pub enum Headline {
    Fact { fact: FactId },
    Figure { index: u32 },
}
