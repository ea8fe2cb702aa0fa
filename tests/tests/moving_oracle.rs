//! Axle trains and lane loads against an independent reference set: numpy influence ordinates with brute
//! force and local zoom, checked by openseespy static solves at the positions found. Tolerances are
//! those of the set, case by case, or 1e-8 of the largest value where that is stricter.

use girderbook_core::influence::{Side, simple_span};
use girderbook_core::load::{AxleTrain, Spacing};
use girderbook_core::moving::{AxlePolicy, absolute_maximum};
use girderbook_core::quantity::{Force, Length, Moment, Quantity};
use girderbook_tests::reference_set::{
    CUSTOMARY, Lines, METRIC, cases, close, compare, customary, extremes, lane, metric, number, numbers,
    policy,
};
use girderbook_tests::two_span::TwoSpans;
use girderbook_tests::vehicles;

fn simple(span: Length, stations: &[Length]) -> Lines {
    let mut all: Vec<_> = stations.iter().map(|&x| simple_span::moment(span, x).expect("inside")).collect();
    for support in [simple_span::Support::Start, simple_span::Support::End] {
        all.push(simple_span::reaction(span, support).expect("a span"));
    }
    all.push(simple_span::shear(span, Length::ZERO, Side::Right).expect("on the beam"));
    all.push(simple_span::shear(span, span, Side::Left).expect("on the beam"));
    Lines { all, kinds: [("M", stations.len()), ("R", 2), ("V_start", 1), ("V_end", 1)] }
}

fn continuous(beam: TwoSpans, stations: &[Length]) -> Lines {
    let mut all: Vec<_> = stations.iter().map(|&x| beam.moment(x)).collect();
    all.extend((0..3).map(|support| beam.reaction(support)));
    all.extend([Length::ZERO, beam.first].map(|x| beam.shear(x, Side::Right)));
    all.extend([beam.first, beam.first + beam.second].map(|x| beam.shear(x, Side::Left)));
    Lines { all, kinds: [("M", stations.len()), ("R", 3), ("V_start", 2), ("V_end", 2)] }
}

#[test]
fn simple_spans() {
    let cases = cases("A_moving_simple.json");
    assert_eq!(cases.len(), 43);
    let mut compared = 0;
    for case in &cases {
        let (inputs, expected) = (&case["inputs"], &case["expected"]);
        let us = case["kind"] == "moving_vehicle_us";
        let (length, units): (fn(f64) -> Length, _) =
            if us { (Length::from_ft, &CUSTOMARY) } else { (Length::from_m, &METRIC) };
        let (span, stations) = if us { ("span_ft", "x_ft") } else { ("span_m", "x_m") };
        let span = length(number(&inputs[span]));
        let stations: Vec<_> = numbers(&expected[stations]).into_iter().map(length).collect();
        let lines = simple(span, &stations);
        match case["kind"].as_str() {
            Some("moving_vehicle" | "moving_vehicle_us") => {
                let train = if us { customary(&inputs["vehicle"]) } else { metric(&inputs["vehicle"]) };
                let got = extremes(&lines, &train, AxlePolicy::AllCount);
                compared += compare(case, expected, &lines, &got, units);
                let found = absolute_maximum(span, &train, 1.0, None).expect("finite").value;
                let want = [number(&expected["M_absolute_max"])];
                compared += close(case, "M_absolute_max", &[(units.moment)(found)], &want);
            }
            Some("lane_patch") => {
                let got = lane(&lines, number(&inputs["udl_kN_per_m"]));
                compared += compare(case, expected, &lines, &got, units);
            }
            Some("hl93_combination") => {
                let truck = extremes(&lines, &metric(&inputs["truck"]), policy(inputs));
                let tandem = extremes(&lines, &metric(&inputs["tandem"]), policy(inputs));
                let lane = lane(&lines, number(&inputs["lane_kN_per_m"]));
                let factor = number(&inputs["dynamic"]);
                let components = &expected["components"];
                for (name, part) in [("truck", &truck), ("tandem", &tandem), ("lane", &lane)] {
                    compared += compare(case, &components[name], &lines, part, units);
                }
                let sum = |t: &(f64, f64), d: &(f64, f64), l: &(f64, f64)| {
                    (factor * t.0.max(d.0) + l.0, factor * t.1.min(d.1) + l.1)
                };
                let all: Vec<_> =
                    truck.iter().zip(&tandem).zip(&lane).map(|((t, d), l)| sum(t, d, l)).collect();
                compared += compare(case, expected, &lines, &all, units);
            }
            other => panic!("a kind of case that is not compared: {other:?}"),
        }
    }
    // 35 vehicles of 31 numbers, 4 lane loads of 30, 4 combinations of 4 lists of 30.
    assert_eq!(compared, 35 * 31 + 4 * 30 + 4 * 120);
}

/// The lines here are cubics, and two trucks any distance apart are a train with a variable spacing.
#[test]
fn two_spans() {
    let cases = cases("A_moving_two_span.json");
    assert_eq!(cases.len(), 39);
    let mut compared = 0;
    for case in &cases {
        let (inputs, expected) = (&case["inputs"], &case["expected"]);
        let spans = numbers(&inputs["spans_m"]);
        let beam = TwoSpans { first: Length::from_m(spans[0]), second: Length::from_m(spans[1]) };
        let stations: Vec<_> = numbers(&expected["x_m"]).into_iter().map(Length::from_m).collect();
        let lines = continuous(beam, &stations);
        match case["kind"].as_str() {
            Some("moving_vehicle") => {
                let got = extremes(&lines, &metric(&inputs["vehicle"]), policy(inputs));
                compared += compare(case, expected, &lines, &got, &METRIC);
            }
            Some("lane_patch") => {
                let got = lane(&lines, number(&inputs["udl_kN_per_m"]));
                compared += compare(case, expected, &lines, &got, &METRIC);
            }
            Some("two_trucks") => {
                let gap = number(&inputs["dual_truck"]["min_clear_gap_m"]);
                let train = two_trucks(&metric(&inputs["truck"]), gap, beam);
                let got = extremes(&lines, &train, policy(inputs));
                let n = stations.len();
                let moments: Vec<_> = got[..n].iter().map(|p| Moment::from_base(p.1).in_kn_m()).collect();
                let reaction = Force::from_base(got[n + 1].0).in_kn();
                compared += close(case, "M", &moments, &numbers(&expected["two_trucks_M_min"]));
                compared += close(case, "R", &[reaction], &numbers(&expected["two_trucks_R_max"]));
            }
            other => panic!("a kind of case that is not compared: {other:?}"),
        }
    }
    // 33 lists of both senses for 21 moments, 3 reactions and 4 shears; 6 of two trucks.
    assert_eq!(compared, 1886);
}

/// Two closed-up trucks behind each other, `gap` or more apart, far enough to have one off the beam.
fn two_trucks(truck: &AxleTrain, gap: f64, beam: TwoSpans) -> AxleTrain {
    let closed: Vec<_> = truck.spacings().iter().map(|s| Spacing::Fixed(s.least())).collect();
    let between =
        Spacing::Range { from: Length::from_m(gap), to: Length::from_m(gap) + beam.first + beam.second };
    let axles = [truck.axles(), truck.axles()].concat();
    let spacings = [&closed[..], &[between], &closed[..]].concat();
    vehicles::made("two trucks", axles, spacings)
}
