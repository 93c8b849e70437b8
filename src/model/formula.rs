//! Expressions over flight quantities, with every dimension checked.

use schemars::JsonSchema;
use serde::Serialize;

use super::Value;
use crate::quantity::Dimension;

/// An expression that is worked out at one instant of the flight.
///
/// [`Formula::At`] and [`Formula::Peak`] stand only in demands, aims and figures, where the whole
/// flight is known.
#[derive(Clone, Debug, PartialEq, Serialize, JsonSchema)]
#[serde(tag = "op", rename_all = "snake_case", deny_unknown_fields)]
pub enum Formula {
    /// A value that no fact states (a number within the expression).
    Number {
        si: f64,
    },
    /// A fact of the model, or a `given`.
    Fact {
        value: Value,
    },
    Reading {
        reading: Reading,
    },
    /// A `figure` of the same mission, by index.
    Figure {
        index: u32,
    },
    Negate {
        of: Box<Formula>,
    },
    Binary {
        operator: Operator,
        left: Box<Formula>,
        right: Box<Formula>,
    },
    Call {
        function: Function,
        of: Vec<Formula>,
    },
    At {
        of: Box<Formula>,
        edge: Edge,
        phase: u32,
    },
    /// Over the whole flight, or over one phase.
    Peak {
        of: Box<Formula>,
        phase: Option<u32>,
    },
}

#[derive(Clone, Copy, Debug, PartialEq, Eq, Serialize, JsonSchema)]
#[serde(rename_all = "snake_case")]
pub enum Edge {
    Start,
    End,
}

#[derive(Clone, Copy, Debug, PartialEq, Eq, Serialize, JsonSchema)]
#[serde(rename_all = "snake_case")]
pub enum Operator {
    Add,
    Subtract,
    Multiply,
    Divide,
    Power,
}

#[derive(Clone, Copy, Debug, PartialEq, Eq, Serialize, JsonSchema)]
#[serde(rename_all = "snake_case")]
pub enum Function {
    Sin,
    Cos,
    Tan,
    Asin,
    Acos,
    Atan,
    Sqrt,
    Abs,
    Exp,
    Ln,
    Least,
    Greatest,
}

/// A flight quantity, with the part of the vehicle where it is of one.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Serialize, JsonSchema)]
pub struct Reading {
    pub quantity: Quantity,
    /// Index into [`super::Vehicle::parts`], for `left` and `lit_time`.
    pub part: Option<u32>,
}

/// Where a quantity makes sense.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum QuantityKind {
    /// On every world.
    Any,
    /// Only around a body with central gravity (orbital elements and the like).
    Orbital,
    /// Only over an ellipsoid (latitude, longitude).
    Round,
    /// Only where there is air.
    Air,
}

macro_rules! quantities {
    ($($variant:ident $name:literal $kind:ident [$l:literal $m:literal $t:literal $a:literal] $unit:literal $doc:literal;)*) => {
        /// What can be read off a flight at any instant.
        #[derive(Clone, Copy, Debug, PartialEq, Eq, PartialOrd, Ord, Serialize, JsonSchema)]
        #[serde(rename_all = "snake_case")]
        pub enum Quantity { $(#[doc = $doc] $variant),* }

        impl Quantity {
            /// Every quantity, in the order of the manual.
            pub const ALL: &[Quantity] = &[$(Quantity::$variant),*];

            /// The word for it in a source.
            pub fn name(self) -> &'static str {
                match self { $(Quantity::$variant => $name),* }
            }

            pub fn kind(self) -> QuantityKind {
                match self { $(Quantity::$variant => QuantityKind::$kind),* }
            }

            pub fn dimension(self) -> Dimension {
                match self { $(Quantity::$variant =>
                    Dimension { length: $l, mass: $m, time: $t, temperature: 0, angle: $a }),* }
            }

            /// The unit that reports show it in where the author chose none.
            pub fn customary_unit(self) -> &'static str {
                match self { $(Quantity::$variant => $unit),* }
            }

            /// One sentence for the manual and the report, with the frame named.
            pub fn meaning(self) -> &'static str {
                match self { $(Quantity::$variant => $doc),* }
            }
        }
    };
}

quantities! {
    Time "time" Any [0 0 1 0] "s" "Time since the start of the mission.";
    PhaseTime "phase_time" Any [0 0 1 0] "s" "Time since the start of the phase.";
    Altitude "altitude" Any [1 0 0 0] "km" "Geodetic height above the ellipsoid (above the ground on a flat world).";
    Height "height" Any [1 0 0 0] "km" "Altitude less the altitude of the start.";
    Radius "radius" Orbital [1 0 0 0] "km" "Distance from the body's centre.";
    Airspeed "airspeed" Any [1 0 -1 0] "m/s" "Speed relative to the moving air (to the ground where there is no air).";
    InertialSpeed "inertial_speed" Any [1 0 -1 0] "m/s" "Speed in the inertial frame.";
    GroundSpeed "ground_speed" Any [1 0 -1 0] "m/s" "Speed in the body-fixed frame.";
    VerticalSpeed "vertical_speed" Any [1 0 -1 0] "m/s" "Rate of climb along the local vertical, body-fixed frame.";
    FlightPathAngle "flight_path_angle" Any [0 0 0 1] "deg" "Angle of the inertial velocity above the local geodetic horizontal.";
    GeocentricFlightPathAngle "geocentric_flight_path_angle" Orbital [0 0 0 1] "deg" "Angle of the inertial velocity above the plane normal to the radius.";
    GroundFlightPathAngle "ground_flight_path_angle" Any [0 0 0 1] "deg" "Angle of the body-fixed velocity above the local geodetic horizontal.";
    Heading "heading" Any [0 0 0 1] "deg" "Direction of the body-fixed velocity, clockwise from north.";
    InertialHeading "inertial_heading" Any [0 0 0 1] "deg" "Direction of the inertial velocity, clockwise from north.";
    Pitch "pitch" Any [0 0 0 1] "deg" "Angle of the thrust axis above the local horizontal.";
    AngleOfAttack "angle_of_attack" Any [0 0 0 1] "deg" "Angle between the thrust axis and the airspeed.";
    Mach "mach" Air [0 0 0 0] "" "Airspeed over the speed of sound.";
    DynamicPressure "dynamic_pressure" Air [-1 1 -2 0] "kPa" "Half the density times the airspeed squared.";
    AirDensity "air_density" Air [-3 1 0 0] "kg/m^3" "Density of the air.";
    AirPressure "air_pressure" Air [-1 1 -2 0] "kPa" "Pressure of the air.";
    Heating "heating" Air [0 1 -3 0] "W/m^2" "Free-molecular heating indicator: half the density times the airspeed cubed.";
    Acceleration "acceleration" Any [1 0 -2 0] "g0" "Size of thrust plus aerodynamic force over mass, as an accelerometer reads it.";
    AxialAcceleration "axial_acceleration" Any [1 0 -2 0] "g0" "Part of the sensed acceleration along the thrust axis.";
    Thrust "thrust" Any [1 1 -2 0] "kN" "Thrust of all lit engines at the pressure in force.";
    Drag "drag" Air [1 1 -2 0] "kN" "Size of the aerodynamic force.";
    ThrustToWeight "thrust_to_weight" Any [0 0 0 0] "" "Thrust over mass times g0 (9.80665 m/s²).";
    Throttle "throttle" Any [0 0 0 0] "%" "Common throttle of the lit engines; zero with none lit.";
    MassFlow "mass_flow" Any [0 1 -1 0] "kg/s" "Propellant burnt a second.";
    Mass "mass" Any [0 1 0 0] "kg" "Mass of all that still flies.";
    Left "left" Any [0 1 0 0] "kg" "Usable propellant of a part not yet burnt, reserve included.";
    Downrange "downrange" Any [1 0 0 0] "km" "Great circle from the start to the body-fixed ground point, times the equatorial radius.";
    Latitude "latitude" Round [0 0 0 1] "deg" "Geodetic latitude.";
    Longitude "longitude" Round [0 0 0 1] "deg" "East of the prime meridian, body-fixed.";
    SemiMajorAxis "semi_major_axis" Orbital [1 0 0 0] "km" "Osculating semi-major axis.";
    Eccentricity "eccentricity" Orbital [0 0 0 0] "" "Osculating eccentricity.";
    Inclination "inclination" Orbital [0 0 0 1] "deg" "Osculating inclination to the equator.";
    Node "node" Orbital [0 0 0 1] "deg" "Right ascension of the ascending node, from inertial x.";
    ArgumentOfPerigee "argument_of_perigee" Orbital [0 0 0 1] "deg" "Osculating argument of perigee.";
    TrueAnomaly "true_anomaly" Orbital [0 0 0 1] "deg" "Osculating true anomaly.";
    Apogee "apogee" Orbital [1 0 0 0] "km" "Apogee radius less the equatorial radius, osculating.";
    Perigee "perigee" Orbital [1 0 0 0] "km" "Perigee radius less the equatorial radius, osculating.";
    Period "period" Orbital [0 0 1 0] "minute" "Osculating orbital period.";
    SpecificEnergy "specific_energy" Orbital [2 0 -2 0] "km^2/s^2" "Orbital energy a kilogram, point mass.";
    PaidDeltaV "paid_delta_v" Any [1 0 -1 0] "m/s" "Delta-v that the propellant paid since the start of the mission.";
    GravityLoss "gravity_loss" Any [1 0 -1 0] "m/s" "Ledger's gravity column since the start, in the ledger's frame.";
    DragLoss "drag_loss" Any [1 0 -1 0] "m/s" "Ledger's drag column since the start, in the ledger's frame.";
    SteeringLoss "steering_loss" Any [1 0 -1 0] "m/s" "Ledger's steering column since the start, in the ledger's frame.";
    BackPressureLoss "back_pressure_loss" Any [1 0 -1 0] "m/s" "Ledger's back-pressure column since the start.";
}
