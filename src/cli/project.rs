//! The project's folder on disk, beyond which no source reaches.

use std::fs;
use std::io;
use std::path::{Path, PathBuf};

use crate::check::{ReadError, Reader};

/// The folder of a project and the entry file's path within it.
pub struct Project {
    root: PathBuf,
    entry: String,
}

impl Project {
    /// The project's folder is the nearest one above the file that holds a `.git`, else the file's own.
    pub fn of(file: &Path) -> io::Result<Project> {
        let file = fs::canonicalize(file)?;
        if file.is_dir() {
            return Err(io::Error::other("is a folder"));
        }
        let folder = file.parent().ok_or_else(|| io::Error::other("not a file"))?;
        let root = folder.ancestors().find(|above| above.join(".git").exists()).unwrap_or(folder);
        let relative = file.strip_prefix(root).map_err(io::Error::other)?;
        let parts: Option<Vec<&str>> = relative.components().map(|part| part.as_os_str().to_str()).collect();
        let entry = parts.ok_or_else(|| io::Error::other("its name is not UTF-8"))?.join("/");
        Ok(Project { root: root.to_owned(), entry })
    }

    /// Path of the entry file from the project's folder, with `/` between its parts.
    pub fn entry(&self) -> &str {
        &self.entry
    }
}

impl Reader for Project {
    fn read(&self, path: &str) -> Result<Vec<u8>, ReadError> {
        let full = fs::canonicalize(self.root.join(path)).map_err(|error| match error.kind() {
            io::ErrorKind::NotFound => ReadError::Missing,
            _ => ReadError::Unreadable(error.to_string()),
        })?;
        // A symbolic link may lead out of the folder although its path does not.
        if !full.starts_with(&self.root) {
            return Err(ReadError::Outside);
        }
        fs::read(full).map_err(|error| ReadError::Unreadable(error.to_string()))
    }
}
