//! From the book to the bridge: what is missing, what cannot be true, what is assumed.

use girderbook_core::bridge::{ConditionRating, MemberKind, Stage, StripSide};
use girderbook_core::document::book::UnitSystem;
use girderbook_core::document::{self, Book, Opened};
use girderbook_core::material::Defaults;
use girderbook_core::problem::{Problem, Severity};
use girderbook_core::quantity::{Length, Stress};
use girderbook_core::units::Provenance;

/// Stands for a rule set: it knows strengths from the year alone.
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
    let opened = document::bridge(book, &ByYear);
    assert_eq!(opened.bridge.is_none(), opened.problems.iter().any(Problem::blocks));
    opened
}

/// Five girders of 2.18 m under a deck of 9.42 m, complete.
fn book() -> Book {
    document::read(include_str!("../../core/demos/hollow-fork.json")).expect("the demo")
}

fn set(book: &mut Book, path: &str, text: &str) {
    book.set(path, text).unwrap_or_else(|problem| panic!("{path}: {problem:?}"));
}

/// What the demo says after one edit.
fn after(path: &str, text: &str) -> Vec<String> {
    let mut book = book();
    set(&mut book, path, text);
    said(&open(&book))
}

/// `severity path: message | mend` of each problem.
fn said(opened: &Opened) -> Vec<String> {
    let one = |p: &Problem| format!("{:?} {}: {} | {}", p.severity, p.path, p.message, p.mend);
    opened.problems.iter().map(one).collect()
}

#[test]
fn an_empty_book_says_what_is_missing_in_the_order_of_the_pages() {
    for system in [UnitSystem::MetreKilonewton, UnitSystem::FootKip] {
        let opened = open(&Book::empty("new", system));
        let missing: Vec<&str> = opened
            .problems
            .iter()
            .filter(|problem| problem.severity == Severity::Missing)
            .map(|problem| problem.path.as_str())
            .collect();
        assert_eq!(
            missing,
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
                "girders",
            ]
        );
        assert!(opened.problems.iter().all(|problem| problem.severity <= Severity::Missing));
    }
}

/// Each item of the list, entered in turn, leaves the list; at its end stands a bridge.
#[test]
fn an_empty_book_filled_item_by_item_becomes_a_bridge() {
    let mut book = Book::empty("new", UnitSystem::FootKip);
    for _ in 0..40 {
        let opened = open(&book);
        let Some(first) = opened.problems.iter().find(|problem| problem.blocks()) else { break };
        let text = match first.path.as_str() {
            "site.year_built" => "1941",
            "spans.s1.length" => "38.5",
            "skew" | "deck.haunch" => "0",
            "deck.width" => "27",
            "deck.roadway" => "24",
            "layers.l1.thickness" => "2",
            "deck.slab" => "7",
            "strips.p1.weight" => "0.2",
            "members.m1.shape" => "W27x94",
            "girders" => {
                book.act("girders.count:4").expect("four girders");
                continue;
            }
            path if path.ends_with(".spacing") => "6",
            path => panic!("{path} is not asked for"),
        };
        let path = first.path.clone();
        set(&mut book, &path, text);
    }
    assert!(open(&book).bridge.is_some(), "{:?}", said(&open(&book)));
}

#[test]
fn the_year_stands_for_strengths_that_were_not_entered() {
    let mut book = book();
    set(&mut book, "site.year_built", "");
    let mend = "enter it: strengths that were not tested are assumed by the year; or enter";
    assert_eq!(
        said(&open(&book)),
        [format!(
            "Missing site.year_built: Year built is not entered yet | {mend} the yield strength of the steel \
             and the strength of the concrete"
        )]
    );
    set(&mut book, "deck.concrete_strength", "20 MPa");
    assert_eq!(
        said(&open(&book)),
        [format!(
            "Missing site.year_built: Year built is not entered yet | {mend} the yield strength of the steel"
        )]
    );
    set(&mut book, "members.m1.yield_strength", "33 ksi");
    assert_eq!(said(&open(&book)), Vec::<String>::new());
    for wrong in ["58", "1958.5", "about 1958", "19580"] {
        set(&mut book, "site.year_built", wrong);
        assert_eq!(
            said(&open(&book)),
            [format!(
                "Error site.year_built: \"{wrong}\" is not a year from 1800 to 2100 | \
                 write the year in four figures, such as 1958"
            )]
        );
    }
}

#[test]
fn the_condition_comes_from_the_words_or_the_rating() {
    let condition = |words: &str, rating: &str| {
        let mut book = book();
        set(&mut book, "site.condition", words);
        set(&mut book, "site.condition_rating", rating);
        let opened = open(&book);
        (opened.bridge.expect("a bridge").site.condition, opened.problems.len())
    };
    assert_eq!(condition("not-known", ""), (None, 0));
    for (rating, is) in [
        ("9", ConditionRating::Good),
        ("6", ConditionRating::Good),
        ("5", ConditionRating::Fair),
        ("4", ConditionRating::Poor),
        ("0", ConditionRating::Poor),
    ] {
        assert_eq!(condition("not-known", rating), (Some(is), 0));
    }
    assert_eq!(condition("poor", ""), (Some(ConditionRating::Poor), 0));
    assert_eq!(
        after("site.condition_rating", "6"),
        [
            "Warning site.condition: the condition does not agree with the condition rating; the condition is used | \
          6 and above is good, 5 is fair, 4 and below is poor"
        ]
    );
    assert_eq!(
        after("site.condition_rating", "10"),
        ["Error site.condition_rating: \"10\" is not a condition rating | \
          write a whole number from 0 to 9, or leave it empty"]
    );
}

#[test]
fn the_roadway_lies_on_the_deck() {
    assert_eq!(
        after("deck.roadway", "9.50 m"),
        ["Error deck.roadway: the roadway is 0.08 m wider than the deck | \
          check the roadway between the curbs and the width of the deck"]
    );
    assert_eq!(
        after("deck.left_curb", "1.2 m"),
        ["Error deck.left_curb: the roadway ends 0.31 m beyond the right edge of the deck | \
          check the left curb, the roadway and the width of the deck"]
    );
    let mut book = book();
    set(&mut book, "deck.left_curb", "0.20 m");
    let bridge = open(&book).bridge.expect("a bridge");
    assert!((bridge.deck.left_curb.in_m() - 0.2).abs() < 1e-12);
}

#[test]
fn girders_stand_under_the_deck() {
    assert_eq!(
        after("girders.g5.spacing", "2.60 m"),
        ["Error girders.g5.spacing: G5 stands 0.07 m outside the deck | \
          check the spacings, the overhang at the left and the width of the deck"]
    );
    assert_eq!(
        after("overhang", "1.00 m"),
        ["Error girders.g5.spacing: G5 stands 0.3 m outside the deck | \
          check the spacings, the overhang at the left and the width of the deck"]
    );
    assert_eq!(
        after("girders.g3.spacing", "0.30 m"),
        ["Error girders.g3.spacing: the girders would stand inside each other | \
          measure from the centre of one girder to the centre of the next"]
    );
    assert_eq!(
        after("girders.g4.spacing", ""),
        ["Missing girders.g4.spacing: Spacing to the girder at the left is not entered yet | \
          measure to the girder at its left, centre to centre"]
    );
    assert_eq!(
        after("girders.g1.spacing", "2 m"),
        [
            "Warning girders.g1.spacing: the first girder has none at its left, so its spacing is not used | clear it"
        ]
    );
    // Without an overhang they stand in the middle, and the page shows it.
    let mut book = book();
    set(&mut book, "overhang", "");
    let opened = open(&book);
    let shown = opened.filled_at("overhang").expect("assumed");
    assert_eq!((shown.text.as_str(), shown.from), ("0.35 m", Provenance::Assumed));
    assert!((opened.bridge.expect("a bridge").lines[0].y.in_m() - 0.35).abs() < 1e-12);
}

#[test]
fn girders_are_of_a_kind_that_is_there() {
    let mut book = book();
    book.girders[1].member.0 = "m9".to_string();
    assert_eq!(
        said(&open(&book)),
        ["Error girders.g2.member: the girder is of a kind that is not in the book | choose its kind"]
    );
    // A kind that no girder is of is left alone, whatever is in it.
    let mut book = self::book();
    book.act("members.add").expect("another kind");
    let id = book.members[1].id.0.clone();
    set(&mut book, &format!("members.{id}.web"), "6x5");
    let opened = open(&book);
    assert_eq!(
        said(&opened),
        [format!(
            "Note members.{id}.name: no girder is of this kind, so it is not looked at | \
             choose it for a girder, or take it out"
        )]
    );
    assert_eq!(opened.bridge.expect("a bridge").members.len(), 1);
}

#[test]
fn a_section_is_a_rolled_shape_or_plates() {
    assert_eq!(
        after("members.m1.shape", "W36x181"),
        ["Error members.m1.shape: \"W36x181\" is not in the table of rolled shapes | \
          write it as W36x182, or leave it empty and measure the plates"]
    );
    assert_eq!(
        after("members.m1.shape", ""),
        ["Missing members.m1.shape: the section of Girder is not entered yet | \
          write the name of a rolled shape, such as W36x182, or measure the plates"]
    );
    let mut book = book();
    book.findings.clear();
    set(&mut book, "members.m1.web", "17.0 mm");
    let bridge = open(&book).bridge.expect("a bridge");
    let MemberKind::Steel(girder) = &bridge.members[0].kind;
    assert_eq!(girder.section.published, None, "a measured plate is not the published shape");
    assert_eq!(girder.section.web.provenance, Provenance::Measured);
    assert_eq!(girder.section.depth.provenance, Provenance::Drawing);
    assert_eq!(girder.section.depth.path, "members.m1.depth");

    set(&mut book, "members.m1.shape", "");
    let mend = "measure it, or write the name of the rolled shape";
    let missing =
        |field: &str, label: &str| format!("Missing members.m1.{field}: {label} is not entered yet | {mend}");
    assert_eq!(
        said(&open(&book)),
        [
            missing("depth", "Depth"),
            missing("top_width", "Width of the top flange"),
            missing("top_thickness", "Thickness of the top flange"),
            missing("bottom_width", "Width of the bottom flange"),
            missing("bottom_thickness", "Thickness of the bottom flange"),
        ]
    );
    for (field, text) in [
        ("depth", "920 mm"),
        ("top_width", "300 mm"),
        ("top_thickness", "28 mm"),
        ("bottom_width", "310 mm"),
        ("bottom_thickness", "30 mm"),
    ] {
        set(&mut book, &format!("members.m1.{field}"), text);
    }
    let opened = open(&book);
    assert_eq!(said(&opened), Vec::<String>::new());
    assert_eq!(opened.filled_at("members.m1.fillet").map(|f| f.text.as_str()), Some("30 mm"));
    let MemberKind::Steel(girder) = &opened.bridge.expect("a bridge").members[0].kind;
    assert_eq!(girder.section.fillet.value, Length::from_mm(30.0));
}

#[test]
fn plates_fit_together() {
    let fits = |field: &str, text: &str| after(&format!("members.m1.{field}"), text);
    assert_eq!(
        fits("top_thickness", "60 mm"),
        ["Error members.m1.fillet: the toe of the fillet lies inside the flange | \
          measure it from the outer face of the flange"]
    );
    let mut book = book();
    book.findings.clear();
    for (path, text) in [("members.m1.depth", "100 mm"), ("members.m1.top_thickness", "80 mm")] {
        set(&mut book, path, text);
    }
    assert_eq!(
        said(&open(&book)),
        [
            "Error members.m1.depth: the girder is no deeper than its two flanges are thick | \
             check the depth and the thickness of the flanges",
            "Error members.m1.fillet: the toe of the fillet lies inside the flange | \
             measure it from the outer face of the flange",
        ]
    );
    book = self::book();
    book.findings.clear();
    set(&mut book, "members.m1.web", "75 mm");
    set(&mut book, "members.m1.top_width", "70 mm");
    assert_eq!(
        said(&open(&book)),
        [
            "Error members.m1.top_width: the flange is no wider than the web is thick | check the flange and the web"
        ]
    );
}

#[test]
fn a_finding_lies_on_its_girder_and_leaves_no_more_than_was_there() {
    assert_eq!(
        after("findings.f6.to", "18.5 m"),
        [
            "Error findings.f6.to: the finding ends 0.2 m beyond the far bearing | check it against the span of 18.3 m"
        ]
    );
    let mut book = book();
    set(&mut book, "findings.f6.from", "2 m");
    set(&mut book, "findings.f6.to", "1.5 m");
    assert_eq!(
        said(&open(&book)),
        ["Error findings.f6.to: the finding ends before it begins | \
          measure both ends from the near bearing; the end lies further along"]
    );
    for (field, text, is, was) in [
        ("web_low", "18.6 mm", "18.6 mm", "18.415 mm"),
        ("web", "1 in", "25.4 mm", "18.415 mm"),
        ("bottom", "31 mm", "31 mm", "29.972 mm"),
    ] {
        assert_eq!(
            after(&format!("findings.f6.{field}"), text),
            [format!(
                "Error findings.f6.{field}: {is} left is more than the {was} of the sound girder | \
                 enter what is left, not what is gone; if the girder is thicker than its table, measure its plates"
            )]
        );
    }
    let mut book = self::book();
    for field in ["web", "web_low", "bottom"] {
        set(&mut book, &format!("findings.f6.{field}"), "");
    }
    assert_eq!(
        said(&open(&book)),
        ["Missing findings.f6.web: the finding does not say what is left | \
          enter a thickness left of a flange or of the web, or take the finding out"]
    );
    let mut book = self::book();
    book.findings[0].girder.0 = "g9".to_string();
    assert_eq!(
        said(&open(&book)),
        ["Error findings.f6.girder: the finding is on a girder that is not in the book | choose the girder"]
    );
}

#[test]
fn layers_and_strips_say_what_they_weigh() {
    let mut book = book();
    book.act("layers.add").expect("a layer");
    book.act("strips.add").expect("a strip");
    let (layer, strip) = (book.layers[1].id.0.clone(), book.strips[1].id.0.clone());
    assert_eq!(
        said(&open(&book)),
        [
            format!(
                "Missing layers.{layer}.thickness: Thickness of the layer is not entered yet | \
                 core or probe it, or take the layer out"
            ),
            format!(
                "Missing layers.{layer}.unit_weight: Unit weight of the layer is not entered yet | \
                 enter it, or say what the layer is made of"
            ),
            format!(
                "Missing strips.{strip}.weight: Weight on a length is not entered yet | \
                 enter the weight of one, or take it out"
            ),
        ]
    );
    set(&mut book, &format!("layers.{layer}.substance"), "gravel");
    set(&mut book, &format!("layers.{layer}.thickness"), "30 mm");
    book.provenance(&format!("layers.{layer}.thickness"), "drawing").expect("from a drawing");
    set(&mut book, &format!("strips.{strip}.weight"), "0.5 kN/m");
    set(&mut book, &format!("strips.{strip}.side"), "left");
    set(&mut book, &format!("strips.{strip}.placed"), "surface");
    let opened = open(&book);
    assert_eq!(
        said(&opened),
        [format!(
            "Note layers.{layer}.thickness: gravel was not measured on this bridge | a core or a probe counts as measured"
        )]
    );
    let bridge = opened.bridge.expect("a bridge");
    // LRFD table 3.5.1-1, rolled gravel, macadam, or ballast: 0.140 kcf (from memory, 8th edition).
    assert!((bridge.deck.layers[1].unit_weight.value.in_kcf() - 0.14).abs() < 1e-12);
    assert_eq!((bridge.deck.strips[1].side, bridge.deck.strips[1].stage), (StripSide::Left, Stage::Surface));

    book.layers.clear();
    book.strips.clear();
    assert_eq!(
        said(&open(&book)),
        [
            "Warning layers: no layer is entered: the deck counts as bare | \
             add what lies on the deck, if anything does",
            "Warning strips: no parapet, rail or curb is entered: nothing stands along the deck | \
             add what stands along the deck, if anything does",
        ]
    );
}

#[test]
fn overrides_and_vehicles_are_complete() {
    let mut book = book();
    book.act("overrides.add").expect("an override");
    book.act("vehicles.add").expect("a vehicle");
    let (factor, vehicle) = (book.overrides[0].id.0.clone(), book.vehicles[0].id.0.clone());
    let path = |field: &str| format!("overrides.{factor}.{field}");
    let of = |field: &str| format!("vehicles.{vehicle}.{field}");
    let paths: Vec<String> = open(&book).problems.into_iter().map(|problem| problem.path).collect();
    assert_eq!(paths, [path("factor"), path("value"), path("reason"), of("name"), of("axles")]);
    for (path, text) in [
        (path("factor"), "condition"),
        (path("value"), "0.9"),
        (path("reason"), "losses were measured"),
        (of("name"), "Log truck"),
        (of("axles"), "50 kN; 80 kN; 80 kN"),
    ] {
        set(&mut book, &path, text);
    }
    assert_eq!(
        said(&open(&book)),
        [format!(
            "Missing {}: Distance from axle to axle is not entered yet | write the distance from each axle to the next",
            of("spacings")
        )]
    );
    set(&mut book, &of("spacings"), "4 m");
    assert_eq!(
        said(&open(&book)),
        [format!(
            "Error {}: 3 axles have 2 distances between them, not 1 | write one distance for each axle but the last",
            of("spacings")
        )]
    );
    set(&mut book, &of("spacings"), "4 m; 1.2 m");
    let bridge = open(&book).bridge.expect("a bridge");
    assert_eq!(
        bridge.vehicles[0].axles.iter().map(|axle| axle.in_kn()).collect::<Vec<_>>(),
        [50.0, 80.0, 80.0]
    );
    assert_eq!(bridge.traffic.overrides.factors[0].0, "condition");
    assert_eq!(bridge.traffic.overrides.factors[0].2, "losses were measured");

    book.act("overrides.add").expect("an override");
    let second = book.overrides[1].id.0.clone();
    for (field, text) in [("factor", " condition "), ("value", "1"), ("reason", "again")] {
        set(&mut book, &format!("overrides.{second}.{field}"), text);
    }
    assert_eq!(
        said(&open(&book)),
        [format!("Error overrides.{second}.factor: this factor is set twice | take one of the two out")]
    );
}

#[test]
fn what_is_not_known_is_told_and_does_not_stop_a_rating() {
    let mut book = book();
    for path in ["members.m1.brace_spacing", "members.m1.bearing_length", "traffic.adtt"] {
        set(&mut book, path, "");
    }
    let opened = open(&book);
    assert_eq!(
        said(&opened),
        [
            "Note members.m1.brace_spacing: the distance between diaphragms is not entered: none counts as a brace | \
             measure the greatest distance between diaphragms that work",
            "Note members.m1.bearing_length: the length of bearing is not entered: the web over the bearings is not \
             rated | measure it along the girder",
            "Note traffic.adtt: the truck traffic is not known: the highest factor is taken | \
             enter trucks a day in one direction",
        ]
    );
    let bridge = opened.bridge.expect("a bridge");
    assert!(bridge.traffic.adtt.is_none());
    let MemberKind::Steel(girder) = &bridge.members[0].kind;
    assert!(girder.bracing.spacing.is_none() && girder.bearing_length.is_none());
}

/// One wrong field leaves no bridge, and hides no other problem.
#[test]
fn every_problem_is_told_at_once() {
    let mut book = book();
    for (path, text) in [
        ("site.year_built", "long ago"),
        ("spans.s1.length", "eighteen"),
        ("deck.slab", ""),
        ("members.m1.shape", "I-beam"),
        ("girders.g2.spacing", "abc"),
        ("findings.f6.to", ""),
        ("traffic.adtt", "many"),
    ] {
        set(&mut book, path, text);
    }
    let opened = open(&book);
    assert!(opened.bridge.is_none());
    let paths: Vec<&str> = opened.problems.iter().map(|problem| problem.path.as_str()).collect();
    assert_eq!(
        paths,
        [
            "site.year_built",
            "spans.s1.length",
            "deck.slab",
            "members.m1.shape",
            "girders.g2.spacing",
            "findings.f6.to",
            "traffic.adtt",
        ]
    );
}

/// A field can be read whatever else is wrong with the book.
#[test]
fn a_field_is_read_by_itself() {
    let mut book = Book::empty("new", UnitSystem::FootKip);
    assert!(document::value::<Length>(&book, "deck.slab").is_none());
    set(&mut book, "deck.slab", "7 1/4; 7");
    let slab = document::value::<Length>(&book, "deck.slab").expect("entered").expect("read");
    assert!((slab.value.in_inch() - 7.125).abs() < 1e-12);
    assert!(document::value::<Stress>(&book, "deck.slab").is_none(), "it is no stress");
    assert!(document::value::<Length>(&book, "deck.nothing").is_none());
}
