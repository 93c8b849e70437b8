//! The rules of the grammar and the characters of a text in human words.

use super::rules::Rule;

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
