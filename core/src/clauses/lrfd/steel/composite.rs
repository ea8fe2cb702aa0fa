//! Nominal flexural resistance of a composite section in positive moment (6.10.7, D6).

use super::{material, proportions, web};
use crate::problem::Problem;
use crate::quantity::{Force, Inertia, Length, Moment, Stress};
use crate::resistance::plastic::{Forces, Plastic, plastic, yield_force};
use crate::section::composite::{Composite, bare_stress, composite_stress};
use crate::units::mark::{In4, Inch, Kip, KipIn, Ksi, One};
use crate::worksheet::{Recorder, Val};
use crate::{clause, condition};

/// What the flexural resistance hangs on.
#[derive(Clone, Copy, Debug)]
pub struct CompositeCase<'a> {
    /// The composite section at the station.
    pub section: &'a Composite<'a>,
    /// Yield strength, of flanges and web alike.
    pub f_y: Val<Stress>,
    /// Path of the yield strength, for messages.
    pub f_y_path: &'a str,
    /// Whether the span is part of a continuous girder.
    pub continuous: bool,
    /// Factored moment of dead load on the bare steel.
    pub m_d1: Val<Moment>,
    /// Factored moment of dead load on the long-term composite section.
    pub m_d2: Val<Moment>,
}

clause! {
    /// Force of the slab crushed throughout, kip. 3 ksi, 88 in by 7.25 in: 1,627 kip.
    pub fn slab_force(f_c: Stress [Ksi], b_e: Length [Inch], t_s: Length [Inch]) -> P_s: Force [Kip]
    { 0.85 * f_c * b_e * t_s }
    cite "AASHTO LRFD 9th ed. D6.1 (table D6.1-1)" what "force of the slab, crushed throughout"
}

condition! {
    /// Whether the steel's strength allows the plastic moment.
    pub fn strength_compact(F_y: Stress [Ksi]) { F_y <= 70.0 }
    cite "AASHTO LRFD 9th ed. 6.10.6.2.2, from memory"
    yes "the steel may reach the plastic moment" no "steel above 70 ksi: no more than first yield"
}

condition! {
    /// Whether the web is compact.
    pub fn web_compact(D_cp: Length [Inch], t_w: Length [Inch], E: Stress [Ksi], F_yc: Stress [Ksi])
    { 2.0 * D_cp / t_w <= 3.76 * sqrt(E / F_yc) }
    cite "AASHTO LRFD 9th ed. 6.10.6.2.2 (6.10.6.2.2-1), from memory"
    yes "the section is compact" no "the section is noncompact: no more than first yield"
}

condition! {
    /// Whether the steel yields well before the slab is crushed.
    pub fn ductile(D_p: Length [Inch], D_t: Length [Inch]) { D_p <= 0.42 * D_t }
    cite "AASHTO LRFD 9th ed. 6.10.7.3 (6.10.7.3-1), from memory"
    yes "the section is ductile enough" no "the slab would be crushed before the steel has yielded enough"
}

condition! {
    /// Whether the plastic moment is reached in full.
    pub fn axis_high(D_p: Length [Inch], D_t: Length [Inch]) { D_p <= 0.1 * D_t }
    cite "AASHTO LRFD 9th ed. 6.10.7.1.2 (6.10.7.1.2-1), from memory"
    yes "the plastic moment is reached in full" no "the plastic moment is not reached in full"
}

clause! {
    /// Resistance with the plastic neutral axis at a tenth of the depth or higher, kip in.
    pub fn full(M_p: Moment [KipIn]) -> M_n: Moment [KipIn] { M_p }
    cite "AASHTO LRFD 9th ed. 6.10.7.1.2 (6.10.7.1.2-1), from memory" what "nominal flexural resistance"
}

clause! {
    /// Resistance with the plastic neutral axis lower than a tenth of the depth, kip in. `D_p / D_t` of
    /// 0.176: 0.947 of the plastic moment.
    pub fn reduced(M_p: Moment [KipIn], D_p: Length [Inch], D_t: Length [Inch]) -> M_n: Moment [KipIn]
    { M_p * (1.07 - 0.7 * D_p / D_t) }
    cite "AASHTO LRFD 9th ed. 6.10.7.1.2 (6.10.7.1.2-2), from memory" what "nominal flexural resistance"
}

clause! {
    /// Cap in continuous girders, kip in: beyond it, moments would shift to the piers.
    pub fn capped(M_n: Moment [KipIn], R_h: f64 [One], M_y: Moment [KipIn]) -> M_nc: Moment [KipIn]
    { min(M_n, 1.3 * R_h * M_y) }
    cite "AASHTO LRFD 9th ed. 6.10.7.1.2 (6.10.7.1.2-3), from memory"
    what "nominal flexural resistance, continuous girder"
}

clause! {
    /// Stress that a flange of a noncompact section may reach, ksi; `R_b` is 1.0 in positive moment.
    pub fn flange_stress(R_b: f64 [One], R_h: f64 [One], F_y: Stress [Ksi]) -> F_n: Stress [Ksi]
    { R_b * R_h * F_y }
    cite "AASHTO LRFD 9th ed. 6.10.7.2.2 (6.10.7.2.2-1, -2), from memory" what "nominal stress of a flange"
}

clause! {
    /// Stress that the concrete may reach with a noncompact section, ksi.
    pub fn concrete_stress(f_c: Stress [Ksi]) -> f_deck: Stress [Ksi] { 0.6 * f_c }
    cite "AASHTO LRFD 9th ed. 6.10.7.2.1, from memory" what "greatest stress of the concrete deck"
}

condition! {
    /// Whether the top flange is pressed by load on the short-term section.
    pub fn top_pressed(c_top: Length [Inch]) { c_top > 0.0 }
    cite "mechanics" yes "the top flange is below the top of what is pressed: it counts"
    no "the neutral axis lies above the top flange: live load does not press it"
}

clause! {
    /// Moment on the short-term section that brings a flange to a stress, kip in.
    pub fn additional_moment(
        F: Stress [Ksi], f_1: Stress [Ksi], f_2: Stress [Ksi], I: Inertia [In4], c: Length [Inch],
    ) -> M_AD: Moment [KipIn] { (F - f_1 - f_2) * I / c }
    cite "AASHTO LRFD 9th ed. D6.2.2 (D6.2.2-1)" what "additional moment until the flange is at its stress"
}

clause! {
    /// Moment on the short-term section that brings the concrete to a stress, kip in, less what came
    /// after the slab had hardened.
    pub fn additional_moment_concrete(
        f_deck: Stress [Ksi], n: f64 [One], I: Inertia [In4], c_slab: Length [Inch], M_D2: Moment [KipIn],
    ) -> M_AD: Moment [KipIn] { f_deck * n * I / c_slab - M_D2 }
    cite "AASHTO LRFD 9th ed. 6.10.1.1.1d, 6.10.7.2.1" what "additional moment until the concrete is at its stress"
}

clause! {
    /// The lesser of two moments, kip in.
    pub fn lesser(M_1: Moment [KipIn], M_2: Moment [KipIn]) -> M: Moment [KipIn] { min(M_1, M_2) }
    cite "AASHTO LRFD 9th ed. D6.2.2" what "the lesser"
}

/// Forces of table D6.1-1 from the plates and the slab.
pub fn forces<R: Recorder>(rec: &mut R, section: &Composite, f_y: Val<Stress>) -> Forces {
    let p = &section.steel.plates;
    Forces {
        p_s: slab_force(rec, section.slab.f_c, section.slab.b_e, section.slab.t_s),
        t_s: section.slab.t_s,
        gap: section.gap,
        p_c: yield_force(rec, f_y, p.top),
        t_c: p.t_top,
        p_w: yield_force(rec, f_y, p.web),
        web_depth: p.web_depth,
        p_t: yield_force(rec, f_y, p.bottom),
        t_t: p.t_bottom,
    }
}

/// Yield moment by stages (D6.2.2), or the moment at which a flange reaches another stress `limit`:
/// both flanges are looked at and the lesser counts.
pub fn yield_moment<R: Recorder>(rec: &mut R, case: &CompositeCase, limit: Val<Stress>) -> Val<Moment> {
    let s = case.section;
    let f_1 = bare_stress(rec, case.m_d1, s.steel.left.s_bottom);
    let f_2 = composite_stress(rec, case.m_d2, s.long.y, s.long.inertia);
    let mut more = additional_moment(rec, limit, f_1, f_2, s.short.inertia, s.short.y);
    if top_pressed(rec, s.short.to_top) {
        let f_1 = bare_stress(rec, case.m_d1, s.steel.left.s_top);
        let f_2 = composite_stress(rec, case.m_d2, s.long.to_top, s.long.inertia);
        let top = additional_moment(rec, limit, f_1, f_2, s.short.inertia, s.short.to_top);
        more = lesser(rec, more, top);
    }
    stages_sum(rec, case, more, "moment at which a flange reaches its stress")
}

fn stages_sum<R: Recorder>(rec: &mut R, case: &CompositeCase, more: Val<Moment>, what: &str) -> Val<Moment> {
    let rows = [("on bare steel", case.m_d1), ("long-term", case.m_d2), ("additional", more)];
    rec.sum("M_y", what, &rows, KipIn)
}

/// Nominal flexural resistance in positive moment, slab in compression.
///
/// For a noncompact section it is the moment, dead load having acted by stages, at which a flange or
/// the concrete reaches its stress.
///
/// # Errors
/// When the section lies outside the formulas or is not ductile enough.
pub fn nominal_moment<R: Recorder>(rec: &mut R, case: &CompositeCase) -> Result<Val<Moment>, Problem> {
    rec.heading("Flexural resistance, composite, positive moment");
    let section = case.section;
    proportions::strength(rec, case.f_y, case.f_y_path)?;
    proportions::web(rec, section.steel)?;
    let e = material::steel_modulus(rec);
    let r_h = web::hybrid_factor(rec);
    let forces = forces(rec, section, case.f_y);
    let p = plastic(rec, &forces, section.slab.path)?;
    if !ductile(rec, p.d_p, section.total_depth) {
        return Err(Problem::error(
            section.slab.path,
            "the plastic neutral axis lies deeper than 0.42 of the depth: the slab is too weak to count on",
            "check slab thickness and strength; rated without the slab it may do",
        ));
    }
    let compact =
        strength_compact(rec, case.f_y) && web_compact(rec, p.d_cp, section.steel.plates.t_w, e, case.f_y);
    if compact { Ok(compact_moment(rec, case, &p, r_h)) } else { Ok(noncompact_moment(rec, case, r_h)) }
}

fn compact_moment<R: Recorder>(rec: &mut R, case: &CompositeCase, p: &Plastic, r_h: Val<f64>) -> Val<Moment> {
    let depth = case.section.total_depth;
    let m_n =
        if axis_high(rec, p.d_p, depth) { full(rec, p.moment) } else { reduced(rec, p.moment, p.d_p, depth) };
    if case.continuous {
        let m_y = yield_moment(rec, case, case.f_y);
        capped(rec, m_n, r_h, m_y)
    } else {
        m_n
    }
}

fn noncompact_moment<R: Recorder>(rec: &mut R, case: &CompositeCase, r_h: Val<f64>) -> Val<Moment> {
    let cite = "AASHTO LRFD 9th ed. 6.10.1.10.2 (from memory)";
    let r_b = rec.look_up("R_b", "web load-shedding factor", 1.0, One, cite, || {
        "composite in positive moment, D / t_w up to 150".to_owned()
    });
    let f_n = flange_stress(rec, r_b, r_h, case.f_y);
    let steel = yield_moment(rec, case, f_n);
    let s = case.section;
    let f_deck = concrete_stress(rec, s.slab.f_c);
    let more =
        additional_moment_concrete(rec, f_deck, s.short.n, s.short.inertia, s.short.to_slab, case.m_d2);
    let concrete = stages_sum(rec, case, more, "moment at which the concrete reaches its stress");
    lesser(rec, steel, concrete)
}
