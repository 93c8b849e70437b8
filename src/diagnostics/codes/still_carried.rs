//! `still-carried`: a carrier shed before what it carries.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "still-carried",
    severity: Severity::Error,
    title: "a stage is shed with its strap-ons still attached",
    explanation: "Strap-ons are carried by a stage of the stack, and are let go of before it; stages go from the bottom up.",
    wrong: r#"world Slate { gravity uniform 1.62 m/s^2; surface flat; air none }
engine Tansy { thrust 30 kN in vacuum; isp 320 s in vacuum }
stage Sedge { engines 1 of Tansy; dry 700 kg; propellant 900 kg }
stage Rush { engines 1 of Tansy; dry 500 kg; propellant 400 kg }
vehicle Heron { stack Sedge; beside Sedge Pair 2 of Rush; drag none }

mission Hop {
    flies    Heron
    within   Slate
    start    pad altitude 0 m
    payload  100 kg
    phase Up { burn Sedge, Pair; steer upright; until Pair spent; shed Sedge }
    phase On { coast; until 2 s }
}
"#,
    mended: r#"world Slate { gravity uniform 1.62 m/s^2; surface flat; air none }
engine Tansy { thrust 30 kN in vacuum; isp 320 s in vacuum }
stage Sedge { engines 1 of Tansy; dry 700 kg; propellant 900 kg }
stage Rush { engines 1 of Tansy; dry 500 kg; propellant 400 kg }
vehicle Heron { stack Sedge; beside Sedge Pair 2 of Rush; drag none }

mission Hop {
    flies    Heron
    within   Slate
    start    pad altitude 0 m
    payload  100 kg
    phase Up { burn Sedge, Pair; steer upright; until Pair spent; shed Pair }
    phase On { coast; until 2 s }
}
"#,
};

pub fn found(span: Span, part: &str, carried: &str) -> Diagnostic {
    CODE.at(span, format!("`{part}` still carries `{carried}`"), "shed here").help(format!("shed `{carried}` first"))
}

pub fn below(span: Span, part: &str, below: &str) -> Diagnostic {
    CODE.at(span, format!("`{part}` stands on `{below}`, which is still there"), "shed here")
        .help(format!("shed `{below}` first: stages go from the bottom up"))
}
