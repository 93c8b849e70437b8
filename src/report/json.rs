//! The report as JSON, and the schema of that form.

use super::Report;

/// Pretty JSON with a newline at its end.
pub fn json(report: &Report) -> String {
    // invariant: plain structs with text keys always have a JSON form.
    let mut text = serde_json::to_string_pretty(report).unwrap_or_default();
    text.push('\n');
    text
}

/// JSON Schema of [`json`].
pub fn schema() -> String {
    let mut text = serde_json::to_string_pretty(&schemars::schema_for!(Report)).unwrap_or_default();
    text.push('\n');
    text
}
