//! The units that every source may use.
//!
//! Factors from NIST Special Publication 811 (2008 edition), appendix B.8, where they are exact or
//! follow exactly from exact ones; the SI itself from NIST SP 330.

use super::{Dimension, Unit};

/// One unit of the table.
#[derive(Clone, Copy, Debug)]
pub struct Row {
    pub symbol: &'static str,
    pub dimension: Dimension,
    /// In SI: value·factor + offset.
    pub factor: f64,
    pub offset: f64,
    /// Whether it takes the prefixes of the SI.
    pub prefixes: bool,
}

impl Row {
    pub fn unit(&self) -> Unit {
        Unit {
            dimension: self.dimension,
            factor: self.factor,
            offset: self.offset,
            percent: self.symbol == "%",
        }
    }
}

const FOOT: f64 = 0.3048;
const INCH: f64 = 0.0254;
const POUND: f64 = 0.453_592_37;
/// Standard gravity (3rd CGPM, 1901).
const G0: f64 = 9.806_65;
const POUND_FORCE: f64 = POUND * G0;
const DEGREE: f64 = std::f64::consts::PI / 180.0;

const fn si(symbol: &'static str, dimension: Dimension, factor: f64) -> Row {
    Row { symbol, dimension, factor, offset: 0.0, prefixes: true }
}

const fn plain(symbol: &'static str, dimension: Dimension, factor: f64) -> Row {
    Row { symbol, dimension, factor, offset: 0.0, prefixes: false }
}

/// The table, in the order of the manual.
pub const UNITS: &[Row] = &[
    si("m", Dimension::LENGTH, 1.0),
    plain("inch", Dimension::LENGTH, INCH),
    plain("ft", Dimension::LENGTH, FOOT),
    plain("ftUS", Dimension::LENGTH, 1200.0 / 3937.0),
    plain("yd", Dimension::LENGTH, 0.9144),
    plain("mi", Dimension::LENGTH, 1609.344),
    plain("nmi", Dimension::LENGTH, 1852.0),
    plain("au", Dimension::LENGTH, 149_597_870_700.0),
    si("g", Dimension::MASS, 1e-3),
    plain("t", Dimension::MASS, 1e3),
    plain("lbm", Dimension::MASS, POUND),
    plain("ozm", Dimension::MASS, POUND / 16.0),
    plain("slug", Dimension::MASS, POUND_FORCE / FOOT),
    plain("short_ton", Dimension::MASS, 2000.0 * POUND),
    plain("long_ton", Dimension::MASS, 1_016.046_908_8),
    si("s", Dimension::TIME, 1.0),
    plain("minute", Dimension::TIME, 60.0),
    plain("hour", Dimension::TIME, 3600.0),
    plain("day", Dimension::TIME, 86_400.0),
    si("Hz", Dimension::FREQUENCY, 1.0),
    si("rad", Dimension::ANGLE, 1.0),
    plain("deg", Dimension::ANGLE, DEGREE),
    plain("arcmin", Dimension::ANGLE, DEGREE / 60.0),
    plain("arcsec", Dimension::ANGLE, DEGREE / 3600.0),
    plain("rev", Dimension::ANGLE, std::f64::consts::TAU),
    plain("rpm", Dimension::ANGULAR_RATE, std::f64::consts::TAU / 60.0),
    plain("kn", Dimension::SPEED, 1852.0 / 3600.0),
    plain("mph", Dimension::SPEED, 5280.0 * FOOT / 3600.0),
    plain("g0", Dimension::ACCELERATION, G0),
    si("N", Dimension::FORCE, 1.0),
    plain("lbf", Dimension::FORCE, POUND_FORCE),
    plain("kgf", Dimension::FORCE, G0),
    plain("tf", Dimension::FORCE, 1e3 * G0),
    si("Pa", Dimension::PRESSURE, 1.0),
    si("bar", Dimension::PRESSURE, 1e5),
    plain("atm", Dimension::PRESSURE, 101_325.0),
    plain("psi", Dimension::PRESSURE, POUND_FORCE / (INCH * INCH)),
    plain("psf", Dimension::PRESSURE, POUND_FORCE / (FOOT * FOOT)),
    si("J", Dimension::ENERGY, 1.0),
    plain("Btu", Dimension::ENERGY, 1_055.055_852_62),
    si("W", Dimension::POWER, 1.0),
    plain("hp", Dimension::POWER, 550.0 * FOOT * POUND_FORCE),
    si("L", Dimension::VOLUME, 1e-3),
    plain("gal", Dimension::VOLUME, 231.0 * INCH * INCH * INCH),
    si("K", Dimension::TEMPERATURE, 1.0),
    plain("degR", Dimension::TEMPERATURE, 5.0 / 9.0),
    Row { offset: 273.15, ..plain("degC", Dimension::TEMPERATURE, 1.0) },
    Row { offset: 459.67 * 5.0 / 9.0, ..plain("degF", Dimension::TEMPERATURE, 5.0 / 9.0) },
    plain("%", Dimension::NONE, 1e-2),
    plain("ppm", Dimension::NONE, 1e-6),
];

/// Prefixes of the SI (SP 330, table 5) that the trade has a use for.
pub const PREFIXES: &[(char, f64)] = &[
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

/// Symbols that mean several things, or that another symbol stands for here.
const ADVICE: &[(&str, &str)] = &[
    ("lb", "`lbm` is the pound of mass, `lbf` the pound of force"),
    ("lbs", "`lbm` is the pound of mass, `lbf` the pound of force"),
    ("pound", "`lbm` is the pound of mass, `lbf` the pound of force"),
    ("pounds", "`lbm` is the pound of mass, `lbf` the pound of force"),
    ("oz", "`ozm` is the ounce of mass"),
    ("ton", "`t` is the tonne, `short_ton` 2000 lbm and `long_ton` 2240 lbm"),
    ("tons", "`t` is the tonne, `short_ton` 2000 lbm and `long_ton` 2240 lbm"),
    ("tonne", "`t` is the tonne"),
    ("in", "the inch is written `inch`"),
    ("inches", "the inch is written `inch`"),
    ("feet", "the foot is written `ft`"),
    ("foot", "the foot is written `ft`"),
    ("mile", "`mi` is the statute mile, `nmi` the nautical mile"),
    ("miles", "`mi` is the statute mile, `nmi` the nautical mile"),
    ("NM", "`nmi` is the nautical mile"),
    ("min", "the minute is written `minute`"),
    ("sec", "the second is written `s`"),
    ("seconds", "the second is written `s`"),
    ("h", "the hour is written `hour`"),
    ("hr", "the hour is written `hour`"),
    ("d", "the day is written `day`"),
    ("C", "`degC` is the degree Celsius, as a reading"),
    ("F", "`degF` is the degree Fahrenheit, as a reading"),
    ("R", "`degR` is the degree Rankine"),
    ("degK", "the kelvin is written `K`"),
    ("knot", "the knot is written `kn`"),
    ("knots", "the knot is written `kn`"),
    ("kt", "`kn` is the knot; thousands of tonnes are not used here"),
    ("kts", "the knot is written `kn`"),
    ("gallon", "`gal` is the US gallon of 231 cubic inches"),
    ("cal", "the calorie has several sizes; write `J`"),
    ("degree", "the degree is written `deg`"),
    ("degrees", "the degree is written `deg`"),
    ("gs", "standard gravity is written `g0`; `g` is the gram"),
    ("gee", "standard gravity is written `g0`; `g` is the gram"),
    ("G", "standard gravity is written `g0`; `g` is the gram"),
    ("kph", "write `km/hour`"),
    ("fps", "write `ft/s`"),
    ("mps", "write `m/s`"),
    ("KG", "the kilogram is written `kg`"),
    ("Kg", "the kilogram is written `kg`"),
    ("percent", "per cent is written `%`"),
    ("psia", "`psi` counts from vacuum; there is no gauge pressure here"),
    ("psig", "`psi` counts from vacuum; there is no gauge pressure here"),
];

/// What to write instead of a symbol that is not a unit here although people use it for one.
pub fn advice(symbol: &str) -> Option<&'static str> {
    ADVICE.iter().find(|(wrong, _)| *wrong == symbol).map(|(_, right)| *right)
}
