//! The state and the orbit at the end.

use super::state;
use crate::flight::{Flight, Snapshot};
use crate::model::{Mission, Quantity};
use crate::report::content::{End, Orbit};
use crate::world::mean_solar_time;

pub fn end(mission: &Mission, flight: &Flight) -> End {
    let unflown = Snapshot::default();
    let last =
        flight.phases.last().map(|flown| &flown.end).or(flight.events.last().map(|event| &event.state));
    let last = last.unwrap_or(&unflown);
    End { state: state(mission, last), orbit: orbit(mission, last) }
}

fn orbit(mission: &Mission, last: &Snapshot) -> Option<Orbit> {
    let node_rad = last.get(Quantity::Node)?;
    // The epoch sets the Earth's angle, so that the node's local time means something there.
    let date = mission.epoch.as_ref().map(|epoch| epoch.julian_date + last.time / 86_400.0);
    Some(Orbit {
        apogee_m: last.get(Quantity::Apogee),
        perigee_m: last.get(Quantity::Perigee)?,
        semi_major_axis_m: last.get(Quantity::SemiMajorAxis)?,
        eccentricity: last.get(Quantity::Eccentricity)?,
        inclination_rad: last.get(Quantity::Inclination)?,
        node_rad,
        argument_of_perigee_rad: last.get(Quantity::ArgumentOfPerigee)?,
        true_anomaly_rad: last.get(Quantity::TrueAnomaly)?,
        period_s: last.get(Quantity::Period),
        mean_local_time_of_node_s: date.map(|date| mean_solar_time(node_rad, date)),
    })
}
