//! `unfit-curve`: a curve of other quantities than its use needs.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "unfit-curve",
    severity: Severity::Error,
    title: "a curve of other quantities than its use needs",
    explanation: "A thrust curve gives a force over `time`. A drag curve gives a pure number over `mach`, \
        and if wanted over `altitude` or `angle_of_attack` as well.",
    wrong: r"curve RowanDrag {
    mach -> cd
    0.0  0.31
    0.8  0.34
    2.0  0.45
}
engine Ember {
    thrust     RowanDrag in vacuum
    isp        304 s in vacuum
    exit_area  0.047 m^2
}
",
    mended: r"curve Push {
    time [s] -> thrust [kN]
    0  43
    9  43
}
engine Ember {
    thrust     Push in vacuum
    isp        304 s in vacuum
    exit_area  0.047 m^2
}
",
};

/// `use_` says for what the curve is used, `header` how its header would begin.
pub fn found(span: Span, curve: &str, use_: &str, header: &str) -> Diagnostic {
    CODE.at(span, format!("`{curve}` cannot give {use_}"), "used here").help(format!("its header would be `{header}`"))
}
