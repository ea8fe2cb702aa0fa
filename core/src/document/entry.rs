//! The leaves of the saved form: readings as they were written, ids, references.

use serde::Deserialize;
use serde_json::{Value as Json, json};

use super::part::{Leaf, Part, Value, choices, keyed, quoted};
use crate::units::Provenance;

choices! {
    /// Where an entry comes from, in the saved form.
    Origin {
        /// Read on this bridge.
        Measured = "measured",
        /// Taken from a drawing or an earlier report.
        Drawing = "drawing",
        /// Somebody's judgement.
        Assumed = "assumed",
    }
}

impl From<Origin> for Provenance {
    fn from(origin: Origin) -> Self {
        match origin {
            Origin::Measured => Self::Measured,
            Origin::Drawing => Self::Drawing,
            Origin::Assumed => Self::Assumed,
        }
    }
}

/// A measured field: one text for each reading, kept as it was written whether or not it can be
/// understood.
#[derive(Clone, Debug, Default, PartialEq, Deserialize)]
#[serde(deny_unknown_fields, remote = "Self")]
pub struct Entry {
    /// The readings; none where nothing was entered.
    pub read: Vec<String>,
    /// Where they come from.
    pub from: Origin,
}

keyed!(Entry, "an entry such as { \"read\": [\"65 mm\"], \"from\": \"measured\" }");

impl Entry {
    /// Readings of one origin.
    #[must_use]
    pub fn new(from: Origin, read: &[&str]) -> Self {
        Self { read: read.iter().map(|text| (*text).to_string()).collect(), from }
    }

    /// Whether nothing was entered.
    #[must_use]
    pub fn is_blank(&self) -> bool {
        self.read.iter().all(|text| text.trim().is_empty())
    }

    /// All readings in one text, as a field shows them.
    #[must_use]
    pub fn text(&self) -> String {
        self.read.join("; ")
    }
}

impl Part for Entry {
    fn leaf(&self) -> Option<Leaf<'_>> {
        Some(Leaf::Entry(self))
    }
    fn put(&mut self, value: Value) -> Option<Value> {
        let Value::Entry(entry) = value else { return None };
        Some(Value::Entry(core::mem::replace(self, entry)))
    }
    fn is_empty(&self) -> bool {
        *self == Self::default()
    }
    fn write(&self, _indent: usize, out: &mut String) {
        let read: Vec<String> = self.read.iter().map(|text| quoted(text)).collect();
        out.push_str(&format!("{{ \"read\": [{}], \"from\": \"{}\" }}", read.join(", "), self.from.text()));
    }
    fn schema() -> Json {
        json!({ "$ref": "#/$defs/entry" })
    }
}

/// The schema that [`Entry::schema`] refers to.
pub(crate) fn entry_schema() -> Json {
    json!({
        "type": "object",
        "description": "Readings as they were written, one text for each, and where they come from.",
        "properties": {
            "read": { "type": "array", "items": { "type": "string" } },
            "from": Origin::schema(),
        },
        "required": ["read", "from"],
        "additionalProperties": false,
    })
}

/// The id of an item, never used again in its book.
#[derive(Clone, Debug, Default, PartialEq, Eq, Deserialize)]
#[serde(transparent)]
pub struct Id(pub String);

impl Part for Id {
    fn is_empty(&self) -> bool {
        self.0.is_empty()
    }
    fn write(&self, _indent: usize, out: &mut String) {
        out.push_str(&quoted(&self.0));
    }
    fn schema() -> Json {
        json!({ "type": "string", "pattern": "^[A-Za-z0-9_-]{1,64}$" })
    }
}

/// The id of an item in another list: the member of a girder, the girder of a finding.
#[derive(Clone, Debug, Default, PartialEq, Eq, Deserialize)]
#[serde(transparent)]
pub struct Reference(pub String);

impl Part for Reference {
    fn leaf(&self) -> Option<Leaf<'_>> {
        Some(Leaf::Reference(&self.0))
    }
    fn put(&mut self, value: Value) -> Option<Value> {
        let Value::Words(text) = value else { return None };
        Some(Value::Words(core::mem::replace(&mut self.0, text)))
    }
    fn is_empty(&self) -> bool {
        self.0.is_empty()
    }
    fn write(&self, _indent: usize, out: &mut String) {
        out.push_str(&quoted(&self.0));
    }
    fn schema() -> Json {
        json!({ "type": "string" })
    }
}
