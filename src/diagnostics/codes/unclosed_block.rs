//! `unclosed-block`: a block without its closing brace.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "unclosed-block",
    severity: Severity::Error,
    title: "a block without its closing brace",
    explanation: "A block goes from `{` to its own `}`. Where that is missing, the block is taken to end \
        before the next definition, or with the file.",
    wrong: "engine Ember {\n    thrust  43 kN in vacuum\n    isp  304 s in vacuum\n\
        \x20   exit_area  0.05 m^2\n",
    mended: "engine Ember {\n    thrust  43 kN in vacuum\n    isp  304 s in vacuum\n\
        \x20   exit_area  0.05 m^2\n}\n",
};

/// `open` is the brace or the head that opened the block, `end` the place where it was taken to end.
pub fn found(open: Span, end: Span) -> Diagnostic {
    CODE.at(open, "this block is not closed", "opened here")
        .and(end, "a `}` is missing before this")
        .help("close the block with `}` on a line of its own")
}

/// `head` is the block whose brace is probably missing, `brace` the one that it took instead.
pub fn found_within(head: Span, brace: Span) -> Diagnostic {
    CODE.at(head, "this block is not closed", "opened here")
        .and(brace, "closed by this, which is indented for the block around it")
        .help("close the block with `}` on a line of its own")
}
