//! The verdict, always below: the figure, the sentence, the sign, what it does not cover.

use girderbook_core::report::{Verdict, unrated, verdict};

use crate::drawing;
use crate::key;
use crate::node::Node;
use crate::scene::Scene;

/// The words for the book as it stands.
#[must_use]
pub fn said(s: &Scene) -> Verdict {
    match s.rating {
        Some(rating) => verdict(rating, s.system()),
        None => unrated(s.problems),
    }
}

/// The surface.
#[must_use]
pub fn regions(s: &Scene) -> Vec<Node> {
    let said = said(s);
    let tone = said.tone.name();
    let text = |words: String| Node::new("text").with("text", words);
    let mut words = Node::region("verdict.words", "Verdict")
        .with("tone", tone)
        .and(text(said.headline).with("tone", "strong"))
        .all(said.reasons.into_iter().map(text));
    let assumed = if s.rating.is_some() { s.assumed() } else { Vec::new() };
    if !assumed.is_empty() {
        words = words.and(text(format!("Assumed: {}.", assumed.join(", "))));
    }
    let mut regions = vec![
        Node::region("verdict.figure", "Rating factor").and(
            Node::new("figure").with("text", said.figure).with("label", said.caption).with("tone", tone),
        ),
        words,
    ];
    if s.rating.is_none() {
        regions.push(crate::missing::next(s, "verdict.missing"));
    }
    if let Some(face) = &said.sign {
        regions.push(Node::region("verdict.sign", "Sign").and(drawing::sign::node(face)));
    }
    if let Some(governing) = s.rating.and_then(|rating| rating.governing) {
        let link = Node::new("link").with("text", "Open the sheet").with("go", key::go(s, governing));
        regions.push(Node::region("verdict.sheet", "Worksheet").and(link));
    }
    let cautions = said.cautions.join(" ");
    regions.push(Node::region("verdict.cautions", "Cautions").and(text(cautions).with("tone", "quiet")));
    regions
}
