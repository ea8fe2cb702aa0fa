//! The factors of the rule set, and the user's own in their place.

use crate::basis::{Case, LoadFactors};
use crate::bridge::{Bridge, ConditionRating};
use crate::check::{Level, LimitState};
use crate::clauses::mbe::factors as table;
use crate::load::dead::DeadLoad;
use crate::quantity::Length;
use crate::units::mark::One;
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

/// Load factors of a combination.
pub fn load_factors<R: Recorder>(
    rec: &mut R,
    bridge: &Bridge,
    state: LimitState,
    case: &Case,
    dead: &DeadLoad,
) -> LoadFactors {
    let dc = table::component(rec, state);
    let dw = table::surface(rec, state, dead.dw_measured);
    let live = match case.level {
        Level::Inventory | Level::Operating => table::design_live(rec, state, case.level),
        Level::Legal => {
            let adtt = bridge
                .traffic
                .adtt
                .as_ref()
                .map(|entry| rec.given("ADTT", "trucks a day in one direction", entry, One));
            table::legal_live(rec, state, adtt)
        }
    };
    if state != LimitState::StrengthI {
        return LoadFactors { dc, dw, live };
    }
    LoadFactors {
        dc: overridden(rec, bridge, "gamma_DC", dc),
        dw: overridden(rec, bridge, "gamma_DW", dw),
        live: if case.level == Level::Legal { overridden(rec, bridge, "gamma_LL", live) } else { live },
    }
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
    rises: bool,
    shear: bool,
    loss_measured: bool,
) -> OnResistance {
    let mut condition = table::condition(rec, bridge.site.condition.unwrap_or(ConditionRating::Poor));
    if rises && loss_measured {
        condition = table::condition_measured(rec, condition);
    }
    let condition = overridden(rec, bridge, "phi_c", condition);
    let system = if shear {
        table::system_shear(rec)
    } else {
        let least = bridge
            .lines
            .windows(2)
            .map(|pair| pair[1].y - pair[0].y)
            .fold(Length::from_m(1000.0), Length::min);
        let system = table::system(rec, bridge.lines.len(), least);
        overridden(rec, bridge, "phi_s", system)
    };
    let both = table::condition_and_system(rec, condition, system);
    OnResistance { condition, system, both }
}
