//! The command line: one file for each command.

mod arguments;
mod builtin;
mod check;
mod completions;
mod explain;
mod findings;
mod fly;
mod manpages;
mod model;
mod output;
mod project;
mod report;
mod session;
mod status;
mod trajectory;

use std::ffi::OsString;
use std::process::ExitCode;

use clap::Parser;

use arguments::{Arguments, Command};
pub use status::Status;

/// Runs the program with these arguments (the program's own name first).
pub fn run(arguments: impl IntoIterator<Item = OsString>) -> ExitCode {
    let arguments = match Arguments::try_parse_from(arguments) {
        Ok(arguments) => arguments,
        Err(error) => {
            // Help and version arrive here too; clap prints them to the right stream.
            let status = if error.use_stderr() { Status::Usage } else { Status::Well };
            return if error.print().is_ok() { status.into() } else { Status::Usage.into() };
        }
    };
    let status = match &arguments.command {
        Command::Check(command) => check::run(command),
        Command::Fly(command) => fly::run(command),
        Command::Report(command) => report::run(command),
        Command::Model(command) => model::run(command),
        Command::Explain(command) => explain::run(command),
        Command::Builtin => builtin::run(),
        Command::Completions(command) => completions::run(command),
        Command::Manpages(command) => manpages::run(command),
    };
    status.into()
}
