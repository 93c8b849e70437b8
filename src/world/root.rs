//! Square roots that meet zero on purpose.

use crate::math::Scalar;

/// Square root that is zero, without a derivative, for zero and for what rounding left below it.
///
/// The derivative of √x does not exist at zero; a type that carries one would give infinity times zero.
pub(super) fn root<S: Scalar>(square: S) -> S {
    if square.real() > 0.0 { square.sqrt() } else { S::zero() }
}
