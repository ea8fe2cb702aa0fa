//! Demand against capacity along the governing girder, for its action.

use girderbook_core::check::Action;
use girderbook_core::quantity::Length;
use girderbook_core::rating::Rating;
use girderbook_core::report::diagram::{Curve, curve};
use girderbook_core::report::names;
use girderbook_core::report::show::effect;
use girderbook_core::report::verdict::at;

use super::along::{LEFT, RIGHT, place};
use super::{Canvas, rect, whole};
use crate::node::Node;
use crate::scene::Scene;

/// Where nothing is asked for, and the greatest height of a curve below it.
const ZERO: i32 = 20;
const TALL: f64 = 96.0;

/// The drawing; none where nothing governs.
pub fn node(s: &Scene, rating: &Rating) -> Option<Node> {
    let check = rating.checks.get(rating.governing?)?;
    let curve = curve(rating, rating.governing?)?;
    let governs = at(check, s.system());
    let name = rating.lines.get(curve.line).map_or("", |line| line.name.as_str());
    let point = curve.points.get(curve.at)?;
    let show = |value: f64| effect(value, curve.action, s.system());
    let mut canvas = Canvas::new(
        "Asked and carried",
        format!("{} of {name}, {}", names::action(curve.action), names::state(curve.state)),
    );
    let most = curve.points.iter().flat_map(|p| [p.demand, p.capacity]).fold(0.0, f64::max);
    if most <= 0.0 {
        return None;
    }
    let y = |value: f64| ZERO + whole(value.max(0.0) / most * TALL);
    let span =
        s.bridge().and_then(|bridge| bridge.spans.first()).map_or(Length::ZERO, |span| span.length.value);
    let x = |at: Length| place(at.in_m(), span.in_m());
    if curve.action == Action::Bearing {
        bearings(&mut canvas, &curve, &x, &y);
    } else {
        along(&mut canvas, &curve, &x, &y);
    }
    canvas.shape("grid", format!("M{LEFT} {ZERO}H{RIGHT}"));
    let here = x(point.x);
    let bottom = ZERO + whole(TALL);
    canvas.shape("limit", format!("M{here} {}V{bottom}", ZERO - 8));
    // The words stand on the side with more room.
    let off = if curve.action == Action::Bearing { 30 } else { 8 };
    let (anchor, beside) =
        if here > (LEFT + RIGHT) / 2 { ("end", here - off) } else { ("start", here + off) };
    canvas.label((beside, ZERO + 22), "strong", anchor, format!("asked {}", show(point.demand)));
    canvas.label((beside, ZERO + 38), "strong", anchor, format!("carries {}", show(point.capacity)));
    canvas.label((beside, bottom + 18), "small", anchor, format!("governs: {governs}"));
    let desc = format!(
        "Demand against capacity of {name}: asked {}, carries {}, {governs}",
        show(point.demand),
        show(point.capacity)
    );
    Some(canvas.done(bottom + 28, desc))
}

fn along(canvas: &mut Canvas, curve: &Curve, x: &dyn Fn(Length) -> i32, y: &dyn Fn(f64) -> i32) {
    let mut demand = format!("M{} {ZERO}", curve.points.first().map_or(LEFT, |p| x(p.x)));
    let mut capacity = String::new();
    for point in &curve.points {
        demand.push_str(&format!("L{} {}", x(point.x), y(point.demand)));
        let pen = if capacity.is_empty() { 'M' } else { 'L' };
        capacity.push_str(&format!("{pen}{} {}", x(point.x), y(point.capacity)));
    }
    demand.push_str(&format!("L{} {ZERO}Z", curve.points.last().map_or(RIGHT, |p| x(p.x))));
    canvas.shape("demand", demand);
    canvas.shape("capacity", capacity);
}

/// Over a bearing there is nothing along the span: a bar at each end, and a line for what it carries.
fn bearings(canvas: &mut Canvas, curve: &Curve, x: &dyn Fn(Length) -> i32, y: &dyn Fn(f64) -> i32) {
    for point in &curve.points {
        let at = x(point.x);
        canvas.shape("demand", rect(at - 14, ZERO, at + 14, y(point.demand)));
        canvas.shape("capacity", format!("M{} {}H{}", at - 22, y(point.capacity), at + 22));
    }
}
