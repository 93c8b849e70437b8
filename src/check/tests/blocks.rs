//! Worlds, stages and vehicles that do not hold together.

use super::{codes, compile_text};

const ENGINE: &str = "engine E { thrust 1 kN in vacuum; isp 300 s in vacuum }\n";
const STAGE: &str = "stage S { engines 1 of E; dry 1 kg; propellant 9 kg }\n";

fn check(cases: &[(&str, &[&str])], wrap: impl Fn(&str) -> String) {
    for (facts, expected) in cases {
        let text = wrap(facts);
        let compiled = compile_text(&text);
        assert_eq!(codes(&compiled), *expected, "{text}\n{:?}", compiled.diagnostics);
    }
}

#[test]
fn worlds() {
    let cases: &[(&str, &[&str])] = &[
        ("gravity uniform 1.62 m/s^2; surface flat; air none", &[]),
        ("gravity central 4902.8 km^3/s^2; equatorial_radius 1737.4 km; air none", &[]),
        (
            "gravity uniform 9.8 m/s^2; surface flat; \
             air exponential density 1.2 kg/m^3 pressure 101 kPa scale_height 8 km sound_speed 340 m/s",
            &[],
        ),
        ("gravity uniform 1.62 m/s^2; surface flat", &["missing-fact"]),
        ("surface flat; air none", &["missing-fact"]),
        ("gravity central 4902.8 km^3/s^2; air none", &["missing-fact"]),
        ("gravity central 4902.8 km^3/s^2; surface flat; air none", &["inconsistent-world"]),
        ("gravity uniform 1.62 m/s^2; equatorial_radius 9 km; air none", &["inconsistent-world"]),
        ("gravity uniform 1.62 m/s^2; surface flat; j2 1e-3; air none", &["inconsistent-world"]),
        ("gravity uniform 1.62 m/s^2; surface flat; flattening 0.1; air none", &["inconsistent-world"]),
        ("gravity uniform 1.62 m/s^2; surface flat; air none density 1 kg/m^3", &["inconsistent-world"]),
        ("gravity sideways 1.62 m/s^2; surface flat; air none", &["unknown-word"]),
        ("gravity uniform 1.62; surface flat; air none", &["missing-unit"]),
        ("gravity uniform 4902.8 km^3/s^2; surface flat; air none", &["dimension-mismatch"]),
        ("gravity uniform -1 m/s^2; surface flat; air none", &["impossible-value"]),
        ("gravity uniform 1 m/s^2; surface flat; air exponential density 1 kg/m^3", &["missing-fact"; 3]),
        ("gravity central 1 km^3/s^2; equatorial_radius 1 km; flattening 2; air none", &["impossible-value"]),
        ("gravity uniform 1 m/s^2; surface flat; air none; spin 1 1/s", &["dimension-mismatch"]),
    ];
    // The missing facts of one block have one place and are told apart by their words.
    check(cases, |facts| format!("world W {{ {facts} }}\n"));
}

#[test]
fn stages() {
    let cases: &[(&str, &[&str])] = &[
        ("dry 1 kg", &[]),
        ("engines 2 of E; dry 1 kg growth 0 %; propellant 9 kg unusable 1 kg; reserve 8 kg", &[]),
        ("engines 2 of E; dry 1 kg; propellant 9 kg unusable 1 kg; reserve 8.1 kg", &["impossible-value"]),
        ("engines 2 of E; dry 1 kg; propellant 9 kg unusable 100 %", &["impossible-value"]),
        ("engines 2 of E; dry 1 kg; propellant 9 kg unusable 0.01", &["percent-or-number"]),
        ("engines 2 of E; dry 1 kg; propellant 9 kg unusable 3 s", &["dimension-mismatch"]),
        ("engines 2 of E; dry 1 kg; propellant 9 kg; reserve 3 s", &["dimension-mismatch"]),
        ("engines 2 of E; dry 1 kg; propellant 9 kg; reserve 3", &["missing-unit"]),
        ("engines 200 % of E; dry 1 kg; propellant 9 kg", &["percent-or-number"]),
        ("engines 0 of E; dry 1 kg; propellant 9 kg", &["impossible-value"]),
        ("engines 1 of E; dry 1 kg", &["missing-fact"]),
        ("dry 1 kg; propellant 9 kg", &["missing-fact"]),
        ("dry 1 kg; reserve 9 kg", &["impossible-value"]),
        ("engines 1 of E; propellant 9 kg", &["missing-fact"]),
        ("engines 1 of Elm; dry 1 kg; propellant 9 kg", &["unknown-name"]),
        ("dry 1 kg; thrust 3 kN in vacuum", &["unknown-fact"]),
        ("dry 1 kg; coast", &["foreign-fact"]),
        ("dry 1 kg in vacuum", &["unexpected-part"]),
    ];
    check(cases, |facts| format!("{ENGINE}stage T {{ {facts} }}\n"));
}

#[test]
fn vehicles() {
    let cases: &[(&str, &[&str])] = &[
        ("stack S", &[]),
        ("stack S; drag none", &[]),
        ("stack S; drag 0.3; reference_area 1 m^2", &[]),
        ("stack S; drag C; reference_area 1 m^2", &[]),
        ("stack S; beside S B 2 of S; shroud F 3 kg", &[]),
        ("drag none", &["missing-fact"]),
        ("stack S; drag 0.3", &["missing-fact"]),
        ("stack S; drag 30 %; reference_area 1 m^2", &["percent-or-number"]),
        ("stack S; drag D; reference_area 1 m^2", &["unfit-curve"]),
        ("stack S; drag N; reference_area 1 m^2", &["impossible-value"]),
        ("stack S; drag 0.3; reference_area 0 m^2", &["impossible-value"]),
        ("stack S, S", &["duplicate-name"]),
        ("stack S; beside S S 2 of S", &["duplicate-name"]),
        ("stack S; beside T B 2 of S", &["unknown-name"]),
        ("stack S; beside S B 1.5 of S", &["impossible-value"]),
        ("stack E", &["wrong-kind"]),
        ("stack S; shroud F 3 kN", &["dimension-mismatch"]),
    ];
    let curves = "curve C { mach -> cd; 0 1; 1 2 }\ncurve D { time [s] -> cd; 0 1; 1 2 }\ncurve N { mach -> cd; 0 1; 1 -2 }\n";
    check(cases, |facts| format!("{ENGINE}{STAGE}{curves}vehicle V {{ {facts} }}\n"));
}
