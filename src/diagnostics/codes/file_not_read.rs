//! `file-not-read`: a file that is missing or cannot be read.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "file-not-read",
    severity: Severity::Error,
    title: "a file that is missing or cannot be read",
    explanation: "A path in `bring` or `from` counts from the folder of the file that it stands in.",
    wrong: r#"bring Ember from "absent.wright"
"#,
    mended: r"engine Ember {
    thrust     43.0 kN in vacuum
    isp        304 s in vacuum
    exit_area  0.047 m^2
}
",
};

pub fn found(span: Span, path: &str, reason: &str) -> Diagnostic {
    CODE.at(span, format!("`{path}` cannot be read: {reason}"), "wanted here")
        .help("a path counts from the folder of the file that it stands in")
}
