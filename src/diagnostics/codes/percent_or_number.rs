//! `percent-or-number`: a percentage where a number was meant, or the reverse.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "percent-or-number",
    severity: Severity::Error,
    title: "a percentage where a number was meant, or the reverse",
    explanation: "Some pure numbers are shares and are written in percent (`growth 8 %`); others are \
        counts or coefficients and are written bare (`engines 7 of Ember`).",
    wrong: r"engine Ember {
    thrust     43.0 kN in vacuum
    isp        304 s in vacuum
    exit_area  0.047 m^2
}
stage Sorrel {
    engines     1 of Ember
    dry         290 kg growth 0.12
    propellant  3.1 t
}
",
    mended: r"engine Ember {
    thrust     43.0 kN in vacuum
    isp        304 s in vacuum
    exit_area  0.047 m^2
}
stage Sorrel {
    engines     1 of Ember
    dry         290 kg growth 12 %
    propellant  3.1 t
}
",
};

/// A bare number for a share; `percent` is the same number in percent.
pub fn bare(span: Span, what: &str, written: &str, percent: &str) -> Diagnostic {
    CODE.at(span, format!("{what} is written in percent, but `{written}` is a bare number"), "percent is meant here")
        .help(format!("write `{written} %`, or `{percent} %` if {written} is the share"))
}

/// A percentage for a number; `number` is the same share as a bare number.
pub fn percent(span: Span, what: &str, written: &str, number: &str) -> Diagnostic {
    CODE.at(span, format!("{what} is a number, but `{written}` is a percentage"), "a bare number is meant here")
        .help(format!("`{written}` is {number}"))
}
