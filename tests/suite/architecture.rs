//! The layers of the code: which folder may know which.

use crate::program::{files, root};

/// Each folder of `src` and the folders that it may use. What is not in the list, it does not know.
const LAYERS: &[(&str, &[&str])] = &[
    ("math", &[]),
    ("source", &[]),
    ("quantity", &[]),
    ("diagnostics", &["source"]),
    ("syntax", &["source", "diagnostics"]),
    ("model", &["quantity"]),
    ("world", &["math"]),
    ("check", &["syntax", "quantity", "model", "source", "diagnostics", "world", "math"]),
    ("flight", &["model", "world", "math"]),
    ("report", &["flight", "model", "quantity", "world", "math"]),
    ("cli", &["check", "diagnostics", "flight", "model", "quantity", "report", "source", "world"]),
];

/// Whether a file holds tests, which may know what they compare with.
fn is_test(path: &str) -> bool {
    path.ends_with("tests.rs") || path.contains("/tests/")
}

#[test]
fn every_folder_knows_only_what_stands_before_it() {
    let mut faults = Vec::new();
    for path in files("src", "rs") {
        let relative = path.strip_prefix(root().join("src")).unwrap().to_str().unwrap().to_owned();
        let Some((folder, _)) = relative.split_once('/') else { continue };
        if is_test(&relative) {
            continue;
        }
        let allowed = LAYERS.iter().find(|(name, _)| *name == folder);
        let Some((_, allowed)) = allowed else {
            faults.push(format!("src/{folder} is not in the list of layers"));
            continue;
        };
        for piece in std::fs::read_to_string(&path).unwrap().split("crate::").skip(1) {
            let names: Vec<&str> = match piece.strip_prefix('{') {
                Some(group) => group.split('}').next().unwrap().split(',').collect(),
                None => vec![piece],
            };
            for name in names {
                let used: String =
                    name.trim().chars().take_while(|c| c.is_ascii_alphanumeric() || *c == '_').collect();
                if used != folder
                    && LAYERS.iter().any(|(layer, _)| *layer == used)
                    && !allowed.contains(&used.as_str())
                {
                    faults.push(format!("src/{relative} knows `{used}`"));
                }
            }
        }
    }
    assert!(faults.is_empty(), "{}", faults.join("\n"));
}

#[test]
fn the_core_reads_no_file_and_no_clock() {
    for path in files("src", "rs") {
        let relative = path.strip_prefix(root().join("src")).unwrap().to_str().unwrap().to_owned();
        if relative.starts_with("cli/") || relative == "main.rs" || is_test(&relative) {
            continue;
        }
        let text = std::fs::read_to_string(&path).unwrap();
        for banned in ["std::fs", "std::env", "std::process", "std::net", "std::time", "println!"] {
            assert!(!text.contains(banned), "src/{relative} uses {banned}");
        }
    }
}

#[test]
fn files_stay_small_enough_for_one_concept() {
    let mut lengths: Vec<(usize, String)> = files("src", "rs")
        .iter()
        .map(|path| (std::fs::read_to_string(path).unwrap().lines().count(), path.display().to_string()))
        .collect();
    lengths.sort();
    let (longest, name) = lengths.last().unwrap();
    assert!(*longest <= 450, "{name} has {longest} lines");
    assert!(
        lengths[lengths.len() / 2].0 <= 150,
        "the median file has {} lines",
        lengths[lengths.len() / 2].0
    );
}
