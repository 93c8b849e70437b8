//! `engine-count`: a count of engines that is not that of the stage.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "engine-count",
    severity: Severity::Error,
    title: "engines that the part does not have",
    explanation: "`burn Bracken with 6 of 7 engines` lights six of the seven engines that the stage has; both numbers are checked against it.",
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
        burn   Sedge with 2 of 3 engines
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
        burn   Sedge with 1 of 1 engines
        steer  upright
        until  6 s
    }
}
"#,
};

pub fn found(span: Span, part: &str, carried: &str) -> Diagnostic {
    let engines = if carried == "1" { "engine" } else { "engines" };
    CODE.at(span, format!("`{part}` has {carried} {engines}"), "not a number of its engines")
        .help(format!("write `with N of {carried} engines`, N not above {carried}"))
}

/// A part without engines that is to burn.
pub fn none(span: Span, part: &str) -> Diagnostic {
    CODE.at(span, format!("`{part}` has no engines"), "nothing here can burn").help("burn a stage that has engines")
}
