//! Flexure without a working slab: hand chains, published worked examples, printed formulas.
//!
//! The chains were worked in a spreadsheet of their own from the formulas of AASHTO LRFD 9th ed. A6 and
//! 6.10.8 (from memory); they check that the program runs those formulas, the published examples that
//! the formulas are right.

use girderbook_core::bridge::{Bracing, Embedded};
use girderbook_core::clauses::lrfd::steel::flange::Hold;
use girderbook_core::clauses::lrfd::steel::lateral::{self, Torsion};
use girderbook_core::clauses::lrfd::steel::noncomposite::{FlexureCase, nominal_moment};
use girderbook_core::clauses::lrfd::steel::{local, web};
use girderbook_core::problem::{Problem, Severity};
use girderbook_core::quantity::{Angle, Inertia, Length, Modulus, Moment, Stress};
use girderbook_core::section::effective::{Edge, Effective, Remains};
use girderbook_core::section::plate::IShape;
use girderbook_core::section::rolled;
use girderbook_core::units::Entered;
use girderbook_core::units::mark::{Deg, Inch, Ksi, One};
use girderbook_core::worksheet::{Recorder, Sheet, Silent, Val};
use girderbook_tests::evaluate::recheck;
use girderbook_tests::steel::{plates_in, remains, told};

/// What the cases below vary.
#[derive(Clone, Copy)]
struct Given {
    f_y: f64,
    l_b: Option<f64>,
    c_b: f64,
    torsion: Torsion,
    pressed: Edge,
    skew: f64,
}

const PLAIN: Given =
    Given { f_y: 36.0, l_b: None, c_b: 1.0, torsion: Torsion::Counted, pressed: Edge::Top, skew: 0.0 };

fn work<R: Recorder>(rec: &mut R, shape: &IShape, left: &Remains, g: Given) -> Result<Moment, Problem> {
    let section = Effective::at(rec, shape, left)?;
    let hold = match g.l_b {
        Some(l_b) => Hold::At(told(rec, "L_b", Length::from_inch(l_b), Inch)),
        None => Hold::Continuous,
    };
    let case = FlexureCase {
        section: &section,
        f_y: told(rec, "F_y", Stress::from_ksi(g.f_y), Ksi),
        f_y_path: "members[0].steel.yield_strength",
        pressed: g.pressed,
        hold: &hold,
        c_b: told(rec, "C_b", g.c_b, One),
        torsion: g.torsion,
        skew: told(rec, "skew", Angle::from_deg(g.skew), Deg),
    };
    nominal_moment(rec, &case).map(|m| m.q)
}

fn sound(shape: &IShape, g: Given) -> Moment {
    work(&mut Silent, shape, &Remains::default(), g).expect("a number")
}

fn near(got: f64, want: f64, rel: f64, what: &str) {
    assert!((got - want).abs() <= rel * want.abs(), "{what}: {got} against {want}");
}

/// The figure on the last line that bears the symbol.
fn line(sheet: &Sheet, symbol: &str) -> f64 {
    sheet.lines.iter().rfind(|l| l.symbol == symbol).unwrap_or_else(|| panic!("{symbol}")).figure
}

/// Hand chain: 33 ksi, braced at 15 ft, Cb 1. Without torsion Mn is 1,699.6 kip ft (2,304 kN m), with
/// it 1,758.2 kip ft (2,384 kN m).
#[test]
fn w36x182_of_33_ksi_braced_at_15_ft() {
    let shape = rolled::find("W36x182 (1980)").expect("in the catalogue").shape("s");
    let g = Given { f_y: 33.0, l_b: Some(180.0), torsion: Torsion::Neglected, ..PLAIN };
    let mut sheet = Sheet::default();
    let m = work(&mut sheet, &shape, &Remains::default(), g).expect("a number");
    near(m.in_kip_ft(), 1699.577, 1e-6, "Mn");
    near(m.in_kn_m(), 2304.3, 1e-4, "Mn");
    for (symbol, want) in [
        ("D", 33.97),
        ("D_c", 16.985),
        ("D_cp", 16.985),
        ("lambda_rw", 168.9728),
        ("lambda_pw", 104.6064),
        ("lambda_wp", 46.8552),
        ("lambda_pf", 11.2649),
        ("R_pc", 1.152_488),
        ("F_yr", 23.1),
        ("r_t", 3.0713),
        ("L_p", 91.0473),
        ("L_r", 341.8755),
        ("M_p", 23_694.0),
        ("M_yc", 20_559.0),
    ] {
        near(line(&sheet, symbol), want, 2e-5, symbol);
    }
    let counted = Given { torsion: Torsion::Counted, ..g };
    let mut sheet = Sheet::default();
    let m = work(&mut sheet, &shape, &Remains::default(), counted).expect("a number");
    near(m.in_kip_ft(), 1758.190, 1e-6, "Mn with torsion");
    near(line(&sheet, "J"), 16.7272, 1e-5, "J");
    near(line(&sheet, "L_r"), 409.8418, 1e-5, "L_r");
    // Present table: d 36.3, bf 12.1.
    let present = rolled::find("W36x182").expect("in the catalogue").shape("s");
    near(sound(&present, g).in_kip_ft(), 1699.577, 1e-3, "present table");
}

/// Each chain's result in kip in.
#[test]
fn hand_chains_of_every_branch() {
    let w36 = rolled::find("W36x182 (1980)").expect("in the catalogue").shape("s");
    let w21 = rolled::find("W21x48").expect("in the catalogue").shape("s");
    let thin = plates_in(51.5, (14.0, 0.75), 0.375, (14.0, 0.75));
    let unlike = plates_in(61.75, (14.0, 0.75), 0.5, (16.0, 1.0));
    let slender = plates_in(73.5, (16.0, 0.75), 0.5, (16.0, 0.75));
    let wide = plates_in(36.0, (18.0, 0.75), 0.5, (18.0, 0.75));
    let neglected = Given { torsion: Torsion::Neglected, ..PLAIN };
    for (what, shape, g, want) in [
        ("held along its length", &w36, Given { f_y: 33.0, ..PLAIN }, 23_694.0),
        ("elastic, no torsion", &w36, Given { f_y: 33.0, l_b: Some(360.0), ..neglected }, 12978.6934),
        ("elastic, torsion", &w36, Given { f_y: 33.0, l_b: Some(480.0), ..PLAIN }, 11439.3429),
        ("skew: 6.10.8", &w36, Given { f_y: 33.0, l_b: Some(180.0), skew: 30.0, ..PLAIN }, 18371.7119),
        ("noncompact web", &thin, Given { l_b: Some(180.0), ..PLAIN }, 23_528.238),
        ("unlike flanges", &unlike, Given { l_b: Some(240.0), ..PLAIN }, 29576.5399),
        ("unlike flanges, held", &unlike, PLAIN, 35470.5983),
        (
            "unlike flanges, bottom pressed",
            &unlike,
            Given { l_b: Some(240.0), pressed: Edge::Bottom, ..PLAIN },
            // The tension flange governs nothing: Rpt Myt is 42,202 kip in.
            38752.0149,
        ),
        ("slender web", &slender, Given { f_y: 50.0, l_b: Some(200.0), ..PLAIN }, 53606.0391),
        ("slender web, longer", &slender, Given { f_y: 50.0, l_b: Some(300.0), ..PLAIN }, 46210.6859),
        ("slender web, held", &slender, Given { f_y: 50.0, ..PLAIN }, 61680.0347),
        ("noncompact flange", &wide, Given { f_y: 50.0, l_b: Some(60.0), ..PLAIN }, 27871.1513),
        ("noncompact rolled flange", &w21, Given { f_y: 50.0, l_b: Some(40.0), ..PLAIN }, 5305.2832),
    ] {
        near(sound(shape, g).in_kip_in(), want, 2e-8, what);
    }
}

/// AISC Design Examples v16.0, F.1-1 to F.1-3, W18x50, 50 ksi: the buckling formulas of AISC 360 F2 and
/// of LRFD A6.3.3 are the same, with `r_ts` for `r_t` and 0.7 Fy for `F_yr`. Published: Lr 203 in,
/// Mn 5,050, 4,060 kip in (Lb 11.667 ft, Cb 1.01), phi Mn 288 kip ft (Lb 17.5 ft, Cb 1.30, elastic).
#[test]
fn w18x50_of_the_aisc_design_examples() {
    let rec = &mut Silent;
    let (e, f_y) = (Val::bare(Stress::from_ksi(29_000.0)), Val::bare(Stress::from_ksi(50.0)));
    let f_yr = Val::bare(Stress::from_ksi(35.0));
    let (s, z) = (Val::bare(Modulus::from_in3(88.9)), Val::bare(Modulus::from_in3(101.0)));
    let (r_t, j) = (Val::bare(Length::from_inch(1.98)), Val::bare(Inertia::from_in4(1.24)));
    let h = Val::bare(Length::from_inch(17.4));
    let m_p = web::plastic_moment(rec, f_y, z);
    near(m_p.q.in_kip_in(), 5050.0, 1e-12, "Mp");
    let m_yc = web::yield_compression(rec, f_y, s);
    let r_pc = web::plastification_compression(rec, m_p, m_yc);
    let l_r = lateral::elastic_length(rec, r_t, e, f_yr, j, s, h);
    assert!((l_r.q.in_inch() - 203.0).abs() < 0.5, "{}", l_r.q.in_inch());
    let l_p = Val::bare(Length::from_inch(69.9));
    let l_b = Val::bare(Length::from_ft(35.0 / 3.0));
    let third = lateral::inelastic_moment(rec, Val::bare(1.01), f_yr, s, r_pc, m_yc, l_b, l_p, l_r);
    near(third.q.in_kip_in(), 4060.0, 0.005, "braced at third points");
    let l_b = Val::bare(Length::from_ft(17.5));
    assert!(!lateral::medium(rec, l_b, l_r));
    let f_cr = lateral::elastic_stress(rec, Val::bare(1.30), e, l_b, r_t, j, s, h);
    let middle = lateral::elastic_moment(rec, f_cr, s, r_pc, m_yc);
    near(0.9 * middle.q.in_kip_ft(), 288.0, 0.002, "braced at midspan");
}

/// AISC Design Examples, F.3, W21x48, 50 ksi (from memory): flange 9.47 against 9.15 and 24.1 (AISC's
/// limit, 1.0 sqrt(E / Fy)), Mp 5,350, Mn 5,310 kip in.
#[test]
fn w21x48_noncompact_flange_of_the_aisc_design_examples() {
    let rec = &mut Silent;
    let f_y = Val::bare(Stress::from_ksi(50.0));
    let lambda_pf = local::compact_limit(rec, Val::bare(Stress::from_ksi(29_000.0)), f_y);
    near(lambda_pf.q, 9.15, 0.001, "limit of a compact flange");
    let (s, z) = (Val::bare(Modulus::from_in3(93.0)), Val::bare(Modulus::from_in3(107.0)));
    let m_p = web::plastic_moment(rec, f_y, z);
    let m_yc = web::yield_compression(rec, f_y, s);
    let r_pc = web::plastification_compression(rec, m_p, m_yc);
    let f_yr = Val::bare(Stress::from_ksi(35.0));
    let (lambda, limit) = (Val::bare(9.47), Val::bare(24.1));
    let m = local::buckling_moment(rec, f_yr, s, r_pc, m_yc, lambda, lambda_pf, limit);
    near(m.q.in_kip_in(), 5310.0, 0.001, "Mn");
}

/// Torsion constant of plates against tables with their fillets (AISC): always below, by up to 12 %.
#[test]
fn the_torsion_constant_is_on_the_safe_side_of_tables() {
    for (name, table) in
        [("W18x50", 1.24), ("W36x150", 10.1), ("W21x62", 1.83), ("W27x94", 4.03), ("W14x90", 4.06)]
    {
        let s = rolled::find(name).expect("in the catalogue");
        let v = Val::bare;
        let depth = s.depth - 2.0 * s.flange;
        let j = lateral::torsion_constant(
            &mut Silent,
            v(depth),
            v(s.web),
            v(s.width),
            v(s.flange),
            v(s.width),
            v(s.flange),
        );
        let part = j.q.in_in4() / table;
        assert!(part > 0.87 && part < 1.0, "{name}: {part}");
    }
}

/// Moment gradient modifier at known points: 1.0 for equal ends, 1.75 for a far end without stress,
/// 2.3 at most for double curvature.
#[test]
fn moment_gradients() {
    let c_b = |f_1: f64| {
        let v = |f| Val::bare(Stress::from_ksi(f));
        lateral::moment_gradient(&mut Silent, v(f_1), v(10.0)).q
    };
    near(c_b(10.0), 1.0, 1e-12, "equal");
    near(c_b(0.0), 1.75, 1e-12, "nothing at the far end");
    near(c_b(-10.0), 2.3, 1e-12, "double curvature");
    near(c_b(5.0), 1.75 - 0.525 + 0.075, 1e-12, "half");
}

#[test]
fn a_girder_with_loss_is_rated_on_what_is_left() {
    let shape = rolled::find("W36x182 (1980)").expect("in the catalogue").shape("s");
    let g = Given { f_y: 33.0, ..PLAIN };
    let mut sheet = Sheet::default();
    let left = Remains {
        top: None,
        bottom: Some(told(&mut sheet, "t_bot", Length::from_inch(0.9), Inch)),
        web: Some(told(&mut sheet, "t_w", Length::from_inch(0.6), Inch)),
        path: "findings[0]",
    };
    let m = work(&mut sheet, &shape, &left, g).expect("a number");
    // Z of the table less the plates' loss, by hand: 718 - (709.990 - 608.223) = 616.233 in3.
    let z = 616.233_213;
    near(m.in_kip_in(), 33.0 * z, 1e-8, "Mp of what is left");
    assert!(recheck(&sheet).expect("every line comes out the same") > 50);
}

#[test]
fn every_branch_prints_lines_that_work_out_again() {
    let w36 = rolled::find("W36x182").expect("in the catalogue").shape("s");
    let unlike = plates_in(61.75, (14.0, 0.75), 0.5, (16.0, 1.0));
    let slender = plates_in(73.5, (16.0, 0.75), 0.5, (16.0, 0.75));
    let wide = plates_in(36.0, (18.0, 0.75), 0.5, (18.0, 0.75));
    for shape in [&w36, &unlike, &slender, &wide] {
        for l_b in [None, Some(60.0), Some(200.0), Some(600.0)] {
            for torsion in [Torsion::Counted, Torsion::Neglected] {
                for pressed in [Edge::Top, Edge::Bottom] {
                    let mut sheet = Sheet::default();
                    let g = Given { l_b, torsion, pressed, ..PLAIN };
                    let told = work(&mut sheet, shape, &Remains::default(), g).expect("a number");
                    assert!(recheck(&sheet).expect("every line comes out the same") > 25);
                    assert_eq!(told, sound(shape, g), "silent and written agree");
                }
            }
        }
    }
}

#[test]
fn what_is_missing_or_outside_gets_no_number() {
    let w36 = rolled::find("W36x182").expect("in the catalogue").shape("s");
    let section = Effective::at(&mut Silent, &w36, &Remains::default()).expect("a section");
    let path = "members[0].bracing.spacing";
    let bracing = |spacing, embedded| Bracing { spacing, embedded };
    let spacing = || Some(Entered::measured(path, Length::from_ft(15.0)));
    let hold = Hold::of(&mut Silent, &bracing(None, Embedded::NotInspected), path);
    let case = FlexureCase {
        section: &section,
        f_y: Val::bare(Stress::from_ksi(33.0)),
        f_y_path: "members[0].steel.yield_strength",
        pressed: Edge::Top,
        hold: &hold,
        c_b: Val::bare(1.0),
        torsion: Torsion::Neglected,
        skew: Val::bare(Angle::ZERO),
    };
    let problem = nominal_moment(&mut Silent, &case).expect_err("no number");
    assert_eq!((problem.severity, problem.path.as_str()), (Severity::Missing, path));
    assert!(matches!(Hold::of(&mut Silent, &bracing(spacing(), Embedded::Yes), path), Hold::Continuous));
    for embedded in [Embedded::No, Embedded::NotInspected] {
        assert!(matches!(Hold::of(&mut Silent, &bracing(spacing(), embedded), path), Hold::At(_)));
    }

    let refused =
        |shape: &IShape, left: &Remains, g| work(&mut Silent, shape, left, g).expect_err("no number").path;
    let none = Remains::default();
    assert_eq!(refused(&w36, &none, Given { f_y: 101.0, ..PLAIN }), "members[0].steel.yield_strength");
    assert_eq!(refused(&w36, &none, Given { f_y: 0.0, ..PLAIN }), "members[0].steel.yield_strength");
    let tall = plates_in(80.0, (16.0, 1.0), 0.5, (16.0, 1.0));
    assert_eq!(refused(&tall, &none, PLAIN), "section.web");
    let flat = plates_in(36.0, (18.1, 0.75), 0.5, (18.0, 0.75));
    assert_eq!(refused(&flat, &none, PLAIN), "section.top.thickness");
    let unlike = plates_in(36.0, (6.0, 0.75), 0.5, (18.0, 0.75));
    assert_eq!(refused(&unlike, &none, PLAIN), "section.top.thickness");
    let heavy = plates_in(20.0, (20.0, 6.0), 0.5, (20.0, 0.9));
    assert_eq!(refused(&heavy, &none, PLAIN), "section.top.thickness");
    // Thinned by corrosion below a 24th of its width: the finding is named.
    let thinned = remains(None, None, Some(0.45));
    assert_eq!(refused(&w36, &thinned, PLAIN), "findings[0]");
    let flat = plates_in(36.0, (18.0, 0.75), 0.5, (18.1, 0.75));
    assert_eq!(refused(&flat, &none, PLAIN), "section.bottom.thickness");
}
