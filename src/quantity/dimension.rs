//! Physical dimensions as exponents of the base quantities, angle among them.

use std::fmt;

use serde::{Deserialize, Serialize};

/// Exponents of length, mass, time, temperature and angle.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq, Hash, Serialize, Deserialize, schemars::JsonSchema)]
#[serde(deny_unknown_fields)]
pub struct Dimension {
    pub length: i8,
    pub mass: i8,
    pub time: i8,
    pub temperature: i8,
    pub angle: i8,
}

/// Dimensions that the trade has a name for: constant, name, exponents (m, kg, s, K, rad).
macro_rules! named {
    ($($constant:ident $name:literal [$l:literal $m:literal $t:literal $k:literal $a:literal];)*) => {
        impl Dimension {
            $(#[doc = $name] pub const $constant: Dimension = Dimension::of($l, $m, $t, $k, $a);)*

            const NAMED: &[(Dimension, &'static str)] = &[$((Dimension::$constant, $name)),*];
        }
    };
}

named! {
    NONE "plain number" [0 0 0 0 0];
    LENGTH "length" [1 0 0 0 0];
    AREA "area" [2 0 0 0 0];
    VOLUME "volume" [3 0 0 0 0];
    MASS "mass" [0 1 0 0 0];
    TIME "time" [0 0 1 0 0];
    TEMPERATURE "temperature" [0 0 0 1 0];
    ANGLE "angle" [0 0 0 0 1];
    SOLID_ANGLE "solid angle" [0 0 0 0 2];
    FREQUENCY "frequency" [0 0 -1 0 0];
    SPEED "speed" [1 0 -1 0 0];
    ACCELERATION "acceleration" [1 0 -2 0 0];
    ANGULAR_RATE "angular rate" [0 0 -1 0 1];
    ANGULAR_ACCELERATION "angular acceleration" [0 0 -2 0 1];
    FORCE "force" [1 1 -2 0 0];
    PRESSURE "pressure" [-1 1 -2 0 0];
    DENSITY "density" [-3 1 0 0 0];
    MASS_FLOW "mass flow" [0 1 -1 0 0];
    IMPULSE "impulse" [1 1 -1 0 0];
    ENERGY "energy" [2 1 -2 0 0];
    POWER "power" [2 1 -3 0 0];
    HEAT_FLUX "heat flux" [0 1 -3 0 0];
    SPECIFIC_ENERGY "specific energy" [2 0 -2 0 0];
    GRAVITATIONAL_PARAMETER "gravitational parameter" [3 0 -2 0 0];
    MOMENT_OF_INERTIA "moment of inertia" [2 1 0 0 0];
    VISCOSITY "dynamic viscosity" [-1 1 -1 0 0];
    VOLUME_FLOW "volume flow" [3 0 -1 0 0];
}

impl Dimension {
    const fn of(length: i8, mass: i8, time: i8, temperature: i8, angle: i8) -> Self {
        Dimension { length, mass, time, temperature, angle }
    }

    fn exponents(self) -> [i8; 5] {
        [self.length, self.mass, self.time, self.temperature, self.angle]
    }

    fn each(self, other: Self, join: impl Fn(i8, i8) -> Option<i8>) -> Option<Self> {
        let (a, b) = (self.exponents(), other.exponents());
        let join = |index: usize| join(a[index], b[index]);
        Some(Dimension::of(join(0)?, join(1)?, join(2)?, join(3)?, join(4)?))
    }

    /// Of a product; nothing where an exponent leaves its range.
    pub fn times(self, other: Self) -> Option<Self> {
        self.each(other, i8::checked_add)
    }

    /// Of a quotient; nothing where an exponent leaves its range.
    pub fn over(self, other: Self) -> Option<Self> {
        self.each(other, i8::checked_sub)
    }

    /// Of a whole power; nothing where an exponent leaves its range.
    pub fn power(self, exponent: i8) -> Option<Self> {
        self.each(self, |own, _| own.checked_mul(exponent))
    }

    /// Of a square root; nothing where an exponent is odd.
    pub fn root(self) -> Option<Self> {
        self.each(self, |own, _| (own % 2 == 0).then_some(own / 2))
    }

    /// What the trade calls it.
    pub fn name(self) -> Option<&'static str> {
        Self::NAMED.iter().find(|(dimension, _)| *dimension == self).map(|(_, name)| *name)
    }

    /// For a sentence: `force (kg·m/s²)`, `a plain number`, or the base units where it has no name.
    pub fn describe(self) -> String {
        match self.name() {
            _ if self == Dimension::NONE => "a plain number".to_owned(),
            Some(name) => format!("{name} ({self})"),
            None => self.to_string(),
        }
    }
}

/// The SI base units, such as `kg·m/s²`; `1` for a plain number.
impl fmt::Display for Dimension {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        const ORDER: [(usize, &str); 5] = [(1, "kg"), (0, "m"), (2, "s"), (3, "K"), (4, "rad")];
        let exponents = self.exponents();
        let side = |sign: i16| -> Vec<String> {
            let held = ORDER.iter().map(|(index, symbol)| (i16::from(exponents[*index]) * sign, symbol));
            held.filter(|(exponent, _)| *exponent > 0)
                .map(|(exponent, symbol)| format!("{symbol}{}", superscript(exponent)))
                .collect()
        };
        let (above, below) = (side(1), side(-1));
        let above = if above.is_empty() { "1".to_owned() } else { above.join("·") };
        match below.len() {
            0 => f.write_str(&above),
            1 => write!(f, "{above}/{}", below[0]),
            _ => write!(f, "{above}/({})", below.join("·")),
        }
    }
}

/// An exponent as raised digits; nothing for one.
fn superscript(exponent: i16) -> String {
    if exponent == 1 {
        return String::new();
    }
    let raised = |digit: char| match digit {
        '0' => '⁰',
        '1' => '¹',
        '2' => '²',
        '3' => '³',
        '4' => '⁴',
        '5' => '⁵',
        '6' => '⁶',
        '7' => '⁷',
        '8' => '⁸',
        _ => '⁹',
    };
    exponent.to_string().chars().map(raised).collect()
}
