//! `hold-not-by-throttle`: a hold that no throttle can keep.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "hold-not-by-throttle",
    severity: Severity::Error,
    title: "a hold on a quantity that the throttle does not set at once",
    explanation: "A hold throttles so that a quantity stays at its limit. That works for what the thrust sets directly: `acceleration`, `axial_acceleration`, `thrust_to_weight` and `thrust`.",
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
        hold   altitude <= 50 m by throttle
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
        hold   acceleration <= 0.5 g0 by throttle
        until  6 s
    }
}
"#,
};

pub fn found(span: Span, written: &str) -> Diagnostic {
    CODE.at(span, format!("the throttle does not hold `{written}`"), "not set by the thrust directly")
        .help("hold acceleration, axial_acceleration, thrust_to_weight or thrust")
}
