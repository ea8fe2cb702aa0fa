//! Typed quantities: values and arithmetic, no text.
//!
//! One coherent system inside: lengths in tenths of a millimetre, forces in newtons, everything
//! else a product of the two, so that no product or quotient carries a conversion factor. A tenth
//! of a millimetre makes whole inches (254) and their binary fractions exact in an `f64`, hence
//! "the axle stands exactly on the support" can be decided; with metres 451 of 1,830 sums of two
//! whole-foot spacings up to 60 ft do not compare equal.
//!
//! Only products that mean something are defined. A ratio is a plain `f64`.

use core::ops::{Add, AddAssign, Div, Mul, Neg, Sub};

/// What all quantities have in common; `f64` is the dimensionless one.
pub trait Quantity: Copy + PartialOrd + core::fmt::Debug + 'static {
    /// Which kind of quantity this is.
    const DIMENSION: Dimension;
    /// From the coherent base unit (0.1 mm, N and their products).
    fn from_base(base: f64) -> Self;
    /// In the coherent base unit.
    fn base(self) -> f64;
}

/// The kinds of quantity that the book knows.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Dimension {
    /// A ratio, a factor, a count.
    Number,
    /// An angle.
    Angle,
    /// A length.
    Length,
    /// An area.
    Area,
    /// A section modulus or a volume.
    Modulus,
    /// A second moment of area.
    Inertia,
    /// A force.
    Force,
    /// A force on a length.
    LineLoad,
    /// A force on an area: stress, strength, pressure.
    Stress,
    /// A force on a volume.
    UnitWeight,
    /// A force times a length.
    Moment,
}

impl Quantity for f64 {
    const DIMENSION: Dimension = Dimension::Number;
    fn from_base(base: f64) -> Self {
        base
    }
    fn base(self) -> f64 {
        self
    }
}

macro_rules! quantity {
    ($(#[$doc:meta])* $name:ident { $($(#[$udoc:meta])* $from:ident $to:ident = $per:expr;)+ }) => {
        $(#[$doc])*
        #[derive(Clone, Copy, Debug, PartialEq, PartialOrd, Default)]
        pub struct $name(f64);

        impl $name {
            /// Nothing of it.
            pub const ZERO: Self = Self(0.0);
            $($(#[$udoc])* #[must_use] pub const fn $from(value: f64) -> Self { Self(value * $per) }
              $(#[$udoc])* #[must_use] pub const fn $to(self) -> f64 { self.0 / $per })+
            /// Its size without sign.
            #[must_use] pub const fn abs(self) -> Self { Self(self.0.abs()) }
            /// The larger of two.
            #[must_use] pub const fn max(self, other: Self) -> Self { Self(self.0.max(other.0)) }
            /// The smaller of two.
            #[must_use] pub const fn min(self, other: Self) -> Self { Self(self.0.min(other.0)) }
        }

        impl Quantity for $name {
            const DIMENSION: Dimension = Dimension::$name;
            fn from_base(base: f64) -> Self { Self(base) }
            fn base(self) -> f64 { self.0 }
        }
        impl Add for $name { type Output = Self; fn add(self, o: Self) -> Self { Self(self.0 + o.0) } }
        impl AddAssign for $name { fn add_assign(&mut self, o: Self) { self.0 += o.0; } }
        impl Sub for $name { type Output = Self; fn sub(self, o: Self) -> Self { Self(self.0 - o.0) } }
        impl Neg for $name { type Output = Self; fn neg(self) -> Self { Self(-self.0) } }
        impl Mul<f64> for $name { type Output = Self; fn mul(self, k: f64) -> Self { Self(self.0 * k) } }
        impl Mul<$name> for f64 { type Output = $name; fn mul(self, q: $name) -> $name { $name(self * q.0) } }
        impl Div<f64> for $name { type Output = Self; fn div(self, k: f64) -> Self { Self(self.0 / k) } }
        impl Div for $name { type Output = f64; fn div(self, o: Self) -> f64 { self.0 / o.0 } }
        impl core::iter::Sum for $name {
            fn sum<I: Iterator<Item = Self>>(all: I) -> Self { all.fold(Self::ZERO, |a, b| a + b) }
        }
    };
}

/// Newtons in one pound-force (exact by the definitions of the pound and of standard gravity).
const LBF: f64 = 4.448_221_615_260_5;
const KIP: f64 = 1000.0 * LBF;
const IN: f64 = 254.0;
const FT: f64 = 3048.0;
const M: f64 = 10_000.0;
const MM: f64 = 10.0;

quantity! {
    /// A length; base 0.1 mm.
    Length {
        /// Millimetres.
        from_mm in_mm = MM;
        /// Centimetres.
        from_cm in_cm = 100.0;
        /// Metres.
        from_m in_m = M;
        /// Inches.
        from_inch in_inch = IN;
        /// Feet.
        from_ft in_ft = FT;
    }
}
quantity! {
    /// An angle; base one degree.
    Angle {
        /// Degrees.
        from_deg in_deg = 1.0;
    }
}
quantity! {
    /// An area.
    Area {
        /// Square millimetres.
        from_mm2 in_mm2 = MM * MM;
        /// Square metres.
        from_m2 in_m2 = M * M;
        /// Square inches.
        from_in2 in_in2 = IN * IN;
    }
}
quantity! {
    /// A section modulus (elastic or plastic) or a volume.
    Modulus {
        /// Cubic millimetres.
        from_mm3 in_mm3 = MM * MM * MM;
        /// Cubic metres.
        from_m3 in_m3 = M * M * M;
        /// Cubic inches.
        from_in3 in_in3 = IN * IN * IN;
    }
}
quantity! {
    /// A second moment of area, or a torsion constant.
    Inertia {
        /// Millimetres to the fourth.
        from_mm4 in_mm4 = MM * MM * MM * MM;
        /// Metres to the fourth.
        from_m4 in_m4 = M * M * M * M;
        /// Inches to the fourth.
        from_in4 in_in4 = IN * IN * IN * IN;
    }
}
quantity! {
    /// A force or a weight; base one newton.
    Force {
        /// Newtons.
        from_n in_n = 1.0;
        /// Kilonewtons.
        from_kn in_kn = 1000.0;
        /// Kips.
        from_kip in_kip = KIP;
        /// Pounds-force.
        from_lbf in_lbf = LBF;
        /// Short tons of weight (2,000 lbf).
        from_short_ton in_short_ton = 2.0 * KIP;
        /// Tonnes of weight (1,000 kg under standard gravity).
        from_tonne in_tonne = 9806.65;
    }
}
quantity! {
    /// A force on a length.
    LineLoad {
        /// Kilonewtons a metre.
        from_kn_m in_kn_m = 1000.0 / M;
        /// Kips a foot.
        from_kip_ft in_kip_ft = KIP / FT;
        /// Pounds a foot.
        from_lb_ft in_lb_ft = LBF / FT;
    }
}
quantity! {
    /// A force on an area: a stress, a strength or a pressure.
    Stress {
        /// Megapascals.
        from_mpa in_mpa = 1.0 / (MM * MM);
        /// Kilopascals, or kilonewtons a square metre.
        from_kpa in_kpa = 1000.0 / (M * M);
        /// Kips a square inch.
        from_ksi in_ksi = KIP / (IN * IN);
        /// Pounds a square inch.
        from_psi in_psi = LBF / (IN * IN);
        /// Pounds a square foot.
        from_psf in_psf = LBF / (FT * FT);
    }
}
quantity! {
    /// A force on a volume.
    UnitWeight {
        /// Kilonewtons a cubic metre.
        from_kn_m3 in_kn_m3 = 1000.0 / (M * M * M);
        /// Pounds a cubic foot.
        from_pcf in_pcf = LBF / (FT * FT * FT);
        /// Kips a cubic foot.
        from_kcf in_kcf = KIP / (FT * FT * FT);
    }
}
quantity! {
    /// A bending moment.
    Moment {
        /// Kilonewton metres.
        from_kn_m in_kn_m = 1000.0 * M;
        /// Kip feet.
        from_kip_ft in_kip_ft = KIP * FT;
        /// Kip inches.
        from_kip_in in_kip_in = KIP * IN;
    }
}

macro_rules! products {
    ($($a:ident * $b:ident = $c:ident;)+) => { $(
        impl Mul<$b> for $a { type Output = $c; fn mul(self, o: $b) -> $c { $c(self.0 * o.0) } }
        impl Mul<$a> for $b { type Output = $c; fn mul(self, o: $a) -> $c { $c(self.0 * o.0) } }
        impl Div<$a> for $c { type Output = $b; fn div(self, o: $a) -> $b { $b(self.0 / o.0) } }
        impl Div<$b> for $c { type Output = $a; fn div(self, o: $b) -> $a { $a(self.0 / o.0) } }
    )+ };
}

impl Mul for Length {
    type Output = Area;
    fn mul(self, o: Self) -> Area {
        Area(self.0 * o.0)
    }
}
impl Div<Length> for Area {
    type Output = Length;
    fn div(self, o: Length) -> Length {
        Length(self.0 / o.0)
    }
}
impl Mul for Area {
    type Output = Inertia;
    fn mul(self, o: Self) -> Inertia {
        Inertia(self.0 * o.0)
    }
}
impl Div<Area> for Inertia {
    type Output = Area;
    fn div(self, o: Area) -> Area {
        Area(self.0 / o.0)
    }
}
products! {
    Area * Length = Modulus;
    Modulus * Length = Inertia;
    LineLoad * Length = Force;
    Stress * Length = LineLoad;
    Stress * Area = Force;
    Stress * Modulus = Moment;
    UnitWeight * Length = Stress;
    UnitWeight * Area = LineLoad;
    UnitWeight * Modulus = Force;
    Force * Length = Moment;
    LineLoad * Area = Moment;
}

#[cfg(test)]
mod tests {
    use super::*;

    /// Exact by definition: 1 in = 25.4 mm, 1 ft = 304.8 mm, 1 lbf = 4.4482216152605 N
    /// (NIST SP 811, appendix B).
    #[test]
    fn exact_definitions() {
        assert_eq!(Length::from_inch(1.0), Length::from_mm(25.4));
        assert_eq!(Length::from_ft(1.0), Length::from_mm(304.8));
        assert_eq!(Force::from_kip(1.0).in_n(), 4_448.221_615_260_5);
        assert_eq!(Length::from_inch(1.0 / 64.0).base(), 254.0 / 64.0);
    }

    /// NIST SP 811, appendix B.8: 1 ksi = 6.894757 MPa; 1 lbf/ft3 = 157.0875 N/m3 (from
    /// 4.448222 / 0.02831685); 1 kip ft = 1.355818 kN m; 1 plf = 14.59390 N/m.
    #[test]
    fn published_conversions() {
        let near = |a: f64, b: f64| assert!((a / b - 1.0).abs() < 5e-7, "{a} against {b}");
        near(Stress::from_ksi(1.0).in_mpa(), 6.894_757);
        near(UnitWeight::from_pcf(1.0).in_kn_m3(), 0.157_087_5);
        near(Moment::from_kip_ft(1.0).in_kn_m(), 1.355_818);
        near(LineLoad::from_lb_ft(1.0).in_kn_m(), 0.014_593_90);
        near(Stress::from_psf(1.0).in_kpa(), 0.047_880_26);
    }

    #[test]
    fn whole_foot_spacings_add_exactly() {
        for a in 1..=60 {
            for b in a..=60 {
                let sum = Length::from_ft(f64::from(a)) + Length::from_ft(f64::from(b));
                assert_eq!(sum, Length::from_ft(f64::from(a + b)));
            }
        }
    }

    #[test]
    fn products_need_no_factor() {
        let m = UnitWeight::from_kn_m3(24.5) * Length::from_m(0.2) * Length::from_m(2.0);
        assert!((m.in_kn_m() - 9.8).abs() < 1e-12);
        let moment = m * Length::from_m(10.0) * Length::from_m(10.0) / 8.0;
        assert!((moment.in_kn_m() - 122.5).abs() < 1e-9);
    }
}
