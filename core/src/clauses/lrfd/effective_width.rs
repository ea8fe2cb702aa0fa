//! Width of the slab that works with a girder (LRFD 4.6.2.6.1).

use crate::bridge::Bridge;
use crate::quantity::Length;
use crate::units::mark::Inch;
use crate::worksheet::{Recorder, Val};

/// Effective flange width: the tributary width; for an exterior girder half the spacing and the whole
/// overhang (LRFD 9th ed. 4.6.2.6.1, as revised in 2008).
pub fn effective_width<R: Recorder>(rec: &mut R, bridge: &Bridge, line: usize) -> Val<Length> {
    rec.look_up(
        "b_e",
        "width of slab that works with the girder",
        bridge.tributary(line),
        Inch,
        "AASHTO LRFD 9th ed. 4.6.2.6.1",
        || {
            if bridge.is_exterior(line) {
                "exterior girder: half the spacing and the overhang".to_owned()
            } else {
                "interior girder: half the spacing at either side".to_owned()
            }
        },
    )
}
