//! Numbers as people read them.

use super::Unit;

/// A value in SI as a number in a unit (its symbol left out), to so many significant digits and
/// without zeros at the end of a fraction that say nothing: `format_si(43000.0, kN, 4)` is `43`.
///
/// Very small and very large numbers are written with a power of ten. What is not finite is `n/a`.
pub fn format_si(si: f64, unit: &Unit, significant: usize) -> String {
    format_number(unit.from_si(si), significant)
}

/// A plain number to so many significant digits; see [`format_si`].
pub fn format_number(value: f64, significant: usize) -> String {
    if !value.is_finite() {
        return "n/a".to_owned();
    }
    let digits = significant.clamp(1, 17) - 1;
    // The exponent after rounding: 9.996 to three digits is 10.0.
    let scientific = format!("{value:.digits$e}");
    let (mantissa, exponent) = scientific.split_once('e').unwrap_or((&scientific, "0"));
    let exponent: i32 = exponent.parse().unwrap_or(0);
    if value == 0.0 {
        return "0".to_owned();
    }
    if !(-4..7).contains(&exponent) {
        return format!("{}e{exponent}", trimmed(mantissa));
    }
    let decimals = (digits as i32 - exponent).max(0) as usize;
    // Digits left of the point that are not significant are still the number's own.
    trimmed(&format!("{value:.decimals$}")).to_owned()
}

fn trimmed(text: &str) -> &str {
    if text.contains('.') { text.trim_end_matches('0').trim_end_matches('.') } else { text }
}

/// A plain number with so many decimals, and no negative zero.
pub fn format_fixed(value: f64, decimals: usize) -> String {
    if !value.is_finite() {
        return "n/a".to_owned();
    }
    let text = format!("{value:.decimals$}");
    let zero = text.bytes().all(|byte| matches!(byte, b'-' | b'0' | b'.'));
    if zero { text.trim_start_matches('-').to_owned() } else { text }
}

/// How finely a number was written: `43.0` has three significant digits, and its last is worth 0.1.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Written {
    pub significant: usize,
    pub last: f64,
}

/// How finely a number was written; nothing where the text is not one.
pub fn digits_written(text: &str) -> Option<Written> {
    let text = text.trim_start_matches(['-', '+']);
    let (mantissa, exponent) = text.split_once(['e', 'E']).unwrap_or((text, "0"));
    let exponent: i32 = exponent.parse().ok()?;
    let (whole, fraction) = mantissa.split_once('.').unwrap_or((mantissa, ""));
    if !whole.bytes().chain(fraction.bytes()).all(|byte| byte.is_ascii_digit()) || whole.is_empty() {
        return None;
    }
    let digits = format!("{whole}{fraction}");
    let significant = digits.trim_start_matches('0').len().max(1);
    let exponent = i64::from(exponent) - i64::try_from(fraction.len()).ok()?;
    let last: f64 = format!("1e{exponent}").parse().ok()?;
    Some(Written { significant, last })
}
