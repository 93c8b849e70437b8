//! `true-at-start`: a phase that ends at its very start.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "true-at-start",
    severity: Severity::Warning,
    title: "a condition that is already true as its phase begins",
    explanation: "The phase ends at once. `rises to` and `falls to` ask for a crossing instead, and wait for it.",
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
    phase Rest { coast; until altitude >= 1 m }
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
    phase Rest { coast; until altitude rises to 110 m or 30 s }
}
"#,
};

pub fn found(span: Span, phase: &str, condition: &str, time: &str) -> Diagnostic {
    let message = format!("`{condition}` is already true as `{phase}` begins, at {time}");
    CODE.at(span, message, "this phase ends at once")
        .help("write `rises to` or `falls to` to wait for a crossing, or another limit")
}
