//! `curve-grid`: a curve over two quantities with points left out.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "curve-grid",
    severity: Severity::Error,
    title: "a curve over two quantities with points left out",
    explanation: "A curve over two quantities needs a value for every pair: the rows go through the points \
        of the second input for the first point of the first input, then through the same points \
        again for the next.",
    wrong: r"curve RowanDrag {
    mach, altitude [km] -> cd
    0.0  0   0.31
    0.0  20  0.33
    2.0  0   0.45
}
",
    mended: r"curve RowanDrag {
    mach, altitude [km] -> cd
    0.0  0   0.31
    0.0  20  0.33
    2.0  0   0.45
    2.0  20  0.48
}
",
};

/// `row` is the first row that does not go with the points of the group that starts at `start`.
pub fn found(row: Span, start: Span) -> Diagnostic {
    CODE.at(row, "the rows of this curve do not fill a grid", "this row breaks the grid")
        .and(start, "the points of the second input are those of the rows from here")
        .help("give a row for each pair of points, the second input running fastest")
}
