//! The model as JSON, and the schema of that form.

use super::Model;

/// Pretty JSON with a newline at its end. The checker admits finite numbers only, so none is lost.
pub fn json(model: &Model) -> String {
    pretty(serde_json::to_string_pretty(model))
}

/// JSON Schema of [`json`].
pub fn schema() -> String {
    pretty(serde_json::to_string_pretty(&schemars::schema_for!(Model)))
}

fn pretty(text: serde_json::Result<String>) -> String {
    // invariant: plain structs with text keys always have a JSON form.
    let mut text = text.unwrap_or_default();
    text.push('\n');
    text
}
