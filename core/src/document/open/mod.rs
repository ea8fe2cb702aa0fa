//! From the saved text to the bridge: readings parsed and found inside their ranges, defaults put in
//! where nothing was entered, entries held against each other.
//!
//! Every problem is found in one go. A field that is wrong or missing leaves no bridge, since a
//! rating must not be built on it; everything else about the book still opens.

mod deck;
mod findings;
mod girders;
mod member;
mod reader;
mod site;
mod traffic;

use super::book::{Book, ServicePosting, SignUnit};
use super::fields::Order;
use crate::bridge::{self, Bridge};
use crate::material::Defaults;
use crate::problem::Problem;
use crate::units::{Provenance, WeightUnit};
use reader::Reader;

/// What a book says.
#[derive(Clone, Debug, PartialEq)]
pub struct Opened {
    /// The bridge, where nothing that it needs is wrong or missing.
    pub bridge: Option<Bridge>,
    /// Everything wrong, missing or worth knowing, in the order of the fields.
    pub problems: Vec<Problem>,
    /// What stands for fields that are empty: defaults, and sizes of a rolled shape. In the order of
    /// the fields.
    pub filled: Vec<Filled>,
}

impl Opened {
    /// What stands for an empty field, if anything does.
    #[must_use]
    pub fn filled_at(&self, path: &str) -> Option<&Filled> {
        self.filled.iter().find(|filled| filled.path == path)
    }
}

/// What stands for an empty field, as the page shows it there.
#[derive(Clone, Debug, PartialEq, Eq)]
pub struct Filled {
    /// The field.
    pub path: String,
    /// The value with its unit.
    pub text: String,
    /// Assumed for a default; for a size out of a table, the origin of the shape's name.
    pub from: Provenance,
    /// Where it is known from.
    pub source: &'static str,
}

/// Converts a book.
#[must_use]
pub fn bridge(book: &Book, defaults: &dyn Defaults) -> Opened {
    let mut reader = Reader::new(book);
    let year = site::year(&mut reader);
    let site = site::site(&mut reader, year);
    let span = girders::span(&mut reader);
    let skew = reader.needed("skew", "enter 0 if the supports are square to the road");
    let members = member::members(&mut reader, year, defaults);
    let deck = deck::deck(&mut reader, &members, year, defaults);
    let lines = girders::lines(&mut reader, &members, deck.as_ref());
    let findings = findings::findings(&mut reader, &members, span.as_ref());
    let traffic = traffic::traffic(&mut reader);
    let vehicles = traffic::vehicles(&mut reader);
    let posting = bridge::Posting {
        sign: match book.posting.unit {
            SignUnit::ShortTons => WeightUnit::ShortTons,
            SignUnit::Tonnes => WeightUnit::Tonnes,
        },
        service_governs: match book.posting.service {
            ServicePosting::RuleSet => None,
            ServicePosting::Yes => Some(true),
            ServicePosting::No => Some(false),
        },
    };
    reader.tell_year();
    let Reader { mut problems, mut filled, .. } = reader;
    let order = Order::of(book);
    problems.sort_by_cached_key(|problem| order.rank(&problem.path));
    filled.sort_by_cached_key(|filled| order.rank(&filled.path));
    let blocked = problems.iter().any(Problem::blocks);
    let bridge = (|| {
        Some(Bridge {
            site: site?,
            spans: vec![span?],
            skew: skew?,
            deck: deck?,
            members: members.into_iter().map(|(_, member)| member).collect::<Option<_>>()?,
            lines: lines?,
            findings: findings?,
            traffic: traffic?,
            vehicles: vehicles?,
            posting,
        })
    })()
    .filter(|_| !blocked);
    Opened { bridge, problems, filled }
}
