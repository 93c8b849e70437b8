//! What a mission asks for: demands, aims, figures, knobs; and the start that it flies from.

use super::{codes, compile_text};
use crate::check::Compiled;
use crate::model::{Edge, Formula, Headline, Mission, Origin, Quantity, Requirement, Start};

fn hop(world: &str, start: &str, asked: &str) -> Compiled {
    compile_text(&format!(
        "bring Moon, Earth from builtin
world Slate {{ gravity uniform 1.62 m/s^2; surface flat; air none }}
engine Tansy {{ thrust 16 kN in vacuum; isp 320 s in vacuum; exit_area 0.1 m^2; throttle 30 % .. 100 % }}
stage Sedge {{ engines 1 of Tansy; dry 1200 kg; propellant 900 kg }}
vehicle Heron {{ stack Sedge; shroud Calyx 20 kg; drag none }}
given tower 40 m
mission Hop {{
    flies    Heron
    within   {world}
    start    {start}
    payload  100 kg
    given    slope  70 deg
    given    idle   1 s
    phase Up {{ burn Sedge; steer pitch slope heading 0 deg; until height >= tower }}
    phase Drift {{ coast; until 5 s }}
    {asked}
}}
"
    ))
}

const PAD: &str = "pad latitude 10 deg longitude 20 deg altitude 0 m";

fn on_moon(asked: &str) -> Vec<&'static str> {
    codes(&hop("Moon", PAD, asked))
}

fn mission(asked: &str) -> Mission {
    let compiled = hop("Moon", PAD, asked);
    assert_eq!(codes(&compiled), Vec::<&str>::new(), "{:?}", compiled.diagnostics);
    compiled.model.unwrap().missions.remove(0)
}

const CLEAN: Vec<&str> = Vec::new();

#[test]
fn quantities_say_where_they_are_meant() {
    assert_eq!(on_moon("demand altitude at end of Drift >= 1 m"), CLEAN);
    assert_eq!(on_moon("demand peak acceleration in Up <= 5 g0"), CLEAN);
    assert_eq!(on_moon("demand altitude >= 1 m"), ["no-place"]);
    assert_eq!(on_moon("figure Way = downrange / 2"), ["no-place"]);
    assert_eq!(on_moon("demand altitude at end of Drfit >= 1 m"), ["unknown-name"]);
    assert_eq!(on_moon("demand altitud at end of Drift >= 1 m"), ["unknown-name"]);
    assert_eq!(on_moon("demand left at end of Drift >= 1 kg"), ["absent-quantity"]);
    assert_eq!(on_moon("demand Calyx.left at end of Drift >= 1 kg"), ["absent-quantity"]);
    assert_eq!(on_moon("phase Late { coast; until peak altitude >= 3 m }"), ["after-the-flight"]);
    assert_eq!(on_moon("demand peak (altitude at end of Up) >= 3 m"), ["after-the-flight"]);
    let tilted = "phase Late { burn Sedge; steer pitch ground_flight_path_angle heading 0 deg; until 1 s }";
    assert_eq!(on_moon(tilted), ["not-constant"]);
    assert_eq!(on_moon("phase Late { coast; until 1 s * (height / 1 m) }"), ["not-constant"]);
}

#[test]
fn a_world_lacks_what_it_lacks() {
    let on_slate = |asked: &str| codes(&hop("Slate", "pad altitude 3 m", asked));
    for absent in ["apogee", "inclination", "latitude", "mach", "peak dynamic_pressure", "heating"] {
        let place = if absent.starts_with("peak") { "" } else { "at end of Up" };
        assert_eq!(on_slate(&format!("figure Odd = {absent} {place}")), ["absent-quantity"], "{absent}");
    }
    assert_eq!(on_slate("figure Well = altitude at end of Up"), CLEAN);
    assert_eq!(on_moon("figure Odd = mach at end of Up"), ["absent-quantity"]);
    assert_eq!(on_moon("figure Well = apogee at end of Up"), CLEAN);
    let on_earth = codes(&hop("Earth", PAD, "figure Well = mach at end of Up"));
    assert!(!on_earth.contains(&"absent-quantity"));
}

#[test]
fn limits_have_the_dimension_of_their_quantity() {
    let compiled = hop("Moon", PAD, "demand altitude at end of Drift >= 5 kg");
    assert_eq!(codes(&compiled), ["dimension-mismatch"]);
    let labels = &compiled.diagnostics[0].labels;
    assert!(labels.len() == 2 && labels[1].text.contains("length"), "{labels:?}");
    assert_eq!(on_moon("demand altitude at end of Drift >= 5"), ["missing-unit"]);
    assert_eq!(on_moon("phase Late { coast; until height >= slope }"), ["dimension-mismatch"]);
    assert_eq!(on_moon("figure Odd = altitude at end of Up + mass at end of Up"), ["dimension-mismatch"]);
    assert_eq!(on_moon("demand mass at end of Up between 9 kg and 5 kg"), ["empty-band"]);
    assert_eq!(on_moon("aim mass at end of Up = 9 kg within 0 kg"), ["empty-band"]);
    assert_eq!(on_moon("figure Odd = altitude at end of Up / 0 m"), CLEAN);
    assert_eq!(on_moon("figure Odd = 1 m / 0 s"), ["impossible-value"]);
}

#[test]
fn formulas_keep_their_facts_and_figures() {
    let mission = mission(
        "figure Spare = Sedge.left at end of Drift - 3 * tower * 1 kg/m
        figure Half = Spare / 2
        demand Much Half >= 10 kg
        demand altitude at end of Drift = tower within 1 km
        headline Half",
    );
    let Formula::Binary { left, right, .. } = &mission.figures[0].value else { panic!() };
    let Formula::At { of, edge: Edge::End, phase: 1 } = &**left else { panic!("{left:?}") };
    assert!(matches!(&**of, Formula::Reading { reading }
        if reading.quantity == Quantity::Left && reading.part == Some(0)));
    assert!(format!("{right:?}").contains("Fact"), "a given stays a fact: {right:?}");
    assert_eq!((mission.figures[1].unit.as_str(), mission.demands[0].unit.as_str()), ("kg", "kg"));
    assert!(matches!(mission.demands[0].quantity, Formula::Figure { index: 1 }));
    assert!(matches!(mission.demands[1].requirement, Requirement::Within { .. }));
    assert_eq!(mission.demands[1].name, "altitude at end of Drift");
    assert_eq!(mission.headline, Some(Headline::Figure { index: 1 }));
}

#[test]
fn a_broken_figure_is_reported_once() {
    assert_eq!(
        on_moon("figure Odd = altitud at end of Up\n demand Odd >= 3 m\n headline Odd"),
        ["unknown-name"]
    );
}

#[test]
fn figures_name_those_above_them() {
    assert_eq!(on_moon("figure A = B * 2\n figure B = mass at end of Up"), ["unknown-name"]);
    assert_eq!(on_moon("figure A = A * 2"), ["unknown-name"]);
    assert_eq!(on_moon("figure mass = thrust at end of Up"), ["duplicate-name"]);
    assert_eq!(on_moon("demand B >= 1 kg\n figure B = mass at end of Up"), CLEAN);
}

#[test]
fn missions_are_defined_by_difference() {
    let mut compiled = hop(
        "Moon",
        PAD,
        "demand Top altitude at end of Drift >= 1 m\n}
        mission Higher like Hop {
            payload  200 kg
            given    slope  60 deg
            phase Up like Up { until height >= 90 m }
            demand   Top altitude at end of Drift >= 2 m",
    );
    assert_eq!(codes(&compiled), CLEAN);
    let model = compiled.model.take().unwrap();
    let [first, second] = model.missions.as_slice() else { panic!() };
    assert_eq!((first.payload.si, second.payload.si), (100.0, 200.0));
    assert_eq!(second.phases.len(), 2);
    assert_eq!(first.phases[0].burns, second.phases[0].burns);
    assert_ne!(first.phases[0].until, second.phases[0].until);
    assert_eq!(second.demands.len(), 1);
}

#[test]
fn every_number_has_an_address() {
    let compiled = hop("Moon", PAD, "demand Top altitude at end of Drift >= 1 m");
    let model = compiled.model.unwrap();
    let of_mission = &model.missions[0].facts;
    let find = |path: &str| {
        let fact = of_mission.iter().map(|fact| &model.facts[fact.0 as usize]).find(|fact| fact.path == path);
        fact.map(|fact| (fact.si, fact.origin))
    };
    assert_eq!(find("payload"), Some((100.0, Origin::Stated)));
    assert_eq!(find("start.altitude"), Some((0.0, Origin::Stated)));
    assert_eq!(find("slope").map(|(_, origin)| origin), Some(Origin::Given));
    assert_eq!(find("tower"), Some((40.0, Origin::Given)), "one of the file, used in a condition");
    assert_eq!(find("Up.steer.heading"), Some((0.0, Origin::Stated)));
    assert_eq!(find("Drift.until"), Some((5.0, Origin::Stated)));
    assert_eq!(find("Top.limit"), Some((1.0, Origin::Stated)));
    assert_eq!(find("Sedge.dry"), Some((1200.0, Origin::Stated)));
}

#[test]
fn knobs_free_what_is_stated_and_used() {
    assert_eq!(on_moon("knob payload between 50 kg and 200 kg\n most payload"), CLEAN);
    assert_eq!(on_moon("knob slope between 50 deg and 80 deg"), CLEAN);
    assert_eq!(on_moon("knob tower between 30 m and 80 m"), CLEAN);
    assert_eq!(on_moon("knob Drift.until between 3 s and 8 s"), CLEAN);
    assert_eq!(on_moon("knob idle between 0 s and 3 s"), ["unused-knob"]);
    assert_eq!(on_moon("knob Sedge.dri between 1 kg and 3 t"), ["unknown-name"]);
    assert_eq!(on_moon("knob Sedge.growth between 1 % and 3 %").len(), 1);
    assert_eq!(on_moon("knob payload between 150 kg and 200 kg"), ["knob-bounds"]);
    assert_eq!(on_moon("knob payload between 200 kg and 50 kg"), ["knob-bounds"]);
    assert_eq!(on_moon("knob payload between 50 m and 200 m"), ["dimension-mismatch"; 2]);
    assert_eq!(
        on_moon("knob payload between 0 kg and 1 t\n knob payload between 0 kg and 2 t"),
        ["repeated-fact"]
    );
    assert_eq!(on_moon("most payload"), ["objective-without-knob"]);
    assert_eq!(on_moon("headline Nothing"), ["unknown-name"]);
    assert_eq!(on_moon("demand A payload <= 1 t\n figure A = mass at end of Up"), ["duplicate-name"]);
}

#[test]
fn starts_are_possible() {
    let from = |world: &str, start: &str| codes(&hop(world, start, ""));
    assert_eq!(from("Moon", "pad latitude 91 deg longitude 0 deg altitude 0 m"), ["angle-out-of-range"]);
    assert_eq!(from("Moon", "pad latitude 10 deg"), ["missing-fact"; 2]);
    let orbit = |perigee: &str, apogee: &str, inclination: &str| {
        let rest = "node 0 deg argument 0 deg anomaly 0 deg";
        from("Moon", &format!("orbit perigee {perigee} apogee {apogee} inclination {inclination} {rest}"))
    };
    assert_eq!(orbit("50 km", "80 km", "90 deg"), CLEAN);
    assert_eq!(orbit("80 km", "50 km", "90 deg"), ["impossible-orbit"]);
    assert_eq!(orbit("-80 km", "50 km", "90 deg"), ["impossible-orbit"]);
    assert_eq!(orbit("50 km", "80 km", "190 deg"), ["impossible-orbit"]);
    let flat = hop("Slate", "pad altitude 3 m", "").model.unwrap();
    let Start::Pad { latitude, altitude, .. } = flat.missions[0].start else { panic!() };
    assert_eq!((latitude.si, altitude.si), (0.0, 3.0));
    assert_eq!(flat.facts[latitude.fact.0 as usize].origin, Origin::Default);
    assert_eq!(on_moon("epoch 2027-02-30T00:00:00Z"), ["impossible-epoch"]);
    assert_eq!(on_moon("epoch 2027-02-28T00:00:00Z"), CLEAN);
}

#[test]
fn directions_are_possible() {
    let steered = |law: &str| on_moon(&format!("phase Late {{ burn Sedge; steer {law}; until 1 s }}"));
    assert_eq!(steered("pitch 95 deg heading 0 deg"), ["angle-out-of-range"]);
    assert_eq!(steered("pitch 45 deg heading 400 deg"), ["angle-out-of-range"]);
    assert_eq!(steered("pitch from 45 deg by 5 deg over 0 s heading 4 deg"), ["impossible-value"]);
    assert_eq!(steered("tangent 2, -0.1 1/s heading 4 deg frozen"), CLEAN);
    assert_eq!(steered("tangent 2, -0.1 deg/s heading 4 deg frozen"), ["dimension-mismatch"]);
    assert_eq!(on_moon("demand inclination at end of Up <= 4 deg"), ["unreachable-inclination"]);
}
