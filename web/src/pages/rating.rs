//! Rating factors, what went into the governing one, and the factors that the user sets.

use girderbook_core::basis::mbe_a::{NAMES, factor_label};
use girderbook_core::problem::{Problem, Severity};
use girderbook_core::report::tables;
use girderbook_core::report::verdict::check_name;

use super::{Page, button, group, opening, quiet, remove, subheading, table, text};
use crate::key;
use crate::node::Node;
use crate::scene::Scene;

pub(super) fn regions(s: &Scene) -> Vec<Node> {
    let rules = [("mbe-a", "AASHTO MBE part A: load and resistance factors")];
    let mut regions = vec![opening(s, Page::Rating, "").and(s.choice("rule_set", "Rule set", "", &rules))];
    match s.rating {
        None => regions.push(crate::missing::region(s, "rating.missing")),
        Some(rating) => {
            regions[0].c.push(quiet(s.editions));
            regions.push(Node::region("rating.vehicles", "By vehicle").and(table::node(
                s,
                &tables::by_vehicle(rating, s.system()),
                &[],
            )));
            regions.push(Node::region("rating.girders", "By girder").and(table::node(
                s,
                &tables::girders(rating, s.system()),
                &[],
            )));
            if let Some(check) = rating.governing.and_then(|i| rating.checks.get(i)) {
                let figures = tables::check_figures(check, s.system());
                regions.push(
                    Node::region("rating.governing", "Governing check")
                        .and(subheading("Governing check"))
                        .and(text(check_name(rating, check, s.system())))
                        .and(table::node(s, &figures, &[]))
                        .and(
                            Node::new("link")
                                .with("text", "Open its worksheet")
                                .with("go", rating.governing.map_or(String::new(), |i| key::go(s, i))),
                        ),
                );
            }
            regions.extend(told(s, "rating.none", "No number", &rating.not_rated));
            let warnings = s.opened.problems.iter().filter(|problem| problem.severity == Severity::Warning);
            let notes: Vec<Problem> = rating.notes.iter().chain(warnings).cloned().collect();
            regions.extend(told(s, "rating.notes", "Worth knowing", &notes));
        }
    }
    regions.push(overrides(s));
    regions
}

/// Problems of the rating as a list, each leading to its field.
fn told(s: &Scene, id: &str, title: &str, problems: &[Problem]) -> Option<Node> {
    if problems.is_empty() {
        return None;
    }
    let items = problems.iter().map(|problem| {
        let words = match problem.mend.trim() {
            "" => problem.message.clone(),
            mend => format!("{}: {mend}", problem.message),
        };
        Node::new("item").with("text", words).with("go", s.go(&problem.path))
    });
    Some(Node::region(id, title).and(Node::new("list").with("title", title).all(items)))
}

fn overrides(s: &Scene) -> Node {
    let mut region = Node::region("rating.overrides", "Your own factors")
        .and(subheading("Your own factors"))
        .and(quiet("In place of the rule set's; the reason is printed beside them."));
    let names = NAMES.map(|name| (name, factor_label(name)));
    for own in &s.book.overrides {
        let path = |field: &str| format!("overrides.{}.{field}", own.id.0);
        region.c.push(
            group(format!("g:overrides.{}", own.id.0), own.factor.trim())
                .and(s.pick(&path("factor"), "Factor", "", &names))
                .and(s.field(&path("value"), "Value", ""))
                .and(s.field(&path("reason"), "Reason", ""))
                .and(remove("Take it out", "overrides", &own.id.0)),
        );
    }
    region.and(button("Set a factor", "overrides.add"))
}
