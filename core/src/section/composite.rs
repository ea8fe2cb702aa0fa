//! Steel and slab together: the slab counts as steel of a width divided by the modular ratio.
//!
//! Heights run upward from the bottom face of the steel that is left. The haunch has height but no
//! area; slab reinforcement is left out. Elastic stresses add stage by stage: bare steel, long-term,
//! short-term.

use crate::clause;
use crate::problem::Problem;
use crate::quantity::{Area, Inertia, Length, Modulus, Moment, Quantity, Stress};
use crate::section::effective::Effective;
use crate::section::parts::{Own, Part, compose};
use crate::units::mark::{In2, In3, In4, Inch, KipIn, Ksi, One};
use crate::worksheet::{Recorder, Val};

/// The slab that works with one girder.
#[derive(Clone, Copy, Debug)]
pub struct Slab<'a> {
    /// Effective width.
    pub b_e: Val<Length>,
    /// Structural thickness.
    pub t_s: Val<Length>,
    /// Haunch: from the top of the sound flange to the soffit.
    pub haunch: Val<Length>,
    /// Strength of its concrete.
    pub f_c: Val<Stress>,
    /// Modular ratio for load that passes.
    pub n: Val<f64>,
    /// Modular ratio for load that stays.
    pub n_long: Val<f64>,
    /// Path of the slab in the document, for messages.
    pub path: &'a str,
}

/// Steel and slab transformed with one modular ratio.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Transformed {
    /// Modular ratio.
    pub n: Val<f64>,
    /// Transformed area.
    pub area: Val<Area>,
    /// Height of the neutral axis.
    pub y: Val<Length>,
    /// Second moment of area.
    pub inertia: Val<Inertia>,
    /// Distance of the top of the steel above the axis; negative where the axis lies higher.
    pub to_top: Val<Length>,
    /// Distance of the top of the slab above the axis.
    pub to_slab: Val<Length>,
}

/// The composite section at a station.
#[derive(Clone, Copy, Debug)]
pub struct Composite<'a> {
    /// Its steel.
    pub steel: &'a Effective<'a>,
    /// Its slab.
    pub slab: Slab<'a>,
    /// Gap between the soffit of the slab and the top of the flange that is left.
    pub gap: Val<Length>,
    /// From the top of the slab to the bottom of the steel that is left.
    pub total_depth: Val<Length>,
    /// With the modular ratio for load that passes.
    pub short: Transformed,
    /// With the modular ratio for load that stays.
    pub long: Transformed,
}

/// Moments by stages.
#[derive(Clone, Copy, Debug)]
pub struct Stages {
    /// On the bare steel.
    pub bare: Val<Moment>,
    /// On the long-term composite section.
    pub long: Val<Moment>,
    /// On the short-term composite section.
    pub short: Val<Moment>,
}

/// Stresses of the stages and their sum at one edge.
#[derive(Clone, Copy, Debug)]
pub struct EdgeStress {
    /// Of the bare stage.
    pub bare: Val<Stress>,
    /// Of the long-term stage.
    pub long: Val<Stress>,
    /// Of the short-term stage.
    pub short: Val<Stress>,
    /// Together.
    pub sum: Val<Stress>,
}

clause! {
    /// Height of the middle of the slab above the bottom face, in.
    pub fn slab_height(seat: Length [Inch], haunch: Length [Inch], t_s: Length [Inch])
    -> y_s: Length [Inch] { seat + haunch + t_s / 2.0 }
    cite "geometry" what "height of the middle of the slab"
}

clause! {
    /// From the top of the slab to the bottom of the steel, in.
    pub fn total_depth(seat: Length [Inch], haunch: Length [Inch], t_s: Length [Inch])
    -> D_t: Length [Inch] { seat + haunch + t_s }
    cite "geometry" what "depth of the composite section"
}

clause! {
    /// Gap between the soffit and the top of the flange that is left, in.
    pub fn gap(seat: Length [Inch], haunch: Length [Inch], d: Length [Inch]) -> gap: Length [Inch]
    { seat + haunch - d }
    cite "geometry" what "gap between soffit and top of the flange"
}

clause! {
    /// Area of the slab as steel, in2. 88 in by 7.25 in with n 9: 70.9 in2.
    pub fn transformed_area(b_e: Length [Inch], t_s: Length [Inch], n: f64 [One]) -> A_s: Area [In2]
    { b_e * t_s / n }
    cite "mechanics" what "area of the slab as steel"
}

clause! {
    /// Second moment of area of the slab as steel about its own middle, in4.
    pub fn transformed_inertia(b_e: Length [Inch], t_s: Length [Inch], n: f64 [One])
    -> I_s: Inertia [In4] { b_e * pow(t_s, 3.0) / (12.0 * n) }
    cite "mechanics" what "slab as steel about its own middle"
}

clause! {
    /// Distance of the top of the steel above the neutral axis, in.
    pub fn distance_top(d: Length [Inch], y: Length [Inch]) -> c_top: Length [Inch] { d - y }
    cite "geometry" what "top of the steel above the neutral axis"
}

clause! {
    /// Distance of the top of the slab above the neutral axis, in.
    pub fn distance_slab(D_t: Length [Inch], y: Length [Inch]) -> c_slab: Length [Inch] { D_t - y }
    cite "geometry" what "top of the slab above the neutral axis"
}

clause! {
    /// Stress on the bare steel, ksi.
    pub fn bare_stress(M: Moment [KipIn], S: Modulus [In3]) -> f: Stress [Ksi] { M / S }
    cite "mechanics" what "stress of the bare stage"
}

clause! {
    /// Stress of the steel at a distance from the neutral axis, ksi; negative on its other side.
    pub fn composite_stress(M: Moment [KipIn], c: Length [Inch], I: Inertia [In4]) -> f: Stress [Ksi]
    { M * c / I }
    cite "mechanics" what "stress of a composite stage"
}

clause! {
    /// Stress of the concrete at the top of the slab, ksi.
    pub fn slab_stress(M: Moment [KipIn], c_slab: Length [Inch], I: Inertia [In4], n: f64 [One])
    -> f: Stress [Ksi] { M * c_slab / (I * n) }
    cite "mechanics" what "stress of the concrete at the top of the slab"
}

fn transform<R: Recorder>(
    rec: &mut R,
    steel: &Effective,
    slab: &Slab,
    y_s: Val<Length>,
    depth: Val<Length>,
    n: Val<f64>,
) -> Transformed {
    let area = transformed_area(rec, slab.b_e, slab.t_s, n);
    let own = transformed_inertia(rec, slab.b_e, slab.t_s, n);
    let left = &steel.left;
    let totals = compose(
        rec,
        [
            Part { what: "steel", area: left.area, y: steel.y, own: Own::Known(left.inertia) },
            Part { what: "slab as steel", area, y: y_s, own: Own::Known(own) },
        ],
    );
    let to_top = distance_top(rec, steel.depth, totals.y);
    let to_slab = distance_slab(rec, depth, totals.y);
    Transformed { n, area: totals.area, y: totals.y, inertia: totals.inertia, to_top, to_slab }
}

impl<'a> Composite<'a> {
    /// Steel and slab at a station.
    ///
    /// # Errors
    /// When a size or a modular ratio of the slab is nothing, negative or not finite.
    pub fn of<R: Recorder>(rec: &mut R, steel: &'a Effective<'a>, slab: Slab<'a>) -> Result<Self, Problem> {
        rec.heading("Composite section");
        let sizes = [slab.b_e.q.base(), slab.t_s.q.base(), slab.f_c.q.base(), slab.n.q, slab.n_long.q];
        let haunch = slab.haunch.q.base();
        if sizes.iter().any(|s| !(*s > 0.0 && s.is_finite())) || !(haunch >= 0.0 && haunch.is_finite()) {
            return Err(Problem::error(
                slab.path,
                "the slab needs a width, a thickness, a strength and a haunch that is not negative",
                "check the deck's entries",
            ));
        }
        let y_s = slab_height(rec, steel.seat, slab.haunch, slab.t_s);
        let depth = total_depth(rec, steel.seat, slab.haunch, slab.t_s);
        let gap = gap(rec, steel.seat, slab.haunch, steel.depth);
        rec.heading("Transformed for load that passes");
        let short = transform(rec, steel, &slab, y_s, depth, slab.n);
        rec.heading("Transformed for load that stays");
        let long = transform(rec, steel, &slab, y_s, depth, slab.n_long);
        Ok(Self { steel, slab, gap, total_depth: depth, short, long })
    }

    /// Stresses at the bottom of the steel: tension positive.
    pub fn bottom_stress<R: Recorder>(&self, rec: &mut R, m: &Stages) -> EdgeStress {
        let bare = bare_stress(rec, m.bare, self.steel.left.s_bottom);
        let long = composite_stress(rec, m.long, self.long.y, self.long.inertia);
        let short = composite_stress(rec, m.short, self.short.y, self.short.inertia);
        Self::add(rec, "stress at the bottom of the steel", bare, long, short)
    }

    /// Stresses at the top of the steel: compression positive.
    pub fn top_stress<R: Recorder>(&self, rec: &mut R, m: &Stages) -> EdgeStress {
        let bare = bare_stress(rec, m.bare, self.steel.left.s_top);
        let long = composite_stress(rec, m.long, self.long.to_top, self.long.inertia);
        let short = composite_stress(rec, m.short, self.short.to_top, self.short.inertia);
        Self::add(rec, "stress at the top of the steel", bare, long, short)
    }

    /// Stress of the concrete at the top of the slab, compression positive: everything that came
    /// after the slab hardened, on the short-term section.
    pub fn slab_stress<R: Recorder>(&self, rec: &mut R, m: &Stages) -> Val<Stress> {
        let of = |rec: &mut R, moment| {
            slab_stress(rec, moment, self.short.to_slab, self.short.inertia, self.short.n)
        };
        let long = of(rec, m.long);
        let short = of(rec, m.short);
        rec.sum("f", "stress at the top of the slab", &[("later dead load", long), ("live load", short)], Ksi)
    }

    fn add<R: Recorder>(
        rec: &mut R,
        what: &str,
        bare: Val<Stress>,
        long: Val<Stress>,
        short: Val<Stress>,
    ) -> EdgeStress {
        let sum =
            rec.sum("f", what, &[("bare steel", bare), ("long-term", long), ("short-term", short)], Ksi);
        EdgeStress { bare, long, short, sum }
    }
}
