//! Shear of webs (6.10.9).

use super::{material, proportions};
use crate::bridge::Straightness;
use crate::problem::Problem;
use crate::quantity::{Force, Length, Stress};
use crate::section::effective::Effective;
use crate::units::mark::{Inch, Kip, Ksi, One};
use crate::worksheet::{Recorder, Val};
use crate::{clause, condition};

/// What stiffens the web.
#[derive(Clone, Copy, Debug)]
pub enum Panel {
    /// Nothing, or stiffeners too far apart to count.
    Unstiffened,
    /// Between transverse stiffeners this far apart, with another panel at either side.
    Interior(Val<Length>),
    /// Between the bearing and the first transverse stiffener, this far apart.
    End(Val<Length>),
}

/// What the shear resistance hangs on.
#[derive(Clone, Copy, Debug)]
pub struct ShearCase<'a> {
    /// The steel at the station.
    pub section: &'a Effective<'a>,
    /// Yield strength of the web.
    pub f_yw: Val<Stress>,
    /// Path of the yield strength, for messages.
    pub f_y_path: &'a str,
    /// What stiffens the web.
    pub panel: Panel,
    /// Whether the web is straight and whole here. A web that nobody looked at away from the bearings
    /// counts as whole, with a remark.
    pub web: Straightness,
    /// Path of the finding that tells so, for messages.
    pub web_path: &'a str,
}

clause! {
    /// Plastic shear, kip. W18x50 as plates (16.86 by 0.355, 50 ksi): 173.6 kip.
    pub fn plastic_shear(F_yw: Stress [Ksi], D: Length [Inch], t_w: Length [Inch]) -> V_p: Force [Kip]
    { 0.58 * F_yw * D * t_w }
    cite "AASHTO LRFD 9th ed. 6.10.9.2 (6.10.9.2-2), from memory" what "plastic shear"
}

clause! {
    /// Shear-buckling coefficient of a stiffened panel.
    pub fn panel_coefficient(d_0: Length [Inch], D: Length [Inch]) -> k: f64 [One]
    { 5.0 + 5.0 / pow(d_0 / D, 2.0) }
    cite "AASHTO LRFD 9th ed. 6.10.9.3.2 (6.10.9.3.2-7), from memory" what "shear-buckling coefficient"
}

condition! {
    /// Whether the web yields in shear before it buckles.
    pub fn yields(D: Length [Inch], t_w: Length [Inch], E: Stress [Ksi], k: f64 [One], F_yw: Stress [Ksi])
    { D / t_w <= 1.12 * sqrt(E * k / F_yw) }
    cite "AASHTO LRFD 9th ed. 6.10.9.3.2 (6.10.9.3.2-4), from memory"
    yes "the web yields in shear: C = 1.0" no "the web buckles in shear"
}

condition! {
    /// Whether the web buckles after some yielding.
    pub fn buckles_inelastic(
        D: Length [Inch], t_w: Length [Inch], E: Stress [Ksi], k: f64 [One], F_yw: Stress [Ksi],
    ) { D / t_w <= 1.40 * sqrt(E * k / F_yw) }
    cite "AASHTO LRFD 9th ed. 6.10.9.3.2 (6.10.9.3.2-5), from memory"
    yes "it buckles after some yielding" no "it buckles elastically"
}

clause! {
    /// Ratio of buckling to yielding, inelastic.
    pub fn ratio_inelastic(
        D: Length [Inch], t_w: Length [Inch], E: Stress [Ksi], k: f64 [One], F_yw: Stress [Ksi],
    ) -> C: f64 [One] { 1.12 / (D / t_w) * sqrt(E * k / F_yw) }
    cite "AASHTO LRFD 9th ed. 6.10.9.3.2 (6.10.9.3.2-5), from memory" what "shear buckling over shear yielding"
}

clause! {
    /// Ratio of buckling to yielding, elastic.
    pub fn ratio_elastic(
        D: Length [Inch], t_w: Length [Inch], E: Stress [Ksi], k: f64 [One], F_yw: Stress [Ksi],
    ) -> C: f64 [One] { 1.57 / pow(D / t_w, 2.0) * (E * k / F_yw) }
    cite "AASHTO LRFD 9th ed. 6.10.9.3.2 (6.10.9.3.2-6), from memory" what "shear buckling over shear yielding"
}

clause! {
    /// Nominal shear without tension field, kip: unstiffened webs and end panels.
    pub fn buckling_shear(C: f64 [One], V_p: Force [Kip]) -> V_n: Force [Kip] { C * V_p }
    cite "AASHTO LRFD 9th ed. 6.10.9.2 (6.10.9.2-1), 6.10.9.3.3 (6.10.9.3.3-1), from memory"
    what "nominal shear resistance"
}

condition! {
    /// Whether stiffeners this far apart count.
    pub fn stiffened(d_0: Length [Inch], D: Length [Inch]) { d_0 <= 3.0 * D }
    cite "AASHTO LRFD 9th ed. 6.10.9.1, from memory"
    yes "the panel is stiffened" no "the stiffeners are too far apart to count"
}

condition! {
    /// Whether an end panel counts as stiffened.
    pub fn end_stiffened(d_0: Length [Inch], D: Length [Inch]) { d_0 <= 1.5 * D }
    cite "AASHTO LRFD 9th ed. 6.10.9.3.3, from memory"
    yes "the end panel is stiffened" no "the first stiffener is too far from the bearing to count"
}

condition! {
    /// Whether the flanges can anchor the whole tension field.
    pub fn flanges_anchor(
        D: Length [Inch], t_w: Length [Inch], b_fc: Length [Inch], t_fc: Length [Inch],
        b_ft: Length [Inch], t_ft: Length [Inch],
    ) { 2.0 * D * t_w <= 2.5 * (b_fc * t_fc + b_ft * t_ft) }
    cite "AASHTO LRFD 9th ed. 6.10.9.3.2 (6.10.9.3.2-1), from memory"
    yes "the flanges anchor the tension field" no "the flanges anchor only part of the tension field"
}

clause! {
    /// Nominal shear with tension field, kip.
    pub fn tension_field(V_p: Force [Kip], C: f64 [One], d_0: Length [Inch], D: Length [Inch])
    -> V_n: Force [Kip] { V_p * (C + 0.87 * (1.0 - C) / sqrt(1.0 + pow(d_0 / D, 2.0))) }
    cite "AASHTO LRFD 9th ed. 6.10.9.3.2 (6.10.9.3.2-2), from memory" what "nominal shear resistance"
}

clause! {
    /// Nominal shear with part of the tension field, kip.
    pub fn tension_field_part(V_p: Force [Kip], C: f64 [One], d_0: Length [Inch], D: Length [Inch])
    -> V_n: Force [Kip] {
        V_p * (C + 0.87 * (1.0 - C) / (sqrt(1.0 + pow(d_0 / D, 2.0)) + d_0 / D))
    }
    cite "AASHTO LRFD 9th ed. 6.10.9.3.2 (6.10.9.3.2-8), from memory" what "nominal shear resistance"
}

/// Shear-buckling coefficient of an unstiffened web: 5.0.
fn plain_coefficient<R: Recorder>(rec: &mut R) -> Val<f64> {
    let cite = "AASHTO LRFD 9th ed. 6.10.9.2 (from memory)";
    rec.look_up("k", "shear-buckling coefficient", 5.0, One, cite, || "unstiffened web".to_owned())
}

/// Buckling over yielding.
fn ratio<R: Recorder>(rec: &mut R, case: &ShearCase, e: Val<Stress>, k: Val<f64>) -> Val<f64> {
    let p = &case.section.plates;
    if yields(rec, p.web_depth, p.t_w, e, k, case.f_yw) {
        let cite = "AASHTO LRFD 9th ed. 6.10.9.3.2 (6.10.9.3.2-4), from memory";
        rec.look_up("C", "shear buckling over shear yielding", 1.0, One, cite, || {
            "the web yields in shear".to_owned()
        })
    } else if buckles_inelastic(rec, p.web_depth, p.t_w, e, k, case.f_yw) {
        ratio_inelastic(rec, p.web_depth, p.t_w, e, k, case.f_yw)
    } else {
        ratio_elastic(rec, p.web_depth, p.t_w, e, k, case.f_yw)
    }
}

/// Nominal shear resistance.
///
/// # Errors
/// When the web is out of plumb or holed, or outside the formulas.
pub fn nominal_shear<R: Recorder>(rec: &mut R, case: &ShearCase) -> Result<Val<Force>, Problem> {
    rec.heading("Shear resistance");
    match case.web {
        Straightness::Straight => {}
        Straightness::NotInspected => {
            rec.remark(|| {
                "Nobody looked whether the web is straight and whole here; it is taken so".to_owned()
            });
        }
        Straightness::Not => {
            return Err(Problem::error(
                case.web_path,
                "the web is out of plumb or holed: the shear formulas do not hold",
                "measure the deformation or the hole and have it studied, or enter a repair",
            ));
        }
    }
    proportions::strength(rec, case.f_yw, case.f_y_path)?;
    proportions::web(rec, case.section)?;
    let p = &case.section.plates;
    let e = material::steel_modulus(rec);
    let v_p = plastic_shear(rec, case.f_yw, p.web_depth, p.t_w);
    match case.panel {
        Panel::Interior(d_0) if stiffened(rec, d_0, p.web_depth) => {
            let k = panel_coefficient(rec, d_0, p.web_depth);
            let c = ratio(rec, case, e, k);
            let anchored = flanges_anchor(rec, p.web_depth, p.t_w, p.b_top, p.t_top, p.b_bottom, p.t_bottom);
            Ok(if anchored {
                tension_field(rec, v_p, c, d_0, p.web_depth)
            } else {
                tension_field_part(rec, v_p, c, d_0, p.web_depth)
            })
        }
        Panel::End(d_0) if end_stiffened(rec, d_0, p.web_depth) => {
            let k = panel_coefficient(rec, d_0, p.web_depth);
            let c = ratio(rec, case, e, k);
            Ok(buckling_shear(rec, c, v_p))
        }
        Panel::Unstiffened | Panel::Interior(_) | Panel::End(_) => {
            let k = plain_coefficient(rec);
            let c = ratio(rec, case, e, k);
            Ok(buckling_shear(rec, c, v_p))
        }
    }
}
