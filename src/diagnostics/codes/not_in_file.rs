//! `not-in-file`: a name that the other file does not define.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "not-in-file",
    severity: Severity::Error,
    title: "a name that the other file does not define",
    explanation: "`bring` takes what the other file itself defines; what that file brings from a third has \
        to be brought from there.",
    wrong: r"bring Erth from builtin
",
    mended: r"bring Earth from builtin
",
};

pub fn found(span: Span, name: &str, file: &str, nearest: Option<&str>) -> Diagnostic {
    let diagnostic = CODE.at(span, format!("`{file}` does not define `{}`", name), "cannot be brought");
    match nearest {
        Some(near) => diagnostic.help(format!("did you mean `{near}`?")),
        None => diagnostic,
    }
}
