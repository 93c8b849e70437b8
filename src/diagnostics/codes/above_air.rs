//! `above-air`: a flight out of the model of the air.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "above-air",
    severity: Severity::Warning,
    title: "the flight goes above the top of the air",
    explanation: "Above its top a model of the air knows none: there is no drag and no heating from there on.",
    wrong: r#"bring Earth from builtin
engine Tansy { thrust 40 kN in vacuum; isp 320 s in vacuum; exit_area 0.4 m^2 }
stage Sedge { engines 1 of Tansy; dry 200 kg; propellant 1900 kg }
vehicle Heron { stack Sedge; drag none }

mission Raise {
    flies    Heron
    within   Earth
    start    orbit perigee 900 km apogee 990 km inclination 30 deg node 0 deg argument 0 deg anomaly 0 deg
    payload  100 kg
    phase Up { burn Sedge; steer along motion; until apogee >= 1500 km }
    phase Climb { coast; until apex }
}
"#,
    mended: r#"bring Earth from builtin
engine Tansy { thrust 40 kN in vacuum; isp 320 s in vacuum; exit_area 0.4 m^2 }
stage Sedge { engines 1 of Tansy; dry 200 kg; propellant 1900 kg }
vehicle Heron { stack Sedge; drag none }

mission Raise {
    flies    Heron
    within   Earth
    start    orbit perigee 300 km apogee 400 km inclination 30 deg node 0 deg argument 0 deg anomaly 0 deg
    payload  100 kg
    phase Up { burn Sedge; steer along motion; until apogee >= 600 km }
    phase Climb { coast; until apex }
}
"#,
};

pub fn found(span: Span, world: &str, top: &str, time: &str) -> Diagnostic {
    let message = format!("above {top} the model of `{world}` knows no air, from {time} on");
    CODE.at(span, message, "flies higher than its air").help("nothing to mend where drag does not matter up there")
}
