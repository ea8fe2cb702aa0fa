//! What a rating holds: every check, what governs, and the posting.

use crate::check::{Action, Class, Level, LimitState, Outcome, Posting};
use crate::problem::Problem;
use crate::quantity::{Force, Length, LineLoad};

/// Everything that came out, for one bridge under one rule set.
#[derive(Clone, Debug, PartialEq)]
pub struct Rating {
    /// Id of the rule set, such as `mbe-a`.
    pub basis: &'static str,
    /// Name of the rule set with its editions.
    pub basis_name: &'static str,
    /// What was driven over the bridge, at which level.
    pub loads: Vec<LiveLoad>,
    /// One summary a girder line.
    pub lines: Vec<LineSummary>,
    /// Every check.
    pub checks: Vec<Check>,
    /// Index of the check with the least factor at the legal level among those that may post.
    pub governing: Option<usize>,
    /// The next different ones behind it (other vehicle, girder or limit state), worst first.
    pub next: Vec<usize>,
    /// What comes out for each of [`Rating::loads`].
    pub by_vehicle: Vec<VehicleResult>,
    /// Whether it must be posted, and how.
    pub posting: Posting,
    /// What got no number, and why; each said once.
    pub not_rated: Vec<Problem>,
    /// Notes and warnings that travel with the answer (range of use, assumptions of a method).
    pub notes: Vec<Problem>,
}

/// A vehicle at a level.
#[derive(Clone, Debug, PartialEq)]
pub struct LiveLoad {
    /// Stable id, such as `su7`.
    pub id: String,
    /// Name as the standard prints it, such as SU7.
    pub name: String,
    /// Level.
    pub level: Level,
    /// Gross weight; none for a notional design load.
    pub weight: Option<Force>,
    /// Whether it is a single unit, a combination or a design load: signs differ.
    pub class: Class,
}

/// Names a check: stable between ratings of the same book.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Key {
    /// Index of the girder line.
    pub line: usize,
    /// Where along the span.
    pub x: Length,
    /// Action.
    pub action: Action,
    /// Limit state.
    pub state: LimitState,
    /// Index into [`Rating::loads`].
    pub load: usize,
}

/// One check with what went into it.
#[derive(Clone, Debug, PartialEq)]
pub struct Check {
    /// Which one.
    pub key: Key,
    /// What comes out.
    pub outcome: Outcome,
    /// What went into it; none where the outcome is `NotRated`.
    pub figures: Option<Figures>,
}

/// The figures of a check. Effects and capacity are of the action's own quantity, in the base unit
/// of [`crate::quantity`] (moment, force or stress).
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Figures {
    /// Capacity with all its factors.
    pub capacity: f64,
    /// Dead load effects, without load factors.
    pub dead: DeadEffects,
    /// Live load effect on the girder with share and dynamic allowance, without load factor.
    pub live: f64,
    /// Factors that were used.
    pub factors: Factors,
    /// Position of the first axle for the governing effect, from the near bearing, and whether the
    /// vehicle faces back.
    pub position: Option<(Length, bool)>,
}

/// Dead load effects by stage.
#[derive(Clone, Copy, Debug, Default, PartialEq)]
pub struct DeadEffects {
    /// Component load on the bare girder.
    pub dc1: f64,
    /// Component load added later.
    pub dc2: f64,
    /// Wearing surface and utilities.
    pub dw: f64,
}

/// The factors of one check.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Factors {
    /// On component dead load.
    pub dc: f64,
    /// On the wearing surface.
    pub dw: f64,
    /// On live load.
    pub live: f64,
    /// Dynamic allowance, as a fraction.
    pub dynamic: f64,
    /// Share of a lane that the girder takes.
    pub share: f64,
    /// Resistance factor.
    pub resistance: f64,
    /// Condition factor.
    pub condition: f64,
    /// System factor.
    pub system: f64,
}

/// Capacity of a girder line at a station for one action and limit state, factored.
#[derive(Clone, Debug, PartialEq)]
pub struct Capacity {
    /// Index of the girder line.
    pub line: usize,
    /// Where.
    pub x: Length,
    /// Action.
    pub action: Action,
    /// Limit state.
    pub state: LimitState,
    /// In the base unit of the action, or why there is none.
    pub value: Result<f64, Problem>,
}

/// What holds for a whole girder line.
#[derive(Clone, Debug, PartialEq)]
pub struct LineSummary {
    /// Name, such as G3.
    pub name: String,
    /// Component load on the bare girder.
    pub dc1: LineLoad,
    /// Component load added later.
    pub dc2: LineLoad,
    /// Wearing surface and utilities.
    pub dw: LineLoad,
    /// Share of a lane for moment, or why there is none.
    pub share_moment: Result<f64, Problem>,
    /// Share of a lane for shear and reactions.
    pub share_shear: Result<f64, Problem>,
    /// Capacities along the line, for the drawing of demand against capacity.
    pub capacities: Vec<Capacity>,
    /// Index of its own worst check at the legal level.
    pub governing: Option<usize>,
}

/// What comes out for one vehicle at one level.
#[derive(Clone, Debug, PartialEq)]
pub struct VehicleResult {
    /// Index into [`Rating::loads`].
    pub load: usize,
    /// Index of the worst strength check.
    pub strength: Option<usize>,
    /// Index of the worst service check.
    pub service: Option<usize>,
    /// Index of the one that rules for this vehicle (whether service may rule is a setting of the
    /// rule set).
    pub ruling: Option<usize>,
    /// The vehicle's gross weight times the ruling factor, rounded down nowhere; none for design
    /// loads and where there is no factor.
    pub rating_weight: Option<Force>,
}
