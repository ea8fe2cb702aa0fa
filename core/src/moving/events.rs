//! The places at which an axle meets a knot, in order, and the effect carried from one to the next.

use crate::numerics::{Cubic, Piecewise};

/// The next sum of each row in [`merge`], with its column.
pub(super) type Heads = Vec<(f64, usize)>;

/// Calls `visit(sum, row, column)` for every sum of a row and a column in ascending order. Rows and
/// columns ascend; an event is known by its indices, never by taking the sum apart again.
fn merge(rows: &[f64], columns: &[f64], heads: &mut Heads, mut visit: impl FnMut(f64, usize, usize)) {
    heads.clear();
    heads.extend(rows.iter().map(|row| (row + columns[0], 0)));
    for _ in 0..rows.len() * columns.len() {
        let mut row = 0;
        for r in 1..heads.len() {
            if heads[r].0 < heads[row].0 {
                row = r;
            }
        }
        let (sum, column) = heads[row];
        visit(sum, row, column);
        let next = column + 1;
        heads[row] = (columns.get(next).map_or(f64::INFINITY, |c| rows[row] + c), next);
    }
}

/// All events of axles at `offsets` on a line with `knots`, as `visit(place of the lead, knot, axle)`.
fn events(knots: &[f64], offsets: &[f64], heads: &mut Heads, mut visit: impl FnMut(f64, usize, usize)) {
    if knots.len() <= offsets.len() {
        merge(knots, offsets, heads, visit);
    } else {
        merge(offsets, knots, heads, |p, axle, knot| visit(p, knot, axle));
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

fn walk<const STRAIGHT: bool>(
    f: &Piecewise,
    loads: &[f64],
    offsets: &[f64],
    touch: f64,
    heads: &mut Heads,
) -> Swept {
    let jumps = f.jumps();
    // The effect as a polynomial about `place`, and its one-sided value before the event there.
    let (mut effect, mut place, mut before) = (Cubic::ZERO, f64::NEG_INFINITY, 0.0);
    // What axles at a jump add when each counts at the side that is worse.
    let (mut up, mut down) = (0.0, 0.0);
    let (mut most, mut least) = ((0.0, 0.0), (0.0, 0.0));
    events(f.knots(), offsets, heads, |p, knot, axle| {
        if p - place > touch {
            let h = p - place;
            if STRAIGHT {
                if h.is_finite() {
                    effect.0[0] += h * effect.0[1];
                }
            } else if h.is_finite() {
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
            (place, before, up, down) = (p, effect.0[0], 0.0, 0.0);
        }
        let (load, jump) = (loads[axle], &jumps[knot].0);
        let step = load * jump[0];
        effect.0[0] += step;
        effect.0[1] += load * jump[1];
        if !STRAIGHT {
            effect.0[2] += load * jump[2];
            effect.0[3] += load * jump[3];
        }
        up += step.max(0.0);
        down += step.min(0.0);
        if before + up > most.0 {
            most = (before + up, place);
        }
        if before + down < least.0 {
            least = (before + down, place);
        }
    });
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
    let (mut effect, mut place, mut before, mut up) = (Cubic::ZERO, f64::NEG_INFINITY, 0.0, 0.0);
    events(f.knots(), offsets, heads, |p, knot, axle| {
        if p - place > touch {
            if place.is_finite() {
                visit(place, before + up, effect);
                effect = effect.about(p - place);
            }
            (place, before, up) = (p, effect.0[0], 0.0);
        }
        let jump = jumps[knot] * (sign * loads[axle]);
        effect += jump;
        up += jump.0[0].max(0.0);
    });
    visit(place, before + up, effect);
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn sums_come_in_order_and_with_their_indices() {
        let (rows, columns) = ([0.0, 3.0, 10.0], [0.0, 1.0, 3.0, 7.0]);
        let mut seen = Vec::new();
        for swap in [false, true] {
            let mut last = f64::NEG_INFINITY;
            let mut visit = |p: f64, k: usize, i: usize| {
                assert!(p >= last);
                last = p;
                assert_eq!(p, rows[k] + columns[i]);
                seen.push((k, i));
            };
            if swap {
                events(&rows, &columns, &mut Vec::new(), &mut visit);
            } else {
                events(&columns, &rows, &mut Vec::new(), |p, i, k| visit(p, k, i));
            }
            seen.sort_unstable();
            seen.dedup();
            assert_eq!(seen.len(), 12);
            seen.clear();
        }
    }
}
