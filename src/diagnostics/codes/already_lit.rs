//! `already-lit`: something lit twice in one phase.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "already-lit",
    severity: Severity::Error,
    title: "something is lit that burns already",
    explanation: "A part listed by `burn` is lit from the start of the phase to its end, and phases in a row that burn a part are one burn. `light` is for what is lit later in the phase.",
    wrong: r#"world Slate { gravity uniform 1.62 m/s^2; surface flat; air none }
engine Tansy { thrust 16 kN in vacuum; isp 320 s in vacuum; throttle 30 % .. 100 % }
stage Sedge { engines 1 of Tansy; dry 1200 kg; propellant 900 kg }
vehicle Heron { stack Sedge; drag none }

mission Hop {
    flies    Heron
    within   Slate
    start    pad altitude 0 m
    payload  100 kg
    phase Up {
        burn   Sedge
        light  Sedge at 2 s
        steer  upright
        until  6 s
    }
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
    phase Up {
        burn   Sedge
        steer  upright
        until  6 s
    }
}
"#,
};

pub fn found(span: Span, part: &str, first: Span) -> Diagnostic {
    CODE.at(span, format!("`{part}` burns already"), "lit a second time here")
        .and(first, "lit here")
        .help("leave it out of `burn` if it is to be lit later, or leave out the second")
}
