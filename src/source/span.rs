//! Places in source text.

/// Which file of [`super::Sources`] a span lies in.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq, PartialOrd, Ord)]
pub struct FileId(pub u32);

/// A half-open range of bytes `start..end` in one file.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq, PartialOrd, Ord)]
pub struct Span {
    pub file: FileId,
    pub start: u32,
    pub end: u32,
}

impl Span {
    pub fn new(file: FileId, start: usize, end: usize) -> Self {
        // invariant: the size guard refuses files of 16 MiB and more, so offsets fit 32 bits.
        Span { file, start: start as u32, end: end as u32 }
    }

    /// The smallest span over both; the second must lie in the same file.
    pub fn to(self, other: Span) -> Span {
        Span { file: self.file, start: self.start.min(other.start), end: self.end.max(other.end) }
    }

    pub fn range(self) -> std::ops::Range<usize> {
        self.start as usize..self.end as usize
    }

    pub fn len(self) -> usize {
        (self.end - self.start) as usize
    }

    pub fn is_empty(self) -> bool {
        self.end == self.start
    }
}
