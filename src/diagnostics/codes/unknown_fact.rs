//! `unknown-fact`: a fact that no block of this kind has.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "unknown-fact",
    severity: Severity::Error,
    title: "a fact that no block of this kind has",
    explanation: "Each kind of block has a fixed list of facts; the nearest of them is offered.",
    wrong: r"engine Ember {
    thrust     43.0 kN in vacuum
    isp        304 s in vacuum
    exit_area  0.047 m^2
}
stage Sorrel {
    engines     1 of Ember
    drey        290 kg
    propellant  3.1 t
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

pub fn found(span: Span, key: &str, kind: &str, keys: &[&str], nearest: Option<&str>) -> Diagnostic {
    let diagnostic = CODE.at(span, format!("{kind} has no fact `{}`", key), "unknown");
    let list = keys.join(", ");
    match nearest {
        Some(near) => diagnostic.help(format!("did you mean `{near}`? {kind} may state: {list}")),
        None => diagnostic.help(format!("{kind} may state: {list}")),
    }
}
