//! Service limits, shear of webs, webs over bearings, material and resistance factors.

use girderbook_core::bridge::Straightness;
use girderbook_core::clauses::lrfd::steel::bearing::{self, BearingCase, Place, web_crippling, web_yielding};
use girderbook_core::clauses::lrfd::steel::shear::{Panel, ShearCase, nominal_shear};
use girderbook_core::clauses::lrfd::steel::{material, phi, service};
use girderbook_core::problem::{Problem, Severity};
use girderbook_core::quantity::{Force, Length, Stress};
use girderbook_core::section::effective::{Edge, Effective, Remains};
use girderbook_core::section::plate::IShape;
use girderbook_core::section::rolled;
use girderbook_core::units::Entered;
use girderbook_core::units::mark::{Inch, Ksi};
use girderbook_core::worksheet::{Sheet, Silent, Val};
use girderbook_tests::evaluate::recheck;
use girderbook_tests::steel::{plates_in, remains, told};

fn near(got: f64, want: f64, rel: f64, what: &str) {
    assert!((got - want).abs() <= rel * want.abs(), "{what}: {got} against {want}");
}

fn inch(x: f64) -> Val<Length> {
    Val::bare(Length::from_inch(x))
}

fn ksi(x: f64) -> Val<Stress> {
    Val::bare(Stress::from_ksi(x))
}

/// 0.80 and 0.95 of the yield strength (6.10.4.2.2): 26.4 and 31.35 ksi for 33 ksi.
#[test]
fn service_limits() {
    let shape = rolled::find("W36x182").expect("in the catalogue").shape("s");
    let mut sheet = Sheet::default();
    let section = Effective::at(&mut sheet, &shape, &Remains::default()).expect("a section");
    let f_y = told(&mut sheet, "F_y", Stress::from_ksi(33.0), Ksi);
    let plain = service::noncomposite(&mut sheet, &section, f_y, "y", Edge::Top).expect("limits");
    near(plain.top.q.in_ksi(), 26.4, 1e-12, "top");
    near(plain.bottom.q.in_ksi(), 26.4, 1e-12, "bottom");
    let composite = service::composite(&mut sheet, &section, f_y, "y").expect("limits");
    near(composite.top.q.in_ksi(), 31.35, 1e-12, "top");
    near(composite.bottom.q.in_ksi(), 31.35, 1e-12, "bottom");
    let m = service::moment_of_limit(&mut sheet, plain.bottom, section.left.s_bottom);
    near(m.q.in_kip_in(), 26.4 * 623.0, 1e-12, "moment");
    let f = service::stress(&mut sheet, m, section.left.s_bottom);
    near(f.q.in_ksi(), 26.4, 1e-12, "stress");
    assert!(recheck(&sheet).expect("every line comes out the same") > 10);
}

/// A slender web whose compressed part is deep: bend buckling governs its compression flange. D 72,
/// tw 0.5, Dc 44.22 (D / tw 144): k 9 / (44.22 / 72)^2 = 23.86, F_crw 0.9 x 29,000 x 23.86 / 144^2 =
/// 30.03 ksi, below 0.8 x 50 = 40.
#[test]
fn bend_buckling_of_the_web_in_service() {
    let shape = plates_in(74.0, (14.0, 0.75), 0.5, (18.0, 1.25));
    let section = Effective::at(&mut Silent, &shape, &Remains::default()).expect("a section");
    let limits = service::noncomposite(&mut Silent, &section, ksi(50.0), "y", Edge::Top).expect("limits");
    let (a_t, a_w, a_b) = (10.5, 36.0, 22.5);
    let y = (a_t * 73.625 + a_w * 37.25 + a_b * 0.625) / (a_t + a_w + a_b);
    let d_c = 73.25 - y;
    let f_crw = 0.9 * 29_000.0 * 9.0 / (d_c / 72.0_f64).powi(2) / 144.0_f64.powi(2);
    assert!(f_crw < 40.0 && f_crw > 25.0, "{f_crw}");
    near(limits.top.q.in_ksi(), f_crw, 1e-9, "top");
    near(limits.bottom.q.in_ksi(), 40.0, 1e-12, "bottom");
    let turned = service::noncomposite(&mut Silent, &section, ksi(50.0), "y", Edge::Bottom).expect("limits");
    near(turned.top.q.in_ksi(), 40.0, 1e-12, "top, bottom pressed");
}

fn shear(shape: &IShape, f_y: f64, panel: Panel) -> Result<Force, Problem> {
    let section = Effective::at(&mut Silent, shape, &Remains::default())?;
    shear_of(&section, f_y, panel, Straightness::Straight)
}

fn shear_of(section: &Effective, f_y: f64, panel: Panel, web: Straightness) -> Result<Force, Problem> {
    let case =
        ShearCase { section, f_yw: ksi(f_y), f_y_path: "y", panel, web, web_path: "findings[0].straight" };
    nominal_shear(&mut Silent, &case).map(|v| v.q)
}

/// Web 69 by 1/2 in, 50 ksi: Vp 1,001 kip; end panel of 87 in: C 0.39, Vn 390 kip; interior panels of
/// 207 in: Vn 468 kip (FHWA Steel Bridge Design Handbook, design example 1, from memory).
#[test]
fn stiffened_web_of_a_published_example() {
    let shape = plates_in(71.0, (16.0, 1.0), 0.5, (18.0, 1.0));
    near(shear(&shape, 50.0, Panel::End(inch(87.0))).expect("Vn").in_kip(), 390.0, 0.003, "end panel");
    near(
        shear(&shape, 50.0, Panel::Interior(inch(207.0))).expect("Vn").in_kip(),
        468.0,
        0.002,
        "interior panel",
    );
    // Farther apart they do not count: C = 1.57 / 138^2 x 29,000 x 5 / 50 = 0.23908.
    for panel in [Panel::Unstiffened, Panel::Interior(inch(207.1)), Panel::End(inch(103.6))] {
        near(shear(&shape, 50.0, panel).expect("Vn").in_kip(), 1000.5 * 0.239_078, 1e-5, "unstiffened");
    }
    // Small flanges anchor only part of the tension field.
    let small = plates_in(70.0, (12.0, 0.5), 0.5, (12.0, 0.5));
    let c = 1.57 / 138.0_f64.powi(2) * (29_000.0 * (5.0 + 5.0 / 9.0) / 50.0);
    let want = 1000.5 * (c + 0.87 * (1.0 - c) / (10.0_f64.sqrt() + 3.0));
    near(
        shear(&small, 50.0, Panel::Interior(inch(207.0))).expect("Vn").in_kip(),
        want,
        1e-9,
        "partly anchored",
    );
}

/// Unstiffened webs by hand: yielding (W36x182, 33 ksi, D 33.94: 0.58 x 33 x 33.94 x 0.725), and the
/// two ways of buckling (50 ksi: limits 60.3 and 75.4).
#[test]
fn unstiffened_webs_by_hand() {
    let w36 = rolled::find("W36x182").expect("in the catalogue").shape("s");
    near(shear(&w36, 33.0, Panel::Unstiffened).expect("Vn").in_kip(), 470.96, 2e-5, "yields");
    let web = |depth: f64| plates_in(depth + 2.0, (16.0, 1.0), 0.5, (16.0, 1.0));
    // 0.58 x 50 x 30 x 0.5 = 435.0 kip.
    near(shear(&web(30.0), 50.0, Panel::Unstiffened).expect("Vn").in_kip(), 435.0, 1e-12, "D / tw 60");
    // D / tw 70: 1.12 / 70 x 53.852 = 0.86163; Vp 507.5.
    near(shear(&web(35.0), 50.0, Panel::Unstiffened).expect("Vn").in_kip(), 437.277, 1e-5, "D / tw 70");
    // D / tw 100: 1.57 / 10,000 x 2,900 = 0.4553; Vp 725.
    near(shear(&web(50.0), 50.0, Panel::Unstiffened).expect("Vn").in_kip(), 330.0925, 1e-9, "D / tw 100");
}

/// Both limits of C are points where the branches meet: within 0.2 %, which is how 1.12, 1.40 and 1.57
/// are rounded (1.12 x 1.40 = 1.568).
#[test]
fn shear_branches_meet() {
    for limit in [1.12, 1.40] {
        let depth = 0.5 * limit * (29_000.0_f64 * 5.0 / 50.0).sqrt();
        let v = |d: f64| {
            let shape = plates_in(d + 2.0, (16.0, 1.0), 0.5, (16.0, 1.0));
            shear(&shape, 50.0, Panel::Unstiffened).expect("Vn").in_kip() / d
        };
        near(v(depth * (1.0 + 1e-9)), v(depth * (1.0 - 1e-9)), 0.002, "at the limit");
    }
}

#[test]
fn a_web_that_is_bent_or_too_slender_gets_no_shear() {
    let w36 = rolled::find("W36x182").expect("in the catalogue").shape("s");
    let section = Effective::at(&mut Silent, &w36, &Remains::default()).expect("a section");
    let of = |web| shear_of(&section, 33.0, Panel::Unstiffened, web);
    assert_eq!(of(Straightness::Not).expect_err("no number").path, "findings[0].straight");
    assert_eq!(of(Straightness::NotInspected).expect("Vn"), of(Straightness::Straight).expect("Vn"));
    let worn = Effective::at(&mut Silent, &w36, &remains(None, Some(0.2), None)).expect("a section");
    let problem = shear_of(&worn, 33.0, Panel::Unstiffened, Straightness::Straight).expect_err("no number");
    assert_eq!(problem.path, "findings[0]");
}

fn bearing_case<'a>(section: &'a Effective<'a>, t_w: f64, f_y: f64, n: f64, place: Place) -> BearingCase<'a> {
    BearingCase {
        section,
        t_w: inch(t_w),
        f_yw: ksi(f_y),
        n: inch(n),
        n_path: "members[0].bearing_length",
        place,
        web: Straightness::Straight,
        web_path: "lines[0].ends[0]",
    }
}

/// AISC Manual table 9-4 and Design Examples J.6, W18x50, 50 ksi (from memory): phi R1 43.1 kip, phi R2
/// 17.8 kip/in (yielding, phi 1.00); and, for bearings longer than a fifth of the depth,
/// phi R5 52.0 kip, phi R6 6.30 kip/in (crippling, phi 0.75). The formulas of AISC 360 J10.2 and J10.3
/// are those of D6.5.2 and D6.5.3; the resistance factors differ.
#[test]
fn w18x50_over_a_bearing_as_the_aisc_manual_has_it() {
    let shape = rolled::find("W18x50").expect("in the catalogue").shape("s");
    let section = Effective::at(&mut Silent, &shape, &Remains::default()).expect("a section");
    let case = bearing_case(&section, 0.355, 50.0, 10.0, Place::End);
    let yielding = web_yielding(&mut Silent, &case).expect("Rn").q.in_kip();
    near(yielding, 43.1 + 17.8 * 10.0, 0.003, "yielding");
    let crippling = web_crippling(&mut Silent, &case).expect("Rn").q.in_kip();
    near(0.75 * crippling, 52.0 + 6.30 * 10.0, 0.001, "crippling");
}

/// By hand, W18x50 (d 18.0, tf 0.57, tw 0.355, k 0.972): sqrt(E Fy tf / tw) = 1,525.85 ksi,
/// (tw / tf)^1.5 = 0.491504.
#[test]
fn bearings_by_hand() {
    let shape = rolled::find("W18x50").expect("in the catalogue").shape("s");
    let section = Effective::at(&mut Silent, &shape, &Remains::default()).expect("a section");
    let of = |n, place| {
        let case = bearing_case(&section, 0.355, 50.0, n, place);
        let r = |v: Result<Val<Force>, Problem>| v.expect("Rn").q.in_kip();
        (r(web_yielding(&mut Silent, &case)), r(web_crippling(&mut Silent, &case)))
    };
    let root = (29_000.0_f64 * 50.0 * 0.57 / 0.355).sqrt();
    let part = (0.355_f64 / 0.57).powf(1.5);
    let square = 0.355 * 0.355;
    let (y, c) = of(3.0, Place::End);
    near(y, (2.43 + 3.0) * 17.75, 1e-12, "end yielding");
    near(c, 0.4 * square * (1.0 + 0.5 * part) * root, 1e-12, "end crippling, short");
    let (y, c) = of(3.0, Place::Interior);
    near(y, (4.86 + 3.0) * 17.75, 1e-12, "interior yielding");
    near(c, 0.8 * square * (1.0 + 0.5 * part) * root, 1e-12, "interior crippling");
    let (_, c) = of(6.0, Place::End);
    near(c, 0.4 * square * (1.0 + (24.0 / 18.0 - 0.2) * part) * root, 1e-12, "end crippling, long");
    // Both formulas give the same at a fifth of the depth.
    let (_, short) = of(3.6, Place::End);
    let (_, long) = of(3.6 + 1e-9, Place::End);
    near(short, long, 1e-9, "a fifth of the depth");
}

/// One millimetre of the lowest band: W36x182, 33 ksi, N 8 in, 12 mm against 11 mm. Crippling goes
/// about with the square of the thickness.
#[test]
fn one_millimetre_of_web_over_the_bearing() {
    let shape = rolled::find("W36x182").expect("in the catalogue").shape("s");
    let section = Effective::at(&mut Silent, &shape, &Remains::default()).expect("a section");
    let at = |mm: f64| {
        let case = bearing_case(&section, mm / 25.4, 33.0, 8.0, Place::End);
        web_crippling(&mut Silent, &case).expect("Rn").q.in_kip()
    };
    let lost = 1.0 - at(11.0) / at(12.0);
    assert!(lost > 0.12 && lost < 0.20, "{lost}");
}

#[test]
fn a_web_over_a_bearing_that_is_bent_unknown_or_gone_gets_no_number() {
    let shape = rolled::find("W36x182").expect("in the catalogue").shape("s");
    let section = Effective::at(&mut Silent, &shape, &Remains::default()).expect("a section");
    let case = bearing_case(&section, 0.725, 33.0, 8.0, Place::End);
    for (web, severity) in
        [(Straightness::Not, Severity::Error), (Straightness::NotInspected, Severity::Missing)]
    {
        let case = BearingCase { web, ..case };
        for problem in [web_yielding(&mut Silent, &case), web_crippling(&mut Silent, &case)] {
            let problem = problem.expect_err("no number");
            assert_eq!((problem.severity, problem.path.as_str()), (severity, "lines[0].ends[0]"));
        }
    }
    let gone = BearingCase { t_w: inch(0.0), ..case };
    assert!(web_crippling(&mut Silent, &gone).is_err() && web_yielding(&mut Silent, &gone).is_err());
    let short = BearingCase { n: inch(1.0), ..case };
    assert_eq!(web_yielding(&mut Silent, &short).expect_err("no number").path, "members[0].bearing_length");
    assert!(web_yielding(&mut Silent, &BearingCase { place: Place::Interior, ..short }).is_ok());
    assert_eq!(bearing::length(&mut Silent, None, "n").expect_err("missing").severity, Severity::Missing);
    let n = Entered::measured("n", Length::from_inch(8.0));
    assert_eq!(bearing::length(&mut Silent, Some(&n), "n").expect("N").q, n.value);
}

#[test]
fn lines_of_shear_and_bearing_work_out_again() {
    let mut sheet = Sheet::default();
    let rec = &mut sheet;
    for (depth, d_0) in [(30.0, 40.0), (35.0, 60.0), (50.0, 100.0)] {
        let shape = plates_in(depth + 2.0, (16.0, 1.0), 0.5, (16.0, 1.0));
        let section = Effective::at(rec, &shape, &Remains::default()).expect("a section");
        let f_y = told(rec, "F_y", Stress::from_ksi(50.0), Ksi);
        let d_0 = told(rec, "d_0", Length::from_inch(d_0), Inch);
        for panel in [Panel::Unstiffened, Panel::Interior(d_0), Panel::End(d_0)] {
            let web = Straightness::Straight;
            let case = ShearCase { section: &section, f_yw: f_y, f_y_path: "", panel, web, web_path: "" };
            nominal_shear(rec, &case).expect("Vn");
        }
        for (n, place) in [(4.0, Place::End), (15.0, Place::End), (4.0, Place::Interior)] {
            let case = BearingCase {
                t_w: told(rec, "t_w", Length::from_inch(0.4), Inch),
                f_yw: f_y,
                n: told(rec, "N", Length::from_inch(n), Inch),
                ..bearing_case(&section, 0.4, 50.0, n, place)
            };
            web_yielding(rec, &case).expect("Rn");
            web_crippling(rec, &case).expect("Rn");
        }
    }
    assert!(recheck(&sheet).expect("every line comes out the same") > 60);
}

/// LRFD 6.5.4.2 (from memory): 1.00 for flexure, shear and bearing, 0.80 for web crippling.
#[test]
fn resistance_factors() {
    assert_eq!(phi::flexure(&mut Silent).q, 1.0);
    assert_eq!(phi::shear(&mut Silent).q, 1.0);
    assert_eq!(phi::bearing(&mut Silent).q, 1.0);
    assert_eq!(phi::crippling(&mut Silent).q, 0.80);
}

/// C6.10.1.1.1b (from memory): 10, 9, 8, 7, 6 by strength. Below the table from the moduli: 2.0 ksi has
/// E_c = 120,000 x 0.145^2 x 2^0.33 = 3,171 ksi, n = 9.1.
#[test]
fn modular_ratios() {
    let n = |f: f64| material::modular_ratio(&mut Silent, ksi(f), "deck.concrete").map(|n| n.q);
    for (strength, want) in [
        (2.4, 10.0),
        (2.89, 10.0),
        (2.9, 9.0),
        (3.0, 9.0),
        (3.6, 8.0),
        (4.0, 8.0),
        (4.6, 7.0),
        (6.0, 6.0),
        (15.0, 6.0),
    ] {
        assert_eq!(n(strength), Ok(want), "{strength}");
    }
    near(n(2.0).expect("n"), 29_000.0 / (120_000.0 * 0.021_025 * 2.0_f64.powf(0.33)), 1e-12, "2 ksi");
    for bad in [0.0, 0.9, 15.1, -3.0, f64::NAN] {
        assert_eq!(n(bad).expect_err("no ratio").path, "deck.concrete");
    }
    let f_c = ksi(4.0);
    let w_c = material::concrete_weight(&mut Silent, f_c);
    near(w_c.q.in_kcf(), 0.145, 1e-12, "unit weight");
    near(material::concrete_modulus(&mut Silent, w_c, f_c).q.in_ksi(), 3987.0, 2e-3, "modulus");
    near(material::concrete_weight(&mut Silent, ksi(8.0)).q.in_kcf(), 0.148, 1e-12, "unit weight of 8 ksi");
    assert_eq!(material::long_term_ratio(&mut Silent, Val::bare(9.0)).q, 27.0);
    assert_eq!(material::steel_modulus(&mut Silent).q, Stress::from_ksi(29_000.0));
}
