//! Numerical integration: adaptive steps, dense output, roots and extrema.

mod coefficients;
mod dense;
mod extremum;
mod root;
mod stepper;
#[cfg(test)]
mod tests;

pub use dense::Dense;
pub use extremum::maximum;
pub use root::root;
pub use stepper::{Field, StepFailure, Stepper, Tolerance};
