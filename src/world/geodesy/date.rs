//! Instants of UTC as people write them.

use std::fmt;

/// A date and time of day in the Gregorian calendar, such as `2027-05-14T09:30:00Z`.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct DateTime {
    /// 1 to 9999.
    pub year: u32,
    pub month: u32,
    pub day: u32,
    pub hour: u32,
    pub minute: u32,
    /// Below 60: UTC is taken as UT1, which has no leap seconds.
    pub second: f64,
}

/// Why a text is not an instant.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum DateError {
    /// Not of the form `2027-05-14T09:30:00Z`, with an optional fraction of the second.
    Form,
    Year,
    Month,
    /// This month has only so many days.
    Day {
        last: u32,
    },
    Hour,
    Minute,
    /// 60 or more: a leap second has no place here.
    Second,
}

impl fmt::Display for DateError {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        match self {
            DateError::Form => f.write_str("an instant is written as 2027-05-14T09:30:00Z"),
            DateError::Year => f.write_str("the year runs from 0001 to 9999"),
            DateError::Month => f.write_str("the month runs from 01 to 12"),
            DateError::Day { last } => write!(f, "the day runs from 01 to {last} in this month"),
            DateError::Hour => f.write_str("the hour runs from 00 to 23"),
            DateError::Minute => f.write_str("the minute runs from 00 to 59"),
            DateError::Second => f.write_str("the second stays below 60; leap seconds are not counted"),
        }
    }
}

impl std::error::Error for DateError {}

impl DateTime {
    /// Reads an instant of UTC in the extended form of ISO 8601, with `Z`, to the second or finer.
    pub fn parse(text: &str) -> Result<Self, DateError> {
        let (date, clock) =
            text.strip_suffix('Z').and_then(|rest| rest.split_once('T')).ok_or(DateError::Form)?;
        let [year, month, day] = split(date, '-')?;
        let [hour, minute, second] = split(clock, ':')?;
        let (whole, fraction) = second.split_once('.').unwrap_or((second, "0"));
        digits(whole, 2)?;
        if fraction.is_empty() || !fraction.bytes().all(|b| b.is_ascii_digit()) {
            return Err(DateError::Form);
        }
        let instant = DateTime {
            year: digits(year, 4)?,
            month: digits(month, 2)?,
            day: digits(day, 2)?,
            hour: digits(hour, 2)?,
            minute: digits(minute, 2)?,
            second: second.parse().map_err(|_| DateError::Form)?,
        };
        instant.check()
    }

    /// Julian date in days of the same time scale.
    ///
    /// J. Meeus, *Astronomical Algorithms* (2nd ed., 1998), eq. 7.1, in whole numbers, Gregorian calendar
    /// throughout. Good to 0.05 ms, the resolution of an `f64` of this size.
    pub fn julian_date(&self) -> f64 {
        let late = self.month > 2;
        let year = i64::from(self.year) - i64::from(!late);
        let month = i64::from(self.month) + if late { 0 } else { 12 };
        let century = year / 100;
        let days = 1461 * (year + 4716) / 4 + 306_001 * (month + 1) / 10_000 + i64::from(self.day) - century
            + century / 4
            + 2;
        let seconds = f64::from(self.hour * 3600 + self.minute * 60) + self.second;
        (days as f64 - 1524.5) + seconds / 86_400.0
    }

    fn check(self) -> Result<Self, DateError> {
        let last = last_day(self.year, self.month);
        match self {
            DateTime { year: 0, .. } => Err(DateError::Year),
            DateTime { month, .. } if !(1..=12).contains(&month) => Err(DateError::Month),
            DateTime { day, .. } if !(1..=last).contains(&day) => Err(DateError::Day { last }),
            DateTime { hour: 24.., .. } => Err(DateError::Hour),
            DateTime { minute: 60.., .. } => Err(DateError::Minute),
            DateTime { second, .. } if second >= 60.0 => Err(DateError::Second),
            _ => Ok(self),
        }
    }
}

fn last_day(year: u32, month: u32) -> u32 {
    let leap = year.is_multiple_of(4) && (!year.is_multiple_of(100) || year.is_multiple_of(400));
    match month {
        2 if leap => 29,
        2 => 28,
        4 | 6 | 9 | 11 => 30,
        _ => 31,
    }
}

/// Exactly three fields.
fn split(text: &str, separator: char) -> Result<[&str; 3], DateError> {
    let mut fields = text.split(separator);
    match (fields.next(), fields.next(), fields.next(), fields.next()) {
        (Some(a), Some(b), Some(c), None) => Ok([a, b, c]),
        _ => Err(DateError::Form),
    }
}

/// A number of exactly `count` digits.
fn digits(text: &str, count: usize) -> Result<u32, DateError> {
    if text.len() != count || !text.bytes().all(|b| b.is_ascii_digit()) {
        return Err(DateError::Form);
    }
    text.parse().map_err(|_| DateError::Form)
}
