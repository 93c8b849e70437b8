//! Diagnostics for programs: one JSON object a line.

use schemars::JsonSchema;
use serde::Serialize;

use super::{Diagnostic, Severity};
use crate::source::{Sources, Span};

/// Version of the form.
const FORMAT: &str = "stagewright-diagnostic/1";

/// One diagnostic.
#[derive(Debug, Serialize, JsonSchema)]
#[serde(deny_unknown_fields)]
struct Line<'a> {
    format: &'a str,
    code: &'a str,
    /// `error` or `warning`.
    severity: &'a str,
    message: &'a str,
    #[serde(flatten)]
    place: Place<'a>,
    /// Every place, the one that the message is about first.
    labels: Vec<Labelled<'a>>,
    help: Option<&'a str>,
}

#[derive(Debug, Serialize, JsonSchema)]
struct Labelled<'a> {
    text: &'a str,
    #[serde(flatten)]
    place: Place<'a>,
}

/// A place: line and column count from one, columns in characters; `utf16_column` counts from zero
/// in UTF-16 units, as editors do; bytes are half-open.
#[derive(Debug, Serialize, JsonSchema)]
struct Place<'a> {
    file: &'a str,
    line: u32,
    column: u32,
    utf16_column: u32,
    start: u32,
    end: u32,
}

impl<'a> Place<'a> {
    fn new(span: Span, sources: &'a Sources) -> Self {
        let file = sources.file(span.file);
        let location = file.location(span.start);
        Place {
            file: file.name(),
            line: location.line,
            column: location.column,
            utf16_column: file.utf16_column(span.start),
            start: span.start,
            end: span.end,
        }
    }
}

/// One object a line, in order.
pub fn render_json(diagnostics: &[Diagnostic], sources: &Sources) -> String {
    let mut text = String::new();
    for diagnostic in diagnostics {
        let labels = diagnostic.labels.iter();
        let line = Line {
            format: FORMAT,
            code: diagnostic.code.name,
            severity: match diagnostic.severity() {
                Severity::Error => "error",
                Severity::Warning => "warning",
            },
            message: &diagnostic.message,
            place: Place::new(diagnostic.span(), sources),
            labels: labels
                .map(|label| Labelled { text: &label.text, place: Place::new(label.span, sources) })
                .collect(),
            help: diagnostic.help.as_deref(),
        };
        // invariant: plain structs with text keys always have a JSON form.
        text.push_str(&serde_json::to_string(&line).unwrap_or_default());
        text.push('\n');
    }
    text
}

/// JSON Schema of one line of [`render_json`].
pub fn schema() -> String {
    let mut text = serde_json::to_string_pretty(&schemars::schema_for!(Line)).unwrap_or_default();
    text.push('\n');
    text
}
