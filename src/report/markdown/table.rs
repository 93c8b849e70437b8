//! Tables, and text made harmless for Markdown.

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
    let mut safe = String::with_capacity(text.len());
    for c in text.chars() {
        match c {
            '\n' | '\r' | '\t' => safe.push(' '),
            '<' => safe.push_str("&lt;"),
            '>' => safe.push_str("&gt;"),
            '&' => safe.push_str("&amp;"),
            // A word with underscores inside is no emphasis on any forge, and reads better bare.
            '\\' | '`' | '*' | '[' | ']' | '|' | '~' | '$' | '#' | '!' | '@' => {
                safe.push('\\');
                safe.push(c);
            }
            _ if c.is_control() || is_turning(c) => safe.push('\u{fffd}'),
            _ => safe.push(c),
        }
    }
    safe
}

/// Text of a source as code within a cell.
pub fn code(text: &str) -> String {
    let harmless = |c: char| match c {
        '`' => '\'',
        _ if c.is_control() || is_turning(c) => ' ',
        _ => c,
    };
    let text: String = text.chars().map(harmless).collect();
    // A pipe ends a cell even within code, unless it is escaped.
    format!("`{}`", text.trim().replace('|', "\\|"))
}

/// Marks that turn the direction of writing, or join what looks apart.
fn is_turning(c: char) -> bool {
    matches!(c, '\u{61c}' | '\u{200b}'..='\u{200f}' | '\u{2028}'..='\u{202e}' | '\u{2060}'..='\u{206f}' | '\u{feff}')
}
