//! `number-out-of-range`: a number too large to be represented.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "number-out-of-range",
    severity: Severity::Error,
    title: "a number too large to be represented",
    explanation: "Numbers are binary64 values, at most about 1.8e308. Choose a larger unit.",
    wrong: "given huge 1e400\n",
    mended: "given huge 1e40\n",
};

pub fn found(span: Span) -> Diagnostic {
    CODE.at(span, "this number is too large to be represented", "above about 1.8e308")
        .help("choose a larger unit, or check the exponent")
}
