//! The design live load HL-93 (LRFD 3.6.1.2): the larger of truck and tandem, with the lane load.

use crate::load::{AxleTrain, Lane, Spacing};
use crate::problem::Problem;
use crate::quantity::{Force, Length, LineLoad};

use super::lanes::GAUGE;

/// The design truck: 8, 32 and 32 kip at 14 ft and at 14 to 30 ft (LRFD 3.6.1.2.2).
///
/// # Errors
/// Never for these axles.
pub fn truck() -> Result<AxleTrain, Vec<Problem>> {
    AxleTrain::new(
        "hl93-truck",
        "HL-93 truck",
        vec![Force::from_kip(8.0), Force::from_kip(32.0), Force::from_kip(32.0)],
        vec![
            Spacing::Fixed(Length::from_ft(14.0)),
            Spacing::Range { from: Length::from_ft(14.0), to: Length::from_ft(30.0) },
        ],
        GAUGE,
        "AASHTO LRFD 9th ed. 3.6.1.2.2",
    )
}

/// The design tandem: two axles of 25 kip at 4 ft (LRFD 3.6.1.2.3).
///
/// # Errors
/// Never for these axles.
pub fn tandem() -> Result<AxleTrain, Vec<Problem>> {
    AxleTrain::new(
        "hl93-tandem",
        "HL-93 tandem",
        vec![Force::from_kip(25.0); 2],
        vec![Spacing::Fixed(Length::from_ft(4.0))],
        GAUGE,
        "AASHTO LRFD 9th ed. 3.6.1.2.3",
    )
}

/// The design lane load: 0.64 kip/ft over 10 ft (LRFD 3.6.1.2.4).
pub const LANE: Lane = Lane { w: LineLoad::from_kip_ft(0.64), width: Length::from_ft(10.0) };
