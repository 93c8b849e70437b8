//! The full example mission parses without a diagnostic, part by part as it should.

use super::{codes, read};
use crate::syntax::{BlockKind, Item, Statement};

const LANTERN: &str = include_str!("lantern.wright");

#[test]
fn the_example_has_no_diagnostics() {
    let parsed = read(LANTERN);
    assert_eq!(codes(&parsed), [""; 0], "{:#?}", parsed.diagnostics);
    assert_eq!(parsed.tree.items.len(), 8);
    assert_eq!(parsed.tree.comments.len(), 1);
}

#[test]
fn the_mission_of_the_example_has_its_facts() {
    let parsed = read(LANTERN);
    let Some(Item::Block(mission)) = parsed.tree.items.last() else { panic!("no block") };
    assert_eq!((mission.kind, mission.name.text.as_str()), (BlockKind::Mission, "Lantern"));
    let phases = mission.lines.iter().filter(|line| matches!(line.statement, Statement::Block(_))).count();
    assert_eq!(phases, 5);
    assert_eq!(mission.lines.len(), 26);
}
