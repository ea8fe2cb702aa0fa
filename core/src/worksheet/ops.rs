//! The functions that formulas may use: from `libm`, so that every device gives the same digits.

/// The ratio of a circle's circumference to its diameter.
pub use core::f64::consts::PI;

/// Square root (correctly rounded everywhere).
#[must_use]
pub fn sqrt(x: f64) -> f64 {
    libm::sqrt(x)
}

/// `x` to the power `y`. Squares and cubes are plain products: they are most of what formulas need, and
/// a general power takes far longer.
#[must_use]
pub fn pow(x: f64, y: f64) -> f64 {
    if y == 2.0 {
        x * x
    } else if y == 3.0 {
        x * x * x
    } else {
        libm::pow(x, y)
    }
}

/// The smaller of two.
#[must_use]
pub fn min(a: f64, b: f64) -> f64 {
    libm::fmin(a, b)
}

/// The larger of two.
#[must_use]
pub fn max(a: f64, b: f64) -> f64 {
    libm::fmax(a, b)
}

/// Tangent of an angle in degrees.
#[must_use]
pub fn tan_deg(x: f64) -> f64 {
    libm::tan(x.to_radians())
}

/// The greatest whole number that is not above `x`.
#[must_use]
pub fn floor(x: f64) -> f64 {
    libm::floor(x)
}
