//! `not-constant`: a flight quantity where a fixed value is needed.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "not-constant",
    severity: Severity::Error,
    title: "a flight quantity where a fixed value is needed",
    explanation: "The facts of engines, stages, vehicles and worlds, and every `given`, are the same \
        throughout the flight. What changes in flight (`height`, `peak …`, `… at end of …`) \
        stands only in phases, aims, demands and figures.",
    wrong: r"given lean 2 * pitch
",
    mended: r"given lean 2 * 0.18 deg
",
};

pub fn found(span: Span, written: &str) -> Diagnostic {
    CODE.at(span, format!("`{written}` is known only in flight"), "a fixed value is needed here")
}
