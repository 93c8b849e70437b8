//! Looking at words and marks in a text without the grammar.

use crate::source::Span;

/// The word that a piece of a text starts with.
pub(super) fn first(read: &str, piece: Span) -> Option<&str> {
    let text = read.get(piece.range())?;
    let end = text.find(|next: char| !is_name_character(next)).unwrap_or(text.len());
    text.get(..end).filter(|word| is_name(word))
}

/// Whether a text is a name in the sense of the grammar.
pub(super) fn is_name(text: &str) -> bool {
    text.chars().all(is_name_character) && text.starts_with(|first: char| !first.is_ascii_digit())
}

fn is_name_character(character: char) -> bool {
    character.is_ascii_alphanumeric() || character == '_'
}

/// The marks of more than one character.
pub(super) const MARKS: &[&str] = &["->", ">=", "<=", ".."];

/// What a rest of a text starts with: a word, a number, a quoted text or a mark; nothing if the line
/// ends here.
pub(super) fn token(rest: &str) -> &str {
    let is_part = |character: char| character.is_alphanumeric() || character == '_';
    let next = rest.trim_start_matches(' ');
    let len = match rest.chars().next() {
        _ if next.is_empty() || next.starts_with('\n') => 0,
        None => 0,
        Some('"') => closing_quote(rest).unwrap_or(1),
        Some(first) if is_part(first) => rest.find(|next| !is_part(next)).unwrap_or(rest.len()),
        Some(first) => {
            let mark = MARKS.iter().find(|mark| rest.starts_with(**mark));
            mark.map_or(first.len_utf8(), |mark| mark.len())
        }
    };
    rest.get(..len).unwrap_or("")
}

/// The length of the quoted text that a rest starts with, if it is closed on its line.
pub(super) fn closing_quote(rest: &str) -> Option<usize> {
    let mut escaped = false;
    for (at, next) in rest.char_indices().skip(1) {
        match next {
            '\n' => return None,
            '"' if !escaped => return Some(at + 1),
            _ => escaped = next == '\\' && !escaped,
        }
    }
    None
}
