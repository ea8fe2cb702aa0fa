//! Traffic lanes of narrow roadways (MBE 6A.2.3.2): what can pass, not what is painted.

use crate::quantity::Length;
use crate::share::Lanes;
use crate::units::mark::Ft;
use crate::worksheet::{Recorder, Val};
use crate::{clause, condition};

/// Traffic lanes of a clear roadway narrower than 20 ft; none for a wider one, which has the design lanes
/// of the design specifications.
///
/// Under 18 ft one lane; from 18 to 20 ft two, each half the width.
pub fn narrow<R: Recorder>(rec: &mut R, w: Val<Length>) -> Option<Lanes> {
    if wide(rec, w) {
        None
    } else if two_lanes(rec, w) {
        Some(Lanes { count: 2, width: half_width(rec, w).q })
    } else {
        Some(Lanes { count: 1, width: w.q })
    }
}

/// Least distance between the nearest wheels of passing vehicles, 4.0 ft (6A.2.3.2).
pub fn between_passing<R: Recorder>(rec: &mut R) -> Val<Length> {
    let cite = "AASHTO MBE 3rd ed. 6A.2.3.2 (from memory)";
    rec.look_up("between", "wheel lines of passing vehicles", Length::from_ft(4.0), Ft, cite, || {
        "least distance between adjacent wheel lines".to_owned()
    })
}

condition! {
    fn wide(w: Length [Ft]) { w >= 20.0 }
    cite "AASHTO MBE 3rd ed. 6A.2.3.2 (from memory)"
    yes "20 ft or more: lanes of the design specifications" no "narrower than 20 ft"
}

condition! {
    fn two_lanes(w: Length [Ft]) { w >= 18.0 }
    cite "AASHTO MBE 3rd ed. 6A.2.3.2 (from memory)"
    yes "18 to 20 ft: two lanes, each half the width" no "narrower than 18 ft: one lane"
}

clause! {
    fn half_width(w: Length [Ft]) -> w_l: Length [Ft] { w / 2.0 }
    cite "AASHTO MBE 3rd ed. 6A.2.3.2 (from memory)" what "width of a traffic lane"
}
