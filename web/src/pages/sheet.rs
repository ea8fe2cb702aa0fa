//! The worksheet of one check: the governing one, or another that was chosen.

use girderbook_core::rating::{Check, Rating};
use girderbook_core::report::sheet::{From, SheetRow};
use girderbook_core::report::{names, show::station, tables, verdict::outcome, verdict::outcome_tone};

use super::{Page, opening, text};
use crate::key;
use crate::node::Node;
use crate::scene::{Scene, option};

pub(super) fn regions(s: &Scene) -> Vec<Node> {
    let mut regions = vec![opening(s, Page::Sheet, "")];
    let Some(rating) = s.rating else {
        regions[0].c.push(crate::missing::link());
        return regions;
    };
    let Some(check) = s.shown.and_then(|i| rating.checks.get(i)) else {
        return regions;
    };
    regions.push(chosen(s, rating, check));
    regions.push(Node::region("sheet.lines", "Worksheet").all(s.sheet.iter().map(|row| line(s, row))));
    regions
}

/// Which check it is, and how to get to another.
fn chosen(s: &Scene, rating: &Rating, check: &Check) -> Node {
    let loads = rating
        .by_vehicle
        .iter()
        .map(|vehicle| option(&key::load(rating, vehicle.load), &tables::load_name(rating, vehicle.load)));
    let girders =
        rating.lines.iter().zip(&s.book.girders).map(|(line, girder)| option(&girder.id.0, &line.name));
    let mut kinds: Vec<(&str, String)> = Vec::new();
    let mut places: Vec<(f64, String)> = Vec::new();
    for other in &rating.checks {
        if (other.key.line, other.key.load) != (check.key.line, check.key.load) {
            continue;
        }
        let kind = key::kind(other.key.action, other.key.state);
        if kinds.iter().all(|(known, _)| *known != kind) {
            let words = format!("{}, {}", names::action(other.key.action), names::state(other.key.state));
            kinds.push((kind, words));
        }
        if (other.key.action, other.key.state) == (check.key.action, check.key.state) {
            let x = key::Key::of(s.book, rating, other).x.unwrap_or(0.0);
            places.push((x, format!("{}: {}", station(other.key.x, s.system()), outcome(&other.outcome))));
        }
    }
    places.sort_by(|(a, _), (b, _)| a.total_cmp(b));
    let own = key::Key::of(s.book, rating, check);
    let choice = |path: &'static str, label: &'static str, value: String| {
        Node::new("choice")
            .named(crate::scene::field_id(path))
            .with("path", path)
            .with("label", label)
            .with("value", value)
    };
    Node::region("sheet.choice", "Which check")
        .and(choice("sheet.load", "Vehicle", own.load.clone()).all(loads))
        .and(choice("sheet.girder", "Girder", own.girder.clone()).all(girders))
        .and(
            choice("sheet.kind", "Action", own.kind.clone())
                .all(kinds.iter().map(|(kind, words)| option(kind, words))),
        )
        .and(
            choice("sheet.x", "Station", format!("{:.0}", own.x.unwrap_or(0.0)))
                .all(places.iter().map(|(x, words)| option(&format!("{x:.0}"), words))),
        )
        .and(
            text(format!("Rating factor: {}", outcome(&check.outcome)))
                .with("tone", outcome_tone(&check.outcome).name()),
        )
}

fn line(s: &Scene, row: &SheetRow) -> Node {
    let id = format!("line{}", row.no);
    match row.from {
        From::Title => Node::new("title").named(id).with("text", row.what.clone()),
        From::Remark => text(row.what.clone()).named(id),
        from => {
            let refs: Vec<String> = row.refs.iter().map(u32::to_string).collect();
            Node::new("line")
                .named(id)
                .with("no", row.no.to_string())
                .with("what", row.what.clone())
                .with("symbol", row.symbol.clone())
                .with("formula", row.formula.clone())
                .with("numbers", row.numbers.clone())
                .with("result", row.result.clone())
                .with("also", row.also.clone())
                .with("cite", row.cite.clone())
                .with("from", from.name())
                .with("refs", refs.join(","))
                .with("go", s.go(&row.path))
        }
    }
}
