//! `missing-line-break`: something after the closing brace of a block on its line.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "missing-line-break",
    severity: Severity::Error,
    title: "something after the closing brace of a block on its line",
    explanation: "A block ends its line, as a fact does. What comes next starts on a line of its own, or \
        after `;` within a block.",
    wrong: "engine Ember {\n    thrust  43 kN in vacuum\n    isp  304 s in vacuum\n\
        \x20   exit_area  0.05 m^2\n} given lean 0.4 deg\n",
    mended: "engine Ember {\n    thrust  43 kN in vacuum\n    isp  304 s in vacuum\n\
        \x20   exit_area  0.05 m^2\n}\ngiven lean 0.4 deg\n",
};

pub fn found(span: Span) -> Diagnostic {
    CODE.at(span, "found more text after the `}` of a block, expected the end of the line", "starts on the same line")
        .help("start a new line after `}`")
}
