//! Flange local buckling (A6.3.2, 6.10.8.2.2).

use crate::quantity::{Length, Modulus, Moment, Stress};
use crate::units::mark::{In3, Inch, KipIn, Ksi, One};
use crate::worksheet::{Recorder, Val};
use crate::{clause, condition};

clause! {
    /// Limiting slenderness of a compact flange. 50 ksi: 9.15; 33 ksi: 11.26.
    pub fn compact_limit(E: Stress [Ksi], F_yc: Stress [Ksi]) -> lambda_pf: f64 [One] { 0.38 * sqrt(E / F_yc) }
    cite "AASHTO LRFD 9th ed. A6.3.2 (A6.3.2-4), 6.10.8.2.2 (6.10.8.2.2-4), from memory"
    what "limiting slenderness of a compact flange"
}

condition! {
    /// Whether the flange is compact.
    pub fn flange_compact(lambda_f: f64 [One], lambda_pf: f64 [One]) { lambda_f <= lambda_pf }
    cite "AASHTO LRFD 9th ed. A6.3.2, 6.10.8.2.2"
    yes "the flange is compact" no "the flange is noncompact: it buckles before the full moment"
}

clause! {
    /// Flange local buckling coefficient of welded plates, 0.35 to 0.76.
    pub fn buckling_coefficient(D: Length [Inch], t_w: Length [Inch]) -> k_c: f64 [One]
    { min(max(4.0 / sqrt(D / t_w), 0.35), 0.76) }
    cite "AASHTO LRFD 9th ed. A6.3.2 (A6.3.2-6), from memory" what "flange local buckling coefficient"
}

clause! {
    /// Stress at which the flange begins to yield, with residual stress, ksi, by appendix A6.
    pub fn onset_of_yield(
        F_yc: Stress [Ksi], R_h: f64 [One], F_yt: Stress [Ksi], S_xt: Modulus [In3], S_xc: Modulus [In3],
        F_yw: Stress [Ksi],
    ) -> F_yr: Stress [Ksi] {
        max(min(min(0.7 * F_yc, R_h * F_yt * S_xt / S_xc), F_yw), 0.5 * F_yc)
    }
    cite "AASHTO LRFD 9th ed. A6.3.2, A6.3.3, from memory"
    what "stress at the onset of yielding with residual stress"
}

clause! {
    /// The same by 6.10.8, ksi.
    pub fn onset_of_yield_slender(F_yc: Stress [Ksi], F_yw: Stress [Ksi]) -> F_yr: Stress [Ksi]
    { max(min(0.7 * F_yc, F_yw), 0.5 * F_yc) }
    cite "AASHTO LRFD 9th ed. 6.10.8.2.2, from memory"
    what "stress at the onset of yielding with residual stress"
}

clause! {
    /// Limiting slenderness of a noncompact flange, appendix A6.
    pub fn noncompact_limit(E: Stress [Ksi], k_c: f64 [One], F_yr: Stress [Ksi]) -> lambda_rf: f64 [One]
    { 0.95 * sqrt(E * k_c / F_yr) }
    cite "AASHTO LRFD 9th ed. A6.3.2 (A6.3.2-5), from memory" what "limiting slenderness of a noncompact flange"
}

clause! {
    /// Limiting slenderness of a noncompact flange, 6.10.8.
    pub fn noncompact_limit_slender(E: Stress [Ksi], F_yr: Stress [Ksi]) -> lambda_rf: f64 [One]
    { 0.56 * sqrt(E / F_yr) }
    cite "AASHTO LRFD 9th ed. 6.10.8.2.2 (6.10.8.2.2-5), from memory"
    what "limiting slenderness of a noncompact flange"
}

clause! {
    /// The compression flange's full moment, kip in.
    pub fn full_moment(R_pc: f64 [One], M_yc: Moment [KipIn]) -> M_nc: Moment [KipIn] { R_pc * M_yc }
    cite "AASHTO LRFD 9th ed. A6.1.3 (A6.1.3-1), A6.3.2 (A6.3.2-1), A6.3.3 (A6.3.3-1), from memory"
    what "moment of the compression flange, no buckling"
}

clause! {
    /// Moment with the noncompact flange buckling, kip in: a straight line from the full moment at
    /// `lambda_pf` to `F_yr S_xc` at `lambda_rf`.
    pub fn buckling_moment(
        F_yr: Stress [Ksi], S_xc: Modulus [In3], R_pc: f64 [One], M_yc: Moment [KipIn],
        lambda_f: f64 [One], lambda_pf: f64 [One], lambda_rf: f64 [One],
    ) -> M_nc: Moment [KipIn] {
        (1.0 - (1.0 - F_yr * S_xc / (R_pc * M_yc)) * (lambda_f - lambda_pf) / (lambda_rf - lambda_pf))
            * R_pc * M_yc
    }
    cite "AASHTO LRFD 9th ed. A6.3.2 (A6.3.2-2), from memory" what "moment by flange local buckling"
}

clause! {
    /// The compression flange's full stress where the web is slender, ksi.
    pub fn full_stress(R_b: f64 [One], R_h: f64 [One], F_yc: Stress [Ksi]) -> F_nc: Stress [Ksi]
    { R_b * R_h * F_yc }
    cite "AASHTO LRFD 9th ed. 6.10.8.2.2 (6.10.8.2.2-1), 6.10.8.2.3 (6.10.8.2.3-1), from memory"
    what "stress of the compression flange, no buckling"
}

clause! {
    /// Stress at which the noncompact flange buckles where the web is slender, ksi.
    pub fn buckling_stress(
        F_yr: Stress [Ksi], R_h: f64 [One], F_yc: Stress [Ksi], lambda_f: f64 [One], lambda_pf: f64 [One],
        lambda_rf: f64 [One], R_b: f64 [One],
    ) -> F_nc: Stress [Ksi] {
        (1.0 - (1.0 - F_yr / (R_h * F_yc)) * (lambda_f - lambda_pf) / (lambda_rf - lambda_pf))
            * R_b * R_h * F_yc
    }
    cite "AASHTO LRFD 9th ed. 6.10.8.2.2 (6.10.8.2.2-2), from memory" what "stress by flange local buckling"
}

/// Flange local buckling coefficient: of rolled shapes 0.76.
pub fn coefficient<R: Recorder>(rec: &mut R, rolled: bool, depth: Val<Length>, t_w: Val<Length>) -> Val<f64> {
    if rolled {
        let cite = "AASHTO LRFD 9th ed. A6.3.2 (from memory)";
        rec.look_up("k_c", "flange local buckling coefficient", 0.76, One, cite, || {
            "rolled shapes".to_owned()
        })
    } else {
        buckling_coefficient(rec, depth, t_w)
    }
}
