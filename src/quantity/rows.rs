//! The built-in units.
//!
//! Conversion factors: NIST Special Publication 811 (2008 edition), Appendix B.8, where each is
//! exact unless noted. Derived ones are written as the product that defines them.

use super::{Dimension, Unit};

/// One built-in unit.
#[derive(Clone, Copy, Debug)]
pub struct Row {
    pub symbol: &'static str,
    pub dimension: Dimension,
    /// Size in SI units.
    pub factor: f64,
    /// SI value of the reading zero.
    pub offset: f64,
    /// Whether it takes SI prefixes.
    pub prefixes: bool,
}

const FOOT: f64 = 0.3048;
const INCH: f64 = 0.0254;
const POUND: f64 = 0.453_592_37;
/// Standard gravity, m/s²: 3rd CGPM (1901); NIST SP 330 (2019 edition).
const STANDARD_GRAVITY: f64 = 9.806_65;
const POUND_FORCE: f64 = POUND * STANDARD_GRAVITY;
const DEGREE: f64 = std::f64::consts::PI / 180.0;
const RANKINE: f64 = 5.0 / 9.0;

const fn si(symbol: &'static str, dimension: Dimension, factor: f64) -> Row {
    Row { symbol, dimension, factor, offset: 0.0, prefixes: true }
}

const fn plain(symbol: &'static str, dimension: Dimension, factor: f64) -> Row {
    Row { symbol, dimension, factor, offset: 0.0, prefixes: false }
}

const fn reading(symbol: &'static str, factor: f64, offset: f64) -> Row {
    Row { symbol, dimension: Dimension::TEMPERATURE, factor, offset, prefixes: false }
}

/// Every built-in unit, in the order of the manual.
pub(super) static ROWS: &[Row] = &[
    si("m", Dimension::LENGTH, 1.0),
    si("g", Dimension::MASS, 1e-3),
    plain("t", Dimension::MASS, 1e3),
    si("s", Dimension::TIME, 1.0),
    plain("minute", Dimension::TIME, 60.0),
    plain("hour", Dimension::TIME, 3600.0),
    plain("day", Dimension::TIME, 86_400.0),
    si("K", Dimension::TEMPERATURE, 1.0),
    reading("degC", 1.0, 273.15),
    si("rad", Dimension::ANGLE, 1.0),
    plain("deg", Dimension::ANGLE, DEGREE),
    plain("arcmin", Dimension::ANGLE, DEGREE / 60.0),
    plain("arcsec", Dimension::ANGLE, DEGREE / 3600.0),
    plain("turn", Dimension::ANGLE, 2.0 * std::f64::consts::PI),
    plain("rpm", Dimension::ANGULAR_RATE, std::f64::consts::PI / 30.0),
    si("Hz", Dimension::FREQUENCY, 1.0),
    si("N", Dimension::FORCE, 1.0),
    si("Pa", Dimension::PRESSURE, 1.0),
    si("bar", Dimension::PRESSURE, 1e5),
    plain("atm", Dimension::PRESSURE, 101_325.0),
    si("J", Dimension::ENERGY, 1.0),
    si("W", Dimension::POWER, 1.0),
    si("L", Dimension::VOLUME, 1e-3),
    plain("%", Dimension::NONE, 0.01),
    plain("g0", Dimension::ACCELERATION, STANDARD_GRAVITY),
    plain("kgf", Dimension::FORCE, STANDARD_GRAVITY),
    // IAU 2012 Resolution B2.
    plain("au", Dimension::LENGTH, 149_597_870_700.0),
    plain("inch", Dimension::LENGTH, INCH),
    plain("ft", Dimension::LENGTH, FOOT),
    plain("yd", Dimension::LENGTH, 3.0 * FOOT),
    plain("mi", Dimension::LENGTH, 5280.0 * FOOT),
    plain("nmi", Dimension::LENGTH, 1852.0),
    // NIST SP 811 (2008 edition), Appendix B.6.
    plain("survey_ft", Dimension::LENGTH, 1200.0 / 3937.0),
    plain("kn", Dimension::SPEED, 1852.0 / 3600.0),
    plain("lbm", Dimension::MASS, POUND),
    plain("slug", Dimension::MASS, POUND_FORCE / FOOT),
    plain("ton", Dimension::MASS, 2000.0 * POUND),
    plain("long_ton", Dimension::MASS, 2240.0 * POUND),
    plain("lbf", Dimension::FORCE, POUND_FORCE),
    plain("kip", Dimension::FORCE, 1000.0 * POUND_FORCE),
    plain("psi", Dimension::PRESSURE, POUND_FORCE / (INCH * INCH)),
    plain("psf", Dimension::PRESSURE, POUND_FORCE / (FOOT * FOOT)),
    plain("degR", Dimension::TEMPERATURE, RANKINE),
    reading("degF", RANKINE, 459.67 * RANKINE),
    // International Table Btu.
    plain("Btu", Dimension::ENERGY, 1055.055_852_62),
    // U.S. liquid gallon, 231 cubic inches.
    plain("gal", Dimension::VOLUME, 231.0 * INCH * INCH * INCH),
];

/// SI prefixes that units take.
const PREFIXES: &[(char, f64)] = &[
    ('T', 1e12),
    ('G', 1e9),
    ('M', 1e6),
    ('k', 1e3),
    ('h', 1e2),
    ('d', 1e-1),
    ('c', 1e-2),
    ('m', 1e-3),
    ('u', 1e-6),
    ('n', 1e-9),
    ('p', 1e-12),
];

/// Symbols that have more than one meaning, or another name here.
const ADVICE: &[(&str, &str)] = &[
    ("lb", "write `lbm` for a mass or `lbf` for a force"),
    ("lbs", "write `lbm` for a mass or `lbf` for a force"),
    ("pound", "write `lbm` for a mass or `lbf` for a force"),
    ("pounds", "write `lbm` for a mass or `lbf` for a force"),
    ("oz", "write a mass in `lbm` or `g`, a volume in `gal` or `L`"),
    ("gallon", "write `gal` for the U.S. gallon, or `L`"),
    ("tonne", "write `t`"),
    ("tons", "write `t` for 1000 kg, `ton` for 2000 lbm, `long_ton` for 2240 lbm"),
    ("min", "write `minute` or `arcmin`"),
    ("sec", "write `s` or `arcsec`"),
    ("second", "write `s` or `arcsec`"),
    ("seconds", "write `s` or `arcsec`"),
    ("h", "write `hour`"),
    ("hr", "write `hour`"),
    ("hours", "write `hour`"),
    ("d", "write `day` or `deg`"),
    ("days", "write `day`"),
    ("minutes", "write `minute` or `arcmin`"),
    ("in", "write `inch`"),
    ("inches", "write `inch`"),
    ("foot", "write `ft`, or `survey_ft` for the retired U.S. survey foot"),
    ("feet", "write `ft`, or `survey_ft` for the retired U.S. survey foot"),
    ("mile", "write `mi` or `nmi`"),
    ("miles", "write `mi` or `nmi`"),
    ("NM", "write `nmi`"),
    ("kt", "write `kn` for a speed; a thousand tonnes are `1000 t`"),
    ("kts", "write `kn`"),
    ("knot", "write `kn`"),
    ("knots", "write `kn`"),
    ("mph", "write `mi/hour`"),
    ("kph", "write `km/hour`"),
    ("fps", "write `ft/s`"),
    ("C", "write `degC` for a temperature"),
    ("F", "write `degF` for a temperature"),
    ("R", "write `degR` for a temperature"),
    ("degK", "write `K`"),
    ("degree", "write `deg`"),
    ("degrees", "write `deg`"),
    ("rev", "write `turn`"),
    ("G", "write `g0` for standard gravity"),
    ("gee", "write `g0` for standard gravity"),
    ("cal", "there are several calories: write `J`"),
    ("kcal", "there are several calories: write `J`"),
    ("BTU", "write `Btu`, the International Table one"),
    ("hp", "there are several horsepowers: write `W`"),
    ("psia", "write `psi`; every pressure is absolute"),
    ("psig", "write `psi`; every pressure is absolute"),
    ("l", "write `L`"),
];

impl Row {
    fn unit(&self) -> Unit {
        Unit {
            dimension: self.dimension,
            factor: self.factor,
            offset: self.offset,
            percent: self.symbol == "%",
        }
    }
}

/// The built-in unit of a symbol, perhaps with a prefix.
pub(super) fn find(symbol: &str) -> Option<Unit> {
    let row = |symbol: &str| ROWS.iter().find(|row| row.symbol == symbol);
    if let Some(row) = row(symbol) {
        return Some(row.unit());
    }
    let mut characters = symbol.chars();
    let first = characters.next()?;
    let (_, size) = PREFIXES.iter().find(|(prefix, _)| *prefix == first)?;
    let row = row(characters.as_str()).filter(|row| row.prefixes)?;
    // A gram is the one base whose own factor is a prefix too: `kg` has to be exactly one.
    let factor = if symbol == "kg" { 1.0 } else { row.factor * size };
    Some(Unit { factor, ..row.unit() })
}

/// What to write instead of a symbol with several meanings or another name here.
pub(super) fn advice(symbol: &str) -> Option<&'static str> {
    ADVICE.iter().find(|(known, _)| *known == symbol).map(|(_, advice)| *advice)
}
