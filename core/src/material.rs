//! Materials: strengths and moduli, and where they are known from.

pub mod weight;

use crate::quantity::{Stress, UnitWeight};
use crate::units::Entered;

/// Structural steel as it stands in one member.
#[derive(Clone, Debug, PartialEq)]
pub struct Steel {
    /// Yield strength.
    pub yield_strength: Entered<Stress>,
}

/// Concrete of a deck.
#[derive(Clone, Debug, PartialEq)]
pub struct Concrete {
    /// Specified or measured compressive strength (cylinder, 28 days).
    pub strength: Entered<Stress>,
    /// Unit weight of the reinforced concrete, for dead load.
    pub unit_weight: Entered<UnitWeight>,
}

/// Strengths that hold where none was entered, by the rules in force.
pub trait Defaults {
    /// Yield strength of structural steel by year built, and where it is known from.
    fn yield_strength(&self, year: Option<i32>) -> Option<(Stress, &'static str)>;
    /// Compressive strength of concrete by year built, and where it is known from.
    fn concrete_strength(&self, year: Option<i32>) -> Option<(Stress, &'static str)>;
}
