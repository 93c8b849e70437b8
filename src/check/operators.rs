//! Operators and functions: which dimensions they take, which they give, and their values.

use super::{Context, ScopeId, with_article};
use crate::diagnostics::codes::{power_of_quantity, unknown_word, wrong_arguments};
use crate::math::Scalar;
use crate::model::Function;
use crate::quantity::Dimension;
use crate::source::Span;
use crate::syntax::{Expr, Name, Operator};

/// The functions of the language by their names.
pub(crate) const FUNCTIONS: &[(&str, Function)] = &[
    ("sin", Function::Sin),
    ("cos", Function::Cos),
    ("tan", Function::Tan),
    ("asin", Function::Asin),
    ("acos", Function::Acos),
    ("atan", Function::Atan),
    ("sqrt", Function::Sqrt),
    ("abs", Function::Abs),
    ("exp", Function::Exp),
    ("ln", Function::Ln),
    ("least", Function::Least),
    ("greatest", Function::Greatest),
];

impl<'a> Context<'a> {
    /// The dimension of `left operator right`; reports sides that do not go together. `exponent` is
    /// the value of the right side of `^`, where it has one that does not change in flight.
    pub(crate) fn binary(
        &mut self,
        scope: ScopeId,
        (left, left_dimension): (&Expr, Dimension),
        (operator, operator_span): (Operator, Span),
        (right, right_dimension): (&Expr, Dimension),
        exponent: Option<f64>,
    ) -> Option<Dimension> {
        match operator {
            Operator::Add | Operator::Subtract if left_dimension == right_dimension => Some(left_dimension),
            Operator::Add | Operator::Subtract => {
                self.report_sides(scope, operator_span, (left, left_dimension), (right, right_dimension));
                None
            }
            Operator::Multiply => self.within_range(operator_span, left_dimension.times(right_dimension)),
            Operator::Divide => self.within_range(operator_span, left_dimension.over(right_dimension)),
            Operator::Power => {
                if !self.fits(scope, right, right_dimension, Dimension::NONE, "an exponent") {
                    return None;
                }
                if left_dimension == Dimension::NONE {
                    return Some(Dimension::NONE);
                }
                match exponent.filter(|power| *power == power.trunc() && power.abs() <= 100.0) {
                    Some(power) => self.within_range(operator_span, left_dimension.power(power as i8)),
                    None => {
                        self.report(power_of_quantity::found(
                            right.span,
                            left.span,
                            &with_article(left_dimension),
                        ));
                        None
                    }
                }
            }
        }
    }

    fn within_range(&mut self, operator: Span, dimension: Option<Dimension>) -> Option<Dimension> {
        if dimension.is_none() {
            self.report(power_of_quantity::beyond(operator));
        }
        dimension
    }

    /// The function of a name and the dimension of its value; reports an unknown function and
    /// arguments that it does not take.
    pub(crate) fn call(
        &mut self,
        scope: ScopeId,
        name: &Name,
        arguments: &[Expr],
        dimensions: &[Dimension],
    ) -> Option<(Function, Dimension)> {
        let Some((_, function)) = FUNCTIONS.iter().find(|(known, _)| *known == name.text) else {
            let words: Vec<_> = FUNCTIONS.iter().map(|(known, _)| *known).collect();
            self.report(unknown_word::found(name.span, &name.text, "a function", &words));
            return None;
        };
        let several = matches!(function, Function::Least | Function::Greatest);
        let (Some(argument), Some(dimension), true) =
            (arguments.first(), dimensions.first(), several || arguments.len() == 1)
        else {
            self.report(wrong_arguments::found(name.span, &name.text, arguments.len(), several));
            return None;
        };
        let what = format!("what `{}` takes", name.text);
        let result = match function {
            Function::Sin | Function::Cos | Function::Tan => {
                self.fits(scope, argument, *dimension, Dimension::ANGLE, &what).then_some(Dimension::NONE)
            }
            Function::Asin | Function::Acos | Function::Atan => {
                self.fits(scope, argument, *dimension, Dimension::NONE, &what).then_some(Dimension::ANGLE)
            }
            Function::Exp | Function::Ln => {
                self.fits(scope, argument, *dimension, Dimension::NONE, &what).then_some(Dimension::NONE)
            }
            Function::Abs => Some(*dimension),
            Function::Sqrt => {
                let root = dimension.root();
                if root.is_none() {
                    self.report(power_of_quantity::no_root(argument.span, &with_article(*dimension)));
                }
                root
            }
            Function::Least | Function::Greatest => {
                let rest = arguments.iter().zip(dimensions).skip(1);
                let mut same = true;
                for (other, found) in rest.filter(|(_, found)| *found != dimension) {
                    self.report_sides(scope, name.span, (argument, *dimension), (other, *found));
                    same = false;
                }
                same.then_some(*dimension)
            }
        };
        result.map(|dimension| (*function, dimension))
    }
}

/// The value of an operator; not finite where it has none.
pub(crate) fn apply_operator(operator: Operator, left: f64, right: f64) -> f64 {
    match operator {
        Operator::Add => left + right,
        Operator::Subtract => left - right,
        Operator::Multiply => left * right,
        Operator::Divide => left / right,
        Operator::Power if right == right.trunc() && right.abs() <= 1024.0 => {
            integer_power(left, right as i32)
        }
        Operator::Power => left.power(right),
    }
}

/// By repeated squaring, so that it is the same on every platform.
fn integer_power(base: f64, exponent: i32) -> f64 {
    let mut factor = base;
    let mut rest = exponent.unsigned_abs();
    let mut product = 1.0;
    while rest > 0 {
        if rest & 1 == 1 {
            product *= factor;
        }
        factor *= factor;
        rest >>= 1;
    }
    if exponent < 0 { 1.0 / product } else { product }
}

/// The value of a function; not finite where it has none.
pub(crate) fn apply_function(function: Function, arguments: &[f64]) -> f64 {
    let first = arguments.first().copied().unwrap_or(f64::NAN);
    match function {
        Function::Sin => Scalar::sin(first),
        Function::Cos => Scalar::cos(first),
        Function::Tan => Scalar::tan(first),
        Function::Asin => Scalar::asin(first),
        Function::Acos => Scalar::acos(first),
        Function::Atan => Scalar::atan(first),
        Function::Sqrt => Scalar::sqrt(first),
        Function::Abs => first.abs(),
        Function::Exp => Scalar::exp(first),
        Function::Ln => Scalar::ln(first),
        Function::Least => arguments.iter().copied().fold(first, f64::min),
        Function::Greatest => arguments.iter().copied().fold(first, f64::max),
    }
}
