//! `nesting-limit`: brackets nested too deeply.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "nesting-limit",
    severity: Severity::Error,
    title: "brackets nested too deeply",
    explanation: "At most 64 brackets of any kind may be open at once, so that any text is read in bounded \
        time and memory. The line that goes deeper is left out.",
    wrong: "given deep (((((((((((((((((((((((((((((((((((((((((((((((((((((((((((((((((1)))))))))))))))))))))))))))))))))))))))))))))))))))))))))))))))))\n",
    mended: "given deep (1)\n",
};

pub fn found(span: Span, limit: usize) -> Diagnostic {
    CODE.at(span, format!("more than {limit} brackets are open here"), "this one is too deep")
        .help("give the inner part a name with `given`")
}

/// For a caller on a thread with too little stack for even 64 levels.
pub fn without_stack(span: Span) -> Diagnostic {
    CODE.at(span, "too little stack is left here to read nested text", "not read")
}
