//! `angle-out-of-range`: a pitch, heading, latitude or longitude out of its range.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "angle-out-of-range",
    severity: Severity::Error,
    title: "an angle that no direction has",
    explanation: "A pitch and a latitude lie between -90 deg and 90 deg; a heading and a longitude between -360 deg and 360 deg. Beyond the vertical, a pitch is one on the opposite heading.",
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
        steer  pitch 95 deg heading 10 deg
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
        steer  pitch 85 deg heading 190 deg
        until  6 s
    }
}
"#,
};

pub fn found(span: Span, what: &str, written: &str, most: f64) -> Diagnostic {
    CODE.at(span, format!("{what} cannot be {written}"), format!("expected -{most} deg to {most} deg"))
        .help("check the number and its unit: an angle is written like `12 deg` or `0.2 rad`")
}
