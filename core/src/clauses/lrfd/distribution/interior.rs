//! Interior girders: tables 4.6.2.2.2b-1 (moment) and 4.6.2.2.3a-1 (shear), cross-section (a).

use crate::clause;
use crate::quantity::{Area, Inertia, Length};
use crate::units::mark::{Ft, In2, In4, Inch, One};

clause! {
    /// Distance between the centres of gravity of the girder and the deck.
    pub fn e_g(y_t: Length [Inch], t_h: Length [Inch], t_s: Length [Inch]) -> e_g: Length [Inch]
    { y_t + t_h + t_s / 2.0 }
    cite "AASHTO LRFD 9th ed. 4.6.2.2.1"
    what "centre of gravity of the girder to that of the deck"
}

clause! {
    /// Longitudinal stiffness parameter.
    pub fn k_g(n: f64 [One], I: Inertia [In4], A: Area [In2], e_g: Length [Inch]) -> K_g: Inertia [In4]
    { n * (I + A * pow(e_g, 2.0)) }
    cite "AASHTO LRFD 9th ed. (4.6.2.2.1-1)"
    what "longitudinal stiffness parameter"
}

clause! {
    /// Moment, one design lane loaded. Contains the multiple presence factor of 1.2.
    pub fn moment_one(S: Length [Ft], L: Length [Ft], K_g: Inertia [In4], t_s: Length [Inch]) -> g_1: f64 [One]
    { 0.06 + pow(S / 14.0, 0.4) * pow(S / L, 0.3) * pow(K_g / (12.0 * L * pow(t_s, 3.0)), 0.1) }
    cite "AASHTO LRFD 9th ed. table 4.6.2.2.2b-1 (a)"
    what "share of moment, one lane loaded (1.2 for multiple presence is in it)"
}

clause! {
    /// Moment, two or more design lanes loaded.
    pub fn moment_more(S: Length [Ft], L: Length [Ft], K_g: Inertia [In4], t_s: Length [Inch]) -> g_2: f64 [One]
    { 0.075 + pow(S / 9.5, 0.6) * pow(S / L, 0.2) * pow(K_g / (12.0 * L * pow(t_s, 3.0)), 0.1) }
    cite "AASHTO LRFD 9th ed. table 4.6.2.2.2b-1 (a)"
    what "share of moment, two lanes or more loaded"
}

clause! {
    /// Shear, one design lane loaded. Contains the multiple presence factor of 1.2.
    pub fn shear_one(S: Length [Ft]) -> g_1: f64 [One] { 0.36 + S / 25.0 }
    cite "AASHTO LRFD 9th ed. table 4.6.2.2.3a-1 (a)"
    what "share of shear, one lane loaded (1.2 for multiple presence is in it)"
}

clause! {
    /// Shear, two or more design lanes loaded.
    pub fn shear_more(S: Length [Ft]) -> g_2: f64 [One] { 0.2 + S / 12.0 - pow(S / 35.0, 2.0) }
    cite "AASHTO LRFD 9th ed. table 4.6.2.2.3a-1 (a)"
    what "share of shear, two lanes or more loaded"
}

clause! {
    /// Mean of the spacings at either side; common practice where they differ, no source.
    pub fn mean_spacing(S_left: Length [Ft], S_right: Length [Ft]) -> S: Length [Ft]
    { (S_left + S_right) / 2.0 }
    cite "mean of the spacings at either side (common practice, no source)"
    what "spacing of girders"
}
