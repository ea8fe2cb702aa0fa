//! Findings: what is left of a girder over a range. A reading is what is left; loss is what is gone.

use crate::quantity::Length;
use crate::units::Entered;

/// Section loss of one girder line over a range along it.
#[derive(Clone, Debug, PartialEq)]
pub struct Finding {
    /// Id in the document.
    pub id: String,
    /// What it is called on site.
    pub name: String,
    /// Index of the girder line.
    pub line: usize,
    /// Start of the range, from the near bearing.
    pub from: Entered<Length>,
    /// End of the range.
    pub to: Entered<Length>,
    /// Thickness left of the top flange.
    pub top: Option<Entered<Length>>,
    /// Thickness left of the bottom flange.
    pub bottom: Option<Entered<Length>>,
    /// Thickness left of the web, readings over its height.
    pub web: Option<Entered<Length>>,
    /// Thickness left in the lowest band of the web: the least reading decides at a bearing.
    pub web_low: Option<Entered<Length>>,
    /// Whether the web is straight and without holes.
    pub straight: Straightness,
}

/// The formulas for web yielding and crippling assume a straight, whole web.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Straightness {
    /// Plumb and whole.
    Straight,
    /// Out of plumb or holed: no number without a named method.
    Not,
    /// Not looked at: taken as not known.
    NotInspected,
}
