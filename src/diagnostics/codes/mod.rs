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
    above_air,
    absent_quantity,
    after_the_flight,
    already_lit,
    already_shed,
    angle_out_of_range,
    burn_or_coast,
    burnt_too_early,
    circular_bring,
    circular_definition,
    contradiction,
    curve_grid,
    curve_header,
    curve_order,
    curve_range,
    curve_too_short,
    curve_width,
    dimension_mismatch,
    duplicate_name,
    empty_band,
    endless_phase,
    engine_count,
    expression_limit,
    file_not_read,
    file_too_large,
    foreign_fact,
    ground_impact,
    hold_exceeded,
    hold_not_by_throttle,
    impossible_epoch,
    impossible_orbit,
    impossible_value,
    impulse_mismatch,
    inconsistent_world,
    isp_as_speed,
    knob_bounds,
    misplaced_fact,
    missing_ambient,
    missing_fact,
    missing_line_break,
    missing_unit,
    nesting_limit,
    never_ends,
    never_shed,
    no_lift_off,
    no_place,
    not_constant,
    not_in_file,
    not_utf8,
    nothing_throttles,
    number_out_of_range,
    number_without_digits,
    numerical_failure,
    objective_without_knob,
    operator_needs_blanks,
    outside_project,
    percent_or_number,
    pounds_confused,
    power_of_quantity,
    ran_dry,
    repeated_fact,
    shed_while_burning,
    still_carried,
    stray_brace,
    throttle_out_of_range,
    too_deep,
    too_many_facts,
    too_many_restarts,
    true_at_start,
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
    unreachable_inclination,
    unused_knob,
    unused_part,
    wrong_arguments,
    wrong_kind,
}

/// The code of a name such as `unknown-name`.
pub fn find(name: &str) -> Option<&'static Code> {
    ALL.iter().copied().find(|code| code.name == name)
}
