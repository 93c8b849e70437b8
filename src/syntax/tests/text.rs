//! What a file can look like as bytes and lines.

use super::{codes, read};
use crate::diagnostics::Severity;
use crate::source::FileId;
use crate::syntax::{Item, decode};

const LANTERN: &str = include_str!("lantern.wright");

/// The debug print of the items without their places.
fn shape(text: &str) -> String {
    let parsed = read(text);
    assert_eq!(codes(&parsed), [""; 0], "{text}");
    let print = format!("{:?}", parsed.tree.items);
    let mut shape = String::new();
    let mut rest = print.as_str();
    while let Some((before, after)) = rest.split_once("Span {") {
        shape.push_str(before);
        rest = after.split_once('}').unwrap().1;
    }
    shape + rest
}

#[test]
fn line_ends_tabs_and_a_byte_order_mark_change_nothing() {
    let plain = shape(LANTERN);
    assert_eq!(shape(&LANTERN.replace('\n', "\r\n")), plain);
    assert_eq!(shape(&LANTERN.replace("    ", "\t")), plain);
    assert_eq!(shape(&format!("\u{feff}{LANTERN}")), plain);
    assert_eq!(shape(LANTERN.trim_end()), plain, "no line break at the end of the file");
}

#[test]
fn places_stay_true_after_a_byte_order_mark() {
    let text = "\u{feff}given a 1\n";
    let parsed = read(text);
    let [Item::Given(given, None)] = parsed.tree.items.as_slice() else { panic!("{:?}", parsed.tree.items) };
    assert_eq!(&text[given.name.span.range()], "a");
}

#[test]
fn a_byte_order_mark_elsewhere_is_found() {
    assert_eq!(codes(&read("given a\u{feff} 1\n")), ["unexpected-text"]);
}

#[test]
fn empty_files_are_fine() {
    for text in ["", "\n", " ", "\t\r\n", "\u{feff}", "# only a comment", "#", ";", ";\n;"] {
        let parsed = read(text);
        assert_eq!(codes(&parsed), [""; 0], "{text:?}");
        assert!(parsed.tree.items.is_empty());
    }
}

#[test]
fn comments_are_kept_in_order() {
    let text =
        "# first\ngiven a (1 + # within\r\n  2) # after\nstage S { # head\n  ??? # broken\n} # \"last\n#";
    let parsed = read(text);
    assert_eq!(codes(&parsed), ["unexpected-text"]);
    let comments: Vec<&str> =
        parsed.tree.comments.iter().map(|comment| &text[comment.span.range()]).collect();
    assert_eq!(comments, ["# first", "# within", "# after", "# head", "# broken", "# \"last", "#"]);
}

#[test]
fn a_sharp_within_a_text_is_no_comment() {
    let parsed = read("given a 1 because \"test #3 \\\" # 4\"\n");
    assert_eq!(codes(&parsed), [""; 0]);
    assert!(parsed.tree.comments.is_empty());
    let [Item::Given(_, Some(because))] = parsed.tree.items.as_slice() else { panic!() };
    assert_eq!(because.text.text, "test #3 \" # 4");
}

#[test]
fn escapes_are_resolved() {
    let parsed = read(r#"given a 1 because "a \"b\" \\ c\d é""#);
    let [Item::Given(_, Some(because))] = parsed.tree.items.as_slice() else { panic!() };
    assert_eq!(because.text.text, r#"a "b" \ c\d é"#);
}

#[test]
fn lines_go_on_after_commas_operators_and_in_brackets() {
    for (text, facts) in [
        ("given a 1 +\n\n  2", 1),
        ("given a 1\n  + 2", 2),
        ("given a max(1,\n 2,\n\n 3)", 1),
        ("given a (\n1\n)", 1),
        ("given a (\n1\ngiven b 2", 3),
        ("given a 1 because\n\"x\"", 2),
    ] {
        let items = read(text).tree.items;
        assert_eq!(items.len(), facts, "{text}: {items:#?}");
    }
}

#[test]
fn bytes_that_are_not_text_are_told() {
    let broken = decode(FileId(0), b"given a 1 # \xe9t\xe9\n").unwrap_err();
    assert_eq!(broken.diagnostic.code.name, "not-utf8");
    assert_eq!(broken.diagnostic.severity(), Severity::Error);
    assert_eq!(broken.diagnostic.message, "the byte 0xE9 is not UTF-8 text");
    assert_eq!(&broken.lossy[broken.diagnostic.span().range()], "\u{fffd}");
    assert_eq!(decode(FileId(0), "é\0".as_bytes()).unwrap(), "é\0");
    let wide = decode(FileId(0), b"\xff\xfeg\0i\0").unwrap_err();
    assert_eq!(wide.diagnostic.span().start, 0);
}
