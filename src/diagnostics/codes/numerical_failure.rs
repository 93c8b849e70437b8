//! `numerical-failure`: a flight that the integration cannot follow.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "numerical-failure",
    severity: Severity::Error,
    title: "the flight cannot be computed any further",
    explanation: "A number became infinite or the steps of the integration became too small. That happens at the centre of a body, with forces without bound, or with masses near zero.",
    // A source short enough to read has not been found to break the integration.
    wrong: r#"world Slate { gravity uniform 1.62 m/s^2; surface flat; air none }
engine Tansy { thrust 16 kN in vacuum; isp 320 s in vacuum }
stage Sedge { engines 1 of Tansy; dry 0 kg; propellant 900 kg }
vehicle Heron { stack Sedge; drag none }

mission Hop {
    flies    Heron
    within   Slate
    start    pad altitude 0 m
    payload  0 kg
    phase Up { burn Sedge; steer upright; until Sedge spent }
}
"#,
    mended: r#"world Slate { gravity uniform 1.62 m/s^2; surface flat; air none }
engine Tansy { thrust 16 kN in vacuum; isp 320 s in vacuum }
stage Sedge { engines 1 of Tansy; dry 90 kg; propellant 900 kg }
vehicle Heron { stack Sedge; drag none }

mission Hop {
    flies    Heron
    within   Slate
    start    pad altitude 0 m
    payload  0 kg
    phase Up { burn Sedge; steer upright; until Sedge spent }
}
"#,
};

pub fn found(span: Span, phase: &str, time: &str, detail: &str) -> Diagnostic {
    CODE.at(span, format!("the flight breaks down in `{phase}` at {time}: {detail}"), "flown until then")
        .help("look at the numbers of this phase: a mass, a radius or a force may be far from what is meant")
}
