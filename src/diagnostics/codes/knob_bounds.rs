//! `knob-bounds`: a knob outside its bounds, or with none.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "knob-bounds",
    severity: Severity::Error,
    title: "bounds that do not hold the knob",
    explanation: "A knob frees a fact that is stated in the source, between a lower and an upper bound; the stated value lies between them, because that is where a search begins.",
    wrong: r#"world Slate { gravity uniform 1.62 m/s^2; surface flat; air none }
engine Tansy { thrust 16 kN in vacuum; isp 320 s in vacuum; throttle 30 % .. 100 % }
stage Sedge { engines 1 of Tansy; dry 1200 kg; propellant 900 kg }
vehicle Heron { stack Sedge; drag none }

mission Hop {
    flies    Heron
    within   Slate
    start    pad altitude 0 m
    payload  100 kg
    given    tilt  2 deg
    phase Up {
        burn   Sedge
        steer  pitch 90 deg - tilt heading 0 deg
        until  6 s
    }
    knob    tilt between 4 deg and 9 deg
}
"#,
    mended: r#"world Slate { gravity uniform 1.62 m/s^2; surface flat; air none }
engine Tansy { thrust 16 kN in vacuum; isp 320 s in vacuum; throttle 30 % .. 100 % }
stage Sedge { engines 1 of Tansy; dry 1200 kg; propellant 900 kg }
vehicle Heron { stack Sedge; drag none }

mission Hop {
    flies    Heron
    within   Slate
    start    pad altitude 0 m
    payload  100 kg
    given    tilt  2 deg
    phase Up {
        burn   Sedge
        steer  pitch 90 deg - tilt heading 0 deg
        until  6 s
    }
    knob    tilt between 0 deg and 9 deg
}
"#,
};

pub fn empty(span: Span) -> Diagnostic {
    CODE.at(span, "no value lies between these bounds", "the lower bound is not below the upper one")
        .help("write the lower bound first")
}

pub fn outside(value: Span, path: &str, written: &str, bounds: Span) -> Diagnostic {
    CODE.at(bounds, format!("`{path}` is {written}, outside its bounds"), "the bounds of the knob")
        .and(value, "the value stands here")
        .help("widen the bounds, or change the value")
}

pub fn not_stated(span: Span, path: &str) -> Diagnostic {
    CODE.at(span, format!("nobody states `{path}`"), "follows from other facts, or is a default")
        .help("state it in its block, so that there is a value to change")
}
