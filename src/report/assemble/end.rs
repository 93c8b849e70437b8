//! The state and the orbit at the end.

use super::state;
use crate::flight::{Flight, Snapshot};
use crate::model::{Gravity, Mission, Quantity};
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
    let epoch = mission.epoch.as_ref().filter(|_| is_earth(mission));
    let date = epoch.map(|epoch| epoch.julian_date + last.time / 86_400.0);
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

/// The mean sun that local time counts by is the Earth's alone: on any other body there is none.
fn is_earth(mission: &Mission) -> bool {
    let near = |value: f64, earth: f64| (value / earth - 1.0).abs() < 0.01;
    let Gravity::Central { mu, .. } = &mission.world.gravity else { return false };
    // WGS 84 (NGA.STND.0036), table 3.1.
    near(mu.si, 3.986004418e14) && near(mission.world.spin.si, 7.292115e-5)
}
