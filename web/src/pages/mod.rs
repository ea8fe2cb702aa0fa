//! The pages of the book, one file a page: which fields stand there, what they are called, and what
//! is shown beside them.

mod findings;
mod layers;
mod members;
mod posting;
mod rating;
mod sheet;
mod site;
mod span;
mod table;
mod traffic;

use crate::node::Node;
use crate::scene::Scene;

/// A page, as an index tab leads to it.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq)]
pub enum Page {
    /// Where the bridge is and what is on file.
    #[default]
    Site,
    /// Span, roadway, girder lines.
    Span,
    /// What lies and stands on the girders.
    Layers,
    /// Kinds of girder.
    Members,
    /// What was found on girders.
    Findings,
    /// What uses the bridge.
    Traffic,
    /// Rating factors.
    Rating,
    /// The sign.
    Posting,
    /// The worksheet.
    Sheet,
}

impl Page {
    /// All there are, in the order of the tabs.
    pub const ALL: [Self; 9] = [
        Self::Site,
        Self::Span,
        Self::Layers,
        Self::Members,
        Self::Findings,
        Self::Traffic,
        Self::Rating,
        Self::Posting,
        Self::Sheet,
    ];

    /// Its id.
    #[must_use]
    pub const fn id(self) -> &'static str {
        match self {
            Self::Site => "site",
            Self::Span => "span",
            Self::Layers => "layers",
            Self::Members => "members",
            Self::Findings => "findings",
            Self::Traffic => "traffic",
            Self::Rating => "rating",
            Self::Posting => "posting",
            Self::Sheet => "sheet",
        }
    }

    /// What stands on its tab.
    #[must_use]
    pub const fn title(self) -> &'static str {
        match self {
            Self::Site => "Site",
            Self::Span => "Span",
            Self::Layers => "Layers",
            Self::Members => "Members",
            Self::Findings => "Findings",
            Self::Traffic => "Traffic",
            Self::Rating => "Rating",
            Self::Posting => "Posting",
            Self::Sheet => "Sheet",
        }
    }

    /// The page of that id.
    #[must_use]
    pub fn by_id(id: &str) -> Option<Self> {
        Self::ALL.into_iter().find(|page| page.id() == id)
    }

    /// Its regions.
    #[must_use]
    pub fn regions(self, scene: &Scene) -> Vec<Node> {
        match self {
            Self::Site => site::regions(scene),
            Self::Span => span::regions(scene),
            Self::Layers => layers::regions(scene),
            Self::Members => members::regions(scene),
            Self::Findings => findings::regions(scene),
            Self::Traffic => traffic::regions(scene),
            Self::Rating => rating::regions(scene),
            Self::Posting => posting::regions(scene),
            Self::Sheet => sheet::regions(scene),
        }
    }
}

/// The page on which the field of a path stands, or the list that the path names.
#[must_use]
pub fn of(path: &str) -> Option<Page> {
    let mut keys = path.split('.');
    let (first, last) = (keys.next()?, keys.next_back().unwrap_or(""));
    Some(match (first, last) {
        ("system" | "site", _) => Page::Site,
        ("spans" | "skew" | "overhang", _)
        | ("girders", "" | "count" | "spacing")
        | ("deck", "width" | "roadway" | "left_curb") => Page::Span,
        ("deck" | "layers" | "strips", _) => Page::Layers,
        ("girders", "end_near" | "end_far") | ("findings", _) => Page::Findings,
        ("girders" | "members", _) => Page::Members,
        ("traffic" | "vehicles", _) => Page::Traffic,
        ("rule_set" | "overrides", _) => Page::Rating,
        ("posting", _) => Page::Posting,
        ("sheet", _) => Page::Sheet,
        _ => return None,
    })
}

/// A sentence on a page.
fn text(words: impl Into<String>) -> Node {
    Node::new("text").with("text", words)
}

/// A sentence in the background.
fn quiet(words: impl Into<String>) -> Node {
    text(words).with("tone", "quiet")
}

fn heading(words: &str) -> Node {
    Node::new("heading").with("text", words).with("level", "2")
}

fn subheading(words: &str) -> Node {
    Node::new("heading").with("text", words).with("level", "3")
}

fn button(words: impl Into<String>, act: impl Into<String>) -> Node {
    Node::new("button").with("text", words).with("act", act)
}

/// A button that takes an item out.
fn remove(words: &str, list: &str, id: &str) -> Node {
    button(words, format!("{list}.remove:{id}")).with("tone", "danger")
}

fn group(id: String, title: impl Into<String>) -> Node {
    Node::new("group").named(id).with("title", title)
}

/// The first region of a page: its title, what it is for, and what an action could not do.
fn opening(scene: &Scene, page: Page, words: &str) -> Node {
    let mut region = Node::region(&format!("page.{}", page.id()), page.title()).and(heading(page.title()));
    if !words.is_empty() {
        region = region.and(quiet(words));
    }
    if let Some(notice) = scene.notice {
        region = region.and(text(format!("{}: {}.", notice.message, notice.mend)).with("tone", "bad"));
    }
    region
}
