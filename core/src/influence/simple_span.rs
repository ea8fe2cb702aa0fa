//! Influence lines of a simple span, by statics.

use super::{InfluenceLine, LineKind, Side};
use crate::numerics::{Cubic, Piecewise};
use crate::problem::Problem;
use crate::quantity::{Length, Quantity};

/// One of the two supports of a simple span.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Support {
    /// At the start of the span.
    Start,
    /// At the end of the span.
    End,
}

/// A station this near to a support, as a part of the span, is taken as on it: tenths of a span add up
/// to the span but for round-off.
const ON_SUPPORT: f64 = 1e-9;

/// Bending moment at `station`: rises from zero at the start to x (L - x) / L at the station, falls to
/// zero at the end.
///
/// # Errors
/// When the span is not above zero, or the station lies outside it.
pub fn moment(span: Length, station: Length) -> Result<InfluenceLine, Problem> {
    let (l, x) = checked(span, station)?;
    let kind = LineKind::Moment { station: Length::from_base(x) };
    if x == 0.0 || x == l {
        return line(kind, vec![0.0, l], vec![Cubic::ZERO]);
    }
    let rise = Cubic::line(0.0, (l - x) / l);
    let fall = Cubic::line(x * (l - x) / l, -x / l);
    line(kind, vec![0.0, x, l], vec![rise, fall])
}

/// Shear just beside `station`: -a / L for a load at a before it, 1 - a / L for one beyond it.
///
/// Within the span both sides have one line, since a load may stand at either side of the cut; at a
/// support only the side towards the span has a beam.
///
/// # Errors
/// When the span is not above zero, the station lies outside it, or the side is off the beam.
pub fn shear(span: Length, station: Length, side: Side) -> Result<InfluenceLine, Problem> {
    let (l, x) = checked(span, station)?;
    let kind = LineKind::Shear { station: Length::from_base(x), side };
    let before = Cubic::line(0.0, -1.0 / l);
    let beyond = Cubic::line((l - x) / l, -1.0 / l);
    match side {
        Side::Left if x == 0.0 => Err(off_beam()),
        Side::Right if x == l => Err(off_beam()),
        _ if x == 0.0 => line(kind, vec![0.0, l], vec![beyond]),
        _ if x == l => line(kind, vec![0.0, l], vec![before]),
        _ => line(kind, vec![0.0, x, l], vec![before, beyond]),
    }
}

/// Reaction of a support: 1 for a load on it, 0 for one on the other.
///
/// # Errors
/// When the span is not above zero.
pub fn reaction(span: Length, support: Support) -> Result<InfluenceLine, Problem> {
    let (l, _) = checked(span, Length::ZERO)?;
    let (number, ordinates) = match support {
        Support::Start => (0, Cubic::line(1.0, -1.0 / l)),
        Support::End => (1, Cubic::line(0.0, 1.0 / l)),
    };
    line(LineKind::Reaction { support: number }, vec![0.0, l], vec![ordinates])
}

/// Span and station in base units, the station put onto a support that it all but touches.
fn checked(span: Length, station: Length) -> Result<(f64, f64), Problem> {
    let (l, x) = (span.base(), station.base());
    if !(l > 0.0 && l.is_finite()) {
        return Err(Problem::error(
            "span",
            "the span must be above zero",
            "enter the length from centre of bearing to centre of bearing",
        ));
    }
    match x {
        x if x.abs() <= ON_SUPPORT * l => Ok((l, 0.0)),
        x if (l - x).abs() <= ON_SUPPORT * l => Ok((l, l)),
        x if x > 0.0 && x < l => Ok((l, x)),
        _ => Err(Problem::error(
            "station",
            "the station lies outside the span",
            "choose a station between the two supports",
        )),
    }
}

fn off_beam() -> Problem {
    Problem::error(
        "station",
        "there is no beam at that side of the support",
        "choose the side towards the span",
    )
}

fn line(kind: LineKind, knots: Vec<f64>, pieces: Vec<Cubic>) -> Result<InfluenceLine, Problem> {
    Piecewise::new(knots, pieces).map(|ordinates| InfluenceLine::new(kind, ordinates)).ok_or_else(|| {
        Problem::error(
            "span",
            "the influence line cannot be worked out for this span",
            "check the length of the span",
        )
    })
}

#[cfg(test)]
mod tests {
    use super::*;

    const SPAN: Length = Length::from_m(10.0);

    fn at(line: &InfluenceLine, m: f64) -> (f64, f64) {
        line.ordinates().sides(Length::from_m(m).base(), 0.0)
    }

    #[test]
    fn ordinates_by_statics() {
        let station = Length::from_m(4.0);
        let m = moment(SPAN, station).expect("inside");
        // a b / L = 4 * 6 / 10 = 2.4 m under the load.
        assert!((at(&m, 4.0).0 - Length::from_m(2.4).base()).abs() < 1e-9);
        assert!((at(&m, 7.0).0 - Length::from_m(1.2).base()).abs() < 1e-9);
        let v = shear(SPAN, station, Side::Left).expect("inside");
        assert_eq!(at(&v, 4.0), (-0.4, 0.6));
        let r = reaction(SPAN, Support::End).expect("a span");
        assert_eq!(at(&r, 10.0), (1.0, 0.0));
        assert_eq!(at(&r, 0.0), (0.0, 0.0));
    }

    #[test]
    fn at_the_supports() {
        assert_eq!(moment(SPAN, SPAN).expect("on it").ordinates().peak(), 0.0);
        assert_eq!(at(&shear(SPAN, Length::ZERO, Side::Right).expect("on it"), 0.0), (0.0, 1.0));
        assert_eq!(at(&shear(SPAN, SPAN, Side::Left).expect("on it"), 10.0), (-1.0, 0.0));
        assert!(shear(SPAN, Length::ZERO, Side::Left).is_err());
        assert!(shear(SPAN, SPAN, Side::Right).is_err());
        assert!(moment(SPAN, Length::from_m(10.1)).is_err());
        assert!(moment(SPAN, Length::from_m(-0.1)).is_err());
        assert!(moment(Length::ZERO, Length::ZERO).is_err());
        // Ten tenths are the span but for round-off.
        let tenth = Length::from_m(9.7) / 10.0;
        let sum = (0..10).fold(Length::ZERO, |x, _| x + tenth);
        assert_eq!(moment(Length::from_m(9.7), sum).expect("on it").ordinates().peak(), 0.0);
    }
}
