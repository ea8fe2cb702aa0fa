//! The kinds of line on a worksheet.

use crate::quantity::Dimension;
use crate::units::Provenance;

/// Number of a line on its sheet, from 1; 0 when nothing was recorded.
#[derive(Clone, Copy, Debug, PartialEq, Eq, PartialOrd, Ord)]
pub struct LineNo(pub u32);

/// What is fixed about a clause: its text is the code that runs.
#[derive(Debug, PartialEq, Eq)]
pub struct Clause {
    /// Where the function stands, such as `clauses::lrfd::flexure::l_p`.
    pub id: &'static str,
    /// Standard and clause.
    pub cite: &'static str,
    /// What the result is, in words.
    pub what: &'static str,
    /// Symbol of the result; empty for a condition.
    pub symbol: &'static str,
    /// Unit of the result.
    pub unit: &'static str,
    /// The expression as the compiler saw it; print it through [`super::spaced`].
    pub text: &'static str,
}

/// A value put into a formula.
#[derive(Clone, Debug, PartialEq)]
pub struct Input {
    /// Symbol, as it stands in the text.
    pub symbol: &'static str,
    /// The figure in `unit`, with full precision.
    pub figure: f64,
    /// The unit in which the clause is written.
    pub unit: &'static str,
    /// What kind of quantity it is.
    pub dimension: Dimension,
    /// The line that it comes from.
    pub from: LineNo,
}

/// One row of a sum.
#[derive(Clone, Debug, PartialEq)]
pub struct Row {
    /// What is added.
    pub what: String,
    /// The figure in the unit of the line.
    pub figure: f64,
    /// The line that it comes from.
    pub from: LineNo,
}

/// How a line came about.
#[derive(Clone, Debug, PartialEq)]
pub enum Kind {
    /// A title; carries no figure.
    Heading,
    /// Entered by the user, or a default still in force.
    Given {
        /// Path of the field.
        path: String,
        /// Where the entry comes from.
        provenance: Provenance,
        /// The readings as written.
        written: Vec<String>,
        /// For a default, where it is known from.
        source: &'static str,
    },
    /// A formula of a clause or of mechanics.
    Formula {
        /// The formula.
        clause: &'static Clause,
        /// What was put in.
        inputs: Vec<Input>,
    },
    /// A condition, and which way it went.
    Choice {
        /// The condition.
        clause: &'static Clause,
        /// What was put in.
        inputs: Vec<Input>,
        /// Whether it holds.
        holds: bool,
        /// What follows, in words.
        branch: &'static str,
    },
    /// Read from a table or a published constant.
    LookUp {
        /// Standard and table.
        cite: String,
        /// The row and column, in words.
        row: String,
    },
    /// A sum of rows.
    Sum {
        /// What was added.
        rows: Vec<Row>,
    },
    /// The result of a search: a governing position, a root.
    Found {
        /// How and where, in words.
        how: String,
        /// What is left over when the result is put back; zero where it is exact.
        residual: f64,
    },
    /// A sentence: why there is no figure, or what the rule set does not look at.
    Remark,
}

/// One line.
#[derive(Clone, Debug, PartialEq)]
pub struct Line {
    /// Symbol of the result; may be empty.
    pub symbol: String,
    /// What it is, in words.
    pub what: String,
    /// The figure in `unit`, with full precision.
    pub figure: f64,
    /// Unit of the figure.
    pub unit: &'static str,
    /// What kind of quantity it is.
    pub dimension: Dimension,
    /// How it came about.
    pub kind: Kind,
}
