//! The rules of the grammar and the characters of a text in human words.

use super::rules::Rule;
use crate::source::Span;

/// The words that start a fact or a definition, for finding the one that was meant.
pub(super) const STATEMENTS: &[&str] = &[
    "aim", "beside", "bring", "burn", "coast", "demand", "engines", "figure", "from", "given", "headline",
    "hold", "knob", "least", "light", "most", "shed", "shroud", "stack", "start", "steer", "unit", "until",
];

/// The words that start a block.
pub(super) const KINDS: &[&str] = &["world", "engine", "curve", "stage", "vehicle", "mission", "phase"];

/// What a rule stands for in "expected …".
pub(super) fn of_rule(rule: Rule) -> String {
    let name = format!("{rule:?}");
    if let Some(keyword) = name.strip_prefix("kw_") {
        return format!("`{keyword}`");
    }
    match rule {
        Rule::airflow => "`into airflow`, `from airflow`",
        Rule::ambient => "`in vacuum`, `at sea_level`",
        Rule::argument | Rule::argument_name => "a further value with its name",
        Rule::arrow => "`->`",
        Rule::at_least => "`>=`",
        Rule::at_most => "`<=`",
        Rule::because => "`because`",
        Rule::bearing => "`heading`",
        Rule::broken_item | Rule::item | Rule::lone_item => "a definition",
        Rule::burned => "the name of a stage or a group of strap-ons",
        Rule::call => "a function",
        Rule::close | Rule::stray_close => "`}`",
        Rule::close_bracket => "`]`",
        Rule::close_paren => "`)`",
        Rule::column => "the name of a column",
        Rule::comma => "`,`",
        Rule::comparison => "`>=`, `<=`, `rises to`, `falls to`",
        Rule::condition => "a duration, a condition, `apex`, `touchdown`",
        Rule::dots => "`..`",
        Rule::equals => "`=`",
        Rule::expr | Rule::term | Rule::operand | Rule::group | Rule::quantity | Rule::minus => "a value",
        Rule::fact_end | Rule::EOI => "the end of the line",
        Rule::instant => "a date and time",
        Rule::kind | Rule::lone_head => "`world`, `engine`, `curve`, `stage`, `vehicle`, `mission`, `phase`",
        Rule::motion => "`along motion`, `against motion`",
        Rule::name | Rule::demand_name | Rule::word | Rule::key => "a name",
        Rule::number | Rule::row | Rule::signed => "a number",
        Rule::open => "`{`",
        Rule::open_bracket => "a unit in brackets",
        Rule::open_paren => "`(`",
        Rule::operator => "an operator",
        Rule::path => "a name",
        Rule::peak => "`peak`",
        Rule::phase_kind => "`phase`",
        Rule::place => "`at end of`, `at start of`",
        Rule::profile => "`from`",
        Rule::requirement => "`>=`, `<=`, `between`, `=`",
        Rule::spent => "`spent`",
        Rule::start_kind => "`pad`, `orbit`, `state`",
        Rule::text => "a quoted text",
        Rule::unit => "a unit",
        Rule::was => "`was`",
        Rule::like => "`like`",
        _ => "a fact",
    }
    .to_owned()
}

/// Whether a fact can always go on with what this rule stands for, so that it need not be offered
/// beside something that has to follow.
pub(super) fn is_optional(rule: Rule) -> bool {
    matches!(
        rule,
        Rule::ambient
            | Rule::argument
            | Rule::argument_name
            | Rule::because
            | Rule::dots
            | Rule::kw_at
            | Rule::kw_because
            | Rule::kw_frozen
            | Rule::kw_hot
            | Rule::kw_in
            | Rule::kw_like
            | Rule::kw_was
            | Rule::open_paren
            | Rule::operator
            | Rule::place
            | Rule::unit
            | Rule::word
    )
}

/// Whether a value can begin with what this rule stands for.
pub(super) fn starts_value(rule: Rule) -> bool {
    matches!(
        rule,
        Rule::call
            | Rule::group
            | Rule::kw_peak
            | Rule::minus
            | Rule::name
            | Rule::number
            | Rule::open_paren
            | Rule::path
            | Rule::peak
            | Rule::quantity
            | Rule::term
    )
}

/// Alternatives as a sentence has them: "a, b or c".
pub(super) fn listed(words: &[&str]) -> String {
    match words {
        [] => "a fact".to_owned(),
        [word] => (*word).to_owned(),
        [words @ .., last] => format!("{} or {last}", words.join(", ")),
    }
}

/// What to write in place of a character that the language does not have.
pub(super) fn instead_of(character: char) -> Option<&'static str> {
    Some(match character {
        '\u{a0}' | '\u{2000}'..='\u{200b}' | '\u{202f}' | '\u{feff}' => "a plain blank",
        '\u{2010}'..='\u{2015}' | '\u{2212}' => "`-`",
        '\u{2018}'..='\u{201f}' | '\u{ab}' | '\u{bb}' | '\'' => "`\"`",
        '≤' => "`<=`",
        '≥' => "`>=`",
        '→' => "`->`",
        '…' => "`..`",
        '×' | '·' => "`*`",
        '÷' => "`/`",
        '²' => "`^2`",
        '³' => "`^3`",
        '°' => "`deg`",
        'µ' | 'μ' => "`u`",
        _ => return None,
    })
}

/// A character as it can be shown: one that has no picture is named by its number.
pub(super) fn of_character(character: char) -> String {
    match character {
        '\0' => "a NUL character".to_owned(),
        '\u{a0}' => "a no-break space (U+00A0)".to_owned(),
        _ if character.is_control() || character.is_whitespace() => {
            format!("the character U+{:04X}", u32::from(character))
        }
        _ if character.is_ascii() => format!("`{character}`"),
        _ => format!("`{character}` (U+{:04X})", u32::from(character)),
    }
}

/// The candidate that is at most two edits away from a word (one for short words, none for
/// those of three letters and less), if any.
pub(super) fn nearest<'c>(word: &str, candidates: impl Iterator<Item = &'c str>) -> Option<&'c str> {
    if word.len() < 4 || !is_name(word) {
        return None;
    }
    let reach = if word.len() < 6 { 1 } else { 2 };
    let near = candidates.map(|candidate| (distance(word, candidate), candidate));
    near.filter(|(distance, _)| (1..=reach).contains(distance)).min().map(|(_, candidate)| candidate)
}

/// The number of insertions, deletions, replacements and swaps of neighbours between two words
/// (optimal string alignment). Long words are never near.
fn distance(left: &str, right: &str) -> usize {
    if left.len() > 32 || left.len().abs_diff(right.len()) > 2 {
        return usize::MAX;
    }
    let (left, right) = (left.as_bytes(), right.as_bytes());
    let mut before: Vec<usize> = Vec::new();
    let mut row: Vec<usize> = (0..=right.len()).collect();
    let mut previous = None;
    for (i, a) in left.iter().enumerate() {
        let mut next = vec![i + 1];
        let mut last = i + 1;
        for (j, b) in right.iter().enumerate() {
            let at = |row: &[usize], j: usize| row.get(j).copied().unwrap_or(usize::MAX - 1);
            last = (at(&row, j) + usize::from(a != b)).min(at(&row, j + 1) + 1).min(last + 1);
            let swapped = j.checked_sub(1).is_some_and(|k| right.get(k) == Some(a)) && previous == Some(b);
            if swapped {
                last = last.min(at(&before, j - 1) + 1);
            }
            next.push(last);
        }
        before = std::mem::replace(&mut row, next);
        previous = Some(a);
    }
    row.last().copied().unwrap_or(usize::MAX)
}

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
