//! The factors of the rule set, and the user's own in their place.

use crate::basis::{Case, LoadFactors};
use crate::bridge::{Bridge, ConditionRating};
use crate::check::{Action, Level, LimitState};
use crate::clause;
use crate::clauses::mbe::factors::{self as table, DesignLevel, LegalTable};
use crate::load::dead::DeadLoad;
use crate::problem::Problem;
use crate::quantity::{Length, LineLoad};
use crate::units::mark::{Ft, KipPerFt, One};
use crate::worksheet::{Recorder, Val};

/// Factors that a user may set, by the name that a book keeps.
pub const NAMES: [&str; 9] =
    ["gamma_DC", "gamma_DW", "gamma_LL", "IM", "g_M", "g_V", "phi_c", "phi_s", "phi"];

/// What a factor is, in words.
#[must_use]
pub fn factor_label(name: &str) -> &'static str {
    match name {
        "gamma_DC" => "load factor, components (Strength I)",
        "gamma_DW" => "load factor, wearing surface (Strength I)",
        "gamma_LL" => "load factor, legal loads (Strength I)",
        "IM" => "dynamic allowance, as a fraction",
        "g_M" => "share of a lane, moment",
        "g_V" => "share of a lane, shear",
        "phi_c" => "condition factor",
        "phi_s" => "system factor",
        "phi" => "resistance factor",
        _ => "",
    }
}

/// The user's own factor where there is one, with its reason on the sheet; else the rule set's.
pub fn overridden<R: Recorder>(rec: &mut R, bridge: &Bridge, name: &str, value: Val<f64>) -> Val<f64> {
    match bridge.traffic.overrides.factors.iter().find(|(own, ..)| own == name) {
        None => value,
        Some((_, entry, reason)) => {
            rec.remark(|| format!("Set by the user in place of the rule set's {}: {reason}", value.q));
            rec.given(name, factor_label(name), entry, One)
        }
    }
}

/// Factors on component dead load and on the wearing surface.
pub fn dead_factors<R: Recorder>(
    rec: &mut R,
    bridge: &Bridge,
    state: LimitState,
    dead: &DeadLoad,
) -> (Val<f64>, Val<f64>) {
    let dc = table::components(rec, state);
    let dw = surface(rec, state, dead);
    if state != LimitState::StrengthI {
        return (dc, dw);
    }
    (overridden(rec, bridge, "gamma_DC", dc), overridden(rec, bridge, "gamma_DW", dw))
}

/// The factor of the wearing surface: of what was measured, of what was not, or of both together by
/// their weights.
fn surface<R: Recorder>(rec: &mut R, state: LimitState, dead: &DeadLoad) -> Val<f64> {
    let (measured, other) = (dead.dw_measured, dead.dw_other);
    if measured.q <= LineLoad::ZERO {
        return table::surface(rec, state);
    }
    let gamma_m = table::surface_measured(rec, state, dead.readings);
    if other.q <= LineLoad::ZERO {
        return gamma_m;
    }
    let gamma_o = table::surface(rec, state);
    together(rec, gamma_m, measured, gamma_o, other)
}

clause! {
    /// One factor for a surface of which a part was measured: the factored parts over their sum.
    fn together(gamma_m: f64 [One], DW_m: LineLoad [KipPerFt], gamma_o: f64 [One], DW_o: LineLoad [KipPerFt])
        -> gamma_DW: f64 [One] { (gamma_m * DW_m + gamma_o * DW_o) / (DW_m + DW_o) }
    cite "AASHTO MBE 3rd ed. table 6A.4.2.2-1, each part with its own factor"
    what "load factor of wearing surface and utilities together"
}

/// Load factors of a combination.
pub fn load_factors<R: Recorder>(
    rec: &mut R,
    bridge: &Bridge,
    state: LimitState,
    case: &Case,
    dead: &DeadLoad,
) -> LoadFactors {
    let (dc, dw) = dead_factors(rec, bridge, state, dead);
    let live = match (case.level, state) {
        (Level::Inventory, _) => table::design_live(rec, state, DesignLevel::Inventory),
        (Level::Operating, _) => table::design_live(rec, state, DesignLevel::Operating),
        (Level::Legal, LimitState::ServiceII) => table::legal_service(rec),
        (Level::Legal, LimitState::StrengthI) => {
            let live = table::legal_live(rec, bridge.traffic.adtt.as_ref(), LegalTable::Current);
            overridden(rec, bridge, "gamma_LL", live)
        }
    };
    LoadFactors { dc, dw, live }
}

/// What multiplies the resistance of a member at the strength limit states.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct OnResistance {
    /// Condition factor.
    pub condition: Val<f64>,
    /// System factor.
    pub system: Val<f64>,
    /// Both together, not below 0.85.
    pub both: Val<f64>,
}

/// Condition and system factor. A condition that nobody entered is rated as poor.
pub fn on_resistance<R: Recorder>(
    rec: &mut R,
    bridge: &Bridge,
    action: Action,
    losses_measured: bool,
) -> Result<OnResistance, Problem> {
    let rating = bridge.site.condition.unwrap_or(ConditionRating::Poor);
    let condition = table::condition(rec, Some(rating), losses_measured)?;
    let condition = overridden(rec, bridge, "phi_c", condition);
    let count = bridge.lines.len() as f64;
    let n_b = rec.found("N_b", "number of girder lines", count, One, 0.0, || "counted".to_owned());
    let spacings = bridge.lines.windows(2).map(|pair| pair[1].y - pair[0].y);
    let widest = spacings.fold(Length::ZERO, Length::max);
    let widest = rec.found("S", "widest spacing of the girders", widest, Ft, 0.0, || {
        "largest of the spacings entered".to_owned()
    });
    let kind = table::superstructure(rec, n_b, widest);
    let mut system = table::system(rec, kind, action);
    if matches!(action, Action::Moment | Action::Stress) {
        system = overridden(rec, bridge, "phi_s", system);
    }
    let both = table::condition_and_system(rec, condition, system);
    Ok(OnResistance { condition, system, both })
}
