//! Reading and comparing the cases of the moving-load reference set.

use crate::vehicles;
use girderbook_core::influence::InfluenceLine;
use girderbook_core::load::{AxleTrain, Spacing};
use girderbook_core::moving::{AxlePolicy, Workspace, envelope, lane_extremes};
use girderbook_core::quantity::{Force, Length, LineLoad, Moment, Quantity};
use serde_json::Value;

/// The lines of one case with the name of their kind, in the order of the lists of the set.
pub struct Lines {
    /// All lines.
    pub all: Vec<InfluenceLine>,
    /// `M`, `R`, `V_start` and `V_end`, with how many lines of each.
    pub kinds: [(&'static str, usize); 4],
}

/// What the numbers of a case are in.
pub struct Units {
    /// Moments.
    pub moment: fn(Moment) -> f64,
    /// Shears and reactions.
    pub force: fn(Force) -> f64,
}

/// Metres and kilonewtons.
pub const METRIC: Units = Units { moment: Moment::in_kn_m, force: Force::in_kn };
/// Feet and kips.
pub const CUSTOMARY: Units = Units { moment: Moment::in_kip_ft, force: Force::in_kip };

/// The cases of a file of the set.
///
/// # Panics
/// When the file is not as it should be.
#[must_use]
pub fn cases(name: &str) -> Vec<Value> {
    let path = format!("{}/data/oracle/{name}", env!("CARGO_MANIFEST_DIR"));
    let text = std::fs::read_to_string(path).expect("the data is beside the tests");
    let set: Value = serde_json::from_str(&text).expect("well-formed");
    let cases = set["cases"].as_array().expect("cases").clone();
    assert_eq!(Some(cases.len() as u64), set["count"].as_u64());
    cases
}

/// A number.
///
/// # Panics
/// When it is none.
#[must_use]
pub fn number(value: &Value) -> f64 {
    value.as_f64().expect("a number")
}

/// A list of numbers.
///
/// # Panics
/// When it is none.
#[must_use]
pub fn numbers(value: &Value) -> Vec<f64> {
    value.as_array().expect("a list").iter().map(number).collect()
}

/// A vehicle in metres and kilonewtons.
#[must_use]
pub fn metric(v: &Value) -> AxleTrain {
    vehicle(
        v,
        ["axle_loads_kN", "spacings_m", "index_of_spacing", "from_m", "to_m"],
        Force::from_kn,
        Length::from_m,
    )
}

/// A vehicle in feet and kips.
#[must_use]
pub fn customary(v: &Value) -> AxleTrain {
    vehicle(
        v,
        ["axle_loads_kip", "spacings_ft", "index", "from_ft", "to_ft"],
        Force::from_kip,
        Length::from_ft,
    )
}

fn vehicle(v: &Value, names: [&str; 5], force: fn(f64) -> Force, length: fn(f64) -> Length) -> AxleTrain {
    let [loads, spacings, index, from, to] = names;
    let axles = numbers(&v[loads]).into_iter().map(force).collect();
    let mut between: Vec<_> = numbers(&v[spacings]).into_iter().map(|s| Spacing::Fixed(length(s))).collect();
    let variable = &v["variable_spacing"];
    if !variable.is_null() {
        let range =
            Spacing::Range { from: length(number(&variable[from])), to: length(number(&variable[to])) };
        between[variable[index].as_u64().expect("an index") as usize] = range;
    }
    vehicles::made("of the set", axles, between)
}

/// The rule for relieving axles in a case.
///
/// # Panics
/// When the case names none.
#[must_use]
pub fn policy(inputs: &Value) -> AxlePolicy {
    match inputs["axle_policy"].as_str() {
        Some("all_axles_count") => AxlePolicy::AllCount,
        Some("neglect_relieving") => AxlePolicy::NeglectRelieving,
        other => panic!("no rule for relieving axles: {other:?}"),
    }
}

/// Largest and least values of all lines, in base units.
///
/// # Panics
/// When the search refuses the case.
#[must_use]
pub fn extremes(lines: &Lines, train: &AxleTrain, policy: AxlePolicy) -> Vec<(f64, f64)> {
    let mut out = Vec::new();
    envelope(&mut Workspace::default(), &lines.all, train, policy, &mut out).expect("finite");
    out.iter().map(|p| (p.max.value, p.min.value)).collect()
}

/// The same for a uniform load in kN/m.
///
/// # Panics
/// When the load is refused.
#[must_use]
pub fn lane(lines: &Lines, w: f64) -> Vec<(f64, f64)> {
    let of = |line| {
        let found = lane_extremes(line, LineLoad::from_kn_m(w)).expect("finite");
        (found.max, found.min)
    };
    lines.all.iter().map(of).collect()
}

/// Compares all lists of a case under its own tolerance; gives how many numbers that were.
///
/// # Panics
/// When one differs by more.
pub fn compare(case: &Value, expected: &Value, lines: &Lines, got: &[(f64, f64)], units: &Units) -> usize {
    let mut compared = 0;
    let mut first = 0;
    for (kind, count) in lines.kinds {
        for sense in ["max", "min"] {
            let want = numbers(&expected[format!("{kind}_{sense}")]);
            assert_eq!(want.len(), count, "{} {kind}", case["id"]);
            let values = got[first..first + count].iter().map(|got| {
                let base = if sense == "max" { got.0 } else { got.1 };
                match kind {
                    "M" => (units.moment)(Moment::from_base(base)),
                    _ => (units.force)(Force::from_base(base)),
                }
            });
            compared += close(case, &format!("{kind}_{sense}"), &values.collect::<Vec<_>>(), &want);
        }
        first += count;
    }
    compared
}

/// Compares one list of a case under its own tolerance, and under the stricter one of 1e-8 of the
/// largest value: the set is printed to ten digits and its optima were zoomed in on. Gives the length
/// of the list.
///
/// # Panics
/// When one number differs by more.
pub fn close(case: &Value, what: &str, got: &[f64], want: &[f64]) -> usize {
    assert_eq!(got.len(), want.len(), "{} {what}", case["id"]);
    let tolerance = |key: &str| number(&case["tolerance"][key]);
    let largest = want.iter().fold(0.0, |a: f64, b| a.max(b.abs()));
    let allowed = tolerance("abs").max(tolerance("rel") * largest).min(1e-8 * largest.max(1.0));
    for (got, want) in got.iter().zip(want) {
        assert!((got - want).abs() <= allowed, "{} {what}: {got}, not {want}", case["id"]);
    }
    want.len()
}
