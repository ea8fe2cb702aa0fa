//! Vehicles as trains of axle loads at fixed or variable distances.

use crate::problem::Problem;
use crate::quantity::{Force, Length};

/// The most axles that a train may have.
pub const MAX_AXLES: usize = 200;

/// Distance from one axle to the next one behind it.
#[derive(Clone, Copy, Debug, PartialEq)]
pub enum Spacing {
    /// Always the same.
    Fixed(Length),
    /// Whatever within these bounds is worst.
    Range {
        /// The least distance.
        from: Length,
        /// The largest distance.
        to: Length,
    },
}

impl Spacing {
    /// The least distance.
    #[must_use]
    pub fn least(self) -> Length {
        match self {
            Self::Fixed(s) | Self::Range { from: s, .. } => s,
        }
    }

    /// The largest distance.
    #[must_use]
    pub fn most(self) -> Length {
        match self {
            Self::Fixed(s) | Self::Range { to: s, .. } => s,
        }
    }
}

/// A vehicle, or a convoy of vehicles, as axle loads in order from the front axle to the rear one.
/// Loads are of whole axles, static, without any factor.
#[derive(Clone, Debug, PartialEq)]
pub struct AxleTrain {
    id: String,
    name: String,
    axles: Vec<Force>,
    spacings: Vec<Spacing>,
    gauge: Length,
    source: String,
}

impl AxleTrain {
    /// A train of `axles` from the front, with the `spacings` between them.
    ///
    /// `gauge` is the distance between the centres of the two wheels (or wheel groups) of an axle;
    /// `source` says where the loads and distances come from.
    ///
    /// # Errors
    /// All problems found, by the paths `axles`, `axles[i]`, `spacings`, `spacings[i]` and `gauge`: no
    /// axle or more than [`MAX_AXLES`]; a load that is negative or no number; no weight at all; not one
    /// spacing fewer than axles; a spacing that is not above zero; a range whose end lies before its
    /// start; a gauge not above zero.
    pub fn new(
        id: impl Into<String>,
        name: impl Into<String>,
        axles: Vec<Force>,
        spacings: Vec<Spacing>,
        gauge: Length,
        source: impl Into<String>,
    ) -> Result<Self, Vec<Problem>> {
        let problems = problems_of(&axles, &spacings, gauge);
        if problems.is_empty() {
            Ok(Self { id: id.into(), name: name.into(), axles, spacings, gauge, source: source.into() })
        } else {
            Err(problems)
        }
    }

    /// Its id in the document or in the data of a rule set.
    #[must_use]
    pub fn id(&self) -> &str {
        &self.id
    }

    /// What it is called.
    #[must_use]
    pub fn name(&self) -> &str {
        &self.name
    }

    /// Where its loads and distances come from.
    #[must_use]
    pub fn source(&self) -> &str {
        &self.source
    }

    /// Axle loads from the front axle on.
    #[must_use]
    pub fn axles(&self) -> &[Force] {
        &self.axles
    }

    /// Distances from each axle to the next one behind it.
    #[must_use]
    pub fn spacings(&self) -> &[Spacing] {
        &self.spacings
    }

    /// Distance between the centres of the two wheels of an axle.
    #[must_use]
    pub fn gauge(&self) -> Length {
        self.gauge
    }

    /// Weight of the whole train.
    #[must_use]
    pub fn weight(&self) -> Force {
        self.axles.iter().copied().sum()
    }

    /// Length from the front axle to the rear one with every spacing at its least.
    #[must_use]
    pub fn least_length(&self) -> Length {
        self.spacings.iter().map(|s| s.least()).sum()
    }

    /// Length from the front axle to the rear one with every spacing at its largest.
    #[must_use]
    pub fn most_length(&self) -> Length {
        self.spacings.iter().map(|s| s.most()).sum()
    }

    /// The same train with its rear axle in front.
    #[must_use]
    pub fn reversed(&self) -> Self {
        let mut turned = self.clone();
        turned.axles.reverse();
        turned.spacings.reverse();
        turned
    }
}

/// Everything that is wrong with the parts of a train.
fn problems_of(axles: &[Force], spacings: &[Spacing], gauge: Length) -> Vec<Problem> {
    let mut found = Vec::new();
    if axles.is_empty() {
        found.push(Problem::missing("axles", "the vehicle has no axles", "enter at least one axle load"));
        return found;
    }
    if axles.len() > MAX_AXLES {
        found.push(Problem::error(
            "axles",
            format!("{} axles are more than can be treated at once", axles.len()),
            format!("enter {MAX_AXLES} axles at most"),
        ));
        return found;
    }
    for (i, axle) in axles.iter().enumerate() {
        if !axle.in_n().is_finite() || axle.in_n() < 0.0 {
            found.push(Problem::error(
                format!("axles[{i}]"),
                "an axle load cannot be negative",
                "enter the load of the axle as a positive number",
            ));
        }
    }
    if found.is_empty() && axles.iter().all(|axle| axle.in_n() == 0.0) {
        found.push(Problem::error("axles", "the vehicle weighs nothing", "enter the loads of its axles"));
    }
    if spacings.len() + 1 != axles.len() {
        found.push(Problem::error(
            "spacings",
            format!("{} axles need {} spacings, not {}", axles.len(), axles.len() - 1, spacings.len()),
            "enter one spacing between each two axles",
        ));
    }
    for (i, spacing) in spacings.iter().enumerate() {
        let (least, most) = (spacing.least(), spacing.most());
        if !(least > Length::ZERO && most.in_m().is_finite()) {
            found.push(Problem::error(
                format!("spacings[{i}]"),
                "two axles cannot stand at one place",
                "enter a spacing above zero",
            ));
        } else if most < least {
            found.push(Problem::error(
                format!("spacings[{i}]"),
                "the range of the spacing ends before it begins",
                "enter the least spacing first, then the largest",
            ));
        }
    }
    if !(gauge > Length::ZERO && gauge.in_m().is_finite()) {
        found.push(Problem::error(
            "gauge",
            "the distance between the wheels must be above zero",
            "enter the distance between the centres of the wheels",
        ));
    }
    found
}

#[cfg(test)]
mod tests {
    use super::*;

    fn train(axles: &[f64], spacings: &[Spacing]) -> Result<AxleTrain, Vec<Problem>> {
        let axles = axles.iter().map(|&kn| Force::from_kn(kn)).collect();
        AxleTrain::new("t", "T", axles, spacings.to_vec(), Length::from_m(1.8), "made up")
    }

    fn paths(made: Result<AxleTrain, Vec<Problem>>) -> Vec<String> {
        made.expect_err("must be refused").into_iter().map(|p| p.path).collect()
    }

    const TWO_M: Spacing = Spacing::Fixed(Length::from_m(2.0));

    #[test]
    fn what_cannot_be_is_refused_with_its_path() {
        let range = |from, to| Spacing::Range { from: Length::from_m(from), to: Length::from_m(to) };
        assert_eq!(paths(train(&[], &[])), ["axles"]);
        assert_eq!(paths(train(&[1.0; 201], &[TWO_M; 200])), ["axles"]);
        assert_eq!(paths(train(&[1.0, -2.0], &[TWO_M])), ["axles[1]"]);
        assert_eq!(paths(train(&[f64::NAN, 2.0], &[TWO_M])), ["axles[0]"]);
        assert_eq!(paths(train(&[0.0, 0.0], &[TWO_M])), ["axles"]);
        assert_eq!(paths(train(&[1.0, 2.0], &[])), ["spacings"]);
        assert_eq!(paths(train(&[1.0, 2.0], &[range(4.0, 3.0)])), ["spacings[0]"]);
        assert_eq!(paths(train(&[1.0, 2.0], &[range(-1.0, 3.0)])), ["spacings[0]"]);
        assert_eq!(paths(train(&[1.0, 2.0], &[Spacing::Fixed(Length::ZERO)])), ["spacings[0]"]);
        assert_eq!(paths(train(&[1.0, 2.0], &[range(1.0, f64::INFINITY)])), ["spacings[0]"]);
        let no_gauge = AxleTrain::new("t", "T", vec![Force::from_kn(1.0)], vec![], Length::ZERO, "made up");
        assert_eq!(paths(no_gauge), ["gauge"]);
    }

    #[test]
    fn reversing_twice_changes_nothing() {
        let range = Spacing::Range { from: Length::from_m(4.0), to: Length::from_m(9.0) };
        let made = train(&[35.0, 145.0, 145.0], &[TWO_M, range]).expect("sound");
        assert_eq!(made.reversed().reversed(), made);
        assert_eq!(made.reversed().spacings(), &[range, TWO_M]);
        assert_eq!(made.weight(), Force::from_kn(325.0));
        assert_eq!(made.least_length(), Length::from_m(6.0));
        assert_eq!(made.most_length(), Length::from_m(11.0));
    }
}
