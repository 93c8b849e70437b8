//! `unexpected-text`: text that does not fit the grammar at its place.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "unexpected-text",
    severity: Severity::Error,
    title: "text that does not fit the grammar at its place",
    explanation: "The text is read line by line: each fact has its own form, which the reference shows. The \
        message says what was found and what can stand in its place. Only the broken line is left \
        out; everything after it is read and checked as usual.",
    wrong: "engine Ember {\n    thrust  43 kN in vacuum\n    isp  304 s in a vacuum\n\
        \x20   exit_area  0.05 m^2\n}\n",
    mended: "engine Ember {\n    thrust  43 kN in vacuum\n    isp  304 s in vacuum\n\
        \x20   exit_area  0.05 m^2\n}\n",
};

/// `found` and `expected` are in human words, such as "the end of the line" and "a name".
pub fn found(span: Span, found: &str, expected: &str) -> Diagnostic {
    CODE.at(span, format!("found {found}, expected {expected}"), format!("expected {expected}"))
}
