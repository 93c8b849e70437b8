//! `number-without-digits`: a number that lacks digits on one side of its point or in its exponent.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "number-without-digits",
    severity: Severity::Error,
    title: "a number that lacks digits on one side of its point or in its exponent",
    explanation: "A number has digits before its point, after its point, and in its exponent: `0.5`, `5.0`, \
        `1e-3`. There are no separators within the digits.",
    wrong: "given half .5\n",
    mended: "given half 0.5\n",
};

/// `mend` is the number as it should be written, where that is plain.
pub fn found(span: Span, what: &str, mend: Option<&str>) -> Diagnostic {
    let diagnostic = CODE.at(span, what, "not a complete number");
    match mend {
        Some(mend) => diagnostic.help(format!("write `{mend}`")),
        None => diagnostic,
    }
}
