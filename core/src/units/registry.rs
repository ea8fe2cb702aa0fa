//! The units that people write, with their spellings.

use crate::quantity::Dimension;

/// A unit.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Unit {
    /// How it is printed.
    pub name: &'static str,
    /// Other spellings, in lower case, superscripts as plain figures.
    pub spellings: &'static [&'static str],
    /// What it measures.
    pub dimension: Dimension,
    /// Base units of [`crate::quantity`] in one of it.
    pub per: f64,
}

const LBF: f64 = 4.448_221_615_260_5;
const KIP: f64 = 1000.0 * LBF;
const FT3: f64 = 3048.0 * 3048.0 * 3048.0;
const G: f64 = 9.806_65;

macro_rules! units {
    ($($dimension:ident { $($name:literal [$($spelling:literal),*] = $per:expr;)+ })+) => {
        /// Every unit that is read or printed.
        pub const UNITS: &[Unit] = &[$($(Unit {
            name: $name, spellings: &[$($spelling),*], dimension: Dimension::$dimension, per: $per,
        }),+),+];
    };
}

units! {
    Length {
        "mm" ["millimetre", "millimetres", "millimeter", "millimeters"] = 10.0;
        "cm" ["centimetre", "centimetres", "centimeter", "centimeters"] = 100.0;
        "m" ["metre", "metres", "meter", "meters"] = 10_000.0;
        "in" ["inch", "inches", "in.", "\""] = 254.0;
        "ft" ["foot", "feet", "ft.", "'"] = 3048.0;
    }
    Angle { "°" ["deg", "deg.", "degree", "degrees"] = 1.0; }
    Area {
        "mm2" ["mm^2"] = 100.0;
        "cm2" ["cm^2"] = 1e4;
        "m2" ["m^2"] = 1e8;
        "in2" ["in^2", "sq in"] = 254.0 * 254.0;
        "ft2" ["ft^2", "sq ft"] = 3048.0 * 3048.0;
    }
    Modulus {
        "mm3" ["mm^3"] = 1000.0;
        "cm3" ["cm^3"] = 1e6;
        "in3" ["in^3"] = 254.0 * 254.0 * 254.0;
    }
    Inertia {
        "mm4" ["mm^4"] = 1e4;
        "cm4" ["cm^4"] = 1e8;
        "in4" ["in^4"] = 254.0 * 254.0 * 254.0 * 254.0;
    }
    Force {
        "kN" [] = 1000.0;
        "N" [] = 1.0;
        "kip" ["kips", "k"] = KIP;
        "lb" ["lbs", "lbf", "lb.", "pound", "pounds"] = LBF;
        "t" ["tonne", "tonnes"] = 1000.0 * G;
        "kg" [] = G;
        "short tons" ["short ton", "short t"] = 2.0 * KIP;
    }
    LineLoad {
        "kN/m" [] = 0.1;
        "kip/ft" ["klf", "k/ft", "kips/ft"] = KIP / 3048.0;
        "lb/ft" ["plf", "lbs/ft", "lbf/ft"] = LBF / 3048.0;
        "kg/m" [] = G / 10_000.0;
    }
    Stress {
        "MPa" ["n/mm2", "n/mm^2"] = 0.01;
        "GPa" [] = 10.0;
        "kN/m2" ["kn/m^2", "kpa"] = 1e-5;
        "ksi" ["kip/in2", "kip/in^2"] = KIP / (254.0 * 254.0);
        "psi" ["lb/in2", "lb/in^2"] = LBF / (254.0 * 254.0);
        "psf" ["lb/ft2", "lb/ft^2"] = LBF / (3048.0 * 3048.0);
    }
    UnitWeight {
        "kN/m3" ["kn/m^3"] = 1e-9;
        "pcf" ["lb/ft3", "lb/ft^3", "lbf/ft3", "lbf/ft^3", "lbs/ft3"] = LBF / FT3;
        "kcf" ["kip/ft3", "kip/ft^3"] = KIP / FT3;
        "kg/m3" ["kg/m^3"] = G / 1e12;
        "t/m3" ["t/m^3"] = 1000.0 * G / 1e12;
    }
    Moment {
        "kN m" ["knm", "kn-m"] = 1e7;
        "kip ft" ["kipft", "kip-ft", "k-ft", "ft-kip"] = KIP * 3048.0;
        "kip in" ["kipin", "kip-in"] = KIP * 254.0;
    }
}

/// The unit of that printed name.
#[must_use]
pub fn by_name(name: &str) -> Option<&'static Unit> {
    UNITS.iter().find(|u| u.name == name)
}

/// The unit that the front of a text spells, the longest one, and how many bytes of it. Case does not
/// matter; a spelling is not cut out of a longer word.
#[must_use]
pub fn leading(text: &str) -> Option<(&'static Unit, usize)> {
    let mut best: Option<(&'static Unit, usize)> = None;
    for unit in UNITS {
        for spelling in core::iter::once(&unit.name).chain(unit.spellings) {
            let bytes = spelling.len();
            if best.is_some_and(|(_, n)| n >= bytes) {
                continue;
            }
            let Some(front) = text.get(..bytes) else { continue };
            let whole = !text[bytes..].starts_with(|c: char| c.is_alphabetic() || c == '/' || c == '^')
                || !spelling.ends_with(|c: char| c.is_alphanumeric());
            if front.eq_ignore_ascii_case(spelling) && whole {
                best = Some((unit, bytes));
            }
        }
    }
    best
}

/// What a dimension is called, with its article, and an example of it.
#[must_use]
pub const fn words(dimension: Dimension) -> (&'static str, &'static str) {
    match dimension {
        Dimension::Number => ("a number", "1.25"),
        Dimension::Angle => ("an angle", "15°"),
        Dimension::Length => ("a length", "65 mm or 2 3/8 in"),
        Dimension::Area => ("an area", "345 cm2"),
        Dimension::Modulus => ("a section modulus", "10 200 cm3"),
        Dimension::Inertia => ("a second moment of area", "470 000 cm4"),
        Dimension::Force => ("a force or weight", "75 kN or 17 kip"),
        Dimension::LineLoad => ("a weight on a length", "5.6 kN/m or 380 lb/ft"),
        Dimension::Stress => ("a strength or stress", "250 MPa or 36 ksi"),
        Dimension::UnitWeight => ("a unit weight", "24.5 kN/m3 or 150 pcf"),
        Dimension::Moment => ("a moment", "850 kN m"),
    }
}
