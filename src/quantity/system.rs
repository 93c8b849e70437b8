//! Systems of units, and the usual units of each dimension.

use super::Dimension;

/// The units that a report speaks in.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq)]
pub enum System {
    /// Those of the source.
    #[default]
    AsWritten,
    Si,
    UsCustomary,
}

impl System {
    /// The unit that this system shows a dimension in; none for the source's own, for plain
    /// numbers and for a dimension that has no usual unit.
    pub fn unit(self, dimension: Dimension) -> Option<&'static str> {
        let (_, si, us) = USUAL.iter().find(|(known, ..)| *known == dimension)?;
        match self {
            System::AsWritten => None,
            System::Si => si.first().copied(),
            System::UsCustomary => us.first().copied(),
        }
    }
}

/// Units that the trade writes a dimension in, SI first; none for an unusual dimension.
pub fn usual_units(dimension: Dimension) -> impl Iterator<Item = &'static str> {
    let known = USUAL.iter().filter(move |(known, ..)| *known == dimension);
    known.flat_map(|(_, si, us)| si.iter().chain(us.iter()).copied())
}

type Usual = (Dimension, &'static [&'static str], &'static [&'static str]);

/// Dimension, SI units and U.S. customary units; the first of each is the one to show.
const USUAL: &[Usual] = &[
    (Dimension::LENGTH, &["m", "km"], &["ft", "nmi"]),
    (Dimension::MASS, &["kg", "t"], &["lbm"]),
    (Dimension::TIME, &["s", "minute", "hour", "day"], &["s"]),
    (Dimension::TEMPERATURE, &["K", "degC"], &["degR", "degF"]),
    (Dimension::ANGLE, &["deg", "rad"], &["deg"]),
    (Dimension::AREA, &["m^2"], &["ft^2"]),
    (Dimension::VOLUME, &["m^3", "L"], &["ft^3", "gal"]),
    (Dimension::SPEED, &["m/s", "km/s"], &["ft/s", "kn"]),
    (Dimension::ACCELERATION, &["m/s^2", "g0"], &["ft/s^2", "g0"]),
    (Dimension::FREQUENCY, &["Hz", "1/s"], &["Hz"]),
    (Dimension::ANGULAR_RATE, &["deg/s", "rad/s"], &["deg/s", "rpm"]),
    (Dimension::ANGULAR_ACCELERATION, &["deg/s^2"], &["deg/s^2"]),
    (Dimension::FORCE, &["kN", "N"], &["lbf"]),
    (Dimension::PRESSURE, &["kPa", "Pa", "bar"], &["psf", "psi", "atm"]),
    (Dimension::DENSITY, &["kg/m^3"], &["slug/ft^3", "lbm/ft^3"]),
    (Dimension::MASS_FLOW, &["kg/s"], &["lbm/s"]),
    (Dimension::IMPULSE, &["kN*s", "N*s"], &["lbf*s"]),
    (Dimension::ENERGY, &["J", "kJ"], &["Btu", "ft*lbf"]),
    (Dimension::POWER, &["W", "kW"], &["Btu/s", "ft*lbf/s"]),
    (Dimension::HEAT_FLUX, &["W/m^2"], &["Btu/ft^2/s"]),
    (Dimension::HEAT_LOAD, &["J/m^2"], &["Btu/ft^2"]),
    (Dimension::SPECIFIC_ENERGY, &["km^2/s^2", "J/kg"], &["ft^2/s^2", "Btu/lbm"]),
    (Dimension::SPECIFIC_ANGULAR_MOMENTUM, &["km^2/s"], &["ft^2/s"]),
    (Dimension::SPECIFIC_GAS_CONSTANT, &["J/kg/K"], &["ft*lbf/lbm/degR"]),
    (Dimension::GRAVITATIONAL_PARAMETER, &["km^3/s^2", "m^3/s^2"], &["ft^3/s^2"]),
];
