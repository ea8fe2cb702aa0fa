//! The whole rating: all lines, stations, actions, limit states, vehicles and levels.

use super::combine::{self, Parts, not_rated};
use super::effects::{CaseEffects, Effects, Peak, effects};
use super::govern;
use super::line::{Prepared, prepare};
use super::result::{Capacity, Check, Key, LineSummary, LiveLoad, Rating};
use crate::basis::{Amount, At, Basis, Case, FaceModuli, LaneShare, LoadFactors, Resistance};
use crate::bridge::{Bridge, Composite};
use crate::check::{Action, LimitState};
use crate::moving::Workspace;
use crate::problem::Problem;
use crate::quantity::{Force, Length, Moment, Quantity};
use crate::worksheet::{Silent, Val};

/// Rates bridges, and remembers the last effects: they depend on the span, the stations and the
/// vehicles, which most edits leave alone.
#[derive(Debug, Default)]
pub struct Rater {
    workspace: Workspace,
    last: Option<(Given, Effects)>,
}

/// What effects depend on.
#[derive(Clone, Debug, PartialEq)]
struct Given {
    span: Length,
    ranges: Vec<(Length, Length)>,
    cases: Vec<Case>,
}

/// Actions that are asked for at every station.
const EVERYWHERE: [Action; 3] = [Action::Moment, Action::Stress, Action::Shear];

impl Rater {
    /// Rates a bridge under a rule set.
    ///
    /// # Errors
    /// When the bridge has no span or girder to rate, or numbers so far out of range that the effects
    /// are not finite. What has no number for another reason is in the rating, with the reason.
    pub fn rate<B: Basis>(&mut self, bridge: &Bridge, basis: &B) -> Result<Rating, Vec<Problem>> {
        let span = only_span(bridge).map_err(|p| vec![p])?;
        let given = Given {
            span,
            ranges: bridge.findings.iter().map(|f| (f.from.value, f.to.value)).collect(),
            cases: basis.cases(bridge),
        };
        if self.last.as_ref().is_none_or(|(before, _)| *before != given) {
            let fresh = effects(&mut self.workspace, bridge, span, &given.cases).map_err(|p| vec![p])?;
            self.last = Some((given, fresh));
        }
        let Some((given, effects)) = &self.last else { return Err(Vec::new()) };
        let mut work =
            Work { bridge, basis, span, cases: &given.cases, effects, checks: Vec::new(), notes: Vec::new() };
        let lines = (0..bridge.lines.len())
            .map(|line| work.line(line))
            .collect::<Result<_, _>>()
            .map_err(|p| vec![p])?;
        let mut rating = Rating {
            basis: basis.about().id,
            basis_name: basis.about().name,
            loads: given.cases.iter().map(live_load).collect(),
            lines,
            checks: work.checks,
            governing: None,
            next: Vec::new(),
            by_vehicle: Vec::new(),
            posting: govern::unknown_posting(),
            not_rated: Vec::new(),
            notes: [basis.notes(bridge), work.notes].concat(),
        };
        govern::govern(&mut rating, bridge, basis, &given.cases);
        Ok(rating)
    }
}

/// The span of a simple-span bridge.
///
/// # Errors
/// When there is none, more than one, or no girder.
pub fn only_span(bridge: &Bridge) -> Result<Length, Problem> {
    if bridge.lines.is_empty() {
        return Err(Problem::missing("girders", "there is no girder yet", "add the girder lines"));
    }
    match bridge.spans.as_slice() {
        [span] => Ok(span.length.value),
        [] => Err(Problem::missing("spans", "there is no span yet", "enter the span")),
        _ => Err(Problem::error(
            "spans",
            "only simple spans are rated so far",
            "rate each simple span by itself",
        )),
    }
}

fn share_of(share: &Result<LaneShare, Problem>) -> Result<f64, Problem> {
    share.as_ref().map(|s| s.share.q).map_err(Clone::clone)
}

fn live_load(case: &Case) -> LiveLoad {
    LiveLoad {
        id: case.id.clone(),
        name: case.name.clone(),
        level: case.level,
        weight: case.weight,
        class: case.class,
    }
}

struct Work<'a, B> {
    bridge: &'a Bridge,
    basis: &'a B,
    span: Length,
    cases: &'a [Case],
    effects: &'a Effects,
    checks: Vec<Check>,
    /// What the shares say of themselves, each once.
    notes: Vec<Problem>,
}

/// Capacities by what they are asked for.
type Capacities = Vec<(Action, LimitState, Result<Resistance, Problem>)>;

/// What a place carries, worked once for all vehicles.
struct Place {
    x: Length,
    index: usize,
    capacities: Capacities,
    moduli: Result<[Option<FaceModuli>; 2], Problem>,
}

impl<B: Basis> Work<'_, B> {
    fn line(&mut self, line: usize) -> Result<LineSummary, Problem> {
        let prepared = prepare(&mut Silent, self.bridge, self.basis, line)?;
        let first = self.checks.len();
        let places = self.places(line, &prepared);
        for (load, case) in self.cases.iter().enumerate() {
            let dynamic = self.basis.dynamic(&mut Silent, self.bridge, case);
            for state in [LimitState::StrengthI, LimitState::ServiceII] {
                let factors = self.basis.load_factors(&mut Silent, self.bridge, state, case, &prepared.dead);
                for place in &places {
                    self.place(line, load, state, place, &prepared, dynamic, factors);
                }
            }
        }
        for share in [&prepared.share_moment, &prepared.share_shear].into_iter().flatten() {
            for note in &share.notes {
                if !self.notes.contains(note) {
                    self.notes.push(note.clone());
                }
            }
        }
        let governing =
            govern::worst_legal(&self.checks[first..], self.cases, self.basis.service_posts(self.bridge));
        Ok(LineSummary {
            name: self.bridge.lines[line].name.clone(),
            dc1: prepared.dead.dc1.q,
            dc2: prepared.dead.dc2.q,
            dw: prepared.dead.dw.q,
            share_moment: share_of(&prepared.share_moment),
            share_shear: share_of(&prepared.share_shear),
            capacities: places.iter().flat_map(|p| capacities(line, p)).collect(),
            governing: governing.map(|i| first + i),
        })
    }

    /// Capacities at every station. The same plates have the same capacity, so each set of plates is
    /// worked once; where the slab works along, first yield hangs on the dead load at the place too.
    fn places(&self, line: usize, prepared: &Prepared) -> Vec<Place> {
        let mut known: Vec<(At<'_>, Capacities, _)> = Vec::new();
        let mut places = Vec::new();
        let last = self.effects.stations.len() - 1;
        for (index, x) in self.effects.stations.iter().enumerate() {
            let at = At::new(self.bridge, line, *x);
            let by_plates = at.steel().composite != Composite::Proved;
            let found = known.iter().position(|(seen, ..)| by_plates && seen.same_plates(&at));
            let found = found.unwrap_or_else(|| {
                let worked = self.worked(&at, prepared, &EVERYWHERE);
                known.push((at, worked, self.basis.moduli(&mut Silent, &at)));
                known.len() - 1
            });
            let (_, capacities, moduli) = &known[found];
            let mut capacities = capacities.clone();
            if index == 0 || index == last {
                capacities.extend(self.worked(&at, prepared, &[Action::Bearing]));
            }
            places.push(Place { x: *x, index, capacities, moduli: moduli.clone() });
        }
        places
    }

    fn worked(&self, at: &At<'_>, prepared: &Prepared, actions: &[Action]) -> Capacities {
        let mut all = Vec::new();
        for action in actions {
            for state in self.basis.states(*action) {
                all.push((
                    *action,
                    *state,
                    self.basis.capacity(&mut Silent, at, &prepared.dead, *action, *state),
                ));
            }
        }
        all
    }

    #[allow(clippy::too_many_arguments)]
    fn place(
        &mut self,
        line: usize,
        load: usize,
        state: LimitState,
        place: &Place,
        prepared: &Prepared,
        dynamic: Val<f64>,
        factors: LoadFactors,
    ) {
        for (action, _, resistance) in place.capacities.iter().filter(|c| c.1 == state) {
            let key = Key { line, x: place.x, action: *action, state, load };
            let (share, resistance) = match (prepared.share(*action), resistance) {
                (Ok(share), Ok(resistance)) => (share.share, resistance),
                (Err(problem), _) | (_, Err(problem)) => {
                    self.checks.push(not_rated(key, problem.clone()));
                    continue;
                }
            };
            let moduli = match (&place.moduli, action) {
                (Err(problem), Action::Stress) => {
                    self.checks.push(not_rated(key, problem.clone()));
                    continue;
                }
                (moduli, _) => moduli.as_ref().ok(),
            };
            let peaks = peaks(&self.effects.cases[load], *action, place, self.effects.stations.len());
            let worst = peaks
                .into_iter()
                .flatten()
                .map(|(peak, against_dead)| {
                    let parts = Parts {
                        dead: &prepared.dead,
                        span: Val::bare(self.span),
                        x: Val::bare(place.x),
                        share,
                        dynamic,
                        factors,
                        peak,
                        against_dead,
                        lane_effect: amounts(*action, peak),
                        resistance,
                        moduli,
                    };
                    combine::check(&mut Silent, self.basis, key, &parts)
                })
                .min_by(|a, b| govern::order(&a.outcome).total_cmp(&govern::order(&b.outcome)));
            self.checks.extend(worst);
        }
    }
}

/// The peaks that an action at a place has to answer: two for shear, which changes its sense.
fn peaks<'a>(
    case: &'a CaseEffects,
    action: Action,
    place: &Place,
    stations: usize,
) -> [Option<(&'a Peak, bool)>; 2] {
    match action {
        Action::Moment | Action::Stress => [Some((&case.moment[place.index], false)), None],
        Action::Shear => {
            [Some((&case.shear[place.index], false)), Some((&case.shear_against[place.index], true))]
        }
        Action::Bearing => {
            let end = usize::from(place.index + 1 == stations);
            [Some((&case.reaction[end], false)), None]
        }
    }
}

/// The truck and lane parts of a peak as quantities.
#[must_use]
pub fn amounts(action: Action, peak: &Peak) -> [Amount; 2] {
    [peak.truck, peak.lane].map(|base| match action {
        Action::Moment | Action::Stress => Amount::Moment(Val::bare(Moment::from_base(base))),
        Action::Shear | Action::Bearing => Amount::Force(Val::bare(Force::from_base(base))),
    })
}

fn capacities(line: usize, place: &Place) -> Vec<Capacity> {
    place
        .capacities
        .iter()
        .map(|(action, state, resistance)| Capacity {
            line,
            x: place.x,
            action: *action,
            state: *state,
            value: resistance.as_ref().map(|r| r.factored.base()).map_err(Clone::clone),
        })
        .collect()
}
