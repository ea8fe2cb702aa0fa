//! The sign, and the safe load of each vehicle.

use girderbook_core::report::{tables, verdict};

use super::{Page, opening, table, text};
use crate::node::Node;
use crate::scene::Scene;

pub(super) fn regions(s: &Scene) -> Vec<Node> {
    let mut regions = vec![opening(s, Page::Posting, "")];
    match s.rating {
        None => regions[0].c.push(crate::missing::link()),
        Some(rating) => {
            let said = verdict(rating, s.system());
            regions[0].c.push(text(said.headline).with("tone", said.tone.name()));
            if let Some(face) = said.sign {
                regions.push(Node::region("posting.sign", "Sign").and(crate::drawing::sign::node(&face)));
            }
            regions.push(Node::region("posting.safe", "Safe loads").and(table::node(
                s,
                &tables::posting(rating, s.system(), s.sign_unit()),
                &[],
            )));
        }
    }
    regions.push(
        Node::region("posting.how", "How it is posted")
            .and(s.choice(
                "posting.unit",
                "Unit of the sign",
                "",
                &[("short-tons", "short tons of 2,000 lb"), ("tonnes", "tonnes of 1,000 kg")],
            ))
            .and(s.choice(
                "posting.service",
                "Yielding in service",
                "Service II never closes a bridge by itself",
                &[
                    ("rule-set", "as the rule set has it"),
                    ("yes", "decides on posting"),
                    ("no", "is shown apart"),
                ],
            )),
    );
    regions
}
