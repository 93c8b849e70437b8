//! The examples of the codes that the parser gives.

use super::{codes, read};
use crate::diagnostics::codes::find;
use crate::source::FileId;
use crate::syntax::decode;
use crate::syntax::lines::FACT_LIMIT;
use crate::syntax::parse::SIZE_LIMIT;

#[test]
fn each_example_brings_up_its_code_and_its_mend_none() {
    for name in [
        "expression-limit",
        "misplaced-fact",
        "missing-line-break",
        "nesting-limit",
        "number-out-of-range",
        "number-without-digits",
        "operator-needs-blanks",
        "stray-brace",
        "unclosed-block",
        "unclosed-text",
        "unexpected-text",
    ] {
        let code = find(name).unwrap();
        assert_eq!(codes(&read(code.wrong)), [name]);
        assert_eq!(codes(&read(code.mended)), [""; 0], "{name}");
    }
}

#[test]
fn examples_that_are_too_long_to_show_bring_up_their_code() {
    let many = find("too-many-facts").unwrap();
    assert_eq!(codes(&read(&many.wrong.repeat(FACT_LIMIT + 1))), [many.name]);
    let large = find("file-too-large").unwrap();
    assert_eq!(codes(&read(&large.wrong.repeat(SIZE_LIMIT / large.wrong.len() + 1))), [large.name]);
    let bytes = find("not-utf8").unwrap();
    let broken = bytes.wrong.as_bytes().iter().map(|byte| if byte.is_ascii() { *byte } else { 0xe9 });
    let broken = decode(FileId(0), &broken.collect::<Vec<u8>>()).unwrap_err();
    assert_eq!(broken.diagnostic.code.name, bytes.name);
    for code in [many, large, bytes] {
        assert_eq!(codes(&read(code.mended)), [""; 0], "{}", code.name);
    }
}
