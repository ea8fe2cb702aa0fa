//! Which flange is pressed, which is pulled, and what holds the pressed one sideways.

use crate::bridge::{Bracing, Embedded};
use crate::clause;
use crate::problem::Problem;
use crate::quantity::{Inertia, Length, Modulus};
use crate::section::effective::{Edge, Effective};
use crate::units::mark::{In4, Inch};
use crate::worksheet::{Recorder, Val};

/// What holds the compression flange.
#[derive(Clone, Debug)]
pub enum Hold {
    /// Held along its whole length: cast into the slab, or connected to it.
    Continuous,
    /// Held at points this far apart.
    At(Val<Length>),
    /// Nobody measured it; path of the field.
    NotKnown(String),
}

impl Hold {
    /// From the bracing as entered: an embedded flange is held, and what was not inspected is not.
    /// `path` is that of the spacing.
    pub fn of<R: Recorder>(rec: &mut R, bracing: &Bracing, path: &str) -> Self {
        match (bracing.embedded, &bracing.spacing) {
            (Embedded::Yes, _) => {
                rec.remark(|| {
                    "The top flange is embedded in the slab or connected to it: held along its length"
                        .to_owned()
                });
                Self::Continuous
            }
            (_, Some(spacing)) => {
                Self::At(rec.given("L_b", "unbraced length between diaphragms that work", spacing, Inch))
            }
            (_, None) => Self::NotKnown(path.to_owned()),
        }
    }
}

/// The section seen from its compression flange.
#[derive(Clone, Copy, Debug)]
pub struct Pressed<'a> {
    /// Path of the compression flange's thickness, for messages.
    pub path_c: &'a str,
    /// Path of the tension flange's thickness.
    pub path_t: &'a str,
    /// Width of the compression flange.
    pub b_fc: Val<Length>,
    /// Thickness of the compression flange.
    pub t_fc: Val<Length>,
    /// Width of the tension flange.
    pub b_ft: Val<Length>,
    /// Thickness of the tension flange.
    pub t_ft: Val<Length>,
    /// Elastic modulus at the compression flange.
    pub s_xc: Val<Modulus>,
    /// Elastic modulus at the tension flange.
    pub s_xt: Val<Modulus>,
    /// Depth of the web in compression, elastic.
    pub d_c: Val<Length>,
    /// Depth of the web in compression at the plastic moment.
    pub d_cp: Val<Length>,
    /// Depth between the centroids of the flanges.
    pub h: Val<Length>,
}

clause! {
    /// Depth of the web in compression with the top flange pressed, in; 0 where the axis lies above it.
    pub fn web_pressed_top(t_bot: Length [Inch], D: Length [Inch], y: Length [Inch])
    -> D_c: Length [Inch] { max(t_bot + D - y, 0.0) }
    cite "AASHTO LRFD 9th ed. D6.3.1" what "depth of the web in compression"
}

clause! {
    /// Depth of the web in compression with the bottom flange pressed, in.
    pub fn web_pressed_bottom(t_bot: Length [Inch], y: Length [Inch]) -> D_c: Length [Inch]
    { max(y - t_bot, 0.0) }
    cite "AASHTO LRFD 9th ed. D6.3.1" what "depth of the web in compression"
}

clause! {
    /// Depth of the web in compression at the plastic moment with the top flange pressed, in.
    pub fn web_plastic_top(Y: Length [Inch]) -> D_cp: Length [Inch] { Y }
    cite "AASHTO LRFD 9th ed. D6.3.2" what "depth of the web in compression at the plastic moment"
}

clause! {
    /// Depth of the web in compression at the plastic moment with the bottom flange pressed, in.
    pub fn web_plastic_bottom(D: Length [Inch], Y: Length [Inch]) -> D_cp: Length [Inch] { D - Y }
    cite "AASHTO LRFD 9th ed. D6.3.2" what "depth of the web in compression at the plastic moment"
}

clause! {
    /// Depth between the centroids of the flanges, in.
    pub fn between_flanges(D: Length [Inch], t_fc: Length [Inch], t_ft: Length [Inch])
    -> h: Length [Inch] { D + (t_fc + t_ft) / 2.0 }
    cite "AASHTO LRFD 9th ed. A6.3.3" what "depth between the centroids of the flanges"
}

clause! {
    /// Second moment of area of the compression flange about the plane of the web, in4.
    pub fn lateral_inertia(t_fc: Length [Inch], b_fc: Length [Inch]) -> I_yc: Inertia [In4]
    { t_fc * pow(b_fc, 3.0) / 12.0 }
    cite "AASHTO LRFD 9th ed. 6.10.2.2" what "compression flange about the vertical axis"
}

clause! {
    /// Second moment of area of the tension flange about the plane of the web, in4.
    pub fn lateral_inertia_tension(t_ft: Length [Inch], b_ft: Length [Inch]) -> I_yt: Inertia [In4]
    { t_ft * pow(b_ft, 3.0) / 12.0 }
    cite "AASHTO LRFD 9th ed. 6.10.2.2" what "tension flange about the vertical axis"
}

impl<'a> Pressed<'a> {
    /// The section with that edge in compression.
    ///
    /// # Errors
    /// When an axis lies outside the web: the section is no I-section in bending then.
    pub fn of<R: Recorder>(rec: &mut R, section: &Effective<'a>, edge: Edge) -> Result<Self, Problem> {
        let p = &section.plates;
        let (b_fc, t_fc, b_ft, t_ft, s_xc, s_xt) = match edge {
            Edge::Top => {
                (p.b_top, p.t_top, p.b_bottom, p.t_bottom, section.left.s_top, section.left.s_bottom)
            }
            Edge::Bottom => {
                (p.b_bottom, p.t_bottom, p.b_top, p.t_top, section.left.s_bottom, section.left.s_top)
            }
        };
        let (path_c, path_t) = match edge {
            Edge::Top => (section.paths.top, section.paths.bottom),
            Edge::Bottom => (section.paths.bottom, section.paths.top),
        };
        let (d_c, d_cp) = match edge {
            Edge::Top => (
                web_pressed_top(rec, p.t_bottom, p.web_depth, section.y),
                web_plastic_top(rec, section.plastic_y),
            ),
            Edge::Bottom => (
                web_pressed_bottom(rec, p.t_bottom, section.y),
                web_plastic_bottom(rec, p.web_depth, section.plastic_y),
            ),
        };
        if d_c.q <= Length::ZERO || d_c.q >= p.web_depth.q {
            return Err(Problem::error(
                path_c,
                "one flange outweighs the other so far that the neutral axis leaves the web",
                "check the flanges; a section like this needs its own study",
            ));
        }
        let h = between_flanges(rec, p.web_depth, t_fc, t_ft);
        Ok(Self { path_c, path_t, b_fc, t_fc, b_ft, t_ft, s_xc, s_xt, d_c, d_cp, h })
    }
}
