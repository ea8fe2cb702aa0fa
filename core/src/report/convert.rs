//! The same figure in the units of the book.

use crate::quantity::{
    Area, Dimension, Force, Inertia, Length, LineLoad, Modulus, Moment, Quantity, Stress, UnitWeight,
};
use crate::units::System;
use crate::units::mark::{
    Ft, Ft2, In2, In3, In4, Inch, KN, KNPerM, KNPerM2, KNPerM3, KNm, Kcf, Kip, KipFt, KipIn, KipPerFt, Ksi,
    M, M2, Mark, Mm, Mm2, Mm3, Mm4, Mpa, Pcf, ShortTon, Tonne,
};
use crate::units::system::{Scale, default_unit};

/// Base units in one of a unit, by the unit's name, and the system that it belongs to; none for a
/// pure number and for degrees, which are the same everywhere.
fn known(unit: &str, dimension: Dimension) -> Option<(f64, System)> {
    use System::{FootKip, MetreKilonewton};
    fn of<Q: Quantity, U: Mark<Q>>(_: U, unit: &str) -> Option<f64> {
        (U::NAME == unit).then_some(U::PER)
    }
    macro_rules! either {
        ($q:ty: $($si:ident)+ | $($us:ident)+) => {
            None $(.or_else(|| of::<$q, _>($si, unit).map(|per| (per, MetreKilonewton))))+
                 $(.or_else(|| of::<$q, _>($us, unit).map(|per| (per, FootKip))))+
        };
    }
    match dimension {
        Dimension::Number | Dimension::Angle => None,
        Dimension::Length => either!(Length: Mm M | Inch Ft),
        Dimension::Area => either!(Area: Mm2 M2 | In2 Ft2),
        Dimension::Modulus => either!(Modulus: Mm3 | In3),
        Dimension::Inertia => either!(Inertia: Mm4 | In4),
        Dimension::Force => either!(Force: KN Tonne | Kip ShortTon),
        Dimension::LineLoad => either!(LineLoad: KNPerM | KipPerFt),
        Dimension::Stress => either!(Stress: Mpa KNPerM2 | Ksi),
        Dimension::UnitWeight => either!(UnitWeight: KNPerM3 | Kcf Pcf),
        Dimension::Moment => either!(Moment: KNm | KipFt KipIn),
    }
}

/// A value of [`Quantity::base`] as a figure in a unit; a number that has no unit stays as it is.
#[must_use]
pub(super) fn in_unit(base: f64, dimension: Dimension, unit: &str) -> f64 {
    known(unit, dimension).map_or(base, |(per, _)| base / per)
}

/// A figure in the unit that the book has for it, where that is another one than `unit`. A length
/// stays long or small.
#[must_use]
pub fn converted(
    figure: f64,
    unit: &str,
    dimension: Dimension,
    system: System,
) -> Option<(f64, &'static str)> {
    let (per, own) = known(unit, dimension)?;
    let scale = if matches!(unit, "m" | "ft") { Scale::Long } else { Scale::Small };
    let target = default_unit(system, dimension, scale);
    let same_kind = own == system && dimension != Dimension::Moment;
    if target == unit || same_kind {
        return None;
    }
    let (to, _) = known(target, dimension)?;
    Some((figure * per / to, target))
}

#[cfg(test)]
mod tests {
    use super::*;
    use System::{FootKip, MetreKilonewton};

    /// NIST SP 811, appendix B.8: 1 in = 25.4 mm, 1 kip ft = 1.355818 kN m, 1 ksi = 6.894757 MPa.
    #[test]
    fn figures_are_converted_into_the_units_of_the_book() {
        let near = |got: Option<(f64, &str)>, value: f64, unit: &str| {
            let (figure, name) = got.expect("another unit");
            assert!((figure / value - 1.0).abs() < 5e-7, "{figure} against {value}");
            assert_eq!(name, unit);
        };
        near(converted(2.0, "in", Dimension::Length, MetreKilonewton), 50.8, "mm");
        near(converted(10.0, "ft", Dimension::Length, MetreKilonewton), 3.048, "m");
        near(converted(1.0, "kip ft", Dimension::Moment, MetreKilonewton), 1.355_818, "kN m");
        near(converted(12.0, "kip in", Dimension::Moment, MetreKilonewton), 1.355_818, "kN m");
        near(converted(12.0, "kip in", Dimension::Moment, FootKip), 1.0, "kip ft");
        near(converted(36.0, "ksi", Dimension::Stress, MetreKilonewton), 248.211_25, "MPa");
        near(converted(1.0, "kN/m", Dimension::LineLoad, FootKip), 0.068_521_77, "kip/ft");
    }

    #[test]
    fn what_is_in_the_book_s_units_stays_alone() {
        for (unit, dimension, system) in [
            ("in", Dimension::Length, FootKip),
            ("ft", Dimension::Length, FootKip),
            ("mm", Dimension::Length, MetreKilonewton),
            ("kN/m2", Dimension::Stress, MetreKilonewton),
            ("short tons", Dimension::Force, FootKip),
            ("t", Dimension::Force, MetreKilonewton),
            ("", Dimension::Number, MetreKilonewton),
            ("°", Dimension::Angle, FootKip),
        ] {
            assert_eq!(converted(1.0, unit, dimension, system), None, "{unit}");
        }
    }
}
