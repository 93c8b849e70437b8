//! Whether the phases of a mission can be flown in their order.

use super::{codes, compile_text};

/// A core with two pairs of strap-ons and an upper stage over flat ground without air.
const VEHICLE: &str = "world Slate { gravity uniform 1.62 m/s^2; surface flat; air none }
engine Tansy { thrust 30 kN in vacuum; isp 320 s in vacuum; throttle 40 % .. 100 %; restarts 1 }
stage Sedge { engines 3 of Tansy; dry 700 kg; propellant 900 kg }
stage Rush { engines 1 of Tansy; dry 500 kg; propellant 400 kg }
stage Alder { engines 1 of Tansy; dry 50 kg; propellant 90 kg }
vehicle Heron { stack Sedge, Rush; beside Sedge Pair 2 of Alder; shroud Calyx 20 kg; drag none }
";

/// The codes that a mission with these phases brings up.
fn flown(phases: &str) -> Vec<&'static str> {
    let mission = format!(
        "mission Hop {{\n flies Heron\n within Slate\n start pad altitude 0 m\n payload 100 kg\n{phases}\n}}\n"
    );
    codes(&compile_text(&format!("{VEHICLE}{mission}")))
}

const UP: &str = "phase Up { burn Sedge, Pair; steer upright; until 5 s; shed Pair }\n";
const NEXT: &str = "phase Next { burn Rush; steer upright; until 5 s }\n";

#[test]
fn what_is_in_order_brings_nothing_up() {
    let part = "phase Mid { burn Sedge; steer upright; until Sedge spent; shed Sedge }\n";
    assert_eq!(flown(&format!("{UP}{part}{NEXT}")), Vec::<&str>::new());
}

#[test]
fn what_is_gone_neither_burns_nor_goes_again() {
    let drop = "phase Drop { coast; until 1 s; shed Sedge }\n";
    assert_eq!(
        flown(&format!("{UP}{drop}{NEXT}phase Late {{ burn Sedge; steer upright; until 1 s }}")),
        ["already-shed"]
    );
    assert_eq!(
        flown(&format!("{UP}{drop}{NEXT}phase Late {{ coast; until 1 s; shed Pair }}")),
        ["already-shed"]
    );
    let asked = "phase Late { coast; until Sedge.left <= 3 kg }";
    assert_eq!(flown(&format!("{UP}{drop}{NEXT}{asked}")), ["absent-quantity"]);
    let asked = "phase Late { coast; until Sedge spent }";
    assert_eq!(flown(&format!("{UP}{drop}{NEXT}{asked}")), ["absent-quantity"]);
    let asked = "demand Sedge.left at end of Next >= 0 kg";
    assert_eq!(flown(&format!("{UP}{drop}{NEXT}{asked}")), ["absent-quantity"]);
}

#[test]
fn stages_go_from_the_bottom_up() {
    assert_eq!(flown(&format!("{UP}{NEXT}")), ["burnt-too-early"]);
    let hot = "phase Next { burn Rush hot; steer upright; until 5 s }\n";
    assert_eq!(flown(&format!("{UP}{hot}")), Vec::<&str>::new());
    let within = "phase Next { burn Sedge; light Rush at 3 s; steer upright; until 5 s; \
        shed Sedge when Sedge spent }\n";
    assert_eq!(flown(&format!("{UP}{within}")), Vec::<&str>::new());
    let whole = "phase Up { burn Sedge, Pair, Rush hot; steer upright; until 5 s; shed Sedge; shed Rush }\n";
    assert_eq!(flown(whole), ["still-carried"], "the pair is still beside its carrier");
    let upper = "phase Up { burn Sedge, Pair, Rush hot; steer upright; until 5 s; shed Rush }\n";
    assert_eq!(flown(upper), ["still-carried"]);
    let all = "phase Up { burn Sedge, Pair, Rush hot; steer upright; until 5 s; shed Rush; shed Sedge; \
        shed Pair }\n";
    assert_eq!(flown(all), Vec::<&str>::new(), "at one instant the order of the text does not matter");
}

#[test]
fn engines_are_lit_as_often_as_they_may() {
    let burn = |name: &str| format!("phase {name} {{ burn Rush; steer upright; until 1 s }}\n");
    let coast = |name: &str| format!("phase {name} {{ coast; until 1 s }}\n");
    let drop = "phase Drop { coast; until 1 s; shed Sedge }\n";
    let (a, b, c, d) = (burn("A"), burn("B"), burn("C"), burn("D"));
    let (x, y) = (coast("X"), coast("Y"));
    let once_more = format!("{UP}{drop}{a}{b}{x}{c}");
    assert_eq!(flown(&once_more), Vec::<&str>::new(), "phases in a row are one burn");
    assert_eq!(flown(&format!("{once_more}{y}{d}")), ["too-many-restarts"]);
    let again = "phase Again { burn Pair; light Sedge at 1 s; steer upright; until 2 s }\n";
    let first = "phase Up { burn Sedge, Pair; steer upright; until 5 s }\n";
    let rest = format!("phase Drop {{ coast; until 1 s; shed Pair; shed Sedge }}\n{NEXT}");
    assert_eq!(flown(&format!("{first}{again}{rest}")), Vec::<&str>::new(), "it is lit anew");
    let twice = "phase Up { burn Sedge, Pair; light Sedge at 2 s; steer upright; until 5 s }\n";
    assert_eq!(flown(&format!("{twice}{rest}")), ["already-lit"]);
    let twice = "phase Up { burn Sedge, Pair, Sedge; steer upright; until 5 s }\n";
    assert_eq!(flown(&format!("{twice}{rest}")), ["already-lit"]);
}

#[test]
fn sheds_spare_what_burns() {
    let rest = format!("phase Drop {{ coast; until 1 s; shed Sedge }}\n{NEXT}");
    let spent = "phase Up { burn Sedge, Pair; steer upright; until 5 s; shed Pair when Pair spent }\n";
    assert_eq!(flown(&format!("{spent}{rest}")), Vec::<&str>::new());
    let burning = "phase Up { burn Sedge, Pair; steer upright; until 5 s; shed Pair when height >= 9 m }\n";
    assert_eq!(flown(&format!("{burning}{rest}")), ["shed-while-burning"]);
}

#[test]
fn a_phase_says_what_it_does_and_can_end() {
    let rest = format!("phase Drop {{ coast; until 1 s; shed Sedge }}\n{NEXT}");
    let with = |phase: &str| flown(&format!("{UP}{phase}\n{rest}"));
    assert_eq!(with("phase Odd { burn Sedge; coast; steer upright; until 1 s }"), ["burn-or-coast"]);
    assert_eq!(with("phase Odd { steer upright; until 1 s }"), ["burn-or-coast"]);
    assert_eq!(with("phase Odd { burn Sedge; until 1 s }"), ["missing-fact"]);
    assert_eq!(with("phase Odd { coast }"), ["missing-fact"]);
    assert_eq!(with("phase Odd { coast; until Sedge spent }"), ["endless-phase"]);
    assert_eq!(with("phase Odd { coast; until Sedge spent or 3 s }"), Vec::<&str>::new());
    assert_eq!(with("phase Odd { coast; until -3 s }"), ["impossible-value"]);
    assert_eq!(with("phase Odd { coast; throttle 60 %; until 1 s }"), ["nothing-throttles"]);
    let burn = |rest: &str| with(&format!("phase Odd {{ burn Sedge; steer upright; until 1 s; {rest} }}"));
    assert_eq!(burn("throttle 30 %"), ["throttle-out-of-range"]);
    assert_eq!(burn("throttle 60 %"), Vec::<&str>::new());
    assert_eq!(burn("throttle 60 % .. 80 %"), ["unexpected-part"]);
    assert_eq!(burn("throttle"), ["missing-fact"]);
    assert_eq!(burn("hold height <= 3 m by throttle"), ["hold-not-by-throttle"]);
    assert_eq!(burn("hold thrust <= 3 m by throttle"), ["dimension-mismatch"]);
    let engines = |count: &str| {
        with(&format!("phase Odd {{ burn Sedge with {count} engines; steer upright; until 1 s }}"))
    };
    assert_eq!(engines("2 of 3"), Vec::<&str>::new());
    assert_eq!(engines("4 of 3"), ["engine-count"]);
    assert_eq!(engines("2 of 4"), ["engine-count"]);
    assert_eq!(engines("1.5 of 3"), ["impossible-value"]);
    assert_eq!(with("phase Odd { burn Calyx; steer upright; until 1 s }"), ["engine-count"]);
    assert_eq!(with("phase Odd { burn Sdge; steer upright; until 1 s }"), ["unknown-name"]);
}

#[test]
fn phases_are_defined_by_difference() {
    let rest = format!("phase Drop {{ coast; until 1 s; shed Sedge }}\n{NEXT}");
    let up = "phase Up { burn Sedge, Pair; steer upright; until 5 s }\n";
    let more = "phase More like Up { until 9 s; shed Pair }\n";
    let compiled = compile_text(&format!(
        "{VEHICLE}mission Hop {{\n flies Heron; within Slate; start pad altitude 0 m; payload 1 kg\n{up}{more}{rest}}}\n"
    ));
    assert_eq!(codes(&compiled), Vec::<&str>::new());
    let phases = &compiled.model.unwrap().missions[0].phases;
    assert_eq!((phases[0].burns.clone(), phases[0].sheds.len()), (phases[1].burns.clone(), 0));
    let coast = "phase Wait like Up { coast }\n";
    assert_eq!(flown(&format!("{up}{coast}{more}{rest}")), Vec::<&str>::new());
    let circle = "phase A like B { until 1 s }\nphase B like A { until 1 s }\n";
    assert!(flown(&format!("{UP}{circle}{rest}")).contains(&"circular-definition"));
}

#[test]
fn a_fault_elsewhere_does_not_hide_the_order() {
    let odd =
        "phase Up { burn Sedge, Pair; steer upright; throttle 20 %; until height >= 3 kg; shed Sedge }\n";
    let drop = "phase Drop { burn Sedge; steer upright; until 1 s }\n";
    let mut found = flown(&format!("{odd}{drop}{NEXT}"));
    found.sort_unstable();
    assert_eq!(found, ["already-shed", "dimension-mismatch", "still-carried", "throttle-out-of-range"]);
    // Where it is not known what is shed, nothing is said of what follows from it.
    let unknown = "phase Up { burn Sedge, Pair; steer upright; until 3 s; shed Sdge; shed Pair }\n";
    assert_eq!(flown(&format!("{unknown}{NEXT}")), ["unknown-name"]);
    let unreadable = "phase Up { burn Sedge, Pair; steer upright; until 3 s; shed }\n";
    assert_eq!(flown(&format!("{unreadable}{NEXT}")).len(), 1);
}
