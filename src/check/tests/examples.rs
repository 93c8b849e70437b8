//! The examples of `explain`: each brings its code up, and its mend does not.

use super::{codes, compile_text};
use crate::diagnostics::codes::ALL;

/// Without an example that can be read: too long, not text, or not known.
const ELSEWHERE: &[&str] = &["file-too-large", "not-utf8", "numerical-failure", "too-many-facts"];

/// They come up only when their examples are flown.
const IN_FLIGHT: &[&str] = &[
    "above-air",
    "curve-range",
    "ground-impact",
    "hold-exceeded",
    "never-ends",
    "never-shed",
    "no-lift-off",
    "ran-dry",
    "true-at-start",
];

#[test]
fn each_example_brings_up_its_code_and_its_mend_brings_up_none() {
    let mut faults = Vec::new();
    for code in ALL.iter().filter(|code| !ELSEWHERE.contains(&code.name)) {
        let (wrong, mended) = (compile_text(code.wrong), compile_text(code.mended));
        let expected = match IN_FLIGHT.contains(&code.name) {
            true => wrong.diagnostics.is_empty(),
            false => codes(&wrong).contains(&code.name),
        };
        if !expected {
            faults.push(format!(
                "{}: found {:?}",
                code.name,
                wrong.diagnostics.iter().map(|d| (d.code.name, &d.message)).collect::<Vec<_>>()
            ));
        }
        if !mended.diagnostics.is_empty() {
            let texts: Vec<_> = mended.diagnostics.iter().map(|one| (one.code.name, &one.message)).collect();
            faults.push(format!("{} mended: found {texts:?}", code.name));
        }
    }
    assert!(faults.is_empty(), "{}", faults.join("\n"));
}
