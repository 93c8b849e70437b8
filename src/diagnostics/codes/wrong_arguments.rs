//! `wrong-arguments`: a function with too few or too many values.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "wrong-arguments",
    severity: Severity::Error,
    title: "a function with too few or too many values",
    explanation: "`least` and `greatest` take one value or more, every other function takes one.",
    wrong: r"given lean sin(3 deg, 4 deg)
",
    mended: r"given lean sin(3 deg)
",
};

pub fn found(span: Span, function: &str, given: usize, several: bool) -> Diagnostic {
    let takes = if several { "one value or more" } else { "one value" };
    CODE.at(span, format!("`{}` takes {takes}, not {given}", function), "called here")
}
