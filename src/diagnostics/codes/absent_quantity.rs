//! `absent-quantity`: a quantity that the world or the vehicle does not have.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "absent-quantity",
    severity: Severity::Error,
    title: "a quantity that this flight never has",
    explanation: "Orbital elements exist around a body with central gravity, latitude and longitude over an ellipsoid, Mach number, dynamic pressure and heating where there is air, and `left` of a part that carries propellant and has not been shed.",
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
    demand  peak mach <= 2
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
    demand  peak ground_speed <= 200 m/s
}
"#,
};

/// `why` says what is missing; `because` is the place that makes it so.
pub fn found(span: Span, written: &str, why: &str, because: Option<Span>) -> Diagnostic {
    let diagnostic = CODE.at(span, format!("this flight never has `{written}`"), why);
    match because {
        Some(place) => diagnostic.and(place, "chosen here").help("ask for another quantity, or fly in another world"),
        None => diagnostic,
    }
}

/// Something of a part that has been shed before.
pub fn after_shed(span: Span, part: &str, shed: Span) -> Diagnostic {
    CODE.at(span, format!("`{part}` is gone by then"), "asks after it").and(shed, "shed here")
        .help(format!("ask at an earlier place, or shed `{part}` later"))
}
