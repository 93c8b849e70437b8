//! Any text gives a tree with true places, in bounded time.

#![allow(clippy::disallowed_methods, reason = "these tests measure time")]

use std::time::{Duration, Instant};

use proptest::prelude::*;

use super::spans::check_spans;
use super::{codes, read};
use crate::syntax::lines::{FACT_LIMIT, NESTING_LIMIT};
use crate::syntax::parse::SIZE_LIMIT;

const LANTERN: &str = include_str!("lantern.wright");

/// Generous: what takes this long is not linear.
const LONG: Duration = Duration::from_secs(20);

fn read_in_time(text: &str) -> Vec<&'static str> {
    let begin = Instant::now();
    let parsed = read(text);
    assert!(begin.elapsed() < LONG, "{:?} for {} bytes", begin.elapsed(), text.len());
    check_spans(text, &parsed);
    let found = codes(&parsed);
    drop(parsed);
    found
}

#[test]
fn deep_nesting_is_reported_once() {
    for depth in [NESTING_LIMIT + 1, 10_000] {
        let on_a_line = format!("given a {}1{}\ngiven b 2\n", "(".repeat(depth), ")".repeat(depth));
        assert_eq!(read_in_time(&on_a_line), ["nesting-limit"]);
        let on_lines = format!("given a {}1{}\ngiven b 2\n", "(\n".repeat(depth), ")\n".repeat(depth));
        assert_eq!(read_in_time(&on_lines)[..1], ["nesting-limit"]);
        let blocks = format!("{}{}given b 2\n", "mission M {\n".repeat(depth), "}\n".repeat(depth));
        assert!(read_in_time(&blocks).contains(&"nesting-limit"));
    }
    let allowed = format!("given a {}1{}\n", "(".repeat(NESTING_LIMIT), ")".repeat(NESTING_LIMIT));
    assert_eq!(read_in_time(&allowed), [""; 0]);
}

#[test]
fn much_of_one_thing_ends() {
    assert_eq!(read_in_time(&"(".repeat(1 << 20)), ["nesting-limit"]);
    let pieces = [
        "(",
        ")",
        "{",
        "}",
        "[",
        "\"",
        "#",
        "-",
        "+ ",
        "a ",
        "a.",
        "a(",
        "1 ",
        "1,",
        ";",
        ",\n",
        "\n",
        "\\",
        "\0",
        "é",
        "(\n",
        "stage a\n",
        "peak ",
    ];
    for piece in pieces {
        let much = piece.repeat((1 << 17) / piece.len());
        read_in_time(&much);
        read_in_time(&format!("mission M {{ given a {much}"));
    }
}

#[test]
fn a_long_chain_of_operators_is_reported() {
    let chain = |count: usize| format!("given a 1{}\ngiven b 2\n", " + 1".repeat(count));
    assert_eq!(read_in_time(&chain(10_000)), ["expression-limit"]);
    assert_eq!(read_in_time(&chain(257)), ["expression-limit"]);
    assert_eq!(read_in_time(&chain(256)), [""; 0]);
    assert_eq!(read_in_time(&format!("given a {}1\n", "-".repeat(257))), ["expression-limit"]);
    assert_eq!(read_in_time(&format!("given a {}1\n", "-".repeat(256))), [""; 0]);
    let tower = format!("given a 2{}\n", " ^ 2".repeat(256));
    assert_eq!(read_in_time(&tower), [""; 0]);
}

#[test]
fn a_file_over_the_limits_is_reported() {
    assert_eq!(read_in_time(&" ".repeat(SIZE_LIMIT)), [""; 0]);
    assert_eq!(read_in_time(&" ".repeat(SIZE_LIMIT + 1)), ["file-too-large"]);
    assert_eq!(read_in_time(&"given a 1\n".repeat(FACT_LIMIT)), [""; 0]);
    assert_eq!(read_in_time(&"given a 1\n".repeat(FACT_LIMIT + 1)), ["too-many-facts"]);
}

#[test]
fn a_hundred_thousand_lines_take_under_half_a_second() {
    let mission = LANTERN.repeat(100_000 / LANTERN.lines().count());
    let begin = Instant::now();
    let parsed = read(&mission);
    let time = begin.elapsed();
    assert!(parsed.diagnostics.is_empty());
    // The bound is for an optimised build; others get more.
    assert!(time < Duration::from_millis(if cfg!(debug_assertions) { 5000 } else { 500 }), "{time:?}");
}

/// Pieces that meet each other in every order.
fn pieces() -> impl Strategy<Value = String> {
    let piece = prop_oneof![
        Just("mission M {"),
        Just("phase P {"),
        Just("}"),
        Just("\n"),
        Just("\r\n"),
        Just(";"),
        Just("given a"),
        Just("1 kg"),
        Just(" + "),
        Just("-"),
        Just("("),
        Just(")"),
        Just("["),
        Just("]"),
        Just(","),
        Just("\""),
        Just("\\"),
        Just("# c"),
        Just("until"),
        Just(" or "),
        Just("apex"),
        Just("steer pitch from"),
        Just("at"),
        Just("time [s] -> cd"),
        Just("0.5 1"),
        Just("because"),
        Just("\t"),
        Just("é"),
        Just("\0"),
        Just(".."),
        Just("peak x"),
        Just("at end of P"),
        Just("\u{feff}"),
        Just("bring A from"),
        Just("unit u ="),
    ];
    proptest::collection::vec(piece, 0..60).prop_map(|pieces| pieces.join(" "))
}

proptest! {
    #[test]
    fn any_string_gives_a_tree(text in any::<String>()) {
        check_spans(&text, &read(&text));
    }

    #[test]
    fn any_pieces_give_a_tree(text in pieces()) {
        check_spans(&text, &read(&text));
    }

    #[test]
    fn the_example_with_a_part_left_out_gives_a_tree(start in 0..LANTERN.len(), len in 0usize..60) {
        let end = (start + len).min(LANTERN.len());
        let text = format!("{}{}", &LANTERN[..start], &LANTERN[end..]);
        check_spans(&text, &read(&text));
    }
}
