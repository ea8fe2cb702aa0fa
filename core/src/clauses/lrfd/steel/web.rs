//! Web slenderness in bending: plastification factors of appendix A6, load shedding of 6.10.1.10.2.

use super::flange::Pressed;
use crate::quantity::{Length, Modulus, Moment, Stress};
use crate::units::mark::{In3, Inch, KipIn, Ksi, One};
use crate::worksheet::{Recorder, Val};
use crate::{clause, condition};

clause! {
    /// Twice the area of the web in compression over the area of the compression flange.
    pub fn web_to_flange(D_c: Length [Inch], t_w: Length [Inch], b_fc: Length [Inch], t_fc: Length [Inch])
    -> a_wc: f64 [One] { 2.0 * D_c * t_w / (b_fc * t_fc) }
    cite "AASHTO LRFD 9th ed. 6.10.1.10.2 (6.10.1.10.2-8), from memory"
    what "twice the pressed area of the web over that of the flange"
}

clause! {
    /// Limiting slenderness of a noncompact web. With `F_yc` 36 ksi and `a_wc` 1.9: 161.8; older
    /// editions have 5.7 for every `a_wc`, which is never less.
    pub fn noncompact_limit(a_wc: f64 [One], E: Stress [Ksi], F_yc: Stress [Ksi])
    -> lambda_rw: f64 [One] { min(max(4.6, 3.1 + 5.0 / a_wc), 5.7) * sqrt(E / F_yc) }
    cite "AASHTO LRFD 9th ed. 6.10.1.10.2 (6.10.1.10.2-5), A6.2.1 (A6.2.1-3), from memory"
    what "limiting slenderness of a noncompact web"
}

clause! {
    /// Slenderness of the web, elastic.
    pub fn web_slenderness(D_c: Length [Inch], t_w: Length [Inch]) -> lambda_w: f64 [One]
    { 2.0 * D_c / t_w }
    cite "AASHTO LRFD 9th ed. A6.2.2 (A6.2.2-3), from memory" what "slenderness of the web"
}

clause! {
    /// Slenderness of the web at the plastic moment.
    pub fn web_slenderness_plastic(D_cp: Length [Inch], t_w: Length [Inch]) -> lambda_wp: f64 [One]
    { 2.0 * D_cp / t_w }
    cite "AASHTO LRFD 9th ed. A6.2.1 (A6.2.1-1), from memory" what "slenderness of the web at the plastic moment"
}

condition! {
    /// Whether the web is slender.
    pub fn web_not_slender(lambda_w: f64 [One], lambda_rw: f64 [One]) { lambda_w <= lambda_rw }
    cite "AASHTO LRFD 9th ed. 6.10.6.2.3 (6.10.6.2.3-1), 6.10.1.10.2, from memory"
    yes "the web is compact or noncompact" no "the web is slender: 6.10.8, with load shedding"
}

clause! {
    /// Plastic moment of the steel alone, kip in. W18x50, 50 ksi: 5,050 kip in.
    pub fn plastic_moment(F_y: Stress [Ksi], Z: Modulus [In3]) -> M_p: Moment [KipIn] { F_y * Z }
    cite "AASHTO LRFD 9th ed. D6.1" what "plastic moment"
}

clause! {
    /// Moment at which the compression flange yields, kip in.
    pub fn yield_compression(F_yc: Stress [Ksi], S_xc: Modulus [In3]) -> M_yc: Moment [KipIn] { F_yc * S_xc }
    cite "AASHTO LRFD 9th ed. D6.2.1" what "yield moment of the compression flange"
}

clause! {
    /// Moment at which the tension flange yields, kip in.
    pub fn yield_tension(F_yt: Stress [Ksi], S_xt: Modulus [In3]) -> M_yt: Moment [KipIn] { F_yt * S_xt }
    cite "AASHTO LRFD 9th ed. D6.2.1" what "yield moment of the tension flange"
}

clause! {
    /// Moment at which the section first yields, kip in.
    pub fn first_yield(M_yc: Moment [KipIn], M_yt: Moment [KipIn]) -> M_y: Moment [KipIn] { min(M_yc, M_yt) }
    cite "AASHTO LRFD 9th ed. D6.2.1" what "yield moment"
}

clause! {
    /// Limiting slenderness of a compact web, against `2 D_cp / t_w`; 36 ksi and a shape factor of
    /// 1.15: 102.1 (3.60 sqrt(E / F_yc)).
    pub fn compact_limit(
        E: Stress [Ksi], F_yc: Stress [Ksi], M_p: Moment [KipIn], R_h: f64 [One], M_y: Moment [KipIn],
        lambda_rw: f64 [One], D_cp: Length [Inch], D_c: Length [Inch],
    ) -> lambda_pw: f64 [One] {
        min(sqrt(E / F_yc) / pow(0.54 * M_p / (R_h * M_y) - 0.09, 2.0), lambda_rw * D_cp / D_c)
    }
    cite "AASHTO LRFD 9th ed. A6.2.1 (A6.2.1-2), from memory" what "limiting slenderness of a compact web"
}

condition! {
    /// Whether the web is compact.
    pub fn web_compact(lambda_wp: f64 [One], lambda_pw: f64 [One]) { lambda_wp <= lambda_pw }
    cite "AASHTO LRFD 9th ed. A6.2.1 (A6.2.1-1), from memory"
    yes "the web is compact" no "the web is noncompact"
}

clause! {
    /// Web plastification factor of the compression flange, compact web.
    pub fn plastification_compression(M_p: Moment [KipIn], M_yc: Moment [KipIn]) -> R_pc: f64 [One]
    { M_p / M_yc }
    cite "AASHTO LRFD 9th ed. A6.2.1 (A6.2.1-4), from memory" what "web plastification factor, compression"
}

clause! {
    /// Web plastification factor of the tension flange, compact web.
    pub fn plastification_tension(M_p: Moment [KipIn], M_yt: Moment [KipIn]) -> R_pt: f64 [One]
    { M_p / M_yt }
    cite "AASHTO LRFD 9th ed. A6.2.1 (A6.2.1-5), from memory" what "web plastification factor, tension"
}

clause! {
    /// Limiting slenderness of a compact web, against `2 D_c / t_w`.
    pub fn compact_limit_elastic(
        lambda_pw: f64 [One], D_c: Length [Inch], D_cp: Length [Inch], lambda_rw: f64 [One],
    ) -> lambda_pwc: f64 [One] { min(lambda_pw * D_c / D_cp, lambda_rw) }
    cite "AASHTO LRFD 9th ed. A6.2.2 (A6.2.2-6), from memory"
    what "limiting slenderness of a compact web, elastic depth"
}

clause! {
    /// Web plastification factor of the compression flange, noncompact web.
    pub fn plastification_compression_noncompact(
        R_h: f64 [One], M_yc: Moment [KipIn], M_p: Moment [KipIn], lambda_w: f64 [One],
        lambda_pwc: f64 [One], lambda_rw: f64 [One],
    ) -> R_pc: f64 [One] {
        min(1.0 - (1.0 - R_h * M_yc / M_p) * (lambda_w - lambda_pwc) / (lambda_rw - lambda_pwc), 1.0)
            * M_p / M_yc
    }
    cite "AASHTO LRFD 9th ed. A6.2.2 (A6.2.2-4), from memory" what "web plastification factor, compression"
}

clause! {
    /// Web plastification factor of the tension flange, noncompact web.
    pub fn plastification_tension_noncompact(
        R_h: f64 [One], M_yt: Moment [KipIn], M_p: Moment [KipIn], lambda_w: f64 [One],
        lambda_pwc: f64 [One], lambda_rw: f64 [One],
    ) -> R_pt: f64 [One] {
        min(1.0 - (1.0 - R_h * M_yt / M_p) * (lambda_w - lambda_pwc) / (lambda_rw - lambda_pwc), 1.0)
            * M_p / M_yt
    }
    cite "AASHTO LRFD 9th ed. A6.2.2 (A6.2.2-5), from memory" what "web plastification factor, tension"
}

clause! {
    /// Web load-shedding factor of a slender web: what the web sheds, the flange takes.
    pub fn load_shedding(a_wc: f64 [One], D_c: Length [Inch], t_w: Length [Inch], lambda_rw: f64 [One])
    -> R_b: f64 [One] {
        min(1.0 - a_wc / (1200.0 + 300.0 * a_wc) * (2.0 * D_c / t_w - lambda_rw), 1.0)
    }
    cite "AASHTO LRFD 9th ed. 6.10.1.10.2 (6.10.1.10.2-3), from memory" what "web load-shedding factor"
}

/// Hybrid factor: 1.0 for rolled shapes and for girders of one steel.
pub fn hybrid_factor<R: Recorder>(rec: &mut R) -> Val<f64> {
    rec.look_up("R_h", "hybrid factor", 1.0, One, "AASHTO LRFD 9th ed. 6.10.1.10.1 (from memory)", || {
        "rolled shapes and girders of one steel".to_owned()
    })
}

/// The web's slenderness and its limits.
#[derive(Clone, Copy, Debug)]
pub struct WebClass {
    /// Web to flange ratio.
    pub a_wc: Val<f64>,
    /// Limit of a noncompact web.
    pub lambda_rw: Val<f64>,
    /// Slenderness, elastic depth.
    pub lambda_w: Val<f64>,
    /// Whether it is compact or noncompact.
    pub not_slender: bool,
}

impl WebClass {
    /// From the section and its strength.
    pub fn of<R: Recorder>(
        rec: &mut R,
        pressed: &Pressed,
        t_w: Val<Length>,
        e: Val<Stress>,
        f_yc: Val<Stress>,
    ) -> Self {
        let a_wc = web_to_flange(rec, pressed.d_c, t_w, pressed.b_fc, pressed.t_fc);
        let lambda_rw = noncompact_limit(rec, a_wc, e, f_yc);
        let lambda_w = web_slenderness(rec, pressed.d_c, t_w);
        let not_slender = web_not_slender(rec, lambda_w, lambda_rw);
        Self { a_wc, lambda_rw, lambda_w, not_slender }
    }
}
