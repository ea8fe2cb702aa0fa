//! Real roots of quadratics and cubics, from `+ - * /` and square roots alone.

/// Up to three real roots in ascending order.
#[derive(Clone, Copy, Debug, Default, PartialEq)]
pub struct Roots {
    at: [f64; 3],
    count: usize,
}

impl Roots {
    /// Adds a root; roots are added in ascending order, a fourth one is not taken.
    pub(super) fn push(&mut self, root: f64) {
        if self.count < 3 {
            self.at[self.count] = root;
            self.count += 1;
        }
    }
}

impl core::ops::Deref for Roots {
    type Target = [f64];
    fn deref(&self) -> &[f64] {
        &self.at[..self.count]
    }
}

/// Real roots of `c0 + c1 x + c2 x^2`, finite ones only.
///
/// In the form that loses no digits where the roots differ much in size, and that stays right where
/// `c2` vanishes: the second root then runs off to infinity and is left out. No root is given for a
/// constant, zero included.
#[must_use]
pub fn quadratic(c0: f64, c1: f64, c2: f64) -> Roots {
    let mut roots = Roots::default();
    let discriminant = c1 * c1 - 4.0 * c2 * c0;
    if discriminant < 0.0 || !discriminant.is_finite() {
        return roots;
    }
    let q = -0.5 * (c1 + discriminant.sqrt().copysign(c1));
    // With q = 0 both terms vanish but the leading one: a double root at 0 (or no equation at all).
    let pair = if q == 0.0 {
        if c2 == 0.0 {
            return roots;
        }
        [0.0, f64::INFINITY]
    } else {
        [c0 / q, q / c2]
    };
    let (low, high) = if pair[0] <= pair[1] { (pair[0], pair[1]) } else { (pair[1], pair[0]) };
    if low.is_finite() {
        roots.push(low);
    }
    if high.is_finite() && high > low {
        roots.push(high);
    }
    roots
}

/// The root of a function between `low` and `high`, where its values have opposite signs and its slope
/// keeps its sign: Newton's step where it stays between the bounds, halving where it does not.
pub(super) fn between(mut low: f64, mut high: f64, rising: bool, f: impl Fn(f64) -> (f64, f64)) -> f64 {
    let mut x = 0.5 * (low + high);
    // 60 halvings alone exhaust the digits of an f64 between two numbers of like size.
    for _ in 0..100 {
        let (value, slope) = f(x);
        if value == 0.0 {
            return x;
        }
        if (value > 0.0) == rising {
            high = x;
        } else {
            low = x;
        }
        let newton = x - value / slope;
        let next = if newton > low && newton < high { newton } else { 0.5 * (low + high) };
        if next == x || (next - x).abs() <= f64::EPSILON * x.abs() {
            return next;
        }
        x = next;
    }
    x
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn roots_of_different_size_keep_their_digits() {
        // (x - 1e-9)(x - 1e9): the school formula loses the small root altogether.
        let roots = quadratic(1.0, -1e9 - 1e-9, 1.0);
        assert_eq!(roots.len(), 2);
        assert!((roots[0] / 1e-9 - 1.0).abs() < 1e-12);
        assert!((roots[1] / 1e9 - 1.0).abs() < 1e-12);
    }

    #[test]
    fn a_vanishing_leading_term_leaves_the_linear_root() {
        assert_eq!(&*quadratic(-3.0, 1.5, 0.0), &[2.0]);
        assert_eq!(quadratic(-3.0, 1.5, 1e-300)[1], 2.0);
        assert_eq!(&*quadratic(-3.0, 1.5, 5e-324), &[2.0]);
        assert!(quadratic(1.0, 0.0, 0.0).is_empty());
        assert!(quadratic(0.0, 0.0, 0.0).is_empty());
    }

    #[test]
    fn double_and_missing_roots() {
        assert_eq!(&*quadratic(0.0, 0.0, 2.0), &[0.0]);
        assert_eq!(&*quadratic(4.0, -4.0, 1.0), &[2.0]);
        assert!(quadratic(1.0, 0.0, 1.0).is_empty());
        assert_eq!(&*quadratic(0.0, -3.0, 1.0), &[0.0, 3.0]);
    }

    #[test]
    fn bracketed_root_to_the_last_digit() {
        let root = between(0.0, 2.0, true, |x| (x * x * x - 2.0, 3.0 * x * x));
        assert!((root * root * root - 2.0).abs() < 4.0 * f64::EPSILON);
    }
}
