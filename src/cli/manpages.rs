//! `manpages`: a manual page for the program and for each of its commands.

use clap::CommandFactory;

use super::arguments::{Arguments, ManpagesCommand};
use super::{Status, output};

pub fn run(command: &ManpagesCommand) -> Status {
    let mut program = Arguments::command();
    program.build();
    let mut pages = vec![("stagewright".to_owned(), program.clone())];
    for part in program.get_subcommands().filter(|part| part.get_name() != "help") {
        let name = format!("stagewright-{}", part.get_name());
        pages.push((name.clone(), part.clone().name(name)));
    }
    for (name, page) in pages {
        let path = command.folder.join(format!("{name}.1"));
        let mut text = Vec::new();
        let written = clap_mangen::Man::new(page).render(&mut text).and_then(|()| output::write_whole(&path, &text));
        if let Err(error) = written {
            return output::complain(&format!("{}: {error}", path.display()));
        }
    }
    Status::Well
}
