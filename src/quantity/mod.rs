//! Dimensions, units, and numbers as people write and read them.

mod builtin;
mod dimension;
mod format;
mod system;
#[cfg(test)]
mod tests;
mod unit;

pub use builtin::{Row, advice};
pub use dimension::Dimension;
pub use format::{Written, digits_written, format_fixed, format_number, format_si};
pub use system::System;
pub use unit::{Unit, UnitError, UnitErrorKind, UnitTable};
