//! `wrong-kind`: the name of something else.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "wrong-kind",
    severity: Severity::Error,
    title: "the name of something else",
    explanation: "The name is defined, but stands for another kind of thing than is needed here.",
    wrong: r"engine Ember {
    thrust     43.0 kN in vacuum
    isp        304 s in vacuum
    exit_area  0.047 m^2
}
stage Sorrel {
    engines     1 of Sorrel
    dry         290 kg
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

/// `wanted` and `found` such as "an engine".
pub fn found(span: Span, name: &str, wanted: &str, found: &str, defined: Span) -> Diagnostic {
    CODE.at(span, format!("`{}` is {found}, not {wanted}", name), format!("{wanted} is needed here"))
        .and(defined, format!("`{}` is defined here", name))
}
