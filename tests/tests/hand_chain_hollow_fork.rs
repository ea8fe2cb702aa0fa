//! The first demo worked by plain arithmetic, from the tape to the factor and the sign, and compared with
//! the program: an interior girder in bending, and the corroded end of the first girder over its bearing.
//!
//! Formulas from memory: AASHTO LRFD 9th ed. and MBE 3rd ed., clause beside each. Kips, feet and inches;
//! nothing of the program is used but its answer.

use girderbook_core::basis::mbe_a::MbeA;
use girderbook_core::bridge::Bridge;
use girderbook_core::check::{Action, LimitState, Outcome};
use girderbook_core::document;
use girderbook_core::quantity::{Force, Moment, Quantity};
use girderbook_core::rating::{Check, Rater, Rating, work};
use girderbook_core::worksheet::Sheet;
use libm::pow;

const M: f64 = 1.0 / 0.3048;
const MM: f64 = 1.0 / 25.4;
const KN: f64 = 1.0 / 4.448_221_615_260_5;
const KN_M2_PER_FT3: f64 = KN * 0.3048 * 0.3048 * 0.3048;
const KIP_FT_IN_KN_M: f64 = 1.0 / (KN * M);

/// W36x182 of the 1980 tables: depth, flange, web, k, area, inertia, moduli (published).
const D: f64 = 36.33;
const B_F: f64 = 12.075;
const T_F: f64 = 1.18;
const T_W: f64 = 0.725;
const K: f64 = 1.92;
const A: f64 = 53.6;
const I: f64 = 11300.0;
const S_X: f64 = 623.0;
const Z_X: f64 = 718.0;

/// Built 1958: 33 ksi (MBE table 6A.6.2.1-1) and 2.5 ksi (table 6A.5.2.1-1).
const F_Y: f64 = 33.0;
const E: f64 = 29000.0;

const SLAB: f64 = 7.25;
const GIRDERS: f64 = 5.0;

/// Axle loads in kip and distances in feet (MBE appendix D6A).
const TYPE_3: (&[f64], &[f64]) = (&[16.0, 17.0, 17.0], &[15.0, 4.0]);
const TYPE_3S2: (&[f64], &[f64]) = (&[10.0, 15.5, 15.5, 15.5, 15.5], &[11.0, 4.0, 22.0, 4.0]);
const SU5: (&[f64], &[f64]) = (&[12.0, 8.0, 8.0, 17.0, 17.0], &[10.0, 4.0, 4.0, 4.0]);
const SU7: (&[f64], &[f64]) = (&[11.5, 8.0, 8.0, 17.0, 17.0, 8.0, 8.0], &[10.0, 4.0, 4.0, 4.0, 4.0, 4.0]);

fn span() -> f64 {
    18.30 * M
}

fn near(found: f64, hand: f64, within: f64, what: &str) {
    assert!((found - hand).abs() <= within * hand.abs(), "{what}: {found} against {hand} by hand");
}

fn rounded(value: f64) -> f64 {
    (value * 100.0).round() / 100.0
}

fn rate(change: impl Fn(&str) -> String) -> (Bridge, Rating) {
    let path = format!("{}/../core/demos/hollow-fork.json", env!("CARGO_MANIFEST_DIR"));
    let text = change(&std::fs::read_to_string(path).expect("the demo"));
    let book = document::read(&text).expect("a readable demo");
    let bridge = document::bridge(&book, &MbeA::default()).bridge.expect("a whole bridge");
    let rating = Rater::default().rate(&bridge, &MbeA::default()).expect("a rating");
    (bridge, rating)
}

fn as_it_is() -> (Bridge, Rating) {
    rate(str::to_owned)
}

/// The checks of a vehicle on a line, but for the ends where it makes no moment.
fn checks<'a>(rating: &'a Rating, id: &str, line: usize, action: Action) -> Vec<&'a Check> {
    let load = rating.loads.iter().position(|load| load.id == id).expect("the vehicle");
    let wanted = |c: &&Check| {
        c.key.load == load && c.key.line == line && c.key.action == action && c.outcome != Outcome::NotLoaded
    };
    rating.checks.iter().filter(wanted).collect()
}

fn factor(check: &Check) -> f64 {
    check.outcome.rank().expect("a factor")
}

/// Dead load of a girder by the width of slab that it carries: kip/ft of components, and of the surface.
fn dead(width: f64) -> [(&'static str, f64); 5] {
    let concrete = 24.5 * KN_M2_PER_FT3;
    let asphalt = (65.0 + 72.0 + 70.0 + 68.0 + 78.0 + 74.0 + 70.0) / 7.0 * MM / 12.0;
    [
        ("girder", A / 144.0 * 0.490),
        ("slab", SLAB / 12.0 * width * concrete),
        ("haunch", (40.0 * MM / 12.0) * (300.0 * MM / 12.0) * concrete),
        // Later loads are shared equally (LRFD 4.6.2.2.1).
        ("parapets", 2.0 * 0.440 / GIRDERS),
        ("asphalt", asphalt * (8.53 * M / GIRDERS) * 22.5 * KN_M2_PER_FT3),
    ]
}

fn components(rows: &[(&str, f64); 5]) -> f64 {
    rows[..4].iter().map(|row| row.1).sum()
}

/// Share of a lane for moment, interior girder, two lanes or more (table 4.6.2.2.2b-1, (a)).
fn share_moment() -> f64 {
    let (s, l) = (2.18 * M, span());
    let e_g = D / 2.0 + 40.0 * MM + SLAB / 2.0;
    // f'c 2.5 ksi: n = 10 (6.10.1.1.1b).
    let k_g = 10.0 * (I + A * e_g * e_g);
    // e_g = 18.165 + 1.5748 + 3.625 = 23.3648 in; 10 (11300 + 53.6 x 545.914) = 405,610 in4.
    assert_eq!(k_g.round(), 405_610.0);
    let stiffness = pow(k_g / (12.0 * l * SLAB * SLAB * SLAB), 0.1);
    let one = 0.06 + pow(s / 14.0, 0.4) * pow(s / l, 0.3) * stiffness;
    let more = 0.075 + pow(s / 9.5, 0.6) * pow(s / l, 0.2) * stiffness;
    assert!(one < more);
    more
}

/// Nominal moment of the bare girder, kip ft: compact web, inelastic lateral-torsional buckling between
/// diaphragms 15 ft apart (A6.3.3), without torsional stiffness.
fn nominal_moment() -> f64 {
    let d_c = (D - 2.0 * T_F) / 2.0;
    let r_t = B_F / (12.0 * (1.0 + d_c * T_W / (3.0 * B_F * T_F))).sqrt();
    let f_yr = 0.7 * F_Y;
    let l_p = r_t * (E / F_Y).sqrt();
    let l_r = std::f64::consts::PI * r_t * (E / f_yr).sqrt();
    let l_b = 15.0 * 12.0;
    assert!(l_p < l_b && l_b < l_r);
    let m_yc = F_Y * S_X / 12.0;
    let r_pc = Z_X / S_X;
    (1.0 - (1.0 - f_yr * S_X / 12.0 / (r_pc * m_yc)) * (l_b - l_p) / (l_r - l_p)) * r_pc * m_yc
}

/// Absolute maximum moment of a vehicle with all axles on the span, and its place: midspan halves the
/// distance between the resultant and an axle beside it.
fn resultant_rule((loads, gaps): (&[f64], &[f64])) -> (f64, f64) {
    let l = span();
    let mut places = vec![0.0];
    for gap in gaps {
        places.push(places[places.len() - 1] + gap);
    }
    let total: f64 = loads.iter().sum();
    let resultant = loads.iter().zip(&places).map(|(p, a)| p * a).sum::<f64>() / total;
    let mut best = (0.0, 0.0);
    for &under in &places {
        let first = l / 2.0 - (under + resultant) / 2.0;
        if first < 0.0 || first + places[places.len() - 1] > l {
            continue;
        }
        let x = first + under;
        let left = total * (l - first - resultant) / l;
        let behind: f64 =
            loads.iter().zip(&places).filter(|(_, a)| **a < under).map(|(p, a)| p * (under - a)).sum();
        let moment = left * x - behind;
        if moment > best.0 {
            best = (moment, x);
        }
    }
    best
}

/// Factors in bending with dead load at `x`: Strength I and Service II.
///
/// MBE 6A.4.2: fair condition 0.95, five girders 1.00; DC 1.25; a surface that was measured 1.25; 420
/// trucks a day 1.30; rough surface 33 %. Service II: 1.0, 1.0, 1.30; 0.80 F_y (LRFD 6.10.4.2.2).
fn factors(moment: f64, x: f64) -> [f64; 2] {
    let rows = dead(2.18 * M);
    let at = |w: f64| w * x * (span() - x) / 2.0;
    let (dc, dw) = (at(components(&rows)), at(rows[4].1));
    let live = share_moment() * 1.33 * moment;
    let strength = (0.95 * nominal_moment() - 1.25 * dc - 1.25 * dw) / (1.30 * live);
    let stress = |m: f64| 12.0 * m / S_X;
    let service = (0.80 * F_Y - stress(dc) - stress(dw)) / (1.30 * stress(live));
    [strength, service]
}

#[test]
fn dead_load_row_by_row() {
    let (_, rating) = as_it_is();
    let in_kn_m = |klf: f64| klf / KN * M;
    let interior = dead(2.18 * M);
    for (row, kn_m) in interior.iter().zip([2.662, 9.836, 0.294, 2.568, 2.725]) {
        assert!((in_kn_m(row.1) - kn_m).abs() < 1e-3, "{row:?}: {}", in_kn_m(row.1));
    }
    let exterior = dead((0.35 + 1.09) * M);
    for (line, rows) in [(0, &exterior), (1, &interior), (2, &interior), (3, &interior)] {
        let found = &rating.lines[line];
        let dc1: f64 = rows[..3].iter().map(|row| row.1).sum();
        near(found.dc1.in_kip_ft(), dc1, 1e-9, "DC1");
        near(found.dc2.in_kip_ft(), rows[3].1, 1e-9, "DC2");
        near(found.dw.in_kip_ft(), rows[4].1, 1e-9, "DW");
    }
}

#[test]
fn share_and_moment() {
    let (_, rating) = as_it_is();
    let share = *rating.lines[2].share_moment.as_ref().expect("a share");
    near(share, share_moment(), 1e-9, "share");
    assert_eq!((share_moment() * 1000.0).round(), 648.0);
    assert_eq!((nominal_moment() * KIP_FT_IN_KN_M).round(), 2304.0);
    let check = checks(&rating, "type3", 2, Action::Moment)[8];
    let capacity = check.figures.expect("figures").capacity;
    near(Moment::from_base(capacity).in_kn_m(), 0.95 * nominal_moment() * KIP_FT_IN_KN_M, 1e-9, "capacity");
}

/// Where a vehicle makes the most of it, the program and the arithmetic say the same; and its worst factor
/// is no lower than the usual short cut, dead load of midspan with the moment beside it.
#[test]
fn factors_of_an_interior_girder() {
    let (_, rating) = as_it_is();
    for (id, vehicle, short_cut) in [
        ("type3", TYPE_3, [1.37, 1.21]),
        ("type3s2", TYPE_3S2, [1.32, 1.17]),
        ("su5", SU5, [1.10, 0.97]),
        ("su7", SU7, [0.91, 0.81]),
    ] {
        let (moment, x) = resultant_rule(vehicle);
        let hand = factors(moment, x);
        let midspan = factors(moment, span() / 2.0);
        assert_eq!(midspan.map(rounded), short_cut, "{id}: {midspan:?}");
        for (i, action) in [Action::Moment, Action::Stress].into_iter().enumerate() {
            let all = checks(&rating, id, 2, action);
            let there = all.iter().find(|c| (c.key.x.in_ft() - x).abs() < 1e-3).expect("its station");
            near(factor(there), hand[i], 1e-6, id);
            let worst = all.iter().map(|c| factor(c)).fold(f64::MAX, f64::min);
            assert!(worst <= hand[i] + 1e-9 && worst >= midspan[i] - 1e-9, "{id}: {worst}");
            near(worst, midspan[i], 0.01, id);
        }
    }
}

/// MBE 6A.8.3: 38.75 short tons, at the factor of Service II.
#[test]
fn sign_of_su7_for_an_interior_girder() {
    let (bridge, rating) = as_it_is();
    let all = checks(&rating, "su7", 2, Action::Stress);
    let worst = all.iter().min_by(|a, b| factor(a).total_cmp(&factor(b))).expect("a check");
    let safe = 77.5 / KN / 9.806_65 / 0.7 * (factor(worst) - 0.3);
    assert_eq!(safe.floor(), 25.0);
    let mut sheet = Sheet::default();
    work(&bridge, &MbeA::default(), &worst.key, &mut sheet).expect("a sheet");
    let line = |symbol: &str| sheet.lines.iter().find(|l| l.symbol == symbol).expect("a line").figure;
    near(line("W_safe"), safe, 1e-9, "safe load in tonnes");
    assert_eq!(line("W_sign"), 25.0);
}

/// Share of a lane for the end of G1: the largest of lever rule, formula and rigid cross-section.
fn share_end_of_g1() -> f64 {
    let (s, curb) = (2.18 * M, (9.42 - 8.53) / 2.0 * M);
    let g1 = 0.35 * M;
    // One lane, the first wheel 2 ft from the curb, the second beyond G2: hinge at G2; 1.2.
    let wheel = curb + 2.0;
    assert!(wheel + 6.0 > g1 + s);
    let lever = 1.2 * (g1 + s - wheel) / s / 2.0;
    // Two lanes, table 4.6.2.2.3b-1: e = 0.6 + d_e / 10.
    let d_e = g1 - curb;
    let formula = (0.6 + d_e / 10.0) * (0.2 + s / 12.0 - (s / 35.0) * (s / 35.0));
    // Rigid cross-section (C4.6.2.2.2d-1): trucks in lanes of 12 ft from the left curb.
    let x_ext = 2.0 * s;
    let squares = 2.0 * (x_ext * x_ext + s * s);
    let centre = g1 + x_ext;
    let e_1 = centre - (curb + 5.0);
    let e_2 = e_1 - 12.0;
    let rigid_one = 1.2 * (1.0 / GIRDERS + x_ext * e_1 / squares);
    let rigid_two = 2.0 / GIRDERS + x_ext * (e_1 + e_2) / squares;
    [lever, formula, rigid_one, rigid_two].into_iter().fold(0.0, f64::max)
}

/// Web yielding and crippling over the near bearing of G1, kip, each with its resistance factor, for a least
/// reading in mm (D6.5.2, D6.5.3; 6.5.4.2).
fn end_of_g1(reading: f64) -> (f64, f64) {
    let t_w = reading * MM;
    let t_f = (27.5 + 26.0 + 26.5) / 3.0 * MM;
    let lost = T_F - t_f;
    let (n, d, k) = (200.0 * MM, D - lost, K - lost);
    assert!(n > 0.2 * d);
    let yielding = 1.0 * (2.5 * k + n) * F_Y * t_w;
    let crippling = 0.8
        * 0.4
        * t_w
        * t_w
        * (1.0 + (4.0 * n / d - 0.2) * pow(t_w / t_f, 1.5))
        * (E * F_Y * t_f / t_w).sqrt();
    (yielding, crippling)
}

/// Factor of SU7 over the bearing: its rear axle on it, everything else ahead.
fn factor_of_the_end(reading: f64) -> f64 {
    let rows = dead((0.35 + 1.09) * M);
    let half = span() / 2.0;
    let (dc, dw) = (components(&rows) * half, rows[4].1 * half);
    let mut place = 0.0;
    let mut reaction = 0.0;
    for (i, load) in SU7.0.iter().rev().enumerate() {
        reaction += load * (1.0 - place / span());
        place += SU7.1.iter().rev().nth(i).copied().unwrap_or(0.0);
    }
    let (yielding, crippling) = end_of_g1(reading);
    let live = share_end_of_g1() * 1.33 * reaction;
    (0.95 * yielding.min(crippling) - 1.25 * dc - 1.25 * dw) / (1.30 * live)
}

#[test]
fn the_corroded_end_of_g1_by_the_least_reading() {
    let (_, rating) = as_it_is();
    let share = *rating.lines[0].share_shear.as_ref().expect("a share");
    near(share, share_end_of_g1(), 1e-9, "share");
    let check = checks(&rating, "su7", 0, Action::Bearing)[0];
    assert!(check.key.x.in_ft() == 0.0 && check.key.state == LimitState::StrengthI);
    let (yielding, crippling) = end_of_g1(9.9);
    assert!(crippling < yielding);
    let capacity = check.figures.expect("figures").capacity;
    near(Force::from_base(capacity).in_kip(), 0.95 * crippling, 1e-9, "crippling");
    near(factor(check), factor_of_the_end(9.9), 1e-9, "factor");
    assert_eq!(rounded(factor(check)), 0.80);
    let governing = &rating.checks[rating.governing.expect("it is rated")].key;
    assert_eq!((governing.line, governing.action), (0, Action::Bearing));
}

/// One millimetre more over the bearing, and the girders at midspan govern instead.
#[test]
fn a_millimetre_decides_what_governs() {
    let (_, rating) = rate(|text| {
        let thicker = text.replace(r#""10.5 mm", "9.9 mm", "10.2 mm""#, r#""11.5 mm", "10.9 mm", "11.2 mm""#);
        assert_ne!(thicker, text);
        thicker
    });
    let end = factor(checks(&rating, "su7", 0, Action::Bearing)[0]);
    near(end, factor_of_the_end(10.9), 1e-9, "factor");
    assert!(end > 0.81);
    let governing = &rating.checks[rating.governing.expect("it is rated")].key;
    assert_eq!((governing.action, governing.state), (Action::Stress, LimitState::ServiceII));
}
