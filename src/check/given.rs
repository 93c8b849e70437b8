//! Names within expressions: givens, and facts by their paths.

use std::collections::HashMap;

use super::facts::{Record, Use};
use super::names::{GivenId, Meaning, kind_words};
use super::{BlockId, Context, Inherited, ScopeId, Typed};
use crate::diagnostics::codes::{circular_definition, not_constant, unknown_name, wrong_kind};
use crate::model::{Fact, FactId, Origin, Quantity, Value};
use crate::source::Span;
use crate::syntax::{Ambient, Argument, BlockKind, Expr, ExprKind, Name, Operand, Path, Statement};

/// Something that is worked out on first use.
#[derive(Clone, Debug)]
pub(super) enum State<T> {
    Working,
    /// None where it has errors, which have been reported.
    Done(Option<T>),
}

impl<'a> Context<'a> {
    /// A `given` in reach of a scope (a mission's own first, then the file's): its fact, worked out
    /// on first use. None, without a word, where no such name is in reach; `Some(None)` where it is
    /// and its own definition is wrong, which has been reported there.
    pub(crate) fn given(&mut self, scope: ScopeId, name: &Name) -> Option<Option<Value>> {
        let given = self.find_given(scope, &name.text)?;
        if matches!(self.given_values.get(&given), Some(State::Working)) {
            let defined = self.givens.get(given.0 as usize).map(|given| given.given.name.span);
            self.report(circular_definition::found(name.span, &name.text, defined));
            return Some(None);
        }
        let value = self.given_value(given);
        if let (Some(value), Some(naming)) = (value, self.naming.last_mut()) {
            naming.push(Use::Fact(value.fact));
        }
        Some(value)
    }

    /// The value of a given; None where it has errors or is being worked out.
    pub(super) fn given_value(&mut self, id: GivenId) -> Option<Value> {
        match self.given_values.get(&id) {
            Some(State::Done(value)) => return *value,
            Some(State::Working) => return None,
            None => {}
        }
        let definition = *self.givens.get(id.0 as usize)?;
        let expr = &definition.given.value;
        self.given_values.insert(id, State::Working);
        self.naming.push(Vec::new());
        let typed = self.infer(definition.scope, expr);
        let uses = self.naming.pop().unwrap_or_default();
        let value = typed.map(|Typed { si, dimension }| {
            let fact = Fact {
                path: definition.given.name.text.clone(),
                si,
                dimension,
                unit: self.unit_of(definition.scope, expr, dimension),
                written: self.text(expr.span).to_string(),
                origin: Origin::Given,
                place: self.place(expr.span),
                because: definition.because.map(|because| because.text.text.clone()),
            };
            self.add_fact(fact, Record { span: expr.span, uses })
        });
        self.given_values.insert(id, State::Done(value));
        value
    }

    /// Where the value that an expression names is stated: that of a given, or of a fact of a block.
    pub(super) fn defined_at(&mut self, scope: ScopeId, expr: &Expr) -> Option<Span> {
        let ExprKind::Path(path) = &expr.kind else { return None };
        let [first, rest @ ..] = path.parts.as_slice() else { return None };
        if rest.is_empty() {
            let given = self.find_given(scope, &first.text)?;
            return self.givens.get(given.0 as usize).map(|given| given.given.value.span);
        }
        let block = self.block_named(scope, &first.text)?.ok()?;
        self.setting(block, &dotted(rest)).map(|(stated, _)| stated.span)
    }

    /// The value of a path in a constant expression.
    pub(super) fn path_value(&mut self, scope: ScopeId, path: &Path) -> Option<Typed> {
        let [first, rest @ ..] = path.parts.as_slice() else { return None };
        if rest.is_empty() {
            return self.name_value(scope, first);
        }
        match self.block_named(scope, &first.text) {
            Some(Ok(block)) => self.block_value(block, path, &dotted(rest)),
            Some(Err(())) => None,
            None => {
                self.unknown_in_expression(scope, first);
                None
            }
        }
    }

    fn name_value(&mut self, scope: ScopeId, name: &Name) -> Option<Typed> {
        if let Some(value) = self.given(scope, name) {
            return value.map(|value| Typed { si: value.si, dimension: self.dimension(value.fact) });
        }
        if let Some(mission) = self.scope(scope).mission
            && let Some((expr, scope)) = self.setting(mission, &name.text)
        {
            return self.setting_value(mission, &name.text, name.span, expr, scope);
        }
        if Quantity::ALL.iter().any(|quantity| quantity.name() == name.text) {
            self.report(not_constant::found(name.span, &name.text));
            return None;
        }
        match self.block_named(scope, &name.text) {
            Some(Ok(block)) => {
                let block = self.definition(block).block;
                self.report(wrong_kind::found(
                    name.span,
                    &name.text,
                    "a value",
                    kind_words(block.kind),
                    block.name.span,
                ));
            }
            Some(Err(())) => {}
            None => self.unknown_in_expression(scope, name),
        }
        None
    }

    /// Reports a name in an expression that nothing in reach defines.
    pub(crate) fn unknown_in_expression(&mut self, scope: ScopeId, name: &Name) {
        let near = self.nearest(&name.text, |context| {
            let mut known: Vec<&'a str> =
                context.scope(context.scope(scope).file).names.keys().copied().collect();
            if let Some(mission) = context.scope(scope).mission {
                known.extend(context.givens_of(mission).into_iter().map(|(name, _)| name));
            }
            known
        });
        let defined = near.and_then(|near| match self.find_given(scope, near) {
            Some(given) => self.givens.get(given.0 as usize).map(|given| given.given.name.span),
            None => self.named(scope, near).map(|named| named.here),
        });
        self.report(unknown_name::found(name.span, "a value", &name.text, near.map(|near| (near, defined))));
    }

    /// A fact of a block: stated, or following from what is stated, or by default.
    fn block_value(&mut self, block: BlockId, path: &Path, rest: &str) -> Option<Typed> {
        let defined = &self.definition(block).block.name;
        let address = format!("{}.{rest}", defined.text);
        if let Some(naming) = self.naming.last_mut() {
            naming.push(Use::Path(block, address.clone()));
        }
        if let Some((expr, scope)) = self.setting(block, rest) {
            return self.setting_value(block, &address, path.span, expr, scope);
        }
        if !self.check_block(block) {
            return None;
        }
        if let Some(fact) = self.fact_of(block, &address) {
            let fact = self.facts.get(fact.0 as usize)?;
            return Some(Typed { si: fact.si, dimension: fact.dimension });
        }
        self.report(
            unknown_name::found(path.span, "a fact", self.text(path.span), None)
                .and(defined.span, "this states no such fact")
                .help("name a fact that the block states, such as `Sorrel.dry`"),
        );
        None
    }

    fn setting_value(
        &mut self,
        block: BlockId,
        address: &str,
        used: Span,
        expr: &'a Expr,
        scope: ScopeId,
    ) -> Option<Typed> {
        let key = (block, address.to_string());
        if !self.settings.insert(key.clone()) {
            self.report(circular_definition::found(used, address, Some(expr.span)));
            return None;
        }
        let value = self.infer(scope, expr);
        self.settings.remove(&key);
        let changed = self.changed_at(&key);
        value.map(|value| Typed { si: changed.unwrap_or(value.si), ..value })
    }

    /// The expression that states a fact of a block, by the part of its path after the block's name.
    fn setting(&mut self, block: BlockId, address: &str) -> Option<(&'a Expr, ScopeId)> {
        if !self.stated.contains_key(&block) {
            let stated = self.stated_expressions(block);
            self.stated.insert(block, stated);
        }
        self.stated.get(&block)?.get(address).copied()
    }

    /// Every expression of a block by its address; an argument answers to its own name too.
    fn stated_expressions(&mut self, block: BlockId) -> HashMap<String, (&'a Expr, ScopeId)> {
        let mut stated = HashMap::new();
        for Inherited { line, scope, .. } in self.lines(block) {
            match &line.statement {
                Statement::Setting(setting) => {
                    let key = &setting.key.text;
                    let at_sea_level = matches!(setting.ambient, Some((Ambient::SeaLevel, _)));
                    let address = if at_sea_level { format!("{key}.sea_level") } else { key.clone() };
                    if let Some(Operand::Expr(value)) = &setting.value
                        && !self.is_word(scope, value)
                    {
                        stated.entry(address).or_insert((value, scope));
                    }
                    for Argument { name, value } in &setting.arguments {
                        stated.entry(format!("{key}.{}", name.text)).or_insert((value, scope));
                        stated.entry(name.text.clone()).or_insert((value, scope));
                    }
                }
                Statement::Engines { count, .. } => {
                    stated.insert("engines".to_string(), (count, scope));
                }
                _ => {}
            }
        }
        stated
    }

    /// Whether a setting's value is not a number but a bare word or the name of a block, as in
    /// `air none` and `drag RowanDrag`.
    pub(super) fn is_word(&self, scope: ScopeId, expr: &Expr) -> bool {
        let ExprKind::Path(path) = &expr.kind else { return false };
        let [only] = path.parts.as_slice() else { return false };
        self.find_given(scope, &only.text).is_none()
    }

    /// The fact that a path in an expression names, where it has been recorded.
    pub(super) fn path_fact(&self, scope: ScopeId, path: &Path) -> Option<FactId> {
        let [first, rest @ ..] = path.parts.as_slice() else { return None };
        if rest.is_empty() {
            return match self.given_values.get(&self.find_given(scope, &first.text)?)? {
                State::Done(value) => value.map(|value| value.fact),
                State::Working => None,
            };
        }
        let Meaning::Block(block) = self.named(scope, &first.text)?.meaning else { return None };
        self.fact_of(block, &format!("{}.{}", self.definition(block).block.name.text, dotted(rest)))
    }

    /// Checks a block of any kind that has facts; false where it has errors, which have been reported.
    pub(super) fn check_block(&mut self, block: BlockId) -> bool {
        match self.definition(block).block.kind {
            BlockKind::World => self.world(block).is_some(),
            BlockKind::Engine => self.engine(block).is_some(),
            BlockKind::Curve => self.curve(block).is_some(),
            BlockKind::Stage => self.stage(block).is_some(),
            BlockKind::Vehicle => self.vehicle(block).is_some(),
            BlockKind::Mission | BlockKind::Phase => true,
        }
    }
}

fn dotted(parts: &[Name]) -> String {
    parts.iter().map(|part| part.text.as_str()).collect::<Vec<_>>().join(".")
}
