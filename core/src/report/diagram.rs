//! Demand against capacity along a girder, for the drawing.

use crate::check::{Action, LimitState, Outcome};
use crate::quantity::Length;
use crate::rating::{Figures, Rating};

/// Demand and capacity of one girder line for one action, limit state and load.
#[derive(Clone, Debug, PartialEq)]
pub struct Curve {
    /// Index of the girder line.
    pub line: usize,
    /// Action.
    pub action: Action,
    /// Limit state.
    pub state: LimitState,
    /// Index of the load.
    pub load: usize,
    /// From the near bearing on, one for each station.
    pub points: Vec<Point>,
    /// Index of the point of the check that the curve was asked for.
    pub at: usize,
}

/// One station, in the base unit of the action.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Point {
    /// Where.
    pub x: Length,
    /// Factored dead and live load.
    pub demand: f64,
    /// What it carries there.
    pub capacity: f64,
}

/// Everything that acts, with its load factors, in the base unit of the action.
#[must_use]
pub fn demand(figures: &Figures) -> f64 {
    let Figures { dead, live, factors, .. } = figures;
    factors.dc * (dead.dc1 + dead.dc2) + factors.dw * dead.dw + factors.live * live
}

/// The curve through a check; none where the check has no figures.
#[must_use]
pub fn curve(rating: &Rating, check: usize) -> Option<Curve> {
    let key = rating.checks.get(check)?.key;
    let mut points: Vec<(usize, Point)> = rating
        .checks
        .iter()
        .enumerate()
        .filter(|(_, other)| {
            (other.key.line, other.key.action, other.key.state, other.key.load)
                == (key.line, key.action, key.state, key.load)
                && !matches!(other.outcome, Outcome::NotRated(_))
        })
        .filter_map(|(i, other)| {
            let figures = other.figures.as_ref()?;
            let point = Point { x: other.key.x, demand: demand(figures), capacity: figures.capacity };
            (point.demand.is_finite() && point.capacity.is_finite()).then_some((i, point))
        })
        .collect();
    points.sort_by(|(_, a), (_, b)| a.x.partial_cmp(&b.x).unwrap_or(core::cmp::Ordering::Equal));
    let at = points.iter().position(|(i, _)| *i == check)?;
    let points = points.into_iter().map(|(_, point)| point).collect();
    Some(Curve { line: key.line, action: key.action, state: key.state, load: key.load, points, at })
}
