//! How long the exact search takes, beside stepping the vehicle along at 1 cm over the same lines in the
//! same run: only the ratio is worth comparing between machines.

use criterion::{Criterion, criterion_group, criterion_main};
use girderbook_core::influence::{InfluenceLine, Side, simple_span};
use girderbook_core::load::AxleTrain;
use girderbook_core::moving::{AxlePolicy, Peaks, Workspace, envelope};
use girderbook_core::quantity::{Length, Quantity};
use girderbook_tests::vehicles::{ELEVEN_AXLES, US, hs20_variable, notional, train_of};
use std::hint::black_box;
use std::time::Duration;

const SECTIONS: usize = 21;

/// Moments and shears at 21 sections of a simple span.
fn lines(span: Length) -> Vec<InfluenceLine> {
    let mut all = Vec::new();
    for i in 0..SECTIONS {
        let x = span * (i as f64 / (SECTIONS - 1) as f64);
        let side = if i == 0 { Side::Right } else { Side::Left };
        all.push(simple_span::moment(span, x).expect("inside"));
        all.push(simple_span::shear(span, x, side).expect("on the beam"));
    }
    all
}

/// Stepping at 1 cm, as one would write it for a simple span: ordinates by formula, both directions.
fn stepping_at_1_cm(span: f64, loads: &[f64], offsets: &[f64], out: &mut Vec<[f64; 4]>) {
    const STEP: f64 = 0.01;
    out.clear();
    let steps = ((span + offsets[offsets.len() - 1]) / STEP).ceil() as usize;
    for section in 0..SECTIONS {
        let x = span * section as f64 / (SECTIONS - 1) as f64;
        let [mut m_max, mut m_min, mut v_max, mut v_min] = [0.0_f64; 4];
        for forward in [true, false] {
            for step in 0..=steps {
                let way = step as f64 * STEP;
                let (mut m, mut v) = (0.0, 0.0);
                for (load, offset) in loads.iter().zip(offsets) {
                    let a = if forward { way - offset } else { span - way + offset };
                    if (0.0..=span).contains(&a) {
                        let before = a < x;
                        m += load * if before { a * (span - x) / span } else { x * (span - a) / span };
                        v += load * if before { -a / span } else { 1.0 - a / span };
                    }
                }
                m_max = m_max.max(m);
                m_min = m_min.min(m);
                v_max = v_max.max(v);
                v_min = v_min.min(v);
            }
        }
        out.push([m_max, m_min, v_max, v_min]);
    }
}

fn bench(c: &mut Criterion) {
    let mut group = c.benchmark_group("21 sections, M and V, both directions");
    group.warm_up_time(Duration::from_millis(300)).measurement_time(Duration::from_secs(1)).sample_size(20);

    let span = Length::from_m(18.3);
    let lines = lines(span);
    let eleven = train_of(&ELEVEN_AXLES);
    let (mut workspace, mut out): (_, Vec<Peaks>) = (Workspace::default(), Vec::new());
    let mut run = |train: &AxleTrain| {
        // The notional rating load is the one whose relieving axles are left out.
        let notional = train.name() == "NRL6";
        let policy = if notional { AxlePolicy::NeglectRelieving } else { AxlePolicy::AllCount };
        envelope(&mut workspace, &lines, black_box(train), policy, &mut out).expect("finite");
        black_box(&out).len()
    };
    group.bench_function("eleven axles, exact", |b| b.iter(|| run(&eleven)));
    group.bench_function("HS20 with a variable spacing, exact", |b| b.iter(|| run(&hs20_variable())));

    let fleet: Vec<_> = US.iter().map(train_of).collect();
    group.bench_function("16 vehicles, exact", |b| b.iter(|| fleet.iter().map(&mut run).sum::<usize>()));
    let with_ranges: Vec<_> = fleet
        .iter()
        .filter(|t| !["HS20", "NRL6"].contains(&t.name()))
        .cloned()
        .chain([hs20_variable(), notional()])
        .collect();
    group.bench_function("16 vehicles, two with a variable spacing, exact", |b| {
        b.iter(|| with_ranges.iter().map(&mut run).sum::<usize>());
    });

    let loads: Vec<_> = eleven.axles().iter().map(|a| a.base()).collect();
    let mut offsets = vec![0.0];
    for spacing in eleven.spacings() {
        offsets.push(offsets[offsets.len() - 1] + spacing.least().in_m());
    }
    let mut stepped = Vec::new();
    group.bench_function("eleven axles, stepping at 1 cm", |b| {
        b.iter(|| {
            stepping_at_1_cm(black_box(span.in_m()), &loads, &offsets, &mut stepped);
            black_box(&stepped).len()
        });
    });
    group.finish();
}

criterion_group!(benches, bench);
criterion_main!(benches);
