//! Kinds of girder, and which girder is of which kind.

use super::{Page, button, group, opening, remove, subheading};
use crate::node::Node;
use crate::scene::{Scene, girder_name, member_name};

pub(super) fn regions(s: &Scene) -> Vec<Node> {
    let mut regions = vec![opening(s, Page::Members, "Write the rolled shape, or measure the plates.")];
    for member in &s.book.members {
        regions.push(kind(s, member));
    }
    regions
        .push(Node::region("members.add", "More kinds").and(button("Add a kind of girder", "members.add")));
    if !s.book.girders.is_empty() {
        regions.push(lines(s));
    }
    regions
}

fn kind(s: &Scene, member: &girderbook_core::document::book::Member) -> Node {
    let id = &member.id.0;
    let path = |field: &str| format!("members.{id}.{field}");
    let section = group(format!("g:members.{id}.section"), "Section")
        .with("note", "A plate that is measured takes the place of the table's.")
        .and(s.field(&path("shape"), "Rolled shape", "such as W36x182, 36 WF 182, I500x180"))
        .and(s.field(&path("depth"), "Depth", "out to out"))
        .and(s.field(&path("top_width"), "Top flange, width", ""))
        .and(s.field(&path("top_thickness"), "Top flange, thickness", ""))
        .and(s.field(&path("bottom_width"), "Bottom flange, width", ""))
        .and(s.field(&path("bottom_thickness"), "Bottom flange, thickness", ""))
        .and(s.field(&path("web"), "Web, thickness", ""))
        .and(s.field(&path("fillet"), "To the toe of the fillet", "from the outer face of the flange"));
    let steel = group(format!("g:members.{id}.steel"), "Steel and slab")
        .and(s.field(&path("yield_strength"), "Yield strength", "from a test, a mill paper or a drawing"))
        .and(s.choice(
            &path("connectors"),
            "Connectors to the slab",
            "counted only where proved",
            &[
                ("not-known", "not known: counted as none"),
                ("proved", "seen, drawn or proved by test"),
                ("none", "none"),
            ],
        ))
        .and(s.choice(
            &path("embedded"),
            "Top flange in the slab",
            "a slab that rests on it is no brace",
            &[
                ("not-inspected", "not inspected: no brace"),
                ("yes", "embedded or connected"),
                ("no", "rests on it"),
            ],
        ))
        .and(s.field(&path("brace_spacing"), "Diaphragms", "greatest distance between those that work"));
    let bearing = group(format!("g:members.{id}.bearing"), "Over the bearings")
        .and(s.field(&path("bearing_length"), "Length of bearing", "along the girder"))
        .and(s.choice(
            &path("bearing_stiffeners"),
            "Bearing stiffeners",
            "",
            &[("not-inspected", "not inspected: counted as none"), ("yes", "there"), ("no", "none")],
        ));
    let mut region = Node::region(&format!("members.{id}"), &member_name(member))
        .and(subheading(&member_name(member)))
        .and(s.field(&path("name"), "Called", ""))
        .and(s.choice(&path("kind"), "Kind", "", &[("steel-girder", "steel I-girder under a concrete slab")]))
        .and(section)
        .and(steel)
        .and(bearing);
    if s.book.members.len() > 1 {
        region.c.push(remove("Take this kind out", "members", id));
    }
    region
}

/// Which girder is of which kind; girders come and go here.
fn lines(s: &Scene) -> Node {
    let mut region = Node::region("members.lines", "Girders").and(subheading("Girders"));
    for (i, girder) in s.book.girders.iter().enumerate() {
        let path = |field: &str| format!("girders.{}.{field}", girder.id.0);
        let name = girder_name(s.book, i);
        region.c.push(
            group(format!("g:girders.{}", girder.id.0), name.clone())
                .and(s.choice(&path("member"), "Kind", "", &[]))
                .and(s.field(&path("name"), "Called", "on site"))
                .and(remove(&format!("Take {name} out"), "girders", &girder.id.0)),
        );
    }
    region.and(button("Add a girder at the right", "girders.add"))
}
