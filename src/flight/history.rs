//! The flight as it was flown: every step with its dense output.

use super::integrate::Dense;
use super::motion::Motion;
use super::quantities::Look;
use super::result::Snapshot;
use crate::math::Scalar;

/// All steps in order of time.
pub struct History<'p, S> {
    /// With whether nothing jumps at its start.
    segments: Vec<(Motion<'p, S>, bool)>,
    legs: Vec<Leg<S>>,
}

/// One step, and the segment that it belongs to.
pub struct Leg<S> {
    segment: usize,
    dense: Dense<S>,
}

impl<'p, S: Scalar> History<'p, S> {
    pub fn new() -> Self {
        History { segments: Vec::new(), legs: Vec::new() }
    }

    /// Begins a segment; the steps that follow belong to it.
    pub fn begin(&mut self, motion: &Motion<'p, S>) {
        self.segments.push((motion.clone(), false));
    }

    /// Goes on with the segment under another formula of the air or of the drag curve.
    pub fn join(&mut self, motion: &Motion<'p, S>) {
        self.segments.push((motion.clone(), true));
    }

    /// The segment that was begun last, as it began.
    pub fn segment(&self) -> Option<&Motion<'p, S>> {
        self.segments.iter().rfind(|(_, joined)| !joined).map(|(motion, _)| motion)
    }

    pub fn push(&mut self, dense: Dense<S>) {
        let segment = self.segments.len().saturating_sub(1);
        self.legs.push(Leg { segment, dense });
    }

    pub fn legs(&self) -> &[Leg<S>] {
        &self.legs
    }

    fn motion(&self, leg: &Leg<S>) -> &Motion<'p, S> {
        // invariant: a leg is pushed after the segment that it belongs to.
        &self.segments[leg.segment].0
    }

    /// The phase that a step belongs to.
    pub fn phase(&self, leg: &Leg<S>) -> usize {
        self.motion(leg).phase
    }

    /// Looks at a time within a step.
    pub fn look<T>(&self, leg: &Leg<S>, time: f64, see: impl FnOnce(&Look<'_, 'p, S>) -> T) -> T {
        let motion = self.motion(leg);
        // Looks are many: a state of the usual size needs no memory of its own.
        let (mut usual, mut large) = ([S::zero(); 24], Vec::new());
        let dimension = motion.dimension();
        let state = match usual.get_mut(..dimension) {
            Some(state) => state,
            None => {
                large.resize(dimension, S::zero());
                &mut large[..]
            }
        };
        leg.dense.state(S::from(time), state);
        see(&Look::new(motion, S::from(time), state))
    }

    pub fn snapshot(&self, leg: &Leg<S>, time: f64) -> Snapshot {
        self.look(leg, time, |look| look.snapshot())
    }

    /// Whether nothing jumps between two steps that follow each other.
    pub fn joined(&self, before: &Leg<S>, after: &Leg<S>) -> bool {
        before.segment == after.segment || self.segments.get(after.segment).is_some_and(|(_, joined)| *joined)
    }
}

impl<S: Scalar> Leg<S> {
    pub fn start(&self) -> f64 {
        self.dense.start()
    }

    pub fn end(&self) -> f64 {
        self.dense.end()
    }
}
