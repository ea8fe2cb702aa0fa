//! From outcomes to the sign (MBE 6A.8, from memory): never milder as a factor falls, three tons at least,
//! and service neither bars a vehicle nor closes a bridge.

use girderbook_core::basis::mbe_a::MbeA;
use girderbook_core::basis::{Basis, Case, Ruling};
use girderbook_core::bridge::{Bridge, OwnVehicle};
use girderbook_core::check::{Class, ClassLimit, Level, Limit, Outcome, Posting, Sign};
use girderbook_core::problem::Problem;
use girderbook_core::quantity::{Force, Length};
use girderbook_core::units::WeightUnit;
use girderbook_tests::bridges::Sizes;
use proptest::prelude::*;

const UNITS: [WeightUnit; 2] = [WeightUnit::ShortTons, WeightUnit::Tonnes];

fn bridge(unit: WeightUnit) -> Bridge {
    let mut bridge = Sizes::even(5, 7.0, 28.0, 31.0, 60.0).bridge();
    bridge.posting.sign = unit;
    bridge
}

fn legal(bridge: &Bridge) -> Vec<Case> {
    MbeA::default().cases(bridge).into_iter().filter(|case| case.level == Level::Legal).collect()
}

/// Posting for the outcomes of strength, and of service where it counts.
fn post(bridge: &Bridge, strength: &[Outcome], service: &[Outcome]) -> Posting {
    let cases = legal(bridge);
    assert_eq!(cases.len(), strength.len());
    let ruling: Vec<Ruling<'_>> = cases
        .iter()
        .enumerate()
        .map(|(load, case)| {
            let (strength, service) = (strength[load].clone(), service[load].clone());
            let outcome = match (strength.rank(), service.rank()) {
                (Some(a), Some(b)) if b < a => service,
                _ => strength.clone(),
            };
            Ruling { load, case, outcome, strength }
        })
        .collect();
    MbeA::default().posting(bridge, &ruling)
}

fn outcomes(factors: &[f64]) -> Vec<Outcome> {
    factors.iter().map(|f| Outcome::Factor(*f)).collect()
}

fn passing() -> Vec<Outcome> {
    outcomes(&[2.0; 7])
}

/// Strictness of a sign for single units and combinations: more is stricter.
fn strictness(posting: &Posting) -> [i64; 2] {
    let of = |limit| match limit {
        ClassLimit::None => -1000,
        ClassLimit::Weight(weight) => -i64::from(weight),
        ClassLimit::NotAllowed => 0,
    };
    match posting.sign {
        Sign::None => [-1000; 2],
        Sign::Limit { single_unit, combination, .. } => [of(single_unit), of(combination)],
        Sign::Close => [1; 2],
        Sign::NotKnown => panic!("everything is rated"),
    }
}

/// Order of cases: Type 3, Type 3S2, Type 3-3, SU4 to SU7.
#[test]
fn a_type_that_is_not_allowed_bars_its_class() {
    for unit in UNITS {
        // 38.75 short tons at 0.33: 1.66 tons; at 0.29 the equation does not hold.
        for su7 in [0.29, 0.30, 0.33, 0.0] {
            let posting = post(&bridge(unit), &outcomes(&[1.1, 1.1, 1.1, 1.1, 1.1, 1.1, su7]), &passing());
            let sign =
                Sign::Limit { single_unit: ClassLimit::NotAllowed, combination: ClassLimit::None, unit };
            assert_eq!(posting.sign, sign, "{su7}");
            assert_eq!(posting.safe[6].limit, Limit::NotAllowed);
            assert_eq!(posting.safe[0].limit, Limit::Full);
        }
    }
}

/// 40 tons at 0.5: 11.43 tons or 10.37 t; Type 3 of 25 tons at 0.65: 12.5 tons or 11.34 t.
#[test]
fn the_strictest_type_rules_its_class() {
    let strength = outcomes(&[0.65, 1.2, 0.5, 1.1, 1.1, 1.1, 1.0]);
    for (unit, single, combination) in [(WeightUnit::ShortTons, 12, 11), (WeightUnit::Tonnes, 11, 10)] {
        let (single_unit, combination) = (ClassLimit::Weight(single), ClassLimit::Weight(combination));
        let posting = post(&bridge(unit), &strength, &passing());
        assert_eq!(posting.sign, Sign::Limit { single_unit, combination, unit });
    }
}

#[test]
fn only_strength_closes() {
    for unit in UNITS {
        let low = outcomes(&[0.1; 7]);
        assert_eq!(post(&bridge(unit), &low, &passing()).sign, Sign::Close);
        let least = ClassLimit::Weight(3);
        let posting = post(&bridge(unit), &passing(), &low);
        assert_eq!(posting.sign, Sign::Limit { single_unit: least, combination: least, unit });
        let none = vec![Outcome::CarriesNoLiveLoad; 7];
        assert_eq!(post(&bridge(unit), &passing(), &none).sign, posting.sign);
        // The heavy hauling vehicles alone do not close it.
        let hauling = outcomes(&[1.0, 1.0, 1.0, 0.1, 0.1, 0.1, 0.1]);
        assert_ne!(post(&bridge(unit), &hauling, &passing()).sign, Sign::Close);
    }
}

/// What has no number is not taken as sound; but a bridge that is to be closed anyway is.
#[test]
fn a_missing_number_is_no_sign() {
    let bridge = bridge(WeightUnit::ShortTons);
    let mut strength = passing();
    strength[6] = Outcome::NotRated(Problem::missing("web", "not looked at", "look"));
    let posting = post(&bridge, &strength, &passing());
    assert_eq!((posting.sign, posting.safe[6].limit), (Sign::NotKnown, Limit::NotKnown));
    for standard in &mut strength[..3] {
        *standard = Outcome::CarriesNoLiveLoad;
    }
    assert_eq!(post(&bridge, &strength, &passing()).sign, Sign::Close);
}

/// Nobody says whether a vehicle of one's own is a single unit, so it rules both.
#[test]
fn an_own_vehicle_rules_both_classes() {
    let mut bridge = bridge(WeightUnit::ShortTons);
    bridge.vehicles.push(OwnVehicle {
        id: "v1".to_owned(),
        name: "crane".to_owned(),
        axles: vec![Force::from_short_ton(20.0); 2],
        spacings: vec![Length::from_ft(14.0)],
    });
    assert_eq!(legal(&bridge)[7].class, Class::Own);
    let strength = outcomes(&[2.0, 2.0, 2.0, 2.0, 2.0, 2.0, 2.0, 0.5]);
    let both = ClassLimit::Weight(11);
    let posting = post(&bridge, &strength, &outcomes(&[2.0; 8]));
    let sign = Sign::Limit { single_unit: both, combination: both, unit: WeightUnit::ShortTons };
    assert_eq!(posting.sign, sign);
}

proptest! {
    #![proptest_config(ProptestConfig { failure_persistence: None, ..ProptestConfig::default() })]

    /// Lower factors never give a milder sign, nor lift a closure; and no sign is below three short tons.
    #[test]
    fn never_milder_as_factors_fall(
        strength in prop::collection::vec((0.0_f64..1.5, 0.3_f64..1.0), 7),
        service in prop::collection::vec((0.0_f64..1.5, 0.3_f64..1.0), 7),
        metric: bool,
    ) {
        let unit = UNITS[usize::from(metric)];
        let bridge = bridge(unit);
        let whole = |all: &[(f64, f64)]| outcomes(&all.iter().map(|p| p.0).collect::<Vec<_>>());
        let less = |all: &[(f64, f64)]| outcomes(&all.iter().map(|p| p.0 * p.1).collect::<Vec<_>>());
        let before = strictness(&post(&bridge, &whole(&strength), &whole(&service)));
        for worse in [
            post(&bridge, &less(&strength), &whole(&service)),
            post(&bridge, &whole(&strength), &less(&service)),
            post(&bridge, &less(&strength), &less(&service)),
        ] {
            let after = strictness(&worse);
            prop_assert!(after[0] >= before[0] && after[1] >= before[1], "{before:?} {after:?}");
            if let Sign::Limit { single_unit, combination, .. } = worse.sign {
                for limit in [single_unit, combination] {
                    prop_assert!(!matches!(limit, ClassLimit::Weight(0..=2)));
                }
            }
        }
    }
}
