//! Posting by MBE 6A.8; from memory of the 3rd edition (2018).

use crate::check::{Class, Limit, Outcome, Posting, SafeLoad, Sign};
use crate::clause;
use crate::quantity::Force;
use crate::units::WeightUnit;
use crate::units::mark::{One, ShortTon};
use crate::worksheet::{Recorder, Val};

/// Below this factor a vehicle type is not allowed at all.
pub const LEAST_FACTOR: f64 = 0.3;

/// A bridge that cannot carry a gross weight of three short tons must be closed (MBE 6A.8.1).
pub const LEAST_LOAD: Force = Force::from_short_ton(3.0);

clause! {
    /// Safe posting load of a vehicle type, for 0.3 <= RF < 1. W 25 tons and RF 0.65: 12.5 tons.
    pub fn safe_load(W: Force [ShortTon], RF: f64 [One]) -> W_safe: Force [ShortTon]
    { W / 0.7 * (RF - 0.3) }
    cite "MBE 3rd ed. 6A.8.3 (6A.8.3-1)" what "safe posting load"
}

/// One legal vehicle with what came out for it.
#[derive(Clone, Debug)]
pub struct Rated {
    /// Index into the loads of the rating.
    pub load: usize,
    /// How signs see it.
    pub class: Class,
    /// Gross weight.
    pub weight: Force,
    /// Ruling outcome.
    pub outcome: Outcome,
    /// Ruling outcome of strength alone: only that may close a bridge.
    pub strength: Outcome,
    /// Whether it is one of the three routine legal trucks.
    pub routine: bool,
}

/// What follows for one vehicle type.
pub fn limit<R: Recorder>(rec: &mut R, weight: Force, outcome: &Outcome) -> Limit {
    match outcome {
        Outcome::Factor(f) if *f >= 1.0 => {
            rec.remark(|| "The factor is 1.0 or more: it passes at its full weight.".to_owned());
            Limit::Full
        }
        Outcome::Factor(f) if *f >= LEAST_FACTOR => {
            Limit::Weight(safe_load(rec, Val::bare(weight), Val::bare(*f)).q)
        }
        Outcome::Factor(_) | Outcome::CarriesNoLiveLoad => {
            rec.remark(|| {
                "The factor is below 0.3: this vehicle type is not allowed (MBE 6A.8.3).".to_owned()
            });
            Limit::NotAllowed
        }
        Outcome::NotLoaded => Limit::Full,
        Outcome::NotRated(_) => Limit::NotKnown,
    }
}

/// The posting of a bridge.
///
/// The sign names one limit for single units and one for combinations, each the least of its types,
/// rounded down in the unit of the sign. A class of which one type is not allowed at all has no safe
/// weight that a sign could name for it, so its limit is that of the least allowed type, but not more
/// than the least load. The bridge is to be closed when strength gives less than 0.3 for all three
/// routine trucks, or when a limit falls below three short tons by strength; service alone never
/// closes it.
pub fn posting<R: Recorder>(rec: &mut R, rated: &[Rated], unit: WeightUnit) -> Posting {
    let safe: Vec<SafeLoad> = rated
        .iter()
        .map(|r| SafeLoad { load: r.load, factor: r.outcome.rank(), limit: limit(rec, r.weight, &r.outcome) })
        .collect();
    let sign = if rated.is_empty() || safe.iter().any(|s| s.limit == Limit::NotKnown) {
        Sign::NotKnown
    } else if must_close(rated) {
        Sign::Close
    } else {
        let of = |class| least(rated, &safe, class).map(|w| floor_in(unit, w));
        match (of(Class::SingleUnit), of(Class::Combination)) {
            (None, None) => Sign::None,
            (single_unit, combination) => Sign::Limit { single_unit, combination, unit },
        }
    };
    Posting { sign, safe }
}

fn must_close(rated: &[Rated]) -> bool {
    let low = |r: &Rated| r.strength.rank().is_some_and(|f| f < LEAST_FACTOR);
    let mut routine = rated.iter().filter(|r| r.routine).peekable();
    let all_routine_low = routine.peek().is_some() && routine.all(low);
    let below_three = rated.iter().any(|r| {
        matches!(limit(&mut crate::worksheet::Silent, r.weight, &r.strength), Limit::Weight(w) if w < LEAST_LOAD)
    });
    all_routine_low || below_three
}

/// Least limit of a class; `None` where all of it passes.
fn least(rated: &[Rated], safe: &[SafeLoad], class: Class) -> Option<Force> {
    let own = |c: Class| c == class || (c == Class::Own && class == Class::SingleUnit);
    rated
        .iter()
        .zip(safe)
        .filter(|(r, _)| own(r.class))
        .filter_map(|(_, s)| match s.limit {
            Limit::Weight(w) => Some(w),
            Limit::NotAllowed => Some(LEAST_LOAD),
            Limit::Full | Limit::NotKnown => None,
        })
        .reduce(Force::min)
}

/// Whole units, rounded down; what is short of a whole one by round-off alone counts as whole.
#[allow(clippy::cast_possible_truncation, clippy::cast_sign_loss)]
fn floor_in(unit: WeightUnit, weight: Force) -> u32 {
    let figure = match unit {
        WeightUnit::ShortTons => weight.in_short_ton(),
        WeightUnit::Tonnes => weight.in_tonne(),
    };
    libm::floor(figure + 1e-9).clamp(0.0, f64::from(u32::MAX)) as u32
}
