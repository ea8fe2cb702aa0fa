//! Functions made of cubics between knots, zero outside, with jumps allowed at the knots.

use super::Cubic;

/// A piecewise-cubic function that vanishes outside its knots.
///
/// At a knot it may jump; [`upper`](Self::upper) and [`lower`](Self::lower) give the larger and the
/// smaller of the two one-sided values there, which are what a supremum and an infimum need.
#[derive(Clone, Debug, Default, PartialEq)]
pub struct Piecewise {
    knots: Vec<f64>,
    pieces: Vec<Cubic>,
    jumps: Vec<Cubic>,
    least: f64,
    largest: f64,
    scale: f64,
    straight: bool,
    /// Whether it is one hump above zero, and whether it is one below.
    humps: [bool; 2],
}

/// A stretch on which a function keeps one sign.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Run {
    /// Where it begins.
    pub from: f64,
    /// Where it ends.
    pub to: f64,
}

/// Roots this near to the end of a piece, as a part of its length, are round-off of a zero at that end.
const AT_END: f64 = 1e-12;

impl Piecewise {
    /// From knots in ascending order and the cubics between them, each written about the knot at its
    /// start. None when the knots do not ascend, the counts do not fit or a number is not finite.
    #[must_use]
    pub fn new(knots: Vec<f64>, pieces: Vec<Cubic>) -> Option<Self> {
        let fits = knots.len() == pieces.len() + 1 && !pieces.is_empty();
        let finite = knots.iter().chain(pieces.iter().flat_map(|p| &p.0)).all(|v| v.is_finite());
        if !fits || !finite || knots.windows(2).any(|k| k[0] >= k[1]) {
            return None;
        }
        let mut made = Self { knots, pieces, ..Self::default() };
        made.finish();
        Some(made)
    }

    /// Works out what follows from knots and pieces.
    fn finish(&mut self) {
        self.jumps.clear();
        self.straight = self.pieces.iter().all(Cubic::is_straight);
        (self.least, self.largest) = (0.0, 0.0);
        let mut before = Cubic::ZERO;
        for i in 0..self.pieces.len() {
            let (piece, h) = (self.pieces[i], self.knots[i + 1] - self.knots[i]);
            self.jumps.push(piece - before);
            before = piece.about(h);
            let inside = piece.stationary(h);
            for value in [piece.0[0], before.0[0]].into_iter().chain(inside.iter().map(|&t| piece.at(t))) {
                self.least = self.least.min(value);
                self.largest = self.largest.max(value);
            }
        }
        self.jumps.push(Cubic::ZERO - before);
        let steepest = self.jumps.iter().fold(0.0, |s: f64, jump| s.max(jump.0[1].abs()));
        let length = self.knots[self.knots.len() - 1] - self.knots[0];
        self.scale = self.peak().max(1e-3 * steepest * length);
        self.humps = [1.0, -1.0].map(|sign| self.is_hump(sign));
    }

    /// The knots, ascending.
    #[must_use]
    pub fn knots(&self) -> &[f64] {
        &self.knots
    }

    /// The cubics between the knots, each written about the knot at its start.
    #[must_use]
    pub fn pieces(&self) -> &[Cubic] {
        &self.pieces
    }

    /// By how much the function changes its course at each knot: the cubic after it less the cubic
    /// before it, both written about the knot.
    #[must_use]
    pub fn jumps(&self) -> &[Cubic] {
        &self.jumps
    }

    /// Whether all pieces are straight lines.
    #[must_use]
    pub fn is_straight(&self) -> bool {
        self.straight
    }

    /// The least value, 0 at most.
    #[must_use]
    pub fn least(&self) -> f64 {
        self.least
    }

    /// The largest value, 0 at least.
    #[must_use]
    pub fn largest(&self) -> f64 {
        self.largest
    }

    /// The largest size of any value.
    #[must_use]
    pub fn peak(&self) -> f64 {
        self.largest.max(-self.least)
    }

    /// Whether the function, times `sign` (1 or -1), is a single hump: nowhere below zero, rising to one
    /// place and falling beyond it; jumps count as steep slopes.
    #[must_use]
    pub fn is_single_hump(&self, sign: f64) -> bool {
        self.humps[usize::from(sign < 0.0)]
    }

    fn is_hump(&self, sign: f64) -> bool {
        let noise = 1e-14 * self.scale;
        let (mut last, mut falls) = (0.0, false);
        for (_, h, piece) in self.spans() {
            // Between these values a cubic rises or falls throughout.
            let turns = piece.stationary(h);
            for t in core::iter::once(0.0).chain(turns.iter().copied()).chain(core::iter::once(h)) {
                let value = sign * piece.at(t);
                if value < -noise || (falls && value > last + noise) {
                    return false;
                }
                falls |= value < last - noise;
                last = value;
            }
        }
        true
    }

    /// What round-off is measured against: the peak, or a thousandth of the steepest slope times the
    /// length where that is more. A function that is small only because it is over soon after it has
    /// risen has no more digits than the places of its knots.
    #[must_use]
    pub fn scale(&self) -> f64 {
        self.scale
    }

    /// The two one-sided values at `x`, before and after it, equal where the function is continuous.
    /// A place within `touch` of a knot is taken as on it.
    #[must_use]
    pub fn sides(&self, x: f64, touch: f64) -> (f64, f64) {
        let after = self.knots.partition_point(|&k| k < x - touch);
        let inside = |i: usize| self.pieces[i].at(x - self.knots[i]);
        match self.knots.get(after) {
            None => (0.0, 0.0),
            Some(&k) if k <= x + touch => {
                let left =
                    if after == 0 { 0.0 } else { self.pieces[after - 1].at(k - self.knots[after - 1]) };
                (left, self.pieces.get(after).map_or(0.0, |p| p.0[0]))
            }
            Some(_) if after == 0 => (0.0, 0.0),
            Some(_) => (inside(after - 1), inside(after - 1)),
        }
    }

    /// The larger of the two one-sided values at `x`.
    #[must_use]
    pub fn upper(&self, x: f64, touch: f64) -> f64 {
        let (left, right) = self.sides(x, touch);
        left.max(right)
    }

    /// The smaller of the two one-sided values at `x`.
    #[must_use]
    pub fn lower(&self, x: f64, touch: f64) -> f64 {
        let (left, right) = self.sides(x, touch);
        left.min(right)
    }

    /// Exact integral over all knots.
    #[must_use]
    pub fn integral(&self) -> f64 {
        self.spans().map(|(_, h, piece)| piece.integral(h)).sum()
    }

    /// Exact integral of the positive part (`sign` 1) or of the negative part (`sign` -1), with the
    /// stretches that it covers, adjoining ones joined, written to `runs`.
    pub fn integral_of_sign(&self, sign: f64, runs: &mut Vec<Run>) -> f64 {
        runs.clear();
        let mut sum = 0.0;
        self.for_each_sign(|knot, from, to, piece, at_work| {
            if at_work == sign {
                sum += piece.about(from).integral(to - from);
                match runs.last_mut() {
                    Some(last) if last.to == knot + from => last.to = knot + to,
                    _ => runs.push(Run { from: knot + from, to: knot + to }),
                }
            }
        });
        sum
    }

    /// Writes the positive part (`sign` 1) or the negative part (`sign` -1) into `out`, whose memory is
    /// used again; the other sign becomes zero.
    pub fn part_into(&self, sign: f64, out: &mut Self) {
        out.knots.clear();
        out.pieces.clear();
        self.for_each_sign(|knot, from, _, piece, at_work| {
            out.knots.push(knot + from);
            out.pieces.push(if at_work == sign { piece.about(from) } else { Cubic::ZERO });
        });
        out.knots.extend(self.knots.last());
        out.finish();
    }

    fn spans(&self) -> impl Iterator<Item = (f64, f64, &Cubic)> {
        self.knots.windows(2).zip(&self.pieces).map(|(k, piece)| (k[0], k[1] - k[0], piece))
    }

    /// Calls `visit(knot, from, to, piece, sign)` for each stretch of one sign, from left to right;
    /// `from` and `to` count from the knot of the piece.
    fn for_each_sign(&self, mut visit: impl FnMut(f64, f64, f64, &Cubic, f64)) {
        let noise = 1e-14 * self.scale;
        for (knot, h, piece) in self.spans() {
            let mut from = 0.0;
            let changes = piece.sign_changes(h);
            let inside = changes.iter().copied().filter(|&t| t > AT_END * h && t < (1.0 - AT_END) * h);
            for to in inside.chain(core::iter::once(h)) {
                let middle = piece.at(0.5 * (from + to));
                let sign = if middle.abs() <= noise { 0.0 } else { middle.signum() };
                visit(knot, from, to, piece, sign);
                from = to;
            }
        }
    }
}

#[cfg(test)]
mod tests {
    use super::*;

    /// Rises from -1 at 0 to 3 at 2, jumps to 1 and falls to 0 at 4.
    fn sample() -> Piecewise {
        Piecewise::new(vec![0.0, 2.0, 4.0], vec![Cubic::line(-1.0, 2.0), Cubic::line(1.0, -0.5)])
            .expect("well formed")
    }

    #[test]
    fn malformed_ones_are_refused() {
        let line = Cubic::line(0.0, 1.0);
        assert!(Piecewise::new(vec![0.0], vec![]).is_none());
        assert!(Piecewise::new(vec![0.0, 0.0], vec![line]).is_none());
        assert!(Piecewise::new(vec![0.0, f64::NAN], vec![line]).is_none());
        assert!(Piecewise::new(vec![0.0, 1.0], vec![Cubic::constant(f64::INFINITY)]).is_none());
        assert!(Piecewise::new(vec![0.0, 1.0], vec![line, line]).is_none());
    }

    #[test]
    fn both_sides_of_jumps() {
        let f = sample();
        assert_eq!(f.sides(0.0, 0.0), (0.0, -1.0));
        assert_eq!(f.sides(2.0, 0.0), (3.0, 1.0));
        assert_eq!(f.sides(2.0 + 1e-9, 1e-8), (3.0, 1.0));
        assert_eq!(f.sides(4.0, 0.0), (0.0, 0.0));
        assert_eq!((f.upper(2.0, 0.0), f.lower(2.0, 0.0)), (3.0, 1.0));
        assert_eq!(f.sides(-0.1, 0.0), (0.0, 0.0));
        assert_eq!(f.sides(4.1, 0.0), (0.0, 0.0));
        assert_eq!(f.sides(3.0, 0.0), (0.5, 0.5));
        assert_eq!((f.least(), f.largest(), f.peak()), (-1.0, 3.0, 3.0));
    }

    #[test]
    fn the_jumps_add_up_to_nothing() {
        let f = Piecewise::new(
            vec![0.0, 1.0, 3.0],
            vec![Cubic([0.0, 2.0, 0.5, -1.0]), Cubic([1.5, 0.0, -2.0, 0.25])],
        )
        .expect("well formed");
        let mut sum = Cubic::ZERO;
        let mut at = 0.0;
        for (k, jump) in f.knots().iter().zip(f.jumps()) {
            sum = sum.about(k - at) + *jump;
            at = *k;
        }
        assert!(sum.0.iter().all(|c| c.abs() < 1e-14), "{sum:?}");
    }

    #[test]
    fn single_humps() {
        let of = |pieces: &[[f64; 4]]| {
            let knots = (0..=pieces.len()).map(|i| i as f64).collect();
            let f = Piecewise::new(knots, pieces.iter().map(|&c| Cubic(c)).collect()).expect("well formed");
            (f.is_single_hump(1.0), f.is_single_hump(-1.0))
        };
        assert_eq!(of(&[[0.0, 1.0, 0.0, 0.0], [1.0, -1.0, 0.0, 0.0]]), (true, false));
        assert_eq!(of(&[[1.0, -1.0, 0.0, 0.0]]), (true, false));
        assert_eq!(of(&[[0.0, -1.0, 0.0, 0.0]]), (false, true));
        assert_eq!(of(&[[0.0, -0.5, 0.0, 0.0], [0.5, -0.5, 0.0, 0.0]]), (false, false));
        // Two humps, and a hump within one piece.
        assert_eq!(of(&[[0.0, 4.0, -4.0, 0.0], [0.0, 4.0, -4.0, 0.0]]), (false, false));
        assert_eq!(of(&[[0.0, 4.0, -4.0, 0.0]]), (true, false));
        assert_eq!(of(&[[0.0; 4]]), (true, true));
    }

    #[test]
    fn integrals_by_sign_with_their_stretches() {
        let f = sample();
        let mut runs = Vec::new();
        assert_eq!(f.integral_of_sign(-1.0, &mut runs), -0.25);
        assert_eq!(runs, [Run { from: 0.0, to: 0.5 }]);
        assert_eq!(f.integral_of_sign(1.0, &mut runs), 0.5 * 1.5 * 3.0 + 1.0);
        assert_eq!(runs, [Run { from: 0.5, to: 4.0 }]);
        assert_eq!(f.integral(), 2.25 + 1.0 - 0.25);
    }

    #[test]
    fn parts_are_the_function_where_it_has_the_sign() {
        let f = sample();
        let (mut plus, mut minus) = (Piecewise::default(), Piecewise::default());
        f.part_into(1.0, &mut plus);
        f.part_into(-1.0, &mut minus);
        for i in 0..=80 {
            let x = f64::from(i) / 20.0;
            assert_eq!(plus.upper(x, 0.0), f.upper(x, 0.0).max(0.0), "{x}");
            assert_eq!(minus.lower(x, 0.0), f.lower(x, 0.0).min(0.0), "{x}");
        }
        assert_eq!(plus.least(), 0.0);
        assert_eq!(minus.largest(), 0.0);
    }
}
