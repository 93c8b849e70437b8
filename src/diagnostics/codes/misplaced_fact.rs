//! `misplaced-fact`: a fact outside every block.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "misplaced-fact",
    severity: Severity::Error,
    title: "a fact outside every block",
    explanation: "A fact belongs to something: it stands between the braces of an engine, a stage, a \
        vehicle, a mission or another block. Outside every block stand only `bring`, `unit`, \
        `given` and the blocks themselves. A brace that closes its block too early is a common \
        cause.",
    wrong: "thrust  43 kN in vacuum\n",
    mended: "engine Ember {\n    thrust  43 kN in vacuum\n    isp  304 s in vacuum\n\
        \x20   exit_area  0.05 m^2\n}\n",
};

pub fn found(span: Span) -> Diagnostic {
    CODE.at(span, "this fact stands outside every block", "belongs to no block")
        .help("put it between the braces of the block that it belongs to")
}
