//! The verdict, the ledger and the timeline for a terminal.

use super::content::{LedgerLine, Report};
use super::inert::is_harmful;
use crate::quantity::{format_fixed, format_number};

/// Plain text in columns; text of the source has no control characters left in it.
pub fn summary(report: &Report) -> String {
    let mut text = format!("{}: {}\n", inert(&report.mission), inert(&report.verdict.sentence));
    let mut demands = vec![row(&["demand", "required", "margin %", "outcome"])];
    for demand in &report.verdict.demands {
        let percent =
            demand.margin_percent.map_or_else(|| "n/a".to_owned(), |percent| format_number(percent, 3));
        let outcome = if demand.met { "met" } else { "UNMET" };
        demands.push(row(&[&demand.name, &demand.requirement, &percent, outcome]));
    }
    if demands.len() > 1 {
        text.push_str(&columns(&demands, 2));
    }
    text.push_str(&format!("\nDelta-v ledger, {} frame, m/s\n", report.ledger.frame));
    let mut ledger =
        vec![row(&["phase", "paid", "back pressure", "steering", "drag", "gravity", "gained", "closure"])];
    ledger.extend(report.ledger.rows.iter().chain([&report.ledger.total]).map(line));
    text.push_str(&columns(&ledger, 1));
    text.push_str("\nTimeline\n");
    let mut timeline =
        vec![row(&["time s", "event", "altitude km", "ground speed m/s", "inertial m/s", "mass kg"])];
    for event in &report.timeline {
        timeline.push(vec![
            format_fixed(event.state.time_s, 2),
            inert(&event.what),
            format_fixed(event.state.altitude_m / 1e3, 3),
            format_fixed(event.state.ground_speed_m_s, 2),
            format_fixed(event.state.inertial_speed_m_s, 2),
            format_fixed(event.state.mass_kg, 1),
        ]);
    }
    text.push_str(&columns(&timeline, 2));
    text
}

fn row(cells: &[&str]) -> Vec<String> {
    cells.iter().map(|cell| inert(cell)).collect()
}

fn line(line: &LedgerLine) -> Vec<String> {
    let numbers = [
        line.paid_m_s,
        line.back_pressure_m_s,
        line.steering_m_s,
        line.drag_m_s,
        line.gravity_m_s,
        line.gained_m_s,
    ];
    let mut cells = vec![inert(&line.phase)];
    cells.extend(numbers.map(|number| format_fixed(number, 2)));
    cells.push(format!("{:.0e}", line.closure_m_s.abs()));
    cells
}

fn inert(text: &str) -> String {
    text.chars().map(|c| if is_harmful(c) { '\u{fffd}' } else { c }).collect()
}

/// Rows in columns, the first `left` of them aligned left and the rest right.
fn columns(rows: &[Vec<String>], left: usize) -> String {
    let count = rows.iter().map(Vec::len).max().unwrap_or(0);
    let width =
        |column: usize| rows.iter().filter_map(|row| row.get(column)).map(|cell| cell.chars().count()).max();
    let widths: Vec<usize> = (0..count).map(|column| width(column).unwrap_or(0)).collect();
    let mut text = String::new();
    for row in rows {
        let mut line = String::new();
        for (column, cell) in row.iter().enumerate() {
            let pad = " ".repeat(widths[column] - cell.chars().count());
            line.push_str("  ");
            line.push_str(&if column < left { format!("{cell}{pad}") } else { format!("{pad}{cell}") });
        }
        text.push_str(line.trim_end());
        text.push('\n');
    }
    text
}
