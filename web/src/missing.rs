//! What is still missing for a rating, in order, each leading to its field.

use girderbook_core::problem::{Problem, Severity};

use crate::node::Node;
use crate::scene::Scene;

/// How many are named where there is little room.
const FEW: usize = 3;

/// What is wrong first, then what is missing, as lists.
pub fn region(s: &Scene, id: &str) -> Node {
    let list = |severity, title: &str| {
        let items: Vec<Node> =
            s.problems.iter().filter(|p| p.severity == severity).map(|p| item(s, p)).collect();
        let list = Node::new("list").with("title", title).with("ordered", "1").all(items);
        (!list.c.is_empty()).then_some(list)
    };
    Node::region(id, "What is missing")
        .all(list(Severity::Error, "To be mended"))
        .all(list(Severity::Missing, "Still missing"))
}

/// The first few of them, and the way to all.
pub fn next(s: &Scene, id: &str) -> Node {
    let of = |severity| s.problems.iter().filter(move |p| p.severity == severity);
    let all: Vec<&Problem> = of(Severity::Error).chain(of(Severity::Missing)).collect();
    let items = all.iter().take(FEW).map(|problem| item(s, problem));
    let region = Node::region(id, "What is missing")
        .and(Node::new("list").with("title", "Next").with("ordered", "1").all(items));
    if all.len() > FEW {
        let text = format!("All {}", all.len());
        return region.and(Node::new("link").with("text", text).with("go", "page:rating"));
    }
    region
}

/// Where there is no rating, the way to what is missing.
pub fn link() -> Node {
    Node::new("link").with("text", "What is missing for a rating").with("go", "page:rating")
}

fn item(s: &Scene, problem: &Problem) -> Node {
    Node::new("item")
        .with("text", format!("{}: {}", problem.message, problem.mend))
        .with("go", s.go(&problem.path))
}
