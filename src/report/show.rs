//! Numbers in the units of the report.

use crate::model::Quantity;
use crate::quantity::{Dimension, System, UnitTable, format_fixed, format_number, format_si};

/// Significant digits of a report: the integration has more, the facts hardly.
pub const DIGITS: usize = 6;

/// The report's way of showing numbers.
#[derive(Clone, Copy, Debug)]
pub struct Show {
    pub system: System,
}

impl Show {
    /// The unit in which a quantity is shown whose author (or the trade) writes `unit`.
    pub fn unit<'u>(&self, dimension: Dimension, unit: &'u str) -> &'u str
    where
        'static: 'u,
    {
        self.system.unit(dimension, unit)
    }

    /// A number in SI, without its unit.
    pub fn number(&self, si: f64, unit: &str, digits: usize) -> String {
        match UnitTable::builtin().parse(unit) {
            Ok(unit) => format_si(si, &unit, digits),
            Err(_) => format_number(si, digits),
        }
    }

    /// A number in SI with its unit, no finer than a thousandth of the tolerance that it is held to.
    pub fn within(&self, si: f64, tolerance: f64, unit: &str) -> String {
        let Ok(parsed) = UnitTable::builtin().parse(unit) else { return self.with_unit(si, unit, DIGITS) };
        let finest = tolerance.abs() / parsed.factor / 1e3;
        let mut decimals = 0;
        let mut step = 1.0;
        while step > finest && decimals < 9 {
            step /= 10.0;
            decimals += 1;
        }
        format!("{} {unit}", format_fixed(parsed.from_si(si), decimals)).trim().to_owned()
    }

    /// A difference of two numbers: without the offset of a thermometer.
    pub fn difference(&self, si: f64, unit: &str, digits: usize) -> String {
        match UnitTable::builtin().parse(unit) {
            Ok(unit) => format_number(si / unit.factor, digits),
            Err(_) => format_number(si, digits),
        }
    }

    /// A number in SI with its unit.
    pub fn with_unit(&self, si: f64, unit: &str, digits: usize) -> String {
        let number = self.number(si, unit, digits);
        if unit.is_empty() { number } else { format!("{number} {unit}") }
    }

    /// A flight quantity with as many decimals as a column of a table has use for.
    pub fn in_table(&self, quantity: Quantity, si: f64) -> String {
        let unit = self.unit(quantity.dimension(), quantity.customary_unit());
        let decimals = match (quantity, unit) {
            (Quantity::Altitude | Quantity::Downrange, "km" | "nmi" | "mi") => 3,
            (Quantity::Altitude | Quantity::Downrange | Quantity::Mass, _) => 1,
            (Quantity::DynamicPressure, "Pa") => 0,
            (Quantity::DynamicPressure, "psf") => 2,
            (Quantity::GroundSpeed | Quantity::InertialSpeed, _) => 2,
            _ => 3,
        };
        let factor = UnitTable::builtin().parse(unit).map_or(1.0, |unit| unit.factor);
        format_fixed(si / factor, decimals)
    }
}
