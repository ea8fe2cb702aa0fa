//! MBE part A: load and resistance factor rating, with the resistances of LRFD section 6.
//!
//! Editions: AASHTO Manual for Bridge Evaluation, 3rd edition (2018) with interims to 2020; AASHTO LRFD
//! Bridge Design Specifications, 9th edition (2020). Choices that the standards leave open are fields of
//! [`Settings`], each with its default and reason.

mod capacity;
mod factors;

use super::{About, Amount, At, Basis, Case, FaceModuli, LoadFactors, Resistance, Ruling};
use crate::bridge::{Bridge, MemberKind};
use crate::check::{Action, Class, Level, LimitState, Outcome, Posting};
use crate::clauses::lrfd::girder_share::{Across, Effect, Stiffness, girder_share};
use crate::clauses::lrfd::steel::lateral::Torsion;
use crate::clauses::lrfd::steel::material;
use crate::clauses::lrfd::{hl93, lanes as lrfd_lanes};
use crate::clauses::mbe;
use crate::clauses::mbe::legal_vehicles::LEGAL;
use crate::clauses::mbe::posting::Rated;
use crate::load::dead::{DeadLoad, Sharing, take_off};
use crate::load::{AxleTrain, Spacing};
use crate::material::Defaults;
use crate::problem::Problem;
use crate::quantity::{Area, Force, Length, Stress};
use crate::section::effective::{Effective, Remains};
use crate::share::LaneShare;
use crate::units::mark::{Inch, Ksi};
use crate::worksheet::{Recorder, Silent, Val};

pub use factors::{NAMES, factor_label};

/// What the standards leave to the engineer.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Settings {
    /// Whether Service II may rule a posting. By default it does: MBE rates steel for it under legal
    /// loads. It never closes a bridge by itself.
    pub service_posts: bool,
    /// Whether the condition factor rises by 0.05 where losses were measured (C6A.4.2.3). Not by
    /// default.
    pub condition_rises: bool,
    /// Whether the torsional stiffness counts in lateral-torsional buckling. Not by default: the safe
    /// side for old girders whose deck merely rests on them.
    pub torsion: Torsion,
    /// How loads added after the slab had hardened are shared out: equally by default (LRFD
    /// 4.6.2.2.1).
    pub sharing: Sharing,
}

impl Default for Settings {
    fn default() -> Self {
        Self {
            service_posts: true,
            condition_rises: false,
            torsion: Torsion::Neglected,
            sharing: Sharing::Equal,
        }
    }
}

/// The rule set.
#[derive(Clone, Copy, Debug, Default, PartialEq)]
pub struct MbeA {
    /// Its settings.
    pub settings: Settings,
}

impl Defaults for MbeA {
    fn yield_strength(&self, year: Option<i32>) -> Option<(Stress, &'static str)> {
        year.map(mbe::factors::yield_by_year)
    }

    fn concrete_strength(&self, year: Option<i32>) -> Option<(Stress, &'static str)> {
        year.map(mbe::factors::concrete_by_year)
    }
}

/// Vehicles of one's own come with the gauge of the legal ones.
fn own_train(own: &crate::bridge::OwnVehicle) -> Result<AxleTrain, Vec<Problem>> {
    AxleTrain::new(
        own.id.clone(),
        own.name.clone(),
        own.axles.clone(),
        own.spacings.iter().map(|s| Spacing::Fixed(*s)).collect(),
        lrfd_lanes::GAUGE,
        "entered by the user",
    )
}

impl Basis for MbeA {
    fn about(&self) -> About {
        About {
            id: "mbe-a",
            name: "MBE part A",
            editions: "AASHTO MBE 3rd ed. (2018, interims to 2020), LRFD 9th ed. (2020)",
        }
    }

    fn cases(&self, bridge: &Bridge) -> Vec<Case> {
        let mut cases = Vec::new();
        for (level, id, name) in
            [(Level::Inventory, "hl93-inventory", "HL-93"), (Level::Operating, "hl93-operating", "HL-93")]
        {
            let trains: Vec<AxleTrain> =
                [hl93::truck(), hl93::tandem()].into_iter().filter_map(Result::ok).collect();
            cases.push(Case {
                id: id.to_owned(),
                name: name.to_owned(),
                level,
                class: Class::Design,
                weight: None,
                trains,
                lane: Some(hl93::LANE),
                relieving_counts: false,
            });
        }
        let legal = LEGAL.iter().filter_map(|row| row.train().ok().map(|train| (row.class, train)));
        let own = bridge.vehicles.iter().filter_map(|v| own_train(v).ok().map(|train| (Class::Own, train)));
        for (class, train) in legal.chain(own) {
            cases.push(Case {
                id: train.id().to_owned(),
                name: train.name().to_owned(),
                level: Level::Legal,
                class,
                weight: Some(train.weight()),
                trains: vec![train],
                lane: None,
                relieving_counts: true,
            });
        }
        cases
    }

    fn notes(&self, bridge: &Bridge) -> Vec<Problem> {
        let mut notes: Vec<Problem> =
            bridge.vehicles.iter().filter_map(|v| own_train(v).err()).flatten().collect();
        if bridge.site.condition.is_none() {
            notes.push(Problem::warning(
                "site.condition",
                "the condition of the superstructure is not known: rated as poor",
                "enter the condition found at the last inspection",
            ));
        }
        notes
    }

    fn states(&self, action: Action) -> &'static [LimitState] {
        match action {
            Action::Moment | Action::Shear | Action::Bearing => &[LimitState::StrengthI],
            Action::Stress => &[LimitState::ServiceII],
        }
    }

    fn dead<R: Recorder>(&self, rec: &mut R, bridge: &Bridge, line: usize, area: Val<Area>) -> DeadLoad {
        take_off(rec, bridge, line, area, self.settings.sharing)
    }

    fn share<R: Recorder>(
        &self,
        rec: &mut R,
        bridge: &Bridge,
        line: usize,
        action: Action,
    ) -> Result<LaneShare, Problem> {
        let MemberKind::Steel(girder) = &bridge.member(line).kind;
        let section = Effective::at(rec, &girder.section, &Remains::default())?;
        let strength = &bridge.deck.concrete.strength;
        let f_c = rec.given("f'c", "strength of the deck concrete", strength, Ksi);
        let n = material::modular_ratio(rec, f_c, &strength.path)?;
        let y_top = rec.found(
            "y_t",
            "centroid to the top of the girder",
            section.depth.q - section.y.q,
            Inch,
            0.0,
            || "depth less the height of the centroid".to_owned(),
        );
        let stiffness = Stiffness { n, inertia: section.left.inertia, area: section.left.area, y_top };
        let deck = &bridge.deck;
        let (count, lane) = mbe::lanes::lanes(deck.roadway.value, lrfd_lanes::LANE);
        let across = Across {
            bridge,
            line,
            road: lrfd_lanes::roadway(deck.left_curb, deck.roadway.value, lane),
            lanes: count,
            diaphragms: girder.bracing.spacing.is_some(),
        };
        let (effect, name) = match action {
            Action::Moment | Action::Stress => (Effect::Moment, "g_M"),
            Action::Shear | Action::Bearing => (Effect::Shear, "g_V"),
        };
        let share = girder_share(rec, &across, effect, &stiffness)?;
        Ok(LaneShare { share: factors::overridden(rec, bridge, name, share.share), lanes: share.lanes })
    }

    fn dynamic<R: Recorder>(&self, rec: &mut R, bridge: &Bridge, case: &Case) -> Val<f64> {
        let value = match case.level {
            Level::Inventory | Level::Operating => mbe::factors::dynamic_design(rec),
            Level::Legal => {
                let span = bridge.spans.first().map_or(Length::ZERO, |s| s.length.value);
                mbe::factors::dynamic_legal(rec, bridge.traffic.riding, span)
            }
        };
        factors::overridden(rec, bridge, "IM", value)
    }

    fn load_factors<R: Recorder>(
        &self,
        rec: &mut R,
        bridge: &Bridge,
        state: LimitState,
        case: &Case,
        dead: &DeadLoad,
    ) -> LoadFactors {
        factors::load_factors(rec, bridge, state, case, dead)
    }

    fn capacity<R: Recorder>(
        &self,
        rec: &mut R,
        at: &At<'_>,
        dead: &DeadLoad,
        action: Action,
        _state: LimitState,
    ) -> Result<Resistance, Problem> {
        capacity::capacity(rec, &self.settings, at, dead, action)
    }

    fn moduli<R: Recorder>(&self, rec: &mut R, at: &At<'_>) -> Result<[Option<FaceModuli>; 2], Problem> {
        capacity::moduli(rec, at)
    }

    fn factor<R: Recorder>(
        &self,
        rec: &mut R,
        capacity: Amount,
        dead: [Amount; 3],
        live: Amount,
        f: &LoadFactors,
    ) -> Val<f64> {
        use mbe::rating::{force_factor, moment_factor, stress_factor};
        match (capacity, dead, live) {
            (
                Amount::Moment(c),
                [Amount::Moment(d1), Amount::Moment(d2), Amount::Moment(dw)],
                Amount::Moment(l),
            ) => moment_factor(rec, c, f.dc, d1, d2, f.dw, dw, f.live, l),
            (
                Amount::Force(c),
                [Amount::Force(d1), Amount::Force(d2), Amount::Force(dw)],
                Amount::Force(l),
            ) => force_factor(rec, c, f.dc, d1, d2, f.dw, dw, f.live, l),
            (
                Amount::Stress(c),
                [Amount::Stress(d1), Amount::Stress(d2), Amount::Stress(dw)],
                Amount::Stress(l),
            ) => stress_factor(rec, c, f.dc, d1, d2, f.dw, dw, f.live, l),
            _ => unreachable!("capacity and effects of a check are of one kind"),
        }
    }

    fn service_posts(&self, bridge: &Bridge) -> bool {
        bridge.posting.service_governs.unwrap_or(self.settings.service_posts)
    }

    fn posting(&self, bridge: &Bridge, ruling: &[Ruling<'_>]) -> Posting {
        let rated: Vec<Rated> = ruling.iter().map(rated).collect();
        mbe::posting::posting(&mut Silent, &rated, bridge.posting.sign)
    }

    fn safe_load<R: Recorder>(&self, rec: &mut R, weight: Force, outcome: &Outcome) {
        mbe::posting::limit(rec, weight, outcome);
    }
}

fn rated(ruling: &Ruling<'_>) -> Rated {
    Rated {
        load: ruling.load,
        class: ruling.case.class,
        weight: ruling.case.weight.unwrap_or(Force::ZERO),
        outcome: ruling.outcome.clone(),
        strength: ruling.strength.clone(),
        routine: ["type3", "type3s2", "type3-3"].contains(&ruling.case.id.as_str()),
    }
}
