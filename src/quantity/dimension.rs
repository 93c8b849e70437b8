//! Physical dimensions as exponents of the base quantities, angle among them.

use serde::{Deserialize, Serialize};

/// Exponents of length, mass, time, temperature and angle.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq, Hash, Serialize, Deserialize, schemars::JsonSchema)]
pub struct Dimension {
    pub length: i8,
    pub mass: i8,
    pub time: i8,
    pub temperature: i8,
    pub angle: i8,
}

macro_rules! named {
    ($($constant:ident [$length:literal $mass:literal $time:literal $temperature:literal $angle:literal] $name:literal;)*) => {
        impl Dimension {
            $(#[doc = concat!("Dimension of ", $name, ".")]
            pub const $constant: Dimension = Dimension {
                length: $length, mass: $mass, time: $time, temperature: $temperature, angle: $angle,
            };)*
        }

        /// What the trade calls a dimension.
        const NAMES: &[(Dimension, &str)] = &[$((Dimension::$constant, $name)),*];
    };
}

named! {
    NONE [0 0 0 0 0] "a plain number";
    LENGTH [1 0 0 0 0] "length";
    MASS [0 1 0 0 0] "mass";
    TIME [0 0 1 0 0] "time";
    TEMPERATURE [0 0 0 1 0] "temperature";
    ANGLE [0 0 0 0 1] "angle";
    AREA [2 0 0 0 0] "area";
    VOLUME [3 0 0 0 0] "volume";
    SPEED [1 0 -1 0 0] "speed";
    ACCELERATION [1 0 -2 0 0] "acceleration";
    FREQUENCY [0 0 -1 0 0] "frequency";
    ANGULAR_RATE [0 0 -1 0 1] "angular rate";
    ANGULAR_ACCELERATION [0 0 -2 0 1] "angular acceleration";
    FORCE [1 1 -2 0 0] "force";
    PRESSURE [-1 1 -2 0 0] "pressure";
    DENSITY [-3 1 0 0 0] "density";
    MASS_FLOW [0 1 -1 0 0] "mass flow";
    IMPULSE [1 1 -1 0 0] "impulse";
    ENERGY [2 1 -2 0 0] "energy";
    POWER [2 1 -3 0 0] "power";
    HEAT_FLUX [0 1 -3 0 0] "heat flux";
    HEAT_LOAD [0 1 -2 0 0] "heat load";
    SPECIFIC_ENERGY [2 0 -2 0 0] "specific energy";
    SPECIFIC_ANGULAR_MOMENTUM [2 0 -1 0 0] "specific angular momentum";
    SPECIFIC_GAS_CONSTANT [2 0 -2 -1 0] "specific gas constant";
    GRAVITATIONAL_PARAMETER [3 0 -2 0 0] "gravitational parameter";
}

impl Dimension {
    /// Dimension of a product; nothing where an exponent leaves its range.
    pub fn times(self, other: Self) -> Option<Self> {
        self.with(other, i8::checked_add)
    }

    /// Dimension of a ratio; nothing where an exponent leaves its range.
    pub fn over(self, other: Self) -> Option<Self> {
        self.with(other, i8::checked_sub)
    }

    /// Dimension of a whole power; nothing where an exponent leaves its range.
    pub fn power(self, exponent: i8) -> Option<Self> {
        self.with(self, |own, _| own.checked_mul(exponent))
    }

    /// Dimension of a square root; nothing where an exponent is odd.
    pub fn root(self) -> Option<Self> {
        self.with(self, |own, _| (own % 2 == 0).then_some(own / 2))
    }

    /// What the trade calls it: "force", "mass flow".
    pub fn name(self) -> Option<&'static str> {
        NAMES.iter().find(|(dimension, _)| *dimension == self).map(|(_, name)| *name)
    }

    /// Its name with its base units, "force (kg·m/s²)"; the base units alone where it has no name.
    pub fn describe(self) -> String {
        match self.name() {
            Some(name) if self == Dimension::NONE => name.to_owned(),
            Some(name) => format!("{name} ({})", self.base_units()),
            None => self.base_units(),
        }
    }

    /// The product of SI base units, such as `kg·m/s²`.
    fn base_units(self) -> String {
        let parts = [
            ("kg", self.mass),
            ("m", self.length),
            ("s", self.time),
            ("K", self.temperature),
            ("rad", self.angle),
        ];
        let side = |sign: i16| -> Vec<String> {
            let powers = parts.iter().map(|(unit, power)| (unit, i16::from(*power) * sign));
            powers.filter(|(_, power)| *power > 0).map(|(unit, power)| raised(unit, power)).collect()
        };
        let (above, below) = (side(1), side(-1));
        let above = if above.is_empty() { "1".to_owned() } else { above.join("·") };
        match below.as_slice() {
            [] => above,
            [single] => format!("{above}/{single}"),
            several => format!("{above}/({})", several.join("·")),
        }
    }

    fn with(self, other: Self, combine: impl Fn(i8, i8) -> Option<i8>) -> Option<Self> {
        Some(Dimension {
            length: combine(self.length, other.length)?,
            mass: combine(self.mass, other.mass)?,
            time: combine(self.time, other.time)?,
            temperature: combine(self.temperature, other.temperature)?,
            angle: combine(self.angle, other.angle)?,
        })
    }
}

/// A unit with a positive power set small and high; a power of one is not shown.
fn raised(unit: &str, power: i16) -> String {
    if power == 1 {
        return unit.to_owned();
    }
    let high = ['⁰', '¹', '²', '³', '⁴', '⁵', '⁶', '⁷', '⁸', '⁹'];
    let digits = power.to_string();
    let digits = digits.chars().filter_map(|digit| high.get(digit.to_digit(10)? as usize));
    unit.chars().chain(digits.copied()).collect()
}
