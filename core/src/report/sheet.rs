//! The lines of a worksheet as text: what stands where on the sheet that a second engineer checks.
//!
//! Figures are printed by [`figure`]. A formula line shows the formula, the
//! formula with the figures put in, and the result in the unit of the clause; where that is not the
//! book's, the result in the book's as well.

use super::convert::converted;
use super::figure::{figure, with_unit};
use super::formula::printed;
use crate::units::{Provenance, System};
use crate::worksheet::{Input, Kind, Line, LineNo, Sheet};

/// What a row of the sheet is.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum From {
    /// A title over the rows that follow.
    Title,
    /// A sentence between the rows.
    Remark,
    /// Read on this bridge.
    Measured,
    /// Taken from a drawing.
    Drawing,
    /// A default or somebody's judgement.
    Assumed,
    /// Read from a published table.
    Table,
    /// A formula.
    Formula,
    /// A condition, and which way it went.
    Choice,
    /// A sum of other rows.
    Sum,
    /// The result of a search.
    Found,
}

impl From {
    /// Its name, as the page and the plain text have it.
    #[must_use]
    pub const fn name(self) -> &'static str {
        match self {
            Self::Title => "title",
            Self::Remark => "remark",
            Self::Measured => "measured",
            Self::Drawing => "drawing",
            Self::Assumed => "assumed",
            Self::Table => "table",
            Self::Formula => "formula",
            Self::Choice => "choice",
            Self::Sum => "sum",
            Self::Found => "found",
        }
    }
}

/// A row of the sheet. What a kind of row does not have is empty.
#[derive(Clone, Debug, PartialEq, Eq)]
pub struct SheetRow {
    /// Number of the line, from 1.
    pub no: u32,
    /// What it is.
    pub from: From,
    /// The result in words; for a choice what follows.
    pub what: String,
    /// Symbol of the result, such as `M_n`.
    pub symbol: String,
    /// The formula or the condition.
    pub formula: String,
    /// The formula with figures; the readings as written; the rows of a sum; the row of a table; how
    /// a search went.
    pub numbers: String,
    /// The result in the unit of the clause.
    pub result: String,
    /// The result in the book's unit, where that is another.
    pub also: String,
    /// Standard and clause, or where a default is known from.
    pub cite: String,
    /// Lines whose results went in, in order.
    pub refs: Vec<u32>,
    /// Path of the field that an entry stands in.
    pub path: String,
}

/// The rows of a sheet for a book of that unit system.
#[must_use]
pub fn rows(sheet: &Sheet, system: System) -> Vec<SheetRow> {
    sheet.lines.iter().zip(1..).map(|(line, no)| row(line, no, system)).collect()
}

fn row(line: &Line, no: u32, system: System) -> SheetRow {
    let mut row = SheetRow {
        no,
        from: From::Remark,
        what: line.what.clone(),
        symbol: symbol(&line.symbol),
        formula: String::new(),
        numbers: String::new(),
        result: String::new(),
        also: String::new(),
        cite: String::new(),
        refs: Vec::new(),
        path: String::new(),
    };
    match &line.kind {
        Kind::Heading => {
            row.from = From::Title;
            return row;
        }
        Kind::Remark => return row,
        Kind::Choice { clause, inputs, holds, .. } => {
            row.from = From::Choice;
            row.formula = with_symbols(clause.text);
            row.numbers = with_figures(clause.text, inputs);
            row.result = if *holds { "yes" } else { "no" }.to_owned();
            clause.cite.clone_into(&mut row.cite);
            row.refs = numbers(inputs.iter().map(|input| input.from));
            return row;
        }
        Kind::Given { path, provenance, written, source } => {
            row.from = match provenance {
                Provenance::Measured => From::Measured,
                Provenance::Drawing => From::Drawing,
                Provenance::Assumed => From::Assumed,
            };
            row.numbers = match written.as_slice() {
                [] | [_] => written.concat(),
                several => format!("{} readings: {}", several.len(), several.join("; ")),
            };
            (*source).clone_into(&mut row.cite);
            row.path.clone_from(path);
        }
        Kind::Formula { clause, inputs } => {
            row.from = From::Formula;
            row.formula = with_symbols(clause.text);
            row.numbers = with_figures(clause.text, inputs);
            clause.cite.clone_into(&mut row.cite);
            row.refs = numbers(inputs.iter().map(|input| input.from));
        }
        Kind::LookUp { cite, row: place } => {
            row.from = From::Table;
            row.numbers.clone_from(place);
            row.cite.clone_from(cite);
        }
        Kind::Sum { rows } if rows.is_empty() => {
            row.from = From::Sum;
            row.formula = "nothing entered".to_owned();
            row.numbers = "0".to_owned();
        }
        Kind::Sum { rows } => {
            row.from = From::Sum;
            let words: Vec<&str> = rows.iter().map(|part| part.what.as_str()).collect();
            row.formula = words.join(" + ");
            let figures: Vec<String> = rows.iter().map(|part| signed(figure(part.figure))).collect();
            row.numbers = figures.join(" + ");
            row.refs = numbers(rows.iter().map(|part| part.from));
        }
        Kind::Found { how, residual } => {
            row.from = From::Found;
            row.numbers = match *residual {
                0.0 => how.clone(),
                left => format!("{how}; put back, {} is left over", figure(left)),
            };
        }
    }
    row.result = with_unit(line.figure, line.unit);
    if let Some((value, unit)) = converted(line.figure, line.unit, line.dimension, system) {
        row.also = with_unit(value, unit);
    }
    row
}

/// A symbol with its Greek letters: `gamma_DC` as `γ_DC`.
#[must_use]
pub fn symbol(name: &str) -> String {
    const GREEK: [(&str, char); 16] = [
        ("alpha", 'α'),
        ("beta", 'β'),
        ("gamma", 'γ'),
        ("delta", 'δ'),
        ("epsilon", 'ε'),
        ("eta", 'η'),
        ("theta", 'θ'),
        ("kappa", 'κ'),
        ("lambda", 'λ'),
        ("mu", 'μ'),
        ("nu", 'ν'),
        ("rho", 'ρ'),
        ("sigma", 'σ'),
        ("tau", 'τ'),
        ("phi", 'φ'),
        ("psi", 'ψ'),
    ];
    let (head, tail) = name.split_once('_').map_or((name, None), |(head, tail)| (head, Some(tail)));
    let head = match GREEK.iter().find(|(word, _)| *word == head) {
        Some((_, letter)) => letter.to_string(),
        None => head.to_owned(),
    };
    tail.map_or(head.clone(), |tail| format!("{head}_{tail}"))
}

/// The formula with its symbols.
fn with_symbols(text: &str) -> String {
    printed(text, &mut symbol)
}

/// The formula with figures in the place of symbols; each with its unit where it stands first.
fn with_figures(text: &str, inputs: &[Input]) -> String {
    let mut named: Vec<&str> = Vec::new();
    printed(text, &mut |symbol| {
        let Some(input) = inputs.iter().find(|input| input.symbol == symbol) else {
            return symbol.to_owned();
        };
        if named.contains(&input.symbol) {
            return signed(figure(input.figure));
        }
        named.push(input.symbol);
        signed(with_unit(input.figure, input.unit))
    })
}

/// A negative figure in brackets, so that no sign meets another.
fn signed(figure: String) -> String {
    if figure.starts_with('-') { format!("({figure})") } else { figure }
}

fn numbers(lines: impl Iterator<Item = LineNo>) -> Vec<u32> {
    let mut out: Vec<u32> = Vec::new();
    for LineNo(no) in lines {
        if no > 0 && !out.contains(&no) {
            out.push(no);
        }
    }
    out
}

/// A sheet as plain text.
#[must_use]
pub fn text(rows: &[SheetRow]) -> String {
    let mut out = String::new();
    for row in rows {
        match row.from {
            From::Title => {
                if !out.is_empty() {
                    out.push('\n');
                }
                out.push_str(&row.what);
                out.push('\n');
                continue;
            }
            From::Remark => {
                out.push_str(&format!("      {}\n", row.what));
                continue;
            }
            _ => {}
        }
        let also = if row.also.is_empty() { String::new() } else { format!(" = {}", row.also) };
        let head = format!("{:>4}  {}", row.no, row.what);
        if row.from == From::Choice {
            out.push_str(&format!("{head}\n        {}: {}: {}\n", row.formula, row.numbers, row.result));
        } else {
            let symbol = if row.symbol.is_empty() { String::new() } else { format!("{} = ", row.symbol) };
            out.push_str(&head);
            out.push('\n');
            match row.from {
                From::Formula | From::Sum => out.push_str(&format!(
                    "        {symbol}{}\n        = {}\n        = {}{also}\n",
                    row.formula, row.numbers, row.result
                )),
                _ => out.push_str(&format!("        {symbol}{}{also}\n", row.result)),
            }
        }
        let mut notes: Vec<String> = Vec::new();
        match row.from {
            From::Measured | From::Drawing | From::Assumed | From::Table | From::Found => {
                notes.push(if row.numbers.is_empty() {
                    row.from.name().to_owned()
                } else {
                    format!("{}: {}", row.from.name(), row.numbers)
                });
            }
            _ => {}
        }
        if !row.cite.is_empty() {
            notes.push(row.cite.clone());
        }
        if !row.refs.is_empty() {
            let lines: Vec<String> = row.refs.iter().map(u32::to_string).collect();
            notes.push(format!("from line {}", lines.join(", ")));
        }
        if !notes.is_empty() {
            out.push_str(&format!("        [{}]\n", notes.join(" | ")));
        }
    }
    out
}
