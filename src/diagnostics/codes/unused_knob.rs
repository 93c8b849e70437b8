//! `unused-knob`: a knob that turns nothing.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "unused-knob",
    severity: Severity::Error,
    title: "a knob on a value that nothing uses",
    explanation: "The value has a name, but no fact of the vehicle, no phase and nothing that is asked of the \
        mission names it, so that turning it changes nothing.",
    wrong: r#"world Slate { gravity uniform 1.62 m/s^2; surface flat; air none }
engine Tansy { thrust 16 kN in vacuum; isp 320 s in vacuum; throttle 30 % .. 100 % }
stage Sedge { engines 1 of Tansy; dry 1200 kg; propellant 900 kg }
vehicle Heron { stack Sedge; drag none }

mission Hop {
    flies    Heron
    within   Slate
    start    pad altitude 0 m
    payload  100 kg
    given    slope  70 deg
    phase Up {
        burn   Sedge
        steer  pitch 70 deg heading 0 deg
        until  6 s
    }
    knob     slope  between 60 deg and 80 deg
}
"#,
    mended: r#"world Slate { gravity uniform 1.62 m/s^2; surface flat; air none }
engine Tansy { thrust 16 kN in vacuum; isp 320 s in vacuum; throttle 30 % .. 100 % }
stage Sedge { engines 1 of Tansy; dry 1200 kg; propellant 900 kg }
vehicle Heron { stack Sedge; drag none }

mission Hop {
    flies    Heron
    within   Slate
    start    pad altitude 0 m
    payload  100 kg
    given    slope  70 deg
    phase Up {
        burn   Sedge
        steer  pitch slope heading 0 deg
        until  6 s
    }
    knob     slope  between 60 deg and 80 deg
}
"#,
};

pub fn found(span: Span, path: &str, defined: Span) -> Diagnostic {
    CODE.at(span, format!("nothing in this mission uses `{path}`"), "freed here").and(defined, "stated here")
        .help(format!("name `{path}` where its value is meant, or leave the knob out"))
}
