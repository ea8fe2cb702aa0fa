//! What governs: the worst check of each vehicle and of the bridge, the next ones behind it, what got
//! no number, and the posting.

use super::result::{Check, Rating, VehicleResult};
use crate::basis::{Basis, Case, Ruling};
use crate::bridge::Bridge;
use crate::check::{Level, LimitState, Outcome, Posting, Sign};
use crate::problem::Problem;

/// How many checks are named behind the governing one.
const NEXT: usize = 5;

/// For sorting from the worst: what is not loaded or has no number comes last.
#[must_use]
pub fn order(outcome: &Outcome) -> f64 {
    outcome.rank().unwrap_or(f64::MAX)
}

/// No posting worked out yet.
#[must_use]
pub const fn unknown_posting() -> Posting {
    Posting { sign: Sign::NotKnown, safe: Vec::new() }
}

/// Index of the worst check at the legal level among those that may rule a posting.
#[must_use]
pub fn worst_legal(checks: &[Check], cases: &[Case], service_posts: bool) -> Option<usize> {
    worst(checks, |c| {
        cases[c.key.load].level == Level::Legal && (service_posts || c.key.state != LimitState::ServiceII)
    })
}

fn worst(checks: &[Check], wanted: impl Fn(&Check) -> bool) -> Option<usize> {
    (0..checks.len())
        .filter(|i| wanted(&checks[*i]) && checks[*i].outcome.rank().is_some())
        .min_by(|a, b| order(&checks[*a].outcome).total_cmp(&order(&checks[*b].outcome)))
}

/// Fills in everything that follows from the checks.
pub fn govern<B: Basis>(rating: &mut Rating, bridge: &Bridge, basis: &B, cases: &[Case]) {
    let service_posts = basis.service_posts(bridge);
    rating.governing = worst_legal(&rating.checks, cases, service_posts);
    rating.by_vehicle = (0..cases.len()).map(|load| of_vehicle(rating, service_posts, cases, load)).collect();
    rating.next = next(rating, cases, service_posts);
    rating.not_rated = not_rated(&rating.checks);
    let ruling: Vec<Ruling<'_>> = cases
        .iter()
        .enumerate()
        .filter(|(_, case)| case.level == Level::Legal)
        .map(|(load, case)| Ruling {
            load,
            case,
            outcome: ruling_outcome(rating, load, rating.by_vehicle[load].ruling),
            strength: ruling_outcome(rating, load, rating.by_vehicle[load].strength),
        })
        .collect();
    rating.posting = basis.posting(bridge, &ruling);
}

fn of_vehicle(rating: &Rating, service_posts: bool, cases: &[Case], load: usize) -> VehicleResult {
    let of = |state| worst(&rating.checks, |c| c.key.load == load && c.key.state == state);
    let (strength, service) = (of(LimitState::StrengthI), of(LimitState::ServiceII));
    let may_rule = if service_posts || cases[load].level != Level::Legal { service } else { None };
    let ruling = [strength, may_rule]
        .into_iter()
        .flatten()
        .min_by(|a, b| order(&rating.checks[*a].outcome).total_cmp(&order(&rating.checks[*b].outcome)));
    let factor = ruling.and_then(|i| rating.checks[i].outcome.rank());
    VehicleResult {
        load,
        strength,
        service,
        ruling,
        rating_weight: factor.and_then(|f| cases[load].weight.map(|w| w * f)),
    }
}

/// The outcome that rules for a vehicle: of strength a girder without a number makes the whole vehicle
/// not known, since the missing one may be the worst.
fn ruling_outcome(rating: &Rating, load: usize, worst: Option<usize>) -> Outcome {
    let gap = rating.checks.iter().find(|c| {
        c.key.load == load
            && c.key.state == LimitState::StrengthI
            && c.key.action != crate::check::Action::Bearing
            && matches!(c.outcome, Outcome::NotRated(_))
    });
    match (gap, worst) {
        (Some(gap), _) => gap.outcome.clone(),
        (None, Some(i)) => rating.checks[i].outcome.clone(),
        (None, None) => Outcome::NotLoaded,
    }
}

/// The next checks behind the governing one that differ from those before in vehicle, girder, action or
/// limit state; stations beside each other say nothing new.
fn next(rating: &Rating, cases: &[Case], service_posts: bool) -> Vec<usize> {
    let mut sorted: Vec<usize> = (0..rating.checks.len())
        .filter(|i| {
            let c = &rating.checks[*i];
            cases[c.key.load].level == Level::Legal
                && c.outcome.rank().is_some()
                && (service_posts || c.key.state != LimitState::ServiceII)
        })
        .collect();
    sorted.sort_by(|a, b| {
        order(&rating.checks[*a].outcome).total_cmp(&order(&rating.checks[*b].outcome)).then(a.cmp(b))
    });
    let name = |i: usize| {
        let k = &rating.checks[i].key;
        (k.load, k.line, k.action, k.state)
    };
    let mut seen: Vec<_> = rating.governing.map(name).into_iter().collect();
    let mut found = Vec::new();
    for i in sorted {
        if found.len() == NEXT {
            break;
        }
        if !seen.contains(&name(i)) {
            seen.push(name(i));
            found.push(i);
        }
    }
    found
}

/// Why checks got no number, each reason once.
fn not_rated(checks: &[Check]) -> Vec<Problem> {
    let mut reasons: Vec<Problem> = Vec::new();
    for check in checks {
        if let Outcome::NotRated(problem) = &check.outcome
            && !reasons.contains(problem)
        {
            reasons.push(problem.clone());
        }
    }
    reasons
}
