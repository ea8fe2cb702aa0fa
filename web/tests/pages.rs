//! Every field of a book stands on one page, every choice has words, every link leads somewhere.

mod common;

use common::{applied, assert_ids_unique, demo, empty, field, first, full, nodes, same, surface, texts};
use girderbook_core::document::{self, fields};
use girderbook_web::desk::Desk;
use girderbook_web::key::Key;
use girderbook_web::pages::{self, Page};

/// Names that say enough as they are saved.
const PLAIN: [&str; 5] = ["none", "smooth", "asphalt", "concrete", "gravel"];

#[test]
fn every_field_of_a_book_stands_on_the_page_that_claims_it_and_on_no_other() {
    let mut desk = full();
    let book = document::read(&desk.text()).expect("its own file");
    let mut paths: Vec<String> = fields(&book).into_iter().map(|field| field.path).collect();
    // The first girder has none at its left.
    paths.retain(|path| *path != format!("girders.{}.spacing", book.girders[0].id.0));
    paths.push("girders.count".to_owned());
    let mut met = vec![0; paths.len()];
    for page in Page::ALL {
        let view = desk.open(page.id()).clone();
        for node in nodes(&view).into_iter().filter(|n| matches!(n.k, "field" | "choice")) {
            let path = node.prop("path");
            assert_eq!(pages::of(path), Some(page), "{path}");
            assert!(!node.prop("label").is_empty(), "{path} has no label");
            if let Some(i) = paths.iter().position(|p| p == path) {
                met[i] += 1;
            } else {
                assert!(path.starts_with("sheet."), "{path} is no field of a book");
            }
        }
    }
    let wrong: Vec<_> = paths.iter().zip(met).filter(|(_, met)| *met != 1).collect();
    assert!(wrong.is_empty(), "not once: {wrong:?}");
}

#[test]
fn every_choice_has_words_and_shows_what_holds() {
    let mut desk = full();
    for page in Page::ALL {
        let view = desk.open(page.id()).clone();
        for choice in nodes(&view).into_iter().filter(|n| n.k == "choice") {
            let path = choice.prop("path");
            let options: Vec<_> = choice.c.iter().map(|o| (o.prop("value"), o.prop("text"))).collect();
            assert!(options.iter().any(|(value, _)| *value == choice.prop("value")), "{path}: {options:?}");
            for (value, text) in options {
                assert!(!text.is_empty(), "{path}: {value}");
                assert!(text != value || PLAIN.contains(&value), "{path}: {value} has no words");
            }
        }
    }
}

#[test]
fn not_inspected_is_a_state_of_its_own_and_the_default() {
    let mut desk = empty();
    desk.act("girders.count:3");
    desk.act("findings.add");
    let mut found = 0;
    for page in Page::ALL {
        let view = desk.open(page.id()).clone();
        for choice in nodes(&view).into_iter().filter(|n| n.k == "choice") {
            if let Some(first) =
                choice.c.iter().find(|o| matches!(o.prop("value"), "not-inspected" | "not-known"))
            {
                assert_eq!(choice.prop("value"), first.prop("value"), "{}", choice.prop("path"));
                assert!(first.prop("text").starts_with("not "), "{}", first.prop("text"));
                found += 1;
            }
        }
    }
    // Condition, connectors, embedded, stiffeners, riding, one web, and two ends of three girders.
    assert_eq!(found, 12);
}

#[test]
fn ids_are_unique_on_every_page() {
    for (mut desk, name) in [(empty(), "empty"), (full(), "full"), (demo(0), "first"), (demo(1), "second")] {
        for page in Page::ALL {
            let view = desk.open(page.id()).clone();
            assert_ids_unique(&view, &format!("{name}, {}", page.id()));
        }
    }
}

#[test]
fn every_link_leads_somewhere() {
    for mut desk in [empty(), full(), demo(0), demo(1)] {
        let mut targets: Vec<String> = Vec::new();
        for page in Page::ALL {
            let view = desk.open(page.id()).clone();
            targets.extend(nodes(&view).iter().map(|n| n.prop("go").to_owned()).filter(|go| !go.is_empty()));
        }
        targets.sort();
        targets.dedup();
        assert!(!targets.is_empty());
        for go in targets {
            if let Some(page) = go.strip_prefix("page:") {
                assert!(Page::by_id(page).is_some(), "{go}");
            } else if let Some(key) = go.strip_prefix("sheet:") {
                let key = Key::parse(key).unwrap_or_else(|| panic!("{go}"));
                desk.open("sheet");
                desk.act(&format!("sheet.show:{}", key.text()));
                let view = desk.view().clone();
                assert_eq!(field(&view, "sheet.girder").prop("value"), key.girder, "{go}");
                assert_eq!(field(&view, "sheet.load").prop("value"), key.load, "{go}");
                assert_eq!(field(&view, "sheet.kind").prop("value"), key.kind, "{go}");
            } else {
                let page = pages::of(&go).unwrap_or_else(|| panic!("{go} is on no page"));
                let view = desk.open(page.id()).clone();
                let _ = field(&view, &go);
            }
        }
    }
}

#[test]
fn an_empty_book_says_what_is_missing_in_order() {
    let mut desk = empty();
    let view = desk.open("rating").clone();
    let items: Vec<(&str, &str)> = surface(&view, "page")
        .into_iter()
        .filter(|n| n.k == "item")
        .map(|n| (n.prop("text"), n.prop("go")))
        .collect();
    let order: Vec<&str> = items.iter().map(|(_, go)| *go).collect();
    assert_eq!(
        order,
        [
            "site.year_built",
            "spans.s1.length",
            "skew",
            "deck.width",
            "deck.roadway",
            "layers.l1.thickness",
            "deck.slab",
            "deck.haunch",
            "strips.p1.weight",
            "members.m1.shape",
            "girders.count"
        ]
    );
    assert_eq!(texts(&view, "verdict", "figure"), ["no number"]);
    let said = texts(&view, "verdict", "text").join(" ");
    assert!(said.contains("No rating yet: 11 things are missing."), "{said}");
    let next: Vec<&str> =
        surface(&view, "verdict").into_iter().filter(|n| n.k == "item").map(|n| n.prop("go")).collect();
    assert_eq!(next, &order[..3]);
    let badges: Vec<usize> = desk.pages().into_iter().map(|(_, n)| n).collect();
    assert_eq!(badges, [1, 5, 4, 1, 0, 0, 0, 0, 0]);
}

/// From nothing to a verdict, as somebody types it under a bridge, and the same as from the file.
#[test]
fn an_empty_book_is_filled_to_a_posted_verdict() {
    let mut desk = empty();
    for (path, text) in [
        ("site.name", "Hollow Fork"),
        ("site.year_built", "1958"),
        ("site.condition", "fair"),
        ("spans.s1.length", "18.30 m; 18.30 m"),
        ("skew", "0"),
        ("deck.width", "9.42 m"),
        ("deck.roadway", "8.53 m"),
        ("layers.l1.thickness", "65; 72; 70; 68; 78; 74; 70"),
        ("deck.slab", "7 1/4 in"),
        ("deck.haunch", "38; 42; 40"),
        ("deck.haunch_width", "300"),
        ("strips.p1.weight", "440 lb/ft"),
        ("members.m1.shape", "W36x182"),
        ("members.m1.connectors", "none"),
        ("members.m1.embedded", "no"),
        ("members.m1.brace_spacing", "15 ft"),
        ("members.m1.bearing_length", "200"),
        ("members.m1.bearing_stiffeners", "no"),
        ("girders.count", "5"),
        ("overhang", "0.35"),
        ("girders.g3.spacing", "2.18 m"),
    ] {
        desk.edit(path, text);
    }
    desk.act("girders.fill:spacing");
    let view = desk.open("span").clone();
    assert_eq!(field(&view, "girders.g6.spacing").prop("text"), "2.18 m");
    for (path, text) in [("traffic.adtt", "420"), ("traffic.riding", "rough")] {
        desk.edit(path, text);
    }
    let figure = first(desk.view(), "verdict", "figure").clone();
    assert!(figure.prop("text").parse::<f64>().is_ok(), "{figure:?}");
    assert!(figure.prop("label").starts_with("least rating factor: "), "{figure:?}");
    assert!(surface(desk.view(), "verdict").iter().any(|n| n.k == "drawing"), "a sign");
    assert!(desk.summary().verdict.starts_with("Post"), "{:?}", desk.summary());
    // Read back from its own file it says the same.
    let mut again = Desk::read(&desk.text()).expect("its own file");
    assert!(same(again.open("rating"), desk.open("rating")) || desk.view().revision > 0);
    assert_eq!(again.summary(), desk.summary());
}

#[test]
fn what_cannot_be_understood_is_kept_and_told_beside_its_field() {
    let mut desk = demo(0);
    desk.open("span");
    for bad in ["abc", "18.3 parsec", "-5 m", "0", "1000000000000 m", "18..3", "\u{0}", "∞", "NaN"] {
        desk.edit("spans.s1.length", bad);
        let view = desk.view().clone();
        let length = field(&view, "spans.s1.length");
        assert_eq!(length.prop("text"), bad);
        assert!(!length.prop("problem").is_empty(), "{bad} passes");
        assert!(!length.prop("mend").is_empty(), "{bad} has no mend");
        assert_eq!(first(&view, "verdict", "figure").prop("text"), "no number", "{bad}");
        assert!(texts(&view, "verdict", "text").iter().any(|t| t == "No rating: 1 entry is wrong."), "{bad}");
    }
    desk.edit("spans.s1.length", "18.3");
    assert!(field(desk.view(), "spans.s1.length").prop("problem").is_empty());
    assert!(first(desk.view(), "verdict", "figure").prop("text").parse::<f64>().is_ok());
}

#[test]
fn a_refused_edit_leaves_the_book_as_it_was() {
    let mut desk = demo(0);
    let before = desk.text();
    desk.open("span");
    desk.edit("girders.count", "many");
    let count = field(desk.view(), "girders.count").clone();
    assert_eq!(count.prop("text"), "many");
    assert!(count.prop("problem").contains("many"), "{count:?}");
    assert_eq!(desk.text(), before);
    desk.open("members");
    desk.act("members.remove:m1");
    let told = texts(desk.view(), "page", "text").join(" ");
    assert!(told.contains("in use"), "{told}");
    assert_eq!(desk.text(), before);
    desk.edit("no.such.field", "x");
    desk.edit("system", "furlong");
    desk.act("everything.explode");
    assert_eq!(desk.text(), before);
}

#[test]
fn a_keystroke_changes_slots_and_mounts_nothing() {
    let mut desk = demo(0);
    desk.open("layers");
    let update = desk.edit("layers.l1.thickness", "65 mm; 72 mm; 70 mm; 68 mm; 78 mm; 74 mm; 84 mm");
    assert!(update.regions.is_empty() && update.surfaces.is_empty(), "{:?}", update.regions);
    let of = |prop: &str| {
        update
            .changes
            .iter()
            .find(|(id, p, _)| id == "f:layers.l1.thickness" && *p == prop)
            .map(|(.., v)| v.as_str())
    };
    assert_eq!(of("echo"), Some("7 readings · mean 73 mm · spread 65 to 84 mm"));
    // What follows from it changes with it.
    assert!(update.changes.iter().any(|(id, ..)| id.starts_with("layers.loads")));
}

#[test]
fn what_an_update_says_is_what_the_next_view_shows() {
    for page in Page::ALL {
        let mut desk = demo(0);
        desk.open(page.id());
        let mut shown = desk.view().clone();
        for (path, text) in [
            ("deck.slab", "x"),
            ("deck.slab", "180 mm"),
            ("layers.l1.thickness", ""),
            ("layers.l1.thickness", "300 mm"),
            ("posting.unit", "short-tons"),
            ("system", "ft-kip"),
            ("members.m1.shape", "W24x94"),
            ("girders.count", "7"),
            ("girders.count", "4"),
            ("findings.f6.web_low", "3 mm"),
            ("findings.f6.straight", "not-straight"),
            ("site.name", ""),
        ] {
            let update = desk.edit(path, text);
            shown = applied(&shown, &update);
            assert!(same(&shown, desk.view()), "{}: {path} {text}", page.id());
            assert_ids_unique(desk.view(), page.id());
        }
        for action in ["layers.add", "findings.add:g1", "undo", "undo", "vehicles.add", "overrides.add"] {
            let update = desk.act(action);
            shown = applied(&shown, &update);
            assert!(same(&shown, desk.view()), "{}: {action}", page.id());
        }
        let update = desk.provenance("deck.slab", "assumed");
        shown = applied(&shown, &update);
        assert!(same(&shown, desk.view()));
    }
}

#[test]
fn an_assumed_default_stands_in_its_empty_field_with_its_source() {
    let mut desk = demo(0);
    let view = desk.open("layers").clone();
    let weight = field(&view, "layers.l1.unit_weight");
    assert_eq!(weight.prop("text"), "");
    assert_eq!(weight.prop("from"), "assumed");
    assert_eq!(weight.prop("ghost"), "22.5");
    assert!(weight.prop("note").contains("asphalt"), "{weight:?}");
    let said = texts(&view, "verdict", "text").join(" ");
    assert!(said.contains("Assumed: ") && said.contains("unit weight of the layer"), "{said}");
    let slab = field(&view, "deck.slab");
    assert_eq!((slab.prop("from"), slab.prop("echo")), ("measured", "= 184.2 mm"));
    desk.provenance("deck.slab", "assumed");
    assert_eq!(field(desk.view(), "deck.slab").prop("from"), "assumed");
    assert!(texts(desk.view(), "verdict", "text").join(" ").contains("thickness of the slab"));
}

#[test]
fn undo_takes_back_a_whole_entry() {
    let mut desk = demo(0);
    desk.open("layers");
    let before = desk.text();
    for typed in ["1", "19", "190", "190 mm"] {
        desk.edit("deck.slab", typed);
    }
    assert_eq!(field(desk.view(), "deck.slab").prop("text"), "190 mm");
    desk.act("undo");
    assert_eq!(desk.text(), before);
    assert!(surface(desk.view(), "head").iter().all(|n| n.prop("act") != "undo"), "nothing is left to undo");
}

#[test]
fn the_sheet_shows_the_governing_check_and_any_other() {
    let mut desk = demo(0);
    let view = desk.open("sheet").clone();
    let lines = surface(&view, "page").into_iter().filter(|n| n.k == "line").count();
    assert!(lines > 30, "{lines} lines");
    let factor = first(&view, "verdict", "figure").prop("text").to_owned();
    assert!(texts(&view, "page", "text").contains(&format!("Rating factor: {factor}")));
    desk.edit("sheet.kind", "moment/strength");
    desk.edit("sheet.girder", "g3");
    desk.edit("sheet.load", "type3/legal");
    let view = desk.view().clone();
    assert_eq!(field(&view, "sheet.kind").prop("value"), "moment/strength");
    assert_eq!(field(&view, "sheet.girder").prop("value"), "g3");
    assert_eq!(field(&view, "sheet.load").prop("value"), "type3/legal");
    // The worst place first; another can be chosen.
    let x = field(&view, "sheet.x");
    assert!(x.c.len() > 20);
    let other = x.c[3].prop("value").to_owned();
    desk.edit("sheet.x", &other);
    assert_eq!(field(desk.view(), "sheet.x").prop("value"), other);
    // It follows edits of the book.
    desk.edit("deck.slab", "150 mm");
    assert_eq!(field(desk.view(), "sheet.girder").prop("value"), "g3");
}

#[test]
fn names_enter_no_figure() {
    let mut desk = demo(0);
    desk.open("site");
    let update = desk.edit("site.notes", "Nothing new.");
    let slots: Vec<(&str, &str)> = update.changes.iter().map(|(id, prop, _)| (id.as_str(), *prop)).collect();
    assert_eq!(slots, [("head.undo", "act"), ("f:site.notes", "text")]);
    desk.edit("site.year_built", "1900");
    let said = texts(desk.view(), "verdict", "text").join(" ");
    assert!(said.contains("yield strength"), "{said}");
}
