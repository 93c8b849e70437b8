//! `numerical-failure`: a flight that the integration cannot follow.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "numerical-failure",
    severity: Severity::Error,
    title: "the flight cannot be computed any further",
    explanation: "A number became infinite or the steps of the integration became too small. That happens at the centre of a body, with forces without bound, or with masses near zero.",
    wrong: r#"world Speck { gravity central 4e14 m^3/s^2; equatorial_radius 0.001 m; air none }
engine Tansy { thrust 16 kN in vacuum; isp 320 s in vacuum }
stage Sedge { engines 1 of Tansy; dry 1200 kg; propellant 900 kg }
vehicle Heron { stack Sedge; drag none }

mission Drop {
    flies    Heron
    within   Speck
    start    state x 100 km y 0 km z 0 km vx -9 km/s vy 0 km/s vz 0 km/s
    payload  100 kg
    phase Fall { coast; until 6 hour }
}
"#,
    mended: r#"world Speck { gravity central 4e14 m^3/s^2; equatorial_radius 0.001 m; air none }
engine Tansy { thrust 16 kN in vacuum; isp 320 s in vacuum }
stage Sedge { engines 1 of Tansy; dry 1200 kg; propellant 900 kg }
vehicle Heron { stack Sedge; drag none }

mission Drop {
    flies    Heron
    within   Speck
    start    state x 7000 km y 0 km z 0 km vx 0 km/s vy 7.5 km/s vz 0 km/s
    payload  100 kg
    phase Up { burn Sedge; steer along motion; until 6 s }
}
"#,
};

pub fn found(span: Span, phase: &str, time: &str, detail: &str) -> Diagnostic {
    CODE.at(span, format!("the flight breaks down in `{phase}` at {time}: {detail}"), "flown until then")
        .help("look at the numbers of this phase: a mass, a radius or a force may be far from what is meant")
}
