//! Stagewright: text → syntax tree → checked model → flight → report.

pub mod check;
pub mod cli;
pub mod diagnostics;
pub mod flight;
pub mod math;
pub mod model;
pub mod quantity;
pub mod report;
pub mod source;
pub mod syntax;
pub mod world;
