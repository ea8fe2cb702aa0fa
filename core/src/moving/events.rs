//! The places at which an axle meets a knot, in order, and the effect carried from one to the next.

use crate::numerics::{Cubic, Piecewise};

/// Memory of [`Events`], used again.
#[derive(Clone, Debug, Default)]
pub(super) struct Heads {
    sums: Vec<f64>,
    columns: Vec<usize>,
}

/// All events of axles at offsets behind a lead on a line with knots, in order of the place of the lead,
/// as (place, knot, axle).
///
/// Knots and offsets ascend, so that the sums of one knot and all offsets do: rows that are merged. An
/// event is known by its indices, never by taking the sum apart again.
struct Events<'a> {
    rows: &'a [f64],
    columns: &'a [f64],
    heads: &'a mut Heads,
    left: usize,
    rows_are_knots: bool,
}

impl<'a> Events<'a> {
    fn new(knots: &'a [f64], offsets: &'a [f64], heads: &'a mut Heads) -> Self {
        // Fewer rows make fewer comparisons.
        let rows_are_knots = knots.len() <= offsets.len();
        let (rows, columns) = if rows_are_knots { (knots, offsets) } else { (offsets, knots) };
        heads.sums.clear();
        heads.sums.extend(rows.iter().map(|row| row + columns[0]));
        heads.columns.clear();
        heads.columns.extend(rows.iter().map(|_| 0));
        Self { rows, columns, heads, left: rows.len() * columns.len(), rows_are_knots }
    }
}

impl Iterator for Events<'_> {
    type Item = (f64, usize, usize);

    #[inline(always)]
    fn next(&mut self) -> Option<Self::Item> {
        if self.left == 0 {
            return None;
        }
        self.left -= 1;
        // Selections instead of branches: which row is next cannot be foreseen.
        let (mut row, mut sum) = (0, self.heads.sums[0]);
        for (r, &other) in self.heads.sums.iter().enumerate().skip(1) {
            row = if other < sum { r } else { row };
            sum = if other < sum { other } else { sum };
        }
        let column = self.heads.columns[row];
        self.heads.columns[row] = column + 1;
        self.heads.sums[row] = self.columns.get(column + 1).map_or(f64::INFINITY, |c| self.rows[row] + c);
        Some(if self.rows_are_knots { (sum, row, column) } else { (sum, column, row) })
    }
}

/// What a walk over all events found.
#[derive(Clone, Copy, Debug)]
pub(super) struct Swept {
    /// The largest value and the place of the lead there.
    pub most: (f64, f64),
    /// The least value and the place of the lead there.
    pub least: (f64, f64),
    /// What is left after the last axle has gone: nothing but round-off.
    pub rest: Cubic,
}

/// The largest and the least effect of axles at fixed `offsets` behind the lead.
pub(super) fn sweep(f: &Piecewise, loads: &[f64], offsets: &[f64], touch: f64, heads: &mut Heads) -> Swept {
    if f.is_straight() {
        walk::<true>(f, loads, offsets, touch, heads)
    } else {
        walk::<false>(f, loads, offsets, touch, heads)
    }
}

/// Carries the effect over all events; on straight pieces without the terms that vanish.
fn walk<const STRAIGHT: bool>(
    f: &Piecewise,
    loads: &[f64],
    offsets: &[f64],
    touch: f64,
    heads: &mut Heads,
) -> Swept {
    let jumps = f.jumps();
    // The effect as a polynomial about `place`: nothing is on the bridge before the first event.
    let (mut effect, mut place) = (Cubic::ZERO, f.knots()[0] + offsets[0]);
    // The values at `place` when each axle at a jump counts at its larger or at its smaller side.
    let (mut high, mut low) = (0.0, 0.0);
    let (mut most, mut least) = ((0.0, 0.0), (0.0, 0.0));
    for (p, knot, axle) in Events::new(f.knots(), offsets, heads) {
        let h = p - place;
        if h > touch {
            if STRAIGHT {
                effect.0[0] += h * effect.0[1];
            } else {
                let bounds = effect.bounds(h);
                if bounds.1 > most.0 || bounds.0 < least.0 {
                    for &t in effect.stationary(h).iter() {
                        let value = effect.at(t);
                        if value > most.0 {
                            most = (value, place + t);
                        }
                        if value < least.0 {
                            least = (value, place + t);
                        }
                    }
                }
                effect = effect.about(h);
            }
            (place, high, low) = (p, effect.0[0], effect.0[0]);
        }
        let (load, jump) = (loads[axle], &jumps[knot].0);
        let step = load * jump[0];
        effect.0[0] += step;
        effect.0[1] += load * jump[1];
        if !STRAIGHT {
            effect.0[2] += load * jump[2];
            effect.0[3] += load * jump[3];
        }
        high += step.max(0.0);
        low += step.min(0.0);
        if high > most.0 {
            most = (high, place);
        }
        if low < least.0 {
            least = (low, place);
        }
    }
    Swept { most, least, rest: effect }
}

/// The same walk, kept: `visit(place, value before, up, effect after)` once for each place, in order.
/// `up` is what the axles at jumps add there when each counts at its larger side; `sign` -1 turns the
/// function upside down.
pub(super) fn trace(
    f: &Piecewise,
    sign: f64,
    loads: &[f64],
    offsets: &[f64],
    touch: f64,
    heads: &mut Heads,
    mut visit: impl FnMut(f64, f64, Cubic),
) {
    let jumps = f.jumps();
    let (mut effect, mut place, mut before, mut up) = (Cubic::ZERO, f.knots()[0] + offsets[0], 0.0, 0.0);
    for (p, knot, axle) in Events::new(f.knots(), offsets, heads) {
        if p - place > touch {
            visit(place, before + up, effect);
            effect = effect.about(p - place);
            (place, before, up) = (p, effect.0[0], 0.0);
        }
        let jump = jumps[knot] * (sign * loads[axle]);
        effect += jump;
        up += jump.0[0].max(0.0);
    }
    visit(place, before + up, effect);
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn sums_come_in_order_and_with_their_indices() {
        let (short, long) = ([0.0, 3.0, 10.0], [0.0, 1.0, 3.0, 7.0]);
        for (knots, offsets) in [(&short[..], &long[..]), (&long[..], &short[..])] {
            let mut last = f64::NEG_INFINITY;
            let mut seen = Vec::new();
            for (p, knot, axle) in Events::new(knots, offsets, &mut Heads::default()) {
                assert!(p >= last);
                last = p;
                assert_eq!(p, knots[knot] + offsets[axle]);
                seen.push((knot, axle));
            }
            seen.sort_unstable();
            seen.dedup();
            assert_eq!(seen.len(), 12);
        }
    }
}
