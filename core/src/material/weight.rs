//! Unit weights of what lies on girders, each with where it is known from. A default in force is
//! marked as assumed; a weight that was entered takes its place.

use crate::quantity::UnitWeight;

/// Reinforced concrete.
pub const REINFORCED_CONCRETE: (UnitWeight, &str) =
    (UnitWeight::from_kn_m3(24.5), "reinforced concrete 24.5 kN/m3 (common practice, no source)");

/// Asphalt.
///
/// On the heavy side of LRFD table 3.5.1-1, bituminous wearing surfaces 0.140 kcf = 22.0 kN/m3
/// (from memory, AASHTO LRFD 8th edition).
pub const ASPHALT: (UnitWeight, &str) =
    (UnitWeight::from_kn_m3(22.5), "asphalt 22.5 kN/m3 (common practice, no source)");

/// Rolled gravel or macadam.
pub const GRAVEL: (UnitWeight, &str) = (
    UnitWeight::from_kcf(0.14),
    "rolled gravel, macadam 0.140 kcf (LRFD table 3.5.1-1, from memory, 8th edition)",
);
