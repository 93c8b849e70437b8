//! Vectors of three components.

use std::ops::{Add, Mul, Neg, Sub};

use super::Scalar;

/// A vector in three dimensions.
#[derive(Clone, Copy, Debug, Default, PartialEq)]
pub struct Vector<S>(pub [S; 3]);

impl<S: Scalar> Vector<S> {
    pub fn new(x: S, y: S, z: S) -> Self {
        Vector([x, y, z])
    }

    pub fn zero() -> Self {
        Vector([S::zero(); 3])
    }

    pub fn x(self) -> S {
        self.0[0]
    }

    pub fn y(self) -> S {
        self.0[1]
    }

    pub fn z(self) -> S {
        self.0[2]
    }

    pub fn dot(self, other: Self) -> S {
        self.0[0] * other.0[0] + self.0[1] * other.0[1] + self.0[2] * other.0[2]
    }

    pub fn cross(self, other: Self) -> Self {
        let ([a, b, c], [d, e, f]) = (self.0, other.0);
        Vector([b * f - c * e, c * d - a * f, a * e - b * d])
    }

    /// Length of the vector. At zero length its derivative does not exist.
    pub fn length(self) -> S {
        self.dot(self).sqrt()
    }

    /// The vector divided by its length, or nothing if the length is zero.
    pub fn unit(self) -> Option<Self> {
        let length = self.length();
        (length.real() > 0.0).then(|| self * (S::one() / length))
    }
}

impl<S: Scalar> Add for Vector<S> {
    type Output = Self;
    fn add(self, other: Self) -> Self {
        Vector([self.0[0] + other.0[0], self.0[1] + other.0[1], self.0[2] + other.0[2]])
    }
}

impl<S: Scalar> Sub for Vector<S> {
    type Output = Self;
    fn sub(self, other: Self) -> Self {
        Vector([self.0[0] - other.0[0], self.0[1] - other.0[1], self.0[2] - other.0[2]])
    }
}

impl<S: Scalar> Mul<S> for Vector<S> {
    type Output = Self;
    fn mul(self, factor: S) -> Self {
        Vector([self.0[0] * factor, self.0[1] * factor, self.0[2] * factor])
    }
}

impl<S: Scalar> Neg for Vector<S> {
    type Output = Self;
    fn neg(self) -> Self {
        Vector([-self.0[0], -self.0[1], -self.0[2]])
    }
}
