//! Take-off of dead load against published worked examples and hand work.

use girderbook_core::bridge::{Bridge, Stage, StripSide};
use girderbook_core::load::dead::{moment, shear, steel_weight, take_off};
use girderbook_core::load::{Across, DeadLoad, Sharing, TakeOff};
use girderbook_core::quantity::{Area, Length, LineLoad, UnitWeight};
use girderbook_core::units::{Entered, Provenance};
use girderbook_core::worksheet::{Kind, Recorder, Sheet, Silent, Val};
use girderbook_tests::bridges::{Sizes, layer, strip};
use proptest::prelude::*;

fn rules(later: Sharing, surface: Sharing) -> TakeOff {
    TakeOff { steel: steel_weight(), later, surface, cite: "LRFD 4.6.2.2.1" }
}

fn worked<R: Recorder>(rec: &mut R, bridge: &Bridge, line: usize, in2: f64, rules: &TakeOff) -> DeadLoad {
    let across = Across::of(rec, bridge);
    take_off(rec, bridge, &across, line, Val::bare(Area::from_in2(in2)), rules)
}

fn taken(bridge: &Bridge, line: usize, in2: f64, rules: &TakeOff) -> DeadLoad {
    worked(&mut Silent, bridge, line, in2, rules)
}

fn near(load: Val<LineLoad>, klf: f64, within: f64) {
    let found = load.q.in_kip_ft();
    assert!((found - klf).abs() <= within, "{found} against {klf} kip/ft");
}

/// Readings of thickness in inches, from where the provenance says.
fn thickness(inches: &[f64], provenance: Provenance) -> Entered<Length> {
    let readings: Vec<Length> = inches.iter().map(|&inch| Length::from_inch(inch)).collect();
    let mean = inches.iter().sum::<f64>() / inches.len() as f64;
    Entered {
        value: Length::from_inch(mean),
        readings,
        written: Vec::new(),
        provenance,
        path: "layers.l1.thickness".to_owned(),
        source: "",
    }
}

/// MBE appendix A, example A1 (from memory, 90 %; recomputed): slab 7.25 in x 7.333 ft at 150 pcf is 0.665 kip/ft;
/// W33x130 (A 38.3 in2) is 0.130 kip/ft, 0.138 with the 6 % of the example for details.
#[test]
fn mbe_example_a1() {
    let mut sizes = Sizes::even(4, 7.0 + 4.0 / 12.0, 22.0, 27.0, 65.0);
    sizes.slab = 7.25;
    sizes.haunch = 0.0;
    let both = rules(Sharing::Equal, Sharing::Equal);
    let slab = taken(&sizes.bridge(), 1, 0.0, &both);
    near(slab.dc1, 0.665, 0.0005);
    let girder = taken(&sizes.bridge(), 1, 38.3, &both).dc1.q.in_kip_ft() - slab.dc1.q.in_kip_ft();
    assert!((girder - 0.130).abs() < 0.0005 && (1.06 * girder - 0.138).abs() < 0.0005);
}

/// Adil, Adnan, Hueste, Keating (2007), vol. 2, A.2 (inputs read, outputs from memory, 90 %), L 108.583 ft: slab
/// 8 in at 8 ft 1179.03 kip ft; rails 2 x 0.326 kip/ft on six girders, 0.109 rounded, 160.64 kip ft; wearing
/// surface 1.5 in at 140 pcf over 44 ft on six girders, 0.128 rounded, 188.64 kip ft.
#[test]
fn type_iv_girder_110_ft() {
    let mut sizes = Sizes::even(6, 8.0, 44.0, 46.0, 110.0 - 17.0 / 12.0);
    sizes.haunch = 0.0;
    let mut bridge = sizes.bridge();
    bridge.deck.strips.push(strip("rail", 0.326, StripSide::Both, Stage::Later));
    bridge.deck.layers.push(layer("asphalt", thickness(&[1.5], Provenance::Drawing), 0.140));
    let load = taken(&bridge, 2, 0.0, &rules(Sharing::Equal, Sharing::Equal));
    let m = |w: Val<LineLoad>| {
        let l = Val::bare(Length::from_ft(sizes.span));
        moment(&mut Silent, w, Val::bare(Length::from_ft(sizes.span / 2.0)), l).q.in_kip_ft()
    };
    // The example rounds the loads of rails and surface to 0.001 kip/ft, 0.5 % of either.
    for (load, printed, within) in
        [(load.dc1, 1179.03, 0.1), (load.dc2, 160.64, 0.005 * 160.64), (load.dw, 188.64, 0.005 * 188.64)]
    {
        assert!((m(load) - printed).abs() < within, "{} against {printed}", m(load));
    }
}

/// Hand-worked take-off of the first demo, interior girder, kN/m: W36x182 53.6 in2 x 77 kN/m3 = 2.662; slab
/// 0.184 x 2.18 x 24.5 = 9.827; haunch 0.040 x 0.300 x 24.5 = 0.294; asphalt, cores of mean 71 mm,
/// 0.071 x 2.18 x 22.5 = 3.483.
#[test]
fn interior_girder_of_the_first_demo() {
    let m = |metres: f64| Length::from_m(metres).in_ft();
    let mut sizes = Sizes::even(5, m(2.18), m(8.53), m(9.75), m(18.3));
    sizes.slab = 184.0 / 25.4;
    sizes.haunch = 40.0 / 25.4;
    let mut bridge = sizes.bridge();
    let weight = |kn_m3: f64| Entered::measured("w", UnitWeight::from_kn_m3(kn_m3));
    bridge.deck.concrete.unit_weight = weight(24.5);
    bridge.deck.haunch_width = Entered::measured("deck.haunch_width", Length::from_mm(300.0));
    let cores = [65.0, 68.0, 70.0, 72.0, 73.0, 71.0, 78.0].map(|mm| mm / 25.4);
    let mut asphalt = layer("asphalt", thickness(&cores, Provenance::Measured), 0.140);
    asphalt.unit_weight = weight(22.5);
    bridge.deck.layers.push(asphalt);
    let by_width = TakeOff { steel: weight(77.0), ..rules(Sharing::Equal, Sharing::Tributary) };
    let load = taken(&bridge, 2, 53.6, &by_width);
    let kn_m = |load: Val<LineLoad>| load.q.in_kn_m();
    assert!((kn_m(load.dc1) - (2.6627 + 9.8274 + 0.294)).abs() < 2e-4, "{}", kn_m(load.dc1));
    assert!((kn_m(load.dw) - 3.4826).abs() < 2e-4, "{}", kn_m(load.dw));
    assert_eq!((kn_m(load.dw_other), load.readings), (0.0, 7));
    // The steel of LRFD table 3.5.1-1 differs by 0.04 %.
    assert!((steel_weight().value.in_kn_m3() - 77.0).abs() < 0.03);
    assert_eq!(steel_weight().provenance, Provenance::Assumed);
}

/// By hand: four girders at 6 ft, overhang 2 ft, curbs 1 ft from the edges: the roadway covers 4 ft of the
/// outer strip (which is 5 ft wide) and 6 ft of the inner one.
#[test]
fn layers_lie_on_the_roadway_alone() {
    let mut bridge = Sizes::even(4, 6.0, 20.0, 22.0, 40.0).bridge();
    bridge.deck.layers.push(layer("asphalt", thickness(&[2.0, 4.0], Provenance::Measured), 0.144));
    let by_width = rules(Sharing::Equal, Sharing::Tributary);
    // 3 in at 144 pcf is 0.036 ksf.
    for (line, width) in [(0, 4.0), (1, 6.0), (2, 6.0), (3, 4.0)] {
        near(taken(&bridge, line, 0.0, &by_width).dw, 0.036 * width, 1e-12);
    }
    let equal = rules(Sharing::Equal, Sharing::Equal);
    near(taken(&bridge, 0, 0.0, &equal).dw, 0.036 * 5.0, 1e-12);
}

/// A roadway that ends inside an inner girder's strip leaves the outer girder without surface, never with less
/// than none.
#[test]
fn a_girder_beside_the_roadway_carries_no_surface() {
    let mut sizes = Sizes::even(4, 6.0, 8.0, 22.0, 40.0);
    sizes.curb = 10.0;
    let mut bridge = sizes.bridge();
    bridge.deck.layers.push(layer("gravel", thickness(&[6.0], Provenance::Measured), 0.140));
    let by_width = rules(Sharing::Equal, Sharing::Tributary);
    // Roadway from 10 to 18 ft; strips end at 5, 11, 17 and 22 ft.
    for (line, width) in [(0, 0.0), (1, 1.0), (2, 6.0), (3, 1.0)] {
        near(taken(&bridge, line, 0.0, &by_width).dw, 0.07 * width, 1e-12);
    }
}

/// The lower factor of DW is for a wearing surface that was measured on this bridge: not for one from a
/// drawing, not for a utility.
#[test]
fn what_was_measured_is_kept_apart_in_dw() {
    let mut bridge = Sizes::even(4, 6.0, 20.0, 22.0, 40.0).bridge();
    bridge.deck.layers.push(layer("asphalt", thickness(&[2.0, 4.0, 3.0], Provenance::Measured), 0.144));
    bridge.deck.layers.push(layer("overlay", thickness(&[1.0], Provenance::Drawing), 0.144));
    bridge.deck.layers.push(layer("old asphalt", thickness(&[1.0, 1.0], Provenance::Measured), 0.144));
    bridge.deck.strips.push(strip("water main", 0.080, StripSide::Left, Stage::Surface));
    let load = taken(&bridge, 1, 0.0, &rules(Sharing::Equal, Sharing::Equal));
    near(load.dw_measured, 5.0 * 0.048, 1e-12);
    near(load.dw_other, 5.0 * 0.012 + 0.020, 1e-12);
    near(load.dw, 5.0 * 0.060 + 0.020, 1e-12);
    assert_eq!(load.readings, 2);

    bridge.deck.layers.remove(0);
    bridge.deck.layers.pop();
    let load = taken(&bridge, 1, 0.0, &rules(Sharing::Equal, Sharing::Equal));
    assert_eq!((load.dw_measured.q, load.readings), (LineLoad::ZERO, 0));
    // A default that nobody measured.
    bridge.deck.layers[0].thickness = Entered::assumed("t", Length::from_inch(3.0), "default");
    assert_eq!(taken(&bridge, 1, 0.0, &rules(Sharing::Equal, Sharing::Equal)).readings, 0);
}

/// Strips by stage and side: with the wet slab on the outer girder; later equally or on the outer girder.
#[test]
fn strips_by_stage_and_side() {
    let mut bridge = Sizes::even(4, 6.0, 20.0, 22.0, 40.0).bridge();
    bridge.deck.strips.push(strip("curb", 0.100, StripSide::Both, Stage::Bare));
    bridge.deck.strips.push(strip("parapet", 0.400, StripSide::Both, Stage::Later));
    bridge.deck.strips.push(strip("rail", 0.040, StripSide::Right, Stage::Later));
    let equal = rules(Sharing::Equal, Sharing::Equal);
    let outer = rules(Sharing::Tributary, Sharing::Tributary);
    let slab = |line: usize| {
        let mut plain = bridge.clone();
        plain.deck.strips.clear();
        taken(&plain, line, 0.0, &equal).dc1.q.in_kip_ft()
    };
    for (line, curb, later) in [(0, 0.1, 0.4), (1, 0.0, 0.0), (2, 0.0, 0.0), (3, 0.1, 0.44)] {
        near(taken(&bridge, line, 0.0, &equal).dc2, 0.21, 1e-12);
        let load = taken(&bridge, line, 0.0, &outer);
        near(load.dc2, later, 1e-12);
        near(load.dc1, slab(line) + curb, 1e-12);
    }
}

/// Simple span of 40 ft under 1.5 kip/ft: 300 kip ft in the middle, 30 kip at the support, 15 kip at a quarter.
#[test]
fn moment_and_shear_of_a_uniform_load() {
    let ft = |feet: f64| Val::bare(Length::from_ft(feet));
    let w = Val::bare(LineLoad::from_kip_ft(1.5));
    let m = |x: f64| moment(&mut Silent, w, ft(x), ft(40.0)).q.in_kip_ft();
    let v = |x: f64| shear(&mut Silent, w, ft(x), ft(40.0)).q.in_kip();
    for (x, by_hand) in [(0.0, 0.0), (10.0, 225.0), (20.0, 300.0), (40.0, 0.0)] {
        assert!((m(x) - by_hand).abs() < 1e-9);
    }
    for (x, by_hand) in [(0.0, 30.0), (10.0, 15.0), (20.0, 0.0), (40.0, -30.0)] {
        assert!((v(x) - by_hand).abs() < 1e-9);
    }
}

/// Each row of the take-off stands on the sheet: what was read, its weight, the sums.
#[test]
fn the_take_off_can_be_followed_row_by_row() {
    let mut bridge = Sizes::even(4, 6.0, 20.0, 22.0, 40.0).bridge();
    bridge.deck.layers.push(layer("asphalt", thickness(&[2.0, 4.0], Provenance::Measured), 0.144));
    bridge.deck.strips.push(strip("parapet", 0.400, StripSide::Both, Stage::Later));
    let mut sheet = Sheet::default();
    let load = worked(&mut sheet, &bridge, 0, 30.0, &rules(Sharing::Equal, Sharing::Tributary));
    for (value, rows) in [
        (load.dc1, &["girder", "slab", "haunch"][..]),
        (load.dc2, &["parapet"]),
        (load.dw_measured, &["asphalt"]),
        (load.dw_other, &[]),
    ] {
        let line = sheet.line(value.line).expect("a line");
        assert!((line.figure - value.q.in_kip_ft()).abs() < 1e-12);
        let Kind::Sum { rows: found } = &line.kind else { panic!("{line:?}") };
        let names: Vec<&str> = found.iter().map(|row| row.what.as_str()).collect();
        assert_eq!(names, rows);
        for row in found {
            assert!((sheet.line(row.from).expect("a line").figure - row.figure).abs() < 1e-12);
        }
    }
    let silent = taken(&bridge, 0, 30.0, &rules(Sharing::Equal, Sharing::Tributary));
    assert_eq!((silent.dc1.q, silent.dc2.q, silent.dw.q), (load.dc1.q, load.dc2.q, load.dw.q));
}

proptest! {
    #![proptest_config(ProptestConfig { failure_persistence: None, ..ProptestConfig::default() })]

    /// What all girders carry together is the weight of the cross-section, however it is shared out.
    #[test]
    fn the_girders_carry_the_cross_section(
        spacings in proptest::collection::vec(3.0_f64..14.0, 1..6),
        overhang in 0.0_f64..4.0,
        right in 0.0_f64..4.0,
        curb in 0.0_f64..3.0,
        clear in 0.5_f64..1.0,
        slab in 5.0_f64..12.0,
        asphalt in 0.0_f64..6.0,
        tributary: bool,
    ) {
        let width = overhang + right + spacings.iter().sum::<f64>();
        let roadway = (width - curb).max(1.0) * clear;
        let count = spacings.len() + 1;
        let sizes = Sizes { spacings, overhang, width, curb, roadway, slab, ..Sizes::even(2, 6.0, 6.0, 8.0, 50.0) };
        let mut bridge = sizes.bridge();
        bridge.deck.layers.push(layer("asphalt", thickness(&[asphalt], Provenance::Measured), 0.144));
        bridge.deck.strips.push(strip("curb", 0.11, StripSide::Left, Stage::Bare));
        bridge.deck.strips.push(strip("parapet", 0.45, StripSide::Both, Stage::Later));
        bridge.deck.strips.push(strip("pipe", 0.07, StripSide::Right, Stage::Surface));
        let sharing = if tributary { Sharing::Tributary } else { Sharing::Equal };
        let loads: Vec<DeadLoad> =
            (0..count).map(|line| taken(&bridge, line, 30.0, &rules(sharing, sharing))).collect();
        let total = |part: fn(&DeadLoad) -> Val<LineLoad>| loads.iter().map(|load| part(load).q.in_kip_ft()).sum::<f64>();
        let haunch = 1.0 / 12.0 * 1.0 * 0.150;
        let dc1 = count as f64 * (30.0 / 144.0 * 0.490 + haunch) + slab / 12.0 * width * 0.150 + 0.11;
        prop_assert!((total(|load| load.dc1) - dc1).abs() < 1e-9);
        prop_assert!((total(|load| load.dc2) - 0.90).abs() < 1e-9);
        prop_assert!((total(|load| load.dw_measured) - asphalt / 12.0 * roadway * 0.144).abs() < 1e-9);
        prop_assert!((total(|load| load.dw_other) - 0.07).abs() < 1e-9);
        for load in &loads {
            prop_assert!(load.dw.q >= LineLoad::ZERO);
        }
    }

    /// A mirrored bridge has mirrored dead loads.
    #[test]
    fn mirrored(spacings in proptest::collection::vec(3.0_f64..14.0, 1..6), overhang in 0.0_f64..4.0, curb in 0.0_f64..3.0) {
        let width = overhang + 2.0 + spacings.iter().sum::<f64>();
        let roadway = (width - curb) * 0.8;
        let count = spacings.len() + 1;
        let sizes = Sizes { spacings, overhang, width, curb, roadway, ..Sizes::even(2, 6.0, 6.0, 8.0, 50.0) };
        let mut bridges = [sizes.bridge(), sizes.mirrored().bridge()];
        for bridge in &mut bridges {
            bridge.deck.layers.push(layer("asphalt", thickness(&[3.0], Provenance::Measured), 0.144));
        }
        let by_width = rules(Sharing::Tributary, Sharing::Tributary);
        for line in 0..count {
            let one = taken(&bridges[0], line, 30.0, &by_width);
            let other = taken(&bridges[1], count - 1 - line, 30.0, &by_width);
            prop_assert!((one.dc1.q.in_kip_ft() - other.dc1.q.in_kip_ft()).abs() < 1e-9);
            prop_assert!((one.dw.q.in_kip_ft() - other.dw.q.in_kip_ft()).abs() < 1e-9);
        }
    }
}
