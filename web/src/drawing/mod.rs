//! Drawings as data: shapes of path data with classes, labels, and the field that each part opens.
//!
//! A drawing is about 640 wide and counts in whole units, so that a view compares slot by slot. What
//! is assumed is drawn dashed, by its class.

mod across;
mod along;
mod bars;
mod diagram;
pub mod sign;
mod sketch;

use crate::node::Node;
use crate::scene::Scene;

/// Width of a drawing.
const WIDE: i32 = 640;

/// The regions of the drawings.
#[must_use]
pub fn regions(s: &Scene) -> Vec<Node> {
    let sketch = sketch::Sketch::of(s);
    let mut regions = vec![
        Node::region("draw.across", "Across").and(across::node(s, &sketch)),
        Node::region("draw.along", "Along").and(along::node(s, &sketch)),
    ];
    if let Some(rating) = s.rating {
        regions.extend(
            diagram::node(s, rating).map(|d| Node::region("draw.demand", "Demand and capacity").and(d)),
        );
        regions.push(Node::region("draw.bars", "Rating by vehicle").and(bars::node(s, rating)));
    }
    regions
}

/// A drawing under construction.
struct Canvas {
    node: Node,
}

impl Canvas {
    fn new(title: impl Into<String>, note: impl Into<String>) -> Self {
        Self { node: Node::new("drawing").with("title", title).with("note", note) }
    }

    /// The finished drawing of that height; `desc` says in words what it shows.
    fn done(self, height: i32, desc: impl Into<String>) -> Node {
        self.node.with("view", format!("0 0 {WIDE} {height}")).with("desc", desc)
    }

    fn shape(&mut self, class: &str, d: impl Into<String>) {
        self.part(class, d, "", "");
    }

    /// A shape that opens a field.
    fn part(&mut self, class: &str, d: impl Into<String>, go: &str, name: &str) {
        self.node
            .c
            .push(Node::new("shape").with("d", d).with("class", class).with("go", go).with("name", name));
    }

    fn label(&mut self, at: (i32, i32), class: &str, anchor: &str, text: impl Into<String>) {
        self.label_to(at, class, anchor, text, "");
    }

    /// A label that opens a field.
    fn label_to(&mut self, (x, y): (i32, i32), class: &str, anchor: &str, text: impl Into<String>, go: &str) {
        self.node.c.push(
            Node::new("label")
                .with("x", x.to_string())
                .with("y", y.to_string())
                .with("text", text)
                .with("class", class)
                .with("anchor", anchor)
                .with("go", go),
        );
    }

    /// A dimension line between two places, with ticks and its text above.
    fn dimension(&mut self, (from, to): (i32, i32), y: i32, text: impl Into<String>, go: &str) {
        self.shape("dim", format!("M{from} {y}H{to}M{from} {}V{}M{to} {}V{}", y - 4, y + 4, y - 4, y + 4));
        self.label_to(((from + to) / 2, y - 5), "dim", "middle", text, go);
    }
}

/// A rectangle between two corners.
fn rect(x0: i32, y0: i32, x1: i32, y1: i32) -> String {
    format!("M{x0} {y0}H{x1}V{y1}H{x0}Z")
}

/// A place on the drawing, in whole units.
#[allow(clippy::cast_possible_truncation)]
fn whole(value: f64) -> i32 {
    // Far outside any drawing, and far inside what an `i32` holds.
    value.round().clamp(-10_000.0, 10_000.0) as i32
}
