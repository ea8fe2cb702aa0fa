//! The saved form: a sample of every format can be read, what is written can be read back, and the
//! schema says the same as the reading.

use girderbook_core::document::book::UnitSystem;
use girderbook_core::document::{self, Book};
use girderbook_core::material::Defaults;
use girderbook_core::quantity::Stress;
use serde_json::{Value, json};

const SAMPLES: [(u64, &str); 1] = [(1, include_str!("../data/documents/format-1.json"))];
const DEMOS: [&str; 2] =
    [include_str!("../../core/demos/hollow-fork.json"), include_str!("../../core/demos/mill-race.json")];

#[test]
fn samples_of_every_format_are_read() {
    for (format, text) in SAMPLES {
        let book = document::read(text).unwrap_or_else(|e| panic!("format {format}: {e:?}"));
        assert_eq!(book.format, document::book::FORMAT);
        assert_eq!(book.girders.len(), 3);
        assert_eq!(book.findings[0].web_low.read, ["5/16", "0.29"]);
        assert_eq!(book.vehicles[0].axles.text(), "12; 18; 18 kip");
    }
    assert_eq!(SAMPLES.map(|(format, _)| format).last(), Some(&document::book::FORMAT));
}

/// Stands for a rule set that knows no strengths: the sample has its own.
struct Nothing;
impl Defaults for Nothing {
    fn yield_strength(&self, _: Option<i32>) -> Option<(Stress, &'static str)> {
        None
    }
    fn concrete_strength(&self, _: Option<i32>) -> Option<(Stress, &'static str)> {
        None
    }
}

/// A sample is more than its keys: what was written means the same as on the day it was kept.
#[test]
fn samples_still_say_what_they_said() {
    let book = document::read(SAMPLES[0].1).expect("a book");
    let opened = document::bridge(&book, &Nothing);
    let said: Vec<&str> = opened.problems.iter().map(|problem| problem.path.as_str()).collect();
    assert_eq!(
        said,
        ["layers.l2.thickness", "members.m6.brace_spacing", "members.m6.bearing_length"],
        "{:#?}",
        opened.problems
    );
    let bridge = opened.bridge.expect("a bridge");
    let near = |a: f64, b: f64| assert!((a / b - 1.0).abs() < 1e-12, "{a} against {b}");
    near(bridge.spans[0].length.value.in_mm(), (32.0 * 304.8 + 3.5 * 25.4 + 9840.0) / 2.0);
    near(bridge.deck.layers[0].thickness.value.in_mm(), (2.0 * 25.4 + 2.75 * 25.4 + 70.0) / 3.0);
    near(bridge.deck.strips[0].weight.value.in_kip_ft(), 0.2);
    near(bridge.lines[2].y.in_inch(), 24.0 + 72.0 + 72.125);
    near(bridge.findings[0].web_low.as_ref().expect("lowest band").least().in_inch(), 0.29);
    near(bridge.vehicles[0].axles[2].in_kip(), 18.0);
    assert_eq!(bridge.posting.service_governs, Some(false));
}

/// The sample of the present format and the demos are kept in the written form, so that a change of
/// the form shows as a change of these files.
#[test]
fn books_are_written_as_they_are_kept() {
    for text in [SAMPLES[0].1, DEMOS[0], DEMOS[1]] {
        let book = document::read(text).expect("a book");
        assert_eq!(document::write(&book), text);
    }
}

#[test]
fn the_sample_has_every_key() {
    let book = document::read(SAMPLES[0].1).expect("a book");
    let mut bare: Vec<String> = Vec::new();
    for field in document::fields(&book) {
        if book.text(&field.path).is_some_and(|view| view.text.is_empty()) {
            bare.push(field.path);
        }
    }
    // What one of the two members or the first girder has not, another has.
    bare.retain(|path| !path.starts_with("members.") && path != "girders.g7.spacing");
    assert_eq!(bare, Vec::<String>::new());
}

#[test]
fn an_empty_book_is_read_back() {
    for system in [UnitSystem::MetreKilonewton, UnitSystem::FootKip] {
        let book = Book::empty("new-1", system);
        assert_eq!(document::read(&document::write(&book)), Ok(book));
    }
}

/// One field a line, short enough to read, in one order.
#[test]
fn the_written_form_is_for_people() {
    let mut book = Book::empty("new-1", UnitSystem::FootKip);
    book.set("deck.slab", "7 1/4; 7 in").expect("slab");
    book.set("site.notes", "a \"quoted\" word").expect("notes");
    let text = document::write(&book);
    assert!(text.starts_with("{\n  \"format\": 1,\n  \"id\": \"new-1\",\n  \"system\": \"ft-kip\",\n"));
    assert!(text.contains("\n    \"slab\": { \"read\": [\"7 1/4\", \"7 in\"], \"from\": \"measured\" }\n"));
    assert!(text.contains("\n    \"notes\": \"a \\\"quoted\\\" word\"\n"));
    assert!(text.ends_with("}\n"));
}

/// As much of JSON Schema as the published schema uses.
fn faults(schema: &Value, root: &Value, value: &Value, path: &str, out: &mut Vec<String>) {
    let mut known = vec!["description", "title", "$schema", "$defs"];
    if let Some(reference) = schema.get("$ref") {
        known.push("$ref");
        assert_eq!(reference, "#/$defs/entry");
        faults(&root["$defs"]["entry"], root, value, path, out);
    }
    if let Some(kind) = schema.get("type") {
        known.push("type");
        let fits = match kind.as_str().expect("type") {
            "object" => value.is_object(),
            "array" => value.is_array(),
            "string" => value.is_string(),
            "integer" => value.is_u64() || value.is_i64(),
            other => panic!("type {other}"),
        };
        if !fits {
            out.push(format!("{path}: not of type {kind}"));
            return;
        }
    }
    if let Some(all) = schema.get("enum") {
        known.push("enum");
        if !all.as_array().expect("enum").contains(value) {
            out.push(format!("{path}: {value} is not one of {all}"));
        }
    }
    if let Some(only) = schema.get("const") {
        known.push("const");
        if only != value {
            out.push(format!("{path}: not {only}"));
        }
    }
    if schema.get("minimum").is_some_and(|least| value.as_i64() < least.as_i64()) {
        out.push(format!("{path}: too small"));
    }
    if schema.get("pattern").is_some() {
        let id = value.as_str().expect("string");
        if id.is_empty()
            || id.len() > 64
            || !id.chars().all(|c| c.is_ascii_alphanumeric() || "-_".contains(c))
        {
            out.push(format!("{path}: no id"));
        }
    }
    if let (Some(items), Some(values)) = (schema.get("items"), value.as_array()) {
        for (i, value) in values.iter().enumerate() {
            faults(items, root, value, &format!("{path}[{i}]"), out);
        }
    }
    if let (Some(properties), Some(values)) = (schema.get("properties"), value.as_object()) {
        assert_eq!(schema["additionalProperties"], json!(false), "{path}");
        for (key, value) in values {
            match properties.get(key) {
                Some(schema) => faults(schema, root, value, &format!("{path}.{key}"), out),
                None => out.push(format!("{path}.{key}: unknown")),
            }
        }
        for key in schema["required"].as_array().expect("required") {
            if !values.contains_key(key.as_str().expect("key")) {
                out.push(format!("{path}: {key} is missing"));
            }
        }
    }
    known.extend(["minimum", "pattern", "items", "properties", "additionalProperties", "required"]);
    for keyword in schema.as_object().expect("schema").keys() {
        assert!(known.contains(&keyword.as_str()), "{keyword} is not checked here");
    }
}

fn against_schema(text: &str) -> Vec<String> {
    let schema: Value = serde_json::from_str(&document::schema()).expect("schema");
    let mut out = Vec::new();
    faults(&schema, &schema, &serde_json::from_str(text).expect("JSON"), "", &mut out);
    out
}

#[test]
fn the_schema_accepts_books() {
    let empty = document::write(&Book::empty("new-1", UnitSystem::FootKip));
    for text in [SAMPLES[0].1, DEMOS[0], DEMOS[1], &empty] {
        assert_eq!(against_schema(text), Vec::<String>::new());
    }
}

/// What the reading refuses for its keys and types, the schema refuses as well.
#[test]
fn the_schema_refuses_what_the_reading_refuses() {
    let sample: Value = serde_json::from_str(SAMPLES[0].1).expect("JSON");
    type Spoil = fn(&mut Value);
    let spoil: [(&str, Spoil); 9] = [
        ("unknown key", |v| v["colour"] = json!("red")),
        ("unknown key inside", |v| v["deck"]["widht"] = json!({"read": [], "from": "measured"})),
        ("number for an entry", |v| v["deck"]["slab"] = json!(184)),
        ("number for a reading", |v| v["deck"]["slab"]["read"][0] = json!(184)),
        ("no origin", |v| v["deck"]["slab"] = json!({"read": ["184 mm"]})),
        ("unknown choice", |v| v["members"][0]["connectors"] = json!("maybe")),
        ("list for an object", |v| v["site"] = json!([])),
        ("newer format", |v| v["format"] = json!(2)),
        ("no id", |v| v["girders"][0] = json!({})),
    ];
    for (what, spoil) in spoil {
        let mut value = sample.clone();
        spoil(&mut value);
        let text = value.to_string();
        assert!(document::read(&text).is_err(), "{what}: read");
        assert!(!against_schema(&text).is_empty(), "{what}: schema");
    }
}

/// Every key is explained to whoever opens the file.
#[test]
fn the_schema_describes_every_key() {
    fn walk(schema: &Value, path: &str) {
        if let Some(properties) = schema["properties"].as_object() {
            for (key, schema) in properties {
                let path = format!("{path}.{key}");
                if !path.starts_with(".$defs") {
                    assert!(schema["description"].as_str().is_some_and(|d| d.len() > 2), "{path}");
                }
                walk(schema, &path);
            }
        }
        if let Some(items) = schema.get("items") {
            walk(items, path);
        }
    }
    walk(&serde_json::from_str(&document::schema()).expect("schema"), "");
}
