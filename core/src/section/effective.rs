//! The steel section at a station: sound, and what is left of it.
//!
//! A rolled shape taken as published keeps the properties of its table, which contain the fillets;
//! loss is then taken off as strips: flange loss from the outer face, web loss evenly over its
//! depth. So a section without loss gives the table's figures exactly, and a section with loss
//! differs from them by what is gone. Plates as measured add up as three rectangles, without welds.
//! Widths are those of the sound section.

use crate::clause;
use crate::problem::Problem;
use crate::quantity::{Area, Inertia, Length, Modulus, Quantity};
use crate::section::parts::{Own, Part, Totals, compose, gone_area, rectangle_area};
use crate::section::plastic::{Plastic, Plates, plastic};
use crate::section::plate::{IShape, Left, Published};
use crate::units::Entered;
use crate::units::mark::{In2, In3, In4, Inch};
use crate::worksheet::{Recorder, Val};

/// Top or bottom edge of a section.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Edge {
    /// The top flange.
    Top,
    /// The bottom flange.
    Bottom,
}

/// Thickness left at a station, each on its line; `None` where no finding tells: as sound.
#[derive(Clone, Copy, Debug, Default)]
pub struct Remains<'a> {
    /// Top flange, mean.
    pub top: Option<Val<Length>>,
    /// Bottom flange, mean.
    pub bottom: Option<Val<Length>>,
    /// Web, mean over its height.
    pub web: Option<Val<Length>>,
    /// Path of the finding, for messages.
    pub path: &'a str,
}

impl Remains<'_> {
    /// From plain values; a plate that is as thick as the sound one is as sound.
    pub fn of<R: Recorder>(rec: &mut R, shape: &IShape, left: &Left) -> Self {
        let mut told = |symbol, what, left: Length, sound: Length| {
            (left != sound).then(|| {
                rec.look_up(symbol, what, left, Inch, "findings", || "readings at this station".to_owned())
            })
        };
        Self {
            top: told("t_top", "top flange left", left.top, shape.top.thickness.value),
            bottom: told("t_bot", "bottom flange left", left.bottom, shape.bottom.thickness.value),
            web: told("t_w", "web left, mean", left.web, shape.web.value),
            path: "",
        }
    }
}

/// Properties about the strong axis.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Properties {
    /// Area.
    pub area: Val<Area>,
    /// Second moment of area.
    pub inertia: Val<Inertia>,
    /// Elastic modulus at the top edge.
    pub s_top: Val<Modulus>,
    /// Elastic modulus at the bottom edge.
    pub s_bottom: Val<Modulus>,
    /// Plastic modulus.
    pub plastic: Val<Modulus>,
}

/// The steel section at a station.
#[derive(Clone, Copy, Debug)]
pub struct Effective<'a> {
    /// What was entered.
    pub shape: &'a IShape,
    /// Out-to-out depth of what is left.
    pub depth: Val<Length>,
    /// Height of the sound top face, on which the haunch sits, above the bottom face that is left.
    pub seat: Val<Length>,
    /// The plates that are left.
    pub plates: Plates,
    /// Height of the elastic centroid above the bottom face of what is left.
    pub y: Val<Length>,
    /// Depth of the plastic neutral axis of the steel alone below the top of the web.
    pub plastic_y: Val<Length>,
    /// What is left.
    pub left: Properties,
    /// The same before the loss, where there is loss.
    pub sound: Option<Properties>,
    /// Outer face of the bottom flange to the toe of the fillet, of what is left.
    pub fillet: Val<Length>,
    /// Where to look when a plate lies outside the formulas.
    pub paths: Paths<'a>,
}

/// Path of the field that each thickness comes from: the finding's where one tells, else the
/// member's.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub struct Paths<'a> {
    /// Of the top flange.
    pub top: &'a str,
    /// Of the web.
    pub web: &'a str,
    /// Of the bottom flange.
    pub bottom: &'a str,
}

impl<'a> Paths<'a> {
    fn of(shape: &'a IShape, remains: &Remains<'a>) -> Self {
        let told = |left: Option<Val<Length>>, entry: &'a Entered<Length>| {
            if left.is_some() && !remains.path.is_empty() { remains.path } else { entry.path.as_str() }
        };
        Self {
            top: told(remains.top, &shape.top.thickness),
            web: told(remains.web, &shape.web),
            bottom: told(remains.bottom, &shape.bottom.thickness),
        }
    }
}

clause! {
    /// Depth of the web between the flanges, in. W36x150 (35.85, 0.94): 33.97 in.
    pub fn web_depth(d: Length [Inch], t_top: Length [Inch], t_bot: Length [Inch])
    -> D: Length [Inch] { d - t_top - t_bot }
    cite "geometry" what "depth of the web"
}

clause! {
    /// Centroid of a section with two equal flanges, in.
    pub fn half_depth(d: Length [Inch]) -> y: Length [Inch] { d / 2.0 }
    cite "symmetry" what "height of the centroid above the bottom face"
}

clause! {
    /// Height of the centroid of the top flange above the bottom face, in.
    pub fn top_flange_height(d: Length [Inch], t_top: Length [Inch]) -> y_top: Length [Inch]
    { d - t_top / 2.0 }
    cite "geometry" what "height of the top flange, or of what is gone of its top"
}

clause! {
    /// Height of the centroid of the web above the bottom face, in.
    pub fn web_height(t_bot: Length [Inch], D: Length [Inch]) -> y_w: Length [Inch] { t_bot + D / 2.0 }
    cite "geometry" what "height of the web"
}

clause! {
    /// Height of the centroid of the bottom flange above the bottom face, in.
    pub fn bottom_flange_height(t_bot: Length [Inch]) -> y_bot: Length [Inch] { t_bot / 2.0 }
    cite "geometry" what "height of the bottom flange, or of what is gone of its bottom"
}

clause! {
    /// Elastic modulus at the top edge, in3.
    pub fn modulus_top(I: Inertia [In4], d: Length [Inch], y: Length [Inch]) -> S_top: Modulus [In3]
    { I / (d - y) }
    cite "mechanics" what "elastic modulus at the top edge"
}

clause! {
    /// Elastic modulus at the bottom edge, in3.
    pub fn modulus_bottom(I: Inertia [In4], y: Length [Inch]) -> S_bot: Modulus [In3] { I / y }
    cite "mechanics" what "elastic modulus at the bottom edge"
}

clause! {
    /// A shape with loss never has more than its table says of the sound one, in3: `I` and `S` of a
    /// table are rounded apart, by up to 0.3 %.
    pub fn modulus_capped(S_left: Modulus [In3], S_table: Modulus [In3]) -> S: Modulus [In3]
    { min(S_left, S_table) }
    cite "mechanics" what "elastic modulus, not above that of the table"
}

clause! {
    /// What is gone of a plate, in; a reading above the sound thickness is no gain.
    pub fn lost(t: Length [Inch], t_left: Length [Inch]) -> delta: Length [Inch] { max(t - t_left, 0.0) }
    cite "geometry" what "thickness gone"
}

clause! {
    /// Thickness that is counted, in: what is left, and never more than the sound plate.
    pub fn counted(t: Length [Inch], delta: Length [Inch]) -> t_left: Length [Inch] { t - delta }
    cite "geometry" what "thickness left"
}

clause! {
    /// Depth of what is left, in.
    pub fn depth_left(d: Length [Inch], delta_top: Length [Inch], delta_bot: Length [Inch])
    -> d_left: Length [Inch] { d - delta_top - delta_bot }
    cite "geometry" what "depth of what is left"
}

clause! {
    /// From heights above the sound bottom face to heights above the face that is left, in.
    pub fn height_left(y: Length [Inch], delta_bot: Length [Inch]) -> y_left: Length [Inch]
    { y - delta_bot }
    cite "geometry" what "height above the bottom face that is left"
}

clause! {
    /// Plastic modulus of a published shape with loss, in3. The fillets that the table contains are
    /// equal above and below, so they do not move the axis and keep their share while the axis lies
    /// between them.
    pub fn plastic_left(Z_table: Modulus [In3], Z_sound: Modulus [In3], Z_left: Modulus [In3])
    -> Z: Modulus [In3] { Z_table - (Z_sound - Z_left) }
    cite "mechanics" what "plastic modulus: of the table, less what the plates lose"
}

/// A size that can be a plate: finite and above nothing.
fn sized(entry: &Entered<Length>, what: &str) -> Result<(), Problem> {
    let base = entry.value.base();
    if base > 0.0 && base.is_finite() {
        Ok(())
    } else {
        Err(Problem::error(
            entry.path.clone(),
            format!("{what} must be more than nothing"),
            "measure it again",
        ))
    }
}

/// The sound section: its plates and properties, and its centroid above the bottom face.
struct Sound {
    d: Val<Length>,
    plates: Plates,
    totals: Totals,
    properties: Properties,
    plastic: Plastic,
}

impl Sound {
    fn read<R: Recorder>(rec: &mut R, shape: &IShape) -> Result<Self, Problem> {
        for (entry, what) in [
            (&shape.depth, "the depth"),
            (&shape.top.width, "the width of the top flange"),
            (&shape.top.thickness, "the thickness of the top flange"),
            (&shape.bottom.width, "the width of the bottom flange"),
            (&shape.bottom.thickness, "the thickness of the bottom flange"),
            (&shape.web, "the thickness of the web"),
            (&shape.fillet, "the distance to the toe of the fillet"),
        ] {
            sized(entry, what)?;
        }
        let d = rec.given("d", "depth", &shape.depth, Inch);
        let b_top = rec.given("b_top", "width of the top flange", &shape.top.width, Inch);
        let t_top = rec.given("t_top", "thickness of the top flange", &shape.top.thickness, Inch);
        let b_bottom = rec.given("b_bot", "width of the bottom flange", &shape.bottom.width, Inch);
        let t_bottom = rec.given("t_bot", "thickness of the bottom flange", &shape.bottom.thickness, Inch);
        let t_w = rec.given("t_w", "thickness of the web", &shape.web, Inch);
        let depth = web_depth(rec, d, t_top, t_bottom);
        if depth.q <= Length::ZERO {
            return Err(Problem::error(
                shape.depth.path.clone(),
                "the flanges are thicker than the depth",
                "compare the depth with the thickness of the flanges",
            ));
        }
        let top = rectangle_area(rec, b_top, t_top);
        let web = rectangle_area(rec, depth, t_w);
        let bottom = rectangle_area(rec, b_bottom, t_bottom);
        let plates = Plates { b_top, t_top, web_depth: depth, t_w, b_bottom, t_bottom, top, web, bottom };
        match &shape.published {
            Some(table) => Ok(Self::published(rec, d, plates, table)),
            None => Ok(Self::of_plates(rec, d, plates)),
        }
    }

    fn published<R: Recorder>(rec: &mut R, d: Val<Length>, plates: Plates, table: &Published) -> Self {
        let row = || table.name.to_owned();
        let area = rec.look_up("A", "area", table.area, In2, table.source, row);
        let inertia = rec.look_up("I", "second moment of area", table.inertia, In4, table.source, row);
        let s = rec.look_up("S", "elastic modulus", table.elastic, In3, table.source, row);
        let z = rec.look_up("Z", "plastic modulus", table.plastic, In3, table.source, row);
        let y = half_depth(rec, d);
        let plastic = plastic(rec, &plates);
        Self {
            d,
            plates,
            totals: Totals { area, y, inertia },
            properties: Properties { area, inertia, s_top: s, s_bottom: s, plastic: z },
            plastic,
        }
    }

    fn of_plates<R: Recorder>(rec: &mut R, d: Val<Length>, plates: Plates) -> Self {
        let y_top = top_flange_height(rec, d, plates.t_top);
        let y_web = web_height(rec, plates.t_bottom, plates.web_depth);
        let y_bottom = bottom_flange_height(rec, plates.t_bottom);
        let part = |what, area, y, b, t| Part { what, area, y, own: Own::Rectangle { b, t } };
        let totals = compose(
            rec,
            [
                part("top flange", plates.top, y_top, plates.b_top, plates.t_top),
                part("web", plates.web, y_web, plates.t_w, plates.web_depth),
                part("bottom flange", plates.bottom, y_bottom, plates.b_bottom, plates.t_bottom),
            ],
        );
        let s_top = modulus_top(rec, totals.inertia, d, totals.y);
        let s_bottom = modulus_bottom(rec, totals.inertia, totals.y);
        let plastic = plastic(rec, &plates);
        let properties = Properties {
            area: totals.area,
            inertia: totals.inertia,
            s_top,
            s_bottom,
            plastic: plastic.modulus,
        };
        Self { d, plates, totals, properties, plastic }
    }
}

/// What is gone of one plate and what is left of it, in that order.
fn wear<R: Recorder>(
    rec: &mut R,
    sound: Val<Length>,
    left: Option<Val<Length>>,
    what: &str,
    path: &str,
) -> Result<(Val<Length>, Val<Length>), Problem> {
    let Some(left) = left else {
        let none = rec.look_up("delta", "nothing gone", Length::ZERO, Inch, "findings", || what.to_owned());
        return Ok((none, sound));
    };
    if !(left.q.base() > 0.0 && left.q.base().is_finite()) {
        return Err(Problem::error(
            path,
            format!("nothing is left of {what}: there is no method for that"),
            "enter the thickness that is left, or have the girder looked at for repair",
        ));
    }
    let gone = lost(rec, sound, left);
    Ok((gone, counted(rec, sound, gone)))
}

impl<'a> Effective<'a> {
    /// The section at a station with the thickness left there.
    ///
    /// # Errors
    /// When a size is nothing or not finite, when the flanges are thicker than the depth, or when
    /// nothing is left of a plate.
    pub fn at<R: Recorder>(rec: &mut R, shape: &'a IShape, remains: &Remains<'a>) -> Result<Self, Problem> {
        rec.heading("Section as sound");
        let sound = Sound::read(rec, shape)?;
        let fillet = rec.given("k", "outer face of the flange to the toe of the fillet", &shape.fillet, Inch);
        if remains.top.is_none() && remains.bottom.is_none() && remains.web.is_none() {
            return Ok(Self {
                shape,
                depth: sound.d,
                seat: sound.d,
                plates: sound.plates,
                y: sound.totals.y,
                plastic_y: sound.plastic.y,
                left: sound.properties,
                sound: None,
                fillet,
                paths: Paths::of(shape, remains),
            });
        }
        rec.heading("What is left of it");
        Self::worn(rec, shape, remains, &sound, fillet)
    }

    fn worn<R: Recorder>(
        rec: &mut R,
        shape: &'a IShape,
        remains: &Remains<'a>,
        sound: &Sound,
        fillet: Val<Length>,
    ) -> Result<Self, Problem> {
        let p = &sound.plates;
        let (gone_top, t_top) = wear(rec, p.t_top, remains.top, "the top flange", remains.path)?;
        let (gone_bottom, t_bottom) =
            wear(rec, p.t_bottom, remains.bottom, "the bottom flange", remains.path)?;
        let (gone_web, t_w) = wear(rec, p.t_w, remains.web, "the web", remains.path)?;

        let gone = |what, area, y, b, t| Part { what, area, y, own: Own::Gone { b, t } };
        let area_top = gone_area(rec, p.b_top, gone_top);
        let area_web = gone_area(rec, p.web_depth, gone_web);
        let area_bottom = gone_area(rec, p.b_bottom, gone_bottom);
        let y_top = top_flange_height(rec, sound.d, gone_top);
        let y_web = web_height(rec, p.t_bottom, p.web_depth);
        let y_bottom = bottom_flange_height(rec, gone_bottom);
        let totals = compose(
            rec,
            [
                Part {
                    what: "sound section",
                    area: sound.totals.area,
                    y: sound.totals.y,
                    own: Own::Known(sound.totals.inertia),
                },
                gone("gone of the top flange", area_top, y_top, p.b_top, gone_top),
                gone("gone of the web", area_web, y_web, gone_web, p.web_depth),
                gone("gone of the bottom flange", area_bottom, y_bottom, p.b_bottom, gone_bottom),
            ],
        );
        let depth = depth_left(rec, sound.d, gone_top, gone_bottom);
        let y = height_left(rec, totals.y, gone_bottom);
        let mut s_top = modulus_top(rec, totals.inertia, depth, y);
        let mut s_bottom = modulus_bottom(rec, totals.inertia, y);
        if shape.published.is_some() {
            s_top = modulus_capped(rec, s_top, sound.properties.s_top);
            s_bottom = modulus_capped(rec, s_bottom, sound.properties.s_bottom);
        }

        let top = rectangle_area(rec, p.b_top, t_top);
        let web = rectangle_area(rec, p.web_depth, t_w);
        let bottom = rectangle_area(rec, p.b_bottom, t_bottom);
        let plates = Plates { t_top, t_bottom, t_w, top, web, bottom, ..*p };
        let plastic = plastic(rec, &plates);
        let z = if shape.published.is_some() && plastic.in_web {
            plastic_left(rec, sound.properties.plastic, sound.plastic.modulus, plastic.modulus)
        } else {
            plastic.modulus
        };
        Ok(Self {
            shape,
            depth,
            seat: height_left(rec, sound.d, gone_bottom),
            plates,
            y,
            plastic_y: plastic.y,
            left: Properties { area: totals.area, inertia: totals.inertia, s_top, s_bottom, plastic: z },
            sound: Some(sound.properties),
            fillet: counted(rec, fillet, gone_bottom),
            paths: Paths::of(shape, remains),
        })
    }

    /// Whether it is a rolled shape, which the standard asks less of than of welded plates.
    #[must_use]
    pub fn is_rolled(&self) -> bool {
        self.shape.published.is_some()
    }
}
