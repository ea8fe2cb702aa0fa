//! Plastic neutral axis and plastic modulus of three plates of one strength.

use crate::quantity::{Area, Length, Modulus};
use crate::units::mark::{In2, In3, Inch};
use crate::worksheet::{Recorder, Val};
use crate::{clause, condition};

/// The plates of an I-section with their areas.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Plates {
    /// Width of the top flange.
    pub b_top: Val<Length>,
    /// Thickness of the top flange.
    pub t_top: Val<Length>,
    /// Depth of the web between the flanges.
    pub web_depth: Val<Length>,
    /// Thickness of the web.
    pub t_w: Val<Length>,
    /// Width of the bottom flange.
    pub b_bottom: Val<Length>,
    /// Thickness of the bottom flange.
    pub t_bottom: Val<Length>,
    /// Area of the top flange.
    pub top: Val<Area>,
    /// Area of the web.
    pub web: Val<Area>,
    /// Area of the bottom flange.
    pub bottom: Val<Area>,
}

/// Where the plastic neutral axis of the steel alone lies and what it gives.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Plastic {
    /// Depth of the plastic neutral axis below the top of the web, held within the web.
    pub y: Val<Length>,
    /// Plastic modulus.
    pub modulus: Val<Modulus>,
    /// Whether the axis lies in the web, hence between the fillets.
    pub in_web: bool,
}

condition! {
    /// The axis halves the area: it lies in the web unless one flange outweighs all the rest.
    pub fn axis_in_web(A_top: Area [In2], A_w: Area [In2], A_bot: Area [In2])
    { max(A_top - A_bot, A_bot - A_top) <= A_w }
    cite "mechanics" yes "the plastic neutral axis lies in the web"
    no "the plastic neutral axis lies in the heavier flange"
}

condition! {
    /// Which flange outweighs the rest.
    pub fn top_outweighs(A_top: Area [In2], A_bot: Area [In2]) { A_top > A_bot }
    cite "mechanics" yes "it lies in the top flange" no "it lies in the bottom flange"
}

clause! {
    /// Depth of the plastic neutral axis below the top of the web, in; 0 or `D` where the axis lies
    /// in a flange. Equal flanges give `D / 2`.
    pub fn axis_depth(D: Length [Inch], A_top: Area [In2], A_w: Area [In2], A_bot: Area [In2])
    -> Y: Length [Inch] { min(max(D / 2.0 * ((A_bot - A_top) / A_w + 1.0), 0.0), D) }
    cite "mechanics" what "plastic neutral axis below the top of the web"
}

clause! {
    /// Plastic modulus with the axis in the web, in3. W33x130 as plates (11.51 by 0.855, web 31.38 by
    /// 0.58): 460.0 in3, where the table with its fillets says 467.
    pub fn modulus_axis_in_web(
        t_w: Length [Inch], Y: Length [Inch], D: Length [Inch], A_top: Area [In2], t_top: Length [Inch],
        A_bot: Area [In2], t_bot: Length [Inch],
    ) -> Z: Modulus [In3] {
        t_w * (pow(Y, 2.0) + pow(D - Y, 2.0)) / 2.0 + A_top * (Y + t_top / 2.0)
            + A_bot * (D - Y + t_bot / 2.0)
    }
    cite "mechanics" what "plastic modulus of the plates"
}

clause! {
    /// How far a flange that outweighs the rest reaches beyond the axis on the web's side, in.
    pub fn axis_in_flange(A_f: Area [In2], A_w: Area [In2], A_o: Area [In2], b_f: Length [Inch])
    -> a: Length [Inch] { (A_f - A_w - A_o) / (2.0 * b_f) }
    cite "mechanics" what "plastic neutral axis from the inner face of the flange"
}

clause! {
    /// Plastic modulus with the axis in the flange `f`, the other flange being `o`, in3.
    pub fn modulus_axis_in_flange(
        b_f: Length [Inch], t_f: Length [Inch], a: Length [Inch], A_w: Area [In2], D: Length [Inch],
        A_o: Area [In2], t_o: Length [Inch],
    ) -> Z: Modulus [In3] {
        b_f * (pow(t_f - a, 2.0) + pow(a, 2.0)) / 2.0 + A_w * (a + D / 2.0) + A_o * (a + D + t_o / 2.0)
    }
    cite "mechanics" what "plastic modulus of the plates"
}

/// Axis and modulus of the three plates.
pub fn plastic<R: Recorder>(rec: &mut R, p: &Plates) -> Plastic {
    let y = axis_depth(rec, p.web_depth, p.top, p.web, p.bottom);
    let in_web = axis_in_web(rec, p.top, p.web, p.bottom);
    let modulus = if in_web {
        modulus_axis_in_web(rec, p.t_w, y, p.web_depth, p.top, p.t_top, p.bottom, p.t_bottom)
    } else if top_outweighs(rec, p.top, p.bottom) {
        let a = axis_in_flange(rec, p.top, p.web, p.bottom, p.b_top);
        modulus_axis_in_flange(rec, p.b_top, p.t_top, a, p.web, p.web_depth, p.bottom, p.t_bottom)
    } else {
        let a = axis_in_flange(rec, p.bottom, p.web, p.top, p.b_bottom);
        modulus_axis_in_flange(rec, p.b_bottom, p.t_bottom, a, p.web, p.web_depth, p.top, p.t_top)
    };
    Plastic { y, modulus, in_web }
}
