//! Every flight quantity, read off an instant.

use std::cell::OnceCell;

use super::attitude;
use super::instant::Instant;
use super::motion::{BACK_PRESSURE, DRAG, GRAVITY, Motion, PAID, STEERING, direction};
use super::plan::G0;
use super::result::Snapshot;
use crate::math::{Scalar, Vector};
use crate::model::{Quantity, Reading};
use crate::world::Orbit;

/// An instant with what it was worked out from.
pub struct Look<'a, 'p, S> {
    pub motion: &'a Motion<'p, S>,
    pub now: Instant<S>,
    state: &'a [S],
    /// Worked out once for all its elements.
    orbit: OnceCell<Option<Orbit<S>>>,
}

impl<'a, 'p, S: Scalar> Look<'a, 'p, S> {
    pub fn new(motion: &'a Motion<'p, S>, time: S, state: &'a [S]) -> Self {
        Look { motion, now: Instant::new(motion, time, state), state, orbit: OnceCell::new() }
    }

    /// The value of a reading; not a number where it does not exist.
    pub fn read(&self, reading: Reading) -> S {
        match (reading.quantity, reading.part) {
            (Quantity::Left, Some(part)) => self.left(part as usize),
            (quantity, _) => self.value(quantity),
        }
    }

    /// Usable propellant left of a part, kg; zero once it is gone.
    pub fn left(&self, part: usize) -> S {
        if !self.motion.carried.get(part).is_some_and(|carried| *carried) {
            return S::zero();
        }
        let lit = self.motion.lit.iter().position(|lit| lit.part == part);
        let burnt = lit.map_or(self.motion.burnt[part], |index| self.state[6 + index]);
        self.motion.plan.parts[part].usable - burnt
    }

    /// A column of the ledger since the start of the mission, m/s.
    fn column(&self, column: usize) -> S {
        self.motion.columns[column] + self.state[self.motion.ledger() + column]
    }

    fn orbit(&self) -> Option<Orbit<S>> {
        let orbit = |mu| Orbit::new(self.now.position, self.now.velocity, mu);
        *self.orbit.get_or_init(|| self.motion.plan.mu.map(orbit))
    }

    fn body_fixed(&self) -> Vector<S> {
        self.motion.plan.spin.at(self.now.time).to_fixed(self.now.position)
    }

    /// Angle of a velocity above the local horizontal, rad; zero at rest.
    fn climb(&self, velocity: Vector<S>) -> S {
        let axes = &self.now.local.axes;
        let up = velocity.dot(axes.up);
        let level = velocity.dot(axes.north).square() + velocity.dot(axes.east).square();
        // Straight up the horizontal part has no square root with a derivative.
        let level = if level.real() > 0.0 { level.sqrt() } else { S::zero() };
        if direction(velocity).is_some() { up.atan2(level) } else { S::zero() }
    }

    /// Direction of a velocity clockwise from north, rad in [0, 2π); zero at rest.
    fn heading(&self, velocity: Vector<S>) -> S {
        let axes = &self.now.local.axes;
        if direction(velocity).is_none() {
            return S::zero();
        }
        turned(velocity.dot(axes.east).atan2(velocity.dot(axes.north)))
    }

    fn longitude(&self) -> S {
        let fixed = self.body_fixed();
        fixed.y().atan2(fixed.x())
    }

    /// The value of a quantity that is not of a part.
    pub fn value(&self, quantity: Quantity) -> S {
        let now = &self.now;
        let none = || S::from(f64::NAN);
        let plan = self.motion.plan;
        let lost = |radius: S| plan.equatorial_radius.map_or_else(none, |equatorial| radius - equatorial);
        let orbital = |read: fn(&Orbit<S>) -> S| self.orbit().map_or_else(none, |orbit| read(&orbit));
        let airy = |value: S| if now.air.is_some() { value } else { S::zero() };
        match quantity {
            Quantity::Time => now.time,
            Quantity::PhaseTime => now.time - self.motion.phase_start,
            Quantity::Altitude => now.local.altitude,
            Quantity::Height => now.local.altitude - plan.start.altitude,
            Quantity::Radius if plan.mu.is_some() => now.position.length(),
            Quantity::Radius => none(),
            Quantity::Airspeed | Quantity::GroundSpeed => now.airspeed,
            Quantity::InertialSpeed => speed(now.velocity),
            Quantity::VerticalSpeed => now.over_ground.dot(now.local.axes.up),
            Quantity::FlightPathAngle => self.climb(now.velocity),
            Quantity::GeocentricFlightPathAngle => orbital(Orbit::flight_path_angle),
            Quantity::GroundFlightPathAngle => self.climb(now.over_ground),
            Quantity::Heading => self.heading(now.over_ground),
            Quantity::InertialHeading => self.heading(now.velocity),
            Quantity::Pitch => now.axis.dot(now.local.axes.up).min(S::one()).max(-S::one()).asin(),
            Quantity::AngleOfAttack => attitude::angle(now.axis, now.over_ground),
            Quantity::Mach => airy(now.mach),
            Quantity::DynamicPressure => airy(now.dynamic_pressure),
            Quantity::AirDensity => now.air.map_or_else(S::zero, |air| air.density),
            Quantity::AirPressure => now.pressure(),
            Quantity::Heating => airy(now.dynamic_pressure * now.airspeed),
            Quantity::Acceleration => speed(now.sensed()),
            Quantity::AxialAcceleration => now.axis.dot(now.sensed()),
            Quantity::Thrust => now.thrust,
            Quantity::Drag => speed(now.aerodynamic),
            Quantity::ThrustToWeight => now.thrust / (now.mass * G0),
            Quantity::Throttle => now.throttle,
            Quantity::MassFlow => now.flow,
            Quantity::Mass => now.mass,
            Quantity::Left => none(),
            Quantity::Downrange => plan.surface.downrange(plan.start.fixed, self.body_fixed()),
            Quantity::Latitude if plan.equatorial_radius.is_some() => {
                // The normal's slope to the equator is the geodetic latitude.
                now.local.axes.up.z().min(S::one()).max(-S::one()).asin()
            }
            Quantity::Longitude if plan.equatorial_radius.is_some() => self.longitude(),
            Quantity::Latitude | Quantity::Longitude => none(),
            Quantity::SemiMajorAxis => orbital(Orbit::semi_major_axis),
            Quantity::Eccentricity => orbital(Orbit::eccentricity),
            Quantity::Inclination => orbital(Orbit::inclination),
            Quantity::Node => orbital(Orbit::node),
            Quantity::ArgumentOfPerigee => orbital(Orbit::argument_of_perigee),
            Quantity::TrueAnomaly => orbital(Orbit::true_anomaly),
            Quantity::Apogee => self.orbit().map_or_else(none, |orbit| lost(orbit.apogee_radius())),
            Quantity::Perigee => self.orbit().map_or_else(none, |orbit| lost(orbit.perigee_radius())),
            Quantity::Period => orbital(Orbit::period),
            Quantity::SpecificEnergy => orbital(Orbit::specific_energy),
            Quantity::PaidDeltaV => self.column(PAID),
            Quantity::GravityLoss => self.column(GRAVITY),
            Quantity::DragLoss => self.column(DRAG),
            Quantity::SteeringLoss => self.column(STEERING),
            Quantity::BackPressureLoss => self.column(BACK_PRESSURE),
        }
    }

    /// All quantities as plain numbers.
    pub fn snapshot(&self) -> Snapshot {
        Snapshot {
            time: self.now.time.real(),
            phase: self.motion.phase,
            values: Quantity::ALL.iter().map(|quantity| self.value(*quantity).real()).collect(),
            left: (0..self.motion.plan.parts.len()).map(|part| self.left(part).real()).collect(),
            position: self.now.position.0.map(Scalar::real),
            velocity: self.now.velocity.0.map(Scalar::real),
        }
    }
}

/// Length of a vector that may be zero, where the square root has no derivative.
fn speed<S: Scalar>(vector: Vector<S>) -> S {
    let square = vector.dot(vector);
    if square.real() > 0.0 { square.sqrt() } else { S::zero() }
}

fn turned<S: Scalar>(angle: S) -> S {
    if angle.real() < 0.0 { angle + std::f64::consts::TAU } else { angle }
}
