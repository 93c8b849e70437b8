//! `impossible-orbit`: elements that no orbit has.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "impossible-orbit",
    severity: Severity::Error,
    title: "a start from an orbit that does not exist",
    explanation: "The perigee is not above the apogee and not below the ground, an inclination lies between 0 deg and 180 deg, and a flat world has no orbits. Perigee and apogee are altitudes above the equatorial radius.",
    wrong: r#"bring Moon from builtin
engine Tansy { thrust 16 kN in vacuum; isp 320 s in vacuum }
stage Sedge { engines 1 of Tansy; dry 1200 kg; propellant 900 kg }
vehicle Heron { stack Sedge; drag none }

mission Raise {
    flies    Heron
    within   Moon
    start    orbit perigee 180 km apogee 100 km inclination 30 deg node 0 deg argument 0 deg anomaly 0 deg
    payload  100 kg
    phase Up { burn Sedge; steer along motion; until 6 s }
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
}
"#,
};

pub fn found(span: Span, why: &str) -> Diagnostic {
    CODE.at(span, "this orbit does not exist", why)
        .help("perigee and apogee are altitudes above the equatorial radius, the perigee the lower one")
}
