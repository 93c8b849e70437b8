//! A sound source with one fault anywhere: never a panic, never silence.

use super::compile_text;
use super::model::ROWAN;
use crate::check::files;
use crate::check::names::Meaning;
use crate::check::{Context, ScopeId};

/// Without an error every block of a source has come out.
fn check(text: &str) {
    let compiled = compile_text(text);
    assert_eq!(
        compiled.model.is_none(),
        compiled.diagnostics.iter().any(|one| one.severity() == crate::diagnostics::Severity::Error)
    );
    for label in compiled.diagnostics.iter().flat_map(|one| &one.labels) {
        assert!(compiled.sources.file(label.span.file).text().get(label.span.range()).is_some(), "{text}");
    }
    if compiled.model.is_none() {
        return;
    }
    let project = files::load("example.wright", &super::Files(&[("example.wright", text)]));
    let mut context = Context::new(&project.sources, &project.links, Default::default());
    context.collect_names(&project.trees);
    context.read_units();
    for name in ["Ember", "EmberV", "RowanDrag", "Bracken", "Sorrel", "Alder", "Rowan", "Earth"] {
        if let Some(Meaning::Block(block)) = context.named(ScopeId(0), name).map(|named| named.meaning) {
            assert!(context.check_block(block), "{name} is lost in silence:\n{text}");
        }
    }
}

#[test]
fn a_character_that_is_wrong() {
    for (at, old) in ROWAN.char_indices() {
        let after = at + old.len_utf8();
        let replacement = ["", "x", "0", " ", "{", "\n", "-", "."][at % 8];
        check(&format!("{}{replacement}{}", &ROWAN[..at], &ROWAN[after..]));
    }
}

#[test]
fn a_line_or_a_word_that_is_missing_or_repeated() {
    let lines: Vec<_> = ROWAN.lines().collect();
    for (at, line) in lines.iter().enumerate() {
        let (before, after) = (lines[..at].join("\n"), lines[at + 1..].join("\n"));
        check(&format!("{before}\n{after}"));
        check(&format!("{before}\n{line}\n{line}\n{after}"));
        let words: Vec<_> = line.split(' ').collect();
        for word in 0..words.len() {
            let rest = [&words[..word], &words[word + 1..]].concat().join(" ");
            check(&format!("{before}\n{rest}\n{after}"));
            let swapped: Vec<_> =
                words.iter().enumerate().map(|(n, one)| if n == word { "Sorrel" } else { one }).collect();
            check(&format!("{before}\n{}\n{after}", swapped.join(" ")));
        }
    }
}
