//! Limits of Service II: no resistance, condition or system factor belongs to them.

use super::flange::Pressed;
use super::{material, proportions, web};
use crate::problem::Problem;
use crate::quantity::{Length, Modulus, Moment, Stress};
use crate::section::effective::{Edge, Effective};
use crate::units::mark::{In3, Inch, KipIn, Ksi, One};
use crate::worksheet::{Recorder, Val};
use crate::{clause, condition};

/// Greatest stress of each flange in service.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Limits {
    /// Of the top flange.
    pub top: Val<Stress>,
    /// Of the bottom flange.
    pub bottom: Val<Stress>,
}

clause! {
    /// Limit of a flange of a section whose slab works with it, ksi. 33 ksi: 31.35 ksi.
    pub fn composite_limit(R_h: f64 [One], F_yf: Stress [Ksi]) -> F_SII: Stress [Ksi] { 0.95 * R_h * F_yf }
    cite "AASHTO LRFD 9th ed. 6.10.4.2.2 (6.10.4.2.2-1, -2), from memory"
    what "greatest stress of a flange in service, composite"
}

clause! {
    /// Limit of a flange of a section without a slab that works with it, ksi. 33 ksi: 26.4 ksi.
    pub fn noncomposite_limit(R_h: f64 [One], F_yf: Stress [Ksi]) -> F_SII: Stress [Ksi]
    { 0.80 * R_h * F_yf }
    cite "AASHTO LRFD 9th ed. 6.10.4.2.2 (6.10.4.2.2-3), from memory"
    what "greatest stress of a flange in service, not composite"
}

clause! {
    /// Bend-buckling coefficient of a web without longitudinal stiffeners.
    pub fn bend_buckling_coefficient(D_c: Length [Inch], D: Length [Inch]) -> k: f64 [One]
    { 9.0 / pow(D_c / D, 2.0) }
    cite "AASHTO LRFD 9th ed. 6.10.1.9.1 (6.10.1.9.1-2), from memory" what "bend-buckling coefficient of the web"
}

clause! {
    /// Stress at which the web buckles in bending, ksi.
    pub fn bend_buckling(
        E: Stress [Ksi], k: f64 [One], D: Length [Inch], t_w: Length [Inch], R_h: f64 [One],
        F_yc: Stress [Ksi], F_yw: Stress [Ksi],
    ) -> F_crw: Stress [Ksi] { min(0.9 * E * k / pow(D / t_w, 2.0), min(R_h * F_yc, F_yw / 0.7)) }
    cite "AASHTO LRFD 9th ed. 6.10.1.9.1 (6.10.1.9.1-1), from memory" what "bend-buckling stress of the web"
}

clause! {
    /// Limit of the compression flange in service, ksi: its own, and that of the web beside it.
    pub fn with_bend_buckling(F_SII: Stress [Ksi], F_crw: Stress [Ksi]) -> F_SIIc: Stress [Ksi]
    { min(F_SII, F_crw) }
    cite "AASHTO LRFD 9th ed. 6.10.4.2.2 (6.10.4.2.2-4), from memory"
    what "greatest stress of the compression flange in service"
}

condition! {
    /// Where no bend buckling of the web has to be looked at.
    pub fn web_spared(lambda_D: f64 [One]) { lambda_D <= 150.0 }
    cite "AASHTO LRFD 9th ed. 6.10.4.2.2, from memory"
    yes "composite in positive moment: bend buckling of the web needs no check"
    no "bend buckling of the web has to be checked"
}

clause! {
    /// Stress of a moment on an elastic modulus, ksi.
    pub fn stress(M: Moment [KipIn], S: Modulus [In3]) -> f: Stress [Ksi] { M / S }
    cite "mechanics" what "bending stress"
}

clause! {
    /// Moment at which a flange reaches its limit, where one section carries everything, kip in.
    pub fn moment_of_limit(F_SII: Stress [Ksi], S: Modulus [In3]) -> M_SII: Moment [KipIn] { F_SII * S }
    cite "mechanics" what "moment at the limit of service"
}

/// Limits for a section without a slab that works with it, that edge being in compression.
///
/// # Errors
/// When the section lies outside the formulas.
pub fn noncomposite<R: Recorder>(
    rec: &mut R,
    section: &Effective,
    f_y: Val<Stress>,
    f_y_path: &str,
    pressed: Edge,
) -> Result<Limits, Problem> {
    rec.heading("Service II, slab not counted");
    proportions::strength(rec, f_y, f_y_path)?;
    proportions::web(rec, section)?;
    let p = Pressed::of(rec, section, pressed)?;
    let r_h = web::hybrid_factor(rec);
    let e = material::steel_modulus(rec);
    let limit = noncomposite_limit(rec, r_h, f_y);
    let k = bend_buckling_coefficient(rec, p.d_c, section.plates.web_depth);
    let f_crw = bend_buckling(rec, e, k, section.plates.web_depth, section.plates.t_w, r_h, f_y, f_y);
    let compression = with_bend_buckling(rec, limit, f_crw);
    Ok(match pressed {
        Edge::Top => Limits { top: compression, bottom: limit },
        Edge::Bottom => Limits { top: limit, bottom: compression },
    })
}

/// Limits for a composite section in positive moment.
///
/// # Errors
/// When the section lies outside the formulas.
pub fn composite<R: Recorder>(
    rec: &mut R,
    section: &Effective,
    f_y: Val<Stress>,
    f_y_path: &str,
) -> Result<Limits, Problem> {
    rec.heading("Service II, composite");
    proportions::strength(rec, f_y, f_y_path)?;
    let ratio = proportions::web(rec, section)?;
    web_spared(rec, ratio);
    let r_h = web::hybrid_factor(rec);
    let limit = composite_limit(rec, r_h, f_y);
    Ok(Limits { top: limit, bottom: limit })
}
