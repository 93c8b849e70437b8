//! The checked model flown: numeric plan, integration, events, ledger and what was asked of it.
//!
//! `lower` turns the model into the numeric `plan`. `run` flies it phase by phase: `motion` holds the
//! equations of one segment, `instant` everything physical at one instant (with `attitude` and
//! `throttle`), `watch` what may end a step, `book` what is written down. `history` keeps the dense
//! output, in which `peaks` finds the summits; `verdict` judges demands, aims and figures.

mod attitude;
mod book;
mod fly;
mod history;
mod instant;
mod integrate;
mod lower;
mod motion;
mod peaks;
mod plan;
mod program;
mod quantities;
mod result;
mod run;
mod settings;
mod table;
#[cfg(test)]
mod tests;
mod throttle;
mod verdict;
mod watch;

pub use fly::fly;
pub use result::{
    AimResult, Burned, Cause, Completion, DemandResult, Event, EventKind, Failure, FigureResult, Flight,
    Frame, Ledger, LedgerRow, Notice, PartAccount, Peak, PhaseFlown, Snapshot,
};
pub use settings::Settings;
