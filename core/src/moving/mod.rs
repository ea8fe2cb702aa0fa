//! Exact extremes of moving loads on an influence line, with the position that governs.
//!
//! Nothing is stepped. While no axle meets a knot of the line, the effect of a train with fixed
//! spacings is one cubic in its position, so that its extremes lie where an axle meets a knot or at
//! the roots of a quadratic. Between such *events* the effect is carried along: at each the load times
//! the change of course of the line is added, and the polynomial is written anew about that place.
//!
//! **Conventions.** A position is the place of the first axle of the list. Moving forward means
//! towards growing distance from the first support, the axles following at smaller distances; both
//! directions are searched. Extremes are suprema: an axle at a jump of the line counts at the side
//! that makes the effect worse, hence an axle exactly on an end support counts in full, and one at a
//! cut on either side of it. The empty bridge counts, so a maximum is never negative and a minimum
//! never positive.
//!
//! **Numbers.** Places are counted in 0.1 mm, so that whole inches and their binary fractions meet
//! exactly; places within some units in the last digit are one. Values below 1e-11 of the weight of the
//! train times the scale of the line (its peak, except close to a support) are 0. After the last axle
//! has gone nothing may be left: that is checked each time.
//!
//! Values are in base units: N for forces, N times 0.1 mm for moments.

mod absolute;
mod engine;
mod events;
mod lane;
mod layout;
mod position;
mod profile;
mod spread;

pub use absolute::{AbsoluteMaximum, absolute_maximum};
pub use engine::{Workspace, envelope};
pub use lane::{LaneExtremes, Stretch, lane_extremes};
pub use position::{Both, PlacedAxle, Position, effect_at, placed_axles};

use crate::influence::InfluenceLine;
use crate::load::AxleTrain;
use crate::problem::Problem;
use crate::quantity::{Force, Length, Moment, Quantity};

/// What is done with axles that would make the effect smaller.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum AxlePolicy {
    /// All axles on the bridge count: a real vehicle.
    AllCount,
    /// Axles that relieve the effect are left out: a notional load, as some rules of loading ask.
    NeglectRelieving,
}

/// Direction of travel.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Direction {
    /// Away from the first support.
    Forward,
    /// Towards the first support.
    Backward,
}

/// Which of the two extremes.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Sense {
    /// The largest value.
    Max,
    /// The least value.
    Min,
}

/// An extreme and where it arises, in short.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Peak {
    /// The effect in base units.
    pub value: f64,
    /// Direction and place of the first axle; none when the empty bridge governs.
    pub at: Option<(Direction, Length)>,
}

impl Peak {
    /// The empty bridge.
    pub const EMPTY: Self = Self { value: 0.0, at: None };

    /// The effect of a line of moments.
    #[must_use]
    pub fn moment(&self) -> Moment {
        Moment::from_base(self.value)
    }

    /// The effect of a line of shears or reactions.
    #[must_use]
    pub fn force(&self) -> Force {
        Force::from_base(self.value)
    }
}

/// Both extremes of one line, in short.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Peaks {
    /// The largest effect, 0 at least.
    pub max: Peak,
    /// The least effect, 0 at most.
    pub min: Peak,
}

/// An extreme with all that is needed to draw it and to work it again by hand.
#[derive(Clone, Debug, PartialEq)]
pub struct Governing {
    /// The effect in base units.
    pub value: f64,
    /// Where the train stands; none when the empty bridge governs.
    pub position: Option<Position>,
    /// The axles that count there, with place and ordinate: the value is the sum of load times
    /// ordinate.
    pub axles_on: Vec<PlacedAxle>,
}

impl Governing {
    /// The effect of a line of moments.
    #[must_use]
    pub fn moment(&self) -> Moment {
        Moment::from_base(self.value)
    }

    /// The effect of a line of shears or reactions.
    #[must_use]
    pub fn force(&self) -> Force {
        Force::from_base(self.value)
    }
}

/// Both extremes of one line.
#[derive(Clone, Debug, PartialEq)]
pub struct Extremes {
    /// The largest effect, 0 at least.
    pub max: Governing,
    /// The least effect, 0 at most.
    pub min: Governing,
}

/// The exact extremes of a train on a line, in both directions, at the worst of its variable spacings.
///
/// The values are those of [`envelope`], digit for digit.
///
/// # Errors
/// When the numbers are so far out of range that the result is not finite or fails its own check.
pub fn extremes(line: &InfluenceLine, train: &AxleTrain, policy: AxlePolicy) -> Result<Extremes, Problem> {
    engine::extremes(line, train, policy)
}
