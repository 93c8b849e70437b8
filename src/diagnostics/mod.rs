//! What the compiler says to people: one plain value for the terminal, JSON and editors alike.

pub mod codes;
mod diagnostic;
mod nearest;

pub use diagnostic::{Code, Diagnostic, Label, Severity};
pub use nearest::nearest;
