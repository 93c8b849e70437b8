//! The common throttle of the lit engines, and the hold that keeps a quantity at its limit.

use super::instant::Instant;
use super::motion::Motion;
use super::plan::{G0, Hold};
use crate::math::Scalar;
use crate::model::Quantity;

/// What sets the throttle during a segment. Going from one to another is an event.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Throttle {
    /// The phase's own throttle.
    Commanded,
    /// The throttle that keeps the hold's quantity at its limit.
    Held,
    /// The limit needs less than the engines can give: all at their least.
    Floor,
}

impl Throttle {
    /// The common throttle at an instant whose thrust is not known yet.
    pub fn common<S: Scalar>(self, motion: &Motion<S>, now: &Instant<S>, pressure: S) -> S {
        let phase = &motion.plan.phases[motion.phase];
        match (self, &phase.hold) {
            (Throttle::Held, Some(hold)) => needed(motion, hold, now, pressure),
            (Throttle::Floor, Some(_)) => least(motion),
            _ => phase.throttle,
        }
    }
}

/// The least common throttle that changes anything: below it every engine stands at its own least.
pub fn least<S: Scalar>(motion: &Motion<S>) -> S {
    let leasts = motion
        .lit
        .iter()
        .filter_map(|lit| motion.plan.parts[lit.part].motor.as_ref())
        .filter(|motor| motor.least.real() < motor.most.real());
    leasts.map(|motor| motor.least).reduce(S::min).unwrap_or_else(S::one)
}

/// The common throttle at which the hold's quantity is at its limit, found in closed form; less than
/// [`least`] where no throttle of the engines does it.
pub fn needed<S: Scalar>(motion: &Motion<S>, hold: &Hold<S>, now: &Instant<S>, pressure: S) -> S {
    let thrust = thrust_at_limit(hold, now);
    let back = motion.output(now.time, S::one(), pressure).back;
    let mut rest = thrust + back;
    let mut free = S::zero();
    for lit in &motion.lit {
        let Some(motor) = &motion.plan.parts[lit.part].motor else { continue };
        let full = motion.vacuum_thrust(lit, now.time);
        if motor.least.real() < motor.most.real() {
            free += full;
        } else {
            rest -= full * motor.most;
        }
    }
    if free.real() <= 0.0 {
        return least(motion) - 1.0;
    }
    let mut common = rest / free;
    // Engines that cannot follow so far down stay at their least, and the others go further.
    for _ in 0..motion.lit.len() {
        let (mut fixed, mut follow) = (S::zero(), S::zero());
        for lit in &motion.lit {
            let Some(motor) = &motion.plan.parts[lit.part].motor else { continue };
            let full = motion.vacuum_thrust(lit, now.time);
            if motor.least.real() >= motor.most.real() {
                continue;
            }
            if motor.least.real() > common.real() {
                fixed += full * motor.least;
            } else {
                follow += full;
            }
        }
        if follow.real() <= 0.0 {
            return least(motion) - 1.0;
        }
        let next = (rest - fixed) / follow;
        if next.real() == common.real() {
            break;
        }
        common = next;
    }
    common
}

/// The net thrust at which the quantity is at its limit, N.
fn thrust_at_limit<S: Scalar>(hold: &Hold<S>, now: &Instant<S>) -> S {
    let along = now.axis.dot(now.aerodynamic);
    match hold.quantity {
        Quantity::Thrust => hold.limit,
        Quantity::ThrustToWeight => hold.limit * now.mass * G0,
        Quantity::AxialAcceleration => hold.limit * now.mass - along,
        // |T·û + A| = L·m, solved for T: the greater root.
        _ => {
            let across = now.aerodynamic.dot(now.aerodynamic) - along.square();
            let square = (hold.limit * now.mass).square() - across;
            if square.real() > 0.0 { square.sqrt() - along } else { -along }
        }
    }
}

/// The hold's quantity less its limit at an instant, in the quantity's unit.
pub fn excess<S: Scalar>(hold: &Hold<S>, now: &Instant<S>) -> S {
    let value = match hold.quantity {
        Quantity::Thrust => now.thrust,
        Quantity::ThrustToWeight => now.thrust / (now.mass * G0),
        Quantity::AxialAcceleration => now.axis.dot(now.sensed()),
        _ => now.sensed().length(),
    };
    value - hold.limit
}

/// The same at a given common throttle instead of the one in force.
pub fn excess_at<S: Scalar>(motion: &Motion<S>, hold: &Hold<S>, now: &Instant<S>, common: S) -> S {
    let output = motion.output(now.time, common, now.pressure());
    excess(
        hold,
        &Instant { throttle: common, vacuum: output.vacuum, thrust: output.vacuum - output.back, ..*now },
    )
}
