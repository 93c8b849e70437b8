//! From a file's name to its flight, with everything said on the way.

use std::io::IsTerminal;
use std::path::Path;

use super::arguments::{Flying, Format, LedgerFrame};
use super::project::Project;
use super::{Status, output};
use crate::check::{self, Compiled};
use crate::diagnostics::{self, Diagnostic, Severity};
use crate::flight::{Completion, Flight, Frame, Settings};
use crate::model::Mission;
use crate::source::Sources;

/// Compiles a file; tells of a file that cannot be found.
pub fn compile(file: &Path) -> Result<Compiled, Status> {
    let project = Project::of(file).map_err(|error| output::complain(&format!("{}: {error}", file.display())))?;
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
            ..Settings::default()
        }
    }
}

/// What a flight's outcome means for the exit status.
pub fn status(mission: &Mission, flight: &Flight) -> Status {
    let _ = mission;
    match &flight.completion {
        Completion::Failed(_) => Status::Flight,
        Completion::Completed => {
            let met = flight.demands.iter().all(|demand| demand.met) && flight.aims.iter().all(|aim| aim.hit);
            if met { Status::Well } else { Status::Unmet }
        }
    }
}
