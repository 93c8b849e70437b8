//! Reads the entry file and every file that it brings, directly or not, each once.

use std::collections::{BTreeMap, HashMap};

use super::paths;
use crate::diagnostics::Diagnostic;
use crate::diagnostics::codes::{circular_bring, file_not_read, outside_project};
use crate::source::{FileId, SourceFile, Sources, Span};
use crate::syntax::{self, BringFrom, Item, Quoted, Statement, Tree};

/// Supplies the bytes of files, by their path from the project's folder: without `.` and `..`,
/// its parts joined by `/`.
pub trait Reader {
    fn read(&self, path: &str) -> Result<Vec<u8>, ReadError>;
}

/// Why a file could not be read.
#[derive(Clone, Debug, PartialEq, Eq)]
pub enum ReadError {
    Missing,
    /// The path leads outside the project's folder, through a link for instance.
    Outside,
    /// In the words of the system.
    Unreadable(String),
}

/// The files of a compilation. `trees` has one tree for each file of `sources`, an empty one for a
/// table of points.
#[derive(Debug, Default)]
pub(super) struct Project {
    pub sources: Sources,
    pub trees: Vec<Tree>,
    /// The file that is meant at the place of a path or of `builtin`; lacks those that could not be
    /// read, which have been reported.
    pub links: BTreeMap<Span, FileId>,
    pub diagnostics: Vec<Diagnostic>,
}

impl std::fmt::Display for ReadError {
    fn fmt(&self, f: &mut std::fmt::Formatter<'_>) -> std::fmt::Result {
        f.write_str(match self {
            ReadError::Missing => "there is no such file",
            ReadError::Outside => "it leads outside the project's folder",
            ReadError::Unreadable(why) => why,
        })
    }
}

struct Loader<'r> {
    reader: &'r dyn Reader,
    project: Project,
    /// By path; None for a file that could not be read.
    known: HashMap<String, Option<FileId>>,
    builtin: Option<FileId>,
}

/// Reads and parses `entry` and all that it needs.
pub(super) fn load(entry: &str, reader: &dyn Reader) -> Project {
    let mut loader = Loader { reader, project: Project::default(), known: HashMap::new(), builtin: None };
    match reader.read(entry) {
        Ok(bytes) => {
            let file = loader.add(entry, &bytes, true);
            loader.known.insert(entry.to_string(), Some(file));
        }
        Err(error) => {
            let file = loader.add(entry, &[], true);
            let place = Span::new(file, 0, 0);
            loader.project.diagnostics.push(file_not_read::found(place, entry, &error.to_string()));
        }
    }
    let mut next = 0;
    while let Some(tree) = loader.project.trees.get(next) {
        let wanted = wanted_files(tree);
        for file in wanted {
            loader.follow(file);
        }
        next += 1;
    }
    report_circles(&mut loader.project);
    loader.project
}

/// A file that a tree refers to.
enum Wanted {
    Builtin(Span),
    Source(Quoted),
    Table(Quoted),
}

fn wanted_files(tree: &Tree) -> Vec<Wanted> {
    let mut wanted = Vec::new();
    for item in &tree.items {
        match item {
            Item::Bring(bring) => wanted.push(match &bring.from {
                BringFrom::Builtin(span) => Wanted::Builtin(*span),
                BringFrom::File(path) => Wanted::Source(path.clone()),
            }),
            Item::Block(block) => {
                for line in &block.lines {
                    if let Statement::From(path) = &line.statement {
                        wanted.push(Wanted::Table(path.clone()));
                    }
                }
            }
            _ => {}
        }
    }
    wanted
}

impl Loader<'_> {
    fn follow(&mut self, wanted: Wanted) {
        let (path, parse) = match wanted {
            Wanted::Builtin(span) => {
                let file = match self.builtin {
                    Some(file) => file,
                    None => self.add("builtin", crate::world::BUILTIN.as_bytes(), true),
                };
                self.builtin = Some(file);
                self.project.links.insert(span, file);
                return;
            }
            Wanted::Source(path) => (path, true),
            Wanted::Table(path) => (path, false),
        };
        let from = self.project.sources.file(path.span.file).name();
        let full = match paths::join(from, &path.text) {
            Ok(full) => full,
            Err(refusal) => {
                self.project.diagnostics.push(outside_project::found(path.span, &path.text, refusal));
                return;
            }
        };
        let file = match self.known.get(&full) {
            Some(known) => *known,
            None => {
                let file = match self.reader.read(&full) {
                    Ok(bytes) => Some(self.add(&full, &bytes, parse)),
                    Err(error) => {
                        self.project.diagnostics.push(file_not_read::found(
                            path.span,
                            &full,
                            &error.to_string(),
                        ));
                        None
                    }
                };
                self.known.insert(full, file);
                file
            }
        };
        if let Some(file) = file {
            self.project.links.insert(path.span, file);
        }
    }

    fn add(&mut self, path: &str, bytes: &[u8], parse: bool) -> FileId {
        let file = FileId(self.project.sources.files().len() as u32);
        let (text, sound) = match syntax::decode(file, bytes) {
            Ok(text) => (text, true),
            Err(error) => {
                self.project.diagnostics.push(error.diagnostic);
                (error.lossy, false)
            }
        };
        let mut tree = Tree::default();
        if parse && sound {
            let parsed = syntax::parse(file, &text);
            tree = parsed.tree;
            self.project.diagnostics.extend(parsed.diagnostics);
        }
        self.project.trees.push(tree);
        self.project.sources.add(SourceFile::new(path, text))
    }
}

/// Reports each `bring` that closes a circle.
fn report_circles(project: &mut Project) {
    #[derive(Clone, Copy, PartialEq)]
    enum Mark {
        New,
        Open,
        Done,
    }
    let edges: Vec<Vec<(FileId, Span)>> =
        project.trees.iter().map(|tree| brings(tree, &project.links)).collect();
    let mut marks = vec![Mark::New; edges.len()];
    let mut path: Vec<(usize, usize)> = Vec::new();
    for root in 0..edges.len() {
        if marks[root] == Mark::New {
            path.push((root, 0));
            marks[root] = Mark::Open;
        }
        while let Some((file, next)) = path.last_mut() {
            let Some((target, span)) = edges[*file].get(*next).copied() else {
                marks[*file] = Mark::Done;
                path.pop();
                continue;
            };
            *next += 1;
            let target = target.0 as usize;
            match marks[target] {
                Mark::Done => {}
                Mark::New => {
                    marks[target] = Mark::Open;
                    path.push((target, 0));
                }
                Mark::Open => {
                    let from = path.iter().position(|(file, _)| *file == target).unwrap_or(0);
                    let name = |file: usize| project.sources.file(FileId(file as u32)).name().to_string();
                    let mut round: Vec<_> = path.iter().skip(from).map(|(file, _)| name(*file)).collect();
                    round.push(name(target));
                    project.diagnostics.push(circular_bring::found(span, &round));
                }
            }
        }
    }
}

fn brings(tree: &Tree, links: &BTreeMap<Span, FileId>) -> Vec<(FileId, Span)> {
    let paths = tree.items.iter().filter_map(|item| match item {
        Item::Bring(bring) => match &bring.from {
            BringFrom::File(path) => Some(path.span),
            BringFrom::Builtin(_) => None,
        },
        _ => None,
    });
    paths.filter_map(|span| Some((*links.get(&span)?, span))).collect()
}
