//! Numbers as people write and read them.

use super::Unit;

/// An SI value in a unit, rounded to significant digits, without zeros at its end: plain decimals
/// from 0.0001 up to ten million, a power of ten beyond; "n/a" for what is no finite number.
pub fn format_si(si: f64, unit: &Unit, digits: usize) -> String {
    let value = unit.from_si(si);
    if !value.is_finite() {
        return "n/a".to_owned();
    }
    if value == 0.0 {
        return "0".to_owned();
    }
    let digits = digits.clamp(1, 17);
    let rounded = format!("{value:.*e}", digits - 1);
    let (mantissa, exponent) = rounded.split_once('e').unwrap_or((&rounded, "0"));
    let exponent: i32 = exponent.parse().unwrap_or(0);
    if !(-4..7).contains(&exponent) {
        return format!("{}e{exponent}", shortened(mantissa));
    }
    let decimals = (digits as i32 - 1 - exponent).max(0) as usize;
    // Read back after rounding, so that digits before the point are rounded by significance too.
    let value: f64 = rounded.parse().unwrap_or(value);
    shortened(&format!("{value:.decimals$}")).to_owned()
}

/// A decimal without the zeros at its end that follow the point.
fn shortened(decimal: &str) -> &str {
    match decimal.contains('.') {
        true => decimal.trim_end_matches('0').trim_end_matches('.'),
        false => decimal,
    }
}

/// How precisely a number is written.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Digits {
    /// Significant digits; zeros before the first other digit are none.
    pub significant: usize,
    /// One unit of the last digit: 0.1 for `43.0`, 100 for `1.2e3`.
    pub last: f64,
}

/// How precisely a number is written; nothing for what is no number.
pub fn digits_written(text: &str) -> Option<Digits> {
    let (mantissa, exponent) = text.split_once(['e', 'E']).unwrap_or((text, "0"));
    let mantissa = mantissa.strip_prefix(['-', '+']).unwrap_or(mantissa);
    let (whole, fraction) = mantissa.split_once('.').unwrap_or((mantissa, ""));
    let is_number = |digits: &str| digits.bytes().all(|byte| byte.is_ascii_digit());
    if !is_number(whole) || !is_number(fraction) || mantissa.len() < 1 + usize::from(mantissa.contains('.')) {
        return None;
    }
    let significant = whole.bytes().chain(fraction.bytes()).skip_while(|byte| *byte == b'0').count();
    let exponent = exponent.parse::<i64>().ok()?.checked_sub(i64::try_from(fraction.len()).ok()?)?;
    Some(Digits { significant, last: format!("1e{exponent}").parse().ok()? })
}
