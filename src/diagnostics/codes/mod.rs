//! One file for each diagnostic code.
//!
//! Each file offers `CODE` and a function `found` that makes the diagnostic. A line in the list
//! below is all that registers a code; the index, `explain` and the tests read [`ALL`].

use super::Code;

macro_rules! codes {
    ($($module:ident),* $(,)?) => {
        $(pub mod $module;)*

        /// Every code, in alphabetical order.
        pub static ALL: &[&Code] = &[$(&$module::CODE),*];
    };
}

codes! {
    expression_limit,
    file_too_large,
    misplaced_fact,
    missing_line_break,
    nesting_limit,
    not_utf8,
    number_out_of_range,
    number_without_digits,
    operator_needs_blanks,
    stray_brace,
    too_many_facts,
    unclosed_block,
    unclosed_text,
    unexpected_text,
    unknown_name,
}

/// The code of a name such as `unknown-name`.
pub fn find(name: &str) -> Option<&'static Code> {
    ALL.iter().copied().find(|code| code.name == name)
}
