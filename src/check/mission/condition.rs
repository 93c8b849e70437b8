//! Conditions and limits.

use super::Site;
use super::formula::{Speaks, is_literal};
use crate::check::{Context, ScopeId, Want};
use crate::diagnostics::codes::absent_quantity;
use crate::model::{Comparison, Condition, Formula};
use crate::quantity::Dimension;
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
            ConditionKind::After(duration) => {
                let want = (Dimension::TIME, "a duration");
                let duration = self.limit(site, scope, (path, duration), Speaks::Constant, want, because)?;
                Some(Condition::After { duration })
            }
            ConditionKind::Compare { quantity, comparison, limit } => {
                let built = self.formula(site, scope, quantity, Speaks::Instant);
                let dimension = built.as_ref().map(|built| built.dimension);
                let what = format!("the limit of `{}`", self.text(quantity.span));
                let limit = match dimension {
                    Some(dimension) => {
                        self.limit(site, scope, (path, limit), Speaks::Instant, (dimension, &what), because)
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
