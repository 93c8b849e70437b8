//! `objective-without-knob`: an objective without knobs.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "objective-without-knob",
    severity: Severity::Warning,
    title: "an objective, and nothing to move towards it",
    explanation: "`most` and `least` say what the knobs are moved for. Without a knob nothing can be moved.",
    wrong: r#"world Slate { gravity uniform 1.62 m/s^2; surface flat; air none }
engine Tansy { thrust 16 kN in vacuum; isp 320 s in vacuum; throttle 30 % .. 100 % }
stage Sedge { engines 1 of Tansy; dry 1200 kg; propellant 900 kg }
vehicle Heron { stack Sedge; drag none }

mission Hop {
    flies    Heron
    within   Slate
    start    pad altitude 0 m
    payload  100 kg
    phase Up {
        burn   Sedge
        steer  upright
        until  6 s
    }
    most    altitude at end of Up
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
    given    tilt  2 deg
    phase Up {
        burn   Sedge
        steer  pitch 90 deg - tilt heading 0 deg
        until  6 s
    }
    knob    tilt between 0 deg and 9 deg
    most    altitude at end of Up
}
"#,
};

pub fn found(span: Span) -> Diagnostic {
    CODE.at(span, "this mission has no knobs", "nothing can be moved towards it")
        .help("free a fact: `knob payload between 0 kg and 400 kg`")
}
