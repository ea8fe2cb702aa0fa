//! Range of use of the tables. Outside it there is no share, but a problem that names the entry.
#![allow(clippy::manual_range_contains, reason = "conditions are printed as they stand")]

use crate::condition;
use crate::problem::Problem;
use crate::quantity::{Inertia, Length};
use crate::units::mark::{Ft, In4, Inch, One};
use crate::worksheet::{Recorder, Val};

/// What the ranges look at, with the fields to name.
pub(super) struct Entries<'a> {
    pub s: Val<Length>,
    pub s_path: &'a str,
    pub l: Val<Length>,
    pub l_path: &'a str,
    pub t_s: Val<Length>,
    pub t_s_path: &'a str,
    pub k_g: Val<Inertia>,
    pub k_g_path: &'a str,
}

/// What follows from the spacing and the number of girders.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub(super) enum Table {
    /// The formulas hold.
    Formula,
    /// Three girders: lesser of formula and lever rule for moment, lever rule for shear.
    ThreeGirders,
    /// The table says lever rule, or two girders, which statics decides.
    LeverRule,
}

/// Which of them applies.
pub(super) fn table<R: Recorder>(rec: &mut R, s: Val<Length>, n_b: Val<f64>) -> Table {
    if !more_than_two(rec, n_b) || beyond_spacing(rec, s) {
        Table::LeverRule
    } else if four_or_more(rec, n_b) {
        Table::Formula
    } else {
        Table::ThreeGirders
    }
}

/// Ranges of the interior moment table (4.6.2.2.2b-1).
pub(super) fn moment<R: Recorder>(rec: &mut R, at: &Entries<'_>) -> Result<(), Problem> {
    shear(rec, at)?;
    if !stiffness_in_range(rec, at.k_g) {
        return Err(outside(at.k_g_path, "the longitudinal stiffness parameter", "10,000 to 7,000,000 in4"));
    }
    Ok(())
}

/// Ranges of the interior shear table (4.6.2.2.3a-1).
pub(super) fn shear<R: Recorder>(rec: &mut R, at: &Entries<'_>) -> Result<(), Problem> {
    spacing_and_span(rec, at)?;
    if !slab_in_range(rec, at.t_s) {
        return Err(outside(at.t_s_path, "the slab", "4.5 to 12 in (114 to 305 mm)"));
    }
    Ok(())
}

/// The ranges of spacing and span, which skew corrections have as well.
pub(super) fn spacing_and_span<R: Recorder>(rec: &mut R, at: &Entries<'_>) -> Result<(), Problem> {
    if !spacing_in_range(rec, at.s) {
        return Err(outside(at.s_path, "the spacing of girders", "3.5 to 16 ft (1.07 to 4.88 m)"));
    }
    if !span_in_range(rec, at.l) {
        return Err(outside(at.l_path, "the span", "20 to 240 ft (6.1 to 73.2 m)"));
    }
    Ok(())
}

/// Range of the exterior tables.
pub(super) fn exterior<R: Recorder>(rec: &mut R, d_e: Val<Length>) -> Result<(), Problem> {
    if curb_in_range(rec, d_e) {
        Ok(())
    } else {
        Err(outside(
            "deck.left_curb",
            "the distance from the exterior girder to the curb",
            "-1.0 to 5.5 ft (-0.30 to 1.68 m), positive where the roadway reaches beyond the girder",
        ))
    }
}

/// The problem of an entry outside its range.
pub(super) fn outside(path: &str, what: &str, range: &str) -> Problem {
    Problem::error(
        path,
        format!("{what} is outside the range of the distribution formulas, {range}"),
        "check the entry; if it is right, rate by the lever rule or by an analysis of the grid",
    )
}

condition! {
    fn spacing_in_range(S: Length [Ft]) { 3.5 <= S && S <= 16.0 }
    cite "AASHTO LRFD 9th ed. tables 4.6.2.2.2b-1 and 4.6.2.2.3a-1 (a), range"
    yes "spacing within 3.5 to 16 ft" no "spacing outside 3.5 to 16 ft"
}

condition! {
    fn span_in_range(L: Length [Ft]) { 20.0 <= L && L <= 240.0 }
    cite "AASHTO LRFD 9th ed. tables 4.6.2.2.2b-1 and 4.6.2.2.3a-1 (a), range"
    yes "span within 20 to 240 ft" no "span outside 20 to 240 ft"
}

condition! {
    fn slab_in_range(t_s: Length [Inch]) { 4.5 <= t_s && t_s <= 12.0 }
    cite "AASHTO LRFD 9th ed. tables 4.6.2.2.2b-1 and 4.6.2.2.3a-1 (a), range"
    yes "slab within 4.5 to 12 in" no "slab outside 4.5 to 12 in"
}

condition! {
    fn stiffness_in_range(K_g: Inertia [In4]) { 10000.0 <= K_g && K_g <= 7000000.0 }
    cite "AASHTO LRFD 9th ed. table 4.6.2.2.2b-1 (a), range"
    yes "stiffness parameter within 10,000 to 7,000,000 in4" no "stiffness parameter outside 10,000 to 7,000,000 in4"
}

condition! {
    fn curb_in_range(d_e: Length [Ft]) { -1.0 <= d_e && d_e <= 5.5 }
    cite "AASHTO LRFD 9th ed. tables 4.6.2.2.2d-1 and 4.6.2.2.3b-1 (a), range"
    yes "curb within -1.0 to 5.5 ft of the exterior girder" no "curb outside -1.0 to 5.5 ft of the exterior girder"
}

condition! {
    fn more_than_two(N_b: f64 [One]) { N_b >= 3.0 }
    cite "AASHTO LRFD 9th ed. table 4.6.2.2.2b-1 (a), range"
    yes "three girder lines or more" no "two girder lines: statics, the lever rule"
}

condition! {
    fn four_or_more(N_b: f64 [One]) { N_b >= 4.0 }
    cite "AASHTO LRFD 9th ed. table 4.6.2.2.2b-1 (a), range"
    yes "four girder lines or more" no "three girder lines"
}

condition! {
    fn beyond_spacing(S: Length [Ft]) { S > 16.0 }
    cite "AASHTO LRFD 9th ed. 4.6.2.2.1"
    yes "spacing beyond the tables: lever rule" no "spacing not beyond the tables"
}
