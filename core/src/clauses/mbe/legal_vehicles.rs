//! Vehicles of legal loads as rows of data (MBE 6A.4.4.2 and appendix D6A; emergency vehicles of the FAST
//! Act). Axle loads and distances from memory, 98 % sure.
//!
//! Legal trucks have no lane load beside them. Lane-type loads come on top of them and the largest
//! effect governs: over 200 ft of span three quarters of a Type 3-3 with 0.2 kip/ft; for negative moment
//! and interior reactions, at all spans, two of them 30 ft apart with 0.2 kip/ft.

use crate::check::Class;
use crate::condition;
use crate::load::{AxleTrain, Lane, Spacing};
use crate::quantity::{Force, Length, LineLoad};
use crate::units::mark::Ft;
use crate::worksheet::{Recorder, Val};

/// What a vehicle stands for.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Family {
    /// The three AASHTO legal trucks; closure looks at them.
    Standard,
    /// Specialised hauling vehicles.
    SpecialisedHauling,
    /// Notional rating load: a screen for specialised hauling vehicles, which need a rating of their
    /// own only where it falls below 1.0. Axles that do not add to the effect are left out.
    Notional,
    /// Emergency vehicles. They end in axle, tandem and gross limits of their own, not in the sign of
    /// legal loads.
    Emergency,
}

/// One vehicle.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Row {
    /// Its id in rule sets.
    pub id: &'static str,
    /// What it is called.
    pub name: &'static str,
    /// What it stands for.
    pub family: Family,
    /// How signs see it.
    pub class: Class,
    /// Axle loads from the front in kips.
    pub kips: &'static [f64],
    /// Distances from each axle to the next in feet, least and most.
    pub feet: &'static [(f64, f64)],
    /// Where it is known from.
    pub source: &'static str,
}

impl Row {
    /// The axle train of the row: whole axles, gauge 6 ft.
    ///
    /// # Panics
    /// Never for the rows of this file; the constructor's tests hold them.
    #[must_use]
    pub fn train(&self) -> AxleTrain {
        train(self, self.id, self.name, 1.0, 1)
    }

    /// Gross weight.
    #[must_use]
    pub fn weight(&self) -> Force {
        Force::from_kip(self.kips.iter().sum())
    }
}

const LEGAL: &str = "AASHTO MBE 3rd ed. appendix D6A (from memory)";
const MEMO: &str = "FHWA memorandum of 3 November 2016 (from memory)";

const fn fixed(feet: f64) -> (f64, f64) {
    (feet, feet)
}

/// Type 3 unit, 50 kip.
pub const TYPE_3: Row = Row {
    id: "type3",
    name: "Type 3",
    family: Family::Standard,
    class: Class::SingleUnit,
    kips: &[16.0, 17.0, 17.0],
    feet: &[fixed(15.0), fixed(4.0)],
    source: LEGAL,
};

/// Type 3S2 unit, 72 kip.
pub const TYPE_3S2: Row = Row {
    id: "type3s2",
    name: "Type 3S2",
    family: Family::Standard,
    class: Class::Combination,
    kips: &[10.0, 15.5, 15.5, 15.5, 15.5],
    feet: &[fixed(11.0), fixed(4.0), fixed(22.0), fixed(4.0)],
    source: LEGAL,
};

/// Type 3-3 unit, 80 kip.
pub const TYPE_3_3: Row = Row {
    id: "type3-3",
    name: "Type 3-3",
    family: Family::Standard,
    class: Class::Combination,
    kips: &[12.0, 12.0, 12.0, 16.0, 14.0, 14.0],
    feet: &[fixed(15.0), fixed(4.0), fixed(15.0), fixed(16.0), fixed(4.0)],
    source: LEGAL,
};

/// SU4, 54 kip.
pub const SU4: Row = Row {
    id: "su4",
    name: "SU4",
    family: Family::SpecialisedHauling,
    class: Class::SingleUnit,
    kips: &[12.0, 8.0, 17.0, 17.0],
    feet: &[fixed(10.0), fixed(4.0), fixed(4.0)],
    source: LEGAL,
};

/// SU5, 62 kip.
pub const SU5: Row = Row {
    id: "su5",
    name: "SU5",
    family: Family::SpecialisedHauling,
    class: Class::SingleUnit,
    kips: &[12.0, 8.0, 8.0, 17.0, 17.0],
    feet: &[fixed(10.0), fixed(4.0), fixed(4.0), fixed(4.0)],
    source: LEGAL,
};

/// SU6, 69.5 kip.
pub const SU6: Row = Row {
    id: "su6",
    name: "SU6",
    family: Family::SpecialisedHauling,
    class: Class::SingleUnit,
    kips: &[11.5, 8.0, 8.0, 17.0, 17.0, 8.0],
    feet: &[fixed(10.0), fixed(4.0), fixed(4.0), fixed(4.0), fixed(4.0)],
    source: LEGAL,
};

/// SU7, 77.5 kip.
pub const SU7: Row = Row {
    id: "su7",
    name: "SU7",
    family: Family::SpecialisedHauling,
    class: Class::SingleUnit,
    kips: &[11.5, 8.0, 8.0, 17.0, 17.0, 8.0, 8.0],
    feet: &[fixed(10.0), fixed(4.0), fixed(4.0), fixed(4.0), fixed(4.0), fixed(4.0)],
    source: LEGAL,
};

/// Notional rating load, 80 kip, first distance 6 to 14 ft.
pub const NRL: Row = Row {
    id: "nrl",
    name: "Notional rating load",
    family: Family::Notional,
    class: Class::SingleUnit,
    kips: &[6.0, 8.0, 8.0, 17.0, 17.0, 8.0, 8.0, 8.0],
    feet: &[(6.0, 14.0), fixed(4.0), fixed(4.0), fixed(4.0), fixed(4.0), fixed(4.0), fixed(4.0)],
    source: LEGAL,
};

/// EV2, 57.5 kip.
pub const EV2: Row = Row {
    id: "ev2",
    name: "EV2",
    family: Family::Emergency,
    class: Class::SingleUnit,
    kips: &[24.0, 33.5],
    feet: &[fixed(15.0)],
    source: MEMO,
};

/// EV3, 86 kip.
pub const EV3: Row = Row {
    id: "ev3",
    name: "EV3",
    family: Family::Emergency,
    class: Class::SingleUnit,
    kips: &[24.0, 31.0, 31.0],
    feet: &[fixed(15.0), fixed(4.0)],
    source: MEMO,
};

/// Vehicles of a legal-load rating: the three standard trucks and the specialised hauling vehicles.
pub const LEGAL_TRUCKS: &[Row] = &[TYPE_3, TYPE_3S2, TYPE_3_3, SU4, SU5, SU6, SU7];

/// Every row of this file.
pub const ALL: &[Row] = &[TYPE_3, TYPE_3S2, TYPE_3_3, SU4, SU5, SU6, SU7, NRL, EV2, EV3];

/// A lane-type load: trucks with a lane load beside them. Posting takes its weight as 80 kip (6A.8.3).
#[derive(Clone, Debug, PartialEq)]
pub struct LaneType {
    /// The trucks, already reduced.
    pub trucks: AxleTrain,
    /// The lane load beside them; no dynamic load allowance.
    pub lane: Lane,
    /// Weight that posting counts with.
    pub posted_weight: Force,
}

/// The lane-type load of a span over 200 ft; none for a shorter one.
pub fn long_span<R: Recorder>(rec: &mut R, span: Val<Length>) -> Option<LaneType> {
    over_200_ft(rec, span).then(|| lane_type("lane-type", "0.75 of Type 3-3 and 0.2 kip/ft", 1))
}

/// The lane-type load for negative moment and interior reactions of continuous spans: two trucks of one
/// direction, 30 ft apart.
#[must_use]
pub fn negative_moment() -> LaneType {
    lane_type("lane-type-pair", "two of 0.75 Type 3-3, 30 ft apart, and 0.2 kip/ft", 2)
}

fn lane_type(id: &str, name: &str, trucks: usize) -> LaneType {
    LaneType {
        trucks: train(&TYPE_3_3, id, name, 0.75, trucks),
        lane: Lane { w: LineLoad::from_kip_ft(0.2), width: Length::from_ft(10.0) },
        posted_weight: Force::from_kip(80.0),
    }
}

/// `count` trucks of a row behind each other, 30 ft from rear axle to front axle.
fn train(row: &Row, id: &str, name: &str, factor: f64, count: usize) -> AxleTrain {
    let spacing = |&(from, to): &(f64, f64)| {
        let (from, to) = (Length::from_ft(from), Length::from_ft(to));
        if from == to { Spacing::Fixed(from) } else { Spacing::Range { from, to } }
    };
    let mut axles = Vec::new();
    let mut spacings = Vec::new();
    for truck in 0..count {
        if truck > 0 {
            spacings.push(Spacing::Fixed(Length::from_ft(30.0)));
        }
        axles.extend(row.kips.iter().map(|&kip| Force::from_kip(factor * kip)));
        spacings.extend(row.feet.iter().map(spacing));
    }
    AxleTrain::new(id, name, axles, spacings, Length::from_ft(6.0), row.source)
        .expect("the rows of this file are vehicles")
}

condition! {
    fn over_200_ft(L: Length [Ft]) { L > 200.0 }
    cite "AASHTO MBE 3rd ed. 6A.4.4.2.1a (from memory, 90 % sure)"
    yes "span over 200 ft: the lane-type legal load counts as well" no "span of 200 ft or less: no lane-type legal load"
}
