//! Stage one: what each vehicle does to a simple span, for a whole lane and without any factor.
//!
//! It depends on the span, the findings' places and the vehicles alone, so one answer serves every
//! girder line; [`super::Rater`] remembers the last one by what it was given.

use super::stations::stations;
use crate::basis::Case;
use crate::bridge::Bridge;
use crate::check::Action;
use crate::influence::simple_span::{self, Support};
use crate::influence::{InfluenceLine, Side};
use crate::moving::{AxlePolicy, Direction, Peaks, Workspace, absolute_maximum, envelope, lane_extremes};
use crate::problem::Problem;
use crate::quantity::Length;

/// The largest effect of a case at a place, in base units, with where the vehicle stands.
#[derive(Clone, Copy, Debug, Default, PartialEq)]
pub struct Peak {
    /// Of the truck alone; never negative.
    pub truck: f64,
    /// Of the lane load alone; never negative.
    pub lane: f64,
    /// Which of the case's trucks.
    pub train: usize,
    /// First axle from the near bearing, and whether the vehicle faces back.
    pub position: Option<(Length, bool)>,
}

/// Effects of one case at every station.
#[derive(Clone, Debug, Default, PartialEq)]
pub struct CaseEffects {
    /// Sagging moment.
    pub moment: Vec<Peak>,
    /// Shear in the sense of the dead load there.
    pub shear: Vec<Peak>,
    /// Shear against it.
    pub shear_against: Vec<Peak>,
    /// Reactions of the near and far support.
    pub reaction: [Peak; 2],
}

/// Effects of all cases.
#[derive(Clone, Debug, Default, PartialEq)]
pub struct Effects {
    /// The stations.
    pub stations: Vec<Length>,
    /// One entry a case.
    pub cases: Vec<CaseEffects>,
}

/// The influence line of an action at a station of a simple span. For shear the side towards the
/// span is taken at a support.
///
/// # Errors
/// When the station lies outside the span.
pub fn line_of(action: Action, span: Length, x: Length) -> Result<InfluenceLine, Problem> {
    match action {
        Action::Moment | Action::Stress => simple_span::moment(span, x),
        Action::Shear => simple_span::shear(span, x, if x < span / 2.0 { Side::Right } else { Side::Left }),
        Action::Bearing => {
            simple_span::reaction(span, if x < span / 2.0 { Support::Start } else { Support::End })
        }
    }
}

/// How the relieving axles of a case are treated.
#[must_use]
pub const fn policy(case: &Case) -> AxlePolicy {
    if case.relieving_counts { AxlePolicy::AllCount } else { AxlePolicy::NeglectRelieving }
}

/// Works all effects of all cases.
///
/// # Errors
/// When the span cannot be worked with.
pub fn effects(
    workspace: &mut Workspace,
    bridge: &Bridge,
    span: Length,
    cases: &[Case],
) -> Result<Effects, Problem> {
    let mut peaks = Vec::new();
    for case in cases {
        for train in &case.trains {
            // A factor on the truck moves the place a little; the allowance itself is not known here.
            let place = absolute_maximum(span, train, 1.0, case.lane.as_ref().map(|l| l.w))?.station;
            peaks.extend([place, span - place]);
        }
    }
    let stations = stations(bridge, span, &peaks);
    let lines = |action| -> Result<Vec<InfluenceLine>, Problem> {
        stations.iter().map(|x| line_of(action, span, *x)).collect()
    };
    let (moment, shear) = (lines(Action::Moment)?, lines(Action::Shear)?);
    let reaction = [simple_span::reaction(span, Support::Start)?, simple_span::reaction(span, Support::End)?];
    let mut out = Vec::new();
    let mut all = Vec::new();
    for case in cases {
        let moments = one(workspace, &mut out, case, &moment)?;
        let shears = one(workspace, &mut out, case, &shear)?;
        let reactions = one(workspace, &mut out, case, &reaction)?;
        let upward = |i: usize| stations[i] <= span / 2.0;
        all.push(CaseEffects {
            moment: moments.iter().map(|p| p[0]).collect(),
            shear: shears.iter().enumerate().map(|(i, p)| p[usize::from(!upward(i))]).collect(),
            shear_against: shears.iter().enumerate().map(|(i, p)| p[usize::from(upward(i))]).collect(),
            reaction: [reactions[0][0], reactions[1][0]],
        });
    }
    Ok(Effects { stations, cases: all })
}

/// The largest and the least effect of a case on each line, both as sizes.
fn one(
    workspace: &mut Workspace,
    out: &mut Vec<Peaks>,
    case: &Case,
    lines: &[InfluenceLine],
) -> Result<Vec<[Peak; 2]>, Problem> {
    let mut best = vec![[Peak::default(); 2]; lines.len()];
    for (i, train) in case.trains.iter().enumerate() {
        envelope(workspace, lines, train, policy(case), out)?;
        for (slot, peaks) in best.iter_mut().zip(out.iter()) {
            for (side, peak) in slot.iter_mut().zip([peaks.max, peaks.min]) {
                if peak.value.abs() > side.truck {
                    side.truck = peak.value.abs();
                    side.train = i;
                    side.position = peak.at.map(|(d, place)| (place, d == Direction::Backward));
                }
            }
        }
    }
    if let Some(lane) = &case.lane {
        for (slot, line) in best.iter_mut().zip(lines) {
            let extremes = lane_extremes(line, lane.w)?;
            slot[0].lane = extremes.max.abs();
            slot[1].lane = extremes.min.abs();
        }
    }
    Ok(best)
}
