//! Tables, and text made harmless for Markdown.

use crate::report::inert::is_harmful;

/// Which way a column leans.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Lean {
    Left,
    Right,
}

/// A table; cells are Markdown already.
pub struct Table {
    heads: Vec<(String, Lean)>,
    rows: Vec<Vec<String>>,
}

impl Table {
    /// Columns of text (left) come before columns of numbers (right).
    pub fn new(left: &[&str], right: &[String]) -> Self {
        let left = left.iter().map(|head| ((*head).to_owned(), Lean::Left));
        let right = right.iter().map(|head| (head.clone(), Lean::Right));
        Table { heads: left.chain(right).collect(), rows: Vec::new() }
    }

    pub fn row(&mut self, cells: Vec<String>) {
        self.rows.push(cells);
    }

    pub fn is_empty(&self) -> bool {
        self.rows.is_empty()
    }

    pub fn render(&self) -> String {
        let line = |cells: &mut dyn Iterator<Item = &str>| {
            let mut text = String::from("|");
            for cell in cells {
                text.push(' ');
                text.push_str(cell);
                text.push_str(" |");
            }
            text.push('\n');
            text
        };
        let mut text = line(&mut self.heads.iter().map(|(head, _)| head.as_str()));
        text.push('|');
        for (_, lean) in &self.heads {
            text.push_str(if *lean == Lean::Right { "---:|" } else { "---|" });
        }
        text.push('\n');
        for row in &self.rows {
            text.push_str(&line(&mut row.iter().map(String::as_str)));
        }
        text
    }
}

/// Text of a source as plain text within a line or a cell: nothing in it is markup, and nothing
/// breaks the line.
pub fn plain(text: &str) -> String {
    let text = text.trim();
    let mut safe = String::with_capacity(text.len());
    let mut before = None;
    let mut rest = text.chars().peekable();
    // A number at the start of a line would open a list.
    let mut opening = true;
    while let Some(c) = rest.next() {
        let in_word = |c: Option<char>| c.is_some_and(char::is_alphanumeric);
        match c {
            '\n' | '\r' | '\t' => safe.push(' '),
            '<' => safe.push_str("&lt;"),
            '>' => safe.push_str("&gt;"),
            '&' => safe.push_str("&amp;"),
            '\\' | '`' | '*' | '[' | ']' | '|' | '~' | '$' | '#' | '!' | '@' => {
                safe.push('\\');
                safe.push(c);
            }
            // Within a word it is no emphasis on any forge, and reads better bare.
            '_' if !(in_word(before) && in_word(rest.peek().copied())) => safe.push_str("\\_"),
            '-' | '+' | '=' if before.is_none() => {
                safe.push('\\');
                safe.push(c);
            }
            '.' | ')' if opening && before.is_some() => {
                safe.push('\\');
                safe.push(c);
            }
            _ if is_harmful(c) => safe.push('\u{fffd}'),
            _ => safe.push(c),
        }
        opening = opening && c.is_ascii_digit();
        before = Some(c);
    }
    safe
}

/// Text of a source as code within a cell; as plain text where forges differ about what ends a code
/// or a cell.
pub fn code(text: &str) -> String {
    let text = text.trim();
    if text.is_empty() || text.contains(['`', '|', '\\']) {
        return plain(text);
    }
    let text: String = text.chars().map(|c| if is_harmful(c) { ' ' } else { c }).collect();
    format!("`{text}`")
}
