//! Distribution of live load to girders under a concrete deck on steel beams (LRFD 4.6.2.2, type a).
//!
//! The one-lane formulas contain the multiple presence factor 1.20; the lever rule and the rigid
//! cross-section do not, and get it here. Shares are of a lane, not of a wheel line.

use crate::quantity::{Angle, Area, Inertia, Length};
use crate::units::mark::{Deg, Ft, In2, In4, Inch, One};
use crate::{clause, condition};

clause! {
    /// Distance between the centroids of girder and slab. W33x130 with its cover plate under a slab of
    /// 7.25 in without haunch: 22.64 in (MBE example A1, from memory).
    pub fn slab_offset(y_t: Length [Inch], t_h: Length [Inch], t_s: Length [Inch]) -> e_g: Length [Inch]
    { y_t + t_h + t_s / 2.0 }
    cite "AASHTO LRFD 9th ed. 4.6.2.2.1" what "distance between the centroids of girder and slab"
}

clause! {
    /// Longitudinal stiffness parameter, in4.
    pub fn stiffness(n: f64 [One], I: Inertia [In4], A: Area [In2], e_g: Length [Inch]) -> K_g: Inertia [In4]
    { n * (I + A * e_g * e_g) }
    cite "AASHTO LRFD 9th ed. 4.6.2.2.1 (4.6.2.2.1-1)" what "longitudinal stiffness"
}

clause! {
    /// Its term in the formulas for moment.
    pub fn stiffness_term(K_g: Inertia [In4], L: Length [Ft], t_s: Length [Inch]) -> k: f64 [One]
    { pow(K_g / (12.0 * L * t_s * t_s * t_s), 0.1) }
    cite "AASHTO LRFD 9th ed. table 4.6.2.2.2b-1" what "stiffness term"
}

clause! {
    /// Interior girder, moment, one lane loaded; multiple presence is in it.
    pub fn moment_one(S: Length [Ft], L: Length [Ft], k: f64 [One]) -> g_M1: f64 [One]
    { 0.06 + pow(S / 14.0, 0.4) * pow(S / L, 0.3) * k }
    cite "AASHTO LRFD 9th ed. table 4.6.2.2.2b-1" what "interior girder, moment, one lane"
}

clause! {
    /// Interior girder, moment, two or more lanes loaded; multiple presence is in it.
    pub fn moment_more(S: Length [Ft], L: Length [Ft], k: f64 [One]) -> g_M2: f64 [One]
    { 0.075 + pow(S / 9.5, 0.6) * pow(S / L, 0.2) * k }
    cite "AASHTO LRFD 9th ed. table 4.6.2.2.2b-1" what "interior girder, moment, two or more lanes"
}

clause! {
    /// Interior girder, shear, one lane loaded.
    pub fn shear_one(S: Length [Ft]) -> g_V1: f64 [One]
    { 0.36 + S / 25.0 }
    cite "AASHTO LRFD 9th ed. table 4.6.2.2.3a-1" what "interior girder, shear, one lane"
}

clause! {
    /// Interior girder, shear, two or more lanes loaded.
    pub fn shear_more(S: Length [Ft]) -> g_V2: f64 [One]
    { 0.2 + S / 12.0 - pow(S / 35.0, 2.0) }
    cite "AASHTO LRFD 9th ed. table 4.6.2.2.3a-1" what "interior girder, shear, two or more lanes"
}

clause! {
    /// Correction for an exterior girder, moment, two or more lanes; for -1.0 <= d_e <= 5.5 ft.
    pub fn exterior_moment(d_e: Length [Ft]) -> e: f64 [One]
    { 0.77 + d_e / 9.1 }
    cite "AASHTO LRFD 9th ed. table 4.6.2.2.2d-1" what "correction for the exterior girder, moment"
}

clause! {
    /// Correction for an exterior girder, shear, two or more lanes; for -1.0 <= d_e <= 5.5 ft.
    pub fn exterior_shear(d_e: Length [Ft]) -> e: f64 [One]
    { 0.6 + d_e / 10.0 }
    cite "AASHTO LRFD 9th ed. table 4.6.2.2.3b-1" what "correction for the exterior girder, shear"
}

clause! {
    /// Exterior girder by correction of the interior one.
    pub fn corrected(e: f64 [One], g_int: f64 [One]) -> g: f64 [One]
    { e * g_int }
    cite "AASHTO LRFD 9th ed. 4.6.2.2.2d, 4.6.2.2.3b" what "exterior girder, two or more lanes"
}

clause! {
    /// A placement with its multiple presence factor.
    pub fn with_presence(m: f64 [One], g_p: f64 [One]) -> g: f64 [One]
    { m * g_p }
    cite "AASHTO LRFD 9th ed. 3.6.1.1.2" what "share with multiple presence"
}

clause! {
    /// Shear at skewed supports, worked in for every girder line: the obtuse corner has it, and which
    /// corner is obtuse changes from end to end. For skews up to 60 degrees.
    pub fn skew_shear(L: Length [Ft], t_s: Length [Inch], K_g: Inertia [In4], theta: Angle [Deg])
        -> c_V: f64 [One]
    { 1.0 + 0.20 * pow(12.0 * L * t_s * t_s * t_s / K_g, 0.3) * tan_deg(theta) }
    cite "AASHTO LRFD 9th ed. table 4.6.2.2.3c-1" what "correction for skew, shear at the obtuse corner"
}

clause! {
    /// Share of shear at a skewed support.
    pub fn skewed(c_V: f64 [One], g: f64 [One]) -> g_V: f64 [One]
    { c_V * g }
    cite "AASHTO LRFD 9th ed. 4.6.2.2.3c" what "share of shear with skew"
}

clause! {
    /// The larger of two shares rules.
    pub fn larger(g_1: f64 [One], g_2: f64 [One]) -> g: f64 [One]
    { max(g_1, g_2) }
    cite "AASHTO LRFD 9th ed. 4.6.2.2" what "the larger share rules"
}

clause! {
    /// The lesser of formula and lever rule, with three girders.
    pub fn lesser(g_1: f64 [One], g_2: f64 [One]) -> g: f64 [One]
    { min(g_1, g_2) }
    cite "AASHTO LRFD 9th ed. table 4.6.2.2.2b-1" what "three girders: the lesser of formula and lever rule"
}

condition! {
    /// Range of use of the formulas for moment.
    pub fn moment_range(
        S: Length [Ft], t_s: Length [Inch], L: Length [Ft], N_b: f64 [One], K_g: Inertia [In4],
    ) { S >= 3.5 && S <= 16.0 && t_s >= 4.5 && t_s <= 12.0 && L >= 20.0 && L <= 240.0 && N_b >= 4.0
        && K_g >= 10000.0 && K_g <= 7000000.0 }
    cite "AASHTO LRFD 9th ed. table 4.6.2.2.2b-1"
    yes "inside the range of the formulas for moment" no "outside the range of the formulas for moment"
}

condition! {
    /// Range of use of the formulas for shear.
    pub fn shear_range(S: Length [Ft], t_s: Length [Inch], L: Length [Ft], N_b: f64 [One])
    { S >= 3.5 && S <= 16.0 && t_s >= 4.5 && t_s <= 12.0 && L >= 20.0 && L <= 240.0 && N_b >= 4.0 }
    cite "AASHTO LRFD 9th ed. table 4.6.2.2.3a-1"
    yes "inside the range of the formulas for shear" no "outside the range of the formulas for shear"
}

condition! {
    /// Range of use of the corrections for exterior girders.
    pub fn exterior_range(d_e: Length [Ft]) { d_e >= -1.0 && d_e <= 5.5 }
    cite "AASHTO LRFD 9th ed. tables 4.6.2.2.2d-1, 4.6.2.2.3b-1"
    yes "inside the range of the correction" no "outside it: the lever rule alone"
}
