//! Posting of legal loads (MBE 6A.8). From memory, 3rd edition.
//!
//! Not for emergency vehicles, whose signs have axle, tandem and gross limits of their own, and not for
//! other rule sets, which have posting equations of their own.

use crate::check::Outcome;
use crate::problem::{Problem, finite};
use crate::quantity::Force;
use crate::units::WeightUnit;
use crate::units::mark::{One, ShortTon, Tonne};
use crate::worksheet::Recorder;
use crate::worksheet::ops::floor;
use crate::{clause, condition};

/// A vehicle with the outcome that governs its posting.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Rated<'a> {
    /// Id of the vehicle.
    pub id: &'a str,
    /// Its gross weight; 80 kip for the lane-type load.
    pub weight: Force,
    /// Its governing outcome.
    pub outcome: &'a Outcome,
    /// Whether it is one of the three AASHTO legal trucks, at which closure looks.
    pub standard: bool,
}

/// What a sign says of one type of vehicle.
#[derive(Clone, Debug, PartialEq)]
pub enum Sign {
    /// No limit is needed: the rating factor is 1.0 or more, or the vehicle has no effect.
    NotNeeded,
    /// A limit.
    Limit {
        /// Safe posting load.
        safe: Force,
        /// What stands on the sign, rounded down in its unit.
        shown: u32,
        /// Unit of the sign.
        unit: WeightUnit,
    },
    /// The type is not allowed on the bridge.
    NotAllowed(NotAllowed),
    /// Its rating is missing, so nothing can be said; the problem of the rating.
    NotKnown(Problem),
}

/// Why a type of vehicle is not allowed.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum NotAllowed {
    /// Rating factor below 0.3 (6A.8.3).
    Below03,
    /// Dead load leaves nothing for live load.
    NoLiveLoad,
    /// Its safe posting load, as the sign would show it, is below three tons (6A.8.1).
    UnderThreeTons,
}

/// Whether a bridge may stay open.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Closure {
    /// Nothing here asks for it.
    Open,
    /// To be closed: none of the standard legal trucks has a safe posting load of three tons (6A.8.1).
    UnderThreeTons,
    /// To be closed: every standard legal truck rates below 0.3, for which 6A.8.3 says to consider
    /// closure, and so none has a safe posting load of three tons.
    AllBelow03,
    /// Not known: a standard legal truck has no rating, and the others do not carry three tons.
    NotKnown,
}

impl Closure {
    /// Whether the bridge is to be closed.
    #[must_use]
    pub fn closes(self) -> bool {
        matches!(self, Self::UnderThreeTons | Self::AllBelow03)
    }
}

/// Posting of a bridge.
#[derive(Clone, Debug, PartialEq)]
pub struct Posting {
    /// Each vehicle with its sign, in the order given.
    pub signs: Vec<(String, Sign)>,
    /// Whether it may stay open.
    pub closure: Closure,
}

/// The least limit that a sign may show, three tons of its unit: two tonnes would be less than the three
/// short tons of 6A.8.1.
#[must_use]
pub const fn least_limit(unit: WeightUnit) -> (Force, u32) {
    match unit {
        WeightUnit::ShortTons => (Force::from_short_ton(3.0), 3),
        WeightUnit::Tonnes => (Force::from_tonne(3.0), 3),
    }
}

/// Posting from the rated legal vehicles.
///
/// Strength always decides; whether an outcome of Service II takes part is for the rule set to settle
/// before it hands in `outcome`.
pub fn post<R: Recorder>(rec: &mut R, vehicles: &[Rated<'_>], unit: WeightUnit) -> Posting {
    let signs: Vec<Sign> = vehicles.iter().map(|vehicle| sign(rec, vehicle, unit)).collect();
    let standard = || vehicles.iter().zip(&signs).filter(|(vehicle, _)| vehicle.standard);
    let carries = |sign: &Sign| matches!(sign, Sign::NotNeeded | Sign::Limit { .. });
    let below = |sign: &Sign| matches!(sign, Sign::NotAllowed(NotAllowed::Below03 | NotAllowed::NoLiveLoad));
    let closure = if standard().any(|(_, sign)| carries(sign)) {
        Closure::Open
    } else if standard().count() == 0 || standard().any(|(_, sign)| matches!(sign, Sign::NotKnown(_))) {
        Closure::NotKnown
    } else if standard().all(|(_, sign)| below(sign)) {
        Closure::AllBelow03
    } else {
        Closure::UnderThreeTons
    };
    Posting { signs: vehicles.iter().map(|vehicle| vehicle.id.to_owned()).zip(signs).collect(), closure }
}

fn sign<R: Recorder>(rec: &mut R, vehicle: &Rated<'_>, unit: WeightUnit) -> Sign {
    let factor = match vehicle.outcome {
        Outcome::Factor(factor) => match finite(*factor, "posting", "the rating factor") {
            Ok(factor) => factor,
            Err(problem) => return Sign::NotKnown(problem),
        },
        Outcome::CarriesNoLiveLoad => return Sign::NotAllowed(NotAllowed::NoLiveLoad),
        Outcome::NotLoaded => return Sign::NotNeeded,
        Outcome::NotRated(problem) => return Sign::NotKnown(problem.clone()),
    };
    let rf = rec.found("RF", &format!("rating factor of {}", vehicle.id), factor, One, 0.0, || {
        "the outcome that governs its posting".to_owned()
    });
    if carried(rec, rf) {
        return Sign::NotNeeded;
    }
    if barred(rec, rf) {
        return Sign::NotAllowed(NotAllowed::Below03);
    }
    let what = format!("gross weight of {}", vehicle.id);
    let weight = |rec: &mut R| {
        let how = || "sum of its axles".to_owned();
        match unit {
            WeightUnit::ShortTons => rec.found("W", &what, vehicle.weight, ShortTon, 0.0, how),
            WeightUnit::Tonnes => rec.found("W", &what, vehicle.weight, Tonne, 0.0, how),
        }
    };
    let w = weight(rec);
    let (safe, written, shown) = match unit {
        WeightUnit::ShortTons => {
            let safe = safe_load_short_tons(rec, w, rf);
            let written = sign_short_tons(rec, safe);
            (safe, written, written.q.in_short_ton())
        }
        WeightUnit::Tonnes => {
            let safe = safe_load_tonnes(rec, w, rf);
            let written = sign_tonnes(rec, safe);
            (safe, written, written.q.in_tonne())
        }
    };
    if under_three_tons(rec, written) {
        return Sign::NotAllowed(NotAllowed::UnderThreeTons);
    }
    // Whole already; rounding only takes off what the conversion of units left behind.
    Sign::Limit { safe: safe.q, shown: shown.round() as u32, unit }
}

condition! {
    fn carried(RF: f64 [One]) { RF >= 1.0 }
    cite "AASHTO MBE 3rd ed. 6A.8.1" yes "no posting for this vehicle" no "to be posted"
}

condition! {
    fn barred(RF: f64 [One]) { RF < 0.3 }
    cite "AASHTO MBE 3rd ed. 6A.8.3" yes "this type of vehicle is not allowed" no "a safe posting load exists"
}

condition! {
    fn under_three_tons(W_sign: Force [ShortTon]) { W_sign < 3.0 }
    cite "AASHTO MBE 3rd ed. 6A.8.1" yes "less than three tons: not allowed" no "three tons or more"
}

clause! {
    /// Safe posting load, for a rating factor from 0.3 to below 1.0.
    fn safe_load_short_tons(W: Force [ShortTon], RF: f64 [One]) -> W_safe: Force [ShortTon]
    { W / 0.7 * (RF - 0.3) }
    cite "AASHTO MBE 3rd ed. (6A.8.3-1)" what "safe posting load"
}

clause! {
    /// Safe posting load, for a rating factor from 0.3 to below 1.0.
    fn safe_load_tonnes(W: Force [Tonne], RF: f64 [One]) -> W_safe: Force [Tonne] { W / 0.7 * (RF - 0.3) }
    cite "AASHTO MBE 3rd ed. (6A.8.3-1)" what "safe posting load"
}

clause! {
    /// Whole short tons, rounded down.
    fn sign_short_tons(W_safe: Force [ShortTon]) -> W_sign: Force [ShortTon] { floor(W_safe) }
    cite "rounded down in the unit of the sign" what "weight on the sign"
}

clause! {
    /// Whole tonnes, rounded down.
    fn sign_tonnes(W_safe: Force [Tonne]) -> W_sign: Force [Tonne] { floor(W_safe) }
    cite "rounded down in the unit of the sign" what "weight on the sign"
}
