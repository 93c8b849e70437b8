//! Stands in for the unit table until that is here; goes with its arrival.

use super::Dimension;
impl Dimension {
    pub const NONE: Dimension = Dimension::d(0, 0, 0, 0, 0);
    pub const LENGTH: Dimension = Dimension::d(1, 0, 0, 0, 0);
    pub const AREA: Dimension = Dimension::d(2, 0, 0, 0, 0);
    pub const MASS: Dimension = Dimension::d(0, 1, 0, 0, 0);
    pub const TIME: Dimension = Dimension::d(0, 0, 1, 0, 0);
    pub const ANGLE: Dimension = Dimension::d(0, 0, 0, 0, 1);
    pub const SPEED: Dimension = Dimension::d(1, 0, -1, 0, 0);
    pub const ACCELERATION: Dimension = Dimension::d(1, 0, -2, 0, 0);
    pub const FORCE: Dimension = Dimension::d(1, 1, -2, 0, 0);
    pub const PRESSURE: Dimension = Dimension::d(-1, 1, -2, 0, 0);
    pub const DENSITY: Dimension = Dimension::d(-3, 1, 0, 0, 0);
    pub const MASS_FLOW: Dimension = Dimension::d(0, 1, -1, 0, 0);
    pub const ANGULAR_RATE: Dimension = Dimension::d(0, 0, -1, 0, 1);
    pub const GRAVITATIONAL_PARAMETER: Dimension = Dimension::d(3, 0, -2, 0, 0);
    const fn d(length: i8, mass: i8, time: i8, temperature: i8, angle: i8) -> Self {
        Dimension { length, mass, time, temperature, angle }
    }
    fn zip(self, o: Self, f: impl Fn(i8, i8) -> Option<i8>) -> Option<Self> {
        Some(Dimension::d(
            f(self.length, o.length)?,
            f(self.mass, o.mass)?,
            f(self.time, o.time)?,
            f(self.temperature, o.temperature)?,
            f(self.angle, o.angle)?,
        ))
    }
    pub fn times(self, o: Self) -> Option<Self> {
        self.zip(o, i8::checked_add)
    }
    pub fn over(self, o: Self) -> Option<Self> {
        self.zip(o, i8::checked_sub)
    }
    pub fn power(self, n: i8) -> Option<Self> {
        self.zip(self, |a, _| a.checked_mul(n))
    }
    pub fn root(self) -> Option<Self> {
        self.zip(self, |a, _| (a % 2 == 0).then_some(a / 2))
    }
    pub fn describe(self) -> String {
        format!("{self:?}")
    }
}
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Unit {
    pub dimension: Dimension,
    pub factor: f64,
    pub offset: f64,
}
impl Unit {
    pub fn to_si(&self, x: f64) -> f64 {
        x * self.factor + self.offset
    }
}
#[derive(Clone, Debug)]
pub struct UnitTable;
#[derive(Clone, Debug)]
pub struct UnitError;
impl UnitTable {
    pub fn builtin() -> Self {
        UnitTable
    }
    pub fn parse(&self, t: &str) -> Result<Unit, UnitError> {
        let u = |dimension, factor| Ok(Unit { dimension, factor, offset: 0.0 });
        match t {
            "kg" => u(Dimension::MASS, 1.0),
            "t" => u(Dimension::MASS, 1000.0),
            "kN" => u(Dimension::FORCE, 1000.0),
            "s" => u(Dimension::TIME, 1.0),
            "m" => u(Dimension::LENGTH, 1.0),
            "km" => u(Dimension::LENGTH, 1000.0),
            "m/s" => u(Dimension::SPEED, 1.0),
            "m^2" => u(Dimension::AREA, 1.0),
            "kg/s" => u(Dimension::MASS_FLOW, 1.0),
            "m/s^2" => u(Dimension::ACCELERATION, 1.0),
            "deg" => u(Dimension::ANGLE, std::f64::consts::PI / 180.0),
            "%" => u(Dimension::NONE, 0.01),
            "lbf" => u(Dimension::FORCE, 4.44),
            "lbm" => u(Dimension::MASS, 0.45),
            "rad/s" => u(Dimension::ANGULAR_RATE, 1.0),
            "m^3/s^2" => u(Dimension::GRAVITATIONAL_PARAMETER, 1.0),
            "km^3/s^2" => u(Dimension::GRAVITATIONAL_PARAMETER, 1e9),
            "kg/m^3" => u(Dimension::DENSITY, 1.0),
            "Pa" => u(Dimension::PRESSURE, 1.0),
            _ => Err(UnitError),
        }
    }
}
