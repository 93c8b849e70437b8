//! Products of units as sources write them.

use std::ops::Range;

use super::{Unit, UnitTable};

/// Why a text is no unit.
#[derive(Clone, Debug, PartialEq, Eq)]
pub struct UnitError {
    /// The bytes of the factor at fault, from the start of the text.
    pub range: Range<usize>,
    pub kind: UnitErrorKind,
}

/// What is wrong with a factor of a unit.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum UnitErrorKind {
    /// Nothing stands where a factor should.
    Empty,
    /// Nobody knows the symbol.
    Unknown,
    /// The symbol has several meanings or another name here; the text says what to write.
    Ambiguous(&'static str),
    /// The power is not a whole number from -127 to 127 other than zero.
    BadPower,
    /// An absolute reading of temperature is part of a product.
    TemperatureInProduct,
    /// The product leaves the range of numbers or of dimensions.
    Overflow,
}

/// Reads factors joined by `/` and `*`, each with a whole power after `^`. Only the first factor
/// may be `1`.
pub(super) fn parse(table: &UnitTable, text: &str) -> Result<Unit, UnitError> {
    let is_sole = !text.contains(['/', '*', '^']);
    let mut product = Unit::ONE;
    let mut start = 0;
    let mut divides = false;
    for piece in text.split_inclusive(['/', '*']) {
        let factor = piece.strip_suffix(['/', '*']).unwrap_or(piece);
        let range = start..start + factor.len();
        let fault = |kind| UnitError { range: range.clone(), kind };
        if !(factor == "1" && start == 0 && piece.ends_with('/')) {
            let (unit, power) = read_factor(table, factor).map_err(fault)?;
            if is_sole {
                return Ok(unit);
            }
            if unit.offset != 0.0 {
                return Err(fault(UnitErrorKind::TemperatureInProduct));
            }
            let power = if divides { -power } else { power };
            product = times(product, unit, power).ok_or_else(|| fault(UnitErrorKind::Overflow))?;
        }
        start += piece.len();
        divides = piece.ends_with('/');
    }
    if text.is_empty() || text.ends_with(['/', '*']) {
        return Err(UnitError { range: start..start, kind: UnitErrorKind::Empty });
    }
    Ok(product)
}

/// The unit and the power of one factor.
fn read_factor(table: &UnitTable, factor: &str) -> Result<(Unit, i8), UnitErrorKind> {
    let (symbol, power) = factor.split_once('^').unwrap_or((factor, "1"));
    if symbol.is_empty() {
        return Err(UnitErrorKind::Empty);
    }
    let unit = table.find(symbol).ok_or_else(|| match table.advice(symbol) {
        Some(advice) => UnitErrorKind::Ambiguous(advice),
        None => UnitErrorKind::Unknown,
    })?;
    // The range is symmetric, so that a divisor's power can change its sign.
    let power: Option<i8> = power.parse().ok().filter(|power| *power != 0 && *power != i8::MIN);
    Ok((unit, power.ok_or(UnitErrorKind::BadPower)?))
}

/// The product of a unit and a power of another, if it can be represented.
fn times(product: Unit, unit: Unit, power: i8) -> Option<Unit> {
    let dimension = product.dimension.times(unit.dimension.power(power)?)?;
    let size = (0..power.unsigned_abs()).fold(1.0, |size, _| size * unit.factor);
    let factor = if power < 0 { product.factor / size } else { product.factor * size };
    factor.is_normal().then(|| Unit::new(dimension, factor))
}
