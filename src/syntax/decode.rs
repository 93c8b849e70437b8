//! Bytes to text.

use crate::diagnostics::Diagnostic;
use crate::diagnostics::codes::not_utf8;
use crate::source::{FileId, Span};

/// A file that is not UTF-8: the text with `�` for what cannot be read, and the diagnostic, whose
/// place is true in that text.
#[derive(Clone, Debug)]
pub struct NotUtf8 {
    pub lossy: String,
    pub diagnostic: Diagnostic,
}

/// The text of a file. A byte-order mark stays in it, so that places stay true; [`super::parse`]
/// passes over it.
///
/// # Errors
/// [`NotUtf8`] with the place of the first byte that is not UTF-8.
pub fn decode(file: FileId, bytes: &[u8]) -> Result<String, NotUtf8> {
    match std::str::from_utf8(bytes) {
        Ok(text) => Ok(text.to_owned()),
        Err(error) => {
            let at = error.valid_up_to();
            let span = Span::new(file, at, at + char::REPLACEMENT_CHARACTER.len_utf8());
            let byte = bytes.get(at).copied().unwrap_or_default();
            let lossy = String::from_utf8_lossy(bytes).into_owned();
            Err(NotUtf8 { lossy, diagnostic: not_utf8::found(span, byte) })
        }
    }
}
