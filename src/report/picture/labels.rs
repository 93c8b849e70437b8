//! Labels that do not lie on each other.

/// Room that one character of small text takes at the most, and one line.
const CHARACTER: f64 = 6.6;
const LINE: f64 = 12.0;

/// Places already taken.
#[derive(Default)]
pub struct Labels {
    taken: Vec<(f64, f64, f64, f64)>,
}

impl Labels {
    /// Takes the room of a text centred at `x` with its base line at `y`, if it is free.
    pub fn take(&mut self, (x, y): (f64, f64), text: &str) -> bool {
        let half = 0.5 * room(text);
        let own = (x - half, y - LINE, x + half, y + 2.0);
        let free = |other: &(f64, f64, f64, f64)| {
            own.2 < other.0 || other.2 < own.0 || own.3 < other.1 || other.3 < own.1
        };
        let fits = self.taken.iter().all(free);
        if fits {
            self.taken.push(own);
        }
        fits
    }
}

/// Width that a text takes at the most.
pub fn room(text: &str) -> f64 {
    CHARACTER * text.chars().count() as f64
}
