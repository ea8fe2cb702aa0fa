//! The search over both directions, for one line or for many.

use super::events::{Heads, sweep};
use super::layout::Layout;
use super::position::{Position, effect_at, placed_axles, touch};
use super::spread::Spread;
use super::{AxlePolicy, Direction, Extremes, Governing, Peak, Peaks, Sense};
use crate::influence::InfluenceLine;
use crate::load::AxleTrain;
use crate::numerics::{Cubic, Piecewise};
use crate::problem::{Problem, finite};
use crate::quantity::{Length, Quantity};

/// Values below this part of the weight of the train times the scale of the line are 0.
const NOTHING: f64 = 1e-11;
/// What may be left after the last axle has gone, and by how much a value may differ when it is summed
/// anew at the position found, as parts of the same.
const RESIDUE: f64 = 1e-10;
/// The second direction takes over only when it is larger by more than round-off.
const SAME: f64 = 1e-13;

/// The two extremes as indices, and the sign that makes either of them a largest value.
const MAX: usize = 0;
const MIN: usize = 1;
const SIGN: [f64; 2] = [1.0, -1.0];

const DIRECTIONS: [Direction; 2] = [Direction::Forward, Direction::Backward];

/// Memory of the search, used again from line to line and from bridge to bridge; what was in it before
/// changes no result.
#[derive(Clone, Debug, Default)]
pub struct Workspace {
    layouts: [Layout; 2],
    closed: [Layout; 2],
    heads: Heads,
    spread: Spread,
    part: Piecewise,
}

/// What the search knows of one line and one train.
struct Case {
    touch: f64,
    scale: f64,
    /// Length over which what is left may not matter.
    reach: f64,
}

/// The spacings chosen at the largest and at the least value, for those who ask.
struct Keep<'a> {
    train: &'a AxleTrain,
    spacings: [Vec<Length>; 2],
}

/// The exact extremes of a train on each of `lines`, into `out` in the same order.
///
/// Allocates nothing once `workspace` and `out` have grown to the largest case.
///
/// # Errors
/// As [`super::extremes`]; `out` then holds the lines before the one that failed.
pub fn envelope(
    workspace: &mut Workspace,
    lines: &[InfluenceLine],
    train: &AxleTrain,
    policy: AxlePolicy,
    out: &mut Vec<Peaks>,
) -> Result<(), Problem> {
    out.clear();
    workspace.take(train);
    for line in lines {
        out.push(workspace.peaks(line, train, policy, &mut None)?);
    }
    Ok(())
}

pub(super) fn extremes(
    line: &InfluenceLine,
    train: &AxleTrain,
    policy: AxlePolicy,
) -> Result<Extremes, Problem> {
    let mut workspace = Workspace::default();
    workspace.take(train);
    let mut keep = Some(Keep { train, spacings: [Vec::new(), Vec::new()] });
    let peaks = workspace.peaks(line, train, policy, &mut keep)?;
    let [at_max, at_min] = keep.map_or_else(Default::default, |keep| keep.spacings);
    Ok(Extremes {
        max: governing(line, train, policy, peaks.max, at_max, Sense::Max)?,
        min: governing(line, train, policy, peaks.min, at_min, Sense::Min)?,
    })
}

/// A peak with its axles; the value is summed anew there and must be the same.
fn governing(
    line: &InfluenceLine,
    train: &AxleTrain,
    policy: AxlePolicy,
    peak: Peak,
    spacings: Vec<Length>,
    sense: Sense,
) -> Result<Governing, Problem> {
    let Some((direction, first_axle)) = peak.at else {
        return Ok(Governing { value: 0.0, position: None, axles_on: Vec::new() });
    };
    let position = Position { first_axle, direction, spacings };
    let both = effect_at(line, train, &position, policy)?;
    let again = match sense {
        Sense::Max => both.most,
        Sense::Min => both.least,
    };
    if (again - peak.value).abs() > RESIDUE * line.ordinates().scale() * train.weight().base() {
        return Err(failed());
    }
    let axles_on = placed_axles(line, train, &position, policy, sense)?;
    Ok(Governing { value: peak.value, position: Some(position), axles_on })
}

fn failed() -> Problem {
    Problem::error(
        "vehicle",
        "the worst position of the vehicle failed its own check",
        "check the axle loads and spacings for sizes that cannot be right",
    )
}

impl Workspace {
    fn take(&mut self, train: &AxleTrain) {
        for (reversed, (layout, closed)) in self.layouts.iter_mut().zip(&mut self.closed).enumerate() {
            layout.set(train, reversed == 1, false);
            closed.set(train, reversed == 1, true);
        }
    }

    /// Both extremes on one line; the spacings chosen for them go to `keep` if asked for.
    fn peaks(
        &mut self,
        line: &InfluenceLine,
        train: &AxleTrain,
        policy: AxlePolicy,
        keep: &mut Option<Keep>,
    ) -> Result<Peaks, Problem> {
        let f = line.ordinates();
        let scale = finite(f.scale() * train.weight().base(), "vehicle", "the effect of the vehicle")?;
        let mut peaks = Peaks { max: Peak::EMPTY, min: Peak::EMPTY };
        let (from, to) = line.extent();
        let case = Case { touch: touch(line, train), scale, reach: (to - from).base() };
        // Where the line has no ordinate of a sign, that extreme is the empty bridge.
        let worth = |ordinate: f64| ordinate > NOTHING * f.scale();
        let wanted = [worth(f.largest()), worth(-f.least())];
        if scale == 0.0 {
            return Ok(peaks);
        }
        if policy == AxlePolicy::AllCount && self.layouts[0].groups.len() == 1 {
            self.fixed(f, &case, wanted, &mut peaks, keep)?;
            return Ok(peaks);
        }
        for sense in [MAX, MIN] {
            if !wanted[sense] {
                continue;
            }
            // The part of the line that has the sign sought: all of it where it has no other.
            if !wanted[1 - sense] {
                self.seek(f, f, &case, sense, &mut peaks, keep)?;
                continue;
            }
            let mut part = core::mem::take(&mut self.part);
            f.part_into(SIGN[sense], &mut part);
            let line = match policy {
                AxlePolicy::AllCount => f,
                AxlePolicy::NeglectRelieving => &part,
            };
            let done = self.seek(line, &part, &case, sense, &mut peaks, keep);
            self.part = part;
            done?;
        }
        Ok(peaks)
    }

    /// One extreme, `part` being the part of the line that has its sign.
    ///
    /// Where the line is a single hump, no spacing beyond its least can help: closing a gap on the hump's
    /// top moves no axle away from it. Elsewhere the part, if it is a single hump, gives a bound that
    /// closed-up trains often reach. What is left takes the search over all spacings.
    fn seek(
        &mut self,
        f: &Piecewise,
        part: &Piecewise,
        case: &Case,
        sense: usize,
        peaks: &mut Peaks,
        keep: &mut Option<Keep>,
    ) -> Result<(), Problem> {
        let only = [sense == MAX, sense == MIN];
        let sign = SIGN[sense];
        self.fixed(f, case, only, peaks, keep)?;
        if self.layouts[0].groups.len() == 1 || f.is_single_hump(sign) {
            return Ok(());
        }
        if part.is_single_hump(sign) {
            let mut bound = Peaks { max: Peak::EMPTY, min: Peak::EMPTY };
            self.fixed(part, case, only, &mut bound, &mut None)?;
            if !case.takes_over(peaks, sense, bound.get(sense).value)? {
                return Ok(());
            }
        }
        for (layout, direction) in self.layouts.iter().zip(DIRECTIONS) {
            let value = sign * self.spread.largest(f, sign, layout, case.touch, &mut self.heads);
            if case.takes_over(peaks, sense, value)? {
                let leads = &self.spread.leads;
                peaks.set(sense, value, direction, first_axle(layout, leads, direction));
                if let Some(keep) = keep {
                    keep.spacings[sense] = chosen(keep.train, layout, leads, direction);
                }
            }
        }
        Ok(())
    }

    /// The extremes with every spacing at its least, in both directions.
    fn fixed(
        &mut self,
        f: &Piecewise,
        case: &Case,
        wanted: [bool; 2],
        peaks: &mut Peaks,
        keep: &mut Option<Keep>,
    ) -> Result<(), Problem> {
        for (layout, direction) in self.closed.iter().zip(DIRECTIONS) {
            let swept = sweep(f, &layout.loads, &layout.offsets, case.touch, &mut self.heads);
            case.check(&swept.rest)?;
            for (sense, (value, lead)) in [swept.most, swept.least].into_iter().enumerate() {
                if wanted[sense] && case.takes_over(peaks, sense, value)? {
                    peaks.set(sense, value, direction, first_axle(layout, &[lead], direction));
                    if let Some(keep) = keep {
                        keep.spacings[sense] = keep.train.spacings().iter().map(|s| s.least()).collect();
                    }
                }
            }
        }
        Ok(())
    }
}

impl Case {
    /// Nothing may be left after the last axle has gone.
    fn check(&self, rest: &Cubic) -> Result<(), Problem> {
        let left = rest.0.iter().rev().fold(0.0, |sum, c| sum * self.reach + c.abs());
        if left <= RESIDUE * self.scale { Ok(()) } else { Err(failed()) }
    }

    /// Whether a value is worth more than what was found before.
    fn takes_over(&self, peaks: &Peaks, sense: usize, value: f64) -> Result<bool, Problem> {
        finite(value, "vehicle", "the effect of the vehicle")?;
        let (before, size) = (SIGN[sense] * peaks.get(sense).value, SIGN[sense] * value);
        Ok(size > NOTHING * self.scale && size > before + SAME * self.scale)
    }
}

impl Peaks {
    fn set(&mut self, sense: usize, value: f64, direction: Direction, first_axle: f64) {
        let peak = Peak { value, at: Some((direction, Length::from_base(first_axle))) };
        if sense == MAX { self.max = peak } else { self.min = peak }
    }

    fn get(&self, sense: usize) -> &Peak {
        if sense == MAX { &self.max } else { &self.min }
    }
}

/// Place of the first axle of the train's list.
fn first_axle(layout: &Layout, leads: &[f64], direction: Direction) -> f64 {
    match direction {
        Direction::Forward => leads[0],
        Direction::Backward => leads[leads.len() - 1] - layout.offsets[layout.offsets.len() - 1],
    }
}

/// The spacings of the train, in the order of its list, with the leads of its groups at their places.
fn chosen(train: &AxleTrain, layout: &Layout, leads: &[f64], direction: Direction) -> Vec<Length> {
    let joints = layout.groups.len() - 1;
    let mut joint = 0;
    let mut all = Vec::with_capacity(train.spacings().len());
    for spacing in train.spacings() {
        let (least, most) = (spacing.least(), spacing.most());
        if least < most {
            let g = match direction {
                Direction::Forward => joint,
                Direction::Backward => joints - 1 - joint,
            };
            joint += 1;
            let last = layout.offsets[layout.groups[g].end - 1];
            all.push(Length::from_base(leads[g] - leads[g + 1] - last).max(least).min(most));
        } else {
            all.push(least);
        }
    }
    all
}
