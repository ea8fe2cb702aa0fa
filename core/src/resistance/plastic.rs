//! Plastic moment of a steel section with a slab on it, slab in compression.
//!
//! Each plate yields throughout, the slab is crushed down to the neutral axis and carries nothing
//! below it; reinforcement of the slab, fillets and haunch concrete are left out, which is safe.
//! Symbols are those of AASHTO LRFD table D6.1-1.

use crate::problem::Problem;
use crate::quantity::{Area, Force, Length, Moment, Stress};
use crate::units::mark::{In2, Inch, Kip, KipIn, Ksi};
use crate::worksheet::{Recorder, Val};
use crate::{clause, condition};

/// Forces of the parts when all of each yields, and where the parts are.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Forces {
    /// Slab crushed throughout.
    pub p_s: Val<Force>,
    /// Thickness of the slab.
    pub t_s: Val<Length>,
    /// Gap between the soffit of the slab and the top of the flange that is left.
    pub gap: Val<Length>,
    /// Top flange.
    pub p_c: Val<Force>,
    /// Its thickness.
    pub t_c: Val<Length>,
    /// Web.
    pub p_w: Val<Force>,
    /// Its depth.
    pub web_depth: Val<Length>,
    /// Bottom flange.
    pub p_t: Val<Force>,
    /// Its thickness.
    pub t_t: Val<Length>,
}

/// Which part the plastic neutral axis lies in.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Axis {
    /// The web (case I).
    Web,
    /// The top flange (case II).
    TopFlange,
    /// The slab (cases III to VII without reinforcement).
    Slab,
}

/// The plastic moment and its neutral axis.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Plastic {
    /// Which part the axis lies in.
    pub axis: Axis,
    /// Depth of the axis below the top of the slab.
    pub d_p: Val<Length>,
    /// Depth of the web in compression.
    pub d_cp: Val<Length>,
    /// Plastic moment.
    pub moment: Val<Moment>,
}

clause! {
    /// Yield force of a plate, kip.
    pub fn yield_force(F_y: Stress [Ksi], A_i: Area [In2]) -> P_i: Force [Kip] { F_y * A_i }
    cite "mechanics" what "force of a plate that yields"
}

condition! {
    /// Whether the bottom flange is no stronger than all the rest.
    pub fn axis_above_bottom(P_t: Force [Kip], P_w: Force [Kip], P_c: Force [Kip], P_s: Force [Kip])
    { P_t <= P_w + P_c + P_s }
    cite "equilibrium" yes "the plastic neutral axis lies above the bottom flange"
    no "the bottom flange outweighs all the rest"
}

condition! {
    /// Whether slab and top flange are weaker than web and bottom flange.
    pub fn axis_in_web(P_t: Force [Kip], P_w: Force [Kip], P_c: Force [Kip], P_s: Force [Kip])
    { P_t + P_w >= P_c + P_s }
    cite "equilibrium; AASHTO LRFD table D6.1-1" yes "the plastic neutral axis lies in the web (case I)"
    no "the plastic neutral axis lies above the web"
}

condition! {
    /// Whether the slab is weaker than the steel.
    pub fn axis_in_flange(P_t: Force [Kip], P_w: Force [Kip], P_c: Force [Kip], P_s: Force [Kip])
    { P_t + P_w + P_c >= P_s }
    cite "equilibrium; AASHTO LRFD table D6.1-1" yes "it lies in the top flange (case II)"
    no "it lies in the slab"
}

clause! {
    /// Depth of the axis below the top of the web, in.
    pub fn depth_in_web(
        D: Length [Inch], P_t: Force [Kip], P_c: Force [Kip], P_s: Force [Kip], P_w: Force [Kip],
    ) -> Y: Length [Inch] { D / 2.0 * ((P_t - P_c - P_s) / P_w + 1.0) }
    cite "AASHTO LRFD table D6.1-1, case I" what "plastic neutral axis below the top of the web"
}

clause! {
    /// Plastic moment with the axis in the web, kip in.
    pub fn moment_axis_in_web(
        P_w: Force [Kip], D: Length [Inch], Y: Length [Inch], P_s: Force [Kip], t_c: Length [Inch],
        gap: Length [Inch], t_s: Length [Inch], P_c: Force [Kip], P_t: Force [Kip], t_t: Length [Inch],
    ) -> M_p: Moment [KipIn] {
        P_w / (2.0 * D) * (pow(Y, 2.0) + pow(D - Y, 2.0)) + P_s * (Y + t_c + gap + t_s / 2.0)
            + P_c * (Y + t_c / 2.0) + P_t * (D - Y + t_t / 2.0)
    }
    cite "AASHTO LRFD table D6.1-1, case I" what "plastic moment"
}

clause! {
    /// Depth of the axis below the top of the slab, the axis lying in the web, in.
    pub fn axis_depth_web(t_s: Length [Inch], gap: Length [Inch], t_c: Length [Inch], Y: Length [Inch])
    -> D_p: Length [Inch] { t_s + gap + t_c + Y }
    cite "geometry" what "plastic neutral axis below the top of the slab"
}

clause! {
    /// Depth of the axis below the top of the top flange, in.
    pub fn depth_in_flange(
        t_c: Length [Inch], P_w: Force [Kip], P_t: Force [Kip], P_s: Force [Kip], P_c: Force [Kip],
    ) -> Y: Length [Inch] { t_c / 2.0 * ((P_w + P_t - P_s) / P_c + 1.0) }
    cite "AASHTO LRFD table D6.1-1, case II" what "plastic neutral axis below the top of the flange"
}

clause! {
    /// Plastic moment with the axis in the top flange, kip in.
    pub fn moment_axis_in_flange(
        P_c: Force [Kip], t_c: Length [Inch], Y: Length [Inch], P_s: Force [Kip], gap: Length [Inch],
        t_s: Length [Inch], P_w: Force [Kip], D: Length [Inch], P_t: Force [Kip], t_t: Length [Inch],
    ) -> M_p: Moment [KipIn] {
        P_c / (2.0 * t_c) * (pow(Y, 2.0) + pow(t_c - Y, 2.0)) + P_s * (Y + gap + t_s / 2.0)
            + P_w * (t_c - Y + D / 2.0) + P_t * (t_c - Y + D + t_t / 2.0)
    }
    cite "AASHTO LRFD table D6.1-1, case II" what "plastic moment"
}

clause! {
    /// Depth of the axis below the top of the slab, the axis lying in the top flange, in.
    pub fn axis_depth_flange(t_s: Length [Inch], gap: Length [Inch], Y: Length [Inch])
    -> D_p: Length [Inch] { t_s + gap + Y }
    cite "geometry" what "plastic neutral axis below the top of the slab"
}

clause! {
    /// Depth of the axis below the top of the slab, the axis lying in the slab, in.
    pub fn depth_in_slab(
        t_s: Length [Inch], P_c: Force [Kip], P_w: Force [Kip], P_t: Force [Kip], P_s: Force [Kip],
    ) -> D_p: Length [Inch] { t_s * (P_c + P_w + P_t) / P_s }
    cite "AASHTO LRFD table D6.1-1, case VII without reinforcement"
    what "plastic neutral axis below the top of the slab"
}

clause! {
    /// Plastic moment with the axis in the slab, kip in.
    pub fn moment_axis_in_slab(
        D_p: Length [Inch], P_s: Force [Kip], t_s: Length [Inch], P_c: Force [Kip], gap: Length [Inch],
        t_c: Length [Inch], P_w: Force [Kip], D: Length [Inch], P_t: Force [Kip], t_t: Length [Inch],
    ) -> M_p: Moment [KipIn] {
        pow(D_p, 2.0) * P_s / (2.0 * t_s) + P_c * (t_s - D_p + gap + t_c / 2.0)
            + P_w * (t_s - D_p + gap + t_c + D / 2.0) + P_t * (t_s - D_p + gap + t_c + D + t_t / 2.0)
    }
    cite "AASHTO LRFD table D6.1-1, case VII without reinforcement" what "plastic moment"
}

/// Depth of the web in compression where the axis lies above it: none.
fn no_web_pressed<R: Recorder>(rec: &mut R) -> Val<Length> {
    rec.look_up("D_cp", "depth of the web in compression", Length::ZERO, Inch, "mechanics", || {
        "the axis lies above the web".to_owned()
    })
}

/// Plastic neutral axis and plastic moment, slab in compression; `path` is that of the slab.
///
/// # Errors
/// When the bottom flange outweighs all the rest: table D6.1-1 has no such case.
pub fn plastic<R: Recorder>(rec: &mut R, f: &Forces, path: &str) -> Result<Plastic, Problem> {
    if !axis_above_bottom(rec, f.p_t, f.p_w, f.p_c, f.p_s) {
        return Err(Problem::error(
            path,
            "the bottom flange is stronger than slab, top flange and web together",
            "check slab and flanges; rated without the slab it may do",
        ));
    }
    Ok(above_bottom(rec, f))
}

fn above_bottom<R: Recorder>(rec: &mut R, f: &Forces) -> Plastic {
    if axis_in_web(rec, f.p_t, f.p_w, f.p_c, f.p_s) {
        let y = depth_in_web(rec, f.web_depth, f.p_t, f.p_c, f.p_s, f.p_w);
        let moment =
            moment_axis_in_web(rec, f.p_w, f.web_depth, y, f.p_s, f.t_c, f.gap, f.t_s, f.p_c, f.p_t, f.t_t);
        let d_p = axis_depth_web(rec, f.t_s, f.gap, f.t_c, y);
        Plastic { axis: Axis::Web, d_p, d_cp: y, moment }
    } else if axis_in_flange(rec, f.p_t, f.p_w, f.p_c, f.p_s) {
        let y = depth_in_flange(rec, f.t_c, f.p_w, f.p_t, f.p_s, f.p_c);
        let moment = moment_axis_in_flange(
            rec,
            f.p_c,
            f.t_c,
            y,
            f.p_s,
            f.gap,
            f.t_s,
            f.p_w,
            f.web_depth,
            f.p_t,
            f.t_t,
        );
        let d_p = axis_depth_flange(rec, f.t_s, f.gap, y);
        Plastic { axis: Axis::TopFlange, d_p, d_cp: no_web_pressed(rec), moment }
    } else {
        let d_p = depth_in_slab(rec, f.t_s, f.p_c, f.p_w, f.p_t, f.p_s);
        let moment = moment_axis_in_slab(
            rec,
            d_p,
            f.p_s,
            f.t_s,
            f.p_c,
            f.gap,
            f.t_c,
            f.p_w,
            f.web_depth,
            f.p_t,
            f.t_t,
        );
        Plastic { axis: Axis::Slab, d_p, d_cp: no_web_pressed(rec), moment }
    }
}
