//! Units against NIST SP 811, and laws of dimensions, products and numbers.

use proptest::prelude::*;

use super::*;

#[track_caller]
fn assert_size(unit: &str, expected: f64, tolerance: f64) {
    let found = UnitTable::builtin().parse(unit).unwrap();
    let error = (found.factor / expected - 1.0).abs();
    assert!(error <= tolerance, "{unit}: {} is {error:e} from {expected}", found.factor);
}

/// NIST SP 811 (2008 edition), Appendix B.8; the survey foot Appendix B.6. Exact definitions to the
/// rounding of a product of doubles, derived values to the digits printed.
#[test]
fn sizes_are_those_of_nist_sp_811() {
    let exact = 4.0 * f64::EPSILON;
    for (unit, size) in [
        ("ft", 0.3048),
        ("inch", 0.0254),
        ("yd", 0.9144),
        ("nmi", 1852.0),
        ("mi", 1609.344),
        ("survey_ft", 1200.0 / 3937.0),
        ("lbm", 0.453_592_37),
        ("lbf", 4.448_221_615_260_5),
        ("kgf", 9.80665),
        ("Btu", 1055.055_852_62),
        ("atm", 101_325.0),
        ("ton", 907.184_74),
        ("long_ton", 1016.046_908_8),
        ("gal", 0.003_785_411_784),
        ("g0", 9.80665),
        ("kip", 4448.221_615_260_5),
    ] {
        assert_size(unit, size, exact);
    }
    for (unit, size) in [
        ("slug", 14.593_902_937_2),
        ("psi", 6_894.757_293_17),
        ("psf", 47.880_258_980_3),
        ("lbm/ft^3", 16.018_463_374),
        ("slug/ft^3", 515.378_818_393),
        ("slug*ft^2", 1.355_817_948_33),
        ("kn", 0.514_444_444_4),
        ("survey_ft", 0.304_800_609_6),
    ] {
        assert_size(unit, size, 1e-9);
    }
    // To the rounding of the figure.
    assert_size("Btu/ft^2/s", 11_356.526_7, 0.000_05 / 11_356.0);
}

/// NIST SP 811 (2008 edition), Appendix B.8: standard gravity in feet, specific impulse as a speed
/// and as an impulse per mass.
#[test]
fn specific_impulse_in_both_systems() {
    let units = UnitTable::builtin();
    let size = |unit: &str| units.parse(unit).unwrap().factor;
    assert!((size("g0") / size("ft/s^2") - 32.174_048_556_4).abs() < 1e-9 * 32.0);
    assert!((300.0 * size("g0*s") - 2941.995).abs() < 1e-12 * 3e3);
    assert!((300.0 * size("g0*s") / size("ft/s") - 9652.214_567).abs() < 1e-6);
    assert!((300.0 * size("lbf*s/lbm") / size("N*s/kg") - 2941.995).abs() < 1e-12 * 3e3);
}

/// Free-molecular heat flux at which fairings are commonly shed: 0.1 Btu/(ft² s), about 1135 W/m².
#[test]
fn fairing_heating_limit() {
    let unit = UnitTable::builtin().parse("Btu/ft^2/s").unwrap();
    assert_eq!(unit.dimension, Dimension::HEAT_FLUX);
    assert!((unit.to_si(0.1) / 1135.653 - 1.0).abs() < 1e-4);
}

/// NASA, Mars Climate Orbiter Mishap Investigation Board, Phase I Report (1999): the factor 4.45.
#[test]
fn pound_seconds_are_not_newton_seconds() {
    let unit = UnitTable::builtin().parse("lbf*s").unwrap();
    assert_eq!(unit.dimension, Dimension::IMPULSE);
    // To the rounding of the figure.
    assert!((unit.to_si(1000.0) - 4448.22162).abs() <= 5e-6);
}

/// NIST SP 811 (2008 edition), Appendix B.8: 59 °F is 288.15 K, 518.67 °R, 15 °C.
#[test]
fn temperatures_are_readings_or_differences() {
    let units = UnitTable::builtin();
    let si = |text: &str, reading: f64| units.parse(text).unwrap().to_si(reading);
    for (unit, reading) in [("degF", 59.0), ("degR", 518.67), ("degC", 15.0), ("K", 288.15)] {
        assert!((si(unit, reading) - 288.15).abs() < 1e-12 * 300.0, "{unit}");
    }
    for text in ["degC/s", "degF^2", "W/degC", "1/degF", "degC^1"] {
        assert_eq!(units.parse(text).unwrap_err().kind, UnitErrorKind::TemperatureInProduct, "{text}");
    }
    assert_eq!(units.parse("ft*lbf/lbm/degR").unwrap().dimension, Dimension::SPECIFIC_GAS_CONSTANT);
}

#[test]
fn prefixes() {
    for (unit, size) in [("kg", 1.0), ("km", 1e3), ("mm", 1e-3), ("hPa", 100.0), ("kN", 1e3), ("GJ", 1e9)] {
        assert_size(unit, size, f64::EPSILON);
    }
    for unit in ["kft", "kdeg", "kt", "mdegC", "kkg", "k", "min"] {
        assert!(UnitTable::builtin().parse(unit).is_err(), "{unit}");
    }
}

#[test]
fn faults_name_their_factor() {
    let fault = |text: &str| {
        let fault = UnitTable::builtin().parse(text).unwrap_err();
        (text[fault.range].to_owned(), fault.kind)
    };
    assert_eq!(fault("kg/furlong^2*s"), ("furlong^2".into(), UnitErrorKind::Unknown));
    assert_eq!(fault("m/min").1, UnitErrorKind::Ambiguous("write `minute` or `arcmin`"));
    for text in ["m^0", "m^", "m^1.5", "m^x", "m^-128", "m^999", "m^2^3"] {
        assert_eq!(fault(text), (text.to_owned(), UnitErrorKind::BadPower));
    }
    for text in ["", "m/", "/m", "m//s", "m*"] {
        assert_eq!(fault(text), (String::new(), UnitErrorKind::Empty), "{text}");
    }
    assert_eq!(fault("^2"), ("^2".into(), UnitErrorKind::Empty));
    assert_eq!(fault("m^100*m^100").1, UnitErrorKind::Overflow);
    assert_eq!(fault("kN^127").1, UnitErrorKind::Overflow);
    assert_eq!(fault("1").1, UnitErrorKind::Unknown);
}

#[test]
fn own_units() {
    let mut units = UnitTable::builtin();
    let furlong = Unit::new(Dimension::LENGTH, 201.168);
    assert_eq!(units.define("furlong", furlong), Ok(()));
    assert_eq!(units.define("furlong", furlong), Err(DefineError::Twice));
    assert_eq!(units.define("kN", furlong), Err(DefineError::Builtin));
    assert_eq!(
        units.define("lb", furlong),
        Err(DefineError::Ambiguous("write `lbm` for a mass or `lbf` for a force"))
    );
    assert_eq!(units.define("nil", Unit::new(Dimension::LENGTH, 0.0)), Err(DefineError::Size));
    assert_eq!(units.parse("furlong/day").unwrap().dimension, Dimension::SPEED);
    assert!(units.symbols().any(|symbol| symbol == "furlong"));
}

#[test]
fn percent_stands_alone() {
    let units = UnitTable::builtin();
    assert!(units.parse("%").unwrap().is_percent());
    assert!(!units.parse("%/s").unwrap().is_percent());
    assert_eq!(units.parse("%").unwrap().to_si(55.0), 0.55);
}

#[test]
fn symbols_are_distinct_and_no_advice_hides_one() {
    let units = UnitTable::builtin();
    let mut symbols: Vec<_> = units.symbols().collect();
    symbols.sort_unstable();
    assert!(symbols.windows(2).all(|pair| pair[0] != pair[1]));
    for symbol in symbols {
        assert_eq!(units.advice(symbol), None, "{symbol}");
    }
}

#[test]
fn usual_units_have_their_dimension() {
    let units = UnitTable::builtin();
    for dimension in
        [Dimension::FORCE, Dimension::MASS, Dimension::HEAT_FLUX, Dimension::SPECIFIC_GAS_CONSTANT]
    {
        for unit in usual_units(dimension) {
            assert_eq!(units.parse(unit).unwrap().dimension, dimension, "{unit}");
        }
    }
    assert_eq!(System::UsCustomary.unit(Dimension::FORCE), Some("lbf"));
    assert_eq!(System::Si.unit(Dimension::FORCE), Some("kN"));
    assert_eq!(System::AsWritten.unit(Dimension::FORCE), None);
    assert_eq!(System::Si.unit(Dimension::NONE), None);
}

#[test]
fn dimensions_in_words() {
    assert_eq!(Dimension::FORCE.describe(), "force (kg·m/s²)");
    assert_eq!(Dimension::NONE.describe(), "a plain number");
    assert_eq!(Dimension::PRESSURE.describe(), "pressure (kg/(m·s²))");
    assert_eq!(Dimension::FREQUENCY.describe(), "frequency (1/s)");
    assert_eq!(Dimension::LENGTH.power(12).unwrap().describe(), "m¹²");
    assert_eq!(Dimension::LENGTH.power(i8::MIN).unwrap().describe(), "1/m¹²⁸");
    assert_eq!(Dimension::AREA.root(), Some(Dimension::LENGTH));
    assert_eq!(Dimension::VOLUME.root(), None);
    assert_eq!(Dimension::AREA.power(64), None);
}

#[test]
fn numbers_as_people_read_them() {
    let shown = |value: f64| format_si(value, &Unit::ONE, 5);
    for (value, text) in [
        (0.0, "0"),
        (-0.0, "0"),
        (43.0, "43"),
        (-0.2214, "-0.2214"),
        (6_378_137.0, "6378100"),
        (9_999_999.0, "1e7"),
        (99_999.9, "100000"),
        (0.000_123_456, "0.00012346"),
        (0.000_012_345_6, "1.2346e-5"),
        (3.986_004_418e14, "3.986e14"),
        (f64::NAN, "n/a"),
        (f64::NEG_INFINITY, "n/a"),
    ] {
        assert_eq!(shown(value), text);
    }
    let units = UnitTable::builtin();
    assert_eq!(format_si(288.15, &units.parse("degF").unwrap(), 4), "59");
}

#[test]
fn digits_of_written_numbers() {
    let digits = |text: &str| digits_written(text).map(|digits| (digits.significant, digits.last));
    assert_eq!(digits("43.0"), Some((3, 0.1)));
    assert_eq!(digits("0.047"), Some((2, 0.001)));
    assert_eq!(digits("1420"), Some((4, 1.0)));
    assert_eq!(digits("1.2e3"), Some((2, 100.0)));
    assert_eq!(digits("-11.6"), Some((3, 0.1)));
    for text in ["", ".", "-", "x", "1e", "1e99999999999999999999", "1.2.3", "NaN"] {
        assert_eq!(digits(text), None, "{text}");
    }
}

fn dimension() -> impl Strategy<Value = Dimension> {
    any::<[i8; 5]>().prop_map(|[length, mass, time, temperature, angle]| Dimension {
        length,
        mass,
        time,
        temperature,
        angle,
    })
}

proptest! {
    #[test]
    fn dividing_undoes_multiplying(left in dimension(), right in dimension()) {
        if let Some(product) = left.times(right) {
            prop_assert_eq!(product.over(right), Some(left));
        }
        if let Some(square) = left.power(2) {
            prop_assert_eq!(square.root(), Some(left));
        }
        prop_assert!(!left.describe().is_empty());
    }

    #[test]
    fn any_text_is_a_unit_or_a_fault_within_it(text in "\\PC{0,12}|[mskgNd%1/*^0-9-]{0,16}") {
        match UnitTable::builtin().parse(&text) {
            Ok(unit) => prop_assert!(unit.factor.is_finite() && unit.factor > 0.0),
            Err(fault) => prop_assert!(text.get(fault.range).is_some()),
        }
        digits_written(&text);
    }

    #[test]
    fn shown_numbers_are_the_value_to_their_digits(value in any::<f64>(), digits in 1_usize..17) {
        let shown = format_si(value, &Unit::ONE, digits);
        if value.is_normal() && value.abs() < 1e300 {
            let read: f64 = shown.parse().unwrap();
            let half = 0.5 * 10_f64.powi(1 - digits as i32);
            prop_assert!((read - value).abs() <= value.abs() * (half + f64::EPSILON));
        }
    }
}
