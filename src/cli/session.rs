//! From a file's name to its flight, with everything said on the way.

use std::io::IsTerminal;
use std::path::Path;

use super::arguments::{Flying, Format, LedgerFrame};
use super::project::Project;
use super::{Status, findings, output};
use crate::check::{self, Compiled};
use crate::diagnostics::{self, Diagnostic, Severity};
use crate::flight::{self, Flight, Frame, Settings};
use crate::model::Mission;
use crate::quantity::System;
use crate::report::{self, Report};
use crate::source::Sources;

/// Compiles a file; tells of a file that cannot be found.
pub fn compile(file: &Path) -> Result<Compiled, Status> {
    let project =
        Project::of(file).map_err(|error| output::complain(&format!("{}: {error}", file.display())))?;
    Ok(check::compile(project.entry(), &project))
}

/// Prints what is to be said about a source, and gives the status that follows from it.
pub fn tell(diagnostics: &[Diagnostic], sources: &Sources, format: Format) -> Status {
    if !diagnostics.is_empty() {
        let text = match format {
            Format::Json => diagnostics::render_json(diagnostics, sources),
            Format::Text => diagnostics::render_terminal(diagnostics, sources, colour(), 100),
        };
        output::print_aside(&text);
    }
    match diagnostics.iter().any(|diagnostic| diagnostic.severity() == Severity::Error) {
        true => Status::Source,
        false => Status::Well,
    }
}

/// Colour only on a terminal, and never against `NO_COLOR`.
fn colour() -> bool {
    std::io::stderr().is_terminal() && std::env::var_os("NO_COLOR").is_none_or(|value| value.is_empty())
}

impl Flying {
    /// The settings of the flight, with every state kept for plots and tables.
    pub fn settings(&self) -> Settings {
        Settings {
            tolerance: self.tolerance,
            frame: self.ledger.map(|frame| match frame {
                LedgerFrame::BodyFixed => Frame::BodyFixed,
                LedgerFrame::Inertial => Frame::Inertial,
            }),
            samples: true,
        }
    }
}

/// A flown mission with all that was said about it.
pub struct Flown<'m> {
    pub mission: &'m Mission,
    pub flight: Flight,
    pub report: Report,
}

/// Compiles a file and flies its missions; tells of everything on the way. The status is that of the
/// compilation and of all flights.
pub fn fly<T>(
    file: &Path,
    format: Format,
    flying: &Flying,
    system: System,
    mut then: impl FnMut(&Flown<'_>, usize) -> T,
) -> (Vec<T>, Status) {
    let compiled = match compile(file) {
        Ok(compiled) => compiled,
        Err(status) => return (Vec::new(), status),
    };
    let mut said = compiled.diagnostics.clone();
    let mut flown = Vec::new();
    let mut status = Status::Well;
    for mission in compiled.model.iter().flat_map(|model| &model.missions) {
        let flight = flight::fly(mission, &flying.settings());
        let found = findings::diagnostics(mission, &flight, &compiled.sources);
        let facts = compiled.model.as_ref().map_or(&[][..], |model| &model.facts);
        let warnings: Vec<String> =
            compiled.diagnostics.iter().map(|warning| warning.message.clone()).collect();
        let report = report::assemble(mission, facts, &flight, flying.tolerance, system, &warnings);
        let outcome = match report.verdict() {
            report::Status::Met => Status::Well,
            report::Status::Unmet => Status::Unmet,
            report::Status::Failed => Status::Flight,
        };
        status = status.max(outcome);
        said.extend(found);
        flown.push(Flown { mission, flight, report });
    }
    let told = tell(&said, &compiled.sources, format);
    // A failed flight is told as an error, and yet the source has none.
    let told = if compiled.model.is_some() { Status::Well } else { told };
    if compiled.model.is_some() && flown.is_empty() {
        let status = output::complain(&format!("{}: this file has no mission to fly", file.display()));
        return (Vec::new(), status);
    }
    let count = flown.len();
    (flown.iter().map(|flown| then(flown, count)).collect(), told.max(status))
}
