//! The checked model flown: numeric plan, integration, events, ledger and what was asked of it.

mod integrate;
mod result;

pub use result::{
    AimResult, Burned, Cause, Completion, DemandResult, Event, EventKind, Failure, FigureResult, Flight,
    Frame, Ledger, LedgerRow, Notice, PartAccount, Peak, PhaseFlown, Snapshot,
};
