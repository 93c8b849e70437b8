//! A diagnostic as plain data.

use crate::source::Span;

/// How bad it is. An error keeps the mission from flying.
#[derive(Clone, Copy, Debug, PartialEq, Eq, PartialOrd, Ord)]
pub enum Severity {
    Error,
    Warning,
}

/// One kind of diagnostic: its name, and the text that `explain` shows.
///
/// Each code stands in a file of its own in [`super::codes`], with the function that makes it.
#[derive(Debug)]
pub struct Code {
    /// Words joined by hyphens, such as `unknown-name`.
    pub name: &'static str,
    pub severity: Severity,
    /// One line: what it means.
    pub title: &'static str,
    /// A few sentences of Markdown: why it matters and how to mend it.
    pub explanation: &'static str,
    /// A smallest complete source (its file is `example.wright`) that brings the code up.
    pub wrong: &'static str,
    /// The same source, mended.
    pub mended: &'static str,
}

/// A place that a diagnostic points at, with a few words of its own.
#[derive(Clone, Debug, PartialEq, Eq)]
pub struct Label {
    pub span: Span,
    pub text: String,
}

/// One thing to tell the author of a source.
#[derive(Clone, Debug)]
pub struct Diagnostic {
    pub code: &'static Code,
    /// What was found and what was expected, in one sentence.
    pub message: String,
    /// Where; the first is the place that the message is about.
    pub labels: Vec<Label>,
    /// What to write instead, where that can be said.
    pub help: Option<String>,
}

impl Code {
    /// A diagnostic of this code about one place.
    pub fn at(&'static self, span: Span, message: impl Into<String>, label: impl Into<String>) -> Diagnostic {
        Diagnostic {
            code: self,
            message: message.into(),
            labels: vec![Label { span, text: label.into() }],
            help: None,
        }
    }
}

impl Diagnostic {
    /// Adds a second place ("first given here", "opened here").
    pub fn and(mut self, span: Span, text: impl Into<String>) -> Self {
        self.labels.push(Label { span, text: text.into() });
        self
    }

    /// Adds the mend.
    pub fn help(mut self, text: impl Into<String>) -> Self {
        self.help = Some(text.into());
        self
    }

    /// The place that the message is about.
    pub fn span(&self) -> Span {
        self.labels.first().map_or_else(Span::default, |label| label.span)
    }

    pub fn severity(&self) -> Severity {
        self.code.severity
    }
}
