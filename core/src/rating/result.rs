//! What a rating holds: every check, what governs, and the posting.

use crate::check::{Action, Level, LimitState, Outcome};
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

/// What kind of vehicle, as signs tell them apart.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Class {
    /// A notional design load.
    Design,
    /// A single-unit truck.
    SingleUnit,
    /// A truck and trailer or semitrailer.
    Combination,
    /// A vehicle of the user's own.
    Own,
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

/// One check with what went into it. Effects and capacity are of the action's own quantity, in the
/// base unit of [`crate::quantity`] (moment, force or stress).
#[derive(Clone, Debug, PartialEq)]
pub struct Check {
    /// Which one.
    pub key: Key,
    /// What comes out.
    pub outcome: Outcome,
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

/// Whether it must be posted, and how.
#[derive(Clone, Debug, PartialEq)]
pub struct Posting {
    /// Whether any vehicle needs a limit, none is rated, or the bridge should be closed.
    pub sign: Sign,
    /// One entry a legal vehicle.
    pub safe: Vec<SafeLoad>,
}

/// The sign that follows.
#[derive(Clone, Copy, Debug, PartialEq)]
pub enum Sign {
    /// Every legal vehicle passes.
    None,
    /// Limits for single units and combinations, in the sign's own unit, rounded down; `None`
    /// where that class needs no limit.
    Limit {
        /// For single-unit trucks.
        single_unit: Option<u32>,
        /// For combinations.
        combination: Option<u32>,
        /// The unit of both figures.
        unit: SignUnit,
    },
    /// Below the least limit that a bridge may stay open with, or no vehicle type allowed: close.
    Close,
    /// No answer: something that has to be rated got no number.
    NotKnown,
}

/// Unit on a sign.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum SignUnit {
    /// Short tons of 2,000 lb.
    ShortTons,
    /// Tonnes.
    Tonnes,
}

/// The safe load of one vehicle type.
#[derive(Clone, Debug, PartialEq)]
pub struct SafeLoad {
    /// Index into [`Rating::loads`].
    pub load: usize,
    /// Ruling factor, where there is one.
    pub factor: Option<f64>,
    /// What follows.
    pub limit: Limit,
}

/// What follows for one vehicle type.
#[derive(Clone, Copy, Debug, PartialEq)]
pub enum Limit {
    /// It passes at its full weight.
    Full,
    /// Up to this weight (not rounded).
    Weight(Force),
    /// Not allowed at all.
    NotAllowed,
    /// No number.
    NotKnown,
}
