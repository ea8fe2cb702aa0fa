//! Names of checks in links: `su7/legal/g3/moment/strength/91440`, the last being the place in
//! tenths of a millimetre. A name outlives edits: girders go by their ids and loads by theirs, and a
//! place that is gone leads to the nearest one.

use girderbook_core::check::{Action, Level, LimitState};
use girderbook_core::document::Book;
use girderbook_core::quantity::Quantity;
use girderbook_core::rating::{Check, Rating};

use crate::scene::Scene;

/// What the sheet shows. Without a place, the worst one.
#[derive(Clone, Debug, PartialEq)]
pub struct Key {
    /// Load and its level.
    pub load: String,
    /// Id of the girder.
    pub girder: String,
    /// Action and limit state.
    pub kind: String,
    /// Place, in tenths of a millimetre.
    pub x: Option<f64>,
}

/// Name of a load with its level.
#[must_use]
pub fn load(rating: &Rating, index: usize) -> String {
    rating.loads.get(index).map_or(String::new(), |load| {
        let level = match load.level {
            Level::Inventory => "inventory",
            Level::Operating => "operating",
            Level::Legal => "legal",
        };
        format!("{}/{level}", load.id)
    })
}

/// Name of an action at a limit state.
#[must_use]
pub const fn kind(action: Action, state: LimitState) -> &'static str {
    use Action::{Bearing, Moment, Shear, Stress};
    use LimitState::{ServiceII, StrengthI};
    match (action, state) {
        (Moment, StrengthI) => "moment/strength",
        (Shear, StrengthI) => "shear/strength",
        (Bearing, StrengthI) => "bearing/strength",
        (Stress, StrengthI) => "stress/strength",
        (Moment, ServiceII) => "moment/service",
        (Shear, ServiceII) => "shear/service",
        (Bearing, ServiceII) => "bearing/service",
        (Stress, ServiceII) => "stress/service",
    }
}

impl Key {
    /// Reads a name; none where it is none.
    #[must_use]
    pub fn parse(text: &str) -> Option<Self> {
        let parts: Vec<&str> = text.split('/').collect();
        let [load, level, girder, action, state, x] = parts.as_slice() else { return None };
        Some(Self {
            load: format!("{load}/{level}"),
            girder: (*girder).to_owned(),
            kind: format!("{action}/{state}"),
            x: x.parse::<f64>().ok().filter(|x| x.is_finite()),
        })
    }

    /// The name of a check.
    #[must_use]
    pub fn of(book: &Book, rating: &Rating, check: &Check) -> Self {
        Self {
            load: load(rating, check.key.load),
            girder: book.girders.get(check.key.line).map_or(String::new(), |g| g.id.0.clone()),
            kind: kind(check.key.action, check.key.state).to_owned(),
            x: Some(check.key.x.base()),
        }
    }

    /// As it stands in a link.
    #[must_use]
    pub fn text(&self) -> String {
        let x = self.x.map_or("worst".to_owned(), |x| format!("{x:.0}"));
        format!("{}/{}/{}/{x}", self.load, self.girder, self.kind)
    }

    /// Index of the check that it means. Without that kind of check on the girder, its worst of
    /// another kind for the same load.
    #[must_use]
    pub fn find(&self, book: &Book, rating: &Rating) -> Option<usize> {
        let line = book.girders.iter().position(|girder| girder.id.0 == self.girder)?;
        let of_load = |check: &Check| check.key.line == line && load(rating, check.key.load) == self.load;
        let of_kind = |check: &Check| kind(check.key.action, check.key.state) == self.kind;
        let far = |check: &Check| match self.x {
            Some(x) => (check.key.x.base() - x).abs(),
            None => check.outcome.rank().unwrap_or(f64::MAX),
        };
        let exact = least(rating, |check| of_load(check) && of_kind(check), far);
        exact.or_else(|| least(rating, of_load, |check| check.outcome.rank().unwrap_or(f64::MAX)))
    }
}

fn least(rating: &Rating, wanted: impl Fn(&Check) -> bool, measure: impl Fn(&Check) -> f64) -> Option<usize> {
    let checks = rating.checks.iter().enumerate().filter(|(_, check)| wanted(check));
    checks.min_by(|(_, a), (_, b)| measure(a).total_cmp(&measure(b))).map(|(i, _)| i)
}

/// The link that opens the sheet of a check.
#[must_use]
pub fn go(s: &Scene, check: usize) -> String {
    let Some(rating) = s.rating else { return String::new() };
    let Some(check) = rating.checks.get(check) else { return String::new() };
    format!("sheet:{}", Key::of(s.book, rating, check).text())
}
