//! The head: which book it is.

use girderbook_core::document::book::UnitSystem;

use crate::node::Node;
use crate::scene::Scene;

/// The title of a book.
#[must_use]
pub fn title(book: &girderbook_core::document::Book) -> String {
    let site = &book.site;
    [&site.name, &site.feature, &site.road]
        .into_iter()
        .map(|text| text.trim())
        .find(|text| !text.is_empty())
        .unwrap_or("New bridge")
        .to_owned()
}

/// Where it is.
#[must_use]
pub fn place(book: &girderbook_core::document::Book) -> String {
    let site = &book.site;
    let crossing = match (site.road.trim(), site.feature.trim()) {
        (road, "") => road.to_owned(),
        ("", feature) => format!("over {feature}"),
        (road, feature) => format!("{road} over {feature}"),
    };
    [crossing.as_str(), site.county.trim()]
        .into_iter()
        .filter(|text| !text.is_empty())
        .collect::<Vec<_>>()
        .join(", ")
}

/// The span as it was written.
#[must_use]
pub fn span(book: &girderbook_core::document::Book) -> String {
    let length = book.spans.first().map_or(String::new(), |span| span.length.text());
    length.split(';').next().unwrap_or("").trim().to_owned()
}

/// The surface.
#[must_use]
pub fn regions(s: &Scene) -> Vec<Node> {
    let mut about: Vec<String> = vec![place(s.book), span(s.book)];
    if !s.book.girders.is_empty() {
        about.push(format!("{} girders", s.book.girders.len()));
    }
    about.retain(|text| !text.is_empty());
    let units = match s.book.system {
        UnitSystem::MetreKilonewton => "m · kN",
        UnitSystem::FootKip => "ft · kip",
    };
    // What can be taken back comes and goes; the button stays in its place.
    let undo = if s.undo { "undo" } else { "" };
    let region = Node::region("head", "Bridge")
        .and(Node::new("heading").with("text", title(s.book)).with("level", "1"))
        .and(Node::new("text").with("text", about.join(" · ")).with("tone", "quiet"))
        .and(Node::new("link").with("text", units).with("go", "system"))
        .and(Node::new("link").with("text", s.rules).with("go", "rule_set"))
        .and(Node::new("button").named("head.undo").with("text", "Undo").with("act", undo));
    vec![region]
}
