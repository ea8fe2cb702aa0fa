//! Span, roadway and girder lines.

use super::{Page, button, opening, subheading};
use crate::node::Node;
use crate::scene::{Scene, girder_name};

pub(super) fn regions(s: &Scene) -> Vec<Node> {
    let mut along = opening(s, Page::Span, "Several readings in one field: put a semicolon between them.");
    for span in &s.book.spans {
        let path = format!("spans.{}.length", span.id.0);
        along.c.push(s.field(&path, "Span", "centre to centre of bearings"));
    }
    along.c.push(s.field("skew", "Skew", "0 if the supports are square to the road"));
    let across = Node::region("span.across", "Across")
        .and(subheading("Across"))
        .and(s.field("deck.width", "Width of the deck", "edge to edge"))
        .and(s.field("deck.roadway", "Roadway", "between curbs or rails"))
        .and(s.field("deck.left_curb", "Left edge to curb", "looking ahead"));
    vec![along, across, girders(s)]
}

fn girders(s: &Scene) -> Node {
    let mut region = Node::region("span.girders", "Girder lines")
        .and(subheading("Girder lines"))
        .and(s.field("girders.count", "Girders", "how many, left to right looking ahead"));
    if s.book.girders.is_empty() {
        return region;
    }
    region.c.push(s.field("overhang", "Left edge to first girder", "edge of the deck to centre"));
    for (i, girder) in s.book.girders.iter().enumerate() {
        let name = girder_name(s.book, i);
        // The first has a spacing only where a file gave it one; it is shown to be cleared.
        if i > 0 || !girder.spacing.is_blank() {
            let label = match i {
                0 => format!("Left of {name}"),
                _ => format!("{} to {name}", girder_name(s.book, i - 1)),
            };
            let path = format!("girders.{}.spacing", girder.id.0);
            region.c.push(s.field(&path, &label, "centre to centre"));
        }
    }
    if s.book.girders.iter().skip(1).any(|girder| girder.spacing.is_blank()) {
        region.c.push(button("Same spacing for all", "girders.fill:spacing"));
    }
    region
}
