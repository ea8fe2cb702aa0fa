//! Which of the distribution rules applies to a girder line, and the share that rules.

use super::distribution as d;
use super::lanes;
use crate::bridge::Bridge;
use crate::problem::Problem;
use crate::quantity::{Area, Inertia, Length};
use crate::share::{LaneShare, Roadway, lever, rigid};
use crate::units::Entered;
use crate::units::mark::{Deg, Ft, Inch, One};
use crate::worksheet::{Recorder, Val};

/// Moment, or shear and reactions.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Effect {
    /// Bending.
    Moment,
    /// Shear and reactions.
    Shear,
}

/// What the stiffness parameter needs of the girder as it is sound.
#[derive(Clone, Copy, Debug)]
pub struct Stiffness {
    /// Modular ratio of steel to deck concrete.
    pub n: Val<f64>,
    /// Second moment of area of the bare girder.
    pub inertia: Val<Inertia>,
    /// Area of the bare girder.
    pub area: Val<Area>,
    /// Centroid to the top of the girder.
    pub y_top: Val<Length>,
}

/// The bridge seen across.
#[derive(Clone, Copy, Debug)]
pub struct Across<'a> {
    /// The bridge.
    pub bridge: &'a Bridge,
    /// Index of the girder line.
    pub line: usize,
    /// Lanes that the roadway holds, and the trucks' freedom on it.
    pub road: Roadway,
    /// Number of lanes.
    pub lanes: u32,
    /// Whether diaphragms work, so that the section turns as a plane.
    pub diaphragms: bool,
}

/// What the formulas need, on lines of the sheet.
struct Terms {
    s: Val<Length>,
    l: Val<Length>,
    t_s: Val<Length>,
    n_b: Val<f64>,
    k_g: Val<Inertia>,
    k: Val<f64>,
}

/// The share of a lane that a girder line takes.
///
/// Interior lines by the formulas of table 4.6.2.2.2b-1 or 4.6.2.2.3a-1; exterior ones by the lever
/// rule for one lane, the corrected interior share for more, and the rigid cross-section where
/// diaphragms work. The lever rule stands in where the table sends there (spacing over 16 ft, two
/// girders), and limits the formula with three.
///
/// # Errors
/// When the bridge lies outside the range of use; the problem names the entry.
pub fn girder_share<R: Recorder>(
    rec: &mut R,
    across: &Across<'_>,
    effect: Effect,
    stiffness: &Stiffness,
) -> Result<LaneShare, Problem> {
    rec.heading(match effect {
        Effect::Moment => "Share of a lane, moment",
        Effect::Shear => "Share of a lane, shear and reactions",
    });
    let terms = terms(rec, across, stiffness);
    let exterior = across.bridge.is_exterior(across.line);
    let by_lever = terms.s.q > Length::from_ft(16.0) || across.bridge.lines.len() < 3;
    let share = if by_lever {
        rec.remark(|| "The table sends to the lever rule (spacing over 16 ft, or two girders).".to_owned());
        lever_shares(rec, across, across.lanes)?
    } else {
        check_range(rec, across, effect, &terms)?;
        let share = if exterior {
            exterior_share(rec, across, effect, &terms)?
        } else {
            interior_share(rec, across, effect, &terms)
        };
        if across.bridge.lines.len() == 3 {
            let lever = lever_shares(rec, across, across.lanes)?;
            LaneShare { share: d::lesser(rec, share.share, lever.share), lanes: share.lanes }
        } else {
            share
        }
    };
    match effect {
        Effect::Shear => skewed(rec, across, &terms, share),
        Effect::Moment => Ok(share),
    }
}

fn terms<R: Recorder>(rec: &mut R, across: &Across<'_>, stiffness: &Stiffness) -> Terms {
    let bridge = across.bridge;
    let spacing = spacing(bridge, across.line);
    let s = rec.found("S", "spacing of the girders", spacing, Ft, 0.0, || {
        if bridge.is_exterior(across.line) {
            "to the neighbour".to_owned()
        } else {
            "mean of the spacings at either side".to_owned()
        }
    });
    let l = rec.given("L", "span", &bridge.spans[0].length, Ft);
    let t_s = rec.given("t_s", "thickness of the slab", &bridge.deck.slab, Inch);
    let t_h = rec.given("t_h", "haunch", &bridge.deck.haunch, Inch);
    let count = u32::try_from(bridge.lines.len()).unwrap_or(u32::MAX);
    let n_b = rec.given("N_b", "number of girders", &Entered::measured("girders", f64::from(count)), One);
    let e_g = d::slab_offset(rec, stiffness.y_top, t_h, t_s);
    let k_g = d::stiffness(rec, stiffness.n, stiffness.inertia, stiffness.area, e_g);
    let k = d::stiffness_term(rec, k_g, l, t_s);
    Terms { s, l, t_s, n_b, k_g, k }
}

/// Spacing that the formulas use: the mean at either side, or that to the only neighbour.
fn spacing(bridge: &Bridge, line: usize) -> Length {
    let y = |i: usize| bridge.lines[i].y;
    let last = bridge.lines.len() - 1;
    match (line, last) {
        (_, 0) => bridge.deck.width.value,
        (0, _) => y(1) - y(0),
        (i, last) if i == last => y(last) - y(last - 1),
        (i, _) => (y(i + 1) - y(i - 1)) / 2.0,
    }
}

fn check_range<R: Recorder>(
    rec: &mut R,
    across: &Across<'_>,
    effect: Effect,
    t: &Terms,
) -> Result<(), Problem> {
    // With three girders the formula is limited by the lever rule, and the table's four do not bind.
    let n_b = if across.bridge.lines.len() == 3 { Val { q: 4.0, line: t.n_b.line } } else { t.n_b };
    let inside = match effect {
        Effect::Moment => d::moment_range(rec, t.s, t.t_s, t.l, n_b, t.k_g),
        Effect::Shear => d::shear_range(rec, t.s, t.t_s, t.l, n_b),
    };
    if inside {
        return Ok(());
    }
    let (s, t_s, l) = (t.s.q.in_ft(), t.t_s.q.in_inch(), t.l.q.in_ft());
    let bridge = across.bridge;
    let (path, what) = if !(3.5..=16.0).contains(&s) {
        (spacing_path(bridge, across.line), "girder spacing must be 1.07 to 4.88 m (3.5 to 16 ft)")
    } else if !(4.5..=12.0).contains(&t_s) {
        (bridge.deck.slab.path.clone(), "slab thickness must be 114 to 305 mm (4.5 to 12 in)")
    } else if !(20.0..=240.0).contains(&l) {
        (bridge.spans[0].length.path.clone(), "span must be 6.1 to 73 m (20 to 240 ft)")
    } else {
        (String::from("members"), "longitudinal stiffness K_g must be 10,000 to 7,000,000 in4")
    };
    Err(Problem::error(
        path,
        format!("outside the range of the LRFD distribution formulas: {what}"),
        "check the entry; a bridge like this needs a refined analysis of how load spreads",
    ))
}

fn spacing_path(bridge: &Bridge, line: usize) -> String {
    let of = |i: usize| bridge.lines.get(i).and_then(|l| l.spacing.as_ref()).map(|s| s.path.clone());
    of(line).or_else(|| of(line + 1)).unwrap_or_else(|| "girders".to_owned())
}

fn interior_share<R: Recorder>(rec: &mut R, across: &Across<'_>, effect: Effect, t: &Terms) -> LaneShare {
    let one = match effect {
        Effect::Moment => d::moment_one(rec, t.s, t.l, t.k),
        Effect::Shear => d::shear_one(rec, t.s),
    };
    if across.lanes < 2 {
        rec.remark(|| "One lane fits: the one-lane share rules; multiple presence is in it.".to_owned());
        return LaneShare { share: one, lanes: 1 };
    }
    let more = interior_more(rec, effect, t);
    larger(rec, LaneShare { share: one, lanes: 1 }, LaneShare { share: more, lanes: 2 })
}

fn interior_more<R: Recorder>(rec: &mut R, effect: Effect, t: &Terms) -> Val<f64> {
    match effect {
        Effect::Moment => d::moment_more(rec, t.s, t.l, t.k),
        Effect::Shear => d::shear_more(rec, t.s),
    }
}

fn larger<R: Recorder>(rec: &mut R, a: LaneShare, b: LaneShare) -> LaneShare {
    let lanes = if b.share.q > a.share.q { b.lanes } else { a.lanes };
    LaneShare { share: d::larger(rec, a.share, b.share), lanes }
}

fn exterior_share<R: Recorder>(
    rec: &mut R,
    across: &Across<'_>,
    effect: Effect,
    t: &Terms,
) -> Result<LaneShare, Problem> {
    let mut share = lever_share(rec, across, 1)?;
    if across.lanes > 1 {
        let d_e = edge_distance(rec, across);
        let more = if d::exterior_range(rec, d_e) {
            let e = match effect {
                Effect::Moment => d::exterior_moment(rec, d_e),
                Effect::Shear => d::exterior_shear(rec, d_e),
            };
            let interior = interior_more(rec, effect, t);
            LaneShare { share: d::corrected(rec, e, interior), lanes: 2 }
        } else {
            lever_shares(rec, across, across.lanes)?
        };
        share = larger(rec, share, more);
    }
    if across.diaphragms {
        for n in 1..=across.lanes.min(lanes::MOST) {
            if let Some(turned) = rigid_share(rec, across, n) {
                share = larger(rec, share, turned);
            }
        }
    }
    Ok(share)
}

/// From the web of the exterior girder to the inside of the curb; negative where the curb stands
/// inside the girder.
fn edge_distance<R: Recorder>(rec: &mut R, across: &Across<'_>) -> Val<Length> {
    let y = across.bridge.lines[across.line].y;
    let road = &across.road;
    let distance = if across.line == 0 { y - road.left } else { road.left + road.width - y };
    rec.found("d_e", "web of the exterior girder to the curb", distance, Ft, 0.0, || {
        "negative: the curb stands inside the girder".to_owned()
    })
}

/// The worst of one and more lanes by the lever rule.
fn lever_shares<R: Recorder>(rec: &mut R, across: &Across<'_>, most: u32) -> Result<LaneShare, Problem> {
    let mut share = lever_share(rec, across, 1)?;
    for n in 2..=most.min(lanes::MOST) {
        let next = lever_share(rec, across, n)?;
        share = larger(rec, share, next);
    }
    Ok(share)
}

fn lever_share<R: Recorder>(rec: &mut R, across: &Across<'_>, n: u32) -> Result<LaneShare, Problem> {
    let girders: Vec<Length> = across.bridge.lines.iter().map(|l| l.y).collect();
    let placed = lever::worst(&girders, across.line, &across.road, n).ok_or_else(|| {
        Problem::error(
            across.bridge.deck.roadway.path.clone(),
            format!("{n} trucks do not fit beside each other between the curbs"),
            "check the roadway width",
        )
    })?;
    let tight = across.road.is_tight(n);
    let g_p = rec.found("g_p", "lever rule, worst placement", placed.share, One, 0.0, || {
        let wheels: Vec<String> =
            placed.left_wheels.iter().map(|y| format!("{:.2}", (*y - across.road.left).in_ft())).collect();
        let narrow = if tight { "; the road is too narrow for 4 ft between trucks" } else { "" };
        format!("left wheels at {} ft from the left curb{narrow}", wheels.join(" and "))
    });
    let m = lanes::multiple_presence(rec, n);
    Ok(LaneShare { share: d::with_presence(rec, m, g_p), lanes: n })
}

fn rigid_share<R: Recorder>(rec: &mut R, across: &Across<'_>, n: u32) -> Option<LaneShare> {
    let girders: Vec<Length> = across.bridge.lines.iter().map(|l| l.y).collect();
    let placed = rigid::worst(&girders, across.line, &across.road, n)?;
    let g_p = rec.found("g_p", "rigid cross-section", placed.share, One, 0.0, || {
        let e: Vec<String> = placed.eccentricities.iter().map(|e| format!("{:.2}", e.in_ft())).collect();
        format!(
            "N_L / N_b + X_ext * sum(e) / sum(x2) with X_ext {:.2} ft, e {} ft, sum(x2) {:.1} ft2 \
             (AASHTO LRFD 9th ed. C4.6.2.2.2d)",
            placed.x_outer.in_ft(),
            e.join(" and "),
            placed.squares * placed.x_outer.in_ft() * placed.x_outer.in_ft()
        )
    });
    let m = lanes::multiple_presence(rec, n);
    Some(LaneShare { share: d::with_presence(rec, m, g_p), lanes: n })
}

fn skewed<R: Recorder>(
    rec: &mut R,
    across: &Across<'_>,
    t: &Terms,
    share: LaneShare,
) -> Result<LaneShare, Problem> {
    let skew = &across.bridge.skew;
    let size = skew.value.abs();
    if size.in_deg() == 0.0 {
        return Ok(share);
    }
    if size.in_deg() > 60.0 {
        return Err(Problem::error(
            skew.path.clone(),
            "the LRFD correction of shear for skew ends at 60 degrees",
            "check the skew; a bridge like this needs a refined analysis",
        ));
    }
    let theta = rec.given_as("theta", "skew of the supports", skew, size, Deg);
    let c_v = d::skew_shear(rec, t.l, t.t_s, t.k_g, theta);
    Ok(LaneShare { share: d::skewed(rec, c_v, share.share), lanes: share.lanes })
}
