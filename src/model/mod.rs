//! The checked model: SI values only, each with the fact that it comes from.
//!
//! Only the checker makes a [`Model`], and only a model can be flown.

mod fact;
mod formula;
mod json;
mod mission;
mod phase;
mod vehicle;
mod world;

pub use fact::{Fact, FactId, Origin, Place, Value};
pub use formula::{Edge, Formula, Function, Operator, Quantity, QuantityKind, Reading};
pub use json::{json, schema};
pub use mission::{
    Aim, Demand, Epoch, FORMAT, Figure, Headline, Knob, Mission, Model, Objective, Requirement, Start,
};
pub use phase::{Burn, Comparison, Condition, Hold, Light, Phase, PitchLaw, Shed, Steer};
pub use vehicle::{
    Axis, Beyond, Curve, Drag, Engine, Part, Propulsion, Reserve, Role, Smoothness, Thrust, Vehicle,
};
pub use world::{Air, Gravity, Surface, World};
