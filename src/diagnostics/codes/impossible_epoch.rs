//! `impossible-epoch`: an epoch that is no instant.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "impossible-epoch",
    severity: Severity::Error,
    title: "a date or time that does not exist",
    explanation: "An epoch is an instant of UTC, written as in `2027-05-14T09:30:00Z`.",
    wrong: r#"world Slate { gravity uniform 1.62 m/s^2; surface flat; air none }
engine Tansy { thrust 16 kN in vacuum; isp 320 s in vacuum; throttle 30 % .. 100 % }
stage Sedge { engines 1 of Tansy; dry 1200 kg; propellant 900 kg }
vehicle Heron { stack Sedge; drag none }

mission Hop {
    flies    Heron
    within   Slate
    start    pad altitude 0 m
    payload  100 kg
    epoch    2027-02-30T09:30:00Z
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
    epoch    2027-02-28T09:30:00Z
    phase Up {
        burn   Sedge
        steer  upright
        until  6 s
    }
}
"#,
};

pub fn found(span: Span, why: &str) -> Diagnostic {
    CODE.at(span, "this is no instant of UTC", why).help("write it like `epoch 2027-05-14T09:30:00Z`")
}
