//! Books and views for the tests of the open book.
#![allow(dead_code)]

use std::collections::BTreeMap;

use girderbook_core::document::book::UnitSystem;
use girderbook_web::desk::Desk;
use girderbook_web::node::{Node, SURFACES, Update, View};
use girderbook_web::pages::Page;

/// The demo books, as files.
pub const DEMOS: [&str; 2] = [
    include_str!("../../../core/demos/hollow-fork.json"),
    include_str!("../../../core/demos/mill-race.json"),
];

pub fn demo(i: usize) -> Desk {
    Desk::read(DEMOS[i]).expect("a book")
}

pub fn empty() -> Desk {
    Desk::empty("b1", UnitSystem::MetreKilonewton)
}

/// A book with an item in every list.
pub fn full() -> Desk {
    let mut desk = demo(0);
    for action in
        ["findings.add:g3", "overrides.add", "vehicles.add", "layers.add", "strips.add", "members.add"]
    {
        let before = desk.text();
        desk.act(action);
        assert_ne!(desk.text(), before, "{action} did nothing");
    }
    desk
}

/// All nodes of a view.
pub fn nodes(view: &View) -> Vec<&Node> {
    let mut all = Vec::new();
    view.walk(&mut |node| all.push(node));
    all
}

/// All nodes of a surface.
pub fn surface<'a>(view: &'a View, name: &str) -> Vec<&'a Node> {
    let at = SURFACES.iter().position(|surface| *surface == name).expect("a surface");
    let mut all = Vec::new();
    for region in &view.surfaces[at] {
        region.walk(&mut |node| all.push(node));
    }
    all
}

/// The field or choice of a path in the open page.
pub fn field<'a>(view: &'a View, path: &str) -> &'a Node {
    let at = |node: &&Node| matches!(node.k, "field" | "choice") && node.prop("path") == path;
    nodes(view).into_iter().find(at).unwrap_or_else(|| panic!("no field {path}"))
}

/// The first node of a kind on a surface.
pub fn first<'a>(view: &'a View, name: &str, kind: &str) -> &'a Node {
    surface(view, name).into_iter().find(|node| node.k == kind).unwrap_or_else(|| panic!("no {kind}"))
}

/// Texts of all nodes of a kind on a surface.
pub fn texts(view: &View, name: &str, kind: &str) -> Vec<String> {
    surface(view, name).into_iter().filter(|n| n.k == kind).map(|n| n.prop("text").to_owned()).collect()
}

pub fn assert_ids_unique(view: &View, what: &str) {
    let mut seen: BTreeMap<&str, &str> = BTreeMap::new();
    for node in nodes(view) {
        assert!(!node.id.is_empty(), "{what}: a {} has no id", node.k);
        let before = seen.insert(&node.id, node.k);
        assert!(before.is_none(), "{what}: two nodes are {}", node.id);
    }
}

/// Does to a view what the page would do.
pub fn applied(before: &View, update: &Update) -> View {
    let mut view = before.clone();
    view.revision = update.revision;
    for (i, name) in SURFACES.iter().enumerate() {
        if let Some(regions) = update.surfaces.get(name) {
            view.surfaces[i].clone_from(regions);
        }
    }
    for region in &update.regions {
        let mounted =
            view.surfaces.iter_mut().flatten().find(|r| r.id == region.id).expect("a mounted region");
        mounted.clone_from(region);
    }
    for (id, prop, value) in &update.changes {
        let mut found = 0;
        for region in view.surfaces.iter_mut().flatten() {
            set(region, id, prop, value, &mut found);
        }
        assert_eq!(found, 1, "{id} is mounted once");
    }
    view
}

fn set(node: &mut Node, id: &str, prop: &'static str, value: &str, found: &mut u32) {
    if node.id == id {
        *found += 1;
        node.p.retain(|(name, _)| *name != prop);
        if !value.is_empty() {
            node.p.push((prop, value.to_owned()));
        }
    }
    for child in &mut node.c {
        set(child, id, prop, value, found);
    }
}

/// Whether two views show the same, whatever the order of properties.
pub fn same(a: &View, b: &View) -> bool {
    a.surfaces.iter().flatten().map(flat).eq(b.surfaces.iter().flatten().map(flat))
}

fn flat(node: &Node) -> String {
    let mut props = node.p.clone();
    props.sort();
    let children: Vec<String> = node.c.iter().map(flat).collect();
    format!("{} {} {props:?} [{}]", node.id, node.k, children.join(","))
}

/// Every page.
pub fn pages() -> [Page; 9] {
    Page::ALL
}
