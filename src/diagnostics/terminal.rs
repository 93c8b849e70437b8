//! Diagnostics for people: the only module that knows how they are drawn.

use std::collections::BTreeMap;
use std::fmt::Write;
use std::sync::Arc;

use miette::{
    GraphicalReportHandler, GraphicalTheme, LabeledSpan, MietteDiagnostic, NamedSource, Report,
    ThemeCharacters, ThemeStyles,
};

use super::inert::{inert, inert_line, is_harmless};
use super::{Diagnostic, Severity};
use crate::source::{FileId, Sources};

/// So many are shown; the rest is counted.
const SHOWN: usize = 100;
/// Columns of a tab.
const TAB: usize = 4;

/// The diagnostics as a terminal shows them, with the lines of source that they are about, and a
/// count at the end.
pub fn render_terminal(diagnostics: &[Diagnostic], sources: &Sources, colour: bool, width: usize) -> String {
    let styles = if colour { ThemeStyles::ansi() } else { ThemeStyles::none() };
    let theme = GraphicalTheme { characters: ThemeCharacters::unicode(), styles };
    let handler = GraphicalReportHandler::new_themed(theme)
        .with_width(width)
        .tab_width(TAB)
        .with_context_lines(1)
        .without_syntax_highlighting()
        .with_links(false);
    // Each file is made harmless once, however many diagnostics it has.
    let mut texts: BTreeMap<FileId, Arc<str>> = BTreeMap::new();
    let mut text = String::new();
    for diagnostic in diagnostics.iter().take(SHOWN) {
        let file = diagnostic.labels.first().map(|label| label.span.file);
        let source = file.map(|id| {
            let file = sources.file(id);
            let text = texts.entry(id).or_insert_with(|| same_bytes(file.text()).into());
            NamedSource::new(inert_line(file.name()), Arc::clone(text))
        });
        let report = report(diagnostic, file, source);
        // Writing into a string cannot fail.
        let _ = handler.render_report(&mut text, report.as_ref());
        for label in diagnostic.labels.iter().filter(|label| Some(label.span.file) != file) {
            let (name, place) = (sources.file(label.span.file).name(), sources.location(label.span));
            let _ = writeln!(
                text,
                "  {}: {}:{}:{}",
                inert_line(&label.text),
                inert_line(name),
                place.line,
                place.column
            );
        }
        text.push('\n');
    }
    text.push_str(&count(diagnostics));
    text
}

/// One diagnostic in the library's form, with those of its places that lie in its file.
fn report(diagnostic: &Diagnostic, file: Option<FileId>, source: Option<NamedSource<Arc<str>>>) -> Report {
    // The library panics at a place beyond the end.
    let size = source.as_ref().map_or(0, |source| source.inner().len());
    let same = diagnostic.labels.iter().enumerate().filter(|(_, label)| Some(label.span.file) == file);
    let labels: Vec<LabeledSpan> = same
        .map(|(index, label)| {
            let text = Some(inert_line(&label.text)).filter(|text| !text.is_empty());
            let end = (label.span.end as usize).min(size);
            let start = (label.span.start as usize).min(end);
            let length = end - start;
            match index {
                0 => LabeledSpan::new_primary_with_span(text, (start, length)),
                _ => LabeledSpan::new(text, start, length),
            }
        })
        .collect();
    let shown = MietteDiagnostic::new(inert_line(&diagnostic.message))
        .with_code(diagnostic.code.name)
        .with_severity(match diagnostic.severity() {
            Severity::Error => miette::Severity::Error,
            Severity::Warning => miette::Severity::Warning,
        })
        .with_labels(labels);
    let shown = match &diagnostic.help {
        Some(help) => shown.with_help(inert(help)),
        None => shown,
    };
    let report = Report::new(shown);
    match source {
        Some(source) => report.with_source_code(source),
        None => report,
    }
}

/// The text with control characters blanked out, byte for byte, so that places stay true.
fn same_bytes(text: &str) -> String {
    let mut shown = String::with_capacity(text.len());
    for c in text.chars() {
        if c == '\n' || c == '\t' || is_harmless(c) {
            shown.push(c);
        } else {
            shown.extend(std::iter::repeat_n(' ', c.len_utf8()));
        }
    }
    shown
}

fn count(diagnostics: &[Diagnostic]) -> String {
    let errors = diagnostics.iter().filter(|diagnostic| diagnostic.severity() == Severity::Error).count();
    let warnings = diagnostics.len() - errors;
    let number = |count: usize, what: &str| match count {
        0 => None,
        1 => Some(format!("1 {what}")),
        _ => Some(format!("{count} {what}s")),
    };
    let parts: Vec<String> =
        [number(errors, "error"), number(warnings, "warning")].into_iter().flatten().collect();
    let hidden = diagnostics.len().saturating_sub(SHOWN);
    let rest = if hidden > 0 { format!(" (the last {hidden} are not shown)") } else { String::new() };
    if parts.is_empty() { String::new() } else { format!("{}{rest}\n", parts.join(", ")) }
}
