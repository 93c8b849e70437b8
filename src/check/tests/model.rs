//! What becomes of engines, stages, vehicles and worlds.

use super::{Files, codes, compile_text};
use crate::check::files;
use crate::check::names::Meaning;
use crate::check::{BlockId, Context, ScopeId};
use crate::model::{Air, Drag, FactId, Gravity, Origin, Reserve, Role, Surface, Thrust};

pub(super) const ROWAN: &str = r#"
bring Earth from builtin

engine Ember {
    thrust     43.0 kN in vacuum            because "hot-fire series 3, mean of 11"
    isp        304 s in vacuum
    exit_area  0.047 m^2
    throttle   55 % .. 100 %
}

engine EmberV like Ember {
    thrust     27.0 kN in vacuum
    isp        334 s in vacuum
    exit_area  0.21 m^2
}

curve RowanDrag {
    kind    linear
    beyond  hold
    mach -> cd
    0.0   0.31
    0.8   0.34
    5.0   0.27
}

given margin 8 %

stage Bracken {
    engines     7 of Ember
    dry         1420 kg   growth margin     because "mass statement, rev C"
    propellant  16.9 t    unusable 0.7 %
    reserve     60 m/s
}

stage Sorrel {
    engines     1 of EmberV
    dry         0.2 * Bracken.dry
    propellant  3.1 t     unusable 9 kg
}

stage Alder { engines 1 of Ember; dry 20 kg; propellant 100 kg }

vehicle Rowan {
    stack           Bracken, Sorrel
    beside          Bracken  Alder1 2 of Alder
    shroud          Calyx 74 kg
    reference_area  1.13 m^2
    drag            RowanDrag
}
"#;

/// Runs `look` on the context of a source and on what a name in it means.
pub(super) fn with_block<T>(text: &str, name: &str, look: impl FnOnce(&mut Context<'_>, BlockId) -> T) -> T {
    let project = files::load("example.wright", &Files(&[("example.wright", text)]));
    assert!(project.diagnostics.is_empty(), "{:?}", project.diagnostics);
    let mut context = Context::new(&project.sources, &project.links, Default::default());
    context.collect_names(&project.trees);
    context.read_units();
    let Some(Meaning::Block(block)) = context.named(ScopeId(0), name).map(|named| named.meaning) else {
        panic!("{name} is no block");
    };
    look(&mut context, block)
}

#[test]
fn a_whole_vehicle_comes_out() {
    let compiled = compile_text(ROWAN);
    assert!(compiled.diagnostics.is_empty(), "{:?}", compiled.diagnostics);
    assert!(compiled.model.is_some());
}

#[test]
fn parts_stand_in_order_with_their_roles() {
    with_block(ROWAN, "Rowan", |context, block| {
        let vehicle = context.vehicle(block).unwrap();
        let names: Vec<_> =
            vehicle.parts.iter().map(|part| (part.name.as_str(), part.definition.as_str())).collect();
        assert_eq!(
            names,
            [("Bracken", "Bracken"), ("Sorrel", "Sorrel"), ("Alder1", "Alder"), ("Calyx", "Calyx")]
        );
        assert_eq!(vehicle.parts[0].role, Role::Stack { position: 0 });
        assert_eq!(vehicle.parts[2].role, Role::Beside { carrier: 0 });
        assert_eq!(vehicle.parts[2].count.si, 2.0);
        assert_eq!(vehicle.parts[3].role, Role::Shroud);
        assert!(matches!(vehicle.drag, Drag::Curve { .. }));
        let first = vehicle.parts[0].propulsion.as_ref().unwrap();
        assert!((first.unusable.si - 0.007 * 16_900.0).abs() < 1e-9);
        assert!(matches!(first.reserve, Some(Reserve::Speed { speed }) if speed.si == 60.0));
        assert!((vehicle.parts[1].dry.si - 284.0).abs() < 1e-9);
        assert_eq!(vehicle.parts[1].propulsion.as_ref().unwrap().unusable.si, 9.0);
    });
}

#[test]
fn facts_know_their_path_origin_and_reason() {
    with_block(ROWAN, "Rowan", |context, block| {
        context.vehicle(block).unwrap();
        let ids = context.facts_of(block);
        let fact = |path: &str| {
            let found: Vec<_> =
                ids.iter().map(|id| &context.facts[id.0 as usize]).filter(|fact| fact.path == path).collect();
            assert_eq!(found.len(), 1, "{path}");
            found[0].clone()
        };
        let thrust = fact("Ember.thrust");
        assert_eq!((thrust.si, thrust.unit.as_str(), thrust.written.as_str()), (43_000.0, "kN", "43.0 kN"));
        assert_eq!(thrust.because.as_deref(), Some("hot-fire series 3, mean of 11"));
        assert_eq!((thrust.origin, thrust.place.line), (Origin::Stated, 5));
        // Inherited: an address of its own, at the place where it is stated.
        assert_eq!(fact("EmberV.throttle.least").place.line, 8);
        assert_eq!(fact("Bracken.growth").unit, "%");
        assert_eq!(fact("margin").origin, Origin::Given);
        assert_eq!(fact("Sorrel.growth").origin, Origin::Default);
        assert_eq!(fact("Sorrel.dry").unit, "kg");
        let places: Vec<_> = ids.iter().map(|id| context.facts[id.0 as usize].place.start).collect();
        assert!(places.is_sorted());
    });
}

#[test]
fn the_built_in_earth_is_that_of_wgs_84() {
    with_block("bring Earth from builtin\n", "Earth", |context, block| {
        let earth = context.world(block).unwrap();
        assert!(matches!(earth.gravity, Gravity::Central { mu, j2: Some(_) } if mu.si == 3.986_004_418e14));
        let Surface::Ellipsoid { equatorial_radius, flattening } = earth.surface else { panic!() };
        assert_eq!((equatorial_radius.si, flattening.si), (6_378_137.0, 1.0 / 298.257_223_563));
        assert_eq!((earth.spin.si, earth.air), (7.292_115e-5, Air::Standard1976));
    });
}

#[test]
fn the_exit_area_follows_from_two_thrusts() {
    let text =
        "engine Ember {\n thrust 43.0 kN in vacuum\n thrust 38.0 kN at sea_level\n isp 304 s in vacuum\n}\n";
    with_block(text, "Ember", |context, block| {
        let engine = context.engine(block).unwrap();
        assert!((engine.exit_area.si - 5_000.0 / 101_325.0).abs() < 1e-12);
        assert_eq!(context.facts[engine.exit_area.fact.0 as usize].origin, Origin::Derived);
        assert!(matches!(engine.thrust, Thrust::Steady { vacuum } if vacuum.si == 43_000.0));
    });
}

#[test]
fn a_mission_scope_sees_its_givens_before_those_of_the_file() {
    let text = "given lean 1 deg\nmission A { given lean 2 deg; given twice 2 * lean }\nmission B like A { given lean 3 deg }\n";
    for (mission, lean) in [("A", 2.0_f64), ("B", 3.0)] {
        with_block(text, mission, |context, block| {
            context.enter(block);
            context.leave();
            let facts = context.facts_of(block);
            let twice = facts
                .iter()
                .map(|id| &context.facts[id.0 as usize])
                .find(|fact| fact.path == "twice")
                .unwrap();
            assert!((twice.si - 2.0 * lean.to_radians()).abs() < 1e-15);
            assert_eq!(facts.len(), 2);
        });
    }
}

#[test]
fn a_vehicle_that_only_knows_vacuum_does_not_fly_in_air() {
    let text = "bring Earth, Moon from builtin\nengine E { thrust 1 kN in vacuum; isp 300 s in vacuum }\n\
        stage S { engines 1 of E; dry 1 kg; propellant 9 kg }\nvehicle V { stack S }\n";
    with_block(text, "V", |context, vehicle| {
        context.vehicle(vehicle).unwrap();
        let world = |context: &Context<'_>, name: &str| match context.named(ScopeId(0), name).unwrap().meaning
        {
            Meaning::Block(block) => block,
            _ => panic!(),
        };
        let (earth, moon) = (world(context, "Earth"), world(context, "Moon"));
        let place = context.definition(vehicle).block.name.span;
        context.check_in_air(vehicle, moon, place);
        assert!(context.diagnostics.is_empty());
        context.check_in_air(vehicle, earth, place);
        assert_eq!(context.diagnostics.len(), 2, "{:?}", context.diagnostics);
    });
}

#[test]
fn errors_of_all_blocks_are_told_at_once_and_none_twice() {
    let text = "engine E { thrust 1 kN in vacuum; isp 300 in vacuum; exit_area 1 kg }\n\
        stage S { engines 1.5 of E; dry -1 kg; propellant 9 kN }\nstage T { engines 1 of Q; dry 1 kg }\n";
    let compiled = compile_text(text);
    assert_eq!(
        codes(&compiled),
        [
            "missing-unit",
            "dimension-mismatch",
            "impossible-value",
            "impossible-value",
            "dimension-mismatch",
            "missing-fact",
            "unknown-name"
        ]
    );
    assert!(compiled.model.is_none());
}

#[test]
fn a_changed_fact_changes_what_is_worked_out_from_it() {
    let compiled = compile_text(ROWAN);
    let model = compiled.model.as_ref().unwrap();
    let id = |path: &str| FactId(model.facts.iter().position(|fact| fact.path == path).unwrap() as u32);
    let changes = [(id("Bracken.dry"), 1500.0), (id("margin"), 0.1)].into();
    let changed = compiled.with(&changes).unwrap();
    let si = |path: &str| changed.facts[id(path).0 as usize].si;
    assert_eq!((si("Bracken.dry"), si("Bracken.growth")), (1500.0, 0.1));
    assert!((si("Sorrel.dry") - 300.0).abs() < 1e-9);
    assert_eq!(changed.facts.len(), model.facts.len());
    assert_eq!(&compiled.with(&Default::default()).unwrap(), model);
    assert!(compiled.with(&[(id("Bracken.dry"), -1.0)].into()).is_err());
}
