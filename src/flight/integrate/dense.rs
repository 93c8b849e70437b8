//! The state between the ends of a step.

use crate::math::Scalar;

/// Dense output of order 7 over one step (Hairer, Nørsett and Wanner, section II.6).
#[derive(Clone, Debug)]
pub struct Dense<S> {
    start: S,
    size: S,
    /// Eight for each component.
    coefficients: Vec<S>,
}

impl<S: Scalar> Dense<S> {
    pub(super) fn new(start: S, size: S, coefficients: Vec<S>) -> Self {
        Dense { start, size, coefficients }
    }

    /// Time at the start of the step.
    pub fn start(&self) -> f64 {
        self.start.real()
    }

    /// Time at the end of the step.
    pub fn end(&self) -> f64 {
        (self.start + self.size).real()
    }

    /// The whole state at a time within the step.
    pub fn state(&self, time: S, state: &mut [S]) {
        // An event at a step's very start leaves a step of no length.
        let at = if self.size.real() == 0.0 { S::zero() } else { (time - self.start) / self.size };
        let rest = S::one() - at;
        for (value, piece) in state.iter_mut().zip(self.coefficients.chunks_exact(8)) {
            *value = polynomial(piece, at, rest);
        }
    }
}

/// y0 + s(c1 + r(c2 + s(c3 + r(c4 + s(c5 + r(c6 + s·c7)))))), s the fraction of the step and r = 1 − s.
fn polynomial<S: Scalar>(piece: &[S], at: S, rest: S) -> S {
    let mut sum = S::zero();
    for (power, coefficient) in piece.iter().enumerate().skip(1).rev() {
        sum = (sum + *coefficient) * if power % 2 == 1 { at } else { rest };
    }
    sum + piece[0]
}
