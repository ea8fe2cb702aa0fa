//! The demo books open into a bridge with nothing left to be entered, and say what they were meant
//! to say. What they rate at is checked with the rating.

use girderbook_core::bridge::{Bridge, Composite, ConditionRating, Embedded, MemberKind, WebEnds};
use girderbook_core::document::{self, Opened};
use girderbook_core::material::Defaults;
use girderbook_core::quantity::{Length, LineLoad, Stress, UnitWeight};
use girderbook_core::units::{Provenance, WeightUnit};

const HOLLOW_FORK: &str = include_str!("../../core/demos/hollow-fork.json");
const MILL_RACE: &str = include_str!("../../core/demos/mill-race.json");

/// Stands for a rule set: the values are of no matter here, only that they reach the bridge.
struct ByYear;
impl Defaults for ByYear {
    fn yield_strength(&self, year: Option<i32>) -> Option<(Stress, &'static str)> {
        year.map(|_| (Stress::from_ksi(33.0), "by year"))
    }
    fn concrete_strength(&self, year: Option<i32>) -> Option<(Stress, &'static str)> {
        year.map(|_| (Stress::from_ksi(2.5), "by year"))
    }
}

fn open(text: &str) -> (Bridge, Opened) {
    let book = document::read(text).expect("a book");
    let opened = document::bridge(&book, &ByYear);
    assert_eq!(opened.problems, [], "a demo has nothing to be mended");
    (opened.bridge.clone().expect("a bridge"), opened)
}

fn near(a: f64, b: f64) {
    assert!((a - b).abs() < 1e-9 * b.abs().max(1.0), "{a} against {b}");
}

#[test]
fn hollow_fork_is_the_bridge_that_is_worked_by_hand() {
    let (bridge, opened) = open(HOLLOW_FORK);
    near(bridge.spans[0].length.value.in_m(), 18.3);
    near(bridge.skew.value.in_deg(), 0.0);
    assert_eq!(bridge.site.year_built, Some(1958));
    assert_eq!(bridge.site.condition, Some(ConditionRating::Fair));
    assert_eq!(bridge.site.place, "CR 14 over Hollow Fork, Tamsin County");
    near(bridge.deck.roadway.value.in_m(), 8.53);
    near(bridge.deck.left_curb.in_m(), (9.42 - 8.53) / 2.0);
    near(bridge.deck.slab.value.in_inch(), 7.25);
    near(bridge.deck.haunch.value.in_mm(), 40.0);
    let asphalt = &bridge.deck.layers[0];
    near(asphalt.thickness.value.in_mm(), 71.0);
    near(asphalt.thickness.least().in_mm(), 65.0);
    near(asphalt.thickness.greatest().in_mm(), 78.0);
    assert_eq!(asphalt.thickness.readings.len(), 7);
    assert_eq!(asphalt.unit_weight.provenance, Provenance::Assumed);
    assert_eq!(bridge.posting.sign, WeightUnit::Tonnes);

    assert_eq!(bridge.lines.len(), 5);
    for (line, y) in bridge.lines.iter().zip([0.35, 2.53, 4.71, 6.89, 9.07]) {
        near(line.y.in_m(), y);
        assert_eq!(line.ends, [WebEnds::Inspected; 2]);
    }
    near(bridge.tributary(2).in_m(), 2.18);
    let MemberKind::Steel(girder) = &bridge.members[0].kind;
    assert_eq!(girder.section.published.map(|shape| shape.name), Some("W36x182 (1980)"));
    assert_eq!(girder.section.web.provenance, Provenance::Drawing);
    assert_eq!(girder.steel.yield_strength.provenance, Provenance::Assumed);
    assert_eq!((girder.composite, girder.bracing.embedded), (Composite::None, Embedded::No));
    assert_eq!(girder.bracing.spacing.as_ref().map(|s| s.value), Some(Length::from_ft(15.0)));

    let finding = &bridge.findings[0];
    assert_eq!(bridge.lines[finding.line].name, "G1");
    near(finding.web_low.as_ref().expect("lowest band").least().in_mm(), 9.9);
    near(girder.bearing_length.as_ref().expect("bearing").value.in_mm(), 200.0);

    // Worked by hand, kN/m on an interior girder: steel 182 lb/ft = 2.656; slab 0.18415 x 2.18 x 24.5
    // = 9.835; haunch 0.04 x 0.3 x 24.5 = 0.294; two parapets of 440 lb/ft on five girders 2.569;
    // asphalt 0.071 x 8.53 x 22.5 on five girders 2.725. Together 18.08.
    let slab = bridge.deck.concrete.unit_weight.value * bridge.deck.slab.value * Length::from_m(2.18);
    let haunch =
        bridge.deck.concrete.unit_weight.value * bridge.deck.haunch.value * bridge.deck.haunch_width.value;
    let steel = LineLoad::from_lb_ft(182.0);
    let parapets = bridge.deck.strips[0].weight.value * 2.0 / 5.0;
    let surface = asphalt.unit_weight.value * asphalt.thickness.value * Length::from_m(8.53) / 5.0;
    for (load, by_hand) in
        [(steel, 2.656), (slab, 9.835), (haunch, 0.294), (parapets, 2.569), (surface, 2.725)]
    {
        assert!((load.in_kn_m() - by_hand).abs() < 6e-4, "{} against {by_hand}", load.in_kn_m());
    }
    let assumed: Vec<&str> = opened
        .filled
        .iter()
        .filter(|filled| filled.from == Provenance::Assumed)
        .map(|filled| filled.path.as_str())
        .collect();
    assert_eq!(
        assumed,
        [
            "deck.left_curb",
            "layers.l1.unit_weight",
            "deck.concrete_weight",
            "deck.concrete_strength",
            "members.m1.yield_strength",
        ]
    );
    assert_eq!(
        opened.filled_at("layers.l1.unit_weight").map(|filled| filled.text.as_str()),
        Some("22.5 kN/m3")
    );
    assert_eq!(opened.filled_at("deck.slab"), None);
}

#[test]
fn mill_race_is_read_in_feet_and_inches() {
    let (bridge, _) = open(MILL_RACE);
    near(bridge.spans[0].length.value.in_ft(), 38.0 + 6.25 / 12.0);
    near(bridge.deck.roadway.value.in_inch(), 288.25);
    near(bridge.deck.haunch.value.in_inch(), (1.0 + 1.25 + 0.875) / 3.0);
    near(bridge.deck.layers[0].thickness.value.in_inch(), 2.125);
    assert_eq!(bridge.deck.concrete.unit_weight.value, UnitWeight::from_pcf(150.0));
    assert_eq!(bridge.lines.len(), 6);
    // In the middle of a deck of 27 ft: 25 ft and 1/4 in from the first to the last.
    near(bridge.lines[0].y.in_inch(), (27.0 * 12.0 - 300.25) / 2.0);
    near((bridge.lines[5].y - bridge.lines[0].y).in_inch(), 300.25);
    near(bridge.deck.strips[0].weight.value.in_kip_ft(), 0.19);
    near(bridge.deck.strips[1].weight.value.in_lb_ft(), 22.0);
    assert_eq!(bridge.posting.sign, WeightUnit::ShortTons);
    assert_eq!(bridge.vehicles[0].axles.len(), 3);
    near(bridge.vehicles[0].axles[1].in_kip(), 20.0);
    near(bridge.vehicles[0].spacings[1].in_ft(), 4.0 + 4.0 / 12.0);
    let MemberKind::Steel(girder) = &bridge.members[0].kind;
    near(girder.bracing.spacing.as_ref().expect("diaphragms").value.in_inch(), 153.875);
}
