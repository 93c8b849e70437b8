//! `ground-impact`: a crash.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "ground-impact",
    severity: Severity::Error,
    title: "the flight reaches the ground on its way down",
    explanation: "Reaching the ground ends the flight, unless the phase ends by `touchdown`.",
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
    phase Fall { coast; until 900 s }
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
    phase Fall { coast; until touchdown }
}
"#,
};

pub fn found(span: Span, phase: &str, time: &str, speed: &str) -> Diagnostic {
    CODE.at(span, format!("the flight hits the ground at {time}, at {speed}"), format!("in `{phase}`"))
        .help("end the phase by `touchdown` if this is meant, or climb more steeply before")
}
