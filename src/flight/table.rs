//! Curves ready to be read: one value over one or two inputs.

use crate::math::Scalar;
use crate::model::{Beyond, Curve, Smoothness};

/// A curve in flat form.
#[derive(Clone, Debug)]
pub struct Table<S> {
    smooth: bool,
    beyond: Beyond,
    /// Points of the first input, rising.
    first: Vec<f64>,
    /// Points of the second input, rising; empty where there is one input only.
    second: Vec<f64>,
    /// For each point of the first input a row over the second (or one value).
    rows: Vec<Row<S>>,
}

/// Values over one input, with the slope at each point.
#[derive(Clone, Debug, Default)]
struct Row<S> {
    values: Vec<S>,
    slopes: Vec<S>,
}

impl<S: Scalar> Table<S> {
    /// The curve with every ordinate times `scale`.
    pub fn new(curve: &Curve, scale: f64) -> Self {
        let smooth = curve.smoothness == Smoothness::Smooth;
        let axis = |index: usize| curve.axes.get(index).map(|axis| axis.points.clone()).unwrap_or_default();
        let (first, second) = (axis(0), axis(1));
        let values: Vec<S> = curve.values.iter().map(|value| S::from(value * scale)).collect();
        let rows = match second.len() {
            0 => vec![Row::new(&first, values, smooth)],
            width => values.chunks(width).map(|row| Row::new(&second, row.to_vec(), smooth)).collect(),
        };
        Table { smooth, beyond: curve.beyond, first, second, rows }
    }

    /// Points of the first input: a step ends at each.
    pub fn knots(&self) -> &[f64] {
        &self.first
    }

    /// The ends of the second input, if there is one.
    pub fn second_range(&self) -> Option<(f64, f64)> {
        self.second.first().copied().zip(self.second.last().copied())
    }

    /// Whether reading outside the range stops the flight.
    pub fn refuses(&self) -> bool {
        self.beyond == Beyond::Refuse
    }

    /// Which piece an input lies in: the number of knots not above it, so that zero and the number of
    /// all knots lie outside.
    pub fn piece(&self, first: f64) -> usize {
        piece(&self.first, first)
    }

    /// The value at one or two inputs; the second is not looked at where there is one input.
    pub fn at(&self, first: S, second: S) -> S {
        self.within(self.piece(first.real()), first, second)
    }

    /// The same by the formula of one piece, which goes on smoothly beyond its ends: so an integration
    /// sees no kink before it has cut its step there. A curve that refuses to be read outside its
    /// range gives its end value there: the flight watches the input and stops.
    pub fn within(&self, piece: usize, first: S, second: S) -> S {
        if self.second.is_empty() {
            return self
                .rows
                .first()
                .map_or_else(S::zero, |row| row.at(&self.first, piece, first, self.beyond));
        }
        let of_second = self::piece(&self.second, second.real());
        let values =
            self.rows.iter().map(|row| row.at(&self.second, of_second, second, self.beyond)).collect();
        Row::new(&self.first, values, self.smooth).at(&self.first, piece, first, self.beyond)
    }
}

impl<S: Scalar> Row<S> {
    fn new(points: &[f64], values: Vec<S>, smooth: bool) -> Self {
        let slopes = if smooth { slopes(points, &values) } else { Vec::new() };
        Row { values, slopes }
    }

    fn at(&self, points: &[f64], piece: usize, input: S, beyond: Beyond) -> S {
        let Some(last) = points.len().checked_sub(1) else { return S::zero() };
        if last == 0 {
            return self.values[0];
        }
        // The last knot itself still belongs to the curve.
        let outside = piece == 0 || piece > last && input.real() > points[last];
        if outside {
            let end = if piece == 0 { 0 } else { last };
            return match beyond {
                Beyond::Hold | Beyond::Refuse => self.values[end],
                Beyond::Zero => S::zero(),
                Beyond::Extend => self.values[end] + (input - points[end]) * self.end_slope(points, end),
            };
        }
        let left = piece.clamp(1, last) - 1;
        let width = points[left + 1] - points[left];
        let (a, b) = (self.values[left], self.values[left + 1]);
        let s = (input - points[left]) / width;
        if self.slopes.is_empty() {
            return a + (b - a) * s;
        }
        // Hermite's cubic through two points and slopes.
        let (p, q) = (self.slopes[left] * width, self.slopes[left + 1] * width);
        let c = (b - a) * 3.0 - p * 2.0 - q;
        let d = p + q - (b - a) * 2.0;
        a + s * (p + s * (c + s * d))
    }

    fn end_slope(&self, points: &[f64], end: usize) -> S {
        if let Some(slope) = self.slopes.get(end) {
            return *slope;
        }
        let left = end.saturating_sub(1).min(self.values.len().saturating_sub(2));
        (self.values[left + 1] - self.values[left]) / (points[left + 1] - points[left])
    }
}

fn piece(points: &[f64], input: f64) -> usize {
    points.partition_point(|point| *point <= input)
}

/// Slopes of the monotone cubic: the weighted harmonic mean of the neighbouring secants, zero at an
/// extremum (F. N. Fritsch, J. Butland, *A Method for Constructing Local Monotone Piecewise Cubic
/// Interpolants*, SIAM J. Sci. Stat. Comput. 5 (1984), eq. 5); at the ends the three-point formula,
/// kept monotone (C. Moler, *Numerical Computing with MATLAB*, 2004, section 3.4).
fn slopes<S: Scalar>(points: &[f64], values: &[S]) -> Vec<S> {
    let widths: Vec<f64> = points.windows(2).map(|pair| pair[1] - pair[0]).collect();
    let secants: Vec<S> =
        values.windows(2).zip(&widths).map(|(pair, width)| (pair[1] - pair[0]) / *width).collect();
    let count = secants.len();
    if count == 0 {
        return vec![S::zero(); values.len()];
    }
    if count == 1 {
        return vec![secants[0]; 2];
    }
    let mut slopes = vec![end_slope(widths[0], widths[1], secants[0], secants[1])];
    for k in 1..count {
        let (before, after) = (secants[k - 1], secants[k]);
        slopes.push(if before.real() * after.real() <= 0.0 {
            S::zero()
        } else {
            let (a, b) = (2.0 * widths[k] + widths[k - 1], widths[k] + 2.0 * widths[k - 1]);
            S::from(a + b) / (S::from(a) / before + S::from(b) / after)
        });
    }
    slopes.push(end_slope(widths[count - 1], widths[count - 2], secants[count - 1], secants[count - 2]));
    slopes
}

fn end_slope<S: Scalar>(near: f64, far: f64, at: S, next: S) -> S {
    let slope = (at * (2.0 * near + far) - next * near) / (near + far);
    if slope.real() * at.real() <= 0.0 {
        S::zero()
    } else if at.real() * next.real() <= 0.0 && slope.real().abs() > 3.0 * at.real().abs() {
        at * 3.0
    } else {
        slope
    }
}

#[cfg(test)]
#[path = "table_tests.rs"]
mod tests;
