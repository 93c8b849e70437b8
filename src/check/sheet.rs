//! The facts of a block read against the list of those that it may state.

use super::{BlockId, Context, ScopeId, Want};
use crate::diagnostics::codes::{missing_fact, unexpected_part, unknown_word};
use crate::model::Value;
use crate::source::Span;
use crate::syntax::{Ambient, Argument, Because, Expr, ExprKind, Name, Operand, Setting, Statement};

/// A fact that a block may state, and what may stand in its line.
#[derive(Clone, Copy, Debug)]
pub(crate) struct Key {
    pub name: &'static str,
    /// How one writes it.
    pub example: &'static str,
    words: &'static [&'static str],
    arguments: &'static [&'static str],
    ambient: bool,
    range: bool,
    instant: bool,
}

impl Key {
    pub(crate) const fn new(name: &'static str, example: &'static str) -> Self {
        Key { name, example, words: &[], arguments: &[], ambient: false, range: false, instant: false }
    }

    /// With one of these words before or instead of a value.
    pub(crate) const fn words(self, words: &'static [&'static str]) -> Self {
        Key { words, ..self }
    }

    pub(crate) const fn arguments(self, arguments: &'static [&'static str]) -> Self {
        Key { arguments, ..self }
    }

    /// With `in vacuum` or `at sea_level`.
    pub(crate) const fn ambient(self) -> Self {
        Key { ambient: true, ..self }
    }

    /// With an instant of time as its value.
    pub(crate) const fn instant(self) -> Self {
        Key { instant: true, ..self }
    }

    /// With `..` and a second value.
    pub(crate) const fn range(self) -> Self {
        Key { range: true, ..self }
    }
}

/// One line of a sheet.
#[derive(Clone, Copy, Debug)]
pub(crate) struct Stated<'a> {
    pub setting: &'a Setting,
    pub scope: ScopeId,
    pub because: Option<&'a Because>,
    pub span: Span,
    pub key: Key,
}

impl<'a> Stated<'a> {
    pub(crate) fn expr(&self) -> Option<&'a Expr> {
        match &self.setting.value {
            Some(Operand::Expr(expr)) => Some(expr),
            _ => None,
        }
    }

    /// A single name as the value: a word, a given or a block.
    pub(crate) fn name(&self) -> Option<&'a Name> {
        match self.expr().map(|expr| &expr.kind) {
            Some(ExprKind::Path(path)) if path.parts.len() == 1 => path.parts.first(),
            _ => None,
        }
    }

    /// The word of a fact such as `gravity central …` or `air none`.
    pub(crate) fn word(&self) -> Option<&'a Name> {
        self.setting.word.as_ref().or_else(|| self.name())
    }

    pub(crate) fn argument(&self, name: &str) -> Option<&'a Argument> {
        self.setting.arguments.iter().find(|argument| argument.name.text == name)
    }

    pub(crate) fn ambient(&self) -> Option<Ambient> {
        self.setting.ambient.map(|(ambient, _)| ambient)
    }
}

/// The facts of a block that belong there.
#[derive(Clone, Debug)]
pub(crate) struct Sheet<'a> {
    pub block: BlockId,
    pub name: &'a str,
    /// Of the block's name.
    pub span: Span,
    lines: Vec<Stated<'a>>,
}

impl<'a> Sheet<'a> {
    pub(crate) fn get(&self, key: &str) -> Option<Stated<'a>> {
        self.lines.iter().copied().find(|line| line.key.name == key)
    }

    pub(crate) fn get_in(&self, key: &str, ambient: Ambient) -> Option<Stated<'a>> {
        self.lines.iter().copied().find(|line| line.key.name == key && line.ambient() == Some(ambient))
    }

    /// `Sorrel.dry`
    pub(crate) fn path(&self, key: &str) -> String {
        format!("{}.{key}", self.name)
    }
}

impl<'a> Context<'a> {
    /// Reads the settings of a block; reports those that have no place in it, and parts of their
    /// lines that they do not have. Statements of other shapes go to `other`, which says whether
    /// they belong; `other_words` are the words that they start with.
    pub(crate) fn sheet(
        &mut self,
        block: BlockId,
        keys: &[Key],
        other_words: &[&str],
        mut other: impl FnMut(super::Inherited<'a>) -> bool,
    ) -> Sheet<'a> {
        let definition = self.definition(block).block;
        let mut lines = Vec::new();
        let words: Vec<&str> = keys.iter().map(|key| key.name).chain(other_words.iter().copied()).collect();
        for inherited in self.lines(block) {
            let line = inherited.line;
            let key = match &line.statement {
                Statement::Setting(setting) => {
                    keys.iter().find(|key| key.name == setting.key.text).map(|key| (setting, *key))
                }
                _ if other(inherited) => continue,
                _ => None,
            };
            match key {
                Some((setting, key)) => {
                    self.check_form(setting, key);
                    let because = line.because.as_ref();
                    lines.push(Stated { setting, scope: inherited.scope, because, span: line.span, key });
                }
                None => {
                    self.incomplete.insert(block);
                    if inherited.from == block {
                        self.misplaced(definition.kind, line.span, &line.statement, &words);
                    }
                }
            }
        }
        Sheet { block, name: &definition.name.text, span: definition.name.span, lines }
    }

    /// Reports parts of a setting that its key does not have.
    pub(super) fn check_form(&mut self, setting: &Setting, key: Key) {
        let mut wrong = Vec::new();
        if let Some(word) = &setting.word
            && key.words.is_empty()
        {
            wrong.push((word.span, format!("the word `{}`", word.text)));
        }
        if let (Some(upto), false) = (&setting.upto, key.range) {
            wrong.push((upto.span, "the end of a range".to_string()));
        }
        if let (Some((_, span)), false) = (setting.ambient, key.ambient) {
            wrong.push((span, format!("`{}`", self.text(span))));
        }
        if let (Some(Operand::Instant(span)), false) = (&setting.value, key.instant) {
            wrong.push((*span, "an instant".to_string()));
        }
        for (number, argument) in setting.arguments.iter().enumerate() {
            let name = &argument.name;
            let repeated = setting.arguments.iter().take(number).any(|before| before.name.text == name.text);
            if repeated || !key.arguments.contains(&name.text.as_str()) {
                let again = if repeated { " a second time" } else { "" };
                wrong.push((name.span, format!("`{}`{again}", name.text)));
            }
        }
        for (span, part) in wrong {
            self.report(unexpected_part::found(span, &part, key.name, key.example, key.arguments));
        }
    }

    /// The word of a fact, one of those that it may have; reported otherwise.
    pub(crate) fn word_of(&mut self, stated: &Stated<'a>, kind: &str) -> Option<&'a Name> {
        match stated.word() {
            Some(word) if stated.key.words.contains(&word.text.as_str()) => Some(word),
            Some(word) => {
                self.report(unknown_word::found(word.span, &word.text, kind, stated.key.words));
                None
            }
            None => {
                if !stated.expr().is_some_and(|expr| matches!(expr.kind, ExprKind::Broken)) {
                    self.report(missing_fact::no_word(stated.setting.key.span, kind, stated.key.words));
                }
                None
            }
        }
    }

    /// The value of a line as a fact; a line without a value is reported.
    pub(crate) fn number_of(
        &mut self,
        stated: &Stated<'a>,
        path: &str,
        want: impl Into<Want>,
        what: &str,
    ) -> Option<Value> {
        let Some(expr) = stated.expr() else {
            if stated.setting.value.is_none() {
                self.report(missing_fact::no_value(stated.setting.key.span, what, stated.key.example));
            }
            return None;
        };
        self.fact(stated.scope, path, expr, want, what, stated.because)
    }
}
