//! Text of unknown origin made harmless for terminals and pages.

/// The text with control characters, escape sequences and marks that turn the direction of writing
/// replaced by visible stand-ins. Each stand-in is one column wide; tabs and line ends stay.
pub fn inert(text: &str) -> String {
    text.chars().map(|c| if c == '\n' || c == '\t' { c } else { harmless(c) }).collect()
}

/// The same for one line: line ends and tabs become blanks.
pub fn inert_line(text: &str) -> String {
    text.chars().map(|c| if matches!(c, '\n' | '\r' | '\t') { ' ' } else { harmless(c) }).collect()
}

/// Whether a character is shown as it is; tabs and line ends are not.
pub(super) fn is_harmless(c: char) -> bool {
    harmless(c) == c
}

fn harmless(c: char) -> char {
    match c {
        // The control pictures of Unicode stand in the order of the controls.
        '\0'..='\u{1f}' => char::from_u32(0x2400 + c as u32).unwrap_or('\u{fffd}'),
        '\u{7f}' => '\u{2421}',
        '\u{80}'..='\u{9f}'
        | '\u{61c}'
        | '\u{200b}'..='\u{200f}'
        | '\u{2028}'..='\u{202e}'
        | '\u{2060}'..='\u{206f}'
        | '\u{feff}' => '\u{fffd}',
        _ => c,
    }
}
