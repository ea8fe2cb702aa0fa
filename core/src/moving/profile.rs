//! The effect of a group of axles over the place of its lead, and the two operations that variable
//! spacings need: the best value over a window of places, and the sum.

use super::events::{Heads, trace};
use crate::numerics::{Cubic, Piecewise};

/// A maximum this near to an end of its piece, as a part of the length, differs from the value at that
/// end by the square of this.
const AT_END: f64 = 1e-9;

/// A piecewise-cubic function of a place, zero outside its knots, closed from above: at a knot it has
/// the larger value that the axles there can take. Pieces have no maximum of their own inside, since a
/// knot is put there.
#[derive(Clone, Debug, Default)]
pub(super) struct Profile {
    knots: Vec<f64>,
    /// Value at each knot.
    at: Vec<f64>,
    /// What follows each knot; nothing after the last.
    after: Vec<Cubic>,
}

/// What a piece of a windowed profile was taken from: equal neighbours are one piece.
#[derive(Clone, Copy, PartialEq)]
enum From {
    FrontEnd(usize),
    RearEnd(usize),
    Between(usize),
}

impl Profile {
    fn clear(&mut self) {
        self.knots.clear();
        self.at.clear();
        self.after.clear();
    }

    /// Adds a knot, and one at each maximum inside the piece before it.
    fn push(&mut self, knot: f64, at: f64, after: Cubic) {
        if let (Some(&from), Some(&piece)) = (self.knots.last(), self.after.last()) {
            let h = knot - from;
            for &t in piece.stationary(h).iter() {
                let bent = piece.about(t);
                // A maximum all but at an end is that of the knot there.
                if bent.0[2] < 0.0 && t > AT_END * h && t < (1.0 - AT_END) * h {
                    self.knots.push(from + t);
                    self.at.push(bent.0[0]);
                    self.after.push(bent);
                }
            }
        }
        self.knots.push(knot);
        self.at.push(at);
        self.after.push(after);
    }

    /// The effect of axles at `offsets` behind a lead, times `sign`.
    pub fn of_group(
        &mut self,
        f: &Piecewise,
        sign: f64,
        loads: &[f64],
        offsets: &[f64],
        touch: f64,
        heads: &mut Heads,
    ) {
        self.clear();
        trace(f, sign, loads, offsets, touch, heads, |place, at, after| self.push(place, at, after));
        // What is left after the last axle is round-off.
        if let Some(last) = self.after.last_mut() {
            *last = Cubic::ZERO;
        }
    }

    /// Becomes the largest value of `of` at any place from `far` to `near` behind, for every place.
    ///
    /// While no knot enters the window at its front end or leaves it at its rear end, the best is the
    /// value at the front end, that at the rear end, or that of a knot between: the largest of two
    /// cubics and a constant. Where they cross, the window gets a knot.
    pub fn window(&mut self, of: &Self, near: f64, far: f64, touch: f64, queue: &mut Vec<usize>) {
        self.clear();
        queue.clear();
        let (n, width) = (of.knots.len(), far - near);
        let (mut entered, mut left, mut head) = (0, 0, 0);
        let mut source = None;
        let mut limit = 0.0;
        while left < n {
            let place = match of.knots.get(entered) {
                Some(&knot) => knot.min(of.knots[left] + width),
                None => of.knots[left] + width,
            };
            while entered < n && of.knots[entered] <= place + touch {
                while queue.len() > head && queue.last().is_some_and(|&k| of.at[k] <= of.at[entered]) {
                    queue.pop();
                }
                queue.push(entered);
                entered += 1;
            }
            while left < n && of.knots[left] + width <= place + touch {
                if queue.get(head) == Some(&left) {
                    head += 1;
                }
                left += 1;
            }
            if left == n {
                self.push(near + place, f64::max(limit, 0.0), Cubic::ZERO);
                break;
            }
            let next = match of.knots.get(entered) {
                Some(&knot) => knot.min(of.knots[left] + width),
                None => of.knots[left] + width,
            };
            let front = of.after[entered - 1].about(place - of.knots[entered - 1]);
            let rear = match left {
                0 => Cubic::ZERO,
                _ => of.after[left - 1].about(place - width - of.knots[left - 1]),
            };
            let front = (From::FrontEnd(entered), front);
            // No knot in the window: the front end stands in once more.
            let between = queue.get(head).map(|&k| (From::Between(k), Cubic::constant(of.at[k])));
            let rivals = [front, (From::RearEnd(left), rear), between.unwrap_or(front)];
            limit = self.best_of(&rivals, near + place, next - place, &mut source, limit);
        }
    }

    /// Appends the largest of `rivals` over a stretch of length `h` from `place`; gives its value at the
    /// end of the stretch.
    fn best_of(
        &mut self,
        rivals: &[(From, Cubic); 3],
        place: f64,
        h: f64,
        source: &mut Option<From>,
        mut limit: f64,
    ) -> f64 {
        // Places where two rivals cross, from the start to the end of the stretch.
        let mut cuts = [0.0; 12];
        let mut count = 1;
        if !clear_winner(rivals, h) {
            for (i, (_, a)) in rivals.iter().enumerate() {
                for (_, b) in &rivals[i + 1..] {
                    for &t in (*a - *b).sign_changes(h).iter() {
                        cuts[count] = t;
                        count += 1;
                    }
                }
            }
        }
        cuts[1..count].sort_unstable_by(f64::total_cmp);
        cuts[count] = h;
        for ends in cuts[..=count].windows(2) {
            if ends[1] <= ends[0] {
                continue;
            }
            let middle = 0.5 * (ends[0] + ends[1]);
            let mut best = rivals[0];
            for &rival in &rivals[1..] {
                if rival.1.at(middle) > best.1.at(middle) {
                    best = rival;
                }
            }
            let piece = best.1.about(ends[0]);
            if *source != Some(best.0) {
                self.push(place + ends[0], limit.max(piece.0[0]), piece);
                *source = Some(best.0);
            }
            limit = best.1.at(ends[1]);
        }
        limit
    }

    /// Becomes the sum of two profiles.
    pub fn sum(&mut self, a: &Self, b: &Self, touch: f64) {
        self.clear();
        let (mut i, mut j) = (0, 0);
        while i < a.knots.len() || j < b.knots.len() {
            let next = |p: &Self, k: usize| p.knots.get(k).copied().unwrap_or(f64::INFINITY);
            let place = next(a, i).min(next(b, j));
            let (at_a, after_a) = a.pass(place, touch, &mut i);
            let (at_b, after_b) = b.pass(place, touch, &mut j);
            self.push(place, at_a + at_b, after_a + after_b);
        }
    }

    /// Value at `place` and the cubic after it, written about it, moving `next` past knots there.
    fn pass(&self, place: f64, touch: f64, next: &mut usize) -> (f64, Cubic) {
        let mut at = None;
        while let Some(&knot) = self.knots.get(*next) {
            if knot > place + touch {
                break;
            }
            at = Some(at.map_or(self.at[*next], |v: f64| v.max(self.at[*next])));
            *next += 1;
        }
        let after = match *next {
            0 => Cubic::ZERO,
            k => self.after[k - 1].about(place - self.knots[k - 1]),
        };
        (at.unwrap_or(after.0[0]), after)
    }

    /// The largest value anywhere and its place; the far end of nothing is 0.
    pub fn largest(&self) -> (f64, f64) {
        let mut best = (0.0, 0.0);
        for (&knot, &at) in self.knots.iter().zip(&self.at) {
            if at > best.0 {
                best = (at, knot);
            }
        }
        best
    }

    /// The place of the largest value from `low` to `high`.
    pub fn best_within(&self, low: f64, high: f64, touch: f64) -> f64 {
        let mut best = (self.upper(high, touch), high);
        let rear = self.upper(low, touch);
        if rear > best.0 {
            best = (rear, low);
        }
        let first = self.knots.partition_point(|&k| k < low - touch);
        for (&knot, &at) in self.knots[first..].iter().zip(&self.at[first..]) {
            if knot > high + touch {
                break;
            }
            if at > best.0 {
                best = (at, knot.clamp(low, high));
            }
        }
        best.1
    }

    /// Value at a place.
    fn upper(&self, place: f64, touch: f64) -> f64 {
        let mut next = self.knots.partition_point(|&k| k < place - touch);
        self.pass(place, touch, &mut next).0
    }
}

/// Whether one rival is nowhere below the others on a stretch, by bounds alone.
fn clear_winner(rivals: &[(From, Cubic); 3], h: f64) -> bool {
    let mut best = (0, f64::NEG_INFINITY);
    for (i, rival) in rivals.iter().enumerate() {
        let low = rival.1.bounds(h).0;
        if low > best.1 {
            best = (i, low);
        }
    }
    rivals.iter().enumerate().all(|(i, rival)| i == best.0 || rival.1.bounds(h).1 <= best.1)
}

#[cfg(test)]
mod tests {
    use super::*;

    fn of(f: &Piecewise, loads: &[f64], offsets: &[f64]) -> Profile {
        let mut made = Profile::default();
        made.of_group(f, 1.0, loads, offsets, 1e-9, &mut Heads::default());
        made
    }

    /// A wave, a jump down, and a slope below zero.
    fn sample() -> Piecewise {
        let pieces = vec![Cubic([0.0, 6.0, -6.0, 1.25]), Cubic::line(2.0, -1.0)];
        Piecewise::new(vec![0.0, 3.0, 6.0], pieces).expect("well formed")
    }

    fn at(p: &Profile, place: f64) -> f64 {
        p.upper(place, 1e-9)
    }

    #[test]
    fn a_group_is_the_sum_of_its_axles() {
        let (f, p) = (sample(), of(&sample(), &[2.0, 5.0], &[0.0, 1.5]));
        for i in -20..200 {
            let place = f64::from(i) / 16.0;
            let want = 2.0 * f.upper(place, 1e-9) + 5.0 * f.upper(place - 1.5, 1e-9);
            assert!((at(&p, place) - want).abs() < 1e-12, "{place}: {} {want}", at(&p, place));
        }
    }

    #[test]
    fn a_window_holds_the_best_of_its_places() {
        let p = of(&sample(), &[1.0, 1.0], &[0.0, 0.75]);
        for (near, far) in [(0.5, 0.75), (1.0, 3.0), (0.25, 20.0)] {
            let mut window = Profile::default();
            window.window(&p, near, far, 1e-9, &mut Vec::new());
            for i in -20..500 {
                let place = f64::from(i) / 16.0;
                let found = p.best_within(place - far, place - near, 1e-9);
                assert!((at(&window, place) - at(&p, found)).abs() < 1e-12, "{place}");
                // Nothing in the window is better, by a fine grid that meets all knots.
                for j in 0..=640 {
                    let inside = place - near - (far - near) * f64::from(j) / 640.0;
                    assert!(at(&p, inside) <= at(&window, place) + 1e-12, "{place} {inside}");
                }
            }
        }
    }

    #[test]
    fn knots_within_touch_are_one_place() {
        let p = of(&sample(), &[1.0], &[0.0]);
        let mut moved = p.clone();
        for knot in &mut moved.knots {
            *knot += 4e-10;
        }
        let mut sum = Profile::default();
        sum.sum(&p, &moved, 1e-9);
        assert_eq!(sum.knots.len(), p.knots.len());
        for (doubled, once) in sum.at.iter().zip(&p.at) {
            assert!((doubled - 2.0 * once).abs() < 1e-8);
        }
        // Two knots of one profile so near to each other: the larger value holds.
        let mut twin = p.clone();
        twin.knots.insert(1, twin.knots[1] - 5e-10);
        twin.at.insert(1, 100.0);
        twin.after.insert(1, Cubic::ZERO);
        assert_eq!(at(&twin, p.knots[1]), 100.0);
    }
}
