//! From the mission and its flight to the report model.

mod assumptions;
mod end;
mod mass;
mod verdict;

use super::content::{Event, FORMAT, Ledger, LedgerLine, Peak, Report, State};
use super::notices::findings;
use crate::flight::{EventKind, Flight, Frame, LedgerRow, Snapshot};
use crate::model::{Fact, Mission, Quantity};
use crate::quantity::System;

/// Printed in every report.
const CAUTION: &str = "This is a performance estimate, not a flight-safety analysis. It is no ground for flying \
    anything: follow the licensing authority, range safety and qualified review.";

/// The report of a flown mission. `tolerance` is that of the integration, `warnings` what the checker
/// had to say.
pub fn assemble(
    mission: &Mission,
    facts: &[Fact],
    flight: &Flight,
    tolerance: f64,
    system: System,
    warnings: &[String],
) -> Report {
    let found = findings(mission, flight);
    let sentences = found.iter().map(super::notices::Finding::sentence);
    Report {
        format: FORMAT.to_owned(),
        mission: mission.name.clone(),
        vehicle: mission.vehicle.name.clone(),
        world: mission.world.name.clone(),
        epoch: mission.epoch.as_ref().map(|epoch| epoch.written.clone()),
        verdict: verdict::verdict(mission, facts, flight, system, &found),
        figures: verdict::figures(mission, facts, flight),
        mass: mass::statement(mission, flight),
        stages: mass::stages(mission, flight),
        ledger: ledger(mission, flight),
        timeline: flight
            .events
            .iter()
            .map(|event| Event {
                what: what(mission, flight, &event.kind),
                state: state(mission, &event.state),
            })
            .collect(),
        peaks: peaks(mission, flight),
        end: end::end(mission, flight),
        propellant: mass::propellant(mission, flight),
        assumptions: assumptions::assumptions(mission, facts, flight, tolerance),
        warnings: warnings.iter().cloned().chain(sentences).collect(),
        caution: CAUTION.to_owned(),
    }
}

fn phase_name(mission: &Mission, index: usize) -> String {
    mission.phases.get(index).map_or_else(String::new, |phase| phase.name.clone())
}

fn part_name(mission: &Mission, index: usize) -> &str {
    mission.vehicle.parts.get(index).map_or("", |part| &part.name)
}

/// The state at an instant; a quantity that does not exist there is zero or left out.
fn state(mission: &Mission, state: &Snapshot) -> State {
    let number = |quantity| state.get(quantity).unwrap_or(0.0);
    let air = mission.world.air != crate::model::Air::None;
    State {
        time_s: state.time,
        phase: phase_name(mission, state.phase),
        mass_kg: number(Quantity::Mass),
        altitude_m: number(Quantity::Altitude),
        downrange_m: number(Quantity::Downrange),
        ground_speed_m_s: number(Quantity::GroundSpeed),
        inertial_speed_m_s: number(Quantity::InertialSpeed),
        flight_path_angle_rad: number(Quantity::FlightPathAngle),
        heading_rad: number(Quantity::Heading),
        latitude_rad: state.get(Quantity::Latitude),
        longitude_rad: state.get(Quantity::Longitude),
        mach: state.get(Quantity::Mach).filter(|_| air),
        dynamic_pressure_pa: state.get(Quantity::DynamicPressure).filter(|_| air),
        acceleration_m_s2: number(Quantity::Acceleration),
    }
}

fn what(mission: &Mission, flight: &Flight, kind: &EventKind) -> String {
    let part = |index: &usize| part_name(mission, *index).to_owned();
    match kind {
        EventKind::LiftOff => "lift-off".to_owned(),
        EventKind::PhaseStart(phase) => format!("{} begins", phase_name(mission, *phase)),
        EventKind::Ignition(index) => format!("{} lit", part(index)),
        EventKind::CutOff(index) => format!("{} cut off", part(index)),
        EventKind::Spent(index) => format!("{} spent", part(index)),
        EventKind::Shed(index) => format!("{} shed", part(index)),
        EventKind::HoldEnters(phase) => format!("hold begins to act in {}", phase_name(mission, *phase)),
        EventKind::HoldLeaves(phase) => format!("hold acts no more in {}", phase_name(mission, *phase)),
        EventKind::Peak(index) => {
            let name = flight.peaks.get(*index).map_or("", |peak| peak.quantity.name());
            format!("greatest {}", name.replace('_', " "))
        }
        EventKind::MachOne => "Mach 1".to_owned(),
        EventKind::Apex => "apex".to_owned(),
        EventKind::Touchdown => "touch-down".to_owned(),
        EventKind::End => "end".to_owned(),
    }
}

fn ledger(mission: &Mission, flight: &Flight) -> Ledger {
    let line = |phase: String, row: &LedgerRow| LedgerLine {
        phase,
        paid_m_s: row.paid,
        back_pressure_m_s: row.back_pressure,
        steering_m_s: row.steering,
        drag_m_s: row.drag,
        gravity_m_s: row.gravity,
        gained_m_s: row.gained,
        closure_m_s: row.closure(),
        rocket_equation_m_s: row.ideal,
    };
    let rows = flight.phases.iter().zip(&flight.ledger.rows);
    Ledger {
        frame: match flight.frame {
            Frame::BodyFixed => "body-fixed",
            Frame::Inertial => "inertial",
        }
        .to_owned(),
        rows: rows.map(|(flown, row)| line(phase_name(mission, flown.phase), row)).collect(),
        total: line("whole flight".to_owned(), &flight.ledger.total),
        ground_speed_at_start_m_s: flight.ledger.ground_speed_at_start,
    }
}

fn peaks(mission: &Mission, flight: &Flight) -> Vec<Peak> {
    let peak = |peak: &crate::flight::Peak| Peak {
        quantity: peak.quantity.name().to_owned(),
        unit: peak.quantity.customary_unit().to_owned(),
        value: peak.value,
        time_s: peak.state.time,
        phase: phase_name(mission, peak.state.phase),
        altitude_m: peak.state.get(Quantity::Altitude).unwrap_or(0.0),
        corner: peak.corner,
    };
    flight.peaks.iter().map(peak).collect()
}
