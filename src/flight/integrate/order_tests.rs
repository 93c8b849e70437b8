//! The method against what defines it: its order, and the quadratures it has to do exactly.

use super::coefficients::{DENSE_STAGES, NODES, SOLUTION, WEIGHTS};
use super::tests::System;
use super::{Stepper, Tolerance};

/// y′ = y·cos t from 1 has the solution exp(sin t); state and time both count.
fn swing(time: f64, y: &[f64], rate: &mut [f64]) {
    rate[0] = y[0] * libm::cos(time);
}

fn exact(time: f64) -> f64 {
    libm::exp(libm::sin(time))
}

/// Equal steps over [0, 4]: the error at the end, and the greatest within the steps.
fn errors(steps: u32) -> (f64, f64) {
    let mut field = System(swing);
    // Every step is within so wide a tolerance: the limit alone sets its size.
    let mut stepper = Stepper::new(Tolerance { relative: 1e9, absolute: vec![1e9] });
    stepper.start(&mut field, 0.0, &[1.0], Some(4.0));
    let (mut within, mut state) = (0.0_f64, [0.0]);
    for step in 1..=steps {
        stepper.step(&mut field, 4.0 * f64::from(step) / f64::from(steps)).unwrap();
        let dense = stepper.dense(&mut field);
        for part in 1..10 {
            let time = dense.start() + (dense.end() - dense.start()) * f64::from(part) / 10.0;
            dense.state(time, &mut state);
            within = within.max((state[0] - exact(time)).abs());
        }
    }
    assert_eq!(stepper.steps(), u64::from(steps));
    ((stepper.end_state()[0] - exact(4.0)).abs(), within)
}

/// Half the step, 2⁸ less error at a step's end and 2⁸ within: dense output of order 7 errs by h⁸ in a
/// step (Hairer, Nørsett and Wanner, sections II.5 and II.6). A wrong node would leave order 1 or 2.
#[test]
fn the_orders_are_eight_and_seven() {
    let order = |coarse: f64, fine: f64| libm::log2(coarse / fine);
    let (coarse, fine) = (errors(8), errors(16));
    let (end, within) = (order(coarse.0, fine.0), order(coarse.1, fine.1));
    assert!((7.5..9.5).contains(&end), "order {end} at the ends");
    assert!((7.2..9.5).contains(&within), "order {within} of the step within");
}

/// Weights of a stage add up to its node, and Σ b·cᵏ = 1/(k + 1) for k < 8 (Hairer, Nørsett and Wanner,
/// eq. II.1.9 and theorem II.2.1).
#[test]
fn the_order_conditions_of_quadrature_hold() {
    let sum = |row: &[(usize, f64)], of: &dyn Fn(f64) -> f64| -> f64 {
        row.iter().map(|(stage, weight)| weight * of(NODES[*stage])).sum()
    };
    let extra = DENSE_STAGES.iter().zip(&NODES[13..]);
    for (row, node) in WEIGHTS.iter().zip(&NODES).chain(extra) {
        assert!((sum(row, &|_| 1.0) - node).abs() < 1e-13, "{node}");
    }
    for power in 0..8 {
        let raise = |node: f64| (0..power).fold(1.0, |product, _| product * node);
        assert!((sum(SOLUTION, &raise) - 1.0 / f64::from(power + 1)).abs() < 1e-14, "{power}");
    }
}

/// A derivative that is not a number from the start is a failure, not an endless search for a step.
#[test]
fn no_number_from_the_start_is_a_failure() {
    for rate_of in [f64::NAN, f64::INFINITY] {
        for start in [0.0, 5.0] {
            let mut field = System(move |_: f64, _: &[f64], rate: &mut [f64]| rate.fill(rate_of));
            let mut stepper = Stepper::new(Tolerance { relative: 1e-9, absolute: vec![1e-12] });
            stepper.start(&mut field, start, &[1.0], None);
            assert!(stepper.step(&mut field, start + 2.0).is_err());
            assert_eq!((stepper.end_time(), stepper.end_state()[0]), (start, 1.0));
        }
    }
}

/// An event at a step's very start leaves a step of no length; it still has a state.
#[test]
fn a_step_of_no_length_has_a_state() {
    let mut field = System(swing);
    let mut stepper = Stepper::new(Tolerance { relative: 1e-9, absolute: vec![1e-12] });
    stepper.start(&mut field, 0.0, &[1.0], None);
    stepper.step(&mut field, 1.0).unwrap();
    stepper.redo(&mut field, 0.0);
    let mut state = [0.0];
    stepper.dense(&mut field).state(0.0, &mut state);
    assert_eq!(state, [1.0]);
}
