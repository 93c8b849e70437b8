//! `contradiction`: facts of an engine that do not agree.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "contradiction",
    severity: Severity::Error,
    title: "facts of an engine that do not agree",
    explanation: "Thrust, specific impulse, mass flow and exit area follow from each other. Where more is \
        stated than is needed, the surplus has to agree within half a unit of the last digit \
        written. Each fact is shown with the value that the others give it: mend the wrong one, \
        or leave one out.",
    wrong: r"engine Ember {
    thrust     43.0 kN in vacuum
    isp        304 s in vacuum
    exit_area  0.047 m^2
    mass_flow  15.9 kg/s
}
",
    mended: r"engine Ember {
    thrust     43.0 kN in vacuum
    isp        304 s in vacuum
    exit_area  0.047 m^2
    mass_flow  14.4 kg/s
}
",
};

/// Each place with what the other facts make of it.
pub fn found(first: &(Span, String), rest: &[(Span, String)]) -> Diagnostic {
    let message = "these facts of an engine contradict each other";
    let diagnostic = rest.iter().fold(CODE.at(first.0, message, first.1.clone()), |all, (span, text)| {
        all.and(*span, text.clone())
    });
    diagnostic.help("mend the wrong one, or leave out one that follows from the others")
}
