//! MBE part A: load and resistance factor rating, with the resistances of LRFD section 6.
//!
//! Editions: AASHTO Manual for Bridge Evaluation, 3rd edition (2018) with interims to 2020; AASHTO LRFD
//! Bridge Design Specifications, 9th edition (2020). Choices that the standards leave open are fields of
//! [`Settings`], each with its default and reason.

mod capacity;
mod factors;
mod posting;

use super::{About, Amount, At, Basis, Case, FaceModuli, LaneShare, LoadFactors, Resistance, Ruling};
use crate::bridge::{Bridge, MemberKind};
use crate::check::{Action, Class, Level, LimitState, Outcome, Posting};
use crate::clauses::lrfd::distribution::{
    Bands, Loading, Method, Policy, RigidRule, SkewShear, Stiffness, governing_share,
};
use crate::clauses::lrfd::steel::lateral::Torsion;
use crate::clauses::lrfd::steel::material;
use crate::clauses::lrfd::{hl93, lanes as lrfd_lanes};
use crate::clauses::mbe;
use crate::clauses::mbe::factors::Crossing;
use crate::clauses::mbe::legal_vehicles::LEGAL_TRUCKS;
use crate::load::dead::{DeadLoad, Sharing, TakeOff, steel_weight, take_off};
use crate::load::{Across, AxleTrain, Spacing};
use crate::material::Defaults;
use crate::problem::Problem;
use crate::quantity::{Length, Stress};
use crate::section::effective::{Effective, Remains};
use crate::units::mark::{Ft, Inch, Ksi};
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
    /// Which girders get the increase of shear for skew (LRFD 4.6.2.2.3c): all of them by default, the
    /// safe side of exterior and first interior girders.
    pub skew_shear: SkewShear,
}

impl Default for Settings {
    fn default() -> Self {
        Self {
            service_posts: true,
            condition_rises: false,
            torsion: Torsion::Neglected,
            sharing: Sharing::Equal,
            skew_shear: SkewShear::All,
        }
    }
}

impl Settings {
    /// How live load is shared out on a roadway of full width.
    const fn share(&self) -> Policy {
        Policy {
            loading: Loading::Governing,
            method: Method::Formula,
            bands: Bands::DesignLanes,
            rigid: RigidRule::WithDiaphragms,
            // A reduction, so not taken.
            skew_moment: false,
            skew_shear: self.skew_shear,
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
        mbe::materials::steel_yield(year)
    }

    fn concrete_strength(&self, year: Option<i32>) -> Option<(Stress, &'static str)> {
        mbe::materials::concrete_strength(year)
    }
}

/// Vehicles of one's own come with the gauge of the legal ones.
fn own_train(own: &crate::bridge::OwnVehicle) -> Result<AxleTrain, Vec<Problem>> {
    AxleTrain::new(
        own.id.clone(),
        own.name.clone(),
        own.axles.clone(),
        own.spacings.iter().map(|s| Spacing::Fixed(*s)).collect(),
        lrfd_lanes::gauge(&mut Silent).q,
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
            cases.push(Case {
                id: id.to_owned(),
                name: name.to_owned(),
                level,
                class: Class::Design,
                weight: None,
                trains: vec![hl93::truck(), hl93::tandem()],
                lane: Some(hl93::lane()),
                relieving_counts: false,
            });
        }
        let legal = LEGAL_TRUCKS.iter().map(|row| (row.class, row.train()));
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

    fn dead<R: Recorder>(&self, rec: &mut R, bridge: &Bridge, line: usize) -> Result<DeadLoad, Problem> {
        let MemberKind::Steel(girder) = &bridge.member(line).kind;
        let section = Effective::at(rec, &girder.section, &Remains::default())?;
        rec.heading("Dead load taken off the measured layers");
        let across = Across::of(rec, bridge);
        let rules = TakeOff {
            steel: steel_weight(),
            later: self.settings.sharing,
            surface: self.settings.sharing,
            cite: "AASHTO LRFD 9th ed. 4.6.2.2.1",
        };
        Ok(take_off(rec, bridge, &across, line, section.left.area, &rules))
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
        let y_t = rec.found(
            "y_t",
            "centroid to the top of the girder",
            section.depth.q - section.y.q,
            Inch,
            0.0,
            || "depth less the height of the centroid".to_owned(),
        );
        let stiffness = Stiffness { n, i: section.left.inertia, a: section.left.area, y_t };
        let across = Across::of(rec, bridge);
        let narrow = mbe::lanes::narrow(rec, across.roadway);
        let bands = match narrow {
            Some(_) => Bands::Passing(mbe::lanes::between_passing(rec)),
            None => Bands::DesignLanes,
        };
        let lanes = narrow.unwrap_or_else(|| lrfd_lanes::design_lanes(rec, across.roadway));
        let policy = Policy { bands, ..self.settings.share() };
        let share = governing_share(rec, bridge, &across, line, action, &stiffness, &lanes, &policy)?;
        let name = match action {
            Action::Moment | Action::Stress => "g_M",
            Action::Shear | Action::Bearing => "g_V",
        };
        Ok(LaneShare { share: factors::overridden(rec, bridge, name, share.g), notes: share.notes })
    }

    fn dynamic<R: Recorder>(&self, rec: &mut R, bridge: &Bridge, case: &Case) -> Val<f64> {
        let crossing = match case.level {
            Level::Inventory | Level::Operating => Crossing::Design,
            Level::Legal => Crossing::LegalOrPermit,
        };
        let span = match bridge.spans.first() {
            Some(span) => rec.given("L", "span", &span.length, Ft),
            // The full allowance holds for the shortest span.
            None => Val::bare(Length::ZERO),
        };
        let value = mbe::factors::dynamic(rec, crossing, span, bridge.traffic.riding);
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
        posting::posting(bridge.posting.sign, ruling)
    }

    fn safe_load<R: Recorder>(
        &self,
        rec: &mut R,
        bridge: &Bridge,
        case: &Case,
        state: LimitState,
        outcome: &Outcome,
    ) {
        posting::safe_load(rec, bridge.posting.sign, case, state, outcome);
    }
}
