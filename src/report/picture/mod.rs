//! Pictures of a flight, as SVG that reads well on light and on dark pages.

mod axis;
mod flight;
mod ground;
mod labels;
mod ledger;
mod svg;

use crate::flight::Flight;
use crate::model::Mission;
use crate::quantity::System;

/// One picture under the name of its file.
#[derive(Clone, Debug, PartialEq, Eq)]
pub struct Picture {
    pub name: &'static str,
    pub svg: String,
}

/// The pictures of a flown mission; none where nothing was flown.
pub fn pictures(mission: &Mission, flight: &Flight, system: System) -> Vec<Picture> {
    if flight.samples.len() < 2 {
        return Vec::new();
    }
    let show = super::show::Show { system };
    vec![
        Picture { name: "flight.svg", svg: flight::draw(mission, flight, &show) },
        Picture { name: "ledger.svg", svg: ledger::draw(mission, flight, &show) },
        Picture { name: "ground.svg", svg: ground::draw(mission, flight, &show) },
    ]
}
