//! Influence lines: what a unit load at each place along the bridge does to one effect at one station.
//!
//! Sagging moments and upward reactions are positive; the shear is the sum of the upward forces to the
//! left of the cut. Ordinates are in base units: 0.1 mm for a moment (a moment by a force), plain
//! numbers for a shear or a reaction; places in 0.1 mm from the first support. A load off the bridge
//! does nothing.

pub mod simple_span;

use crate::numerics::Piecewise;
use crate::quantity::{Dimension, Length};

/// Which side of a cut.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Side {
    /// Just before the station.
    Left,
    /// Just beyond the station.
    Right,
}

/// The effect that a line describes.
#[derive(Clone, Copy, Debug, PartialEq)]
pub enum LineKind {
    /// Bending moment at a station.
    Moment {
        /// Distance from the first support.
        station: Length,
    },
    /// Shear at one side of a station.
    Shear {
        /// Distance from the first support.
        station: Length,
        /// Side of the cut.
        side: Side,
    },
    /// Reaction of a support.
    Reaction {
        /// Its number, from 0 at the first support.
        support: usize,
    },
}

impl LineKind {
    /// What the effect is measured in.
    #[must_use]
    pub fn dimension(self) -> Dimension {
        match self {
            Self::Moment { .. } => Dimension::Moment,
            Self::Shear { .. } | Self::Reaction { .. } => Dimension::Force,
        }
    }
}

/// An influence line: exact, as cubics between knots.
#[derive(Clone, Debug, PartialEq)]
pub struct InfluenceLine {
    kind: LineKind,
    ordinates: Piecewise,
}

impl InfluenceLine {
    /// The line of an effect from its ordinates.
    #[must_use]
    pub fn new(kind: LineKind, ordinates: Piecewise) -> Self {
        Self { kind, ordinates }
    }

    /// The effect that it describes.
    #[must_use]
    pub fn kind(&self) -> LineKind {
        self.kind
    }

    /// Its ordinates over the places along the bridge.
    #[must_use]
    pub fn ordinates(&self) -> &Piecewise {
        &self.ordinates
    }

    /// From the first to the last place at which a load counts.
    #[must_use]
    pub fn extent(&self) -> (Length, Length) {
        use crate::quantity::Quantity;
        let knots = self.ordinates.knots();
        let at = |k: Option<&f64>| Length::from_base(k.copied().unwrap_or(0.0));
        (at(knots.first()), at(knots.last()))
    }
}
