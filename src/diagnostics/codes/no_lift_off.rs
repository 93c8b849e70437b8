//! `no-lift-off`: a vehicle heavier than its thrust.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "no-lift-off",
    severity: Severity::Error,
    title: "the thrust does not lift the vehicle",
    explanation: "A start from a pad is at full thrust; the thrust at the pressure of the pad has to exceed the weight.",
    wrong: r#"world Slate { gravity uniform 1.62 m/s^2; surface flat; air none }
engine Tansy { thrust 16 kN in vacuum; isp 320 s in vacuum; throttle 30 % .. 100 % }
stage Sedge { engines 1 of Tansy; dry 1200 kg; propellant 900 kg }
vehicle Heron { stack Sedge; drag none }

mission Hop {
    flies    Heron
    within   Slate
    start    pad altitude 0 m
    payload  9 t
    phase Up {
        burn   Sedge
        steer  upright
        until  6 s
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
        until  6 s
    }
}
"#,
};

pub fn found(span: Span, thrust: &str, weight: &str) -> Diagnostic {
    CODE.at(span, format!("no lift-off: the thrust of {thrust} does not exceed the weight of {weight}"), "burns here")
        .help("light more engines, or carry less")
}
