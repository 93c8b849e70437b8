use super::codes::unknown_name;
use super::{codes, inert, inert_line, render_json, render_terminal};
use crate::source::{SourceFile, Sources, Span};

fn sources(text: &str) -> (Sources, Span) {
    let mut sources = Sources::default();
    let file = sources.add(SourceFile::new("example.wright", text));
    let at = text.find("Embr").unwrap();
    (sources, Span::new(file, at, at + 4))
}

/// The caret's column on the screen, below the word that it points at.
#[test]
fn carets_stand_below_their_word_after_tabs() {
    let (sources, span) = sources("stage A {\n\tengines\t1 of Embr\n}\n");
    let text = render_terminal(&[unknown_name::found(span, "an engine", "Embr", None)], &sources, false, 80);
    let lines: Vec<&str> = text.lines().collect();
    let (index, line) = lines.iter().enumerate().find(|(_, line)| line.contains("1 of Embr")).unwrap();
    let column = |line: &str, what: char| line.chars().position(|c| c == what).unwrap();
    let word = line.chars().count() - line[line.find("Embr").unwrap()..].chars().count();
    let caret = column(lines[index + 1], '─');
    assert!(caret == word || caret + 1 == word, "{text}");
}

#[test]
fn nothing_of_a_source_reaches_the_terminal_alive() {
    let (sources, span) = sources("stage A { engines 1 of Embr } # \u{1b}[31m \u{202e} \u{7}\n");
    let mut said = unknown_name::found(span, "an engine", "Em\u{1b}[2Jbr", None);
    said.labels[0].text = "a\u{202e}b".to_owned();
    let text = render_terminal(&[said], &sources, false, 80);
    assert!(!text.contains(['\u{1b}', '\u{202e}', '\u{7}']), "{text:?}");
    assert_eq!(inert_line("a\nb\u{1b}"), "a b\u{241b}");
    assert_eq!(inert("a\tb\r"), "a\tb\u{240d}");
}

#[test]
fn json_has_bytes_lines_and_utf16_columns() {
    let (sources, span) = sources("# 🚀\nstage A { because \"🚀\" engines 1 of Embr }\n");
    let text = render_json(&[unknown_name::found(span, "an engine", "Embr", None)], &sources);
    let value: serde_json::Value = serde_json::from_str(text.trim_end()).unwrap();
    assert_eq!(value["line"], 2);
    assert_eq!(value["column"].as_u64().unwrap(), value["utf16_column"].as_u64().unwrap());
    assert_eq!(value["start"].as_u64().unwrap() as u32, span.start);
}

#[test]
fn more_than_a_hundred_are_counted() {
    let (sources, span) = sources("stage A { engines 1 of Embr }\n");
    let many: Vec<_> = (0..130).map(|_| unknown_name::found(span, "an engine", "Embr", None)).collect();
    assert!(
        render_terminal(&many, &sources, false, 80).ends_with("130 errors (the last 30 are not shown)\n")
    );
}

#[test]
fn codes_are_words_in_order() {
    let names: Vec<&str> = codes::ALL.iter().map(|code| code.name).collect();
    assert!(names.is_sorted(), "{names:?}");
    for code in codes::ALL {
        assert!(
            code.name.bytes().all(|byte| byte.is_ascii_lowercase() || byte == b'-' || byte.is_ascii_digit())
        );
        assert!(!code.title.is_empty() && !code.explanation.is_empty(), "{}", code.name);
    }
}

/// Also past the end, where the drawing library itself would panic.
#[test]
fn any_place_can_be_shown() {
    let text = "stage A {\r\n\tengines 1 of Embr\r\r\n é\u{1b}\u{feff}}";
    let (sources, _) = sources(text);
    for start in 0..=text.len() + 2 {
        for end in start..=text.len() + 2 {
            let span = Span::new(crate::source::FileId(0), start, end);
            let said = unknown_name::found(span, "an engine", "Embr", None);
            let shown = render_terminal(std::slice::from_ref(&said), &sources, false, 80);
            assert!(shown.contains("unknown-name"), "{start}..{end}: {shown}");
            render_json(&[said], &sources);
        }
    }
}
