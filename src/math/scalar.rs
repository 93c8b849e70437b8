//! The number type that a flight is computed in.
//!
//! Everything in the flight is generic over [`Scalar`], so that a type that carries derivatives can
//! take the place of `f64`. Decisions (step control, branches, clamps) look at [`Scalar::real`] alone.

use std::fmt::Debug;
use std::ops::{Add, AddAssign, Div, Mul, MulAssign, Neg, Sub, SubAssign};

/// A real number, perhaps with derivatives attached.
pub trait Scalar:
    Copy
    + Debug
    + Default
    + From<f64>
    + Add<Output = Self>
    + Sub<Output = Self>
    + Mul<Output = Self>
    + Div<Output = Self>
    + Neg<Output = Self>
    + Add<f64, Output = Self>
    + Sub<f64, Output = Self>
    + Mul<f64, Output = Self>
    + Div<f64, Output = Self>
    + AddAssign
    + SubAssign
    + MulAssign
    + Send
    + Sync
    + 'static
{
    /// The value without its derivatives.
    fn real(self) -> f64;
    fn sqrt(self) -> Self;
    fn exp(self) -> Self;
    fn ln(self) -> Self;
    fn sin(self) -> Self;
    fn cos(self) -> Self;
    fn tan(self) -> Self;
    fn asin(self) -> Self;
    fn acos(self) -> Self;
    fn atan(self) -> Self;
    /// Angle of the point (`x`, `self`), in (−π, π].
    fn atan2(self, x: Self) -> Self;

    fn zero() -> Self {
        Self::from(0.0)
    }

    fn one() -> Self {
        Self::from(1.0)
    }

    fn square(self) -> Self {
        self * self
    }

    fn abs(self) -> Self {
        if self.real() < 0.0 { -self } else { self }
    }

    /// `self` to a real power, as exp(c·ln x): half the price of a general power. For `self` > 0.
    fn power(self, exponent: f64) -> Self {
        (self.ln() * exponent).exp()
    }

    fn min(self, other: Self) -> Self {
        if other.real() < self.real() { other } else { self }
    }

    fn max(self, other: Self) -> Self {
        if other.real() > self.real() { other } else { self }
    }
}

impl Scalar for f64 {
    #[inline]
    fn real(self) -> f64 {
        self
    }
    #[inline]
    fn sqrt(self) -> Self {
        // Exact to the last bit by IEEE 754, so the standard method is as portable as the library.
        f64::sqrt(self)
    }
    #[inline]
    fn exp(self) -> Self {
        libm::exp(self)
    }
    #[inline]
    fn ln(self) -> Self {
        libm::log(self)
    }
    #[inline]
    fn sin(self) -> Self {
        libm::sin(self)
    }
    #[inline]
    fn cos(self) -> Self {
        libm::cos(self)
    }
    #[inline]
    fn tan(self) -> Self {
        libm::tan(self)
    }
    #[inline]
    fn asin(self) -> Self {
        libm::asin(self)
    }
    #[inline]
    fn acos(self) -> Self {
        libm::acos(self)
    }
    #[inline]
    fn atan(self) -> Self {
        libm::atan(self)
    }
    #[inline]
    fn atan2(self, x: Self) -> Self {
        libm::atan2(self, x)
    }
}
