use super::{Field, Stepper, Tolerance, maximum, root};

pub(super) struct System<F>(pub F);

impl<F: FnMut(f64, &[f64], &mut [f64])> Field<f64> for System<F> {
    fn rate(&mut self, time: f64, state: &[f64], rate: &mut [f64]) {
        (self.0)(time, state, rate);
    }
}

pub(super) fn run(
    relative: f64,
    end: f64,
    start: &[f64],
    f: impl FnMut(f64, &[f64], &mut [f64]),
) -> (Vec<f64>, u64) {
    let mut field = System(f);
    let mut stepper = Stepper::new(Tolerance { relative, absolute: vec![relative * 1e-3; start.len()] });
    stepper.start(&mut field, 0.0, start, None);
    while stepper.end_time() < end {
        stepper.step(&mut field, end).unwrap();
    }
    (stepper.end_state().to_vec(), stepper.evaluations())
}

pub(super) fn two_body(_: f64, y: &[f64], rate: &mut [f64]) {
    let cube = (y[0] * y[0] + y[1] * y[1]).sqrt() * (y[0] * y[0] + y[1] * y[1]);
    rate.copy_from_slice(&[y[2], y[3], -y[0] / cube, -y[1] / cube]);
}

/// An explicit time in the derivative shows a wrong node, the last one above all.
#[test]
fn explicit_time_is_met() {
    let (y, _) = run(1e-12, 3.0, &[0.0], |t, _, rate| rate[0] = 9.0 * t * t * t * t * t * t * t * t);
    assert!((y[0] - 19683.0).abs() < 1e-8, "{}", y[0]);
}

/// Kepler's orbit of eccentricity 0.6 comes back to its start after one period, 2π.
#[test]
fn error_falls_with_the_tolerance() {
    let start = [0.4, 0.0, 0.0, 2.0];
    let mut before = f64::INFINITY;
    for relative in [1e-6, 1e-8, 1e-10, 1e-12] {
        let (y, _) = run(relative, std::f64::consts::TAU, &start, two_body);
        let error = ((y[0] - 0.4) * (y[0] - 0.4) + y[1] * y[1]).sqrt();
        assert!(error < 0.1 * before && error < 300.0 * relative, "{relative}: {error}");
        before = error;
    }
}

/// A hundred orbits at eccentricities 0 and 0.6: energy and angular momentum held to 1e-10.
#[test]
fn invariants_hold_over_a_hundred_orbits() {
    for eccentricity in [0.0_f64, 0.6] {
        let speed = ((1.0 + eccentricity) / (1.0 - eccentricity)).sqrt();
        let start = [1.0 - eccentricity, 0.0, 0.0, speed];
        let (y, _) = run(1e-13, 100.0 * std::f64::consts::TAU, &start, two_body);
        let energy = 0.5 * (y[2] * y[2] + y[3] * y[3]) - 1.0 / (y[0] * y[0] + y[1] * y[1]).sqrt();
        let momentum = y[0] * y[3] - y[1] * y[2];
        let expected = (1.0 - eccentricity * eccentricity).sqrt();
        assert!((energy + 0.5).abs() < 1e-10, "{energy}");
        assert!((momentum - expected).abs() < 1e-10, "{momentum}");
    }
}

/// Between its ends a step is as good as the tolerance, give or take an order of the dense output.
#[test]
fn dense_output_follows_the_orbit() {
    let mut field = System(two_body);
    let mut stepper = Stepper::new(Tolerance { relative: 1e-11, absolute: vec![1e-14; 4] });
    stepper.start(&mut field, 0.0, &[1.0, 0.0, 0.0, 1.0], None);
    let mut state = [0.0; 4];
    while stepper.end_time() < 6.0 {
        stepper.step(&mut field, 6.0).unwrap();
        let dense = stepper.dense(&mut field);
        for part in 0..=10 {
            let time = dense.start() + (dense.end() - dense.start()) * f64::from(part) / 10.0;
            dense.state(time, &mut state);
            assert!((state[0] - libm::cos(time)).abs() < 1e-9, "{time}");
        }
    }
}

/// A step taken again to an earlier time stands where the solution stands.
#[test]
fn a_step_is_taken_again_exactly() {
    let mut field = System(two_body);
    let mut stepper = Stepper::new(Tolerance { relative: 1e-11, absolute: vec![1e-14; 4] });
    stepper.start(&mut field, 0.0, &[1.0, 0.0, 0.0, 1.0], None);
    stepper.step(&mut field, 6.0).unwrap();
    stepper.step(&mut field, 6.0).unwrap();
    let time = 0.3 * stepper.start_time() + 0.7 * stepper.end_time();
    stepper.redo(&mut field, time);
    assert_eq!(stepper.end_time(), time);
    assert!((stepper.end_state()[0] - libm::cos(time)).abs() < 1e-11);
    stepper.step(&mut field, 6.0).unwrap();
    assert!((stepper.end_state()[0] - libm::cos(stepper.end_time())).abs() < 1e-11);
}

#[test]
fn a_limit_is_met_exactly() {
    let (y, _) = run(1e-10, 0.1 + 0.2, &[0.0], |_, _, rate| rate[0] = 1.0);
    assert!((y[0] - (0.1 + 0.2)).abs() < 1e-15);
}

#[test]
fn a_pole_stops_the_flight_and_does_not_hang() {
    let mut field = System(|_: f64, y: &[f64], rate: &mut [f64]| rate[0] = y[0] * y[0]);
    let mut stepper = Stepper::new(Tolerance { relative: 1e-9, absolute: vec![1e-12] });
    stepper.start(&mut field, 0.0, &[1.0], None);
    let mut failure = None;
    for _ in 0..100_000 {
        if let Err(found) = stepper.step(&mut field, 2.0) {
            failure = Some(found);
            break;
        }
    }
    assert!(failure.is_some());
    assert!(stepper.end_time() <= 1.0 + 1e-9);
}

/// Free fall from 10 m at 9.80665 m/s² takes √(2·10/9.80665) s.
#[test]
fn roots_are_found_to_the_last_digits() {
    let fall = root(0.0, 5.0, |t| 10.0 - 0.5 * 9.80665 * t * t);
    assert!((fall - (20.0_f64 / 9.80665).sqrt()).abs() < 1e-15);
    let fixed = root(0.0, 1.0, |x| x - libm::cos(x));
    assert!((fixed - 0.739_085_133_215_160_6).abs() < 1e-15);
    assert_eq!(root(1.0, 2.0, |x| x - 1.0), 1.0);
}

/// An interval of a few units in the last place ends the search like any other.
#[test]
fn a_very_short_interval_is_searched_in_bounded_time() {
    let (start, end) = (400.0, 400.0 + 2e-13);
    let (time, _) = maximum(start, end, |t| -(t - 400.0));
    assert_eq!(time, start);
}

#[test]
fn a_summit_and_a_corner_are_found() {
    let (time, value) = maximum(0.0, 3.0, libm::sin);
    assert!((time - std::f64::consts::FRAC_PI_2).abs() < 1e-5 && (value - 1.0).abs() < 1e-10);
    assert_eq!(maximum(0.0, 1.0, |t| t), (1.0, 1.0));
    assert_eq!(maximum(0.0, 1.0, |t| -t), (0.0, 0.0));
}
