//! `never-ends`: a condition that the flight never meets.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "never-ends",
    severity: Severity::Error,
    title: "a phase goes on and on",
    explanation: "None of the conditions of the phase came true within 400 days of flight.",
    wrong: r#"bring Moon from builtin
engine Tansy { thrust 16 kN in vacuum; isp 320 s in vacuum }
stage Sedge { engines 1 of Tansy; dry 1200 kg; propellant 900 kg }
vehicle Heron { stack Sedge; drag none }

mission Raise {
    flies    Heron
    within   Moon
    start    orbit perigee 80 km apogee 100 km inclination 30 deg node 0 deg argument 0 deg anomaly 0 deg
    payload  100 kg
    phase Up { burn Sedge; steer along motion; until 6 s }
    phase Wait { coast; until altitude >= 900 km }
}
"#,
    mended: r#"bring Moon from builtin
engine Tansy { thrust 16 kN in vacuum; isp 320 s in vacuum }
stage Sedge { engines 1 of Tansy; dry 1200 kg; propellant 900 kg }
vehicle Heron { stack Sedge; drag none }

mission Raise {
    flies    Heron
    within   Moon
    start    orbit perigee 80 km apogee 100 km inclination 30 deg node 0 deg argument 0 deg anomaly 0 deg
    payload  100 kg
    phase Up { burn Sedge; steer along motion; until 6 s }
    phase Wait { coast; until 90 minute }
}
"#,
};

pub fn found(span: Span, phase: &str, after: &str) -> Diagnostic {
    CODE.at(span, format!("`{phase}` does not end: nothing of this came true in {after}"), "waited for here")
        .help("add a condition that comes true, such as a duration: `or 90 minute`")
}
