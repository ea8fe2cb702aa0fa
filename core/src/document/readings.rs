//! The seam to `units` and `limits`: from the texts of a field to what can be calculated with.

use super::book::{Book, UnitSystem};
use super::entry::Entry;
use super::fields::{self, Form, Measure};
use crate::problem::Problem;
use crate::quantity::{Dimension, Quantity};
use crate::units::Entered;

/// The readings in one text.
pub(super) fn split(text: &str) -> Vec<String> {
    text.split(';').map(str::trim).filter(|t| !t.is_empty()).map(str::to_string).collect()
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
    let mut readings = Vec::new();
    for text in &entry.read {
        let (figure, unit) = match text.find(|c: char| c.is_ascii_alphabetic() || c == '°') {
            Some(at) => (text[..at].trim(), text[at..].trim()),
            None => (text.trim(), measure.unit(system)),
        };
        let mut sum = 0.0;
        for word in figure.split_whitespace() {
            let number = match word.split_once('/') {
                Some((a, b)) => a.parse::<f64>().ok().zip(b.parse::<f64>().ok()).map(|(a, b)| a / b),
                None => word.parse::<f64>().ok(),
            };
            let Some(number) = number else {
                return Err(vec![Problem::error(path, format!("\"{text}\" is no figure"), "write it")]);
            };
            sum += number;
        }
        let per = match unit {
            "mm" => 10.0,
            "m" => 10_000.0,
            "in" => 254.0,
            "ft" => 3048.0,
            "kN/m" => 0.1,
            "kN/m3" => 1e-9,
            "MPa" => 0.01,
            "ksi" => 4448.221_615_260_5 / 254.0 / 254.0,
            "kN" => 1000.0,
            "kip" => 4448.221_615_260_5,
            "lb/ft" => 4.448_221_615_260_5 / 3048.0,
            "" | "°" | "deg" => 1.0,
            _ => return Err(vec![Problem::error(path, format!("\"{unit}\" is no unit"), "write it")]),
        };
        let base = sum * per;
        if !(measure.limit.least..=measure.limit.most).contains(&base) {
            return Err(vec![Problem::error(path, format!("\"{text}\" out of range"), "check")]);
        }
        readings.push(Q::from_base(base));
    }
    let mean = readings.iter().map(|q| q.base()).sum::<f64>() / readings.len() as f64;
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
    let unit = measure.unit(system);
    let per = match (Q::DIMENSION, unit) {
        (Dimension::Length, "mm") => 10.0,
        (Dimension::Length, "m") => 10_000.0,
        (Dimension::Length, "in") => 254.0,
        (Dimension::Length, "ft") => 3048.0,
        (Dimension::UnitWeight, "kN/m3") => 1e-9,
        _ => 1.0,
    };
    format!("{:.1} {unit}", value.base() / per)
}
