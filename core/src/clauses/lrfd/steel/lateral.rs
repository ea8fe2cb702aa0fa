//! Lateral-torsional buckling (A6.3.3, 6.10.8.2.3).

use crate::quantity::{Inertia, Length, Modulus, Moment, Stress};
use crate::units::mark::{In3, In4, Inch, KipIn, Ksi, One};
use crate::{clause, condition};

/// Whether the section's own torsional stiffness is counted against buckling.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Torsion {
    /// St. Venant torsion counts, as appendix A6 has it.
    Counted,
    /// It is taken as nothing, which is safe: what is left is the buckling of the flange alone, as in
    /// 6.10.8.2.3, with the plastification of appendix A6.
    Neglected,
}

clause! {
    /// Effective radius of gyration of the compression flange with a third of its web, in.
    /// W18x50 (7.5 by 0.57, D_c 8.43, t_w 0.355): 1.95 in.
    pub fn radius(b_fc: Length [Inch], D_c: Length [Inch], t_w: Length [Inch], t_fc: Length [Inch])
    -> r_t: Length [Inch] { b_fc / sqrt(12.0 * (1.0 + D_c * t_w / (3.0 * b_fc * t_fc))) }
    cite "AASHTO LRFD 9th ed. A6.3.3 (A6.3.3-10), 6.10.8.2.3 (6.10.8.2.3-9), from memory"
    what "effective radius of gyration for lateral-torsional buckling"
}

clause! {
    /// Unbraced length up to which the full moment is reached, in.
    pub fn full_length(r_t: Length [Inch], E: Stress [Ksi], F_yc: Stress [Ksi]) -> L_p: Length [Inch]
    { 1.0 * r_t * sqrt(E / F_yc) }
    cite "AASHTO LRFD 9th ed. A6.3.3 (A6.3.3-4), 6.10.8.2.3 (6.10.8.2.3-4), from memory"
    what "unbraced length up to which the full moment is reached"
}

clause! {
    /// St. Venant torsion constant of the plates, in4; fillets add to it. W18x50: 1.13 in4, where the
    /// table with its fillets says 1.24.
    pub fn torsion_constant(
        D: Length [Inch], t_w: Length [Inch], b_fc: Length [Inch], t_fc: Length [Inch],
        b_ft: Length [Inch], t_ft: Length [Inch],
    ) -> J: Inertia [In4] {
        D * pow(t_w, 3.0) / 3.0 + b_fc * pow(t_fc, 3.0) / 3.0 * (1.0 - 0.63 * t_fc / b_fc)
            + b_ft * pow(t_ft, 3.0) / 3.0 * (1.0 - 0.63 * t_ft / b_ft)
    }
    cite "AASHTO LRFD 9th ed. A6.3.3 (A6.3.3-9), from memory" what "St. Venant torsion constant"
}

clause! {
    /// Unbraced length from which buckling is elastic, in, with torsion. W18x50 with `F_yr` 35 ksi, `J`
    /// 1.24, `S_xc` 88.9, `h` 17.4 and `r_t` 1.98: 203 in.
    pub fn elastic_length(
        r_t: Length [Inch], E: Stress [Ksi], F_yr: Stress [Ksi], J: Inertia [In4], S_xc: Modulus [In3],
        h: Length [Inch],
    ) -> L_r: Length [Inch] {
        1.95 * r_t * E / F_yr * sqrt(J / (S_xc * h))
            * sqrt(1.0 + sqrt(1.0 + 6.76 * pow(F_yr * S_xc * h / (E * J), 2.0)))
    }
    cite "AASHTO LRFD 9th ed. A6.3.3 (A6.3.3-5), from memory"
    what "unbraced length from which buckling is elastic"
}

clause! {
    /// The same without torsion, in: what (A6.3.3-5) tends to as `J` vanishes (there 1.95 sqrt(2.6) =
    /// 3.144 stands for pi).
    pub fn elastic_length_plain(r_t: Length [Inch], E: Stress [Ksi], F_yr: Stress [Ksi])
    -> L_r: Length [Inch] { PI * r_t * sqrt(E / F_yr) }
    cite "AASHTO LRFD 9th ed. 6.10.8.2.3 (6.10.8.2.3-5), from memory"
    what "unbraced length from which buckling is elastic"
}

condition! {
    /// Whether the brace is near enough for the full moment.
    pub fn short(L_b: Length [Inch], L_p: Length [Inch]) { L_b <= L_p }
    cite "AASHTO LRFD 9th ed. A6.3.3, 6.10.8.2.3"
    yes "braced closely: the full moment" no "not braced closely enough for the full moment"
}

condition! {
    /// Whether buckling is inelastic.
    pub fn medium(L_b: Length [Inch], L_r: Length [Inch]) { L_b <= L_r }
    cite "AASHTO LRFD 9th ed. A6.3.3, 6.10.8.2.3"
    yes "buckling after some yielding: straight line" no "elastic buckling"
}

clause! {
    /// Moment by inelastic buckling, kip in.
    pub fn inelastic_moment(
        C_b: f64 [One], F_yr: Stress [Ksi], S_xc: Modulus [In3], R_pc: f64 [One], M_yc: Moment [KipIn],
        L_b: Length [Inch], L_p: Length [Inch], L_r: Length [Inch],
    ) -> M_nc: Moment [KipIn] {
        min(C_b * (1.0 - (1.0 - F_yr * S_xc / (R_pc * M_yc)) * (L_b - L_p) / (L_r - L_p)), 1.0)
            * R_pc * M_yc
    }
    cite "AASHTO LRFD 9th ed. A6.3.3 (A6.3.3-2), from memory" what "moment by lateral-torsional buckling"
}

clause! {
    /// Elastic buckling stress with torsion, ksi.
    pub fn elastic_stress(
        C_b: f64 [One], E: Stress [Ksi], L_b: Length [Inch], r_t: Length [Inch], J: Inertia [In4],
        S_xc: Modulus [In3], h: Length [Inch],
    ) -> F_cr: Stress [Ksi] {
        C_b * pow(PI, 2.0) * E / pow(L_b / r_t, 2.0)
            * sqrt(1.0 + 0.078 * J / (S_xc * h) * pow(L_b / r_t, 2.0))
    }
    cite "AASHTO LRFD 9th ed. A6.3.3 (A6.3.3-8), from memory" what "elastic lateral-torsional buckling stress"
}

clause! {
    /// Elastic buckling stress without torsion, ksi; `R_b` is 1 unless the web is slender.
    pub fn elastic_stress_plain(
        C_b: f64 [One], R_b: f64 [One], E: Stress [Ksi], L_b: Length [Inch], r_t: Length [Inch],
    ) -> F_cr: Stress [Ksi] { C_b * R_b * pow(PI, 2.0) * E / pow(L_b / r_t, 2.0) }
    cite "AASHTO LRFD 9th ed. 6.10.8.2.3 (6.10.8.2.3-8), from memory"
    what "elastic lateral-torsional buckling stress"
}

clause! {
    /// Moment by elastic buckling, kip in.
    pub fn elastic_moment(F_cr: Stress [Ksi], S_xc: Modulus [In3], R_pc: f64 [One], M_yc: Moment [KipIn])
    -> M_nc: Moment [KipIn] { min(F_cr * S_xc, R_pc * M_yc) }
    cite "AASHTO LRFD 9th ed. A6.3.3 (A6.3.3-3), from memory" what "moment by lateral-torsional buckling"
}

clause! {
    /// Stress by inelastic buckling where the web is slender, ksi.
    pub fn inelastic_stress(
        C_b: f64 [One], F_yr: Stress [Ksi], R_h: f64 [One], F_yc: Stress [Ksi], L_b: Length [Inch],
        L_p: Length [Inch], L_r: Length [Inch], R_b: f64 [One],
    ) -> F_nc: Stress [Ksi] {
        min(C_b * (1.0 - (1.0 - F_yr / (R_h * F_yc)) * (L_b - L_p) / (L_r - L_p)), 1.0) * R_b * R_h * F_yc
    }
    cite "AASHTO LRFD 9th ed. 6.10.8.2.3 (6.10.8.2.3-2), from memory"
    what "stress by lateral-torsional buckling"
}

clause! {
    /// Stress by elastic buckling where the web is slender, ksi.
    pub fn elastic_stress_capped(F_cr: Stress [Ksi], R_b: f64 [One], R_h: f64 [One], F_yc: Stress [Ksi])
    -> F_nc: Stress [Ksi] { min(F_cr, R_b * R_h * F_yc) }
    cite "AASHTO LRFD 9th ed. 6.10.8.2.3 (6.10.8.2.3-3), from memory"
    what "stress by lateral-torsional buckling"
}

clause! {
    /// Moment gradient modifier, at most 2.3, from the stresses `f_1` and `f_2` at the ends of the
    /// unbraced length; `f_2` is the larger and not 0, `f_1` with its sign. 1.0 for a length whose
    /// middle is stressed more than its ends, and for cantilevers.
    pub fn moment_gradient(f_1: Stress [Ksi], f_2: Stress [Ksi]) -> C_b: f64 [One]
    { min(1.75 - 1.05 * (f_1 / f_2) + 0.3 * pow(f_1 / f_2, 2.0), 2.3) }
    cite "AASHTO LRFD 9th ed. A6.3.3 (A6.3.3-7), 6.10.8.2.3 (6.10.8.2.3-7), from memory"
    what "moment gradient modifier"
}
