//! Exit statuses, as the language's charter fixes them.

use std::process::ExitCode;

/// How a run ended. With several files the gravest counts; the order here is that of gravity.
#[derive(Clone, Copy, Debug, PartialEq, Eq, PartialOrd, Ord)]
pub enum Status {
    Well,
    /// A demand is unmet, an aim is missed, or a verified report is stale.
    Unmet,
    /// A flight could not be completed.
    Flight,
    /// The source has errors.
    Source,
    /// Wrong usage, or a file that cannot be read or written.
    Usage,
}

impl Status {
    pub fn code(self) -> u8 {
        match self {
            Status::Well => 0,
            Status::Unmet => 1,
            Status::Usage => 2,
            Status::Source => 3,
            Status::Flight => 4,
        }
    }
}

impl From<Status> for ExitCode {
    fn from(status: Status) -> ExitCode {
        ExitCode::from(status.code())
    }
}
