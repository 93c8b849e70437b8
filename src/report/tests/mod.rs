//! Reports of a flown mission, with its own text and with hostile text.

mod page;
mod picture;
mod sums;

use super::{Report, assemble};
use crate::check::{ReadError, Reader, compile};
use crate::flight::{Completion, Flight, Settings, fly};
use crate::model::{Fact, Mission, Model};
use crate::quantity::System;

/// Markup of every kind that a name or a reason might carry, with bidirectional marks and controls.
const HOSTILE: &str =
    "1. <script>&x;</script> | `a\\|b` [l](u) ![i](u) **b** _e_ ~~s~~ \u{202e}\u{7}\n# head\n- item";

struct One(&'static str);

impl Reader for One {
    fn read(&self, path: &str) -> Result<Vec<u8>, ReadError> {
        if path == "missions/lantern.wright" { Ok(self.0.into()) } else { Err(ReadError::Missing) }
    }
}

fn model() -> Model {
    let compiled = compile("missions/lantern.wright", &One(include_str!("../../../missions/lantern.wright")));
    compiled.model.unwrap()
}

/// The same, with hostile text wherever a source may put text.
fn hostile() -> Model {
    let mut model = model();
    for fact in &mut model.facts {
        fact.path = HOSTILE.to_owned();
        fact.written = HOSTILE.to_owned();
        fact.because = Some(HOSTILE.to_owned());
        fact.place.file = HOSTILE.to_owned();
    }
    for mission in &mut model.missions {
        mission.name = HOSTILE.to_owned();
        mission.vehicle.name = HOSTILE.to_owned();
        mission.world.name = HOSTILE.to_owned();
        mission.phases.iter_mut().for_each(|phase| phase.name = HOSTILE.to_owned());
        mission.vehicle.parts.iter_mut().for_each(|part| part.name = HOSTILE.to_owned());
        for demand in &mut mission.demands {
            demand.name = HOSTILE.to_owned();
            demand.written = HOSTILE.to_owned();
        }
        mission.aims.iter_mut().for_each(|aim| aim.written = HOSTILE.to_owned());
        for figure in &mut mission.figures {
            figure.name = HOSTILE.to_owned();
            figure.written = HOSTILE.to_owned();
        }
    }
    model
}

fn flown(mission: &Mission) -> Flight {
    let flight = fly(mission, &Settings::default());
    assert_eq!(flight.completion, Completion::Completed);
    flight
}

/// A flight that fails: the payload is far more than the engines lift.
fn too_heavy(model: &Model) -> (Mission, Flight) {
    let mut mission = model.missions[0].clone();
    mission.payload.si = 1e6;
    let flight = fly(&mission, &Settings::default());
    assert!(matches!(flight.completion, Completion::Failed(_)));
    (mission, flight)
}

fn report(mission: &Mission, facts: &[Fact], flight: &Flight) -> Report {
    assemble(mission, facts, flight, 1e-9, System::Written, &[HOSTILE.to_owned()])
}
