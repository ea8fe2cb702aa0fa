//! The section at a station: sound, with loss, and with its slab, against independent references.

use girderbook_core::quantity::{Area, Length, Moment, Stress};
use girderbook_core::resistance::plastic::{Axis, Forces, plastic};
use girderbook_core::section::composite::{Composite, Slab, Stages};
use girderbook_core::section::effective::{Effective, Remains};
use girderbook_core::section::parts::{Own, Part, compose};
use girderbook_core::section::plate::{IShape, Left};
use girderbook_core::section::rolled;
use girderbook_core::units::mark::{Inch, Ksi, One};
use girderbook_core::worksheet::{Kind, Sheet, Silent, Val};
use girderbook_tests::evaluate::recheck;
use girderbook_tests::steel::{plates, plates_in, remains, told};
use serde_json::Value;

fn near(got: f64, want: f64, rel: f64, what: &str) {
    assert!((got - want).abs() <= rel * want.abs(), "{what}: {got} against {want}");
}

fn reference(id: &str) -> (Value, Value) {
    let data: Value =
        serde_json::from_str(include_str!("../data/sections_reference.json")).expect("reference data");
    let cases = data["cases"].as_array().expect("cases");
    let case = cases.iter().find(|c| c["id"] == id).unwrap_or_else(|| panic!("{id}"));
    (case["inputs"]["section"].clone(), case["expected"].clone())
}

fn pair(section: &Value, key: &str) -> (Length, Length) {
    let at = |i: usize| Length::from_m(section[key][i].as_f64().expect("a figure"));
    (at(0), at(1))
}

/// The case as three plates; both web parts must be alike.
fn three_plates(section: &Value) -> IShape {
    let (bottom, lower) = (pair(section, "bf"), pair(section, "wl"));
    let (upper, top) = (pair(section, "wu"), pair(section, "tf"));
    assert_eq!(lower.1, upper.1, "one web thickness");
    plates(bottom.1 + lower.0 + upper.0 + top.1, top, lower.1, bottom)
}

#[test]
fn a_sound_rolled_shape_has_the_figures_of_its_table_and_says_so() {
    let shape = rolled::find("W36x150").expect("in the catalogue").shape("members[0].section");
    let mut sheet = Sheet::default();
    let section = Effective::at(&mut sheet, &shape, &Remains::default()).expect("a section");
    assert_eq!(section.left.area.q, Area::from_in2(44.3));
    assert_eq!(section.left.inertia.q.in_in4(), 9040.0);
    assert_eq!(section.left.s_top.q.in_in3(), 504.0);
    assert_eq!(section.left.s_bottom.q.in_in3(), 504.0);
    assert_eq!(section.left.plastic.q.in_in3(), 581.0);
    assert!(section.sound.is_none());
    let cited = sheet.lines.iter().filter(|l| match &l.kind {
        Kind::LookUp { cite, row } => cite == "AISC Shapes Database v16.0" && row == "W36x150",
        _ => false,
    });
    assert_eq!(cited.count(), 4);
    assert!(recheck(&sheet).expect("every line comes out the same") > 5);
}

/// Closed form on rectangles, cross-checked with sectionproperties (see the data file).
#[test]
fn plates_agree_with_the_reference() {
    let (section, expected) = reference("C-o-015");
    let shape = three_plates(&section);
    let s = Effective::at(&mut Silent, &shape, &Remains::default()).expect("a section");
    let e = |key: &str| expected[key].as_f64().expect("a figure");
    near(s.depth.q.in_m(), e("depth"), 1e-9, "depth");
    near(s.left.area.q.in_m2(), e("A"), 1e-8, "area");
    near(s.y.q.in_m(), e("y_centroid_from_bottom"), 1e-8, "centroid");
    near(s.left.inertia.q.in_m4(), e("I"), 1e-8, "inertia");
    near(s.left.s_top.q.in_m3(), e("S_top"), 1e-8, "top modulus");
    near(s.left.s_bottom.q.in_m3(), e("S_bottom"), 1e-8, "bottom modulus");
    near(s.left.plastic.q.in_m3(), e("Z_plastic"), 1e-8, "plastic modulus");
}

/// Webs of two thicknesses and narrowed flanges: the take-off of parts.
#[test]
fn parts_agree_with_the_reference() {
    for id in ["C-o-015", "C-o-016", "C-o-017"] {
        let (section, expected) = reference(id);
        let mut y = Length::ZERO;
        let parts = ["bf", "wl", "wu", "tf"].map(|key| {
            let (one, two) = pair(&section, key);
            let (b, t) = if key.starts_with('w') { (two, one) } else { (one, two) };
            let part = Part {
                what: key,
                area: Val::bare(b * t),
                y: Val::bare(y + t / 2.0),
                own: Own::Rectangle { b: Val::bare(b), t: Val::bare(t) },
            };
            y += t;
            part
        });
        let totals = compose(&mut Silent, parts);
        let e = |key: &str| expected[key].as_f64().expect("a figure");
        near(totals.area.q.in_m2(), e("A"), 1e-8, id);
        near(totals.y.q.in_m(), e("y_centroid_from_bottom"), 1e-8, id);
        near(totals.inertia.q.in_m4(), e("I"), 1e-8, id);
    }
}

/// Slab and steel, elastic with n and 3n, and the plastic moment.
#[test]
fn composite_sections_agree_with_the_reference() {
    for (id, axis) in [("C-o-018", Axis::Slab), ("C-o-019", Axis::TopFlange), ("C-o-020", Axis::Web)] {
        let (section, expected) = reference(id);
        let number = |key: &str| section[key].as_f64().expect("a figure");
        let shape = three_plates(&section["steel"]);
        let steel = Effective::at(&mut Silent, &shape, &Remains::default()).expect("a section");
        let slab = Slab {
            b_e: Val::bare(Length::from_m(number("beff"))),
            t_s: Val::bare(Length::from_m(number("ts"))),
            haunch: Val::bare(Length::from_m(number("haunch"))),
            f_c: Val::bare(Stress::from_kpa(number("fc"))),
            n: Val::bare(number("n")),
            n_long: Val::bare(3.0 * number("n")),
            path: "deck",
        };
        let c = Composite::of(&mut Silent, &steel, slab).expect("a section");
        for (t, key) in [(&c.short, "elastic_n"), (&c.long, "elastic_3n")] {
            let e = |name: &str| expected[key][name].as_f64().expect("a figure");
            near(t.area.q.in_m2(), e("A_transformed"), 1e-8, id);
            near(t.y.q.in_m(), e("y_from_bottom"), 1e-8, id);
            near(t.inertia.q.in_m4(), e("I"), 1e-8, id);
            near((t.inertia.q / t.y.q).in_m3(), e("S_bottom_steel"), 1e-8, id);
            near((t.inertia.q / t.to_top.q).in_m3(), e("S_top_steel"), 1e-7, id);
            near((t.inertia.q / t.to_slab.q).in_m3() * t.n.q, e("S_top_slab_concrete"), 1e-8, id);
        }
        let f_y = Val::bare(Stress::from_kpa(number("fy")));
        let forces = girderbook_core::clauses::lrfd::steel::composite::forces(&mut Silent, &c, f_y);
        let p = plastic(&mut Silent, &forces, "").expect("an axis");
        let e = |name: &str| expected["plastic"][name].as_f64().expect("a figure");
        assert_eq!(p.axis, axis, "{id}");
        near(p.moment.q.in_kn_m(), e("Mp"), 1e-8, id);
        near((c.total_depth.q - p.d_p.q).in_m(), e("PNA_from_bottom"), 1e-8, id);
    }
}

/// A corroded girder whose web has two thicknesses: its lower part goes with the bottom flange.
#[test]
fn a_corroded_composite_section_agrees_with_the_reference() {
    let (section, expected) = reference("C-o-021");
    let number = |key: &str| section[key].as_f64().expect("a figure");
    let steel = &section["steel"];
    let (bf, wl, wu, tf) = (pair(steel, "bf"), pair(steel, "wl"), pair(steel, "wu"), pair(steel, "tf"));
    let f_y = Stress::from_kpa(number("fy"));
    let (flange, lower) = (bf.0 * bf.1, wl.0 * wl.1);
    // The middle of flange and lower web together, below the upper web.
    let middle = (flange * (wl.0 + bf.1 / 2.0) + lower * (wl.0 / 2.0)) / (flange + lower);
    let forces = Forces {
        p_s: Val::bare(
            0.85 * Stress::from_kpa(number("fc"))
                * (Length::from_m(number("beff")) * Length::from_m(number("ts"))),
        ),
        t_s: Val::bare(Length::from_m(number("ts"))),
        gap: Val::bare(Length::from_m(number("haunch"))),
        p_c: Val::bare(f_y * (tf.0 * tf.1)),
        t_c: Val::bare(tf.1),
        p_w: Val::bare(f_y * (wu.0 * wu.1)),
        web_depth: Val::bare(wu.0),
        p_t: Val::bare(f_y * (flange + lower)),
        t_t: Val::bare(2.0 * middle),
    };
    let p = plastic(&mut Silent, &forces, "").expect("an axis");
    let e = |name: &str| expected["plastic"][name].as_f64().expect("a figure");
    assert_eq!(p.axis, Axis::Slab);
    near(p.moment.q.in_kn_m(), e("Mp"), 1e-8, "Mp");
    near(p.d_p.q.in_m(), e("slab_block_depth"), 1e-8, "depth of the block");
}

/// Area, centroid above the sound bottom face, inertia and plastic modulus of a stack of rectangles,
/// by cutting it into thin strips: an independent way.
fn strips(rectangles: &[(f64, f64, f64)]) -> [f64; 4] {
    let cut = |f: &dyn Fn(f64) -> f64| {
        rectangles
            .iter()
            .map(|(b, low, high)| {
                let steps = 4000;
                let dy = (high - low) / f64::from(steps);
                (0..steps).map(|i| b * dy * f(low + dy * (f64::from(i) + 0.5))).sum::<f64>()
            })
            .sum::<f64>()
    };
    let area = cut(&|_| 1.0);
    let y = cut(&|y| y) / area;
    let inertia = cut(&|x| (x - y) * (x - y));
    let (mut low, mut high) = (0.0_f64, 100.0_f64);
    for _ in 0..60 {
        let middle = (low + high) / 2.0;
        let below: f64 = rectangles.iter().map(|(b, l, h)| b * (middle.clamp(*l, *h) - l)).sum();
        if below < area / 2.0 { low = middle } else { high = middle }
    }
    [area, y, inertia, cut(&|x| (x - low).abs())]
}

/// W36x150 with loss of every plate, against the same body with fillets as lumps that make up the
/// table's area, inertia and plastic modulus when sound.
#[test]
fn a_rolled_shape_with_loss_is_the_published_one_less_what_is_gone() {
    let shape = rolled::find("W36x150").expect("in the catalogue").shape("s");
    let (d, b, t, w) = (35.9, 12.0, 0.94, 0.625);
    let (top, web, bottom) = (0.90, 0.50, 0.60);
    let s =
        Effective::at(&mut Silent, &shape, &remains(Some(top), Some(web), Some(bottom))).expect("a section");
    let sound = strips(&[(b, 0.0, t), (w, t, d - t), (b, d - t, d)]);
    let left = strips(&[(b, t - bottom, t), (web, t, d - t), (b, d - t, d - t + top)]);
    // Fillets: 44.3 - plates of area at both sides, at a distance that makes up the inertia.
    let lump = 44.3 - sound[0];
    let arm2 = (9040.0 - sound[2]) / lump;
    let area = left[0] + lump;
    let y = (left[0] * left[1] + lump * d / 2.0) / area;
    let inertia = left[2] + left[0] * (left[1] - y).powi(2) + lump * (arm2 + (d / 2.0 - y).powi(2));
    near(s.left.area.q.in_in2(), area, 1e-9, "area");
    near(s.y.q.in_inch(), y - (t - bottom), 1e-9, "centroid");
    near(s.left.inertia.q.in_in4(), inertia, 1e-6, "inertia");
    near(s.left.s_bottom.q.in_in3(), inertia / (y - (t - bottom)), 1e-6, "bottom modulus");
    near(s.left.s_top.q.in_in3(), inertia / (d - t + top - y), 1e-6, "top modulus");
    near(s.left.plastic.q.in_in3(), 581.0 - (sound[3] - left[3]), 1e-6, "plastic modulus");
    near(s.fillet.q.in_inch(), 1.69 - (t - bottom), 1e-9, "fillet");
    let before = s.sound.expect("what it was before");
    assert_eq!(before.inertia.q.in_in4(), 9040.0);
}

#[test]
fn plates_with_loss_agree_with_strips() {
    let shape = plates_in(30.0, (10.0, 0.75), 0.5, (12.0, 1.0));
    for (top, web, bottom) in [(0.5, 0.5, 1.0), (0.75, 0.3, 0.4), (0.6, 0.25, 0.8), (0.75, 0.05, 0.3)] {
        let s = Effective::at(&mut Silent, &shape, &remains(Some(top), Some(web), Some(bottom)))
            .expect("a section");
        let left = strips(&[(12.0, 1.0 - bottom, 1.0), (web, 1.0, 29.25), (10.0, 29.25, 29.25 + top)]);
        near(s.left.area.q.in_in2(), left[0], 1e-9, "area");
        near(s.y.q.in_inch(), left[1] - (1.0 - bottom), 1e-9, "centroid");
        near(s.left.inertia.q.in_in4(), left[2], 1e-6, "inertia");
        near(s.left.plastic.q.in_in3(), left[3], 1e-6, "plastic modulus");
    }
}

/// A reading thicker than the sound plate is no gain; nothing left is refused and says where.
#[test]
fn readings_beyond_the_plates() {
    let shape = plates_in(30.0, (10.0, 0.75), 0.5, (12.0, 1.0));
    let sound = Effective::at(&mut Silent, &shape, &Remains::default()).expect("a section");
    let thick = Effective::at(&mut Silent, &shape, &remains(Some(0.8), None, Some(1.2))).expect("a section");
    near(thick.left.inertia.q.in_in4(), sound.left.inertia.q.in_in4(), 1e-12, "no gain");
    for (top, web, bottom) in
        [(Some(0.0), None, None), (None, Some(-0.1), None), (None, None, Some(f64::NAN))]
    {
        let problem = Effective::at(&mut Silent, &shape, &remains(top, web, bottom)).expect_err("refused");
        assert_eq!(problem.path, "findings[0]");
        assert!(problem.blocks());
    }
    let bad = plates_in(1.5, (10.0, 0.75), 0.5, (12.0, 1.0));
    assert_eq!(
        Effective::at(&mut Silent, &bad, &Remains::default()).expect_err("refused").path,
        "section.depth"
    );
    let bad = plates_in(30.0, (10.0, 0.75), 0.0, (12.0, 1.0));
    assert_eq!(
        Effective::at(&mut Silent, &bad, &Remains::default()).expect_err("refused").path,
        "section.web"
    );
}

#[test]
fn left_plates_as_plain_values() {
    let shape = rolled::find("W36x150").expect("in the catalogue").shape("s");
    let left = Left {
        depth: shape.depth.value,
        top: shape.top.thickness.value,
        bottom: Length::from_inch(0.6),
        web: shape.web.value,
        web_low: Length::from_inch(0.4),
    };
    let r = Remains::of(&mut Silent, &shape, &left);
    assert!(r.top.is_none() && r.web.is_none() && r.bottom.is_some());
}

/// Every printed line of a composite section with loss, and stresses by stages against a hand sum.
#[test]
fn the_sheet_of_a_corroded_composite_section_works_out_again() {
    let mut sheet = Sheet::default();
    let rec = &mut sheet;
    let shape = rolled::find("W33x130").expect("in the catalogue").shape("s");
    let left = Remains {
        top: None,
        bottom: Some(told(rec, "t_bot", Length::from_inch(0.7), Inch)),
        web: Some(told(rec, "t_w", Length::from_inch(0.5), Inch)),
        path: "findings[0]",
    };
    let steel = Effective::at(rec, &shape, &left).expect("a section");
    let slab = Slab {
        b_e: told(rec, "b_e", Length::from_inch(88.0), Inch),
        t_s: told(rec, "t_s", Length::from_inch(7.25), Inch),
        haunch: told(rec, "haunch", Length::from_inch(1.0), Inch),
        f_c: told(rec, "f_c", Stress::from_ksi(3.0), Ksi),
        n: told(rec, "n", 9.0, One),
        n_long: told(rec, "n_3", 27.0, One),
        path: "deck",
    };
    let c = Composite::of(rec, &steel, slab).expect("a section");
    let m = |rec: &mut Sheet, kip_ft: f64| {
        told(rec, "M", Moment::from_kip_ft(kip_ft), girderbook_core::units::mark::KipIn)
    };
    let stages = Stages { bare: m(rec, 439.0), long: m(rec, 129.0), short: m(rec, 952.6) };
    let bottom = c.bottom_stress(rec, &stages);
    let top = c.top_stress(rec, &stages);
    let slab = c.slab_stress(rec, &stages);
    let sum = 439.0 * 12.0 / steel.left.s_bottom.q.in_in3()
        + 129.0 * 12.0 * c.long.y.q.in_inch() / c.long.inertia.q.in_in4()
        + 952.6 * 12.0 * c.short.y.q.in_inch() / c.short.inertia.q.in_in4();
    near(bottom.sum.q.in_ksi(), sum, 1e-12, "bottom");
    let sum = 439.0 * 12.0 / steel.left.s_top.q.in_in3()
        + 129.0 * 12.0 * (steel.depth.q - c.long.y.q).in_inch() / c.long.inertia.q.in_in4()
        + 952.6 * 12.0 * (steel.depth.q - c.short.y.q).in_inch() / c.short.inertia.q.in_in4();
    near(top.sum.q.in_ksi(), sum, 1e-12, "top");
    let sum =
        (129.0 + 952.6) * 12.0 * (c.total_depth.q - c.short.y.q).in_inch() / c.short.inertia.q.in_in4() / 9.0;
    near(slab.q.in_ksi(), sum, 1e-12, "slab");
    // The soffit stays where it was: bottom loss moves the reference face, not the slab.
    near(c.total_depth.q.in_inch(), 33.1 - (0.855 - 0.7) + 1.0 + 7.25, 1e-12, "depth");
    assert!(recheck(&sheet).expect("every line comes out the same") > 60);
}
