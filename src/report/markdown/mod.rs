//! The report in Markdown that any forge renders.

mod sections;
mod table;

use super::content::Report;
use super::show::Show;
use crate::quantity::System;

/// The whole page; the pictures stand beside it under their names.
pub fn markdown(report: &Report, system: System, pictures: &[&str]) -> String {
    let show = Show { system };
    let parts = [
        sections::head(report),
        sections::verdict(report, &show),
        sections::figures(report, &show),
        sections::pictures(pictures),
        sections::mass(report, &show),
        sections::stages(report, &show),
        sections::ledger(report),
        sections::timeline(report, &show),
        sections::peaks(report, &show),
        sections::end(report, &show),
        sections::propellant(report, &show),
        sections::assumptions(report),
        sections::warnings(report),
        sections::caution(report),
    ];
    let mut page = parts.into_iter().filter(|part| !part.is_empty()).collect::<Vec<_>>().join("\n");
    if !page.ends_with('\n') {
        page.push('\n');
    }
    page
}
