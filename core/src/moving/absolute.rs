//! The largest moment of a simple span over all its sections.

use super::position::{Position, effect_at};
use super::{AxlePolicy, Direction};
use crate::influence::simple_span;
use crate::load::AxleTrain;
use crate::problem::{Problem, finite};
use crate::quantity::{Length, LineLoad, Moment, Quantity};

/// The largest moment of a simple span under an axle train, with or without a lane load.
#[derive(Clone, Debug, PartialEq)]
pub struct AbsoluteMaximum {
    /// The moment: that of the train times the factor, and that of the lane load at the same station.
    pub value: Moment,
    /// The part of the train, factor included.
    pub train: Moment,
    /// The part of the lane load.
    pub lane: Moment,
    /// The section, from the first support. It lies under an axle.
    pub station: Length,
    /// Number of that axle in the train, from 0 at the front.
    pub axle: usize,
    /// Where the train stands. Turned about midspan it does the same at the mirrored section.
    pub position: Position,
}

/// A part of this size by which another candidate must be larger to take over.
const SAME: f64 = 1e-13;

/// The exact maximum over all sections and all positions of `factor` times the moment of `train` plus
/// that of a load `lane` over the whole span.
///
/// The moment line of a simple span falls to both sides of its section, so that the worst position for
/// a section puts an axle over it, and every variable spacing is at its least. Under an axle, with the
/// same axles on the span, the moment is one parabola of the section, with its top where midspan halves
/// the distance between the axle and the resultant (moved towards midspan by a lane load). Each axle and
/// each set of axles that can be on the span is tried; the parabola holds only while that set is on.
///
/// # Errors
/// When the span is not above zero, the factor or the lane load is negative, or the result is not
/// finite or not met by the influence line at the station found.
pub fn absolute_maximum(
    span: Length,
    train: &AxleTrain,
    factor: f64,
    lane: Option<LineLoad>,
) -> Result<AbsoluteMaximum, Problem> {
    simple_span::moment(span, Length::ZERO)?;
    let w = lane.unwrap_or(LineLoad::ZERO).base();
    if !(factor >= 0.0 && w >= 0.0) {
        return Err(Problem::error(
            "vehicle",
            "neither the factor on the vehicle nor the lane load can be negative",
            "enter zero or more",
        ));
    }
    let best = search(span.base(), train, factor, w);
    finite(best.value, "span", "the largest moment")?;
    let position = Position::closed_up(train, Length::from_base(best.first_axle), Direction::Forward);
    let station = Length::from_base(best.station);
    let line = simple_span::moment(span, station)?;
    let of_train = factor * effect_at(&line, train, &position, AxlePolicy::AllCount)?.most;
    let of_lane = w * line.ordinates().integral();
    let value = finite(of_train + of_lane, "span", "the largest moment")?;
    if (value - best.value).abs() > 1e-10 * value.abs() {
        return Err(Problem::error(
            "vehicle",
            "the largest moment failed its own check",
            "check the span, the axle loads and the spacings for sizes that cannot be right",
        ));
    }
    Ok(AbsoluteMaximum {
        value: Moment::from_base(value),
        train: Moment::from_base(of_train),
        lane: Moment::from_base(of_lane),
        station,
        axle: best.axle,
        position,
    })
}

struct Candidate {
    value: f64,
    station: f64,
    axle: usize,
    first_axle: f64,
}

fn search(span: f64, train: &AxleTrain, factor: f64, w: f64) -> Candidate {
    let loads: Vec<f64> = train.axles().iter().map(|a| a.base()).collect();
    let mut offsets = vec![0.0];
    for spacing in train.spacings() {
        offsets.push(offsets[offsets.len() - 1] + spacing.least().base());
    }
    let mut best = Candidate { value: 0.0, station: 0.5 * span, axle: 0, first_axle: 0.5 * span };
    let mut ends = Vec::new();
    for (axle, &own) in offsets.iter().enumerate() {
        // Stations at which another axle comes onto the span or leaves it.
        ends.clear();
        ends.extend([0.0, span]);
        for other in &offsets {
            ends.extend([other - own, span + other - own].into_iter().filter(|&x| x > 0.0 && x < span));
        }
        ends.sort_unstable_by(f64::total_cmp);
        for stretch in ends.windows(2) {
            let middle = 0.5 * (stretch[0] + stretch[1]);
            // Weight on the span, and its moment about the axle from loads ahead and behind.
            let (mut weight, mut ahead, mut behind) = (0.0, 0.0, 0.0);
            for (load, other) in loads.iter().zip(&offsets) {
                let distance = own - other;
                if middle + distance >= 0.0 && middle + distance <= span {
                    weight += load;
                    ahead += load * distance.max(0.0);
                    behind += load * distance.min(0.0);
                }
            }
            let bend = factor * weight / span + 0.5 * w;
            if bend == 0.0 {
                continue;
            }
            let top = 0.5 * span - factor * (ahead + behind) / (2.0 * bend * span);
            let x = top.clamp(stretch[0], stretch[1]);
            let value = bend * x * (span - x) + factor / span * (behind * (span - x) - ahead * x);
            if value > best.value * (1.0 + SAME) {
                best = Candidate { value, station: x, axle, first_axle: x + own };
            }
        }
    }
    best
}
