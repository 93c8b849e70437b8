//! Where the thrust axis points.

use super::motion::{Motion, direction};
use super::plan::{PitchLaw, Steer};
use crate::math::{Scalar, Vector};
use crate::world::Local;

/// The thrust axis, a unit vector with inertial components.
pub fn axis<S: Scalar>(
    motion: &Motion<S>,
    time: S,
    velocity: Vector<S>,
    over_ground: Vector<S>,
    local: &Local<S>,
) -> Vector<S> {
    let along = |velocity: Vector<S>, against: bool| match direction(velocity) {
        Some(direction) if against => -direction,
        Some(direction) => direction,
        None => motion.axis,
    };
    match &motion.plan.phases[motion.phase].steer {
        Steer::Upright => local.axes.up,
        Steer::Airflow { against } => along(over_ground, *against),
        Steer::Motion { against, over_ground: true } => along(over_ground, *against),
        Steer::Motion { against, over_ground: false } => along(velocity, *against),
        Steer::Keep => motion.axis,
        Steer::Pitch { law, heading, frozen } => {
            let axes = if *frozen { &motion.plan.start.axes } else { &local.axes };
            axes.direction(pitch(law, time - motion.phase_start), *heading)
        }
    }
}

/// Pitch in rad at a time from the start of the phase.
fn pitch<S: Scalar>(law: &PitchLaw<S>, time: S) -> S {
    match *law {
        PitchLaw::Fixed(pitch) => pitch,
        PitchLaw::Rate { from, rate } => from + rate * time,
        PitchLaw::Over { from, by, over } if time.real() < over.real() => from + by * time / over,
        PitchLaw::Over { from, by, .. } => from + by,
        PitchLaw::Tangent { a, b } => (a + b * time).atan(),
    }
}

/// Angle between a unit vector and a velocity, rad; zero at rest.
pub fn angle<S: Scalar>(axis: Vector<S>, velocity: Vector<S>) -> S {
    let across = axis.cross(velocity);
    let square = across.dot(across);
    // Aligned, the angle has no derivative.
    let across = if square.real() > 0.0 { square.sqrt() } else { S::zero() };
    let along = axis.dot(velocity);
    if across.real() == 0.0 && along.real() == 0.0 { S::zero() } else { across.atan2(along) }
}
