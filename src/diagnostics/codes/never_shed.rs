//! `never-shed`: a shed that does not happen.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "never-shed",
    severity: Severity::Warning,
    title: "a condition for shedding that never comes true",
    explanation: "The part is carried to the end of the flight, or until another phase sheds it.",
    wrong: r#"world Slate { gravity uniform 1.62 m/s^2; surface flat; air none }
engine Tansy { thrust 16 kN in vacuum; isp 320 s in vacuum; throttle 30 % .. 100 % }
stage Sedge { engines 1 of Tansy; dry 1200 kg; propellant 900 kg }
vehicle Heron { stack Sedge; drag none; shroud Calyx 20 kg }

mission Hop {
    flies    Heron
    within   Slate
    start    pad altitude 0 m
    payload  100 kg
    phase Up {
        burn   Sedge
        steer  upright
        shed   Calyx when altitude >= 900 km
        until  6 s
    }
}
"#,
    mended: r#"world Slate { gravity uniform 1.62 m/s^2; surface flat; air none }
engine Tansy { thrust 16 kN in vacuum; isp 320 s in vacuum; throttle 30 % .. 100 % }
stage Sedge { engines 1 of Tansy; dry 1200 kg; propellant 900 kg }
vehicle Heron { stack Sedge; drag none; shroud Calyx 20 kg }

mission Hop {
    flies    Heron
    within   Slate
    start    pad altitude 0 m
    payload  100 kg
    phase Up {
        burn   Sedge
        steer  upright
        shed   Calyx when altitude >= 20 m
        until  6 s
    }
}
"#,
};

pub fn found(span: Span, part: &str, phase: &str) -> Diagnostic {
    CODE.at(span, format!("`{part}` is not shed: the condition never comes true in `{phase}`"), "its mass is carried on")
        .help("ease the condition, or shed it at the phase's end")
}
