//! Reading and writing of the file. A file is somebody else's until it has been checked: size and
//! nesting before anything is built from it, then the format, then every key and type, then ids.

use core::fmt;

use serde::de::{Deserializer, IgnoredAny, MapAccess, Visitor};
use serde_json::Value as Json;
use serde_json::error::Category;

use super::book::{Book, FORMAT};
use super::migrate;
use super::part::{Leaf, Part};
use crate::problem::Problem;

/// Greatest size of a file in bytes.
pub const MOST_BYTES: usize = 10_000_000;
/// Greatest depth of brackets and braces in a file.
pub const MOST_LEVELS: usize = 64;
/// Greatest number of items in a list, of readings in a field.
pub const MOST_ITEMS: usize = 1000;
/// Greatest number of characters in a text.
pub const MOST_CHARACTERS: usize = 10_000;

/// Greatest counter for an id: far beyond any book, far below where counting ends.
pub(super) const MOST_IDS: u64 = 1_000_000_000_000;

const MEND_FILE: &str = "correct the file, or open an earlier copy of the book";

/// Reads a book of this format or of an older one.
///
/// # Errors
/// What keeps the file from being read, each naming the place in the file. Fields that were
/// entered wrongly are no reason: they are kept, and [`super::bridge`] tells of them.
pub fn read(text: &str) -> Result<Book, Vec<Problem>> {
    let refuse = |problem: Problem| vec![problem];
    if text.len() > MOST_BYTES {
        return Err(refuse(Problem::error(
            "",
            format!(
                "the file has {} MB; a book has at most {} MB",
                text.len() / 1_000_000,
                MOST_BYTES / 1_000_000
            ),
            "choose the file of a book",
        )));
    }
    let text = text.strip_prefix('\u{feff}').unwrap_or(text);
    if levels(text) > MOST_LEVELS {
        return Err(refuse(Problem::error(
            "",
            format!("the file is nested more than {MOST_LEVELS} levels deep, which no book is"),
            "choose the file of a book",
        )));
    }
    let book: Book = match format_of(text).map_err(refuse)? {
        FORMAT => {
            let mut reader = serde_json::Deserializer::from_str(text);
            let book = serde_path_to_error::deserialize(&mut reader).map_err(|e| refuse(explain(&e)))?;
            reader.end().map_err(|e| refuse(not_json(&e)))?;
            book
        }
        older => {
            let value = serde_json::from_str(text).map_err(|e| refuse(not_json(&e)))?;
            let value = migrate::to_current(value, older);
            serde_path_to_error::deserialize(value).map_err(|e| refuse(explain(&e)))?
        }
    };
    let problems = unsound(&book);
    if problems.is_empty() { Ok(book) } else { Err(problems) }
}

/// Writes a book, in the order of its fields, one field a line, so that two copies can be compared.
#[must_use]
pub fn write(book: &Book) -> String {
    let mut out = String::new();
    book.write(0, &mut out);
    out.push('\n');
    out
}

/// Greatest depth of brackets and braces outside texts.
fn levels(text: &str) -> usize {
    let (mut depth, mut deepest, mut inside, mut escaped) = (0_usize, 0, false, false);
    for byte in text.bytes() {
        if inside {
            match byte {
                _ if escaped => escaped = false,
                b'\\' => escaped = true,
                b'"' => inside = false,
                _ => {}
            }
        } else {
            match byte {
                b'"' => inside = true,
                b'{' | b'[' => {
                    depth += 1;
                    deepest = deepest.max(depth);
                }
                b'}' | b']' => depth = depth.saturating_sub(1),
                _ => {}
            }
        }
    }
    deepest
}

/// Reads nothing but the format.
struct FormatOnly;

impl<'de> Visitor<'de> for FormatOnly {
    type Value = Option<Json>;

    fn expecting(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        f.write_str("an object in braces")
    }
    fn visit_map<A: MapAccess<'de>>(self, mut map: A) -> Result<Self::Value, A::Error> {
        let mut format = None;
        while let Some(key) = map.next_key::<String>()? {
            if key == "format" {
                format = Some(map.next_value()?);
            } else {
                map.next_value::<IgnoredAny>()?;
            }
        }
        Ok(format)
    }
}

fn format_of(text: &str) -> Result<u64, Problem> {
    let mut reader = serde_json::Deserializer::from_str(text);
    let format = reader
        .deserialize_map(FormatOnly)
        .and_then(|format| reader.end().map(|()| format))
        .map_err(|e| match e.classify() {
            Category::Data => Problem::error("", "this is not a book's file", "choose the file of a book"),
            _ => not_json(&e),
        })?;
    let Some(format) = format else {
        return Err(Problem::error(
            "format",
            "the file does not say which format it has, so it is not a book's file",
            "choose the file of a book",
        ));
    };
    match format.as_u64() {
        Some(number) if (1..=FORMAT).contains(&number) => Ok(number),
        Some(number) if number > FORMAT => Err(Problem::error(
            "format",
            format!(
                "this book was written by a newer Girderbook (format {number}; this one reads up to {FORMAT})"
            ),
            "update Girderbook and open the book again; the file was left as it is",
        )),
        _ => Err(Problem::error(
            "format",
            format!("there is no format {}", short(&format.to_string())),
            "choose the file of a book",
        )),
    }
}

fn not_json(error: &serde_json::Error) -> Problem {
    let place = format!("line {}, column {}", error.line(), error.column());
    let message = if error.classify() == Category::Eof {
        format!("the file breaks off at {place}")
    } else {
        format!("the file cannot be read as JSON at {place}")
    };
    Problem::error("", message, MEND_FILE)
}

/// What serde found wrong, in words for people.
fn explain(error: &serde_path_to_error::Error<serde_json::Error>) -> Problem {
    let inner = error.inner();
    if inner.classify() != Category::Data {
        return not_json(inner);
    }
    let path = short(&error.path().to_string());
    let path = if path == "." { String::new() } else { path };
    let whole = inner.to_string();
    let said = whole.rsplit_once(" at line ").map_or(whole.as_str(), |(said, _)| said);
    let named = |said: &str| said.split('`').nth(1).map(short).unwrap_or_default();
    let at = |key: String| if path.is_empty() { key } else { format!("{path}.{key}") };
    if let Some(rest) = said.strip_prefix("invalid type: ").or(said.strip_prefix("invalid value: ")) {
        let (found, expected) = rest.rsplit_once(", expected ").unwrap_or((rest, "something else"));
        return Problem::error(
            path,
            format!("{} stands where {} belongs", found_in_words(found), expected_in_words(expected)),
            MEND_FILE,
        );
    }
    if said.starts_with("unknown field") {
        return Problem::error(
            path,
            format!("the key \"{}\" is not known in a book", named(said)),
            "take the key out of the file, or correct its spelling",
        );
    }
    if said.starts_with("unknown variant") {
        let all: Vec<&str> = said.split('`').skip(3).step_by(2).collect();
        return Problem::error(
            path,
            format!("\"{}\" is not one of the choices", named(said)),
            format!("write {}", all.join(" or ")),
        );
    }
    if said.starts_with("missing field") {
        return Problem::error(at(named(said)), format!("the key \"{}\" is missing", named(said)), MEND_FILE);
    }
    if said.starts_with("duplicate field") {
        return Problem::error(
            at(named(said)),
            format!("the key \"{}\" is there twice", named(said)),
            "take one of the two out of the file",
        );
    }
    Problem::error(path, short(said), MEND_FILE)
}

fn found_in_words(found: &str) -> String {
    let inner = found.split('`').nth(1).unwrap_or(found);
    if found.starts_with("integer") || found.starts_with("floating point") || found.starts_with("number") {
        format!("the number {}", short(inner))
    } else if let Some(text) = found.strip_prefix("string ") {
        format!("the text {}", short(text))
    } else if found.starts_with("sequence") {
        "a list".to_string()
    } else if found.starts_with("map") {
        "an object".to_string()
    } else {
        short(inner)
    }
}

fn expected_in_words(expected: &str) -> &str {
    match expected {
        "a string" => "a text in quotes",
        "a sequence" => "a list in brackets",
        "u64" => "a whole number",
        other => other,
    }
}

/// At most 80 characters of a text that comes from a file.
fn short(text: &str) -> String {
    match text.char_indices().nth(80) {
        Some((end, _)) => format!("{}…", &text[..end]),
        None => text.to_string(),
    }
}

/// What no type can refuse: ids that cannot be told apart or are no part of a path, sizes.
fn unsound(book: &Book) -> Vec<Problem> {
    let mut problems = Vec::new();
    if !is_id(&book.id.0) {
        problems.push(bad_id("id", &book.id.0));
    }
    if book.next_id > MOST_IDS {
        problems.push(Problem::error("next_id", "the counter of ids is out of reach", MEND_FILE));
    }
    book.lists("", &mut |path, ids| {
        if ids.len() > MOST_ITEMS {
            problems.push(Problem::error(
                path,
                format!("the list has {} items; at most {MOST_ITEMS} are read", ids.len()),
                MEND_FILE,
            ));
            return;
        }
        for (i, id) in ids.iter().enumerate() {
            if !is_id(id) {
                problems.push(bad_id(&format!("{path}[{i}].id"), id));
            } else if ids[..i].contains(id) {
                problems.push(Problem::error(
                    format!("{path}[{i}].id"),
                    format!("the id \"{id}\" is there twice, so the two cannot be told apart"),
                    "give one of the two another id in the file",
                ));
            }
        }
    });
    book.visit("", &mut |path, leaf| {
        let long = |text: &str| text.chars().nth(MOST_CHARACTERS).is_some();
        let too_long = match leaf {
            Leaf::Entry(entry) => entry.read.len() > MOST_ITEMS || entry.read.iter().any(|t| long(t)),
            Leaf::Words(text) | Leaf::Reference(text) => long(text),
            Leaf::Choice(..) => false,
        };
        if too_long {
            problems.push(too_much(path));
        }
    });
    problems
}

/// The refusal of a text that is longer than any field needs.
pub(super) fn too_much(path: &str) -> Problem {
    Problem::error(
        path,
        format!("more than {MOST_CHARACTERS} characters or {MOST_ITEMS} readings do not go into a field"),
        "shorten it",
    )
}

fn is_id(id: &str) -> bool {
    (1..=64).contains(&id.len()) && id.bytes().all(|b| b.is_ascii_alphanumeric() || b == b'-' || b == b'_')
}

fn bad_id(path: &str, id: &str) -> Problem {
    Problem::error(
        path,
        format!("\"{}\" is no id", short(id)),
        "write 1 to 64 letters, digits, hyphens or underscores in the file",
    )
}
