//! How to fly.

use super::Frame;

/// What the caller of [`super::fly`] chooses.
#[derive(Clone, Debug)]
pub struct Settings {
    /// Relative tolerance of the integration.
    pub tolerance: f64,
    /// Frame of the ledger; without one, body-fixed for flights from the ground and inertial otherwise.
    pub frame: Option<Frame>,
    /// Keep states for plots and tables, and look for peaks of every quantity that a report shows.
    pub samples: bool,
}

impl Default for Settings {
    fn default() -> Self {
        Settings { tolerance: 1e-9, frame: None, samples: true }
    }
}
