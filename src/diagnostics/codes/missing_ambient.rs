//! `missing-ambient`: a thrust or specific impulse that does not say at which pressure.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "missing-ambient",
    severity: Severity::Error,
    title: "a thrust or specific impulse that does not say at which pressure",
    explanation: "Thrust and specific impulse differ between vacuum and sea level (101325 Pa, on any \
        world), so each says which it is: `in vacuum` or `at sea_level`.",
    wrong: r"engine Ember {
    thrust     43.0 kN in vacuum
    isp        304 s
    exit_area  0.047 m^2
}
",
    mended: r"engine Ember {
    thrust     43.0 kN in vacuum
    isp        304 s in vacuum
    exit_area  0.047 m^2
}
",
};

pub fn found(span: Span, key: &str, choice: &str) -> Diagnostic {
    CODE.at(span, format!("`{key}` does not say at which pressure"), "in vacuum or at sea level?")
        .help(format!("end it with `{choice}`"))
}
