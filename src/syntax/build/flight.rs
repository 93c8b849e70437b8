//! The facts of phases.

use super::Builder;
use super::parts::Parts;
use crate::syntax::rules::{Pair, Rule};
use crate::syntax::{Burn, Comparison, Condition, ConditionKind, PitchLaw, Statement, Steer};

impl Builder<'_> {
    /// The rules of `statement` that belong to phases.
    pub(super) fn phase_statement(&mut self, rule: Rule, parts: &mut Parts<'_>) -> Option<Statement> {
        Some(match rule {
            Rule::burn => Statement::Burn(self.burns(parts)?),
            Rule::light => Statement::Light {
                part: self.next_name(parts)?,
                at: self.next_expr(parts)?,
                hot: parts.has(Rule::kw_hot),
            },
            Rule::coast => Statement::Coast,
            Rule::steer => Statement::Steer(self.steer(parts)?),
            Rule::hold => Statement::Hold { quantity: self.next_expr(parts)?, limit: self.next_expr(parts)? },
            Rule::until => {
                let mut conditions = Vec::new();
                while let Some(condition) = parts.find(Rule::condition) {
                    conditions.push(self.condition(condition)?);
                }
                Statement::Until(conditions)
            }
            Rule::shed => {
                let part = self.next_name(parts)?;
                let when = match parts.find(Rule::condition) {
                    Some(condition) => Some(self.condition(condition)?),
                    None => None,
                };
                Statement::Shed { part, when }
            }
            _ => return None,
        })
    }

    fn burns(&mut self, parts: &mut Parts<'_>) -> Option<Vec<Burn>> {
        let mut burns = Vec::new();
        while let Some(burned) = parts.find(Rule::burned) {
            let mut inner = Parts::of(burned);
            let part = self.next_name(&mut inner)?;
            let engines = if inner.has(Rule::kw_with) {
                let engines = (self.next_expr(&mut inner)?, self.next_expr(&mut inner)?);
                inner.find(Rule::kw_engines)?;
                Some(engines)
            } else {
                None
            };
            burns.push(Burn { part, engines, hot: inner.has(Rule::kw_hot) });
        }
        Some(burns)
    }

    fn steer(&mut self, parts: &mut Parts<'_>) -> Option<Steer> {
        parts.find(Rule::kw_steer)?;
        let law = parts.any()?;
        let rule = law.as_rule();
        let inner = &mut Parts::of(law);
        Some(match rule {
            Rule::kw_upright => Steer::Upright,
            Rule::kw_keep => Steer::Keep,
            Rule::airflow if inner.has(Rule::kw_into) => Steer::IntoAirflow,
            Rule::airflow => Steer::FromAirflow,
            Rule::motion => Steer::Motion {
                against: inner.has(Rule::kw_against),
                over_ground: inner.find(Rule::kw_over).is_some(),
            },
            Rule::pitch | Rule::tangent => {
                let law = self.pitch_law(inner)?;
                let mut bearing = Parts::of(inner.find(Rule::bearing)?);
                Steer::Pitch {
                    law,
                    heading: self.next_expr(&mut bearing)?,
                    frozen: bearing.has(Rule::kw_frozen),
                }
            }
            _ => return None,
        })
    }

    fn pitch_law(&mut self, parts: &mut Parts<'_>) -> Option<PitchLaw> {
        if parts.any()?.as_rule() == Rule::kw_tangent {
            return Some(PitchLaw::Tangent { a: self.next_expr(parts)?, b: self.next_expr(parts)? });
        }
        let Some(profile) = parts.accept(Rule::profile) else {
            return Some(PitchLaw::Fixed(self.next_expr(parts)?));
        };
        let mut inner = Parts::of(profile);
        let from = self.next_expr(&mut inner)?;
        Some(match inner.any()?.as_rule() {
            Rule::kw_at => PitchLaw::Rate { from, rate: self.next_expr(&mut inner)? },
            _ => PitchLaw::Over { from, by: self.next_expr(&mut inner)?, over: self.next_expr(&mut inner)? },
        })
    }

    fn condition(&mut self, pair: Pair<'_>) -> Option<Condition> {
        let span = self.span(&pair);
        let mut parts = Parts::of(pair);
        let first = parts.any()?;
        let kind = match first.as_rule() {
            Rule::spent => ConditionKind::Spent(self.next_name(&mut Parts::of(first))?),
            Rule::kw_apex => ConditionKind::Apex,
            Rule::kw_touchdown => ConditionKind::Touchdown,
            _ => {
                let quantity = self.expr(first);
                match parts.accept(Rule::comparison) {
                    Some(comparison) => ConditionKind::Compare {
                        quantity,
                        comparison: match Parts::of(comparison).any()?.as_rule() {
                            Rule::at_least => Comparison::AtLeast,
                            Rule::at_most => Comparison::AtMost,
                            Rule::rises => Comparison::RisesTo,
                            _ => Comparison::FallsTo,
                        },
                        limit: self.next_expr(&mut parts)?,
                    },
                    None => ConditionKind::After(quantity),
                }
            }
        };
        Some(Condition { span, kind })
    }
}
