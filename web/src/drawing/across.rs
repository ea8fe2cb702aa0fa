//! The cross-section, to scale, looking ahead.

use super::sketch::{Girder, Sketch};
use super::{Canvas, WIDE, rect, whole};
use crate::node::Node;
use crate::scene::Scene;

/// Room at either side for labels.
const MARGIN: f64 = 40.0;
/// Most units for a metre, so that a narrow deck does not fill the screen.
const MOST: f64 = 90.0;
/// Where the roadway's dimension line stands, and the top of the surface.
const DIMENSION: i32 = 22;
const SURFACE: i32 = 74;
/// Height of what stands along the edges, which no field tells.
const PARAPET: i32 = 34;

/// Places across the deck in units of the drawing.
struct Scale {
    left: f64,
    per_m: f64,
}

impl Scale {
    fn x(&self, y: f64) -> i32 {
        whole(self.left + y * self.per_m)
    }

    /// A thickness, seen even where it is thinner than a line.
    fn thick(&self, m: f64) -> i32 {
        whole(m * self.per_m).max(if m > 0.0 { 2 } else { 0 })
    }
}

/// The drawing.
pub fn node(s: &Scene, sketch: &Sketch) -> Node {
    // Entries that do not fit together are drawn as they are, so that one sees which.
    let last = sketch
        .girders
        .last()
        .map_or(0.0, |girder| girder.y + girder.plates.top.0.max(girder.plates.bottom.0));
    let wide = sketch.width.m.max(sketch.curb + sketch.roadway.m).max(last).max(1.0);
    let per_m = ((f64::from(WIDE) - 2.0 * MARGIN) / wide).min(MOST);
    let scale = Scale { left: (f64::from(WIDE) - per_m * wide) / 2.0, per_m };
    let mut canvas = Canvas::new("Across", "looking ahead, to scale");
    let soffit = deck(s, &mut canvas, sketch, &scale);
    let governs = s.rating.and_then(|r| r.checks.get(r.governing?)).map(|check| check.key.line);
    wheels(&mut canvas, sketch, &scale, governs);
    let mut lowest = soffit;
    for (i, girder) in sketch.girders.iter().enumerate() {
        lowest = lowest.max(self::girder(&mut canvas, sketch, &scale, soffit, girder, governs == Some(i)));
    }
    for found in &sketch.findings {
        if let Some(girder) = sketch.girders.get(found.girder) {
            mark(&mut canvas, scale.x(girder.y) - 20, lowest - 12, found.number, &found.field, &found.name);
        }
    }
    let names = lowest + 18;
    for (i, girder) in sketch.girders.iter().enumerate() {
        let class = if governs == Some(i) { "strong" } else { "small" };
        canvas.label((scale.x(girder.y), names), class, "middle", girder.name.clone());
    }
    let mut height = names + 10;
    if sketch.girders.len() > 1 {
        spacings(s, &mut canvas, sketch, &scale, names + 26);
        height = names + 38;
    }
    canvas.done(height, described(s, sketch))
}

/// Slab, layers, what stands along the edges, and the roadway's dimension; the soffit of the slab.
fn deck(s: &Scene, canvas: &mut Canvas, sketch: &Sketch, scale: &Scale) -> i32 {
    let (left, right) = (scale.x(0.0), scale.x(sketch.width.m));
    let (curb, other) = (scale.x(sketch.curb), scale.x(sketch.curb + sketch.roadway.m));
    let mut top = SURFACE;
    let layers: i32 = sketch.layers.iter().map(|layer| scale.thick(layer.thickness.m)).sum();
    let slab_top = SURFACE + layers;
    for layer in &sketch.layers {
        let bottom = top + scale.thick(layer.thickness.m);
        let name = named("layer", &layer.name);
        canvas.part(
            &assumed(layer.class, layer.thickness.known),
            rect(curb, top, other, bottom),
            &layer.field,
            &name,
        );
        top = bottom;
    }
    let soffit = slab_top + scale.thick(sketch.slab.m);
    canvas.part(
        &assumed("deck", sketch.slab.known && sketch.width.known),
        rect(left, slab_top, right, soffit),
        "deck.slab",
        "slab",
    );
    for (strip, (from, to)) in sketch.strips.iter().zip([(left, curb), (other, right)]) {
        if let Some(field) = strip {
            // A strip on a deck without a curb width still stands on its edge.
            let (from, to) = if to - from < 6 { (from.min(to) - 3, from.max(to) + 3) } else { (from, to) };
            canvas.part("parapet", rect(from, slab_top - PARAPET, to, slab_top), field, "along the edge");
        }
    }
    let words = match written(s, "deck.roadway") {
        Some(text) => format!("roadway {text}"),
        None => "roadway not entered".to_owned(),
    };
    canvas.dimension((curb, other), DIMENSION, words, "deck.roadway");
    soffit
}

/// A girder with its haunch; where its lower edge is.
fn girder(
    canvas: &mut Canvas,
    sketch: &Sketch,
    scale: &Scale,
    soffit: i32,
    girder: &Girder,
    governs: bool,
) -> i32 {
    let plates = &girder.plates;
    let x = scale.x(girder.y);
    let half = |width: f64| (whole(width * scale.per_m) / 2).max(3);
    let top = soffit + scale.thick(sketch.haunch.m);
    if top > soffit {
        let wide = half(plates.top.0);
        canvas.part("haunch", rect(x - wide, soffit, x + wide, top), "deck.haunch", "haunch");
    }
    let bottom = top + whole(plates.depth * scale.per_m).max(12);
    let (t_top, t_bottom) = (scale.thick(plates.top.1), scale.thick(plates.bottom.1));
    let (w_top, w_bottom) = (half(plates.top.0), half(plates.bottom.0));
    let web = scale.thick(plates.web);
    let (w0, w1) = (x - web / 2, x - web / 2 + web);
    let d = format!(
        "M{} {top}H{}V{}H{w1}V{}H{}V{bottom}H{}V{}H{w0}V{}H{}Z",
        x - w_top,
        x + w_top,
        top + t_top,
        bottom - t_bottom,
        x + w_bottom,
        x - w_bottom,
        bottom - t_bottom,
        top + t_top,
        x - w_top,
    );
    let class = match (plates.known, governs) {
        (_, true) => "steel-governs",
        (true, false) => "steel",
        (false, false) => "steel-assumed",
    };
    canvas.part(class, d, &girder.section, &format!("girder {}", girder.name));
    bottom
}

/// The wheels of one axle over the girder that governs, 1.8 m apart and kept to the roadway.
fn wheels(canvas: &mut Canvas, sketch: &Sketch, scale: &Scale, governs: Option<usize>) {
    const GAUGE: f64 = 1.83;
    const TO_CURB: f64 = 0.61;
    let Some(girder) = governs.and_then(|line| sketch.girders.get(line)) else { return };
    let first = sketch.curb + TO_CURB;
    let last = sketch.curb + sketch.roadway.m - TO_CURB - GAUGE;
    if last < first {
        return;
    }
    let near = (girder.y - GAUGE / 2.0).clamp(first, last);
    let wide = scale.thick(0.25);
    for wheel in [near, near + GAUGE] {
        let x = scale.x(wheel);
        canvas.shape("wheel", rect(x - wide / 2, SURFACE - scale.thick(0.5).min(30), x + wide / 2, SURFACE));
    }
    canvas.shape("axle", format!("M{} {}H{}", scale.x(near), SURFACE - 12, scale.x(near + GAUGE)));
}

/// Dimension lines from girder to girder; where all are written alike, or too near each other for
/// their texts, the first stands for all.
fn spacings(s: &Scene, canvas: &mut Canvas, sketch: &Sketch, scale: &Scale, y: i32) {
    for pair in sketch.girders.windows(2) {
        let (from, to) = (scale.x(pair[0].y), scale.x(pair[1].y));
        let text = written(s, &pair[1].spacing).unwrap_or_else(|| "?".to_owned());
        let fits = 7 * text.chars().count() <= usize::try_from(to - from).unwrap_or(0);
        canvas.dimension((from, to), y, if fits { text } else { String::new() }, &pair[1].spacing);
    }
}

/// A numbered mark for a finding.
pub fn mark(canvas: &mut Canvas, x: i32, y: i32, number: usize, field: &str, name: &str) {
    let d = format!("M{} {y}a9 9 0 1 0 18 0a9 9 0 1 0 -18 0Z", x - 9);
    canvas.part("mark", d, field, &format!("finding {number}: {name}"));
    canvas.label((x, y + 4), "on-dark", "middle", number.to_string());
}

/// What is written in a field, as one reading or as the mean of several.
pub fn written(s: &Scene, path: &str) -> Option<String> {
    let text = s.book.text(path)?.text;
    if text.trim().is_empty() {
        return None;
    }
    match text.split_once(';') {
        None => Some(text.trim().to_owned()),
        Some((first, _)) => {
            let length = s.read::<girderbook_core::quantity::Length>(path);
            Some(length.map_or(first.trim().to_owned(), |entered| {
                girderbook_core::report::show::station(entered.value, s.system())
            }))
        }
    }
}

fn assumed(class: &str, known: bool) -> String {
    if known { class.to_owned() } else { format!("{class} assumed") }
}

fn named(fallback: &str, name: &str) -> String {
    if name.is_empty() { fallback.to_owned() } else { name.to_lowercase() }
}

fn described(s: &Scene, sketch: &Sketch) -> String {
    let roadway = written(s, "deck.roadway").map_or(String::new(), |text| format!(", roadway {text}"));
    let findings = match sketch.findings.len() {
        0 => String::new(),
        1 => ", 1 finding".to_owned(),
        n => format!(", {n} findings"),
    };
    format!("Cross-section with {} girders{roadway}{findings}", sketch.girders.len())
}
