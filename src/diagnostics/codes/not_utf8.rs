//! `not-utf8`: a file that is not UTF-8 text.
//!
//! The example shows the nearest text: the test builds the bytes.

use crate::diagnostics::{Code, Diagnostic, Severity};
use crate::source::Span;

pub static CODE: Code = Code {
    name: "not-utf8",
    severity: Severity::Error,
    title: "a file that is not UTF-8 text",
    explanation: "Source files are UTF-8. Editors call the other encodings Latin-1, Windows-1252 or UTF-16; \
        save the file again as UTF-8.",
    wrong: "given a 1 # �\n",
    mended: "given a 1\n",
};

pub fn found(span: Span, byte: u8) -> Diagnostic {
    CODE.at(span, format!("the byte 0x{byte:02X} is not UTF-8 text"), "from here on")
        .help("save the file as UTF-8")
}
