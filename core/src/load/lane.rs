//! A uniform load along a traffic lane.

use crate::quantity::{Length, LineLoad};

/// A uniform load along one lane. It may lie on any stretch, broken ones too: it is put where it makes
/// the effect worse (the placement is worked out by [`crate::moving::lane_extremes`]).
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Lane {
    /// Load on a length of the lane.
    pub w: LineLoad,
    /// Width over which it is spread evenly.
    pub width: Length,
}
