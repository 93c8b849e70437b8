//! Dates against Meeus's *Astronomical Algorithms*, the Earth's angle against the IAU's own software.

use std::f64::consts::TAU;

use super::{DateError, DateTime, earth_rotation_angle};

fn julian(text: &str) -> f64 {
    DateTime::parse(text).unwrap().julian_date()
}

#[test]
fn julian_dates() {
    // Meeus, 2nd ed., ch. 7: Example 7.a and the list that follows it.
    assert_eq!(julian("1957-10-04T19:26:24Z"), 2436116.31);
    assert_eq!(julian("2000-01-01T12:00:00Z"), 2451545.0);
    assert_eq!(julian("1999-01-01T00:00:00Z"), 2451179.5);
    assert_eq!(julian("1987-01-27T00:00:00Z"), 2446822.5);
    assert_eq!(julian("1988-06-19T12:00:00Z"), 2447332.0);
    assert_eq!(julian("1900-01-01T00:00:00Z"), 2415020.5);
    assert_eq!(julian("1600-12-31T00:00:00Z"), 2305812.5);
}

#[test]
fn days_follow_each_other() {
    let mut last = julian("1895-12-31T00:00:00Z");
    for year in 1896..=2105 {
        for month in 1..=12 {
            for day in 1..=31 {
                let text = format!("{year:04}-{month:02}-{day:02}T00:00:00Z");
                if let Ok(date) = DateTime::parse(&text) {
                    assert_eq!(date.julian_date(), last + 1.0, "{text}");
                    last = date.julian_date();
                }
            }
        }
    }
}

#[test]
fn fields_are_read() {
    let date = DateTime::parse("2027-05-14T09:30:05.25Z").unwrap();
    let expected = DateTime { year: 2027, month: 5, day: 14, hour: 9, minute: 30, second: 5.25 };
    assert_eq!(date, expected);
}

#[test]
fn impossible_dates() {
    let wrong = [
        ("2027-02-29T00:00:00Z", DateError::Day { last: 28 }),
        ("1900-02-29T00:00:00Z", DateError::Day { last: 28 }),
        ("2028-02-30T00:00:00Z", DateError::Day { last: 29 }),
        ("2027-04-31T00:00:00Z", DateError::Day { last: 30 }),
        ("2027-01-00T00:00:00Z", DateError::Day { last: 31 }),
        ("2027-13-01T00:00:00Z", DateError::Month),
        ("2027-00-01T00:00:00Z", DateError::Month),
        ("0000-01-01T00:00:00Z", DateError::Year),
        ("2027-05-14T24:00:00Z", DateError::Hour),
        ("2027-05-14T09:60:00Z", DateError::Minute),
        ("2016-12-31T23:59:60Z", DateError::Second),
    ];
    for (text, error) in wrong {
        assert_eq!(DateTime::parse(text), Err(error), "{text}");
    }
    assert!(DateTime::parse("2000-02-29T00:00:00Z").is_ok());
}

#[test]
fn other_forms_are_refused() {
    let texts = [
        "",
        "Z",
        "T",
        "2027-05-14",
        "2027-05-14T09:30Z",
        "2027-05-14T09:30:00",
        "2027-05-14 09:30:00Z",
        "2027-5-14T09:30:00Z",
        "+027-05-14T09:30:00Z",
        "2027-05-14T09:30:00+02:00",
        "2027-05-14T9:30:00Z",
        "2027-05-14T09:30:00.Z",
        "2027-05-14T09:30:0.5Z",
        "2027-05-14T09:30:00.5.5Z",
        "2027-05-14-01T09:30:00Z",
        "2027-05-14T09:30:1e1Z",
        "２０２７-05-14T09:30:00Z",
    ];
    for text in texts {
        assert_eq!(DateTime::parse(text), Err(DateError::Form), "{text}");
    }
}

#[test]
fn earth_rotation() {
    // Test case of `era00` in the IAU's SOFA software: JD 2454388.5 UT1.
    assert!((earth_rotation_angle(2454388.5) - 0.4022837240028158).abs() < 1e-12);
    // The same routine (through pyerfa 2.0.1.5) at 2027-05-14T09:30:00; the date itself is good to
    // 0.02 ms, 1.5e-9 rad.
    let angle = earth_rotation_angle(julian("2027-05-14T09:30:00Z"));
    assert!((angle - 0.24526710316803957).abs() < 3e-9);
}

#[test]
fn earth_rotation_is_sidereal_time_less_precession() {
    // Meeus, Example 12.a: mean sidereal time 197.693195° on 1987 April 10, 0 h. It counts from the
    // equinox, which has moved by 4612.156534″ a century (IERS Conventions (2010), eq. 5.32).
    let centuries = (2446895.5 - 2451545.0) / 36525.0;
    let precession = (0.014506 + 4612.156534 * centuries) / 3600.0;
    let angle = earth_rotation_angle(2446895.5).to_degrees();
    assert!((angle + precession - 197.693195).abs() < 2e-5);
}

#[test]
fn angle_stays_in_a_turn() {
    for date in [0.0, 2305812.5, 2451544.9999, 2451545.0, 2488069.75] {
        assert!((0.0..TAU).contains(&earth_rotation_angle(date)));
    }
}
