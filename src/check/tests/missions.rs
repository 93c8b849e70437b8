//! The missions that ship with the project.

use std::path::Path;

use crate::check::{ReadError, Reader, compile};
use crate::diagnostics::Severity;

struct Folder;

impl Reader for Folder {
    fn read(&self, path: &str) -> Result<Vec<u8>, ReadError> {
        let root = Path::new(env!("CARGO_MANIFEST_DIR"));
        std::fs::read(root.join(path)).map_err(|error| ReadError::Unreadable(error.to_string()))
    }
}

#[test]
fn every_mission_of_the_project_is_sound() {
    let folder = Path::new(env!("CARGO_MANIFEST_DIR")).join("missions");
    let mut names: Vec<_> =
        std::fs::read_dir(folder).unwrap().map(|entry| entry.unwrap().file_name()).collect();
    names.sort();
    for name in names.iter().filter_map(|name| name.to_str()).filter(|name| name.ends_with(".wright")) {
        let compiled = compile(&format!("missions/{name}"), &Folder);
        let errors = compiled.diagnostics.iter().filter(|one| one.severity() == Severity::Error);
        let faults: Vec<_> = errors.map(|one| (one.code.name, &one.message)).collect();
        assert!(faults.is_empty(), "{name}: {faults:?}");
    }
}
