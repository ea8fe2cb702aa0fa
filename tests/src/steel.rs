//! Steel sections and values for tests.

use girderbook_core::quantity::{Length, Quantity};
use girderbook_core::section::effective::Remains;
use girderbook_core::section::plate::{Flange, IShape};
use girderbook_core::units::{Entered, Mark};
use girderbook_core::worksheet::{Recorder, Val};

/// Three plates: depth, top flange, web thickness, bottom flange; `k` is the thicker flange.
#[must_use]
pub fn plates(d: Length, top: (Length, Length), t_w: Length, bottom: (Length, Length)) -> IShape {
    let flange = |which: &str, (width, thickness): (Length, Length)| Flange {
        width: Entered::measured(format!("section.{which}.width"), width),
        thickness: Entered::measured(format!("section.{which}.thickness"), thickness),
    };
    IShape {
        depth: Entered::measured("section.depth", d),
        top: flange("top", top),
        bottom: flange("bottom", bottom),
        web: Entered::measured("section.web", t_w),
        fillet: Entered::measured("section.fillet", top.1.max(bottom.1)),
        published: None,
    }
}

/// The same in inches.
#[must_use]
pub fn plates_in(d: f64, top: (f64, f64), t_w: f64, bottom: (f64, f64)) -> IShape {
    let inch = Length::from_inch;
    plates(inch(d), (inch(top.0), inch(top.1)), inch(t_w), (inch(bottom.0), inch(bottom.1)))
}

/// A value that stands on a line as something measured.
pub fn told<R: Recorder, Q: Quantity, U: Mark<Q>>(rec: &mut R, symbol: &str, value: Q, unit: U) -> Val<Q> {
    rec.given(symbol, symbol, &Entered::measured(symbol, value), unit)
}

/// Thickness left, in inches, on no line; `None` is as sound.
#[must_use]
pub fn remains(top: Option<f64>, web: Option<f64>, bottom: Option<f64>) -> Remains<'static> {
    let left = |t: Option<f64>| t.map(|t| Val::bare(Length::from_inch(t)));
    Remains { top: left(top), bottom: left(bottom), web: left(web), path: "findings[0]" }
}
