//! A table of the report as nodes.

use girderbook_core::report::tables::Table;

use crate::key;
use crate::node::Node;
use crate::scene::Scene;

/// The table; `fields` are the fields that its rows open, in order, where rows open fields.
pub(super) fn node(s: &Scene, table: &Table, fields: &[String]) -> Node {
    let head = table.head.iter().map(|text| Node::new("cell").with("text", text.clone()));
    let rows = table.rows.iter().enumerate().map(|(i, row)| {
        let cells = row.iter().map(|cell| {
            Node::new("cell")
                .with("text", cell.text.clone())
                .with("num", if cell.number { "1" } else { "" })
                .with("tone", cell.tone.name())
                .with("go", cell.check.map_or(String::new(), |check| key::go(s, check)))
        });
        Node::new("row").with("go", fields.get(i).cloned().unwrap_or_default()).all(cells)
    });
    Node::new("table")
        .with("caption", table.caption.clone())
        .and(Node::new("row").with("head", "1").all(head))
        .all(rows)
}
