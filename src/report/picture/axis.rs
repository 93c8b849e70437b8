//! Scales, their marks, and lines with no more points than the eye sees.

use crate::quantity::format_number;

/// A share of a step by which a value may lie beyond the last mark: less than the eye sees.
const HAIR: f64 = 1e-3;

/// A linear scale from values to places on the page.
#[derive(Clone, Copy, Debug)]
pub struct Scale {
    low: f64,
    high: f64,
    from: f64,
    to: f64,
}

impl Scale {
    /// Over exactly these values.
    pub fn exact((low, high): (f64, f64), (from, to): (f64, f64)) -> Self {
        let high = if high > low { high } else { low + 1.0 };
        Scale { low, high, from, to }
    }

    /// Over these values, widened to the marks around them.
    pub fn nice((low, high): (f64, f64), (from, to): (f64, f64), marks: usize) -> Self {
        let exact = Scale::exact((low, high), (from, to));
        let step = exact.step(marks);
        Scale {
            low: (exact.low / step + HAIR).floor() * step,
            high: (exact.high / step - HAIR).ceil() * step,
            from,
            to,
        }
    }

    pub fn place(&self, value: f64) -> f64 {
        self.from + (value - self.low) / (self.high - self.low) * (self.to - self.from)
    }

    /// The distance of marks: 1, 2 or 5 times a power of ten, so that there are about so many.
    fn step(&self, marks: usize) -> f64 {
        let rough = (self.high - self.low) / marks.max(1) as f64;
        let power = (-30..=30).map(power_of_ten).take_while(|power| *power <= rough).last().unwrap_or(1e-30);
        [1.0, 2.0, 5.0, 10.0]
            .into_iter()
            .map(|factor| factor * power)
            .find(|step| *step >= rough)
            .unwrap_or(rough)
    }

    /// Values and texts of the marks within the scale.
    pub fn marks(&self, about: usize) -> Vec<(f64, String)> {
        let step = self.step(about);
        let first = (self.low / step - 1e-9).ceil() as i64;
        let last = (self.high / step + 1e-9).floor() as i64;
        (first..=last.min(first + 100))
            .map(|index| index as f64 * step)
            .map(|value| (value, format_number(value, 5)))
            .collect()
    }
}

fn power_of_ten(exponent: i32) -> f64 {
    format!("1e{exponent}").parse().unwrap_or(1.0)
}

/// The line with every point left out that lies within a third of a pixel of what is drawn without
/// it (U. Ramer, *Computer Graphics and Image Processing* 1 (1972); D. Douglas, T. Peucker, 1973).
pub fn simplified(points: &[(f64, f64)]) -> Vec<(f64, f64)> {
    const NEAR: f64 = 0.3;
    let mut keep = vec![false; points.len()];
    let mut open = vec![(0, points.len().saturating_sub(1))];
    while let Some((from, to)) = open.pop() {
        let (Some(a), Some(b)) = (points.get(from), points.get(to)) else { break };
        (keep[from], keep[to]) = (true, true);
        let mut worst = (NEAR, None);
        for (index, point) in points.iter().enumerate().take(to).skip(from + 1) {
            let away = distance(*point, *a, *b);
            if away > worst.0 {
                worst = (away, Some(index));
            }
        }
        if let (_, Some(index)) = worst {
            open.extend([(from, index), (index, to)]);
        }
    }
    points.iter().zip(keep).filter(|(_, keep)| *keep).map(|(point, _)| *point).collect()
}

/// From a point to the line through two others.
fn distance(point: (f64, f64), a: (f64, f64), b: (f64, f64)) -> f64 {
    let (dx, dy) = (b.0 - a.0, b.1 - a.1);
    let (px, py) = (point.0 - a.0, point.1 - a.1);
    let length = (dx * dx + dy * dy).sqrt();
    if length == 0.0 { (px * px + py * py).sqrt() } else { (dx * py - dy * px).abs() / length }
}
