//! Drawings: to scale, inside their frame, in whole units, dashed where assumed.

mod common;

use common::{demo, empty, full, nodes, surface};
use girderbook_web::node::{Node, View};
use girderbook_web::pages::Page;

/// Every place that path data goes through.
fn places(d: &str) -> Vec<(f64, f64)> {
    let mut out = Vec::new();
    let (mut x, mut y) = (0.0, 0.0);
    let mut rest = d;
    while let Some(command) = rest.chars().next() {
        rest = &rest[1..];
        let end = rest.find(|c: char| c.is_ascii_alphabetic()).unwrap_or(rest.len());
        let numbers: Vec<f64> = rest[..end]
            .replace('-', " -")
            .split_whitespace()
            .map(|n| n.parse().unwrap_or_else(|_| panic!("{n} in {d}")))
            .collect();
        rest = &rest[end..];
        for number in &numbers {
            assert_eq!(number.fract(), 0.0, "{d} is not in whole units");
        }
        match command {
            'M' | 'L' => (x, y) = (numbers[0], numbers[1]),
            'l' => (x, y) = (x + numbers[0], y + numbers[1]),
            'H' => x = numbers[0],
            'h' => x += numbers[0],
            'V' => y = numbers[0],
            'v' => y += numbers[0],
            // A half circle: its far end.
            'a' => (x, y) = (x + numbers[5], y + numbers[6]),
            'Z' => {}
            other => panic!("{other} in {d}"),
        }
        out.push((x, y));
    }
    out
}

fn bounds(node: &Node) -> (f64, f64, f64, f64) {
    let all = places(node.prop("d"));
    let fold = |f: fn(f64, f64) -> f64, first: f64, pick: fn(&(f64, f64)) -> f64| {
        all.iter().map(pick).fold(first, f)
    };
    (
        fold(f64::min, f64::INFINITY, |p| p.0),
        fold(f64::min, f64::INFINITY, |p| p.1),
        fold(f64::max, f64::NEG_INFINITY, |p| p.0),
        fold(f64::max, f64::NEG_INFINITY, |p| p.1),
    )
}

fn drawing<'a>(view: &'a View, title: &str) -> &'a Node {
    let found = |n: &&Node| n.k == "drawing" && n.prop("title").starts_with(title);
    nodes(view).into_iter().find(found).unwrap_or_else(|| panic!("no drawing {title}"))
}

fn shapes<'a>(drawing: &'a Node, class: &str) -> Vec<&'a Node> {
    drawing.c.iter().filter(|n| n.k == "shape" && n.prop("class").split(' ').any(|c| c == class)).collect()
}

#[test]
fn everything_lies_inside_its_frame_in_whole_units_and_is_described() {
    for mut desk in [empty(), full(), demo(0), demo(1)] {
        for edit in [
            ("system", "ft-kip"),
            ("girders.count", "12"),
            ("spans.s1.length", "60 m"),
            ("deck.width", "30 m"),
        ] {
            let view = desk.open(Page::Posting.id()).clone();
            for drawing in nodes(&view).into_iter().filter(|n| n.k == "drawing") {
                assert!(!drawing.prop("desc").is_empty(), "{}", drawing.prop("title"));
                let frame: Vec<f64> =
                    drawing.prop("view").split(' ').map(|n| n.parse().expect("a number")).collect();
                for part in &drawing.c {
                    if part.k == "shape" {
                        let (x0, y0, x1, y1) = bounds(part);
                        let inside = x0 >= 0.0 && y0 >= 0.0 && x1 <= frame[2] && y1 <= frame[3];
                        assert!(inside, "{} {part:?} outside {frame:?}", drawing.prop("title"));
                    } else {
                        let (x, y): (i32, i32) =
                            (part.prop("x").parse().expect("whole"), part.prop("y").parse().expect("whole"));
                        let inside = (0..=640).contains(&x) && f64::from(y) <= frame[3] && y >= 10;
                        assert!(inside, "{} {part:?}", drawing.prop("title"));
                    }
                }
            }
            desk.edit(edit.0, edit.1);
        }
    }
}

/// W36x182 (AISC): 36.3 in deep, flange 12.1 in; deck 9.42 m, spacing 2.18 m, slab 7 1/4 in.
#[test]
fn the_cross_section_is_to_scale() {
    let desk = demo(0);
    let across = drawing(desk.view(), "Across");
    let deck = shapes(across, "deck");
    let (x0, y0, x1, y1) = bounds(deck[0]);
    let per_m = (x1 - x0) / 9.42;
    assert!((y1 - y0 - 0.184_15 * per_m).abs() <= 1.0, "slab {} at {per_m} a metre", y1 - y0);
    let steel: Vec<_> = across.c.iter().filter(|n| n.prop("name").starts_with("girder ")).collect();
    assert_eq!(steel.len(), 5);
    let middles: Vec<f64> = steel
        .iter()
        .map(|n| {
            let b = bounds(n);
            (b.0 + b.2) / 2.0
        })
        .collect();
    for pair in middles.windows(2) {
        assert!((pair[1] - pair[0] - 2.18 * per_m).abs() <= 1.0, "{middles:?}");
    }
    assert!((middles[0] - x0 - 0.35 * per_m).abs() <= 1.0, "overhang");
    for girder in &steel {
        let (a, t, b, u) = bounds(girder);
        assert!((u - t - 36.3 * 0.0254 * per_m).abs() <= 1.0, "depth");
        assert!((b - a - 12.1 * 0.0254 * per_m).abs() <= 2.0, "flange");
    }
    let governs: Vec<_> = shapes(across, "steel-governs");
    assert_eq!(governs.len(), 1);
    // The readings as they were written.
    let labels: Vec<&str> = across.c.iter().filter(|n| n.k == "label").map(|n| n.prop("text")).collect();
    assert!(labels.contains(&"roadway 8.53 m"), "{labels:?}");
    assert_eq!(labels.iter().filter(|l| **l == "2.18 m").count(), 4);
    assert_eq!(shapes(across, "mark").len(), 1);
    assert_eq!(shapes(across, "wheel").len(), 2);
}

#[test]
fn what_is_not_entered_is_drawn_as_assumed() {
    let mut desk = empty();
    let across = drawing(desk.view(), "Across");
    assert!(shapes(across, "deck").iter().all(|n| n.prop("class").contains("assumed")));
    assert!(shapes(drawing(desk.view(), "Along"), "steel-assumed").len() == 1);
    for (path, text) in [("deck.width", "9 m"), ("deck.slab", "200 mm"), ("girders.count", "4")] {
        desk.edit(path, text);
    }
    let across = drawing(desk.view(), "Across");
    assert!(shapes(across, "deck").iter().all(|n| !n.prop("class").contains("assumed")));
    assert_eq!(shapes(across, "steel-assumed").len(), 4);
    desk.edit("members.m1.shape", "W36x182");
    assert_eq!(shapes(drawing(desk.view(), "Across"), "steel").len(), 4);
    desk.provenance("deck.slab", "assumed");
    assert!(
        shapes(drawing(desk.view(), "Across"), "deck").iter().all(|n| n.prop("class").contains("assumed"))
    );
}

#[test]
fn parts_open_their_fields() {
    let desk = demo(0);
    let across = drawing(desk.view(), "Across");
    let opens: Vec<&str> = across.c.iter().map(|n| n.prop("go")).filter(|go| !go.is_empty()).collect();
    for field in [
        "deck.slab",
        "deck.roadway",
        "layers.l1.thickness",
        "strips.p1.weight",
        "members.m1.shape",
        "girders.g2.spacing",
        "findings.f6.from",
        "deck.haunch",
    ] {
        assert!(opens.contains(&field), "{field} in {opens:?}");
    }
    for part in across.c.iter().filter(|n| n.k == "shape" && !n.prop("go").is_empty()) {
        assert!(!part.prop("name").is_empty(), "{part:?} has no name");
    }
}

/// Axle spacings of the SU7, 10 ft and then 4 ft (MBE, appendix D6A, from memory), on 18.3 m.
#[test]
fn the_vehicle_stands_to_scale_where_it_governs() {
    let desk = demo(0);
    let along = drawing(desk.view(), "Along");
    let beam = bounds(shapes(along, "steel")[0]);
    let per_m = (beam.2 - beam.0) / 18.3;
    let mut axles: Vec<f64> = shapes(along, "axle").iter().map(|n| places(n.prop("d"))[0].0).collect();
    axles.sort_by(f64::total_cmp);
    let mut gaps: Vec<f64> = axles.windows(2).map(|pair| (pair[1] - pair[0]) / per_m / 0.3048).collect();
    gaps.sort_by(f64::total_cmp);
    assert_eq!(gaps.len(), 6, "seven axles: {axles:?}");
    for (gap, feet) in gaps.iter().zip([4.0, 4.0, 4.0, 4.0, 4.0, 10.0]) {
        assert!((gap - feet).abs() < 0.15, "{gaps:?}");
    }
}

#[test]
fn bars_end_where_their_factor_is() {
    let desk = demo(1);
    let bars = drawing(desk.view(), "Rating by vehicle");
    let line = bounds(shapes(bars, "limit")[0]).0;
    let base = bounds(shapes(bars, "bar-base")[0]);
    let mut seen = 0;
    for class in ["bar-ok", "bar-low"] {
        for bar in shapes(bars, class) {
            let factor: f64 = bar.prop("name").rsplit(' ').next().expect("words").parse().expect("a factor");
            let (x0, _, x1, _) = bounds(bar);
            let shown = (x1 - x0) / (line - base.0);
            assert!((shown - factor.min(2.0)).abs() < 0.02, "{} is {shown} long", bar.prop("name"));
            assert_eq!(class == "bar-low", factor < 1.0);
            seen += 1;
        }
    }
    // Seven legal trucks and one of the county's own.
    assert_eq!(seen, 8);
    // Status is said in words as well.
    let words: Vec<&str> = bars.c.iter().filter(|n| n.k == "label").map(|n| n.prop("text")).collect();
    assert!(words.contains(&"no sign"), "{words:?}");
}

#[test]
fn demand_and_capacity_share_the_ends_of_the_elevation() {
    let mut desk = demo(1);
    desk.act("findings.remove:f9");
    let view = desk.view();
    let beam = bounds(shapes(drawing(view, "Along"), "steel")[0]);
    let diagram = drawing(view, "Asked and carried");
    for class in ["demand", "capacity"] {
        let b = bounds(shapes(diagram, class)[0]);
        assert!(b.0 >= beam.0 - 22.0 && b.2 <= beam.2 + 22.0, "{class} {b:?} against {beam:?}");
    }
    let words: Vec<&str> = diagram.c.iter().filter(|n| n.k == "label").map(|n| n.prop("text")).collect();
    assert!(words[0].starts_with("asked ") && words[1].starts_with("carries "), "{words:?}");
}

#[test]
fn the_sign_says_what_the_posting_says() {
    let mut desk = demo(0);
    let sign = |desk: &girderbook_web::desk::Desk| {
        let found =
            surface(desk.view(), "verdict").into_iter().find(|n| n.k == "drawing").cloned().expect("a sign");
        found.c.iter().filter(|n| n.k == "label").map(|n| n.prop("text").to_owned()).collect::<Vec<_>>()
    };
    let tonnes = sign(&desk);
    assert_eq!(tonnes[0], "WEIGHT LIMIT");
    assert!(tonnes.iter().any(|t| t.ends_with(" t")), "{tonnes:?}");
    desk.edit("posting.unit", "short-tons");
    let tons = sign(&desk);
    assert!(tons.iter().any(|t| t.ends_with(" T")), "{tons:?}");
}
