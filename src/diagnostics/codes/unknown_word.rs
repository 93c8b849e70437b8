//! `unknown-word`: a word that is not one of those that may stand here.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "unknown-word",
    severity: Severity::Error,
    title: "a word that is not one of those that may stand here",
    explanation: "Some facts are told by a word, such as `air none` or `kind linear`.",
    wrong: r"curve RowanDrag {
    kind  linnear
    mach -> cd
    0.0  0.31
    0.8  0.34
    2.0  0.45
}
",
    mended: r"curve RowanDrag {
    kind  linear
    mach -> cd
    0.0  0.31
    0.8  0.34
    2.0  0.45
}
",
};

/// `kind` such as "a kind of air"; `words` are those that may stand here.
pub fn found(span: Span, word: &str, kind: &str, words: &[&str]) -> Diagnostic {
    CODE.at(span, format!("`{}` is not {kind}", word), "unknown here")
        .help(format!("it is one of: {}", words.join(", ")))
}
