//! Design lanes, multiple presence, and where wheels may stand (LRFD 3.6.1). From memory, 9th edition.

use crate::quantity::Length;
use crate::share::Lanes;
use crate::units::mark::{Ft, One};
use crate::worksheet::ops::floor;
use crate::worksheet::{Recorder, Val};
use crate::{clause, condition};

const CITE_LANES: &str = "AASHTO LRFD 9th ed. 3.6.1.1.1 (from memory)";

/// Number of design lanes on a clear roadway, and their width (3.6.1.1.1).
///
/// Whole lanes of 12 ft; from 20 to 24 ft two, each half the width; below 20 ft one.
pub fn design_lanes<R: Recorder>(rec: &mut R, w: Val<Length>) -> Lanes {
    if full_lanes(rec, w) {
        let count = lanes_of_12_ft(rec, w);
        let width =
            rec.look_up("w_l", "width of a design lane", Length::from_ft(12.0), Ft, CITE_LANES, || {
                "design lane".to_owned()
            });
        Lanes { count: count.q as usize, width: width.q }
    } else if two_lanes(rec, w) {
        Lanes { count: 2, width: half_width(rec, w).q }
    } else {
        Lanes { count: 1, width: one_lane(rec, w).q }
    }
}

/// Multiple presence factor for a number of loaded lanes (table 3.6.1.1.2-1).
///
/// The one-lane formulas of table 4.6.2.2 contain the factor of one lane; lever rule, rigid section and
/// grid do not.
pub fn multiple_presence<R: Recorder>(rec: &mut R, loaded: usize) -> Val<f64> {
    let (m, row) = match loaded {
        0 | 1 => (1.20, "one lane loaded"),
        2 => (1.00, "two lanes loaded"),
        3 => (0.85, "three lanes loaded"),
        _ => (0.65, "more than three lanes loaded"),
    };
    let cite = "AASHTO LRFD 9th ed. table 3.6.1.1.2-1 (from memory)";
    rec.look_up("m", "multiple presence factor", m, One, cite, || row.to_owned())
}

/// Centre to centre of the wheel lines of a design truck, 6.0 ft (3.6.1.2.2).
pub fn gauge<R: Recorder>(rec: &mut R) -> Val<Length> {
    let cite = "AASHTO LRFD 9th ed. 3.6.1.2.2 (from memory)";
    rec.look_up("gauge", "centre to centre of wheel lines", Length::from_ft(6.0), Ft, cite, || {
        "design truck".to_owned()
    })
}

/// Least distance from a wheel to the edge of its lane and to the curb, 2.0 ft (3.6.1.3.1).
pub fn edge<R: Recorder>(rec: &mut R) -> Val<Length> {
    let cite = "AASHTO LRFD 9th ed. 3.6.1.3.1 (from memory)";
    rec.look_up(
        "edge",
        "least distance from a wheel to the edge of its lane",
        Length::from_ft(2.0),
        Ft,
        cite,
        || "all components but the deck overhang".to_owned(),
    )
}

condition! {
    /// Whether the roadway has room for two full lanes.
    fn full_lanes(w: Length [Ft]) { w >= 24.0 }
    cite "AASHTO LRFD 9th ed. 3.6.1.1.1 (from memory)"
    yes "lanes of 12 ft, whole ones only" no "less than two lanes of 12 ft"
}

condition! {
    /// Whether a narrower roadway still has two lanes.
    fn two_lanes(w: Length [Ft]) { w >= 20.0 }
    cite "AASHTO LRFD 9th ed. 3.6.1.1.1 (from memory)"
    yes "20 to 24 ft: two lanes, each half the width" no "one lane"
}

clause! {
    /// Whole lanes of 12 ft.
    fn lanes_of_12_ft(w: Length [Ft]) -> N_L: f64 [One] { floor(w / 12.0) }
    cite "AASHTO LRFD 9th ed. 3.6.1.1.1 (from memory)" what "number of design lanes"
}

clause! {
    /// Half the roadway.
    fn half_width(w: Length [Ft]) -> w_l: Length [Ft] { w / 2.0 }
    cite "AASHTO LRFD 9th ed. 3.6.1.1.1 (from memory)" what "width of a design lane"
}

clause! {
    /// The one lane of a narrow roadway.
    fn one_lane(w: Length [Ft]) -> w_l: Length [Ft] { min(w, 12.0) }
    cite "AASHTO LRFD 9th ed. 3.6.1.1.1 (from memory)" what "width of the design lane"
}
