//! What is always true of steel girders, over sections drawn at random within the range of the formulas.

use girderbook_core::bridge::Straightness;
use girderbook_core::clauses::lrfd::steel::bearing::{BearingCase, Place, web_crippling, web_yielding};
use girderbook_core::clauses::lrfd::steel::composite::{self, CompositeCase};
use girderbook_core::clauses::lrfd::steel::flange::Hold;
use girderbook_core::clauses::lrfd::steel::lateral::Torsion;
use girderbook_core::clauses::lrfd::steel::noncomposite::{FlexureCase, nominal_moment};
use girderbook_core::clauses::lrfd::steel::service;
use girderbook_core::clauses::lrfd::steel::shear::{Panel, ShearCase, nominal_shear};
use girderbook_core::problem::Problem;
use girderbook_core::quantity::{Angle, Length, Moment, Stress};
use girderbook_core::resistance::plastic::plastic;
use girderbook_core::section::composite::{Composite, Slab};
use girderbook_core::section::effective::{Edge, Effective, Remains};
use girderbook_core::section::plate::IShape;
use girderbook_core::section::rolled;
use girderbook_core::worksheet::{Sheet, Silent, Val};
use girderbook_tests::steel::{plates, plates_in, remains};
use proptest::prelude::*;
use proptest::test_runner::RngSeed;

/// Depth of the web, flanges (width, thickness), web thickness: plates as old girders have them.
#[derive(Clone, Copy, Debug)]
struct Plates {
    web_depth: f64,
    t_w: f64,
    top: (f64, f64),
    bottom: (f64, f64),
}

impl Plates {
    fn shape(self) -> IShape {
        plates_in(self.web_depth + self.top.1 + self.bottom.1, self.top, self.t_w, self.bottom)
    }

    /// Whether appendix A6 is open to the flanges with these parts of them left: the standard itself
    /// jumps, by up to a fifth, where `I_yc` passes 0.3 `I_yt`; pairs across it are left out below.
    fn alike(self, parts: [f64; 3]) -> bool {
        let lateral = |flange: (f64, f64), part: f64| flange.1 * part * flange.0.powi(3);
        lateral(self.top, parts[0]) >= 0.3 * lateral(self.bottom, parts[2])
    }
}

fn any_plates() -> impl Strategy<Value = Plates> {
    (12.0..72.0_f64, 30.0..149.0_f64, 4.0..24.0_f64, 2.0..11.9_f64, 0.6..1.6_f64, 0.6..1.6_f64).prop_map(
        |(web_depth, slender, width, flange, wider, thicker)| {
            let thickness = width / (2.0 * flange);
            let bottom = (width * wider, (thickness * thicker).max(width * wider / 23.9));
            Plates { web_depth, t_w: web_depth / slender, top: (width, thickness), bottom }
        },
    )
}

#[derive(Clone, Copy, Debug)]
struct Brace {
    f_y: f64,
    l_b: Option<f64>,
    c_b: f64,
    torsion: Torsion,
}

fn moment(shape: &IShape, left: &Remains, b: Brace) -> Result<f64, Problem> {
    let section = Effective::at(&mut Silent, shape, left)?;
    let hold = b.l_b.map_or(Hold::Continuous, |l| Hold::At(Val::bare(Length::from_inch(l))));
    let case = FlexureCase {
        section: &section,
        f_y: Val::bare(Stress::from_ksi(b.f_y)),
        f_y_path: "y",
        pressed: Edge::Top,
        hold: &hold,
        c_b: Val::bare(b.c_b),
        torsion: b.torsion,
        skew: Val::bare(Angle::ZERO),
    };
    nominal_moment(&mut Silent, &case).map(|m| m.q.in_kip_in())
}

fn torsions() -> impl Strategy<Value = Torsion> {
    prop_oneof![Just(Torsion::Counted), Just(Torsion::Neglected)]
}

/// The same draws every time, unless `PROPTEST_RNG_SEED` asks for others.
fn config() -> ProptestConfig {
    let asked = ProptestConfig::default();
    let rng_seed = match asked.rng_seed {
        RngSeed::Random => RngSeed::Fixed(20),
        fixed => fixed,
    };
    ProptestConfig { rng_seed, failure_persistence: None, max_global_rejects: 100_000, ..asked }
}

proptest! {
    #![proptest_config(config())]

    /// A number that comes out is one: finite, above nothing, and never above the plastic moment.
    #[test]
    fn flexure_is_a_number_or_a_problem(
        p in any_plates(), f_y in 26.0..70.0_f64, l_b in prop::option::of(1.0..1200.0_f64),
        c_b in 1.0..2.3_f64, torsion in torsions(),
    ) {
        let shape = p.shape();
        if let Ok(m) = moment(&shape, &Remains::default(), Brace { f_y, l_b, c_b, torsion }) {
            let z = Effective::at(&mut Silent, &shape, &Remains::default()).expect("a section").left.plastic;
            prop_assert!(m.is_finite() && m > 0.0, "{m}");
            prop_assert!(m <= f_y * z.q.in_in3() * (1.0 + 1e-9), "{m}");
        }
    }

    /// Longer between braces is never better. Where torsion counts, the straight line and the elastic
    /// curve meet within the rounding of 1.95 and 0.078; upward by less than 0.1 %.
    #[test]
    fn a_longer_unbraced_length_is_never_better(
        p in any_plates(), f_y in 26.0..70.0_f64, l_b in 1.0..1000.0_f64, longer in 0.0..400.0_f64,
        c_b in 1.0..2.3_f64, torsion in torsions(),
    ) {
        let shape = p.shape();
        let at = |l| moment(&shape, &Remains::default(), Brace { f_y, l_b: Some(l), c_b, torsion });
        if let (Ok(near), Ok(far)) = (at(l_b), at(l_b + longer)) {
            prop_assert!(far <= near * 1.001, "{far} after {near}");
        }
    }

    /// Held along its length, it carries no less than braced at points; counting torsion never lowers.
    #[test]
    fn more_holding_and_torsion_are_never_worse(
        p in any_plates(), f_y in 26.0..70.0_f64, l_b in 1.0..1000.0_f64,
    ) {
        let shape = p.shape();
        let at = |l_b, torsion| {
            moment(&shape, &Remains::default(), Brace { f_y, l_b, c_b: 1.0, torsion })
        };
        if let (Ok(held), Ok(counted), Ok(neglected)) =
            (at(None, Torsion::Counted), at(Some(l_b), Torsion::Counted), at(Some(l_b), Torsion::Neglected))
        {
            prop_assert!(counted <= held * (1.0 + 1e-12));
            prop_assert!(neglected <= counted * 1.001, "{neglected} above {counted}");
        }
    }

    /// Less thickness of the compression flange is never better, held along the length, nor is less of the
    /// web but for 1 %: between very unlike flanges the axis moves so that less of the web is pressed.
    /// A thinner tension flange does the same, and by A6.2 a web pressed less counts better, by up to a
    /// tenth; for rolled shapes, whose webs are compact, the next test thins all three.
    #[test]
    fn a_thinner_plate_is_never_better(
        p in any_plates(), f_y in 26.0..70.0_f64, parts in [0.5..1.0_f64, 0.5..1.0, 0.5..1.0], less in 0.8..1.0_f64,
        which in 0..2_usize,
    ) {
        let shape = p.shape();
        let at = |parts: [f64; 3]| {
            let left = remains(Some(p.top.1 * parts[0]), Some(p.t_w * parts[1]), Some(p.bottom.1 * parts[2]));
            moment(&shape, &left, Brace { f_y, l_b: None, c_b: 1.0, torsion: Torsion::Counted })
        };
        let mut thinner = parts;
        thinner[which] *= less;
        prop_assume!(p.alike(parts) == p.alike(thinner));
        if let (Ok(thick), Ok(thin)) = (at(parts), at(thinner)) {
            let room = if which == 0 { 1e-9 } else { 0.01 };
            prop_assert!(thin <= thick * (1.0 + room), "{thin} after {thick}, plate {which}");
        }
    }

    /// The same for rolled shapes, sound against worn, with the figures of the table.
    #[test]
    fn a_worn_rolled_shape_is_never_better(
        at in 0..289_usize, parts in [0.6..1.0_f64, 0.6..1.0, 0.6..1.0],
    ) {
        let rolled = rolled::all().nth(at).expect("a row");
        let shape = rolled.shape("s");
        let (t, w) = (rolled.flange.in_inch(), rolled.web.in_inch());
        let left = remains(Some(t * parts[0]), Some(w * parts[1]), Some(t * parts[2]));
        let brace = Brace { f_y: 33.0, l_b: None, c_b: 1.0, torsion: Torsion::Counted };
        if let (Ok(sound), Ok(worn)) =
            (moment(&shape, &Remains::default(), brace), moment(&shape, &left, brace))
        {
            prop_assert!(worn <= sound * (1.0 + 1e-9), "{}: {worn} after {sound}", rolled.name);
        }
        let of = |left: &Remains| Effective::at(&mut Silent, &shape, left).expect("a section").left;
        let (sound, worn) = (of(&Remains::default()), of(&left));
        prop_assert!(worn.area.q <= sound.area.q && worn.inertia.q <= sound.inertia.q);
        prop_assert!(worn.s_top.q <= sound.s_top.q && worn.s_bottom.q <= sound.s_bottom.q);
        prop_assert!(worn.plastic.q <= sound.plastic.q);
    }

    /// With buckling between braces: `r_t` counts a third of the pressed web as weight on the flange, so
    /// a thinner web can raise the buckling stress by more than it lowers the modulus, by the formulas
    /// of the standard; never by more than 5 %. A thinner compression flange is never better by more
    /// than 0.1 %. (Of the tension flange see above.)
    #[test]
    fn a_thinner_plate_is_hardly_better_where_the_flange_buckles(
        p in any_plates(), f_y in 26.0..70.0_f64, l_b in 20.0..600.0_f64, less in 0.8..1.0_f64,
        which in 0..2_usize, torsion in torsions(),
    ) {
        let shape = p.shape();
        let at = |parts: [f64; 3]| {
            let left = remains(Some(p.top.1 * parts[0]), Some(p.t_w * parts[1]), Some(p.bottom.1 * parts[2]));
            moment(&shape, &left, Brace { f_y, l_b: Some(l_b), c_b: 1.0, torsion })
        };
        let mut thinner = [1.0; 3];
        thinner[which] = less;
        prop_assume!(p.alike([1.0; 3]) == p.alike(thinner));
        if let (Ok(thick), Ok(thin)) = (at([1.0; 3]), at(thinner)) {
            let room = if which == 0 { 1.001 } else { 1.05 };
            prop_assert!(thin <= thick * room, "{thin} after {thick}, plate {which}");
        }
    }

    /// Shear, web yielding and crippling: finite, and never better with a thinner web or weaker steel.
    #[test]
    fn webs_are_never_better_when_thinner(
        p in any_plates(), f_y in 26.0..70.0_f64, less in 0.5..1.0_f64, n in 1.0..20.0_f64,
        d_0 in 6.0..200.0_f64, end in any::<bool>(),
    ) {
        let shape = p.shape();
        let at = |part: f64, f_y: f64| -> Result<([f64; 5], bool), Problem> {
            let left = remains(None, Some(p.t_w * part), None);
            let section = Effective::at(&mut Silent, &shape, &left)?;
            let areas = &section.plates;
            let anchored = 2.0 * areas.web.q.in_in2() <= 2.5 * (areas.top.q + areas.bottom.q).in_in2();
            let f_yw = Val::bare(Stress::from_ksi(f_y));
            let d_0 = Val::bare(Length::from_inch(d_0));
            let place = if end { Place::End } else { Place::Interior };
            let web = Straightness::Straight;
            let bearing = BearingCase {
                section: &section, t_w: section.plates.t_w, f_yw, n: Val::bare(Length::from_inch(n)),
                n_path: "", place, web, web_path: "",
            };
            let shear = |panel| {
                let case = ShearCase { section: &section, f_yw, f_y_path: "", panel, web, web_path: "" };
                nominal_shear(&mut Silent, &case).map(|v| v.q.in_kip())
            };
            let all = [
                shear(Panel::Unstiffened)?,
                shear(Panel::Interior(d_0))?,
                shear(Panel::End(d_0))?,
                web_yielding(&mut Silent, &bearing).map_or(0.0, |v| v.q.in_kip()),
                web_crippling(&mut Silent, &bearing)?.q.in_kip(),
            ];
            Ok((all, anchored))
        };
        if let (Ok((thick, one)), Ok((thin, two)), Ok((weak, _))) =
            (at(1.0, f_y), at(less, f_y), at(1.0, f_y * less))
        {
            // Flanges that anchor the field of the thinner web only: a jump of the standard's.
            prop_assume!(one == two);
            for i in 0..5 {
                prop_assert!(thick[i].is_finite() && thick[i] >= 0.0);
                // C has jumps of 0.2 % upward at its limits (1.12 x 1.40 is not 1.57).
                prop_assert!(thin[i] <= thick[i] * 1.002, "{i}: {} after {}", thin[i], thick[i]);
                prop_assert!(weak[i] <= thick[i] * 1.002, "{i}: {} after {}", weak[i], thick[i]);
            }
        }
    }

    /// Service limits: finite, never above the yield strength.
    #[test]
    fn service_limits_are_below_yield(p in any_plates(), f_y in 26.0..100.0_f64) {
        let shape = p.shape();
        let section = Effective::at(&mut Silent, &shape, &Remains::default()).expect("a section");
        let f = Val::bare(Stress::from_ksi(f_y));
        if let Ok(l) = service::noncomposite(&mut Silent, &section, f, "y", Edge::Top) {
            for s in [l.top, l.bottom] {
                prop_assert!(s.q.in_ksi() > 0.0 && s.q.in_ksi() <= 0.8 * f_y * (1.0 + 1e-12));
            }
        }
    }

    /// Composite: finite, at most the plastic moment where the section is compact, and the plastic moment
    /// never better with less steel. The resistance can be: with less steel the axis rises, and the
    /// share of the plastic moment that ductility leaves grows.
    #[test]
    fn composite_is_a_number_or_a_problem(
        p in any_plates(), f_y in 26.0..70.0_f64, f_c in 2.0..8.0_f64, t_s in 4.0..12.0_f64,
        b_e in 40.0..120.0_f64, haunch in 0.0..4.0_f64, less in 0.8..1.0_f64, which in 0..3_usize,
        continuous in any::<bool>(),
    ) {
        let shape = p.shape();
        let at = |parts: [f64; 3]| -> Result<(f64, Option<f64>), Problem> {
            let left = remains(Some(p.top.1 * parts[0]), Some(p.t_w * parts[1]), Some(p.bottom.1 * parts[2]));
            let steel = Effective::at(&mut Silent, &shape, &left)?;
            let slab = Slab {
                b_e: Val::bare(Length::from_inch(b_e)), t_s: Val::bare(Length::from_inch(t_s)),
                haunch: Val::bare(Length::from_inch(haunch)), f_c: Val::bare(Stress::from_ksi(f_c)),
                n: Val::bare(8.0), n_long: Val::bare(24.0), path: "deck",
            };
            let section = Composite::of(&mut Silent, &steel, slab)?;
            let f_y = Val::bare(Stress::from_ksi(f_y));
            let case = CompositeCase {
                section: &section, f_y, f_y_path: "y", continuous,
                m_d1: Val::bare(Moment::from_kip_in(10.0)), m_d2: Val::bare(Moment::ZERO),
            };
            let forces = composite::forces(&mut Silent, &section, f_y);
            let m_p = plastic(&mut Silent, &forces, "deck")?.moment.q.in_kip_in();
            Ok((m_p, composite::nominal_moment(&mut Silent, &case).ok().map(|m| m.q.in_kip_in())))
        };
        let mut thinner = [1.0; 3];
        thinner[which] = less;
        if let (Ok((m_p, m_n)), Ok((thin, _))) = (at([1.0; 3]), at(thinner)) {
            prop_assert!(m_p.is_finite() && m_p > 0.0);
            prop_assert!(thin <= m_p * (1.0 + 1e-9), "{thin} after {m_p}, plate {which}");
            if let Some(m_n) = m_n {
                prop_assert!(m_n.is_finite() && m_n > 0.0 && m_n <= m_p * (1.0 + 1e-9), "{m_n} of {m_p}");
            }
        }
    }

    /// The same plates in millimetres give the same figures, and the written sheet the same as silence.
    #[test]
    fn units_and_recording_change_nothing(p in any_plates(), f_y in 26.0..70.0_f64, l_b in 10.0..400.0_f64) {
        let mm = |x: f64| Length::from_mm(x * 25.4);
        let metric = plates(
            mm(p.web_depth + p.top.1 + p.bottom.1), (mm(p.top.0), mm(p.top.1)), mm(p.t_w),
            (mm(p.bottom.0), mm(p.bottom.1)),
        );
        let brace = Brace { f_y, l_b: Some(l_b), c_b: 1.0, torsion: Torsion::Counted };
        let (one, two) = (moment(&p.shape(), &Remains::default(), brace), moment(&metric, &Remains::default(), brace));
        if let (Ok(one), Ok(two)) = (&one, &two) {
            prop_assert!((one / two - 1.0).abs() < 1e-9, "{one} {two}");
        }
        let mut sheet = Sheet::default();
        let written = Effective::at(&mut sheet, &metric, &Remains::default()).expect("a section").left;
        let silent = Effective::at(&mut Silent, &metric, &Remains::default()).expect("a section").left;
        prop_assert_eq!(written.inertia.q, silent.inertia.q);
        prop_assert_eq!(written.plastic.q, silent.plastic.q);
    }
}

/// At `L_p` and at `L_r` the branches meet: exactly without torsion, within 0.2 % with it, which is how
/// 1.95 and 0.078 are rounded.
#[test]
fn buckling_branches_meet() {
    let shape = rolled::find("W36x182").expect("in the catalogue").shape("s");
    let at = |l: f64, torsion| {
        moment(&shape, &Remains::default(), Brace { f_y: 33.0, l_b: Some(l), c_b: 1.0, torsion })
            .expect("a number")
    };
    for torsion in [Torsion::Counted, Torsion::Neglected] {
        for (symbol, room) in [("L_p", 1e-6), ("L_r", if torsion == Torsion::Counted { 2e-3 } else { 1e-6 })]
        {
            let mut sheet = Sheet::default();
            let section = Effective::at(&mut sheet, &shape, &Remains::default()).expect("a section");
            let hold = Hold::At(Val::bare(Length::from_ft(15.0)));
            let case = FlexureCase {
                section: &section,
                f_y: Val::bare(Stress::from_ksi(33.0)),
                f_y_path: "y",
                pressed: Edge::Top,
                hold: &hold,
                c_b: Val::bare(1.0),
                torsion,
                skew: Val::bare(Angle::ZERO),
            };
            nominal_moment(&mut sheet, &case).expect("a number");
            let limit = sheet.lines.iter().find(|l| l.symbol == symbol).expect("the limit").figure;
            let (before, after) = (at(limit * (1.0 - 1e-9), torsion), at(limit * (1.0 + 1e-9), torsion));
            assert!((after / before - 1.0).abs() < room, "{symbol} {torsion:?}: {before} {after}");
        }
    }
}

/// From compact to noncompact web the moment does not jump; from noncompact to slender it does not
/// rise.
#[test]
fn web_classes_meet() {
    let at = |t_w: f64| {
        let shape = plates_in(61.5, (14.0, 0.75), t_w, (14.0, 0.75));
        moment(
            &shape,
            &Remains::default(),
            Brace { f_y: 36.0, l_b: None, c_b: 1.0, torsion: Torsion::Counted },
        )
        .expect("a number")
    };
    let mut last = at(1.0);
    let mut t = 1.0;
    while t > 0.4005 {
        t -= 0.0005;
        let next = at(t);
        assert!(next <= last * (1.0 + 1e-12), "{t}: {next} after {last}");
        assert!(next > last * 0.995, "{t}: {next} after {last}");
        last = next;
    }
}
