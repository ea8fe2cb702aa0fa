//! The JSON Schema of the saved form, made of the same description as the types.

use serde_json::json;

use super::book::{Book, FORMAT};
use super::entry::entry_schema;
use super::part::Part;

/// The schema (JSON Schema, draft 2020-12) of a book's file, as text.
#[must_use]
pub fn schema() -> String {
    let mut schema = Book::schema();
    schema["$schema"] = json!("https://json-schema.org/draft/2020-12/schema");
    schema["title"] = json!(format!("A book of Girderbook, format {FORMAT}"));
    schema["properties"]["format"] = json!({ "const": FORMAT, "description": "Format of the file." });
    schema["$defs"] = json!({ "entry": entry_schema() });
    format!("{schema:#}\n")
}
