//! Everything visible as a tree of nodes, and what changed from one view to the next.
//!
//! The page mounts a view once and then takes updates: a property of a mounted node, a region whose
//! structure changed, a surface whose list of regions changed. So a keystroke mounts nothing anew
//! unless what is there became something else.

use std::collections::BTreeMap;

use serde::ser::{Serialize, SerializeMap, SerializeStruct, Serializer};

/// One thing on the page: what it is, its properties, what is in it.
#[derive(Clone, Debug, PartialEq)]
pub struct Node {
    /// Unique in a view; empty until [`View::sealed`] names it by its place.
    pub id: String,
    /// Kind of node, as the page knows it.
    pub k: &'static str,
    /// Properties; an empty one is left out.
    pub p: Vec<(&'static str, String)>,
    /// What is in it.
    pub c: Vec<Node>,
}

impl Node {
    /// A node without properties.
    #[must_use]
    pub fn new(k: &'static str) -> Self {
        Self { id: String::new(), k, p: Vec::new(), c: Vec::new() }
    }

    /// A region of a surface; its id tells it from the others.
    #[must_use]
    pub fn region(id: &str, label: &str) -> Self {
        Self::new("region").named(id).with("label", label)
    }

    /// The same node under an id of its own.
    #[must_use]
    pub fn named(mut self, id: impl Into<String>) -> Self {
        self.id = id.into();
        self
    }

    /// The same node with a property.
    #[must_use]
    pub fn with(mut self, name: &'static str, value: impl Into<String>) -> Self {
        let value = value.into();
        if !value.is_empty() {
            self.p.push((name, value));
        }
        self
    }

    /// The same node with one more child.
    #[must_use]
    pub fn and(mut self, child: Node) -> Self {
        self.c.push(child);
        self
    }

    /// The same node with more children.
    #[must_use]
    pub fn all(mut self, children: impl IntoIterator<Item = Node>) -> Self {
        self.c.extend(children);
        self
    }

    /// A property; empty where it is not there.
    #[must_use]
    pub fn prop(&self, name: &str) -> &str {
        self.p.iter().find(|(n, _)| *n == name).map_or("", |(_, v)| v)
    }

    /// Visits the node and everything in it.
    pub fn walk<'a>(&'a self, see: &mut dyn FnMut(&'a Node)) {
        see(self);
        for child in &self.c {
            child.walk(see);
        }
    }

    /// Names every node that has no id by its place in its parent.
    fn seal(&mut self) {
        for (i, child) in self.c.iter_mut().enumerate() {
            if child.id.is_empty() {
                child.id = format!("{}.{i}", self.id);
            }
            child.seal();
        }
    }

    fn same_structure(&self, other: &Node) -> bool {
        self.k == other.k
            && self.id == other.id
            && self.c.len() == other.c.len()
            && self.c.iter().zip(&other.c).all(|(a, b)| a.same_structure(b))
    }

    fn changes(&self, before: &Node, out: &mut Vec<Change>) {
        for (name, value) in &self.p {
            if before.prop(name) != value {
                out.push((self.id.clone(), name, value.clone()));
            }
        }
        for (name, _) in &before.p {
            if self.prop(name).is_empty() {
                out.push((self.id.clone(), name, String::new()));
            }
        }
        for (child, before) in self.c.iter().zip(&before.c) {
            child.changes(before, out);
        }
    }
}

/// A property of a mounted node: id, name, value.
pub type Change = (String, &'static str, String);

/// The surfaces of the page.
pub const SURFACES: [&str; 4] = ["head", "drawings", "page", "verdict"];

/// Everything that is visible.
#[derive(Clone, Debug, Default, PartialEq)]
pub struct View {
    /// Counts the edits of the open book.
    pub revision: u32,
    /// The regions of each of [`SURFACES`].
    pub surfaces: [Vec<Node>; 4],
}

impl View {
    /// A view whose nodes all have ids.
    #[must_use]
    pub fn sealed(revision: u32, mut surfaces: [Vec<Node>; 4]) -> Self {
        for region in surfaces.iter_mut().flatten() {
            region.seal();
        }
        Self { revision, surfaces }
    }

    /// What has to be done to a page that shows `before` so that it shows this.
    #[must_use]
    pub fn since(&self, before: &View) -> Update {
        let mut update = Update { revision: self.revision, ..Update::default() };
        for (name, (now, then)) in SURFACES.iter().zip(self.surfaces.iter().zip(&before.surfaces)) {
            let same_list = now.len() == then.len() && now.iter().zip(then).all(|(a, b)| a.id == b.id);
            if !same_list {
                update.surfaces.insert(name, now.clone());
                continue;
            }
            for (region, before) in now.iter().zip(then) {
                if region.same_structure(before) {
                    region.changes(before, &mut update.changes);
                } else {
                    update.regions.push(region.clone());
                }
            }
        }
        update
    }

    /// Visits every node.
    pub fn walk<'a>(&'a self, see: &mut dyn FnMut(&'a Node)) {
        for region in self.surfaces.iter().flatten() {
            region.walk(see);
        }
    }
}

/// What changed from one view to the next.
#[derive(Clone, Debug, Default, PartialEq)]
pub struct Update {
    /// Revision of the view that it leads to.
    pub revision: u32,
    /// Properties of mounted nodes.
    pub changes: Vec<Change>,
    /// Regions to be mounted anew in their place.
    pub regions: Vec<Node>,
    /// Surfaces to be mounted anew.
    pub surfaces: BTreeMap<&'static str, Vec<Node>>,
}

struct Props<'a>(&'a [(&'static str, String)]);

impl Serialize for Props<'_> {
    fn serialize<S: Serializer>(&self, to: S) -> Result<S::Ok, S::Error> {
        let mut map = to.serialize_map(Some(self.0.len()))?;
        for (name, value) in self.0 {
            map.serialize_entry(name, value)?;
        }
        map.end()
    }
}

impl Serialize for Node {
    fn serialize<S: Serializer>(&self, to: S) -> Result<S::Ok, S::Error> {
        let leaf = self.c.is_empty();
        let mut node = to.serialize_struct("Node", if leaf { 3 } else { 4 })?;
        node.serialize_field("id", &self.id)?;
        node.serialize_field("k", self.k)?;
        node.serialize_field("p", &Props(&self.p))?;
        if !leaf {
            node.serialize_field("c", &self.c)?;
        }
        node.end()
    }
}

impl Serialize for View {
    fn serialize<S: Serializer>(&self, to: S) -> Result<S::Ok, S::Error> {
        let mut view = to.serialize_struct("View", 1 + SURFACES.len())?;
        view.serialize_field("revision", &self.revision)?;
        for (name, regions) in SURFACES.into_iter().zip(&self.surfaces) {
            view.serialize_field(name, regions)?;
        }
        view.end()
    }
}

impl Serialize for Update {
    fn serialize<S: Serializer>(&self, to: S) -> Result<S::Ok, S::Error> {
        let mut update = to.serialize_struct("Update", 4)?;
        update.serialize_field("revision", &self.revision)?;
        update.serialize_field("changes", &self.changes)?;
        update.serialize_field("regions", &self.regions)?;
        update.serialize_field("surfaces", &self.surfaces)?;
        update.end()
    }
}

#[cfg(test)]
mod tests {
    use super::*;

    fn view(revision: u32, page: Vec<Node>) -> View {
        View::sealed(revision, [Vec::new(), Vec::new(), page, Vec::new()])
    }

    fn page(length: &str, problem: &str) -> Vec<Node> {
        vec![
            Node::region("a", "Span")
                .and(Node::new("field").named("f:span.length").with("text", length).with("problem", problem)),
            Node::region("b", "Roadway").and(Node::new("text").with("text", "between curbs")),
        ]
    }

    #[test]
    fn nothing_changed_is_an_empty_update() {
        let before = view(1, page("18.3 m", ""));
        assert_eq!(view(2, page("18.3 m", "")).since(&before), Update { revision: 2, ..Update::default() });
    }

    #[test]
    fn a_changed_slot_is_one_change_and_a_vanished_one_is_emptied() {
        let before = view(1, page("18.3", "which unit?"));
        let update = view(2, page("18.3 m", "")).since(&before);
        let id = "f:span.length".to_owned();
        assert_eq!(
            update.changes,
            vec![(id.clone(), "text", "18.3 m".to_owned()), (id, "problem", String::new())]
        );
        assert!(update.regions.is_empty() && update.surfaces.is_empty());
    }

    #[test]
    fn a_changed_structure_replaces_its_region_alone() {
        let before = view(1, page("18.3 m", ""));
        let mut after = page("18.3 m", "");
        after[1] = Node::region("b", "Roadway")
            .and(Node::new("text").with("text", "between curbs"))
            .and(Node::new("text").with("text", "and one more"));
        let update = view(2, after).since(&before);
        assert_eq!(update.regions.iter().map(|r| r.id.as_str()).collect::<Vec<_>>(), ["b"]);
        assert!(update.changes.is_empty() && update.surfaces.is_empty());
    }

    #[test]
    fn a_changed_list_of_regions_replaces_the_surface() {
        let before = view(1, page("18.3 m", ""));
        let mut after = page("18.3 m", "");
        after.pop();
        let update = view(2, after).since(&before);
        assert_eq!(update.surfaces.keys().copied().collect::<Vec<_>>(), ["page"]);
        assert!(update.changes.is_empty() && update.regions.is_empty());
    }

    #[test]
    fn nodes_without_an_id_are_named_by_their_place() {
        let view = view(1, page("18.3 m", ""));
        let mut ids = Vec::new();
        view.walk(&mut |node| ids.push(node.id.as_str()));
        assert_eq!(ids, ["a", "f:span.length", "b", "b.0"]);
    }

    #[test]
    fn the_written_form_is_that_of_the_border() {
        let view = view(3, page("18.3 m", ""));
        let json = serde_json::to_value(&view).expect("plain data");
        assert_eq!(json["revision"], 3);
        assert_eq!(json["head"], serde_json::json!([]));
        assert_eq!(
            json["page"][1],
            serde_json::json!({"id": "b", "k": "region", "p": {"label": "Roadway"},
                "c": [{"id": "b.0", "k": "text", "p": {"text": "between curbs"}}]})
        );
    }
}
