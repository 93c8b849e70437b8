//! `stray-brace`: a closing brace that closes nothing.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "stray-brace",
    severity: Severity::Error,
    title: "a closing brace that closes nothing",
    explanation: "Every `}` closes the block that was opened last. This one has no open block left: either \
        it is one too many, or a `{` is missing above.",
    wrong: "engine Ember {\n    thrust  43 kN in vacuum\n    isp  304 s in vacuum\n\
        \x20   exit_area  0.05 m^2\n}\n}\n",
    mended: "engine Ember {\n    thrust  43 kN in vacuum\n    isp  304 s in vacuum\n\
        \x20   exit_area  0.05 m^2\n}\n",
};

pub fn found(span: Span) -> Diagnostic {
    CODE.at(span, "this `}` closes no block", "no block is open here").help("delete it, or open the block with `{`")
}
