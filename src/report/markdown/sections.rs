//! The sections of the page, in their order.

use super::table::{Table, code, plain};
use crate::model::Quantity;
use crate::quantity::{Dimension, format_fixed, format_number};
use crate::report::content::{Fact, LedgerLine, Report, State, Status};
use crate::report::show::{DIGITS, Show};

pub fn head(report: &Report) -> String {
    let epoch = report.epoch.as_ref().map_or_else(String::new, |epoch| format!(", {}", plain(epoch)));
    format!(
        "# {}\n\n{} in the world of {}{epoch}. *A performance estimate, not a flight-safety analysis.*\n",
        plain(&report.mission),
        plain(&report.vehicle),
        plain(&report.world)
    )
}

pub fn verdict(report: &Report, show: &Show) -> String {
    let verdict = &report.verdict;
    let word = match verdict.status {
        Status::Met => "Met",
        Status::Unmet => "Not met",
        Status::Failed => "Failed",
    };
    let mut text = format!("## Verdict: {}\n\n{}\n", word.to_lowercase(), plain(&verdict.sentence));
    let mut demands = Table::new(
        &["demand", "quantity", "required", "outcome"],
        &["value".into(), "margin".into(), "margin, %".into(), "at, s".into()],
    );
    for demand in &verdict.demands {
        let outcome = match (demand.met, demand.close) {
            (true, true) => "met, close",
            (true, false) => "met",
            (false, _) => "**unmet**",
        };
        let value = |si: Option<f64>| {
            si.map_or_else(|| "n/a".to_owned(), |si| show.with_unit(si, &demand.unit, DIGITS))
        };
        let margin = demand.margin.map_or_else(
            || "n/a".to_owned(),
            |margin| {
                format!("{} {}", show.difference(margin, &demand.unit, 4), demand.unit).trim().to_owned()
            },
        );
        demands.row(vec![
            plain(&demand.name),
            code(&demand.quantity),
            code(&demand.requirement),
            outcome.to_owned(),
            value(demand.value),
            margin,
            demand.margin_percent.map_or_else(String::new, |percent| format_number(percent, 3)),
            demand.time_s.map_or_else(String::new, |time| format_fixed(time, 2)),
        ]);
    }
    let mut aims = Table::new(&["aim", "outcome"], &["value".into(), "target".into(), "tolerance".into()]);
    for aim in &verdict.aims {
        let value = aim.value.map_or_else(|| "n/a".to_owned(), |si| show.with_unit(si, &aim.unit, 8));
        let tolerance = format!("{} {}", show.difference(aim.tolerance, &aim.unit, 3), aim.unit);
        aims.row(vec![
            code(&aim.quantity),
            if aim.hit { "hit" } else { "**missed**" }.to_owned(),
            value,
            show.with_unit(aim.target, &aim.unit, 8),
            tolerance.trim().to_owned(),
        ]);
    }
    for table in [demands, aims] {
        if !table.is_empty() {
            text.push('\n');
            text.push_str(&table.render());
        }
    }
    text
}

pub fn figures(report: &Report, show: &Show) -> String {
    let mut table = Table::new(&["figure", "quantity"], &["value".into()]);
    for figure in &report.figures {
        let name = plain(&figure.name);
        let unit = show_unit(show, &figure.unit);
        table.row(vec![
            if figure.headline { format!("**{name}** (headline)") } else { name },
            if figure.quantity == "as stated" { "as stated".to_owned() } else { code(&figure.quantity) },
            figure.value.map_or_else(|| "n/a".to_owned(), |si| show.with_unit(si, &unit, DIGITS)),
        ]);
    }
    if table.is_empty() { String::new() } else { format!("## Figures\n\n{}", table.render()) }
}

/// The unit of the report's system for one that an author wrote.
fn show_unit(show: &Show, written: &str) -> String {
    let dimension =
        crate::quantity::UnitTable::builtin().parse(written).map_or(Dimension::NONE, |unit| unit.dimension);
    show.unit(dimension, written).to_owned()
}

pub fn pictures(names: &[&str]) -> String {
    let title = |name: &str| match name {
        "flight.svg" => {
            "Altitude, speed, dynamic pressure and acceleration against time, with the phases marked"
        }
        "ledger.svg" => "The delta-v ledger: what the propellant paid, and where it went",
        _ => "Altitude against downrange",
    };
    names.iter().map(|name| format!("![{}]({name})\n", title(name))).collect::<Vec<_>>().join("\n")
}

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

pub fn ledger(report: &Report) -> String {
    let ledger = &report.ledger;
    let heads = [
        "paid by propellant",
        "back pressure",
        "steering",
        "drag",
        "gravity",
        "speed gained",
        "closure",
        "rocket equation",
    ];
    let mut table = Table::new(&["phase"], &heads.map(str::to_owned));
    let row = |line: &LedgerLine, strong: bool| {
        let speed = |si: f64| format_fixed(si, 2);
        let equation = line.rocket_equation_m_s.map_or_else(|| "n/a".to_owned(), speed);
        let name = plain(&line.phase);
        vec![
            if strong { format!("**{name}**") } else { name },
            speed(line.paid_m_s),
            speed(line.back_pressure_m_s),
            speed(line.steering_m_s),
            speed(line.drag_m_s),
            speed(line.gravity_m_s),
            speed(line.gained_m_s),
            small(line.closure_m_s),
            equation,
        ]
    };
    for line in &ledger.rows {
        table.row(row(line, false));
    }
    table.row(row(&ledger.total, true));
    format!(
        "## Delta-v ledger, {} frame\n\nIn m/s. Speed gained is what the propellant paid less the columns between; losses are positive when they cost speed. The closure is what is left unexplained; the last column is the rocket equation's own answer where it has a closed form.\n\n{}\nGift of the ground's rotation at the start, inertial: {} m/s, not in the table.\n",
        ledger.frame,
        table.render(),
        format_fixed(ledger.ground_speed_at_start_m_s, 2)
    )
}

/// The order of size of a remainder: its digits are noise.
fn small(closure: f64) -> String {
    match closure.abs() {
        size if size < 1e-6 => "< 1e-6".to_owned(),
        size => format!("{size:.0e}"),
    }
}

pub fn timeline(report: &Report, show: &Show) -> String {
    let quantities = [
        Quantity::Altitude,
        Quantity::Downrange,
        Quantity::GroundSpeed,
        Quantity::InertialSpeed,
        Quantity::FlightPathAngle,
        Quantity::Mach,
        Quantity::DynamicPressure,
        Quantity::Acceleration,
        Quantity::Mass,
    ];
    let names = [
        "altitude",
        "downrange",
        "ground speed, body-fixed",
        "inertial speed",
        "flight-path angle, inertial",
        "Mach",
        "dynamic pressure",
        "sensed acceleration",
        "mass",
    ];
    let air = report.timeline.iter().any(|event| event.state.mach.is_some());
    let shown = |quantity: &Quantity| air || !matches!(quantity, Quantity::Mach | Quantity::DynamicPressure);
    let mut heads = Vec::new();
    for (quantity, name) in quantities.iter().zip(names).filter(|(quantity, _)| shown(quantity)) {
        let unit = show.unit(quantity.dimension(), quantity.customary_unit());
        heads.push(if unit.is_empty() { name.to_owned() } else { format!("{name}, {unit}") });
    }
    let mut table = Table::new(&["time, s", "event"], &heads);
    for event in &report.timeline {
        let mut cells = vec![format_fixed(event.state.time_s, 2), plain(&event.what)];
        for quantity in quantities.iter().filter(|quantity| shown(quantity)) {
            cells.push(
                of(&event.state, *quantity).map_or_else(String::new, |si| show.in_table(*quantity, si)),
            );
        }
        table.row(cells);
    }
    format!("## Timeline\n\n{}", table.render())
}

fn of(state: &State, quantity: Quantity) -> Option<f64> {
    match quantity {
        Quantity::Altitude => Some(state.altitude_m),
        Quantity::Downrange => Some(state.downrange_m),
        Quantity::GroundSpeed => Some(state.ground_speed_m_s),
        Quantity::InertialSpeed => Some(state.inertial_speed_m_s),
        Quantity::FlightPathAngle => Some(state.flight_path_angle_rad),
        Quantity::Mach => state.mach,
        Quantity::DynamicPressure => state.dynamic_pressure_pa,
        Quantity::Acceleration => Some(state.acceleration_m_s2),
        Quantity::Mass => Some(state.mass_kg),
        _ => None,
    }
}

pub fn peaks(report: &Report, show: &Show) -> String {
    let length = show.unit(Dimension::LENGTH, "km");
    let mut table = Table::new(
        &["quantity", "phase", "kind"],
        &["greatest".into(), "at, s".into(), format!("altitude, {length}")],
    );
    for peak in &report.peaks {
        let quantity = Quantity::ALL.iter().find(|quantity| quantity.name() == peak.quantity);
        let dimension = quantity.map_or(Dimension::NONE, |quantity| quantity.dimension());
        table.row(vec![
            peak.quantity.replace('_', " "),
            plain(&peak.phase),
            if peak.corner { "corner" } else { "smooth" }.to_owned(),
            show.with_unit(peak.value, show.unit(dimension, &peak.unit), DIGITS),
            format_fixed(peak.time_s, 2),
            show.number(peak.altitude_m, length, 5),
        ]);
    }
    if table.is_empty() {
        return String::new();
    }
    format!(
        "## Peaks\n\nA corner stands where something switches and the slope jumps. Ground speed is body-fixed.\n\n{}",
        table.render()
    )
}

pub fn end(report: &Report, show: &Show) -> String {
    let state = &report.end.state;
    let (length, speed) = (show.unit(Dimension::LENGTH, "km"), show.unit(Dimension::SPEED, "m/s"));
    let degrees = |radians: f64, decimals: usize| {
        format!("{} deg", format_fixed(radians * (180.0 / std::f64::consts::PI), decimals))
    };
    let km = |si: f64| show.with_unit(si, length, 7);
    let mut table = Table::new(&["at the end"], &["value".into()]);
    let mut row = |name: &str, value: String| table.row(vec![name.to_owned(), value]);
    row("time", format!("{} s", format_fixed(state.time_s, 2)));
    row("mass", show.with_unit(state.mass_kg, show.unit(Dimension::MASS, "kg"), 7));
    row("altitude", km(state.altitude_m));
    row("speed, inertial", show.with_unit(state.inertial_speed_m_s, speed, 7));
    row("speed over ground, body-fixed", show.with_unit(state.ground_speed_m_s, speed, 7));
    row(
        "gift of the ground's rotation at the start, inertial",
        show.with_unit(report.ledger.ground_speed_at_start_m_s, speed, 5),
    );
    row("flight-path angle, inertial", degrees(state.flight_path_angle_rad, 4));
    row("heading, body-fixed", degrees(state.heading_rad, 3));
    if let (Some(latitude), Some(longitude)) = (state.latitude_rad, state.longitude_rad) {
        row("latitude, geodetic", degrees(latitude, 4));
        row("longitude", degrees(longitude, 4));
    }
    let Some(orbit) = &report.end.orbit else { return format!("## Final state\n\n{}", table.render()) };
    row("apogee altitude", orbit.apogee_m.map_or_else(|| "none: it escapes".to_owned(), km));
    row("perigee altitude", km(orbit.perigee_m));
    row("semi-major axis", show.with_unit(orbit.semi_major_axis_m, length, 8));
    row("eccentricity", format_number(orbit.eccentricity, 6));
    row("inclination", degrees(orbit.inclination_rad, 4));
    row("right ascension of the ascending node", degrees(orbit.node_rad, 4));
    row("argument of perigee", degrees(orbit.argument_of_perigee_rad, 3));
    row("true anomaly", degrees(orbit.true_anomaly_rad, 3));
    if let Some(period) = orbit.period_s {
        row("period", format!("{} minute", format_fixed(period / 60.0, 3)));
    }
    if let Some(time) = orbit.mean_local_time_of_node_s {
        row("mean local time of the ascending node", clock(time));
    }
    format!(
        "## Final orbit\n\nElements are osculating, from the inertial state; apogee and perigee altitudes are radii less the equatorial radius.\n\n{}",
        table.render()
    )
}

/// Seconds after midnight as a clock shows them.
fn clock(time: f64) -> String {
    let whole = time.round().clamp(0.0, 86_399.0) as u32;
    format!("{:02}:{:02}:{:02}", whole / 3600, whole / 60 % 60, whole % 60)
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

pub fn assumptions(report: &Report) -> String {
    let listed = &report.assumptions;
    let mut text = String::from("## Assumptions\n");
    let mut list = |title: String, facts: &[Fact], reasons: bool| {
        if facts.is_empty() {
            return;
        }
        let mut table =
            Table::new(if reasons { &["fact", "value", "because"] } else { &["fact", "value"] }, &[]);
        for fact in facts {
            let mut cells = vec![code(&fact.path), code(&fact.written)];
            if reasons {
                cells.push(fact.because.as_deref().map_or_else(String::new, plain));
            }
            table.row(cells);
        }
        text.push_str(&format!("\n### {title}\n\n{}", table.render()));
    };
    list(format!("Facts with a reason ({})", listed.reasoned.len()), &listed.reasoned, true);
    list(format!("Facts without a reason ({})", listed.unreasoned.len()), &listed.unreasoned, false);
    list(format!("Defaults, which nobody wrote ({})", listed.defaults.len()), &listed.defaults, false);
    text.push_str("\n### Conventions in force\n\n");
    for convention in &listed.conventions {
        text.push_str(&format!("- {}\n", plain(convention)));
    }
    text
}

pub fn warnings(report: &Report) -> String {
    if report.warnings.is_empty() {
        return "## Warnings\n\nNone.\n".to_owned();
    }
    let lines: Vec<String> =
        report.warnings.iter().map(|warning| format!("- {}\n", plain(warning))).collect();
    format!("## Warnings\n\n{}", lines.concat())
}

pub fn caution(report: &Report) -> String {
    format!("## Caution\n\n{}\n", report.caution)
}
