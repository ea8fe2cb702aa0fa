//! Factors of a rating (MBE 6A.4.2 to 6A.4.4). From memory, 3rd edition with interims to 2020.
//!
//! A factor that cannot be chosen because something was not entered is a problem, never 1.0.

use crate::bridge::{ConditionRating, Riding};
use crate::check::{Action, LimitState};
use crate::problem::Problem;
use crate::quantity::Length;
use crate::units::Entered;
use crate::units::mark::{Ft, One};
use crate::worksheet::{Recorder, Val};
use crate::{clause, condition};

const CITE_LOADS: &str = "AASHTO MBE 3rd ed. table 6A.4.2.2-1 (from memory)";
const CITE_CONDITION: &str = "AASHTO MBE 3rd ed. table 6A.4.2.3-1 (from memory)";
const CITE_SYSTEM: &str = "AASHTO MBE 3rd ed. table 6A.4.2.4-1 (from memory)";

/// Load factor of components, for both limit states (table 6A.4.2.2-1).
pub fn components<R: Recorder>(rec: &mut R, state: LimitState) -> Val<f64> {
    let (value, row) = match state {
        LimitState::StrengthI => (1.25, "Strength I, DC"),
        LimitState::ServiceII => (1.00, "Service II, DC"),
    };
    rec.look_up("gamma_DC", "load factor of components", value, One, CITE_LOADS, || row.to_owned())
}

/// Load factor of wearing surface and utilities that were not measured (table 6A.4.2.2-1).
pub fn surface<R: Recorder>(rec: &mut R, state: LimitState) -> Val<f64> {
    let (value, row) = match state {
        LimitState::StrengthI => (1.50, "Strength I, DW"),
        LimitState::ServiceII => (1.00, "Service II, DW"),
    };
    rec.look_up("gamma_DW", "load factor of wearing surface and utilities", value, One, CITE_LOADS, || {
        row.to_owned()
    })
}

/// Load factor of a wearing surface whose thickness was measured on this bridge (6A.2.2.3). Not for
/// utilities, and not for an overlay that is planned.
pub fn surface_measured<R: Recorder>(rec: &mut R, state: LimitState, readings: usize) -> Val<f64> {
    let value = match state {
        LimitState::StrengthI => 1.25,
        LimitState::ServiceII => 1.00,
    };
    let cite = "AASHTO MBE 3rd ed. 6A.2.2.3 and table 6A.4.2.2-1, note (from memory)";
    rec.look_up("gamma_DWm", "load factor of the measured wearing surface", value, One, cite, || {
        format!("thickness measured in the field, readings of a layer: {readings}")
    })
}

/// Levels of the design load.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum DesignLevel {
    /// Inventory.
    Inventory,
    /// Operating.
    Operating,
}

/// Load factor of the design live load (table 6A.4.2.2-1).
pub fn design_live<R: Recorder>(rec: &mut R, state: LimitState, level: DesignLevel) -> Val<f64> {
    let (value, row) = match (state, level) {
        (LimitState::StrengthI, DesignLevel::Inventory) => (1.75, "Strength I, design load, inventory"),
        (LimitState::StrengthI, DesignLevel::Operating) => (1.35, "Strength I, design load, operating"),
        (LimitState::ServiceII, DesignLevel::Inventory) => (1.30, "Service II, design load, inventory"),
        (LimitState::ServiceII, DesignLevel::Operating) => (1.00, "Service II, design load, operating"),
    };
    rec.look_up("gamma_LL", "load factor of live load", value, One, CITE_LOADS, || row.to_owned())
}

/// Which table of legal-load factors is in force.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum LegalTable {
    /// Since the 2013 interims to the 2nd edition, and the 3rd edition: 1.45 to 1.30.
    Current,
    /// 2nd edition (2011) as printed, routine commercial traffic: 1.80, 1.65, 1.40.
    SecondEdition,
}

/// Load factor of routine commercial traffic, Strength I, by truck traffic of one direction (table
/// 6A.4.4.2.3a-1; for specialised hauling vehicles table 6A.4.4.2.3b-1 has the same values since 2013).
/// Unknown traffic takes the highest factor; between the rows the factor is linear.
pub fn legal_live<R: Recorder>(rec: &mut R, adtt: Option<&Entered<f64>>, table: LegalTable) -> Val<f64> {
    let (rows, cite): (&[(f64, f64)], &str) = match table {
        LegalTable::Current => {
            (&[(1000.0, 1.30), (5000.0, 1.45)], "AASHTO MBE 3rd ed. (2018) table 6A.4.4.2.3a-1 (from memory)")
        }
        LegalTable::SecondEdition => (
            &[(100.0, 1.40), (1000.0, 1.65), (5000.0, 1.80)],
            "AASHTO MBE 2nd ed. (2011) table 6A.4.4.2.3a-1 (from memory)",
        ),
    };
    let name = "load factor of live load, legal loads";
    let (least, most) = (rows[0], rows[rows.len() - 1]);
    let Some(entry) = adtt else {
        return rec.look_up("gamma_LL", name, most.1, One, cite, || "truck traffic not known".to_owned());
    };
    let traffic = rec.given("ADTT", "trucks a day in one direction", entry, One);
    if traffic.q <= least.0 {
        return rec.look_up("gamma_LL", name, least.1, One, cite, || format!("ADTT of {} or less", least.0));
    }
    for pair in rows.windows(2) {
        let ((from, low), (to, high)) = (pair[0], pair[1]);
        if traffic.q < to {
            let row = |at: f64| move || format!("ADTT of {at}");
            let a_1 = rec.look_up("ADTT_1", "row below", from, One, cite, row(from));
            let gamma_1 = rec.look_up("gamma_1", "its factor", low, One, cite, row(from));
            let a_2 = rec.look_up("ADTT_2", "row above", to, One, cite, row(to));
            let gamma_2 = rec.look_up("gamma_2", "its factor", high, One, cite, row(to));
            return between_rows(rec, traffic, a_1, gamma_1, a_2, gamma_2);
        }
    }
    rec.look_up("gamma_LL", name, most.1, One, cite, || format!("ADTT of {} or more", most.0))
}

/// Load factor of legal live load, Service II of steel (table 6A.4.2.2-1).
pub fn legal_service<R: Recorder>(rec: &mut R) -> Val<f64> {
    rec.look_up("gamma_LL", "load factor of live load, legal loads", 1.30, One, CITE_LOADS, || {
        "Service II, legal load".to_owned()
    })
}

/// Condition factor (table 6A.4.2.3-1).
///
/// It covers uncertainty and loss still to come, so it stands beside the measured section. Where the
/// losses were measured it may rise by 0.05, to at most 1.0 (`losses_measured`).
///
/// # Errors
/// When the condition is not entered.
pub fn condition<R: Recorder>(
    rec: &mut R,
    rating: Option<ConditionRating>,
    losses_measured: bool,
) -> Result<Val<f64>, Problem> {
    let (value, row) = match rating {
        Some(ConditionRating::Good) => (1.00, "good or satisfactory"),
        Some(ConditionRating::Fair) => (0.95, "fair"),
        Some(ConditionRating::Poor) => (0.85, "poor"),
        None => {
            return Err(Problem::missing(
                "site.condition",
                "the condition of the superstructure is not entered, so there is no condition factor",
                "enter what the last inspection found",
            ));
        }
    };
    let phi_c = rec.look_up("phi_c", "condition factor", value, One, CITE_CONDITION, || row.to_owned());
    Ok(if losses_measured { condition_raised(rec, phi_c) } else { phi_c })
}

/// Superstructures of the table of system factors.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Superstructure {
    /// Welded members in two-girder bridges.
    TwoGirdersWelded,
    /// Riveted members in two-girder bridges.
    TwoGirdersRiveted,
    /// Three-girder bridges with a girder spacing of 6 ft or less.
    ThreeGirders,
    /// Four-girder bridges with a girder spacing of 4 ft or less.
    FourGirders,
    /// All other girder bridges and slab bridges.
    Other,
}

/// The row that a bridge of steel girders belongs to, by their number and widest spacing. Two girders count
/// as welded, which is on the safe side of riveted.
pub fn superstructure<R: Recorder>(rec: &mut R, n_b: Val<f64>, widest: Val<Length>) -> Superstructure {
    if two_girders(rec, n_b) {
        Superstructure::TwoGirdersWelded
    } else if three_close(rec, n_b, widest) {
        Superstructure::ThreeGirders
    } else if four_close(rec, n_b, widest) {
        Superstructure::FourGirders
    } else {
        Superstructure::Other
    }
}

/// System factor (table 6A.4.2.4-1): for bending; 1.0 for shear.
pub fn system<R: Recorder>(rec: &mut R, kind: Superstructure, action: Action) -> Val<f64> {
    let (value, row) = match (action, kind) {
        (Action::Shear | Action::Bearing, _) => (1.00, "shear: 6A.4.2.4 takes 1.0"),
        (_, Superstructure::TwoGirdersWelded) => (0.85, "welded members in two-girder bridges"),
        (_, Superstructure::TwoGirdersRiveted) => (0.90, "riveted members in two-girder bridges"),
        (_, Superstructure::ThreeGirders) => (0.85, "three-girder bridges, spacing 6 ft (value 88 % sure)"),
        (_, Superstructure::FourGirders) => {
            (0.95, "four-girder bridges, spacing 4 ft or less (value 88 % sure)")
        }
        (_, Superstructure::Other) => (1.00, "all other girder bridges and slab bridges"),
    };
    rec.look_up("phi_s", "system factor", value, One, CITE_SYSTEM, || row.to_owned())
}

/// What a dynamic load allowance is for.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Crossing {
    /// Design load: always the full allowance.
    Design,
    /// Legal or permit load: less on smooth surfaces, on longer spans.
    LegalOrPermit,
}

/// Dynamic load allowance on axles of steel and concrete members, as a ratio (6A.4.3.3, 6A.4.4.3).
///
/// The lesser values of table C6A.4.4.3-1 hold only for legal and permit loads, over 40 ft of span, where
/// approaches, joints and deck were looked at.
pub fn dynamic<R: Recorder>(rec: &mut R, crossing: Crossing, span: Val<Length>, riding: Riding) -> Val<f64> {
    let full = "AASHTO MBE 3rd ed. 6A.4.3.3, 6A.4.4.3 (from memory)";
    let less = "AASHTO MBE 3rd ed. table C6A.4.4.3-1 (from memory)";
    let longer = crossing == Crossing::LegalOrPermit && over_40_ft(rec, span);
    let (value, cite, row) = match (crossing, longer, riding) {
        (Crossing::Design, ..) => (0.33, full, "design load"),
        (_, false, _) => (0.33, full, "span of 40 ft or less"),
        (_, true, Riding::Smooth) => {
            (0.10, less, "smooth riding surface at approaches, bridge deck and joints")
        }
        (_, true, Riding::Minor) => (0.20, less, "minor surface deviations or depressions"),
        (_, true, Riding::Rough) => (0.33, full, "other riding surface"),
        (_, true, Riding::NotInspected) => (0.33, full, "riding surface not looked at"),
    };
    rec.look_up("IM", "dynamic load allowance", value, One, cite, || row.to_owned())
}

clause! {
    /// Between two rows of the table.
    fn between_rows(ADTT: f64 [One], ADTT_1: f64 [One], gamma_1: f64 [One], ADTT_2: f64 [One], gamma_2: f64 [One])
        -> gamma_LL: f64 [One] { gamma_1 + (gamma_2 - gamma_1) * (ADTT - ADTT_1) / (ADTT_2 - ADTT_1) }
    cite "AASHTO MBE 3rd ed. 6A.4.4.2.3a, linear interpolation" what "load factor of live load, legal loads"
}

clause! {
    /// Condition factor where losses were measured.
    fn condition_raised(phi_c: f64 [One]) -> phi_c: f64 [One] { min(phi_c + 0.05, 1.0) }
    cite "AASHTO MBE 3rd ed. 6A.4.2.3 (from memory)" what "condition factor, section losses measured"
}

clause! {
    /// Condition and system factor together, not below 0.85.
    pub fn condition_and_system(phi_c: f64 [One], phi_s: f64 [One]) -> phi_cs: f64 [One]
    { max(phi_c * phi_s, 0.85) }
    cite "AASHTO MBE 3rd ed. (6A.4.2.1-3)" what "condition and system factor together"
}

condition! {
    fn two_girders(N_b: f64 [One]) { N_b <= 2.0 }
    cite "AASHTO MBE 3rd ed. table 6A.4.2.4-1" yes "two girders" no "more than two girders"
}

condition! {
    fn three_close(N_b: f64 [One], S: Length [Ft]) { N_b <= 3.0 && S <= 6.0 }
    cite "AASHTO MBE 3rd ed. table 6A.4.2.4-1" yes "three girders, spacing 6 ft or less" no "not three girders at 6 ft or less"
}

condition! {
    fn four_close(N_b: f64 [One], S: Length [Ft]) { N_b <= 4.0 && S <= 4.0 }
    cite "AASHTO MBE 3rd ed. table 6A.4.2.4-1" yes "four girders, spacing 4 ft or less" no "not four girders at 4 ft or less"
}

condition! {
    fn over_40_ft(L: Length [Ft]) { L > 40.0 }
    cite "AASHTO MBE 3rd ed. table C6A.4.4.3-1" yes "span over 40 ft: riding surface counts" no "span of 40 ft or less"
}
