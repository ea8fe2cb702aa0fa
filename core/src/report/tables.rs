//! Tables as rows of cells, for the page and for paper.

use super::figure::{decimals, factor};
use super::names;
use super::show::{carried, effect, line_load, line_load_unit, weight};
use super::verdict::{Tone, at, limit, outcome, outcome_tone};
use crate::check::{Class, Limit};
use crate::rating::{Check, Rating};
use crate::units::{System, WeightUnit};

/// A table.
#[derive(Clone, Debug, PartialEq)]
pub struct Table {
    /// What it shows.
    pub caption: String,
    /// Head of each column.
    pub head: Vec<String>,
    /// Rows.
    pub rows: Vec<Vec<Cell>>,
}

/// A cell.
#[derive(Clone, Debug, Default, PartialEq)]
pub struct Cell {
    /// What stands in it.
    pub text: String,
    /// Whether it is a figure.
    pub number: bool,
    /// How it stands.
    pub tone: Tone,
    /// Index of the check whose worksheet it opens.
    pub check: Option<usize>,
}

fn words(text: impl Into<String>) -> Cell {
    Cell { text: text.into(), ..Cell::default() }
}

fn number(text: impl Into<String>) -> Cell {
    Cell { text: text.into(), number: true, ..Cell::default() }
}

fn heads(texts: &[&str]) -> Vec<String> {
    texts.iter().map(|text| (*text).to_owned()).collect()
}

/// Name of a load, with its level where it is a design load.
#[must_use]
pub fn load_name(rating: &Rating, load: usize) -> String {
    match rating.loads.get(load) {
        Some(load) if load.class == Class::Design => format!("{} {}", load.name, names::level(load.level)),
        Some(load) => load.name.clone(),
        None => "?".to_owned(),
    }
}

/// Rating by vehicle: strength, service, what rules and where, the weight that it would carry.
#[must_use]
pub fn by_vehicle(rating: &Rating, system: System) -> Table {
    let cell = |index: Option<usize>| match index.and_then(|i| Some((i, rating.checks.get(i)?))) {
        Some((i, check)) => Cell {
            text: outcome(&check.outcome),
            number: true,
            tone: outcome_tone(&check.outcome),
            check: Some(i),
        },
        None => words("none"),
    };
    let rows = rating
        .by_vehicle
        .iter()
        .map(|vehicle| {
            let load = rating.loads.get(vehicle.load);
            let ruling = vehicle.ruling.and_then(|i| rating.checks.get(i));
            vec![
                words(load_name(rating, vehicle.load)),
                number(load.and_then(|load| load.weight).map_or(String::new(), |w| weight(w, system))),
                cell(vehicle.strength),
                cell(vehicle.service),
                Cell {
                    text: ruling.map_or("none".to_owned(), |check| short_place(rating, check, system)),
                    check: vehicle.ruling,
                    ..Cell::default()
                },
                number(vehicle.rating_weight.map_or(String::new(), |w| carried(w, system))),
            ]
        })
        .collect();
    Table {
        caption: "Rating factor by vehicle".to_owned(),
        head: heads(&["Vehicle", "Weight", "Strength I", "Service II", "Rules", "Rating weight"]),
        rows,
    }
}

fn short_place(rating: &Rating, check: &Check, system: System) -> String {
    let line = rating.lines.get(check.key.line).map_or("?", |line| line.name.as_str());
    format!("{line}, {}", at(check, system))
}

/// What went into a check: effects, factors, capacity.
#[must_use]
pub fn check_figures(check: &Check, system: System) -> Table {
    let action = check.key.action;
    let mut rows = Vec::new();
    if let Some(f) = &check.figures {
        let mut row = |name: &str, value: String| rows.push(vec![words(name), number(value)]);
        row("Capacity with its factors", effect(f.capacity, action, system));
        row("Dead load before the deck worked (DC1)", effect(f.dead.dc1, action, system));
        row("Dead load added later (DC2)", effect(f.dead.dc2, action, system));
        row("Wearing surface (DW)", effect(f.dead.dw, action, system));
        row("Live load with share and dynamic allowance", effect(f.live, action, system));
        row("Load factor on DC1 and DC2", decimals(f.factors.dc, 3));
        row("Load factor on DW", decimals(f.factors.dw, 3));
        row("Load factor on live load", decimals(f.factors.live, 3));
        row("Dynamic allowance", format!("{} %", decimals(100.0 * f.factors.dynamic, 1)));
        row("Share of a lane", decimals(f.factors.share, 3));
        row("Resistance factor", decimals(f.factors.resistance, 3));
        row("Condition factor", decimals(f.factors.condition, 3));
        row("System factor", decimals(f.factors.system, 3));
    }
    Table { caption: "What went into it".to_owned(), head: heads(&["", "Value"]), rows }
}

/// Dead loads of each girder line.
#[must_use]
pub fn dead_loads(rating: &Rating, system: System) -> Table {
    let rows = rating
        .lines
        .iter()
        .map(|line| {
            let loads = [line.dc1, line.dc2, line.dw, line.dc1 + line.dc2 + line.dw];
            let figures = loads.into_iter().map(|load| number(line_load(load, system)));
            core::iter::once(words(line.name.clone())).chain(figures).collect()
        })
        .collect();
    Table {
        caption: format!("Dead load of each girder, {}", line_load_unit(system)),
        head: heads(&["Girder", "DC1", "DC2", "DW", "All"]),
        rows,
    }
}

/// Share of a lane and least factor of each girder line.
#[must_use]
pub fn girders(rating: &Rating, system: System) -> Table {
    let rows = rating
        .lines
        .iter()
        .map(|line| {
            let share = |share: &Result<f64, crate::problem::Problem>| match share {
                Ok(share) => number(format!("{share:.3}")),
                Err(_) => Cell { tone: Tone::Caution, ..words("no number") },
            };
            let worst = line.governing.and_then(|i| Some((i, rating.checks.get(i)?)));
            let (least, place) = match worst {
                Some((i, check)) => (
                    Cell {
                        text: outcome(&check.outcome),
                        number: true,
                        tone: outcome_tone(&check.outcome),
                        check: Some(i),
                    },
                    words(format!("{}, {}", load_name(rating, check.key.load), at(check, system))),
                ),
                None => (words("none"), words("")),
            };
            vec![words(line.name.clone()), share(&line.share_moment), share(&line.share_shear), least, place]
        })
        .collect();
    Table {
        caption: "Share of a lane and least legal factor of each girder".to_owned(),
        head: heads(&["Girder", "Moment", "Shear", "Least", "Of"]),
        rows,
    }
}

/// The safe load of each legal vehicle.
#[must_use]
pub fn posting(rating: &Rating, system: System, unit: WeightUnit) -> Table {
    let rows = rating
        .posting
        .safe
        .iter()
        .map(|safe| {
            let load = rating.loads.get(safe.load);
            let tone = match safe.limit {
                Limit::Full => Tone::Good,
                Limit::NotKnown => Tone::Caution,
                _ => Tone::Bad,
            };
            vec![
                words(load_name(rating, safe.load)),
                words(load.map_or("", |load| names::class(load.class))),
                number(load.and_then(|load| load.weight).map_or(String::new(), |w| weight(w, system))),
                number(safe.factor.map_or("no number".to_owned(), factor)),
                Cell { text: limit(safe.limit, unit), tone, ..Cell::default() },
            ]
        })
        .collect();
    Table {
        caption: "Safe load by vehicle, rounded down in the unit of the sign".to_owned(),
        head: heads(&["Vehicle", "Kind", "Weight", "Factor", "Limit"]),
        rows,
    }
}

/// A table as plain text, columns padded.
#[must_use]
pub fn text(table: &Table) -> String {
    let columns = table.head.len();
    let width = |column: usize| {
        let cells = table.rows.iter().filter_map(|row| row.get(column)).map(|cell| cell.text.chars().count());
        cells.chain([table.head[column].chars().count()]).max().unwrap_or(0)
    };
    let widths: Vec<usize> = (0..columns).map(width).collect();
    let mut out = format!("{}\n", table.caption);
    let mut line = |cells: Vec<(&str, bool)>| {
        let padded: Vec<String> = cells
            .iter()
            .zip(&widths)
            .map(
                |((text, right), width)| {
                    if *right { format!("{text:>width$}") } else { format!("{text:<width$}") }
                },
            )
            .collect();
        out.push_str(padded.join("  ").trim_end());
        out.push('\n');
    };
    line(table.head.iter().map(|head| (head.as_str(), false)).collect());
    for row in &table.rows {
        line(row.iter().map(|cell| (cell.text.as_str(), cell.number)).collect());
    }
    out
}
