//! Posting by MBE 6A.8 (from memory, 99 % sure of the equation).

use girderbook_core::check::Outcome;
use girderbook_core::clauses::mbe::legal_vehicles as legal;
use girderbook_core::clauses::mbe::posting::{Closure, NotAllowed, Posting, Rated, Sign, post};
use girderbook_core::problem::Problem;
use girderbook_core::quantity::Force;
use girderbook_core::units::WeightUnit;
use girderbook_core::worksheet::{Kind, Sheet, Silent};
use proptest::prelude::*;

fn sign_of(tons: f64, outcome: &Outcome, unit: WeightUnit) -> Sign {
    let rated = Rated { id: "truck", weight: Force::from_short_ton(tons), outcome, standard: true };
    post(&mut Silent, &[rated], unit).signs.remove(0).1
}

fn limit(tons: f64, factor: f64, unit: WeightUnit) -> (f64, u32) {
    match sign_of(tons, &Outcome::Factor(factor), unit) {
        Sign::Limit { safe, shown, unit: written } => {
            assert_eq!(written, unit);
            (safe.in_short_ton(), shown)
        }
        other => panic!("{other:?}"),
    }
}

/// Published checks: 25 tons at 0.65 gives 12.5, 40 tons at 0.5 gives 11.43; rounded down.
#[test]
fn safe_posting_load() {
    for (tons, factor, safe, shown) in [(25.0, 0.65, 12.5, 12), (40.0, 0.5, 11.428_571_428_571, 11)] {
        let found = limit(tons, factor, WeightUnit::ShortTons);
        assert!((found.0 - safe).abs() < 1e-9, "{found:?}");
        assert_eq!(found.1, shown);
    }
}

/// Just below 1.0 the sign shows less than the vehicle weighs; at 1.0 there is none.
#[test]
fn no_sign_from_1_0() {
    assert_eq!(sign_of(36.0, &Outcome::Factor(1.0), WeightUnit::ShortTons), Sign::NotNeeded);
    assert_eq!(sign_of(36.0, &Outcome::Factor(2.4), WeightUnit::ShortTons), Sign::NotNeeded);
    assert_eq!(sign_of(36.0, &Outcome::NotLoaded, WeightUnit::ShortTons), Sign::NotNeeded);
    assert_eq!(limit(36.0, 0.999, WeightUnit::ShortTons).1, 35);
}

/// The equation holds from 0.3 only: below, the type is not allowed, and nothing negative is shown.
#[test]
fn below_0_3_the_type_is_not_allowed() {
    for factor in [0.0, 0.1, 0.299_999] {
        let sign = sign_of(40.0, &Outcome::Factor(factor), WeightUnit::ShortTons);
        assert_eq!(sign, Sign::NotAllowed(NotAllowed::Below03));
    }
    let none = sign_of(40.0, &Outcome::CarriesNoLiveLoad, WeightUnit::ShortTons);
    assert_eq!(none, Sign::NotAllowed(NotAllowed::NoLiveLoad));
    // 40 / 0.7 x 0 = 0 and 40 / 0.7 x 0.05 = 2.86: under three tons.
    for factor in [0.3, 0.35] {
        let sign = sign_of(40.0, &Outcome::Factor(factor), WeightUnit::ShortTons);
        assert_eq!(sign, Sign::NotAllowed(NotAllowed::UnderThreeTons));
    }
    assert_eq!(limit(40.0, 0.3526, WeightUnit::ShortTons).1, 3);
}

/// Limits are rounded down in the sign's own unit: 12.5 short tons are 11.34 tonnes, so 11 and not 12.
#[test]
fn rounded_down_in_the_unit_of_the_sign() {
    assert_eq!(limit(25.0, 0.65, WeightUnit::Tonnes).1, 11);
    // 3.3 short tons are 2.99 t: a sign of 2 t would be below three short tons.
    let factor = 0.3 + 3.3 * 0.7 / 25.0;
    assert_eq!(limit(25.0, factor, WeightUnit::ShortTons).1, 3);
    let sign = sign_of(25.0, &Outcome::Factor(factor), WeightUnit::Tonnes);
    assert_eq!(sign, Sign::NotAllowed(NotAllowed::UnderThreeTons));
}

/// The lane-type load is posted with 80 kip: 40 tons at 0.6 gives 17.1.
#[test]
fn lane_type_load_counts_80_kip() {
    let outcome = Outcome::Factor(0.6);
    let weight = legal::negative_moment().posted_weight;
    let rated = Rated { id: "lane-type", weight, outcome: &outcome, standard: false };
    let sign = post(&mut Silent, &[rated], WeightUnit::ShortTons).signs.remove(0).1;
    assert!(matches!(sign, Sign::Limit { shown: 17, .. }), "{sign:?}");
}

/// What has no rating has no sign, and no number that is none is let through.
#[test]
fn not_rated_is_not_fine() {
    let problem = Problem::missing("site.condition", "no condition", "enter it");
    let sign = sign_of(25.0, &Outcome::NotRated(problem.clone()), WeightUnit::ShortTons);
    assert_eq!(sign, Sign::NotKnown(problem));
    for bad in [f64::NAN, f64::INFINITY] {
        let sign = sign_of(25.0, &Outcome::Factor(bad), WeightUnit::ShortTons);
        assert!(matches!(sign, Sign::NotKnown(_)), "{sign:?}");
    }
}

fn posting(standard: [Outcome; 3], su7: Outcome) -> Posting {
    let rows = [legal::TYPE_3, legal::TYPE_3S2, legal::TYPE_3_3, legal::SU7];
    let outcomes: Vec<Outcome> = standard.into_iter().chain([su7]).collect();
    let rated: Vec<Rated<'_>> = rows
        .iter()
        .zip(&outcomes)
        .enumerate()
        .map(|(i, (row, outcome))| Rated { id: row.id, weight: row.weight(), outcome, standard: i < 3 })
        .collect();
    post(&mut Silent, &rated, WeightUnit::ShortTons)
}

/// MBE 6A.8.1 and 6A.8.3: all three standard trucks below 0.3, or none with a safe load of three tons.
#[test]
fn closure() {
    let f = Outcome::Factor;
    let open = posting([f(1.2), f(0.29), f(0.2)], f(0.1));
    assert_eq!(open.closure, Closure::Open);
    assert!(!open.closure.closes());
    // A hauling vehicle that may not cross does not close a bridge.
    assert_eq!(posting([f(1.2), f(1.1), f(1.05)], f(0.1)).closure, Closure::Open);
    // 25 / 0.7 x 0.0841 = 3.004 tons of a Type 3.
    assert_eq!(posting([f(0.3841), f(0.3), f(0.3)], f(1.5)).closure, Closure::Open);
    let three = posting([f(0.383), f(0.31), f(0.31)], f(1.5));
    assert_eq!(three.closure, Closure::UnderThreeTons);
    assert_eq!(three.signs[3], ("su7".to_owned(), Sign::NotNeeded));
    let all = posting([f(0.29), f(0.25), Outcome::CarriesNoLiveLoad], f(0.9));
    assert_eq!(all.closure, Closure::AllBelow03);
    assert!(all.closure.closes() && three.closure.closes());
}

/// Closure is not denied because a truck has no rating, and not decided without the standard trucks.
#[test]
fn closure_that_is_not_known() {
    let f = Outcome::Factor;
    let missing = || Outcome::NotRated(Problem::missing("web", "not looked at", "look"));
    assert_eq!(posting([f(0.2), missing(), f(0.2)], f(0.9)).closure, Closure::NotKnown);
    assert_eq!(posting([f(0.9), missing(), f(0.2)], f(0.9)).closure, Closure::Open);
    let outcome = f(0.9);
    let rated = Rated { id: "su7", weight: legal::SU7.weight(), outcome: &outcome, standard: false };
    assert_eq!(post(&mut Silent, &[rated], WeightUnit::ShortTons).closure, Closure::NotKnown);
}

/// The sheet shows equation and rounding as lines of their own.
#[test]
fn equation_and_rounding_stand_on_the_sheet() {
    for (unit, safe, written) in [(WeightUnit::ShortTons, 12.5, 12.0), (WeightUnit::Tonnes, 11.339_809, 11.0)]
    {
        let outcome = Outcome::Factor(0.65);
        let rated = Rated { id: "type3", weight: legal::TYPE_3.weight(), outcome: &outcome, standard: true };
        let mut sheet = Sheet::default();
        post(&mut sheet, &[rated], unit);
        let figure = |symbol: &str| {
            let line = sheet.lines.iter().find(|line| line.symbol == symbol).expect("a line");
            assert!(matches!(line.kind, Kind::Formula { .. }));
            line.figure
        };
        assert!((figure("W_safe") - safe).abs() < 1e-6);
        assert!((figure("W_sign") - written).abs() < 1e-9);
    }
}

proptest! {
    #![proptest_config(ProptestConfig { failure_persistence: None, ..ProptestConfig::default() })]

    /// A sign never shows more than is safe, nor more than the vehicle weighs, and more capacity never gives a
    /// lower sign.
    #[test]
    fn signs_are_safe_and_in_order(tons in 10.0_f64..60.0, a in 0.0_f64..1.2, b in 0.0_f64..1.2, metric: bool) {
        let unit = if metric { WeightUnit::Tonnes } else { WeightUnit::ShortTons };
        let one = if metric { Force::from_tonne(1.0) } else { Force::from_short_ton(1.0) };
        let shown = |factor: f64| match sign_of(tons, &Outcome::Factor(factor), unit) {
            Sign::Limit { safe, shown, .. } => {
                assert!(one * f64::from(shown) <= safe + Force::from_n(1e-3));
                assert!(safe < one * f64::from(shown + 1) + Force::from_n(1e-3));
                assert!(safe <= Force::from_short_ton(tons));
                assert!(one * f64::from(shown) >= Force::from_short_ton(3.0));
                shown
            }
            Sign::NotAllowed(_) => 0,
            Sign::NotNeeded => u32::MAX,
            Sign::NotKnown(problem) => panic!("{problem:?}"),
        };
        let (low, high) = if a < b { (a, b) } else { (b, a) };
        prop_assert!(shown(low) <= shown(high));
    }
}
