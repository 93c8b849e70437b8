//! `ran-dry`: a burn that outlasts its propellant.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "ran-dry",
    severity: Severity::Error,
    title: "the propellant is gone before the phase ends",
    explanation: "The last part that burns has come down to its reserve, and none of the conditions of the phase says what then.",
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
        until  altitude >= 900 km
    }
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
        until  altitude >= 900 km or Sedge spent
    }
}
"#,
};

pub fn found(span: Span, part: &str, phase: &str, time: &str) -> Diagnostic {
    CODE.at(span, format!("`{part}` runs dry at {time}, before `{phase}` ends"), "none of this has come true")
        .help(format!("add `or {part} spent`, or carry more propellant"))
}
