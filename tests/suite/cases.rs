//! Every diagnostic code: a case that brings it up where the case says, and how it looks.
//!
//! A case is `tests/cases/CODE.wright`. A line that ends in `#! code: words` expects a diagnostic of
//! that code to start on it, with those words in its message; nothing else may be said. The text that
//! a user would see is kept beside it as a snapshot. With `STAGEWRIGHT_BLESS=1` a missing case is
//! written from the code's own example, and expectations are written anew: read them before you commit.

use std::fs;

use stagewright::diagnostics::codes;

use crate::program::{Run, files, root, stagewright};

/// What is said about a source, as one `(line, code, message)` for each diagnostic.
fn said(run: &Run) -> Vec<(u64, String, String)> {
    run.err
        .lines()
        .map(|line| {
            let value: serde_json::Value =
                serde_json::from_str(line).unwrap_or_else(|_| panic!("not JSON: {line}"));
            let text = |key: &str| value[key].as_str().unwrap().to_owned();
            (value["line"].as_u64().unwrap(), text("code"), text("message"))
        })
        .collect()
}

fn fly(file: &str, format: &str) -> Run {
    stagewright(&root().join("tests/cases"), &[command(file), "--format", format, file])
}

/// A file without a mission cannot be flown.
fn command(file: &str) -> &'static str {
    let text = fs::read(root().join("tests/cases").join(file)).unwrap_or_default();
    if String::from_utf8_lossy(&text).contains("mission ") { "fly" } else { "check" }
}

/// Cases that no file of the repository should be: too large, or not text. Built here, with the words
/// that have to be said.
fn built(code: &str) -> Option<(Vec<u8>, &'static str)> {
    match code {
        "file-too-large" => Some((vec![b' '; 5 * 1024 * 1024], "the limit is")),
        "too-many-facts" => Some((
            (0..200_010).map(|n| format!("given a{n} 1\n")).collect::<String>().into_bytes(),
            "more than 200000",
        )),
        "not-utf8" => Some((b"given a 1\ngiven b 2 # caf\xe9\n".to_vec(), "UTF-8")),
        _ => None,
    }
}

/// The expectations that stand in a case: `(line, code, words)`.
fn expected(bytes: &[u8]) -> Vec<(u64, String, String)> {
    let text = String::from_utf8_lossy(bytes);
    let mut found = Vec::new();
    for (index, line) in text.lines().enumerate() {
        for note in line.split("#!").skip(1) {
            let (code, words) = note.split_once(':').unwrap_or((note, ""));
            found.push((index as u64 + 1, code.trim().to_owned(), words.trim().to_owned()));
        }
    }
    found
}

fn bless(code: &str) {
    let path = root().join(format!("tests/cases/{code}.wright"));
    if !path.exists() {
        // An example is called so, and stands alone in its project; a case has the repository around it.
        let example = codes::find(code).map_or("", |code| code.wrong);
        let example =
            example.replace("example.wright", &format!("{code}.wright")).replace("\"../", "\"../../../");
        fs::write(&path, example).unwrap();
    }
    let Ok(text) = fs::read_to_string(&path) else { return };
    let ends_whole = text.ends_with('\n');
    let bare: Vec<String> =
        text.lines().map(|line| line.split("#!").next().unwrap_or("").trim_end().to_owned()).collect();
    let write = |lines: &[String]| {
        let mut text = lines.join("\n");
        if ends_whole {
            text.push('\n');
        }
        fs::write(&path, text).unwrap();
    };
    write(&bare);
    let mut noted = bare;
    for (line, code, message) in said(&fly(&format!("{code}.wright"), "json")) {
        if let Some(text) = noted.get_mut(line as usize - 1) {
            text.push_str(&format!("  #! {code}: {message}"));
        }
    }
    write(&noted);
}

#[test]
fn every_code_has_a_case_that_says_where_and_what() {
    let blessing = std::env::var_os("STAGEWRIGHT_BLESS").is_some();
    let mut faults = Vec::new();
    for code in codes::ALL.iter().filter(|code| built(code.name).is_none()) {
        if blessing {
            bless(code.name);
        }
        let path = root().join(format!("tests/cases/{}.wright", code.name));
        let Ok(bytes) = fs::read(&path) else {
            faults.push(format!("{}: tests/cases/{0}.wright is missing", code.name));
            continue;
        };
        let expected = expected(&bytes);
        if !expected.iter().any(|(_, found, _)| found == code.name) {
            faults.push(format!("{}: its case does not expect it", code.name));
        }
        let file = format!("{}.wright", code.name);
        let said = said(&fly(&file, "json"));
        let agree = said.len() == expected.len()
            && said.iter().zip(&expected).all(|(said, expected)| {
                (said.0, &said.1) == (expected.0, &expected.1) && said.2.contains(&expected.2)
            });
        if !agree {
            faults.push(format!("{}: expected {expected:#?}\nbut it says {said:#?}", code.name));
        }
        let shown = format!("{}\n{}", String::from_utf8_lossy(&bytes).trim_end(), "=".repeat(60));
        let text = format!("{shown}\n{}", fly(&file, "text").err);
        insta::with_settings!({ snapshot_path => "../cases/snapshots", prepend_module_to_snapshot => false, omit_expression => true }, {
            insta::assert_snapshot!(code.name, text);
        });
    }
    assert!(faults.is_empty(), "{}", faults.join("\n"));
}

#[test]
fn what_no_file_should_hold_is_told_too() {
    let folder = tempfile::tempdir().unwrap();
    for code in codes::ALL {
        let Some((bytes, words)) = built(code.name) else { continue };
        fs::write(folder.path().join("built.wright"), bytes).unwrap();
        let run = stagewright(folder.path(), &["check", "--format", "json", "built.wright"]);
        let said = said(&run);
        let told = said.iter().any(|(_, found, message)| found == code.name && message.contains(words));
        assert!(told && run.status == 3, "{}: {:?}", code.name, said.first());
    }
}

#[test]
fn every_case_belongs_to_a_code() {
    for path in files("tests/cases", "wright") {
        let name = path.file_stem().unwrap().to_str().unwrap();
        let helper = path.parent().unwrap().file_name().unwrap() == "brought";
        assert!(helper || codes::find(name).is_some(), "{} is the case of no code", path.display());
    }
}

/// The examples on the `explain` page do what the page says.
#[test]
fn every_explained_example_is_true() {
    let folder = tempfile::tempdir().unwrap();
    let mut faults = Vec::new();
    for code in codes::ALL {
        let say = |source: &str| {
            fs::write(folder.path().join("example.wright"), source).unwrap();
            let command = if source.contains("mission ") { "fly" } else { "check" };
            said(&stagewright(folder.path(), &[command, "--format", "json", "example.wright"]))
        };
        let (wrong, mended) = (say(code.wrong), say(code.mended));
        // What no readable example can show is built by a test of its own.
        if built(code.name).is_none() && !wrong.iter().any(|(_, found, _)| found == code.name) {
            faults.push(format!("{}: the wrong example says {wrong:?}", code.name));
        }
        if !mended.is_empty() {
            faults.push(format!("{}: the mended example says {mended:?}", code.name));
        }
        let page = stagewright(folder.path(), &["explain", code.name]);
        if page.status != 0 || !page.out.contains(&code.title[1..]) {
            faults.push(format!("{}: no `explain` page", code.name));
        }
    }
    assert!(faults.is_empty(), "{}", faults.join("\n"));
}
