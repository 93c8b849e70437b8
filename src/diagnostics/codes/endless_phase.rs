//! `endless-phase`: conditions that cannot come true.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "endless-phase",
    severity: Severity::Error,
    title: "a phase that can never end",
    explanation: "A phase ends when one of its conditions comes true. `P spent` comes true only in a phase in which P burns.",
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
    phase Rest { coast; until Sedge spent }
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
    phase Rest { coast; until 2 s }
}
"#,
};

pub fn found(span: Span, phase: &str, part: &str) -> Diagnostic {
    CODE.at(span, format!("`{phase}` never ends"), format!("`{part}` does not burn in this phase"))
        .help("add a condition that comes true, such as a duration: `until 6 s`")
}
