//! Dead load take-off: what each girder line carries, by stage, in rows that can be checked by hand.
//!
//! DC1 came onto the bare girder (its own weight, the slab by tributary width, the haunch), DC2 after
//! the slab had hardened (parapets, rails), DW is the wearing surface and utilities. Later loads are
//! shared by tributary width or equally, as the rule set says.

use crate::bridge::{Bridge, Layer, Stage, Strip, StripSide};
use crate::clause;
use crate::quantity::{Area, Length, LineLoad, UnitWeight};
use crate::units::mark::{Ft, Ft2, In2, Inch, KipPerFt, One, Pcf};
use crate::units::{Entered, Provenance};
use crate::worksheet::{Recorder, Val};

/// How loads added after the slab had hardened are shared out.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Sharing {
    /// Equally among the girders.
    Equal,
    /// By the width of deck that a girder carries; what stands at an edge goes to the outer girder.
    Tributary,
}

/// Dead load of one girder line.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct DeadLoad {
    /// Components on the bare girder.
    pub dc1: Val<LineLoad>,
    /// Components added later.
    pub dc2: Val<LineLoad>,
    /// Wearing surface and utilities.
    pub dw: Val<LineLoad>,
    /// Whether all of the wearing surface was measured on this bridge, and nothing else is in it.
    pub dw_measured: bool,
}

clause! {
    /// Weight of a girder from the area of its section; steel weighs 490 pcf.
    pub fn girder_weight(A: Area [In2], gamma_s: UnitWeight [Pcf]) -> w: LineLoad [KipPerFt]
    { A / 144.0 * gamma_s / 1000.0 }
    cite "geometry" what "weight of the girder"
}

clause! {
    /// Weight of a layer of uniform thickness on a width of deck.
    pub fn layer_weight(t: Length [Inch], b: Length [Ft], gamma: UnitWeight [Pcf]) -> w: LineLoad [KipPerFt]
    { t / 12.0 * b * gamma / 1000.0 }
    cite "geometry" what "weight of the layer on the girder"
}

clause! {
    /// Equal part of a layer over the whole roadway.
    pub fn layer_weight_shared(
        t: Length [Inch], b: Length [Ft], gamma: UnitWeight [Pcf], N_b: f64 [One],
    ) -> w: LineLoad [KipPerFt]
    { t / 12.0 * b * gamma / 1000.0 / N_b }
    cite "geometry; shared equally" what "weight of the layer on the girder"
}

clause! {
    /// Equal part of what stands along the deck.
    pub fn strip_weight_shared(n: f64 [One], w_1: LineLoad [KipPerFt], N_b: f64 [One])
        -> w: LineLoad [KipPerFt]
    { n * w_1 / N_b }
    cite "shared equally" what "weight of the strip on the girder"
}

clause! {
    /// Concrete in the haunch over one girder.
    pub fn haunch_area(t_h: Length [Inch], b_h: Length [Inch]) -> A_h: Area [Ft2]
    { t_h * b_h / 144.0 }
    cite "geometry" what "area of the haunch"
}

clause! {
    /// Weight of the haunch over one girder.
    pub fn haunch_weight(A_h: Area [Ft2], gamma: UnitWeight [Pcf]) -> w: LineLoad [KipPerFt]
    { A_h * gamma / 1000.0 }
    cite "geometry" what "weight of the haunch"
}

/// Unit weight of steel: 490 pcf.
fn steel<R: Recorder>(rec: &mut R) -> Val<UnitWeight> {
    rec.look_up(
        "gamma_s",
        "unit weight of steel",
        UnitWeight::from_pcf(490.0),
        Pcf,
        "AASHTO LRFD 9th ed. table 3.5.1-1 (0.490 kcf)",
        || "steel".to_owned(),
    )
}

/// Dead load of a girder line whose sound section has the area given.
pub fn take_off<R: Recorder>(
    rec: &mut R,
    bridge: &Bridge,
    line: usize,
    area: Val<Area>,
    sharing: Sharing,
) -> DeadLoad {
    rec.heading("Dead load taken off the measured layers");
    let dc1 = bare(rec, bridge, line, area);
    let dc2 = strips(rec, bridge, line, Stage::Later, sharing);
    let dc2 = total(rec, "w_DC2", "components added later", &dc2);
    let mut surface = Vec::new();
    for layer in &bridge.deck.layers {
        surface.push((layer.name.as_str(), of_layer(rec, bridge, line, layer, sharing)));
    }
    let utilities = strips(rec, bridge, line, Stage::Surface, sharing);
    let measured = utilities.is_empty()
        && bridge.deck.layers.iter().all(|l| l.thickness.provenance == Provenance::Measured);
    surface.extend(utilities);
    let dw = total(rec, "w_DW", "wearing surface and utilities", &surface);
    DeadLoad { dc1, dc2, dw, dw_measured: measured && !bridge.deck.layers.is_empty() }
}

fn total<R: Recorder>(
    rec: &mut R,
    symbol: &str,
    what: &str,
    parts: &[(&str, Val<LineLoad>)],
) -> Val<LineLoad> {
    rec.sum(symbol, what, parts, KipPerFt)
}

/// What came onto the bare girder.
fn bare<R: Recorder>(rec: &mut R, bridge: &Bridge, line: usize, area: Val<Area>) -> Val<LineLoad> {
    let deck = &bridge.deck;
    let gamma_s = steel(rec);
    let girder = girder_weight(rec, area, gamma_s);
    let b = tributary(rec, bridge, line);
    let gamma = rec.given("gamma", "unit weight of reinforced concrete", &deck.concrete.unit_weight, Pcf);
    let t = rec.given("t", "thickness of the slab", &deck.slab, Inch);
    let slab = layer_weight(rec, t, b, gamma);
    let t_h = rec.given("t_h", "thickness of the haunch", &deck.haunch, Inch);
    let b_h = rec.given("b_h", "width of the haunch", &deck.haunch_width, Inch);
    let a_h = haunch_area(rec, t_h, b_h);
    let haunch = haunch_weight(rec, a_h, gamma);
    let mut parts = vec![("girder", girder), ("slab", slab), ("haunch", haunch)];
    parts.extend(strips(rec, bridge, line, Stage::Bare, Sharing::Tributary));
    total(rec, "w_DC1", "components on the bare girder", &parts)
}

/// Width of deck that a line carries, on its line of the sheet.
fn tributary<R: Recorder>(rec: &mut R, bridge: &Bridge, line: usize) -> Val<Length> {
    let width = bridge.tributary(line);
    rec.found("b", "width of deck that the girder carries", width, Ft, 0.0, || {
        if bridge.is_exterior(line) {
            "half the spacing at the inner side and the overhang".to_owned()
        } else {
            "half the spacing at either side".to_owned()
        }
    })
}

/// A layer lies on the roadway only: to an outer girder goes the part of its width between the curbs.
fn of_layer<R: Recorder>(
    rec: &mut R,
    bridge: &Bridge,
    line: usize,
    layer: &Layer,
    sharing: Sharing,
) -> Val<LineLoad> {
    let t = rec.given("t", &layer.name, &layer.thickness, Inch);
    let gamma = rec.given("gamma", "its unit weight", &layer.unit_weight, Pcf);
    match sharing {
        Sharing::Equal => {
            let b = rec.given("b", "roadway between curbs", &bridge.deck.roadway, Ft);
            let n = count(rec, bridge);
            layer_weight_shared(rec, t, b, gamma, n)
        }
        Sharing::Tributary => {
            let width = on_roadway(bridge, line);
            let b = rec.found("b", "roadway over the width that the girder carries", width, Ft, 0.0, || {
                "its tributary width between the curbs".to_owned()
            });
            layer_weight(rec, t, b, gamma)
        }
    }
}

/// The part of a line's tributary width that lies between the curbs.
#[must_use]
pub fn on_roadway(bridge: &Bridge, line: usize) -> Length {
    let y = bridge.lines[line].y;
    let left = if line == 0 { Length::ZERO } else { (y + bridge.lines[line - 1].y) / 2.0 };
    let right = if line + 1 == bridge.lines.len() {
        bridge.deck.width.value
    } else {
        (y + bridge.lines[line + 1].y) / 2.0
    };
    let (from, to) = (bridge.deck.left_curb, bridge.deck.left_curb + bridge.deck.roadway.value);
    (right.min(to) - left.max(from)).max(Length::ZERO)
}

fn count<R: Recorder>(rec: &mut R, bridge: &Bridge) -> Val<f64> {
    let lines = u32::try_from(bridge.lines.len()).unwrap_or(u32::MAX);
    let entry = Entered::measured("girders", f64::from(lines));
    rec.given("N_b", "number of girders", &entry, One)
}

/// Strips of a stage on a line: an equal part, or the whole of what stands at its edge.
fn strips<'a, R: Recorder>(
    rec: &mut R,
    bridge: &'a Bridge,
    line: usize,
    stage: Stage,
    sharing: Sharing,
) -> Vec<(&'a str, Val<LineLoad>)> {
    let mut parts = Vec::new();
    for strip in bridge.deck.strips.iter().filter(|s| s.stage == stage) {
        let w_1 = rec.given("w_1", &strip.name, &strip.weight, KipPerFt);
        let part = match sharing {
            Sharing::Equal => {
                let n = rec.look_up("n", "how many of them", how_many(strip), One, "entry", || {
                    "one, or one along either edge".to_owned()
                });
                let n_b = count(rec, bridge);
                strip_weight_shared(rec, n, w_1, n_b)
            }
            Sharing::Tributary if at_its_edge(bridge, line, strip) => w_1,
            Sharing::Tributary => continue,
        };
        parts.push((strip.name.as_str(), part));
    }
    parts
}

const fn how_many(strip: &Strip) -> f64 {
    match strip.side {
        StripSide::Left | StripSide::Right => 1.0,
        StripSide::Both => 2.0,
    }
}

fn at_its_edge(bridge: &Bridge, line: usize, strip: &Strip) -> bool {
    let (first, last) = (line == 0, line + 1 == bridge.lines.len());
    match strip.side {
        StripSide::Left => first,
        StripSide::Right => last,
        StripSide::Both => first || last,
    }
}
