//! A train set down at a place by hand: the effect there, axle by axle.

use super::{AxlePolicy, Direction, Sense};
use crate::influence::InfluenceLine;
use crate::load::AxleTrain;
use crate::problem::{Problem, finite};
use crate::quantity::{Force, Length, Quantity};

/// Where a train stands.
#[derive(Clone, Debug, PartialEq)]
pub struct Position {
    /// Place of the first axle of the list, from the first support.
    pub first_axle: Length,
    /// Direction of travel: forward, the other axles stand at smaller distances.
    pub direction: Direction,
    /// The distance chosen behind each axle but the last.
    pub spacings: Vec<Length>,
}

impl Position {
    /// With every variable spacing at its least.
    #[must_use]
    pub fn closed_up(train: &AxleTrain, first_axle: Length, direction: Direction) -> Self {
        Self { first_axle, direction, spacings: train.spacings().iter().map(|s| s.least()).collect() }
    }

    /// Places of all axles, the first one first.
    pub fn places(&self) -> impl Iterator<Item = Length> {
        let sign = match self.direction {
            Direction::Forward => -1.0,
            Direction::Backward => 1.0,
        };
        let first = self.first_axle;
        core::iter::once(Length::ZERO)
            .chain(self.spacings.iter().scan(Length::ZERO, |sum, &s| {
                *sum += s;
                Some(*sum)
            }))
            .map(move |offset| first + sign * offset)
    }
}

/// An axle on the bridge.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct PlacedAxle {
    /// Its number in the train, from 0 at the front.
    pub axle: usize,
    /// Its load.
    pub load: Force,
    /// Its distance from the first support.
    pub place: Length,
    /// Ordinate of the influence line under it, in base units; at a jump the side that counts.
    pub ordinate: f64,
}

/// The effects of a train at one position. They differ only where an axle stands at a jump of the line,
/// or where relieving axles are left out.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Both {
    /// The largest, each axle at a jump counting at its larger side.
    pub most: f64,
    /// The least, each axle at a jump counting at its smaller side.
    pub least: f64,
}

/// Places nearer than this are one: some units in the last digit of the largest place that can arise.
pub(super) fn touch(line: &InfluenceLine, train: &AxleTrain) -> f64 {
    let (from, to) = line.extent();
    32.0 * f64::EPSILON * (from.abs().max(to.abs()) + train.most_length()).base()
}

/// The effect of a train set down at `position`, in base units of the line.
///
/// # Errors
/// When the position has not one spacing for each of the train, one of them lies outside its range, or
/// the result is not finite.
pub fn effect_at(
    line: &InfluenceLine,
    train: &AxleTrain,
    position: &Position,
    policy: AxlePolicy,
) -> Result<Both, Problem> {
    let sum = |sense| -> Result<f64, Problem> {
        let axles = placed_axles(line, train, position, policy, sense)?;
        finite(axles.iter().map(|a| a.load.base() * a.ordinate).sum(), "position", "the effect of the train")
    };
    Ok(Both { most: sum(Sense::Max)?, least: sum(Sense::Min)? })
}

/// The axles that count towards the extreme of the given sense with the train at `position`: on the
/// bridge, and where relieving axles are left out, not relieving.
///
/// # Errors
/// As [`effect_at`].
pub fn placed_axles(
    line: &InfluenceLine,
    train: &AxleTrain,
    position: &Position,
    policy: AxlePolicy,
    sense: Sense,
) -> Result<Vec<PlacedAxle>, Problem> {
    check(train, position)?;
    let touch = touch(line, train);
    let (from, to) = line.extent();
    let mut on = Vec::new();
    for (axle, (&load, place)) in train.axles().iter().zip(position.places()).enumerate() {
        if place.base() < from.base() - touch || place.base() > to.base() + touch {
            continue;
        }
        let ordinate = match sense {
            Sense::Max => line.ordinates().upper(place.base(), touch),
            Sense::Min => line.ordinates().lower(place.base(), touch),
        };
        let relieves = match sense {
            Sense::Max => ordinate < 0.0,
            Sense::Min => ordinate > 0.0,
        };
        if policy == AxlePolicy::AllCount || !relieves {
            on.push(PlacedAxle { axle, load, place, ordinate });
        }
    }
    Ok(on)
}

fn check(train: &AxleTrain, position: &Position) -> Result<(), Problem> {
    let spacings = train.spacings();
    if spacings.len() != position.spacings.len() {
        return Err(Problem::error(
            "position.spacings",
            format!("the vehicle has {} spacings, not {}", spacings.len(), position.spacings.len()),
            "give one spacing behind each axle but the last",
        ));
    }
    for (i, (range, &chosen)) in spacings.iter().zip(&position.spacings).enumerate() {
        if !(range.least() <= chosen && chosen <= range.most()) {
            return Err(Problem::error(
                format!("position.spacings[{i}]"),
                "the spacing lies outside the range of the vehicle",
                "choose a spacing that the vehicle can have",
            ));
        }
    }
    finite(position.first_axle.base(), "position.first_axle", "the place of the first axle")?;
    Ok(())
}
