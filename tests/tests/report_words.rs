//! The words of a verdict and its tables, pinned. The ratings here are made by hand: they hold
//! figures for the words, not results.

use girderbook_core::check::{
    Action, Class, ClassLimit, Level, Limit, LimitState, Outcome, Posting, SafeLoad, Sign,
};
use girderbook_core::problem::Problem;
use girderbook_core::quantity::{Force, Length, LineLoad};
use girderbook_core::rating::{
    Check, DeadEffects, Factors, Figures, Key, LineSummary, LiveLoad, Rating, VehicleResult,
};
use girderbook_core::report::diagram::curve;
use girderbook_core::report::tables::{by_vehicle, check_figures, dead_loads, girders, posting, text};
use girderbook_core::report::verdict::CAUTIONS;
use girderbook_core::report::{Tone, unrated, verdict};
use girderbook_core::units::System::{FootKip, MetreKilonewton};
use girderbook_core::units::WeightUnit;

fn load(id: &str, level: Level, kip: f64, class: Class) -> LiveLoad {
    let weight = (class != Class::Design).then(|| Force::from_kip(kip));
    LiveLoad { id: id.to_lowercase(), name: id.to_owned(), level, weight, class }
}

fn check(line: usize, x: f64, state: LimitState, load: usize, outcome: Outcome) -> Check {
    let action = match state {
        LimitState::StrengthI => Action::Moment,
        LimitState::ServiceII => Action::Stress,
    };
    let figures = Figures {
        capacity: 2.2e10,
        dead: DeadEffects { dc1: 5e9, dc2: 1e9, dw: 1.5e9 },
        live: 1e10,
        factors: Factors {
            dc: 1.25,
            dw: 1.5,
            live: 1.3,
            dynamic: 0.33,
            share: 0.6483,
            resistance: 1.0,
            condition: 0.95,
            system: 1.0,
        },
        position: None,
    };
    Check {
        key: Key { line, x: Length::from_m(x), action, state, load },
        figures: (!matches!(outcome, Outcome::NotRated(_))).then_some(figures),
        outcome,
    }
}

/// Two girders, three legal trucks and a design load; SU7 below 1 in service.
fn rating() -> Rating {
    use LimitState::{ServiceII, StrengthI};
    let checks = vec![
        check(1, 9.14, ServiceII, 3, Outcome::Factor(0.8199)),
        check(1, 9.14, StrengthI, 3, Outcome::Factor(0.915)),
        check(1, 9.14, ServiceII, 1, Outcome::Factor(1.2149)),
        check(0, 9.14, ServiceII, 2, Outcome::Factor(1.1733)),
        check(0, 9.14, StrengthI, 0, Outcome::Factor(0.71)),
        check(1, 4.57, ServiceII, 3, Outcome::Factor(1.1)),
    ];
    let line = |name: &str, governing| LineSummary {
        name: name.to_owned(),
        dc1: LineLoad::from_kn_m(12.783),
        dc2: LineLoad::from_kn_m(1.82),
        dw: LineLoad::from_kn_m(3.483),
        share_moment: Ok(0.6483),
        share_shear: Err(Problem::error(
            "girders",
            "the deck is outside the range of the formula",
            "measure",
        )),
        capacities: Vec::new(),
        governing,
    };
    let vehicle = |load, strength, service, ruling, t: Option<f64>| VehicleResult {
        load,
        strength,
        service,
        ruling,
        rating_weight: t.map(Force::from_tonne),
    };
    let safe = |load, factor, limit| SafeLoad { load, factor: Some(factor), limit };
    Rating {
        basis: "mbe-a",
        basis_name: "AASHTO MBE part A",
        loads: vec![
            load("HL-93", Level::Inventory, 0.0, Class::Design),
            load("Type 3", Level::Legal, 50.0, Class::SingleUnit),
            load("Type 3S2", Level::Legal, 72.0, Class::Combination),
            load("SU7", Level::Legal, 77.5, Class::SingleUnit),
        ],
        lines: vec![line("G1", Some(3)), line("G2", Some(0))],
        checks,
        governing: Some(0),
        next: vec![1, 3],
        by_vehicle: vec![
            vehicle(0, Some(4), None, Some(4), None),
            vehicle(1, None, Some(2), Some(2), Some(27.5)),
            vehicle(2, None, Some(3), Some(3), Some(38.3)),
            vehicle(3, Some(1), Some(0), Some(0), Some(28.8)),
        ],
        posting: Posting {
            sign: Sign::Limit {
                single_unit: ClassLimit::Weight(25),
                combination: ClassLimit::None,
                unit: WeightUnit::Tonnes,
            },
            safe: vec![
                safe(1, 1.2149, Limit::Full),
                safe(2, 1.1733, Limit::Full),
                safe(3, 0.8299, Limit::Weight(Force::from_tonne(25.93))),
            ],
        },
        not_rated: vec![],
        notes: vec![],
    }
}

#[test]
fn a_bridge_to_be_posted() {
    let verdict = verdict(&rating(), MetreKilonewton);
    assert_eq!(verdict.figure, "0.82");
    assert_eq!(verdict.caption, "least rating factor: SU7 on G2, Service II, bending stress at 9.14 m");
    assert_eq!(verdict.headline, "Post for single-unit trucks: 25 t.");
    assert_eq!(verdict.tone, Tone::Caution);
    assert_eq!(
        verdict.reasons,
        ["Below 1: SU7 0.83.", "Next behind it: SU7 on G2, Strength I, bending at 9.14 m, 0.92."]
    );
    assert_eq!(verdict.sign.expect("a sign").spoken, "sign: weight limit, single unit 25 t");
}

#[test]
fn the_next_one_behind_is_another_place_or_action() {
    let mut rating = rating();
    rating.next = vec![5, 2, 1];
    let reasons = verdict(&rating, FootKip).reasons;
    assert_eq!(reasons[1], "Next behind it: SU7 on G2, Strength I, bending at 30.0 ft, 0.92.");
}

#[test]
fn a_bearing_is_the_near_or_the_far_one() {
    let mut rating = rating();
    rating.checks[0].key.action = Action::Bearing;
    rating.checks[0].key.state = LimitState::StrengthI;
    let caption = |rating: &Rating| verdict(rating, MetreKilonewton).caption;
    assert_eq!(caption(&rating), "least rating factor: SU7 on G2, Strength I, web over the far bearing");
    rating.checks[0].key.x = Length::ZERO;
    assert_eq!(caption(&rating), "least rating factor: SU7 on G2, Strength I, web over the near bearing");
}

#[test]
fn every_verdict_carries_every_caution() {
    let all = CAUTIONS.join(" ");
    for word in [
        "licensed engineer",
        "replaces none",
        "Local codes",
        "agency's rules",
        "what was entered",
        "fatigue",
        "scour",
        "substructure",
        "connections",
        "gusset plates",
    ] {
        assert!(all.contains(word), "{word}");
    }
    assert_eq!(verdict(&rating(), FootKip).cautions, CAUTIONS);
    assert_eq!(unrated(&[]).cautions, CAUTIONS);
}

#[test]
fn every_posting_has_its_sentence() {
    let headline = |sign, safe| {
        let mut rating = rating();
        rating.posting = Posting { sign, safe };
        verdict(&rating, FootKip).headline
    };
    let limit =
        |single_unit, combination| Sign::Limit { single_unit, combination, unit: WeightUnit::ShortTons };
    let barred = vec![SafeLoad { load: 1, factor: Some(0.2), limit: Limit::NotAllowed }];
    for (sign, safe, words) in [
        (Sign::None, vec![], "Carries all legal loads: no posting."),
        (
            limit(ClassLimit::Weight(21), ClassLimit::Weight(34)),
            vec![],
            "Post: single-unit trucks 21 tons, combinations 34 tons.",
        ),
        (limit(ClassLimit::Weight(12), ClassLimit::Weight(12)), vec![], "Post for all trucks: 12 tons."),
        (limit(ClassLimit::None, ClassLimit::Weight(34)), vec![], "Post for combinations: 34 tons."),
        (
            limit(ClassLimit::NotAllowed, ClassLimit::Weight(34)),
            vec![],
            "Post: single-unit trucks not allowed, combinations 34 tons.",
        ),
        (limit(ClassLimit::NotAllowed, ClassLimit::NotAllowed), vec![], "Post: no trucks."),
        (Sign::Close, barred, "Close: no legal truck may cross."),
        (Sign::Close, vec![], "Close: what it safely carries is below the least limit of an open bridge."),
        (Sign::NotKnown, vec![], "No answer on posting: something that has to be rated got no number."),
    ] {
        assert_eq!(headline(sign, safe), words);
    }
}

#[test]
fn an_outcome_that_is_no_number_is_said_in_words() {
    let mut rating = rating();
    rating.checks[0].outcome = Outcome::CarriesNoLiveLoad;
    let dead = verdict(&rating, MetreKilonewton);
    assert_eq!(dead.figure, "no live load");
    assert_eq!(
        dead.caption,
        "dead load alone takes all of it: SU7 on G2, Service II, bending stress at 9.14 m"
    );
    rating.governing = None;
    rating.not_rated =
        vec![Problem::missing("girders.g1.end_near", "the web over the near bearing of G1", "")];
    let none = verdict(&rating, MetreKilonewton);
    assert_eq!(none.figure, "no number");
    assert_eq!(none.caption, "no legal load got a rating factor");
    assert!(none.reasons.contains(&"Not rated: the web over the near bearing of G1.".to_owned()));
}

#[test]
fn without_a_rating_it_counts_what_is_missing_and_wrong() {
    let missing = Problem::missing("a", "m", "n");
    let wrong = Problem::error("b", "m", "n");
    let note = Problem::warning("c", "m", "n");
    for (problems, words) in [
        (vec![missing.clone(), missing.clone(), note.clone()], "No rating yet: 2 things are missing."),
        (vec![missing.clone()], "No rating yet: 1 thing is missing."),
        (vec![wrong.clone()], "No rating: 1 entry is wrong."),
        (vec![wrong.clone(), wrong, missing], "No rating: 2 entries are wrong, 1 thing is missing."),
        (vec![note], "No rating yet."),
    ] {
        let verdict = unrated(&problems);
        assert_eq!(verdict.headline, words);
        assert_eq!(verdict.figure, "no number");
        assert!(verdict.sign.is_none());
    }
}

#[test]
fn the_table_by_vehicle() {
    let table = by_vehicle(&rating(), MetreKilonewton);
    assert_eq!(
        text(&table),
        "\
Rating factor by vehicle
Vehicle          Weight  Strength I  Service II  Rules                         Rating weight
HL-93 inventory                0.71  none        G1, bending at 9.14 m
Type 3           22.7 t  none              1.21  G2, bending stress at 9.14 m         27.5 t
Type 3S2         32.7 t  none              1.17  G1, bending stress at 9.14 m         38.3 t
SU7              35.2 t        0.92        0.82  G2, bending stress at 9.14 m         28.8 t
"
    );
    let su7 = &table.rows[3];
    assert_eq!((su7[2].check, su7[3].check, su7[4].check), (Some(1), Some(0), Some(0)));
    assert_eq!((su7[2].tone, table.rows[1][3].tone), (Tone::Bad, Tone::Good));
}

#[test]
fn the_tables_of_girders_and_posting() {
    assert_eq!(
        text(&dead_loads(&rating(), MetreKilonewton)),
        "\
Dead load of each girder, kN/m
Girder  DC1    DC2   DW    All
G1      12.78  1.82  3.48  18.09
G2      12.78  1.82  3.48  18.09
"
    );
    assert_eq!(
        text(&girders(&rating(), FootKip)),
        "\
Share of a lane and least legal factor of each girder
Girder  Moment  Shear      Least  Of
G1       0.648  no number   1.17  Type 3S2, bending stress at 30.0 ft
G2       0.648  no number   0.82  SU7, bending stress at 30.0 ft
"
    );
    assert_eq!(
        text(&posting(&rating(), FootKip, WeightUnit::Tonnes)),
        "\
Safe load by vehicle, rounded down in the unit of the sign
Vehicle   Kind                Weight      Factor  Limit
Type 3    single-unit trucks     25 tons    1.21  no sign
Type 3S2  combinations           36 tons    1.17  no sign
SU7       single-unit trucks  38.75 tons    0.83  25 t
"
    );
}

#[test]
fn what_went_into_a_check() {
    let rating = rating();
    let printed = text(&check_figures(&rating.checks[1], MetreKilonewton));
    for row in [
        "Capacity with its factors                   2200 kN m",
        "Dynamic allowance                                33 %",
        "Condition factor                                 0.95",
    ] {
        assert!(printed.contains(row), "{row} in\n{printed}");
    }
    let none = check(0, 0.0, LimitState::StrengthI, 0, Outcome::NotRated(Problem::error("a", "b", "c")));
    assert!(check_figures(&none, FootKip).rows.is_empty());
}

/// 1.25 (5e9 + 1e9) + 1.5 * 1.5e9 + 1.3 * 1e10 = 2.275e10, by hand.
#[test]
fn demand_is_dead_and_live_load_with_their_factors() {
    let curve = curve(&rating(), 0).expect("figures");
    assert_eq!(curve.points.len(), 2);
    assert_eq!(curve.at, 1);
    assert!(curve.points[0].x < curve.points[1].x);
    assert!((curve.points[1].demand / 2.275e10 - 1.0).abs() < 1e-12);
    assert_eq!(curve.points[1].capacity, 2.2e10);
}
