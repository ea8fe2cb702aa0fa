//! Lanes across a roadway and multiple presence (LRFD 3.6.1.1).

use crate::quantity::Length;
use crate::share::Roadway;
use crate::units::mark::One;
use crate::worksheet::{Recorder, Val};

/// Gauge of all axles of design and legal vehicles: 6 ft (LRFD 3.6.1.2.2).
pub const GAUGE: Length = Length::from_ft(6.0);

/// Least distance from a wheel to the curb, or to the edge of its lane: 2 ft (LRFD 3.6.1.3.1).
pub const EDGE: Length = Length::from_ft(2.0);

/// Width of a design lane: 12 ft (LRFD 3.6.1.1.1).
pub const LANE: Length = Length::from_ft(12.0);

/// Most lanes that the table of multiple presence tells apart.
pub const MOST: u32 = 4;

/// Multiple presence factor for loaded lanes: 1.20, 1.00, 0.85, 0.65 (LRFD table 3.6.1.1.2-1).
pub fn multiple_presence<R: Recorder>(rec: &mut R, lanes: u32) -> Val<f64> {
    let m = match lanes {
        0 | 1 => 1.20,
        2 => 1.00,
        3 => 0.85,
        _ => 0.65,
    };
    rec.look_up("m", "multiple presence", m, One, "AASHTO LRFD 9th ed. table 3.6.1.1.2-1", || {
        format!("{lanes} lane{} loaded", if lanes == 1 { "" } else { "s" })
    })
}

/// The roadway with lanes of a width.
#[must_use]
pub const fn roadway(left: Length, width: Length, lane: Length) -> Roadway {
    Roadway { left, width, lane, gauge: GAUGE, edge: EDGE }
}
