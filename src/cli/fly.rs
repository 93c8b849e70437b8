//! `fly`: the ledger and the timeline in the terminal, and the states as a table.

use std::path::Path;

use super::arguments::FlyCommand;
use super::session::{self, Flown};
use super::{Status, output, trajectory};
use crate::quantity::System;
use crate::report;

pub fn run(command: &FlyCommand) -> Status {
    if command.trajectory.is_some() && command.inputs.files.len() > 1 {
        return output::complain("`--trajectory` takes the states of one file");
    }
    command.inputs.files.iter().map(|file| one(file, command)).max().unwrap_or(Status::Well)
}

fn one(file: &Path, command: &FlyCommand) -> Status {
    let show = |flown: &Flown<'_>, count: usize| {
        let printed = output::print(&format!("{}\n", report::summary(&flown.report)));
        let Some(path) = &command.trajectory else { return printed };
        // Several missions in one file have a table each.
        let path = match count {
            1 => path.clone(),
            _ => path.with_file_name(format!(
                "{}-{}",
                flown.mission.name,
                path.file_name().unwrap_or_default().display()
            )),
        };
        let table = trajectory::csv(flown.mission, &flown.flight);
        match output::write_whole(&path, table.as_bytes()) {
            Ok(()) => printed,
            Err(error) => output::complain(&format!("{}: {error}", path.display())),
        }
    };
    let (printed, status) = session::fly(file, command.inputs.format, &command.flying, System::Written, show);
    printed.into_iter().fold(status, Status::max)
}
