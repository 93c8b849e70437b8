//! Characters that no report passes on.

/// Controls, and marks that turn the direction of writing or join what looks apart.
pub fn is_harmful(c: char) -> bool {
    c.is_control()
        || matches!(
            c,
            '\u{61c}' | '\u{200b}'..='\u{200f}' | '\u{2028}'..='\u{202e}' | '\u{2060}'..='\u{206f}' | '\u{feff}'
        )
}
