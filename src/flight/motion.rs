//! The equations of motion of one segment: between two instants at which nothing switches.

use super::Frame;
use super::instant::Instant;
use super::integrate::Field;
use super::plan::{Drag, Plan, Thrust};
use super::throttle::Throttle;
use crate::math::{Scalar, Vector};

/// Columns of the ledger that are integrated with the flight, in this order.
pub const PAID: usize = 0;
pub const BACK_PRESSURE: usize = 1;
pub const STEERING: usize = 2;
pub const DRAG: usize = 3;
pub const GRAVITY: usize = 4;
pub const COLUMNS: usize = 5;

/// A part that burns.
#[derive(Clone, Debug)]
pub struct Lit<S> {
    pub part: usize,
    /// Engines lit in all.
    pub engines: S,
    /// When it was lit, s.
    pub since: S,
}

/// What holds during a segment. The state is position, velocity, propellant burnt of each lit part,
/// and the columns of the ledger.
#[derive(Clone, Debug)]
pub struct Motion<'p, S> {
    pub plan: &'p Plan<S>,
    pub frame: Frame,
    pub phase: usize,
    /// When the phase began, s.
    pub phase_start: S,
    pub lit: Vec<Lit<S>>,
    /// Mass of all that is attached, less what parts that are not lit have burnt, kg.
    pub attached: S,
    /// The thrust axis that `keep` keeps and that stands in where a direction of motion has none.
    pub axis: Vector<S>,
    pub throttle: Throttle,
    /// Which parts are still attached.
    pub carried: Vec<bool>,
    /// The layer of the air and the piece of the drag curve whose formulas hold; events change them.
    pub layer: usize,
    pub piece: usize,
    /// Propellant burnt by each part up to the start of the segment, kg.
    pub burnt: Vec<S>,
    /// Columns of the ledger up to the start of the segment, m/s.
    pub columns: [S; COLUMNS],
    /// Propellant flow of each lit part at the last instant looked at, kg/s.
    flows: Vec<S>,
}

impl<'p, S: Scalar> Motion<'p, S> {
    pub fn new(plan: &'p Plan<S>, frame: Frame) -> Self {
        Motion {
            plan,
            frame,
            phase: 0,
            phase_start: S::zero(),
            lit: Vec::new(),
            attached: S::zero(),
            axis: plan.start.axes.up,
            throttle: Throttle::Commanded,
            layer: plan.air.layer(plan.start.altitude.real()),
            piece: match &plan.drag {
                Drag::Curve { table, .. } => table.piece(start_mach(plan)),
                _ => 0,
            },
            carried: vec![true; plan.parts.len()],
            burnt: vec![S::zero(); plan.parts.len()],
            columns: [S::zero(); COLUMNS],
            flows: Vec::new(),
        }
    }

    /// Number of components of the state.
    pub fn dimension(&self) -> usize {
        6 + self.lit.len() + COLUMNS
    }

    /// Index of the first column of the ledger in the state.
    pub fn ledger(&self) -> usize {
        6 + self.lit.len()
    }

    /// What the lit engines give at a throttle: vacuum thrust (N), flow (kg/s), and the product of
    /// pressure and exit area (N).
    pub fn output(&self, time: S, common: S, pressure: S) -> Output<S> {
        let mut sum = Output { vacuum: S::zero(), flow: S::zero(), back: S::zero() };
        for lit in &self.lit {
            let Some(motor) = &self.plan.parts[lit.part].motor else { continue };
            let vacuum = self.vacuum_thrust(lit, time) * clamp(common, motor.least, motor.most);
            sum.vacuum += vacuum;
            sum.flow += vacuum / motor.exhaust;
            sum.back += pressure * motor.exit_area * lit.engines;
        }
        sum
    }

    /// Vacuum thrust of a lit part at full throttle, N.
    pub fn vacuum_thrust(&self, lit: &Lit<S>, time: S) -> S {
        match self.plan.parts[lit.part].motor.as_ref().map(|motor| &motor.thrust) {
            Some(Thrust::Steady(thrust)) => *thrust * lit.engines,
            Some(Thrust::Curve(table)) => table.at(time - lit.since, S::zero()) * lit.engines,
            None => S::zero(),
        }
    }

    /// Flow of one lit part at the common throttle, kg/s.
    fn flow(&self, lit: &Lit<S>, time: S, common: S) -> S {
        let Some(motor) = &self.plan.parts[lit.part].motor else { return S::zero() };
        self.vacuum_thrust(lit, time) * clamp(common, motor.least, motor.most) / motor.exhaust
    }
}

/// Mach number at the start; zero without air.
fn start_mach<S: Scalar>(plan: &Plan<S>) -> f64 {
    let start = &plan.start;
    let over_ground = start.velocity - plan.spin.velocity(start.position);
    let speed = over_ground.dot(over_ground).real().sqrt();
    plan.air.at(start.altitude).map_or(0.0, |air| speed / air.sound_speed.real())
}

/// What engines give together.
#[derive(Clone, Copy, Debug)]
pub struct Output<S> {
    pub vacuum: S,
    pub flow: S,
    pub back: S,
}

pub fn clamp<S: Scalar>(value: S, least: S, most: S) -> S {
    value.max(least).min(most)
}

impl<S: Scalar> Field<S> for Motion<'_, S> {
    fn rate(&mut self, time: S, state: &[S], rate: &mut [S]) {
        let now = Instant::new(self, time, state);
        let over_mass = S::one() / now.mass;
        let aerodynamic = now.aerodynamic * over_mass;
        let push = now.axis * (now.thrust * over_mass);
        let acceleration = now.gravity + aerodynamic + push;
        rate[0..3].copy_from_slice(&now.velocity.0);
        rate[3..6].copy_from_slice(&acceleration.0);

        self.flows.clear();
        for lit in &self.lit {
            self.flows.push(self.flow(lit, time, now.throttle));
        }
        let ledger = self.ledger();
        rate[6..ledger].copy_from_slice(&self.flows);

        let (towards, gravity) = match self.frame {
            Frame::BodyFixed => (now.over_ground, now.gravity + self.plan.spin.centrifugal(now.position)),
            Frame::Inertial => (now.velocity, now.gravity),
        };
        let resting = if self.lit.is_empty() { now.local.axes.up } else { now.axis };
        let towards = direction(towards).unwrap_or(resting);
        rate[ledger + PAID] = now.vacuum * over_mass;
        rate[ledger + BACK_PRESSURE] = (now.vacuum - now.thrust) * over_mass;
        rate[ledger + STEERING] = now.thrust * over_mass * (S::one() - now.axis.dot(towards));
        rate[ledger + DRAG] = -aerodynamic.dot(towards);
        rate[ledger + GRAVITY] = -gravity.dot(towards);
    }
}

/// Speed under which a velocity has no direction, m/s: what rounding leaves of the ground's own speed.
const AT_REST: f64 = 1e-7;

/// The direction of a velocity, if it has one.
pub fn direction<S: Scalar>(velocity: Vector<S>) -> Option<Vector<S>> {
    let square = velocity.dot(velocity);
    (square.real() > AT_REST * AT_REST).then(|| velocity * (S::one() / square.sqrt()))
}
