//! Sets of engine facts: enough, too few, and more than enough.

use super::{codes, compile_text};

fn engine(facts: &str) -> Vec<&'static str> {
    codes(&compile_text(&format!("engine Ember {{\n{facts}\n}}\n")))
}

/// F = 43.0 kN, I = 304 s, Aₑ = 0.047 m² give ṁ = 14.424 kg/s, F(sea) = 38.238 kN, I(sea) = 270.3 s.
#[test]
fn sets_that_agree_are_taken() {
    for facts in [
        "thrust 43.0 kN in vacuum\n isp 304 s in vacuum\n exit_area 0.047 m^2",
        "thrust 43.0 kN in vacuum\n thrust 38.2 kN at sea_level\n isp 304 s in vacuum",
        "thrust 43.0 kN in vacuum\n isp 304 s in vacuum\n isp 270.3 s at sea_level",
        "thrust 38.2 kN at sea_level\n isp 304 s in vacuum\n exit_area 0.047 m^2",
        "thrust 38.2 kN at sea_level\n isp 270 s at sea_level\n exit_area 0.047 m^2",
        "mass_flow 14.42 kg/s\n isp 304 s in vacuum\n exit_area 0.047 m^2",
        "thrust 43.0 kN in vacuum\n mass_flow 14.42 kg/s\n exit_area 0.047 m^2",
        "thrust 43.0 kN in vacuum\n exhaust_speed 2981 m/s in vacuum\n exit_area 0.047 m^2",
        // More than enough, each within half a unit of the last digit.
        "thrust 43.0 kN in vacuum\n thrust 38.2 kN at sea_level\n isp 304 s in vacuum\n isp 270 s at sea_level\n \
         exit_area 0.047 m^2\n mass_flow 14.4 kg/s\n exhaust_speed 2981 m/s in vacuum",
        // Only meant for vacuum.
        "thrust 43.0 kN in vacuum\n isp 304 s in vacuum",
    ] {
        assert!(engine(facts).is_empty(), "{facts}: {:?}", engine(facts));
    }
}

#[test]
fn sets_that_do_not_agree_are_refused() {
    for facts in [
        "thrust 43.0 kN in vacuum\n isp 304 s in vacuum\n exit_area 0.047 m^2\n mass_flow 15.9 kg/s",
        "thrust 43.0 kN in vacuum\n isp 304 s in vacuum\n exit_area 0.047 m^2\n thrust 39.0 kN at sea_level",
        "thrust 43.0 kN in vacuum\n isp 304 s in vacuum\n exhaust_speed 3100 m/s in vacuum",
    ] {
        assert_eq!(engine(facts), ["contradiction"], "{facts}");
    }
}

#[test]
fn a_contradiction_shows_what_the_others_make_of_each_fact() {
    let compiled = compile_text(
        "engine E {\nthrust 43.0 kN in vacuum\nisp 304 s in vacuum\nmass_flow 15.9 kg/s\nexit_area 1 m^2\n}\n",
    );
    let texts: Vec<_> = compiled.diagnostics[0].labels.iter().map(|label| label.text.as_str()).collect();
    assert_eq!(texts.len(), 3);
    assert!(texts[0].contains("47.4"), "{texts:?}");
    assert!(texts[1].contains("275.77"), "{texts:?}");
    assert!(texts[2].contains("14.4"), "{texts:?}");
}

#[test]
fn what_is_missing_is_named() {
    for (facts, expected) in [
        ("exit_area 0.047 m^2", vec!["missing-fact", "missing-fact"]),
        ("thrust 43.0 kN in vacuum", vec!["missing-fact"]),
        ("isp 304 s in vacuum", vec!["missing-fact"]),
        ("thrust 43.0 kN at sea_level\n isp 304 s in vacuum", vec!["missing-fact"]),
        ("thrust 43.0 kN\n isp 304 s in vacuum", vec!["missing-ambient"]),
        (
            "thrust 43.0 kN in vacuum\n thrust 44 kN at sea_level\n isp 304 s in vacuum",
            vec!["impossible-value"],
        ),
        ("thrust 43.0 kN in vacuum\n isp 304 s in vacuum\n throttle 100 % .. 55 %", vec!["impossible-value"]),
        ("thrust 43.0 kN in vacuum\n isp 304 s in vacuum\n throttle 55 %", vec!["missing-fact"]),
        (
            "thrust 43.0 kN in vacuum\n isp 304 s in vacuum\n throttle 0.55 .. 100 %",
            vec!["percent-or-number"],
        ),
        ("thrust 43.0 kN in vacuum\n isp 304 s in vacuum\n restarts 1.5", vec!["impossible-value"]),
        ("thrust 43.0 kN in vacuum\n isp 2981 m/s in vacuum", vec!["isp-as-speed"]),
        ("thrust 43.0 kN in vacuum\n exhaust_speed 304 s in vacuum", vec!["isp-as-speed"]),
        ("thrust 9700 lbm in vacuum\n isp 304 s in vacuum", vec!["pounds-confused"]),
    ] {
        assert_eq!(engine(facts), expected, "{facts}");
    }
}
