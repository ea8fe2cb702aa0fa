//! Who listens while something is worked out: nobody, or a sheet.

use super::line::{Kind, Line, LineNo, Row};
use crate::quantity::{Dimension, Quantity};
use crate::units::{Entered, Mark};

/// A value and the line that it stands on.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Val<Q> {
    /// The value.
    pub q: Q,
    /// Its line; 0 when nobody listens.
    pub line: LineNo,
}

impl<Q> Val<Q> {
    /// A value that stands on no line: for silent work and for tests.
    pub const fn bare(q: Q) -> Self {
        Self { q, line: LineNo(0) }
    }
}

/// Takes the lines of a calculation, or drops them.
pub trait Recorder {
    /// Keeps a line and tells its number. A silent recorder never calls `line`.
    fn write(&mut self, line: impl FnOnce() -> Line) -> LineNo;

    /// A title over the lines that follow.
    fn heading(&mut self, title: &str) {
        self.write(|| Line {
            symbol: String::new(),
            what: title.to_owned(),
            figure: 0.0,
            unit: "",
            dimension: Dimension::Number,
            kind: Kind::Heading,
        });
    }

    /// A sentence between the lines.
    fn remark(&mut self, words: impl FnOnce() -> String) {
        self.write(|| Line {
            symbol: String::new(),
            what: words(),
            figure: 0.0,
            unit: "",
            dimension: Dimension::Number,
            kind: Kind::Remark,
        });
    }

    /// An entry of the user, or a default still in force.
    fn given<Q: Quantity, U: Mark<Q>>(
        &mut self,
        symbol: &str,
        what: &str,
        entry: &Entered<Q>,
        _unit: U,
    ) -> Val<Q> {
        self.given_as(symbol, what, entry, entry.value, _unit)
    }

    /// An entry of which a rule takes another value than the mean, such as the least reading.
    fn given_as<Q: Quantity, U: Mark<Q>>(
        &mut self,
        symbol: &str,
        what: &str,
        entry: &Entered<Q>,
        value: Q,
        _unit: U,
    ) -> Val<Q> {
        let line = self.write(|| Line {
            symbol: symbol.to_owned(),
            what: what.to_owned(),
            figure: U::read(value),
            unit: U::NAME,
            dimension: Q::DIMENSION,
            kind: Kind::Given {
                path: entry.path.clone(),
                provenance: entry.provenance,
                written: entry.written.clone(),
                source: entry.source,
            },
        });
        Val { q: value, line }
    }

    /// A figure of a published table, or a published constant.
    fn look_up<Q: Quantity, U: Mark<Q>>(
        &mut self,
        symbol: &str,
        what: &str,
        value: Q,
        _unit: U,
        cite: &str,
        row: impl FnOnce() -> String,
    ) -> Val<Q> {
        let line = self.write(|| Line {
            symbol: symbol.to_owned(),
            what: what.to_owned(),
            figure: U::read(value),
            unit: U::NAME,
            dimension: Q::DIMENSION,
            kind: Kind::LookUp { cite: cite.to_owned(), row: row() },
        });
        Val { q: value, line }
    }

    /// A sum of values that stand on lines of their own.
    fn sum<Q: Quantity, U: Mark<Q>>(
        &mut self,
        symbol: &str,
        what: &str,
        parts: &[(&str, Val<Q>)],
        _unit: U,
    ) -> Val<Q> {
        let total = Q::from_base(parts.iter().map(|(_, v)| v.q.base()).fold(0.0, |a, b| a + b));
        let line = self.write(|| Line {
            symbol: symbol.to_owned(),
            what: what.to_owned(),
            figure: U::read(total),
            unit: U::NAME,
            dimension: Q::DIMENSION,
            kind: Kind::Sum {
                rows: parts
                    .iter()
                    .map(|(what, v)| Row { what: (*what).to_owned(), figure: U::read(v.q), from: v.line })
                    .collect(),
            },
        });
        Val { q: total, line }
    }

    /// The result of a search, with how it was found and what is left over.
    fn found<Q: Quantity, U: Mark<Q>>(
        &mut self,
        symbol: &str,
        what: &str,
        value: Q,
        _unit: U,
        residual: f64,
        how: impl FnOnce() -> String,
    ) -> Val<Q> {
        let line = self.write(|| Line {
            symbol: symbol.to_owned(),
            what: what.to_owned(),
            figure: U::read(value),
            unit: U::NAME,
            dimension: Q::DIMENSION,
            kind: Kind::Found { how: how(), residual },
        });
        Val { q: value, line }
    }
}

/// Nobody listens; costs nothing.
#[derive(Clone, Copy, Debug, Default)]
pub struct Silent;

impl Recorder for Silent {
    #[inline(always)]
    fn write(&mut self, _line: impl FnOnce() -> Line) -> LineNo {
        LineNo(0)
    }
}

/// Keeps every line.
#[derive(Clone, Debug, Default, PartialEq)]
pub struct Sheet {
    /// The lines, in the order in which they were worked.
    pub lines: Vec<Line>,
}

impl Sheet {
    /// The line of that number.
    #[must_use]
    pub fn line(&self, no: LineNo) -> Option<&Line> {
        (no.0 as usize).checked_sub(1).and_then(|i| self.lines.get(i))
    }
}

impl Recorder for Sheet {
    fn write(&mut self, line: impl FnOnce() -> Line) -> LineNo {
        self.lines.push(line());
        LineNo(u32::try_from(self.lines.len()).unwrap_or(u32::MAX))
    }
}
