//! `repeated-fact`: a fact that is given twice.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "repeated-fact",
    severity: Severity::Error,
    title: "a fact that is given twice",
    explanation: "Each fact stands once in its block. To change an inherited one, state it in the block \
        that is `like` the other.",
    wrong: r"engine Ember {
    thrust     43.0 kN in vacuum
    isp        304 s in vacuum
    exit_area  0.047 m^2
}
stage Sorrel {
    engines     1 of Ember
    dry         290 kg
    dry         310 kg
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

pub fn found(span: Span, what: &str, first: Span) -> Diagnostic {
    CODE.at(span, format!("`{what}` is given twice"), "given again here").and(first, "first given here")
}
