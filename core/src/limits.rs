//! Stand-in.
use crate::quantity::{Angle, Force, Length, LineLoad, Stress, UnitWeight};
/// Range.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Limit {
    /// What.
    pub least: f64,
    /// What.
    pub most: f64,
    /// Whether least itself counts.
    pub open: bool,
}
const fn len(a: f64, b: f64) -> Limit {
    Limit { least: Length::from_mm(a).in_mm() * 10.0, most: b * 10.0, open: false }
}
/// Years.
pub const YEARS: core::ops::RangeInclusive<i32> = 1800..=2100;
macro_rules! l { ($($n:ident = $e:expr;)+) => { $( #[allow(missing_docs)] pub static $n: Limit = $e; )+ } }
l! {
 SPAN = len(1000.0, 200_000.0);
 SKEW = Limit { least: -75.0, most: 75.0, open: false };
 DECK_WIDTH = len(1000.0, 60_000.0);
 ROADWAY = len(1000.0, 60_000.0);
 OFFSET = len(0.0, 10_000.0);
 LAYER = len(0.0, 2000.0);
 UNIT_WEIGHT = Limit { least: UnitWeight::from_kn_m3(1.0).in_kn_m3() * 1e-9, most: 100.0 * 1e-9, open: false };
 SLAB = len(50.0, 1000.0);
 CONCRETE_STRENGTH = Limit { least: Stress::from_mpa(5.0).in_mpa() * 0.01, most: 1.2, open: false };
 HAUNCH = len(0.0, 500.0);
 FLANGE_WIDTH = len(50.0, 1500.0);
 STRIP = Limit { least: LineLoad::from_kn_m(0.0).in_kn_m(), most: 10.0, open: false };
 DEPTH = len(80.0, 4000.0);
 PLATE = len(2.0, 150.0);
 YIELD_STRENGTH = Limit { least: 1.0, most: 8.0, open: false };
 BRACE_SPACING = len(300.0, 200_000.0);
 BEARING_LENGTH = len(20.0, 2000.0);
 SPACING = len(300.0, 10_000.0);
 STATION = len(0.0, 200_000.0);
 LEFT = len(0.0, 150.0);
 ADTT = Limit { least: 0.0, most: 100_000.0, open: false };
 FACTOR = Limit { least: 0.0, most: 10.0, open: true };
 AXLE = Limit { least: Force::from_kn(0.1).in_n(), most: 2e6, open: false };
 AXLE_SPACING = len(300.0, 60_000.0);
}
#[allow(unused)]
const A: Option<Angle> = None;
