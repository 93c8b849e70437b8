//! The pictures as an XML reader sees them.

use super::{HOSTILE, flown, hostile, model, too_heavy};
use crate::quantity::System;
use crate::report::{Picture, pictures};

fn drawn(model: &crate::model::Model) -> Vec<Picture> {
    let mission = &model.missions[0];
    pictures(mission, &flown(mission), System::Written)
}

#[test]
fn they_are_well_formed_small_and_told_in_words() {
    for picture in drawn(&model()).iter().chain(&drawn(&hostile())) {
        let tree = roxmltree::Document::parse(&picture.svg).unwrap();
        let root = tree.root_element();
        assert_eq!(root.attribute("role"), Some("img"));
        for name in ["title", "desc", "style"] {
            let space = ("http://www.w3.org/2000/svg", name);
            assert_eq!(root.children().filter(|node| node.has_tag_name(space)).count(), 1, "{name}");
        }
        assert!(picture.svg.len() < 20_000, "{} has {} bytes", picture.name, picture.svg.len());
        assert!(!picture.svg.contains("<script"));
        assert!(!picture.svg.contains("var("));
        for text in tree.descendants().filter_map(|node| node.attribute("font-size")) {
            assert!(text.parse::<f64>().unwrap() >= 11.0);
        }
    }
}

#[test]
fn names_are_text_and_every_mark_lies_on_the_page() {
    for picture in drawn(&hostile()) {
        let tree = roxmltree::Document::parse(&picture.svg).unwrap();
        let root = tree.root_element();
        let known = ["svg", "title", "desc", "style", "rect", "path", "circle", "text"];
        assert!(
            tree.descendants()
                .filter(|node| node.is_element())
                .all(|node| { known.contains(&node.tag_name().name()) })
        );
        let head = root.children().find(|node| node.tag_name().name() == "title").unwrap();
        assert!(head.text().unwrap().starts_with(&HOSTILE[..20]));
        let size = |name| root.attribute(name).unwrap().parse::<f64>().unwrap();
        let (width, height) = (size("width"), size("height"));
        for node in tree.descendants() {
            let number = |name| node.attribute(name).map_or(0.0, |text: &str| text.parse::<f64>().unwrap());
            assert!((0.0..=width).contains(&(number("x") + number("cx"))), "{node:?}");
            assert!((0.0..=height).contains(&(number("y") + number("cy"))), "{node:?}");
        }
    }
}

#[test]
fn the_same_flight_gives_the_same_pictures() {
    assert_eq!(drawn(&model()), drawn(&model()));
    let names: Vec<&str> = drawn(&model()).iter().map(|picture| picture.name).collect();
    assert_eq!(names, ["flight.svg", "ledger.svg", "ground.svg"]);
}

#[test]
fn nothing_flown_is_nothing_drawn_or_well_formed() {
    let (mission, flight) = too_heavy(&model());
    for picture in pictures(&mission, &flight, System::Written) {
        roxmltree::Document::parse(&picture.svg).unwrap();
    }
}
