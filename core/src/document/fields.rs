//! Every field of the saved form in one table, in the order of the pages: what it is called, what is
//! written in it, which unit a bare figure has, which range is admissible.

use super::book::{Book, UnitSystem};
use super::part::Part;
use crate::limits::{self, Limit};
use crate::quantity::Dimension;
use crate::units::System;
use crate::units::system::{Scale, default_unit};

/// What is written in a field.
#[derive(Clone, Copy, Debug, PartialEq)]
pub enum Form {
    /// Readings of a quantity.
    Quantity(Measure),
    /// The name of a rolled shape, with its origin.
    Shape,
    /// Free words, or a figure that is no quantity, such as a year.
    Words,
    /// One of several.
    Choice,
    /// An item of another list.
    Reference(Group),
}

/// A quantity that is read off.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Measure {
    /// Kind of quantity.
    pub dimension: Dimension,
    /// Which of the system's units a bare figure has.
    pub scale: Scale,
    /// What can be true.
    pub limit: &'static Limit,
    /// What several readings are.
    pub several: Several,
}

/// What several readings in one field are.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Several {
    /// Readings of one thing: their mean counts.
    Mean,
    /// One thing after another, such as the axles of a vehicle.
    Each,
}

/// Lists that a field can refer to.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Group {
    /// Kinds of girder.
    Members,
    /// Girder lines.
    Girders,
}

/// A field of a book.
#[derive(Clone, Debug, PartialEq)]
pub struct FieldInfo {
    /// Its path.
    pub path: String,
    /// What it is called.
    pub label: &'static str,
    /// What is written in it.
    pub form: Form,
    /// Unit of a bare figure; empty for numbers, words and choices.
    pub unit: &'static str,
}

impl Measure {
    /// Unit of a bare figure.
    #[must_use]
    pub fn unit(&self, system: UnitSystem) -> &'static str {
        default_unit(system.into(), self.dimension, self.scale)
    }
}

impl From<UnitSystem> for System {
    fn from(system: UnitSystem) -> Self {
        match system {
            UnitSystem::MetreKilonewton => Self::MetreKilonewton,
            UnitSystem::FootKip => Self::FootKip,
        }
    }
}

const fn quantity(dimension: Dimension, scale: Scale, limit: &'static Limit) -> Form {
    Form::Quantity(Measure { dimension, scale, limit, several: Several::Mean })
}
const fn long(limit: &'static Limit) -> Form {
    quantity(Dimension::Length, Scale::Long, limit)
}
const fn small(limit: &'static Limit) -> Form {
    quantity(Dimension::Length, Scale::Small, limit)
}
const fn of(dimension: Dimension, limit: &'static Limit) -> Form {
    quantity(dimension, Scale::Long, limit)
}
const fn each(dimension: Dimension, limit: &'static Limit) -> Form {
    Form::Quantity(Measure { dimension, scale: Scale::Long, limit, several: Several::Each })
}

use Form::{Choice, Reference, Shape, Words};

/// Path (`*` for the id of an item), what it is called, what is written in it.
const FIELDS: &[(&str, &str, Form)] = &[
    ("system", "Unit system", Choice),
    ("rule_set", "Rule set", Choice),
    ("site.name", "Name of the bridge", Words),
    ("site.road", "Road", Words),
    ("site.feature", "Crosses", Words),
    ("site.county", "County or place", Words),
    ("site.year_built", "Year built", Words),
    ("site.condition_rating", "Condition rating", Words),
    ("site.condition", "Condition", Choice),
    ("site.notes", "Notes of the last inspection", Words),
    ("site.rating_before", "Rating before", Words),
    ("site.posting_before", "Posting before", Words),
    ("site.rater", "Rater", Words),
    ("site.checker", "Checker", Words),
    ("site.date", "Date", Words),
    ("spans.*.length", "Span", long(&limits::SPAN)),
    ("skew", "Skew", of(Dimension::Angle, &limits::SKEW)),
    ("deck.width", "Width of the deck", long(&limits::DECK_WIDTH)),
    ("deck.roadway", "Roadway between curbs", long(&limits::ROADWAY)),
    ("deck.left_curb", "Left edge to curb", long(&limits::OFFSET)),
    ("layers.*.name", "Layer", Words),
    ("layers.*.substance", "Made of", Choice),
    ("layers.*.thickness", "Thickness of the layer", small(&limits::LAYER)),
    ("layers.*.unit_weight", "Unit weight of the layer", of(Dimension::UnitWeight, &limits::UNIT_WEIGHT)),
    ("deck.slab", "Thickness of the slab", small(&limits::SLAB)),
    ("deck.concrete_weight", "Unit weight of the concrete", of(Dimension::UnitWeight, &limits::UNIT_WEIGHT)),
    ("deck.concrete_strength", "Strength of the concrete", of(Dimension::Stress, &limits::CONCRETE_STRENGTH)),
    ("deck.haunch", "Haunch", small(&limits::HAUNCH)),
    ("deck.haunch_width", "Width of the haunch", small(&limits::FLANGE_WIDTH)),
    ("strips.*.name", "Along the deck", Words),
    ("strips.*.weight", "Weight on a length", of(Dimension::LineLoad, &limits::STRIP)),
    ("strips.*.side", "Edge", Choice),
    ("strips.*.placed", "Placed", Choice),
    ("members.*.name", "Kind of girder", Words),
    ("members.*.kind", "Kind", Choice),
    ("members.*.shape", "Rolled shape", Shape),
    ("members.*.depth", "Depth", small(&limits::DEPTH)),
    ("members.*.top_width", "Width of the top flange", small(&limits::FLANGE_WIDTH)),
    ("members.*.top_thickness", "Thickness of the top flange", small(&limits::PLATE)),
    ("members.*.bottom_width", "Width of the bottom flange", small(&limits::FLANGE_WIDTH)),
    ("members.*.bottom_thickness", "Thickness of the bottom flange", small(&limits::PLATE)),
    ("members.*.web", "Thickness of the web", small(&limits::PLATE)),
    ("members.*.fillet", "Outer face of the flange to the toe of the fillet", small(&limits::PLATE)),
    ("members.*.yield_strength", "Yield strength", of(Dimension::Stress, &limits::YIELD_STRENGTH)),
    ("members.*.connectors", "Connectors to the slab", Choice),
    ("members.*.brace_spacing", "Distance between diaphragms", long(&limits::BRACE_SPACING)),
    ("members.*.embedded", "Top flange embedded in the slab", Choice),
    ("members.*.bearing_length", "Length of bearing", small(&limits::BEARING_LENGTH)),
    ("members.*.bearing_stiffeners", "Stiffeners over the bearings", Choice),
    ("overhang", "Left edge of the deck to the first girder", long(&limits::OFFSET)),
    ("girders.*.name", "Girder", Words),
    ("girders.*.spacing", "Spacing to the girder at the left", long(&limits::SPACING)),
    ("girders.*.member", "Kind of girder", Reference(Group::Members)),
    ("girders.*.end_near", "Web at the near bearing", Choice),
    ("girders.*.end_far", "Web at the far bearing", Choice),
    ("findings.*.name", "Finding", Words),
    ("findings.*.girder", "On girder", Reference(Group::Girders)),
    ("findings.*.from", "Begins, from the near bearing", long(&limits::STATION)),
    ("findings.*.to", "Ends, from the near bearing", long(&limits::STATION)),
    ("findings.*.top", "Left of the top flange", small(&limits::LEFT)),
    ("findings.*.bottom", "Left of the bottom flange", small(&limits::LEFT)),
    ("findings.*.web", "Left of the web, over its height", small(&limits::LEFT)),
    ("findings.*.web_low", "Left in the lowest band of the web", small(&limits::LEFT)),
    ("findings.*.straight", "Web straight and whole", Choice),
    ("traffic.adtt", "Trucks a day in one direction", of(Dimension::Number, &limits::ADTT)),
    ("traffic.riding", "Riding surface", Choice),
    ("overrides.*.factor", "Factor", Words),
    ("overrides.*.value", "Value of the factor", of(Dimension::Number, &limits::FACTOR)),
    ("overrides.*.reason", "Reason", Words),
    ("vehicles.*.name", "Vehicle", Words),
    ("vehicles.*.axles", "Weight of each axle", each(Dimension::Force, &limits::AXLE)),
    ("vehicles.*.spacings", "Distance from axle to axle", each(Dimension::Length, &limits::AXLE_SPACING)),
    ("posting.unit", "Unit of the sign", Choice),
    ("posting.service", "Yielding in service decides on posting", Choice),
];

/// Every field of a book, in the order of the pages.
#[must_use]
pub fn fields(book: &Book) -> Vec<FieldInfo> {
    let mut all = Vec::new();
    book.visit("", &mut |path, _| {
        if let Some((_, label, form)) = row(path) {
            let unit = match form {
                Form::Quantity(measure) => measure.unit(book.system),
                _ => "",
            };
            all.push(FieldInfo { path: path.to_string(), label, form: *form, unit });
        }
    });
    let order = Order::of(book);
    all.sort_by_cached_key(|field| order.rank(&field.path));
    all
}

/// What is written in the field at a path.
#[must_use]
pub fn form(path: &str) -> Option<Form> {
    row(path).map(|(_, _, form)| *form)
}

/// What the field at a path is called; empty where there is no field.
#[must_use]
pub fn label(path: &str) -> &'static str {
    row(path).map_or("", |(_, label, _)| label)
}

fn row(path: &str) -> Option<&'static (&'static str, &'static str, Form)> {
    FIELDS.iter().find(|(pattern, ..)| is_of(path, pattern, false))
}

/// Whether a path is one of a pattern; with `begins`, whether it leads towards it.
fn is_of(path: &str, pattern: &str, begins: bool) -> bool {
    if path.as_bytes().first() != pattern.as_bytes().first() {
        return false;
    }
    let mut keys = path.split('.');
    for wanted in pattern.split('.') {
        match keys.next() {
            Some(key) if wanted == "*" || key == wanted => {}
            None => return begins,
            Some(_) => return false,
        }
    }
    keys.next().is_none()
}

/// The order of the pages for the items that a book has.
pub(super) struct Order<'a> {
    lists: Vec<(String, Vec<&'a str>)>,
}

impl<'a> Order<'a> {
    pub(super) fn of(book: &'a Book) -> Self {
        let mut lists = Vec::new();
        book.lists("", &mut |name, ids| lists.push((name.to_string(), ids)));
        Self { lists }
    }

    /// Place of a path: items of a list stay together, in their order.
    pub(super) fn rank(&self, path: &str) -> (usize, usize, usize) {
        let first = |path: &str| FIELDS.iter().position(|(pattern, ..)| is_of(path, pattern, true));
        let at = first(path).unwrap_or(FIELDS.len());
        let mut keys = path.split('.');
        let list = keys.next().unwrap_or_default();
        match self.lists.iter().find(|(name, _)| name == list) {
            None => (at, 0, 0),
            Some((_, ids)) => {
                let item = keys.next().and_then(|id| ids.iter().position(|other| *other == id));
                (first(list).unwrap_or(at), item.map_or(0, |i| i + 1), at)
            }
        }
    }
}

#[cfg(test)]
mod tests {
    use super::*;
    use crate::document::part::Leaf;

    /// The table and the saved form have the same fields, of the same nature.
    #[test]
    fn the_table_holds_every_field_and_no_other() {
        let mut book = Book::empty("b", UnitSystem::MetreKilonewton);
        for action in ["girders.count:2", "findings.add", "overrides.add", "vehicles.add"] {
            let _ = book.act(action).expect(action);
        }
        let mut met = vec![false; FIELDS.len()];
        book.visit("", &mut |path, leaf| {
            let at = FIELDS.iter().position(|(pattern, ..)| is_of(path, pattern, false));
            let at = at.unwrap_or_else(|| panic!("{path} is not in the table"));
            met[at] = true;
            let fits = matches!(
                (leaf, FIELDS[at].2),
                (Leaf::Entry(_), Form::Quantity(_) | Form::Shape)
                    | (Leaf::Words(_), Form::Words)
                    | (Leaf::Choice(..), Form::Choice)
                    | (Leaf::Reference(_), Form::Reference(_))
            );
            assert!(fits, "{path}");
        });
        let unmet: Vec<_> = FIELDS.iter().zip(met).filter(|(_, met)| !met).collect();
        assert!(unmet.is_empty(), "{unmet:?}");
    }

    #[test]
    fn fields_stand_in_the_order_of_the_pages() {
        let mut book = Book::empty("b", UnitSystem::FootKip);
        let _ = book.act("girders.count:2").expect("two girders");
        let paths: Vec<String> = fields(&book).into_iter().map(|field| field.path).collect();
        let at = |path: &str| paths.iter().position(|p| p == path).expect(path);
        let order = [
            "site.year_built",
            "spans.s1.length",
            "deck.width",
            "layers.l1.thickness",
            "deck.slab",
            "members.m1.shape",
            "overhang",
            "girders.g2.spacing",
            "girders.g2.end_far",
            "girders.g3.name",
            "girders.g3.spacing",
            "traffic.adtt",
        ];
        for pair in order.windows(2) {
            assert!(at(pair[0]) < at(pair[1]), "{pair:?}");
        }
        // What is wrong with a list as a whole comes before its items.
        let rank = |path: &str| Order::of(&book).rank(path);
        assert!(rank("overhang") < rank("girders"));
        assert!(rank("girders") < rank("girders.g2.name"));
    }
}
