//! What holds for a whole girder line before any station is looked at.

use crate::basis::Basis;
use crate::bridge::{Bridge, MemberKind};
use crate::check::Action;
use crate::load::dead::DeadLoad;
use crate::problem::Problem;
use crate::section::effective::{Effective, Remains};
use crate::share::LaneShare;
use crate::worksheet::Recorder;

/// Dead load and shares of a girder line.
#[derive(Clone, Debug, PartialEq)]
pub struct Prepared {
    /// Dead load by stage.
    pub dead: DeadLoad,
    /// Share of a lane for moment.
    pub share_moment: Result<LaneShare, Problem>,
    /// Share of a lane for shear and reactions.
    pub share_shear: Result<LaneShare, Problem>,
}

impl Prepared {
    /// The share for an action.
    #[must_use]
    pub const fn share(&self, action: Action) -> &Result<LaneShare, Problem> {
        match action {
            Action::Moment | Action::Stress => &self.share_moment,
            Action::Shear | Action::Bearing => &self.share_shear,
        }
    }
}

/// The dead load of a line. Its own weight is that of the sound section: what rust has taken off one
/// end does not make the span lighter.
///
/// # Errors
/// When the section cannot be worked out.
pub fn dead<R: Recorder, B: Basis>(
    rec: &mut R,
    bridge: &Bridge,
    basis: &B,
    line: usize,
) -> Result<DeadLoad, Problem> {
    let MemberKind::Steel(girder) = &bridge.member(line).kind;
    let section = Effective::at(rec, &girder.section, &Remains::default())?;
    Ok(basis.dead(rec, bridge, line, section.left.area))
}

/// Everything of a line at once.
///
/// # Errors
/// When the section cannot be worked out.
pub fn prepare<R: Recorder, B: Basis>(
    rec: &mut R,
    bridge: &Bridge,
    basis: &B,
    line: usize,
) -> Result<Prepared, Problem> {
    Ok(Prepared {
        dead: dead(rec, bridge, basis, line)?,
        share_moment: basis.share(rec, bridge, line, Action::Moment),
        share_shear: basis.share(rec, bridge, line, Action::Shear),
    })
}
