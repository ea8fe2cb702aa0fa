//! Kinds of member. A new kind is a section here, a drawing on the page and clauses.

use crate::material::Steel;
use crate::quantity::Length;
use crate::section::plate::IShape;
use crate::units::Entered;

/// A kind of member that girder lines refer to.
#[derive(Clone, Debug, PartialEq)]
pub struct Member {
    /// Id in the document.
    pub id: String,
    /// What it is called.
    pub name: String,
    /// What it is.
    pub kind: MemberKind,
}

/// The kinds of member that can be rated today.
#[derive(Clone, Debug, PartialEq)]
pub enum MemberKind {
    /// A steel I-girder under a concrete deck.
    Steel(SteelGirder),
}

/// A steel I-girder.
#[derive(Clone, Debug, PartialEq)]
pub struct SteelGirder {
    /// Its sound section.
    pub section: IShape,
    /// Its steel.
    pub steel: Steel,
    /// Whether the slab works with it.
    pub composite: Composite,
    /// What holds its top flange.
    pub bracing: Bracing,
    /// Length of bearing along the girder at a support.
    pub bearing_length: Option<Entered<Length>>,
    /// Whether stiffeners stand over the bearings: then web yielding and crippling do not apply.
    pub bearing_stiffeners: bool,
}

/// Composite action counts only where connectors are proved.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Composite {
    /// Connectors seen, drawn or proved by test.
    Proved,
    /// Known to have none.
    None,
    /// Nobody knows: rated as non-composite.
    NotKnown,
}

/// What holds the compression flange sideways.
#[derive(Clone, Debug, PartialEq)]
pub struct Bracing {
    /// Greatest distance between diaphragms that work; none where not measured.
    pub spacing: Option<Entered<Length>>,
    /// Whether the top flange is embedded in, or connected to, the slab. A deck that merely rests
    /// on it is no brace.
    pub embedded: Embedded,
}

/// Whether the slab holds the top flange.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Embedded {
    /// The flange is cast into the slab or connected to it.
    Yes,
    /// The slab rests on it.
    No,
    /// Not inspected: taken as no brace.
    NotInspected,
}

/// What is known of the web over a bearing.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum WebEnds {
    /// Looked at and sound, or with the loss that a finding tells.
    Inspected,
    /// Not looked at: no number for web yielding and crippling.
    NotInspected,
}
