//! The parser that is generated from the grammar file.

use pest::Parser as _;
use pest_derive::Parser;

#[derive(Parser)]
#[grammar = "../grammar/stagewright.pest"]
pub(super) struct Grammar;

pub(super) type Pair<'t> = pest::iterators::Pair<'t, Rule>;
pub(super) type Pairs<'t> = pest::iterators::Pairs<'t, Rule>;

/// Whether a word can follow a number as part of a fact. Such a word is never read as a unit, so no
/// unit may be called by it.
pub fn is_keyword(word: &str) -> bool {
    Grammar::parse(Rule::keyword, word).is_ok_and(|pairs| pairs.as_str() == word)
}
