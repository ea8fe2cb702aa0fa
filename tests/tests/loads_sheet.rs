//! Whole sheets of dead load, lanes, shares, factors and posting, worked again by an evaluator that knows
//! nothing of the program.

use girderbook_core::bridge::{Bridge, ConditionRating, Riding, Stage, StripSide};
use girderbook_core::check::{Action, LimitState, Outcome};
use girderbook_core::clauses::lrfd::distribution::{
    Bands, Loading, Method, Policy, RigidRule, SkewShear, Stiffness, governing_share,
};
use girderbook_core::clauses::lrfd::lanes::design_lanes;
use girderbook_core::clauses::mbe::factors::{self, Crossing, LegalTable};
use girderbook_core::clauses::mbe::legal_vehicles as legal;
use girderbook_core::clauses::mbe::posting::{Rated, post};
use girderbook_core::clauses::mbe::{self};
use girderbook_core::load::dead::{moment, shear, steel_weight, take_off};
use girderbook_core::load::{Across, Sharing, TakeOff};
use girderbook_core::quantity::{Area, Inertia, Length, Quantity};
use girderbook_core::units::mark::{Ft, In2, In4, Inch, Mark, One};
use girderbook_core::units::{Entered, WeightUnit};
use girderbook_core::worksheet::{Recorder, Sheet, Val};
use girderbook_tests::bridges::{Sizes, layer, strip};
use girderbook_tests::evaluate::recheck;

fn stands<Q: Quantity, U: Mark<Q>>(sheet: &mut Sheet, symbol: &str, value: Q, unit: U) -> Val<Q> {
    sheet.found(symbol, "for this sheet", value, unit, 0.0, || "set".to_owned())
}

fn bridges() -> Vec<Sizes> {
    let skewed = Sizes { skew: -35.0, diaphragms: true, ..Sizes::even(5, 8.0, 34.0, 37.0, 100.0) };
    let uneven = Sizes { spacings: vec![6.0, 7.5, 8.0], ..Sizes::even(4, 7.0, 21.0, 26.0, 60.0) };
    let narrow = Sizes::even(3, 8.0, 18.5, 20.0, 40.0);
    let one_lane = Sizes { diaphragms: true, ..Sizes::even(4, 4.5, 15.0, 16.0, 30.0) };
    let wide = Sizes { diaphragms: true, ..Sizes::even(4, 17.0, 50.0, 56.0, 210.0) };
    vec![skewed, uneven, narrow, one_lane, wide, Sizes::even(2, 9.0, 11.0, 13.0, 40.0)]
}

fn loaded(sizes: &Sizes) -> Bridge {
    let mut bridge = sizes.bridge();
    let cores = Entered::measured("layers.l1.thickness", Length::from_inch(2.8));
    bridge.deck.layers.push(layer("asphalt", cores, 0.140));
    let planned = Entered::assumed("layers.l2.thickness", Length::from_inch(1.5), "planned");
    bridge.deck.layers.push(layer("overlay", planned, 0.140));
    bridge.deck.strips.push(strip("curb", 0.100, StripSide::Left, Stage::Bare));
    bridge.deck.strips.push(strip("parapet", 0.400, StripSide::Both, Stage::Later));
    bridge.deck.strips.push(strip("water main", 0.060, StripSide::Right, Stage::Surface));
    bridge
}

#[test]
fn dead_loads() {
    for sizes in bridges() {
        let bridge = loaded(&sizes);
        for sharing in [Sharing::Equal, Sharing::Tributary] {
            let rules =
                TakeOff { steel: steel_weight(), later: sharing, surface: sharing, cite: "4.6.2.2.1" };
            for line in 0..bridge.lines.len() {
                let sheet = &mut Sheet::default();
                let across = Across::of(sheet, &bridge);
                let area = stands(sheet, "A", Area::from_in2(44.2), In2);
                let load = take_off(sheet, &bridge, &across, line, area, &rules);
                let l = sheet.given("L", "span", &bridge.spans[0].length, Ft);
                let x = stands(sheet, "x", Length::from_ft(11.0), Ft);
                for w in [load.dc1, load.dc2, load.dw] {
                    moment(sheet, w, x, l);
                    shear(sheet, w, x, l);
                }
                assert!(recheck(sheet).expect("the sheet comes out again") > 15);
            }
        }
    }
}

#[test]
fn shares() {
    let mut worked = 0;
    for sizes in bridges() {
        let bridge = loaded(&sizes);
        for (loading, method, passing) in [
            (Loading::Governing, Method::Formula, false),
            (Loading::Governing, Method::LeverRule, true),
            (Loading::OneLane, Method::Formula, true),
            (Loading::OneLaneAlone, Method::Formula, false),
        ] {
            for line in 0..bridge.lines.len() {
                for action in [Action::Moment, Action::Shear] {
                    let sheet = &mut Sheet::default();
                    let across = Across::of(sheet, &bridge);
                    let lanes = mbe::lanes::narrow(sheet, across.roadway)
                        .unwrap_or_else(|| design_lanes(sheet, across.roadway));
                    let bands = if passing {
                        Bands::Passing(mbe::lanes::between_passing(sheet))
                    } else {
                        Bands::DesignLanes
                    };
                    let policy = Policy {
                        loading,
                        method,
                        bands,
                        rigid: RigidRule::WithDiaphragms,
                        skew_moment: true,
                        skew_shear: SkewShear::All,
                    };
                    let stiffness = Stiffness {
                        n: stands(sheet, "n", 9.0, One),
                        i: stands(sheet, "I", Inertia::from_in4(9040.0), In4),
                        a: stands(sheet, "A", Area::from_in2(44.2), In2),
                        y_t: stands(sheet, "y_t", Length::from_inch(17.9), Inch),
                    };
                    let share =
                        governing_share(sheet, &bridge, &across, line, action, &stiffness, &lanes, &policy)
                            .expect("a share");
                    assert!(share.g.q > 0.0);
                    worked += recheck(sheet).expect("the sheet comes out again");
                }
            }
        }
    }
    assert!(worked > 4000, "{worked} lines");
}

#[test]
fn factors_and_posting() {
    let sheet = &mut Sheet::default();
    for adtt in [200.0, 1000.0, 2750.0, 9000.0] {
        let entry = Entered::measured("traffic.adtt", adtt);
        factors::legal_live(sheet, Some(&entry), LegalTable::Current);
        factors::legal_live(sheet, Some(&entry), LegalTable::SecondEdition);
    }
    factors::surface_measured(sheet, LimitState::StrengthI, 5);
    for rating in [ConditionRating::Good, ConditionRating::Fair, ConditionRating::Poor] {
        let phi_c = factors::condition(sheet, Some(rating), true).expect("entered");
        for (girders, feet) in [(2.0, 7.0), (3.0, 5.0), (4.0, 4.0), (5.0, 8.0)] {
            let n_b = stands(sheet, "N_b", girders, One);
            let widest = stands(sheet, "S", Length::from_ft(feet), Ft);
            let kind = factors::superstructure(sheet, n_b, widest);
            let phi_s = factors::system(sheet, kind, Action::Moment);
            factors::condition_and_system(sheet, phi_c, phi_s);
        }
    }
    for feet in [35.0, 61.0, 230.0] {
        let span = stands(sheet, "L", Length::from_ft(feet), Ft);
        factors::dynamic(sheet, Crossing::LegalOrPermit, span, Riding::Smooth);
        legal::long_span(sheet, span);
    }
    let outcomes = [0.2, 0.31, 0.64, 0.97, 1.2].map(Outcome::Factor);
    for unit in [WeightUnit::ShortTons, WeightUnit::Tonnes] {
        let rated: Vec<Rated<'_>> = outcomes
            .iter()
            .map(|outcome| Rated { id: "SU6", weight: legal::SU6.weight(), outcome, standard: true })
            .collect();
        post(sheet, &rated, unit);
    }
    assert!(recheck(sheet).expect("the sheet comes out again") > 50);
}
