//! `burn-or-coast`: a phase whose engines are not spoken of, or twice.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "burn-or-coast",
    severity: Severity::Error,
    title: "a phase that neither burns nor coasts, or does both",
    explanation: "A phase says what its engines do: `burn` and `light` name the parts that burn, `coast` says that none does.",
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
        steer  upright
        until  6 s
    }
    phase Rest {
        until  2 s
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
    phase Rest {
        coast
        until  2 s
    }
}
"#,
};

pub fn neither(span: Span, phase: &str) -> Diagnostic {
    CODE.at(span, format!("`{phase}` neither burns nor coasts"), "what do its engines do?")
        .help("add `burn Bracken`, or `coast`")
}

pub fn both(coast: Span, burn: Span) -> Diagnostic {
    CODE.at(coast, "a phase that burns does not coast", "coasts here").and(burn, "burns here")
        .help("leave out one of the two, or make two phases of it")
}
