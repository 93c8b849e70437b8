//! `impulse-mismatch`: a thrust curve that does not burn what the stage carries.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "impulse-mismatch",
    severity: Severity::Warning,
    title: "a thrust curve that does not burn what the stage carries",
    explanation: "A thrust curve and a specific impulse together say how much propellant is burnt. If that \
        is more than 2 % away from the usable propellant of the stage, one of the three is \
        likely to be wrong.",
    wrong: r"curve Push {
    time [s] -> thrust [kN]
    0   10
    20  10
}

engine Alder {
    thrust     Push in vacuum
    isp        270 s in vacuum
    exit_area  0.02 m^2
}

stage Booster {
    engines     1 of Alder
    dry         20 kg
    propellant  60 kg
}
",
    mended: r"curve Push {
    time [s] -> thrust [kN]
    0   10
    20  10
}

engine Alder {
    thrust     Push in vacuum
    isp        270 s in vacuum
    exit_area  0.02 m^2
}

stage Booster {
    engines     1 of Alder
    dry         20 kg
    propellant  75.5 kg
}
",
};

pub fn found(span: Span, curve: &str, burnt: &str, usable: &str, defined: Option<Span>) -> Diagnostic {
    let message = format!("the thrust curve `{curve}` burns {burnt}, and the stage carries {usable} of usable propellant");
    let diagnostic = CODE.at(span, message, "loaded here");
    match defined {
        Some(defined) => diagnostic.and(defined, "the thrust is defined here"),
        None => diagnostic,
    }
}
