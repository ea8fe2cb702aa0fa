//! Influence lines of a beam over two spans with constant stiffness, from the three-moment equation:
//! curved lines for the tests of the search.
//!
//! A unit load at a from the outer support of a span l gives the moment -a (l^2 - a^2) / (2 l (l1 + l2))
//! at the inner support (closed form, three-moment equation).

use girderbook_core::influence::{InfluenceLine, LineKind, Side};
use girderbook_core::numerics::{Cubic, Piecewise};
use girderbook_core::quantity::{Length, Quantity};

/// A beam over supports at 0, `first` and `first + second`.
#[derive(Clone, Copy, Debug)]
pub struct TwoSpans {
    /// First span.
    pub first: Length,
    /// Second span.
    pub second: Length,
}

impl TwoSpans {
    fn turned(self) -> Self {
        Self { first: self.second, second: self.first }
    }

    fn lengths(self) -> (f64, f64, f64) {
        let (a, b) = (self.first.base(), self.second.base());
        (a, b, a + b)
    }

    /// Moment at the inner support as one cubic a span, each about the start of its span.
    fn inner_moment(self) -> [Cubic; 2] {
        let (a, b, sum) = self.lengths();
        [
            Cubic([0.0, -a / (2.0 * sum), 0.0, 1.0 / (2.0 * a * sum)]),
            Cubic([0.0, -b / sum, 3.0 / (2.0 * sum), -1.0 / (2.0 * b * sum)]),
        ]
    }

    /// Moment at a station.
    ///
    /// # Panics
    /// When the station is off the beam.
    #[must_use]
    pub fn moment(self, station: Length) -> InfluenceLine {
        let (a, b, sum) = self.lengths();
        let x = station.base();
        let kind = LineKind::Moment { station };
        if x > a {
            return mirrored(&self.turned().moment(Length::from_base(sum - x)), sum, 1.0, kind);
        }
        let [near, far] = self.inner_moment().map(|m| m * (x / a));
        let rise = Cubic::line(0.0, (a - x) / a) + near;
        let fall = Cubic::line(x * (a - x) / a, -x / a) + near.about(x);
        if x <= 0.0 || x >= a {
            return line(kind, vec![0.0, a, a + b], vec![if x <= 0.0 { Cubic::ZERO } else { near }, far]);
        }
        line(kind, vec![0.0, x, a, a + b], vec![rise, fall, far])
    }

    /// Shear just beside a station.
    ///
    /// # Panics
    /// When the station is off the beam.
    #[must_use]
    pub fn shear(self, station: Length, side: Side) -> InfluenceLine {
        let (a, b, sum) = self.lengths();
        let x = station.base();
        let kind = LineKind::Shear { station, side };
        if x > a || (x == a && side == Side::Right) {
            let other = if side == Side::Left { Side::Right } else { Side::Left };
            return mirrored(&self.turned().shear(Length::from_base(sum - x), other), sum, -1.0, kind);
        }
        let [near, far] = self.inner_moment().map(|m| m * (1.0 / a));
        let before = Cubic::line(0.0, -1.0 / a) + near;
        let beyond = Cubic::line((a - x) / a, -1.0 / a) + near.about(x);
        if x <= 0.0 {
            return line(kind, vec![0.0, a, a + b], vec![beyond, far]);
        }
        if x >= a {
            return line(kind, vec![0.0, a, a + b], vec![before, far]);
        }
        line(kind, vec![0.0, x, a, a + b], vec![before, beyond, far])
    }

    /// Reaction of a support, 0 to 2.
    ///
    /// # Panics
    /// When there is no such support.
    #[must_use]
    pub fn reaction(self, support: usize) -> InfluenceLine {
        let (a, b, sum) = self.lengths();
        let kind = LineKind::Reaction { support };
        let [near, far] = self.inner_moment();
        match support {
            0 => {
                let [near, far] = [near, far].map(|m| m * (1.0 / a));
                line(kind, vec![0.0, a, a + b], vec![Cubic::line(1.0, -1.0 / a) + near, far])
            }
            1 => {
                let [near, far] = [near, far].map(|m| m * (-1.0 / a - 1.0 / b));
                let pieces = vec![Cubic::line(0.0, 1.0 / a) + near, Cubic::line(1.0, -1.0 / b) + far];
                line(kind, vec![0.0, a, a + b], pieces)
            }
            2 => mirrored(&self.turned().reaction(0), sum, 1.0, kind),
            _ => panic!("no support {support}"),
        }
    }
}

fn line(kind: LineKind, knots: Vec<f64>, pieces: Vec<Cubic>) -> InfluenceLine {
    InfluenceLine::new(kind, Piecewise::new(knots, pieces).expect("spans above zero"))
}

/// The line seen from the other end of a beam of length `sum`, times `sign`.
fn mirrored(line: &InfluenceLine, sum: f64, sign: f64, kind: LineKind) -> InfluenceLine {
    let f = line.ordinates();
    let knots = f.knots().iter().rev().map(|k| sum - k).collect();
    let turned = f
        .knots()
        .windows(2)
        .zip(f.pieces())
        .rev()
        .map(|(k, piece)| piece.about(k[1] - k[0]).mirrored() * sign)
        .collect();
    self::line(kind, knots, turned)
}
