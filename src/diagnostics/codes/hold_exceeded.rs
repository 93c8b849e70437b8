//! `hold-exceeded`: a limit that throttling cannot keep.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "hold-exceeded",
    severity: Severity::Warning,
    title: "a hold needs less throttle than the engines can give",
    explanation: "The engines stay at their least throttle and the limit is exceeded. The mission counts as unmet, like one whose demand is.",
    wrong: r#"world Slate { gravity uniform 1.62 m/s^2; surface flat; air none }
engine Tansy { thrust 16 kN in vacuum; isp 320 s in vacuum; throttle 60 % .. 100 % }
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
        hold   acceleration <= 0.3 g0 by throttle
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

pub fn found(span: Span, worst: &str, limit: &str, time: &str) -> Diagnostic {
    let message = format!("the hold is exceeded: {worst} at {time}, against {limit}");
    CODE.at(span, message, "needs less throttle than the engines have")
        .help("lower the engines' least throttle, light fewer engines (`with 1 of 2 engines`), or raise the limit")
}
