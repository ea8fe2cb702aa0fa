//! The check that somebody opens, worked again with a sheet that keeps every line.

use super::combine::{self, Parts};
use super::effects::{Peak, line_of, policy};
use super::rater::only_span;
use super::result::{Check, Key};
use crate::basis::{Amount, At, Basis, Case};
use crate::bridge::Bridge;
use crate::check::{Action, Level};
use crate::clause;
use crate::moving::{Direction, Governing, extremes, lane_extremes};
use crate::problem::Problem;
use crate::quantity::{Force, Length, LineLoad, Moment, Quantity};
use crate::units::mark::{Ft, Kip, KipFt, KipPerFt, One};
use crate::worksheet::{Recorder, Sheet, Val};

clause! {
    /// Part of one axle in a moment: its load times the ordinate of the influence line under it.
    pub fn axle_moment(P: Force [Kip], eta: Length [Ft]) -> M_i: Moment [KipFt] { P * eta }
    cite "influence line of the span" what "part of the axle"
}

clause! {
    /// Part of one axle in a shear or reaction.
    pub fn axle_force(P: Force [Kip], eta: f64 [One]) -> V_i: Force [Kip] { P * eta }
    cite "influence line of the span" what "part of the axle"
}

clause! {
    /// Lane load over the whole span, moment.
    pub fn lane_moment(w: LineLoad [KipPerFt], x: Length [Ft], L: Length [Ft]) -> M_lane: Moment [KipFt]
    { w * x * (L - x) / 2.0 }
    cite "statics" what "moment of the lane load over the whole span"
}

/// Works a check line by line.
///
/// # Errors
/// When the key names no check of this bridge, or when the check has no number; the sheet then ends
/// with the reason.
pub fn work<B: Basis>(bridge: &Bridge, basis: &B, key: &Key, sheet: &mut Sheet) -> Result<Check, Problem> {
    let span = only_span(bridge)?;
    let cases = basis.cases(bridge);
    let unknown = || Problem::error("", "there is no such check", "open one from the rating");
    let case = cases.get(key.load).ok_or_else(unknown)?;
    if key.line >= bridge.lines.len() || key.x < Length::ZERO || key.x > span {
        return Err(unknown());
    }
    let done = check(bridge, basis, case, key, span, sheet);
    if let Err(problem) = &done {
        sheet.remark(|| format!("Not rated: {}", problem.message));
    }
    done
}

fn check<B: Basis>(
    bridge: &Bridge,
    basis: &B,
    case: &Case,
    key: &Key,
    span: Length,
    sheet: &mut Sheet,
) -> Result<Check, Problem> {
    sheet.heading("Where");
    let length = sheet.given("L", "span", &bridge.spans[0].length, Ft);
    let x = sheet.found("x", "station, from the near bearing", key.x, Ft, 0.0, || {
        "chosen by the search for what governs".to_owned()
    });
    let dead = basis.dead(sheet, bridge, key.line)?;
    sheet.heading("Live load on a whole lane");
    let (peak, lane_effect, against_dead) = live(sheet, case, key, span, length, x)?;
    let share = basis.share(sheet, bridge, key.line, key.action)?.share;
    sheet.heading("Dynamic allowance");
    let dynamic = basis.dynamic(sheet, bridge, case);
    sheet.heading("Capacity");
    let at = At::new(bridge, key.line, key.x);
    let resistance = basis.capacity(sheet, &at, &dead, key.action, key.state)?;
    let moduli = match key.action {
        Action::Stress => Some(basis.moduli(sheet, &at)?),
        Action::Moment | Action::Shear | Action::Bearing => None,
    };
    sheet.heading("Load factors");
    let factors = basis.load_factors(sheet, bridge, key.state, case, &dead);
    sheet.heading("Effects on the girder and rating factor");
    let parts = Parts {
        dead: &dead,
        span: length,
        x,
        share,
        dynamic,
        factors,
        peak: &peak,
        against_dead,
        lane_effect,
        resistance: &resistance,
        moduli: moduli.as_ref(),
    };
    let check = combine::check(sheet, basis, *key, &parts);
    if case.level == Level::Legal && check.outcome.rank().is_some() {
        sheet.heading("What follows for this vehicle, if this check rules it");
        basis.safe_load(sheet, bridge, case, key.state, &check.outcome);
    }
    Ok(check)
}

/// The live load effect of a whole lane with the vehicle where it governs, axle by axle.
fn live(
    sheet: &mut Sheet,
    case: &Case,
    key: &Key,
    span: Length,
    length: Val<Length>,
    x: Val<Length>,
) -> Result<(Peak, [Amount; 2], bool), Problem> {
    let line = line_of(key.action, span, key.x)?;
    let upward = key.action != Action::Shear || key.x <= span / 2.0;
    let mut best: Option<(Governing, usize, bool)> = None;
    for (i, train) in case.trains.iter().enumerate() {
        let both = extremes(&line, train, policy(case))?;
        for (sense, governing) in [(true, both.max), (false, both.min)] {
            let wanted = key.action == Action::Shear || sense;
            let larger = best.as_ref().is_none_or(|(b, ..)| governing.value.abs() > b.value.abs());
            if wanted && larger {
                best = Some((governing, i, sense != upward));
            }
        }
    }
    let (governing, train, against_dead) =
        best.ok_or_else(|| Problem::error("", "there is no vehicle to place", "choose another vehicle"))?;
    let truck = axles(sheet, case, key, train, &governing, span);
    let lane = lane(sheet, case, key, &line, governing.value < 0.0, length, x)?;
    let position = governing.position.map(|p| (p.first_axle, p.direction == Direction::Backward));
    let peak = Peak { truck: truck.base().abs(), lane: lane.base(), train, position };
    Ok((peak, [truck, lane], against_dead))
}

/// One row an axle, and their sum as a size.
fn axles(
    sheet: &mut Sheet,
    case: &Case,
    key: &Key,
    train: usize,
    governing: &Governing,
    span: Length,
) -> Amount {
    let name = case.trains[train].name().to_owned();
    let facing = match governing.position.as_ref().map(|p| p.direction) {
        Some(Direction::Backward) => "facing back towards the near bearing",
        _ => "facing ahead",
    };
    sheet.remark(|| {
        format!("{name}, {facing}, where it makes the most of this effect; found exactly, not by steps.")
    });
    let moment = matches!(key.action, Action::Moment | Action::Stress);
    let cite = case.trains[train].source().to_owned();
    let (mut moments, mut forces) = (Vec::new(), Vec::new());
    let names: Vec<String> =
        governing.axles_on.iter().map(|axle| format!("axle {}", axle.axle + 1)).collect();
    for (axle, called) in governing.axles_on.iter().zip(&names) {
        let p = sheet.look_up("P", "axle load", axle.load, Kip, &cite, || format!("{called} of {name}"));
        let place = axle.place;
        let how = || format!("axle at {:.3} ft of {:.3} ft", place.in_ft(), span.in_ft());
        if moment {
            let eta = sheet.found(
                "eta",
                "ordinate under the axle",
                Length::from_base(axle.ordinate.abs()),
                Ft,
                0.0,
                how,
            );
            moments.push((called.as_str(), axle_moment(sheet, p, eta)));
        } else {
            let eta = sheet.found(
                "eta",
                "ordinate under the axle",
                axle.ordinate * governing.value.signum(),
                One,
                0.0,
                how,
            );
            forces.push((called.as_str(), axle_force(sheet, p, eta)));
        }
    }
    if moment {
        Amount::Moment(sheet.sum("M_truck", "moment of the truck, whole lane", &moments, KipFt))
    } else {
        Amount::Force(sheet.sum("V_truck", "force of the truck, whole lane", &forces, Kip))
    }
}

fn lane(
    sheet: &mut Sheet,
    case: &Case,
    key: &Key,
    line: &crate::influence::InfluenceLine,
    negative: bool,
    length: Val<Length>,
    x: Val<Length>,
) -> Result<Amount, Problem> {
    let moment = matches!(key.action, Action::Moment | Action::Stress);
    let Some(lane) = &case.lane else {
        let none = || "legal trucks have no lane load beside them on a simple span up to 200 ft".to_owned();
        return Ok(if moment {
            Amount::Moment(sheet.look_up("M_lane", "lane load", Moment::ZERO, KipFt, "rule set", none))
        } else {
            Amount::Force(sheet.look_up("V_lane", "lane load", Force::ZERO, Kip, "rule set", none))
        });
    };
    let w = sheet.look_up("w", "lane load", lane.w, KipPerFt, "AASHTO LRFD 9th ed. 3.6.1.2.4", || {
        "design lane load".to_owned()
    });
    if moment {
        return Ok(Amount::Moment(lane_moment(sheet, w, x, length)));
    }
    let extreme = lane_extremes(line, lane.w)?;
    let force = Force::from_base(if negative { extreme.min.abs() } else { extreme.max });
    Ok(Amount::Force(sheet.found("V_lane", "force of the lane load", force, Kip, 0.0, || {
        "lane load on the part of the span that makes it worse: w times the area of the influence line there".to_owned()
    })))
}
