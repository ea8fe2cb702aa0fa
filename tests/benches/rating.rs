//! One full re-rating of the first demo book, and the same with its effects remembered, beside plain
//! stepping of its vehicles at 1 cm in the same run.

use std::hint::black_box;
use std::time::Duration;

use criterion::{Criterion, criterion_group, criterion_main};
use girderbook_core::basis::Basis;
use girderbook_core::basis::mbe_a::MbeA;
use girderbook_core::bridge::Bridge;
use girderbook_core::document;
use girderbook_core::load::AxleTrain;
use girderbook_core::quantity::Length;
use girderbook_core::rating::Rater;

fn demo(basis: &MbeA) -> Bridge {
    let path = concat!(env!("CARGO_MANIFEST_DIR"), "/../core/demos/hollow-fork.json");
    let text = std::fs::read_to_string(path).expect("the demo book");
    let book = document::read(&text).expect("a readable book");
    document::bridge(&book, basis).bridge.expect("a whole bridge")
}

/// Midspan moment of a train stepped over a simple span at 1 cm, both ways: what a table does.
fn stepped(span: Length, train: &AxleTrain) -> f64 {
    let length = span.in_m();
    let mut best = 0.0_f64;
    for way in [train.clone(), train.reversed()] {
        let mut offsets = vec![0.0];
        for spacing in way.spacings() {
            offsets.push(offsets[offsets.len() - 1] + spacing.least().in_m());
        }
        let loads: Vec<f64> = way.axles().iter().map(|a| a.in_kn()).collect();
        let steps = ((length + offsets[offsets.len() - 1]) * 100.0) as u32;
        for i in 1..20_u32 {
            let x = length * f64::from(i) / 20.0;
            for step in 0..=steps {
                let front = f64::from(step) / 100.0;
                let moment: f64 = offsets
                    .iter()
                    .zip(&loads)
                    .map(|(o, p)| (front - o, p))
                    .filter(|(at, _)| (0.0..=length).contains(at))
                    .map(|(at, p)| p * if at < x { at * (length - x) } else { x * (length - at) } / length)
                    .sum();
                best = best.max(moment);
            }
        }
    }
    best
}

fn rating(c: &mut Criterion) {
    let basis = MbeA::default();
    let bridge = demo(&basis);
    let mut group = c.benchmark_group("full re-rating of the first demo");
    group.warm_up_time(Duration::from_millis(500)).measurement_time(Duration::from_secs(2)).sample_size(20);
    group.bench_function("everything anew", |b| {
        b.iter(|| Rater::default().rate(black_box(&bridge), &basis).expect("a rating"));
    });
    let mut rater = Rater::default();
    group.bench_function("effects remembered", |b| {
        b.iter(|| rater.rate(black_box(&bridge), &basis).expect("a rating"));
    });
    let cases = basis.cases(&bridge);
    let span = bridge.spans[0].length.value;
    group.bench_function("its vehicles stepped at 1 cm, moment alone", |b| {
        b.iter(|| {
            cases
                .iter()
                .flat_map(|case| &case.trains)
                .map(|t| stepped(black_box(span), t))
                .fold(0.0, f64::max)
        });
    });
    group.finish();
}

criterion_group!(benches, rating);
criterion_main!(benches);
