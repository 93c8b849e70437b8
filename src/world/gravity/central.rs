//! A point mass with zonal harmonics.

use crate::math::{Scalar, Vector};

/// Highest degree of zonal harmonic that a [`Central`] field can hold.
pub const MAX_DEGREE: usize = 4;

const ZONALS: usize = MAX_DEGREE - 1;

/// The field μ/r·[1 − Σ Jn (a/r)ⁿ Pn(sin φ)], φ the geocentric latitude and a the equatorial radius.
///
/// The sign convention is that of the unnormalised zonal coefficients Jn: W. M. Kaula, *Theory of
/// Satellite Geodesy* (1966), ch. 1.
#[derive(Clone, Copy, Debug)]
pub struct Central<S> {
    mu: S,
    equatorial_radius: S,
    /// J2, J3, …
    zonals: [S; ZONALS],
    /// How many of them are in force.
    count: usize,
}

impl<S: Scalar> Central<S> {
    /// A field of gravitational parameter `mu` (m³/s²) about a body of `equatorial_radius` (m), with the
    /// coefficients J2, J3, … in order. Those beyond [`MAX_DEGREE`] are left out.
    pub fn new(mu: S, equatorial_radius: S, zonals: &[S]) -> Self {
        let mut kept = [S::zero(); ZONALS];
        for (slot, zonal) in kept.iter_mut().zip(zonals) {
            *slot = *zonal;
        }
        Central { mu, equatorial_radius, zonals: kept, count: zonals.len().min(ZONALS) }
    }

    /// Gravitational parameter, m³/s².
    pub fn mu(&self) -> S {
        self.mu
    }

    /// Radius to which the zonal coefficients refer, m.
    pub fn equatorial_radius(&self) -> S {
        self.equatorial_radius
    }

    /// Potential in m²/s², positive; its gradient is the acceleration.
    pub fn potential(&self, position: Vector<S>) -> S {
        let r = position.length();
        let sums = self.sums(position.z() / r, self.equatorial_radius / r);
        self.mu / r * (S::one() - sums.value)
    }

    /// Acceleration in m/s².
    #[inline]
    pub fn acceleration(&self, position: Vector<S>) -> Vector<S> {
        let inverse = S::one() / position.length();
        let outward = position * inverse;
        let pull = self.mu * inverse.square();
        if self.count == 0 {
            return outward * -pull;
        }
        // With s = sin φ, grad s = (z − s·r̂)/r, so the gradient has a part along r̂ and one along z.
        let s = outward.z();
        let sums = self.sums(s, self.equatorial_radius * inverse);
        let radial = sums.radial + s * sums.slope - S::one();
        let mut acceleration = outward * (pull * radial);
        acceleration.0[2] -= pull * sums.slope;
        acceleration
    }

    /// The sums over the zonals at sin φ = `s` and a/r = `ratio`, by the recurrences of the Legendre
    /// polynomials: n·Pn = (2n−1)·s·Pn−1 − (n−1)·Pn−2 and Pn′ = s·Pn−1′ + n·Pn−1.
    #[inline]
    fn sums(&self, s: S, ratio: S) -> Sums<S> {
        let mut sums = Sums { value: S::zero(), radial: S::zero(), slope: S::zero() };
        let (mut before, mut legendre, mut slope) = (S::one(), s, S::one());
        let mut power = ratio;
        for (zonal, n) in self.zonals.iter().take(self.count).zip((2u32..).map(f64::from)) {
            let next = (s * legendre * (2.0 * n - 1.0) - before * (n - 1.0)) / n;
            slope = s * slope + legendre * n;
            (before, legendre) = (legendre, next);
            power *= ratio;
            let weight = *zonal * power;
            sums.value += weight * legendre;
            sums.radial += weight * legendre * (n + 1.0);
            sums.slope += weight * slope;
        }
        sums
    }
}

/// Σ Jn (a/r)ⁿ Pn, the same with the factor n+1, and with Pn′ in place of Pn.
struct Sums<S> {
    value: S,
    radial: S,
    slope: S,
}
