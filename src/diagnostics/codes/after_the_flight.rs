//! `after-the-flight`: a peak or a state of another phase where the present is needed.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "after-the-flight",
    severity: Severity::Error,
    title: "a value that is known only after the flight, where one is needed during it",
    explanation: "A `peak`, a state `at end of` a phase and a `figure` are known once the whole flight is. What ends a phase, sheds a part or steers can only look at the present.",
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
        until  altitude >= peak altitude
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
        until  altitude >= 20 m
    }
}
"#,
};

pub fn found(span: Span, written: &str) -> Diagnostic {
    CODE.at(span, format!("`{written}` is known only after the flight"), "needed during the flight")
        .help("compare the quantity itself with a limit, such as `altitude >= 20 km`")
}
