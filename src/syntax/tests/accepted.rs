//! Examples of every statement that the grammar takes.

use super::{codes, read};
use crate::syntax::{Item, Statement};

/// The facts of a block, one by one, in every form that the reference shows.
const FACTS: &[&str] = &[
    "given lean 0.36 deg",
    "given coast 3 s because \"any word can be a name\"",
    "given total (a +\n    b) * 2",
    "given total a +\n    b",
    "given total max(a,\n    b)",
    "given sum -a ^ 2 - -b * 3 kg / (c + 1)",
    "engines 7 of Ember",
    "engines count * 2 of Ember",
    "stack Bracken, Sorrel",
    "stack Bracken, # first\n    Sorrel",
    "beside Bracken  Alder1 2 of Alder",
    "shroud Calyx 74 kg",
    "start pad latitude 58.2 deg longitude -11.6 deg altitude 45 m",
    "start orbit perigee 180 km apogee 240 km inclination 51 deg node 10 deg argument 0 deg anomaly 0 deg",
    "start state x 1 km y 2 km z 3 km vx 0 m/s vy 7 km/s vz 0 m/s",
    "burn Bracken",
    "burn Bracken with 6 of 7 engines, Alder1",
    "burn Sorrel hot",
    "light Alder2 at 18 s",
    "light Alder2 at delay hot",
    "coast",
    "steer upright",
    "steer into airflow",
    "steer from airflow",
    "steer along motion",
    "steer along motion over ground",
    "steer against motion over ground",
    "steer keep",
    "steer pitch 40 deg heading 90 deg",
    "steer pitch lean heading track frozen",
    "steer pitch from first at rate heading track frozen",
    "steer pitch from 90 deg by -lean over 6 s heading track",
    "steer tangent 0.3, -0.002 1/s heading track frozen",
    "hold acceleration <= 5.5 g0 by throttle",
    "until 6 s",
    "until height >= 140 m",
    "until height falls to 3 km or speed rises to 2 km/s or Bracken spent or apex or\n    touchdown",
    "until semi_major_axis >= 6878.137 km or Sorrel spent",
    "shed Bracken",
    "shed Calyx when heating <= 1135 W/m^2",
    "shed Alder1 when Alder1 spent",
    "knob Sorrel.propellant between 2 t and 4 t",
    "aim radius at end of Climb = 6878.137 km within 1 km",
    "most payload",
    "least Spare",
    "demand MaxQ peak dynamic_pressure <= 32 kPa because \"SYS-114\"",
    "demand Spare >= 0 kg",
    "demand Sorrel.left at end of Climb >= 38 kg",
    "demand Q -x between 1 m and 2 m",
    "demand apex_height at end of Climb = 97.4 deg within 0.01 deg",
    "demand G peak acceleration in Climb <= 6 g0",
    "figure Spare = Sorrel.left at end of Climb - 3 kg",
    "headline payload",
    "headline Sorrel.left",
    "mach -> cd",
    "time [s] -> thrust [kN]",
    "mach, altitude [km] -> cd",
    "0.0   0.31",
    "-1, 2.5e3, +3",
    "from \"tail.csv\"",
    "thrust 43.0 kN in vacuum because \"hot-fire \\\"3\\\"\"",
    "isp 304 s at sea_level",
    "throttle 55 % .. 100 %",
    "throttle 55%..100%",
    "dry 1420 kg growth 8 %",
    "propellant 16.9 t unusable 0.7 %",
    "gravity central 3.986e14 m^3/s^2 j2 1.08e-3 flattening 1 / 298.257223563 radius 6378 km",
    "gravity central mu",
    "gravity central mu * 2",
    "air none",
    "air exponential density 1.2 kg/m^3 scale_height 8 km pressure 101325 Pa sound_speed 340 m/s",
    "drag RowanDrag",
    "epoch 2027-05-14T09:30:00Z",
    "kind linear",
    "beyond hold",
    "flies Rowan",
    "within Earth",
    "reserve 60 m/s",
    "payload 132 kg; epoch 2027-05-14",
    "phase Gap { coast; until 4 s }",
    "phase coast like Gap was Rest { coast }",
];

#[test]
fn every_form_of_a_fact_is_accepted() {
    for fact in FACTS {
        for text in [format!("mission M {{\n    {fact}\n}}\n"), format!("mission M {{ {fact} }}")] {
            let parsed = read(&text);
            assert_eq!(codes(&parsed), [""; 0], "{text}\n{:#?}", parsed.diagnostics);
            let [Item::Block(block)] = parsed.tree.items.as_slice() else { panic!("{text}") };
            assert!(block.lines.iter().all(|line| !matches!(line.statement, Statement::Broken)), "{text}");
        }
    }
}

#[test]
fn every_definition_is_accepted() {
    let text = "bring Earth, Moon from builtin\nbring Ember from \"engines/ember.wright\"\n\
        unit smoot = 1.7018 m because \"a bridge\"\ngiven lean 0.36 deg; given rate 2\n\
        engine EmberV like Ember was EmberX {\n}\nworld W {}\n\ncurve C {} \nstage S {}\nvehicle V {}\nmission M {}\n";
    let parsed = read(text);
    assert_eq!(codes(&parsed), [""; 0], "{:#?}", parsed.diagnostics);
    assert_eq!(parsed.tree.items.len(), 11);
}
