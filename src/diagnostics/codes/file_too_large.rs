//! `file-too-large`: a file over the size limit.
//!
//! The example of what is wrong would be too long: the test repeats it over the limit.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "file-too-large",
    severity: Severity::Error,
    title: "a file over the size limit",
    explanation: "A source file may hold 4 MiB of text, so that any text is read in bounded time and memory. \
        Put the rows of a long curve into a file of their own with `from`, or spread the \
        definitions over several files.",
    wrong: "given a 1\n",
    mended: "given a 1\n",
};

pub fn found(span: Span, size: usize, limit: usize) -> Diagnostic {
    CODE.at(span, format!("this file has {size} bytes, the limit is {limit}"), "nothing of it was read")
        .help("spread the definitions over several files and `bring` them")
}
