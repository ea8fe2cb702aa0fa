//! Where girders, curbs and edges stand across the deck, as lines of a worksheet.

use crate::bridge::Bridge;
use crate::clause;
use crate::quantity::Length;
use crate::units::mark::Ft;
use crate::worksheet::{Recorder, Val};

/// Distances across the deck from its left edge.
#[derive(Clone, Debug, PartialEq)]
pub struct Across {
    /// Each girder line.
    pub girders: Vec<Val<Length>>,
    /// Spacing of each girder line to the one at its left; the first has none, so one entry fewer than
    /// [`Across::girders`].
    pub spacings: Vec<Val<Length>>,
    /// Inside face of the left curb.
    pub curb: Val<Length>,
    /// Clear width between the curbs.
    pub roadway: Val<Length>,
    /// Right edge of the deck, which is its width.
    pub edge: Val<Length>,
}

impl Across {
    /// Takes them from the entries of a bridge.
    ///
    /// The overhang and the left curb are lengths that the bridge keeps without their readings, so they
    /// stand as placed, with the field that they follow from.
    pub fn of<R: Recorder>(rec: &mut R, bridge: &Bridge) -> Self {
        let edge = rec.given("W", "width of the deck", &bridge.deck.width, Ft);
        let roadway = rec.given("w", "clear roadway between curbs", &bridge.deck.roadway, Ft);
        let curb = placed(
            rec,
            "c",
            "left edge of the deck to the left curb",
            bridge.deck.left_curb,
            "deck.left_curb",
        );
        let mut girders: Vec<Val<Length>> = Vec::with_capacity(bridge.lines.len());
        let mut spacings = Vec::with_capacity(bridge.lines.len());
        for line in &bridge.lines {
            let y = match (girders.last(), &line.spacing) {
                (Some(&y_left), Some(spacing)) => {
                    let what = format!("spacing of {} to the line at its left", line.name);
                    let s = rec.given("S", &what, spacing, Ft);
                    spacings.push(s);
                    next(rec, y_left, s)
                }
                (Some(&y_left), None) => {
                    let y = placed(rec, "y", "left edge of the deck to the girder", line.y, "girders");
                    spacings.push(between(rec, y, y_left));
                    y
                }
                (None, _) => {
                    placed(rec, "y", "left edge of the deck to the first girder", line.y, "overhang")
                }
            };
            girders.push(y);
        }
        Self { girders, spacings, curb, roadway, edge }
    }

    /// Bounds of the strip of deck that a line carries: halfway to each neighbour, or the edge.
    pub fn strip<R: Recorder>(&self, rec: &mut R, line: usize) -> (Val<Length>, Val<Length>) {
        let left = if line == 0 {
            rec.found("y_l", "left edge of the deck", Length::ZERO, Ft, 0.0, || {
                "distances are taken from it".to_owned()
            })
        } else {
            halfway_left(rec, self.girders[line - 1], self.girders[line])
        };
        let right = match self.girders.get(line + 1) {
            Some(&next) => halfway_right(rec, self.girders[line], next),
            None => self.edge,
        };
        (left, right)
    }
}

fn placed<R: Recorder>(rec: &mut R, symbol: &str, what: &str, length: Length, path: &str) -> Val<Length> {
    rec.found(symbol, what, length, Ft, 0.0, || format!("as entered or assumed at {path}"))
}

clause! {
    /// Place of a girder line from that of the line at its left.
    fn next(y_left: Length [Ft], S: Length [Ft]) -> y: Length [Ft] { y_left + S }
    cite "geometry" what "left edge of the deck to the girder"
}

clause! {
    /// Spacing of two girder lines.
    fn between(y: Length [Ft], y_left: Length [Ft]) -> S: Length [Ft] { y - y_left }
    cite "geometry" what "spacing of the girder to the line at its left"
}

clause! {
    /// Left bound of the strip that a girder carries.
    fn halfway_left(y_left: Length [Ft], y: Length [Ft]) -> y_l: Length [Ft] { (y_left + y) / 2.0 }
    cite "tributary width" what "left bound of the strip of deck that the girder carries"
}

clause! {
    /// Right bound of the strip that a girder carries.
    fn halfway_right(y: Length [Ft], y_right: Length [Ft]) -> y_r: Length [Ft] { (y + y_right) / 2.0 }
    cite "tributary width" what "right bound of the strip of deck that the girder carries"
}
