//! `operator-needs-blanks`: an operator without a blank on each side.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "operator-needs-blanks",
    severity: Severity::Error,
    title: "an operator without a blank on each side",
    explanation: "In arithmetic `+ - * / ^` have a blank on both sides: `a - b`. Without blanks `/ * ^` join \
        the factors of a unit (`m/s`), and a `-` directly before a value is its sign (`longitude \
        -11.6 deg`).",
    wrong: "given a 3 m\ngiven b a-1 m\n",
    mended: "given a 3 m\ngiven b a - 1 m\n",
};

pub fn found(span: Span, operator: &str) -> Diagnostic {
    CODE.at(span, format!("the operator `{operator}` needs a blank on both sides"), "blank missing here")
        .help(format!("write ` {operator} `"))
}
