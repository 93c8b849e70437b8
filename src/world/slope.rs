//! A number with one derivative, to test that what is generic over `Scalar` carries it rightly.

use std::ops::{Add, AddAssign, Div, Mul, MulAssign, Neg, Sub, SubAssign};

use crate::math::Scalar;

#[derive(Clone, Copy, Debug, Default)]
pub(super) struct Slope {
    pub(super) value: f64,
    pub(super) slope: f64,
}

impl Slope {
    pub(super) fn variable(value: f64) -> Self {
        Slope { value, slope: 1.0 }
    }

    fn with(self, value: f64, factor: f64) -> Self {
        Slope { value, slope: self.slope * factor }
    }
}

/// Asserts that the derivative of `f` at `x` is that of central differences over `step`, to `tolerance`
/// of its size (or of one, if that is larger).
#[track_caller]
pub(super) fn assert_slope(f: impl Fn(Slope) -> Slope, x: f64, step: f64, tolerance: f64) {
    let carried = f(Slope::variable(x)).slope;
    let ends = [f(Slope::from(x + step)).value, f(Slope::from(x - step)).value];
    let difference = (ends[0] - ends[1]) / (2.0 * step);
    let miss = (carried - difference).abs();
    assert!(miss <= tolerance * difference.abs(), "{carried} carried, {difference} by differences");
}

impl From<f64> for Slope {
    fn from(value: f64) -> Self {
        Slope { value, slope: 0.0 }
    }
}

impl Neg for Slope {
    type Output = Self;
    fn neg(self) -> Self {
        self.with(-self.value, -1.0)
    }
}

impl Add for Slope {
    type Output = Self;
    fn add(self, other: Self) -> Self {
        Slope { value: self.value + other.value, slope: self.slope + other.slope }
    }
}

impl Sub for Slope {
    type Output = Self;
    fn sub(self, other: Self) -> Self {
        self + -other
    }
}

impl Mul for Slope {
    type Output = Self;
    fn mul(self, other: Self) -> Self {
        Slope { value: self.value * other.value, slope: self.slope * other.value + self.value * other.slope }
    }
}

impl Div for Slope {
    type Output = Self;
    fn div(self, other: Self) -> Self {
        let value = self.value / other.value;
        Slope { value, slope: (self.slope - value * other.slope) / other.value }
    }
}

macro_rules! with_real {
    ($($trait:ident $method:ident)*) => {$(
        impl $trait<f64> for Slope {
            type Output = Self;
            fn $method(self, other: f64) -> Self {
                $trait::$method(self, Slope::from(other))
            }
        }
    )*};
}

with_real! { Add add Sub sub Mul mul Div div }

macro_rules! assigning {
    ($($trait:ident $method:ident $operator:tt)*) => {$(
        impl $trait for Slope {
            fn $method(&mut self, other: Self) {
                *self = *self $operator other;
            }
        }
    )*};
}

assigning! { AddAssign add_assign + SubAssign sub_assign - MulAssign mul_assign * }

impl Scalar for Slope {
    fn real(self) -> f64 {
        self.value
    }
    fn sqrt(self) -> Self {
        let root = self.value.sqrt();
        self.with(root, 0.5 / root)
    }
    fn exp(self) -> Self {
        let value = Scalar::exp(self.value);
        self.with(value, value)
    }
    fn ln(self) -> Self {
        self.with(Scalar::ln(self.value), 1.0 / self.value)
    }
    fn sin(self) -> Self {
        self.with(Scalar::sin(self.value), Scalar::cos(self.value))
    }
    fn cos(self) -> Self {
        self.with(Scalar::cos(self.value), -Scalar::sin(self.value))
    }
    fn tan(self) -> Self {
        let tan = Scalar::tan(self.value);
        self.with(tan, 1.0 + tan * tan)
    }
    fn asin(self) -> Self {
        self.with(Scalar::asin(self.value), 1.0 / (1.0 - self.value * self.value).sqrt())
    }
    fn acos(self) -> Self {
        self.with(Scalar::acos(self.value), -1.0 / (1.0 - self.value * self.value).sqrt())
    }
    fn atan(self) -> Self {
        self.with(Scalar::atan(self.value), 1.0 / (1.0 + self.value * self.value))
    }
    fn atan2(self, x: Self) -> Self {
        let square = self.value * self.value + x.value * x.value;
        Slope {
            value: Scalar::atan2(self.value, x.value),
            slope: (self.slope * x.value - self.value * x.slope) / square,
        }
    }
}
