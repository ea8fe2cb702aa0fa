//! Books of older formats, brought to the present one step by step.
//!
//! A sample of every format is kept in `tests/data/documents`. Step `n` turns format `n` into
//! `n + 1`; there is none yet, since the first format is the present one.

use serde_json::Value as Json;

use super::book::FORMAT;

type Step = fn(Json) -> Json;

const STEPS: [Step; (FORMAT - 1) as usize] = [];

/// Brings a file of format `from` to the present format. The result still has to be read.
pub(super) fn to_current(value: Json, from: u64) -> Json {
    run(value, from, &STEPS)
}

fn run(value: Json, from: u64, steps: &[Step]) -> Json {
    let first = usize::try_from(from.saturating_sub(1)).unwrap_or(usize::MAX);
    let mut value = value;
    for (i, step) in steps.iter().enumerate().skip(first) {
        value = step(value);
        value["format"] = Json::from(i as u64 + 2);
    }
    value
}

#[cfg(test)]
mod tests {
    use super::*;
    use serde_json::json;

    /// Two planted steps: each book takes exactly those that it has before it, and says so.
    #[test]
    fn a_book_takes_the_steps_that_lie_before_it() {
        let steps: [Step; 2] = [
            |mut v| {
                v["slab"] = v["deck"].take();
                v
            },
            |mut v| {
                v["slab"] = json!([v["slab"]]);
                v
            },
        ];
        let oldest = run(json!({"format": 1, "deck": "7 in"}), 1, &steps);
        assert_eq!((&oldest["format"], &oldest["slab"]), (&json!(3), &json!(["7 in"])));
        let middle = run(json!({"format": 2, "slab": "7 in"}), 2, &steps);
        assert_eq!(middle, json!({"format": 3, "slab": ["7 in"]}));
        let newest = json!({"format": 3, "slab": ["7 in"]});
        assert_eq!(run(newest.clone(), 3, &steps), newest);
    }
}
