//! What only the flight could find, in words and with the place in the source that it is about.

use crate::flight::{Cause, Completion, Flight, Notice};
use crate::model::{Condition, Formula, Mission, Place, Quantity};
use crate::quantity::{UnitTable, format_number, format_si};

/// A finding of the flight; numbers are texts with their units.
#[derive(Clone, Debug, PartialEq)]
pub struct Finding {
    /// The diagnostic code that tells of it.
    pub code: &'static str,
    pub place: Place,
    /// What goes into the message, in the order in which the code takes it.
    pub words: Vec<String>,
}

impl Finding {
    /// One sentence for the report.
    pub fn sentence(&self) -> String {
        let word = |index: usize| self.words.get(index).map_or("", String::as_str);
        match self.code {
            "true-at-start" => format!(
                "`{}` was already true as `{}` began, at {}: the phase ended at once.",
                word(1),
                word(0),
                word(2)
            ),
            "never-shed" => format!(
                "`{}` was not shed in `{}`: the condition never came true, and its mass was carried on.",
                word(0),
                word(1)
            ),
            "hold-exceeded" => {
                format!("A hold was exceeded: {} at {}, against {}.", word(0), word(2), word(1))
            }
            "above-air" => format!(
                "Above {} the model of `{}` knows no air: from {} on the flight had none.",
                word(1),
                word(0),
                word(2)
            ),
            "no-lift-off" => {
                format!("The thrust of {} does not exceed the weight of {}: no lift-off.", word(0), word(1))
            }
            "ground-impact" => {
                format!("In `{}` the flight hit the ground at {}, at {}.", word(0), word(1), word(2))
            }
            "never-ends" => format!("`{}` did not end within {}.", word(0), word(1)),
            "ran-dry" => format!("`{}` ran dry at {}, before `{}` ended.", word(0), word(2), word(1)),
            "curve-range" => {
                format!("The drag curve, which covers {}, was read at {} at {}.", word(1), word(0), word(2))
            }
            _ => format!("In `{}` the flight broke down at {}: {}.", word(0), word(1), word(2)),
        }
    }
}

/// All findings of a flight, in order of what happened; a failure last.
pub fn findings(mission: &Mission, flight: &Flight) -> Vec<Finding> {
    let mut found: Vec<Finding> =
        flight.notices.iter().filter_map(|notice| of_notice(mission, flight, notice)).collect();
    if let Completion::Failed(failure) = &flight.completion {
        found.extend(of_failure(mission, failure.phase, failure.time, &failure.cause));
    }
    found
}

fn of_notice(mission: &Mission, flight: &Flight, notice: &Notice) -> Option<Finding> {
    Some(match notice {
        Notice::TrueAtStart { phase, condition } => {
            let from = mission.phases.get(*phase)?;
            let start =
                flight.phases.iter().find(|flown| flown.phase == *phase).map(|flown| flown.start.time);
            Finding {
                code: "true-at-start",
                place: from.place.clone(),
                words: vec![
                    from.name.clone(),
                    condition_words(mission, from.until.get(*condition)?),
                    seconds(start?),
                ],
            }
        }
        Notice::NeverShed { phase, shed } => {
            let from = mission.phases.get(*phase)?;
            let shed = from.sheds.get(*shed)?;
            let part = mission.vehicle.parts.get(shed.part as usize)?;
            Finding {
                code: "never-shed",
                place: shed.place.clone(),
                words: vec![part.name.clone(), from.name.clone()],
            }
        }
        Notice::HoldExceeded { phase, worst, limit, time } => {
            let hold = mission.phases.get(*phase)?.hold.as_ref()?;
            let quantity = match &hold.quantity {
                Formula::Reading { reading } => reading.quantity,
                _ => Quantity::Acceleration,
            };
            let show = |si: f64| in_unit(si, quantity.customary_unit());
            let words = vec![show(limit + worst), show(*limit), seconds(*time)];
            Finding { code: "hold-exceeded", place: hold.place.clone(), words }
        }
        Notice::AboveAir { top, time } => Finding {
            code: "above-air",
            place: mission.place.clone(),
            words: vec![mission.world.name.clone(), in_unit(*top, "km"), seconds(*time)],
        },
    })
}

fn of_failure(mission: &Mission, phase: usize, time: f64, cause: &Cause) -> Option<Finding> {
    let from = mission.phases.get(phase)?;
    let name = from.name.clone();
    let (code, words) = match cause {
        Cause::NoLiftOff { thrust, weight } => {
            ("no-lift-off", vec![in_unit(*thrust, "kN"), in_unit(*weight, "kN")])
        }
        Cause::GroundImpact { speed } => ("ground-impact", vec![name, seconds(time), in_unit(*speed, "m/s")]),
        Cause::NeverEnds { after } => ("never-ends", vec![name, in_unit(*after, "day")]),
        Cause::RanDry { part } => {
            ("ran-dry", vec![mission.vehicle.parts.get(*part)?.name.clone(), name, seconds(time)])
        }
        Cause::CurveRange { input, value, low, high } => {
            let unit = input.customary_unit();
            let name =
                if *input == Quantity::Mach { "Mach".to_owned() } else { input.name().replace('_', " ") };
            let scale = UnitTable::builtin().parse(unit).map_or(1.0, |unit| unit.factor);
            let end = if unit.is_empty() { String::new() } else { format!(" {unit}") };
            let read = format!("{name} {}{end}", format_number(value / scale, 4));
            let range = format!(
                "{name} {} to {}{end}",
                format_number(low / scale, 4),
                format_number(high / scale, 4)
            );
            ("curve-range", vec![read, range, seconds(time)])
        }
        Cause::Numerical { detail } => ("numerical-failure", vec![name, seconds(time), detail.clone()]),
    };
    Some(Finding { code, place: from.place.clone(), words })
}

fn condition_words(mission: &Mission, condition: &Condition) -> String {
    match condition {
        Condition::After { .. } => "a duration".to_owned(),
        Condition::Compare { written, .. } => written.clone(),
        Condition::Spent { part } => mission
            .vehicle
            .parts
            .get(*part as usize)
            .map_or_else(String::new, |part| format!("{} spent", part.name)),
        Condition::Apex => "apex".to_owned(),
        Condition::Touchdown => "touchdown".to_owned(),
    }
}

fn seconds(time: f64) -> String {
    format!("{} s", crate::quantity::format_fixed(time, 1))
}

fn in_unit(si: f64, unit: &str) -> String {
    let number = match UnitTable::builtin().parse(unit) {
        Ok(unit) => format_si(si, &unit, 5),
        Err(_) => format_number(si, 5),
    };
    if unit.is_empty() { number } else { format!("{number} {unit}") }
}
