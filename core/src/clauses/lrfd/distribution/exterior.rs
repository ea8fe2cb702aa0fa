//! Exterior girders: tables 4.6.2.2.2d-1 (moment) and 4.6.2.2.3b-1 (shear), cross-section (a).
//!
//! One lane: lever rule, with multiple presence. Two lanes or more: the interior share times e.

use crate::clause;
use crate::quantity::Length;
use crate::units::mark::{Ft, One};

clause! {
    /// Web of the left exterior girder to the inside face of the curb; positive where the roadway
    /// reaches beyond the web.
    pub fn d_e_left(y: Length [Ft], c: Length [Ft]) -> d_e: Length [Ft] { y - c }
    cite "AASHTO LRFD 9th ed. 4.6.2.2.1" what "web of the exterior girder to the inside face of the curb"
}

clause! {
    /// Web of the right exterior girder to the inside face of the curb; positive where the roadway
    /// reaches beyond the web.
    pub fn d_e_right(c: Length [Ft], w: Length [Ft], y: Length [Ft]) -> d_e: Length [Ft] { c + w - y }
    cite "AASHTO LRFD 9th ed. 4.6.2.2.1" what "web of the exterior girder to the inside face of the curb"
}

clause! {
    /// Correction for the exterior girder, moment, two or more design lanes loaded.
    pub fn moment_e(d_e: Length [Ft]) -> e: f64 [One] { 0.77 + d_e / 9.1 }
    cite "AASHTO LRFD 9th ed. table 4.6.2.2.2d-1 (a)" what "exterior to interior share of moment"
}

clause! {
    /// Correction for the exterior girder, shear, two or more design lanes loaded.
    pub fn shear_e(d_e: Length [Ft]) -> e: f64 [One] { 0.6 + d_e / 10.0 }
    cite "AASHTO LRFD 9th ed. table 4.6.2.2.3b-1 (a)" what "exterior to interior share of shear"
}

clause! {
    /// Exterior share from the interior one.
    pub fn from_interior(e: f64 [One], g_interior: f64 [One]) -> g_2: f64 [One] { e * g_interior }
    cite "AASHTO LRFD 9th ed. tables 4.6.2.2.2d-1 and 4.6.2.2.3b-1 (a)"
    what "share of the exterior girder, two lanes or more loaded"
}
