//! The facts of stages, vehicles, missions and curves.

use super::Builder;
use super::parts::Parts;
use crate::syntax::rules::{Pair, Rule};
use crate::syntax::{Column, Given, Literal, Requirement, StartKind, Statement};

impl Builder<'_> {
    /// Any rule that `statement` offers.
    pub(super) fn statement(&mut self, pair: Pair<'_>) -> Option<Statement> {
        let rule = pair.as_rule();
        match rule {
            Rule::setting => return self.setting(pair).map(Statement::Setting),
            Rule::given => return self.given(pair).map(Statement::Given),
            _ => {}
        }
        let parts = &mut Parts::of(pair);
        Some(match rule {
            Rule::engines => {
                let count = self.next_expr(parts)?;
                Statement::Engines { count, engine: self.next_name(parts)? }
            }
            Rule::stack => Statement::Stack(self.names(parts)),
            Rule::beside => Statement::Beside {
                carrier: self.next_name(parts)?,
                group: self.next_name(parts)?,
                count: self.next_expr(parts)?,
                stage: self.next_name(parts)?,
            },
            Rule::shroud => Statement::Shroud { name: self.next_name(parts)?, mass: self.next_expr(parts)? },
            Rule::start => self.start(parts)?,
            Rule::knob => Statement::Knob {
                path: self.path(parts.find(Rule::path)?),
                low: self.next_expr(parts)?,
                high: self.next_expr(parts)?,
            },
            Rule::aim => Statement::Aim {
                quantity: self.next_expr(parts)?,
                target: self.next_expr(parts)?,
                within: self.next_expr(parts)?,
            },
            Rule::objective => {
                Statement::Objective { most: parts.has(Rule::kw_most), quantity: self.next_expr(parts)? }
            }
            Rule::demand => self.demand(parts)?,
            Rule::figure => Statement::Figure { name: self.next_name(parts)?, value: self.next_expr(parts)? },
            Rule::headline => Statement::Headline(self.path(parts.find(Rule::path)?)),
            Rule::header => self.header(parts)?,
            Rule::row => Statement::Row(self.row(parts)?),
            Rule::from_file => Statement::From(self.quoted(&parts.find(Rule::text)?)),
            _ => return self.phase_statement(rule, parts),
        })
    }

    pub(super) fn given(&mut self, pair: Pair<'_>) -> Option<Given> {
        let mut parts = Parts::of(pair);
        let name = self.next_name(&mut parts)?;
        Some(Given { value: self.value_of(&name, &mut parts)?, name })
    }

    fn start(&mut self, parts: &mut Parts<'_>) -> Option<Statement> {
        let kind = parts.find(Rule::start_kind)?;
        let kind_span = self.span(&kind);
        let kind = match Parts::of(kind).any()?.as_rule() {
            Rule::kw_pad => StartKind::Pad,
            Rule::kw_orbit => StartKind::Orbit,
            _ => StartKind::State,
        };
        Some(Statement::Start { kind, kind_span, arguments: self.arguments(parts)? })
    }

    fn demand(&mut self, parts: &mut Parts<'_>) -> Option<Statement> {
        parts.find(Rule::kw_demand)?;
        let name = parts.accept(Rule::demand_name).map(|name| self.name(&name));
        let quantity = self.next_expr(parts)?;
        let mut required = Parts::of(parts.find(Rule::requirement)?);
        let requirement = match required.any()?.as_rule() {
            Rule::at_least => Requirement::AtLeast(self.next_expr(&mut required)?),
            Rule::at_most => Requirement::AtMost(self.next_expr(&mut required)?),
            Rule::kw_between => {
                Requirement::Between(self.next_expr(&mut required)?, self.next_expr(&mut required)?)
            }
            _ => Requirement::Within {
                target: self.next_expr(&mut required)?,
                tolerance: self.next_expr(&mut required)?,
            },
        };
        Some(Statement::Demand { name, quantity, requirement })
    }

    fn header(&mut self, parts: &mut Parts<'_>) -> Option<Statement> {
        let mut columns = Vec::new();
        while let Some(column) = parts.find(Rule::column) {
            let mut inner = Parts::of(column);
            let name = self.next_name(&mut inner)?;
            columns.push(Column { name, unit: inner.find(Rule::unit).map(|unit| self.unit(&unit)) });
        }
        let output = columns.pop()?;
        Some(Statement::Header { inputs: columns, output })
    }

    fn row(&mut self, parts: &mut Parts<'_>) -> Option<Vec<Literal>> {
        let mut row = Vec::new();
        while let Some(signed) = parts.find(Rule::signed) {
            row.push(self.literal(&signed, self.span(&signed), None)?);
        }
        Some(row)
    }
}
