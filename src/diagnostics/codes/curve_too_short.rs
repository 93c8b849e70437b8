//! `curve-too-short`: a curve with fewer than two points.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "curve-too-short",
    severity: Severity::Error,
    title: "a curve with fewer than two points",
    explanation: "A curve needs two points at the least, along each of its inputs. A value that does not \
        change is stated as a number instead of a curve.",
    wrong: r"curve RowanDrag {
    mach -> cd
    0.0  0.31
}
",
    mended: r"curve RowanDrag {
    mach -> cd
    0.0  0.31
    0.8  0.34
    2.0  0.45
}
",
};

pub fn found(name: Span, points: usize, column: Option<Span>) -> Diagnostic {
    let count = match points {
        0 => "none",
        _ => "one",
    };
    let diagnostic = CODE.at(name, format!("a curve needs two points at the least, and this has {count}"), "too short");
    match column {
        Some(column) => diagnostic.and(column, "along this input"),
        None => diagnostic,
    }
}
