//! Expressions, dimensions and curves.

use super::{Files, codes, compile_text};
use crate::check::{Compiled, compile};

fn value(expr: &str) -> f64 {
    let compiled = compile_text(&format!("given x {expr}\n"));
    assert!(compiled.diagnostics.is_empty(), "{expr}: {:?}", compiled.diagnostics);
    compiled.model.unwrap().facts[0].si
}

fn near(expr: &str, expected: f64) {
    let found = value(expr);
    assert!(
        (found - expected).abs() <= 4.0 * f64::EPSILON * expected.abs(),
        "{expr}: {found}, not {expected}"
    );
}

#[test]
fn expressions_have_their_values_in_si() {
    near("2 km + 3 m", 2003.0);
    near("-(2 + 3) * 4 ^ 2", -80.0);
    near("2 ^ 3 ^ 2", 512.0);
    near("2 ^ -2", 0.25);
    near("90 kg / 3 s", 30.0);
    near("sin(30 deg) * 2", 1.0);
    near("atan(1) / 45 deg", 1.0);
    near("sqrt(16 m^2)", 4.0);
    near("least(3 km, 400 m, 2 km)", 400.0);
    near("greatest(1, 2)", 2.0);
    near("ln(exp(2))", 2.0);
    near("abs(-3 kg)", 3.0);
    near("8 %", 0.08);
}

#[test]
fn what_has_no_value_or_no_dimension_is_reported() {
    for (expr, code) in [
        ("2 km + 3 kg", "dimension-mismatch"),
        ("2 km + 3", "dimension-mismatch"),
        ("sin(3)", "missing-unit"),
        ("sin(3 kg)", "dimension-mismatch"),
        ("exp(3 deg)", "dimension-mismatch"),
        ("1 / 0", "impossible-value"),
        ("ln(-1)", "impossible-value"),
        ("(2 kg) ^ 0.5", "power-of-quantity"),
        ("(2 kg) ^ 200", "power-of-quantity"),
        ("sqrt(2 kg)", "power-of-quantity"),
        ("2 ^ (3 m)", "dimension-mismatch"),
        ("sine(3 deg)", "unknown-word"),
        ("sin(1 deg, 2 deg)", "wrong-arguments"),
        ("2 * height", "not-constant"),
        ("peak acceleration", "not-constant"),
        ("3 kgs", "unknown-unit"),
    ] {
        assert_eq!(codes(&compile_text(&format!("given x {expr}\n"))), [code], "{expr}");
    }
}

#[test]
fn a_mismatch_shows_use_and_definition() {
    let compiled = compile_text("given heavy 3 kN\nstage S { dry heavy }\n");
    let found = &compiled.diagnostics[0];
    assert_eq!(found.code.name, "dimension-mismatch");
    let places: Vec<_> = found.labels.iter().map(|label| compiled.sources.text(label.span)).collect();
    assert_eq!(places, ["heavy", "3 kN"]);
    let compiled = compile_text("stage T { dry 2 t }\nstage S { dry 3 kg + T.growth }\n");
    assert_eq!(codes(&compiled), ["dimension-mismatch"]);
    let compiled = compile_text("stage T { dry 2 t growth 3 % }\nstage S { dry T.growth }\n");
    assert_eq!(compiled.sources.text(compiled.diagnostics[0].labels[1].span), "3 %");
    let compiled = compile_text("given x exp(3 deg)\n");
    assert!(compiled.diagnostics[0].help.as_deref().unwrap().contains("1 rad"));
}

fn curve(rows: &str) -> Vec<&'static str> {
    codes(&compile_text(&format!("curve C {{\n{rows}\n}}\n")))
}

#[test]
fn curves_are_checked_row_by_row() {
    for (rows, expected) in [
        ("mach -> cd\n0 1\n1 2", vec![]),
        ("mach, altitude [km] -> cd\n0 0 1\n0 9 2\n1 0 3\n1 9 4", vec![]),
        ("mach -> cd\n0 1", vec!["curve-too-short"]),
        ("mach -> cd\n0 1\n0 2", vec!["curve-order"]),
        ("mach -> cd\n1 1\n0 2\n-1 3", vec!["curve-order", "curve-order"]),
        ("mach -> cd\n0 1 2\n1 2", vec!["curve-width"]),
        ("mach, altitude [km] -> cd\n0 0 1\n0 9 2\n1 0 3", vec!["curve-grid"]),
        ("mach, altitude [km] -> cd\n0 0 1\n0 9 2\n1 0 3\n1 8 4", vec!["curve-grid"]),
        ("mach, altitude [km] -> cd\n0 9 1\n0 0 2\n1 9 3\n1 0 4", vec!["curve-order"]),
        ("mach [kgs] -> cd\n0 1\n1 2", vec!["unknown-unit"]),
        ("kind cubic\nmach -> cd\n0 1\n1 2", vec!["unknown-word"]),
        ("0 1\n1 2", vec!["missing-fact"]),
        ("mach -> cd", vec!["curve-too-short"]),
        ("mach, altitude [km] -> cd", vec!["curve-too-short"]),
    ] {
        assert_eq!(curve(rows), expected, "{rows}");
    }
}

fn with_table(table: &str) -> Compiled {
    let text =
        "curve Push { from \"data/push.csv\" }\nengine E { thrust Push in vacuum; isp 270 s in vacuum }\n";
    compile("example.wright", &Files(&[("example.wright", text), ("data/push.csv", table)]))
}

#[test]
fn points_come_from_files_of_comma_separated_values() {
    assert!(codes(&with_table("time [s],thrust [kN]\r\n0, 10\r\n2.5e1,12\r\n\r\n")).is_empty());
    for (table, expected) in [
        ("", vec!["curve-header"]),
        ("time [s],thrust kN\n0,1\n1,2\n", vec!["curve-header"]),
        ("time [s]\n0\n1\n", vec!["curve-header"]),
        ("time [s],thrust [kN]\n0,ten\n1,2\n", vec!["impossible-value"]),
        ("time [s],thrust [kN]\n0,nan\n1,2\n", vec!["impossible-value"]),
        ("time [s],thrust [kN]\n0,1\n1\n", vec!["curve-width"]),
        ("time [s],thrust [km]\n0,1\n1,2\n", vec!["unfit-curve"]),
        ("time [s],thrust [kN]\n0,1\n1,-2\n", vec!["impossible-value"]),
        ("time [s],thrust [kN]\n0.1,1\n1,2\n", vec!["impossible-value"]),
    ] {
        assert_eq!(codes(&with_table(table)), expected, "{table}");
    }
}

#[test]
fn files_define_and_bring_units() {
    let parts = "unit smoot = 1.7018 m\nunit furlong = 220 yd\n";
    let main = "bring smoot from \"parts.wright\"\nunit ken = 2 smoot\ngiven x 3 ken\n";
    let compiled = compile("main.wright", &Files(&[("main.wright", main), ("parts.wright", parts)]));
    assert!(compiled.diagnostics.is_empty(), "{:?}", compiled.diagnostics);
    assert!((compiled.model.unwrap().facts[0].si - 6.0 * 1.7018).abs() < 1e-12);
    for (text, expected) in [
        ("unit m = 2 km\n", vec!["duplicate-name"]),
        ("unit a = -2 km\ngiven x 3 a\n", vec!["impossible-value"]),
        ("unit a = 2 kms\ngiven x 3 a\n", vec!["unknown-unit"]),
        ("unit a = 2 a\n", vec!["unknown-unit"]),
        ("given x 3 lb\n", vec!["unknown-unit"]),
    ] {
        assert_eq!(codes(&compile_text(text)), expected, "{text}");
    }
}

#[test]
fn the_units_that_would_do_are_offered() {
    let compiled = compile_text("stage S { dry 290 }\n");
    assert_eq!(
        compiled.diagnostics[0].help.as_deref(),
        Some("write its unit, such as `290 kg`; it may be kg, lbm, g, t, ozm")
    );
}
