//! `too-deep`: definitions that lean on each other too deeply.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "too-deep",
    severity: Severity::Error,
    title: "definitions that lean on each other too deeply",
    explanation: "Definitions may rest on others, but not on hundreds of them one above the other; `like` \
        goes 64 deep.",
    wrong: r"engine E0 like E1 { }
engine E1 like E2 { }
engine E2 like E3 { }
engine E3 like E4 { }
engine E4 like E5 { }
engine E5 like E6 { }
engine E6 like E7 { }
engine E7 like E8 { }
engine E8 like E9 { }
engine E9 like E10 { }
engine E10 like E11 { }
engine E11 like E12 { }
engine E12 like E13 { }
engine E13 like E14 { }
engine E14 like E15 { }
engine E15 like E16 { }
engine E16 like E17 { }
engine E17 like E18 { }
engine E18 like E19 { }
engine E19 like E20 { }
engine E20 like E21 { }
engine E21 like E22 { }
engine E22 like E23 { }
engine E23 like E24 { }
engine E24 like E25 { }
engine E25 like E26 { }
engine E26 like E27 { }
engine E27 like E28 { }
engine E28 like E29 { }
engine E29 like E30 { }
engine E30 like E31 { }
engine E31 like E32 { }
engine E32 like E33 { }
engine E33 like E34 { }
engine E34 like E35 { }
engine E35 like E36 { }
engine E36 like E37 { }
engine E37 like E38 { }
engine E38 like E39 { }
engine E39 like E40 { }
engine E40 like E41 { }
engine E41 like E42 { }
engine E42 like E43 { }
engine E43 like E44 { }
engine E44 like E45 { }
engine E45 like E46 { }
engine E46 like E47 { }
engine E47 like E48 { }
engine E48 like E49 { }
engine E49 like E50 { }
engine E50 like E51 { }
engine E51 like E52 { }
engine E52 like E53 { }
engine E53 like E54 { }
engine E54 like E55 { }
engine E55 like E56 { }
engine E56 like E57 { }
engine E57 like E58 { }
engine E58 like E59 { }
engine E59 like E60 { }
engine E60 like E61 { }
engine E61 like E62 { }
engine E62 like E63 { }
engine E63 like E64 { }
engine E64 like E65 { }
engine E65 {
    thrust     43.0 kN in vacuum
    isp        304 s in vacuum
    exit_area  0.047 m^2
}
",
    mended: r"engine E0 like E65 { }
engine E65 {
    thrust     43.0 kN in vacuum
    isp        304 s in vacuum
    exit_area  0.047 m^2
}
",
};

pub fn found(span: Span) -> Diagnostic {
    CODE.at(span, "definitions lean on each other too deeply", "one too many")
}
