//! A mission in flat numeric form: nothing but numbers and indices, ready for the derivative.

use super::program::Program;
use super::table::Table;
use crate::math::{Scalar, Vector};
use crate::model::{Comparison, Quantity};
use crate::world::{Air, Axes, Gravity, Spin, Surface};

/// Standard gravity, m/s² (3rd CGPM, 1901).
pub const G0: f64 = 9.80665;

/// A whole mission.
#[derive(Clone, Debug)]
pub struct Plan<S> {
    pub gravity: Gravity<S>,
    /// Gravitational parameter, m³/s², around a body.
    pub mu: Option<S>,
    /// Equatorial radius, m; of a flat world, nothing.
    pub equatorial_radius: Option<S>,
    pub surface: Surface<S>,
    pub spin: Spin<S>,
    pub air: Air<S>,
    pub drag: Drag<S>,
    /// In the order of the vehicle's parts.
    pub parts: Vec<Part<S>>,
    /// Payload and adapter, kg.
    pub payload: S,
    pub phases: Vec<Phase<S>>,
    pub start: Start<S>,
}

#[derive(Clone, Debug)]
pub struct Start<S> {
    /// At rest on the ground.
    pub pad: bool,
    pub position: Vector<S>,
    pub velocity: Vector<S>,
    /// Local axes at the start, inertial components.
    pub axes: Axes<S>,
    pub altitude: S,
    /// Body-fixed position.
    pub fixed: Vector<S>,
}

#[derive(Clone, Debug)]
pub enum Drag<S> {
    None,
    /// Coefficient times area, m².
    Steady(S),
    Curve {
        table: Table<S>,
        area: S,
        second: Second,
    },
}

/// The second input of a drag curve.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Second {
    None,
    Altitude,
    AngleOfAttack,
}

/// A part of the vehicle; masses are of all strap-ons of a group together, kg.
#[derive(Clone, Debug)]
pub struct Part<S> {
    pub dry_basic: S,
    pub dry_growth: S,
    pub loaded: S,
    pub usable: S,
    pub motor: Option<Motor<S>>,
}

impl<S: Scalar> Part<S> {
    /// With all its propellant.
    pub fn full(&self) -> S {
        self.dry_basic + self.dry_growth + self.loaded
    }
}

#[derive(Clone, Debug)]
pub struct Motor<S> {
    /// Engines of all strap-ons of the group together.
    pub engines: S,
    /// How many of these groups there are; engines lit are counted on one.
    pub count: S,
    pub thrust: Thrust<S>,
    /// Effective exhaust speed in vacuum, m/s.
    pub exhaust: S,
    /// m²
    pub exit_area: S,
    pub least: S,
    pub most: S,
    pub reserve: Reserve<S>,
}

/// Vacuum thrust of one engine at full throttle, N.
#[derive(Clone, Debug)]
pub enum Thrust<S> {
    Steady(S),
    /// Over the time since it was lit, s.
    Curve(Table<S>),
}

#[derive(Clone, Copy, Debug)]
pub enum Reserve<S> {
    /// kg, of all strap-ons of the group together.
    Mass(S),
    /// m/s
    Speed(S),
}

#[derive(Clone, Debug)]
pub struct Phase<S> {
    pub burns: Vec<Burn<S>>,
    pub lights: Vec<(Burn<S>, S)>,
    pub steer: Steer<S>,
    pub throttle: S,
    pub hold: Option<Hold<S>>,
    pub until: Vec<Condition<S>>,
    pub sheds: Vec<Shed<S>>,
}

#[derive(Clone, Debug)]
pub struct Burn<S> {
    pub part: usize,
    /// Lit in all.
    pub engines: S,
}

#[derive(Clone, Debug)]
pub struct Shed<S> {
    pub part: usize,
    pub when: Option<Condition<S>>,
}

#[derive(Clone, Debug)]
pub struct Hold<S> {
    pub quantity: Quantity,
    pub limit: S,
}

#[derive(Clone, Debug)]
pub enum Steer<S> {
    Upright,
    Airflow { against: bool },
    Motion { against: bool, over_ground: bool },
    Keep,
    Pitch { law: PitchLaw<S>, heading: S, frozen: bool },
}

/// Angles in rad, times in s from the start of the phase.
#[derive(Clone, Copy, Debug)]
pub enum PitchLaw<S> {
    Fixed(S),
    Rate { from: S, rate: S },
    Over { from: S, by: S, over: S },
    Tangent { a: S, b: S },
}

#[derive(Clone, Debug)]
pub enum Condition<S> {
    /// s from the start of the phase.
    After(S),
    /// Of quantity less limit.
    Compare(Program<S>, Comparison),
    Spent(usize),
    Apex,
    Touchdown,
}
