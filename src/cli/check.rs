//! `check`: diagnostics only.

use super::arguments::CheckCommand;
use super::{Status, session};

pub fn run(command: &CheckCommand) -> Status {
    let one = |file| match session::compile(file) {
        Ok(compiled) => session::tell(&compiled.diagnostics, &compiled.sources, command.inputs.format),
        Err(status) => status,
    };
    command.inputs.files.iter().map(|file| one(file.as_path())).max().unwrap_or(Status::Well)
}
