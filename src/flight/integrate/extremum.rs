//! The greatest value of a function over an interval.

/// Intervals that are looked at before the best of them is searched closely.
const LOOKS: usize = 6;
/// Sections of the interval between two looks. A count and not
/// a width, because the width of a very short interval is lost in the digits of its ends.
const SECTIONS: usize = 26;
/// Golden section: the ratio of the lesser part to the whole.
const GOLDEN: f64 = 0.381_966_011_250_105_1;

/// Where `f` is greatest in `[start, end]`, and how great. `f` has one summit between two looks at
/// the most; the ends count, so that a corner between two intervals is found.
///
/// Golden section until the place is known to a millionth of the interval, and so the value, which is
/// flat there, to the square of that.
pub fn maximum(start: f64, end: f64, mut f: impl FnMut(f64) -> f64) -> (f64, f64) {
    let look = |index: usize| start + (end - start) * index as f64 / LOOKS as f64;
    let values: Vec<f64> =
        (0..=LOOKS).map(|index| f(if index == LOOKS { end } else { look(index) })).collect();
    let mut best = 0;
    for (index, value) in values.iter().enumerate() {
        if *value - values[best] > 1e-12 * values[best].abs() {
            best = index;
        }
    }
    let end_of = |index: usize| if index == LOOKS { end } else { look(index) };
    let mut found = (end_of(best), values[best]);
    let (mut low, mut high) = (look(best.saturating_sub(1)), end_of((best + 1).min(LOOKS)));
    let mut inner = low + GOLDEN * (high - low);
    let mut outer = high - GOLDEN * (high - low);
    let (mut at_inner, mut at_outer) = (f(inner), f(outer));
    for _ in 0..SECTIONS {
        if at_inner >= at_outer {
            high = outer;
            (outer, at_outer) = (inner, at_inner);
            inner = low + GOLDEN * (high - low);
            at_inner = f(inner);
        } else {
            low = inner;
            (inner, at_inner) = (outer, at_outer);
            outer = high - GOLDEN * (high - low);
            at_outer = f(outer);
        }
    }
    for (time, value) in [(inner, at_inner), (outer, at_outer)] {
        // On a plateau the end stands, where something began to hold.
        if value - found.1 > 1e-12 * found.1.abs() {
            found = (time, value);
        }
    }
    found
}
