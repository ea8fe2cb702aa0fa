//! From the outcomes of the legal vehicles to the sign at the bridge.
//!
//! Strength says whether a vehicle type may cross at all and whether the bridge stays open. Service may
//! lower a limit, but neither bars a type nor closes the bridge: a limit that it asks for is never less
//! than the least that a sign may show.

use crate::basis::{Case, Ruling};
use crate::check::{Class, ClassLimit, Limit, LimitState, Outcome, Posting, SafeLoad, Sign};
use crate::clauses::mbe::legal_vehicles::{Family, LEGAL_TRUCKS};
use crate::clauses::mbe::posting::{self as clause, Rated, least_limit, post};
use crate::problem::Problem;
use crate::quantity::Force;
use crate::units::WeightUnit;
use crate::worksheet::{Recorder, Silent};

/// The posting of a bridge.
///
/// A sign tells classes apart, not types, so the strictest type rules its class: a type that is not
/// allowed bars the class, since no weight would be safe for it. Vehicles of one's own may be of
/// either class and rule both.
pub fn posting(unit: WeightUnit, ruling: &[Ruling<'_>]) -> Posting {
    let by_strength = signs(unit, ruling, |r| &r.strength);
    let by_ruling = signs(unit, ruling, |r| &r.outcome);
    let limits: Vec<(Limit, ClassLimit)> = by_strength
        .signs
        .iter()
        .zip(&by_ruling.signs)
        .map(|((_, strength), (_, ruling))| limit(unit, strength, ruling))
        .collect();
    let safe = ruling
        .iter()
        .zip(&limits)
        .map(|(r, (limit, _))| SafeLoad { load: r.load, factor: r.outcome.rank(), limit: *limit })
        .collect();
    let of = |class| {
        ruling
            .iter()
            .zip(&limits)
            .filter(|(r, _)| r.case.class == class || r.case.class == Class::Own)
            .fold(ClassLimit::None, |so_far, (_, (_, limit))| so_far.stricter(*limit))
    };
    let known = limits.iter().all(|(limit, _)| *limit != Limit::NotKnown);
    let sign = if by_strength.closure.closes() {
        Sign::Close
    } else if ruling.is_empty() || !known {
        Sign::NotKnown
    } else {
        match (of(Class::SingleUnit), of(Class::Combination)) {
            (ClassLimit::None, ClassLimit::None) => Sign::None,
            (single_unit, combination) => Sign::Limit { single_unit, combination, unit },
        }
    };
    Posting { sign, safe }
}

/// What follows for one vehicle, and what it asks of the sign of its class.
fn limit(unit: WeightUnit, strength: &clause::Sign, ruling: &clause::Sign) -> (Limit, ClassLimit) {
    use clause::Sign::{Limit as Weight, NotAllowed, NotKnown, NotNeeded};
    match (strength, ruling) {
        (NotAllowed(_), _) => (Limit::NotAllowed, ClassLimit::NotAllowed),
        (NotKnown(_), _) | (_, NotKnown(_)) => (Limit::NotKnown, ClassLimit::None),
        (_, NotNeeded) => (Limit::Full, ClassLimit::None),
        (_, Weight { safe, shown, .. }) => (Limit::Weight(*safe), ClassLimit::Weight(*shown)),
        (_, NotAllowed(_)) => {
            let (safe, shown) = least_limit(unit);
            (Limit::Weight(safe), ClassLimit::Weight(shown))
        }
    }
}

fn signs<'a>(
    unit: WeightUnit,
    ruling: &'a [Ruling<'_>],
    outcome: impl Fn(&'a Ruling<'_>) -> &'a Outcome,
) -> clause::Posting {
    // A vehicle without a weight has no safe load.
    let no_weight = Outcome::NotRated(Problem::error("", "its weight is not known", "enter its axles"));
    let rated: Vec<Rated<'_>> = ruling
        .iter()
        .map(|r| Rated {
            id: &r.case.id,
            weight: r.case.weight.unwrap_or(Force::ZERO),
            outcome: if r.case.weight.is_some() { outcome(r) } else { &no_weight },
            standard: is_standard(r.case),
        })
        .collect();
    post(&mut Silent, &rated, unit)
}

/// Whether a case is one of the three trucks at which closure looks. A vehicle of one's own is none.
fn is_standard(case: &Case) -> bool {
    case.class != Class::Own
        && LEGAL_TRUCKS.iter().any(|row| row.family == Family::Standard && row.id == case.id)
}

/// The safe load of one vehicle, line by line.
pub fn safe_load<R: Recorder>(
    rec: &mut R,
    unit: WeightUnit,
    case: &Case,
    state: LimitState,
    outcome: &Outcome,
) {
    let Some(weight) = case.weight else { return };
    let rated = Rated { id: &case.name, weight, outcome, standard: false };
    let signs = post(rec, &[rated], unit).signs;
    if state == LimitState::ServiceII && matches!(signs[0].1, clause::Sign::NotAllowed(_)) {
        rec.remark(|| {
            "Service alone bars no vehicle: its limit is the least that a sign may show, three tons."
                .to_owned()
        });
    }
}
