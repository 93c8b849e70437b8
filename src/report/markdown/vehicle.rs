//! Masses, stages and propellant.

use super::table::{Table, plain};
use crate::quantity::{Dimension, format_fixed, format_number};
use crate::report::content::Report;
use crate::report::show::{DIGITS, Show};

pub fn mass(report: &Report, show: &Show) -> String {
    let unit = show.unit(Dimension::MASS, "kg");
    let kg = |si: f64| show.number(si, unit, 7);
    let heads = [
        "count".into(),
        format!("basic, {unit}"),
        "growth, % of basic".into(),
        format!("growth, {unit}"),
        format!("predicted, {unit}"),
        format!("propellant, {unit}"),
    ];
    let mut table = Table::new(&["part"], &heads);
    let statement = &report.mass;
    for part in &statement.parts {
        table.row(vec![
            plain(&part.name),
            format_number(part.count, 6),
            kg(part.basic_kg),
            format_number(part.growth_percent, 4),
            kg(part.growth_kg),
            kg(part.predicted_kg),
            kg(part.propellant_kg),
        ]);
    }
    let mut lone = |name: &str, mass: f64| {
        let none = String::new;
        table.row(vec![name.to_owned(), none(), kg(mass), none(), none(), kg(mass), none()]);
    };
    lone("payload", statement.payload_kg);
    if statement.adapter_kg != 0.0 {
        lone("adapter", statement.adapter_kg);
    }
    let total =
        |of: fn(&crate::report::content::MassLine) -> f64| statement.parts.iter().map(of).sum::<f64>();
    let carried = statement.payload_kg + statement.adapter_kg;
    table.row(vec![
        "**all**".to_owned(),
        String::new(),
        kg(total(|part| part.basic_kg) + carried),
        String::new(),
        kg(total(|part| part.growth_kg)),
        kg(total(|part| part.predicted_kg) + carried),
        kg(total(|part| part.propellant_kg)),
    ]);
    format!(
        "## Mass statement\n\nBasic mass is without growth; predicted is what flies. Strap-ons of a group together.\n\n{}\nMass as the flight starts: **{} {unit}**.\n",
        table.render(),
        kg(statement.total_kg)
    )
}

pub fn stages(report: &Report, show: &Show) -> String {
    let (mass, force) = (show.unit(Dimension::MASS, "kg"), show.unit(Dimension::FORCE, "kN"));
    let speed = show.unit(Dimension::SPEED, "m/s");
    let heads = [
        "engines".into(),
        "lit at, s".into(),
        "burn time, s".into(),
        format!("mass at ignition, {mass}"),
        format!("at burnout, {mass}"),
        "mass ratio".into(),
        format!("ideal delta-v, {speed}"),
        "thrust-to-weight at ignition".into(),
        "at burnout".into(),
        format!("thrust in vacuum, {force}"),
        format!("at sea level, {force}"),
        "isp in vacuum, s".into(),
        "at sea level, s".into(),
    ];
    let mut table = Table::new(&["burn"], &heads);
    for stage in &report.stages {
        let ratio =
            |value: Option<f64>| value.map_or_else(|| "n/a".to_owned(), |value| format_fixed(value, 3));
        table.row(vec![
            plain(&stage.name),
            format_number(stage.engines, 6),
            format_fixed(stage.ignition_s, 2),
            format_fixed(stage.burn_time_s, 2),
            show.number(stage.mass_at_ignition_kg, mass, DIGITS),
            show.number(stage.mass_at_burnout_kg, mass, DIGITS),
            format_fixed(stage.mass_ratio, 4),
            show.number(stage.ideal_delta_v_m_s, speed, DIGITS),
            ratio(stage.thrust_to_weight_at_ignition),
            ratio(stage.thrust_to_weight_at_burnout),
            show.number(stage.thrust_vacuum_n, force, 5),
            show.number(stage.thrust_sea_level_n, force, 5),
            format_number(stage.isp_vacuum_s, 5),
            format_number(stage.isp_sea_level_s, 5),
        ]);
    }
    if table.is_empty() {
        return String::new();
    }
    format!(
        "## Stages\n\nA row for each unbroken burn. Masses are of the whole vehicle; thrust is of all engines of the part at full throttle; thrust-to-weight is at the pressure in force, over mass times 9.80665 m/s².\n\n{}",
        table.render()
    )
}

pub fn propellant(report: &Report, show: &Show) -> String {
    let unit = show.unit(Dimension::MASS, "kg");
    let heads = ["loaded", "burnt", "left, reserve included", "of which reserve", "unusable"];
    let mut heads: Vec<String> = heads.iter().map(|head| format!("{head}, {unit}")).collect();
    heads.push("shed at, s".to_owned());
    let mut table = Table::new(&["part"], &heads);
    for part in &report.propellant {
        let kg = |si: f64| show.number(si, unit, 7);
        table.row(vec![
            plain(&part.name),
            kg(part.loaded_kg),
            kg(part.burnt_kg),
            kg(part.left_kg.max(0.0)),
            kg(part.reserve_kg),
            kg(part.unusable_kg),
            part.shed_s.map_or_else(String::new, |time| format_fixed(time, 2)),
        ]);
    }
    if table.is_empty() {
        String::new()
    } else {
        format!("## Propellant budget\n\nLoaded = burnt + left + unusable.\n\n{}", table.render())
    }
}
