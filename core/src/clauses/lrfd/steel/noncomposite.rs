//! Nominal flexural resistance of a girder without a slab that works with it: appendix A6 where it
//! may be used, 6.10.8 elsewhere.

use super::flange::{Hold, Pressed};
use super::lateral::{self, Torsion};
use super::web::{self, WebClass};
use super::{local, material, proportions};
use crate::problem::Problem;
use crate::quantity::{Angle, Inertia, Length, Modulus, Moment, Stress};
use crate::section::effective::{Edge, Effective};
use crate::units::mark::{Deg, In3, In4, KipIn, Ksi, One};
use crate::worksheet::{Recorder, Val};
use crate::{clause, condition};

/// What the flexural resistance hangs on.
#[derive(Clone, Debug)]
pub struct FlexureCase<'a> {
    /// The steel at the station.
    pub section: &'a Effective<'a>,
    /// Yield strength, of flanges and web alike.
    pub f_y: Val<Stress>,
    /// Path of the yield strength, for messages.
    pub f_y_path: &'a str,
    /// The edge in compression: the top in positive moment.
    pub pressed: Edge,
    /// What holds that flange.
    pub hold: &'a Hold,
    /// Moment gradient modifier; 1.0 is safe.
    pub c_b: Val<f64>,
    /// Whether torsional stiffness counts.
    pub torsion: Torsion,
    /// Skew of the supports.
    pub skew: Val<Angle>,
}

condition! {
    /// Where appendix A6 may be used: straight girders with supports skewed at most 20 degrees, flanges
    /// up to 70 ksi and not too unlike.
    pub fn appendix_may_be_used(F_y: Stress [Ksi], I_yc: Inertia [In4], I_yt: Inertia [In4], skew: Angle [Deg])
    { F_y <= 70.0 && I_yc >= 0.3 * I_yt && skew <= 20.0 }
    cite "AASHTO LRFD 9th ed. 6.10.6.2.3 (6.10.6.2.3-2), A6.1, from memory"
    yes "appendix A6 may be used unless the web is slender" no "6.10.8: no more than first yield"
}

clause! {
    /// Moment of the tension flange, kip in, by appendix A6.
    pub fn tension_moment(R_pt: f64 [One], M_yt: Moment [KipIn]) -> M_nt: Moment [KipIn] { R_pt * M_yt }
    cite "AASHTO LRFD 9th ed. A6.4 (A6.4-1), from memory" what "moment of the tension flange"
}

clause! {
    /// Moment of the compression flange, kip in, by 6.10.8.
    pub fn compression_moment_of_stress(F_nc: Stress [Ksi], S_xc: Modulus [In3]) -> M_nc: Moment [KipIn]
    { F_nc * S_xc }
    cite "AASHTO LRFD 9th ed. 6.10.8.1.1" what "moment of the compression flange"
}

clause! {
    /// Moment of the tension flange, kip in, by 6.10.8.
    pub fn tension_moment_of_stress(R_h: f64 [One], F_yt: Stress [Ksi], S_xt: Modulus [In3])
    -> M_nt: Moment [KipIn] { R_h * F_yt * S_xt }
    cite "AASHTO LRFD 9th ed. 6.10.8.3 (6.10.8.3-1), from memory" what "moment of the tension flange"
}

clause! {
    /// The lesser of the two ways in which the compression flange buckles, kip in.
    pub fn lesser_buckling(M_FLB: Moment [KipIn], M_LTB: Moment [KipIn]) -> M_nc: Moment [KipIn]
    { min(M_FLB, M_LTB) }
    cite "AASHTO LRFD 9th ed. A6.3.1, 6.10.8.2.1" what "moment of the compression flange"
}

clause! {
    /// Nominal flexural resistance, kip in.
    pub fn nominal(M_nc: Moment [KipIn], M_nt: Moment [KipIn]) -> M_n: Moment [KipIn] { min(M_nc, M_nt) }
    cite "AASHTO LRFD 9th ed. A6.1.1, A6.1.2, 6.10.8.1" what "nominal flexural resistance"
}

/// Nominal flexural resistance, in the sense of the edge named as pressed; positive.
///
/// A flange held along its length does not buckle. Where its bracing is not known there is no number.
///
/// # Errors
/// When the unbraced length is not known, or when the section lies outside the formulas.
pub fn nominal_moment<R: Recorder>(rec: &mut R, case: &FlexureCase) -> Result<Val<Moment>, Problem> {
    rec.heading("Flexural resistance, slab not counted");
    if let Hold::NotKnown(path) = case.hold {
        return Err(Problem::missing(
            path.clone(),
            "the distance between diaphragms is not known and the top flange is not known to be embedded",
            "measure the distance between diaphragms that work, or look whether the flange is embedded",
        ));
    }
    proportions::strength(rec, case.f_y, case.f_y_path)?;
    let pressed = Pressed::of(rec, case.section, case.pressed)?;
    let flanges = proportions::flexure(rec, case.section, &pressed)?;
    let e = material::steel_modulus(rec);
    let r_h = web::hybrid_factor(rec);
    let class = WebClass::of(rec, &pressed, case.section.plates.t_w, e, case.f_y);
    let work = Work { case, pressed, class, lambda_f: flanges.slenderness, e, r_h };
    if appendix_may_be_used(rec, case.f_y, flanges.i_yc, flanges.i_yt, case.skew) && class.not_slender {
        Ok(work.by_appendix(rec))
    } else {
        Ok(work.by_stress(rec))
    }
}

/// What both ways need.
struct Work<'a> {
    case: &'a FlexureCase<'a>,
    pressed: Pressed<'a>,
    class: WebClass,
    lambda_f: Val<f64>,
    e: Val<Stress>,
    r_h: Val<f64>,
}

impl Work<'_> {
    /// Appendix A6.
    fn by_appendix<R: Recorder>(&self, rec: &mut R) -> Val<Moment> {
        let (section, p, f_y) = (self.case.section, &self.pressed, self.case.f_y);
        let t_w = section.plates.t_w;
        let m_p = web::plastic_moment(rec, f_y, section.left.plastic);
        let m_yc = web::yield_compression(rec, f_y, p.s_xc);
        let m_yt = web::yield_tension(rec, f_y, p.s_xt);
        let m_y = web::first_yield(rec, m_yc, m_yt);
        let lambda_rw = self.class.lambda_rw;
        let lambda_pw = web::compact_limit(rec, self.e, f_y, m_p, self.r_h, m_y, lambda_rw, p.d_cp, p.d_c);
        let lambda_wp = web::web_slenderness_plastic(rec, p.d_cp, t_w);
        let (r_pc, r_pt) = if web::web_compact(rec, lambda_wp, lambda_pw) {
            (web::plastification_compression(rec, m_p, m_yc), web::plastification_tension(rec, m_p, m_yt))
        } else {
            let limit = web::compact_limit_elastic(rec, lambda_pw, p.d_c, p.d_cp, lambda_rw);
            let lambda_w = self.class.lambda_w;
            (
                web::plastification_compression_noncompact(
                    rec, self.r_h, m_yc, m_p, lambda_w, limit, lambda_rw,
                ),
                web::plastification_tension_noncompact(rec, self.r_h, m_yt, m_p, lambda_w, limit, lambda_rw),
            )
        };
        let m_nt = tension_moment(rec, r_pt, m_yt);
        let m_nc = match self.case.hold {
            Hold::At(l_b) => {
                let f_yr = local::onset_of_yield(rec, f_y, self.r_h, f_y, p.s_xt, p.s_xc, f_y);
                let flb = self.local_moment(rec, r_pc, m_yc, f_yr);
                let ltb = self.lateral_moment(rec, *l_b, r_pc, m_yc, f_yr);
                lesser_buckling(rec, flb, ltb)
            }
            Hold::Continuous | Hold::NotKnown(_) => local::full_moment(rec, r_pc, m_yc),
        };
        nominal(rec, m_nc, m_nt)
    }

    fn local_moment<R: Recorder>(
        &self,
        rec: &mut R,
        r_pc: Val<f64>,
        m_yc: Val<Moment>,
        f_yr: Val<Stress>,
    ) -> Val<Moment> {
        let section = self.case.section;
        let lambda_pf = local::compact_limit(rec, self.e, self.case.f_y);
        if local::flange_compact(rec, self.lambda_f, lambda_pf) {
            return local::full_moment(rec, r_pc, m_yc);
        }
        let plates = &section.plates;
        let k_c = local::coefficient(rec, section.is_rolled(), plates.web_depth, plates.t_w);
        let lambda_rf = local::noncompact_limit(rec, self.e, k_c, f_yr);
        local::buckling_moment(rec, f_yr, self.pressed.s_xc, r_pc, m_yc, self.lambda_f, lambda_pf, lambda_rf)
    }

    fn lateral_moment<R: Recorder>(
        &self,
        rec: &mut R,
        l_b: Val<Length>,
        r_pc: Val<f64>,
        m_yc: Val<Moment>,
        f_yr: Val<Stress>,
    ) -> Val<Moment> {
        let (p, e, c_b) = (&self.pressed, self.e, self.case.c_b);
        let plates = &self.case.section.plates;
        let r_t = lateral::radius(rec, p.b_fc, p.d_c, plates.t_w, p.t_fc);
        let l_p = lateral::full_length(rec, r_t, e, self.case.f_y);
        let (j, l_r) = match self.case.torsion {
            Torsion::Counted => {
                let j = lateral::torsion_constant(
                    rec,
                    plates.web_depth,
                    plates.t_w,
                    p.b_fc,
                    p.t_fc,
                    p.b_ft,
                    p.t_ft,
                );
                (Some(j), lateral::elastic_length(rec, r_t, e, f_yr, j, p.s_xc, p.h))
            }
            Torsion::Neglected => (None, lateral::elastic_length_plain(rec, r_t, e, f_yr)),
        };
        if lateral::short(rec, l_b, l_p) {
            return local::full_moment(rec, r_pc, m_yc);
        }
        if lateral::medium(rec, l_b, l_r) {
            return lateral::inelastic_moment(rec, c_b, f_yr, p.s_xc, r_pc, m_yc, l_b, l_p, l_r);
        }
        let f_cr = match j {
            Some(j) => lateral::elastic_stress(rec, c_b, e, l_b, r_t, j, p.s_xc, p.h),
            None => {
                let r_b = no_shedding(rec);
                lateral::elastic_stress_plain(rec, c_b, r_b, e, l_b, r_t)
            }
        };
        lateral::elastic_moment(rec, f_cr, p.s_xc, r_pc, m_yc)
    }

    /// 6.10.8, stresses; the moments are those stresses times the elastic moduli.
    fn by_stress<R: Recorder>(&self, rec: &mut R) -> Val<Moment> {
        let (p, f_y, r_h) = (&self.pressed, self.case.f_y, self.r_h);
        let r_b = if self.class.not_slender {
            no_shedding(rec)
        } else {
            let t_w = self.case.section.plates.t_w;
            web::load_shedding(rec, self.class.a_wc, p.d_c, t_w, self.class.lambda_rw)
        };
        let m_nt = tension_moment_of_stress(rec, r_h, f_y, p.s_xt);
        let m_nc = match self.case.hold {
            Hold::At(l_b) => {
                let f_yr = local::onset_of_yield_slender(rec, f_y, f_y);
                let flb = self.local_stress(rec, r_b, f_yr);
                let ltb = self.lateral_stress(rec, *l_b, r_b, f_yr);
                let flb = compression_moment_of_stress(rec, flb, p.s_xc);
                let ltb = compression_moment_of_stress(rec, ltb, p.s_xc);
                lesser_buckling(rec, flb, ltb)
            }
            Hold::Continuous | Hold::NotKnown(_) => {
                let f_nc = local::full_stress(rec, r_b, r_h, f_y);
                compression_moment_of_stress(rec, f_nc, p.s_xc)
            }
        };
        nominal(rec, m_nc, m_nt)
    }

    fn local_stress<R: Recorder>(&self, rec: &mut R, r_b: Val<f64>, f_yr: Val<Stress>) -> Val<Stress> {
        let f_y = self.case.f_y;
        let lambda_pf = local::compact_limit(rec, self.e, f_y);
        if local::flange_compact(rec, self.lambda_f, lambda_pf) {
            return local::full_stress(rec, r_b, self.r_h, f_y);
        }
        let lambda_rf = local::noncompact_limit_slender(rec, self.e, f_yr);
        local::buckling_stress(rec, f_yr, self.r_h, f_y, self.lambda_f, lambda_pf, lambda_rf, r_b)
    }

    fn lateral_stress<R: Recorder>(
        &self,
        rec: &mut R,
        l_b: Val<Length>,
        r_b: Val<f64>,
        f_yr: Val<Stress>,
    ) -> Val<Stress> {
        let (p, e, f_y, c_b) = (&self.pressed, self.e, self.case.f_y, self.case.c_b);
        let r_t = lateral::radius(rec, p.b_fc, p.d_c, self.case.section.plates.t_w, p.t_fc);
        let l_p = lateral::full_length(rec, r_t, e, f_y);
        let l_r = lateral::elastic_length_plain(rec, r_t, e, f_yr);
        if lateral::short(rec, l_b, l_p) {
            local::full_stress(rec, r_b, self.r_h, f_y)
        } else if lateral::medium(rec, l_b, l_r) {
            lateral::inelastic_stress(rec, c_b, f_yr, self.r_h, f_y, l_b, l_p, l_r, r_b)
        } else {
            let f_cr = lateral::elastic_stress_plain(rec, c_b, r_b, e, l_b, r_t);
            lateral::elastic_stress_capped(rec, f_cr, r_b, self.r_h, f_y)
        }
    }
}

/// `R_b` of a web that is not slender: 1.0.
fn no_shedding<R: Recorder>(rec: &mut R) -> Val<f64> {
    let cite = "AASHTO LRFD 9th ed. 6.10.1.10.2 (from memory)";
    rec.look_up("R_b", "web load-shedding factor", 1.0, One, cite, || "the web is not slender".to_owned())
}
