//! `builtin`: the definitions that ship with the program, in the language itself.

use super::{Status, output};

pub fn run() -> Status {
    output::print(crate::world::BUILTIN)
}
