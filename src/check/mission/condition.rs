//! Conditions and limits.

use super::Site;
use super::formula::{Speaks, constant, is_literal};
use crate::check::{Context, ScopeId, Want, with_article};
use crate::diagnostics::codes::{absent_quantity, impossible_value};
use crate::model::{Comparison, Condition, Formula};
use crate::quantity::Dimension;
use crate::source::Span;
use crate::syntax::{self, Because, ConditionKind, Expr};

impl<'a> Context<'a> {
    /// A value that stands in a phase or a demand: a number becomes a fact under `path`, an
    /// expression stays one.
    pub(super) fn limit(
        &mut self,
        site: &Site<'a>,
        scope: ScopeId,
        (path, expr): (&str, &Expr),
        speaks: Speaks,
        (want, what): (impl Into<Want>, &str),
        because: Option<&Because>,
    ) -> Option<Formula> {
        if is_literal(expr) {
            let value = self.fact(scope, path, expr, want, what, because)?;
            return Some(Formula::Fact { value });
        }
        self.formula_of(site, scope, expr, speaks, (want, what))
    }

    /// A limit that stands against a quantity: of its dimension, else both places are shown.
    pub(super) fn limit_of(
        &mut self,
        site: &Site<'a>,
        scope: ScopeId,
        stated: (&str, &Expr),
        speaks: Speaks,
        (quantity, dimension, what): (Span, Dimension, &str),
        because: Option<&Because>,
    ) -> Option<Formula> {
        let before = self.diagnostics.len();
        let limit = self.limit(site, scope, stated, speaks, (dimension, what), because);
        if limit.is_none()
            && self.diagnostics.len() == before + 1
            && let Some(said) = self.diagnostics.pop()
        {
            let of_dimension = ["dimension-mismatch", "missing-unit", "pounds-confused"];
            let is_one = of_dimension.contains(&said.code.name) && said.span() == stated.1.span;
            self.report(match is_one {
                true => said.and(quantity, format!("this is {}", with_article(dimension))),
                false => said,
            });
        }
        limit
    }

    /// Reports a value, where it does not change in flight, that is not as it has to be.
    pub(super) fn require(
        &mut self,
        (expr, formula): (&Expr, &Formula),
        holds: impl Fn(f64) -> bool,
        (what, expected): (&str, &str),
    ) -> Option<()> {
        if constant(formula).is_none_or(holds) {
            return Some(());
        }
        let found = format!("{what} cannot be {}", self.text(expr.span));
        self.report(impossible_value::found(expr.span, &found, expected));
        None
    }

    /// One condition; `path` is the address of its number.
    pub(super) fn condition(
        &mut self,
        site: &Site<'a>,
        scope: ScopeId,
        path: &str,
        condition: &syntax::Condition,
        because: Option<&Because>,
    ) -> Option<Condition> {
        match &condition.kind {
            ConditionKind::After(stated) => {
                let want = (Dimension::TIME, "a duration");
                let duration = self.limit(site, scope, (path, stated), Speaks::Constant, want, because)?;
                self.require((stated, &duration), |time| time >= 0.0, ("a duration", "zero or more"))?;
                Some(Condition::After { duration })
            }
            ConditionKind::Compare { quantity, comparison, limit } => {
                let built = self.formula(site, scope, quantity, Speaks::Instant);
                let dimension = built.as_ref().map(|built| built.dimension);
                let what = format!("the limit of `{}`", self.text(quantity.span));
                let limit = match dimension {
                    Some(dimension) => {
                        let asked = (quantity.span, dimension, what.as_str());
                        self.limit_of(site, scope, (path, limit), Speaks::Instant, asked, because)
                    }
                    // The quantity is wrong and reported; the limit may have faults of its own.
                    None => self.formula(site, scope, limit, Speaks::Instant).map(|built| built.formula),
                };
                Some(Condition::Compare {
                    quantity: built?.formula,
                    comparison: match comparison {
                        syntax::Comparison::AtLeast => Comparison::AtLeast,
                        syntax::Comparison::AtMost => Comparison::AtMost,
                        syntax::Comparison::RisesTo => Comparison::RisesTo,
                        syntax::Comparison::FallsTo => Comparison::FallsTo,
                    },
                    limit: limit?,
                    written: self.text(condition.span).to_string(),
                })
            }
            ConditionKind::Spent(name) => {
                let part = self.part(site, name)?;
                if site.vehicle.parts[part].propulsion.is_none() {
                    let why = format!("`{}` carries no propellant", name.text);
                    self.report(absent_quantity::found(
                        condition.span,
                        self.text(condition.span),
                        &why,
                        None,
                    ));
                    return None;
                }
                Some(Condition::Spent { part: part as u32 })
            }
            ConditionKind::Apex => Some(Condition::Apex),
            ConditionKind::Touchdown => Some(Condition::Touchdown),
        }
    }
}
