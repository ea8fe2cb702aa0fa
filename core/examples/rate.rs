//! Rates books without a browser: one JSON object a line, in kN and m.
//!
//! `cargo run --release -p girderbook-core --example rate -- FILE...`
//!
//! Exit code 0 when every book was rated, 1 when one is wrong or unfinished (the message names the
//! field), 2 when there is nothing to do.

use std::process::ExitCode;

use girderbook_core::basis::mbe_a::MbeA;
use girderbook_core::check::{Action, ClassLimit, Level, Limit, LimitState, Outcome, Sign};
use girderbook_core::document;
use girderbook_core::problem::Problem;
use girderbook_core::quantity::{Force, Moment, Quantity, Stress};
use girderbook_core::rating::{Check, Rater, Rating};
use girderbook_core::units::WeightUnit;
use serde_json::{Value, json};

fn main() -> ExitCode {
    let files: Vec<String> = std::env::args().skip(1).collect();
    if files.is_empty() {
        eprintln!("usage: rate FILE... (books as saved by Girderbook)");
        return ExitCode::from(2);
    }
    let mut all_rated = true;
    for file in &files {
        match rate(file) {
            Ok(line) => println!("{line}"),
            Err(problems) => {
                all_rated = false;
                for problem in problems {
                    eprintln!("{file}: {}: {}; {}", problem.path, problem.message, problem.mend);
                }
            }
        }
    }
    if all_rated { ExitCode::SUCCESS } else { ExitCode::FAILURE }
}

fn rate(file: &str) -> Result<Value, Vec<Problem>> {
    let text = std::fs::read_to_string(file)
        .map_err(|e| vec![Problem::error("", format!("the file cannot be read ({e})"), "check its name")])?;
    let book = document::read(&text)?;
    let basis = MbeA::default();
    let opened = document::bridge(&book, &basis);
    let blocking: Vec<Problem> = opened.problems.iter().filter(|p| p.blocks()).cloned().collect();
    let Some(bridge) = opened.bridge.filter(|_| blocking.is_empty()) else { return Err(blocking) };
    let rating = Rater::default().rate(&bridge, &basis)?;
    Ok(describe(file, &rating))
}

fn describe(file: &str, rating: &Rating) -> Value {
    json!({
        "file": file,
        "rule_set": rating.basis_name,
        "units": "kN, m, MPa",
        "governing": rating.governing.map(|i| check(rating, &rating.checks[i])),
        "by_vehicle": rating.by_vehicle.iter().map(|v| json!({
            "vehicle": rating.loads[v.load].name,
            "level": level(rating.loads[v.load].level),
            "strength": v.strength.map(|i| check(rating, &rating.checks[i])),
            "service": v.service.map(|i| check(rating, &rating.checks[i])),
            "rating_tonnes": v.rating_weight.map(Force::in_tonne),
        })).collect::<Vec<_>>(),
        "posting": posting(rating),
        "not_rated": rating.not_rated.iter().map(problem).collect::<Vec<_>>(),
        "notes": rating.notes.iter().map(problem).collect::<Vec<_>>(),
        "checks": rating.checks.iter().map(|c| check(rating, c)).collect::<Vec<_>>(),
    })
}

fn problem(p: &Problem) -> Value {
    json!({ "field": p.path, "message": p.message, "mend": p.mend })
}

fn level(level: Level) -> &'static str {
    match level {
        Level::Inventory => "inventory",
        Level::Operating => "operating",
        Level::Legal => "legal",
    }
}

fn check(rating: &Rating, c: &Check) -> Value {
    let per = match c.key.action {
        Action::Moment => Moment::from_kn_m(1.0).base(),
        Action::Shear | Action::Bearing => Force::from_kn(1.0).base(),
        Action::Stress => Stress::from_mpa(1.0).base(),
    };
    let load = &rating.loads[c.key.load];
    let (factor, outcome) = match &c.outcome {
        Outcome::Factor(f) => (Some(*f), "rated".to_owned()),
        Outcome::CarriesNoLiveLoad => (None, "carries no live load".to_owned()),
        Outcome::NotLoaded => (None, "not loaded".to_owned()),
        Outcome::NotRated(p) => (None, format!("not rated: {}", p.message)),
    };
    json!({
        "rating_factor": factor,
        "outcome": outcome,
        "vehicle": load.name,
        "level": level(load.level),
        "member": rating.lines[c.key.line].name,
        "station": c.key.x.in_m(),
        "action": match c.key.action {
            Action::Moment => "moment",
            Action::Shear => "shear",
            Action::Bearing => "bearing",
            Action::Stress => "stress",
        },
        "limit_state": match c.key.state {
            LimitState::StrengthI => "Strength I",
            LimitState::ServiceII => "Service II",
        },
        "capacity": c.figures.map(|f| f.capacity / per),
        "dead": c.figures.map(|f| json!({
            "dc1": f.dead.dc1 / per, "dc2": f.dead.dc2 / per, "dw": f.dead.dw / per,
        })),
        "live": c.figures.map(|f| f.live / per),
        "factors": c.figures.map(|f| json!({
            "dc": f.factors.dc, "dw": f.factors.dw, "live": f.factors.live,
            "dynamic": f.factors.dynamic, "share": f.factors.share,
            "resistance": f.factors.resistance, "condition": f.factors.condition,
            "system": f.factors.system,
        })),
        "first_axle_at": c.figures.and_then(|f| f.position).map(|(x, _)| x.in_m()),
        "faces_back": c.figures.and_then(|f| f.position).map(|(_, back)| back),
    })
}

fn class_limit(limit: ClassLimit) -> Value {
    match limit {
        ClassLimit::None => Value::Null,
        ClassLimit::Weight(weight) => json!(weight),
        ClassLimit::NotAllowed => json!("not allowed"),
    }
}

fn posting(rating: &Rating) -> Value {
    let sign = match rating.posting.sign {
        Sign::None => json!({ "needed": false }),
        Sign::Limit { single_unit, combination, unit } => json!({
            "needed": true, "single_unit": class_limit(single_unit), "combination": class_limit(combination),
            "unit": match unit { WeightUnit::ShortTons => "short tons", WeightUnit::Tonnes => "tonnes" },
        }),
        Sign::Close => json!({ "close": true }),
        Sign::NotKnown => json!({ "known": false }),
    };
    json!({
        "sign": sign,
        "vehicles": rating.posting.safe.iter().map(|s| json!({
            "vehicle": rating.loads[s.load].name,
            "rating_factor": s.factor,
            "limit": match s.limit {
                Limit::Full => json!("full weight"),
                Limit::Weight(w) => json!({ "kN": w.in_kn(), "tonnes": w.in_tonne() }),
                Limit::NotAllowed => json!("not allowed"),
                Limit::NotKnown => json!("not known"),
            },
        })).collect::<Vec<_>>(),
    })
}
