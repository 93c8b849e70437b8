//! `circular-bring`: files that bring each other in a circle.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "circular-bring",
    severity: Severity::Error,
    title: "files that bring each other in a circle",
    explanation: "A file may bring another only if that one does not, directly or through further files, \
        bring it back. Move what both need into a third file that brings neither.",
    wrong: r#"bring Ember from "example.wright"

engine Ember {
    thrust     43.0 kN in vacuum
    isp        304 s in vacuum
    exit_area  0.047 m^2
}
"#,
    mended: r"engine Ember {
    thrust     43.0 kN in vacuum
    isp        304 s in vacuum
    exit_area  0.047 m^2
}
",
};

/// `round` is the way from a file back to itself.
pub fn found(span: Span, round: &[String]) -> Diagnostic {
    CODE.at(span, format!("this closes a circle: {}", round.join(" brings ")), "brought here again")
        .help("move what both need into a file that brings neither")
}
