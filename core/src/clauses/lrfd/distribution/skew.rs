//! Corrections for skewed supports: moment 4.6.2.2.2e, shear 4.6.2.2.3c.
//!
//! The moment correction is a reduction and is taken only where a rule set says so. The shear
//! correction is an increase; where a girder has it, it is taken at both ends and along the whole
//! girder, which is on the safe side of a decrease toward midspan.

use super::range::{self, Entries};
use crate::problem::Problem;
use crate::quantity::{Angle, Inertia, Length};
use crate::units::mark::{Deg, Ft, In4, Inch, One};
use crate::worksheet::{Recorder, Val};
use crate::{clause, condition};

/// Which girders get the increase of shear at the obtuse corner.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum SkewShear {
    /// Exterior girders: the text of earlier editions (read on their page 4-44).
    Exterior,
    /// Exterior and first interior girders: the text since the 8th edition (from memory).
    ExteriorAndFirst,
    /// Every girder.
    All,
}

impl SkewShear {
    /// Whether a line gets it.
    #[must_use]
    pub fn covers(self, line: usize, lines: usize) -> bool {
        let from_edge = line.min(lines.saturating_sub(line + 1));
        match self {
            Self::Exterior => from_edge == 0,
            Self::ExteriorAndFirst => from_edge <= 1,
            Self::All => true,
        }
    }
}

/// Reduced share of moment, if the skew is 30 degrees or more.
pub(super) fn moment<R: Recorder>(
    rec: &mut R,
    g: Val<f64>,
    theta: Val<Angle>,
    at: &Entries<'_>,
    n_b: Val<f64>,
) -> Val<f64> {
    if !reduces(rec, theta) || !enough_girders(rec, n_b) || range::spacing_and_span(rec, at).is_err() {
        return g;
    }
    let theta = capped(rec, theta);
    let c_1 = c_1(rec, at.k_g, at.l, at.t_s, at.s);
    let factor = moment_factor(rec, c_1, theta);
    corrected(rec, g, factor)
}

/// Increased share of shear.
///
/// # Errors
/// When the skew or the girders lie outside the range of the table.
pub(super) fn shear<R: Recorder>(
    rec: &mut R,
    g: Val<f64>,
    theta: Val<Angle>,
    theta_path: &str,
    at: &Entries<'_>,
    n_b: Val<f64>,
) -> Result<Val<f64>, Problem> {
    if !skewed(rec, theta) {
        return Ok(g);
    }
    if !skew_in_range(rec, theta) {
        return Err(range::outside(theta_path, "the skew", "60 degrees at most for shear"));
    }
    if !enough_girders(rec, n_b) {
        return Err(range::outside(
            "girders",
            "the number of girders of a skewed bridge",
            "four or more for shear",
        ));
    }
    range::spacing_and_span(rec, at)?;
    let factor = shear_factor(rec, at.l, at.t_s, at.k_g, theta);
    Ok(corrected(rec, g, factor))
}

condition! {
    fn skewed(theta: Angle [Deg]) { theta > 0.0 }
    cite "AASHTO LRFD 9th ed. 4.6.2.2.3c" yes "skewed supports" no "square supports"
}

condition! {
    fn skew_in_range(theta: Angle [Deg]) { theta <= 60.0 }
    cite "AASHTO LRFD 9th ed. table 4.6.2.2.3c-1, range" yes "skew within 0 to 60°" no "skew beyond 60°"
}

condition! {
    fn enough_girders(N_b: f64 [One]) { N_b >= 4.0 }
    cite "AASHTO LRFD 9th ed. tables 4.6.2.2.2e-1 and 4.6.2.2.3c-1, range"
    yes "four girder lines or more" no "fewer than four girder lines"
}

condition! {
    fn reduces(theta: Angle [Deg]) { theta >= 30.0 }
    cite "AASHTO LRFD 9th ed. table 4.6.2.2.2e-1"
    yes "skew of 30° or more reduces the moment" no "skew below 30°: no reduction"
}

clause! {
    fn capped(theta: Angle [Deg]) -> theta: Angle [Deg] { min(theta, 60.0) }
    cite "AASHTO LRFD 9th ed. table 4.6.2.2.2e-1" what "skew, not more than 60°"
}

clause! {
    fn c_1(K_g: Inertia [In4], L: Length [Ft], t_s: Length [Inch], S: Length [Ft]) -> c_1: f64 [One]
    { 0.25 * pow(K_g / (12.0 * L * pow(t_s, 3.0)), 0.25) * pow(S / L, 0.5) }
    cite "AASHTO LRFD 9th ed. table 4.6.2.2.2e-1 (a)" what "parameter of the skew correction"
}

clause! {
    fn moment_factor(c_1: f64 [One], theta: Angle [Deg]) -> f_skew: f64 [One]
    { 1.0 - c_1 * pow(tan_deg(theta), 1.5) }
    cite "AASHTO LRFD 9th ed. table 4.6.2.2.2e-1 (a)" what "reduction of moment for skew"
}

clause! {
    fn shear_factor(L: Length [Ft], t_s: Length [Inch], K_g: Inertia [In4], theta: Angle [Deg]) -> f_skew: f64 [One]
    { 1.0 + 0.20 * pow(12.0 * L * pow(t_s, 3.0) / K_g, 0.3) * tan_deg(theta) }
    cite "AASHTO LRFD 9th ed. table 4.6.2.2.3c-1 (a)" what "increase of shear at the obtuse corner"
}

clause! {
    fn corrected(g: f64 [One], f_skew: f64 [One]) -> g: f64 [One] { g * f_skew }
    cite "AASHTO LRFD 9th ed. 4.6.2.2.2e and 4.6.2.2.3c" what "share, corrected for skew"
}
