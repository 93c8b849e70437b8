//! `impossible-value`: a value that the quantity cannot have.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "impossible-value",
    severity: Severity::Error,
    title: "a value that the quantity cannot have",
    explanation: "Masses, areas and thrusts are not negative, counts are whole numbers, and no number may \
        be beyond the range of floating point.",
    wrong: r"engine Ember {
    thrust     43.0 kN in vacuum
    isp        304 s in vacuum
    exit_area  0.047 m^2
}
stage Sorrel {
    engines     1 of Ember
    dry         -290 kg
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

pub fn found(span: Span, found: &str, expected: &str) -> Diagnostic {
    CODE.at(span, found, format!("expected {expected}"))
}
