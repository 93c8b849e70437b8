//! Source files and their line index.

use super::{FileId, Span};

/// A place as people count: line and column from one, columns in characters.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub struct Location {
    pub line: u32,
    pub column: u32,
}

/// One file: its name as shown to people (relative to the project's folder), its text, and where
/// its lines start.
#[derive(Clone, Debug)]
pub struct SourceFile {
    name: String,
    text: String,
    line_starts: Vec<u32>,
}

impl SourceFile {
    pub fn new(name: impl Into<String>, text: impl Into<String>) -> Self {
        let text = text.into();
        let line_starts = std::iter::once(0)
            .chain(text.bytes().enumerate().filter(|(_, byte)| *byte == b'\n').map(|(at, _)| at as u32 + 1))
            .collect();
        SourceFile { name: name.into(), text, line_starts }
    }

    pub fn name(&self) -> &str {
        &self.name
    }

    pub fn text(&self) -> &str {
        &self.text
    }

    /// Column of a byte offset in UTF-16 units, counted from zero, as editors count.
    pub fn utf16_column(&self, offset: u32) -> u32 {
        let offset = (offset as usize).min(self.text.len());
        let line = self.line_starts.partition_point(|start| *start as usize <= offset) - 1;
        let start = self.line_starts[line] as usize;
        self.text.get(start..offset).map_or(offset - start, |before| before.encode_utf16().count()) as u32
    }

    /// Line and column of a byte offset; an offset past the end counts as the end.
    pub fn location(&self, offset: u32) -> Location {
        let offset = (offset as usize).min(self.text.len());
        let line = self.line_starts.partition_point(|start| *start as usize <= offset) - 1;
        let start = self.line_starts[line] as usize;
        let column = self.text.get(start..offset).map_or(offset - start, |before| before.chars().count());
        Location { line: line as u32 + 1, column: column as u32 + 1 }
    }
}

/// All files of one compilation, in the order in which they were read.
#[derive(Clone, Debug, Default)]
pub struct Sources {
    files: Vec<SourceFile>,
}

impl Sources {
    pub fn add(&mut self, file: SourceFile) -> FileId {
        self.files.push(file);
        FileId(self.files.len() as u32 - 1)
    }

    /// The file of an id that this collection gave out.
    pub fn file(&self, id: FileId) -> &SourceFile {
        &self.files[id.0 as usize]
    }

    pub fn files(&self) -> &[SourceFile] {
        &self.files
    }

    pub fn text(&self, span: Span) -> &str {
        self.file(span.file).text.get(span.range()).unwrap_or("")
    }

    pub fn location(&self, span: Span) -> Location {
        self.file(span.file).location(span.start)
    }
}
