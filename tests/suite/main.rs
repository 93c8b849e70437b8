//! Tests of the whole program, each module against one promise.

mod architecture;
mod cases;
mod commands;
mod docs;
mod missions;
mod program;
