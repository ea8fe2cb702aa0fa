//! What must hold of the search whatever the bridge and the vehicle: properties, planted answers and
//! exact ties.

use girderbook_core::influence::{InfluenceLine, LineKind, Side, simple_span};
use girderbook_core::load::{AxleTrain, Spacing};
use girderbook_core::moving::{
    AxlePolicy, Direction, Position, Workspace, absolute_maximum, effect_at, envelope, extremes,
    lane_extremes,
};
use girderbook_core::numerics::{Cubic, Piecewise};
use girderbook_core::quantity::{Force, Length, LineLoad, Quantity};
use girderbook_tests::moving_reference as reference;
use girderbook_tests::two_span::TwoSpans;
use girderbook_tests::vehicles::{hs20_variable, made, notional, us};
use proptest::prelude::*;

const POLICIES: [AxlePolicy; 2] = [AxlePolicy::AllCount, AxlePolicy::NeglectRelieving];

/// Any length from `low` to `high` m: whole feet, whole millimetres or anything.
fn length(low: f64, high: f64) -> impl Strategy<Value = Length> {
    prop_oneof![
        ((low / 0.3048).ceil() as i32..=(high / 0.3048) as i32).prop_map(|ft| Length::from_ft(f64::from(ft))),
        ((low * 1e3) as i32..=(high * 1e3) as i32).prop_map(|mm| Length::from_mm(f64::from(mm))),
        (low..high).prop_map(Length::from_m),
    ]
}

/// Trains of up to `axles` axles; `variable` of their spacings are ranges.
fn train(axles: usize, variable: usize) -> impl Strategy<Value = AxleTrain> {
    (variable + 1..=axles.max(variable + 1))
        .prop_flat_map(move |n| {
            let load = prop_oneof![4 => 1.0..200.0, 1 => Just(0.0), 1 => Just(100.0)];
            let places = proptest::sample::subsequence((0..n - 1).collect::<Vec<_>>(), variable);
            (
                prop::collection::vec(load, n),
                prop::collection::vec(length(0.4, 14.0), n - 1),
                prop::collection::vec(length(0.4, 20.0), n - 1),
                places,
            )
        })
        .prop_map(|(loads, spacings, extra, places)| {
            let mut axles: Vec<_> = loads.into_iter().map(Force::from_kn).collect();
            axles[0] += Force::from_kn(1.0);
            let mut between: Vec<_> = spacings.iter().map(|&s| Spacing::Fixed(s)).collect();
            for i in places {
                between[i] = Spacing::Range { from: spacings[i], to: spacings[i] + extra[i] };
            }
            made("any", axles, between)
        })
}

fn simple_line() -> impl Strategy<Value = InfluenceLine> {
    let station = prop_oneof![4 => 0.0..1.0, 1 => Just(0.0), 1 => Just(0.5), 1 => Just(1.0)];
    (length(2.0, 40.0), station, 0..4).prop_map(|(span, part, kind)| match kind {
        0 | 1 => simple_span::moment(span, part * span).expect("inside"),
        2 => {
            let side = if part == 0.0 { Side::Right } else { Side::Left };
            simple_span::shear(span, part * span, side).expect("on the beam")
        }
        _ => simple_span::reaction(span, simple_span::Support::Start).expect("a span"),
    })
}

fn curved_line() -> impl Strategy<Value = InfluenceLine> {
    (length(4.0, 30.0), length(4.0, 30.0), 0.0..1.0, 0..4).prop_map(|(first, second, part, kind)| {
        let beam = TwoSpans { first, second };
        let station = part * (first + second);
        match kind {
            0 | 1 => beam.moment(station),
            2 => beam.shear(station, Side::Right),
            _ => beam.reaction(1),
        }
    })
}

fn any_line() -> impl Strategy<Value = InfluenceLine> {
    prop_oneof![simple_line(), curved_line()]
}

/// What differences are measured against: the weight at the peak of the line, which within a thousandth
/// of the beam from a support counts as that of a section there.
fn peak(line: &InfluenceLine, train: &AxleTrain) -> f64 {
    line.ordinates().scale() * train.weight().base()
}

fn values(line: &InfluenceLine, train: &AxleTrain, policy: AxlePolicy) -> (f64, f64) {
    let found = extremes(line, train, policy).expect("finite");
    (found.max.value, found.min.value)
}

fn closed(train: &AxleTrain) -> Vec<f64> {
    train.spacings().iter().map(|s| s.least().base()).collect()
}

/// Both extremes are met by the train at the position given for them, axle by axle.
fn reached(line: &InfluenceLine, train: &AxleTrain, policy: AxlePolicy) -> Result<(), TestCaseError> {
    let tolerance = 1e-11 * peak(line, train);
    let found = extremes(line, train, policy).expect("finite");
    for (governing, largest) in [(&found.max, true), (&found.min, false)] {
        let sum: f64 = governing.axles_on.iter().map(|a| a.load.base() * a.ordinate).sum();
        prop_assert!((sum - governing.value).abs() <= tolerance);
        if let Some(position) = &governing.position {
            let both = effect_at(line, train, position, policy).expect("a position of the train");
            let again = if largest { both.most } else { both.least };
            prop_assert!((again - governing.value).abs() <= tolerance, "{again} {governing:?}");
        } else {
            prop_assert_eq!(governing.value, 0.0);
        }
    }
    Ok(())
}

proptest! {
    #![proptest_config(ProptestConfig { cases: 192, failure_persistence: None, ..ProptestConfig::default() })]

    #[test]
    fn the_search_equals_summing_all_axles_anew(line in any_line(), train in train(11, 0)) {
        for policy in POLICIES {
            let (max, min) = values(&line, &train, policy);
            let (most, least) = reference::extremes(&line, &train, policy);
            let tolerance = 1e-12 * peak(&line, &train);
            // Below 1e-11 of the peak the search gives 0.
            prop_assert!((max - most).abs() <= tolerance || (max == 0.0 && most <= 10.0 * tolerance), "{max} {most}");
            prop_assert!((min - least).abs() <= tolerance || (min == 0.0 && least >= -10.0 * tolerance), "{min} {least}");
        }
    }

    #[test]
    fn one_variable_spacing_equals_all_vertices(line in simple_line(), train in train(6, 1)) {
        for policy in POLICIES {
            let (max, min) = values(&line, &train, policy);
            let (most, least) = reference::extremes(&line, &train, policy);
            let tolerance = 1e-11 * peak(&line, &train);
            prop_assert!((max - most).abs() <= tolerance && (min - least).abs() <= tolerance, "{max} {most} {min} {least}");
        }
    }

    #[test]
    fn positions_reproduce_their_values(line in any_line(), train in (0_usize..4).prop_flat_map(|v| train(9, v))) {
        for policy in POLICIES {
            reached(&line, &train, policy)?;
        }
    }

    #[test]
    fn turning_the_train_round_changes_nothing(line in any_line(), train in (0_usize..3).prop_flat_map(|v| train(8, v))) {
        for policy in POLICIES {
            let (max, min) = values(&line, &train, policy);
            let (most, least) = values(&line, &train.reversed(), policy);
            let tolerance = 1e-11 * peak(&line, &train);
            prop_assert!((max - most).abs() <= tolerance && (min - least).abs() <= tolerance);
        }
    }

    #[test]
    fn leaving_out_relieving_axles_never_helps(line in any_line(), train in (0_usize..3).prop_flat_map(|v| train(8, v))) {
        let (max, min) = values(&line, &train, AxlePolicy::AllCount);
        let (most, least) = values(&line, &train, AxlePolicy::NeglectRelieving);
        let tolerance = 1e-12 * peak(&line, &train);
        prop_assert!(min <= 0.0 && 0.0 <= max);
        prop_assert!(most >= max - tolerance && least <= min + tolerance);
    }

    #[test]
    fn a_wider_range_of_spacings_is_never_better(line in any_line(), train in train(7, 1), share in 0.0..1.0) {
        let (max, min) = values(&line, &train, AxlePolicy::AllCount);
        let inside = train.spacings().iter().map(|s| Spacing::Fixed(s.least() + share * (s.most() - s.least())));
        let fixed = made("fixed", train.axles().to_vec(), inside.collect());
        let (most, least) = values(&line, &fixed, AxlePolicy::AllCount);
        let tolerance = 1e-12 * peak(&line, &train);
        prop_assert!(max >= most - tolerance && min <= least + tolerance);
    }

    #[test]
    fn customary_units_change_nothing(
        span in 10..120_i32, tenth in 0..=10, axles in prop::collection::vec(1..60_i32, 2..8), gap in 3..20_i32,
    ) {
        let ratio = 4.448_221_615_260_5;
        let ft = |n: i32| Length::from_ft(f64::from(n));
        let m = |n: i32| Length::from_m(f64::from(n) * 0.3048);
        let gaps = |length: &dyn Fn(i32) -> Length| (1..axles.len()).map(|_| Spacing::Fixed(length(gap))).collect();
        let kip = axles.iter().map(|&p| Force::from_kip(f64::from(p))).collect();
        let kn = axles.iter().map(|&p| Force::from_kn(f64::from(p) * ratio)).collect();
        let of = |span: Length, train: &AxleTrain| {
            let line = simple_span::moment(span, span * f64::from(tenth) / 10.0).expect("inside");
            extremes(&line, train, AxlePolicy::AllCount).expect("finite").max.moment().in_kn_m()
        };
        let (us, metric) = (made("us", kip, gaps(&ft)), made("metric", kn, gaps(&m)));
        let (a, b) = (of(ft(span), &us), of(m(span), &metric));
        prop_assert!((a - b).abs() <= 1e-11 * a.max(1.0), "{a} {b}");
    }

    #[test]
    fn a_used_workspace_gives_the_same_digits(
        before in prop::collection::vec(any_line(), 1..4), lines in prop::collection::vec(any_line(), 1..4),
        first in (0_usize..3).prop_flat_map(|v| train(9, v)), second in (0_usize..3).prop_flat_map(|v| train(5, v)),
    ) {
        for policy in POLICIES {
            let (mut used, mut out, mut fresh) = (Workspace::default(), Vec::new(), Vec::new());
            envelope(&mut used, &before, &first, policy, &mut out).expect("finite");
            envelope(&mut used, &lines, &second, policy, &mut out).expect("finite");
            envelope(&mut Workspace::default(), &lines, &second, policy, &mut fresh).expect("finite");
            prop_assert_eq!(&out, &fresh);
            for (line, peaks) in lines.iter().zip(&out) {
                prop_assert_eq!(values(line, &second, policy), (peaks.max.value, peaks.min.value));
            }
        }
    }

    #[test]
    fn the_absolute_maximum_is_one(
        span in length(2.0, 40.0), train in (0_usize..2).prop_flat_map(|v| train(8, v)),
        lane in 0.0..20.0, part in prop::collection::vec(0.0..1.0, 8),
    ) {
        let w = LineLoad::from_kn_m(lane);
        let at = |x: Length| {
            let line = simple_span::moment(span, x).expect("inside");
            1.33 * extremes(&line, &train, AxlePolicy::AllCount).expect("finite").max.value
                + lane_extremes(&line, w).expect("finite").max
        };
        let found = absolute_maximum(span, &train, 1.33, Some(w)).expect("finite");
        let value = found.value.base();
        prop_assert!((at(found.station) - value).abs() <= 1e-11 * value, "reached");
        let near = [-1e-3, 1e-3].map(|d| (found.station.base() / span.base() + d).clamp(0.0, 1.0));
        for part in part.into_iter().chain(near) {
            prop_assert!(at(part * span) <= value * (1.0 + 1e-12), "nowhere more, {part}");
        }
        prop_assert!((found.train + found.lane - found.value).abs().base() <= 1e-12 * value);
    }
}

proptest! {
    #![proptest_config(ProptestConfig { cases: 24, failure_persistence: None, ..ProptestConfig::default() })]

    #[test]
    fn never_below_stepping_at_1_cm(line in any_line(), train in (0_usize..2).prop_flat_map(|v| train(6, v)), share in 0.0..=1.0) {
        let spacings: Vec<_> = train.spacings().iter()
            .map(|s| s.least().base() + share * (s.most() - s.least()).base()).collect();
        for policy in POLICIES {
            let (max, min) = values(&line, &train, policy);
            let (most, least) = reference::stepping(&line, &train, policy, &spacings, Length::from_cm(1.0).base());
            let tolerance = 1e-11 * peak(&line, &train);
            prop_assert!(max >= most - tolerance && min <= least + tolerance, "{max} {most} {min} {least}");
        }
    }

    #[test]
    fn variable_spacings_on_curved_lines_are_never_below_any_choice(
        line in curved_line(), train in (1_usize..3).prop_flat_map(|v| train(6, v)),
    ) {
        for policy in POLICIES {
            let (max, min) = values(&line, &train, policy);
            let tolerance = 1e-11 * peak(&line, &train);
            // All on a grid of 15 values a range, and near the spacings found.
            let found = extremes(&line, &train, policy).expect("finite");
            let mut tried = vec![closed(&train)];
            for (i, s) in train.spacings().iter().enumerate() {
                let (least, width) = (s.least().base(), (s.most() - s.least()).base());
                let mut values: Vec<f64> = (0..15).map(|k| least + width * f64::from(k) / 14.0).collect();
                for governing in [&found.max, &found.min] {
                    if let Some(position) = &governing.position {
                        let chosen = position.spacings[i].base();
                        values.extend([-1e-3, 0.0, 1e-3].map(|d| (chosen + d * width).clamp(least, least + width)));
                    }
                }
                if width > 0.0 {
                    tried = tried.iter().flat_map(|base| values.iter().map(move |&v| {
                        let mut changed = base.clone();
                        changed[i] = v;
                        changed
                    })).collect();
                }
            }
            for spacings in tried {
                let (most, least) = reference::at_spacings(&line, &train, policy, &spacings);
                prop_assert!(max >= most - tolerance && min <= least + tolerance, "{spacings:?}: {max} {most} {min} {least}");
            }
        }
    }

    #[test]
    fn two_variable_spacings_equal_all_vertices(line in simple_line(), train in train(4, 2)) {
        for policy in POLICIES {
            let (max, min) = values(&line, &train, policy);
            let (most, least) = reference::extremes(&line, &train, policy);
            let tolerance = 1e-11 * peak(&line, &train);
            prop_assert!((max - most).abs() <= tolerance && (min - least).abs() <= tolerance, "{max} {most} {min} {least}");
        }
    }
}

/// Extremes by whole numbers on a grid of whole feet, times the span: moment at a station and shear just
/// beside it, axles at both sides of the cut. No rounding anywhere.
fn whole_numbers(span: i64, station: i64, loads: &[i64], offsets: &[i64], shear: bool) -> (i64, i64) {
    let ordinates = |a: i64| -> (i64, i64) {
        if a < 0 || a > span {
            return (0, 0);
        }
        if !shear {
            let value = if a <= station { a * (span - station) } else { station * (span - a) };
            return (value, value);
        }
        let before = if a <= station { Some(-a) } else { None };
        let beyond = if a >= station { Some(span - a) } else { None };
        (before.unwrap_or(i64::MAX).min(beyond.unwrap_or(i64::MAX)), beyond.or(before).expect("on one side"))
    };
    // On an end support the axle may as well be off.
    let ordinates = |a: i64| {
        let (low, high) = ordinates(a);
        if a == 0 || a == span { (low.min(0), high.max(0)) } else { (low, high) }
    };
    let length = offsets[offsets.len() - 1];
    let (mut max, mut min) = (0, 0);
    for sign in [-1, 1] {
        for p in -length..=span + length {
            let sum = |pick: fn((i64, i64)) -> i64| -> i64 {
                loads.iter().zip(offsets).map(|(load, o)| load * pick(ordinates(p + sign * o))).sum()
            };
            max = max.max(sum(|o| o.1));
            min = min.min(sum(|o| o.0));
        }
    }
    (max, min)
}

proptest! {
    #![proptest_config(ProptestConfig { cases: 1024, failure_persistence: None, ..ProptestConfig::default() })]

    /// Spacings equal to the span, to half of it and to the station are drawn on purpose.
    #[test]
    fn exact_ties_on_a_grid_of_whole_feet(
        span in 2..60_i64, part in 0.0..=1.0_f64, loads in prop::collection::vec(1..50_i64, 1..8),
        choices in prop::collection::vec((0..6, 1..40_i64), 7), shear in any::<bool>(),
    ) {
        let station = (part * span as f64).round() as i64;
        let mut offsets = vec![0];
        for (choice, other) in &choices[..loads.len() - 1] {
            let gap = match choice {
                0 => span,
                1 => span / 2,
                2 => station,
                3 => span - station,
                _ => *other,
            };
            offsets.push(offsets[offsets.len() - 1] + gap.max(1));
        }
        let ft = |n: i64| Length::from_ft(n as f64);
        let line = if shear {
            let side = if station == span { Side::Left } else { Side::Right };
            simple_span::shear(ft(span), ft(station), side)
        } else {
            simple_span::moment(ft(span), ft(station))
        }.expect("on the beam");
        let axles = loads.iter().map(|&p| Force::from_n(p as f64)).collect();
        let between = offsets.windows(2).map(|o| Spacing::Fixed(ft(o[1] - o[0]))).collect();
        let train = made("whole", axles, between);
        let (max, min) = values(&line, &train, AxlePolicy::AllCount);
        let (most, least) = whole_numbers(span, station, &loads, &offsets, shear);
        let unit = if shear { 1.0 } else { 3048.0 } / span as f64;
        let tolerance = 1e-11 * peak(&line, &train);
        prop_assert!((max - most as f64 * unit).abs() <= tolerance, "{max} {}", most as f64 * unit);
        prop_assert!((min - least as f64 * unit).abs() <= tolerance, "{min} {}", least as f64 * unit);
        reached(&line, &train, AxlePolicy::AllCount)?;
    }
}

fn two_axles(front: f64, rear: f64, gap: Spacing) -> AxleTrain {
    made("two axles", vec![Force::from_kn(front), Force::from_kn(rear)], vec![gap])
}

/// Answers by statics, one line each.
#[test]
fn planted_answers() {
    let span = Length::from_m(10.0);
    let mid = simple_span::moment(span, span / 2.0).expect("inside");
    let start = simple_span::reaction(span, simple_span::Support::Start).expect("a span");
    let m = |line: &InfluenceLine, train: &AxleTrain| {
        extremes(line, train, AxlePolicy::AllCount).expect("finite").max
    };
    // One axle: P L / 4 under it, P on the support.
    let one = made("one", vec![Force::from_kn(100.0)], vec![]);
    assert!((m(&mid, &one).moment().in_kn_m() - 250.0).abs() < 1e-9);
    assert_eq!(m(&start, &one).force().in_kn(), 100.0);
    assert_eq!(m(&start, &one).position.expect("on it").first_axle, Length::ZERO);
    // A spacing equal to the span: both axles on the bridge, each on a support, the other adds nothing.
    let spread = two_axles(60.0, 100.0, Spacing::Fixed(span));
    assert_eq!(m(&start, &spread).force().in_kn(), 100.0);
    assert!((m(&mid, &spread).moment().in_kn_m() - 250.0).abs() < 1e-9);
    // Half the span: the heavy axle at midspan, the light one on a support.
    let half = two_axles(60.0, 100.0, Spacing::Fixed(span / 2.0));
    assert!((m(&mid, &half).moment().in_kn_m() - 250.0).abs() < 1e-9);
    assert!((m(&start, &half).force().in_kn() - 130.0).abs() < 1e-9);
    // Shear at midspan: the rear axle just beyond the cut, the front one 5 m further, on the support.
    let cut = simple_span::shear(span, span / 2.0, Side::Right).expect("on the beam");
    let found = extremes(&cut, &half, AxlePolicy::AllCount).expect("finite");
    assert!((found.max.force().in_kn() - 50.0).abs() < 1e-9);
    assert!((found.min.force().in_kn() + 50.0).abs() < 1e-9);
    // At a support nothing bends.
    let none = simple_span::moment(span, Length::ZERO).expect("inside");
    assert_eq!(m(&none, &half).value, 0.0);
    assert!(m(&none, &half).position.is_none());
}

/// The weight on the bridge jumps at both ends: with a spacing equal to the span, both axles count when
/// each stands on a support, also where the places do not add up to the last digit.
#[test]
fn axles_on_both_supports_count_in_full() {
    for m in [10.0, 0.1 + 0.2, 17.3, 22.0 / 7.0] {
        let span = Length::from_m(m);
        let ones = Piecewise::new(vec![0.0, span.base()], vec![Cubic::constant(1.0)]).expect("well formed");
        let weight = InfluenceLine::new(LineKind::Reaction { support: 0 }, ones);
        let part = span / 3.0;
        let three = |s: &[Spacing]| made("three", vec![Force::from_kn(10.0); 3], s.to_vec());
        let exact = three(&[Spacing::Fixed(part), Spacing::Fixed(span - part)]);
        let free =
            three(&[Spacing::Range { from: part, to: span }, Spacing::Range { from: span - part, to: span }]);
        let long = three(&[Spacing::Fixed(part), Spacing::Fixed(span - 0.99 * part)]);
        for (train, want) in [(exact, 30.0), (free, 30.0), (long, 20.0)] {
            let found = extremes(&weight, &train, AxlePolicy::AllCount).expect("finite");
            assert!((found.max.force().in_kn() - want).abs() < 1e-9, "{m} m: {}", found.max.force().in_kn());
            assert_eq!(found.max.axles_on.len(), want as usize / 10);
        }
    }
}

/// What is below 1e-11 of the peak is round-off: 0, and no position is given for it.
#[test]
fn next_to_nothing_is_nothing() {
    let pieces = [Cubic::constant(-1.0), Cubic::constant(1e-12), Cubic::constant(1e-10)];
    for (last, some) in [(2, false), (3, true)] {
        let knots = (0..=last).map(|i| f64::from(i) * 1e4).collect();
        let f = Piecewise::new(knots, pieces[..last as usize].to_vec()).expect("well formed");
        let line = InfluenceLine::new(LineKind::Reaction { support: 0 }, f);
        let train = made("one", vec![Force::from_kn(100.0)], vec![]);
        for policy in POLICIES {
            let found = extremes(&line, &train, policy).expect("finite").max;
            assert_eq!(found.position.is_some(), some);
            assert_eq!(found.value > 0.0, some);
        }
    }
}

/// At a shear's cut a relieving axle that can be moved off by a variable spacing is moved off.
#[test]
fn a_variable_spacing_is_opened_where_that_is_worse() {
    let span = Length::from_m(10.0);
    let cut = simple_span::shear(span, Length::from_m(4.0), Side::Right).expect("on the beam");
    let range = Spacing::Range { from: Length::from_m(2.0), to: Length::from_m(5.0) };
    // Backward, the front axle of 20 kN is at the left of the cut and relieves, unless 4 m ahead.
    let train = two_axles(20.0, 100.0, range);
    let found = extremes(&cut, &train, AxlePolicy::AllCount).expect("finite").max;
    let closed =
        extremes(&cut, &two_axles(20.0, 100.0, Spacing::Fixed(Length::from_m(2.0))), AxlePolicy::AllCount);
    // Forward, both beyond the cut and closed up: 0.6 * 100 + 0.4 * 20.
    assert!((found.force().in_kn() - 68.0).abs() < 1e-9);
    assert_eq!(found.position.clone().expect("on it").spacings, [Length::from_m(2.0)]);
    assert!((closed.expect("finite").max.force().in_kn() - 68.0).abs() < 1e-9);
    // With a spacing that cannot be under 7 m the front axle leaves the bridge forward.
    let wide = two_axles(20.0, 100.0, Spacing::Range { from: Length::from_m(7.0), to: Length::from_m(9.0) });
    let found = extremes(&cut, &wide, AxlePolicy::AllCount).expect("finite").max;
    assert!((found.force().in_kn() - 60.0).abs() < 1e-9);
}

#[test]
fn a_checker_can_set_the_train_down_by_hand() {
    // HS20 on 60 ft, middle axle at midspan: 32 * 15 + (8 + 32) * 16 / 60 * 30 = 800 kip ft.
    let span = Length::from_ft(60.0);
    let line = simple_span::moment(span, Length::from_ft(30.0)).expect("inside");
    let train = us("HS20");
    let by_hand = Position::closed_up(&train, Length::from_ft(44.0), Direction::Forward);
    let places: Vec<_> = by_hand.places().map(Length::in_ft).collect();
    assert_eq!(places, [44.0, 30.0, 16.0]);
    let both = effect_at(&line, &train, &by_hand, AxlePolicy::AllCount).expect("a position");
    let kip_ft = Force::from_kip(1.0).base() * Length::from_ft(1.0).base();
    assert!((both.most / kip_ft - 800.0).abs() < 1e-9);
    assert_eq!(both.most, both.least);
    // Another spacing than the train can have is refused, and so is a missing one.
    let mut wrong = by_hand.clone();
    wrong.spacings[1] = Length::from_ft(15.0);
    let problem = effect_at(&line, &train, &wrong, AxlePolicy::AllCount).expect_err("refused");
    assert_eq!(problem.path, "position.spacings[1]");
    assert!(effect_at(&line, &hs20_variable(), &wrong, AxlePolicy::AllCount).is_ok());
    wrong.spacings.pop();
    let problem = effect_at(&line, &train, &wrong, AxlePolicy::AllCount).expect_err("refused");
    assert_eq!(problem.path, "position.spacings");
}

/// Closed up governs the moments of simple spans: AASHTO LRFD 3.6.1.2.2 speaks of the spacing that
/// gives the extreme effect; from memory, the 14 ft spacing does on simple spans.
#[test]
fn on_simple_spans_closed_up_trucks_govern_moments() {
    for train in [hs20_variable(), notional()] {
        for ft in [20.0, 40.0, 80.0] {
            let span = Length::from_ft(ft);
            for tenth in 1..10 {
                let line = simple_span::moment(span, span * f64::from(tenth) / 10.0).expect("inside");
                let found = extremes(&line, &train, AxlePolicy::AllCount).expect("finite").max;
                let fixed = made(
                    "closed",
                    train.axles().to_vec(),
                    train.spacings().iter().map(|s| Spacing::Fixed(s.least())).collect(),
                );
                let want = extremes(&line, &fixed, AxlePolicy::AllCount).expect("finite").max.value;
                assert!((found.value - want).abs() <= 1e-12 * want);
            }
        }
    }
}

/// Sizes that no bridge has give a problem, never a number that is none.
#[test]
fn out_of_range_sizes_give_a_problem() {
    let span = Length::from_m(10.0);
    let line = simple_span::moment(span, span / 2.0).expect("inside");
    let heavy =
        made("heavy", vec![Force::from_n(f64::MAX), Force::from_n(f64::MAX)], vec![Spacing::Fixed(span)]);
    assert!(extremes(&line, &heavy, AxlePolicy::AllCount).is_err());
    assert!(absolute_maximum(span, &heavy, 1.0, None).is_err());
    assert!(lane_extremes(&line, LineLoad::from_kn_m(f64::MAX)).is_err());
    assert!(lane_extremes(&line, LineLoad::from_kn_m(-1.0)).is_err());
    assert!(lane_extremes(&line, LineLoad::from_kn_m(f64::NAN)).is_err());
    let train = us("HS20");
    assert!(absolute_maximum(span, &train, -1.0, None).is_err());
    assert!(absolute_maximum(span, &train, f64::NAN, None).is_err());
    assert!(absolute_maximum(Length::ZERO, &train, 1.0, None).is_err());
    let nowhere = Position::closed_up(&train, Length::from_m(f64::NAN), Direction::Forward);
    assert!(effect_at(&line, &train, &nowhere, AxlePolicy::AllCount).is_err());
}
