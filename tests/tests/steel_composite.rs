//! Composite flexure: published examples, hand chains by stages, ductility, printed formulas.

use girderbook_core::clauses::lrfd::steel::composite::{
    CompositeCase, axis_high, ductile, nominal_moment, reduced, slab_force, yield_moment,
};
use girderbook_core::problem::Problem;
use girderbook_core::quantity::{Area, Force, Inertia, Length, Moment, Stress};
use girderbook_core::resistance::plastic::{Axis, Forces, plastic};
use girderbook_core::section::composite::{Composite, Slab};
use girderbook_core::section::effective::{Effective, Remains};
use girderbook_core::section::parts::{Own, Part, compose};
use girderbook_core::section::plate::IShape;
use girderbook_core::units::mark::{Inch, KipIn, Ksi, One};
use girderbook_core::worksheet::{Recorder, Sheet, Silent, Val};
use girderbook_tests::evaluate::recheck;
use girderbook_tests::steel::{plates_in, remains, told};

fn near(got: f64, want: f64, rel: f64, what: &str) {
    assert!((got - want).abs() <= rel * want.abs(), "{what}: {got} against {want}");
}

fn inch(x: f64) -> Val<Length> {
    Val::bare(Length::from_inch(x))
}

fn kip(x: f64) -> Val<Force> {
    Val::bare(Force::from_kip(x))
}

/// MBE appendix A, example A1 (from memory; recomputed): W33x130 with a cover plate of 10 1/2 by 5/8 in
/// below, 36 ksi, slab 7 1/4 in by 88 in of 3 ksi, no haunch. Plates alone: Mp 3,029 kip ft, Mn 2,873
/// kip ft (remembered), a 7.13 in. With the handbook's 38.3 in2: Mp 3,050, Mn 2,888, a 7.197 in.
#[test]
fn cover_plated_stringer_of_the_mbe() {
    let rec = &mut Silent;
    let (f_y, plate, flange) = (36.0, 10.5 * 0.625, 11.51 * 0.855);
    let p_s = slab_force(rec, Val::bare(Stress::from_ksi(3.0)), inch(88.0), inch(7.25));
    near(p_s.q.in_kip(), 1626.9, 1e-9, "Ps");
    let web = 33.09 - 2.0 * 0.855;
    // Flange and cover plate act together at the middle of both, below the web.
    let middle = (flange * 0.4275 + plate * (0.855 + 0.3125)) / (flange + plate);
    let total = inch(33.09 + 0.625 + 7.25);
    for (web_area, m_p_want, m_n_want, a_want) in
        [(web * 0.58, 3029.2, 2872.2, 7.130), (38.3 - 2.0 * flange, 3050.1, 2888.5, 7.197)]
    {
        let forces = Forces {
            p_s,
            t_s: inch(7.25),
            gap: inch(0.0),
            p_c: kip(f_y * flange),
            t_c: inch(0.855),
            p_w: kip(f_y * web_area),
            web_depth: inch(web),
            p_t: kip(f_y * (flange + plate)),
            t_t: inch(2.0 * middle),
        };
        let p = plastic(rec, &forces, "").expect("an axis");
        assert_eq!(p.axis, Axis::Slab);
        near(p.d_p.q.in_inch(), a_want, 2e-4, "depth of the block");
        near(p.moment.q.in_kip_ft(), m_p_want, 1e-4, "Mp");
        assert!(ductile(rec, p.d_p, total) && !axis_high(rec, p.d_p, total));
        let m_n = reduced(rec, p.moment, p.d_p, total);
        near(m_n.q.in_kip_ft(), m_n_want, 1e-4, "Mn");
        if m_n_want < 2880.0 {
            near(m_n.q.in_kip_ft(), 2873.0, 1e-3, "Mn as remembered");
        }
    }
}

/// The same example's section: A 44.86 in2, yb 14.7 in, I 8,302 in4 (from memory, recomputed).
#[test]
fn section_of_the_cover_plated_stringer_of_the_mbe() {
    let area = |x| Val::bare(Area::from_in2(x));
    let totals = compose(
        &mut Silent,
        [
            Part {
                what: "W33x130",
                area: area(38.3),
                y: inch(33.09 / 2.0 + 0.625),
                own: Own::Known(Val::bare(Inertia::from_in4(6710.0))),
            },
            Part {
                what: "cover plate",
                area: area(6.5625),
                y: inch(0.3125),
                own: Own::Rectangle { b: inch(10.5), t: inch(0.625) },
            },
        ],
    );
    near(totals.area.q.in_in2(), 44.86, 1e-4, "area");
    near(totals.y.q.in_inch(), 14.7, 1e-3, "centroid");
    near(totals.inertia.q.in_in4(), 8302.0, 3e-4, "inertia");
}

/// AISC Design Examples v16.0, example I.1, W21x50, 50 ksi: studs carry 386 kip, block 0.946 in deep at the
/// top of 7.5 in, phi Mn 769 kip ft (phi 0.90), Mn / omega 512 kip ft (omega 1.67).
#[test]
fn partially_composite_beam_of_the_aisc_design_examples() {
    let (f_y, flange) = (50.0, 6.53 * 0.535);
    let a = 386.0 / (0.85 * 4.0 * 120.0);
    near(a, 0.946, 1e-3, "depth of the block");
    let forces = Forces {
        p_s: kip(386.0),
        t_s: inch(a),
        gap: inch(7.5 - a),
        p_c: kip(f_y * flange),
        t_c: inch(0.535),
        // The web with the fillets that the handbook's area of 14.7 in2 contains.
        p_w: kip(f_y * (14.7 - 2.0 * flange)),
        web_depth: inch(20.8 - 2.0 * 0.535),
        p_t: kip(f_y * flange),
        t_t: inch(0.535),
    };
    let p = plastic(&mut Silent, &forces, "").expect("an axis");
    assert_eq!(p.axis, Axis::TopFlange);
    near(p.d_p.q.in_inch() - 7.5, 0.534, 2e-3, "axis below the top of the flange");
    near(0.90 * p.moment.q.in_kip_ft(), 769.0, 0.002, "phi Mn");
    near(p.moment.q.in_kip_ft() / 1.67, 512.0, 0.002, "Mn / omega");
}

/// The example of the hand chains: 36 in deep, top 12 by 3/4, web 1/2, bottom 14 by 1, slab 90 by 8 in.
struct Bridge {
    f_y: f64,
    f_c: f64,
    t_s: f64,
    continuous: bool,
}

fn girder() -> IShape {
    plates_in(36.0, (12.0, 0.75), 0.5, (14.0, 1.0))
}

fn work<R: Recorder>(
    rec: &mut R,
    shape: &IShape,
    left: &Remains,
    b: &Bridge,
) -> Result<(Moment, Moment), Problem> {
    let steel = Effective::at(rec, shape, left)?;
    let slab = Slab {
        b_e: told(rec, "b_e", Length::from_inch(90.0), Inch),
        t_s: told(rec, "t_s", Length::from_inch(b.t_s), Inch),
        haunch: told(rec, "haunch", Length::from_inch(1.0), Inch),
        f_c: told(rec, "f_c", Stress::from_ksi(b.f_c), Ksi),
        n: told(rec, "n", 8.0, One),
        n_long: told(rec, "n_3", 24.0, One),
        path: "deck.slab",
    };
    let section = Composite::of(rec, &steel, slab)?;
    let case = CompositeCase {
        section: &section,
        f_y: told(rec, "F_y", Stress::from_ksi(b.f_y), Ksi),
        f_y_path: "members[0].steel.yield_strength",
        continuous: b.continuous,
        m_d1: told(rec, "M_D1", Moment::from_kip_ft(400.0), KipIn),
        m_d2: told(rec, "M_D2", Moment::from_kip_ft(100.0), KipIn),
    };
    let first = yield_moment(rec, &case, case.f_y);
    nominal_moment(rec, &case).map(|m| (m.q, first.q))
}

/// Chains worked apart, kip in. Steel: I 8,582.3465 in4, y 15.9007; n 8: y 33.2604, I 26,545.51; n 24: y
/// 26.6384, I 19,556.35.
#[test]
fn hand_chains_by_stages() {
    let of = |f_y, f_c, continuous| {
        let b = Bridge { f_y, f_c, t_s: 8.0, continuous };
        let (m_n, m_y) = work(&mut Silent, &girder(), &Remains::default(), &b).expect("a number");
        (m_n.in_kip_in(), m_y.in_kip_in())
    };
    // 50 ksi, simple span: axis 6.556 in deep, 0.1457 of the depth; Mp 51,803.61.
    let (m_n, m_y) = of(50.0, 4.0, false);
    near(m_n, 50_146.512_836, 1e-9, "Mn");
    near(m_y, 37_503.313_646, 1e-9, "My");
    // Continuous: 1.3 My is less.
    near(of(50.0, 4.0, true).0, 48_754.307_740, 1e-9, "cap");
    // 80 ksi: noncompact, the concrete reaches 0.6 f'c first.
    let (m_n, m_y) = of(80.0, 4.0, false);
    near(m_n, 48_215.091_163, 1e-9, "Mn by the concrete");
    near(m_y, 61_446.626_393, 1e-9, "My");
    near(of(80.0, 3.0, false).0, 37_361.318_372, 1e-9, "Mn by weaker concrete");
    // 80 ksi with strong concrete: the bottom flange yields first.
    near(of(80.0, 9.0, false).0, 61_446.626_393, 1e-9, "Mn by the steel");
}

/// A thin slab of weak concrete on a deep web: the axis is too deep, and there is no number.
#[test]
fn a_section_that_is_not_ductile_gets_no_number() {
    let b = Bridge { f_y: 50.0, f_c: 2.0, t_s: 3.0, continuous: false };
    let shape = plates_in(50.0, (12.0, 0.75), 0.5, (20.0, 2.0));
    let problem = work(&mut Silent, &shape, &Remains::default(), &b).expect_err("no number");
    assert_eq!(problem.path, "deck.slab");
    let b = Bridge { t_s: 0.0, ..b };
    assert_eq!(work(&mut Silent, &girder(), &Remains::default(), &b).expect_err("no slab").path, "deck.slab");
    let b = Bridge { f_y: 120.0, f_c: 4.0, t_s: 8.0, continuous: false };
    let problem = work(&mut Silent, &girder(), &Remains::default(), &b).expect_err("no number");
    assert_eq!(problem.path, "members[0].steel.yield_strength");
}

/// Where the axis moves from one part to the next, the moment does not jump.
#[test]
fn the_plastic_moment_is_continuous_where_the_axis_changes_parts() {
    let at = |p_s: f64| {
        let forces = Forces {
            p_s: kip(p_s),
            t_s: inch(8.0),
            gap: inch(1.0),
            p_c: kip(300.0),
            t_c: inch(0.75),
            p_w: kip(600.0),
            web_depth: inch(34.0),
            p_t: kip(400.0),
            t_t: inch(1.0),
        };
        plastic(&mut Silent, &forces, "").expect("an axis")
    };
    // Slab 700 kip: web and bottom flange outweigh it and the top flange exactly; 1,300: all steel.
    for p_s in [700.0, 1300.0] {
        let (below, above) = (at(p_s * (1.0 - 1e-9)), at(p_s * (1.0 + 1e-9)));
        assert_ne!(below.axis, above.axis);
        near(below.moment.q.in_kip_in(), above.moment.q.in_kip_in(), 1e-8, "moment");
    }
    // Fibres: the moment is the sum of forces times distances from the axis, whatever the case.
    for p_s in [200.0, 690.0, 1000.0, 1290.0, 2000.0] {
        let p = at(p_s);
        let axis = p.d_p.q.in_inch();
        let mut sum = 0.0;
        for (force, from, to, concrete) in [
            (p_s, 0.0, 8.0, true),
            (300.0, 9.0, 9.75, false),
            (600.0, 9.75, 43.75, false),
            (400.0, 43.75, 44.75, false),
        ] {
            let steps = 20_000;
            for i in 0..steps {
                let y = from + (to - from) * (f64::from(i) + 0.5) / f64::from(steps);
                if !concrete || y < axis {
                    sum += force / f64::from(steps) * (y - axis).abs();
                }
            }
        }
        near(p.moment.q.in_kip_in(), sum, 1e-6, "fibres");
    }
}

#[test]
fn every_branch_prints_lines_that_work_out_again() {
    for (f_y, f_c, t_s) in [(36.0, 3.0, 8.0), (50.0, 3.0, 4.0), (80.0, 4.0, 8.0), (36.0, 5.0, 10.0)] {
        for continuous in [false, true] {
            for loss in [0.0, 0.15] {
                let b = Bridge { f_y, f_c, t_s, continuous };
                let left = |rec: &mut Sheet| Remains {
                    top: Some(told(rec, "t_top", Length::from_inch(0.75 - loss), Inch)),
                    web: Some(told(rec, "t_w", Length::from_inch(0.5 - loss), Inch)),
                    bottom: Some(told(rec, "t_bot", Length::from_inch(1.0 - loss), Inch)),
                    path: "findings[0]",
                };
                let mut sheet = Sheet::default();
                let left = left(&mut sheet);
                let written = work(&mut sheet, &girder(), &left, &b).expect("a number");
                assert!(recheck(&sheet).expect("every line comes out the same") > 50);
                assert_eq!(written, work(&mut Silent, &girder(), &left, &b).expect("a number"));
            }
        }
    }
}

/// Less steel, less moment; with the slab and the loads held.
#[test]
fn loss_lowers_the_composite_moment() {
    let b = Bridge { f_y: 36.0, f_c: 3.0, t_s: 8.0, continuous: false };
    let at = |top, web, bottom| {
        let left = remains(Some(top), Some(web), Some(bottom));
        work(&mut Silent, &girder(), &left, &b).expect("a number").0.in_kip_in()
    };
    let sound = at(0.75, 0.5, 1.0);
    for less in [at(0.6, 0.5, 1.0), at(0.75, 0.4, 1.0), at(0.75, 0.5, 0.7), at(0.6, 0.4, 0.7)] {
        assert!(less < sound, "{less} against {sound}");
    }
}
