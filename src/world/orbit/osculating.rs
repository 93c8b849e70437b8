//! The orbit that a state would follow if the body were a point mass.

use super::{Elements, turned};
use crate::math::{Scalar, Vector};
use crate::world::root::root;

/// Eccentricity below which an orbit counts as circular, and sine of the inclination below which it
/// counts as equatorial: a little above what rounding leaves.
const SINGULAR: f64 = 1e-12;

/// The osculating orbit of an inertial state; every element is worked out when asked for.
///
/// Singular cases, so that every element always has a value:
/// - circular (e < 10⁻¹²): the argument of perigee is zero and the true anomaly counts from the node;
/// - equatorial (sin i < 10⁻¹²): the node is zero and the argument of perigee counts from inertial x,
///   in the direction of motion;
/// - escape orbit: apogee radius and period are infinite, the semi-major axis negative (parabola:
///   infinite);
/// - rectilinear (no angular momentum): inclination and node are zero, the perigee radius is zero and
///   the true anomaly π.
///
/// In the first two cases the angles, and the eccentricity itself, have no derivative.
///
/// R. R. Bate, D. D. Mueller, J. E. White, *Fundamentals of Astrodynamics* (1971), §2.4, with arc
/// tangents in place of arc cosines.
#[derive(Clone, Copy, Debug)]
pub struct Orbit<S> {
    mu: S,
    position: Vector<S>,
    /// r·v, m²/s.
    radial: S,
    energy: S,
    momentum: Vector<S>,
    /// Points to the perigee; its length is the eccentricity.
    eccentricity: Vector<S>,
}

impl<S: Scalar> Orbit<S> {
    /// From inertial position (m) and velocity (m/s) and the gravitational parameter (m³/s²).
    ///
    /// Nothing about it is finite at the centre of the body.
    pub fn new(position: Vector<S>, velocity: Vector<S>, mu: S) -> Self {
        let radius = position.length();
        let radial = position.dot(velocity);
        let square = velocity.dot(velocity);
        Orbit {
            mu,
            position,
            radial,
            energy: square * 0.5 - mu / radius,
            momentum: position.cross(velocity),
            eccentricity: position * (square / mu - S::one() / radius) - velocity * (radial / mu),
        }
    }

    /// Orbital energy a kilogram, J/kg.
    pub fn specific_energy(&self) -> S {
        self.energy
    }

    /// Specific angular momentum, m²/s.
    pub fn angular_momentum(&self) -> Vector<S> {
        self.momentum
    }

    /// m; negative on a hyperbola, infinite on a parabola.
    pub fn semi_major_axis(&self) -> S {
        if self.energy.real() == 0.0 {
            return S::from(f64::INFINITY);
        }
        -(self.mu / (self.energy * 2.0))
    }

    /// m; zero on a straight line.
    pub fn semi_latus_rectum(&self) -> S {
        self.momentum.dot(self.momentum) / self.mu
    }

    pub fn eccentricity(&self) -> S {
        root(self.eccentricity.dot(self.eccentricity))
    }

    /// Distance of the perigee from the centre, m.
    pub fn perigee_radius(&self) -> S {
        self.semi_latus_rectum() / (self.eccentricity() + 1.0)
    }

    /// Distance of the apogee from the centre, m; infinite on an escape orbit.
    pub fn apogee_radius(&self) -> S {
        if self.energy.real() < 0.0 {
            self.semi_major_axis() * (self.eccentricity() + 1.0)
        } else {
            S::from(f64::INFINITY)
        }
    }

    /// s; infinite on an escape orbit.
    pub fn period(&self) -> S {
        if self.energy.real() < 0.0 {
            let a = self.semi_major_axis();
            (a / self.mu).sqrt() * a * std::f64::consts::TAU
        } else {
            S::from(f64::INFINITY)
        }
    }

    /// rad, 0 to π.
    pub fn inclination(&self) -> S {
        self.tilt().atan2(self.momentum.z())
    }

    /// Right ascension of the ascending node from inertial x, rad, 0 to 2π.
    pub fn node(&self) -> S {
        let towards = self.node_direction();
        turned(towards.y().atan2(towards.x()))
    }

    /// rad, 0 to 2π.
    pub fn argument_of_perigee(&self) -> S {
        if self.is_circular() { S::zero() } else { self.angle_past_node(self.eccentricity) }
    }

    /// rad, 0 to 2π.
    pub fn true_anomaly(&self) -> S {
        if self.is_circular() {
            return self.angle_past_node(self.position);
        }
        // e·r·sin ν = h·(r·v)/μ and e·r·cos ν = e·r.
        let along = self.eccentricity.dot(self.position);
        let across = root(self.momentum.dot(self.momentum)) * self.radial / self.mu;
        turned(across.atan2(along))
    }

    /// Angle of the velocity above the plane normal to the radius, rad; zero at rest.
    pub fn flight_path_angle(&self) -> S {
        self.radial.atan2(root(self.momentum.dot(self.momentum)))
    }

    pub fn elements(&self) -> Elements<S> {
        Elements {
            semi_latus_rectum: self.semi_latus_rectum(),
            eccentricity: self.eccentricity(),
            inclination: self.inclination(),
            node: self.node(),
            argument_of_perigee: self.argument_of_perigee(),
            true_anomaly: self.true_anomaly(),
        }
    }

    fn is_circular(&self) -> bool {
        self.eccentricity().real() < SINGULAR
    }

    /// Part of the angular momentum that lies in the equator.
    fn tilt(&self) -> S {
        root(self.momentum.x().square() + self.momentum.y().square())
    }

    /// Towards the ascending node, of any length; inertial x where there is none.
    fn node_direction(&self) -> Vector<S> {
        let size = self.momentum.length().real();
        if self.tilt().real() > SINGULAR * size {
            Vector::new(-self.momentum.y(), self.momentum.x(), S::zero())
        } else {
            Vector::new(S::one(), S::zero(), S::zero())
        }
    }

    /// Angle from the node to a direction in the orbit's plane, in the sense of the motion.
    fn angle_past_node(&self, direction: Vector<S>) -> S {
        let node = self.node_direction();
        let normal = self.momentum.unit().unwrap_or_else(|| Vector::new(S::zero(), S::zero(), S::one()));
        turned(direction.dot(normal.cross(node)).atan2(direction.dot(node)))
    }
}
