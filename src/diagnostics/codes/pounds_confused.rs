//! `pounds-confused`: pounds of force for pounds of mass, or the reverse.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "pounds-confused",
    severity: Severity::Error,
    title: "pounds of force for pounds of mass, or the reverse",
    explanation: "`lbf` is the weight of `lbm` under standard gravity. Thrusts are in `lbf`, masses in \
        `lbm`.",
    wrong: r"engine Ember {
    thrust     43.0 kN in vacuum
    isp        304 s in vacuum
    exit_area  0.047 m^2
}
stage Sorrel {
    engines     1 of Ember
    dry         640 lbf
    propellant  3.1 t
}
",
    mended: r"engine Ember {
    thrust     43.0 kN in vacuum
    isp        304 s in vacuum
    exit_area  0.047 m^2
}
stage Sorrel {
    engines     1 of Ember
    dry         640 lbm
    propellant  3.1 t
}
",
};

/// `mend` is the unit that was meant.
pub fn found(span: Span, what: &str, written: &str, found: &str, expected: &str, mend: &str) -> Diagnostic {
    CODE.at(span, format!("{what} is {expected}, but `{written}` is {found}"), format!("this is {found}"))
        .help(format!("pounds of mass are `lbm`, pounds of force `lbf`: write `{mend}`"))
}
