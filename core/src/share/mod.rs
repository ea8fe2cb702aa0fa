//! How a lane of load is shared out among girder lines: pure placement and statics, no code
//! coefficients.

pub mod lever;
pub mod rigid;

use crate::quantity::Length;
use crate::worksheet::Val;

/// Share of a lane that a girder takes.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct LaneShare {
    /// The share that rules, with multiple presence in it.
    pub share: Val<f64>,
    /// Lanes loaded when it rules.
    pub lanes: u32,
}

/// Where trucks may stand across the roadway.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Roadway {
    /// Left curb, from the left edge of the deck.
    pub left: Length,
    /// Width between curbs.
    pub width: Length,
    /// Width of a design lane.
    pub lane: Length,
    /// Distance between the wheels of an axle.
    pub gauge: Length,
    /// Least distance from a wheel to the curb or the edge of its lane.
    pub edge: Length,
}

impl Roadway {
    /// First and last place of the left wheel of truck `k` of `n` (from 0), each within a lane of its
    /// own and all lanes on the roadway. On a road too narrow for that, the distance to the curbs is
    /// kept and the trucks share what is left between them.
    ///
    /// `None` when `n` trucks do not fit beside each other at all.
    #[must_use]
    pub fn places(&self, k: u32, n: u32) -> Option<(Length, Length)> {
        let lane = self.effective_lane(n)?;
        let from = self.left + self.edge + lane * f64::from(k);
        let to = self.left + self.width - self.edge - self.gauge - lane * f64::from(n - 1 - k);
        // What is less than a tenth of a millimetre short is round-off of the widths.
        if to < from - Length::from_mm(0.1) { None } else { Some((from, to.max(from))) }
    }

    /// Least distance between the left wheels of trucks beside each other.
    #[must_use]
    pub fn pitch(&self, n: u32) -> Option<Length> {
        let lane = self.effective_lane(n)?;
        Some((self.gauge + self.edge * 2.0).min(lane))
    }

    /// Whether trucks stand closer to each other than the rule asks, for want of width.
    #[must_use]
    pub fn is_tight(&self, n: u32) -> bool {
        n > 1 && self.pitch(n).is_some_and(|p| p < self.gauge + self.edge * 2.0 - Length::from_mm(0.1))
    }

    fn effective_lane(&self, n: u32) -> Option<Length> {
        if n <= 1 {
            return Some(self.lane.min(self.width));
        }
        let free = (self.width - self.edge * 2.0 - self.gauge) / f64::from(n - 1);
        (free >= self.gauge).then(|| self.lane.min(free))
    }
}
