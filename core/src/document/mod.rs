//! The book as it is saved, edited and opened.
//!
//! - [`book`]: the saved form, format 1;
//! - [`entry`]: its leaves, readings as they were written;
//! - [`read()`] and [`write()`]: the file, checked before anything is built on it;
//! - [`mod@fields`]: every field in one table, by path;
//! - [`Book::set`], [`Book::provenance`], [`Book::act`]: edits by path, each with what takes it back;
//! - [`bridge()`]: from the text to the bridge, with every problem and every default in force.
//!
//! These are the only serialised types. Nothing that was typed is lost: what cannot be understood
//! is kept as it is, and no rating is built on it.

pub mod book;
mod edit;
pub mod entry;
pub mod fields;
mod migrate;
mod open;
mod part;
mod read;
mod readings;
mod schema;
mod structure;

pub use book::Book;
pub use edit::{Edit, FieldView};
pub use entry::{Entry, Origin};
pub use fields::{FieldInfo, fields};
pub use open::{Filled, Opened, bridge};
pub use read::{MOST_BYTES, MOST_CHARACTERS, MOST_ITEMS, MOST_LEVELS, read, write};
pub use readings::value;
pub use schema::schema;
