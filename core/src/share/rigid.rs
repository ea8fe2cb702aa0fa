//! The rigid cross-section: girders deflect as a plane, as with diaphragms that work.

use super::Roadway;
use crate::quantity::Length;

/// The worst placement for an outer girder.
#[derive(Clone, Debug, PartialEq)]
pub struct Placement {
    /// Share of the lanes, without multiple presence.
    pub share: f64,
    /// Distance of the girder from the centre of the girders.
    pub x_outer: Length,
    /// Sum of the squares of these distances, in units of the square of [`Placement::x_outer`].
    pub squares: f64,
    /// Eccentricities of the trucks, towards the girder positive.
    pub eccentricities: Vec<Length>,
}

/// `n` trucks as near to the girder as their lanes allow; `None` when they do not fit, or when there
/// is one girder only.
#[must_use]
pub fn worst(girders: &[Length], line: usize, road: &Roadway, n: u32) -> Option<Placement> {
    if girders.len() < 2 {
        return None;
    }
    let count = f64::from(u32::try_from(girders.len()).ok()?);
    let centre = girders.iter().copied().sum::<Length>() / count;
    let reach = girders[line] - centre;
    let mut eccentricities = Vec::new();
    for k in 0..n {
        let (from, to) = road.places(k, n)?;
        let towards = if reach < Length::ZERO { from } else { to };
        let e = towards + road.gauge / 2.0 - centre;
        eccentricities.push(if reach < Length::ZERO { -e } else { e });
    }
    let x_outer = reach.abs();
    if x_outer == Length::ZERO {
        return None;
    }
    let squares: f64 = girders.iter().map(|y| ((*y - centre) / x_outer) * ((*y - centre) / x_outer)).sum();
    let moment: f64 = eccentricities.iter().map(|e| *e / x_outer).sum();
    let share = f64::from(n) / count + moment / squares;
    Some(Placement { share, x_outer, squares, eccentricities })
}
