//! What lies on the roadway, the slab, and what stands along the deck.

use girderbook_core::report::tables;

use super::{Page, button, group, opening, remove, subheading, table};
use crate::node::Node;
use crate::scene::Scene;

pub(super) fn regions(s: &Scene) -> Vec<Node> {
    let mut regions = vec![layers(s), slab(s), strips(s)];
    if let Some(rating) = s.rating {
        regions.push(Node::region("layers.loads", "On the girders").and(table::node(
            s,
            &tables::dead_loads(rating, s.system()),
            &[],
        )));
    }
    regions
}

fn layers(s: &Scene) -> Node {
    let mut region = opening(s, Page::Layers, "From the top down.");
    for layer in &s.book.layers {
        let path = |field: &str| format!("layers.{}.{field}", layer.id.0);
        let title = match layer.name.trim() {
            "" => "Layer",
            name => name,
        };
        region.c.push(
            group(format!("g:layers.{}", layer.id.0), title)
                .and(s.field(&path("thickness"), "Thickness", "cores or probes; the mean counts"))
                .and(s.field(&path("unit_weight"), "Unit weight", ""))
                .and(s.choice(
                    &path("substance"),
                    "Made of",
                    "",
                    &[
                        ("asphalt", "asphalt"),
                        ("concrete", "concrete"),
                        ("gravel", "gravel"),
                        ("other", "something else"),
                    ],
                ))
                .and(s.field(&path("name"), "Called", ""))
                .and(remove("Take this layer out", "layers", &layer.id.0)),
        );
    }
    region.and(button("Add a layer", "layers.add"))
}

fn slab(s: &Scene) -> Node {
    Node::region("layers.slab", "Slab")
        .and(subheading("Slab"))
        .and(s.field("deck.slab", "Thickness", "structural slab; drilled, cored or at the edge"))
        .and(s.field("deck.concrete_weight", "Unit weight", "reinforced concrete"))
        .and(s.field("deck.concrete_strength", "Strength", "cylinder, 28 days"))
        .and(s.field("deck.haunch", "Haunch", "top of flange to soffit; 0 for none"))
        .and(s.field("deck.haunch_width", "Width of haunch", "over each girder"))
}

fn strips(s: &Scene) -> Node {
    let mut region = Node::region("layers.strips", "Along the deck").and(subheading("Along the deck"));
    for strip in &s.book.strips {
        let path = |field: &str| format!("strips.{}.{field}", strip.id.0);
        let title = match strip.name.trim() {
            "" => "Parapet, rail, curb, utility",
            name => name,
        };
        region.c.push(
            group(format!("g:strips.{}", strip.id.0), title)
                .and(s.field(&path("weight"), "Weight", "of one, on a length"))
                .and(s.choice(
                    &path("side"),
                    "Stands",
                    "",
                    &[
                        ("both", "one along either edge"),
                        ("left", "along the left edge"),
                        ("right", "along the right edge"),
                    ],
                ))
                .and(s.choice(
                    &path("placed"),
                    "Came",
                    "",
                    &[
                        ("later", "after the slab had hardened (DC2)"),
                        ("bare", "with the wet slab (DC1)"),
                        ("surface", "with the surface, or a utility (DW)"),
                    ],
                ))
                .and(s.field(&path("name"), "Called", ""))
                .and(remove("Take it out", "strips", &strip.id.0)),
        );
    }
    region.and(button("Add a parapet, rail or utility", "strips.add"))
}
