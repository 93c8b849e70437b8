//! Numerical integration: adaptive steps, dense output, roots and extrema.

#[cfg(test)]
mod checks_tests;
mod coefficients;
mod dense;
mod extremum;
#[cfg(test)]
mod order_tests;
mod root;
mod stepper;
#[cfg(test)]
mod tests;

pub use dense::Dense;
pub use extremum::maximum;
pub use root::root;
pub use stepper::{Field, StepFailure, Stepper, Tolerance};
