//! Dead load of a girder line, taken off from measured layers, strips and the girder itself.
//!
//! Kept apart by stage: DC1, components that the bare girder carries (its own steel, the slab, the
//! haunch, strips that came with the wet slab); DC2, components that came later; DW, wearing surface
//! and utilities. Every row is a line that can be checked by hand. Loads are uniform along the span.

use super::across::Across;
use crate::bridge::{Bridge, Layer, Stage, Strip, StripSide};
use crate::clause;
use crate::quantity::{Area, Force, Length, LineLoad, Moment, UnitWeight};
use crate::units::mark::{Ft, In2, Inch, Kcf, Kip, KipFt, KipPerFt, One};
use crate::units::{Entered, Provenance};
use crate::worksheet::{Recorder, Val};

/// How a load that came after the slab is shared out.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Sharing {
    /// By the width of deck that a girder carries; a strip along an edge goes to the outer girder.
    Tributary,
    /// Equally among all girders.
    Equal,
}

/// The choices of a rule set for the take-off.
#[derive(Clone, Debug, PartialEq)]
pub struct TakeOff {
    /// Unit weight of structural steel.
    pub steel: Entered<UnitWeight>,
    /// Sharing of strips that came after the slab had hardened.
    pub later: Sharing,
    /// Sharing of wearing surface and utilities.
    pub surface: Sharing,
    /// Clause that allows the sharing, for the worksheet.
    pub cite: &'static str,
}

/// Uniform dead load of one girder line by stage.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct DeadLoad {
    /// Components on the bare girder.
    pub dc1: Val<LineLoad>,
    /// Components that came after the slab had hardened.
    pub dc2: Val<LineLoad>,
    /// Wearing surface and utilities together.
    pub dw: Val<LineLoad>,
    /// The part of `dw` that is a wearing surface whose thickness was measured on this bridge.
    pub dw_measured: Val<LineLoad>,
    /// The part of `dw` that is not: other layers, utilities, planned overlays.
    pub dw_other: Val<LineLoad>,
    /// Readings of thickness behind `dw_measured`: the fewest that a measured layer has; 0 without one.
    pub readings: usize,
}

/// Unit weight of structural steel, 0.490 kcf (AASHTO LRFD table 3.5.1-1, from memory, 9th edition).
#[must_use]
pub fn steel_weight() -> Entered<UnitWeight> {
    Entered::assumed(
        "",
        UnitWeight::from_kcf(0.490),
        "structural steel 0.490 kcf (AASHTO LRFD table 3.5.1-1, from memory, 9th edition)",
    )
}

/// Takes off the dead load of a girder line.
///
/// `area` is the area of the girder's steel section. Slab and haunch go by tributary width; layers lie
/// on the roadway alone, so a girder outside the curb carries less of them.
pub fn take_off<R: Recorder>(
    rec: &mut R,
    bridge: &Bridge,
    across: &Across,
    line: usize,
    area: Val<Area>,
    rules: &TakeOff,
) -> DeadLoad {
    let strip = across.strip(rec, line);
    let b = width(rec, strip.1, strip.0);
    let on = Placed { bridge, across, line, strip, rules };
    let dc1 = bare(rec, &on, b, area);
    let dc2 = later(rec, &on);
    let (dw_measured, dw_other, readings) = surface(rec, &on);
    let dw = rec.sum(
        "DW",
        "wearing surface and utilities",
        &[("wearing surface, measured", dw_measured), ("not measured, and utilities", dw_other)],
        KipPerFt,
    );
    DeadLoad { dc1, dc2, dw, dw_measured, dw_other, readings }
}

/// What the parts of a take-off look at.
struct Placed<'a> {
    bridge: &'a Bridge,
    across: &'a Across,
    line: usize,
    strip: (Val<Length>, Val<Length>),
    rules: &'a TakeOff,
}

fn bare<R: Recorder>(rec: &mut R, on: &Placed<'_>, b: Val<Length>, area: Val<Area>) -> Val<LineLoad> {
    let deck = &on.bridge.deck;
    let steel = rec.given("gamma_s", "unit weight of steel", &on.rules.steel, Kcf);
    let own = girder_weight(rec, area, steel);
    let gamma = rec.given("gamma", "unit weight of reinforced concrete", &deck.concrete.unit_weight, Kcf);
    let t = rec.given("t", "thickness of the slab", &deck.slab, Inch);
    let slab = layer_weight(rec, t, b, gamma);
    let t_h = rec.given("t", "thickness of the haunch", &deck.haunch, Inch);
    let b_h = rec.given("b", "width of the haunch", &deck.haunch_width, Ft);
    let haunch = layer_weight(rec, t_h, b_h, gamma);
    let mut rows = vec![("girder", own), ("slab", slab), ("haunch", haunch)];
    for strip in deck.strips.iter().filter(|strip| strip.stage == Stage::Bare) {
        rows.push((strip.name.as_str(), strip_share(rec, on, strip, Sharing::Tributary)));
    }
    rec.sum("DC1", "components on the bare girder", &rows, KipPerFt)
}

fn later<R: Recorder>(rec: &mut R, on: &Placed<'_>) -> Val<LineLoad> {
    let mut rows = Vec::new();
    for strip in on.bridge.deck.strips.iter().filter(|strip| strip.stage == Stage::Later) {
        rows.push((strip.name.as_str(), strip_share(rec, on, strip, on.rules.later)));
    }
    rec.sum("DC2", "components that came after the slab had hardened", &rows, KipPerFt)
}

fn surface<R: Recorder>(rec: &mut R, on: &Placed<'_>) -> (Val<LineLoad>, Val<LineLoad>, usize) {
    let deck = &on.bridge.deck;
    let mut measured = Vec::new();
    let mut other = Vec::new();
    let mut readings = usize::MAX;
    if !deck.layers.is_empty() {
        let b = match on.rules.surface {
            Sharing::Tributary => {
                let (y_l, y_r) = on.strip;
                roadway_over(rec, y_l, y_r, on.across.curb, on.across.roadway)
            }
            Sharing::Equal => {
                let n_b = girders(rec, on);
                rec.remark(|| {
                    format!("The wearing surface is shared equally among the girders: {}", on.rules.cite)
                });
                roadway_each(rec, on.across.roadway, n_b)
            }
        };
        for layer in &deck.layers {
            let t = rec.given("t", &format!("thickness of {}", layer.name), &layer.thickness, Inch);
            let gamma =
                rec.given("gamma", &format!("unit weight of {}", layer.name), &layer.unit_weight, Kcf);
            let row = (layer.name.as_str(), layer_weight(rec, t, b, gamma));
            if is_measured(layer) {
                readings = readings.min(layer.thickness.readings.len());
                measured.push(row);
            } else {
                other.push(row);
            }
        }
    }
    for strip in deck.strips.iter().filter(|strip| strip.stage == Stage::Surface) {
        other.push((strip.name.as_str(), strip_share(rec, on, strip, on.rules.surface)));
    }
    let dw_measured =
        rec.sum("DW_m", "wearing surface, thickness measured on this bridge", &measured, KipPerFt);
    let dw_other = rec.sum("DW_o", "wearing surface not measured, and utilities", &other, KipPerFt);
    (dw_measured, dw_other, if measured.is_empty() { 0 } else { readings })
}

/// Whether a layer's thickness was measured on this bridge: read, not taken from a drawing.
fn is_measured(layer: &Layer) -> bool {
    layer.thickness.provenance == Provenance::Measured && !layer.thickness.readings.is_empty()
}

/// What a girder line carries of a strip along the deck.
fn strip_share<R: Recorder>(rec: &mut R, on: &Placed<'_>, strip: &Strip, sharing: Sharing) -> Val<LineLoad> {
    let w_s = rec.given("w_s", &format!("weight of one {}", strip.name), &strip.weight, KipPerFt);
    let last = on.across.girders.len() - 1;
    let both = strip.side == StripSide::Both;
    let along = |rec: &mut R, count: usize| {
        rec.found("n_s", "strips that count", count as f64, One, 0.0, || match strip.side {
            StripSide::Left => "one along the left edge".to_owned(),
            StripSide::Right => "one along the right edge".to_owned(),
            StripSide::Both => "one along either edge".to_owned(),
        })
    };
    match sharing {
        Sharing::Equal => {
            let n_s = along(rec, if both { 2 } else { 1 });
            let n_b = girders(rec, on);
            rec.remark(|| format!("{} is shared equally among the girders: {}", strip.name, on.rules.cite));
            equal_share(rec, w_s, n_s, n_b)
        }
        Sharing::Tributary => {
            let left = on.line == 0 && (both || strip.side == StripSide::Left);
            let right = on.line == last && (both || strip.side == StripSide::Right);
            let n_s = along(rec, usize::from(left) + usize::from(right));
            edge_share(rec, w_s, n_s)
        }
    }
}

fn girders<R: Recorder>(rec: &mut R, on: &Placed<'_>) -> Val<f64> {
    rec.found("N_b", "number of girder lines", on.across.girders.len() as f64, One, 0.0, || {
        "counted".to_owned()
    })
}

clause! {
    /// Width of deck that a girder carries.
    fn width(y_r: Length [Ft], y_l: Length [Ft]) -> b: Length [Ft] { y_r - y_l }
    cite "tributary width" what "width of deck that the girder carries"
}

clause! {
    /// Width of roadway within the strip that a girder carries; nothing where no roadway lies over it.
    fn roadway_over(y_l: Length [Ft], y_r: Length [Ft], c: Length [Ft], w: Length [Ft]) -> b: Length [Ft]
    { max(0.0, min(y_r, c + w) - max(y_l, c)) }
    cite "tributary width" what "width of roadway over the strip that the girder carries"
}

clause! {
    /// Width of roadway for each girder where it is shared equally.
    fn roadway_each(w: Length [Ft], N_b: f64 [One]) -> b: Length [Ft] { w / N_b }
    cite "equal shares" what "width of roadway for each girder"
}

clause! {
    /// Weight of a layer on a length.
    fn layer_weight(t: Length [Inch], b: Length [Ft], gamma: UnitWeight [Kcf]) -> w: LineLoad [KipPerFt]
    { t / 12.0 * b * gamma }
    cite "thickness x width x unit weight" what "weight of the layer on a length"
}

clause! {
    /// Weight of a girder on a length.
    fn girder_weight(A: Area [In2], gamma_s: UnitWeight [Kcf]) -> w: LineLoad [KipPerFt]
    { A / 144.0 * gamma_s }
    cite "area x unit weight" what "weight of the girder on a length"
}

clause! {
    /// Equal share of strips.
    fn equal_share(w_s: LineLoad [KipPerFt], n_s: f64 [One], N_b: f64 [One]) -> w: LineLoad [KipPerFt]
    { w_s * n_s / N_b }
    cite "equal shares" what "what each girder carries of it"
}

clause! {
    /// Strips along the edge beside a girder.
    fn edge_share(w_s: LineLoad [KipPerFt], n_s: f64 [One]) -> w: LineLoad [KipPerFt] { w_s * n_s }
    cite "tributary width" what "what the girder carries of it"
}

clause! {
    /// Moment at a station of a simple span under a uniform load.
    pub fn moment(w: LineLoad [KipPerFt], x: Length [Ft], L: Length [Ft]) -> M: Moment [KipFt]
    { w * x * (L - x) / 2.0 }
    cite "statics, simple span" what "moment of the uniform load"
}

clause! {
    /// Shear at a station of a simple span under a uniform load; positive near the first support.
    pub fn shear(w: LineLoad [KipPerFt], x: Length [Ft], L: Length [Ft]) -> V: Force [Kip]
    { w * (L / 2.0 - x) }
    cite "statics, simple span" what "shear of the uniform load"
}
