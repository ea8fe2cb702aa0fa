//! What people may type: each wrong entry is kept as it was typed, told beside its field with how to
//! mend it, and no rating is built on it.

use girderbook_core::document::{self, Book, Opened};
use girderbook_core::limits;
use girderbook_core::material::Defaults;
use girderbook_core::problem::Problem;
use girderbook_core::quantity::{Length, Stress};
use girderbook_core::units::Provenance;

struct ByYear;
impl Defaults for ByYear {
    fn yield_strength(&self, year: Option<i32>) -> Option<(Stress, &'static str)> {
        year.map(|_| (Stress::from_mpa(230.0), "by year"))
    }
    fn concrete_strength(&self, year: Option<i32>) -> Option<(Stress, &'static str)> {
        year.map(|_| (Stress::from_mpa(17.0), "by year"))
    }
}

fn open(book: &Book) -> Opened {
    document::bridge(book, &ByYear)
}

fn demo(name: &str) -> Book {
    let text = match name {
        "m-kN" => include_str!("../../core/demos/hollow-fork.json"),
        _ => include_str!("../../core/demos/mill-race.json"),
    };
    document::read(text).expect("a demo")
}

const LENGTH: &str = "enter a length, such as 65 mm or 2 3/8 in";

/// System, path, what is typed, what is said, how to mend it, what one tap would put there.
type Wrong = (&'static str, &'static str, &'static str, &'static str, &'static str, Option<&'static str>);

const WRONG: &[Wrong] = &[
    // Letters, and what only looks like a number.
    (
        "m-kN",
        "spans.s1.length",
        "eighteen",
        "\"eighteen\" is neither a figure nor a unit known here",
        LENGTH,
        None,
    ),
    ("m-kN", "deck.slab", "NaN", "\"NaN\" is neither a figure nor a unit known here", LENGTH, None),
    ("m-kN", "deck.slab", "inf mm", "\"inf\" is neither a figure nor a unit known here", LENGTH, None),
    ("m-kN", "layers.l1.thickness", "6x5", "\"x\" is neither a figure nor a unit known here", LENGTH, None),
    ("m-kN", "deck.slab", "mm", "\"mm\" cannot be read as a length", LENGTH, None),
    ("m-kN", "deck.slab", "1e999 mm", "1e999 is beyond what can be calculated with", LENGTH, None),
    // A unit that is wrong, or missing where it cannot be guessed.
    (
        "m-kN",
        "deck.slab",
        "184 kN",
        "kN is the unit of a force or weight; this field takes a length",
        LENGTH,
        None,
    ),
    (
        "m-kN",
        "strips.p1.weight",
        "5.6 kN",
        "kN is the unit of a force or weight; this field takes a weight on a length",
        "enter a weight on a length, such as 5.6 kN/m or 380 lb/ft",
        None,
    ),
    (
        "m-kN",
        "layers.l1.thickness",
        "2; 3; 4 in",
        "some readings have no unit: are they mm like the field, or in?",
        "write the unit behind each reading",
        Some("2 in; 3 in; 4 in"),
    ),
    (
        "ft-kip",
        "deck.width",
        "27 6",
        "\"27 6\" can be feet and inches, or two readings",
        "write 27 ft 6 in, or 27; 6",
        Some("27 ft 6 in"),
    ),
    (
        "m-kN",
        "deck.haunch",
        "1,234",
        "1,234 can be 1234 or 1.234",
        "write it without the comma, or with a point",
        Some("1234"),
    ),
    // Negative, nothing, and far too large.
    (
        "m-kN",
        "deck.slab",
        "-184 mm",
        "slab thickness must be 50 to 600 mm, not -184 mm",
        "check the reading and its unit (thinner slabs are planks, thicker ones are slab bridges)",
        None,
    ),
    (
        "m-kN",
        "spans.s1.length",
        "0",
        "span must be 2 to 60 m, not 0",
        "check the reading and its unit (short spans: the methods here are for 2 to 60 m)",
        None,
    ),
    (
        "m-kN",
        "spans.s1.length",
        "1e12 m",
        "span must be 2 to 60 m, not 1e12 m",
        "check the reading and its unit (short spans: the methods here are for 2 to 60 m)",
        None,
    ),
    (
        "ft-kip",
        "spans.s1.length",
        "1000000000000",
        "span must be 6.56 to 197 ft, not 1000000000000",
        "check the reading and its unit (short spans: the methods here are for 2 to 60 m)",
        None,
    ),
    (
        "m-kN",
        "girders.g3.spacing",
        "-2.18",
        "girder spacing must be 0.2 to 8 m, not -2.18",
        "check the reading and its unit (beyond 8 m a deck is framed by floor beams)",
        None,
    ),
    (
        "m-kN",
        "skew",
        "90°",
        "skew must be -75 to 75 °, not 90°",
        "check the reading and its unit (beyond 75 degrees the supports hardly cross the road)",
        None,
    ),
    (
        "m-kN",
        "traffic.adtt",
        "-1",
        "trucks a day must be 0 to 50000, not -1",
        "check the reading and its unit (more than any road carries in one direction)",
        None,
    ),
    (
        "ft-kip",
        "vehicles.v9.axles",
        "14; 0; 20 kip",
        "axle weight must be above 0 and at most 337 kip, not 0",
        "check the reading and its unit (heavier axles are no road vehicles)",
        None,
    ),
];

#[test]
fn wrong_entries_are_kept_and_told_and_nothing_is_built_on_them() {
    for &(system, path, typed, message, mend, repair) in WRONG {
        let mut book = demo(system);
        book.set(path, typed).expect(path);
        let opened = open(&book);
        let wanted = Problem::error(path, message, mend);
        let wanted = match repair {
            Some(text) => wanted.with_repair(text),
            None => wanted,
        };
        assert_eq!(opened.problems, [wanted], "{path}: {typed}");
        assert_eq!(opened.bridge, None, "{path}: {typed}");
        let kept = document::read(&document::write(&book)).expect("can be read again");
        assert_eq!(kept.text(path).expect(path).text, typed);
    }
}

/// What one tap puts there can be read, and is in the field's range or is told to be out of it.
#[test]
fn a_repair_mends_what_could_not_be_read() {
    let mut repairs = 0;
    for &(system, path, typed, message, _, repair) in WRONG {
        let Some(repair) = repair else { continue };
        let mut book = demo(system);
        book.set(path, typed).expect(path);
        book.set(path, repair).expect(path);
        let opened = open(&book);
        assert!(opened.problems.iter().all(|problem| problem.message != message), "{path}: {repair}");
        repairs += 1;
    }
    assert_eq!(repairs, 3);
}

/// Of several readings each one that cannot be true is told.
#[test]
fn each_reading_is_held_against_the_range() {
    let mut book = demo("m-kN");
    book.set("layers.l1.thickness", "65; 7200; 70; -3").expect("layer");
    let said: Vec<String> = open(&book).problems.into_iter().map(|problem| problem.message).collect();
    assert_eq!(
        said,
        ["layer thickness must be 0 to 1000 mm, not 7200", "layer thickness must be 0 to 1000 mm, not -3"]
    );
}

/// The ends of every range are let in and what lies just outside is not, by the text of the field.
#[test]
fn ranges_end_where_they_say() {
    let limit = &limits::SLAB;
    for (base, inside) in
        [(limit.least, true), (limit.most, true), (limit.least * 0.999, false), (limit.most * 1.001, false)]
    {
        let mut book = demo("m-kN");
        book.set("deck.slab", &format!("{} mm", base / 10.0)).expect("slab");
        assert_eq!(open(&book).bridge.is_some(), inside, "{base}");
    }
}

/// Readings written in other units are the same reading, and say where they come from.
#[test]
fn readings_in_other_units_count_as_what_they_are() {
    let mut book = demo("m-kN");
    for (typed, mm) in [
        ("184.15", 184.15),
        ("184.15 mm", 184.15),
        ("18,415 cm", 184.15),
        ("7 1/4 in", 184.15),
        ("7-1/4\"", 184.15),
        ("0 ft 7 1/4 in", 184.15),
        ("0.18415m", 184.15),
        ("184.1; 184.2", 184.15),
    ] {
        book.set("deck.slab", typed).expect("slab");
        book.provenance("deck.slab", "drawing").expect("drawing");
        let slab = document::value::<Length>(&book, "deck.slab").expect("entered");
        match (typed, slab) {
            // Decimal comma with three digits behind it: it may be thousands.
            ("18,415 cm", slab) => {
                let problem = slab.expect_err("two meanings").remove(0);
                assert_eq!(problem.message, "18,415 can be 18415 or 18.415");
            }
            (_, slab) => {
                let slab = slab.unwrap_or_else(|problems| panic!("{typed}: {problems:?}"));
                assert!((slab.value.in_mm() - mm).abs() < 1e-9, "{typed}");
                assert_eq!(slab.provenance, Provenance::Drawing);
                assert_eq!(slab.path, "deck.slab");
                assert_eq!(slab.written.join("; "), typed);
            }
        }
    }
}
