//! `already-shed`: a part that burns or is shed after it was shed.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "already-shed",
    severity: Severity::Error,
    title: "something is used after it was let go of",
    explanation: "A part that has been shed is gone: it cannot burn, and it cannot be shed again.",
    wrong: r#"world Slate { gravity uniform 1.62 m/s^2; surface flat; air none }
engine Tansy { thrust 30 kN in vacuum; isp 320 s in vacuum; restarts 0 }
stage Sedge { engines 1 of Tansy; dry 700 kg; propellant 900 kg }
stage Rush { engines 1 of Tansy; dry 500 kg; propellant 400 kg }
vehicle Heron { stack Sedge, Rush; drag none }

mission Hop {
    flies    Heron
    within   Slate
    start    pad altitude 0 m
    payload  100 kg
    phase Up { burn Sedge; steer upright; until Sedge spent; shed Sedge }
    phase On { burn Rush; steer upright; until 6 s }
    phase Again { burn Sedge; steer upright; until 6 s }
}
"#,
    mended: r#"world Slate { gravity uniform 1.62 m/s^2; surface flat; air none }
engine Tansy { thrust 30 kN in vacuum; isp 320 s in vacuum; restarts 0 }
stage Sedge { engines 1 of Tansy; dry 700 kg; propellant 900 kg }
stage Rush { engines 1 of Tansy; dry 500 kg; propellant 400 kg }
vehicle Heron { stack Sedge, Rush; drag none }

mission Hop {
    flies    Heron
    within   Slate
    start    pad altitude 0 m
    payload  100 kg
    phase Up { burn Sedge; steer upright; until Sedge spent; shed Sedge }
    phase On { burn Rush; steer upright; until 6 s }
}
"#,
};

pub fn found(span: Span, part: &str, shed: Span) -> Diagnostic {
    CODE.at(span, format!("`{part}` burns after it was shed"), "it is gone by now").and(shed, "shed here")
        .help("burn a part that is still there, or shed this one later")
}

pub fn twice(span: Span, part: &str, shed: Span) -> Diagnostic {
    CODE.at(span, format!("`{part}` is shed twice"), "it is gone by now").and(shed, "first shed here")
        .help("leave out one of the two")
}
