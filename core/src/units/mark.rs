//! Units as types: a clause is written in the units of its standard, so its coefficients print as
//! published, and the compiler knows which quantity goes through which unit.

use crate::quantity::{
    Angle, Area, Force, Inertia, Length, LineLoad, Modulus, Moment, Quantity, Stress, UnitWeight,
};

/// A unit of the quantity `Q`.
pub trait Mark<Q: Quantity>: Copy {
    /// What is printed behind a figure; empty for a pure number.
    const NAME: &'static str;
    /// Base units of [`Quantity::base`] in one of this unit.
    const PER: f64;
    /// The figure in this unit.
    fn read(q: Q) -> f64 {
        q.base() / Self::PER
    }
    /// The quantity of a figure in this unit.
    fn make(figure: f64) -> Q {
        Q::from_base(figure * Self::PER)
    }
}

macro_rules! marks {
    ($($(#[$doc:meta])* $mark:ident: $q:ident = $name:literal, $one:expr;)+) => { $(
        $(#[$doc])*
        #[derive(Clone, Copy, Debug, Default)]
        pub struct $mark;
        impl Mark<$q> for $mark {
            const NAME: &'static str = $name;
            const PER: f64 = $one;
        }
    )+ };
}

const KIP: f64 = 4_448.221_615_260_5;

marks! {
    /// A pure number.
    One: f64 = "", 1.0;
    /// Degrees.
    Deg: Angle = "°", 1.0;
    /// Inches.
    Inch: Length = "in", 254.0;
    /// Feet.
    Ft: Length = "ft", 3048.0;
    /// Millimetres.
    Mm: Length = "mm", 10.0;
    /// Metres.
    M: Length = "m", 10_000.0;
    /// Square inches.
    In2: Area = "in2", 254.0 * 254.0;
    /// Square feet.
    Ft2: Area = "ft2", 3048.0 * 3048.0;
    /// Square millimetres.
    Mm2: Area = "mm2", 100.0;
    /// Square metres.
    M2: Area = "m2", 1e8;
    /// Cubic inches.
    In3: Modulus = "in3", 254.0 * 254.0 * 254.0;
    /// Cubic millimetres.
    Mm3: Modulus = "mm3", 1000.0;
    /// Inches to the fourth.
    In4: Inertia = "in4", 254.0 * 254.0 * 254.0 * 254.0;
    /// Millimetres to the fourth.
    Mm4: Inertia = "mm4", 10_000.0;
    /// Kips.
    Kip: Force = "kip", KIP;
    /// Kilonewtons.
    KN: Force = "kN", 1000.0;
    /// Short tons (2,000 lb of weight).
    ShortTon: Force = "short tons", 2.0 * KIP;
    /// Tonnes (1,000 kg of weight).
    Tonne: Force = "t", 9806.65;
    /// Kips a foot.
    KipPerFt: LineLoad = "kip/ft", KIP / 3048.0;
    /// Kilonewtons a metre.
    KNPerM: LineLoad = "kN/m", 0.1;
    /// Kips a square inch.
    Ksi: Stress = "ksi", KIP / (254.0 * 254.0);
    /// Megapascals.
    Mpa: Stress = "MPa", 0.01;
    /// Kilonewtons a square metre.
    KNPerM2: Stress = "kN/m2", 1e-5;
    /// Pounds a cubic foot.
    Pcf: UnitWeight = "pcf", KIP / 1000.0 / (3048.0 * 3048.0 * 3048.0);
    /// Kips a cubic foot.
    Kcf: UnitWeight = "kcf", KIP / (3048.0 * 3048.0 * 3048.0);
    /// Kilonewtons a cubic metre.
    KNPerM3: UnitWeight = "kN/m3", 1e-9;
    /// Kip feet.
    KipFt: Moment = "kip ft", KIP * 3048.0;
    /// Kip inches.
    KipIn: Moment = "kip in", KIP * 254.0;
    /// Kilonewton metres.
    KNm: Moment = "kN m", 1e7;
}
