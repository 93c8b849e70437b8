//! `burnt-too-early`: a stage lit above another one.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "burnt-too-early",
    severity: Severity::Error,
    title: "a stage burns while one below it is still attached",
    explanation: "Stages burn from the bottom up: those below are shed first. A stage that is lit on purpose before the one below has gone says so with `hot`.",
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
    phase Up { burn Sedge; steer upright; until Sedge spent }
    phase On { burn Rush; steer upright; until 6 s }
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

pub fn found(span: Span, part: &str, below: &str) -> Diagnostic {
    CODE.at(span, format!("`{part}` burns while `{below}` is still below it"), "lit here")
        .help(format!("add `shed {below}` to a phase before, or write `burn {part} hot`"))
}
