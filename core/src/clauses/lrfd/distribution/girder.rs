//! The governing share of one girder line.

use super::policy::{Bands, Loading, Method, Policy, RigidRule, Share, Stiffness};
use super::range::{self, Entries, Table};
use super::{exterior, interior, lever, rigid, skew};
use crate::bridge::{Bridge, MemberKind};
use crate::check::Action;
use crate::clause;
use crate::clauses::lrfd::lanes;
use crate::load::Across;
use crate::problem::Problem;
use crate::quantity::{Angle, Length};
use crate::share::{self, Lanes, Pattern, Placement, Roadway};
use crate::units::mark::{Deg, Ft, Inch, One};
use crate::worksheet::{Recorder, Val};

/// One way to load the bridge.
#[derive(Clone, Debug)]
struct Case {
    g: Val<f64>,
    lanes: usize,
    method: Method,
    placement: Option<Placement>,
}

/// The governing share of a girder line for an action. Stress goes with moment, bearing with shear.
///
/// `lanes` come from the clause of the rule set that counts them.
///
/// # Errors
/// When an entry lies outside the range of use; the problem names it and the range.
#[allow(clippy::too_many_arguments)]
pub fn governing_share<R: Recorder>(
    rec: &mut R,
    bridge: &Bridge,
    across: &Across,
    line: usize,
    action: Action,
    stiffness: &Stiffness,
    lanes: &Lanes,
    policy: &Policy,
) -> Result<Share, Problem> {
    let Some(span) = bridge.spans.first() else {
        return Err(Problem::missing("spans", "no span is entered yet", "enter the span"));
    };
    if across.girders.len() < 2 || line >= across.girders.len() {
        return Err(Problem::missing(
            "girders",
            "a share needs two girders or more",
            "enter the girder lines",
        ));
    }
    let member_path = format!("members.{}", bridge.member(line).id);
    let n_b = rec.found("N_b", "number of girder lines", across.girders.len() as f64, One, 0.0, || {
        "counted".to_owned()
    });
    let (s, s_path) = spacing(rec, bridge, across, line);
    let l = rec.given("L", "span", &span.length, Ft);
    let t_s = rec.given("t_s", "thickness of the structural slab", &bridge.deck.slab, Inch);
    let t_h = rec.given("t_h", "thickness of the haunch", &bridge.deck.haunch, Inch);
    let e_g = interior::e_g(rec, stiffness.y_t, t_h, t_s);
    let k_g = interior::k_g(rec, stiffness.n, stiffness.i, stiffness.a, e_g);
    let at = Entries {
        s,
        s_path: &s_path,
        l,
        l_path: &span.length.path,
        t_s,
        t_s_path: &bridge.deck.slab.path,
        k_g,
        k_g_path: &member_path,
    };
    let on = Girder { bridge, across, line, moment: is_moment(action), lanes, policy, at: &at, n_b };
    let mut share = on.unskewed(rec)?;
    share.g = on.skewed(rec, share.g)?;
    Ok(share)
}

fn is_moment(action: Action) -> bool {
    match action {
        Action::Moment | Action::Stress => true,
        Action::Shear | Action::Bearing => false,
    }
}

/// Spacing that the tables ask for: of the outer bay, or the mean of both sides.
fn spacing<R: Recorder>(rec: &mut R, bridge: &Bridge, across: &Across, line: usize) -> (Val<Length>, String) {
    let path = |right: usize| {
        bridge.lines[right].spacing.as_ref().map_or_else(|| "girders".to_owned(), |s| s.path.clone())
    };
    let last = across.girders.len() - 1;
    if line == 0 {
        (across.spacings[0], path(1))
    } else if line == last {
        (across.spacings[last - 1], path(last))
    } else {
        let (left, right) = (across.spacings[line - 1], across.spacings[line]);
        (interior::mean_spacing(rec, left, right), path(line))
    }
}

/// Everything that the cases look at.
struct Girder<'a> {
    bridge: &'a Bridge,
    across: &'a Across,
    line: usize,
    moment: bool,
    lanes: &'a Lanes,
    policy: &'a Policy,
    at: &'a Entries<'a>,
    n_b: Val<f64>,
}

impl Girder<'_> {
    fn unskewed<R: Recorder>(&self, rec: &mut R) -> Result<Share, Problem> {
        let table = match self.policy.method {
            Method::Formula => range::table(rec, self.at.s, self.n_b),
            Method::LeverRule | Method::RigidSection => {
                rec.remark(|| "The rule set takes the lever rule in place of the formulas.".to_owned());
                Table::LeverRule
            }
        };
        let several = self.policy.loading == Loading::Governing && self.lanes.count >= 2;
        let outer = self.bridge.is_exterior(self.line);
        let by_lever =
            if outer || table != Table::Formula { self.lever_cases(rec, several)? } else { Vec::new() };
        let (mut one, mut more) = if outer {
            self.exterior(rec, table, &by_lever, several)?
        } else {
            self.interior(rec, table, &by_lever, several)?
        };
        if outer && self.policy.rigid == RigidRule::WithDiaphragms && self.has_diaphragms() {
            rec.heading("Rigid cross-section");
            rec.remark(|| {
                "AASHTO LRFD 9th ed. 4.6.2.2.2d: with diaphragms, an exterior girder takes no less than this."
                    .to_owned()
            });
            for case in self.rigid_cases(rec, several)? {
                if case.lanes == 1 {
                    one = larger_case(rec, one, case);
                } else {
                    more = Some(match more {
                        Some(so_far) => larger_case(rec, so_far, case),
                        None => case,
                    });
                }
            }
        }
        let (one_lane, multi) = (one.g.q, more.as_ref().map(|case| case.g.q));
        let governing = match more {
            Some(more) => larger_case(rec, one, more),
            None => one,
        };
        let notes = self.notes(governing.placement.as_ref());
        let Case { g, lanes, method, placement } = governing;
        Ok(Share { g, lanes, one_lane, multi, method, placement, notes })
    }

    fn interior<R: Recorder>(
        &self,
        rec: &mut R,
        table: Table,
        by_lever: &[Case],
        several: bool,
    ) -> Result<(Case, Option<Case>), Problem> {
        if table == Table::LeverRule || (table == Table::ThreeGirders && !self.moment) {
            return lever_alone(rec, by_lever, several);
        }
        self.in_range(rec)?;
        let one = self.interior_one(rec);
        let one = formula(self.presence_taken_out(rec, one), 1);
        let more = several.then(|| formula(self.interior_more(rec), 2));
        if table == Table::ThreeGirders {
            let (lever_one, lever_more) = lever_alone(rec, by_lever, several)?;
            let more = match (more, lever_more) {
                (Some(formula), Some(lever)) => Some(smaller_case(rec, formula, lever)),
                _ => None,
            };
            return Ok((smaller_case(rec, one, lever_one), more));
        }
        Ok((one, more))
    }

    fn exterior<R: Recorder>(
        &self,
        rec: &mut R,
        table: Table,
        by_lever: &[Case],
        several: bool,
    ) -> Result<(Case, Option<Case>), Problem> {
        let (one, lever_more) = lever_alone(rec, by_lever, several)?;
        if !several || table == Table::LeverRule || (table == Table::ThreeGirders && !self.moment) {
            return Ok((one, lever_more));
        }
        let y = self.across.girders[self.line];
        let d_e = if self.line == 0 {
            exterior::d_e_left(rec, y, self.across.curb)
        } else {
            exterior::d_e_right(rec, self.across.curb, self.across.roadway, y)
        };
        range::exterior(rec, d_e)?;
        self.in_range(rec)?;
        let inner = self.interior_more(rec);
        let e = if self.moment { exterior::moment_e(rec, d_e) } else { exterior::shear_e(rec, d_e) };
        let more = formula(exterior::from_interior(rec, e, inner), 2);
        let more = match (table, lever_more) {
            (Table::ThreeGirders, Some(lever)) => smaller_case(rec, more, lever),
            _ => more,
        };
        Ok((one, Some(more)))
    }

    fn in_range<R: Recorder>(&self, rec: &mut R) -> Result<(), Problem> {
        if self.moment { range::moment(rec, self.at) } else { range::shear(rec, self.at) }
    }

    fn interior_one<R: Recorder>(&self, rec: &mut R) -> Val<f64> {
        let at = self.at;
        if self.moment {
            interior::moment_one(rec, at.s, at.l, at.k_g, at.t_s)
        } else {
            interior::shear_one(rec, at.s)
        }
    }

    fn interior_more<R: Recorder>(&self, rec: &mut R) -> Val<f64> {
        let at = self.at;
        if self.moment {
            interior::moment_more(rec, at.s, at.l, at.k_g, at.t_s)
        } else {
            interior::shear_more(rec, at.s)
        }
    }

    /// A one-lane formula contains the 1.2; it comes out only for a controlled crossing.
    fn presence_taken_out<R: Recorder>(&self, rec: &mut R, g_1: Val<f64>) -> Val<f64> {
        if self.policy.loading == Loading::OneLaneAlone {
            let m = lanes::multiple_presence(rec, 1);
            without_presence(rec, g_1, m)
        } else {
            g_1
        }
    }

    /// Statics knows nothing of multiple presence; it is put on, but for a controlled crossing.
    fn presence_put_on<R: Recorder>(&self, rec: &mut R, r: Val<f64>, loaded: usize) -> Val<f64> {
        if self.policy.loading == Loading::OneLaneAlone {
            r
        } else {
            let m = lanes::multiple_presence(rec, loaded);
            with_presence(rec, m, r)
        }
    }

    /// The lever rule for 1, 2 ... lanes, with multiple presence.
    fn lever_cases<R: Recorder>(&self, rec: &mut R, several: bool) -> Result<Vec<Case>, Problem> {
        rec.heading("Lever rule");
        let places: Vec<Length> = self.across.girders.iter().map(|y| y.q).collect();
        let (pattern, roadway) = self.pattern(rec, several);
        let worst = share::lever::worst(&places, self.line, &roadway, &pattern)?;
        Ok(worst
            .into_iter()
            .enumerate()
            .map(|(i, found)| {
                let r = lever::write(rec, &self.across.girders, self.line, &found);
                let g = self.presence_put_on(rec, r, i + 1);
                Case { g, lanes: i + 1, method: Method::LeverRule, placement: Some(found.placement) }
            })
            .collect())
    }

    /// The rigid cross-section for 1, 2 ... lanes, with multiple presence.
    fn rigid_cases<R: Recorder>(&self, rec: &mut R, several: bool) -> Result<Vec<Case>, Problem> {
        let (pattern, roadway) = self.pattern(rec, several);
        let mut cases = Vec::with_capacity(pattern.lanes);
        for loaded in 1..=pattern.lanes {
            let placement = share::rigid::toward(self.line == 0, &roadway, &pattern, loaded)?;
            let r = rigid::share(rec, &self.across.girders, self.line, &placement)?;
            let g = self.presence_put_on(rec, r, loaded);
            cases.push(Case { g, lanes: loaded, method: Method::RigidSection, placement: Some(placement) });
        }
        Ok(cases)
    }

    fn pattern<R: Recorder>(&self, rec: &mut R, several: bool) -> (Pattern, Roadway) {
        let gauge = lanes::gauge(rec);
        let edge = lanes::edge(rec);
        let band = match self.policy.bands {
            Bands::DesignLanes => self.lanes.width,
            Bands::Passing(between) => passing_band(rec, gauge, between).q,
        };
        let lanes = if several { self.lanes.count } else { 1 };
        let pattern = Pattern { lanes, band, edge: edge.q, gauge: gauge.q };
        (pattern, Roadway { left: self.across.curb.q, width: self.across.roadway.q })
    }

    fn has_diaphragms(&self) -> bool {
        match &self.bridge.member(self.line).kind {
            MemberKind::Steel(girder) => girder.bracing.spacing.is_some(),
        }
    }

    fn notes(&self, placement: Option<&Placement>) -> Vec<Problem> {
        let mut notes = Vec::new();
        if self.bridge.lines.iter().any(|line| line.member != self.bridge.lines[0].member) {
            notes.push(Problem::warning(
                "girders",
                "the distribution formulas are for girders of about the same stiffness, and these are of \
                 different kinds",
                "consider an analysis of the grid",
            ));
        }
        if placement.is_some_and(|placement| placement.squeezed) {
            notes.push(Problem::warning(
                "deck.roadway",
                "the trucks find no room on the roadway at the distances of the rule; they were placed closer \
                 together",
                "check the clear roadway; see where the trucks stand",
            ));
        }
        notes
    }

    fn skewed<R: Recorder>(&self, rec: &mut R, g: Val<f64>) -> Result<Val<f64>, Problem> {
        let entry = &self.bridge.skew;
        let size = Angle::from_deg(entry.value.in_deg().abs());
        if self.moment {
            if !self.policy.skew_moment {
                return Ok(g);
            }
            let theta = rec.given_as("theta", "skew", entry, size, Deg);
            Ok(skew::moment(rec, g, theta, self.at, self.n_b))
        } else {
            if !self.policy.skew_shear.covers(self.line, self.across.girders.len()) {
                return Ok(g);
            }
            let theta = rec.given_as("theta", "skew", entry, size, Deg);
            skew::shear(rec, g, theta, &entry.path, self.at, self.n_b)
        }
    }
}

fn formula(g: Val<f64>, lanes: usize) -> Case {
    Case { g, lanes, method: Method::Formula, placement: None }
}

/// One lane, and the worst of several, by the lever rule.
fn lever_alone<R: Recorder>(
    rec: &mut R,
    by_lever: &[Case],
    several: bool,
) -> Result<(Case, Option<Case>), Problem> {
    let Some(one) = by_lever.first().cloned() else {
        return Err(Problem::error("deck.roadway", "no lane finds room on the roadway", "check the roadway"));
    };
    let mut more: Option<Case> = None;
    if several {
        for case in &by_lever[1..] {
            more = Some(match more {
                Some(so_far) => larger_case(rec, so_far, case.clone()),
                None => case.clone(),
            });
        }
    }
    Ok((one, more))
}

fn larger_case<R: Recorder>(rec: &mut R, a: Case, b: Case) -> Case {
    let g = larger(rec, a.g, b.g);
    Case { g, ..if b.g.q > a.g.q { b } else { a } }
}

fn smaller_case<R: Recorder>(rec: &mut R, a: Case, b: Case) -> Case {
    let g = lesser(rec, a.g, b.g);
    Case { g, ..if b.g.q < a.g.q { b } else { a } }
}

clause! {
    /// Statics with multiple presence.
    fn with_presence(m: f64 [One], r: f64 [One]) -> g: f64 [One] { m * r }
    cite "AASHTO LRFD 9th ed. 3.6.1.1.2" what "share with multiple presence"
}

clause! {
    /// One-lane formula without multiple presence.
    fn without_presence(g_1: f64 [One], m: f64 [One]) -> g: f64 [One] { g_1 / m }
    cite "AASHTO LRFD 9th ed. 3.6.1.1.2" what "share without multiple presence, one truck alone"
}

clause! {
    /// The larger of two shares.
    fn larger(g_a: f64 [One], g_b: f64 [One]) -> g: f64 [One] { max(g_a, g_b) }
    cite "AASHTO LRFD 9th ed. 4.6.2.2" what "larger share"
}

clause! {
    /// The lesser of two shares, for three girders.
    fn lesser(g_a: f64 [One], g_b: f64 [One]) -> g: f64 [One] { min(g_a, g_b) }
    cite "AASHTO LRFD 9th ed. tables 4.6.2.2.2b-1 and 4.6.2.2.2d-1 (a), N_b = 3" what "lesser share"
}

clause! {
    /// Width that a truck keeps for itself where trucks pass each other.
    fn passing_band(gauge: Length [Ft], between: Length [Ft]) -> band: Length [Ft] { gauge + between }
    cite "gauge and the distance between passing vehicles" what "width that a truck keeps for itself"
}
