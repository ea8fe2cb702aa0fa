//! Where the bridge is, in which state, and what uses it.

use crate::units::Entered;

/// Where the bridge is and who rates it. Words only; nothing here enters a figure but the year.
#[derive(Clone, Debug, Default, PartialEq)]
pub struct Site {
    /// Name of the bridge.
    pub name: String,
    /// Road and feature crossed.
    pub place: String,
    /// Year built, where known: chooses default strengths.
    pub year_built: Option<i32>,
    /// Condition of the superstructure at the last inspection.
    pub condition: Option<ConditionRating>,
    /// Name of the rater.
    pub rater: String,
    /// Name of the checker.
    pub checker: String,
    /// Posting in force before this rating, as it reads.
    pub posting_before: String,
    /// Rating in force before this one, as it reads.
    pub rating_before: String,
}

/// Condition of the member as the rating sees it.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum ConditionRating {
    /// Good or satisfactory: 6 and above.
    Good,
    /// Fair: 5.
    Fair,
    /// Poor: 4 and below.
    Poor,
}

/// Traffic and riding surface.
#[derive(Clone, Debug, PartialEq)]
pub struct Traffic {
    /// Trucks a day in one direction; none where not known.
    pub adtt: Option<Entered<f64>>,
    /// How smooth approaches, joints and deck are.
    pub riding: Riding,
    /// The user's own factors, each with its reason.
    pub overrides: Overrides,
}

/// Riding surface at approaches, joints and deck.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Riding {
    /// Smooth approaches, joints and deck.
    Smooth,
    /// Minor deviations or depressions.
    Minor,
    /// Anything else.
    Rough,
    /// Not looked at: taken as rough.
    NotInspected,
}

/// Factors that the user sets in place of the rule set's, each with a reason that is printed.
#[derive(Clone, Debug, Default, PartialEq)]
pub struct Overrides {
    /// The factor's name, as the rule set calls it, its value and the reason.
    pub factors: Vec<(String, Entered<f64>, String)>,
}
