//! Missions.

use super::{BlockId, Context};
use crate::model::Mission;

impl Context<'_> {
    /// The checked mission; None where it has errors, which have been reported.
    pub(super) fn mission(&mut self, block: BlockId) -> Option<Mission> {
        self.enter(block);
        self.leave();
        None
    }
}
