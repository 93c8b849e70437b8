//! Names: across files, twice, unknown, in circles.

use super::{Files, codes, compile_text};
use crate::check::compile;

const EMBER: &str = "engine Ember { thrust 43 kN in vacuum; isp 304 s in vacuum }\n";
const STAGE: &str = "stage S { engines 1 of Ember; dry 1 kg; propellant 9 kg }\n";

fn codes_of(files: &[(&str, &str)]) -> Vec<&'static str> {
    codes(&compile("a/main.wright", &Files(files)))
}

#[test]
fn definitions_are_brought_from_other_files() {
    let main = format!("bring Ember, heavy from \"../parts/ember.wright\"\ngiven x 2 * heavy\n{STAGE}");
    let parts = format!("bring Earth from builtin\ngiven heavy 3 kg\n{EMBER}");
    assert!(codes_of(&[("a/main.wright", &main), ("parts/ember.wright", &parts)]).is_empty());
}

#[test]
fn what_cannot_be_brought_is_reported_once() {
    let main = format!("bring Ember from \"absent.wright\"\n{STAGE}");
    assert_eq!(codes_of(&[("a/main.wright", &main)]), ["file-not-read"]);
    let main = format!("bring Ember from \"../../absent.wright\"\n{STAGE}");
    assert_eq!(codes_of(&[("a/main.wright", &main)]), ["outside-project"]);
    let main = format!("bring Ember from \"b.wright\"\n{STAGE}");
    assert_eq!(codes_of(&[("a/main.wright", &main), ("a/b.wright", "given q 1")]), ["not-in-file"]);
    let brings = "bring Ember from \"c.wright\"\n";
    assert_eq!(
        codes_of(&[("a/main.wright", &main), ("a/b.wright", brings), ("a/c.wright", EMBER)]),
        ["not-in-file"]
    );
    assert_eq!(codes_of(&[]), ["file-not-read"]);
}

#[test]
fn circles_of_files_are_reported() {
    let main = format!("bring Ember from \"b.wright\"\ngiven x 1 kg\n{STAGE}");
    let other = format!("bring x from \"main.wright\"\n{EMBER}");
    assert_eq!(codes_of(&[("a/main.wright", &main), ("a/b.wright", &other)]), ["circular-bring"]);
}

#[test]
fn a_broken_definition_is_not_unknown_where_it_is_used() {
    let text = format!("engine Ember like {{\n thrust 43 kN in vacuum\n isp 304 s in vacuum\n}}\n{STAGE}");
    let found = codes(&compile_text(&text));
    assert!(!found.is_empty() && !found.contains(&"unknown-name"), "{found:?}");
}

#[test]
fn names_are_reported_with_the_nearest_and_with_both_places() {
    let compiled = compile_text(&format!("{EMBER}{}", STAGE.replace("Ember", "Embre")));
    assert_eq!(codes(&compiled), ["unknown-name"]);
    assert_eq!(compiled.diagnostics[0].help.as_deref(), Some("did you mean `Ember`?"));
    let compiled = compile_text(&format!("{EMBER}{STAGE}{STAGE}"));
    assert_eq!(codes(&compiled), ["duplicate-name"]);
    assert_eq!(compiled.diagnostics[0].labels.len(), 2);
}

#[test]
fn circles_of_values_are_reported() {
    for text in [
        "given a a + 1 m\n",
        "given a 2 * b\ngiven b 2 * a\n",
        "stage S { dry 2 * S.dry }\n",
        "stage S { dry 2 * T.dry }\nstage T { dry 2 * S.dry }\n",
        // A default is known only once the block has been read.
        "stage S { dry 1 kg + T.dry }\nstage T { dry 1 kg * (1 + S.growth) }\n",
        "engine A like A { thrust 1 kN in vacuum; isp 300 s in vacuum }\n",
    ] {
        let found = codes(&compile_text(text));
        assert!(found.contains(&"circular-definition"), "{text}: {found:?}");
    }
}

#[test]
fn blocks_may_use_each_others_facts_in_any_order() {
    for text in [
        "stage S { engines 1 of E; dry 1 kg; propellant 9 * S.dry }\n\
         engine E { thrust 1 kN / kilo * S.dry in vacuum; isp 300 s in vacuum }\ngiven kilo 1 kg\n",
        "stage S { dry 1 kg + T.dry }\nstage T { dry 1 kg * (1 + U.growth) }\nstage U { dry 1 kg }\n",
    ] {
        let compiled = compile_text(text);
        assert!(compiled.diagnostics.is_empty(), "{text}: {:?}", compiled.diagnostics);
    }
}

#[test]
fn what_may_stand_in_an_unreadable_line_is_not_missing() {
    for (text, expected) in [
        ("stage S { drey 1 kg }\n", vec!["unknown-fact"]),
        ("engine A like B { thrust 1 kN in vacuum }\n", vec!["unknown-name"]),
    ] {
        assert_eq!(codes(&compile_text(text)), expected, "{text}");
    }
    let found = codes(&compile_text("engine Ember {\n thrust 43 kN in a vacuum\n isp 304 s in vacuum\n}\n"));
    assert!(!found.contains(&"missing-fact"), "{found:?}");
}
