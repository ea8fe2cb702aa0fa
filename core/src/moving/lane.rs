//! A uniform load on the stretches where it makes the effect worse.

use crate::influence::InfluenceLine;
use crate::numerics::Run;
use crate::problem::{Problem, finite};
use crate::quantity::{Force, Length, LineLoad, Moment, Quantity};

/// A loaded stretch.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Stretch {
    /// Where it begins, from the first support.
    pub from: Length,
    /// Where it ends.
    pub to: Length,
}

/// Both extremes of a uniform load, in base units of the line.
#[derive(Clone, Debug, PartialEq)]
pub struct LaneExtremes {
    /// The largest effect, 0 at least.
    pub max: f64,
    /// The least effect, 0 at most.
    pub min: f64,
    /// What is loaded for the largest effect.
    pub loaded_max: Vec<Stretch>,
    /// What is loaded for the least effect.
    pub loaded_min: Vec<Stretch>,
}

impl LaneExtremes {
    /// Largest and least effect of a line of moments.
    #[must_use]
    pub fn moments(&self) -> (Moment, Moment) {
        (Moment::from_base(self.max), Moment::from_base(self.min))
    }

    /// Largest and least effect of a line of shears or reactions.
    #[must_use]
    pub fn forces(&self) -> (Force, Force) {
        (Force::from_base(self.max), Force::from_base(self.min))
    }
}

/// The exact extremes of a load `w` that lies wherever the influence line has the sign sought.
///
/// # Errors
/// When the load is negative or the result not finite.
pub fn lane_extremes(line: &InfluenceLine, w: LineLoad) -> Result<LaneExtremes, Problem> {
    let per_length = w.base();
    if per_length.is_nan() || per_length < 0.0 {
        return Err(Problem::error(
            "lane",
            "the lane load cannot be negative",
            "enter a load of zero or more",
        ));
    }
    let mut runs = Vec::new();
    let mut sign = |sign: f64| -> Result<(f64, Vec<Stretch>), Problem> {
        let area = line.ordinates().integral_of_sign(sign, &mut runs);
        let stretch = |r: &Run| Stretch { from: Length::from_base(r.from), to: Length::from_base(r.to) };
        Ok((
            finite(per_length * area, "lane", "the effect of the lane load")?,
            runs.iter().map(stretch).collect(),
        ))
    };
    let (max, loaded_max) = sign(1.0)?;
    let (min, loaded_min) = sign(-1.0)?;
    Ok(LaneExtremes { max, min, loaded_max, loaded_min })
}
