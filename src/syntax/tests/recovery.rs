//! One mistake, one diagnostic; everything else of the file is still read.

use super::spans::check_spans;
use super::{codes, read};
use crate::syntax::{BlockKind, Item, Statement};

#[test]
fn eight_mistakes_give_eight_diagnostics_in_order() {
    let text = "\
bring Earth builtin
engine Ember {
    thrust  43.0 kN in vacum
    isp     304 s in vacuum
}
stage Bracken like {
    dry  1420 kg because \"mass statement
    propellant  .5 t
}
vehicle Rowan {
    stack  Bracken Sorrel
}
mission Lantern {
    phase Rise {
        until  height > 140 m
    }
    payload  132 kg
}
}
";
    let parsed = read(text);
    assert_eq!(parsed.diagnostics.len(), 8, "{:#?}", parsed.diagnostics);
    let places: Vec<&str> = parsed.diagnostics.iter().map(|found| &text[found.span().range()]).collect();
    let expected = ["builtin", "vacum", "{", "\"mass statement", ".5", "Sorrel", ">", "}"];
    assert_eq!(places, expected);
    let names: Vec<&str> = parsed
        .tree
        .items
        .iter()
        .filter_map(|item| match item {
            Item::Block(block) => Some(block.name.text.as_str()),
            _ => None,
        })
        .collect();
    assert_eq!(names, ["Ember", "Bracken", "Rowan", "Lantern"]);
    check_spans(text, &parsed);
}

#[test]
fn a_broken_head_keeps_its_block() {
    for (head, kind, name) in [
        ("stage S like {", BlockKind::Stage, "S"),
        ("stage S 3 {", BlockKind::Stage, "S"),
        ("stge Sage {", BlockKind::Stage, "Sage"),
        ("stage S", BlockKind::Stage, "S"),
        ("stage S\n\n{", BlockKind::Stage, "S"),
    ] {
        let text = format!("{head}\n    dry 3 kg\n}}\ngiven a 1\n");
        let parsed = read(&text);
        assert_eq!(codes(&parsed), ["unexpected-text"], "{text}");
        let [Item::Block(block), Item::Given(..)] = parsed.tree.items.as_slice() else { panic!("{text}") };
        assert_eq!((block.kind, block.name.text.as_str()), (kind, name));
        assert_eq!(&text[block.name.span.range()], name);
        let [broken, dry] = block.lines.as_slice() else { panic!("{text}") };
        assert!(
            matches!(broken.statement, Statement::Broken),
            "what is missing in the block is not told again"
        );
        assert!(matches!(dry.statement, Statement::Setting(_)));
        check_spans(&text, &parsed);
    }
}

#[test]
fn a_block_that_is_not_closed_ends_before_the_next() {
    let parsed = read("stage A {\n    dry 1 kg\n\nstage B {\n    dry 2 kg\n}\n");
    assert_eq!(codes(&parsed), ["unclosed-block"]);
    assert_eq!(parsed.tree.items.len(), 2);
    let parsed = read("mission M {\n    phase A {\n        coast\n    phase B {\n        coast\n    }\n}\n");
    assert_eq!(codes(&parsed), ["unclosed-block"]);
    let parsed = read("mission M {\n    phase A {\n        coast\n");
    assert_eq!(codes(&parsed), ["unclosed-block", "unclosed-block"]);
}

#[test]
fn a_block_that_took_the_brace_of_another_is_found_by_its_indentation() {
    let text = "mission M {\n    phase A {\n        coast\n\n    payload 3 kg\n}\nstage B {\n}\n";
    let parsed = read(text);
    assert_eq!(codes(&parsed), ["unclosed-block"]);
    assert_eq!(&text[parsed.diagnostics[0].span().range()], "phase A");
    assert_eq!(parsed.tree.items.len(), 2);
}

#[test]
fn a_block_closed_too_early_is_told_once() {
    let parsed =
        read("stage A {\n    dry 1 kg\n    }\n    propellant 2 kg\n    reserve 3 kg\n}\nstage B {\n}\n");
    assert_eq!(codes(&parsed), ["misplaced-fact"]);
    assert_eq!(codes(&read("stage A {\n}\n}\n")), ["stray-brace"]);
}

#[test]
fn facts_after_a_broken_one_are_read() {
    let parsed = read("stage A { dry ?; propellant 2 kg; ? }\ngiven b 1; ?; given c 2\n");
    assert_eq!(codes(&parsed), ["unexpected-text"; 3]);
    let [Item::Block(block), _, Item::Broken(_), Item::Given(..)] = parsed.tree.items.as_slice() else {
        panic!()
    };
    assert_eq!(block.lines.len(), 3);
}

#[test]
fn definitions_say_what_they_lack() {
    for (text, message) in [
        ("engine {\n}", "found `{`, expected a name"),
        ("engine Ember like {\n}", "found `{`, expected a name"),
        ("engine Ember was 3 {\n}", "found `3`, expected a name"),
        ("unit smoot 3 m", "found `3`, expected `=`"),
        ("bring from builtin", "found `builtin`, expected `,` or `from`"),
        ("bring Earth from", "found the end of the line, expected a quoted text or `builtin`"),
        ("given a", "found the end of the line, expected a value"),
        ("?", "found `?`, expected a definition"),
        ("thrust 3 kN", "this fact stands outside every block"),
        ("burn ?", "this fact stands outside every block"),
    ] {
        let parsed = read(text);
        let messages: Vec<&str> = parsed.diagnostics.iter().map(|found| found.message.as_str()).collect();
        assert_eq!(messages, [message], "{text}");
    }
}

#[test]
fn at_most_a_thousand_are_told() {
    assert_eq!(codes(&read(&"?\n".repeat(3000))).len(), 1000);
}

#[test]
fn one_wrong_character_never_gives_two_diagnostics() {
    let text = include_str!("lantern.wright");
    for (at, character) in text.char_indices().filter(|(_, character)| !matches!(character, '\n' | '}')) {
        let wrong = format!("{}?{}", &text[..at], &text[at + character.len_utf8()..]);
        let parsed = read(&wrong);
        assert!(parsed.diagnostics.len() <= 1, "at {at}: {:#?}", parsed.diagnostics);
    }
}
