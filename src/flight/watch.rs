//! What is watched during a segment, and where in a step it comes about.

use super::integrate::{Dense, maximum, root};
use super::motion::Motion;
use super::plan::{Condition, Drag};
use super::quantities::Look;
use super::throttle::{Throttle, excess, excess_at, least, needed};
use crate::math::Scalar;
use crate::model::Comparison;

/// Something that ends a step where it comes about. The order of a list is that of one instant:
/// sheds first, then what burns out, then the end of the phase, then what only switches.
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
    Ground,
    /// The air goes over to this layer, across an altitude in m.
    Layer(usize, f64),
    /// The drag curve goes over to this piece, across a Mach number.
    Piece(usize, f64),
}

/// What may come about in a segment.
pub struct Watches<S> {
    pub list: Vec<Watch>,
    /// Usable propellant less reserve of each lit part, kg.
    pub burnable: Vec<S>,
    /// Altitude of the ground, m.
    pub ground: f64,
}

/// The ground is met this far below where it stands, m: at a start from it, rounding is no contact.
const TOUCH: f64 = 1e-6;

/// Where within a step the list is looked at, as shares of the step, beside its ends: enough to see
/// two crossings of one step apart.
const LOOKS: [f64; 3] = [0.25, 0.5, 0.75];
/// How near its ends a step is looked at to see which way a watch goes there, as a share of it.
const EDGE: f64 = 1e-3;

impl<S: Scalar> Watches<S> {
    pub fn new(motion: &Motion<S>, burnable: Vec<S>, list: Vec<Watch>) -> Self {
        let start = &motion.plan.start;
        Watches { list, burnable, ground: if start.pad { start.altitude.real() } else { 0.0 } }
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
            Watch::Ground => self.depth(look),
            Watch::Layer(layer, altitude) => {
                rising(layer > motion.layer, now.local.altitude.real() - altitude)
            }
            Watch::Piece(piece, mach) => rising(piece > motion.piece, now.mach.real() - mach),
        }
    }

    /// How far below the ground the vehicle is, m.
    fn depth(&self, look: &Look<S>) -> f64 {
        self.ground - look.now.local.altitude.real() - TOUCH
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
            Condition::Touchdown => self.depth(look),
        }
    }

    /// The values of the whole list at an instant.
    pub fn values(&self, look: &Look<S>) -> Vec<f64> {
        self.list.iter().map(|watch| self.value(*watch, look)).collect()
    }

    /// The earliest of all that comes about within a step, with its time; of two at one time the one
    /// that stands first. `before` and `after` are the values of the list at the step's ends, `last`
    /// looks at its end.
    pub fn earliest(
        &self,
        dense: &Dense<S>,
        before: &[f64],
        after: &[f64],
        last: &Look<S>,
    ) -> Option<(f64, Watch)> {
        let (start, end) = (dense.start(), dense.end());
        let motion = last.motion;
        let mut state = vec![S::zero(); motion.dimension()];
        let mut look = |time: f64, see: &mut dyn FnMut(&Look<S>)| {
            dense.state(S::from(time), &mut state);
            see(&Look::new(motion, S::from(time), &state));
        };
        let mut found: Option<(f64, Watch)> = None;
        let mut offer = |time: f64, watch: Watch| {
            if found.is_none_or(|(earliest, _)| time < earliest) {
                found = Some((time, watch));
            }
        };
        let mut glance = |share: f64| {
            let (time, mut values) = (start + (end - start) * share, Vec::new());
            look(time, &mut |look| values = self.values(look));
            (time, values)
        };
        let any = |is: &dyn Fn(usize) -> bool| (0..self.list.len()).any(is);
        let turns = any(&|index| self.may_turn(index, before, after));
        let within = if turns { LOOKS.map(&mut glance).to_vec() } else { Vec::new() };
        // A watch that rises at first and is no nearer at the end has a summit between.
        let mut closely = Vec::new();
        if any(&|index| self.is_quiet(index, before, after)) {
            closely.push(glance(EDGE));
            if turns
                || any(&|index| self.is_quiet(index, before, after) && closely[0].1[index] > before[index])
            {
                closely.extend(if turns { within.clone() } else { LOOKS.map(&mut glance).to_vec() });
                closely.push(glance(1.0 - EDGE));
            }
        }
        for (index, watch) in self.list.iter().enumerate() {
            let seen = |inner: &[(f64, Vec<f64>)]| -> Vec<(f64, f64)> {
                let inner = inner.iter().map(|(time, values)| (*time, values[index]));
                [(start, before[index])].into_iter().chain(inner).chain([(end, after[index])]).collect()
            };
            let mut value = |time: f64| {
                let mut value = 0.0;
                look(time, &mut |look| value = self.value(*watch, look));
                value
            };
            let found = crossing(&seen(&within)).or_else(|| {
                let seen = seen(&closely);
                crossing(&seen).or_else(|| {
                    let (low, high) = hidden_summit(&seen)?;
                    let (summit, height) = maximum(low, high, &mut value);
                    (height >= 0.0).then_some((low, summit))
                })
            });
            if let Some((low, high)) = found {
                offer(root(low, high, value), *watch);
            }
        }
        for watch in [layer_left(last), piece_left(last)].into_iter().flatten() {
            let time = root(start, end, |time| {
                let mut value = 0.0;
                look(time, &mut |look| value = self.value(watch, look));
                value
            });
            offer(time, watch);
        }
        found
    }

    /// Whether a watch has not come about at either end of a step, and may have between. Propellant
    /// only gets less, so its watch never turns.
    fn is_quiet(&self, index: usize, before: &[f64], after: &[f64]) -> bool {
        !matches!(self.list[index], Watch::Spent(_)) && before[index] < 0.0 && after[index] < 0.0
    }

    /// Whether a watch that is quiet at both ends of a step may have come about between: it is nearer
    /// at the end than at the start. Propellant only gets less, so its watch never turns.
    fn may_turn(&self, index: usize, before: &[f64], after: &[f64]) -> bool {
        let (before, after) = (before[index], after[index]);
        !matches!(self.list[index], Watch::Spent(_)) && before < 0.0 && after < 0.0 && after > before
            || before >= 0.0 && after < 0.0
    }
}

/// The first two of the points seen between which a watch comes about.
fn crossing(seen: &[(f64, f64)]) -> Option<(f64, f64)> {
    let pair = seen.windows(2).find(|pair| pair[0].1 < 0.0 && pair[1].1 >= 0.0)?;
    Some((pair[0].0, pair[1].0))
}

/// Between which of the points seen, all below zero, a summit may lie that is not: beside the greatest,
/// if the slopes around it reach so far.
fn hidden_summit(seen: &[(f64, f64)]) -> Option<(f64, f64)> {
    let greatest = (1..seen.len().saturating_sub(1)).max_by(|a, b| seen[*a].1.total_cmp(&seen[*b].1))?;
    let [before, here, after] = seen.get(greatest - 1..=greatest + 1)? else { return None };
    let summit = here.1 < 0.0 && here.1 >= before.1 && here.1 >= after.1;
    // No concave function rises further than the slopes at its sides carry it.
    let slope = |a: &(f64, f64), b: &(f64, f64)| ((b.1 - a.1) / (b.0 - a.0)).abs();
    let reach = slope(before, here).max(slope(here, after)) * (after.0 - before.0);
    (summit && here.1 + reach >= 0.0).then_some((before.0, after.0))
}

fn rising(up: bool, value: f64) -> f64 {
    if up { value } else { -value }
}

/// The next layer of the air, if the altitude has left the one that holds.
fn layer_left<S: Scalar>(look: &Look<S>) -> Option<Watch> {
    let layers = look.motion.plan.air.layer_altitudes();
    left(look.motion.layer, layers, look.now.local.altitude.real()).map(|(layer, at)| Watch::Layer(layer, at))
}

/// The next piece of the drag curve, if the Mach number has left the one that holds.
fn piece_left<S: Scalar>(look: &Look<S>) -> Option<Watch> {
    let Drag::Curve { table, .. } = &look.motion.plan.drag else { return None };
    // Without air there is no Mach number to speak of.
    look.now.air?;
    left(look.motion.piece, table.knots(), look.now.mach.real()).map(|(piece, at)| Watch::Piece(piece, at))
}

/// The neighbour into which a value has gone from a piece between points, and the point between.
fn left(piece: usize, points: &[f64], value: f64) -> Option<(usize, f64)> {
    let above = points.get(piece).filter(|point| value >= **point).map(|point| (piece + 1, *point));
    let below = piece.checked_sub(1).and_then(|below| Some((below, *points.get(below)?)));
    above.or(below.filter(|(_, point)| value < *point))
}
