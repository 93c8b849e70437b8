//! Elementary functions that give the same bits on every processor, and small vectors over them.

mod scalar;
mod vector;

pub use scalar::Scalar;
pub use vector::Vector;
