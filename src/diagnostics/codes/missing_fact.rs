//! `missing-fact`: a block without a fact that it needs.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "missing-fact",
    severity: Severity::Error,
    title: "a block without a fact that it needs",
    explanation: "Nothing that shapes a flight is made up in silence. What may be left out has a default \
        that the report lists; what has none has to be stated.",
    wrong: r"engine Ember {
    thrust     43.0 kN in vacuum
    isp        304 s in vacuum
    exit_area  0.047 m^2
}
stage Sorrel {
    engines     1 of Ember
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

/// `kind` such as "a stage", `what` such as "its dry mass".
pub fn found(span: Span, name: &str, kind: &str, what: &str, example: &str) -> Diagnostic {
    CODE.at(span, format!("`{}` lacks {what}", name), format!("{kind} has to state it"))
        .help(format!("add `{example}`"))
}

pub fn no_value(key: Span, what: &str, example: &str) -> Diagnostic {
    CODE.at(key, format!("{what} has no value"), "a value has to follow").help(format!("write it like `{example}`"))
}

pub fn no_word(key: Span, kind: &str, words: &[&str]) -> Diagnostic {
    CODE.at(key, format!("{kind} has to follow"), "says nothing").help(format!("it is one of: {}", words.join(", ")))
}

/// A fact that another one needs beside it.
pub fn beside(span: Span, what: &str, example: &str) -> Diagnostic {
    CODE.at(span, format!("this needs {what}"), "stated without it").help(format!("add `{example}`"))
}

/// An engine, in a mission with air, of which only the vacuum is known.
pub fn sea_level(span: Span, engine: &str, flies: Span) -> Diagnostic {
    let message = format!("`{}` says nothing about sea level, and this mission has air", engine);
    CODE.at(span, message, "how much of its thrust does the pressure of the air take?")
        .and(flies, "it flies here")
        .help("add `exit_area`, or a thrust or isp `at sea_level`")
}

/// A vehicle, in a mission with air, of which the drag is not known.
pub fn drag(span: Span, vehicle: &str, flies: Span) -> Diagnostic {
    CODE.at(span, format!("`{}` says nothing about drag, and this mission has air", vehicle), "what is its drag?")
        .and(flies, "it flies here")
        .help("add `reference_area` and `drag`, or `drag none`")
}
