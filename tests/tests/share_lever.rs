//! Lever rule and rigid cross-section: published examples, hand work, properties.

use girderbook_core::clauses::lrfd::distribution::lever::write;
use girderbook_core::clauses::lrfd::distribution::rigid::share as rigid_share;
use girderbook_core::quantity::Length;
use girderbook_core::share::lever::{hinge, ordinate, worst};
use girderbook_core::share::{Pattern, Roadway, rigid};
use girderbook_core::worksheet::{Kind, Sheet, Silent, Val};
use proptest::prelude::*;

fn ft(feet: f64) -> Length {
    Length::from_ft(feet)
}

/// Bands of 12 ft: each truck in its own design lane.
fn lanes(count: usize) -> Pattern {
    Pattern { lanes: count, band: ft(12.0), edge: ft(2.0), gauge: ft(6.0) }
}

/// Bands of 10 ft: passing trucks 4 ft apart.
fn passing(count: usize) -> Pattern {
    Pattern { band: ft(10.0), ..lanes(count) }
}

fn girders(first: f64, spacing: f64, count: usize) -> Vec<Length> {
    (0..count).map(|i| ft(first + spacing * i as f64)).collect()
}

fn shares(places: &[Length], line: usize, left: f64, width: f64, pattern: &Pattern) -> Vec<f64> {
    let roadway = Roadway { left: ft(left), width: ft(width) };
    worst(places, line, &roadway, pattern).expect("room").into_iter().map(|found| found.share).collect()
}

fn near(value: f64, expected: f64) {
    assert!((value - expected).abs() < 1e-9, "{value} against {expected}");
}

/// Examples of the lever rule, scribd.com document 245313048 (read): girders at 16 ft, first wheel 20 ft from
/// the hinge. Exterior: one lane 34/16/2 (x 1.2 = 1.275), two lanes 44/16/2 = 1.375 in design lanes. Interior:
/// one lane 26/16/2 (x 1.2 = 0.975).
#[test]
fn published_examples_at_16_ft() {
    // Curb 6 ft outside the exterior girder.
    let places = girders(8.0, 16.0, 4);
    let exterior = shares(&places, 0, 2.0, 60.0, &lanes(2));
    near(1.2 * exterior[0], 1.275);
    near(exterior[1], 1.375);
    near(1.2 * shares(&places, 1, 2.0, 60.0, &lanes(1))[0], 0.975);
}

/// NCHRP Report 592, closed forms of the lever rule (from memory, each recomputed): wheels 6 ft apart, 4 ft
/// between trucks, the first 2 ft from the curb. Exterior, one lane: 1/2 + d_e/(2S) with one wheel in the
/// bay (d_e + S <= 8), 1 + d_e/S - 5/S with two. Two lanes: 3/2 + 3 d_e/(2S) - 11/S with three
/// (12 < d_e + S <= 18), 2 + 2 d_e/S - 20/S with four.
#[test]
fn published_closed_forms_exterior() {
    for (s, d_e) in [(5.0, 2.5), (6.0, 2.0), (9.0, 1.0), (11.0, 3.0), (15.0, 2.0), (16.0, 4.0)] {
        let places = girders(6.0, s, 6);
        let by_rule = shares(&places, 0, 6.0 - d_e, 30.0, &passing(2));
        let one = if d_e + s <= 8.0 { 0.5 + (d_e - 2.0) / (2.0 * s) } else { 1.0 + d_e / s - 5.0 / s };
        near(by_rule[0], one);
        let two = match d_e + s {
            reach if reach <= 12.0 => one,
            reach if reach <= 18.0 => 1.5 + 3.0 * d_e / (2.0 * s) - 11.0 / s,
            _ => 2.0 + 2.0 * d_e / s - 20.0 / s,
        };
        near(by_rule[1], two);
        near(shares(&places, 5, 6.0 + 5.0 * s - (30.0 - d_e), 30.0, &passing(2))[1], two);
    }
}

/// The same report, interior: one lane 1/2 to 6 ft, 1 - 3/S beyond; two lanes 1/2 to 4 ft, 1 - 2/S to 6 ft,
/// 3/2 - 5/S to 10 ft, 2 - 10/S beyond.
#[test]
fn published_closed_forms_interior() {
    for s in [3.5, 4.0, 5.0, 6.0, 7.0, 8.0, 10.0, 12.0, 14.0] {
        let places = girders(3.0, s, 7);
        let by_rule = shares(&places, 3, 0.0, 6.0 + 6.0 * s, &passing(2));
        near(by_rule[0], if s <= 6.0 { 0.5 } else { 1.0 - 3.0 / s });
        let two = match s {
            s if s <= 4.0 => 0.5,
            s if s <= 6.0 => 1.0 - 2.0 / s,
            s if s <= 10.0 => 1.5 - 5.0 / s,
            _ => 2.0 - 10.0 / s,
        };
        // At 3.5 ft the two outer wheels reach the neighbours' bays too, but give nothing there.
        near(by_rule[1], two);
    }
}

/// By hand: on 24 ft of roadway two design lanes fill it, so the first truck against the left curb leaves the
/// second at 14 ft or more; 4 ft apart it may stand at 12 ft.
#[test]
fn design_lanes_keep_to_their_bands() {
    let places = girders(2.0, 10.0, 3);
    let roadway = Roadway { left: ft(0.0), width: ft(24.0) };
    let banded = worst(&places, 1, &roadway, &lanes(2)).expect("room");
    let close = worst(&places, 1, &roadway, &passing(2)).expect("room");
    // Girder at 12 ft. Bands: wheels at 4, 10 and 14, 20: (0.2 + 0.8 + 0.8 + 0.2) / 2.
    near(banded[1].share, 1.0);
    // 4 ft apart: wheels at 2, 8, 12, 18 give (0 + 0.6 + 1 + 0.4) / 2 = 1.0, at 6, 12, 16, 22 the same.
    near(close[1].share, 1.0);
    // Girder at 2 ft: against the curb, wheels at 2 and 8, then 14 or 12: the far truck gives nothing either way.
    near(worst(&places, 0, &roadway, &lanes(2)).expect("room")[1].share, 0.7);
}

/// Steel Bridge Design Handbook, design example 1 (from memory, recomputed): four girders at 12 ft, roadway
/// 40 ft: R = 0.625, 0.950, 0.975 for one, two and three lanes.
#[test]
fn rigid_cross_section_of_a_published_example() {
    let places: Vec<Val<Length>> = girders(3.5, 12.0, 4).into_iter().map(Val::bare).collect();
    let roadway = Roadway { left: ft(1.5), width: ft(40.0) };
    for (trucks, expected) in [(1, 0.625), (2, 0.950), (3, 0.975)] {
        for line in [0, 3] {
            let placement = rigid::toward(line == 0, &roadway, &lanes(3), trucks).expect("room");
            near(rigid_share(&mut Silent, &places, line, &placement).expect("girders").q, expected);
        }
    }
}

/// Three trucks on 33 ft: the third lane fits at 11 ft.
#[test]
fn lanes_wider_than_their_share_of_the_roadway_shrink() {
    let places = girders(0.5, 8.0, 5);
    let roadway = Roadway { left: ft(0.0), width: ft(33.0) };
    let found = worst(&places, 2, &roadway, &lanes(3)).expect("room");
    assert_eq!(found.len(), 3);
    let placement = &found[2].placement;
    assert!(!placement.squeezed);
    assert_eq!(placement.edge, ft(2.0));
    near(placement.band.in_ft(), 11.0);
}

/// By hand, girders at 0, 10 and 20 ft: whom a load reaches, and about which hinge moments are taken.
#[test]
fn hinges() {
    let places = girders(0.0, 10.0, 3);
    for (y, hinges) in [
        (-3.0, [Some(1), Some(0), None]),
        (4.0, [Some(1), Some(0), None]),
        (10.0, [None, Some(2), Some(1)]),
        (24.0, [None, Some(2), Some(1)]),
    ] {
        for (line, expected) in hinges.into_iter().enumerate() {
            assert_eq!(hinge(&places, line, ft(y)), expected, "girder {line}, load at {y} ft");
        }
    }
    near(ordinate(&places, 0, ft(-3.0)), 1.3);
    near(ordinate(&places, 1, ft(-3.0)), -0.3);
    near(ordinate(&places, 1, ft(4.0)), 0.4);
    near(ordinate(&places, 2, ft(24.0)), 1.4);
}

#[test]
fn what_finds_no_room_is_a_problem() {
    let places = girders(1.0, 4.0, 3);
    let narrow = |feet: f64, count: usize| {
        let roadway = Roadway { left: ft(0.0), width: ft(feet) };
        worst(&places, 1, &roadway, &lanes(count))
    };
    assert_eq!(narrow(5.9, 1).expect_err("one truck is wider").path, "deck.roadway");
    assert_eq!(narrow(11.9, 2).expect_err("two trucks are wider").path, "deck.roadway");
    assert!(narrow(12.0, 2).expect("just room")[1].placement.squeezed);
    assert_eq!(narrow(f64::NAN, 1).expect_err("no size").path, "deck.roadway");
    let roadway = Roadway { left: ft(0.0), width: ft(20.0) };
    assert_eq!(worst(&places[..1], 0, &roadway, &lanes(1)).expect_err("one girder").path, "girders");
    assert_eq!(worst(&[ft(3.0), ft(3.0)], 0, &roadway, &lanes(1)).expect_err("in one place").path, "girders");
}

/// The sheet gives each wheel's place and part; the parts add up to the share, and nothing is left over.
#[test]
fn the_sheet_can_be_followed_wheel_by_wheel() {
    let places = girders(2.0, 7.0, 5);
    let roadway = Roadway { left: ft(1.0), width: ft(30.0) };
    let vals: Vec<Val<Length>> = places.iter().copied().map(Val::bare).collect();
    for line in 0..5 {
        for found in worst(&places, line, &roadway, &passing(3)).expect("room") {
            let mut sheet = Sheet::default();
            let written = write(&mut sheet, &vals, line, &found);
            near(written.q, found.share);
            let wheels = sheet
                .lines
                .iter()
                .filter(|entry| match entry.kind {
                    Kind::Found { residual, .. } => {
                        near(residual, 0.0);
                        true
                    }
                    _ => false,
                })
                .count();
            assert_eq!(wheels, 2 * found.placement.trucks.len());
        }
    }
}

/// Girders, roadway and pattern that go together; the roadway lies within the deck, which may overhang.
#[derive(Clone, Debug)]
struct Case {
    places: Vec<Length>,
    line: usize,
    roadway: Roadway,
    pattern: Pattern,
    width: Length,
}

fn case() -> impl Strategy<Value = Case> {
    (proptest::collection::vec(3.0_f64..14.0, 1..6), 0.0_f64..4.0, 0.0_f64..4.0, 0.0_f64..1.0, 0.0_f64..1.0)
        .prop_flat_map(|(spacings, left, right, from, to)| {
            let count = spacings.len() + 1;
            let across: f64 = spacings.iter().sum();
            let width = left + across + right;
            let curb = from * 0.2 * width;
            let roadway = (width - curb) * (0.7 + 0.3 * to);
            let most = ((roadway / 9.0) as usize).clamp(1, 3);
            (Just(spacings), 0..count, 1..=most, prop_oneof![Just(10.0), Just(12.0)], Just(roadway.max(8.0)))
                .prop_map(move |(spacings, line, lanes, band, clear)| {
                    let mut y = left;
                    let mut places = vec![ft(y)];
                    for spacing in &spacings {
                        y += spacing;
                        places.push(ft(y));
                    }
                    let roadway = Roadway { left: ft(curb), width: ft(clear) };
                    let pattern = Pattern { lanes, band: ft(band), edge: ft(2.0), gauge: ft(6.0) };
                    Case { places, line, roadway, pattern, width: ft(width.max(curb + clear)) }
                })
        })
}

/// A placement within the rules from numbers between 0 and 1: bands share out the room that is left.
fn some_placement(case: &Case, band: Length, edge: Length, room: &[f64], seat: &[f64]) -> Vec<Length> {
    let spare = case.roadway.width - room.len() as f64 * band;
    let total: f64 = room.iter().sum::<f64>() + 0.3;
    let play = band - case.pattern.gauge - 2.0 * edge;
    let mut at = case.roadway.left;
    room.iter()
        .zip(seat)
        .map(|(gap, place)| {
            at += spare.max(Length::ZERO) * (gap / total);
            let left = at + edge + play.max(Length::ZERO) * *place;
            at += band;
            left
        })
        .collect()
}

fn taken(case: &Case, lefts: &[Length]) -> f64 {
    lefts
        .iter()
        .flat_map(|&left| [left, left + case.pattern.gauge])
        .map(|y| ordinate(&case.places, case.line, y) / 2.0)
        .sum()
}

proptest! {
    #![proptest_config(ProptestConfig { cases: 400, failure_persistence: None, ..ProptestConfig::default() })]

    /// Equilibrium: whatever stands on the deck is carried by its girders, all of it.
    #[test]
    fn ordinates_add_up_to_one(case in case(), at in 0.0_f64..1.0) {
        let y = case.width * at;
        let sum: f64 = (0..case.places.len()).map(|i| ordinate(&case.places, i, y)).sum();
        let moment: f64 = (0..case.places.len())
            .map(|i| ordinate(&case.places, i, y) * case.places[i].in_ft())
            .sum();
        prop_assert!((sum - 1.0).abs() < 1e-12);
        prop_assert!((moment - y.in_ft()).abs() < 1e-9);
    }

    /// No placement within the rules is worse than the one found, and the one found is within the rules.
    #[test]
    fn nothing_is_worse(
        case in case(),
        room in proptest::collection::vec(0.0_f64..1.0, 3),
        seat in proptest::collection::vec(0.0_f64..=1.0, 3),
    ) {
        let found = worst(&case.places, case.line, &case.roadway, &case.pattern).expect("room");
        prop_assert_eq!(found.len(), case.pattern.lanes);
        for (i, found) in found.iter().enumerate() {
            let placement = &found.placement;
            prop_assert_eq!(placement.trucks.len(), i + 1);
            let slack = ft(1e-5);
            let mut end = case.roadway.left;
            for truck in &placement.trucks {
                prop_assert!(truck.band + slack >= end);
                end = truck.band + placement.band;
                prop_assert!(truck.left + slack >= truck.band + placement.edge);
                prop_assert!(truck.right <= end - placement.edge + slack);
                prop_assert!((truck.right - truck.left - case.pattern.gauge).abs() < slack);
            }
            prop_assert!(end <= case.roadway.right() + slack);
            let lefts: Vec<Length> = placement.trucks.iter().map(|truck| truck.left).collect();
            prop_assert!((taken(&case, &lefts) - found.share).abs() < 1e-9);
            let other = some_placement(&case, placement.band, placement.edge, &room[..=i], &seat[..=i]);
            prop_assert!(taken(&case, &other) <= found.share + 1e-9);
        }
    }

    /// Exactness: stepping two trucks through the roadway comes as near as its step allows, never above.
    #[test]
    fn stepping_comes_near(case in case()) {
        let found = worst(&case.places, case.line, &case.roadway, &case.pattern).expect("room");
        let step = 0.05;
        let placement = &found[0].placement;
        let count = ((case.roadway.width - case.pattern.gauge - 2.0 * placement.edge).in_ft() / step) as usize;
        let best = (0..=count)
            .map(|i| taken(&case, &[case.roadway.left + placement.edge + ft(step * i as f64)]))
            .fold(f64::NEG_INFINITY, f64::max);
        // A wheel's ordinate changes by at most 1/3 a foot, spacings being 3 ft or more.
        prop_assert!(best <= found[0].share + 1e-9);
        prop_assert!(best >= found[0].share - step / 3.0 - 1e-9, "{} {}", best, found[0].share);
    }

    /// Two trucks on a grid of places that their bands allow are never worse than what was found.
    #[test]
    fn two_trucks_on_a_grid(case in case()) {
        prop_assume!(case.pattern.lanes >= 2);
        let found = worst(&case.places, case.line, &case.roadway, &case.pattern).expect("room");
        let (band, edge) = (found[1].placement.band, found[1].placement.edge);
        let play = (band - case.pattern.gauge - 2.0 * edge).max(Length::ZERO);
        let step = ft(0.1);
        let count = ((case.roadway.width - case.pattern.gauge - 2.0 * edge) / step) as usize;
        let places: Vec<(Length, f64)> = (0..=count)
            .map(|i| case.roadway.left + edge + step * i as f64)
            .map(|left| (left, taken(&case, &[left])))
            .collect();
        for (i, (one, share_one)) in places.iter().enumerate() {
            let first = case.roadway.left.max(*one - edge - play);
            for (two, share_two) in &places[i + 1..] {
                let second = (first + band).max(*two - edge - play);
                if second + edge <= *two && second + band <= case.roadway.right() {
                    prop_assert!(share_one + share_two <= found[1].share + 1e-9);
                }
            }
        }
    }

    /// A girder never takes more than all the lanes, as long as no wheel stands beyond the outer girders.
    #[test]
    fn never_more_than_the_lanes(case in case()) {
        let (first, last) = (case.places[0], case.places[case.places.len() - 1]);
        let within = case.roadway.left >= first && case.roadway.right() <= last;
        prop_assume!(within);
        for (i, found) in worst(&case.places, case.line, &case.roadway, &case.pattern).expect("room").iter().enumerate() {
            prop_assert!(found.share <= (i + 1) as f64 + 1e-12);
            prop_assert!(found.share >= 0.0);
        }
    }

    /// A mirrored bridge has mirrored shares.
    #[test]
    fn mirrored(case in case()) {
        let places: Vec<Length> = case.places.iter().rev().map(|&y| case.width - y).collect();
        let roadway = Roadway { left: case.width - case.roadway.right(), width: case.roadway.width };
        let line = places.len() - 1 - case.line;
        let one = worst(&case.places, case.line, &case.roadway, &case.pattern).expect("room");
        let other = worst(&places, line, &roadway, &case.pattern).expect("room");
        for (a, b) in one.iter().zip(&other) {
            prop_assert!((a.share - b.share).abs() < 1e-9, "{} {}", a.share, b.share);
        }
    }

    /// Trucks 4 ft apart are never better than trucks in design lanes.
    #[test]
    fn passing_is_on_the_safe_side(case in case()) {
        let near = Pattern { band: ft(10.0), ..case.pattern };
        let apart = Pattern { band: ft(12.0), ..case.pattern };
        let near = worst(&case.places, case.line, &case.roadway, &near).expect("room");
        let apart = worst(&case.places, case.line, &case.roadway, &apart).expect("room");
        for (a, b) in near.iter().zip(&apart) {
            prop_assert!(a.share >= b.share - 1e-9);
        }
    }
}
