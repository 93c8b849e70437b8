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
    circular_bring,
    circular_definition,
    contradiction,
    curve_grid,
    curve_header,
    curve_order,
    curve_too_short,
    curve_width,
    dimension_mismatch,
    duplicate_name,
    expression_limit,
    file_not_read,
    file_too_large,
    foreign_fact,
    impossible_value,
    impulse_mismatch,
    inconsistent_world,
    isp_as_speed,
    misplaced_fact,
    missing_ambient,
    missing_fact,
    missing_line_break,
    missing_unit,
    nesting_limit,
    not_constant,
    not_in_file,
    not_utf8,
    number_out_of_range,
    number_without_digits,
    operator_needs_blanks,
    outside_project,
    percent_or_number,
    pounds_confused,
    power_of_quantity,
    repeated_fact,
    stray_brace,
    too_deep,
    too_many_facts,
    unclosed_block,
    unclosed_text,
    unexpected_part,
    unexpected_text,
    unfit_curve,
    unknown_fact,
    unknown_name,
    unknown_unit,
    unknown_word,
    unlikely_value,
    wrong_arguments,
    wrong_kind,
}

/// The code of a name such as `unknown-name`.
pub fn find(name: &str) -> Option<&'static Code> {
    ALL.iter().copied().find(|code| code.name == name)
}
