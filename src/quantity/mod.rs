//! Dimensions, units, and numbers as people write and read them.

mod dimension;
mod number;
mod parse;
mod rows;
mod system;
mod table;
mod unit;

pub use dimension::Dimension;
pub use number::{Digits, digits_written, format_si};
pub use parse::{UnitError, UnitErrorKind};
pub use rows::Row;
pub use system::{System, usual_units};
pub use table::{DefineError, UnitTable};
pub use unit::Unit;

#[cfg(test)]
mod tests;
