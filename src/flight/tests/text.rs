//! Missions written as text, compiled and flown.

use crate::check::{ReadError, Reader, compile};
use crate::flight::{Flight, Settings, fly};
use crate::model::Mission;

struct Text<'a>(&'a str);

impl Reader for Text<'_> {
    fn read(&self, _: &str) -> Result<Vec<u8>, ReadError> {
        Ok(self.0.as_bytes().to_vec())
    }
}

pub fn mission(text: &str) -> Mission {
    let compiled = compile("test.wright", &Text(text));
    let told: Vec<&str> = compiled.diagnostics.iter().map(|one| one.message.as_str()).collect();
    compiled.model.unwrap_or_else(|| panic!("{told:#?}\n{text}")).missions.remove(0)
}

/// Flies a text to whatever end it comes to.
pub fn attempt(text: &str) -> Flight {
    fly(&mission(text), &Settings::default())
}
