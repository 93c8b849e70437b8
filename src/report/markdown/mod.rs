//! The report in Markdown that any forge renders.

mod course;
mod foundation;
mod ledger;
mod outcome;
mod table;
mod vehicle;

use super::content::Report;
use super::show::Show;
use crate::quantity::System;

/// The whole page; the pictures stand beside it under their names.
pub fn markdown(report: &Report, system: System, pictures: &[&str]) -> String {
    let show = Show { system };
    let parts = [
        outcome::head(report),
        outcome::verdict(report, &show),
        outcome::figures(report, &show),
        outcome::pictures(pictures),
        vehicle::mass(report, &show),
        vehicle::stages(report, &show),
        ledger::ledger(report),
        course::timeline(report, &show),
        course::peaks(report, &show),
        course::end(report, &show),
        vehicle::propellant(report, &show),
        foundation::assumptions(report),
        foundation::warnings(report),
        foundation::caution(report),
    ];
    let mut page = parts.into_iter().filter(|part| !part.is_empty()).collect::<Vec<_>>().join("\n");
    if !page.ends_with('\n') {
        page.push('\n');
    }
    page
}
