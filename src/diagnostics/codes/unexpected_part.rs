//! `unexpected-part`: a part of a fact that does not belong to it.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "unexpected-part",
    severity: Severity::Error,
    title: "a part of a fact that does not belong to it",
    explanation: "A fact has a value and, some of them, a word, a second value after `..`, `in vacuum` or \
        `at sea_level`, or named values behind it (`dry 290 kg growth 12 %`).",
    wrong: r"engine Ember {
    thrust     43.0 kN in vacuum
    isp        304 s in vacuum
    exit_area  0.047 m^2
}
stage Sorrel {
    engines     1 of Ember
    dry         290 kg
    propellant  3.1 t growth 2 %
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

/// `part` in words or quotes; `arguments` are the named values that may follow.
pub fn found(span: Span, part: &str, key: &str, example: &str, arguments: &[&str]) -> Diagnostic {
    let diagnostic = CODE.at(span, format!("{part} does not belong to `{key}`"), "not part of this fact");
    if arguments.is_empty() {
        diagnostic.help(format!("write it like `{example}`"))
    } else {
        diagnostic.help(format!("write it like `{example}`; it may be followed by: {}", arguments.join(", ")))
    }
}
