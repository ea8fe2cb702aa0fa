//! Webs over bearings without bearing stiffeners (D6.5): local yielding and crippling.
//!
//! The formulas are those of a straight, whole web; one that is out of plumb, holed or not looked at
//! gets no number. The least thickness in the lowest band of the web counts, not the mean.

use super::material;
use crate::bridge::Straightness;
use crate::problem::Problem;
use crate::quantity::{Force, Length, Quantity, Stress};
use crate::section::effective::Effective;
use crate::units::Entered;
use crate::units::mark::{Inch, Kip, Ksi};
use crate::worksheet::{Recorder, Val};
use crate::{clause, condition};

/// Where along the girder the force stands.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Place {
    /// At an end: nearer to it than the depth (yielding) or half of it (crippling).
    End,
    /// Away from the ends: an interior pier.
    Interior,
}

/// What the web over a bearing hangs on.
#[derive(Clone, Copy, Debug)]
pub struct BearingCase<'a> {
    /// The steel over the bearing.
    pub section: &'a Effective<'a>,
    /// Least thickness left in the lowest band of the web.
    pub t_w: Val<Length>,
    /// Yield strength of the web.
    pub f_yw: Val<Stress>,
    /// Length of bearing.
    pub n: Val<Length>,
    /// Path of the length of bearing, for messages.
    pub n_path: &'a str,
    /// Where the bearing is.
    pub place: Place,
    /// What is known of the web.
    pub web: Straightness,
    /// Path of the field that tells so, for messages.
    pub web_path: &'a str,
}

clause! {
    /// Web local yielding at an end, kip. W21x62 (k 1.12, t_w 0.400), N 4.25 in, 50 ksi: 141.0 kip.
    pub fn yielding_end(k: Length [Inch], N: Length [Inch], F_yw: Stress [Ksi], t_w: Length [Inch])
    -> R_n: Force [Kip] { (2.5 * k + N) * F_yw * t_w }
    cite "AASHTO LRFD 9th ed. D6.5.2 (D6.5.2-3), from memory" what "web local yielding over the bearing"
}

clause! {
    /// Web local yielding away from the ends, kip.
    pub fn yielding_interior(k: Length [Inch], N: Length [Inch], F_yw: Stress [Ksi], t_w: Length [Inch])
    -> R_n: Force [Kip] { (5.0 * k + N) * F_yw * t_w }
    cite "AASHTO LRFD 9th ed. D6.5.2 (D6.5.2-2), from memory" what "web local yielding over the bearing"
}

condition! {
    /// The bearing at an end is to be at least as long as the fillet is high.
    pub fn bearing_long_enough(N: Length [Inch], k: Length [Inch]) { N >= k }
    cite "AASHTO LRFD 9th ed. D6.5.2, from memory"
    yes "the bearing is long enough for the formula" no "the bearing is shorter than the formula allows"
}

condition! {
    /// Which formula of crippling at an end.
    pub fn short_bearing(N: Length [Inch], d: Length [Inch]) { N <= 0.2 * d }
    cite "AASHTO LRFD 9th ed. D6.5.3, from memory"
    yes "the bearing is up to a fifth of the depth" no "the bearing is longer than a fifth of the depth"
}

clause! {
    /// Web crippling away from the ends, kip.
    pub fn crippling_interior(
        t_w: Length [Inch], N: Length [Inch], d: Length [Inch], t_f: Length [Inch], E: Stress [Ksi],
        F_yw: Stress [Ksi],
    ) -> R_n: Force [Kip] {
        0.8 * pow(t_w, 2.0) * (1.0 + 3.0 * (N / d) * pow(t_w / t_f, 1.5)) * sqrt(E * F_yw * t_f / t_w)
    }
    cite "AASHTO LRFD 9th ed. D6.5.3 (D6.5.3-2), from memory" what "web crippling over the bearing"
}

clause! {
    /// Web crippling at an end, bearing up to a fifth of the depth, kip.
    pub fn crippling_end_short(
        t_w: Length [Inch], N: Length [Inch], d: Length [Inch], t_f: Length [Inch], E: Stress [Ksi],
        F_yw: Stress [Ksi],
    ) -> R_n: Force [Kip] {
        0.4 * pow(t_w, 2.0) * (1.0 + 3.0 * (N / d) * pow(t_w / t_f, 1.5)) * sqrt(E * F_yw * t_f / t_w)
    }
    cite "AASHTO LRFD 9th ed. D6.5.3 (D6.5.3-3), from memory" what "web crippling over the bearing"
}

clause! {
    /// Web crippling at an end, bearing longer than a fifth of the depth, kip.
    pub fn crippling_end_long(
        t_w: Length [Inch], N: Length [Inch], d: Length [Inch], t_f: Length [Inch], E: Stress [Ksi],
        F_yw: Stress [Ksi],
    ) -> R_n: Force [Kip] {
        0.4 * pow(t_w, 2.0) * (1.0 + (4.0 * N / d - 0.2) * pow(t_w / t_f, 1.5))
            * sqrt(E * F_yw * t_f / t_w)
    }
    cite "AASHTO LRFD 9th ed. D6.5.3 (D6.5.3-4), from memory" what "web crippling over the bearing"
}

/// The length of bearing as entered.
///
/// # Errors
/// When it was not measured.
pub fn length<R: Recorder>(
    rec: &mut R,
    entry: Option<&Entered<Length>>,
    path: &str,
) -> Result<Val<Length>, Problem> {
    entry.map(|n| rec.given("N", "length of bearing along the girder", n, Inch)).ok_or_else(|| {
        Problem::missing(
            path,
            "the length of bearing is not known",
            "measure how far the girder rests on its bearing, along the girder",
        )
    })
}

/// The web has to be known, straight and whole.
fn known(case: &BearingCase) -> Result<(), Problem> {
    let left = case.t_w.q.base();
    match case.web {
        Straightness::Not => Err(Problem::error(
            case.web_path,
            "the web over the bearing is out of plumb or holed: the formulas do not hold",
            "measure the deformation or the hole and have it studied, or enter a repair",
        )),
        Straightness::NotInspected => Err(Problem::missing(
            case.web_path,
            "nobody looked at the web over the bearing",
            "look whether it is straight and whole, and measure its least thickness",
        )),
        Straightness::Straight if left > 0.0 && left.is_finite() => Ok(()),
        Straightness::Straight => Err(Problem::error(
            case.web_path,
            "nothing is left of the web over the bearing: there is no method for that",
            "enter the thickness that is left, or have the girder looked at for repair",
        )),
    }
}

/// Web local yielding, nominal.
///
/// # Errors
/// When the web is not straight, not whole or not known, or when the bearing is too short.
pub fn web_yielding<R: Recorder>(rec: &mut R, case: &BearingCase) -> Result<Val<Force>, Problem> {
    rec.heading("Web local yielding over the bearing");
    known(case)?;
    let k = case.section.fillet;
    match case.place {
        Place::Interior => Ok(yielding_interior(rec, k, case.n, case.f_yw, case.t_w)),
        Place::End if bearing_long_enough(rec, case.n, k) => {
            Ok(yielding_end(rec, k, case.n, case.f_yw, case.t_w))
        }
        Place::End => Err(Problem::error(
            case.n_path,
            "the bearing is shorter than the distance from the flange's face to the toe of the fillet",
            "measure the length of bearing again; one as short as this needs its own study",
        )),
    }
}

/// Web crippling, nominal.
///
/// # Errors
/// When the web is not straight, not whole or not known.
pub fn web_crippling<R: Recorder>(rec: &mut R, case: &BearingCase) -> Result<Val<Force>, Problem> {
    rec.heading("Web crippling over the bearing");
    known(case)?;
    let e = material::steel_modulus(rec);
    let (d, t_f) = (case.section.depth, case.section.plates.t_bottom);
    Ok(match case.place {
        Place::Interior => crippling_interior(rec, case.t_w, case.n, d, t_f, e, case.f_yw),
        Place::End if short_bearing(rec, case.n, d) => {
            crippling_end_short(rec, case.t_w, case.n, d, t_f, e, case.f_yw)
        }
        Place::End => crippling_end_long(rec, case.t_w, case.n, d, t_f, e, case.f_yw),
    })
}
