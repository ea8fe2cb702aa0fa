//! Legal vehicles of the MBE as data: axle loads in kip, spacings in ft.
//!
//! Source: MBE 3rd edition, 6A.4.4.2.1 and appendix D6A (Type 3, Type 3S2, Type 3-3, SU4 to SU7); from
//! memory, in agreement with a second list kept with the tests. Gauge 6 ft.

use crate::check::Class;
use crate::load::{AxleTrain, Spacing};
use crate::problem::Problem;
use crate::quantity::{Force, Length};

/// One row of the table.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Row {
    /// Stable id.
    pub id: &'static str,
    /// Name as the manual prints it.
    pub name: &'static str,
    /// How signs see it.
    pub class: Class,
    /// Axle loads from the front, kip.
    pub axles: &'static [f64],
    /// Spacings, ft.
    pub spacings: &'static [f64],
}

/// The legal vehicles that are rated, routine ones first.
pub const LEGAL: [Row; 7] = [
    Row {
        id: "type3",
        name: "Type 3",
        class: Class::SingleUnit,
        axles: &[16.0, 17.0, 17.0],
        spacings: &[15.0, 4.0],
    },
    Row {
        id: "type3s2",
        name: "Type 3S2",
        class: Class::Combination,
        axles: &[10.0, 15.5, 15.5, 15.5, 15.5],
        spacings: &[11.0, 4.0, 22.0, 4.0],
    },
    Row {
        id: "type3-3",
        name: "Type 3-3",
        class: Class::Combination,
        axles: &[12.0, 12.0, 12.0, 16.0, 14.0, 14.0],
        spacings: &[15.0, 4.0, 15.0, 16.0, 4.0],
    },
    Row {
        id: "su4",
        name: "SU4",
        class: Class::SingleUnit,
        axles: &[12.0, 8.0, 17.0, 17.0],
        spacings: &[10.0, 4.0, 4.0],
    },
    Row {
        id: "su5",
        name: "SU5",
        class: Class::SingleUnit,
        axles: &[12.0, 8.0, 8.0, 17.0, 17.0],
        spacings: &[10.0, 4.0, 4.0, 4.0],
    },
    Row {
        id: "su6",
        name: "SU6",
        class: Class::SingleUnit,
        axles: &[11.5, 8.0, 8.0, 17.0, 17.0, 8.0],
        spacings: &[10.0, 4.0, 4.0, 4.0, 4.0],
    },
    Row {
        id: "su7",
        name: "SU7",
        class: Class::SingleUnit,
        axles: &[11.5, 8.0, 8.0, 17.0, 17.0, 8.0, 8.0],
        spacings: &[10.0, 4.0, 4.0, 4.0, 4.0, 4.0],
    },
];

impl Row {
    /// The vehicle as a train of axles.
    ///
    /// # Errors
    /// Never for the rows of this table.
    pub fn train(&self) -> Result<AxleTrain, Vec<Problem>> {
        AxleTrain::new(
            self.id,
            self.name,
            self.axles.iter().map(|kip| Force::from_kip(*kip)).collect(),
            self.spacings.iter().map(|ft| Spacing::Fixed(Length::from_ft(*ft))).collect(),
            Length::from_ft(6.0),
            "MBE 3rd ed. 6A.4.4.2.1, appendix D6A",
        )
    }
}
