//! Rating by vehicle: a bar past the line carries it.

use girderbook_core::check::Level;
use girderbook_core::rating::Rating;
use girderbook_core::report::show::weight;
use girderbook_core::report::verdict::{limit, outcome, outcome_tone};
use girderbook_core::report::{Tone, tables::load_name};

use super::{Canvas, rect, whole};
use crate::key;
use crate::node::Node;
use crate::scene::Scene;

const BAR_LEFT: i32 = 204;
const BAR_RIGHT: i32 = 444;
/// The factor at the right end of a bar.
const MOST: f64 = 2.0;
const ROW: i32 = 25;
/// Most characters of a name that fit before the weight.
const NAME: usize = 15;

/// A name as far as it has room.
fn short(name: &str) -> String {
    match name.char_indices().nth(NAME) {
        None => name.to_owned(),
        Some(_) => name.chars().take(NAME - 1).chain(['…']).collect(),
    }
}

/// The drawing.
pub fn node(s: &Scene, rating: &Rating) -> Node {
    let mut canvas = Canvas::new("Rating by vehicle", "a bar past the line carries it");
    let wide = f64::from(BAR_RIGHT - BAR_LEFT);
    let mut y = 8;
    let mut said = Vec::new();
    for vehicle in &rating.by_vehicle {
        let Some(load) = rating.loads.get(vehicle.load).filter(|load| load.level == Level::Legal) else {
            continue;
        };
        let name = load_name(rating, vehicle.load);
        let ruling = vehicle.ruling.and_then(|i| Some((i, rating.checks.get(i)?)));
        let safe = rating.posting.safe.iter().find(|safe| safe.load == vehicle.load);
        let words = safe.map_or(String::new(), |safe| limit(safe.limit, s.sign_unit()));
        let (figure, low, factor, go) = match ruling {
            Some((i, check)) => (
                outcome(&check.outcome),
                outcome_tone(&check.outcome) == Tone::Bad,
                check.outcome.rank().unwrap_or(0.0),
                key::go(s, i),
            ),
            None => ("no number".to_owned(), false, 0.0, String::new()),
        };
        let text = y + 15;
        canvas.label_to((10, text), "strong", "start", short(&name), &go);
        canvas.label(
            (194, text),
            "small",
            "end",
            load.weight.map_or(String::new(), |w| weight(w, s.system())),
        );
        canvas.shape("bar-base", rect(BAR_LEFT, y + 3, BAR_RIGHT, y + 19));
        let end = BAR_LEFT + whole((factor / MOST).clamp(0.0, 1.0) * wide);
        let class = if low { "bar-low" } else { "bar-ok" };
        canvas.part(class, rect(BAR_LEFT, y + 3, end, y + 19), &go, &format!("{name} {figure}"));
        let class = if low { "low" } else { "strong" };
        canvas.label((456, text), class, "start", figure.clone());
        canvas.label((540, text), if low { "low" } else { "small" }, "start", words.clone());
        said.push(format!("{name} {figure}, {words}"));
        y += ROW;
    }
    let line = BAR_LEFT + whole(wide / MOST);
    canvas.shape("limit", format!("M{line} 4V{}", y + 2));
    canvas.label((line, y + 16), "small", "middle", "1.0");
    canvas.done(y + 24, format!("Rating factors: {}", said.join("; ")))
}
