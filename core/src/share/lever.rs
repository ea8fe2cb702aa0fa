//! The lever rule: the deck as a row of simple beams hinged over the inner girders, wheels placed for
//! the worst.

use super::Roadway;
use crate::quantity::{Length, Quantity};

/// The worst placement for a girder.
#[derive(Clone, Debug, PartialEq)]
pub struct Placement {
    /// Share of a lane load, each truck counted as 1, without multiple presence.
    pub share: f64,
    /// Left wheels of the trucks, from the left edge of the deck.
    pub left_wheels: Vec<Length>,
}

/// Reaction of girder `line` under a unit load at `y`, by the lever rule.
///
/// Inner girders answer loads between their neighbours; over an overhang the outer girder takes more
/// than the load and its neighbour is relieved. With one girder it takes everything.
#[must_use]
pub fn ordinate(girders: &[Length], line: usize, y: Length) -> f64 {
    let at = girders[line];
    let last = girders.len() - 1;
    if last == 0 {
        return 1.0;
    }
    let beside = if y < at {
        match line {
            0 => return 1.0 + (at - y) / (girders[1] - at),
            1 if y < girders[0] => return -((girders[0] - y) / (at - girders[0])),
            _ => girders[line - 1],
        }
    } else {
        match line {
            _ if line == last => return 1.0 + (y - at) / (at - girders[last - 1]),
            _ if line + 1 == last && y > girders[last] => {
                return -((y - girders[last]) / (girders[last] - at));
            }
            _ => girders[line + 1],
        }
    };
    (1.0 - (y - at).abs() / (beside - at).abs()).max(0.0)
}

/// The worst placement of `n` trucks for a girder; `None` when they do not fit beside each other.
///
/// The share is piecewise linear in every truck's place, so the worst has each truck at an end of its
/// range, with a wheel over a girder, or as close as allowed to another that stands so.
#[must_use]
pub fn worst(girders: &[Length], line: usize, road: &Roadway, n: u32) -> Option<Placement> {
    let pitch = road.pitch(n)?;
    let mut bases = Vec::new();
    for y in girders {
        bases.extend([*y, *y - road.gauge]);
    }
    for k in 0..n {
        let (from, to) = road.places(k, n)?;
        bases.extend([from, to]);
    }
    let span = i32::try_from(n).unwrap_or(0) - 1;
    let mut places: Vec<Length> = bases
        .iter()
        .flat_map(|base| (-span..=span).map(move |shift| *base + pitch * f64::from(shift)))
        .collect();
    places.sort_by(|a, b| a.base().total_cmp(&b.base()));
    let value = |p: Length| (ordinate(girders, line, p) + ordinate(girders, line, p + road.gauge)) / 2.0;
    // Best sum of the trucks so far with the last one at each place, and where the one before stands.
    let slack = Length::from_mm(0.001);
    let mut best: Vec<Option<(f64, Vec<Length>)>> = vec![None; places.len()];
    for k in 0..n {
        let (from, to) = road.places(k, n)?;
        let mut next: Vec<Option<(f64, Vec<Length>)>> = vec![None; places.len()];
        for (i, p) in places.iter().enumerate() {
            if *p < from - slack || *p > to + slack {
                continue;
            }
            let before = if k == 0 {
                Some((0.0, Vec::new()))
            } else {
                best.iter()
                    .zip(&places)
                    .filter(|(_, q)| **q <= *p - pitch + slack)
                    .filter_map(|(b, _)| b.clone())
                    .max_by(|a, b| a.0.total_cmp(&b.0))
            };
            next[i] = before.map(|(sum, mut wheels)| {
                wheels.push(*p);
                (sum + value(*p), wheels)
            });
        }
        best = next;
    }
    best.into_iter()
        .flatten()
        .max_by(|a, b| a.0.total_cmp(&b.0))
        .map(|(share, left_wheels)| Placement { share, left_wheels })
}
