//! Rule sets: which clauses belong together.
//!
//! A basis answers what a member kind cannot: which vehicles at which level, the factor on each
//! load, the share of live load, the dynamic allowance, the capacity of a section for an action, and
//! the posting that follows. Its factors, vehicles and levels are plain data. One basis never
//! imports another.

pub mod mbe_a;

use crate::bridge::{Bridge, MemberKind, SteelGirder};
use crate::check::{Action, Class, Level, LimitState, Outcome, Posting};
use crate::load::axle_train::AxleTrain;
use crate::load::dead::DeadLoad;
use crate::load::lane::Lane;
use crate::problem::Problem;
use crate::quantity::{Force, Length, Modulus, Moment, Quantity, Stress};
use crate::section::plate::Left;
use crate::worksheet::{LineNo, Recorder, Val};

/// What a rule set is called and from which editions it is taken.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub struct About {
    /// Stable id, kept in books.
    pub id: &'static str,
    /// Name on screen.
    pub name: &'static str,
    /// Standards and editions.
    pub editions: &'static str,
}

/// One live load at one level.
#[derive(Clone, Debug, PartialEq)]
pub struct Case {
    /// Stable id, such as `su7`.
    pub id: String,
    /// Name as the standard prints it.
    pub name: String,
    /// Level.
    pub level: Level,
    /// How signs see it.
    pub class: Class,
    /// Gross weight; none for a notional load.
    pub weight: Option<Force>,
    /// Trucks of which the one with the largest effect counts; they carry the dynamic allowance.
    pub trains: Vec<AxleTrain>,
    /// Lane load together with it, without dynamic allowance.
    pub lane: Option<Lane>,
    /// Whether an axle that would relieve the effect counts.
    pub relieving_counts: bool,
}

/// Factors on the loads of one combination.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct LoadFactors {
    /// On component dead load.
    pub dc: Val<f64>,
    /// On the wearing surface.
    pub dw: Val<f64>,
    /// On live load.
    pub live: Val<f64>,
}

/// Share of a lane that a girder takes.
#[derive(Clone, Debug, PartialEq)]
pub struct LaneShare {
    /// The share that rules, with multiple presence in it.
    pub share: Val<f64>,
    /// What deserves a second look.
    pub notes: Vec<Problem>,
}

/// A moment, a force or a stress on its line of the worksheet.
#[derive(Clone, Copy, Debug, PartialEq)]
pub enum Amount {
    /// Bending.
    Moment(Val<Moment>),
    /// Shear or a reaction.
    Force(Val<Force>),
    /// Bending stress.
    Stress(Val<Stress>),
}

impl Amount {
    /// In the base unit of its quantity.
    #[must_use]
    pub fn base(&self) -> f64 {
        match self {
            Self::Moment(v) => v.q.base(),
            Self::Force(v) => v.q.base(),
            Self::Stress(v) => v.q.base(),
        }
    }

    /// The line that it stands on.
    #[must_use]
    pub const fn line(&self) -> LineNo {
        match self {
            Self::Moment(v) => v.line,
            Self::Force(v) => v.line,
            Self::Stress(v) => v.line,
        }
    }
}

/// A capacity with its factors in it.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Resistance {
    /// The factored capacity.
    pub factored: Amount,
    /// Resistance factor.
    pub resistance: f64,
    /// Condition factor.
    pub condition: f64,
    /// System factor.
    pub system: f64,
}

/// What came out for a legal vehicle.
#[derive(Clone, Debug)]
pub struct Ruling<'a> {
    /// Index of the load in the rating.
    pub load: usize,
    /// The vehicle.
    pub case: &'a Case,
    /// What rules for it.
    pub outcome: Outcome,
    /// What strength alone says.
    pub strength: Outcome,
}

/// A place on a girder line that is looked at.
#[derive(Clone, Copy, Debug)]
pub struct At<'a> {
    /// The bridge.
    pub bridge: &'a Bridge,
    /// Index of the girder line.
    pub line: usize,
    /// From the near bearing.
    pub x: Length,
    /// What is left of the plates there.
    pub left: Left,
}

impl<'a> At<'a> {
    /// The place with the findings there.
    #[must_use]
    pub fn new(bridge: &'a Bridge, line: usize, x: Length) -> Self {
        Self { bridge, line, x, left: bridge.left_at(line, x) }
    }

    /// Whether both places are on one line, with the same plates left.
    #[must_use]
    pub fn same_plates(&self, other: &Self) -> bool {
        let crooked = |at: &Self| at.bridge.crooked_web_at(at.line, at.x).map(|f| (f.id.clone(), f.straight));
        let measured = |at: &Self| at.bridge.loss_measured_at(at.line, at.x);
        self.line == other.line
            && self.left == other.left
            && crooked(self) == crooked(other)
            && measured(self) == measured(other)
    }

    /// The girder, if the member is of steel.
    #[must_use]
    pub fn steel(&self) -> &'a SteelGirder {
        let MemberKind::Steel(girder) = &self.bridge.member(self.line).kind;
        girder
    }
}

/// Section moduli of one face for the three stages of load.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct FaceModuli {
    /// Bare girder.
    pub bare: Val<Modulus>,
    /// With the slab under long-term load.
    pub long: Val<Modulus>,
    /// With the slab under live load.
    pub short: Val<Modulus>,
}

/// A rule set.
pub trait Basis {
    /// What it is called.
    fn about(&self) -> About;

    /// What is driven over the bridge, worst-known order of the standard.
    fn cases(&self, bridge: &Bridge) -> Vec<Case>;

    /// What a reader of the rating has to know of this rule set on this bridge.
    fn notes(&self, bridge: &Bridge) -> Vec<Problem>;

    /// Limit states that the rule set looks at for an action.
    fn states(&self, action: Action) -> &'static [LimitState];

    /// Dead load on a girder line. Its own weight is that of the sound section: what rust has taken
    /// off one end does not make the span lighter.
    ///
    /// # Errors
    /// When the section cannot be worked out.
    fn dead<R: Recorder>(&self, rec: &mut R, bridge: &Bridge, line: usize) -> Result<DeadLoad, Problem>;

    /// Share of live load for an action (moment, or shear and reactions).
    ///
    /// # Errors
    /// When the bridge lies outside every method that the rule set allows.
    fn share<R: Recorder>(
        &self,
        rec: &mut R,
        bridge: &Bridge,
        line: usize,
        action: Action,
    ) -> Result<LaneShare, Problem>;

    /// Dynamic allowance of a case, as a fraction.
    fn dynamic<R: Recorder>(&self, rec: &mut R, bridge: &Bridge, case: &Case) -> Val<f64>;

    /// Load factors of a combination.
    fn load_factors<R: Recorder>(
        &self,
        rec: &mut R,
        bridge: &Bridge,
        state: LimitState,
        case: &Case,
        dead: &DeadLoad,
    ) -> LoadFactors;

    /// Capacity at a place.
    ///
    /// # Errors
    /// When something that the method needs is missing or outside its range.
    fn capacity<R: Recorder>(
        &self,
        rec: &mut R,
        at: &At<'_>,
        dead: &DeadLoad,
        action: Action,
        state: LimitState,
    ) -> Result<Resistance, Problem>;

    /// Moduli of the top and bottom face, for stresses in service; none for a face at the neutral axis.
    ///
    /// # Errors
    /// When the section cannot be worked out.
    fn moduli<R: Recorder>(&self, rec: &mut R, at: &At<'_>) -> Result<[Option<FaceModuli>; 2], Problem>;

    /// The rating factor as the standard prints it. Whether it means something is decided by
    /// [`Outcome::from_effects`].
    fn factor<R: Recorder>(
        &self,
        rec: &mut R,
        capacity: Amount,
        dead: [Amount; 3],
        live: Amount,
        factors: &LoadFactors,
    ) -> Val<f64>;

    /// Whether service checks may rule a posting.
    fn service_posts(&self, bridge: &Bridge) -> bool;

    /// What the outcomes of the legal vehicles ask for: one entry a legal case.
    fn posting(&self, bridge: &Bridge, ruling: &[Ruling<'_>]) -> Posting;

    /// The safe load of one vehicle if an outcome of a limit state rules it, for the sheet.
    fn safe_load<R: Recorder>(
        &self,
        rec: &mut R,
        bridge: &Bridge,
        case: &Case,
        state: LimitState,
        outcome: &Outcome,
    );
}
