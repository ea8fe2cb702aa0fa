//! The lever rule: the deck is hinged over every inner girder, so a wheel goes to the two girders
//! beside it by statics; beyond the outer girder the deck is the overhang of its first bay.
//!
//! The share of a girder is piecewise linear in the place of each truck, so its worst value over all
//! placements lies where a wheel line stands over a girder, a band touches a curb, or a truck stands as
//! far to one side of its band as it may, or at whole bands from such a place. All of these are tried;
//! nothing is stepped.

use super::pattern::{Pattern, Placement, Roadway, Truck, no_room};
use crate::problem::{Problem, finite};
use crate::quantity::{Length, Quantity};

/// Lengths closer than this count as equal when it is asked whether a band finds room: a ten-thousandth
/// of a millimetre, far above the rounding of sums and far below any reading.
const SLACK: Length = Length::from_mm(1e-4);

/// The worst placement of a number of trucks.
#[derive(Clone, Debug, PartialEq)]
pub struct Worst {
    /// Share of one axle that the girder takes from all trucks together; no multiple presence.
    pub share: f64,
    /// Where the trucks stand.
    pub placement: Placement,
}

/// What a girder takes of a load of one at `y`. Above 1 beyond an outer girder, negative for the girder
/// next to it.
///
/// `girders` are two at least, from left to right.
#[must_use]
pub fn ordinate(girders: &[Length], line: usize, y: Length) -> f64 {
    match hinge(girders, line, y) {
        Some(other) => (y - girders[other]) / (girders[line] - girders[other]),
        None => 0.0,
    }
}

/// The girder at the other end of the bay in which a load at `y` reaches a girder: the hinge about which
/// moments give its reaction. None where the load does not reach it.
#[must_use]
pub fn hinge(girders: &[Length], line: usize, y: Length) -> Option<usize> {
    let bay = bay_of(girders, y);
    if line == bay {
        Some(bay + 1)
    } else if line == bay + 1 {
        Some(bay)
    } else {
        None
    }
}

/// Index of the girder at the left of the bay that carries a load at `y`.
fn bay_of(girders: &[Length], y: Length) -> usize {
    (1..girders.len() - 1).filter(|&i| girders[i] <= y).count()
}

/// Worst placements of 1, 2 ... trucks side by side, up to the number of lanes of the pattern.
///
/// # Errors
/// When there are fewer than two girders, they do not stand apart, or the trucks find no room.
pub fn worst(
    girders: &[Length],
    line: usize,
    roadway: &Roadway,
    pattern: &Pattern,
) -> Result<Vec<Worst>, Problem> {
    let apart = girders.windows(2).all(|pair| pair[1] > pair[0]);
    if girders.len() < 2 || !apart || line >= girders.len() {
        return Err(Problem::error(
            "girders",
            "the lever rule needs two girders or more, apart from each other",
            "check the girder lines and their spacings",
        ));
    }
    (1..=pattern.lanes).map(|trucks| worst_of(girders, line, roadway, pattern, trucks)).collect()
}

fn worst_of(
    girders: &[Length],
    line: usize,
    roadway: &Roadway,
    pattern: &Pattern,
    trucks: usize,
) -> Result<Worst, Problem> {
    let fit = pattern.fit(trucks, roadway)?;
    let gauge = pattern.gauge;
    let axle = |left: Length| (ordinate(girders, line, left) + ordinate(girders, line, left + gauge)) / 2.0;
    let free = (fit.band - gauge - 2.0 * fit.edge).max(Length::ZERO);
    let breaks: Vec<Length> = girders.iter().flat_map(|&y| [y, y - gauge]).collect();

    let last_band = roadway.right() - fit.band;
    let mut anchors = vec![roadway.left, last_band];
    for &place in &breaks {
        anchors.push(place - fit.edge);
        anchors.push(place - fit.edge - free);
    }
    let reach = trucks as i32 - 1;
    let mut bands: Vec<Length> = anchors
        .iter()
        .flat_map(|&anchor| (-reach..=reach).map(move |m| anchor + f64::from(m) * fit.band))
        .filter(|&band| band >= roadway.left - SLACK && band <= last_band + SLACK)
        .collect();
    bands.sort_by(|a, b| a.base().total_cmp(&b.base()));
    bands.dedup();

    // The best truck within each band, then the best chain of bands that do not overlap.
    let seats: Vec<(f64, Length)> = bands
        .iter()
        .map(|&band| {
            let (from, to) = (band + fit.edge, band + fit.edge + free);
            breaks
                .iter()
                .copied()
                .filter(|&place| place > from && place < to)
                .chain([to])
                .map(|left| (axle(left), left))
                .fold((axle(from), from), |best, next| if next.0 > best.0 { next } else { best })
        })
        .collect();
    let mut chains: Vec<Vec<Option<(f64, usize)>>> = Vec::with_capacity(trucks);
    for truck in 0..trucks {
        let mut chain = Vec::with_capacity(bands.len());
        let mut best: Option<(f64, usize)> = None;
        let mut next = 0;
        for (i, &band) in bands.iter().enumerate() {
            if truck == 0 {
                chain.push(Some((seats[i].0, i)));
                continue;
            }
            while next < bands.len() && bands[next] + fit.band <= band + SLACK {
                if let Some((value, _)) = chains[truck - 1][next]
                    && best.is_none_or(|(most, _)| value > most)
                {
                    best = Some((value, next));
                }
                next += 1;
            }
            chain.push(best.map(|(value, from)| (value + seats[i].0, from)));
        }
        chains.push(chain);
    }
    let end = chains[trucks - 1]
        .iter()
        .enumerate()
        .filter_map(|(i, entry)| entry.map(|(value, _)| (value, i)))
        .fold(None, |best: Option<(f64, usize)>, next| match best {
            Some(most) if most.0 >= next.0 => Some(most),
            _ => Some(next),
        });
    let Some((share, mut at)) = end else {
        return Err(no_room(trucks));
    };
    let share = finite(share, "girders", "the lever rule")?;
    let mut placed = Vec::with_capacity(trucks);
    for truck in (0..trucks).rev() {
        let left = seats[at].1;
        placed.push(Truck { band: bands[at], left, right: left + gauge });
        if let Some((_, from)) = chains[truck][at] {
            at = from;
        }
    }
    placed.reverse();
    Ok(Worst {
        share,
        placement: Placement { trucks: placed, band: fit.band, edge: fit.edge, squeezed: fit.squeezed },
    })
}
