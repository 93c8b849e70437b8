//! `curve-header`: columns of a curve that are not named, or too few or too many.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "curve-header",
    severity: Severity::Error,
    title: "columns of a curve that are not named, or too few or too many",
    explanation: "The first line of a table of points names its columns, the inputs before the output, \
        each with its unit in brackets: `time [s],thrust [kN]`. A curve has one input or two, \
        and one output.",
    wrong: r"curve Tail {
    time [s], mach, altitude [km] -> thrust [kN]
    0  0  0  10
    1  0  0  12
}
",
    mended: r"curve Tail {
    time [s] -> thrust [kN]
    0  10
    1  12
}
",
};

/// A file without any line.
pub fn empty(path: Span) -> Diagnostic {
    CODE.at(path, "this table is empty", "nothing stands in this file").help("start it with a line such as `time [s],thrust [kN]`")
}

/// A cell of the first line that is not a name with its unit.
pub fn malformed(cell: Span, text: &str) -> Diagnostic {
    CODE.at(cell, format!("`{text}` does not name a column"), "expected a name and its unit")
        .help("write a name and its unit, such as `time [s]`")
}

pub fn unit_in_row(span: Span) -> Diagnostic {
    CODE.at(span, "the rows of a curve have no units", "leave this out")
        .help("the units stand in the header, such as `time [s] -> thrust [kN]`")
}

/// A header or a row in a curve that has its points from a file.
pub fn beside_file(span: Span, path: Span) -> Diagnostic {
    CODE.at(span, "a curve has its points from a file or states them, not both", "stated here")
        .and(path, "the file has the header and the rows")
}

/// A header with too few columns or too many.
pub fn width(header: Span, columns: usize) -> Diagnostic {
    CODE.at(header, format!("a curve has two columns or three, not {columns}"), "one or two inputs, and one output")
}
