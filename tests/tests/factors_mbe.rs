//! Factors, default strengths and vehicles of MBE part A against the published tables (from memory of MBE 3rd
//! edition, 2018; how sure stands beside each).

use girderbook_core::bridge::{ConditionRating, Riding};
use girderbook_core::check::{Action, LimitState};
use girderbook_core::clauses::lrfd::hl93;
use girderbook_core::clauses::mbe::factors::{
    Crossing, DesignLevel, LegalTable, Superstructure, components, condition, condition_and_system,
    design_live, dynamic, legal_live, legal_service, superstructure, surface, surface_measured, system,
};
use girderbook_core::clauses::mbe::legal_vehicles::{self as legal, Family};
use girderbook_core::clauses::mbe::materials::{concrete_strength, steel_yield};
use girderbook_core::load::Spacing;
use girderbook_core::problem::Severity;
use girderbook_core::quantity::{Force, Length, LineLoad};
use girderbook_core::units::Entered;
use girderbook_core::worksheet::{Kind, Sheet, Silent, Val};

const I: LimitState = LimitState::StrengthI;
const II: LimitState = LimitState::ServiceII;

fn near(value: f64, expected: f64) {
    assert!((value - expected).abs() < 1e-12, "{value} against {expected}");
}

/// MBE table 6A.4.2.2-1, 99 % sure.
#[test]
fn load_factors() {
    let rec = &mut Silent;
    near(components(rec, I).q, 1.25);
    near(components(rec, II).q, 1.0);
    near(surface(rec, I).q, 1.5);
    near(surface(rec, II).q, 1.0);
    near(surface_measured(rec, I, 5).q, 1.25);
    near(surface_measured(rec, II, 5).q, 1.0);
    near(design_live(rec, I, DesignLevel::Inventory).q, 1.75);
    near(design_live(rec, I, DesignLevel::Operating).q, 1.35);
    near(design_live(rec, II, DesignLevel::Inventory).q, 1.30);
    near(design_live(rec, II, DesignLevel::Operating).q, 1.0);
    near(legal_service(rec).q, 1.30);
}

/// The row of the measured wearing surface tells how many readings stand behind it.
#[test]
fn the_lower_factor_of_dw_says_how_many_readings() {
    let mut sheet = Sheet::default();
    surface_measured(&mut sheet, I, 7);
    assert!(matches!(&sheet.lines[0].kind, Kind::LookUp { row, .. } if row.contains('7')));
}

/// MBE table 6A.4.4.2.3a-1, 95 % sure: 1.45 from 5,000 or unknown, 1.30 to 1,000, linear between. Unknown is
/// the highest.
#[test]
fn legal_load_factor_by_truck_traffic() {
    let at = |adtt: f64| {
        legal_live(&mut Silent, Some(&Entered::measured("traffic.adtt", adtt)), LegalTable::Current).q
    };
    for (adtt, factor) in [
        (0.0, 1.30),
        (400.0, 1.30),
        (1000.0, 1.30),
        (2000.0, 1.3375),
        (3000.0, 1.375),
        (4999.0, 1.45 - 0.15 / 4000.0),
        (5000.0, 1.45),
        (20_000.0, 1.45),
    ] {
        near(at(adtt), factor);
    }
    near(legal_live(&mut Silent, None, LegalTable::Current).q, 1.45);
}

/// MBE 2nd edition (2011): 1.80 / 1.65 / 1.40 at 5,000 or unknown / 1,000 / 100 or less, 95 % sure.
#[test]
fn legal_load_factor_of_the_second_edition() {
    let at = |adtt: Option<f64>| {
        let entry = adtt.map(|adtt| Entered::measured("traffic.adtt", adtt));
        legal_live(&mut Silent, entry.as_ref(), LegalTable::SecondEdition).q
    };
    for (adtt, factor) in [
        (Some(50.0), 1.40),
        (Some(100.0), 1.40),
        (Some(550.0), 1.525),
        (Some(1000.0), 1.65),
        (Some(3000.0), 1.725),
    ] {
        near(at(adtt), factor);
    }
    near(at(Some(5000.0)), 1.80);
    near(at(None), 1.80);
}

/// The table in force is named with its edition on the sheet.
#[test]
fn the_table_is_named_with_its_edition() {
    for (table, edition) in
        [(LegalTable::Current, "3rd ed. (2018)"), (LegalTable::SecondEdition, "2nd ed. (2011)")]
    {
        let mut sheet = Sheet::default();
        legal_live(&mut sheet, None, table);
        assert!(matches!(&sheet.lines[0].kind, Kind::LookUp { cite, .. } if cite.contains(edition)));
    }
}

/// MBE table 6A.4.2.3-1 and 6A.4.2.3, 97 % sure: measured losses raise it by 0.05, to 1.0 at most. It is not
/// 1.0 because losses were measured, and a missing condition is no factor at all.
#[test]
fn condition_factor_and_measured_loss() {
    use ConditionRating::{Fair, Good, Poor};
    for (rating, plain, raised) in [(Good, 1.0, 1.0), (Fair, 0.95, 1.0), (Poor, 0.85, 0.90)] {
        near(condition(&mut Silent, Some(rating), false).expect("entered").q, plain);
        near(condition(&mut Silent, Some(rating), true).expect("entered").q, raised);
    }
    let missing = condition(&mut Silent, None, true).expect_err("not entered");
    assert_eq!((missing.severity, missing.path.as_str()), (Severity::Missing, "site.condition"));
}

/// MBE table 6A.4.2.4-1: rows of three and four girders 88 % sure, the others 97 %. For shear 1.0.
#[test]
fn system_factor() {
    let row = |girders: f64, spacing: f64| {
        superstructure(&mut Silent, Val::bare(girders), Val::bare(Length::from_ft(spacing)))
    };
    for (girders, spacing, kind, factor) in [
        (2.0, 8.0, Superstructure::TwoGirdersWelded, 0.85),
        (3.0, 6.0, Superstructure::ThreeGirders, 0.85),
        (3.0, 6.1, Superstructure::Other, 1.0),
        (4.0, 4.0, Superstructure::FourGirders, 0.95),
        (4.0, 4.1, Superstructure::Other, 1.0),
        (5.0, 4.0, Superstructure::Other, 1.0),
    ] {
        assert_eq!(row(girders, spacing), kind, "{girders} girders at {spacing} ft");
        near(system(&mut Silent, kind, Action::Moment).q, factor);
        near(system(&mut Silent, kind, Action::Shear).q, 1.0);
        near(system(&mut Silent, kind, Action::Bearing).q, 1.0);
    }
    near(system(&mut Silent, Superstructure::TwoGirdersRiveted, Action::Moment).q, 0.90);
}

/// MBE (6A.4.2.1-3), 97 % sure: the product is not below 0.85.
#[test]
fn condition_times_system_not_below_085() {
    let product = |c, s| condition_and_system(&mut Silent, Val::bare(c), Val::bare(s)).q;
    near(product(0.85, 0.85), 0.85);
    near(product(0.95, 0.85), 0.85);
    near(product(0.95, 0.95), 0.9025);
    near(product(1.0, 1.0), 1.0);
}

/// MBE table C6A.4.4.3-1: 10 % and 20 % only for legal and permit loads, over 40 ft of span, where the surface
/// was looked at.
#[test]
fn dynamic_allowance() {
    let at =
        |crossing, feet, riding| dynamic(&mut Silent, crossing, Val::bare(Length::from_ft(feet)), riding).q;
    use Crossing::{Design, LegalOrPermit};
    near(at(LegalOrPermit, 60.0, Riding::Smooth), 0.10);
    near(at(LegalOrPermit, 60.0, Riding::Minor), 0.20);
    near(at(LegalOrPermit, 60.0, Riding::Rough), 0.33);
    near(at(LegalOrPermit, 60.0, Riding::NotInspected), 0.33);
    near(at(LegalOrPermit, 40.0, Riding::Smooth), 0.33);
    near(at(LegalOrPermit, 40.1, Riding::Smooth), 0.10);
    for riding in [Riding::Smooth, Riding::Minor, Riding::Rough, Riding::NotInspected] {
        near(at(Design, 60.0, riding), 0.33);
    }
}

/// MBE tables 6A.6.2.1-1 and 6A.5.2.1-1, 93 % sure.
#[test]
fn strengths_by_year_built() {
    for (year, ksi) in [
        (1890, 26.0),
        (1904, 26.0),
        (1905, 30.0),
        (1936, 30.0),
        (1937, 33.0),
        (1958, 33.0),
        (1963, 33.0),
        (1964, 36.0),
        (2001, 36.0),
    ] {
        near(steel_yield(Some(year)).expect("a row").0.in_ksi(), ksi);
    }
    for (year, ksi) in [(1940, 2.5), (1958, 2.5), (1959, 3.0), (1990, 3.0)] {
        near(concrete_strength(Some(year)).expect("a row").0.in_ksi(), ksi);
    }
    assert_eq!((steel_yield(None), concrete_strength(None)), (None, None));
}

/// Gross weights in kip and lengths in ft of the vehicles (axle tables 98 % sure; FAST Act limits of EV2 and EV3
/// read: single axle 33.5, tandem 62, gross 86 kip).
#[test]
fn vehicles() {
    for (row, kip, feet) in [
        (legal::TYPE_3, 50.0, 19.0),
        (legal::TYPE_3S2, 72.0, 41.0),
        (legal::TYPE_3_3, 80.0, 54.0),
        (legal::SU4, 54.0, 18.0),
        (legal::SU5, 62.0, 22.0),
        (legal::SU6, 69.5, 26.0),
        (legal::SU7, 77.5, 30.0),
        (legal::NRL, 80.0, 30.0),
        (legal::EV2, 57.5, 15.0),
        (legal::EV3, 86.0, 19.0),
    ] {
        let train = row.train();
        let weight = train.weight().in_kip();
        assert!((weight - kip).abs() < 1e-9, "{} weighs {weight}", row.id);
        near(row.weight().in_kip(), kip);
        near(train.least_length().in_ft(), feet);
        assert_eq!((train.id(), train.name(), train.source()), (row.id, row.name, row.source));
        assert_eq!(train.gauge(), Length::from_ft(6.0));
    }
    near(legal::NRL.train().most_length().in_ft(), 38.0);
}

/// Closure looks at the three standard trucks; a rating runs the hauling vehicles too; emergency vehicles and
/// the notional load are not of the sign.
#[test]
fn families() {
    let ids =
        |family| legal::ALL.iter().filter(|row| row.family == family).map(|row| row.id).collect::<Vec<_>>();
    assert_eq!(ids(Family::Standard), ["type3", "type3s2", "type3-3"]);
    assert_eq!(ids(Family::SpecialisedHauling), ["su4", "su5", "su6", "su7"]);
    assert_eq!(ids(Family::Notional), ["nrl"]);
    assert_eq!(ids(Family::Emergency), ["ev2", "ev3"]);
    let legal_ids: Vec<&str> = legal::LEGAL_TRUCKS.iter().map(|row| row.id).collect();
    assert_eq!(legal_ids, ["type3", "type3s2", "type3-3", "su4", "su5", "su6", "su7"]);
}

/// LRFD 3.6.1.2: 8, 32, 32 kip at 14 and 14 to 30 ft; 25, 25 at 4 ft; 0.64 kip/ft over 10 ft.
#[test]
fn hl93_loads() {
    let truck = hl93::truck();
    let kips: Vec<f64> = truck.axles().iter().map(|axle| axle.in_kip()).collect();
    assert_eq!(kips, [8.0, 32.0, 32.0]);
    let (from, to) = (Length::from_ft(14.0), Length::from_ft(30.0));
    assert_eq!(truck.spacings(), &[Spacing::Fixed(from), Spacing::Range { from, to }]);
    let tandem = hl93::tandem();
    assert_eq!(tandem.weight(), Force::from_kip(50.0));
    assert_eq!(tandem.spacings(), &[Spacing::Fixed(Length::from_ft(4.0))]);
    assert_eq!(hl93::lane().w, LineLoad::from_kip_ft(0.64));
    assert_eq!(hl93::lane().width, Length::from_ft(10.0));
}

/// Legal trucks have no lane load beside them; the lane-type load comes on top, over 200 ft of span or for
/// negative moment (90 % sure). Posting counts its weight as 80 kip.
#[test]
fn lane_type_loads() {
    let at = |feet: f64| legal::long_span(&mut Silent, Val::bare(Length::from_ft(feet)));
    assert_eq!(at(200.0), None);
    let long = at(200.1).expect("a lane-type load");
    near(long.trucks.weight().in_kip(), 60.0);
    near(long.lane.w.in_kip_ft(), 0.2);
    near(long.posted_weight.in_kip(), 80.0);
    let pair = legal::negative_moment();
    near(pair.trucks.weight().in_kip(), 120.0);
    assert_eq!(pair.trucks.spacings()[5], Spacing::Fixed(Length::from_ft(30.0)));
    near(pair.trucks.least_length().in_ft(), 54.0 + 30.0 + 54.0);
}
