//! Proportions within which the strength formulas hold (6.10.2), for girders as they stand.

use super::flange::{Pressed, lateral_inertia, lateral_inertia_tension};
use crate::problem::Problem;
use crate::quantity::{Inertia, Length, Stress};
use crate::section::effective::Effective;
use crate::units::mark::{In4, Inch, Ksi, One};
use crate::worksheet::{Recorder, Val};
use crate::{clause, condition};

clause! {
    /// Slenderness of the web.
    pub fn web_ratio(D: Length [Inch], t_w: Length [Inch]) -> lambda_D: f64 [One] { D / t_w }
    cite "AASHTO LRFD 9th ed. 6.10.2.1.1" what "depth of the web over its thickness"
}

condition! {
    /// Webs without longitudinal stiffeners reach up to 150.
    pub fn web_ratio_holds(lambda_D: f64 [One]) { lambda_D <= 150.0 }
    cite "AASHTO LRFD 9th ed. 6.10.2.1.1 (6.10.2.1.1-1), from memory"
    yes "the web is within the range of the formulas" no "the web is too slender for the formulas"
}

clause! {
    /// Slenderness of a flange.
    pub fn flange_ratio(b_f: Length [Inch], t_f: Length [Inch]) -> lambda_f: f64 [One] { b_f / (2.0 * t_f) }
    cite "AASHTO LRFD 9th ed. 6.10.2.2" what "half the width of the flange over its thickness"
}

condition! {
    /// Flanges reach up to 12.
    pub fn flange_ratio_holds(lambda_f: f64 [One]) { lambda_f <= 12.0 }
    cite "AASHTO LRFD 9th ed. 6.10.2.2 (6.10.2.2-1), from memory"
    yes "the flange is within the range of the formulas" no "the flange is too thin for its width"
}

condition! {
    /// Neither flange may be ten times as stiff sideways as the other.
    pub fn flanges_alike(I_yc: Inertia [In4], I_yt: Inertia [In4])
    { 0.1 * I_yt <= I_yc && I_yc <= 10.0 * I_yt }
    cite "AASHTO LRFD 9th ed. 6.10.2.2 (6.10.2.2-4), from memory"
    yes "the flanges are within the range of the formulas" no "the flanges are too unlike"
}

condition! {
    /// A flange is to be at least a sixth of the web's depth in width and 1.1 times its thickness.
    pub fn flange_stout(b_f: Length [Inch], t_f: Length [Inch], D: Length [Inch], t_w: Length [Inch])
    { D <= 6.0 * b_f && 1.1 * t_w <= t_f }
    cite "AASHTO LRFD 9th ed. 6.10.2.2 (6.10.2.2-2 and -3), from memory"
    yes "the flange has the proportions asked of a new one"
    no "the flange lacks proportions asked of a new one; the strength formulas are used all the same (common practice, no source)"
}

condition! {
    /// The formulas of 6.10 reach up to 100 ksi.
    pub fn strength_holds(F_y: Stress [Ksi]) { F_y <= 100.0 }
    cite "AASHTO LRFD 9th ed. 6.10.1, from memory"
    yes "the strength is within the range of the formulas" no "no formula for steel of this strength"
}

/// Checks the yield strength.
///
/// # Errors
/// Above 100 ksi.
pub fn strength<R: Recorder>(rec: &mut R, f_y: Val<Stress>, path: &str) -> Result<(), Problem> {
    if f_y.q > Stress::ZERO && strength_holds(rec, f_y) {
        return Ok(());
    }
    Err(Problem::error(
        path,
        "the formulas reach from above 0 to 100 ksi (689 MPa) of yield strength",
        "check the yield strength of the steel",
    ))
}

/// Checks the web and returns its slenderness.
///
/// # Errors
/// Above 150.
pub fn web<R: Recorder>(rec: &mut R, section: &Effective) -> Result<Val<f64>, Problem> {
    let ratio = web_ratio(rec, section.plates.web_depth, section.plates.t_w);
    if web_ratio_holds(rec, ratio) {
        return Ok(ratio);
    }
    Err(Problem::error(
        section.paths.web,
        "the web is more slender than 150, beyond the formulas for webs without longitudinal stiffeners",
        "check the web's thickness and depth; a web like this needs its own study",
    ))
}

/// The flanges of a section within the range of the formulas.
#[derive(Clone, Copy, Debug)]
pub struct Flanges {
    /// Slenderness of the compression flange.
    pub slenderness: Val<f64>,
    /// Second moment of area of the compression flange about the vertical axis.
    pub i_yc: Val<Inertia>,
    /// The same of the tension flange.
    pub i_yt: Val<Inertia>,
}

/// Checks web and flanges against the range of the flexure formulas.
///
/// # Errors
/// When a limit is passed beyond which the formulas say nothing.
pub fn flexure<R: Recorder>(rec: &mut R, section: &Effective, pressed: &Pressed) -> Result<Flanges, Problem> {
    web(rec, section)?;
    let p = &section.plates;
    let slenderness = flange_ratio(rec, pressed.b_fc, pressed.t_fc);
    let tension = flange_ratio(rec, pressed.b_ft, pressed.t_ft);
    for (ratio, path) in [(slenderness, pressed.path_c), (tension, pressed.path_t)] {
        if !flange_ratio_holds(rec, ratio) {
            return Err(Problem::error(
                path,
                "the flange is more than 24 times as wide as it is thick, beyond the formulas",
                "check width and thickness left of the flanges",
            ));
        }
    }
    flange_stout(rec, pressed.b_fc, pressed.t_fc, p.web_depth, p.t_w);
    flange_stout(rec, pressed.b_ft, pressed.t_ft, p.web_depth, p.t_w);
    let i_yc = lateral_inertia(rec, pressed.t_fc, pressed.b_fc);
    let i_yt = lateral_inertia_tension(rec, pressed.t_ft, pressed.b_ft);
    if !flanges_alike(rec, i_yc, i_yt) {
        return Err(Problem::error(
            pressed.path_c,
            "one flange is more than ten times as stiff sideways as the other, beyond the formulas",
            "check width and thickness left of the flanges",
        ));
    }
    Ok(Flanges { slenderness, i_yc, i_yt })
}
