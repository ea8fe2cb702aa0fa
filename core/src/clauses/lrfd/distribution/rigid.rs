//! The girders as a rigid cross-section: it sinks and turns, but does not bend (commentary 4.6.2.2.2d).

use crate::clause;
use crate::problem::Problem;
use crate::quantity::{Area, Length};
use crate::share::Placement;
use crate::units::mark::{Ft, Ft2, One};
use crate::worksheet::{Recorder, Val};

/// What an outer girder takes of an axle from all trucks of a placement together; girders of equal
/// stiffness. No multiple presence.
///
/// # Errors
/// When the girders do not stand apart.
pub fn share<R: Recorder>(
    rec: &mut R,
    girders: &[Val<Length>],
    line: usize,
    placement: &Placement,
) -> Result<Val<f64>, Problem> {
    if girders.len() < 2 || !girders.windows(2).all(|pair| pair[1].q > pair[0].q) {
        return Err(Problem::error(
            "girders",
            "a cross-section needs two girders or more, apart from each other",
            "check the girder lines and their spacings",
        ));
    }
    let n_b =
        rec.found("N_b", "number of girder lines", girders.len() as f64, One, 0.0, || "counted".to_owned());
    let rows: Vec<(&str, Val<Length>)> = girders.iter().map(|y| ("girder line", *y)).collect();
    let total = rec.sum("y_sum", "sum of the girders' distances from the left edge", &rows, Ft);
    let y_c = centre(rec, total, n_b);
    // Distances toward the outer girder count as positive.
    let left_side = line == 0;
    let mut arms = Vec::with_capacity(girders.len());
    for &y in girders {
        arms.push(if left_side { arm_left(rec, y_c, y) } else { arm_right(rec, y, y_c) });
    }
    let mut squares = Vec::with_capacity(girders.len());
    for &x in &arms {
        squares.push(("girder line", square(rec, x)));
    }
    let sum_x2 =
        rec.sum("sum_x2", "sum of the squares of the girders' distances from the centre", &squares, Ft2);
    let mut eccentric = Vec::with_capacity(placement.trucks.len());
    for truck in &placement.trucks {
        let middle = (truck.left + truck.right) / 2.0;
        let y_t =
            rec.found("y_t", "middle of the truck from the left edge of the deck", middle, Ft, 0.0, || {
                "as near to the outer girder as it may stand".to_owned()
            });
        let e = if left_side { eccentricity_left(rec, y_c, y_t) } else { eccentricity_right(rec, y_t, y_c) };
        eccentric.push(("truck", e));
    }
    let sum_e = rec.sum("sum_e", "sum of the trucks' distances from the centre", &eccentric, Ft);
    let n_l =
        rec.found("N_L", "lanes loaded", placement.trucks.len() as f64, One, 0.0, || "counted".to_owned());
    Ok(reaction(rec, n_l, n_b, arms[line], sum_e, sum_x2))
}

clause! {
    /// Centre of the girders.
    fn centre(y_sum: Length [Ft], N_b: f64 [One]) -> y_c: Length [Ft] { y_sum / N_b }
    cite "rigid cross-section" what "centre of the girders"
}

clause! {
    /// Distance of a girder from the centre, positive to the left.
    fn arm_left(y_c: Length [Ft], y: Length [Ft]) -> x: Length [Ft] { y_c - y }
    cite "rigid cross-section" what "distance of the girder from the centre"
}

clause! {
    /// Distance of a girder from the centre, positive to the right.
    fn arm_right(y: Length [Ft], y_c: Length [Ft]) -> x: Length [Ft] { y - y_c }
    cite "rigid cross-section" what "distance of the girder from the centre"
}

clause! {
    /// Square of a girder's distance from the centre.
    fn square(x: Length [Ft]) -> x2: Area [Ft2] { x * x }
    cite "rigid cross-section" what "square of that distance"
}

clause! {
    /// Distance of a truck from the centre, positive to the left.
    fn eccentricity_left(y_c: Length [Ft], y_t: Length [Ft]) -> e: Length [Ft] { y_c - y_t }
    cite "rigid cross-section" what "distance of the truck from the centre"
}

clause! {
    /// Distance of a truck from the centre, positive to the right.
    fn eccentricity_right(y_t: Length [Ft], y_c: Length [Ft]) -> e: Length [Ft] { y_t - y_c }
    cite "rigid cross-section" what "distance of the truck from the centre"
}

clause! {
    /// Reaction of the outer girder in lanes.
    fn reaction(N_L: f64 [One], N_b: f64 [One], X_ext: Length [Ft], sum_e: Length [Ft], sum_x2: Area [Ft2])
        -> R: f64 [One] { N_L / N_b + X_ext * sum_e / sum_x2 }
    cite "AASHTO LRFD 9th ed. C4.6.2.2.2d (C4.6.2.2.2d-1)" what "reaction of the outer girder, in lanes"
}
