//! Formulas in flat form, worked out on a small stack.

use crate::math::Scalar;
use crate::model::{Edge, Formula, Function, Operator, Reading};

/// A formula without [`Formula::At`], [`Formula::Peak`] and figures, ready to be worked out often.
#[derive(Clone, Debug)]
pub struct Program<S> {
    steps: Vec<Step<S>>,
}

#[derive(Clone, Debug)]
enum Step<S> {
    Number(S),
    Read(Reading),
    Negate,
    Binary(Operator),
    /// With the number of its arguments.
    Call(Function, usize),
}

impl<S: Scalar> Program<S> {
    /// The formula in flat form. Nodes that speak of the whole flight have no value at an instant
    /// and become not-a-number; the checker admits none here.
    pub fn new(formula: &Formula) -> Self {
        let mut steps = Vec::new();
        flatten(formula, &mut steps);
        Program { steps }
    }

    /// The value if it depends on no reading.
    pub fn constant(&self) -> Option<S> {
        let reads = self.steps.iter().any(|step| matches!(step, Step::Read(_)));
        (!reads).then(|| self.run(|_| S::zero()))
    }

    /// The single reading that the whole formula is, if it is one.
    pub fn reading(&self) -> Option<Reading> {
        match self.steps.as_slice() {
            [Step::Read(reading)] => Some(*reading),
            _ => None,
        }
    }

    /// The value with readings taken from `read`.
    pub fn run(&self, mut read: impl FnMut(Reading) -> S) -> S {
        if let [Step::Read(reading)] = self.steps.as_slice() {
            return read(*reading);
        }
        let mut stack: Vec<S> = Vec::with_capacity(self.steps.len());
        for step in &self.steps {
            let value = match step {
                Step::Number(value) => *value,
                Step::Read(reading) => read(*reading),
                Step::Negate => -pop(&mut stack),
                Step::Binary(operator) => {
                    let right = pop(&mut stack);
                    binary(*operator, pop(&mut stack), right)
                }
                Step::Call(function, count) => {
                    let first = stack.len().saturating_sub(*count);
                    let value = call(*function, &stack[first..]);
                    stack.truncate(first);
                    value
                }
            };
            stack.push(value);
        }
        pop(&mut stack)
    }
}

fn pop<S: Scalar>(stack: &mut Vec<S>) -> S {
    stack.pop().unwrap_or_else(|| S::from(f64::NAN))
}

fn flatten<S: Scalar>(formula: &Formula, steps: &mut Vec<Step<S>>) {
    match formula {
        Formula::Number { si } => steps.push(Step::Number(S::from(*si))),
        Formula::Fact { value } => steps.push(Step::Number(S::from(value.si))),
        Formula::Reading { reading } => steps.push(Step::Read(*reading)),
        Formula::Negate { of } => {
            flatten(of, steps);
            steps.push(Step::Negate);
        }
        Formula::Binary { operator, left, right } => {
            flatten(left, steps);
            flatten(right, steps);
            steps.push(Step::Binary(*operator));
        }
        Formula::Call { function, of } => {
            of.iter().for_each(|argument| flatten(argument, steps));
            steps.push(Step::Call(*function, of.len()));
        }
        Formula::Figure { .. } | Formula::At { .. } | Formula::Peak { .. } => {
            steps.push(Step::Number(S::from(f64::NAN)));
        }
    }
}

fn binary<S: Scalar>(operator: Operator, left: S, right: S) -> S {
    match operator {
        Operator::Add => left + right,
        Operator::Subtract => left - right,
        Operator::Multiply => left * right,
        Operator::Divide => left / right,
        Operator::Power => power(left, right.real()),
    }
}

/// Whole powers by multiplying out, so that a negative base keeps its sign.
fn power<S: Scalar>(base: S, exponent: f64) -> S {
    let whole = exponent.abs().min(64.0) as u32;
    if f64::from(whole) == exponent.abs() {
        let product = (0..whole).fold(S::one(), |product, _| product * base);
        return if exponent < 0.0 { S::one() / product } else { product };
    }
    base.power(exponent)
}

fn call<S: Scalar>(function: Function, of: &[S]) -> S {
    let Some(first) = of.first().copied() else { return S::from(f64::NAN) };
    match function {
        Function::Sin => first.sin(),
        Function::Cos => first.cos(),
        Function::Tan => first.tan(),
        Function::Asin => first.asin(),
        Function::Acos => first.acos(),
        Function::Atan => first.atan(),
        Function::Sqrt => first.sqrt(),
        Function::Abs => first.abs(),
        Function::Exp => first.exp(),
        Function::Ln => first.ln(),
        Function::Least => of.iter().skip(1).fold(first, |least, value| least.min(*value)),
        Function::Greatest => of.iter().skip(1).fold(first, |greatest, value| greatest.max(*value)),
    }
}

/// What a formula over the whole flight asks of it.
pub trait Whole {
    /// A formula of one instant at an edge of a phase, if the phase was flown.
    fn at(&self, of: &Formula, edge: Edge, phase: usize) -> Option<f64>;
    /// The greatest value of a formula of one instant, and when, over the flight or a phase.
    fn peak(&self, of: &Formula, phase: Option<usize>) -> Option<(f64, f64)>;
    fn figure(&self, index: usize) -> Option<f64>;
    /// A formula of one instant at the end of the flight.
    fn last(&self, reading: Reading) -> Option<f64>;
}

/// The value of a formula over the whole flight, and when its last peak stood.
pub fn evaluate(formula: &Formula, whole: &impl Whole, time: &mut Option<f64>) -> Option<f64> {
    let value = match formula {
        Formula::Number { si } => *si,
        Formula::Fact { value } => value.si,
        Formula::Reading { reading } => whole.last(*reading)?,
        Formula::Figure { index } => whole.figure(*index as usize)?,
        Formula::Negate { of } => -evaluate(of, whole, time)?,
        Formula::Binary { operator, left, right } => {
            binary(*operator, evaluate(left, whole, time)?, evaluate(right, whole, time)?)
        }
        Formula::Call { function, of } => {
            let of: Option<Vec<f64>> = of.iter().map(|argument| evaluate(argument, whole, time)).collect();
            call(*function, &of?)
        }
        Formula::At { of, edge, phase } => whole.at(of, *edge, *phase as usize)?,
        Formula::Peak { of, phase } => {
            let (value, when) = whole.peak(of, phase.map(|phase| phase as usize))?;
            *time = Some(when);
            value
        }
    };
    value.is_finite().then_some(value)
}
