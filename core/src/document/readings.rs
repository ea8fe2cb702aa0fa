//! The seam to `units` and `limits`: from the texts of a field to what can be calculated with.

use super::book::{Book, UnitSystem};
use super::entry::Entry;
use super::fields::{self, Form, Measure};
use crate::problem::{self, Problem};
use crate::quantity::Quantity;
use crate::units::{Entered, format, parse};

/// The readings in one text.
pub(super) fn split(text: &str) -> Vec<String> {
    parse::split(text)
}

/// The same readings with `unit` behind every bare figure.
pub(super) fn with_units(read: &[String], unit: &str) -> Vec<String> {
    read.iter()
        .map(|text| match text.trim_end().ends_with(|c: char| c.is_ascii_digit()) && !unit.is_empty() {
            true => format!("{} {unit}", text.trim_end()),
            false => text.clone(),
        })
        .collect()
}

/// What the readings at a path say, whatever else is wrong in the book; none where nothing was
/// entered, or where the path leads to no readings of this kind of quantity.
#[must_use]
pub fn value<Q: Quantity>(book: &Book, path: &str) -> Option<Result<Entered<Q>, Vec<Problem>>> {
    let entry = book.entry(path).filter(|entry| !entry.is_blank())?;
    let Some(Form::Quantity(measure)) = fields::form(path) else { return None };
    (measure.dimension == Q::DIMENSION).then(|| enter(path, entry, measure, book.system))
}

fn enter<Q: Quantity>(
    path: &str,
    entry: &Entry,
    measure: Measure,
    system: UnitSystem,
) -> Result<Entered<Q>, Vec<Problem>> {
    let unit = measure.unit(system);
    let mut readings = Vec::new();
    let mut problems = Vec::new();
    for text in &entry.read {
        match parse::readings::<Q>(text, unit) {
            Err(refusal) => {
                let problem = Problem::error(path, refusal.message, refusal.mend);
                problems.push(match refusal.repair {
                    Some(text) if entry.read.len() == 1 => problem.with_repair(text),
                    _ => problem,
                });
            }
            Ok(values) => {
                for value in values {
                    match measure.limit.check(path, value.base(), text, system.into()) {
                        Ok(()) => readings.push(value),
                        Err(problem) => problems.push(problem),
                    }
                }
            }
        }
    }
    let mean = readings.iter().map(|q| q.base()).sum::<f64>() / readings.len() as f64;
    match problem::finite(mean, path, "the mean of the readings") {
        Err(problem) if problems.is_empty() => problems.push(problem),
        _ => {}
    }
    if !problems.is_empty() {
        return Err(problems);
    }
    Ok(Entered {
        value: Q::from_base(mean),
        readings,
        written: entry.read.clone(),
        provenance: entry.from.into(),
        path: path.to_string(),
        source: "",
    })
}

/// A quantity in the unit of its field.
pub(super) fn shown<Q: Quantity>(value: Q, measure: Measure, system: UnitSystem) -> String {
    format::show(value, measure.unit(system))
}
