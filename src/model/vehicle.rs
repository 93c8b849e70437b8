//! Engines, stages and how they are put together.

use std::sync::Arc;

use schemars::JsonSchema;
use serde::{Serialize, Serializer};

use super::{Place, Value};
use crate::quantity::Dimension;

/// All that leaves the ground below the payload.
#[derive(Clone, Debug, PartialEq, Serialize, JsonSchema)]
pub struct Vehicle {
    pub name: String,
    pub place: Place,
    /// The stack bottom first, then the groups beside it, then the shroud.
    pub parts: Vec<Part>,
    pub drag: Drag,
}

/// What can be shed as one: a stage, a group of strap-ons, the shroud.
#[derive(Clone, Debug, PartialEq, Serialize, JsonSchema)]
pub struct Part {
    pub name: String,
    /// The stage's definition, where its name differs from the part's (strap-ons).
    pub definition: String,
    pub place: Place,
    pub role: Role,
    /// How many of them (strap-ons); masses and engines below are of one.
    pub count: Value,
    /// Dry mass without growth, kg.
    pub dry: Value,
    /// Growth allowance as a fraction of `dry`.
    pub growth: Value,
    pub propulsion: Option<Propulsion>,
}

#[derive(Clone, Debug, PartialEq, Serialize, JsonSchema)]
#[serde(tag = "kind", rename_all = "snake_case", deny_unknown_fields)]
pub enum Role {
    /// A stage of the stack; 0 is the lowest.
    Stack {
        position: u32,
    },
    /// Carried beside the part of this index.
    Beside {
        carrier: u32,
    },
    Shroud,
}

#[derive(Clone, Debug, PartialEq, Serialize, JsonSchema)]
pub struct Propulsion {
    pub engine: Engine,
    /// Engines on one stage.
    pub engines: Value,
    /// Loaded, kg.
    pub propellant: Value,
    /// Of the loaded propellant, kg.
    pub unusable: Value,
    pub reserve: Option<Reserve>,
}

#[derive(Clone, Debug, PartialEq, Serialize, JsonSchema)]
#[serde(tag = "kind", rename_all = "snake_case", deny_unknown_fields)]
pub enum Reserve {
    /// kg
    Mass { mass: Value },
    /// m/s, turned into mass by the whole vehicle's mass once the usable propellant is gone.
    Speed { speed: Value },
}

#[derive(Clone, Debug, PartialEq, Serialize, JsonSchema)]
pub struct Engine {
    pub name: String,
    pub place: Place,
    pub thrust: Thrust,
    /// In vacuum, s.
    pub isp: Value,
    /// m²; zero where only vacuum flight is meant.
    pub exit_area: Value,
    /// Least and greatest throttle, as fractions.
    pub throttle_least: Value,
    pub throttle_most: Value,
    /// How often it may be lit again after its first burn.
    pub restarts: Option<Value>,
}

#[derive(Clone, Debug, PartialEq, Serialize, JsonSchema)]
#[serde(tag = "kind", rename_all = "snake_case", deny_unknown_fields)]
pub enum Thrust {
    /// In vacuum at full throttle, N.
    Steady { vacuum: Value },
    /// In vacuum over the time since it was lit, s → N.
    Curve {
        #[serde(serialize_with = "shared")]
        #[schemars(with = "Curve")]
        curve: Arc<Curve>,
    },
}

#[derive(Clone, Debug, PartialEq, Serialize, JsonSchema)]
#[serde(tag = "kind", rename_all = "snake_case", deny_unknown_fields)]
pub enum Drag {
    /// No aerodynamic force.
    None,
    Steady {
        coefficient: Value,
        reference_area: Value,
    },
    /// Coefficient over `mach`, or over `mach` and `altitude` or `angle_of_attack`.
    Curve {
        #[serde(serialize_with = "shared")]
        #[schemars(with = "Curve")]
        curve: Arc<Curve>,
        reference_area: Value,
    },
}

/// A long curve may belong to many engines or vehicles, which then share it.
fn shared<S: Serializer>(curve: &Arc<Curve>, serializer: S) -> Result<S::Ok, S::Error> {
    curve.as_ref().serialize(serializer)
}

/// A table of one quantity over one or two others, in SI.
#[derive(Clone, Debug, PartialEq, Serialize, JsonSchema)]
pub struct Curve {
    pub name: String,
    pub place: Place,
    pub smoothness: Smoothness,
    pub beyond: Beyond,
    /// One or two; each strictly rising.
    pub axes: Vec<Axis>,
    pub output: String,
    pub output_dimension: Dimension,
    /// With two axes the second runs fastest: `values[i * axes[1].points.len() + j]`.
    pub values: Vec<f64>,
}

#[derive(Clone, Debug, PartialEq, Serialize, JsonSchema)]
pub struct Axis {
    pub name: String,
    pub dimension: Dimension,
    pub points: Vec<f64>,
}

#[derive(Clone, Copy, Debug, PartialEq, Eq, Serialize, JsonSchema)]
#[serde(rename_all = "snake_case")]
pub enum Smoothness {
    /// Monotone cubic with continuous slope.
    Smooth,
    Linear,
}

#[derive(Clone, Copy, Debug, PartialEq, Eq, Serialize, JsonSchema)]
#[serde(rename_all = "snake_case")]
pub enum Beyond {
    /// Reading outside the table stops the flight.
    Refuse,
    Hold,
    Zero,
    Extend,
}
