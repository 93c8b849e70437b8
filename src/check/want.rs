//! What an expression is expected to be.

use crate::quantity::Dimension;

/// The dimension that a place in the source asks for and, for a pure number, how it is written.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub(crate) struct Want {
    pub dimension: Dimension,
    pub style: Style,
}

#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub(crate) enum Style {
    /// With a unit, or either way for a pure number.
    Free,
    /// `0.31`, not `31 %`.
    Plain,
    /// `8 %`, not `0.08`.
    Percent,
}

impl Want {
    /// A pure number that may not be written in percent (counts, coefficients).
    pub const NUMBER: Want = Want { dimension: NONE, style: Style::Plain };
    /// A fraction that is written in percent.
    pub const PERCENT: Want = Want { dimension: NONE, style: Style::Percent };
}

const NONE: Dimension = Dimension { length: 0, mass: 0, time: 0, temperature: 0, angle: 0 };

impl From<Dimension> for Want {
    fn from(dimension: Dimension) -> Self {
        Want { dimension, style: Style::Free }
    }
}
