//! The units that a source may use: the built-in ones and its own.

use std::collections::BTreeMap;

use super::rows::{self, Row};
use super::{Dimension, Unit, UnitError, parse};

/// Built-in units, and those that a source defines.
#[derive(Clone, Debug, Default)]
pub struct UnitTable {
    own: BTreeMap<String, Unit>,
}

/// Why a unit cannot be defined.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum DefineError {
    /// A built-in unit, perhaps with a prefix, has this symbol.
    Builtin,
    /// The symbol has several meanings; the text says what to write instead.
    Ambiguous(&'static str),
    /// It is defined already.
    Twice,
    /// Its factor is zero, negative or not finite, or it has an offset.
    Size,
}

impl UnitTable {
    /// The built-in units alone.
    pub fn builtin() -> Self {
        UnitTable::default()
    }

    /// Adds a unit of the source's own.
    pub fn define(&mut self, symbol: &str, unit: Unit) -> Result<(), DefineError> {
        if rows::find(symbol).is_some() {
            return Err(DefineError::Builtin);
        }
        if let Some(advice) = rows::advice(symbol) {
            return Err(DefineError::Ambiguous(advice));
        }
        if self.own.contains_key(symbol) {
            return Err(DefineError::Twice);
        }
        if !(unit.factor.is_finite() && unit.factor > 0.0 && unit.offset == 0.0) {
            return Err(DefineError::Size);
        }
        self.own.insert(symbol.to_owned(), Unit { percent: false, ..unit });
        Ok(())
    }

    /// The unit of one symbol, with its prefix.
    pub fn find(&self, symbol: &str) -> Option<Unit> {
        rows::find(symbol).or_else(|| self.own.get(symbol).copied())
    }

    /// What to write instead of a symbol with several meanings or another name here.
    pub fn advice(&self, symbol: &str) -> Option<&'static str> {
        rows::advice(symbol)
    }

    /// The unit of a text such as `W/m^2`, `m/s^-2`, `1/s`.
    pub fn parse(&self, text: &str) -> Result<Unit, UnitError> {
        parse::parse(self, text)
    }

    /// The built-in units, in the order of the manual.
    pub fn rows(&self) -> impl Iterator<Item = &'static Row> {
        rows::ROWS.iter()
    }

    /// Every symbol without its prefixes: built-in ones in the order of the manual, then the own.
    pub fn symbols(&self) -> impl Iterator<Item = &str> {
        rows::ROWS.iter().map(|row| row.symbol).chain(self.own.keys().map(String::as_str))
    }

    /// Symbols of a dimension, in the order of [`UnitTable::symbols`].
    pub fn symbols_of(&self, dimension: Dimension) -> impl Iterator<Item = &str> {
        let own = self.own.iter().filter(move |(_, unit)| unit.dimension == dimension);
        let builtin = rows::ROWS.iter().filter(move |row| row.dimension == dimension);
        builtin.map(|row| row.symbol).chain(own.map(|(symbol, _)| symbol.as_str()))
    }
}
