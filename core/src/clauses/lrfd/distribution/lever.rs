//! The lever rule on the sheet: where the trucks stand, what each wheel gives to the girder.

use crate::clause;
use crate::quantity::Length;
use crate::share::Placement;
use crate::share::lever::{Worst, hinge, ordinate};
use crate::units::mark::{Ft, One};
use crate::worksheet::{Recorder, Val};

/// Writes a placement so that it can be checked by hand: where the trucks stand, what each wheel gives
/// to the girder, and the sum. Returns the sum, which is the share.
///
/// What is left over, printed with the placement, is the difference between the wheels' weight and the
/// reactions of all girders.
pub fn write<R: Recorder>(rec: &mut R, girders: &[Val<Length>], line: usize, found: &Worst) -> Val<f64> {
    let places: Vec<Length> = girders.iter().map(|y| y.q).collect();
    let trucks = &found.placement.trucks;
    let taken: f64 = trucks
        .iter()
        .flat_map(|truck| [truck.left, truck.right])
        .map(|y| (0..places.len()).map(|i| ordinate(&places, i, y)).sum::<f64>() / 2.0)
        .sum();
    let mut rows = Vec::new();
    for (i, truck) in trucks.iter().enumerate() {
        for (side, y) in [("left", truck.left), ("right", truck.right)] {
            let what = format!("{side} wheels of truck {} from the left edge of the deck", i + 1);
            let y_w = rec.found("y_w", &what, y, Ft, taken - trucks.len() as f64, || how(found));
            if let Some(other) = hinge(&places, line, y) {
                rows.push((what, reaction(rec, y_w, girders[other], girders[line])));
            }
        }
    }
    let rows: Vec<(&str, Val<f64>)> = rows.iter().map(|(what, value)| (what.as_str(), *value)).collect();
    rec.sum("r", "share of an axle by the lever rule", &rows, One)
}

fn how(found: &Worst) -> String {
    let Placement { trucks, edge, squeezed, .. } = &found.placement;
    let lanes = if trucks.len() == 1 { "one lane".to_owned() } else { format!("{} lanes", trucks.len()) };
    let kept = if *squeezed {
        format!(
            "; the roadway is too narrow for the distances of the rule, so each truck stands {:.2} ft from \
             the edges of its share of the width",
            edge.in_ft()
        )
    } else {
        String::new()
    };
    format!("worst of all placements, {lanes} loaded{kept}")
}

clause! {
    /// What a girder takes of an axle through one of its two wheels, by moments about the hinge.
    fn reaction(y_w: Length [Ft], y_hinge: Length [Ft], y: Length [Ft]) -> r: f64 [One]
    { (y_w - y_hinge) / (y - y_hinge) / 2.0 }
    cite "lever rule: moments about the hinge" what "share of the axle through this wheel"
}
