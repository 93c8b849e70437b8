//! The states of a flight as comma-separated values, with units in the header.

use std::fmt::Write;

use crate::flight::Flight;
use crate::model::{Mission, Quantity};
use crate::quantity::UnitTable;

/// One line for each state, the header first; a quantity that does not exist at a state is empty.
pub fn csv(mission: &Mission, flight: &Flight) -> String {
    let units = UnitTable::builtin();
    let columns: Vec<(Quantity, f64)> = Quantity::ALL
        .iter()
        .filter(|quantity| **quantity != Quantity::Left)
        .map(|quantity| (*quantity, units.parse(quantity.customary_unit()).map_or(1.0, |unit| unit.factor)))
        .collect();

    let mut text = String::from("phase");
    for (quantity, _) in &columns {
        match quantity.customary_unit() {
            "" => _ = write!(text, ",{}", quantity.name()),
            unit => _ = write!(text, ",{} [{unit}]", quantity.name()),
        }
    }
    for part in mission.vehicle.parts.iter().filter(|part| part.propulsion.is_some()) {
        _ = write!(text, ",{}.left [kg]", part.name);
    }
    text.push('\n');
    for state in &flight.samples {
        text.push_str(mission.phases.get(state.phase).map_or("", |phase| &phase.name));
        for (quantity, factor) in &columns {
            text.push(',');
            if let Some(value) = state.get(*quantity) {
                _ = write!(text, "{:.9e}", value / factor);
            }
        }
        for (index, part) in mission.vehicle.parts.iter().enumerate() {
            if part.propulsion.is_some() {
                _ = write!(text, ",{:.9e}", state.left.get(index).copied().unwrap_or(0.0));
            }
        }
        text.push('\n');
    }
    text
}
