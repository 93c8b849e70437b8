//! Everything physical at one instant, worked out once: the derivative and every quantity read it.

use super::attitude;
use super::motion::{Motion, Output};
use super::plan::{Drag, Second};
use crate::math::{Scalar, Vector};
use crate::world::{AirState, Local};

/// Vectors are inertial.
#[derive(Clone, Copy, Debug)]
pub struct Instant<S> {
    pub time: S,
    pub position: Vector<S>,
    pub velocity: Vector<S>,
    /// Velocity relative to the rotating body, which the air follows.
    pub over_ground: Vector<S>,
    pub local: Local<S>,
    pub mass: S,
    /// Where there is air.
    pub air: Option<AirState<S>>,
    /// m/s
    pub airspeed: S,
    /// Zero without air.
    pub mach: S,
    /// Pa, zero without air.
    pub dynamic_pressure: S,
    /// N
    pub aerodynamic: Vector<S>,
    /// Unit vector.
    pub axis: Vector<S>,
    /// Common throttle.
    pub throttle: S,
    /// Of all lit engines, in vacuum and at the pressure in force, N.
    pub vacuum: S,
    pub thrust: S,
    /// kg/s
    pub flow: S,
    /// m/s²
    pub gravity: Vector<S>,
}

impl<S: Scalar> Instant<S> {
    pub fn new(motion: &Motion<S>, time: S, state: &[S]) -> Self {
        let plan = motion.plan;
        let position = Vector([state[0], state[1], state[2]]);
        let velocity = Vector([state[3], state[4], state[5]]);
        let over_ground = velocity - plan.spin.velocity(position);
        let local = plan.surface.local(position);
        let mut mass = motion.attached;
        for burnt in &state[6..motion.ledger()] {
            mass -= *burnt;
        }
        let square = over_ground.dot(over_ground);
        // At rest the square root has no derivative, and the speed is zero.
        let airspeed = if square.real() > 0.0 { square.sqrt() } else { S::zero() };
        let axis = attitude::axis(motion, time, velocity, over_ground, &local);

        let air = plan.air.within(motion.layer, local.altitude);
        let (mut mach, mut dynamic_pressure, mut pressure) = (S::zero(), S::zero(), S::zero());
        let mut aerodynamic = Vector::zero();
        if let Some(air) = &air {
            mach = airspeed / air.sound_speed;
            dynamic_pressure = air.density * square * 0.5;
            pressure = air.pressure;
            let area = match &plan.drag {
                Drag::None => S::zero(),
                Drag::Steady(area) => *area,
                Drag::Curve { table, area, second } => {
                    let second = match second {
                        Second::None => S::zero(),
                        Second::Altitude => local.altitude,
                        Second::AngleOfAttack => attitude::angle(axis, over_ground),
                    };
                    table.within(motion.piece, mach, second) * *area
                }
            };
            aerodynamic = over_ground * -(air.density * airspeed * area * 0.5);
        }

        let now = Instant {
            time,
            position,
            velocity,
            over_ground,
            local,
            mass,
            air,
            airspeed,
            mach,
            dynamic_pressure,
            aerodynamic,
            axis,
            throttle: S::zero(),
            vacuum: S::zero(),
            thrust: S::zero(),
            flow: S::zero(),
            gravity: plan.gravity.acceleration(position),
        };
        if motion.lit.is_empty() {
            return now;
        }
        let throttle = motion.throttle.common(motion, &now, pressure);
        let Output { vacuum, flow, back } = motion.output(time, throttle, pressure);
        Instant { throttle, vacuum, thrust: vacuum - back, flow, ..now }
    }

    /// Acceleration that an accelerometer reads, m/s².
    pub fn sensed(&self) -> Vector<S> {
        (self.axis * self.thrust + self.aerodynamic) * (S::one() / self.mass)
    }

    /// Pressure of the air, Pa; zero without air.
    pub fn pressure(&self) -> S {
        self.air.map_or_else(S::zero, |air| air.pressure)
    }
}
