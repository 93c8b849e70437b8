//! Dormand and Prince's method of order 8(5,3), with adaptive steps.
//!
//! E. Hairer, S. P. Nørsett, G. Wanner, *Solving Ordinary Differential Equations I*, 2nd ed., 1993,
//! sections II.4 (starting step), II.5 (the pair) and II.6 (dense output).

use super::Dense;
use super::coefficients::{DENSE, DENSE_STAGES, ERROR_FIFTH, ERROR_THIRD, NODES, SOLUTION, STAGES, WEIGHTS};
use crate::math::Scalar;

/// Equations of motion in the form y′ = f(t, y).
pub trait Field<S> {
    /// Writes the derivative of `state` at `time` into `rate`; both have the same length.
    fn rate(&mut self, time: S, state: &[S], rate: &mut [S]);
}

/// What error a step may make: `relative`·|y| + `absolute`, component by component.
#[derive(Clone, Debug)]
pub struct Tolerance {
    pub relative: f64,
    pub absolute: Vec<f64>,
}

#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum StepFailure {
    /// The error asks for a step too small to change the time.
    TooSmall,
    /// The derivative or the state is not a number.
    NotFinite,
}

/// Least and greatest change of the step from one to the next, and the safety factor (DOP853's own).
const SHRINK: f64 = 0.333;
const GROW: f64 = 6.0;
const SAFETY: f64 = 0.9;
/// Exponent of the error for order 8.
const ORDER: f64 = 1.0 / 8.0;

/// The integrator of one system: its workspaces are made once and used for every step.
#[derive(Clone, Debug)]
pub struct Stepper<S> {
    tolerance: Tolerance,
    /// Ends of the last step.
    t0: S,
    t1: S,
    y0: Vec<S>,
    y1: Vec<S>,
    /// Derivatives of the stages; 12 is the derivative at the step's end.
    stages: Vec<Vec<S>>,
    work: Vec<S>,
    /// Derivative at `t1`, the first stage of the next step.
    rate: Vec<S>,
    next_size: f64,
    evaluations: u64,
    steps: u64,
}

impl<S: Scalar> Stepper<S> {
    /// For a system of as many components as the tolerance has.
    pub fn new(tolerance: Tolerance) -> Self {
        let dimension = tolerance.absolute.len();
        let zeros = || vec![S::zero(); dimension];
        Stepper {
            tolerance,
            t0: S::zero(),
            t1: S::zero(),
            y0: zeros(),
            y1: zeros(),
            stages: (0..16).map(|_| zeros()).collect(),
            work: zeros(),
            rate: zeros(),
            next_size: 0.0,
            evaluations: 0,
            steps: 0,
        }
    }

    /// Begins, or goes on after a jump, from a state of as many components as the tolerance has. A
    /// `size` that is known to fit (from before the jump) spares the search for the first step.
    pub fn start(&mut self, field: &mut impl Field<S>, time: S, state: &[S], size: Option<f64>) {
        self.t0 = time;
        self.t1 = time;
        self.y0.copy_from_slice(state);
        self.y1.copy_from_slice(state);
        field.rate(time, state, &mut self.rate);
        self.evaluations += 1;
        self.next_size = size.filter(|size| *size > 0.0).unwrap_or_else(|| self.first_size(field));
    }

    /// A first step from the sizes of the state and of its first two derivatives (Hairer, II.4).
    fn first_size(&mut self, field: &mut impl Field<S>) -> f64 {
        let scales: Vec<f64> = (0..self.y1.len()).map(|i| self.scale(i, self.y1[i].real().abs())).collect();
        let norm = |values: &[S]| {
            let sum: f64 = values
                .iter()
                .zip(&scales)
                .map(|(value, scale)| (value.real() / scale) * (value.real() / scale))
                .sum();
            (sum / scales.len().max(1) as f64).sqrt()
        };
        let (size, slope) = (norm(&self.y1), norm(&self.rate));
        let guess = if size < 1e-5 || slope < 1e-5 { 1e-6 } else { 0.01 * size / slope };
        for i in 0..self.work.len() {
            self.work[i] = self.y1[i] + self.rate[i] * guess;
        }
        field.rate(self.t1 + guess, &self.work, &mut self.stages[1]);
        self.evaluations += 1;
        for i in 0..self.work.len() {
            self.work[i] = self.stages[1][i] - self.rate[i];
        }
        let greatest = slope.max(norm(&self.work) / guess);
        let next = if greatest <= 1e-15 { (guess * 1e-3).max(1e-6) } else { (0.01 / greatest).power(ORDER) };
        let first = (100.0 * guess).min(next);
        if first.is_finite() { first } else { guess }
    }

    fn scale(&self, component: usize, size: f64) -> f64 {
        self.tolerance.absolute[component] + self.tolerance.relative * size
    }

    /// One step that the tolerance accepts and that does not pass `limit`, which is met exactly.
    ///
    /// # Errors
    /// The step collapsed, or a number was not finite. The last accepted step stands.
    pub fn step(&mut self, field: &mut impl Field<S>, limit: S) -> Result<(), StepFailure> {
        let start = self.t1;
        let room = limit.real() - start.real();
        let mut grow = GROW;
        let mut size = self.next_size;
        loop {
            // Without a derivative there is no size of a first step.
            if !size.is_finite() {
                return Err(StepFailure::NotFinite);
            }
            // A rest shorter than a hundredth of a step is taken along.
            let last = size * 1.01 >= room;
            let taken = if last { limit - start } else { S::from(size) };
            if taken.real() <= 4.0 * f64::EPSILON * start.real().abs() && taken.real() < room {
                return Err(StepFailure::TooSmall);
            }
            self.try_step(field, start, taken);
            let error = self.error(taken.real());
            if !error.is_finite() {
                if taken.real() <= 1e-10 * start.real().abs().max(1e-3) {
                    return Err(StepFailure::NotFinite);
                }
                size = 0.1 * taken.real();
                grow = 1.0;
                continue;
            }
            let factor = if error == 0.0 { GROW } else { (SAFETY * error.power(-ORDER)).clamp(SHRINK, GROW) };
            if error <= 1.0 {
                let next = taken.real() * factor.min(grow);
                // A step cut short by the limit says little against the size that was meant.
                self.next_size = if last { next.max(size.min(self.next_size)) } else { next };
                self.accept(field, start, if last { limit } else { start + taken });
                return Ok(());
            }
            size = taken.real() * factor.min(1.0);
            grow = 1.0;
        }
    }

    /// Takes the last step again, but only as far as `time`, so that an event stands at a step's end
    /// with the accuracy of the method and not of its dense output. Step control goes on from before.
    pub fn redo(&mut self, field: &mut impl Field<S>, time: S) {
        let start = self.t0;
        std::mem::swap(&mut self.y0, &mut self.y1);
        std::mem::swap(&mut self.rate, &mut self.stages[0]);
        self.steps -= 1;
        self.try_step(field, start, time - start);
        self.accept(field, start, time);
    }

    /// Fills the stages and `work`, the state at the end, from `y1` and `rate`.
    fn try_step(&mut self, field: &mut impl Field<S>, start: S, size: S) {
        self.stages[0].copy_from_slice(&self.rate);
        for stage in 1..STAGES {
            combine(&mut self.work, &self.y1, &self.stages, WEIGHTS[stage], size);
            field.rate(start + size * NODES[stage], &self.work, &mut self.stages[stage]);
        }
        self.evaluations += STAGES as u64 - 1;
        combine(&mut self.work, &self.y1, &self.stages, SOLUTION, size);
    }

    /// The error of the step in `work` over what is allowed (Hairer, II.5, eq. 5.26 and DOP853).
    fn error(&self, size: f64) -> f64 {
        let (mut fifth, mut third) = (0.0, 0.0);
        for i in 0..self.work.len() {
            let greatest = self.y1[i].real().abs().max(self.work[i].real().abs());
            let scale = self.scale(i, greatest);
            let weigh = |weights: &[(usize, f64)]| {
                let sum: f64 =
                    weights.iter().map(|(stage, weight)| self.stages[*stage][i].real() * weight).sum();
                (sum / scale) * (sum / scale)
            };
            fifth += weigh(ERROR_FIFTH);
            third += weigh(ERROR_THIRD);
        }
        let weighted = fifth + 0.01 * third;
        if weighted == 0.0 { 0.0 } else { size.abs() * fifth / (weighted * self.work.len() as f64).sqrt() }
    }

    fn accept(&mut self, field: &mut impl Field<S>, start: S, end: S) {
        field.rate(end, &self.work, &mut self.stages[12]);
        self.evaluations += 1;
        self.steps += 1;
        self.t0 = start;
        self.t1 = end;
        std::mem::swap(&mut self.y0, &mut self.y1);
        std::mem::swap(&mut self.y1, &mut self.work);
        self.rate.copy_from_slice(&self.stages[12]);
    }

    /// The dense output of the last step, which costs three more evaluations.
    pub fn dense(&mut self, field: &mut impl Field<S>) -> Dense<S> {
        let size = self.t1 - self.t0;
        for (extra, weights) in DENSE_STAGES.iter().enumerate() {
            let stage = 13 + extra;
            combine(&mut self.work, &self.y0, &self.stages, weights, size);
            field.rate(self.t0 + size * NODES[stage], &self.work, &mut self.stages[stage]);
        }
        self.evaluations += 3;
        let mut coefficients = Vec::with_capacity(8 * self.y0.len());
        for i in 0..self.y0.len() {
            let change = self.y1[i] - self.y0[i];
            let (first, last) = (self.stages[0][i] * size, self.stages[12][i] * size);
            coefficients.extend([self.y0[i], change, first - change, change * 2.0 - (last + first)]);
            for weights in DENSE {
                let mut sum = S::zero();
                for (stage, weight) in weights {
                    sum += self.stages[*stage][i] * *weight;
                }
                coefficients.push(sum * size);
            }
        }
        Dense::new(self.t0, size, coefficients)
    }

    pub fn start_time(&self) -> S {
        self.t0
    }

    pub fn end_time(&self) -> S {
        self.t1
    }

    pub fn end_state(&self) -> &[S] {
        &self.y1
    }

    /// The size that the next step would have.
    pub fn next_size(&self) -> f64 {
        self.next_size
    }

    /// Evaluations of the field so far.
    pub fn evaluations(&self) -> u64 {
        self.evaluations
    }

    /// Steps accepted so far.
    pub fn steps(&self) -> u64 {
        self.steps
    }
}

/// `out` = `from` + `size`·Σ weight·stage.
#[inline]
fn combine<S: Scalar>(out: &mut [S], from: &[S], stages: &[Vec<S>], weights: &[(usize, f64)], size: S) {
    let dimension = from.len();
    out[..dimension].fill(S::zero());
    for (stage, weight) in weights {
        for (sum, slope) in out.iter_mut().zip(&stages[*stage]) {
            *sum += *slope * *weight;
        }
    }
    for (sum, base) in out.iter_mut().zip(from) {
        *sum = *base + *sum * size;
    }
}
