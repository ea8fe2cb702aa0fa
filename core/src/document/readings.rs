//! The seam to `units` and `limits`: from the texts of a field to what can be calculated with.
//!
//! A field is read as a whole, however its readings are kept: whether a bare figure has the unit of
//! the field or that of its neighbour cannot be seen from the figure alone.

use super::book::{Book, UnitSystem};
use super::entry::Entry;
use super::fields::{self, Form, Measure};
use crate::problem::{self, Problem};
use crate::quantity::{
    Angle, Area, Dimension, Force, Inertia, Length, LineLoad, Modulus, Moment, Quantity, Stress, UnitWeight,
};
use crate::units::parse::{self, Refusal};
use crate::units::{Entered, format, registry};

/// The readings in one text, each as it was written; what stands side by side, as in `65 72 70`, is
/// taken apart where that changes nothing.
pub(super) fn split(text: &str, measure: Option<Measure>, system: UnitSystem) -> Vec<String> {
    let mut all = Vec::new();
    for piece in parse::split(text) {
        let apart: Vec<&str> = piece
            .split_whitespace()
            .map(|word| word.trim_end_matches(','))
            .filter(|w| !w.is_empty())
            .collect();
        let whole = measure.and_then(|m| bases(&piece, m.dimension, m.unit(system)).ok());
        let parts = measure.and_then(|m| one_by_one(&apart, m.dimension, m.unit(system)));
        match (whole, parts) {
            (Some(whole), Some(parts)) if apart.len() > 1 && whole == parts => {
                all.extend(apart.into_iter().map(str::to_string));
            }
            _ => all.push(piece),
        }
    }
    all
}

/// The same readings for a book of another unit system, with the unit that bare figures had behind
/// them. What cannot be read stays as it is.
pub(super) fn written_out(
    read: &[String],
    measure: Measure,
    was: UnitSystem,
    becomes: UnitSystem,
) -> Vec<String> {
    let (old, new) = (measure.unit(was), measure.unit(becomes));
    let means = |texts: &[String], unit| bases(&texts.join("; "), measure.dimension, unit).ok();
    let Some(values) = means(read, old) else { return read.to_vec() };
    let same = |texts: &[String]| means(texts, new).as_ref() == Some(&values);
    if same(read) {
        return read.to_vec();
    }
    // Each text by itself: as it is if it has its unit, else with the unit behind it, else as the
    // figures that it means.
    let mut out = Vec::new();
    for text in read {
        let Ok(meant) = bases(text, measure.dimension, old) else { return read.to_vec() };
        let is_meant = |text: &str| bases(text, measure.dimension, new).as_ref() == Ok(&meant);
        let with_unit = format!("{} {old}", text.trim_end());
        if is_meant(text) {
            out.push(text.clone());
        } else if is_meant(&with_unit) {
            out.push(with_unit);
        } else {
            let per = registry::by_name(old).map_or(1.0, |unit| unit.per);
            out.extend(meant.iter().map(|base| format!("{} {old}", base / per)));
        }
    }
    out
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
    let text = entry.text();
    let readings = parse::readings::<Q>(&text, measure.unit(system)).map_err(|refusal| {
        let problem = Problem::error(path, refusal.message, refusal.mend);
        vec![match refusal.repair {
            Some(repair) => problem.with_repair(repair),
            None => problem,
        }]
    })?;
    let each_its_text = readings.len() == entry.read.len();
    let problems: Vec<Problem> = readings
        .iter()
        .enumerate()
        .filter_map(|(i, reading)| {
            let written = if each_its_text { &entry.read[i] } else { &text };
            measure.limit.check(path, reading.base(), written, system.into()).err()
        })
        .collect();
    if !problems.is_empty() {
        return Err(problems);
    }
    let mean = readings.iter().map(|q| q.base()).sum::<f64>() / readings.len() as f64;
    let mean = problem::finite(mean, path, "the mean of the readings").map_err(|problem| vec![problem])?;
    Ok(Entered {
        value: Q::from_base(mean),
        readings,
        written: entry.read.clone(),
        provenance: entry.from.into(),
        path: path.to_string(),
        source: "",
    })
}

/// Readings in base units.
fn bases(text: &str, dimension: Dimension, unit: &str) -> Result<Vec<f64>, Refusal> {
    fn of<Q: Quantity>(text: &str, unit: &str) -> Result<Vec<f64>, Refusal> {
        parse::readings::<Q>(text, unit).map(|all| all.into_iter().map(Quantity::base).collect())
    }
    match dimension {
        Dimension::Number => of::<f64>(text, unit),
        Dimension::Angle => of::<Angle>(text, unit),
        Dimension::Length => of::<Length>(text, unit),
        Dimension::Area => of::<Area>(text, unit),
        Dimension::Modulus => of::<Modulus>(text, unit),
        Dimension::Inertia => of::<Inertia>(text, unit),
        Dimension::Force => of::<Force>(text, unit),
        Dimension::LineLoad => of::<LineLoad>(text, unit),
        Dimension::Stress => of::<Stress>(text, unit),
        Dimension::UnitWeight => of::<UnitWeight>(text, unit),
        Dimension::Moment => of::<Moment>(text, unit),
    }
}

/// The readings of texts that hold one each; none where one of them holds none or several.
fn one_by_one(texts: &[&str], dimension: Dimension, unit: &str) -> Option<Vec<f64>> {
    texts
        .iter()
        .map(|text| match bases(text, dimension, unit).as_deref() {
            Ok([one]) => Some(*one),
            _ => None,
        })
        .collect()
}

/// A quantity in the unit of its field, to four digits.
pub(super) fn shown<Q: Quantity>(value: Q, measure: Measure, system: UnitSystem) -> String {
    in_digits(value, measure.unit(system), 4)
}

/// The same to six digits, for messages that hold two quantities against each other.
pub(super) fn told<Q: Quantity>(value: Q, measure: Measure, system: UnitSystem) -> String {
    in_digits(value, measure.unit(system), 6)
}

fn in_digits<Q: Quantity>(value: Q, unit: &str, digits: usize) -> String {
    let per = registry::by_name(unit).map_or(1.0, |unit| unit.per);
    let figure = format::significant(value.base() / per, digits);
    let figure = match figure.contains('.') {
        true => figure.trim_end_matches('0').trim_end_matches('.'),
        false => &figure,
    };
    if unit.is_empty() { figure.to_string() } else { format!("{figure} {unit}") }
}
