//! Conversion factors against NIST Special Publication 811 (2008 edition), appendix B.8, from memory;
//! each was recomputed from the definitions of the foot, the pound and standard gravity.

use proptest::prelude::*;

use super::*;

fn si(value: f64, unit: &str) -> f64 {
    UnitTable::builtin().parse(unit).unwrap().to_si(value)
}

#[track_caller]
fn close(found: f64, expected: f64, relative: f64) {
    assert!((found - expected).abs() <= relative * expected.abs(), "{found} against {expected}");
}

#[test]
fn lengths() {
    close(si(1.0, "ft"), 0.3048, 1e-16);
    close(si(1.0, "inch"), 0.0254, 1e-16);
    close(si(1.0, "nmi"), 1852.0, 0.0);
    close(si(1.0, "mi"), 1609.344, 1e-15);
    // 1200/3937 m; withdrawn at the end of 2022 (Federal Register 85 FR 62698).
    close(si(1.0, "ftUS"), 0.304_800_609_6, 1e-10);
}

#[test]
fn masses_and_forces() {
    close(si(1.0, "lbm"), 0.453_592_37, 1e-16);
    close(si(1.0, "lbf"), 4.448_221_615_260_5, 1e-15);
    close(si(1.0, "kgf"), 9.80665, 0.0);
    close(si(1.0, "slug"), 14.593_902_937_2, 1e-11);
    close(si(1.0, "short_ton"), 907.184_74, 1e-15);
    close(si(1.0, "long_ton"), 1_016.046_908_8, 1e-15);
    // Impulse of 1000 lbf·s read as N·s: the factor of the Mars Climate Orbiter Mishap Investigation
    // Board's Phase I Report (1999).
    close(si(1000.0, "lbf*s"), 4_448.221_62, 2e-9);
}

#[test]
fn pressures_and_densities() {
    close(si(1.0, "psi"), 6_894.757_293_17, 1e-11);
    close(si(1.0, "psf"), 47.880_258_980_3, 1e-11);
    close(si(1.0, "atm"), 101_325.0, 0.0);
    close(si(1.0, "lbm/ft^3"), 16.018_463_374, 1e-10);
    close(si(1.0, "slug/ft^3"), 515.378_818_393, 1e-11);
    close(si(1.0, "slug*ft^2"), 1.355_817_948_33, 1e-11);
}

#[test]
fn heat_speed_and_volume() {
    close(si(1.0, "Btu"), 1_055.055_852_62, 1e-15);
    close(si(1.0, "Btu/ft^2/s"), 11_356.526_7, 1e-8);
    // The customary limit of free-molecular heating at fairing release, 0.1 Btu/(ft²·s).
    close(si(0.1, "Btu/ft^2/s"), 1135.653, 1e-6);
    close(si(1.0, "kn"), 0.514_444_444_4, 1e-10);
    close(si(1.0, "gal"), 0.003_785_411_784, 1e-15);
    close(si(1.0, "g0") / 0.3048, 32.174_048_556_4, 1e-11);
}

#[test]
fn temperatures_are_readings() {
    close(si(59.0, "degF"), 288.15, 1e-15);
    close(si(518.67, "degR"), 288.15, 1e-15);
    close(si(15.0, "degC"), 288.15, 0.0);
    let error = UnitTable::builtin().parse("W/degC").unwrap_err();
    assert_eq!((error.start, error.end, error.kind), (2, 6, UnitErrorKind::TemperatureInProduct));
}

/// Isp of 300 s is an exhaust speed of 2941.995 m/s, and as many N·s a kilogram.
#[test]
fn specific_impulse() {
    close(si(300.0, "s") * si(1.0, "g0"), 2941.995, 1e-15);
    close(si(300.0, "lbf*s/lbm"), 2941.995, 1e-14);
    close(si(2941.995, "m/s") / si(1.0, "ft/s"), 9_652.214_567, 1e-9);
}

#[test]
fn prefixes_and_products() {
    close(si(3.0, "km"), 3000.0, 0.0);
    close(si(3.0, "mbar"), 300.0, 1e-15);
    close(si(1.0, "km^2/s^2"), 1e6, 0.0);
    close(si(2.0, "m*s^-1"), 2.0, 0.0);
    close(si(5.0, "1/s"), 5.0, 0.0);
    close(si(12.0, "%"), 0.12, 1e-16);
    close(si(180.0, "deg"), std::f64::consts::PI, 1e-16);
    let table = UnitTable::builtin();
    assert_eq!(table.parse("W/m^2").unwrap().dimension, Dimension::HEAT_FLUX);
    assert!(table.parse("kinch").is_err() && table.parse("k%").is_err());
}

#[test]
fn errors_point_at_the_factor() {
    let table = UnitTable::builtin();
    let error = |text: &str| table.parse(text).unwrap_err();
    assert_eq!(error("kN/furlong").start, 3);
    assert_eq!(error("kN/furlong").kind, UnitErrorKind::Unknown("furlong".to_owned()));
    assert!(matches!(error("lb").kind, UnitErrorKind::Ambiguous(_, _)));
    assert_eq!(error("m^x").kind, UnitErrorKind::BadPower);
    assert_eq!(error("m//s").kind, UnitErrorKind::Empty);
    assert_eq!(error("m^99*m^99").kind, UnitErrorKind::Overflow);
    assert_eq!(error("").kind, UnitErrorKind::Empty);
}

#[test]
fn a_source_may_define_units() {
    let mut table = UnitTable::builtin();
    assert!(table.define("smoot", Unit { factor: 1.7018, ..table.parse("m").unwrap() }));
    assert!(!table.define("smoot", Unit::ONE) && !table.define("kg", Unit::ONE));
    close(table.parse("smoot/s").unwrap().factor, 1.7018, 0.0);
}

#[test]
fn dimensions_have_names() {
    assert_eq!(Dimension::FORCE.describe(), "force (kg·m/s²)");
    assert_eq!(Dimension::NONE.describe(), "a plain number");
    assert_eq!(Dimension::PRESSURE.to_string(), "kg/(m·s²)");
    assert_eq!(Dimension::FREQUENCY.to_string(), "1/s");
    assert_eq!(Dimension::LENGTH.power(4).unwrap().describe(), "m⁴");
    assert_eq!(Dimension::AREA.root(), Some(Dimension::LENGTH));
    assert_eq!(Dimension::LENGTH.root(), None);
    assert_eq!(Dimension { length: 127, ..Dimension::NONE }.times(Dimension::LENGTH), None);
}

#[test]
fn numbers_are_rounded_by_significance() {
    assert_eq!(format_number(43.04, 3), "43");
    assert_eq!(format_number(9.996, 3), "10");
    assert_eq!(format_number(0.001_234_56, 3), "0.00123");
    assert_eq!(format_number(123_456.7, 4), "123457");
    assert_eq!(format_number(1.5e-7, 3), "1.5e-7");
    assert_eq!(format_number(3.986_004_418e14, 10), "3.986004418e14");
    assert_eq!(format_number(-0.0, 3), "0");
    assert_eq!(format_number(f64::NAN, 3), "n/a");
    assert_eq!(format_fixed(-0.001, 2), "0.00");
    assert_eq!(format_si(43_000.0, &UnitTable::builtin().parse("kN").unwrap(), 4), "43");
}

#[test]
fn digits_as_written() {
    let written = |text: &str| digits_written(text).map(|written| (written.significant, written.last));
    assert_eq!(written("43.0"), Some((3, 0.1)));
    assert_eq!(written("-0.0120"), Some((3, 1e-4)));
    assert_eq!(written("1.5e3"), Some((2, 100.0)));
    assert_eq!(written("x"), None);
}

#[test]
fn symbols_are_told_apart() {
    let table = UnitTable::builtin();
    for row in table.rows() {
        // A prefix before a unit never spells another unit of the table that would hide it.
        assert_eq!(table.find(row.symbol).unwrap(), row.unit(), "{}", row.symbol);
        assert_eq!(advice(row.symbol), None, "{}", row.symbol);
    }
}

proptest! {
    #[test]
    fn any_text_is_a_unit_or_an_error_within_it(text in "[a-zA-Z0-9/*^%-]{0,12}") {
        if let Err(error) = UnitTable::builtin().parse(&text) {
            prop_assert!(error.start <= error.end && error.end <= text.len());
        }
    }

    #[test]
    fn formatting_keeps_the_value(value in -1e9_f64..1e9) {
        let read: f64 = format_number(value, 9).parse().unwrap();
        prop_assert!((read - value).abs() <= 1e-8 * value.abs());
    }
}

#[test]
fn products_beyond_the_range_of_numbers_overflow() {
    for text in ["Tm^20*Tm^20", "pm^20*pm^20", "pm/Tm^26", "Tm^20/pm^20"] {
        let error = UnitTable::builtin().parse(text).map_err(|error| error.kind);
        assert_eq!(error, Err(UnitErrorKind::Overflow), "{text}");
    }
}

#[test]
fn digits_of_extreme_exponents() {
    assert_eq!(digits_written("1.5e-2147483648").map(|written| written.last), Some(0.0));
    assert_eq!(digits_written("1e99999999999"), None);
    assert_eq!(digits_written("."), None);
}
