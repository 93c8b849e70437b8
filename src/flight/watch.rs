//! What is watched during a segment, and where in a step it comes about.

use super::integrate::{Dense, crossings, root};
use super::motion::Motion;
use super::plan::{Condition, Drag};
use super::quantities::Look;
use super::throttle::{Throttle, excess, excess_at, least, needed};
use crate::math::Scalar;
use crate::model::Comparison;

/// Something that ends a step where it comes about. The order is that of one instant: sheds first,
/// then what burns out, then the end of the phase, then what only switches.
#[derive(Clone, Copy, Debug, PartialEq)]
pub enum Watch {
    /// Index of the phase's shed.
    Shed(usize),
    /// Index of the lit part.
    Spent(usize),
    /// Index of the phase's condition.
    Until(usize),
    /// The hold goes over to this.
    Throttle(Throttle),
    /// A layer of the air, m.
    Layer(f64),
    /// A knot of the drag curve, Mach number.
    Knot(f64),
    /// The Mach number leaves the range of a curve that refuses it, below or above.
    Range {
        above: bool,
        limit: f64,
    },
    Ground,
}

/// What may come about in a segment.
pub struct Watches<S> {
    pub list: Vec<Watch>,
    /// Usable propellant less reserve of each lit part, kg.
    pub burnable: Vec<S>,
    /// Altitude of the ground, m.
    pub ground: f64,
    /// Altitudes of the air's layers and Mach numbers of the drag curve's knots, rising.
    layers: &'static [f64],
    knots: Vec<f64>,
}

/// A root this close to the start of a step is that of the event that ended the step before, s.
const SAME_INSTANT: f64 = 1e-7;

impl<S: Scalar> Watches<S> {
    pub fn new(motion: &Motion<S>, burnable: Vec<S>, list: Vec<Watch>) -> Self {
        let start = &motion.plan.start;
        let knots = match &motion.plan.drag {
            Drag::Curve { table, .. } => table.knots().to_vec(),
            _ => Vec::new(),
        };
        let mut watches = Watches {
            list,
            burnable,
            ground: if start.pad { start.altitude.real() } else { 0.0 },
            layers: motion.plan.air.layer_altitudes(),
            knots,
        };
        if let (Drag::Curve { table, .. }, Some(low), Some(high)) =
            (&motion.plan.drag, watches.knots.first().copied(), watches.knots.last().copied())
            && table.refuses()
        {
            watches.list.push(Watch::Range { above: false, limit: low });
            watches.list.push(Watch::Range { above: true, limit: high });
        }
        watches
    }

    /// The value that crosses zero where the watch comes about, from below.
    fn value(&self, watch: Watch, look: &Look<S>) -> f64 {
        let (motion, now) = (look.motion, &look.now);
        let phase = &motion.plan.phases[motion.phase];
        match watch {
            Watch::Until(index) => {
                phase.until.get(index).map_or(-1.0, |condition| self.condition(condition, look))
            }
            Watch::Shed(index) => {
                let when = phase.sheds.get(index).and_then(|shed| shed.when.as_ref());
                when.map_or(-1.0, |condition| self.condition(condition, look))
            }
            Watch::Spent(index) => match (motion.lit.get(index), self.burnable.get(index)) {
                (Some(lit), Some(burnable)) => {
                    let part = &motion.plan.parts[lit.part];
                    -(*burnable - part.usable + look.left(lit.part)).real()
                }
                _ => -1.0,
            },
            Watch::Throttle(next) => phase.hold.as_ref().map_or(-1.0, |hold| {
                let pressure = now.pressure();
                match (motion.throttle, next) {
                    (Throttle::Commanded, _) => excess(hold, now).real(),
                    (Throttle::Held, Throttle::Commanded) => {
                        (needed(motion, hold, now, pressure) - phase.throttle).real()
                    }
                    (Throttle::Held, _) => (least(motion) - needed(motion, hold, now, pressure)).real(),
                    (Throttle::Floor, _) => -excess_at(motion, hold, now, least(motion)).real(),
                }
            }),
            Watch::Layer(altitude) => now.local.altitude.real() - altitude,
            Watch::Knot(mach) => now.mach.real() - mach,
            Watch::Range { above: true, limit } => now.mach.real() - limit,
            Watch::Range { above: false, limit } => limit - now.mach.real(),
            Watch::Ground => self.ground - now.local.altitude.real(),
        }
    }

    /// The value that is not negative where a condition is true.
    pub fn condition(&self, condition: &Condition<S>, look: &Look<S>) -> f64 {
        match condition {
            Condition::After(duration) => (look.now.time - look.motion.phase_start - *duration).real(),
            Condition::Compare(program, comparison) => {
                let difference = program.run(|reading| look.read(reading)).real();
                match comparison {
                    Comparison::AtLeast | Comparison::RisesTo => difference,
                    Comparison::AtMost | Comparison::FallsTo => -difference,
                }
            }
            // Told by the part's own watch.
            Condition::Spent(_) => -1.0,
            Condition::Apex => -look.now.over_ground.dot(look.now.local.axes.up).real(),
            Condition::Touchdown => self.ground - look.now.local.altitude.real(),
        }
    }

    /// The range of the drag curve's Mach numbers.
    pub fn range(&self) -> (f64, f64) {
        (self.knots.first().copied().unwrap_or(0.0), self.knots.last().copied().unwrap_or(0.0))
    }

    /// The values of the whole list at an instant.
    pub fn values(&self, look: &Look<S>) -> Vec<f64> {
        self.list.iter().map(|watch| self.value(*watch, look)).collect()
    }

    /// Layers and knots on either side of the instant.
    fn neighbours(&self, look: &Look<S>) -> (usize, usize) {
        let (altitude, mach) = (look.now.local.altitude.real(), look.now.mach.real());
        let layer = self.layers.partition_point(|layer| *layer <= altitude);
        (layer, self.knots.partition_point(|knot| *knot <= mach))
    }

    /// The earliest of all that comes about within a step, with its time. `before` are the values of
    /// the list at the step's start, `after` at its end, which ties to source order at equal times.
    pub fn earliest(
        &self,
        motion: &Motion<S>,
        dense: &Dense<S>,
        before: &[f64],
        first: &Look<S>,
        last: &Look<S>,
    ) -> Option<(f64, Watch)> {
        let (start, end) = (dense.start(), dense.end());
        let mut state = vec![S::zero(); motion.dimension()];
        let mut at = |watch: Watch, time: f64| {
            dense.state(S::from(time), &mut state);
            self.value(watch, &Look::new(motion, S::from(time), &state))
        };
        let mut found: Option<(f64, Watch)> = None;
        let mut offer = |time: f64, watch: Watch| {
            if found.is_none_or(|(earliest, _)| time < earliest) {
                found = Some((time, watch));
            }
        };
        for (watch, value) in self.list.iter().zip(before) {
            let at_end = self.value(*watch, last);
            // Flight quantities move slowly within a step: what is far from its threshold at both
            // ends, and no nearer at the end, is not looked at between.
            let quiet = at_end < *value && *value < 0.0 && !matches!(watch, Watch::Throttle(_));
            if quiet || *value >= 0.0 && at_end >= 0.0 {
                continue;
            }
            let bracket =
                match *value < 0.0 && at_end >= 0.0 {
                    true => Some((start, end)),
                    false => crossings(start, end, *value, true, |time| {
                        if time == end { at_end } else { at(*watch, time) }
                    }),
                };
            if let Some((low, high)) = bracket {
                offer(root(low, high, |time| at(*watch, time)), *watch);
            }
        }
        let ((layer_before, knot_before), (layer_after, knot_after)) =
            (self.neighbours(first), self.neighbours(last));
        let mut cut = |before: usize, after: usize, points: &[f64], make: fn(f64) -> Watch| {
            // The first point on the way; a later one is met by a later step.
            let point = if after > before { points.get(before) } else { points.get(before.wrapping_sub(1)) };
            if let (true, Some(point)) = (after != before, point) {
                let time = root(start, end, |time| at(make(*point), time));
                if time > start + SAME_INSTANT && time < end {
                    offer(time, make(*point));
                }
            }
        };
        cut(layer_before, layer_after, self.layers, Watch::Layer);
        cut(knot_before, knot_after, &self.knots, Watch::Knot);
        found
    }
}
