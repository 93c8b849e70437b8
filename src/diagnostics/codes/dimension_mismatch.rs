//! `dimension-mismatch`: quantities of different kinds where they have to be of the same.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "dimension-mismatch",
    severity: Severity::Error,
    title: "quantities of different kinds where they have to be of the same",
    explanation: "Every fact has a dimension, and so have the two sides of `+`, `-` and of a comparison. \
        Angles are a dimension of their own: where a formula needs a pure number, divide the \
        angle by `1 rad`.",
    wrong: r"engine Ember {
    thrust     43.0 kN in vacuum
    isp        304 s in vacuum
    exit_area  0.047 m^2
}
stage Sorrel {
    engines     1 of Ember
    dry         290 kN
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

/// `what` has to be `expected`, but `written` is `found`; both in the words of the trade.
pub fn found(span: Span, what: &str, written: &str, found: &str, expected: &str) -> Diagnostic {
    CODE.at(span, format!("{what} has to be {expected}, but `{written}` is {found}"), format!("this is {found}"))
}

/// Two sides that do not go together.
pub fn sides(operator: Span, left: (Span, &str), right: (Span, &str)) -> Diagnostic {
    let message = format!("{} and {} do not go together", left.1, right.1);
    CODE.at(left.0, message, format!("this is {}", left.1))
        .and(right.0, format!("this is {}", right.1))
        .and(operator, "both sides have to be of the same kind")
}
