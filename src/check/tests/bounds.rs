//! Large and nasty sources: bounded time and stack.

use std::fmt::Write;
use std::time::{Duration, Instant};

use super::{Files, codes, compile_text};
use crate::check::compile;

/// Generous, since tests run unoptimised and side by side; what is quadratic takes minutes.
const PATIENCE: Duration = Duration::from_secs(20);

#[allow(clippy::disallowed_methods, reason = "a test of time reads the clock")]
fn timed(text: &str) -> Vec<&'static str> {
    let start = Instant::now();
    let compiled = compile_text(text);
    println!("{} lines: {:?}", text.lines().count(), start.elapsed());
    assert!(start.elapsed() < PATIENCE, "{:?}", start.elapsed());
    codes(&compiled)
}

#[test]
fn a_hundred_thousand_lines_are_checked_in_linear_time() {
    let mut text = String::new();
    for n in 0..8000 {
        let _ = writeln!(text, "engine E{n} {{\n thrust {} kN in vacuum\n isp 300 s in vacuum\n}}", n + 1);
        let _ = writeln!(text, "given g{n} {n} kg\nstage S{n} {{\n engines 1 of E{n}\n dry g{n} * 2 + 1 kg");
        let _ = writeln!(text, " propellant 10 * S{n}.dry\n}}\nvehicle V{n} {{ stack S{n} }}\n");
    }
    assert!(timed(&text).is_empty());
}

#[test]
fn many_unknown_names_do_not_take_quadratic_time() {
    let mut text = String::new();
    for n in 0..20_000 {
        let _ = writeln!(
            text,
            "given known{n} unknown{n}\nstage S{n} {{ engines 1 of Unknown{n}; dry 1 kg; propellant 1 kg }}"
        );
    }
    assert_eq!(timed(&text).len(), 40_000);
}

#[test]
fn a_mission_of_many_lines_is_read_once() {
    let mut text = "mission M {\n payload 10 kg\n".to_string();
    for n in 0..40_000 {
        let _ = writeln!(text, " given g{n} payload * {n}");
    }
    text.push_str("}\n");
    let _ = timed(&text);
}

#[test]
fn a_large_curve_is_read_in_linear_time() {
    let mut text = "curve C {\n mach -> cd\n".to_string();
    for n in 0..100_000 {
        let _ = writeln!(text, " {n} 0.5");
    }
    text.push_str("}\n");
    assert!(timed(&text).is_empty());
}

#[test]
fn givens_in_a_long_chain_are_refused_rather_than_overflow_the_stack() {
    let mut text = String::new();
    for n in 0..30_000 {
        let _ = writeln!(text, "given a{n} a{} + 1 m", n + 1);
    }
    text.push_str("given a30000 1 m\n");
    assert!(timed(&text).contains(&"too-deep"));
}

#[test]
fn a_long_chain_of_like_is_refused() {
    let mut text = String::new();
    for n in 0..20_000 {
        let _ = writeln!(text, "engine E{n} like E{} {{ }}", n + 1);
    }
    assert!(timed(&text).contains(&"too-deep"));
}

#[test]
fn blocks_that_lean_on_each_other_do_not_overflow_the_stack() {
    let mut text = String::new();
    for n in 0..5_000 {
        let _ = writeln!(text, "stage S{n} {{ dry 1 kg + 1 kg * S{}.growth }}", n + 1);
    }
    assert!(timed(&text).contains(&"too-deep"));
}

#[test]
fn many_files_in_a_row_are_followed() {
    let names: Vec<String> = (0..3000).map(|n| format!("f{n}.wright")).collect();
    let texts: Vec<String> = (0..3000)
        .map(|n| format!("bring G{} from \"f{}.wright\"\ngiven G{n} 1 kg\n", n + 1, n + 1))
        .collect();
    let files: Vec<_> = names.iter().map(String::as_str).zip(texts.iter().map(String::as_str)).collect();
    let compiled = compile("f0.wright", &Files(&files));
    assert_eq!(codes(&compiled), ["file-not-read"]);
}

#[test]
fn a_long_curve_is_shared_by_all_that_use_it() {
    let mut text = "curve C {\n time [s] -> thrust [kN]\n".to_string();
    for n in 0..20_000 {
        let _ = writeln!(text, " {n} 0.5");
    }
    text.push_str("}\n");
    for n in 0..5_000 {
        let _ = writeln!(text, "engine E{n} {{ thrust C in vacuum; isp 300 s in vacuum }}");
        let _ = writeln!(text, "stage S{n} {{ engines 1 of E{n}; dry 1 kg; propellant 3399 kg }}");
        let _ = writeln!(text, "vehicle V{n} {{ stack S{n} }}");
    }
    assert!(timed(&text).is_empty());
}
