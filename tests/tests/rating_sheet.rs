//! The sheet of a check gives what the rating gave (regression: both are ours), and each of its lines
//! comes out again from an evaluator that is not ours.

use girderbook_core::basis::mbe_a::MbeA;
use girderbook_core::document;
use girderbook_core::rating::{Rater, work};
use girderbook_core::worksheet::Sheet;
use girderbook_tests::evaluate::recheck;

#[test]
fn every_ruling_check_works_out_the_same_on_its_sheet() {
    for file in ["hollow-fork.json", "mill-race.json"] {
        let path = format!("{}/../core/demos/{file}", env!("CARGO_MANIFEST_DIR"));
        let text = std::fs::read_to_string(&path).expect("a demo");
        let book = document::read(&text).expect("a readable demo");
        let basis = MbeA::default();
        let bridge = document::bridge(&book, &basis).bridge.expect("a whole bridge");
        let rating = Rater::default().rate(&bridge, &basis).expect("a rating");
        let mut looked_at = 0;
        for result in &rating.by_vehicle {
            for i in [result.strength, result.service].into_iter().flatten() {
                let check = &rating.checks[i];
                let mut sheet = Sheet::default();
                let again = work(&bridge, &basis, &check.key, &mut sheet).expect("a sheet");
                let (a, b) = (check.outcome.rank().expect("rated"), again.outcome.rank().expect("rated"));
                assert!((a - b).abs() <= 1e-12 * a.abs(), "{file} {:?}: {a} against {b}", check.key);
                let lines = recheck(&sheet).unwrap_or_else(|e| panic!("{file} {:?}: {e}", check.key));
                assert!(lines > 20, "{file}: {lines} lines worked again");
                looked_at += 1;
            }
        }
        assert!(looked_at >= 14);
    }
}
