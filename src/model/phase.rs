//! Phases: what burns, how it steers, what ends it.

use schemars::JsonSchema;
use serde::Serialize;

use super::{Formula, Place, Value};

#[derive(Clone, Debug, PartialEq, Serialize, JsonSchema)]
pub struct Phase {
    pub name: String,
    pub place: Place,
    /// Lit from the start of the phase; empty in a coast.
    pub burns: Vec<Burn>,
    /// Lit later within the phase.
    pub lights: Vec<Light>,
    pub steer: Steer,
    /// Commanded throttle where no hold acts, as a fraction; absent means full.
    pub throttle: Option<Value>,
    pub hold: Option<Hold>,
    /// The first to come true ends the phase; never empty.
    pub until: Vec<Condition>,
    /// In the order of the source.
    pub sheds: Vec<Shed>,
}

#[derive(Clone, Debug, PartialEq, Serialize, JsonSchema)]
pub struct Burn {
    /// Index into [`super::Vehicle::parts`].
    pub part: u32,
    /// Engines lit on one stage, where fewer than all.
    pub engines: Option<Value>,
}

#[derive(Clone, Debug, PartialEq, Serialize, JsonSchema)]
pub struct Light {
    pub part: u32,
    /// Seconds from the start of the phase.
    pub at: Value,
}

#[derive(Clone, Debug, PartialEq, Serialize, JsonSchema)]
#[serde(tag = "law", rename_all = "snake_case", deny_unknown_fields)]
pub enum Steer {
    Upright,
    IntoAirflow,
    FromAirflow,
    Motion {
        against: bool,
        over_ground: bool,
    },
    /// The inertial direction at the end of the phase before (local up in the first).
    Keep,
    Pitch {
        pitch: PitchLaw,
        heading: Formula,
        frozen: bool,
    },
}

/// Angles in rad, times in s from the start of the phase.
#[derive(Clone, Debug, PartialEq, Serialize, JsonSchema)]
#[serde(tag = "law", rename_all = "snake_case", deny_unknown_fields)]
pub enum PitchLaw {
    Fixed { pitch: Formula },
    Rate { from: Formula, rate: Formula },
    Over { from: Formula, by: Formula, over: Formula },
    Tangent { a: Formula, b: Formula },
}

/// Keeps a quantity at or under a limit by throttling.
#[derive(Clone, Debug, PartialEq, Serialize, JsonSchema)]
pub struct Hold {
    /// A single reading: acceleration, axial acceleration, thrust-to-weight or thrust.
    pub quantity: Formula,
    pub limit: Formula,
    pub place: Place,
}

#[derive(Clone, Debug, PartialEq, Serialize, JsonSchema)]
#[serde(tag = "kind", rename_all = "snake_case", deny_unknown_fields)]
pub enum Condition {
    /// Seconds from the start of the phase.
    After {
        duration: Formula,
    },
    Compare {
        quantity: Formula,
        comparison: Comparison,
        limit: Formula,
        written: String,
    },
    Spent {
        part: u32,
    },
    Apex,
    Touchdown,
}

#[derive(Clone, Copy, Debug, PartialEq, Eq, Serialize, JsonSchema)]
#[serde(rename_all = "snake_case")]
pub enum Comparison {
    AtLeast,
    AtMost,
    RisesTo,
    FallsTo,
}

#[derive(Clone, Debug, PartialEq, Serialize, JsonSchema)]
pub struct Shed {
    pub part: u32,
    /// Absent: at the end of the phase.
    pub when: Option<Condition>,
    pub place: Place,
}
