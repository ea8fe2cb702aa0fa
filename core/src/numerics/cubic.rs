//! A cubic polynomial written about a point.

use super::roots::{Roots, between, quadratic};
use core::ops::{Add, AddAssign, Mul, Sub};

/// `c0 + c1 t + c2 t^2 + c3 t^3`, with `t` counted from the point about which it is written.
#[derive(Clone, Copy, Debug, Default, PartialEq)]
pub struct Cubic(pub [f64; 4]);

impl Cubic {
    /// Zero everywhere.
    pub const ZERO: Self = Self([0.0; 4]);

    /// The same value everywhere.
    #[must_use]
    pub const fn constant(value: f64) -> Self {
        Self([value, 0.0, 0.0, 0.0])
    }

    /// A straight line.
    #[must_use]
    pub const fn line(value: f64, slope: f64) -> Self {
        Self([value, slope, 0.0, 0.0])
    }

    /// Whether it is a straight line.
    #[must_use]
    pub fn is_straight(&self) -> bool {
        self.0[2] == 0.0 && self.0[3] == 0.0
    }

    /// Value at `t`.
    #[must_use]
    pub fn at(&self, t: f64) -> f64 {
        let [c0, c1, c2, c3] = self.0;
        c0 + t * (c1 + t * (c2 + t * c3))
    }

    /// Slope at `t`.
    #[must_use]
    pub fn slope_at(&self, t: f64) -> f64 {
        let [_, c1, c2, c3] = self.0;
        c1 + t * (2.0 * c2 + t * 3.0 * c3)
    }

    /// The same polynomial written about the point `t`.
    #[must_use]
    pub fn about(&self, t: f64) -> Self {
        let [_, _, c2, c3] = self.0;
        Self([self.at(t), self.slope_at(t), c2 + 3.0 * c3 * t, c3])
    }

    /// The polynomial run through backwards: `t` becomes `-t`.
    #[must_use]
    pub fn mirrored(&self) -> Self {
        let [c0, c1, c2, c3] = self.0;
        Self([c0, -c1, c2, -c3])
    }

    /// Exact integral from 0 to `t`.
    #[must_use]
    pub fn integral(&self, t: f64) -> f64 {
        let [c0, c1, c2, c3] = self.0;
        t * (c0 + t * (c1 / 2.0 + t * (c2 / 3.0 + t * c3 / 4.0)))
    }

    /// Coefficients in Bernstein's form on `0..h`: the values in between lie between the least and the
    /// largest of them.
    #[must_use]
    pub fn bernstein(&self, h: f64) -> [f64; 4] {
        let [c0, c1, c2, _] = self.0;
        let (d1, d2) = (c1 * h / 3.0, c2 * h * h / 3.0);
        [c0, c0 + d1, c0 + 2.0 * d1 + d2, self.at(h)]
    }

    /// Bounds of the values on `0..=h`: exact for a straight line, safe for others.
    #[must_use]
    pub fn bounds(&self, h: f64) -> (f64, f64) {
        let [a, b, c, d] = self.bernstein(h);
        (a.min(b).min(c.min(d)), a.max(b).max(c.max(d)))
    }

    /// Where the slope vanishes strictly between 0 and `h`, ascending.
    #[must_use]
    pub fn stationary(&self, h: f64) -> Roots {
        let mut inside = Roots::default();
        if self.is_straight() || h <= 0.0 {
            return inside;
        }
        // In parts of h, so that all terms have the unit of the value and none is lost by its scale.
        let [_, c1, c2, c3] = self.0;
        for &s in quadratic(c1 * h, 2.0 * c2 * h * h, 3.0 * c3 * h * h * h).iter() {
            if s > 0.0 && s < 1.0 {
                inside.push(s * h);
            }
        }
        inside
    }

    /// Where the value changes its sign strictly between 0 and `h`, ascending. A root at which it only
    /// touches zero is no change of sign.
    #[must_use]
    pub fn sign_changes(&self, h: f64) -> Roots {
        let mut found = Roots::default();
        if h <= 0.0 {
            return found;
        }
        let turns = self.stationary(h);
        let (mut from, mut before, mut zero) = (0.0, self.0[0], None);
        for to in turns.iter().copied().chain(core::iter::once(h)) {
            let after = self.at(to);
            if after == 0.0 {
                // A turning point exactly at zero: whether the sign changes there shows beyond it.
                zero = Some(to);
            } else {
                if before * after < 0.0 {
                    let rising = after > 0.0;
                    found.push(
                        zero.unwrap_or_else(|| between(from, to, rising, |t| (self.at(t), self.slope_at(t)))),
                    );
                }
                before = after;
                zero = None;
            }
            from = to;
        }
        found
    }
}

impl Add for Cubic {
    type Output = Self;
    fn add(self, o: Self) -> Self {
        Self([self.0[0] + o.0[0], self.0[1] + o.0[1], self.0[2] + o.0[2], self.0[3] + o.0[3]])
    }
}
impl AddAssign for Cubic {
    fn add_assign(&mut self, o: Self) {
        *self = *self + o;
    }
}
impl Sub for Cubic {
    type Output = Self;
    fn sub(self, o: Self) -> Self {
        Self([self.0[0] - o.0[0], self.0[1] - o.0[1], self.0[2] - o.0[2], self.0[3] - o.0[3]])
    }
}
impl Mul<f64> for Cubic {
    type Output = Self;
    fn mul(self, k: f64) -> Self {
        Self([self.0[0] * k, self.0[1] * k, self.0[2] * k, self.0[3] * k])
    }
}

#[cfg(test)]
mod tests {
    use super::*;

    /// (t - 1)(t - 2)(t - 4)
    const THREE: Cubic = Cubic([-8.0, 14.0, -7.0, 1.0]);

    #[test]
    fn about_another_point_it_is_the_same_function() {
        let moved = THREE.about(1.5);
        for t in [-2.0, 0.0, 0.3, 5.0] {
            assert!((moved.at(t) - THREE.at(1.5 + t)).abs() < 1e-12);
            assert!((moved.slope_at(t) - THREE.slope_at(1.5 + t)).abs() < 1e-12);
            assert_eq!(THREE.mirrored().at(-t), THREE.at(t));
        }
    }

    #[test]
    fn bounds_hold_the_values() {
        let (low, high) = THREE.bounds(5.0);
        for i in 0..=100 {
            let value = THREE.at(f64::from(i) / 20.0);
            assert!(low <= value && value <= high);
        }
        assert_eq!(Cubic::line(1.0, 2.0).bounds(3.0), (1.0, 7.0));
    }

    #[test]
    fn sign_changes_are_the_roots_inside() {
        let roots = THREE.sign_changes(5.0);
        assert_eq!(roots.len(), 3);
        for (root, want) in roots.iter().zip([1.0, 2.0, 4.0]) {
            assert!((root - want).abs() < 1e-14, "{root}");
        }
        assert_eq!(THREE.sign_changes(1.5).len(), 1);
        assert!(THREE.sign_changes(0.9).is_empty());
    }

    #[test]
    fn touching_zero_changes_no_sign_and_an_inflection_does() {
        // (t - 1)^2
        assert!(Cubic([1.0, -2.0, 1.0, 0.0]).sign_changes(3.0).is_empty());
        // (t - 1)^3
        assert_eq!(&*Cubic([-1.0, 3.0, -3.0, 1.0]).sign_changes(3.0), &[1.0]);
        // t (t - 2): zero at the start counts as inside neither.
        assert_eq!(&*Cubic([0.0, -2.0, 1.0, 0.0]).sign_changes(3.0), &[2.0]);
    }

    #[test]
    fn integral_of_a_cubic() {
        // Simpson's rule is exact for cubics.
        let simpson = 5.0 / 6.0 * (THREE.at(0.0) + 4.0 * THREE.at(2.5) + THREE.at(5.0));
        assert!((THREE.integral(5.0) - simpson).abs() < 1e-12);
    }
}
