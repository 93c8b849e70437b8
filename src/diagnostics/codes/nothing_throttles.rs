//! `nothing-throttles`: a hold without a throttle.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "nothing-throttles",
    severity: Severity::Warning,
    title: "a hold in a phase whose engines cannot throttle",
    explanation: "A hold works through the throttle. Engines that state no range of throttle burn at full thrust, so the limit is exceeded as soon as it is reached.",
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
    phase Up { burn Sedge; steer upright; hold acceleration <= 5 g0 by throttle; until Sedge spent; shed Sedge }
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

pub fn found(span: Span, phase: &str) -> Diagnostic {
    CODE.at(span, format!("no engine that burns in `{phase}` can throttle"), "holds a limit by throttle")
        .help("give an engine a range, such as `throttle 60 % .. 100 %`, or leave the hold out")
}

pub fn coast(span: Span, phase: &str) -> Diagnostic {
    CODE.at(span, format!("no engine burns in `{phase}`"), "throttles nothing").help("leave the throttle out")
}
