//! `circular-definition`: a definition that depends on itself.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "circular-definition",
    severity: Severity::Error,
    title: "a definition that depends on itself",
    explanation: "A value, or a block defined with `like`, may not be needed to work out itself, neither \
        directly nor by way of others.",
    wrong: r"given lean 2 * tilt
given tilt lean / 2
",
    mended: r"given lean 0.36 deg
given tilt lean / 2
",
};

/// `used` is where the name comes up while it is being worked out.
pub fn found(used: Span, name: &str, defined: Option<Span>) -> Diagnostic {
    let diagnostic = CODE.at(used, format!("`{name}` depends on itself"), "it is needed here to work out itself");
    let diagnostic = match defined {
        Some(defined) => diagnostic.and(defined, "it is defined here"),
        None => diagnostic,
    };
    diagnostic.help("state one of the values in this circle as a number")
}
