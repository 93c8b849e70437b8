//! Dimensions, units, and numbers as people write and read them.

mod dimension;

pub use dimension::Dimension;
mod provisional;
pub use provisional::*;
