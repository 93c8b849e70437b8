//! The documents: their examples compile, and their tables say what the program does.

use std::fs;

use stagewright::diagnostics::{Severity, codes};
use stagewright::model::{Quantity, QuantityKind};
use stagewright::quantity::UnitTable;

use crate::program::{files, root, stagewright};

/// The fenced blocks of a document with this tag.
fn blocks(text: &str, tag: &str) -> Vec<String> {
    let mut found = Vec::new();
    let mut inside: Option<String> = None;
    for line in text.lines() {
        match &mut inside {
            Some(block) if line == "```" => {
                found.push(std::mem::take(block));
                inside = None;
            }
            Some(block) => {
                block.push_str(line);
                block.push('\n');
            }
            None if line == format!("```{tag}") => inside = Some(String::new()),
            None => {}
        }
    }
    found
}

#[test]
fn every_example_of_the_manual_compiles() {
    let folder = tempfile::tempdir().unwrap();
    let text = fs::read_to_string(root().join("docs/manual.md")).unwrap();
    let examples = blocks(&text, "wright");
    assert!(examples.len() >= 6);
    for example in examples {
        fs::write(folder.path().join("example.wright"), &example).unwrap();
        let command = if example.contains("mission ") { "fly" } else { "check" };
        let run = stagewright(folder.path(), &[command, "example.wright"]);
        assert_eq!((run.status, run.err.as_str()), (0, ""), "{example}");
    }
}

/// A unit stands only after a number, and no word that may follow a number is a unit.
#[test]
fn units_and_words_of_the_language_are_disjoint() {
    for symbol in UnitTable::builtin().symbols() {
        assert!(!stagewright::syntax::is_keyword(symbol), "{symbol}");
    }
}

/// Every flight quantity and every heading of a committed report has its origin on record.
#[test]
fn the_vocabulary_knows_what_the_program_says() {
    let vocabulary = fs::read_to_string(root().join("docs/vocabulary.md")).unwrap();
    let report = fs::read_to_string(root().join("missions/lantern.report/report.md")).unwrap();
    for heading in report.lines().filter_map(|line| line.strip_prefix("## ")) {
        let word = heading.split([',', ':']).next().unwrap().to_lowercase();
        assert!(vocabulary.to_lowercase().contains(&word), "{heading}");
    }
    for name in ["check", "fly", "report", "model", "explain", "builtin", "completions", "manpages"] {
        assert!(vocabulary.contains(&format!("`{name}`")), "{name}");
    }
}

/// Compares the part of a document between two marks with what it should say, or writes it.
fn keep(document: &str, mark: &str, wanted: &str) {
    let path = root().join(document);
    let text = fs::read_to_string(&path).unwrap();
    let open = format!("<!-- generated: {mark} -->\n");
    let (before, rest) = text.split_once(&open).unwrap_or_else(|| panic!("{document} has no mark {mark}"));
    let (found, after) = rest.split_once("<!-- end -->").unwrap();
    if found == wanted {
        return;
    }
    if std::env::var_os("STAGEWRIGHT_BLESS").is_some() {
        fs::write(&path, format!("{before}{open}{wanted}<!-- end -->{after}")).unwrap();
    } else {
        panic!(
            "{document}: the part `{mark}` is not what the program says; see DEVELOPERS.md on how to write it anew"
        );
    }
}

/// The rules of the grammar that have a comment, with it.
fn rules() -> String {
    let grammar = fs::read_to_string(root().join("grammar/stagewright.pest")).unwrap();
    let mut text = String::from("| rule | what it reads |\n|---|---|\n");
    let mut comment = String::new();
    for line in grammar.lines() {
        if let Some(words) = line.strip_prefix("///") {
            comment.push_str(words);
            continue;
        }
        if let Some((name, _)) = line.split_once('=')
            && !comment.is_empty()
        {
            text.push_str(&format!("| `{}` |{} |\n", name.trim(), comment.replace('|', "\\|")));
        }
        comment.clear();
    }
    text
}

/// One test for all parts, because they are written into one file.
#[test]
fn the_generated_parts_of_the_manual_are_current() {
    let mut units = String::from("| symbol | dimension | in SI | prefixes |\n|---|---|---:|---|\n");
    for unit in UnitTable::builtin().rows() {
        let prefixes = if unit.prefixes { "yes" } else { "" };
        units.push_str(&format!(
            "| `{}` | {} | {} | {prefixes} |\n",
            unit.symbol,
            unit.dimension.describe(),
            unit.factor
        ));
    }
    keep("docs/manual.md", "units", &units);

    let mut quantities =
        String::from("| quantity | dimension | shown in | where | meaning |\n|---|---|---|---|---|\n");
    for quantity in Quantity::ALL {
        let kind = match quantity.kind() {
            QuantityKind::Any => "everywhere",
            QuantityKind::Orbital => "central gravity",
            QuantityKind::Round => "ellipsoid",
            QuantityKind::Air => "air",
        };
        let unit = quantity.customary_unit();
        let unit = if unit.is_empty() { String::new() } else { format!("`{unit}`") };
        quantities.push_str(&format!(
            "| `{}` | {} | {unit} | {kind} | {} |\n",
            quantity.name(),
            quantity.dimension().describe(),
            quantity.meaning()
        ));
    }
    keep("docs/manual.md", "quantities", &quantities);

    let mut list = String::from("| code | | means |\n|---|---|---|\n");
    for code in codes::ALL {
        let severity = match code.severity {
            Severity::Error => "error",
            Severity::Warning => "warning",
        };
        list.push_str(&format!("| `{}` | {severity} | {} |\n", code.name, code.title));
    }
    keep("docs/manual.md", "codes", &list);
    keep("docs/manual.md", "grammar", &rules());
}

/// What the README shows of a source and of its report stands in them.
#[test]
fn the_readme_quotes_what_is_there() {
    let readme = fs::read_to_string(root().join("README.md")).unwrap();
    let source = fs::read_to_string(root().join("missions/lantern.wright")).unwrap();
    let report = fs::read_to_string(root().join("missions/lantern.report/report.md")).unwrap();
    for excerpt in blocks(&readme, "wright") {
        for piece in excerpt.split("…\n") {
            assert!(source.contains(piece.trim_end()), "not in the mission:\n{piece}");
        }
    }
    let excerpt = readme.split_once("What you get").unwrap().1.split_once("![").unwrap().0;
    for row in excerpt.lines().filter(|line| line.starts_with('|')) {
        assert!(report.contains(row), "not in the report:\n{row}");
    }
    let run = fs::read_to_string(root().join(".ci/run")).unwrap();
    assert!(readme.contains("cargo run --release -- report missions/lantern.wright"));
    assert!(readme.contains("cargo test") && run.contains("cargo test"));
}

/// Links between the documents lead somewhere.
#[test]
fn links_lead_to_files() {
    let mut documents = files("docs", "md");
    documents.extend(["README.md", "DEVELOPERS.md", "CHANGELOG.md"].map(|name| root().join(name)));
    for document in documents {
        let text = fs::read_to_string(&document).unwrap();
        for link in text.split("](").skip(1).filter_map(|rest| rest.split(')').next()) {
            let file = link.split('#').next().unwrap();
            if file.is_empty() || file.starts_with("http") {
                continue;
            }
            assert!(document.parent().unwrap().join(file).exists(), "{}: {link}", document.display());
        }
    }
}
