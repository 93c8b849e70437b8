//! `inconsistent-world`: facts of a world that do not go together.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "inconsistent-world",
    severity: Severity::Error,
    title: "facts of a world that do not go together",
    explanation: "Uniform gravity goes with a flat surface; central gravity with an `equatorial_radius` \
        and, if wanted, `j2` and `flattening`.",
    wrong: r"world Slate {
    gravity  uniform 1.62 m/s^2
    equatorial_radius  1737.4 km
    air      none
}
",
    mended: r"world Slate {
    gravity  uniform 1.62 m/s^2
    surface  flat
    air      none
}
",
};

pub fn found(span: Span, message: &str, (other, label): (Span, &str)) -> Diagnostic {
    CODE.at(span, message, "does not go with the other").and(other, label)
}
