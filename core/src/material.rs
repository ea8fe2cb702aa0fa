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
