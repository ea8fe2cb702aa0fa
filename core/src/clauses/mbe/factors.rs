//! Factors of MBE part A: loads, condition, system, dynamic allowance; default strengths by year.
//!
//! Values from memory of the 3rd edition (2018) with interims to 2020; legal load factors are those
//! after the recalibration of 2011 (NCHRP 20-07 task 285), which editions before it do not have.

use crate::bridge::{ConditionRating, Riding};
use crate::check::{Level, LimitState};
use crate::clause;
use crate::quantity::{Length, Stress};
use crate::units::mark::One;
use crate::worksheet::{Recorder, Val};

const LOADS: &str = "MBE 3rd ed. table 6A.4.2.2-1 (from memory)";

/// Load factor on component dead load: Strength I 1.25, Service II 1.00.
pub fn component<R: Recorder>(rec: &mut R, state: LimitState) -> Val<f64> {
    let value = match state {
        LimitState::StrengthI => 1.25,
        LimitState::ServiceII => 1.00,
    };
    rec.look_up("gamma_DC", "load factor, components", value, One, LOADS, || words(state).to_owned())
}

/// Load factor on the wearing surface: Strength I 1.50, or 1.25 where its thickness was measured on
/// this bridge; Service II 1.00.
pub fn surface<R: Recorder>(rec: &mut R, state: LimitState, measured: bool) -> Val<f64> {
    let (value, row) = match (state, measured) {
        (LimitState::StrengthI, true) => (1.25, "Strength I, thickness field measured"),
        (LimitState::StrengthI, false) => (1.50, "Strength I, thickness not measured here"),
        (LimitState::ServiceII, _) => (1.00, "Service II"),
    };
    rec.look_up("gamma_DW", "load factor, wearing surface", value, One, LOADS, || row.to_owned())
}

/// Load factor on the design live load.
pub fn design_live<R: Recorder>(rec: &mut R, state: LimitState, level: Level) -> Val<f64> {
    let value = match (state, level) {
        (LimitState::StrengthI, Level::Operating) => 1.35,
        (LimitState::StrengthI, _) => 1.75,
        (LimitState::ServiceII, Level::Operating) => 1.00,
        (LimitState::ServiceII, _) => 1.30,
    };
    rec.look_up("gamma_LL", "load factor, live load", value, One, LOADS, || {
        format!(
            "{}, design load, {}",
            words(state),
            if level == Level::Operating { "operating" } else { "inventory" }
        )
    })
}

clause! {
    /// Legal load factor between 1,000 and 5,000 trucks a day, by straight line.
    pub fn legal_between(ADTT: f64 [One]) -> gamma_LL: f64 [One]
    { 1.30 + (1.45 - 1.30) * (ADTT - 1000.0) / (5000.0 - 1000.0) }
    cite "MBE 3rd ed. table 6A.4.4.2.3a-1 (from memory)" what "load factor, legal loads"
}

/// Load factor on legal loads: Strength I by trucks a day in one direction (1.45 where unknown or
/// 5,000 and more, 1.30 up to 1,000, a straight line between), Service II 1.30.
pub fn legal_live<R: Recorder>(rec: &mut R, state: LimitState, adtt: Option<Val<f64>>) -> Val<f64> {
    const STRENGTH: &str = "MBE 3rd ed. table 6A.4.4.2.3a-1 (from memory)";
    let mut known = |value, cite: &str, row: &str| {
        rec.look_up("gamma_LL", "load factor, legal loads", value, One, cite, || row.to_owned())
    };
    match (state, adtt) {
        (LimitState::ServiceII, _) => known(1.30, LOADS, "Service II, legal loads"),
        (LimitState::StrengthI, None) => known(1.45, STRENGTH, "truck traffic not known"),
        (LimitState::StrengthI, Some(n)) if n.q >= 5000.0 => known(1.45, STRENGTH, "ADTT of 5,000 and more"),
        (LimitState::StrengthI, Some(n)) if n.q <= 1000.0 => known(1.30, STRENGTH, "ADTT up to 1,000"),
        (LimitState::StrengthI, Some(n)) => legal_between(rec, n),
    }
}

const fn words(state: LimitState) -> &'static str {
    match state {
        LimitState::StrengthI => "Strength I",
        LimitState::ServiceII => "Service II",
    }
}

/// Condition factor: good or satisfactory 1.00, fair 0.95, poor 0.85.
pub fn condition<R: Recorder>(rec: &mut R, condition: ConditionRating) -> Val<f64> {
    let (value, row) = match condition {
        ConditionRating::Good => (1.00, "good or satisfactory"),
        ConditionRating::Fair => (0.95, "fair"),
        ConditionRating::Poor => (0.85, "poor"),
    };
    rec.look_up("phi_c", "condition factor", value, One, "MBE 3rd ed. table 6A.4.2.3-1 (from memory)", || {
        row.to_owned()
    })
}

clause! {
    /// Condition factor where losses were measured and the measured section is used.
    pub fn condition_measured(phi_c0: f64 [One]) -> phi_c: f64 [One]
    { min(phi_c0 + 0.05, 1.0) }
    cite "MBE 3rd ed. C6A.4.2.3 (from memory)" what "condition factor, losses measured"
}

/// System factor for bending of multi-girder bridges: 0.85 with three girders or fewer at a spacing of
/// 6 ft or less; 0.95 with four at 4 ft or less; 1.00 for all others.
///
/// Two girders are taken as the welded two-girder case, 0.85.
pub fn system<R: Recorder>(rec: &mut R, girders: usize, spacing: Length) -> Val<f64> {
    let (value, row) = match girders {
        0..=2 => (0.85, "two girders"),
        3 if spacing <= Length::from_ft(6.0) => (0.85, "three girders, spacing up to 6 ft"),
        4 if spacing <= Length::from_ft(4.0) => (0.95, "four girders, spacing up to 4 ft"),
        _ => (1.00, "all other girder bridges"),
    };
    rec.look_up("phi_s", "system factor", value, One, "MBE 3rd ed. table 6A.4.2.4-1 (from memory)", || {
        row.to_owned()
    })
}

/// System factor for shear and reactions: 1.00.
pub fn system_shear<R: Recorder>(rec: &mut R) -> Val<f64> {
    rec.look_up("phi_s", "system factor", 1.0, One, "MBE 3rd ed. 6A.4.2.4 (from memory)", || {
        "shear and reactions".to_owned()
    })
}

clause! {
    /// Condition and system factor together, not below 0.85.
    pub fn condition_and_system(phi_c: f64 [One], phi_s: f64 [One]) -> phi_cs: f64 [One]
    { max(phi_c * phi_s, 0.85) }
    cite "MBE 3rd ed. 6A.4.2.1 (6A.4.2.1-3)" what "condition and system factor together"
}

/// Dynamic allowance of the design load: 33 %.
pub fn dynamic_design<R: Recorder>(rec: &mut R) -> Val<f64> {
    rec.look_up("IM", "dynamic allowance", 0.33, One, "AASHTO LRFD 9th ed. table 3.6.2.1-1", || {
        "all other components, strength and service".to_owned()
    })
}

/// Dynamic allowance of legal loads: 33 %, or by riding surface 10 % and 20 % on spans over 40 ft
/// where approaches, joints and deck were looked at.
pub fn dynamic_legal<R: Recorder>(rec: &mut R, riding: Riding, span: Length) -> Val<f64> {
    let long = span > Length::from_ft(40.0);
    let (value, row) = match riding {
        Riding::Smooth if long => (0.10, "smooth approaches, joints and deck, span over 40 ft"),
        Riding::Minor if long => (0.20, "minor deviations, span over 40 ft"),
        Riding::Smooth | Riding::Minor => (0.33, "span of 40 ft or less: not reduced"),
        Riding::Rough => (0.33, "neither smooth nor with minor deviations only"),
        Riding::NotInspected => (0.33, "riding surface not looked at"),
    };
    rec.look_up(
        "IM",
        "dynamic allowance",
        value,
        One,
        "MBE 3rd ed. 6A.4.4.3, table C6A.4.4.3-1 (from memory)",
        || row.to_owned(),
    )
}

/// Yield strength of unknown structural steel by the year it was built (MBE table 6A.6.2.1-1).
#[must_use]
pub fn yield_by_year(year: i32) -> (Stress, &'static str) {
    match year {
        ..=1904 => (Stress::from_ksi(26.0), "MBE 3rd ed. table 6A.6.2.1-1: built before 1905 (from memory)"),
        1905..=1935 => {
            (Stress::from_ksi(30.0), "MBE 3rd ed. table 6A.6.2.1-1: built 1905 to 1936 (from memory)")
        }
        1936..=1963 => {
            (Stress::from_ksi(33.0), "MBE 3rd ed. table 6A.6.2.1-1: built 1936 to 1963 (from memory)")
        }
        _ => (Stress::from_ksi(36.0), "MBE 3rd ed. table 6A.6.2.1-1: built after 1963 (from memory)"),
    }
}

/// Strength of unknown reinforced concrete by the year it was built (MBE table 6A.5.2.1-1).
#[must_use]
pub fn concrete_by_year(year: i32) -> (Stress, &'static str) {
    if year < 1959 {
        (Stress::from_ksi(2.5), "MBE 3rd ed. table 6A.5.2.1-1: built before 1959 (from memory)")
    } else {
        (Stress::from_ksi(3.0), "MBE 3rd ed. table 6A.5.2.1-1: built 1959 and later (from memory)")
    }
}
