//! The parser that is generated from the grammar file.

use pest_derive::Parser;

#[derive(Parser)]
#[grammar = "../grammar/stagewright.pest"]
pub(super) struct Grammar;

pub(super) type Pair<'t> = pest::iterators::Pair<'t, Rule>;
pub(super) type Pairs<'t> = pest::iterators::Pairs<'t, Rule>;
