//! A section as a take-off of parts: areas, first moments, second moments, each on a line of its own.
//!
//! Heights `y` run upward from one reference line, which the caller names. Steel that is gone is a
//! part with a negative area, so that a section with loss is "the sound section less what is gone".

use crate::clause;
use crate::quantity::{Area, Inertia, Length, Modulus};
use crate::units::mark::{In2, In3, In4, Inch};
use crate::worksheet::{Recorder, Val};

/// One part of a section.
#[derive(Clone, Copy, Debug)]
pub struct Part {
    /// What it is, for the rows of the sums.
    pub what: &'static str,
    /// Its area; negative where it is gone.
    pub area: Val<Area>,
    /// Height of its centroid above the reference line.
    pub y: Val<Length>,
    /// What it has about its own centroid.
    pub own: Own,
}

/// Second moment of area of a part about its own centroid.
#[derive(Clone, Copy, Debug)]
pub enum Own {
    /// A rectangle.
    Rectangle {
        /// Width.
        b: Val<Length>,
        /// Height.
        t: Val<Length>,
    },
    /// A rectangle that is gone.
    Gone {
        /// Width.
        b: Val<Length>,
        /// Height.
        t: Val<Length>,
    },
    /// Known from a table or an earlier step.
    Known(Val<Inertia>),
}

/// Area, centroid and second moment of area of a whole section.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Totals {
    /// Area.
    pub area: Val<Area>,
    /// Height of the centroid above the reference line.
    pub y: Val<Length>,
    /// Second moment of area about the centroid.
    pub inertia: Val<Inertia>,
}

clause! {
    /// Area of a rectangle in in2, for 11.96 in by 0.94 in: 11.24 in2.
    pub fn rectangle_area(b: Length [Inch], t: Length [Inch]) -> A_i: Area [In2] { b * t }
    cite "mechanics" what "area of a plate"
}

clause! {
    /// Area of a rectangle that is gone, in in2: negative.
    pub fn gone_area(b: Length [Inch], t: Length [Inch]) -> A_i: Area [In2] { -b * t }
    cite "mechanics" what "area that is gone"
}

clause! {
    /// First moment of area of a part about the reference line, in3.
    pub fn first_moment(A_i: Area [In2], y_i: Length [Inch]) -> Q_i: Modulus [In3] { A_i * y_i }
    cite "mechanics" what "area times height of its centroid"
}

clause! {
    /// Centroid of the whole, in.
    pub fn centroid(Q: Modulus [In3], A: Area [In2]) -> y: Length [Inch] { Q / A }
    cite "mechanics" what "height of the centroid"
}

clause! {
    /// A rectangle about the centroid of the whole, in4.
    pub fn rectangle_inertia(
        b: Length [Inch], t: Length [Inch], A_i: Area [In2], y_i: Length [Inch], y: Length [Inch],
    ) -> I_i: Inertia [In4] { b * pow(t, 3.0) / 12.0 + A_i * pow(y_i - y, 2.0) }
    cite "mechanics (parallel axes)" what "part about the centroid of the whole"
}

clause! {
    /// A rectangle that is gone about the centroid of the whole, in4: negative, as is `A_i`.
    pub fn gone_inertia(
        b: Length [Inch], t: Length [Inch], A_i: Area [In2], y_i: Length [Inch], y: Length [Inch],
    ) -> I_i: Inertia [In4] { -b * pow(t, 3.0) / 12.0 + A_i * pow(y_i - y, 2.0) }
    cite "mechanics (parallel axes)" what "what is gone about the centroid of the whole"
}

clause! {
    /// A part with a known second moment of area about the centroid of the whole, in4.
    pub fn shifted_inertia(
        I_0: Inertia [In4], A_i: Area [In2], y_i: Length [Inch], y: Length [Inch],
    ) -> I_i: Inertia [In4] { I_0 + A_i * pow(y_i - y, 2.0) }
    cite "mechanics (parallel axes)" what "part about the centroid of the whole"
}

/// Adds the parts up. The whole must have area: checked by those who make the parts.
pub fn compose<R: Recorder, const N: usize>(rec: &mut R, parts: [Part; N]) -> Totals {
    let area = rec.sum("A", "area", &parts.map(|p| (p.what, p.area)), In2);
    let first = parts.map(|p| (p.what, first_moment(rec, p.area, p.y)));
    let first = rec.sum("Q", "first moment of area", &first, In3);
    let y = centroid(rec, first, area);
    let second = parts.map(|p| {
        let own = match p.own {
            Own::Rectangle { b, t } => rectangle_inertia(rec, b, t, p.area, p.y, y),
            Own::Gone { b, t } => gone_inertia(rec, b, t, p.area, p.y, y),
            Own::Known(inertia) => shifted_inertia(rec, inertia, p.area, p.y, y),
        };
        (p.what, own)
    });
    let inertia = rec.sum("I", "second moment of area", &second, In4);
    Totals { area, y, inertia }
}
