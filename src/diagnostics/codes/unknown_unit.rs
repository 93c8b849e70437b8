//! `unknown-unit`: a unit that nobody knows.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "unknown-unit",
    severity: Severity::Error,
    title: "a unit that nobody knows",
    explanation: "A unit follows its number; its factors are joined by `/`, `*` and `^` without blanks, \
        such as `W/m^2`. A file may define units of its own: `unit smoot = 1.7018 m`.",
    wrong: r"engine Ember {
    thrust     43.0 kN in vacuum
    isp        304 s in vacuum
    exit_area  0.047 m^2
}
stage Sorrel {
    engines     1 of Ember
    dry         290 kgs
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

pub fn found(span: Span, unit: &str, why: &str, help: String) -> Diagnostic {
    CODE.at(span, format!("`{unit}` is not a unit: {why}"), "not a unit").help(help)
}
