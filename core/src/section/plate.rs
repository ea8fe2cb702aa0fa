//! The plates of an I-shaped girder.

use crate::quantity::{Area, Inertia, Length, Modulus};
use crate::units::Entered;

/// One flange as measured.
#[derive(Clone, Debug, PartialEq)]
pub struct Flange {
    /// Width.
    pub width: Entered<Length>,
    /// Thickness.
    pub thickness: Entered<Length>,
}

/// An I-shaped section as entered: three plates and, for a rolled shape, what the table says of it.
#[derive(Clone, Debug, PartialEq)]
pub struct IShape {
    /// Out-to-out depth.
    pub depth: Entered<Length>,
    /// Top flange.
    pub top: Flange,
    /// Bottom flange.
    pub bottom: Flange,
    /// Web thickness.
    pub web: Entered<Length>,
    /// Distance from the outer face of a flange to the toe of the fillet; for a welded girder the
    /// flange thickness and the weld.
    pub fillet: Entered<Length>,
    /// Published properties when the section is a rolled shape taken as published. They contain the
    /// fillets, which three rectangles lack.
    pub published: Option<Published>,
}

/// What a table of rolled shapes says beyond the dimensions.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Published {
    /// Name of the shape.
    pub name: &'static str,
    /// Table that it was read from.
    pub source: &'static str,
    /// Area.
    pub area: Area,
    /// Second moment of area about the strong axis.
    pub inertia: Inertia,
    /// Elastic modulus about the strong axis.
    pub elastic: Modulus,
    /// Plastic modulus about the strong axis.
    pub plastic: Modulus,
}

/// The plates left at one station, after findings: plain values.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Left {
    /// Out-to-out depth of the sound section; loss is taken from the outer face of a flange.
    pub depth: Length,
    /// Thickness left of the top flange (mean).
    pub top: Length,
    /// Thickness left of the bottom flange (mean).
    pub bottom: Length,
    /// Thickness left of the web (mean over the height).
    pub web: Length,
    /// Least thickness left in the lowest band of the web, which decides at a bearing.
    pub web_low: Length,
}
