//! `missing-unit`: a bare number where a quantity has a unit.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "missing-unit",
    severity: Severity::Error,
    title: "a bare number where a quantity has a unit",
    explanation: "Every physical quantity carries its unit. Bare numbers stand only where a fact has no \
        dimension.",
    wrong: r"engine Ember {
    thrust     43.0 kN in vacuum
    isp        304 s in vacuum
    exit_area  0.047 m^2
}
stage Sorrel {
    engines     1 of Ember
    dry         290
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
    dry         290 kg
    propellant  3.1 t
}
",
};

/// `units` are some that would do.
pub fn found(span: Span, what: &str, written: &str, expected: &str, units: &[&str]) -> Diagnostic {
    let diagnostic = CODE.at(span, format!("{what} is {expected}, but `{written}` has no unit"), "a unit has to follow");
    match units.first() {
        Some(unit) => diagnostic.help(format!("write its unit, such as `{written} {unit}`; it may be {}", units.join(", "))),
        None => diagnostic,
    }
}
