//! The elevation of the girder that governs, with the vehicle where it governs.

use girderbook_core::basis::Case;
use girderbook_core::moving::{Direction, Position};
use girderbook_core::quantity::Force;
use girderbook_core::rating::Rating;
use girderbook_core::report::show::axle;
use girderbook_core::report::tables::load_name;

use super::across::{mark, written};
use super::sketch::Sketch;
use super::{Canvas, rect, whole};
use crate::node::Node;
use crate::scene::Scene;

/// Ends of the span on the drawing; the diagram below has the same.
pub const LEFT: i32 = 50;
/// The far end.
pub const RIGHT: i32 = 590;
/// Top of the girder.
const TOP: i32 = 58;

/// A place along a span of that length, both in metres.
pub fn place(x: f64, span: f64) -> i32 {
    LEFT + whole(x / span.max(0.1) * f64::from(RIGHT - LEFT))
}

/// The drawing.
pub fn node(s: &Scene, sketch: &Sketch) -> Node {
    let governing = s.rating.and_then(|rating| Some((rating, rating.checks.get(rating.governing?)?)));
    let line = governing.map_or(0, |(_, check)| check.key.line);
    let girder = sketch.girders.get(line);
    let name = girder.map_or("the girder", |girder| girder.name.as_str());
    let axles = governing.map(|(rating, check)| axles(s, rating, check)).unwrap_or_default();
    let unit = axle(Force::ZERO, s.system()).1;
    let vehicle = governing.map(|(rating, check)| load_name(rating, check.key.load)).unwrap_or_default();
    let note =
        if axles.is_empty() { String::new() } else { format!("{vehicle} where it governs, axles in {unit}") };
    let mut canvas = Canvas::new(format!("Along {name}"), note.clone());
    let scale = f64::from(RIGHT - LEFT) / sketch.span.m.max(0.1);
    let depth = girder.map_or(0.8, |girder| girder.plates.depth);
    let bottom = TOP + whole(depth * scale).clamp(12, 60);
    let known = sketch.span.known && girder.is_none_or(|girder| girder.plates.known);
    let class = if known { "steel" } else { "steel-assumed" };
    let section = girder.map_or("", |girder| girder.section.as_str());
    canvas.part(class, rect(LEFT, TOP, RIGHT, bottom), section, &format!("girder {name}"));
    canvas.shape("support", format!("M{LEFT} {bottom}l-9 14h18Z"));
    canvas.shape("support", format!("M{} {}a7 7 0 1 0 14 0a7 7 0 1 0 -14 0Z", RIGHT - 7, bottom + 7));
    canvas.shape(
        "ground",
        format!("M{} {}H{}M{} {}H{}", LEFT - 20, bottom + 15, LEFT + 20, RIGHT - 20, bottom + 15, RIGHT + 20),
    );
    for found in sketch.findings.iter().filter(|found| found.girder == line) {
        if let Some((from, to)) = found.range {
            let (a, b) = (place(from, sketch.span.m), place(to, sketch.span.m));
            let b = b.clamp(a + 3, RIGHT.max(a + 3));
            canvas.part("loss", rect(a, TOP, b, bottom), &found.field, &format!("finding {}", found.number));
            mark(&mut canvas, (a + b) / 2, bottom + 12, found.number, &found.field, &found.name);
        }
    }
    draw_axles(s, &mut canvas, sketch, &axles);
    let text = written(s, &sketch.span_field).unwrap_or_else(|| "span not entered".to_owned());
    canvas.dimension((LEFT, RIGHT), bottom + 40, text.clone(), &sketch.span_field);
    let what = if note.is_empty() { String::new() } else { format!(", with {note}") };
    canvas.done(bottom + 52, format!("Elevation of {name}, span {text}{what}"))
}

/// Loads and places in metres of the axles of the governing vehicle; none where the place is not
/// known from the rating alone, as for a load of several trucks or of variable spacing.
fn axles(s: &Scene, rating: &Rating, check: &girderbook_core::rating::Check) -> Vec<(Force, f64)> {
    let found = || {
        let load = rating.loads.get(check.key.load)?;
        let case = s.cases.iter().find(|case| case.id == load.id && case.level == load.level)?;
        let (first, back) = check.figures?.position?;
        let Case { trains, .. } = case;
        let [train] = trains.as_slice() else { return None };
        if train.least_length() != train.most_length() {
            return None;
        }
        let direction = if back { Direction::Backward } else { Direction::Forward };
        let places = Position::closed_up(train, first, direction);
        Some(train.axles().iter().copied().zip(places.places().map(|x| x.in_m())).collect())
    };
    found().unwrap_or_default()
}

/// An arrow for each axle on the span, with its load where it has room.
fn draw_axles(s: &Scene, canvas: &mut Canvas, sketch: &Sketch, axles: &[(Force, f64)]) {
    let mut shown: Vec<(i32, String)> = axles
        .iter()
        .filter(|(_, x)| *x >= 0.0 && *x <= sketch.span.m)
        .map(|(load, x)| (place(*x, sketch.span.m), axle(*load, s.system()).0))
        .collect();
    shown.sort_by_key(|(x, _)| *x);
    let mut free = i32::MIN;
    for (x, text) in shown {
        canvas.shape(
            "axle",
            format!("M{x} {}V{}M{} {}L{x} {}L{} {}", 24, TOP - 3, x - 5, TOP - 12, TOP - 3, x + 5, TOP - 12),
        );
        let half = 4 * i32::try_from(text.chars().count()).unwrap_or(0) + 2;
        if x - half >= free {
            canvas.label((x, 18), "small", "middle", text);
            free = x + half;
        }
    }
}
