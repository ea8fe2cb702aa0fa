//! One check: a member at a station, asked for one action at one limit state by one vehicle at one
//! level, and what comes out of it.

mod posting;

use crate::problem::Problem;

pub use posting::{Class, ClassLimit, Limit, Posting, SafeLoad, Sign};

/// What a girder is asked for.
#[derive(Clone, Copy, Debug, PartialEq, Eq, PartialOrd, Ord)]
pub enum Action {
    /// Bending about the strong axis.
    Moment,
    /// Vertical shear.
    Shear,
    /// The reaction on the web over a bearing.
    Bearing,
    /// Bending stress in service.
    Stress,
}

/// What is kept from being reached.
#[derive(Clone, Copy, Debug, PartialEq, Eq, PartialOrd, Ord)]
pub enum LimitState {
    /// Strength under the first combination.
    StrengthI,
    /// Permanent set of steel in service.
    ServiceII,
}

/// How sure the answer has to be.
#[derive(Clone, Copy, Debug, PartialEq, Eq, PartialOrd, Ord)]
pub enum Level {
    /// Design load, inventory.
    Inventory,
    /// Design load, operating.
    Operating,
    /// Legal loads.
    Legal,
}

/// What comes out of a check. A rating factor is a number only where it means something.
#[derive(Clone, Debug, PartialEq)]
pub enum Outcome {
    /// Capacity left for live load over the live load effect: finite and not negative.
    Factor(f64),
    /// Dead load alone takes all capacity, or more.
    CarriesNoLiveLoad,
    /// This vehicle has no effect there.
    NotLoaded,
    /// No number, and why.
    NotRated(Problem),
}

impl Outcome {
    /// From capacity and effects, all factored, in one unit.
    ///
    /// A live effect of nothing is `NotLoaded`; dead load at or above capacity is
    /// `CarriesNoLiveLoad`. A result that is not finite becomes `NotRated`.
    #[must_use]
    pub fn from_effects(capacity: f64, dead: f64, live: f64, path: &str) -> Self {
        for (value, what) in
            [(capacity, "the capacity"), (dead, "the dead load effect"), (live, "the live load effect")]
        {
            if let Err(problem) = crate::problem::finite(value, path, what) {
                return Self::NotRated(problem);
            }
        }
        if live <= 0.0 {
            Self::NotLoaded
        } else if capacity <= dead {
            Self::CarriesNoLiveLoad
        } else {
            match crate::problem::finite((capacity - dead) / live, path, "the rating factor") {
                Ok(factor) => Self::Factor(factor),
                Err(problem) => Self::NotRated(problem),
            }
        }
    }

    /// The factor for ordering: less is worse; `None` where nothing is asked for or known.
    #[must_use]
    pub fn rank(&self) -> Option<f64> {
        match self {
            Self::Factor(f) => Some(*f),
            Self::CarriesNoLiveLoad => Some(0.0),
            Self::NotLoaded | Self::NotRated(_) => None,
        }
    }
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn a_factor_is_a_number_only_where_it_means_something() {
        assert_eq!(Outcome::from_effects(10.0, 4.0, 3.0, "x"), Outcome::Factor(2.0));
        assert_eq!(Outcome::from_effects(10.0, 10.0, 3.0, "x"), Outcome::CarriesNoLiveLoad);
        assert_eq!(Outcome::from_effects(10.0, 14.0, 3.0, "x"), Outcome::CarriesNoLiveLoad);
        assert_eq!(Outcome::from_effects(10.0, 4.0, 0.0, "x"), Outcome::NotLoaded);
        for (c, d, l) in
            [(f64::NAN, 1.0, 1.0), (1.0, f64::INFINITY, 1.0), (1.0, 0.0, f64::NAN), (1e300, 0.0, 1e-300)]
        {
            assert!(matches!(Outcome::from_effects(c, d, l, "x"), Outcome::NotRated(_)));
        }
    }
}
