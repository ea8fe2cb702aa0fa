//! Losing steel never makes a girder stronger, with dead load and shares held.

use girderbook_core::basis::mbe_a::MbeA;
use girderbook_core::basis::{At, Basis};
use girderbook_core::bridge::{Bridge, Straightness};
use girderbook_core::check::{Action, LimitState};
use girderbook_core::document;
use girderbook_core::quantity::Length;
use girderbook_core::rating::Rater;
use girderbook_core::units::Entered;
use girderbook_core::worksheet::Silent;
use proptest::prelude::*;

fn demo(file: &str) -> Bridge {
    let path = format!("{}/../core/demos/{file}", env!("CARGO_MANIFEST_DIR"));
    let book = document::read(&std::fs::read_to_string(path).expect("a demo")).expect("a readable demo");
    document::bridge(&book, &MbeA::default()).bridge.expect("a whole bridge")
}

/// Capacity at midspan of G3 with plates thinned to parts of their sound thickness.
fn capacity(bridge: &Bridge, parts: [f64; 3], action: Action, state: LimitState) -> f64 {
    let basis = MbeA::default();
    let dead = basis.dead(&mut Silent, bridge, 2).expect("a dead load");
    let mut at = At::new(bridge, 2, bridge.spans[0].length.value / 2.0);
    at.left.top = at.left.top * parts[0];
    at.left.bottom = at.left.bottom * parts[1];
    at.left.web = at.left.web * parts[2];
    basis.capacity(&mut Silent, &at, &dead, action, state).map_or(0.0, |r| r.factored.base())
}

proptest! {
    #![proptest_config(ProptestConfig::with_cases(300))]

    #[test]
    fn never_above_the_sound_section(parts in prop::array::uniform3(0.3_f64..1.0)) {
        for file in ["hollow-fork.json", "mill-race.json"] {
            let bridge = demo(file);
            for (action, state) in
                [(Action::Moment, LimitState::StrengthI), (Action::Shear, LimitState::StrengthI)]
            {
                let sound = capacity(&bridge, [1.0; 3], action, state);
                let worn = capacity(&bridge, parts, action, state);
                prop_assert!(worn <= sound * (1.0 + 1e-12), "{file} {action:?} {parts:?}: {worn} above {sound}");
            }
        }
    }
}

/// A hole somewhere must not hide behind a place with the same plates that is whole.
#[test]
fn a_web_that_is_not_straight_gets_no_shear_there() {
    let mut bridge = demo("hollow-fork.json");
    let mut hole = bridge.findings[0].clone();
    hole.id = "f99".to_owned();
    hole.line = 2;
    hole.from = Entered::measured("findings.f99.from", Length::from_m(6.0));
    hole.to = Entered::measured("findings.f99.to", Length::from_m(7.0));
    (hole.top, hole.bottom, hole.web, hole.web_low) = (None, None, None, None);
    hole.straight = Straightness::Not;
    bridge.findings.push(hole);
    let rating = Rater::default().rate(&bridge, &MbeA::default()).expect("a rating");
    let not_rated = |from: f64, to: f64| {
        rating
            .checks
            .iter()
            .filter(|c| c.key.line == 2 && c.key.action == Action::Shear)
            .filter(|c| (from..=to).contains(&c.key.x.in_m()))
            .all(|c| c.outcome.rank().is_none())
    };
    assert!(not_rated(6.0, 7.0), "no number where the web is holed");
    assert!(!not_rated(7.5, 9.0), "numbers elsewhere");
}
