//! `throttle-out-of-range`: a commanded throttle outside the range of an engine.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "throttle-out-of-range",
    severity: Severity::Error,
    title: "a throttle that the engine cannot give",
    explanation: "The throttle of a phase lies within the range that its engines state with `throttle LEAST .. MOST`; an engine that states none burns at 100 %.",
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
        throttle  20 %
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
        throttle  70 %
        until  6 s
    }
}
"#,
};

pub fn found(span: Span, written: &str, range: &str) -> Diagnostic {
    CODE.at(span, format!("the throttle cannot be {written}"), format!("expected {range}"))
        .help("change the throttle of the phase, or the range of the engine")
}
