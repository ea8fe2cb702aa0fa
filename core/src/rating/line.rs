//! What holds for a whole girder line before any station is looked at.

use crate::basis::{Basis, LaneShare};
use crate::bridge::Bridge;
use crate::check::Action;
use crate::load::dead::DeadLoad;
use crate::problem::Problem;
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
    pub const fn share(&self, action: Action) -> &Result<LaneShare, Problem> {
        match action {
            Action::Moment | Action::Stress => &self.share_moment,
            Action::Shear | Action::Bearing => &self.share_shear,
        }
    }
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
        dead: basis.dead(rec, bridge, line)?,
        share_moment: basis.share(rec, bridge, line, Action::Moment),
        share_shear: basis.share(rec, bridge, line, Action::Shear),
    })
}
