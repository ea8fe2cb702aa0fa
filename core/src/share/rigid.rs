//! Trucks that load a rigid cross-section most: it sinks and turns, but does not bend, so they stand as near
//! to the outer girder as they may.

use super::pattern::{Pattern, Placement, Roadway, Truck};
use crate::problem::Problem;

/// The placement of `trucks` side by side that loads an outer girder most: as near to it as they may.
///
/// # Errors
/// When the trucks find no room.
pub fn toward(
    left_side: bool,
    roadway: &Roadway,
    pattern: &Pattern,
    trucks: usize,
) -> Result<Placement, Problem> {
    let fit = pattern.fit(trucks, roadway)?;
    let mut placed: Vec<Truck> = (0..trucks)
        .map(|i| {
            let step = i as f64 * fit.band;
            if left_side {
                let band = roadway.left + step;
                let left = band + fit.edge;
                Truck { band, left, right: left + pattern.gauge }
            } else {
                let band = roadway.right() - fit.band - step;
                let right = band + fit.band - fit.edge;
                Truck { band, left: right - pattern.gauge, right }
            }
        })
        .collect();
    placed.sort_by(|a, b| a.left.in_ft().total_cmp(&b.left.in_ft()));
    Ok(Placement { trucks: placed, band: fit.band, edge: fit.edge, squeezed: fit.squeezed })
}
