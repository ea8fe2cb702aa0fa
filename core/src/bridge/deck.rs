//! The deck: slab, haunches, what lies on it and what stands along it.

use crate::material::Concrete;
use crate::quantity::{Length, LineLoad, UnitWeight};
use crate::units::Entered;

/// The deck across all girder lines.
#[derive(Clone, Debug, PartialEq)]
pub struct Deck {
    /// Width out to out.
    pub width: Entered<Length>,
    /// Clear roadway between curbs or rails: what traffic can use.
    pub roadway: Entered<Length>,
    /// Distance from the left edge of the deck to the left curb.
    pub left_curb: Length,
    /// Thickness of the structural slab.
    pub slab: Entered<Length>,
    /// Concrete of the slab.
    pub concrete: Concrete,
    /// Haunch between slab and girder: thickness from top of the flange to the soffit of the slab.
    pub haunch: Entered<Length>,
    /// Width of the haunch.
    pub haunch_width: Entered<Length>,
    /// What lies on the roadway, from the top down.
    pub layers: Vec<Layer>,
    /// What stands along the deck: parapets, rails, curbs, utilities.
    pub strips: Vec<Strip>,
}

/// A layer across the roadway.
#[derive(Clone, Debug, PartialEq)]
pub struct Layer {
    /// Id in the document.
    pub id: String,
    /// What it is, such as asphalt.
    pub name: String,
    /// Thickness: cores, probes.
    pub thickness: Entered<Length>,
    /// Unit weight.
    pub unit_weight: Entered<UnitWeight>,
}

/// When a strip came onto the girders.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Stage {
    /// With the wet slab, on the bare girder: DC1.
    Bare,
    /// After the slab had hardened: DC2.
    Later,
    /// A utility or overlay carried as DW.
    Surface,
}

/// Where a strip stands.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum StripSide {
    /// Along the left edge.
    Left,
    /// Along the right edge.
    Right,
    /// One along either edge.
    Both,
}

/// Something that stands along the whole deck.
#[derive(Clone, Debug, PartialEq)]
pub struct Strip {
    /// Id in the document.
    pub id: String,
    /// What it is, such as parapet.
    pub name: String,
    /// Weight on a length, of one.
    pub weight: Entered<LineLoad>,
    /// Which edge.
    pub side: StripSide,
    /// When it came onto the girders.
    pub stage: Stage,
}
