//! The demo books are in the written form and open into a bridge.

use girderbook_core::document::{self, Book, Defaults};
use girderbook_core::quantity::Stress;

pub const HOLLOW_FORK: &str = include_str!("../../core/demos/hollow-fork.json");
pub const MILL_RACE: &str = include_str!("../../core/demos/mill-race.json");

struct ByYear;
impl Defaults for ByYear {
    fn yield_strength(&self, year: Option<i32>) -> Option<(Stress, &'static str)> {
        year.map(|_| (Stress::from_ksi(33.0), "by year, for this test"))
    }
    fn concrete_strength(&self, year: Option<i32>) -> Option<(Stress, &'static str)> {
        year.map(|_| (Stress::from_ksi(2.5), "by year, for this test"))
    }
}

#[test]
fn canonical() {
    for (name, text) in [("hollow-fork", HOLLOW_FORK), ("mill-race", MILL_RACE)] {
        let book: Book = document::read(text).unwrap();
        std::fs::write(format!("../core/demos/{name}.json"), document::write(&book)).unwrap();
        let o = document::bridge(&book, &ByYear);
        println!("{name}: {:#?}\n{:#?}", o.problems, o.filled);
    }
}
