//! What the compiler says to people: one plain value for the terminal, JSON and editors alike.

pub mod codes;
mod diagnostic;
mod explain;
mod inert;
mod json;
mod nearest;
mod terminal;
#[cfg(test)]
mod tests;

pub use diagnostic::{Code, Diagnostic, Label, Severity};
pub use explain::{explain, explain_index};
pub use inert::{inert, inert_line};
pub use json::{render_json, schema};
pub use nearest::nearest;
pub use terminal::render_terminal;
