//! The Markdown page as a reader of CommonMark with tables sees it, and the JSON beside it.

use pulldown_cmark::{Event, Options, Parser, Tag, TagEnd};

use super::{HOSTILE, flown, hostile, model, report, too_heavy};
use crate::quantity::System;
use crate::report::markdown::markdown;
use crate::report::{Status, json, schema, summary};

const NAMES: &[&str] = &["flight.svg", "ledger.svg", "ground.svg"];

fn events(page: &str) -> Vec<Event<'_>> {
    let options = Options::ENABLE_TABLES | Options::ENABLE_STRIKETHROUGH;
    Parser::new_ext(page, options).collect()
}

fn headings(page: &str) -> Vec<String> {
    let mut found = Vec::new();
    let mut inside = false;
    for event in events(page) {
        match event {
            Event::Start(Tag::Heading { .. }) => {
                inside = true;
                found.push(String::new());
            }
            Event::End(TagEnd::Heading(_)) => inside = false,
            Event::Text(text) if inside => found.last_mut().unwrap().push_str(&text),
            _ => {}
        }
    }
    found
}

/// Every line of a table has as many cells as its head: a reader of Markdown drops those too many
/// without a word, so they are counted in the text as well.
fn count_cells(page: &str) {
    let mut width = 0;
    let mut last = "";
    for line in page.lines() {
        if line.starts_with('|') {
            let cells = line.replace("\\\\", "").replace("\\|", "").matches('|').count() - 1;
            if !last.starts_with('|') {
                width = cells;
            }
            assert_eq!(cells, width, "{line}");
        }
        last = line;
    }
}

#[test]
fn the_sections_stand_in_their_order() {
    let model = model();
    let mission = &model.missions[0];
    let page = markdown(&report(mission, &model.facts, &flown(mission)), System::Written, NAMES);
    let heads = headings(&page);
    let second: Vec<&str> = heads
        .iter()
        .map(String::as_str)
        .filter(|head| !head.starts_with("Facts") && !head.starts_with("Defaults"))
        .collect();
    assert_eq!(
        second,
        [
            "Lantern",
            "Verdict: met",
            "Figures",
            "Mass statement",
            "Stages",
            "Delta-v ledger, body-fixed frame",
            "Timeline",
            "Peaks",
            "Final orbit",
            "Propellant budget",
            "Assumptions",
            "Conventions in force",
            "Warnings",
            "Caution",
        ]
    );
    count_cells(&page);
}

#[test]
fn hostile_text_stays_text() {
    let (plain, hostile) = (model(), hostile());
    let page_of = |model: &crate::model::Model| {
        let mission = &model.missions[0];
        let mut report = report(mission, &model.facts, &flown(mission));
        report.warnings = vec![mission.name.clone()];
        markdown(&report, System::Written, NAMES)
    };
    let page = page_of(&hostile);
    count_cells(&page);
    // Emphasis and images are the report's own, as many as with harmless names.
    let count = |page: &str| {
        let mut counts = [0; 7];
        for event in events(page) {
            let kind = match event {
                Event::Html(_) | Event::InlineHtml(_) => panic!("HTML: {event:?}"),
                Event::Start(Tag::Link { .. } | Tag::Strikethrough) => panic!("{event:?}"),
                Event::Start(Tag::Image { .. }) => 0,
                Event::Start(Tag::Strong) => 1,
                Event::Start(Tag::Emphasis) => 2,
                Event::Start(Tag::Heading { .. }) => 3,
                Event::Start(Tag::Item) => 4,
                Event::Start(Tag::TableCell) => 5,
                Event::Start(Tag::List(_)) => 6,
                _ => continue,
            };
            counts[kind] += 1;
        }
        counts
    };
    let (own, other) = (count(&page_of(&plain)), count(&page));
    // Every hostile fact has a reason, so that the table of facts without one is not there: one head
    // fewer, and other counts of cells. The rest is the same.
    assert_eq!(own[..3], other[..3]);
    assert_eq!(own[3], other[3] + 1);
    assert_eq!((own[4], own[6]), (other[4], other[6]));
    // What a reader sees is what was written, but for marks, line ends and direction.
    let seen: String = events(&page)
        .into_iter()
        .filter_map(|event| if let Event::Text(text) = event { Some(text.to_string()) } else { None })
        .collect();
    let expected = HOSTILE.replace(['\u{202e}', '\u{7}'], "\u{fffd}").replace('\n', " ");
    assert!(seen.contains(&expected), "{expected}");
    assert!(!page.contains(['\u{202e}', '\u{7}']));
}

#[test]
fn the_terminal_gets_no_control_characters() {
    let model = hostile();
    let mission = &model.missions[0];
    let text = summary(&report(mission, &model.facts, &flown(mission)));
    assert!(text.contains("<script>"));
    assert!(!text.contains(['\u{202e}', '\u{7}', '\r', '\t']));
}

#[test]
fn a_failed_flight_says_where_and_why_and_keeps_its_tables() {
    let model = model();
    let (mission, flight) = too_heavy(&model);
    let report = report(&mission, &model.facts, &flight);
    assert_eq!(report.verdict(), Status::Failed);
    assert!(report.verdict.sentence.contains("no lift-off"), "{}", report.verdict.sentence);
    let page = markdown(&report, System::Written, &[]);
    assert!(page.contains("## Verdict: failed"));
    assert!(page.contains("## Delta-v ledger"));
    count_cells(&page);
}

#[test]
fn the_json_is_as_its_schema_says() {
    let schema = serde_json::from_str(&schema()).unwrap();
    let validator = jsonschema::validator_for(&schema).unwrap();
    let model = model();
    let mission = &model.missions[0];
    let (heavy, failed) = too_heavy(&model);
    for (mission, flight) in [(mission, &flown(mission)), (&heavy, &failed)] {
        let text = json(&report(mission, &model.facts, flight));
        assert!(text.ends_with("}\n"));
        let found = serde_json::from_str(&text).unwrap();
        let faults: Vec<String> = validator.iter_errors(&found).map(|fault| fault.to_string()).collect();
        assert!(faults.is_empty(), "{faults:?}");
    }
}

#[test]
fn the_same_flight_gives_the_same_bytes() {
    let one = || {
        let model = model();
        let mission = &model.missions[0];
        let report = report(mission, &model.facts, &flown(mission));
        (markdown(&report, System::Written, NAMES), json(&report), summary(&report))
    };
    assert_eq!(one(), one());
}

#[test]
fn places_are_called_from_the_folder_of_the_mission() {
    let model = model();
    let mission = &model.missions[0];
    let report = report(mission, &model.facts, &flown(mission));
    let line = include_str!("../../../missions/lantern.wright")
        .lines()
        .position(|line| line.trim_start().starts_with("payload "))
        .unwrap();
    let listed = &report.assumptions;
    let payload = listed.reasoned.iter().chain(&listed.unreasoned).find(|fact| fact.path == "payload");
    assert_eq!(payload.unwrap().place, format!("lantern.wright:{}", line + 1));
}

#[test]
fn local_time_is_of_the_earth_alone() {
    let model = model();
    let mut mission = model.missions[0].clone();
    let orbit = |mission: &crate::model::Mission| {
        report(mission, &model.facts, &flown(&model.missions[0])).end.orbit.unwrap()
    };
    assert!(orbit(&mission).mean_local_time_of_node_s.is_some());
    mission.world.spin.si = 7.0882e-5;
    assert_eq!(orbit(&mission).mean_local_time_of_node_s, None);
}
