//! `duplicate-name`: one name for two things.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "duplicate-name",
    severity: Severity::Error,
    title: "one name for two things",
    explanation: "Within a file, and within what a mission uses, every block and every `given` has a name \
        of its own, because facts are addressed by it (`Sorrel.dry`). So do the parts of a \
        vehicle, by which phases burn and shed them.",
    wrong: r"engine Ember {
    thrust     43.0 kN in vacuum
    isp        304 s in vacuum
    exit_area  0.047 m^2
}
engine Ember {
    thrust     27.0 kN in vacuum
    isp        304 s in vacuum
    exit_area  0.047 m^2
}
",
    mended: r"engine Ember {
    thrust     43.0 kN in vacuum
    isp        304 s in vacuum
    exit_area  0.047 m^2
}
engine EmberV {
    thrust     27.0 kN in vacuum
    isp        304 s in vacuum
    exit_area  0.047 m^2
}
",
};

pub fn found(span: Span, name: &str, first: Span) -> Diagnostic {
    CODE.at(span, format!("`{name}` is defined twice"), "defined again here").and(first, "first defined here")
}

/// Two definitions of one name, in different files, that one mission uses.
pub fn in_one_mission(span: Span, name: &str, first: Span) -> Diagnostic {
    CODE.at(span, format!("a mission uses two different `{name}`"), "one is defined here")
        .and(first, "the other is defined here")
        .help("rename one of them: the addresses of their facts would be the same")
}

/// A unit of a name that is taken, perhaps by a built-in one.
pub fn unit(span: Span, name: &str) -> Diagnostic {
    CODE.at(span, format!("there is a unit `{name}` already, or the name is kept back"), "defined again here")
        .help("choose another name")
}

/// Two parts of a vehicle of one name.
pub fn part(span: Span, name: &str, first: Span) -> Diagnostic {
    CODE.at(span, format!("`{name}` stands twice in this vehicle"), "stands again here")
        .and(first, "first stands here")
        .help(format!("define a second one by difference, such as `stage {name}B like {name} {{ }}`"))
}

/// A figure of the name of a flight quantity.
pub fn quantity(span: Span, name: &str) -> Diagnostic {
    CODE.at(span, format!("`{name}` is a flight quantity already"), "named again here")
        .help("choose another name, so that a formula can tell them apart")
}
