//! `foreign-fact`: a fact that has no place in its block.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "foreign-fact",
    severity: Severity::Error,
    title: "a fact that has no place in its block",
    explanation: "Each kind of block has facts of its own: phases burn and steer, stages have masses, \
        vehicles have a stack.",
    wrong: r"engine Ember {
    thrust     43.0 kN in vacuum
    isp        304 s in vacuum
    exit_area  0.047 m^2
}
stage Sorrel {
    engines     1 of Ember
    dry         290 kg
    propellant  3.1 t
    stack  Sorrel
}
",
    mended: r"engine Ember {
    thrust     43.0 kN in vacuum
    isp        304 s in vacuum
    exit_area  0.047 m^2
}
stage Sorrel {
    engines     1 of Ember
    dry         290 kg
    propellant  3.1 t
}
",
};

pub fn found(span: Span, written: &str, kind: &str, keys: &[&str]) -> Diagnostic {
    let word = written.split_whitespace().next().unwrap_or(written);
    let diagnostic = CODE.at(span, format!("`{word}` has no place in {kind}"), "does not belong here");
    if keys.is_empty() { diagnostic } else { diagnostic.help(format!("{kind} may state: {}", keys.join(", "))) }
}

/// A fact that a thrust curve leaves no room for.
pub fn beside_thrust_curve(span: Span, curve: Span) -> Diagnostic {
    CODE.at(span, "beside a thrust curve stand `isp … in vacuum` and `exit_area`, nothing else", "does not belong here")
        .and(curve, "the thrust is a curve")
}
