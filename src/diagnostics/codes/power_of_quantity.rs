//! `power-of-quantity`: a power or root of a quantity that has no dimension of its own.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "power-of-quantity",
    severity: Severity::Error,
    title: "a power or root of a quantity that has no dimension of its own",
    explanation: "A quantity with a unit takes whole numbers as exponents, and a square root only where \
        every exponent of its dimension is even.",
    wrong: r"given side (4 m) ^ 1.5
",
    mended: r"given side (4 m) ^ 2
",
};

pub fn found(exponent: Span, base: Span, dimension: &str) -> Diagnostic {
    CODE.at(exponent, format!("{dimension} takes a whole number as its exponent"), "not a whole number that is known here")
        .and(base, format!("this is {dimension}"))
}

pub fn beyond(operator: Span) -> Diagnostic {
    CODE.at(operator, "the dimension of this goes beyond all measure", "an exponent above 100")
}

pub fn no_root(argument: Span, dimension: &str) -> Diagnostic {
    CODE.at(argument, format!("{dimension} has no square root"), format!("this is {dimension}"))
}
