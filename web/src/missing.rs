//! What is still missing for a rating, in order, each leading to its field.

use girderbook_core::problem::Severity;

use crate::node::Node;
use crate::scene::Scene;

/// What is wrong first, then what is missing, as lists.
pub fn lists(s: &Scene) -> Vec<Node> {
    let list = |severity, title: &str| {
        let items: Vec<Node> = s
            .problems
            .iter()
            .filter(|problem| problem.severity == severity)
            .map(|problem| {
                let words = format!("{}: {}", problem.message, problem.mend);
                Node::new("item").with("text", words).with("go", s.go(&problem.path))
            })
            .collect();
        let list = Node::new("list").with("title", title).with("ordered", "1").all(items);
        (!list.c.is_empty()).then_some(list)
    };
    [list(Severity::Error, "To be mended"), list(Severity::Missing, "Still missing")]
        .into_iter()
        .flatten()
        .collect()
}

/// The same as a region of a page.
pub fn region(s: &Scene, id: &str) -> Node {
    Node::region(id, "What is missing").all(lists(s))
}
