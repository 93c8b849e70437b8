//! A unit: what a written number is multiplied with to be SI.

use super::Dimension;

/// A unit or a product of units. The SI value of `x` is `x * factor + offset`.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Unit {
    pub dimension: Dimension,
    pub factor: f64,
    /// Other than zero for absolute readings of temperature alone.
    pub offset: f64,
    pub(super) percent: bool,
}

impl Unit {
    /// The unit of plain numbers.
    pub const ONE: Unit = Unit::new(Dimension::NONE, 1.0);

    /// A unit without an offset.
    pub const fn new(dimension: Dimension, factor: f64) -> Self {
        Unit { dimension, factor, offset: 0.0, percent: false }
    }

    pub fn to_si(&self, written: f64) -> f64 {
        written * self.factor + self.offset
    }

    pub fn from_si(&self, si: f64) -> f64 {
        (si - self.offset) / self.factor
    }

    /// Whether this is `%` alone.
    pub fn is_percent(&self) -> bool {
        self.percent
    }
}
