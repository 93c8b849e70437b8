//! Constant expressions: their value in SI and their dimension.

use super::{Context, ScopeId, Want};
use crate::quantity::Dimension;
use crate::syntax::Expr;

/// A value and its dimension.
#[derive(Clone, Copy, Debug, PartialEq)]
pub(crate) struct Typed {
    pub si: f64,
    pub dimension: Dimension,
}

impl<'a> Context<'a> {
    /// The value of an expression over numbers, givens and facts; reports what keeps it from
    /// having one, flight quantities included.
    pub(crate) fn infer(&mut self, scope: ScopeId, expr: &Expr) -> Option<Typed> {
        let _ = (scope, expr);
        None
    }

    /// The value of an expression that has to have a given dimension. `what` names the fact in
    /// diagnostics ("the dry mass").
    pub(crate) fn constant(
        &mut self,
        scope: ScopeId,
        expr: &Expr,
        want: impl Into<Want>,
        what: &str,
    ) -> Option<f64> {
        let _ = (scope, expr, want.into(), what);
        None
    }

    /// Checks the dimension (and the style of a pure number) of an expression that has been
    /// inferred, here or by the formulas of a mission. True where it fits; otherwise it is reported.
    pub(crate) fn fits(&mut self, expr: &Expr, found: Dimension, want: impl Into<Want>, what: &str) -> bool {
        let _ = (expr, found, want.into(), what);
        false
    }
}
