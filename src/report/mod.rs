//! One report model of a flown mission, and from it Markdown, JSON, pictures and a summary.

mod assemble;
mod content;
mod inert;
mod json;
mod markdown;
mod notices;
mod picture;
mod show;
mod summary;
#[cfg(test)]
mod tests;

pub use assemble::assemble;
pub use content::{FORMAT, Report, Status};
pub use json::{json, schema};
pub use markdown::markdown;
pub use notices::{Finding, findings};
pub use picture::{Picture, pictures};
pub use summary::summary;
