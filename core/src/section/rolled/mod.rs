//! Rolled I-shapes: published dimensions and properties.
//!
//! Present American, European and Indian shapes, and older American editions and shapes no longer
//! rolled, which old bridges are made of. A shape that two editions hold bears the edition's year in
//! the name of the older row, such as `W36x150 (1994)`.

mod european;
mod indian;
mod older;
mod standard;
mod wide;

use crate::quantity::{Area, Inertia, Length, LineLoad, Modulus};
use crate::section::plate::{Flange, IShape, Published};
use crate::units::{Entered, Provenance};

/// One row of the catalogue.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Rolled {
    /// Name, such as `W36x150`.
    pub name: &'static str,
    /// Table that the row was read from.
    pub table: &'static str,
    /// Nominal weight on a length.
    pub weight: LineLoad,
    /// Out-to-out depth.
    pub depth: Length,
    /// Width of a flange.
    pub width: Length,
    /// Thickness of a flange; mean thickness where it tapers.
    pub flange: Length,
    /// Thickness of the web.
    pub web: Length,
    /// Outer face of a flange to the toe of the fillet.
    pub fillet: Length,
    /// Area.
    pub area: Area,
    /// Second moment of area about the strong axis.
    pub inertia: Inertia,
    /// Elastic modulus about the strong axis.
    pub elastic: Modulus,
    /// Plastic modulus about the strong axis.
    pub plastic: Modulus,
}

/// A row in lb/ft, in, in2, in3, in4.
#[expect(clippy::too_many_arguments, reason = "the columns of a published table")]
const fn us(
    table: &'static str,
    name: &'static str,
    weight: f64,
    depth: f64,
    width: f64,
    flange: f64,
    web: f64,
    fillet: f64,
    area: f64,
    inertia: f64,
    elastic: f64,
    plastic: f64,
) -> Rolled {
    Rolled {
        name,
        table,
        weight: LineLoad::from_lb_ft(weight),
        depth: Length::from_inch(depth),
        width: Length::from_inch(width),
        flange: Length::from_inch(flange),
        web: Length::from_inch(web),
        fillet: Length::from_inch(fillet),
        area: Area::from_in2(area),
        inertia: Inertia::from_in4(inertia),
        elastic: Modulus::from_in3(elastic),
        plastic: Modulus::from_in3(plastic),
    }
}

/// A row in kg/m, mm, cm2, cm3, cm4.
#[expect(clippy::too_many_arguments, reason = "the columns of a published table")]
const fn si(
    table: &'static str,
    name: &'static str,
    weight: f64,
    depth: f64,
    width: f64,
    flange: f64,
    web: f64,
    fillet: f64,
    area: f64,
    inertia: f64,
    elastic: f64,
    plastic: f64,
) -> Rolled {
    Rolled {
        name,
        table,
        weight: LineLoad::from_kn_m(weight * 0.009_806_65),
        depth: Length::from_mm(depth),
        width: Length::from_mm(width),
        flange: Length::from_mm(flange),
        web: Length::from_mm(web),
        fillet: Length::from_mm(fillet),
        area: Area::from_mm2(area * 100.0),
        inertia: Inertia::from_mm4(inertia * 1e4),
        elastic: Modulus::from_mm3(elastic * 1e3),
        plastic: Modulus::from_mm3(plastic * 1e3),
    }
}

/// Every row, table by table.
pub fn all() -> impl Iterator<Item = &'static Rolled> {
    [wide::WIDE, standard::STANDARD, european::EUROPEAN, indian::INDIAN, older::OLDER].into_iter().flatten()
}

/// Letters and digits of a name in one form: `w 36 × 150` and `W36X150` are the same.
fn key(name: &str) -> impl Iterator<Item = char> + '_ {
    name.chars().filter(|c| !c.is_whitespace()).map(|c| if c == '×' { 'X' } else { c.to_ascii_uppercase() })
}

/// The shape of that name, whatever its case, spaces and sign of multiplication. The designation of
/// older drawings, such as `36 WF 150`, finds `W36x150`.
#[must_use]
pub fn find(name: &str) -> Option<&'static Rolled> {
    let plain = |name: &str| all().find(|shape| key(shape.name).eq(key(name)));
    plain(name).or_else(|| {
        let old: String = key(name).collect();
        let (depth, weight) = old.split_once("WF")?;
        plain(&format!("W{depth}X{weight}"))
    })
}

impl Rolled {
    /// The shape taken as published; `path` is that of the member's section in the document.
    #[must_use]
    pub fn shape(&'static self, path: &str) -> IShape {
        let entry = |field: &str, value: Length| Entered {
            value,
            readings: vec![value],
            written: vec![self.name.to_owned()],
            provenance: Provenance::Drawing,
            path: format!("{path}.{field}"),
            source: self.table,
        };
        let flange = |which: &str| Flange {
            width: entry(&format!("{which}.width"), self.width),
            thickness: entry(&format!("{which}.thickness"), self.flange),
        };
        IShape {
            depth: entry("depth", self.depth),
            top: flange("top"),
            bottom: flange("bottom"),
            web: entry("web", self.web),
            fillet: entry("fillet", self.fillet),
            published: Some(Published {
                name: self.name,
                source: self.table,
                area: self.area,
                inertia: self.inertia,
                elastic: self.elastic,
                plastic: self.plastic,
            }),
        }
    }
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn names_are_found_as_people_write_them() {
        for name in ["W36x150", "w36X150", " W 36 × 150", "36 WF 150", "36wf150"] {
            assert_eq!(find(name).map(|s| s.name), Some("W36x150"), "{name}");
        }
        assert_eq!(find("20 I 65.4").map(|s| s.name), Some("20 I 65.4"));
        assert_eq!(find("ipe300").map(|s| s.name), Some("IPE 300"));
        for name in ["", "W", "W36", "WF", "W36x151", "W36x150x2"] {
            assert_eq!(find(name), None, "{name}");
        }
    }

    #[test]
    fn no_name_stands_twice() {
        let mut names: Vec<String> = all().map(|s| key(s.name).collect()).collect();
        let count = names.len();
        names.sort();
        names.dedup();
        assert_eq!(names.len(), count);
        assert!(count >= 350, "{count}");
    }
}
