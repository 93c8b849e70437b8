//! `unreachable-inclination`: a plane that does not pass over the start.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "unreachable-inclination",
    severity: Severity::Warning,
    title: "an inclination below the latitude of the start",
    explanation: "A flight that does not turn out of its plane passes over its start, so its orbit is inclined at least as much as the latitude there. Less is reached only by a costly turn.",
    wrong: r#"bring Moon from builtin
engine Tansy { thrust 16 kN in vacuum; isp 320 s in vacuum }
stage Sedge { engines 1 of Tansy; dry 1200 kg; propellant 900 kg }
vehicle Heron { stack Sedge; drag none }

mission Raise {
    flies    Heron
    within   Moon
    start    pad latitude 40 deg longitude 0 deg altitude 0 m
    payload  100 kg
    phase Up { burn Sedge; steer pitch 60 deg heading 90 deg; until 90 s }
    demand   inclination at end of Up <= 12 deg
}
"#,
    mended: r#"bring Moon from builtin
engine Tansy { thrust 16 kN in vacuum; isp 320 s in vacuum }
stage Sedge { engines 1 of Tansy; dry 1200 kg; propellant 900 kg }
vehicle Heron { stack Sedge; drag none }

mission Raise {
    flies    Heron
    within   Moon
    start    pad latitude 40 deg longitude 0 deg altitude 0 m
    payload  100 kg
    phase Up { burn Sedge; steer pitch 60 deg heading 90 deg; until 90 s }
    demand   inclination at end of Up <= 60 deg
}
"#,
};

pub fn found(span: Span, wanted: &str, latitude: &str) -> Diagnostic {
    let message = format!("an inclination of {wanted} is below the latitude of the start, {latitude}");
    CODE.at(span, message, "asked for here").help("ask for an inclination of at least the latitude, or plan a turn")
}
