//! HL-93 design live load (LRFD 3.6.1.2): the larger of truck and tandem, with the lane load beside it.
//!
//! From memory, 9th edition. Dynamic load allowance goes on truck and tandem, not on the lane load. For
//! negative moment between points of contraflexure and for interior reactions, 90 % of two trucks and the
//! lane load come on top (3.6.1.3.1); a simple span has neither.

use crate::load::{AxleTrain, Lane, Spacing};
use crate::quantity::{Force, Length, LineLoad};

/// Design truck (3.6.1.2.2): 8, 32 and 32 kip, 14 ft apart and 14 to 30 ft apart, whichever is worse.
#[must_use]
pub fn truck() -> AxleTrain {
    train(
        "hl93-truck",
        "HL-93 truck",
        &[8.0, 32.0, 32.0],
        &[
            Spacing::Fixed(Length::from_ft(14.0)),
            Spacing::Range { from: Length::from_ft(14.0), to: Length::from_ft(30.0) },
        ],
        "AASHTO LRFD 9th ed. 3.6.1.2.2 (from memory)",
    )
}

/// Design tandem (3.6.1.2.3): two axles of 25 kip, 4 ft apart.
#[must_use]
pub fn tandem() -> AxleTrain {
    train(
        "hl93-tandem",
        "HL-93 tandem",
        &[25.0, 25.0],
        &[Spacing::Fixed(Length::from_ft(4.0))],
        "AASHTO LRFD 9th ed. 3.6.1.2.3 (from memory)",
    )
}

/// Design lane load (3.6.1.2.4): 0.64 kip/ft over a width of 10 ft.
#[must_use]
pub fn lane() -> Lane {
    Lane { w: LineLoad::from_kip_ft(0.64), width: Length::from_ft(10.0) }
}

fn train(id: &str, name: &str, kips: &[f64], spacings: &[Spacing], source: &str) -> AxleTrain {
    let axles = kips.iter().map(|&kip| Force::from_kip(kip)).collect();
    AxleTrain::new(id, name, axles, spacings.to_vec(), Length::from_ft(6.0), source)
        .expect("the rows of this file are vehicles")
}
