//! What the tree holds of each fact.

use super::{codes, read};
use crate::syntax::{
    Ambient, Comparison, Condition, ConditionKind, ExprKind, Item, Operand, PitchLaw, Requirement,
};
use crate::syntax::{StartKind, Statement, Steer};

/// The one statement of a block.
fn statement(fact: &str) -> Statement {
    let parsed = read(&format!("mission M {{ {fact} }}"));
    assert_eq!(codes(&parsed), [""; 0], "{fact}");
    match parsed.tree.items.into_iter().next() {
        Some(Item::Block(mut block)) => block.lines.remove(0).statement,
        other => panic!("{fact}: {other:?}"),
    }
}

/// A setting that is expected: the fact, its word, value, end of a range, surroundings, and the names
/// of its further values.
type Expected<'t> = (&'t str, Option<&'t str>, Option<&'t str>, bool, Option<Ambient>, &'t [&'t str]);

/// A setting in short: key, word, value, end of the range, surroundings, names of the further values.
fn setting(fact: &str) -> (String, Option<String>, Option<String>, bool, Option<Ambient>, Vec<String>) {
    let Statement::Setting(setting) = statement(fact) else { panic!("{fact}") };
    let value = setting.value.map(|value| match value {
        Operand::Instant(_) => "instant".to_owned(),
        Operand::Expr(expr) => match expr.kind {
            ExprKind::Number(literal) => literal.value.to_string(),
            ExprKind::Path(path) => {
                path.parts.into_iter().map(|part| part.text).collect::<Vec<_>>().join(".")
            }
            _ => "formula".to_owned(),
        },
    });
    let arguments = setting.arguments.into_iter().map(|argument| argument.name.text).collect();
    let ambient = setting.ambient.map(|(ambient, _)| ambient);
    (setting.key.text, setting.word.map(|word| word.text), value, setting.upto.is_some(), ambient, arguments)
}

#[test]
fn settings_have_their_parts() {
    let cases: &[Expected] = &[
        ("thrust 43 kN in vacuum", None, Some("43"), false, Some(Ambient::Vacuum), &[]),
        ("isp curve1 at sea_level", None, Some("curve1"), false, Some(Ambient::SeaLevel), &[]),
        ("throttle 55 % .. 100 %", None, Some("55"), true, None, &[]),
        ("throttle low .. high", None, Some("low"), true, None, &[]),
        ("dry 3 kg growth 8 % spare 2 %", None, Some("3"), false, None, &["growth", "spare"]),
        ("gravity central 3.5 j2 1e-3", Some("central"), Some("3.5"), false, None, &["j2"]),
        ("gravity central mu", Some("central"), Some("mu"), false, None, &[]),
        ("gravity central mu because \"x\"", Some("central"), Some("mu"), false, None, &[]),
        ("gravity central (a + b)", Some("central"), Some("formula"), false, None, &[]),
        ("gravity uniform sqrt(a)", Some("uniform"), Some("formula"), false, None, &[]),
        ("offset north -3 m", Some("north"), Some("3"), false, None, &[]),
        ("air none", None, Some("none"), false, None, &[]),
        ("air exponential density 1 kg/m^3", None, Some("exponential"), false, None, &["density"]),
        ("flattening 1 / 298.25", None, Some("formula"), false, None, &[]),
        ("epoch 2027-05-14T09:30:00Z", None, Some("instant"), false, None, &[]),
        ("epoch 2027-05-14T09:30:00.5+02:00", None, Some("instant"), false, None, &[]),
        ("flat", None, None, false, None, &[]),
    ];
    for (fact, word, value, upto, ambient, arguments) in cases {
        let found = setting(fact);
        let value = value.map(|value| if *word == Some("north") { "formula" } else { value });
        assert_eq!(found.0, fact.split(' ').next().unwrap());
        assert_eq!((found.1.as_deref(), found.2.as_deref()), (*word, value), "{fact}");
        assert_eq!((found.3, found.4), (*upto, *ambient), "{fact}");
        assert_eq!(found.5, *arguments, "{fact}");
    }
}

#[test]
fn a_first_word_before_a_value_names_a_demand() {
    for (fact, expected) in [
        ("demand MaxQ peak q <= 32 kPa", Some("MaxQ")),
        ("demand peak q <= 32 kPa", None),
        ("demand Spare >= 0 kg", None),
        ("demand A.left at end of C >= 0 kg", None),
        ("demand Reserve A.left at end of C >= 0 kg", Some("Reserve")),
        ("demand q at end of C between 1 and 2", None),
        ("demand q between 1 and 2", None),
        ("demand Q (a + b) between 1 and 2", Some("Q")),
        ("demand sqrt(a) between 1 and 2", None),
        ("demand Q -a between 1 and 2", Some("Q")),
        ("demand a - b between 1 and 2", None),
    ] {
        let Statement::Demand { name, .. } = statement(fact) else { panic!("{fact}") };
        assert_eq!(name.as_ref().map(|name| name.text.as_str()), expected, "{fact}");
    }
}

#[test]
fn requirements_are_told_apart() {
    let requirement = |text: &str| match statement(&format!("demand a {text}")) {
        Statement::Demand { requirement, .. } => requirement,
        other => panic!("{other:?}"),
    };
    assert!(matches!(requirement(">= 1"), Requirement::AtLeast(_)));
    assert!(matches!(requirement("<= 1"), Requirement::AtMost(_)));
    assert!(matches!(requirement("between 1 and 2"), Requirement::Between(..)));
    assert!(matches!(requirement("= 1 within 2"), Requirement::Within { .. }));
}

#[test]
fn laws_of_attitude_are_told_apart() {
    let law = |text: &str| match statement(&format!("steer {text}")) {
        Statement::Steer(steer) => steer,
        other => panic!("{other:?}"),
    };
    assert!(matches!(law("upright"), Steer::Upright));
    assert!(matches!(law("keep"), Steer::Keep));
    assert!(matches!(law("into airflow"), Steer::IntoAirflow));
    assert!(matches!(law("from airflow"), Steer::FromAirflow));
    assert!(matches!(law("along motion"), Steer::Motion { against: false, over_ground: false }));
    assert!(matches!(law("against motion over ground"), Steer::Motion { against: true, over_ground: true }));
    assert!(matches!(law("pitch a heading b"), Steer::Pitch { law: PitchLaw::Fixed(_), frozen: false, .. }));
    assert!(matches!(law("pitch from a at b heading c"), Steer::Pitch { law: PitchLaw::Rate { .. }, .. }));
    assert!(matches!(
        law("pitch from a by b over c heading d"),
        Steer::Pitch { law: PitchLaw::Over { .. }, .. }
    ));
    let tangent = law("tangent a, b heading c frozen");
    assert!(matches!(tangent, Steer::Pitch { law: PitchLaw::Tangent { .. }, frozen: true, .. }));
}

#[test]
fn conditions_are_told_apart() {
    let Statement::Until(conditions) = statement(
        "until 6 s or a >= 1 or a <= 1 or a rises to 1 or a falls to 1 or A spent or apex or touchdown",
    ) else {
        panic!()
    };
    let compares = |condition: &Condition, expected: Comparison| match &condition.kind {
        ConditionKind::Compare { comparison, .. } => *comparison == expected,
        _ => false,
    };
    assert!(matches!(conditions[0].kind, ConditionKind::After(_)));
    assert!(compares(&conditions[1], Comparison::AtLeast));
    assert!(compares(&conditions[2], Comparison::AtMost));
    assert!(compares(&conditions[3], Comparison::RisesTo));
    assert!(compares(&conditions[4], Comparison::FallsTo));
    assert!(matches!(&conditions[5].kind, ConditionKind::Spent(name) if name.text == "A"));
    assert!(matches!(conditions[6].kind, ConditionKind::Apex));
    assert!(matches!(conditions[7].kind, ConditionKind::Touchdown));
    assert_eq!(conditions.len(), 8);
}

#[test]
fn engines_at_work_are_told() {
    let Statement::Burn(burns) =
        statement("burn A with 6 of 7 engines, B hot, C with n of n + 1 engines hot")
    else {
        panic!()
    };
    let shape: Vec<(&str, bool, bool)> =
        burns.iter().map(|burn| (burn.part.text.as_str(), burn.engines.is_some(), burn.hot)).collect();
    assert_eq!(shape, [("A", true, false), ("B", false, true), ("C", true, true)]);
    assert!(matches!(statement("light A at 18 s hot"), Statement::Light { hot: true, .. }));
    assert!(matches!(statement("light A at 18 s"), Statement::Light { hot: false, .. }));
    assert!(matches!(statement("start state x 1 m"), Statement::Start { kind: StartKind::State, .. }));
    assert!(matches!(statement("most a"), Statement::Objective { most: true, .. }));
    assert!(matches!(statement("least a"), Statement::Objective { most: false, .. }));
}

#[test]
fn curves_have_columns_and_rows() {
    let Statement::Header { inputs, output } = statement("mach, altitude [km] -> thrust [kN*s]") else {
        panic!()
    };
    let units: Vec<Option<&str>> = inputs
        .iter()
        .chain([&output])
        .map(|column| column.unit.as_ref().map(|unit| unit.text.as_str()))
        .collect();
    assert_eq!(units, [None, Some("km"), Some("kN*s")]);
    let Statement::Row(row) = statement("-1.5,2   +3e-2 , 0") else { panic!() };
    assert_eq!(row.iter().map(|literal| literal.value).collect::<Vec<_>>(), [-1.5, 2.0, 0.03, 0.0]);
}
