//! `outside-project`: a path that is refused.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "outside-project",
    severity: Severity::Error,
    title: "a path that is refused",
    explanation: "A source reaches only the files of its own project, so paths are relative, joined by \
        `/`, and never lead above the project's folder.",
    wrong: r#"bring Ember from "../elsewhere/ember.wright"
"#,
    mended: r"engine Ember {
    thrust     43.0 kN in vacuum
    isp        304 s in vacuum
    exit_area  0.047 m^2
}
",
};

pub fn found(span: Span, path: &str, why: &str) -> Diagnostic {
    CODE.at(span, format!("`{path}` is refused: {why}"), "not a path within the project")
}
