//! The units in which a report is written.

use super::Dimension;

/// The report's choice of units.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq)]
pub enum System {
    /// Each number in the unit that its author wrote.
    #[default]
    Written,
    Si,
    UsCustomary,
}

impl System {
    /// The unit to show a quantity in, given the one that its author (or the trade) uses for it.
    pub fn unit(self, dimension: Dimension, written: &str) -> &str {
        let pairs: &[(Dimension, &str)] = match self {
            System::Written => return written,
            System::Si => &[
                (Dimension::LENGTH, "m"),
                (Dimension::AREA, "m^2"),
                (Dimension::MASS, "kg"),
                (Dimension::TIME, "s"),
                (Dimension::SPEED, "m/s"),
                (Dimension::ACCELERATION, "m/s^2"),
                (Dimension::ANGLE, "deg"),
                (Dimension::ANGULAR_RATE, "deg/s"),
                (Dimension::FORCE, "N"),
                (Dimension::PRESSURE, "Pa"),
                (Dimension::DENSITY, "kg/m^3"),
                (Dimension::MASS_FLOW, "kg/s"),
                (Dimension::HEAT_FLUX, "W/m^2"),
                (Dimension::SPECIFIC_ENERGY, "J/kg"),
                (Dimension::GRAVITATIONAL_PARAMETER, "m^3/s^2"),
            ],
            System::UsCustomary => &[
                (Dimension::LENGTH, "ft"),
                (Dimension::AREA, "ft^2"),
                (Dimension::MASS, "lbm"),
                (Dimension::TIME, "s"),
                (Dimension::SPEED, "ft/s"),
                (Dimension::ACCELERATION, "g0"),
                (Dimension::ANGLE, "deg"),
                (Dimension::ANGULAR_RATE, "deg/s"),
                (Dimension::FORCE, "lbf"),
                (Dimension::PRESSURE, "psf"),
                (Dimension::DENSITY, "slug/ft^3"),
                (Dimension::MASS_FLOW, "lbm/s"),
                (Dimension::HEAT_FLUX, "Btu/ft^2/s"),
                (Dimension::SPECIFIC_ENERGY, "ft^2/s^2"),
                (Dimension::GRAVITATIONAL_PARAMETER, "ft^3/s^2"),
            ],
        };
        // Distances of an orbit stay readable in nautical miles.
        if self == System::UsCustomary
            && dimension == Dimension::LENGTH
            && matches!(written, "km" | "nmi" | "mi")
        {
            return "nmi";
        }
        if self == System::Si && written == "km" {
            return "km";
        }
        pairs.iter().find(|(of, _)| *of == dimension).map_or(written, |(_, unit)| unit)
    }
}
