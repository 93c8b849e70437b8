//! From 86 km to 1000 km, by cubics through a table of logarithms and their slopes.

use super::upper_table::SEGMENTS;
use crate::math::Scalar;
use crate::world::air::AirState;

/// Speed of sound at 86 km, m/s. The standard's table of it ends there; above, this value is kept.
pub(super) const SOUND_SPEED: f64 = 274.096_253_534_950_5;

/// Part of the table with equal steps.
pub(super) struct Segment {
    /// Geometric altitude of the first row, m.
    pub(super) bottom: f64,
    /// m
    pub(super) step: f64,
    /// ln(density in kg/m³), its slope a metre, ln(pressure in Pa), its slope a metre.
    pub(super) rows: &'static [[f64; 4]],
}

/// The air at a geometric altitude in m within the table.
#[inline]
pub(super) fn at<S: Scalar>(altitude: S) -> Option<AirState<S>> {
    // Below the table its first cell goes on: a step may look there before it is cut at 86 km.
    let segment =
        SEGMENTS.iter().rev().find(|segment| altitude.real() >= segment.bottom).or(SEGMENTS.first())?;
    let steps = (altitude - segment.bottom) / segment.step;
    let cell = (steps.real() as usize).min(segment.rows.len().saturating_sub(2));
    let [low, high] = segment.rows.get(cell..cell + 2)? else { return None };
    let hermite = Hermite::new(steps - cell as f64, segment.step);
    Some(AirState {
        density: hermite.between([low[0], low[1]], [high[0], high[1]]).exp(),
        pressure: hermite.between([low[2], low[3]], [high[2], high[3]]).exp(),
        sound_speed: S::from(SOUND_SPEED),
    })
}

/// The cubic through two values with two slopes.
struct Hermite<S> {
    /// Weight of the upper value; the lower one has the rest.
    value: S,
    /// Weights of the two slopes.
    slopes: [S; 2],
}

impl<S: Scalar> Hermite<S> {
    /// At the fraction `t` of a cell.
    fn new(t: S, step: f64) -> Self {
        let rest = S::one() - t;
        let bump = t * rest * step;
        Hermite { value: t.square() * (t * -2.0 + 3.0), slopes: [bump * rest, -(bump * t)] }
    }

    fn between(&self, low: [f64; 2], high: [f64; 2]) -> S {
        self.value * (high[0] - low[0]) + low[0] + self.slopes[0] * low[1] + self.slopes[1] * high[1]
    }
}
