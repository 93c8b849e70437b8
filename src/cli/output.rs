//! Writing: files whole or not at all, and text to the standard streams.

use std::fs;
use std::io::{self, Write};
use std::path::{Path, PathBuf};

use super::Status;

/// Writes a file by way of a neighbour that then takes its place, so that no reader sees half of it.
pub fn write_whole(path: &Path, bytes: &[u8]) -> io::Result<()> {
    if let Some(folder) = path.parent().filter(|folder| !folder.as_os_str().is_empty()) {
        fs::create_dir_all(folder)?;
    }
    let mut aside = path.as_os_str().to_owned();
    aside.push(format!(".{}.part", std::process::id()));
    let aside = PathBuf::from(aside);
    let written = fs::write(&aside, bytes).and_then(|()| fs::rename(&aside, path));
    if written.is_err() {
        // The neighbour is of no use to anyone; the error that counts is the one above.
        let _ = fs::remove_file(&aside);
    }
    written
}

/// Prints to standard output; a reader that has gone away is no error.
pub fn print(text: &str) -> Status {
    match anstream::stdout().lock().write_all(text.as_bytes()) {
        Ok(()) => Status::Well,
        Err(error) if error.kind() == io::ErrorKind::BrokenPipe => Status::Well,
        Err(error) => complain(&format!("standard output: {error}")),
    }
}

/// Prints to standard error, colours taken out where they are not wanted.
pub fn print_aside(text: &str) {
    // Nothing can be told to anyone when standard error is gone.
    let _ = anstream::stderr().lock().write_all(text.as_bytes());
}

/// Tells of wrong usage or of a file that cannot be read or written.
pub fn complain(message: &str) -> Status {
    let inert: String = message.chars().map(|c| if c.is_control() { '\u{fffd}' } else { c }).collect();
    print_aside(&format!("stagewright: {inert}\n"));
    Status::Usage
}
