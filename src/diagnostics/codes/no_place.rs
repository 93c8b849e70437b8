//! `no-place`: a quantity that a whole flight has many values of.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "no-place",
    severity: Severity::Error,
    title: "a flight quantity without its place in the flight",
    explanation: "A demand, an aim and a figure speak of the flight as a whole, so a quantity says where in the flight it is meant: its `peak`, or its value `at start of` or `at end of` a phase.",
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
    demand  altitude >= 20 m
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
    phase Up {
        burn   Sedge
        steer  upright
        until  6 s
    }
    demand  altitude at end of Up >= 20 m
}
"#,
};

pub fn found(span: Span, written: &str, phase: Option<&str>) -> Diagnostic {
    let phase = phase.unwrap_or("Climb");
    CODE.at(span, format!("where in the flight is `{written}` meant?"), "changes all the time")
        .help(format!("write `peak {written}`, or `{written} at end of {phase}`"))
}
