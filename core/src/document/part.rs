//! How the saved types hang together: one description of each type gives its Rust struct, its
//! reading, its writing, the paths into it and its JSON Schema, so that they cannot drift apart.

use core::fmt;
use core::marker::PhantomData;

use serde::de::value::MapAccessDeserializer;
use serde::de::{Deserializer, MapAccess, Visitor};
use serde_json::{Value as Json, json};

use super::entry::Entry;

/// A type of the saved form: a struct, a list, or a leaf that holds what was written.
pub(crate) trait Part {
    /// The part under a key: a field of a struct, or the item of a list with that id.
    fn part(&self, _key: &str) -> Option<&dyn Part> {
        None
    }
    /// The same, to be changed.
    fn part_mut(&mut self, _key: &str) -> Option<&mut dyn Part> {
        None
    }
    /// What is written here, if this is a leaf that can be edited.
    fn leaf(&self) -> Option<Leaf<'_>> {
        None
    }
    /// Puts a value of the leaf's own kind; the value before, or none where the kind does not fit.
    fn put(&mut self, _value: Value) -> Option<Value> {
        None
    }
    /// Visits every leaf with its path, in the order of the saved form.
    fn visit<'a>(&'a self, path: &str, see: &mut dyn FnMut(&str, Leaf<'a>)) {
        if let Some(leaf) = self.leaf() {
            see(path, leaf);
        }
    }
    /// Visits every list with its path and the ids of its items.
    fn lists<'a>(&'a self, _path: &str, _see: &mut dyn FnMut(&str, Vec<&'a str>)) {}
    /// Whether there is nothing here that would have to be written.
    fn is_empty(&self) -> bool;
    /// Writes it as JSON, `indent` levels deep.
    fn write(&self, indent: usize, out: &mut String);
    /// Its JSON Schema.
    fn schema() -> Json
    where
        Self: Sized;
}

/// A leaf as it stands.
#[derive(Clone, Copy, Debug, PartialEq)]
pub(crate) enum Leaf<'a> {
    /// Readings with their origin.
    Entry(&'a Entry),
    /// Free words.
    Words(&'a str),
    /// One of several, with all that there are.
    Choice(&'static str, &'static [&'static str]),
    /// The id of an item in another list.
    Reference(&'a str),
}

/// What a leaf held or shall hold.
#[derive(Clone, Debug, PartialEq)]
pub(crate) enum Value {
    /// Readings with their origin.
    Entry(Entry),
    /// Free words or the id of an item.
    Words(String),
    /// One of several, by its name in the saved form.
    Choice(String),
}

/// An item of a list, which has an id.
pub(crate) trait Item {
    /// Its id, never used again in the book.
    fn id(&self) -> &str;
}

/// `path` and `key` put together.
pub(crate) fn join(path: &str, key: &str) -> String {
    if path.is_empty() { key.to_string() } else { format!("{path}.{key}") }
}

/// A text as JSON.
pub(crate) fn quoted(text: &str) -> String {
    Json::from(text).to_string()
}

pub(crate) fn new_line(indent: usize, out: &mut String) {
    out.push('\n');
    for _ in 0..indent {
        out.push_str("  ");
    }
}

impl<T: Part + Item> Part for Vec<T> {
    fn part(&self, key: &str) -> Option<&dyn Part> {
        self.iter().find(|item| item.id() == key).map(|item| item as &dyn Part)
    }
    fn part_mut(&mut self, key: &str) -> Option<&mut dyn Part> {
        self.iter_mut().find(|item| item.id() == key).map(|item| item as &mut dyn Part)
    }
    fn visit<'a>(&'a self, path: &str, see: &mut dyn FnMut(&str, Leaf<'a>)) {
        for item in self {
            item.visit(&join(path, item.id()), see);
        }
    }
    fn lists<'a>(&'a self, path: &str, see: &mut dyn FnMut(&str, Vec<&'a str>)) {
        see(path, self.iter().map(Item::id).collect());
    }
    fn is_empty(&self) -> bool {
        self.as_slice().is_empty()
    }
    fn write(&self, indent: usize, out: &mut String) {
        out.push('[');
        for (i, item) in self.iter().enumerate() {
            if i > 0 {
                out.push(',');
            }
            new_line(indent + 1, out);
            item.write(indent + 1, out);
        }
        new_line(indent, out);
        out.push(']');
    }
    fn schema() -> Json {
        json!({ "type": "array", "items": T::schema() })
    }
}

impl Part for String {
    fn leaf(&self) -> Option<Leaf<'_>> {
        Some(Leaf::Words(self))
    }
    fn put(&mut self, value: Value) -> Option<Value> {
        let Value::Words(text) = value else { return None };
        Some(Value::Words(core::mem::replace(self, text)))
    }
    fn is_empty(&self) -> bool {
        self.as_str().is_empty()
    }
    fn write(&self, _indent: usize, out: &mut String) {
        out.push_str(&quoted(self));
    }
    fn schema() -> Json {
        json!({ "type": "string" })
    }
}

/// The counter behind the ids.
impl Part for u64 {
    fn is_empty(&self) -> bool {
        *self == 0
    }
    fn write(&self, _indent: usize, out: &mut String) {
        out.push_str(&self.to_string());
    }
    fn schema() -> Json {
        json!({ "type": "integer", "minimum": 0 })
    }
}

/// Structs of the saved form. Fields under `must` have to be in the file; what is empty under `may`
/// is left out.
macro_rules! saved {
    ($(
        $(#[doc = $doc:literal])+
        $name:ident {
            must { $( $(#[doc = $mdoc:literal])+ $must:ident: $mty:ty, )* }
            may { $( $(#[doc = $ydoc:literal])+ $may:ident: $yty:ty, )* }
        }
    )+) => { $(
        $(#[doc = $doc])+
        #[derive(Clone, Debug, Default, PartialEq, serde::Deserialize)]
        #[serde(deny_unknown_fields, remote = "Self")]
        pub struct $name {
            $( $(#[doc = $mdoc])+ pub $must: $mty, )*
            $( $(#[doc = $ydoc])+ #[serde(default)] pub $may: $yty, )*
        }

        $crate::document::part::keyed!($name, "an object in braces");

        impl $crate::document::part::Part for $name {
            fn part(&self, key: &str) -> Option<&dyn $crate::document::part::Part> {
                $( if key == stringify!($must) { return Some(&self.$must); } )*
                $( if key == stringify!($may) { return Some(&self.$may); } )*
                None
            }
            fn part_mut(&mut self, key: &str) -> Option<&mut dyn $crate::document::part::Part> {
                $( if key == stringify!($must) { return Some(&mut self.$must); } )*
                $( if key == stringify!($may) { return Some(&mut self.$may); } )*
                None
            }
            fn visit<'a>(
                &'a self,
                path: &str,
                see: &mut dyn FnMut(&str, $crate::document::part::Leaf<'a>),
            ) {
                use $crate::document::part::join;
                $( self.$must.visit(&join(path, stringify!($must)), see); )*
                $( self.$may.visit(&join(path, stringify!($may)), see); )*
            }
            fn lists<'a>(&'a self, path: &str, see: &mut dyn FnMut(&str, Vec<&'a str>)) {
                use $crate::document::part::join;
                $( self.$must.lists(&join(path, stringify!($must)), see); )*
                $( self.$may.lists(&join(path, stringify!($may)), see); )*
            }
            fn is_empty(&self) -> bool {
                let full: &[bool] = &[
                    $( !$crate::document::part::Part::is_empty(&self.$must), )*
                    $( !$crate::document::part::Part::is_empty(&self.$may), )*
                ];
                !full.contains(&true)
            }
            fn write(&self, indent: usize, out: &mut String) {
                use $crate::document::part::{Part, new_line};
                let parts: &[(&str, bool, &dyn Part)] = &[
                    $( (stringify!($must), true, &self.$must), )*
                    $( (stringify!($may), false, &self.$may), )*
                ];
                out.push('{');
                let mut first = true;
                for (key, must, part) in parts {
                    if *must || !part.is_empty() {
                        if !first {
                            out.push(',');
                        }
                        first = false;
                        new_line(indent + 1, out);
                        out.push('"');
                        out.push_str(key);
                        out.push_str("\": ");
                        part.write(indent + 1, out);
                    }
                }
                new_line(indent, out);
                out.push('}');
            }
            fn schema() -> serde_json::Value {
                use $crate::document::part::described;
                let must: &[&str] = &[ $( stringify!($must), )* ];
                let mut fields = serde_json::Map::new();
                $( fields.insert(
                    stringify!($must).to_string(),
                    described(<$mty as $crate::document::part::Part>::schema(), concat!($($mdoc),+)),
                ); )*
                $( fields.insert(
                    stringify!($may).to_string(),
                    described(<$yty as $crate::document::part::Part>::schema(), concat!($($ydoc),+)),
                ); )*
                serde_json::json!({
                    "type": "object",
                    "description": concat!($($doc),+).trim(),
                    "properties": fields,
                    "required": must,
                    "additionalProperties": false,
                })
            }
        }
    )+ };
}

/// Choices of the saved form, the first one being what holds while nothing was chosen.
macro_rules! choices {
    ($(
        $(#[doc = $doc:literal])+
        $name:ident { $( $(#[doc = $vdoc:literal])+ $variant:ident = $text:literal, )+ }
    )+) => { $(
        $(#[doc = $doc])+
        #[derive(Clone, Copy, Debug, PartialEq, Eq)]
        pub enum $name {
            $( $(#[doc = $vdoc])+ $variant, )+
        }

        impl<'de> serde::Deserialize<'de> for $name {
            fn deserialize<D: serde::Deserializer<'de>>(from: D) -> Result<Self, D::Error> {
                let text = String::deserialize(from)?;
                Self::ALL.iter().copied().find(|choice| choice.text() == text).ok_or_else(|| {
                    serde::de::Error::unknown_variant(&text, Self::TEXTS)
                })
            }
        }

        impl $name {
            /// All there are, the default first.
            pub const ALL: &'static [Self] = &[ $( Self::$variant, )+ ];
            const TEXTS: &'static [&'static str] = &[ $( $text, )+ ];

            /// Its name in the saved form.
            #[must_use]
            pub const fn text(self) -> &'static str {
                match self { $( Self::$variant => $text, )+ }
            }
        }

        impl Default for $name {
            fn default() -> Self {
                Self::ALL[0]
            }
        }

        impl $crate::document::part::Part for $name {
            fn leaf(&self) -> Option<$crate::document::part::Leaf<'_>> {
                Some($crate::document::part::Leaf::Choice(self.text(), Self::TEXTS))
            }
            fn put(
                &mut self,
                value: $crate::document::part::Value,
            ) -> Option<$crate::document::part::Value> {
                let $crate::document::part::Value::Choice(text) = value else { return None };
                let next = Self::ALL.iter().copied().find(|c| c.text() == text)?;
                let before = core::mem::replace(self, next).text().to_string();
                Some($crate::document::part::Value::Choice(before))
            }
            /// A choice is always written: what holds while nothing was chosen is said as well.
            fn is_empty(&self) -> bool {
                false
            }
            fn write(&self, _indent: usize, out: &mut String) {
                out.push('"');
                out.push_str(self.text());
                out.push('"');
            }
            fn schema() -> serde_json::Value {
                serde_json::json!({ "enum": Self::TEXTS })
            }
        }
    )+ };
}

/// Reading of a struct from an object alone: the derived reading would take a list of values in
/// order as well, and so an empty list for any struct. The derive has to say `remote = "Self"`.
macro_rules! keyed {
    ($name:ident, $expected:literal) => {
        impl $crate::document::part::Keyed for $name {
            const EXPECTED: &'static str = $expected;
            fn from_keys<'de, D: serde::Deserializer<'de>>(keys: D) -> Result<Self, D::Error> {
                Self::deserialize(keys)
            }
        }
        impl<'de> serde::Deserialize<'de> for $name {
            fn deserialize<D: serde::Deserializer<'de>>(from: D) -> Result<Self, D::Error> {
                from.deserialize_map($crate::document::part::Keys(core::marker::PhantomData))
            }
        }
    };
}

pub(crate) use {choices, keyed, saved};

/// A struct that is read from an object only.
pub(crate) trait Keyed: Sized {
    /// What belongs there, in words.
    const EXPECTED: &'static str;
    /// The derived reading.
    fn from_keys<'de, D: Deserializer<'de>>(keys: D) -> Result<Self, D::Error>;
}

/// Accepts an object and nothing else.
pub(crate) struct Keys<T>(pub(crate) PhantomData<T>);

impl<'de, T: Keyed> Visitor<'de> for Keys<T> {
    type Value = T;

    fn expecting(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        f.write_str(T::EXPECTED)
    }
    fn visit_map<A: MapAccess<'de>>(self, map: A) -> Result<T, A::Error> {
        T::from_keys(MapAccessDeserializer::new(map))
    }
}

/// A schema with its description.
pub(crate) fn described(mut schema: Json, doc: &str) -> Json {
    if let Some(object) = schema.as_object_mut() {
        object.insert("description".to_string(), Json::from(doc.trim()));
    }
    schema
}
