//! What follows from the outcomes for a sign at the bridge.

use crate::quantity::Force;
use crate::units::WeightUnit;

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
    /// Limits for single units and combinations.
    Limit {
        /// For single-unit trucks.
        single_unit: ClassLimit,
        /// For combinations.
        combination: ClassLimit,
        /// The unit of both figures.
        unit: WeightUnit,
    },
    /// Below the least limit that a bridge may stay open with, or no vehicle type allowed: close.
    Close,
    /// No answer: something that has to be rated got no number.
    NotKnown,
}

/// What a sign says of a class of vehicles.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum ClassLimit {
    /// All of the class pass.
    None,
    /// Up to this weight, in the sign's own unit, rounded down.
    Weight(u32),
    /// None of the class may cross.
    NotAllowed,
}

impl ClassLimit {
    /// The stricter of two.
    #[must_use]
    pub fn stricter(self, other: Self) -> Self {
        match (self, other) {
            (Self::NotAllowed, _) | (_, Self::NotAllowed) => Self::NotAllowed,
            (Self::Weight(a), Self::Weight(b)) => Self::Weight(a.min(b)),
            (Self::None, limit) | (limit, Self::None) => limit,
        }
    }
}

/// The safe load of one vehicle type.
#[derive(Clone, Debug, PartialEq)]
pub struct SafeLoad {
    /// Index into the loads of the rating.
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
