//! The commands, their exit statuses and their streams.

use std::fs;

use crate::program::{root, stagewright};

#[test]
fn exit_statuses_are_those_of_the_charter() {
    let folder = tempfile::tempdir().unwrap();
    let here = root();
    assert_eq!(stagewright(&here, &["check", "missions/lantern.wright"]).status, 0);
    assert_eq!(stagewright(&here, &["fly", "missions/overreach.wright"]).status, 1);
    assert_eq!(stagewright(&here, &["check", "missions/no-such-file.wright"]).status, 2);
    assert_eq!(stagewright(&here, &["check", "missions"]).status, 2);
    assert_eq!(stagewright(&here, &["chekc"]).status, 2);
    assert_eq!(stagewright(&here, &["fly", "--tolerance", "7", "missions/lantern.wright"]).status, 2);
    assert_eq!(stagewright(&here, &["check", "tests/cases/unknown-name.wright"]).status, 3);
    assert_eq!(stagewright(&here, &["fly", "tests/cases/no-lift-off.wright"]).status, 4);
    assert_eq!(stagewright(folder.path(), &["--help"]).status, 0);
    assert_eq!(stagewright(folder.path(), &["--version"]).status, 0);
}

#[test]
fn the_gravest_of_several_files_counts_and_all_are_told() {
    let run = stagewright(
        &root(),
        &[
            "check",
            "tests/cases/unknown-name.wright",
            "missions/lantern.wright",
            "tests/cases/unclosed-block.wright",
        ],
    );
    assert_eq!(run.status, 3);
    assert!(run.err.contains("unknown-name") && run.err.contains("unclosed-block"), "{}", run.err);
}

#[test]
fn the_model_is_json_and_fits_its_schema() {
    let model = stagewright(&root(), &["model", "missions/lantern.wright"]);
    let schema = stagewright(&root(), &["model", "--schema", "model"]);
    assert_eq!((model.status, schema.status), (0, 0));
    let model: serde_json::Value = serde_json::from_str(&model.out).unwrap();
    let schema: serde_json::Value = serde_json::from_str(&schema.out).unwrap();
    if let Err(error) = jsonschema::validate(&schema, &model) {
        panic!("{error}");
    }
    assert_eq!(model["format"], "stagewright-model/1");
}

#[test]
fn diagnostics_as_json_fit_their_schema() {
    let run = stagewright(&root(), &["check", "--format", "json", "tests/cases/unknown-name.wright"]);
    let schema = stagewright(&root(), &["model", "--schema", "diagnostic"]);
    let schema: serde_json::Value = serde_json::from_str(&schema.out).unwrap();
    for line in run.err.lines() {
        let value: serde_json::Value = serde_json::from_str(line).unwrap();
        if let Err(error) = jsonschema::validate(&schema, &value) {
            panic!("{error}");
        }
    }
}

#[test]
fn nothing_is_coloured_in_a_pipe() {
    let run = stagewright(&root(), &["check", "tests/cases/unknown-name.wright"]);
    assert!(!run.err.contains('\u{1b}'));
}

#[test]
fn same_bytes_from_any_folder() {
    let folder = tempfile::tempdir().unwrap();
    let (first, second) = (folder.path().join("a"), folder.path().join("b"));
    let source = root().join("missions/lantern.wright");
    let from_root =
        stagewright(&root(), &["report", "--out", first.to_str().unwrap(), "missions/lantern.wright"]);
    let from_afar =
        stagewright(folder.path(), &["report", "--out", second.to_str().unwrap(), source.to_str().unwrap()]);
    assert_eq!((from_root.status, from_afar.status), (0, 0), "{}{}", from_root.err, from_afar.err);
    let mut names: Vec<_> = fs::read_dir(&first).unwrap().map(|entry| entry.unwrap().file_name()).collect();
    names.sort();
    assert!(names.len() >= 5, "{names:?}");
    for name in names {
        assert_eq!(fs::read(first.join(&name)).unwrap(), fs::read(second.join(&name)).unwrap(), "{name:?}");
    }
}

#[test]
fn a_stale_report_is_status_one_and_names_the_file() {
    let folder = tempfile::tempdir().unwrap();
    let text = fs::read_to_string(root().join("missions/plover.wright")).unwrap();
    let source = folder.path().join("plover.wright");
    fs::write(&source, &text).unwrap();
    assert_eq!(stagewright(folder.path(), &["report", "plover.wright"]).status, 0);
    assert_eq!(stagewright(folder.path(), &["report", "--verify", "plover.wright"]).status, 0);
    fs::write(&source, text.replace("152 kg", "153 kg")).unwrap();
    let run = stagewright(folder.path(), &["report", "--verify", "plover.wright"]);
    assert_eq!(run.status, 1);
    assert!(run.err.contains("report.md"), "{}", run.err);
}

#[test]
fn completions_and_manual_pages_are_written() {
    let folder = tempfile::tempdir().unwrap();
    for shell in ["bash", "zsh", "fish", "powershell", "elvish"] {
        let run = stagewright(folder.path(), &["completions", shell]);
        assert!(run.status == 0 && run.out.contains("stagewright"), "{shell}");
    }
    assert_eq!(stagewright(folder.path(), &["manpages", "pages"]).status, 0);
    let page = fs::read_to_string(folder.path().join("pages/stagewright-report.1")).unwrap();
    assert!(page.contains("verify"));
}
