//! Roots of a function of one variable.

/// The root of a continuous function between `a` and `b`, where its values have different signs, to
/// the resolution of the numbers.
///
/// I. F. D. Oliveira, R. H. C. Takahashi, *An Enhancement of the Bisection Method Average Performance
/// Preserving Minmax Optimality*, ACM Transactions on Mathematical Software 47 (2020), method ITP
/// with κ₁ = 0.2/(b − a), κ₂ = 2, n₀ = 1.
pub fn root(mut a: f64, mut b: f64, mut f: impl FnMut(f64) -> f64) -> f64 {
    let (mut at_a, mut at_b) = (f(a), f(b));
    if at_a == 0.0 {
        return a;
    }
    if at_b == 0.0 || (at_a > 0.0) == (at_b > 0.0) {
        return b;
    }
    let precision = 2.0 * f64::EPSILON * a.abs().max(b.abs()).max(f64::MIN_POSITIVE);
    let truncation = 0.2 / (b - a);
    let bisections = libm::ceil(libm::log2((b - a) / (2.0 * precision))).max(0.0) + 1.0;
    let mut radius = precision * libm::exp2(bisections);
    // ITP needs one step more than bisection at the most; the cap only guards against a rounding.
    for _ in 0..200 {
        if b - a <= 2.0 * precision {
            break;
        }
        let middle = 0.5 * (a + b);
        let falsi = (at_b * a - at_a * b) / (at_b - at_a);
        let side = if middle >= falsi { 1.0 } else { -1.0 };
        let shift = truncation * (b - a) * (b - a);
        let truncated = if shift <= (middle - falsi).abs() { falsi + side * shift } else { middle };
        let reach = (radius - 0.5 * (b - a)).max(0.0);
        let trial = if (truncated - middle).abs() <= reach { truncated } else { middle - side * reach };
        let trial = if trial > a && trial < b { trial } else { middle };
        let value = f(trial);
        if value == 0.0 || trial == a || trial == b {
            return trial;
        }
        if (value > 0.0) == (at_b > 0.0) {
            (b, at_b) = (trial, value);
        } else {
            (a, at_a) = (trial, value);
        }
        radius *= 0.5;
    }
    if at_a.abs() < at_b.abs() { a } else { b }
}
