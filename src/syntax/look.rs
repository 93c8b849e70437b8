//! The second look: one broken piece alone, to find the exact place and what could have stood there.

use pest::Parser;
use pest::error::{ErrorVariant, InputLocation};

use super::rules::{Grammar, Rule};
use super::{token, words};
use crate::diagnostics::codes::{
    number_without_digits, operator_needs_blanks, unclosed_text, unexpected_text,
};
use crate::diagnostics::{Diagnostic, nearest};
use crate::source::{FileId, Span};

/// Where a piece of text stops to fit a rule.
pub(super) struct Stop<'t> {
    file: FileId,
    /// The whole text as the grammar sees it.
    read: &'t str,
    /// Where the piece starts.
    start: usize,
    /// The furthest place that fits.
    at: usize,
    /// What could have stood there.
    expected: Vec<Rule>,
}

/// Reads the piece `start..end` by an entry rule; `None` if it fits.
pub(super) fn stop(file: FileId, read: &str, piece: Span, entry: Rule) -> Option<Stop<'_>> {
    let text = read.get(piece.range())?;
    let start = piece.range().start;
    let error = Grammar::parse(entry, text).err()?;
    let (InputLocation::Pos(furthest) | InputLocation::Span((furthest, _))) = error.location;
    let expected = match error.variant {
        ErrorVariant::ParsingError { positives, .. } => positives,
        ErrorVariant::CustomError { .. } => Vec::new(),
    };
    // Blanks before the place are no part of what was found; at the end of a line it is the place
    // after the last character that counts.
    let rest = read.get(start + furthest..)?;
    let next = rest.trim_start_matches(' ');
    let at = if next.is_empty() || next.starts_with('\n') {
        start + text.get(..furthest)?.trim_end_matches(' ').len()
    } else {
        start + furthest + (rest.len() - next.len())
    };
    Some(Stop { file, read, start, at, expected })
}

impl<'t> Stop<'t> {
    /// The diagnostic of the place: the most telling of the things that can be wrong there.
    pub(super) fn diagnostic(&self) -> Diagnostic {
        let special = self.unclosed_text().or_else(|| self.number()).or_else(|| self.operator());
        special.unwrap_or_else(|| {
            let diagnostic = unexpected_text::found(self.span(), &self.found(), &self.expected());
            match self.mend() {
                Some(mend) => diagnostic.help(mend),
                None => diagnostic,
            }
        })
    }

    pub(super) fn at(&self) -> usize {
        self.at
    }

    fn rest(&self) -> &'t str {
        self.read.get(self.at..).unwrap_or("")
    }

    /// The piece up to the place.
    fn before(&self) -> &'t str {
        self.read.get(self.start..self.at).unwrap_or("")
    }

    /// What stands at the place: a word, a number, a quoted text or a mark; nothing at the end of a
    /// line.
    fn token(&self) -> &'t str {
        token::token(self.rest())
    }

    fn span(&self) -> Span {
        Span::new(self.file, self.at, self.at + self.token().len())
    }

    fn found(&self) -> String {
        let token = self.token();
        match token.chars().next() {
            None => "the end of the line".to_owned(),
            Some('"') => "a quoted text".to_owned(),
            Some(_) if token::MARKS.contains(&token) => format!("`{token}`"),
            Some(first) if token.len() == first.len_utf8() => words::of_character(first),
            Some(_) if token.len() > 40 => "a long word".to_owned(),
            Some(_) => format!("`{token}`"),
        }
    }

    fn expected(&self) -> String {
        let rules = &self.expected;
        let can_end = rules.iter().any(|rule| matches!(rule, Rule::because | Rule::kw_because));
        let needed = can_end || rules.iter().any(|rule| !words::is_optional(*rule));
        // Where a value can begin with `peak`, any value can begin.
        let value = rules.iter().any(|rule| matches!(rule, Rule::peak | Rule::kw_peak));
        let rules = rules.iter().filter(|rule| !needed || !words::is_optional(**rule));
        let rules = rules.map(|rule| if value && words::starts_value(*rule) { Rule::expr } else { *rule });
        let mut alternatives: Vec<&str> = Vec::new();
        let named: Vec<String> = rules.chain(can_end.then_some(Rule::fact_end)).map(words::of_rule).collect();
        for word in named.iter().flat_map(|name| name.split(", ")) {
            if !alternatives.contains(&word) {
                alternatives.push(word);
            }
        }
        words::listed(&alternatives)
    }

    /// What to write instead, if that is plain.
    fn mend(&self) -> Option<String> {
        let token = self.token();
        let before = self.before();
        let first = token.chars().next();
        if let Some(instead) = first.and_then(words::instead_of) {
            return Some(format!("write {instead}"));
        }
        if first.is_some_and(|first| first.is_alphabetic() && !first.is_ascii()) {
            return Some("names are made of the letters a to z and A to Z, digits and `_`".to_owned());
        }
        match token {
            "" if self.expected.contains(&Rule::open) => {
                return Some("the `{` of a block stands on the line of its name".to_owned());
            }
            "<" | ">" => return Some(format!("write `{token}=`: the limit itself is always allowed")),
            "=" if before.ends_with('=') => return Some("write a single `=`".to_owned()),
            "(" if before.trim_end().ends_with(|last: char| last.is_ascii_alphanumeric()) => {
                return Some("no blank stands between a function and its bracket".to_owned());
            }
            _ => {}
        }
        if before.ends_with("- ") {
            return Some("a minus sign stands directly before its value".to_owned());
        }
        if self.in_row() {
            return Some("the rows of a curve are bare numbers; their units stand in its header".to_owned());
        }
        self.nearest_word()
    }

    /// The keyword that was meant: here, or at the start of the fact.
    fn nearest_word(&self) -> Option<String> {
        let token = self.token();
        let named: Vec<String> = self.expected.iter().map(|rule| words::of_rule(*rule)).collect();
        let keywords = named.iter().flat_map(|name| name.split('`').skip(1).step_by(2));
        if let Some(near) = nearest(token, keywords.flat_map(|keyword| keyword.split(' '))) {
            return Some(format!("did you mean `{near}`?"));
        }
        let piece = Span::new(self.file, self.start, self.at);
        let word = token::first(self.read, piece)?;
        if words::STATEMENTS.contains(&word) || words::KINDS.contains(&word) {
            return None;
        }
        let near = nearest(word, words::STATEMENTS.iter().copied())?;
        Some(format!("did you mean `{near}` in place of `{word}`?"))
    }

    fn in_row(&self) -> bool {
        let before = self.before();
        !before.is_empty() && before.chars().all(|next| next.is_ascii_digit() || " ,.+-eE".contains(next))
    }

    fn unclosed_text(&self) -> Option<Diagnostic> {
        let rest = self.rest();
        (rest.starts_with('"') && token::closing_quote(rest).is_none()).then(|| {
            let line = rest.split('\n').next().unwrap_or("").trim_end();
            unclosed_text::found(Span::new(self.file, self.at, self.at + line.len()))
        })
    }

    /// A point without digits on one side, or a `_` within a number.
    fn number(&self) -> Option<Diagnostic> {
        let rest = self.rest();
        let is_part = |next: char| next.is_ascii_digit() || next == '.' || next == '_';
        let before = self.before();
        let head = before.len() - before.trim_end_matches(is_part).len();
        let tail = rest.find(|next| !is_part(next)).unwrap_or(rest.len());
        if !rest.starts_with(['.', '_']) || head + tail < 2 || rest.starts_with("..") {
            return None;
        }
        let start = self.at - head;
        let written = self.read.get(start..self.at + tail)?;
        if !written.starts_with(|first: char| first.is_ascii_digit() || first == '.') {
            return None;
        }
        let span = Span::new(self.file, start, self.at + tail);
        if written.contains('_') {
            let plain = written.replace('_', "");
            return Some(number_without_digits::found(
                span,
                "a number has no `_` between its digits",
                Some(&plain),
            ));
        }
        if written.matches('.').count() > 1 {
            return Some(number_without_digits::found(span, "a number has only one decimal point", None));
        }
        let (side, mend) = match written.strip_prefix('.') {
            Some(digits) => ("before", format!("0.{digits}")),
            None => ("after", format!("{written}0")),
        };
        let message = format!("the number `{written}` lacks a digit {side} its point");
        Some(number_without_digits::found(span, &message, Some(&mend)))
    }

    /// An operator that lacks a blank on one side or both.
    fn operator(&self) -> Option<Diagnostic> {
        let token = self.token();
        let before = self.before();
        let after = self.rest().get(token.len()..).unwrap_or("");
        let is_operator = matches!(token, "+" | "-" | "*" | "/" | "^") && !after.starts_with('>');
        let blank_before = before.ends_with(' ');
        let blank_after = after.is_empty() || after.starts_with([' ', '\n']);
        let has_left =
            before.trim_end().ends_with(|last: char| last.is_alphanumeric() || "_)%".contains(last));
        let misses = is_operator && has_left && !(blank_before && blank_after);
        misses.then(|| operator_needs_blanks::found(self.span(), token))
    }
}
