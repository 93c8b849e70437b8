//! The tables add up.

use super::{flown, model, report};

/// Sums of numbers of size 1e4 in kg and m/s; the rounding of a double there is 2e-12.
const ROUNDING: f64 = 1e-9;

#[test]
fn masses_add_up_to_what_lifts_off() {
    let model = model();
    let mission = &model.missions[0];
    let report = report(mission, &model.facts, &flown(mission));
    let mass = &report.mass;
    for part in &mass.parts {
        assert!((part.basic_kg * part.growth_percent / 100.0 - part.growth_kg).abs() < ROUNDING);
        assert!((part.basic_kg + part.growth_kg - part.predicted_kg).abs() < ROUNDING);
    }
    let first = &report.timeline[0].state;
    assert!((mass.total_kg - first.mass_kg).abs() < ROUNDING, "{} {}", mass.total_kg, first.mass_kg);
}

#[test]
fn the_propellant_is_burnt_left_or_unusable() {
    let model = model();
    let mission = &model.missions[0];
    let report = report(mission, &model.facts, &flown(mission));
    assert!(!report.propellant.is_empty());
    for part in &report.propellant {
        let sum = part.burnt_kg + part.left_kg + part.unusable_kg;
        assert!((part.loaded_kg - sum).abs() < ROUNDING, "{}: {} {sum}", part.name, part.loaded_kg);
    }
    // What was lifted is what arrived, was burnt, or was let go of.
    let burnt: f64 = report.propellant.iter().map(|part| part.burnt_kg).sum();
    let gone: f64 = report
        .mass
        .parts
        .iter()
        .filter(|part| ["Bracken", "Calyx"].contains(&part.name.as_str()))
        .map(|part| part.predicted_kg)
        .sum();
    let bracken = &report.propellant[0];
    let arrived = report.mass.total_kg - burnt - gone - bracken.left_kg - bracken.unusable_kg;
    assert!((arrived - report.end.state.mass_kg).abs() < ROUNDING);
}

#[test]
fn the_ledger_adds_up_by_phase_and_to_the_rocket_equation() {
    let model = model();
    let mission = &model.missions[0];
    let report = report(mission, &model.facts, &flown(mission));
    let total = &report.ledger.total;
    let sum =
        |of: fn(&crate::report::content::LedgerLine) -> f64| report.ledger.rows.iter().map(of).sum::<f64>();
    assert!((sum(|row| row.paid_m_s) - total.paid_m_s).abs() < ROUNDING);
    assert!((sum(|row| row.gravity_m_s) - total.gravity_m_s).abs() < ROUNDING);
    assert!((sum(|row| row.gained_m_s) - total.gained_m_s).abs() < ROUNDING);
    // From rest on the ground, in the frame of the ground.
    assert!((total.gained_m_s - report.end.state.ground_speed_m_s).abs() < ROUNDING);
    for row in report.ledger.rows.iter().chain([total]) {
        let losses = row.back_pressure_m_s + row.steering_m_s + row.drag_m_s + row.gravity_m_s;
        let closure = row.paid_m_s - losses - row.gained_m_s;
        assert!((closure - row.closure_m_s).abs() < ROUNDING);
        // Integrated at a relative tolerance of 1e-9.
        assert!(row.closure_m_s.abs() < 1e-6, "{}: {}", row.phase, row.closure_m_s);
        let equation = row.rocket_equation_m_s.unwrap();
        assert!((equation - row.paid_m_s).abs() < 1e-6, "{}: {equation}", row.phase);
    }
}
