//! The line reader: what happens to a text before the grammar sees it.
//!
//! Comments, tabs, carriage returns and a byte-order mark become blanks, and so does every line
//! break after which a fact goes on. The text keeps its length, so all places stay true. Everything
//! here is one pass from left to right, and so linear.

use crate::diagnostics::Diagnostic;
use crate::diagnostics::codes::{nesting_limit, too_many_facts};
use crate::source::{FileId, Span};

use super::Comment;

/// A text that is ready for the grammar, and what was taken out of it.
pub(super) struct Read {
    pub(super) text: String,
    pub(super) comments: Vec<Comment>,
    pub(super) diagnostics: Vec<Diagnostic>,
}

/// The most brackets of any kind that may be open at once. It bounds the recursion of the grammar.
pub(super) const NESTING_LIMIT: usize = 64;

/// The most facts and definitions in one file.
pub(super) const FACT_LIMIT: usize = 200_000;

/// The state of the pass.
struct Reader<'t> {
    file: FileId,
    text: &'t str,
    bytes: Vec<u8>,
    comments: Vec<Comment>,
    diagnostics: Vec<Diagnostic>,
    open: Vec<Open>,
    /// The line breaks within open round and square brackets. They are blanked once the bracket is
    /// closed; one that stays open takes no further line with it.
    breaks: Vec<usize>,
    /// The last bytes before this place that are not blank; runs of blanks count as one.
    tail: [u8; 3],
    blank_before: bool,
    line_start: usize,
    /// This line goes over the nesting limit.
    deep_line: bool,
    deep_reported: bool,
    facts: usize,
}

/// An open bracket.
struct Open {
    at: usize,
    brace: bool,
    /// It stood on a line that was blanked, and so has to go together with its partner.
    blanked: bool,
}

pub(super) fn read(file: FileId, text: &str) -> Read {
    let mut reader = Reader {
        file,
        text,
        bytes: text.as_bytes().to_vec(),
        comments: Vec::new(),
        diagnostics: Vec::new(),
        open: Vec::new(),
        breaks: Vec::new(),
        tail: [0; 3],
        blank_before: false,
        line_start: 0,
        deep_line: false,
        deep_reported: false,
        facts: 0,
    };
    reader.run();
    // invariant: only whole characters were replaced, each by as many ASCII bytes.
    let text = String::from_utf8(reader.bytes).unwrap_or_default();
    Read { text, comments: reader.comments, diagnostics: reader.diagnostics }
}

impl Reader<'_> {
    fn run(&mut self) {
        if self.text.starts_with('\u{feff}') {
            self.blank(0, '\u{feff}'.len_utf8());
        }
        let mut at = 0;
        while let Some(&byte) = self.bytes.get(at) {
            at = match byte {
                b'#' => self.comment(at),
                b'"' => {
                    self.push_tail(byte);
                    self.quoted(at)
                }
                b' ' | b'\t' | b'\r' => {
                    self.blank(at, at + 1);
                    self.blank_before = true;
                    at + 1
                }
                b'\n' => {
                    self.line_break(at);
                    at + 1
                }
                _ => {
                    self.push_tail(byte);
                    self.bracket(at, byte);
                    at + 1
                }
            };
            if self.facts > FACT_LIMIT {
                self.diagnostics.push(too_many_facts::found(Span::new(self.file, at - 1, at), FACT_LIMIT));
                self.blank(at - 1, self.bytes.len());
                return;
            }
        }
        self.end_line(at);
    }

    fn blank(&mut self, start: usize, end: usize) {
        if let Some(piece) = self.bytes.get_mut(start..end) {
            piece.fill(b' ');
        }
    }

    fn push_tail(&mut self, byte: u8) {
        let [_, second, third] = self.tail;
        self.tail = if self.blank_before { [third, b' ', byte] } else { [second, third, byte] };
        self.blank_before = false;
    }

    /// Takes a comment out. Gives the end of its line, without a carriage return.
    fn comment(&mut self, at: usize) -> usize {
        let rest = self.bytes.get(at..).unwrap_or(&[]);
        let mut end = at + rest.iter().position(|byte| *byte == b'\n').unwrap_or(rest.len());
        if self.bytes.get(end - 1) == Some(&b'\r') {
            end -= 1;
        }
        self.comments.push(Comment { span: Span::new(self.file, at, end) });
        self.blank(at, end);
        self.blank_before = true;
        end
    }

    /// Passes over a quoted text; one without an end goes to the end of its line.
    fn quoted(&self, start: usize) -> usize {
        let mut at = start + 1;
        while let Some(byte) = self.bytes.get(at) {
            match byte {
                b'"' => return at + 1,
                b'\n' => return at,
                b'\\' if self.bytes.get(at + 1).is_some_and(|next| *next != b'\n') => at += 2,
                _ => at += 1,
            }
        }
        at
    }

    fn line_break(&mut self, at: usize) {
        self.end_line(at);
        self.line_start = at + 1;
        self.blank_before = true;
        if self.goes_on() {
            self.blank(at, at + 1);
        } else if self.open.last().is_some_and(|open| !open.brace) {
            self.breaks.push(at);
        } else {
            self.facts += usize::from(self.tail != [0; 3]);
            self.tail = [0; 3];
        }
    }

    /// Whether what stands before this line break asks for more.
    fn goes_on(&self) -> bool {
        match self.tail {
            [_, _, b',' | b'+' | b'-' | b'*' | b'/' | b'^' | b'=' | b'<' | b'>'] | [_, b'.', b'.'] => true,
            [before, b'o', b'r'] => !(before.is_ascii_alphanumeric() || before == b'_'),
            _ => false,
        }
    }

    fn bracket(&mut self, at: usize, byte: u8) {
        match byte {
            b'(' | b'[' => self.open_bracket(at, false),
            b')' | b']' if self.open.last().is_some_and(|open| !open.brace) => self.close_bracket(at),
            b'{' => {
                self.forget_brackets();
                self.open_bracket(at, true);
            }
            b'}' => {
                self.forget_brackets();
                self.close_bracket(at);
            }
            b';' => {
                self.forget_brackets();
                self.facts += 1;
            }
            _ => {}
        }
    }

    fn open_bracket(&mut self, at: usize, brace: bool) {
        self.open.push(Open { at, brace, blanked: false });
        if self.open.len() > NESTING_LIMIT {
            self.deep_line = true;
            if !self.deep_reported {
                self.diagnostics.push(nesting_limit::found(Span::new(self.file, at, at + 1), NESTING_LIMIT));
                self.deep_reported = true;
            }
        }
    }

    fn close_bracket(&mut self, at: usize) {
        let Some(opened) = self.open.pop() else { return };
        if opened.blanked {
            self.blank(at, at + 1);
        }
        self.deep_reported &= self.open.len() >= NESTING_LIMIT;
        if !opened.brace && self.open.last().is_none_or(|open| open.brace) {
            for at in std::mem::take(&mut self.breaks) {
                self.blank(at, at + 1);
            }
        }
    }

    /// No round or square bracket stays open over the start or end of a block or over a `;`.
    fn forget_brackets(&mut self) {
        while self.open.pop_if(|open| !open.brace).is_some() {}
        self.breaks.clear();
        self.tail = [0; 3];
    }

    /// Blanks a line on which the nesting goes over the limit.
    fn end_line(&mut self, end: usize) {
        if !std::mem::take(&mut self.deep_line) {
            return;
        }
        self.blank(self.line_start, end);
        let start = self.line_start;
        for open in self.open.iter_mut().rev().take_while(|open| open.at >= start) {
            open.blanked = true;
        }
    }
}
