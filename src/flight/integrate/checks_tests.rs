//! Small equations with a closed form, and roots of equations in books.

use std::f64::consts::{PI, TAU};

use super::tests::{System, run, two_body};
use super::{Stepper, Tolerance, root};

/// Standard gravity, m/s² (3rd CGPM, 1901).
const G0: f64 = 9.80665;
/// Accuracy of these flights; figures are held to their last digit.
const TOLERANCE: f64 = 1e-12;

fn near(found: f64, expected: f64, relative: f64) {
    assert!((found - expected).abs() <= relative * expected.abs().max(1e-3), "{found} for {expected}");
}

/// Flies until `event` first rises through zero: the time and the state at a step's end.
fn until(
    start: &[f64],
    f: impl FnMut(f64, &[f64], &mut [f64]),
    event: impl Fn(&[f64]) -> f64,
) -> (f64, Vec<f64>) {
    let mut field = System(f);
    let mut stepper = Stepper::new(Tolerance { relative: TOLERANCE, absolute: vec![1e-12; start.len()] });
    stepper.start(&mut field, 0.0, start, None);
    let mut state = start.to_vec();
    for _ in 0..10_000 {
        let before = event(stepper.end_state());
        stepper.step(&mut field, 1e6).unwrap();
        if before < 0.0 && event(stepper.end_state()) >= 0.0 {
            let dense = stepper.dense(&mut field);
            let time = root(dense.start(), dense.end(), |time| {
                dense.state(time, &mut state);
                event(&state)
            });
            stepper.redo(&mut field, time);
            return (stepper.end_time(), stepper.end_state().to_vec());
        }
    }
    panic!("the event never comes about");
}

/// A throw of 500 m/s at 40° over flat ground without air lands after 2·v·sin 40°/g at v²·sin 80°/g.
#[test]
fn an_event_lies_where_the_closed_form_says() {
    let (sine, cosine) = (libm::sin(40.0_f64.to_radians()), libm::cos(40.0_f64.to_radians()));
    let throw = |_: f64, y: &[f64], rate: &mut [f64]| rate.copy_from_slice(&[y[2], y[3], 0.0, -G0]);
    // The event is the height itself, which starts above zero by less than counts.
    let (time, landed) = until(&[0.0, 1e-9, 500.0 * cosine, 500.0 * sine], throw, |y| -y[1]);
    near(time, 1000.0 * sine / G0, 1e-12);
    near(landed[0], 500_000.0 * sine * cosine / G0, 1e-12);
    near(landed[0], 25_105.610_81, 1e-9);
    assert!(landed[1].abs() < 1e-9);
}

/// Where Kepler's equation puts the body after `time`: a = μ = 1, from perigee.
fn kepler(eccentricity: f64, time: f64) -> [f64; 2] {
    let anomaly = root(0.0, TAU, |anomaly| anomaly - eccentricity * libm::sin(anomaly) - time);
    let minor = (1.0 - eccentricity * eccentricity).sqrt();
    [libm::cos(anomaly) - eccentricity, minor * libm::sin(anomaly)]
}

#[test]
fn an_orbit_follows_keplers_equation() {
    for time in [0.3, 2.0, PI, 4.0, 6.0] {
        let (y, _) = run(1e-13, time, &[0.4, 0.0, 0.0, 2.0], two_body);
        let place = kepler(0.6, time);
        assert!((y[0] - place[0]).abs() < 1e-11 && (y[1] - place[1]).abs() < 1e-11, "{time}: {y:?}");
    }
}

/// The restricted three-body orbit of Arenstorf closes (Hairer, Nørsett and Wanner, section II.0). Errors
/// grow by its close passes, up to some 10⁴ times the tolerance.
#[test]
fn arenstorfs_orbit_closes() {
    let moon = 0.012277471;
    let start = [0.994, 0.0, 0.0, -2.001_585_106_379_082_5];
    let (y, _) = run(1e-13, 17.065_216_560_157_96, &start, |_, y, rate| {
        let cube = |x: f64| {
            let square = x * x + y[1] * y[1];
            square * square.sqrt()
        };
        let (earthwards, moonwards) = (cube(y[0] + moon), cube(y[0] - 1.0 + moon));
        let x = y[0] + 2.0 * y[3]
            - (1.0 - moon) * (y[0] + moon) / earthwards
            - moon * (y[0] - 1.0 + moon) / moonwards;
        let z = y[1] - 2.0 * y[2] - (1.0 - moon) * y[1] / earthwards - moon * y[1] / moonwards;
        rate.copy_from_slice(&[y[2], y[3], x, z]);
    });
    assert!((y[0] - 0.994).abs() < 1e-9 && y[1].abs() < 1e-9, "{y:?}");
}

/// Free flight at v²r/μ = 0.8 over a round Earth: sin(ψ/2) = Q/(2 − Q) at the best path angle,
/// (180° − ψ)/4 (Bate, Mueller and White, *Fundamentals of Astrodynamics*, ch. 6).
#[test]
fn the_longest_ballistic_arc_lands_where_it_should() {
    let (speed, angle) = (0.8_f64.sqrt(), 24.09484_f64.to_radians());
    let start = [1.0, 0.0, speed * libm::sin(angle), speed * libm::cos(angle)];
    let falling =
        |y: &[f64]| if y[0] * y[2] + y[1] * y[3] > 0.0 { -1.0 } else { 1.0 - y[0] * y[0] - y[1] * y[1] };
    let (_, landed) = until(&start, two_body, falling);
    near(libm::atan2(landed[1], landed[0]).to_degrees(), 83.62063, 1e-7);
}

/// A turn at 0.5°/s from 80° to 20° under thrust of 2 g·sin γ: v = g/ω·cos γ, as v·dγ/dt = −g·cos γ.
#[test]
fn a_turn_at_constant_rate_meets_its_closed_form() {
    let rate_of_turn = 0.5_f64.to_radians();
    let start = [G0 / rate_of_turn * libm::cos(80.0_f64.to_radians()), 80.0_f64.to_radians(), 0.0, 0.0];
    near(start[0], 195.138757, 1e-8);
    let (y, _) = run(TOLERANCE, 120.0, &start, |_, y, rate| {
        let (sine, cosine) = (libm::sin(y[1]), libm::cos(y[1]));
        rate.copy_from_slice(&[G0 * sine, -G0 * cosine / y[0], y[0] * sine, y[0] * cosine]);
    });
    near(y[0], 1055.988333, 1e-8);
    near(y[1].to_degrees(), 20.0, 1e-9);
    near(y[2], 54_913.361_1, 1e-8);
    near(y[3], 57_742.851_6, 1e-8);
}

/// Exit Mach numbers of ideal nozzles as roots of A/A* (NACA Report 1135, 1953, eq. 80; γ 1.4 at 2 from
/// its Table II, the others by the same formula).
#[test]
fn nozzles_exit_mach_numbers_are_found() {
    for (gamma, ratio, mach) in [
        (1.4, 2.0, 2.197198),
        (1.15, 40.0, 3.96647),
        (1.2, 5.0, 2.78504),
        (1.2, 200.0, 5.40078),
        (1.3, 40.0, 4.86355),
        (1.4, 10.0, 3.92255),
    ] {
        let area = |mach: f64| {
            let inner: f64 = 2.0 / (gamma + 1.0) * (1.0 + 0.5 * (gamma - 1.0) * mach * mach);
            libm::pow(inner, 0.5 * (gamma + 1.0) / (gamma - 1.0)) / mach
        };
        let mut looks = 0;
        let found = root(1.0, 50.0, |mach| {
            looks += 1;
            area(mach) - ratio
        });
        near(found, mach, 2e-6);
        near(area(found), ratio, 1e-13);
        assert!(looks <= 58, "bisection alone takes 54 looks; {looks}");
    }
}
