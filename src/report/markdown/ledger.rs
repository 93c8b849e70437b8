//! The account of delta-v.

use super::table::{Table, plain};
use crate::quantity::format_fixed;
use crate::report::content::{LedgerLine, Report};

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
