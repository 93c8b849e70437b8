//! `curve-order`: rows of a curve that are out of order.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "curve-order",
    severity: Severity::Error,
    title: "rows of a curve that are out of order",
    explanation: "The first column of a curve rises from row to row; with two inputs the second rises \
        within each value of the first. A jump is written as two points close together.",
    wrong: r"curve RowanDrag {
    mach -> cd
    0.0  0.31
    0.8  0.34
    0.8  0.36
    2.0  0.45
}
",
    mended: r"curve RowanDrag {
    mach -> cd
    0.0  0.31
    0.8  0.34
    0.801  0.36
    2.0  0.45
}
",
};

/// `value` is the point as written, `before` the row before it.
pub fn found(span: Span, value: &str, before: Span, equal: bool) -> Diagnostic {
    let fault = if equal { "stands there twice" } else { "is less than in the row before" };
    CODE.at(span, format!("the rows of a curve have to rise, but {value} {fault}"), "out of order")
        .and(before, "the row before")
        .help("sort the rows, and keep one of those at the same point")
}
