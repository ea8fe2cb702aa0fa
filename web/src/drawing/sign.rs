//! The face of the sign, as rectangles and text.

use girderbook_core::report::sign::Face;

use super::rect;
use crate::node::Node;

const WIDE: i32 = 240;
const LINE: i32 = 34;

/// The drawing of a sign.
#[must_use]
pub fn node(face: &Face) -> Node {
    let height = 24 + LINE * i32::try_from(face.rows.len()).unwrap_or(1);
    let mut node = Node::new("drawing")
        .with("desc", face.spoken.clone())
        .with("view", format!("0 0 {WIDE} {height}"))
        .and(shape("sign-face", rect(2, 2, WIDE - 2, height - 2)))
        .and(shape("sign-face", rect(8, 8, WIDE - 8, height - 8)));
    let mut y = 12 + LINE - 10;
    for (name, limit) in &face.rows {
        if name.is_empty() || limit.is_empty() {
            node = node.and(label(WIDE / 2, y, "middle", format!("{name}{limit}")));
        } else {
            node = node.and(label(20, y, "start", (*name).to_owned())).and(label(
                WIDE - 20,
                y,
                "end",
                limit.clone(),
            ));
        }
        y += LINE;
    }
    node
}

fn shape(class: &str, d: String) -> Node {
    Node::new("shape").with("class", class).with("d", d)
}

fn label(x: i32, y: i32, anchor: &str, text: String) -> Node {
    Node::new("label")
        .with("x", x.to_string())
        .with("y", y.to_string())
        .with("text", text)
        .with("class", "sign")
        .with("anchor", anchor)
}
