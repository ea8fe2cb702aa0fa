//! Edits by path: each can be taken back, none loses what was typed, none makes a book that cannot
//! be read again.

use girderbook_core::document::book::UnitSystem;
use girderbook_core::document::{self, Book, Edit, MOST_CHARACTERS, Origin};
use girderbook_core::problem::Problem;
use girderbook_core::quantity::{Length, Stress};
use proptest::prelude::*;

fn five_girders() -> Book {
    let mut book = Book::empty("b", UnitSystem::MetreKilonewton);
    done(book.act("girders.count:5"));
    book
}

fn done(result: Result<Edit, Problem>) -> Edit {
    result.expect("must be done")
}

fn refused(result: Result<Edit, Problem>) -> String {
    let problem = result.expect_err("must be refused");
    format!("{}: {} | {}", problem.path, problem.message, problem.mend)
}

fn text(book: &Book, path: &str) -> String {
    book.text(path).expect(path).text
}

#[test]
fn what_is_typed_is_kept_as_it_is() {
    let mut book = five_girders();
    for typed in ["6x5", "65 mm", "-3", "1e12 m", "NaN", "abc", "12'-3 1/2\"", "7,1 cm"] {
        done(book.set("deck.slab", typed));
        assert_eq!(text(&book, "deck.slab"), typed);
        let again = document::read(&document::write(&book)).expect("can be read");
        assert_eq!(text(&again, "deck.slab"), typed);
    }
    done(book.set("site.notes", " two  blanks\nand a line "));
    assert_eq!(text(&book, "site.notes"), " two  blanks\nand a line ");
}

#[test]
fn readings_are_one_text_each() {
    let mut book = five_girders();
    done(book.set("layers.l1.thickness", "65 mm; 72 mm ; 2 3/4 in"));
    assert_eq!(book.layers[0].thickness.read, ["65 mm", "72 mm", "2 3/4 in"]);
    assert_eq!(text(&book, "layers.l1.thickness"), "65 mm; 72 mm; 2 3/4 in");
    done(book.set("layers.l1.thickness", "  "));
    assert!(book.layers[0].thickness.read.is_empty());
}

/// Clearing a field does not turn what is typed next from a drawing's into a measurement.
#[test]
fn provenance_stays_with_the_field() {
    let mut book = five_girders();
    assert_eq!(book.text("deck.slab").expect("slab").from, Some(Origin::Measured));
    done(book.provenance("deck.slab", "drawing"));
    for typed in ["184", "", "190"] {
        done(book.set("deck.slab", typed));
        assert_eq!(book.text("deck.slab").expect("slab").from, Some(Origin::Drawing));
    }
    assert_eq!(
        refused(book.provenance("deck.slab", "guess")),
        "deck.slab: \"guess\" is not one of the choices | choose one of: measured, drawing, assumed"
    );
    assert_eq!(
        refused(book.provenance("site.name", "drawing")),
        "site.name: there is no such field in this book | open the page again"
    );
}

#[test]
fn choices_and_references_offer_what_there_is() {
    let mut book = five_girders();
    assert_eq!(book.text("members.m1.connectors").expect("choice").options, ["not-known", "proved", "none"]);
    done(book.set("members.m1.connectors", "none"));
    assert_eq!(text(&book, "members.m1.connectors"), "none");
    assert_eq!(
        refused(book.set("members.m1.connectors", "perhaps")),
        "members.m1.connectors: \"perhaps\" is not one of the choices | choose one of: not-known, proved, none"
    );
    done(book.act("members.add"));
    let second = book.members[1].id.0.clone();
    let path = format!("girders.{}.member", book.girders[0].id.0);
    assert_eq!(book.text(&path).expect("reference").options, ["m1", &second]);
    done(book.set(&path, &second));
    assert_eq!(
        refused(book.set(&path, "m77")),
        format!("{path}: \"m77\" is not one of the choices | choose one of: m1, {second}")
    );
}

#[test]
fn paths_that_lead_nowhere_are_refused() {
    let mut book = five_girders();
    let before = book.clone();
    for path in [
        "",
        ".",
        "deck",
        "girders",
        "girders.g99.spacing",
        "deck.slab.read",
        "id",
        "format",
        "next_id",
        "spans.s1.id",
    ] {
        assert_eq!(
            refused(book.set(path, "1")),
            format!("{path}: there is no such field in this book | open the page again")
        );
        assert_eq!(book.text(path), None);
    }
    assert!(book.set("deck.slab", &"9".repeat(MOST_CHARACTERS + 1)).is_err());
    assert!(book.set("deck.slab", &"9;".repeat(MOST_CHARACTERS / 2)).is_err());
    assert_eq!(book, before);
}

/// Readings side by side are taken apart where that changes nothing.
#[test]
fn readings_side_by_side_are_one_text_each() {
    let mut book = five_girders();
    for (typed, kept) in [
        ("65 72 70", vec!["65", "72", "70"]),
        ("65, 72, 70", vec!["65", "72", "70"]),
        ("65mm 72mm; 2 3/4 in", vec!["65mm", "72mm", "2 3/4 in"]),
        ("65 72 70 mm", vec!["65 72 70 mm"]),
        ("2 3/4 in", vec!["2 3/4 in"]),
        ("6x5 3", vec!["6x5 3"]),
    ] {
        done(book.set("layers.l1.thickness", typed));
        assert_eq!(book.layers[0].thickness.read, kept, "{typed}");
    }
    // In inches 2 3/4 is one reading, and stays one.
    done(book.set("system", "ft-kip"));
    done(book.set("layers.l1.thickness", "2 3/4"));
    assert_eq!(book.layers[0].thickness.read, ["2 3/4"]);
}

/// 65 in a metric book stays 65 mm when the book turns to feet and inches, and back.
#[test]
fn changing_the_unit_system_changes_no_size() {
    let mut book = five_girders();
    for (path, typed) in [
        ("layers.l1.thickness", "65; 72 mm"),
        ("deck.haunch", "65 72 70 mm"),
        ("deck.width", "9.42 m"),
        ("spans.s1.length", "18.3"),
        ("deck.concrete_weight", "150 pcf"),
        ("traffic.adtt", "420"),
        ("deck.slab", "6x5 abc"),
        ("skew", "15"),
    ] {
        done(book.set(path, typed));
    }
    let before = book.clone();
    let back = done(book.set("system", "ft-kip"));
    for (path, kept) in [
        ("layers.l1.thickness", "65 mm; 72 mm"),
        ("deck.haunch", "65 mm; 72 mm; 70 mm"),
        ("deck.width", "9.42 m"),
        ("spans.s1.length", "18.3 m"),
        ("deck.concrete_weight", "150 pcf"),
        ("traffic.adtt", "420"),
        ("deck.slab", "6x5 abc"),
        ("skew", "15"),
    ] {
        assert_eq!(text(&book, path), kept, "{path}");
    }
    for (path, typed) in [("deck.roadway", "24-0 1/2"), ("deck.slab", "7 1/4; 7"), ("deck.width", "27'-6\"")]
    {
        done(book.set(path, typed));
    }
    done(book.set("system", "m-kN"));
    for (path, kept, ft) in [
        ("deck.slab", "7 1/4 in; 7 in", 7.125 / 12.0),
        ("deck.width", "27'-6\"", 27.5),
        ("deck.roadway", "", 24.0 + 0.5 / 12.0),
    ] {
        let is = document::value::<Length>(&book, path).expect(path).expect(path);
        assert!((is.value.in_ft() / ft - 1.0).abs() < 1e-15, "{path}: {}", text(&book, path));
        assert!(kept.is_empty() || text(&book, path) == kept, "{path}: {}", text(&book, path));
    }
    book = before.clone();
    done(book.set("system", "ft-kip"));
    let after = book.clone();
    let again = done(book.apply(back));
    assert_eq!(book, before);
    done(book.apply(again));
    assert_eq!(book, after);
}

#[test]
fn girders_come_and_go() {
    let mut book = Book::empty("b", UnitSystem::MetreKilonewton);
    done(book.act("girders.count:3"));
    let names = |book: &Book| book.girders.iter().map(|g| g.name.clone()).collect::<Vec<_>>();
    assert_eq!(names(&book), ["G1", "G2", "G3"]);
    let second = format!("girders.{}.spacing", book.girders[1].id.0);
    done(book.set(&second, "2.18 m"));
    done(book.provenance(&second, "drawing"));
    done(book.act("girders.fill:spacing"));
    done(book.set("girders.count", "5"));
    assert_eq!(text(&book, "girders.count"), "5");
    for girder in &book.girders[1..] {
        assert_eq!(girder.spacing, document::Entry::new(Origin::Drawing, &["2.18 m"]));
        assert_eq!(girder.member.0, "m1");
    }
    assert!(book.girders[0].spacing.is_blank());
    // The one behind a girder that is taken out was measured to that girder.
    let third = book.girders[2].id.0.clone();
    done(book.act(&format!("girders.remove:{third}")));
    assert_eq!(names(&book), ["G1", "G2", "G4", "G5"]);
    assert!(book.girders[2].spacing.is_blank());
    done(book.act("girders.add"));
    assert_eq!(names(&book), ["G1", "G2", "G4", "G5", "G6"]);
    for (wrong, shown) in [("", ""), ("1", "1"), ("41", "41"), ("-2", "-2"), ("5.0", "5.0"), ("many", "many")]
    {
        assert_eq!(
            refused(book.set("girders.count", wrong)),
            format!("girders.count: \"{shown}\" is no number of girders | write a whole number from 2 to 40")
        );
    }
}

#[test]
fn what_is_in_use_is_not_taken_out() {
    let mut book = five_girders();
    assert_eq!(
        refused(book.act("members.remove:m1")),
        "members.m1: this kind of girder is in use at G1, G2, G3, G4, G5 | give these girders another kind first"
    );
    let last = book.girders[4].id.0.clone();
    done(book.act(&format!("findings.add:{last}")));
    let finding = book.findings[0].id.0.clone();
    let said = format!(
        "findings.{finding}.girder: there is a finding on this girder | \
         take the finding out first, or give it to another girder"
    );
    assert_eq!(refused(book.act(&format!("girders.remove:{last}"))), said);
    assert_eq!(refused(book.act("girders.count:3")), said);
    done(book.act(&format!("findings.remove:{finding}")));
    done(book.act("girders.count:3"));
}

#[test]
fn actions_that_there_are_not_are_refused() {
    let mut book = Book::empty("b", UnitSystem::FootKip);
    for action in
        ["", "girders", "spans.add", "spans.remove:s1", "girders.fill:all", "deck.add", "layers.move:l1"]
    {
        let said = refused(book.act(action));
        assert!(said.starts_with(": there is no action"), "{action}: {said}");
    }
    assert_eq!(
        refused(book.act("layers.remove:l9")),
        "layers.l9: it is not in this book any more | open the page again"
    );
    assert_eq!(
        refused(book.act("findings.add")),
        "findings: a finding is on a girder, and there is no such girder yet | enter the girders first"
    );
    assert_eq!(
        refused(book.act("girders.fill:spacing")),
        "girders: no spacing is entered yet | enter the first one"
    );
}

/// Ids go up, even over what was taken out or taken back, and over ids that a file brought.
#[test]
fn ids_are_never_used_again() {
    let mut book = five_girders();
    let mut seen: Vec<String> = Vec::new();
    for _ in 0..5 {
        done(book.act("layers.add"));
        let id = book.layers.last().expect("a layer").id.0.clone();
        assert!(!seen.contains(&id), "{id}");
        seen.push(id.clone());
        done(book.act(&format!("layers.remove:{id}")));
        let back = done(book.act("layers.add"));
        let id = book.layers.last().expect("a layer").id.0.clone();
        assert!(!seen.contains(&id), "{id}");
        seen.push(id);
        done(book.apply(back));
    }
    let text = r#"{"format": 1, "id": "b", "system": "m-kN", "layers": [{"id": "l7"}, {"id": "core-12"}]}"#;
    let mut book = document::read(text).expect("a book");
    done(book.act("layers.add"));
    assert_eq!(book.layers[2].id.0, "l13");
    let full = r#"{"format": 1, "id": "b", "system": "m-kN", "next_id": 1000000000000}"#;
    let mut book = document::read(full).expect("a book");
    assert_eq!(refused(book.act("layers.add")), "next_id: the counter of ids is used up | begin a new book");
}

/// An edit that no longer fits leaves the book alone.
#[test]
fn an_edit_is_done_whole_or_not_at_all() {
    let mut book = five_girders();
    done(book.act("layers.add"));
    let id = book.layers[1].id.0.clone();
    let back = done(book.set(&format!("layers.{id}.name"), "Chip seal"));
    done(book.act(&format!("layers.remove:{id}")));
    let before = book.clone();
    assert!(book.apply(back).is_err());
    assert_eq!(book, before);
}

#[derive(Clone, Debug)]
enum Move {
    Set(prop::sample::Index, String),
    From(prop::sample::Index, &'static str),
    Act(String),
    Remove(prop::sample::Index),
}

fn moves() -> impl Strategy<Value = Move> {
    let typed = prop_oneof![
        prop::sample::select(vec![
            "",
            "65",
            "65; 72; 70 mm",
            "7 1/4 in",
            "-3 mm",
            "0",
            "1e12 m",
            "NaN",
            "inf",
            "18.3 m",
            "9.42 m",
            "2.18 m",
            "12'-3 1/2\"",
            "W36x182",
            "36 ksi",
            "24.5 kN/m3",
            "1958",
            "yes",
            "none",
            "inspected",
            "ft-kip",
            "m-kN",
            "g3",
            "m1",
            "14; 20; 20 kip",
            "m; ; 3",
        ])
        .prop_map(str::to_string),
        any::<String>(),
    ];
    let act = prop::sample::select(vec![
        "girders.add",
        "girders.count:4",
        "girders.count:2",
        "girders.fill:spacing",
        "findings.add",
        "layers.add",
        "strips.add",
        "members.add",
        "overrides.add",
        "vehicles.add",
        "spans.add",
        "x",
    ]);
    prop_oneof![
        6 => (any::<prop::sample::Index>(), typed).prop_map(|(at, text)| Move::Set(at, text)),
        1 => (any::<prop::sample::Index>(), prop::sample::select(vec!["measured", "drawing", "assumed", "x"]))
            .prop_map(|(at, from)| Move::From(at, from)),
        2 => act.prop_map(|action| Move::Act(action.to_string())),
        1 => any::<prop::sample::Index>().prop_map(Move::Remove),
    ]
}

struct Nothing;
impl girderbook_core::material::Defaults for Nothing {
    fn yield_strength(&self, _: Option<i32>) -> Option<(Stress, &'static str)> {
        None
    }
    fn concrete_strength(&self, _: Option<i32>) -> Option<(Stress, &'static str)> {
        None
    }
}

/// The same book but for the counter, which never goes back.
fn but_for_the_counter(book: &Book) -> Book {
    Book { next_id: 0, ..book.clone() }
}

proptest! {
    #![proptest_config(ProptestConfig::with_cases(128))]

    #[test]
    fn any_edits_can_be_taken_back(start in 0..3_usize, moves in prop::collection::vec(moves(), 1..25)) {
        let mut book = match start {
            0 => Book::empty("b", UnitSystem::FootKip),
            1 => five_girders(),
            _ => document::read(include_str!("../../core/demos/hollow-fork.json")).expect("the demo"),
        };
        let mut stack = Vec::new();
        for step in moves {
            let before = book.clone();
            let paths: Vec<String> = document::fields(&book).into_iter().map(|field| field.path).collect();
            let result = match &step {
                Move::Set(at, text) => book.set(at.get::<String>(&paths), text),
                Move::From(at, from) => book.provenance(at.get::<String>(&paths), from),
                Move::Act(action) => book.act(action),
                Move::Remove(at) => {
                    let path = at.get(&paths).split('.').collect::<Vec<_>>();
                    let id = path.get(1).copied().unwrap_or_default();
                    book.act(&format!("{}.remove:{id}", path[0]))
                }
            };
            match result {
                Ok(back) => {
                    let after = book.clone();
                    let again = book.apply(back).expect("can be taken back");
                    prop_assert_eq!(but_for_the_counter(&book), but_for_the_counter(&before));
                    stack.push((before, book.apply(again).expect("can be done again")));
                    prop_assert_eq!(&book, &after);
                }
                Err(_) => prop_assert_eq!(but_for_the_counter(&book), but_for_the_counter(&before)),
            }
            prop_assert_eq!(&document::read(&document::write(&book)).expect("can be read"), &book);
            let opened = document::bridge(&book, &Nothing);
            prop_assert_eq!(opened.bridge.is_none(), opened.problems.iter().any(Problem::blocks));
        }
        while let Some((before, back)) = stack.pop() {
            let _ = book.apply(back).expect("can be taken back");
            prop_assert_eq!(but_for_the_counter(&book), but_for_the_counter(&before));
        }
    }
}
