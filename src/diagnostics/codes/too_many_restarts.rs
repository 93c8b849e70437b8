//! `too-many-restarts`: more burns than the engine has lights.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "too-many-restarts",
    severity: Severity::Error,
    title: "lit more often than its engine allows",
    explanation: "Phases in a row that burn a part are one burn. After a phase that does not burn it, it is lit again, and its engine says with `restarts` how often that may be.",
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
    phase Up { burn Sedge; steer upright; until 3 s }
    phase Drift { coast; until 1 s }
    phase Again { burn Sedge; steer upright; until Sedge spent; shed Sedge }
    phase On { burn Rush; steer upright; until 6 s }
}
"#,
    mended: r#"world Slate { gravity uniform 1.62 m/s^2; surface flat; air none }
engine Tansy { thrust 30 kN in vacuum; isp 320 s in vacuum; restarts 1 }
stage Sedge { engines 1 of Tansy; dry 700 kg; propellant 900 kg }
stage Rush { engines 1 of Tansy; dry 500 kg; propellant 400 kg }
vehicle Heron { stack Sedge, Rush; drag none }

mission Hop {
    flies    Heron
    within   Slate
    start    pad altitude 0 m
    payload  100 kg
    phase Up { burn Sedge; steer upright; until 3 s }
    phase Drift { coast; until 1 s }
    phase Again { burn Sedge; steer upright; until Sedge spent; shed Sedge }
    phase On { burn Rush; steer upright; until 6 s }
}
"#,
};

pub fn found(span: Span, part: &str, allowed: u32, before: Span) -> Diagnostic {
    let times = match allowed {
        0 => "its engine cannot be lit again".to_owned(),
        1 => "its engine can be lit again once".to_owned(),
        _ => format!("its engine can be lit again {allowed} times"),
    };
    CODE.at(span, format!("`{part}` is lit too often: {times}"), "lit again here")
        .and(before, "lit before here")
        .help("burn it in phases in a row, or raise `restarts` of its engine")
}
