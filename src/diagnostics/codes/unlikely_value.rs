//! `unlikely-value`: a value that is possible, but hardly meant.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "unlikely-value",
    severity: Severity::Warning,
    title: "a value that is possible, but hardly meant",
    explanation: "The value is far outside of what is usual; check its unit.",
    wrong: r"engine Ember {
    thrust     43.0 kN in vacuum
    isp        3040 s in vacuum
    exit_area  0.047 m^2
}
",
    mended: r"engine Ember {
    thrust     43.0 kN in vacuum
    isp        304 s in vacuum
    exit_area  0.047 m^2
}
",
};

pub fn found(span: Span, what: &str, usual: &str) -> Diagnostic {
    CODE.at(span, format!("{what} is hardly meant"), "check the number and its unit").help(usual)
}
