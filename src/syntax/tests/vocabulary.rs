//! The words of the grammar: in step with each other, and human where they are shown.

use pest::Parser;

use crate::syntax::rules::{Grammar, Rule};
use crate::syntax::{is_keyword, words};

const GRAMMAR: &str = include_str!("../../../grammar/stagewright.pest");

fn takes(rule: Rule, text: &str) -> bool {
    Grammar::parse(rule, text).is_ok_and(|mut pairs| pairs.next().is_some_and(|pair| pair.as_str() == text))
}

/// The quoted words of a rule of the grammar file.
fn words_of(rule: &str) -> Vec<&'static str> {
    let start = GRAMMAR.find(&format!("\n{rule} = @{{")).unwrap();
    let body = GRAMMAR[start..].split_once("!name_char").unwrap().0;
    body.split('"').skip(1).step_by(2).collect()
}

#[test]
fn no_word_of_a_list_hides_a_longer_one() {
    for (name, rule) in
        [("first_word", Rule::first_word), ("reserved", Rule::reserved), ("keyword", Rule::keyword)]
    {
        let words = words_of(name);
        assert!(words.len() > 10);
        for word in words {
            assert!(takes(rule, word), "{word} in {name}");
        }
    }
}

#[test]
fn the_words_that_start_facts_and_blocks_are_known() {
    for word in words::STATEMENTS.iter().chain(words::KINDS) {
        assert!(takes(Rule::first_word, word), "{word}");
    }
    for word in words_of("first_word") {
        let known = words::STATEMENTS.contains(&word) || words::KINDS.contains(&word);
        assert!(known || word == "because", "{word}");
    }
}

#[test]
fn keywords_are_whole_words() {
    assert!(is_keyword("in") && is_keyword("inclination") && is_keyword("with") && is_keyword("within"));
    assert!(!is_keyword("inch") && !is_keyword("kg") && !is_keyword("") && !is_keyword("in vacuum"));
}

#[test]
fn every_rule_is_explained() {
    let mut explained = false;
    for line in GRAMMAR.lines() {
        let rule = line.split_once(" = ").map(|(name, _)| name.trim_end());
        if let Some(name) = rule.filter(|name| !name.contains([' ', '/'])) {
            assert!(explained || name.starts_with("kw_"), "{name}");
            let keyword = name.strip_prefix("kw_");
            assert!(
                keyword.is_none_or(|word| line.contains(&format!("@{{ \"{word}\" ~ !name_char }}"))),
                "{name}"
            );
        }
        explained = line.starts_with("/// ");
    }
}

/// Rules that a second look cannot expect: they are silent, stand for a whole file, or take anything.
const NEVER_EXPECTED: &[Rule] = &[
    Rule::WHITESPACE,
    Rule::b,
    Rule::block_end,
    Rule::body,
    Rule::broken_char,
    Rule::escape,
    Rule::file,
    Rule::first_word,
    Rule::keyword,
    Rule::line,
    Rule::missing_break,
    Rule::name_char,
    Rule::name_start,
    Rule::peak_of,
    Rule::phase_body,
    Rule::phase_head,
    Rule::phase_line,
    Rule::primary,
    Rule::reserved,
    Rule::separator,
    Rule::text_without_end,
    Rule::top_head,
    Rule::unclosed,
    Rule::unit_factor,
    Rule::value_goes_on,
    Rule::value_start,
    Rule::broken_head,
    Rule::broken_kind_head,
    Rule::broken_phase_head,
];

#[test]
fn every_rule_has_human_words() {
    for rule in Rule::all_rules() {
        let said = words::of_rule(*rule);
        assert!(!said.contains("kw_"), "{said}");
        let outside_code: String = said.split('`').step_by(2).collect();
        assert!(!outside_code.contains('_'), "{rule:?}: {said}");
        // A fact of any form is "a fact"; every smaller rule has words of its own.
        let name = format!("{rule:?}");
        let is_fact = said == "a fact";
        assert!(!is_fact || NEVER_EXPECTED.contains(rule) || FACTS.contains(&name.as_str()), "{rule:?}");
    }
}

/// The rules of whole facts, blocks and broken pieces.
const FACTS: &[&str] = &[
    "aim",
    "beside",
    "block",
    "bring",
    "broken_block",
    "broken_kind_block",
    "broken_line",
    "broken_phase",
    "burn",
    "coast",
    "demand",
    "engines",
    "fact",
    "figure",
    "from_file",
    "given",
    "given_item",
    "header",
    "headline",
    "hold",
    "knob",
    "light",
    "lone_fact",
    "objective",
    "phase",
    "setting",
    "shed",
    "shroud",
    "stack",
    "start",
    "statement",
    "steer",
    "unit_definition",
    "until",
    "pitch",
    "tangent",
    "rises",
    "falls",
];
