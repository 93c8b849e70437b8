//! `curve-range`: a drag curve too short for the flight.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "curve-range",
    severity: Severity::Error,
    title: "a curve is read outside its range",
    explanation: "The drag curve ends at a Mach number that the flight goes beyond. A curve that may be read there says how: `beyond hold` keeps its last value, `beyond zero` gives none, `beyond extend` goes on in a straight line.",
    wrong: r#"bring Earth from builtin
engine Wick { thrust 40 kN in vacuum; isp 250 s in vacuum; exit_area 0.05 m^2 }
stage Reed { engines 1 of Wick; dry 150 kg; propellant 300 kg }
curve ReedDrag {
    mach -> cd
    0.0  0.4
    1.5  0.6
}
vehicle Plover { stack Reed; reference_area 0.1 m^2; drag ReedDrag }

mission Heath {
    flies    Plover
    within   Earth
    start    pad latitude 68 deg longitude 21 deg altitude 300 m
    payload  80 kg
    phase Boost { burn Reed; steer upright; until Reed spent }
}
"#,
    mended: r#"bring Earth from builtin
engine Wick { thrust 40 kN in vacuum; isp 250 s in vacuum; exit_area 0.05 m^2 }
stage Reed { engines 1 of Wick; dry 150 kg; propellant 300 kg }
curve ReedDrag {
    beyond  hold
    mach -> cd
    0.0  0.4
    1.5  0.6
}
vehicle Plover { stack Reed; reference_area 0.1 m^2; drag ReedDrag }

mission Heath {
    flies    Plover
    within   Earth
    start    pad latitude 68 deg longitude 21 deg altitude 300 m
    payload  80 kg
    phase Boost { burn Reed; steer upright; until Reed spent }
}
"#,
};

pub fn found(span: Span, read: &str, range: &str, time: &str) -> Diagnostic {
    CODE.at(span, format!("the drag curve is read at {read} at {time}, and ends before"), format!("covers {range}"))
        .help("add rows to the curve, or say `beyond hold`, `beyond zero` or `beyond extend`")
}
