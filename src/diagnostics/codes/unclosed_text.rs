//! `unclosed-text`: a quoted text without its closing quote.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "unclosed-text",
    severity: Severity::Error,
    title: "a quoted text without its closing quote",
    explanation: "A quoted text starts and ends with `\"` on the same line. Within it `\\\"` is a quote and \
        `\\\\` a backslash.",
    wrong: "engine Ember {\n    thrust  43 kN in vacuum\n    isp  304 s in vacuum  because \"test 3\n\
        \x20   exit_area  0.05 m^2\n}\n",
    mended: "engine Ember {\n    thrust  43 kN in vacuum\n    isp  304 s in vacuum  because \"test 3\"\n\
        \x20   exit_area  0.05 m^2\n}\n",
};

pub fn found(span: Span) -> Diagnostic {
    CODE.at(span, "this text has no closing quote", "opened here").help("end it with `\"` on the same line")
}
