//! The verdict: one figure, one sentence, why, and what it does not cover.

use super::figure::factor;
use super::names;
use super::show::{limit as limit_of, signed, station};
use super::sign::{Face, face};
use crate::check::{Action, ClassLimit, Limit, Outcome, Sign};
use crate::problem::{Problem, Severity};
use crate::quantity::Length;
use crate::rating::{Check, Rating};
use crate::units::{System, WeightUnit};

/// How a thing stands; always said in words beside it.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq)]
pub enum Tone {
    /// Nothing to say.
    #[default]
    Plain,
    /// In the background.
    Quiet,
    /// It passes.
    Good,
    /// It passes with a limit, or deserves a look.
    Caution,
    /// It does not pass.
    Bad,
}

impl Tone {
    /// Its name, as the page has it.
    #[must_use]
    pub const fn name(self) -> &'static str {
        match self {
            Self::Plain => "",
            Self::Quiet => "quiet",
            Self::Good => "good",
            Self::Caution => "caution",
            Self::Bad => "bad",
        }
    }
}

/// What is said of a bridge.
#[derive(Clone, Debug, PartialEq)]
pub struct Verdict {
    /// The least rating factor, rounded down, or why there is none in two or three words.
    pub figure: String,
    /// What the figure is of.
    pub caption: String,
    /// What follows, in a sentence.
    pub headline: String,
    /// How it stands.
    pub tone: Tone,
    /// Why, each in a sentence.
    pub reasons: Vec<String>,
    /// What the answer rests on and does not cover.
    pub cautions: Vec<String>,
    /// The sign that follows.
    pub sign: Option<Face>,
}

/// What travels with every verdict.
pub const CAUTIONS: [&str; 4] = [
    "Supports a licensed engineer and replaces none.",
    "Local codes and the agency's rules come first.",
    "Rests on what was entered.",
    "Not rated: deck slab, fatigue, scour, substructure, bearings, connections, gusset plates.",
];

const NO_POSTING: &str = "Carries all legal loads: no posting.";

fn cautions() -> Vec<String> {
    CAUTIONS.iter().map(|caution| (*caution).to_owned()).collect()
}

/// A check in words: `SU7 on G3, Strength I, bending at 9.14 m`.
#[must_use]
pub fn check_name(rating: &Rating, check: &Check, system: System) -> String {
    let load = rating.loads.get(check.key.load).map_or("?", |load| load.name.as_str());
    format!("{load} on {}", place(rating, check, system))
}

/// Where a check is: `G3, Strength I, bending at 9.14 m`.
#[must_use]
pub fn place(rating: &Rating, check: &Check, system: System) -> String {
    let line = rating.lines.get(check.key.line).map_or("?", |line| line.name.as_str());
    format!("{line}, {}, {}", names::state(check.key.state), at(check, system))
}

/// What is asked for and where: `bending at 9.14 m`, `web over the near bearing`.
#[must_use]
pub fn at(check: &Check, system: System) -> String {
    match check.key.action {
        Action::Bearing if check.key.x > Length::ZERO => "web over the far bearing".to_owned(),
        Action::Bearing => "web over the near bearing".to_owned(),
        action => format!("{} at {}", names::action(action), station(check.key.x, system)),
    }
}

/// An outcome as a figure or in a few words.
#[must_use]
pub fn outcome(outcome: &Outcome) -> String {
    match outcome {
        Outcome::Factor(value) => factor(*value),
        Outcome::CarriesNoLiveLoad => "no live load".to_owned(),
        Outcome::NotLoaded => "not loaded".to_owned(),
        Outcome::NotRated(_) => "no number".to_owned(),
    }
}

/// How an outcome stands.
#[must_use]
pub fn outcome_tone(outcome: &Outcome) -> Tone {
    match outcome {
        Outcome::Factor(value) if *value >= 1.0 => Tone::Good,
        Outcome::Factor(_) | Outcome::CarriesNoLiveLoad => Tone::Bad,
        Outcome::NotLoaded => Tone::Quiet,
        Outcome::NotRated(_) => Tone::Caution,
    }
}

/// What follows for one vehicle, in a few words.
#[must_use]
pub fn limit(limit: Limit, unit: WeightUnit) -> String {
    match limit {
        Limit::Full => "no sign".to_owned(),
        Limit::Weight(force) => limit_of(force, unit),
        Limit::NotAllowed => "not allowed".to_owned(),
        Limit::NotKnown => "no number".to_owned(),
    }
}

/// The verdict of a rating.
#[must_use]
pub fn verdict(rating: &Rating, system: System) -> Verdict {
    let governing = rating.governing.and_then(|i| rating.checks.get(i));
    let (figure, caption) = match governing {
        Some(check) => {
            let name = check_name(rating, check, system);
            let caption = match check.outcome {
                Outcome::CarriesNoLiveLoad => format!("dead load alone takes all of it: {name}"),
                _ => format!("least rating factor: {name}"),
            };
            (outcome(&check.outcome), caption)
        }
        None => ("no number".to_owned(), "no legal load got a rating factor".to_owned()),
    };
    let (headline, tone) = headline(rating);
    Verdict {
        figure,
        caption,
        headline,
        tone,
        reasons: reasons(rating, governing, system),
        cautions: cautions(),
        sign: face(rating.posting.sign),
    }
}

fn headline(rating: &Rating) -> (String, Tone) {
    let safe = &rating.posting.safe;
    match rating.posting.sign {
        Sign::None => (NO_POSTING.to_owned(), Tone::Good),
        Sign::Limit { single_unit, combination, unit } => {
            let text = match (single_unit, combination) {
                (ClassLimit::None, ClassLimit::None) => NO_POSTING.to_owned(),
                (single, ClassLimit::None) => {
                    format!("Post for single-unit trucks: {}.", of_class(single, unit))
                }
                (ClassLimit::None, combination) => {
                    format!("Post for combinations: {}.", of_class(combination, unit))
                }
                (ClassLimit::NotAllowed, ClassLimit::NotAllowed) => "Post: no trucks.".to_owned(),
                (single, combination) if single == combination => {
                    format!("Post for all trucks: {}.", of_class(single, unit))
                }
                (single, combination) => format!(
                    "Post: single-unit trucks {}, combinations {}.",
                    of_class(single, unit),
                    of_class(combination, unit)
                ),
            };
            (text, Tone::Caution)
        }
        Sign::Close => {
            let none = !safe.is_empty() && safe.iter().all(|s| s.limit == Limit::NotAllowed);
            let text = if none {
                "Close: no legal truck may cross."
            } else {
                "Close: what it safely carries is below the least limit of an open bridge."
            };
            (text.to_owned(), Tone::Bad)
        }
        Sign::NotKnown => {
            ("No answer on posting: something that has to be rated got no number.".to_owned(), Tone::Caution)
        }
    }
}

/// What a sign says of a class, in words.
fn of_class(limit: ClassLimit, unit: WeightUnit) -> String {
    match limit {
        ClassLimit::None => "no limit".to_owned(),
        ClassLimit::Weight(limit) => signed(limit, unit),
        ClassLimit::NotAllowed => "not allowed".to_owned(),
    }
}

fn reasons(rating: &Rating, governing: Option<&Check>, system: System) -> Vec<String> {
    let mut reasons = Vec::new();
    let load = |index: usize| rating.loads.get(index).map_or("?", |load| load.name.as_str());
    let low: Vec<String> = rating
        .posting
        .safe
        .iter()
        .filter_map(|safe| {
            safe.factor.filter(|f| *f < 1.0).map(|f| format!("{} {}", load(safe.load), factor(f)))
        })
        .collect();
    if !low.is_empty() {
        reasons.push(format!("Below 1: {}.", low.join(", ")));
    }
    let barred: Vec<&str> =
        rating.posting.safe.iter().filter(|s| s.limit == Limit::NotAllowed).map(|s| load(s.load)).collect();
    if !barred.is_empty() && rating.posting.sign != Sign::Close {
        reasons.push(format!("Not allowed at any weight: {}.", barred.join(", ")));
    }
    // The same place under the next vehicle says nothing new.
    let kind = |check: &Check| (check.key.line, check.key.action, check.key.state);
    let mut next = rating.next.iter().filter_map(|i| rating.checks.get(*i));
    if let Some(next) = next.find(|next| governing.is_none_or(|governing| kind(governing) != kind(next))) {
        reasons.push(format!(
            "Next behind it: {}, {}.",
            check_name(rating, next, system),
            outcome(&next.outcome)
        ));
    }
    // The same reason at several places is said once.
    let mut said: Vec<(&str, usize)> = Vec::new();
    for problem in &rating.not_rated {
        match said.iter_mut().find(|(message, _)| *message == problem.message) {
            Some((_, places)) => *places += 1,
            None => said.push((&problem.message, 1)),
        }
    }
    for (message, places) in said {
        let at =
            if places > 1 { format!("Not rated at {places} places: ") } else { "Not rated: ".to_owned() };
        reasons.push(sentence(&at, message));
    }
    reasons
}

/// Words with a beginning, ended by one full stop.
fn sentence(begin: &str, words: &str) -> String {
    format!("{begin}{}.", words.trim().trim_end_matches('.'))
}

/// The verdict while there is no rating: what is wrong and what is still missing.
#[must_use]
pub fn unrated(problems: &[Problem]) -> Verdict {
    let count = |severity| problems.iter().filter(|p| p.severity == severity).count();
    let (missing, wrong) = (count(Severity::Missing), count(Severity::Error));
    let things = |n: usize, one: &str, several: &str| match n {
        1 => format!("1 {one}"),
        n => format!("{n} {several}"),
    };
    let missing_text = things(missing, "thing is missing", "things are missing");
    let wrong_text = things(wrong, "entry is wrong", "entries are wrong");
    let headline = match (missing, wrong) {
        (0, 0) => "No rating yet.".to_owned(),
        (_, 0) => format!("No rating yet: {missing_text}."),
        (0, _) => format!("No rating: {wrong_text}."),
        _ => format!("No rating: {wrong_text}, {missing_text}."),
    };
    Verdict {
        figure: "no number".to_owned(),
        caption: "a rating is built on complete entries only".to_owned(),
        headline,
        tone: if wrong > 0 { Tone::Bad } else { Tone::Quiet },
        reasons: Vec::new(),
        cautions: cautions(),
        sign: None,
    }
}
