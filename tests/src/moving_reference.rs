//! Slow ways to the extremes of moving loads, as references: every position sums all axles anew.

use girderbook_core::influence::InfluenceLine;
use girderbook_core::load::{AxleTrain, Spacing};
use girderbook_core::moving::AxlePolicy;
use girderbook_core::numerics::Cubic;
use girderbook_core::quantity::Quantity;

/// A line and a train as plain numbers.
struct Case<'a> {
    knots: &'a [f64],
    pieces: &'a [Cubic],
    loads: Vec<f64>,
    /// Sign of travel: 1 forward.
    forward: f64,
    neglect: bool,
    touch: f64,
}

impl Case<'_> {
    /// The larger (`sense` 1) or the smaller (-1) ordinate at a place.
    fn ordinate(&self, place: f64, sense: f64) -> f64 {
        let mut best: Option<f64> = None;
        let mut take = |value: f64| {
            best = Some(best.map_or(value, |b| if sense * value > sense * b { value } else { b }));
        };
        for (k, piece) in self.knots.windows(2).zip(self.pieces) {
            if place >= k[0] - self.touch && place <= k[1] + self.touch {
                take(piece.at((place - k[0]).clamp(0.0, k[1] - k[0])));
            }
        }
        for end in [self.knots[0], self.knots[self.knots.len() - 1]] {
            if (place - end).abs() <= self.touch {
                take(0.0);
            }
        }
        let value = best.unwrap_or(0.0);
        if self.neglect && sense * value < 0.0 { 0.0 } else { value }
    }

    fn places<'b>(&'b self, first: f64, offsets: &'b [f64]) -> impl Iterator<Item = (f64, f64)> + 'b {
        self.loads.iter().zip(offsets).map(move |(&load, offset)| (load, first - self.forward * offset))
    }

    fn effect(&self, first: f64, offsets: &[f64], sense: f64) -> f64 {
        self.places(first, offsets).map(|(load, place)| load * self.ordinate(place, sense)).sum()
    }

    /// The effect from a position on to the next event, as a cubic of the way gone.
    fn course(&self, from: f64, to: f64, offsets: &[f64], sense: f64) -> Cubic {
        let middle = 0.5 * (from + to);
        let mut sum = Cubic::ZERO;
        for ((load, there), (_, start)) in self.places(middle, offsets).zip(self.places(from, offsets)) {
            for (k, piece) in self.knots.windows(2).zip(self.pieces) {
                if there > k[0] && there < k[1] && !(self.neglect && sense * piece.at(there - k[0]) < 0.0) {
                    sum += piece.about(start - k[0]) * load;
                }
            }
        }
        sum
    }

    /// Knots, and where the line changes its sign if that matters.
    fn marks(&self) -> Vec<f64> {
        let mut marks = self.knots.to_vec();
        if self.neglect {
            for (k, piece) in self.knots.windows(2).zip(self.pieces) {
                let parts = 64;
                let at = |i: i32| (k[1] - k[0]) * f64::from(i) / f64::from(parts);
                for i in 0..parts {
                    let (mut low, mut high) = (at(i), at(i + 1));
                    if piece.at(low) * piece.at(high) < 0.0 {
                        for _ in 0..80 {
                            let middle = 0.5 * (low + high);
                            if piece.at(low) * piece.at(middle) <= 0.0 { high = middle } else { low = middle }
                        }
                        marks.push(k[0] + 0.5 * (low + high));
                    }
                }
            }
        }
        marks
    }

    /// The extreme at fixed offsets.
    fn extreme(&self, offsets: &[f64], sense: f64) -> f64 {
        let mut events: Vec<f64> = Vec::new();
        for mark in self.marks() {
            events.extend(offsets.iter().map(|o| mark + self.forward * o));
        }
        events.sort_by(f64::total_cmp);
        let mut best = 0.0_f64;
        let mut take = |value: f64| best = best.max(sense * value);
        for &p in &events {
            take(self.effect(p, offsets, sense));
        }
        for ends in events.windows(2) {
            let h = ends[1] - ends[0];
            if h > self.touch {
                let course = self.course(ends[0], ends[1], offsets, sense);
                for &t in course.stationary(h).iter() {
                    take(course.at(t));
                }
            }
        }
        sense * best
    }
}

fn cases<'a>(line: &'a InfluenceLine, train: &AxleTrain, policy: AxlePolicy) -> [Case<'a>; 2] {
    [1.0, -1.0].map(|forward| Case {
        knots: line.ordinates().knots(),
        pieces: line.ordinates().pieces(),
        loads: train.axles().iter().map(|a| a.base()).collect(),
        forward,
        neglect: policy == AxlePolicy::NeglectRelieving,
        touch: 1e-6,
    })
}

fn offsets(spacings: &[f64]) -> Vec<f64> {
    let mut sum = vec![0.0];
    sum.extend(spacings.iter().scan(0.0, |at, s| {
        *at += s;
        Some(*at)
    }));
    sum
}

/// The extremes with the spacings given, in base units: the larger and the smaller.
#[must_use]
pub fn at_spacings(
    line: &InfluenceLine,
    train: &AxleTrain,
    policy: AxlePolicy,
    spacings: &[f64],
) -> (f64, f64) {
    let offsets = offsets(spacings);
    let mut found = (0.0_f64, 0.0_f64);
    for case in cases(line, train, policy) {
        found.0 = found.0.max(case.extreme(&offsets, 1.0));
        found.1 = found.1.min(case.extreme(&offsets, -1.0));
    }
    found
}

/// The extremes of a train with fixed spacings, or on a line of straight pieces with one variable
/// spacing or two: then the extremes lie where each group of axles that keep their distances is held by
/// an axle on a knot, or by a spacing at its end to a group that is.
///
/// # Panics
/// For more than two variable spacings, or variable ones on a curved line.
#[must_use]
pub fn extremes(line: &InfluenceLine, train: &AxleTrain, policy: AxlePolicy) -> (f64, f64) {
    let closed: Vec<f64> = train.spacings().iter().map(|s| s.least().base()).collect();
    let variable: Vec<usize> =
        (0..closed.len()).filter(|&i| matches!(train.spacings()[i], Spacing::Range { .. })).collect();
    if variable.is_empty() {
        return at_spacings(line, train, policy, &closed);
    }
    assert!(line.ordinates().is_straight() && variable.len() <= 2, "no reference for this");
    let mut found = (0.0_f64, 0.0_f64);
    for spacings in vertices(line.ordinates().knots(), train, &closed, &variable) {
        let (max, min) = at_spacings(line, train, policy, &spacings);
        found = (found.0.max(max), found.1.min(min));
    }
    found
}

/// All spacings that a vertex can have.
fn vertices(knots: &[f64], train: &AxleTrain, closed: &[f64], variable: &[usize]) -> Vec<Vec<f64>> {
    let n = closed.len() + 1;
    let range = |i: usize| (train.spacings()[i].least().base(), train.spacings()[i].most().base());
    // Values of spacing i that put one axle before it and one behind it on knots, the others being
    // as in `given`; `joints` are the variable spacings that may lie between the two axles.
    let held = |given: &[f64], i: usize, joints: &[usize]| -> Vec<f64> {
        let mut values = vec![range(i).0, range(i).1];
        for front in 0..=i {
            for rear in i + 1..n {
                let inside = |j: usize| front <= j && j < rear;
                if variable.iter().any(|&j| inside(j) != joints.contains(&j)) {
                    continue;
                }
                let fixed: f64 = (front..rear).filter(|&j| j != i).map(|j| given[j]).sum();
                for a in knots {
                    values.extend(knots.iter().map(|b| a - b - fixed));
                }
            }
        }
        values.retain(|v| *v >= range(i).0 && *v <= range(i).1);
        values
    };
    let mut all = Vec::new();
    let with = |base: &[f64], i: usize, value: f64| {
        let mut changed = base.to_vec();
        changed[i] = value;
        changed
    };
    match *variable {
        [i] => all.extend(held(closed, i, &[i]).into_iter().map(|v| with(closed, i, v))),
        [i, j] => {
            for v in held(closed, i, &[i]) {
                let one = with(closed, i, v);
                all.extend(held(closed, j, &[j]).into_iter().map(|w| with(&one, j, w)));
            }
            for (first, second) in [(i, j), (j, i)] {
                for v in [range(first).0, range(first).1] {
                    let one = with(closed, first, v);
                    all.extend(held(&one, second, &[i, j]).into_iter().map(|w| with(&one, second, w)));
                }
            }
        }
        _ => {}
    }
    all
}

/// The extremes by stepping the first axle along by `step`, both directions, at the spacings given.
#[must_use]
pub fn stepping(
    line: &InfluenceLine,
    train: &AxleTrain,
    policy: AxlePolicy,
    spacings: &[f64],
    step: f64,
) -> (f64, f64) {
    let offsets = offsets(spacings);
    let length = offsets[offsets.len() - 1];
    let mut found = (0.0_f64, 0.0_f64);
    for case in cases(line, train, policy) {
        let (start, end) = (case.knots[0], case.knots[case.knots.len() - 1]);
        let (mut p, last) = if case.forward > 0.0 { (start, end + length) } else { (start - length, end) };
        while p <= last + step {
            found.0 = found.0.max(case.effect(p, &offsets, 1.0));
            found.1 = found.1.min(case.effect(p, &offsets, -1.0));
            p += step;
        }
    }
    found
}
