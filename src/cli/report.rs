//! `report`: the report and its pictures, written or verified.

use std::fs;
use std::path::{Path, PathBuf};

use super::arguments::{ReportCommand, Units};
use super::session::{self, Flown};
use super::{Status, output};
use crate::quantity::System;
use crate::report;

pub fn run(command: &ReportCommand) -> Status {
    if command.out.is_some() && command.inputs.files.len() > 1 {
        return output::complain("`--out` takes the report of one file");
    }
    command.inputs.files.iter().map(|file| one(file, command)).max().unwrap_or(Status::Well)
}

fn one(file: &Path, command: &ReportCommand) -> Status {
    let system = match command.units {
        Units::Written => System::Written,
        Units::Si => System::Si,
        Units::Us => System::UsCustomary,
    };
    let folder = command.out.clone().unwrap_or_else(|| file.with_extension("report"));
    let deliver = |flown: &Flown<'_>, count: usize| {
        // Several missions in one file have a folder each.
        let folder = if count == 1 { folder.clone() } else { folder.join(&flown.mission.name) };
        let files = files(flown, system);
        match command.verify {
            true => verify(&folder, &files),
            false => write(&folder, &files),
        }
    };
    let (delivered, status) = session::fly(file, command.inputs.format, &command.flying, system, deliver);
    delivered.into_iter().fold(status, Status::max)
}

/// The files of a report under their names.
fn files(flown: &Flown<'_>, system: System) -> Vec<(&'static str, String)> {
    let pictures = report::pictures(flown.mission, &flown.flight, system);
    let names: Vec<&str> = pictures.iter().map(|picture| picture.name).collect();
    let mut files = vec![
        ("report.md", report::markdown(&flown.report, system, &names)),
        ("report.json", report::json(&flown.report)),
    ];
    files.extend(pictures.into_iter().map(|picture| (picture.name, picture.svg)));
    files
}

fn write(folder: &Path, files: &[(&str, String)]) -> Status {
    for (name, text) in files {
        let path: PathBuf = folder.join(name);
        if let Err(error) = output::write_whole(&path, text.as_bytes()) {
            return output::complain(&format!("{}: {error}", path.display()));
        }
    }
    output::print(&format!("{}\n", folder.join("report.md").display()))
}

/// Tells of every file that is not what the source gives now.
fn verify(folder: &Path, files: &[(&str, String)]) -> Status {
    let mut status = Status::Well;
    for (name, text) in files {
        let path = folder.join(name);
        let why = match fs::read(&path) {
            Ok(found) if found == text.as_bytes() => continue,
            Ok(_) => "is not what the source gives now",
            Err(_) => "is not there",
        };
        output::print_aside(&format!(
            "stale: {} {why}; `stagewright report` writes it anew\n",
            path.display()
        ));
        status = Status::Unmet;
    }
    status
}
