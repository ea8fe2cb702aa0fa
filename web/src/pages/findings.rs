//! What was found on girders, and which ends were looked at.

use super::{Page, button, group, opening, quiet, remove, subheading};
use crate::node::Node;
use crate::scene::{Scene, girder_name};

pub(super) fn regions(s: &Scene) -> Vec<Node> {
    let mut regions = vec![opening(s, Page::Findings, "Enter what is left, not what is gone.")];
    if s.book.girders.is_empty() {
        regions[0].c.push(quiet("A finding is on a girder: enter the girders first."));
        regions[0].c.push(Node::new("link").with("text", "Girders").with("go", "girders.count"));
        return regions;
    }
    for (i, finding) in s.book.findings.iter().enumerate() {
        regions.push(one(s, finding, i + 1));
    }
    let mut add = Node::region("findings.add", "More findings");
    for (i, girder) in s.book.girders.iter().enumerate() {
        add.c.push(button(
            format!("Add a finding on {}", girder_name(s.book, i)),
            format!("findings.add:{}", girder.id.0),
        ));
    }
    regions.push(add);
    regions.push(ends(s));
    regions
}

fn one(s: &Scene, finding: &girderbook_core::document::book::Finding, number: usize) -> Node {
    let id = &finding.id.0;
    let path = |field: &str| format!("findings.{id}.{field}");
    let girder = s.book.girders.iter().position(|girder| girder.id.0 == finding.girder.0);
    let on = girder.map_or(String::new(), |i| format!(" on {}", girder_name(s.book, i)));
    let title = match finding.name.trim() {
        "" => format!("{number}: finding{on}"),
        name => format!("{number}: {name}"),
    };
    Node::region(&format!("findings.{id}"), &title).and(
        group(format!("g:findings.{id}"), title)
            .and(s.choice(&path("girder"), "On girder", "", &[]))
            .and(s.field(&path("from"), "Begins", "from the near bearing; 0 at the bearing"))
            .and(s.field(&path("to"), "Ends", "from the near bearing"))
            .and(s.field(&path("top"), "Top flange left", "mean thickness"))
            .and(s.field(&path("bottom"), "Bottom flange left", "mean thickness"))
            .and(s.field(&path("web"), "Web left", "readings over its height"))
            .and(s.field(
                &path("web_low"),
                "Lowest band of the web left",
                "the least reading decides at a bearing",
            ))
            .and(s.choice(
                &path("straight"),
                "Web",
                "",
                &[
                    ("not-inspected", "not inspected for plumb and holes"),
                    ("straight", "plumb and whole"),
                    ("not-straight", "out of plumb, or holed"),
                ],
            ))
            .and(s.field(&path("name"), "Called", ""))
            .and(remove("Take this finding out", "findings", id)),
    )
}

/// Which girder ends were looked at.
fn ends(s: &Scene) -> Node {
    let looked = [("not-inspected", "not inspected"), ("inspected", "looked at: sound but for the findings")];
    let mut region = Node::region("findings.ends", "Girder ends")
        .and(subheading("Girder ends"))
        .and(quiet("The web over a bearing that nobody looked at gets no number."));
    for (i, girder) in s.book.girders.iter().enumerate() {
        let name = girder_name(s.book, i);
        let path = |field: &str| format!("girders.{}.{field}", girder.id.0);
        region.c.push(s.choice(&path("end_near"), &format!("{name}, near bearing"), "", &looked));
        region.c.push(s.choice(&path("end_far"), &format!("{name}, far bearing"), "", &looked));
    }
    region
}
