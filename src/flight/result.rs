//! What a flight gives: plain numbers in SI units, with indices into the mission that was flown.

use crate::model::{Quantity, Reading};

/// A flown mission.
#[derive(Clone, Debug)]
pub struct Flight {
    pub completion: Completion,
    /// The frame in which the ledger is kept.
    pub frame: Frame,
    /// Phases that were entered, in order.
    pub phases: Vec<PhaseFlown>,
    pub events: Vec<Event>,
    pub ledger: Ledger,
    /// One row for each unbroken burn of one part.
    pub burns: Vec<Burned>,
    /// As long as the vehicle's parts, and in their order.
    pub parts: Vec<PartAccount>,
    /// Peaks of the quantities that every report shows.
    pub peaks: Vec<Peak>,
    pub demands: Vec<DemandResult>,
    pub aims: Vec<AimResult>,
    pub figures: Vec<FigureResult>,
    pub notices: Vec<Notice>,
    /// States for plots and tables: the ends of every step and points between, in order of time;
    /// at a jump both sides stand, the earlier first.
    pub samples: Vec<Snapshot>,
    /// Evaluations of the equations of motion, and accepted steps.
    pub evaluations: u64,
    pub steps: u64,
}

#[derive(Clone, Debug, PartialEq)]
pub enum Completion {
    Completed,
    Failed(Failure),
}

/// Where and why a flight could not be completed.
#[derive(Clone, Debug, PartialEq)]
pub struct Failure {
    pub time: f64,
    pub phase: usize,
    pub cause: Cause,
}

#[derive(Clone, Debug, PartialEq)]
pub enum Cause {
    /// Net thrust does not exceed the weight at lift-off; both in N.
    NoLiftOff { thrust: f64, weight: f64 },
    /// Reached the ground on the way down in a phase that does not end by touch-down; speed in m/s.
    GroundImpact { speed: f64 },
    /// A phase went on past the limit of time (s) or steps without its `until` coming true.
    NeverEnds { after: f64 },
    /// The drag curve was read outside its range: at a Mach number, or at a second input (m or rad).
    CurveRange { input: Quantity, value: f64, low: f64, high: f64 },
    /// A lit part has no usable propellant left and the phase does not end by it.
    RanDry { part: usize },
    /// The step became too small, or a number was not finite.
    Numerical { detail: String },
}

/// Frame of the ledger's speed.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Frame {
    /// Rotating with the body: flights from the ground.
    BodyFixed,
    Inertial,
}

#[derive(Clone, Debug)]
pub struct PhaseFlown {
    /// Index into [`crate::model::Mission::phases`].
    pub phase: usize,
    pub start: Snapshot,
    /// Before the sheds at its end.
    pub end: Snapshot,
    /// Index into the phase's `until` of the condition that ended it.
    pub ended_by: Option<usize>,
    /// Least throttle flown, and whether a hold needed less than the engines can give.
    pub throttle_least: f64,
}

/// The state at one instant.
#[derive(Clone, Debug, Default)]
pub struct Snapshot {
    pub time: f64,
    /// Index of the phase in force.
    pub phase: usize,
    /// In the order of [`Quantity::ALL`]; not a number where the quantity does not exist here.
    pub values: Vec<f64>,
    /// Usable propellant left of each part, kg; zero once it is gone.
    pub left: Vec<f64>,
    /// Inertial position (m) and velocity (m/s); on a flat world east, north, up.
    pub position: [f64; 3],
    pub velocity: [f64; 3],
}

impl Snapshot {
    /// A quantity, if it exists in this world at this instant.
    pub fn get(&self, quantity: Quantity) -> Option<f64> {
        self.values.get(quantity as usize).copied().filter(|value| value.is_finite())
    }

    /// A reading, if it exists in this world at this instant.
    pub fn read(&self, reading: Reading) -> Option<f64> {
        match (reading.quantity, reading.part) {
            (Quantity::Left, Some(part)) => self.left.get(part as usize).copied(),
            (quantity, _) => self.get(quantity),
        }
    }
}

#[derive(Clone, Debug)]
pub struct Event {
    pub kind: EventKind,
    pub state: Snapshot,
}

#[derive(Clone, Debug, PartialEq)]
pub enum EventKind {
    LiftOff,
    /// Index of the phase.
    PhaseStart(usize),
    /// Index of the part.
    Ignition(usize),
    CutOff(usize),
    /// Usable propellant down to the reserve.
    Spent(usize),
    Shed(usize),
    /// A hold starts or stops to act in this phase.
    HoldEnters(usize),
    HoldLeaves(usize),
    /// Index into [`Flight::peaks`].
    Peak(usize),
    MachOne,
    Apex,
    Touchdown,
    /// The last phase has ended.
    End,
}

/// The account of delta-v, m/s; losses are positive when they cost speed.
#[derive(Clone, Debug, Default)]
pub struct Ledger {
    /// One row for each of [`Flight::phases`].
    pub rows: Vec<LedgerRow>,
    pub total: LedgerRow,
    /// Speed of the ground at the start in the inertial frame (the gift of rotation), m/s.
    pub ground_speed_at_start: f64,
}

#[derive(Clone, Copy, Debug, Default, PartialEq)]
pub struct LedgerRow {
    pub paid: f64,
    pub back_pressure: f64,
    pub steering: f64,
    pub drag: f64,
    pub gravity: f64,
    /// Speed at the end less speed at the start, in the ledger's frame.
    pub gained: f64,
    /// Σ isp·g0·ln(m₀/m₁) over the pieces between mass jumps and changes of the lit set; nothing where
    /// engines of different isp change their shares within a piece, which has no closed form.
    pub ideal: Option<f64>,
}

impl LedgerRow {
    /// What the columns leave unexplained.
    pub fn closure(&self) -> f64 {
        self.paid - self.back_pressure - self.steering - self.drag - self.gravity - self.gained
    }
}

/// One unbroken burn of one part.
#[derive(Clone, Debug)]
pub struct Burned {
    pub part: usize,
    pub start: Snapshot,
    pub end: Snapshot,
    /// kg, all of the part's engines.
    pub propellant: f64,
    /// Delta-v paid by the whole vehicle while it burnt, m/s.
    pub paid: f64,
}

/// Where one part's propellant went, kg; all engines and all strap-ons of the group together.
#[derive(Clone, Debug, Default)]
pub struct PartAccount {
    pub dry_basic: f64,
    pub dry_growth: f64,
    pub loaded: f64,
    pub unusable: f64,
    pub reserve: f64,
    pub burnt: f64,
    /// Usable and not burnt at the end or when it was shed, reserve included.
    pub left: f64,
    pub shed_at: Option<f64>,
}

#[derive(Clone, Debug)]
pub struct Peak {
    pub quantity: Quantity,
    pub value: f64,
    pub state: Snapshot,
    /// It stands at a corner, where the derivative jumps (a shed, a cut-off, a hold).
    pub corner: bool,
}

#[derive(Clone, Debug)]
pub struct DemandResult {
    /// Nothing where the flight never had the quantity.
    pub value: Option<f64>,
    /// The limit; for a band the nearer end.
    pub limit: f64,
    /// Positive when met.
    pub margin: f64,
    /// What a margin is a share of: the size of the limit, or half the width of a band.
    pub scale: f64,
    pub met: bool,
    /// Where a peak stood.
    pub time: Option<f64>,
}

#[derive(Clone, Debug)]
pub struct AimResult {
    pub value: Option<f64>,
    pub target: f64,
    pub tolerance: f64,
    pub hit: bool,
}

#[derive(Clone, Debug)]
pub struct FigureResult {
    pub value: Option<f64>,
}

/// Something that the author should know and that did not stop the flight.
#[derive(Clone, Debug, PartialEq)]
pub enum Notice {
    /// A condition of `until` was already true as the phase began.
    TrueAtStart { phase: usize, condition: usize },
    /// A `shed … when` never came true; index into the phase's sheds.
    NeverShed { phase: usize, shed: usize },
    /// A hold needed less throttle than the engines have; greatest excess over the limit, SI.
    HoldExceeded { phase: usize, worst: f64, limit: f64, time: f64 },
    /// Flew above the top of the air model, m.
    AboveAir { top: f64, time: f64 },
}
