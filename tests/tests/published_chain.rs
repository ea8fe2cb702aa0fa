//! A whole rating as published: AASHTO Manual for Bridge Evaluation, appendix A, example A1 (simple-span
//! composite steel stringer, interior girder, 65 ft). Its figures are from memory (90 %), each worked
//! again to 0.5 % by hand; the manual itself was not read. What the chain takes as given are the printed
//! dead load moments and capacity; everything that the program has of its own is worked by it.

use girderbook_core::check::LimitState;
use girderbook_core::clauses::lrfd::{distribution::interior, hl93};
use girderbook_core::clauses::mbe::factors::{DesignLevel, components, design_live, surface};
use girderbook_core::clauses::mbe::rating::moment_factor;
use girderbook_core::influence::simple_span;
use girderbook_core::moving::{AxlePolicy, extremes, lane_extremes};
use girderbook_core::quantity::{Inertia, Length, Moment};
use girderbook_core::rating::combine::live_moment;
use girderbook_core::worksheet::{Silent, Val};

fn near(got: f64, published: f64, part: f64, what: &str) {
    assert!((got / published - 1.0).abs() <= part, "{what}: {got} against {published} as published");
}

#[test]
fn example_a1_rates_as_published() {
    let rec = &mut Silent;
    let span = Length::from_ft(65.0);
    // Live load at midspan: truck 890.0, tandem 762.5, lane 338.0 kip ft.
    let line = simple_span::moment(span, span / 2.0).expect("midspan");
    let most =
        |train| extremes(&line, &train, AxlePolicy::NeglectRelieving).expect("an extreme").max.moment();
    let (truck, tandem) = (most(hl93::truck()), most(hl93::tandem()));
    near(truck.in_kip_ft(), 890.0, 0.000_5, "truck");
    near(tandem.in_kip_ft(), 762.5, 0.000_5, "tandem");
    let lane = lane_extremes(&line, hl93::lane().w).expect("a lane").moments().0;
    near(lane.in_kip_ft(), 338.0, 0.000_5, "lane");
    // Share of a lane: K_g 281,603 in4, S 7.333 ft, slab 7.25 in: 0.626.
    let share = interior::moment_more(
        rec,
        Val::bare(Length::from_ft(7.333)),
        Val::bare(span),
        Val::bare(Inertia::from_in4(281_603.0)),
        Val::bare(Length::from_inch(7.25)),
    );
    near(share.q, 0.626, 0.002, "share");
    let live = live_moment(rec, share, Val::bare(0.33), Val::bare(truck), Val::bare(lane));
    near(live.q.in_kip_ft(), 952.6, 0.003, "live load moment with dynamic allowance");
    // M_DC1 439, M_DC2 129 kip ft, no wearing surface, M_n 2873 kip ft, condition and system 1.0.
    let moment = |kip_ft| Val::bare(Moment::from_kip_ft(kip_ft));
    let state = LimitState::StrengthI;
    for (level, published) in [(DesignLevel::Inventory, 1.30), (DesignLevel::Operating, 1.68)] {
        let on_live = design_live(rec, state, level);
        let dc = components(rec, state);
        let dw = surface(rec, state);
        let factor = moment_factor(
            rec,
            moment(2873.0),
            dc,
            moment(439.0),
            moment(129.0),
            dw,
            moment(0.0),
            on_live,
            live,
        );
        near(factor.q, published, 0.005, "rating factor");
    }
}
