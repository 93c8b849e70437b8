//! Classical elements, the state they stand for, and motion along the conic.

use super::{eccentric_anomaly, hyperbolic_anomaly, turned};
use crate::math::{Scalar, Vector};
use crate::world::root::root;

/// How near to one an eccentricity is taken for that of a parabola.
const PARABOLIC: f64 = 1e-9;

/// Classical elements of any conic but a straight line. Angles in rad.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Elements<S> {
    /// m, positive.
    pub semi_latus_rectum: S,
    pub eccentricity: S,
    pub inclination: S,
    /// Right ascension of the ascending node, from inertial x.
    pub node: S,
    pub argument_of_perigee: S,
    pub true_anomaly: S,
}

enum Conic {
    Ellipse,
    Parabola,
    Hyperbola,
}

impl<S: Scalar> Elements<S> {
    /// From the radii of perigee and apogee in m, the perigee the smaller; the angles are left at zero.
    pub fn from_apsides(perigee: S, apogee: S) -> Self {
        let sum = perigee + apogee;
        Elements {
            semi_latus_rectum: perigee * apogee * 2.0 / sum,
            eccentricity: (apogee - perigee) / sum,
            inclination: S::zero(),
            node: S::zero(),
            argument_of_perigee: S::zero(),
            true_anomaly: S::zero(),
        }
    }

    /// m; negative on a hyperbola, not finite on a parabola.
    pub fn semi_major_axis(&self) -> S {
        self.semi_latus_rectum / (S::one() - self.eccentricity.square())
    }

    /// Inertial position (m) and velocity (m/s).
    ///
    /// On a hyperbola the true anomaly has to lie between the asymptotes.
    pub fn state(&self, mu: S) -> (Vector<S>, Vector<S>) {
        let (sin_i, cos_i) = (self.inclination.sin(), self.inclination.cos());
        let (sin_node, cos_node) = (self.node.sin(), self.node.cos());
        let towards_node = Vector::new(cos_node, sin_node, S::zero());
        let ahead_of_node = Vector::new(-(sin_node * cos_i), cos_node * cos_i, sin_i);
        let (sin_w, cos_w) = (self.argument_of_perigee.sin(), self.argument_of_perigee.cos());
        let p = towards_node * cos_w + ahead_of_node * sin_w;
        let q = ahead_of_node * cos_w - towards_node * sin_w;
        let (sin, cos) = (self.true_anomaly.sin(), self.true_anomaly.cos());
        let radius = self.semi_latus_rectum / (S::one() + self.eccentricity * cos);
        let speed = (mu / self.semi_latus_rectum).sqrt();
        let position = p * (radius * cos) + q * (radius * sin);
        let velocity = q * (speed * (self.eccentricity + cos)) - p * (speed * sin);
        (position, velocity)
    }

    /// Time in s from the perigee, at most half a period either way on an ellipse.
    pub fn time_from_perigee(&self, mu: S) -> S {
        self.mean_anomaly() / self.mean_motion(mu)
    }

    /// The elements after a time in s: only the true anomaly moves.
    pub fn after(&self, time: S, mu: S) -> Self {
        let mean = self.mean_anomaly() + self.mean_motion(mu) * time;
        let e = self.eccentricity;
        let true_anomaly = match self.conic() {
            Conic::Ellipse => {
                let anomaly = eccentric_anomaly(mean, e);
                (root(S::one() - e.square()) * anomaly.sin()).atan2(anomaly.cos() - e)
            }
            Conic::Parabola => barker(mean).atan() * 2.0,
            Conic::Hyperbola => {
                let growth = hyperbolic_anomaly(mean, e).exp();
                let decay = S::one() / growth;
                (root(e.square() - 1.0) * (growth - decay)).atan2(e * 2.0 - (growth + decay))
            }
        };
        Elements { true_anomaly: turned(true_anomaly), ..*self }
    }

    fn conic(&self) -> Conic {
        match self.eccentricity.real() - 1.0 {
            over if over.abs() < PARABOLIC => Conic::Parabola,
            over if over > 0.0 => Conic::Hyperbola,
            _ => Conic::Ellipse,
        }
    }

    /// Rate of the mean anomaly, rad/s; on a parabola √(μ/p³).
    fn mean_motion(&self, mu: S) -> S {
        let size = match self.conic() {
            Conic::Parabola => self.semi_latus_rectum,
            _ => self.semi_major_axis().abs(),
        };
        (mu / size).sqrt() / size
    }

    fn mean_anomaly(&self) -> S {
        let e = self.eccentricity;
        let (sin, cos) = (self.true_anomaly.sin(), self.true_anomaly.cos());
        match self.conic() {
            Conic::Ellipse => {
                let anomaly = (root(S::one() - e.square()) * sin).atan2(e + cos);
                anomaly - e * anomaly.sin()
            }
            Conic::Parabola => {
                // tan(ν/2), in the form that has no pole but at ν = π.
                let half = sin / (S::one() + cos);
                (half + half.square() * half / 3.0) * 0.5
            }
            Conic::Hyperbola => {
                let sinh = root(e.square() - 1.0) * sin / (S::one() + e * cos);
                e * sinh - inverse_sinh(sinh)
            }
        }
    }
}

/// tan(ν/2) on a parabola, the root of Barker's equation D + D³/3 = 2M.
fn barker<S: Scalar>(mean: S) -> S {
    let w = mean.abs() * 3.0;
    let cube_root = (w + (w.square() + 1.0).sqrt()).power(1.0 / 3.0);
    let half = cube_root - S::one() / cube_root;
    if mean.real() < 0.0 { -half } else { half }
}

fn inverse_sinh<S: Scalar>(x: S) -> S {
    let size = x.abs();
    let positive = (size + (size.square() + 1.0).sqrt()).ln();
    if x.real() < 0.0 { -positive } else { positive }
}
