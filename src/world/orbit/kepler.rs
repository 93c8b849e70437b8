//! Kepler's equation.
//!
//! Both forms are convex on the side where the root lies, so that Newton's method from a start beyond
//! the root comes down to it without a miss. It runs on real numbers; one more step in the caller's
//! number type then gives the root its derivatives.

use std::f64::consts::{PI, TAU};

use crate::math::Scalar;

/// Far more steps than the slowest case needs (an eccentricity next to one, at perigee).
const STEPS: usize = 100;

/// Eccentric anomaly in rad on an ellipse: the root of E − e·sin E = M, for 0 ≤ e < 1.
pub fn eccentric_anomaly<S: Scalar>(mean: S, eccentricity: S) -> S {
    let e = eccentricity.real();
    let turns = (mean.real() / TAU).round() * TAU;
    let target = mean.real() - turns;
    let size = target.abs();
    let root = descend((size + e).min(PI), |anomaly| {
        (anomaly - e * Scalar::sin(anomaly) - size, 1.0 - e * Scalar::cos(anomaly))
    });
    let near = S::from(if target < 0.0 { -root } else { root });
    let miss = near - eccentricity * near.sin() - (mean - turns);
    near - miss / (S::one() - eccentricity * near.cos()) + turns
}

/// Hyperbolic anomaly: the root of e·sinh H − H = M, for e > 1.
pub fn hyperbolic_anomaly<S: Scalar>(mean: S, eccentricity: S) -> S {
    let e = eccentricity.real();
    let size = mean.real().abs();
    if size == 0.0 {
        return mean / (eccentricity - 1.0);
    }
    // Upper bounds of the root, from sinh H ≥ H and from sinh H − H ≥ H³/6.
    let steep = size / (e - 1.0);
    let by_line = Scalar::ln(steep + (steep * steep + 1.0).sqrt());
    let start = by_line.min((6.0 * size / e).power(1.0 / 3.0));
    let root = descend(start, |anomaly| {
        let (sinh, cosh) = hyperbolic(anomaly);
        (e * sinh - anomaly - size, e * cosh - 1.0)
    });
    let near = S::from(if mean.real() < 0.0 { -root } else { root });
    let (sinh, cosh) = hyperbolic(near);
    near - (eccentricity * sinh - near - mean) / (eccentricity * cosh - 1.0)
}

/// Newton's method for an increasing, convex function, from a point where it is not negative.
fn descend(start: f64, function: impl Fn(f64) -> (f64, f64)) -> f64 {
    let mut at = start;
    for _ in 0..STEPS {
        let (value, slope) = function(at);
        let next = at - value / slope;
        // At the root rounding alone decides the step, so that it may not descend.
        if next >= at || next.is_nan() {
            break;
        }
        at = next;
    }
    at
}

fn hyperbolic<S: Scalar>(x: S) -> (S, S) {
    let growth = x.exp();
    let decay = S::one() / growth;
    ((growth - decay) * 0.5, (growth + decay) * 0.5)
}
