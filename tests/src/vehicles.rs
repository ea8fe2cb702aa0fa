//! Vehicle tables of the tests. The core holds none: rule sets bring theirs as data.
//!
//! US vehicles: AASHTO Standard Specifications 3.7 (H, HS); AASHTO LRFD 3.6.1.2 (tandem); AASHTO MBE
//! 6A.4.4.2 and appendix D6A (Type 3, 3S2, 3-3, SU4 to SU7, notional rating load); FHWA memorandum of
//! 3 November 2016 (EV2, EV3). Axle tables from memory (98 %), gross weights beside them.

use girderbook_core::load::{AxleTrain, Spacing};
use girderbook_core::quantity::{Force, Length};

/// Distance between the wheels of an axle: 6 ft.
const GAUGE: Length = Length::from_ft(6.0);

/// One vehicle: name, axle loads in kip, spacings in ft, gross weight in kip.
type Row = (&'static str, &'static [f64], &'static [f64], f64);

/// Vehicles with fixed spacings; HS20 and the notional rating load closed up.
pub const US: &[Row] = &[
    ("H10", &[4.0, 16.0], &[14.0], 20.0),
    ("H15", &[6.0, 24.0], &[14.0], 30.0),
    ("H20", &[8.0, 32.0], &[14.0], 40.0),
    ("HS15", &[6.0, 24.0, 24.0], &[14.0, 14.0], 54.0),
    ("HS20", &[8.0, 32.0, 32.0], &[14.0, 14.0], 72.0),
    ("Tandem25", &[25.0, 25.0], &[4.0], 50.0),
    ("Type3", &[16.0, 17.0, 17.0], &[15.0, 4.0], 50.0),
    ("Type3S2", &[10.0, 15.5, 15.5, 15.5, 15.5], &[11.0, 4.0, 22.0, 4.0], 72.0),
    ("Type3-3", &[12.0, 12.0, 12.0, 16.0, 14.0, 14.0], &[15.0, 4.0, 15.0, 16.0, 4.0], 80.0),
    ("SU4", &[12.0, 8.0, 17.0, 17.0], &[10.0, 4.0, 4.0], 54.0),
    ("SU5", &[12.0, 8.0, 8.0, 17.0, 17.0], &[10.0, 4.0, 4.0, 4.0], 62.0),
    ("SU6", &[11.5, 8.0, 8.0, 17.0, 17.0, 8.0], &[10.0, 4.0, 4.0, 4.0, 4.0], 69.5),
    ("SU7", &[11.5, 8.0, 8.0, 17.0, 17.0, 8.0, 8.0], &[10.0, 4.0, 4.0, 4.0, 4.0, 4.0], 77.5),
    ("NRL6", &[6.0, 8.0, 8.0, 17.0, 17.0, 8.0, 8.0, 8.0], &[6.0, 4.0, 4.0, 4.0, 4.0, 4.0, 4.0], 80.0),
    ("EV2", &[24.0, 33.5], &[15.0], 57.5),
    ("EV3", &[24.0, 31.0, 31.0], &[15.0, 4.0], 86.0),
];

/// An invented eleven-axle permit vehicle, 235.5 kip.
pub const ELEVEN_AXLES: Row = (
    "eleven axles",
    &[12.0, 22.0, 21.0, 24.5, 24.5, 19.0, 26.0, 26.0, 23.0, 17.5, 20.0],
    &[11.5, 4.5, 14.25, 4.5, 33.0, 4.25, 4.75, 4.5, 13.5, 5.0],
    235.5,
);

/// A train of axle loads in kip at fixed distances in ft.
#[must_use]
pub fn train_of(row: &Row) -> AxleTrain {
    let axles = row.1.iter().map(|&kip| Force::from_kip(kip)).collect();
    let spacings = row.2.iter().map(|&ft| Spacing::Fixed(Length::from_ft(ft))).collect();
    made(row.0, axles, spacings)
}

/// A vehicle of [`US`] by its name.
///
/// # Panics
/// When there is none of that name.
#[must_use]
pub fn us(name: &str) -> AxleTrain {
    train_of(US.iter().find(|row| row.0 == name).unwrap_or_else(|| panic!("no vehicle {name}")))
}

/// A vehicle of [`US`] with one spacing free from its value to `to_ft`.
#[must_use]
pub fn us_variable(name: &str, index: usize, to_ft: f64) -> AxleTrain {
    let closed = us(name);
    let mut spacings = closed.spacings().to_vec();
    spacings[index] = Spacing::Range { from: spacings[index].least(), to: Length::from_ft(to_ft) };
    made(name, closed.axles().to_vec(), spacings)
}

/// HS20 with its rear spacing free from 14 to 30 ft.
#[must_use]
pub fn hs20_variable() -> AxleTrain {
    us_variable("HS20", 1, 30.0)
}

/// The notional rating load with its first spacing free from 6 to 14 ft.
#[must_use]
pub fn notional() -> AxleTrain {
    us_variable("NRL6", 0, 14.0)
}

/// A sound train.
///
/// # Panics
/// When the parts make none.
#[must_use]
pub fn made(name: &str, axles: Vec<Force>, spacings: Vec<Spacing>) -> AxleTrain {
    AxleTrain::new(name, name, axles, spacings, GAUGE, "tables of the tests")
        .unwrap_or_else(|problems| panic!("{name}: {problems:?}"))
}
