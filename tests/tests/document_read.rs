//! Files that are no book, or not quite: each is refused with words that name the place.

use girderbook_core::document::{MOST_BYTES, MOST_CHARACTERS, MOST_ITEMS, MOST_LEVELS, read};

/// `path: message | mend` of every problem.
fn refusals(text: &str) -> Vec<String> {
    let problems = read(text).expect_err("must be refused");
    assert!(problems.iter().all(|problem| problem.blocks()));
    problems.iter().map(|p| format!("{}: {} | {}", p.path, p.message, p.mend)).collect()
}

/// A book with `rest` behind the keys that it must have.
fn book(rest: &str) -> String {
    format!(r#"{{"format": 1, "id": "b", "system": "m-kN"{rest}}}"#)
}

#[test]
fn the_least_book_is_read() {
    let book = read(&book("")).expect("a book");
    assert_eq!(book.id.0, "b");
    assert!(book.girders.is_empty());
}

#[test]
fn a_byte_order_mark_and_white_space_are_no_harm() {
    assert!(read(&format!("\u{feff} {}\r\n ", book(""))).is_ok());
}

#[test]
fn size_is_refused_before_reading() {
    let text = " ".repeat(MOST_BYTES + 1);
    assert_eq!(
        refusals(&text),
        [": the file has 10 MB; a book has at most 10 MB | choose the file of a book"]
    );
}

#[test]
fn deep_nesting_is_refused_before_reading() {
    let deep = |levels: usize| format!("{}{}", "[".repeat(levels), "]".repeat(levels));
    let said = ": the file is nested more than 64 levels deep, which no book is | choose the file of a book";
    for text in [deep(MOST_LEVELS + 1), deep(1_000_000), book(&format!(r#", "x": {}"#, deep(100_000)))] {
        assert_eq!(refusals(&text), [said]);
    }
    // Brackets inside a text are no nesting.
    assert!(read(&book(&format!(r#", "site": {{"notes": "\"{}"}}"#, "[".repeat(200)))).is_ok());
}

#[test]
fn what_is_not_json_is_refused_with_its_place() {
    let mend = "correct the file, or open an earlier copy of the book";
    for (text, said) in [
        ("", format!(": the file breaks off at line 1, column 0 | {mend}")),
        (r#"{"format": 1,"#, format!(": the file breaks off at line 1, column 13 | {mend}")),
        ("span 18.3 m", format!(": the file cannot be read as JSON at line 1, column 1 | {mend}")),
        (
            "{\"format\": 1,\n \"id\": NaN}",
            format!(": the file cannot be read as JSON at line 2, column 8 | {mend}"),
        ),
        (r#"{"format": 1e999}"#, format!(": the file cannot be read as JSON at line 1, column 16 | {mend}")),
    ] {
        assert_eq!(refusals(text), [said]);
    }
    assert_eq!(
        refusals(&format!("{} x", book(""))),
        [format!(": the file cannot be read as JSON at line 1, column 44 | {mend}")]
    );
}

#[test]
fn other_files_are_no_books() {
    for text in ["[]", "5", "null", "\"book\"", "true"] {
        assert_eq!(refusals(text), [": this is not a book's file | choose the file of a book"], "{text}");
    }
    assert_eq!(
        refusals("{}"),
        [
            "format: the file does not say which format it has, so it is not a book's file | choose the file of a book"
        ]
    );
    for (format, shown) in [("0", "0"), ("-1", "-1"), ("1.5", "1.5"), ("\"1\"", "\"1\""), ("null", "null")] {
        assert_eq!(
            refusals(&format!(r#"{{"format": {format}}}"#)),
            [format!("format: there is no format {shown} | choose the file of a book")]
        );
    }
}

/// Whatever else a newer file holds, it is refused for its format alone.
#[test]
fn a_newer_format_is_refused_kindly() {
    assert_eq!(
        refusals(r#"{"format": 2, "bridges": [{"girders": 5}]}"#),
        ["format: this book was written by a newer Girderbook (format 2; this one reads up to 1) | \
          update Girderbook and open the book again; the file was left as it is"]
    );
}

#[test]
fn unknown_keys_name_their_path() {
    let mend = "take the key out of the file, or correct its spelling";
    for (rest, path, key) in [
        (r#", "colour": "red""#, "colour", "colour"),
        (r#", "deck": {"widht": {"read": ["9 m"], "from": "measured"}}"#, "deck.widht", "widht"),
        (r#", "deck": {"slab": {"read": [], "from": "measured", "unit": "mm"}}"#, "deck.slab.unit", "unit"),
        (r#", "girders": [{"id": "g1"}, {"id": "g2", "y": "2 m"}]"#, "girders[1].y", "y"),
    ] {
        assert_eq!(
            refusals(&book(rest)),
            [format!("{path}: the key \"{key}\" is not known in a book | {mend}")]
        );
    }
}

#[test]
fn wrong_types_say_what_belongs_there() {
    let mend = "correct the file, or open an earlier copy of the book";
    let entry = r#"an entry such as { "read": ["65 mm"], "from": "measured" }"#;
    for (rest, said) in [
        (r#", "deck": []"#, "deck: a list stands where an object in braces belongs".to_string()),
        (
            r#", "site": "by the mill""#,
            "site: the text \"by the mill\" stands where an object in braces belongs".to_string(),
        ),
        (r#", "girders": {}"#, "girders: an object stands where a list in brackets belongs".to_string()),
        (
            r#", "girders": [["g1"]]"#,
            "girders[0]: a list stands where an object in braces belongs".to_string(),
        ),
        (r#", "deck": {"slab": 184}"#, format!("deck.slab: the number 184 stands where {entry} belongs")),
        (
            r#", "deck": {"slab": "184 mm"}"#,
            format!("deck.slab: the text \"184 mm\" stands where {entry} belongs"),
        ),
        (r#", "deck": {"slab": ["184 mm"]}"#, format!("deck.slab: a list stands where {entry} belongs")),
        (r#", "deck": {"slab": null}"#, format!("deck.slab: null stands where {entry} belongs")),
        (
            r#", "deck": {"slab": {"read": [184.5], "from": "measured"}}"#,
            "deck.slab.read[0]: the number 184.5 stands where a text in quotes belongs".to_string(),
        ),
        (
            r#", "deck": {"slab": {"read": "184 mm", "from": "measured"}}"#,
            "deck.slab.read: the text \"184 mm\" stands where a list in brackets belongs".to_string(),
        ),
        (
            r#", "site": {"year_built": 1958}"#,
            "site.year_built: the number 1958 stands where a text in quotes belongs".to_string(),
        ),
        (r#", "next_id": -3"#, "next_id: the number -3 stands where a whole number belongs".to_string()),
        (r#", "next_id": true"#, "next_id: true stands where a whole number belongs".to_string()),
        (
            r#", "deck": {"slab": {"read": ["184 mm"]}}"#,
            "deck.slab.from: the key \"from\" is missing".to_string(),
        ),
        (r#", "spans": [{}]"#, "spans[0].id: the key \"id\" is missing".to_string()),
    ] {
        assert_eq!(refusals(&book(rest)), [format!("{said} | {mend}")], "{rest}");
    }
    assert_eq!(
        refusals(r#"{"format": 1, "id": "b"}"#),
        [format!("system: the key \"system\" is missing | {mend}")]
    );
}

#[test]
fn choices_name_what_can_be_written() {
    assert_eq!(
        refusals(r#"{"format": 1, "id": "b", "system": "cgs"}"#),
        ["system: \"cgs\" is not one of the choices | write m-kN or ft-kip"]
    );
    assert_eq!(
        refusals(&book(r#", "deck": {"slab": {"read": ["7 in"], "from": "guess"}}"#)),
        ["deck.slab.from: \"guess\" is not one of the choices | write measured or drawing or assumed"]
    );
    assert_eq!(
        refusals(&book(r#", "members": [{"id": "m1", "embedded": 1}]"#)),
        ["members[0].embedded: the number 1 stands where a text in quotes belongs | \
          correct the file, or open an earlier copy of the book"]
    );
}

#[test]
fn a_key_is_there_once() {
    assert_eq!(
        refusals(&book(r#", "site": {}, "site": {}"#)),
        ["site: the key \"site\" is there twice | take one of the two out of the file"]
    );
    assert_eq!(
        refusals(r#"{"format": 1, "id": "b", "system": "m-kN", "format": 1}"#),
        ["format: the key \"format\" is there twice | take one of the two out of the file"]
    );
}

#[test]
fn ids_can_be_told_apart() {
    let twice =
        "is there twice, so the two cannot be told apart | give one of the two another id in the file";
    assert_eq!(
        refusals(&book(
            r#", "girders": [{"id": "g1"}, {"id": "g2"}, {"id": "g1"}, {"id": "g2"}], "layers": [{"id": "g1"}]"#
        )),
        [format!("girders[2].id: the id \"g1\" {twice}"), format!("girders[3].id: the id \"g2\" {twice}")]
    );
    let mend = "write 1 to 64 letters, digits, hyphens or underscores in the file";
    assert_eq!(
        refusals(&book(r#", "layers": [{"id": ""}, {"id": "l.1"}, {"id": "é"}]"#)),
        [
            format!("layers[0].id: \"\" is no id | {mend}"),
            format!("layers[1].id: \"l.1\" is no id | {mend}"),
            format!("layers[2].id: \"é\" is no id | {mend}"),
        ]
    );
    assert_eq!(
        refusals(r#"{"format": 1, "id": "", "system": "m-kN"}"#),
        [format!("id: \"\" is no id | {mend}")]
    );
}

#[test]
fn what_is_too_long_is_refused() {
    let field = format!(
        "more than {MOST_CHARACTERS} characters or {MOST_ITEMS} readings do not go into a field | shorten it"
    );
    let long = "é".repeat(MOST_CHARACTERS + 1);
    assert_eq!(
        refusals(&book(&format!(r#", "site": {{"notes": "{long}"}}"#))),
        [format!("site.notes: {field}")]
    );
    assert!(read(&book(&format!(r#", "site": {{"notes": "{}"}}"#, "é".repeat(MOST_CHARACTERS)))).is_ok());
    let many = vec!["\"7 in\""; MOST_ITEMS + 1].join(", ");
    assert_eq!(
        refusals(&book(&format!(r#", "deck": {{"slab": {{"read": [{many}], "from": "measured"}}}}"#))),
        [format!("deck.slab: {field}")]
    );
    let items: Vec<String> = (0..=MOST_ITEMS).map(|i| format!(r#"{{"id": "g{i}"}}"#)).collect();
    assert_eq!(
        refusals(&book(&format!(r#", "girders": [{}]"#, items.join(", ")))),
        [
            "girders: the list has 1001 items; at most 1000 are read | correct the file, or open an earlier copy of the book"
        ]
    );
    assert_eq!(
        refusals(&book(r#", "next_id": 18446744073709551615"#)),
        [
            "next_id: the counter of ids is out of reach | correct the file, or open an earlier copy of the book"
        ]
    );
}

/// A message never carries a whole file.
#[test]
fn messages_are_short_whatever_the_file_holds() {
    let long = "x".repeat(1_000_000);
    for text in [
        book(&format!(r#", "{long}": 1"#)),
        book(&format!(r#", "deck": "{long}""#)),
        book(&format!(r#", "posting": {{"unit": "{long}"}}"#)),
        format!(r#"{{"format": "{long}"}}"#),
        format!(r#"{{"format": 1, "id": "{long}", "system": "m-kN"}}"#),
    ] {
        for said in refusals(&text) {
            assert!(said.chars().count() < 400, "{said}");
        }
    }
}
