//! Title, verdict, figures and pictures.

use super::table::{Table, code, plain};
use crate::quantity::{Dimension, format_fixed, format_number};
use crate::report::content::{Report, Status};
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
        let value =
            aim.value.map_or_else(|| "n/a".to_owned(), |si| show.within(si, aim.tolerance, &aim.unit));
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
