//! Where the bridge is, what is on file about it, who rates it.

use super::{Page, opening};
use crate::node::Node;
use crate::scene::Scene;

pub(super) fn regions(s: &Scene) -> Vec<Node> {
    vec![
        opening(s, Page::Site, "")
            .and(s.field("site.name", "Bridge", "name or number"))
            .and(s.field("site.road", "Road", "that it carries"))
            .and(s.field("site.feature", "Crosses", "stream, rail, road"))
            .and(s.field("site.county", "County or place", ""))
            .and(s.field("site.date", "Date", "of the readings"))
            .and(s.choice(
                "system",
                "Units",
                "of a figure without one",
                &[("m-kN", "m, mm, kN"), ("ft-kip", "ft, in, kip")],
            )),
        Node::region("site.file", "On file")
            .and(super::subheading("On file"))
            .and(s.field("site.year_built", "Year built", "strengths are assumed by it"))
            .and(s.field(
                "site.condition_rating",
                "Condition rating",
                "superstructure, 0 to 9, last inspection",
            ))
            .and(s.choice(
                "site.condition",
                "Condition",
                "of the superstructure",
                &[
                    ("not-known", "not known"),
                    ("good", "good or satisfactory (6 to 9)"),
                    ("fair", "fair (5)"),
                    ("poor", "poor (0 to 4)"),
                ],
            ))
            .and(s.field("site.rating_before", "Rating before", "as it reads on file"))
            .and(s.field("site.posting_before", "Posting before", "as the sign reads"))
            .and(s.field("site.notes", "Notes", "of the last inspection")),
        Node::region("site.people", "Names")
            .and(super::subheading("Names"))
            .and(s.field("site.rater", "Rated by", ""))
            .and(s.field("site.checker", "Checked by", "")),
    ]
}
