//! `isp-as-speed`: a specific impulse given as an exhaust speed, or the reverse.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "isp-as-speed",
    severity: Severity::Error,
    title: "a specific impulse given as an exhaust speed, or the reverse",
    explanation: "`isp` is in seconds and `exhaust_speed` in metres a second; the one is the other times \
        g0 = 9.80665 m/s².",
    wrong: r"engine Ember {
    thrust     43.0 kN in vacuum
    isp        2981 m/s in vacuum
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

/// `meant` is the number that the fact named `key` would have.
pub fn found(span: Span, key: &str, written: &str, meant: &str) -> Diagnostic {
    let (is, other) = if key == "isp" { ("a time", "exhaust_speed") } else { ("a speed", "isp") };
    CODE.at(span, format!("`{key}` is {is}, but `{written}` is what `{other}` says"), format!("that makes {key} {meant}"))
        .help(format!("write `{key} {meant}`, or `{other} {written}`"))
}
