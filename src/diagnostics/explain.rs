//! What `explain` shows, written from the codes themselves.

use std::fmt::Write;

use super::{Code, Severity, codes};

/// The page of one code, in Markdown.
pub fn explain(code: &Code) -> String {
    let mut page = format!(
        "# {} ({})\n\n{}.\n\n{}\n",
        code.name,
        word(code.severity),
        capital(code.title),
        code.explanation
    );
    for (heading, source) in [("Brings it up", code.wrong), ("Mended", code.mended)] {
        if !source.is_empty() {
            // Writing into a string cannot fail.
            let _ = write!(page, "\n{heading}:\n\n```wright\n{}\n```\n", source.trim_end());
        }
    }
    page
}

/// All codes with their titles, one a line.
pub fn explain_index() -> String {
    let width = codes::ALL.iter().map(|code| code.name.len()).max().unwrap_or(0);
    let line = |code: &&Code| format!("{:width$}  {:7}  {}\n", code.name, word(code.severity), code.title);
    codes::ALL.iter().map(line).collect()
}

fn word(severity: Severity) -> &'static str {
    match severity {
        Severity::Error => "error",
        Severity::Warning => "warning",
    }
}

fn capital(text: &str) -> String {
    let mut rest = text.chars();
    rest.next().map_or_else(String::new, |first| first.to_uppercase().chain(rest).collect())
}
