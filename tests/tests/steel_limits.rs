//! Each limit of the formulas from both sides (AASHTO LRFD 9th ed., from memory).

use girderbook_core::clauses::lrfd::steel::flange::{Hold, lateral_inertia, lateral_inertia_tension};
use girderbook_core::clauses::lrfd::steel::lateral::Torsion;
use girderbook_core::clauses::lrfd::steel::noncomposite::{
    FlexureCase, appendix_may_be_used, nominal_moment,
};
use girderbook_core::clauses::lrfd::steel::{bearing, composite, local, proportions, service, shear, web};
use girderbook_core::quantity::{Angle, Inertia, Length, Stress};
use girderbook_core::section::effective::{Edge, Effective, Remains};
use girderbook_core::section::plate::IShape;
use girderbook_core::worksheet::{Sheet, Silent, Val};
use girderbook_tests::steel::plates_in;

fn inch(x: f64) -> Val<Length> {
    Val::bare(Length::from_inch(x))
}

fn ksi(x: f64) -> Val<Stress> {
    Val::bare(Stress::from_ksi(x))
}

fn in4(x: f64) -> Val<Inertia> {
    Val::bare(Inertia::from_in4(x))
}

fn n(x: f64) -> Val<f64> {
    Val::bare(x)
}

/// Holds at the limit and just on its good side, not just beyond it.
fn limit(holds: impl Fn(f64) -> bool, at: f64, beyond: f64) {
    let step = (beyond - at).signum() * 1e-6 * at;
    assert!(holds(at - step), "before {at}");
    assert!(!holds(at + step), "beyond {at}");
}

#[test]
fn proportions_of_webs_and_flanges() {
    let rec = || Silent;
    limit(|x| proportions::web_ratio_holds(&mut rec(), n(x)), 150.0, 151.0);
    limit(|x| proportions::flange_ratio_holds(&mut rec(), n(x)), 12.0, 13.0);
    limit(|x| proportions::strength_holds(&mut rec(), ksi(x)), 100.0, 101.0);
    limit(|x| proportions::flanges_alike(&mut rec(), in4(x), in4(1.0)), 10.0, 11.0);
    limit(|x| proportions::flanges_alike(&mut rec(), in4(x), in4(1.0)), 0.1, 0.0);
    // A sixth of the web's depth, 1.1 times its thickness.
    limit(|x| proportions::flange_stout(&mut rec(), inch(10.0), inch(1.1), inch(x), inch(0.5)), 60.0, 61.0);
    limit(|x| proportions::flange_stout(&mut rec(), inch(10.0), inch(1.1), inch(30.0), inch(x)), 1.0, 1.1);
    assert_eq!(proportions::web_ratio(&mut rec(), inch(30.0), inch(0.5)).q, 60.0);
    assert_eq!(proportions::flange_ratio(&mut rec(), inch(12.0), inch(1.0)).q, 6.0);
    assert_eq!(lateral_inertia(&mut rec(), inch(2.0), inch(6.0)).q, Inertia::from_in4(36.0));
    assert_eq!(lateral_inertia_tension(&mut rec(), inch(1.0), inch(6.0)).q, Inertia::from_in4(18.0));
}

#[test]
fn where_appendix_a6_may_be_used() {
    let may = |f: f64, i: f64, skew: f64| {
        appendix_may_be_used(&mut Silent, ksi(f), in4(i), in4(1.0), Val::bare(Angle::from_deg(skew)))
    };
    limit(|x| may(x, 1.0, 0.0), 70.0, 71.0);
    limit(|x| may(36.0, x, 0.0), 0.3, 0.0);
    limit(|x| may(36.0, 1.0, x), 20.0, 21.0);
}

/// Which way a whole case goes shows by the symbols on its sheet.
#[test]
fn the_way_a_case_goes() {
    let goes = |shape: &IShape, f_y: f64, skew: f64| {
        let mut sheet = Sheet::default();
        let section = Effective::at(&mut sheet, shape, &Remains::default()).expect("a section");
        let case = FlexureCase {
            section: &section,
            f_y: ksi(f_y),
            f_y_path: "y",
            pressed: Edge::Top,
            hold: &Hold::Continuous,
            c_b: n(1.0),
            torsion: Torsion::Counted,
            skew: Val::bare(Angle::from_deg(skew)),
        };
        nominal_moment(&mut sheet, &case).expect("a number");
        sheet.lines.iter().any(|l| l.symbol == "R_pc")
    };
    let stout = plates_in(36.0, (12.0, 1.0), 0.6, (12.0, 1.0));
    assert!(goes(&stout, 36.0, 0.0));
    assert!(goes(&stout, 36.0, 20.0));
    assert!(!goes(&stout, 36.0, 20.1));
    assert!(goes(&stout, 69.9, 0.0));
    assert!(!goes(&stout, 70.1, 0.0));
    // a_wc 1.944, 5.67 sqrt(E / F_yc): the web is slender from D / t_w 161 at 36 ksi, 117 at 68 ksi.
    let tall = plates_in(72.0, (14.0, 1.0), 0.583, (14.0, 1.0));
    assert!(goes(&tall, 36.0, 0.0));
    assert!(!goes(&tall, 68.0, 0.0));
}

#[test]
fn web_and_flange_classes() {
    let e = ksi(29_000.0);
    let rw = |a: f64| web::noncompact_limit(&mut Silent, n(a), e, ksi(29.0)).q / 1000.0_f64.sqrt();
    // (3.1 + 5 / a_wc), kept between 4.6 and 5.7.
    for (a, want) in [(0.1, 5.7), (2.5, 5.1), (5.0, 4.6)] {
        assert!((rw(a) - want).abs() < 1e-9, "{a}: {}", rw(a));
    }
    let k_c = |d: f64| local::buckling_coefficient(&mut Silent, inch(d), inch(1.0)).q;
    assert_eq!((k_c(4.0), k_c(64.0), k_c(1000.0)), (0.76, 0.5, 0.35));
    let r_b = |x: f64| web::load_shedding(&mut Silent, n(2.0), inch(x), inch(1.0), n(140.0)).q;
    assert_eq!(r_b(70.0), 1.0);
    assert!((r_b(80.0) - (1.0 - 2.0 / 1800.0 * 20.0)).abs() < 1e-12);
    limit(|x| web::web_not_slender(&mut Silent, n(x), n(160.0)), 160.0, 161.0);
    limit(|x| web::web_compact(&mut Silent, n(x), n(100.0)), 100.0, 101.0);
    limit(|x| local::flange_compact(&mut Silent, n(x), n(9.15)), 9.15, 10.0);
    // 0.7 F_yc, the tension flange, and the floor of half the yield strength.
    let f_yr = |s_xt: f64| {
        let s = |x| Val::bare(girderbook_core::quantity::Modulus::from_in3(x));
        local::onset_of_yield(&mut Silent, ksi(50.0), n(1.0), ksi(50.0), s(s_xt), s(100.0), ksi(50.0))
            .q
            .in_ksi()
    };
    for (s_xt, want) in [(100.0, 35.0), (60.0, 30.0), (40.0, 25.0)] {
        assert!((f_yr(s_xt) - want).abs() < 1e-9);
    }
}

#[test]
fn composite_sections() {
    limit(|x| composite::ductile(&mut Silent, inch(x), inch(100.0)), 42.0, 43.0);
    limit(|x| composite::axis_high(&mut Silent, inch(x), inch(100.0)), 10.0, 11.0);
    limit(|x| composite::strength_compact(&mut Silent, ksi(x)), 70.0, 71.0);
    // 3.76 sqrt(1,000) = 118.90 against 2 D_cp / t_w.
    let compact = |d: f64| composite::web_compact(&mut Silent, inch(d), inch(1.0), ksi(29_000.0), ksi(29.0));
    limit(compact, 3.76 * 1000.0_f64.sqrt() / 2.0, 60.0);
    let pressed = |c: f64| composite::top_pressed(&mut Silent, inch(c));
    assert!(pressed(1e-9) && !pressed(0.0) && !pressed(-1.0));
    limit(|x| service::web_spared(&mut Silent, n(x)), 150.0, 151.0);
}

#[test]
fn panels_and_bearings() {
    limit(|x| shear::stiffened(&mut Silent, inch(x), inch(50.0)), 150.0, 151.0);
    limit(|x| shear::end_stiffened(&mut Silent, inch(x), inch(50.0)), 75.0, 76.0);
    let k = |d_0: f64| shear::panel_coefficient(&mut Silent, inch(d_0), inch(50.0)).q;
    assert_eq!((k(50.0), k(100.0)), (10.0, 6.25));
    let web = |x: f64| {
        shear::flanges_anchor(&mut Silent, inch(x), inch(0.5), inch(10.0), inch(1.0), inch(10.0), inch(1.0))
    };
    limit(web, 50.0, 51.0);
    limit(|x| bearing::short_bearing(&mut Silent, inch(x), inch(30.0)), 6.0, 7.0);
    limit(|x| bearing::bearing_long_enough(&mut Silent, inch(x), inch(2.0)), 2.0, 1.0);
}
