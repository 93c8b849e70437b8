//! `shed-while-burning`: a part let go of in the middle of its burn.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "shed-while-burning",
    severity: Severity::Error,
    title: "a part is shed while it burns",
    explanation: "A part that burns is first cut off: by its own end, or by the end of the phase that burns it.",
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
    phase Up { burn Sedge; steer upright; shed Sedge when altitude >= 20 m; until altitude >= 90 m }
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

/// `lit` is where it was lit.
pub fn found(span: Span, part: &str, lit: Option<Span>) -> Diagnostic {
    let found = CODE.at(span, format!("`{part}` is shed while it burns"), "let go of in this phase, which burns it");
    let found = match lit {
        Some(lit) => found.and(lit, "lit here"),
        None => found,
    };
    found.help(format!("shed it at the phase's end (`shed {part}`), when it is spent (`shed {part} when {part} spent`), or in a later phase"))
}
