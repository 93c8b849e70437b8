//! Units and their products.

use std::collections::BTreeMap;

use super::Dimension;
use super::builtin::{PREFIXES, Row, UNITS, advice};

/// A unit: a value in it is value·factor + offset in SI.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Unit {
    pub dimension: Dimension,
    pub factor: f64,
    /// Zero but for the readings of a thermometer.
    pub offset: f64,
    /// The unit is `%`.
    pub percent: bool,
}

impl Unit {
    /// The plain number one.
    pub const ONE: Unit = Unit { dimension: Dimension::NONE, factor: 1.0, offset: 0.0, percent: false };

    pub fn to_si(&self, value: f64) -> f64 {
        value * self.factor + self.offset
    }

    pub fn from_si(&self, si: f64) -> f64 {
        (si - self.offset) / self.factor
    }
}

/// Why a text is not a unit, with the bytes of the text that it is about.
#[derive(Clone, Debug, PartialEq)]
pub struct UnitError {
    pub start: usize,
    pub end: usize,
    pub kind: UnitErrorKind,
}

#[derive(Clone, Debug, PartialEq, Eq)]
pub enum UnitErrorKind {
    Unknown(String),
    /// A symbol that means several things or is written otherwise here, and what to write.
    Ambiguous(String, &'static str),
    /// The power is not a whole number of one digit or two.
    BadPower,
    /// The reading of a thermometer within a product.
    TemperatureInProduct,
    /// The exponents or the factor leave their range.
    Overflow,
    /// A factor is missing.
    Empty,
}

/// The units that a source may use: the built-in ones and its own.
#[derive(Clone, Debug, Default)]
pub struct UnitTable {
    own: BTreeMap<String, Unit>,
}

impl UnitTable {
    /// The built-in units alone.
    pub fn builtin() -> Self {
        UnitTable::default()
    }

    /// The built-in units in the order of the manual.
    pub fn rows(&self) -> impl Iterator<Item = &'static Row> {
        UNITS.iter()
    }

    /// Adds a unit; false where the symbol is a unit already.
    pub fn define(&mut self, symbol: &str, unit: Unit) -> bool {
        let free = self.find(symbol).is_none();
        if free {
            self.own.insert(symbol.to_owned(), unit);
        }
        free
    }

    /// One symbol, with its prefix.
    pub fn find(&self, symbol: &str) -> Option<Unit> {
        let builtin = |symbol: &str| UNITS.iter().find(|row| row.symbol == symbol);
        if let Some(row) = builtin(symbol) {
            return Some(row.unit());
        }
        if let Some(unit) = self.own.get(symbol) {
            return Some(*unit);
        }
        let mut rest = symbol.chars();
        let prefix = rest.next()?;
        let (_, factor) = PREFIXES.iter().find(|(letter, _)| *letter == prefix)?;
        let row = builtin(rest.as_str()).filter(|row| row.prefixes)?;
        Some(Unit { factor: scaled(row.factor, *factor), ..row.unit() })
    }

    /// Symbols for advice on a misspelt one: the built-in ones with the usual prefixes, then the own.
    pub fn symbols(&self) -> impl Iterator<Item = &str> {
        const USUAL: &[&str] =
            &["kg", "km", "mm", "cm", "kN", "MN", "kPa", "MPa", "mbar", "kW", "MW", "kJ", "MJ", "ms", "Mg"];
        UNITS
            .iter()
            .map(|row| row.symbol)
            .chain(USUAL.iter().copied())
            .chain(self.own.keys().map(String::as_str))
    }

    /// A unit as written after a number: factors joined by `/`, `*` and `^`, without blanks.
    ///
    /// # Errors
    /// The first factor that is not a unit, with its place in the text.
    pub fn parse(&self, text: &str) -> Result<Unit, UnitError> {
        let mut product = Unit::ONE;
        let (mut at, mut divide) = (0, false);
        let single = !text.contains(['/', '*', '^']);
        loop {
            let rest = &text[at..];
            let length = rest.find(['/', '*']).unwrap_or(rest.len());
            let factor = self.factor(&rest[..length], at, single)?;
            if single {
                return Ok(factor);
            }
            let joined = match divide {
                true => product.dimension.over(factor.dimension),
                false => product.dimension.times(factor.dimension),
            };
            let overflow = UnitError { start: at, end: at + length, kind: UnitErrorKind::Overflow };
            product.factor =
                if divide { product.factor / factor.factor } else { product.factor * factor.factor };
            // Less than normal would not keep its digits.
            product.dimension = joined.filter(|_| product.factor.is_normal()).ok_or(overflow)?;
            if length == rest.len() {
                return Ok(product);
            }
            divide = rest.as_bytes()[length] == b'/';
            at += length + 1;
        }
    }

    /// One factor with its power.
    fn factor(&self, text: &str, at: usize, single: bool) -> Result<Unit, UnitError> {
        let fail = |kind| UnitError { start: at, end: at + text.len(), kind };
        let (symbol, power) = match text.split_once('^') {
            Some((symbol, power)) => (symbol, whole(power).ok_or_else(|| fail(UnitErrorKind::BadPower))?),
            None => (text, 1),
        };
        if symbol.is_empty() {
            return Err(fail(UnitErrorKind::Empty));
        }
        if symbol == "1" {
            return Ok(Unit::ONE);
        }
        let unit = self.find(symbol).ok_or_else(|| {
            fail(match advice(symbol) {
                Some(right) => UnitErrorKind::Ambiguous(symbol.to_owned(), right),
                None => UnitErrorKind::Unknown(symbol.to_owned()),
            })
        })?;
        if unit.offset != 0.0 && !single {
            return Err(fail(UnitErrorKind::TemperatureInProduct));
        }
        if power == 1 {
            return Ok(unit);
        }
        let dimension = unit.dimension.power(power).ok_or_else(|| fail(UnitErrorKind::Overflow))?;
        let one = (0..power.unsigned_abs()).fold(1.0, |product, _| product * unit.factor);
        let factor = if power < 0 { 1.0 / one } else { one };
        if !factor.is_finite() || factor == 0.0 {
            return Err(fail(UnitErrorKind::Overflow));
        }
        Ok(Unit { dimension, factor, offset: 0.0, percent: false })
    }
}

/// A power of one digit or two, perhaps negative.
fn whole(text: &str) -> Option<i8> {
    let digits = text.strip_prefix('-').unwrap_or(text);
    let fits = (1..=2).contains(&digits.len()) && digits.bytes().all(|byte| byte.is_ascii_digit());
    fits.then(|| text.parse().ok()).flatten()
}

/// A factor with its prefix, as exact as if it were written out: dividing by a power of ten that is
/// a whole number rounds once, multiplying by its inverse twice.
fn scaled(factor: f64, prefix: f64) -> f64 {
    if prefix < 1.0 { factor / (1.0 / prefix).round() } else { factor * prefix }
}
