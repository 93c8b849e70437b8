//! `too-many-facts`: a file with too many facts.
//!
//! The example of what is wrong would be too long: the test repeats it over the limit.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "too-many-facts",
    severity: Severity::Error,
    title: "a file with too many facts",
    explanation: "A file may hold 200,000 facts and definitions, so that any text is read in bounded time \
        and memory. What comes after is left out. Spread the definitions over several files and \
        `bring` them, or put the rows of a long curve into a file of their own with `from`.",
    wrong: "given a 1\n",
    mended: "given a 1\n",
};

pub fn found(span: Span, limit: usize) -> Diagnostic {
    CODE.at(span, format!("more than {limit} facts stand in this file"), "nothing is read from here on")
        .help("spread the definitions over several files and `bring` them")
}
