//! Default strengths by year built, where neither drawing nor test exists (MBE 6A.5.2.1, 6A.6.2.1).
//! What follows from them is assumed and has to be shown as such.

use crate::quantity::Stress;

/// One row of a table of strengths: built up to and including the year.
struct Row {
    until: i32,
    ksi: f64,
    source: &'static str,
}

const STEEL: &[Row] = &[
    Row { until: 1904, ksi: 26.0, source: "built before 1905 (MBE 3rd ed. table 6A.6.2.1-1, from memory)" },
    Row { until: 1936, ksi: 30.0, source: "built 1905 to 1936 (MBE 3rd ed. table 6A.6.2.1-1, from memory)" },
    Row { until: 1963, ksi: 33.0, source: "built 1936 to 1963 (MBE 3rd ed. table 6A.6.2.1-1, from memory)" },
    Row {
        until: i32::MAX,
        ksi: 36.0,
        source: "built after 1963 (MBE 3rd ed. table 6A.6.2.1-1, from memory)",
    },
];

const CONCRETE: &[Row] = &[
    Row { until: 1958, ksi: 2.5, source: "built before 1959 (MBE 3rd ed. table 6A.5.2.1-1, from memory)" },
    Row {
        until: i32::MAX,
        ksi: 3.0,
        source: "built 1959 or later (MBE 3rd ed. table 6A.5.2.1-1, from memory)",
    },
];

/// Minimum yield strength of structural steel by year built, with its row. A year that two rows share
/// takes the lower strength. None where the year is not known.
#[must_use]
pub fn steel_yield(year: Option<i32>) -> Option<(Stress, &'static str)> {
    find(STEEL, year)
}

/// Compressive strength of reinforced concrete by year built, with its row. None where the year is not
/// known.
#[must_use]
pub fn concrete_strength(year: Option<i32>) -> Option<(Stress, &'static str)> {
    find(CONCRETE, year)
}

fn find(table: &[Row], year: Option<i32>) -> Option<(Stress, &'static str)> {
    let year = year?;
    table.iter().find(|row| year <= row.until).map(|row| (Stress::from_ksi(row.ksi), row.source))
}
