//! One check from its parts: dead effects at the place, the live effect on the girder, the factors,
//! the capacity.

use super::effects::Peak;
use super::govern::order;
use super::result::{Check, DeadEffects, Factors, Figures, Key};
use crate::basis::{Amount, Basis, FaceModuli, LoadFactors, Resistance};
use crate::check::{Action, Outcome};
use crate::clause;
use crate::load::dead::DeadLoad;
use crate::problem::Problem;
use crate::quantity::{Force, Length, LineLoad, Modulus, Moment, Stress};
use crate::units::mark::{Ft, In3, Kip, KipFt, KipPerFt, Ksi, One};
use crate::worksheet::{Recorder, Silent, Val};

clause! {
    /// Moment of a uniform load on a simple span, at `x` from the near bearing.
    pub fn uniform_moment(w: LineLoad [KipPerFt], x: Length [Ft], L: Length [Ft]) -> M: Moment [KipFt]
    { w * x * (L - x) / 2.0 }
    cite "statics" what "moment of a uniform load on a simple span"
}

clause! {
    /// Shear of a uniform load on a simple span, at `x` from the near bearing; positive upward at the
    /// left of the cut.
    pub fn uniform_shear(w: LineLoad [KipPerFt], x: Length [Ft], L: Length [Ft]) -> V: Force [Kip]
    { w * (L / 2.0 - x) }
    cite "statics" what "shear of a uniform load on a simple span"
}

clause! {
    /// Reaction of a uniform load on a simple span.
    pub fn uniform_reaction(w: LineLoad [KipPerFt], L: Length [Ft]) -> R: Force [Kip]
    { w * L / 2.0 }
    cite "statics" what "reaction of a uniform load on a simple span"
}

clause! {
    /// Live load moment on one girder: the share of what a whole lane makes. The dynamic allowance
    /// goes on axles, not on lane load.
    pub fn live_moment(g: f64 [One], IM: f64 [One], M_truck: Moment [KipFt], M_lane: Moment [KipFt])
        -> M_LL: Moment [KipFt] { g * (M_truck * (1.0 + IM) + M_lane) }
    cite "share of a lane, dynamic allowance on axles" what "live load moment on the girder"
}

clause! {
    /// Live load shear or reaction on one girder.
    pub fn live_force(g: f64 [One], IM: f64 [One], V_truck: Force [Kip], V_lane: Force [Kip])
        -> V_LL: Force [Kip] { g * (V_truck * (1.0 + IM) + V_lane) }
    cite "share of a lane, dynamic allowance on axles" what "live load force on the girder"
}

clause! {
    /// Bending stress of a moment on a section modulus.
    pub fn bending_stress(M: Moment [KipFt], S: Modulus [In3]) -> f: Stress [Ksi]
    { 12.0 * M / S }
    cite "mechanics" what "bending stress"
}

/// What a check needs besides its key.
pub struct Parts<'a> {
    /// Dead load of the line.
    pub dead: &'a DeadLoad,
    /// Span.
    pub span: Val<Length>,
    /// Station, on its line.
    pub x: Val<Length>,
    /// Share of a lane.
    pub share: Val<f64>,
    /// Dynamic allowance.
    pub dynamic: Val<f64>,
    /// Load factors.
    pub factors: LoadFactors,
    /// Live load effect of a whole lane.
    pub peak: &'a Peak,
    /// Whether it acts against the dead load there; relief by dead load is not counted.
    pub against_dead: bool,
    /// The same on lines of the sheet: truck and lane parts.
    pub lane_effect: [Amount; 2],
    /// Capacity.
    pub resistance: &'a Resistance,
    /// Moduli of the faces, for stresses.
    pub moduli: Option<&'a [Option<FaceModuli>; 2]>,
}

/// Works one check.
pub fn check<R: Recorder, B: Basis>(rec: &mut R, basis: &B, key: Key, parts: &Parts<'_>) -> Check {
    match key.action {
        Action::Moment => {
            let dead = dead_moments(rec, parts);
            let live = live_of_moment(rec, parts);
            finish(rec, basis, key, parts, dead.map(Amount::Moment), Amount::Moment(live))
        }
        Action::Shear => {
            let [dc1, dc2, dw] = [parts.dead.dc1, parts.dead.dc2, parts.dead.dw]
                .map(|w| uniform_shear(rec, w, parts.x, parts.span));
            // The peak is that of the sense in which dead load shears, or of either where it does not.
            let size = |v: Val<Force>| Amount::Force(Val { q: v.q.abs(), line: v.line });
            let live = live_of_force(rec, parts);
            let dead = if parts.against_dead {
                // Relief by dead load is not counted.
                [dc1, dc2, dw].map(|v| Amount::Force(Val { q: Force::ZERO, line: v.line }))
            } else {
                [size(dc1), size(dc2), size(dw)]
            };
            finish(rec, basis, key, parts, dead, Amount::Force(live))
        }
        Action::Bearing => {
            let dead = [parts.dead.dc1, parts.dead.dc2, parts.dead.dw]
                .map(|w| Amount::Force(uniform_reaction(rec, w, parts.span)));
            let live = live_of_force(rec, parts);
            finish(rec, basis, key, parts, dead, Amount::Force(live))
        }
        Action::Stress => stress(rec, basis, key, parts),
    }
}

/// Elastic stresses add stage by stage, at both faces; the worse face rules.
fn stress<R: Recorder, B: Basis>(rec: &mut R, basis: &B, key: Key, parts: &Parts<'_>) -> Check {
    let Some(faces) = parts.moduli else {
        let problem = Problem::error("", "section moduli are missing", "check the member's section");
        return not_rated(key, problem);
    };
    let worst = faces
        .iter()
        .enumerate()
        .filter_map(|(i, face)| face.as_ref().map(|face| (i, face)))
        .map(|(i, face)| {
            let quiet = face_check(&mut Silent, basis, key, parts, face);
            (order(&quiet.outcome), i, face)
        })
        .min_by(|a, b| a.0.total_cmp(&b.0));
    match worst {
        Some((_, i, face)) => {
            rec.remark(|| ["The top face rules.", "The bottom face rules."][i].to_owned());
            face_check(rec, basis, key, parts, face)
        }
        None => {
            not_rated(key, Problem::error("", "no face of the girder can be looked at", "check its section"))
        }
    }
}

fn face_check<R: Recorder, B: Basis>(
    rec: &mut R,
    basis: &B,
    key: Key,
    parts: &Parts<'_>,
    face: &FaceModuli,
) -> Check {
    let [dc1, dc2, dw] = dead_moments(rec, parts);
    let live = live_of_moment(rec, parts);
    let dead = [
        bending_stress(rec, dc1, face.bare),
        bending_stress(rec, dc2, face.long),
        bending_stress(rec, dw, face.long),
    ];
    let live = bending_stress(rec, live, face.short);
    finish(rec, basis, key, parts, dead.map(Amount::Stress), Amount::Stress(live))
}

fn dead_moments<R: Recorder>(rec: &mut R, parts: &Parts<'_>) -> [Val<Moment>; 3] {
    [parts.dead.dc1, parts.dead.dc2, parts.dead.dw].map(|w| uniform_moment(rec, w, parts.x, parts.span))
}

fn live_of_moment<R: Recorder>(rec: &mut R, parts: &Parts<'_>) -> Val<Moment> {
    let [Amount::Moment(truck), Amount::Moment(lane)] = parts.lane_effect else {
        unreachable!("a moment check is given moments");
    };
    live_moment(rec, parts.share, parts.dynamic, truck, lane)
}

fn live_of_force<R: Recorder>(rec: &mut R, parts: &Parts<'_>) -> Val<Force> {
    let [Amount::Force(truck), Amount::Force(lane)] = parts.lane_effect else {
        unreachable!("a force check is given forces");
    };
    live_force(rec, parts.share, parts.dynamic, truck, lane)
}

fn finish<R: Recorder, B: Basis>(
    rec: &mut R,
    basis: &B,
    key: Key,
    parts: &Parts<'_>,
    dead: [Amount; 3],
    live: Amount,
) -> Check {
    let f = &parts.factors;
    let capacity = parts.resistance.factored;
    let [dc1, dc2, dw] = dead.map(|d| d.base());
    let outcome = Outcome::from_effects(
        capacity.base(),
        f.dc.q * (dc1 + dc2) + f.dw.q * dw,
        f.live.q * live.base(),
        "",
    );
    match &outcome {
        Outcome::Factor(_) => {
            basis.factor(rec, capacity, dead, live, f);
        }
        Outcome::CarriesNoLiveLoad => {
            rec.remark(|| "Dead load alone takes all the capacity: it carries no live load.".to_owned());
        }
        Outcome::NotLoaded => rec.remark(|| "This vehicle has no effect here.".to_owned()),
        Outcome::NotRated(problem) => rec.remark(|| problem.message.clone()),
    }
    let figures = Figures {
        capacity: capacity.base(),
        dead: DeadEffects { dc1, dc2, dw },
        live: live.base(),
        factors: Factors {
            dc: f.dc.q,
            dw: f.dw.q,
            live: f.live.q,
            dynamic: parts.dynamic.q,
            share: parts.share.q,
            resistance: parts.resistance.resistance,
            condition: parts.resistance.condition,
            system: parts.resistance.system,
        },
        position: parts.peak.position,
    };
    let figures = (!matches!(outcome, Outcome::NotRated(_))).then_some(figures);
    Check { key, outcome, figures }
}

/// A check without a number.
#[must_use]
pub const fn not_rated(key: Key, problem: Problem) -> Check {
    Check { key, outcome: Outcome::NotRated(problem), figures: None }
}
