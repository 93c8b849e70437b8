//! What a report says: plain numbers in SI, units named in the fields or beside them.

use schemars::JsonSchema;
use serde::Serialize;

/// Version of the report's JSON form.
pub const FORMAT: &str = "stagewright-report/1";

#[derive(Clone, Debug, Serialize, JsonSchema)]
pub struct Report {
    pub format: String,
    pub mission: String,
    pub vehicle: String,
    pub world: String,
    pub epoch: Option<String>,
    pub verdict: Verdict,
    pub figures: Vec<Figure>,
    pub mass: MassStatement,
    pub stages: Vec<Stage>,
    pub ledger: Ledger,
    pub timeline: Vec<Event>,
    pub peaks: Vec<Peak>,
    pub end: End,
    pub propellant: Vec<Propellant>,
    pub assumptions: Assumptions,
    pub warnings: Vec<String>,
    pub caution: String,
}

impl Report {
    /// How the flight came out.
    pub fn verdict(&self) -> Status {
        self.verdict.status
    }
}

#[derive(Clone, Copy, Debug, PartialEq, Eq, Serialize, JsonSchema)]
#[serde(rename_all = "snake_case")]
pub enum Status {
    /// Completed, with everything met.
    Met,
    /// Completed, with a demand unmet, an aim missed or a hold exceeded.
    Unmet,
    /// The flight could not be completed.
    Failed,
}

#[derive(Clone, Debug, Serialize, JsonSchema)]
pub struct Verdict {
    pub status: Status,
    pub sentence: String,
    pub demands: Vec<Demand>,
    pub aims: Vec<Aim>,
}

/// Value, limit and margin in SI; `unit` is that in which they are shown.
#[derive(Clone, Debug, Serialize, JsonSchema)]
pub struct Demand {
    pub name: String,
    pub quantity: String,
    /// Such as `<= 45 kPa`.
    pub requirement: String,
    pub unit: String,
    pub value: Option<f64>,
    pub limit: f64,
    /// Positive when met.
    pub margin: Option<f64>,
    /// Margin over the size of the limit, or over half the width of a band, %.
    pub margin_percent: Option<f64>,
    pub met: bool,
    /// Met with less than 5 % of that to spare.
    pub close: bool,
    /// When a peak stood, s.
    pub time_s: Option<f64>,
    pub because: Option<String>,
}

#[derive(Clone, Debug, Serialize, JsonSchema)]
pub struct Aim {
    pub quantity: String,
    pub unit: String,
    pub value: Option<f64>,
    pub target: f64,
    pub tolerance: f64,
    pub hit: bool,
}

#[derive(Clone, Debug, Serialize, JsonSchema)]
pub struct Figure {
    pub name: String,
    pub quantity: String,
    pub unit: String,
    pub value: Option<f64>,
    pub headline: bool,
    pub because: Option<String>,
}

/// Masses of all strap-ons of a group together.
#[derive(Clone, Debug, Serialize, JsonSchema)]
pub struct MassStatement {
    pub parts: Vec<MassLine>,
    pub payload_kg: f64,
    pub adapter_kg: f64,
    /// All of it, as the flight starts.
    pub total_kg: f64,
}

#[derive(Clone, Debug, Serialize, JsonSchema)]
pub struct MassLine {
    pub name: String,
    pub count: f64,
    pub basic_kg: f64,
    /// Of the basic mass.
    pub growth_percent: f64,
    pub growth_kg: f64,
    pub predicted_kg: f64,
    pub propellant_kg: f64,
}

/// One unbroken burn of a part.
#[derive(Clone, Debug, Serialize, JsonSchema)]
pub struct Stage {
    pub name: String,
    pub engines: f64,
    pub ignition_s: f64,
    pub burn_time_s: f64,
    pub mass_at_ignition_kg: f64,
    pub mass_at_burnout_kg: f64,
    pub mass_ratio: f64,
    /// Paid by the whole vehicle while the part burnt.
    pub ideal_delta_v_m_s: f64,
    /// Over mass times 9.80665 m/s², at the pressure in force.
    pub thrust_to_weight_at_ignition: Option<f64>,
    pub thrust_to_weight_at_burnout: Option<f64>,
    /// Of all its engines at full throttle; with a thrust curve, its greatest.
    pub thrust_vacuum_n: f64,
    /// At 101325 Pa.
    pub thrust_sea_level_n: f64,
    pub isp_vacuum_s: f64,
    pub isp_sea_level_s: f64,
}

/// m/s; losses are positive when they cost speed.
#[derive(Clone, Debug, Serialize, JsonSchema)]
pub struct Ledger {
    /// `body-fixed` or `inertial`.
    pub frame: String,
    pub rows: Vec<LedgerLine>,
    pub total: LedgerLine,
    /// Inertial speed of the ground at the start.
    pub ground_speed_at_start_m_s: f64,
}

#[derive(Clone, Debug, Serialize, JsonSchema)]
pub struct LedgerLine {
    pub phase: String,
    pub paid_m_s: f64,
    pub back_pressure_m_s: f64,
    pub steering_m_s: f64,
    pub drag_m_s: f64,
    pub gravity_m_s: f64,
    pub gained_m_s: f64,
    pub closure_m_s: f64,
    /// By the rocket equation, where it has a closed form.
    pub rocket_equation_m_s: Option<f64>,
}

#[derive(Clone, Debug, Serialize, JsonSchema)]
pub struct Event {
    pub what: String,
    #[serde(flatten)]
    pub state: State,
}

/// The state at one instant; what does not exist in the world is left out.
#[derive(Clone, Debug, Serialize, JsonSchema)]
pub struct State {
    pub time_s: f64,
    pub phase: String,
    pub mass_kg: f64,
    pub altitude_m: f64,
    pub downrange_m: f64,
    /// Body-fixed.
    pub ground_speed_m_s: f64,
    pub inertial_speed_m_s: f64,
    /// Of the inertial velocity above the geodetic horizontal.
    pub flight_path_angle_rad: f64,
    /// Of the body-fixed velocity, clockwise from north.
    pub heading_rad: f64,
    pub latitude_rad: Option<f64>,
    pub longitude_rad: Option<f64>,
    pub mach: Option<f64>,
    pub dynamic_pressure_pa: Option<f64>,
    /// Sensed.
    pub acceleration_m_s2: f64,
}

#[derive(Clone, Debug, Serialize, JsonSchema)]
pub struct Peak {
    pub quantity: String,
    pub unit: String,
    /// SI.
    pub value: f64,
    pub time_s: f64,
    pub phase: String,
    pub altitude_m: f64,
    /// The derivative jumps there: something switches.
    pub corner: bool,
}

#[derive(Clone, Debug, Serialize, JsonSchema)]
pub struct End {
    pub state: State,
    /// Around a body with central gravity.
    pub orbit: Option<Orbit>,
}

/// Osculating, from the inertial state and the gravitational parameter alone.
#[derive(Clone, Debug, Serialize, JsonSchema)]
pub struct Orbit {
    /// Radius less the equatorial radius; of an escape orbit, none.
    pub apogee_m: Option<f64>,
    pub perigee_m: f64,
    pub semi_major_axis_m: f64,
    pub eccentricity: f64,
    pub inclination_rad: f64,
    /// From inertial x.
    pub node_rad: f64,
    pub argument_of_perigee_rad: f64,
    pub true_anomaly_rad: f64,
    pub period_s: Option<f64>,
    /// After midnight; where an epoch is given.
    pub mean_local_time_of_node_s: Option<f64>,
}

/// Of all strap-ons of a group together, kg: loaded = burnt + left + unusable.
#[derive(Clone, Debug, Serialize, JsonSchema)]
pub struct Propellant {
    pub name: String,
    pub loaded_kg: f64,
    pub burnt_kg: f64,
    /// Usable, reserve included.
    pub left_kg: f64,
    pub reserve_kg: f64,
    pub unusable_kg: f64,
    /// When it went with its part.
    pub shed_s: Option<f64>,
}

#[derive(Clone, Debug, Serialize, JsonSchema)]
pub struct Assumptions {
    /// Stated with a reason, in the order of the source.
    pub reasoned: Vec<Fact>,
    pub unreasoned: Vec<Fact>,
    /// Nobody wrote them.
    pub defaults: Vec<Fact>,
    pub conventions: Vec<String>,
}

#[derive(Clone, Debug, Serialize, JsonSchema)]
pub struct Fact {
    pub path: String,
    pub si: f64,
    pub written: String,
    /// File, relative to the mission's where it lies in or under the same folder, and line; of a
    /// default, where the block stands that lacks it.
    pub place: String,
    pub because: Option<String>,
}
