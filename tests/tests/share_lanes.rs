//! Lanes of a roadway and multiple presence.

use girderbook_core::clauses::{lrfd, mbe};
use girderbook_core::quantity::Length;
use girderbook_core::share::Lanes;
use girderbook_core::worksheet::{Kind, Sheet, Silent, Val};

fn feet(feet: f64) -> Val<Length> {
    Val::bare(Length::from_ft(feet))
}

fn rated(width: f64) -> Lanes {
    mbe::lanes::narrow(&mut Silent, feet(width))
        .unwrap_or_else(|| lrfd::lanes::design_lanes(&mut Silent, feet(width)))
}

/// MBE 6A.2.3.2 under 20 ft and LRFD 3.6.1.1.1 from there (both from memory): what can pass, not what is
/// painted.
#[test]
fn lanes_for_a_rating() {
    for (width, count, lane) in [
        (12.0, 1, 12.0),
        (17.9, 1, 17.9),
        (18.0, 2, 9.0),
        (19.9, 2, 9.95),
        (20.0, 2, 10.0),
        (23.9, 2, 11.95),
        (24.0, 2, 12.0),
        (28.0, 2, 12.0),
        (35.99, 2, 12.0),
        (36.0, 3, 12.0),
        (48.0, 4, 12.0),
    ] {
        let lanes = rated(width);
        assert_eq!(lanes.count, count, "{width} ft");
        assert!((lanes.width.in_ft() - lane).abs() < 1e-9, "{width} ft");
    }
}

/// The design specifications alone: one lane under 20 ft.
#[test]
fn design_lanes_alone() {
    for (width, count, lane) in
        [(17.9, 1, 12.0), (18.0, 1, 12.0), (10.0, 1, 10.0), (19.99, 1, 12.0), (20.0, 2, 10.0)]
    {
        let lanes = lrfd::lanes::design_lanes(&mut Silent, feet(width));
        assert_eq!(lanes.count, count, "{width} ft");
        assert!((lanes.width.in_ft() - lane).abs() < 1e-9, "{width} ft");
    }
}

/// Whole feet in metres: 7.3152 m is 24 ft to the last digit, so its lanes are not lost to rounding.
#[test]
fn whole_feet_written_in_metres() {
    for (metres, count) in [(5.4864, 2), (6.096, 2), (7.3152, 2), (10.9728, 3)] {
        let width = Val::bare(Length::from_m(metres));
        let lanes = mbe::lanes::narrow(&mut Silent, width)
            .unwrap_or_else(|| lrfd::lanes::design_lanes(&mut Silent, width));
        assert_eq!(lanes.count, count, "{metres} m");
    }
}

/// LRFD table 3.6.1.1.2-1 (D6 of the published values, 95 %).
#[test]
fn multiple_presence() {
    for (loaded, m) in [(1, 1.20), (2, 1.00), (3, 0.85), (4, 0.65), (7, 0.65)] {
        let mut sheet = Sheet::default();
        assert_eq!(lrfd::lanes::multiple_presence(&mut sheet, loaded).q, m);
        assert!(matches!(&sheet.lines[0].kind, Kind::LookUp { cite, .. } if cite.contains("3.6.1.1.2-1")));
    }
}

#[test]
fn distances_of_wheels() {
    assert_eq!(lrfd::lanes::gauge(&mut Silent).q, Length::from_ft(6.0));
    assert_eq!(lrfd::lanes::edge(&mut Silent).q, Length::from_ft(2.0));
    assert_eq!(mbe::lanes::between_passing(&mut Silent).q, Length::from_ft(4.0));
}
