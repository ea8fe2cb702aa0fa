//! What a rule set chooses for a share, and what comes out.

use super::skew::SkewShear;
use crate::problem::Problem;
use crate::quantity::{Area, Inertia, Length};
use crate::share::Placement;
use crate::worksheet::Val;

/// What the stiffness parameter needs of a girder.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Stiffness {
    /// Modular ratio of girder to deck.
    pub n: Val<f64>,
    /// Second moment of area of the girder alone.
    pub i: Val<Inertia>,
    /// Area of the girder alone.
    pub a: Val<Area>,
    /// Centre of gravity of the girder to the top of its top flange.
    pub y_t: Val<Length>,
}

/// Which lanes are loaded.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Loading {
    /// One lane or several, whichever is worse: design, legal and routine permit loads.
    Governing,
    /// One lane, with multiple presence: where only one truck can be on the bridge.
    OneLane,
    /// One lane without multiple presence: special permits, whose crossing is controlled.
    OneLaneAlone,
}

/// Formulas or lever rule.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Method {
    /// The formulas of the tables, where they hold.
    Formula,
    /// The lever rule.
    LeverRule,
    /// The rigid cross-section, for exterior girders.
    RigidSection,
}

/// Bands that trucks keep for themselves in the lever rule and the rigid cross-section.
#[derive(Clone, Copy, Debug, PartialEq)]
pub enum Bands {
    /// Each truck within its own design lane.
    DesignLanes,
    /// The nearest wheels of passing trucks at least this far apart. On the safe side of
    /// [`Bands::DesignLanes`].
    Passing(Val<Length>),
}

/// When an exterior girder takes no less than the rigid cross-section gives (4.6.2.2.2d).
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum RigidRule {
    /// Where diaphragms that work were measured between the girders.
    WithDiaphragms,
    /// Never: a choice of the rule set.
    Never,
}

/// What a rule set chooses.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Policy {
    /// Which lanes are loaded.
    pub loading: Loading,
    /// [`Method::Formula`], or [`Method::LeverRule`] in place of the formulas everywhere.
    pub method: Method,
    /// How trucks stand side by side.
    pub bands: Bands,
    /// Rigid cross-section for exterior girders.
    pub rigid: RigidRule,
    /// Whether the reduction of moment for skew is taken (4.6.2.2.2e).
    pub skew_moment: bool,
    /// Which girders get the increase of shear for skew (4.6.2.2.3c).
    pub skew_shear: SkewShear,
}

/// Share of live load of one girder line.
#[derive(Clone, Debug, PartialEq)]
pub struct Share {
    /// The share in lanes, with everything in it.
    pub g: Val<f64>,
    /// Lanes loaded where it governs; 2 stands for two or more where a formula governs.
    pub lanes: usize,
    /// Worst share with one lane loaded, before any correction for skew.
    pub one_lane: f64,
    /// Worst share with several lanes loaded, before any correction for skew; none for one lane.
    pub multi: Option<f64>,
    /// What governs.
    pub method: Method,
    /// Where the trucks stand, for the lever rule and the rigid cross-section.
    pub placement: Option<Placement>,
    /// What deserves a second look.
    pub notes: Vec<Problem>,
}
