//! `manpages`: a manual page for the program and for each of its commands.

use clap::CommandFactory;

use super::arguments::{Arguments, ManpagesCommand};
use super::{Status, output};

pub fn run(command: &ManpagesCommand) -> Status {
    let program = Arguments::command().disable_help_subcommand(true);
    let written = std::fs::create_dir_all(&command.folder)
        .and_then(|()| clap_mangen::generate_to(program, &command.folder));
    match written {
        Ok(()) => Status::Well,
        Err(error) => output::complain(&format!("{}: {error}", command.folder.display())),
    }
}
