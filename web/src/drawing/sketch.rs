//! What is known of the bridge for drawing it, while entries are still missing: a size that is not
//! entered has a stand-in, which is drawn as assumed and enters no figure.

use girderbook_core::bridge::MemberKind;
use girderbook_core::document::book;
use girderbook_core::quantity::Length;
use girderbook_core::section::rolled;
use girderbook_core::units::Provenance;

use crate::scene::{Scene, girder_name};

/// A size, and whether it is more than an assumption.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Size {
    /// The size in metres.
    pub m: f64,
    /// Whether it was measured or taken from a drawing.
    pub known: bool,
}

/// The plates of a girder, in metres.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Plates {
    /// Depth out to out.
    pub depth: f64,
    /// Width and thickness of the top flange.
    pub top: (f64, f64),
    /// Width and thickness of the bottom flange.
    pub bottom: (f64, f64),
    /// Thickness of the web.
    pub web: f64,
    /// Whether they were entered.
    pub known: bool,
}

/// A girder line.
#[derive(Clone, Debug, PartialEq)]
pub struct Girder {
    /// What it is called.
    pub name: String,
    /// Distance from the left edge of the deck.
    pub y: f64,
    /// Field of its spacing.
    pub spacing: String,
    /// Field of its section.
    pub section: String,
    /// Its plates.
    pub plates: Plates,
}

/// A finding.
#[derive(Clone, Debug, PartialEq)]
pub struct Found {
    /// Number on the drawing.
    pub number: usize,
    /// What it is called.
    pub name: String,
    /// Index of the girder.
    pub girder: usize,
    /// Range along the girder, where both ends are entered.
    pub range: Option<(f64, f64)>,
    /// Field to open.
    pub field: String,
}

/// A layer on the roadway.
#[derive(Clone, Debug, PartialEq)]
pub struct Layer {
    /// What it is called.
    pub name: String,
    /// Thickness.
    pub thickness: Size,
    /// Class of its shape.
    pub class: &'static str,
    /// Field of its thickness.
    pub field: String,
}

/// The bridge for drawing.
#[derive(Clone, Debug, PartialEq)]
pub struct Sketch {
    /// Width of the deck.
    pub width: Size,
    /// Roadway.
    pub roadway: Size,
    /// Left edge to curb.
    pub curb: f64,
    /// Slab.
    pub slab: Size,
    /// Haunch.
    pub haunch: Size,
    /// Layers from the top down.
    pub layers: Vec<Layer>,
    /// Whether something stands along the left and the right edge, and its field.
    pub strips: [Option<String>; 2],
    /// Girders from left to right.
    pub girders: Vec<Girder>,
    /// Findings.
    pub findings: Vec<Found>,
    /// Span.
    pub span: Size,
    /// Field of the span.
    pub span_field: String,
}

/// A size of the book, or its stand-in in metres.
fn size(s: &Scene, path: &str, stand_in: f64) -> Size {
    match s.read::<Length>(path) {
        Some(entered) => Size { m: entered.value.in_m(), known: entered.provenance != Provenance::Assumed },
        None => Size { m: stand_in, known: false },
    }
}

impl Sketch {
    /// What the book says so far.
    #[must_use]
    pub fn of(s: &Scene) -> Self {
        let girders = girders(s);
        let last = girders.last().map_or(0.0, |girder| girder.y);
        let width = size(s, "deck.width", if girders.is_empty() { 8.0 } else { last + girders[0].y });
        let roadway = size(s, "deck.roadway", 0.9 * width.m);
        let middle = ((width.m - roadway.m) / 2.0).max(0.0);
        let side = |strip: &book::Strip, side| strip.side == book::Side::Both || strip.side == side;
        let strip = |wanted| {
            let strip = s.book.strips.iter().find(|strip| side(strip, wanted))?;
            Some(format!("strips.{}.weight", strip.id.0))
        };
        let span_field =
            s.book.spans.first().map_or(String::new(), |span| format!("spans.{}.length", span.id.0));
        Self {
            width,
            roadway,
            curb: size(s, "deck.left_curb", middle).m,
            slab: size(s, "deck.slab", 0.2),
            haunch: size(s, "deck.haunch", 0.0),
            layers: s.book.layers.iter().map(|layer| self::layer(s, layer)).collect(),
            strips: [strip(book::Side::Left), strip(book::Side::Right)],
            girders,
            findings: s.book.findings.iter().enumerate().filter_map(|(i, f)| found(s, i, f)).collect(),
            span: size(s, &span_field, 15.0),
            span_field,
        }
    }
}

fn layer(s: &Scene, layer: &book::Layer) -> Layer {
    let field = format!("layers.{}.thickness", layer.id.0);
    Layer {
        name: layer.name.trim().to_owned(),
        thickness: size(s, &field, 0.05),
        class: match layer.substance {
            book::Substance::Asphalt => "asphalt",
            book::Substance::Concrete => "deck",
            book::Substance::Gravel | book::Substance::Other => "haunch",
        },
        field,
    }
}

fn found(s: &Scene, index: usize, finding: &book::Finding) -> Option<Found> {
    let girder = s.book.girders.iter().position(|girder| girder.id.0 == finding.girder.0)?;
    let path = |field: &str| format!("findings.{}.{field}", finding.id.0);
    let end = |field: &str| s.read::<Length>(&path(field)).map(|entered| entered.value.in_m());
    let name = match finding.name.trim() {
        "" => format!("on {}", girder_name(s.book, girder)),
        name => name.to_owned(),
    };
    Some(Found { number: index + 1, name, girder, range: end("from").zip(end("to")), field: path("from") })
}

fn girders(s: &Scene) -> Vec<Girder> {
    // The bridge knows places that follow from defaults; a book that is not complete has its own.
    let known = s.bridge().map(|bridge| &bridge.lines);
    let spacing =
        |i: usize, id: &str| if i == 0 { 0.0 } else { size(s, &format!("girders.{id}.spacing"), 2.2).m };
    let across: f64 = s.book.girders.iter().enumerate().map(|(i, g)| spacing(i, &g.id.0)).sum();
    let free = s.read::<Length>("deck.width").map_or(0.8, |width| (width.value.in_m() - across) / 2.0);
    let mut y = s.read::<Length>("overhang").map_or(free.max(0.1), |entered| entered.value.in_m());
    let mut all = Vec::new();
    for (i, girder) in s.book.girders.iter().enumerate() {
        y += spacing(i, &girder.id.0);
        let member = s.book.members.iter().find(|member| member.id.0 == girder.member.0);
        all.push(Girder {
            name: girder_name(s.book, i),
            y: known.and_then(|lines| lines.get(i)).map_or(y, |line| line.y.in_m()),
            spacing: format!("girders.{}.spacing", girder.id.0),
            section: member.map_or(String::new(), |member| {
                let field =
                    if member.shape.is_blank() && !member.depth.is_blank() { "depth" } else { "shape" };
                format!("members.{}.{field}", member.id.0)
            }),
            plates: plates(s, i, member),
        });
    }
    all
}

/// The plates of a girder: of the bridge, else what is entered so far.
fn plates(s: &Scene, line: usize, member: Option<&book::Member>) -> Plates {
    if let Some(bridge) = s.bridge()
        && line < bridge.lines.len()
    {
        let MemberKind::Steel(girder) = &bridge.member(line).kind;
        let section = &girder.section;
        return Plates {
            depth: section.depth.value.in_m(),
            top: (section.top.width.value.in_m(), section.top.thickness.value.in_m()),
            bottom: (section.bottom.width.value.in_m(), section.bottom.thickness.value.in_m()),
            web: section.web.value.in_m(),
            known: section.depth.provenance != Provenance::Assumed,
        };
    }
    let Some(member) = member else {
        return Plates { depth: 0.8, top: (0.3, 0.03), bottom: (0.3, 0.03), web: 0.02, known: false };
    };
    let shape = rolled::find(member.shape.text().trim());
    let depth = size(s, &format!("members.{}.depth", member.id.0), shape.map_or(0.8, |r| r.depth.in_m()));
    let plate = |field: &str, table: Option<Length>, stand_in: f64| {
        size(s, &format!("members.{}.{field}", member.id.0), table.map_or(stand_in, Length::in_m)).m
    };
    let flange = shape.map(|r| r.flange);
    let width = shape.map(|r| r.width);
    Plates {
        depth: depth.m,
        top: (plate("top_width", width, 0.3), plate("top_thickness", flange, 0.03)),
        bottom: (plate("bottom_width", width, 0.3), plate("bottom_thickness", flange, 0.03)),
        web: plate("web", shape.map(|r| r.web), 0.02),
        known: depth.known || shape.is_some(),
    }
}
