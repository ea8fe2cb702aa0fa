//! Trucks side by side on a roadway.

use crate::problem::Problem;
use crate::quantity::Length;

/// Lanes on a roadway.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Lanes {
    /// How many; one at least.
    pub count: usize,
    /// Width of each.
    pub width: Length,
}

/// The strip that traffic can use.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Roadway {
    /// Left edge of the deck to the inside face of the left curb.
    pub left: Length,
    /// Clear width between the curbs.
    pub width: Length,
}

impl Roadway {
    /// Left edge of the deck to the inside face of the right curb.
    #[must_use]
    pub fn right(&self) -> Length {
        self.left + self.width
    }
}

/// How trucks may stand side by side. Each keeps a band of the roadway for itself; bands do not
/// overlap and may lie anywhere between the curbs.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Pattern {
    /// Most trucks side by side: the number of lanes.
    pub lanes: usize,
    /// Width of the band: a lane, or the gauge and the distance between passing vehicles.
    pub band: Length,
    /// Least distance from the centre of a wheel to the edge of its band, and so to the curb.
    pub edge: Length,
    /// Centre to centre of the two wheel lines.
    pub gauge: Length,
}

/// Where one truck stands.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Truck {
    /// Left edge of its band.
    pub band: Length,
    /// Left wheel line.
    pub left: Length,
    /// Right wheel line.
    pub right: Length,
}

/// Where trucks stand, from left to right.
#[derive(Clone, Debug, PartialEq)]
pub struct Placement {
    /// The trucks.
    pub trucks: Vec<Truck>,
    /// Width of each band.
    pub band: Length,
    /// Distance kept between a wheel and the edge of its band; less than the pattern's where the
    /// roadway is too narrow for that.
    pub edge: Length,
    /// Whether the distances of the pattern could not be kept.
    pub squeezed: bool,
}

/// Band and distance to its edge for a number of trucks.
#[derive(Clone, Copy, Debug, PartialEq)]
pub(super) struct Fit {
    pub band: Length,
    pub edge: Length,
    pub squeezed: bool,
}

impl Pattern {
    /// Fits `trucks` on the roadway. Where bands of full width find no room they shrink to what a
    /// truck needs, and where even that finds none all distances shrink together: a truck in the middle
    /// of each equal band. A lane is never dropped.
    ///
    /// # Errors
    /// When the bands would be narrower than the gauge, or the entries are no sizes.
    pub(super) fn fit(&self, trucks: usize, roadway: &Roadway) -> Result<Fit, Problem> {
        let n = trucks as f64;
        let needed = self.gauge + 2.0 * self.edge;
        let room = roadway.width / n;
        let sound = [self.band, self.edge, self.gauge, roadway.width]
            .iter()
            .all(|size| size.in_m().is_finite() && *size >= Length::ZERO);
        if trucks == 0 || !sound || !roadway.left.in_m().is_finite() || room < self.gauge {
            return Err(no_room(trucks));
        }
        Ok(if self.band >= needed && self.band <= room {
            Fit { band: self.band, edge: self.edge, squeezed: false }
        } else if needed <= room {
            Fit { band: needed.max(self.band.min(room)), edge: self.edge, squeezed: false }
        } else {
            Fit { band: room, edge: (room - self.gauge) / 2.0, squeezed: true }
        })
    }
}

/// The problem of trucks that find no room.
pub(super) fn no_room(trucks: usize) -> Problem {
    let who =
        if trucks == 1 { "a truck does".to_owned() } else { format!("{trucks} trucks side by side do") };
    Problem::error(
        "deck.roadway",
        format!("{who} not fit on the roadway"),
        "check the clear roadway between the curbs",
    )
}
