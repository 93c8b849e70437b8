//! Masses, stages and propellant.

use super::part_name;
use crate::flight::Flight;
use crate::model::{Mission, Quantity, Thrust};
use crate::report::content::{MassLine, MassStatement, Propellant, Stage};

/// Standard gravity, m/s², and the pressure that the trade calls sea level, Pa.
const G0: f64 = 9.80665;
const SEA_LEVEL: f64 = 101_325.0;

pub fn statement(mission: &Mission, flight: &Flight) -> MassStatement {
    let parts: Vec<MassLine> = mission
        .vehicle
        .parts
        .iter()
        .zip(&flight.parts)
        .map(|(part, account)| MassLine {
            name: part.name.clone(),
            count: part.count.si,
            basic_kg: account.dry_basic,
            growth_percent: 100.0 * part.growth.si,
            growth_kg: account.dry_growth,
            predicted_kg: account.dry_basic + account.dry_growth,
            propellant_kg: account.loaded,
        })
        .collect();
    let payload_kg = mission.payload.si;
    let adapter_kg = mission.adapter.map_or(0.0, |adapter| adapter.si);
    let total_kg = parts.iter().map(|part| part.predicted_kg + part.propellant_kg).sum::<f64>()
        + payload_kg
        + adapter_kg;
    MassStatement { parts, payload_kg, adapter_kg, total_kg }
}

pub fn stages(mission: &Mission, flight: &Flight) -> Vec<Stage> {
    let stage = |burn: &crate::flight::Burned| {
        let part = mission.vehicle.parts.get(burn.part)?;
        let propulsion = part.propulsion.as_ref()?;
        let engine = &propulsion.engine;
        let engines = part.count.si * propulsion.engines.si;
        let one = match &engine.thrust {
            Thrust::Steady { vacuum } => vacuum.si,
            Thrust::Curve { curve } => curve.values.iter().copied().fold(0.0, f64::max),
        };
        let flow = one / (engine.isp.si * G0);
        let sea_level = one - SEA_LEVEL * engine.exit_area.si;
        let mass = |state: &crate::flight::Snapshot| state.get(Quantity::Mass).unwrap_or(0.0);
        let (first, last) = (mass(&burn.start), mass(&burn.end));
        Some(Stage {
            name: part_name(mission, burn.part).to_owned(),
            engines,
            ignition_s: burn.start.time,
            burn_time_s: burn.end.time - burn.start.time,
            mass_at_ignition_kg: first,
            mass_at_burnout_kg: last,
            mass_ratio: first / last,
            ideal_delta_v_m_s: burn.paid,
            thrust_to_weight_at_ignition: burn.start.get(Quantity::ThrustToWeight),
            thrust_to_weight_at_burnout: burn.end.get(Quantity::ThrustToWeight),
            thrust_vacuum_n: engines * one,
            thrust_sea_level_n: engines * sea_level,
            isp_vacuum_s: engine.isp.si,
            isp_sea_level_s: sea_level / (flow * G0),
        })
    };
    flight.burns.iter().filter_map(stage).collect()
}

pub fn propellant(mission: &Mission, flight: &Flight) -> Vec<Propellant> {
    let parts = mission.vehicle.parts.iter().zip(&flight.parts);
    parts
        .filter(|(part, _)| part.propulsion.is_some())
        .map(|(part, account)| Propellant {
            name: part.name.clone(),
            loaded_kg: account.loaded,
            burnt_kg: account.burnt,
            left_kg: account.left,
            reserve_kg: account.reserve,
            unusable_kg: account.unusable,
            shed_s: account.shed_at,
        })
        .collect()
}
