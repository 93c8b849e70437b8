//! How to fly.

use std::sync::atomic::AtomicBool;

use super::Frame;

/// What the caller of [`super::fly`] chooses.
#[derive(Clone, Debug)]
pub struct Settings<'a> {
    /// Relative tolerance of the integration.
    pub tolerance: f64,
    /// Frame of the ledger; without one, body-fixed for flights from the ground and inertial otherwise.
    pub frame: Option<Frame>,
    /// Keep states for plots and tables, and look for peaks of every quantity that a report shows.
    pub samples: bool,
    /// Set from outside to stop the flight.
    pub stop: Option<&'a AtomicBool>,
}

impl Default for Settings<'_> {
    fn default() -> Self {
        Settings { tolerance: 1e-9, frame: None, samples: true, stop: None }
    }
}
