//! `completions`: a script for a shell.

use clap::CommandFactory;

use super::arguments::{Arguments, CompletionsCommand};
use super::{Status, output};

pub fn run(command: &CompletionsCommand) -> Status {
    let mut script = Vec::new();
    clap_complete::generate(command.shell, &mut Arguments::command(), "stagewright", &mut script);
    output::print(&String::from_utf8_lossy(&script))
}
