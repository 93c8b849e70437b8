//! `curve-width`: a row of a curve with too few or too many values.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "curve-width",
    severity: Severity::Error,
    title: "a row of a curve with too few or too many values",
    explanation: "Each row of a curve has one value for each column of its header.",
    wrong: r"curve RowanDrag {
    mach -> cd
    0.0  0.31
    0.8  0.34  0.36
    2.0  0.45
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

pub fn found(row: Span, values: usize, columns: usize, header: Span) -> Diagnostic {
    let plural = if values == 1 { "" } else { "s" };
    CODE.at(row, format!("this row has {values} value{plural}, where the header has {columns} columns"), "wrong width")
        .and(header, "the header")
}
