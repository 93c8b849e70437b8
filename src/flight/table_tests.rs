use proptest::prelude::*;

use super::Table;
use crate::model::{Axis, Beyond, Curve, Place, Smoothness};
use crate::quantity::Dimension;

fn curve(smoothness: Smoothness, beyond: Beyond, axes: &[&[f64]], values: &[f64]) -> Curve {
    let axis = |points: &&[f64]| Axis {
        name: String::new(),
        dimension: Dimension::default(),
        points: points.to_vec(),
    };
    Curve {
        name: String::new(),
        place: Place { file: String::new(), line: 1, column: 1, start: 0, end: 0 },
        smoothness,
        beyond,
        axes: axes.iter().map(axis).collect(),
        output: String::new(),
        output_dimension: Dimension::default(),
        values: values.to_vec(),
    }
}

fn table(smoothness: Smoothness, beyond: Beyond, points: &[f64], values: &[f64]) -> Table<f64> {
    Table::new(&curve(smoothness, beyond, &[points], values), 1.0)
}

#[test]
fn straight_lines_and_what_lies_beyond() {
    let at = |beyond, x| table(Smoothness::Linear, beyond, &[0.0, 1.0, 3.0], &[1.0, 2.0, 0.0]).at(x, 0.0);
    assert_eq!(at(Beyond::Hold, 0.25), 1.25);
    assert_eq!(at(Beyond::Hold, 2.0), 1.0);
    assert_eq!((at(Beyond::Hold, -1.0), at(Beyond::Hold, 9.0)), (1.0, 0.0));
    assert_eq!((at(Beyond::Zero, -1.0), at(Beyond::Zero, 9.0)), (0.0, 0.0));
    assert_eq!((at(Beyond::Extend, -1.0), at(Beyond::Extend, 4.0)), (0.0, -1.0));
}

/// A monotone cubic gives back a straight line, and never overshoots its points.
#[test]
fn the_smooth_kind_keeps_lines_and_steps() {
    let line = table(Smoothness::Smooth, Beyond::Hold, &[0.0, 1.0, 3.0, 4.0], &[1.0, 3.0, 7.0, 9.0]);
    assert!((line.at(2.2, 0.0) - 5.4).abs() < 1e-14);
    let step = table(Smoothness::Smooth, Beyond::Hold, &[0.0, 1.0, 2.0, 3.0], &[0.0, 0.0, 1.0, 1.0]);
    for x in [0.5, 1.2, 1.9, 2.5] {
        assert!((0.0..=1.0).contains(&step.at(x, 0.0)));
    }
    assert_eq!(step.at(0.5, 0.0), 0.0);
}

/// SciPy 1.17.1's `PchipInterpolator`, an implementation of the same slopes, on uneven points.
#[test]
fn the_smooth_kind_is_that_of_another_implementation() {
    let points = [0.0, 0.5, 0.9, 1.0, 1.2, 2.0, 5.0];
    let table = table(Smoothness::Smooth, Beyond::Hold, &points, &[0.3, 0.32, 0.45, 0.6, 0.58, 0.4, 0.25]);
    for (x, expected) in [
        (0.25, 0.3054153605015674),
        (0.7, 0.3580073342402555),
        (0.95, 0.5326650943396225),
        (1.1, 0.5932142857142857),
        (1.6, 0.48647012987012983),
        (3.5, 0.29002272727272727),
        (4.9, 0.2501883434343434),
    ] {
        assert!((table.at(x, 0.0) - expected).abs() < 1e-15, "{x}");
    }
}

#[test]
fn two_inputs_make_a_plane() {
    let plane: Vec<f64> =
        [0.0, 1.0, 2.0].iter().flat_map(|x| [0.0, 10.0].map(|y| 2.0 * x + 3.0 * y)).collect();
    for smoothness in [Smoothness::Linear, Smoothness::Smooth] {
        let curve = curve(smoothness, Beyond::Hold, &[&[0.0, 1.0, 2.0], &[0.0, 10.0]], &plane);
        let table: Table<f64> = Table::new(&curve, 1.0);
        assert!((table.at(1.3, 4.0) - 14.6).abs() < 1e-13);
    }
}

proptest! {
    /// Between two points a smooth curve stays between their values.
    #[test]
    fn smooth_stays_between_its_neighbours(values in prop::collection::vec(-10.0..10.0_f64, 5), x in 0.0..4.0_f64) {
        let table = table(Smoothness::Smooth, Beyond::Hold, &[0.0, 1.0, 2.0, 3.0, 4.0], &values);
        let left = (x as usize).min(3);
        let (low, high) = (values[left].min(values[left + 1]), values[left].max(values[left + 1]));
        let value = table.at(x, 0.0);
        prop_assert!(value >= low - 1e-12 && value <= high + 1e-12);
    }

    /// Rising values on uneven points make a rising curve, also between two looks within a piece.
    #[test]
    fn rising_values_make_a_rising_curve(
        widths in prop::collection::vec(0.01..3.0_f64, 6),
        rises in prop::collection::vec(0.0..5.0_f64, 6),
    ) {
        let sums = |steps: &[f64]| -> Vec<f64> {
            let running = steps.iter().scan(0.0, |sum, step| { *sum += step; Some(*sum) });
            std::iter::once(0.0).chain(running).collect()
        };
        let (points, values) = (sums(&widths), sums(&rises));
        let table = table(Smoothness::Smooth, Beyond::Hold, &points, &values);
        let mut before = table.at(0.0, 0.0);
        for look in 1..=200 {
            let value = table.at(points[6] * f64::from(look) / 200.0, 0.0);
            prop_assert!(value >= before - 1e-12);
            before = value;
        }
    }
}
