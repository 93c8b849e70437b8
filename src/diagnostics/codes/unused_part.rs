//! `unused-part`: propellant that is never burnt.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "unused-part",
    severity: Severity::Warning,
    title: "a stage that no phase burns",
    explanation: "A stage with engines and propellant that never burns is carried as dead mass.",
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
    phase On { coast; until 6 s }
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

pub fn found(span: Span, part: &str) -> Diagnostic {
    CODE.at(span, format!("no phase burns `{part}`"), "flies it all the same")
        .help(format!("add a phase with `burn {part}`, or leave the part out of the vehicle"))
}
