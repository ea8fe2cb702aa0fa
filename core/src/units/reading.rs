//! What was read on site: several readings of one thing, their mean, and where they come from.

use crate::quantity::Quantity;

/// Where an entry comes from. An assumption looks different from a measurement everywhere.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Provenance {
    /// Read on this bridge.
    Measured,
    /// Taken from a drawing or an earlier report.
    Drawing,
    /// Neither: a default or somebody's judgement.
    Assumed,
}

/// An entry that can be calculated with: its readings were parsed and found inside their range.
#[derive(Clone, Debug, PartialEq)]
pub struct Entered<Q> {
    /// The design value: the mean of the readings, or the assumed value.
    pub value: Q,
    /// Every reading; empty for a default that was never entered.
    pub readings: Vec<Q>,
    /// The readings as they were written.
    pub written: Vec<String>,
    /// Where they come from.
    pub provenance: Provenance,
    /// Path of the field in the saved document.
    pub path: String,
    /// For a default: where it is known from. Empty for what was entered.
    pub source: &'static str,
}

impl<Q: Quantity> Entered<Q> {
    /// A default that nobody entered, marked as assumed.
    #[must_use]
    pub fn assumed(path: impl Into<String>, value: Q, source: &'static str) -> Self {
        Self {
            value,
            readings: Vec::new(),
            written: Vec::new(),
            provenance: Provenance::Assumed,
            path: path.into(),
            source,
        }
    }

    /// One measured value without text: for tests and examples that need no document.
    #[must_use]
    pub fn measured(path: impl Into<String>, value: Q) -> Self {
        Self {
            value,
            readings: vec![value],
            written: Vec::new(),
            provenance: Provenance::Measured,
            path: path.into(),
            source: "",
        }
    }

    /// The least reading, for rules that look at the worst place and not at the mean.
    #[must_use]
    pub fn least(&self) -> Q {
        self.readings.iter().copied().fold(self.value, |a, b| if b < a { b } else { a })
    }

    /// The greatest reading.
    #[must_use]
    pub fn greatest(&self) -> Q {
        self.readings.iter().copied().fold(self.value, |a, b| if b > a { b } else { a })
    }

    /// Greatest less least reading; zero for one reading.
    #[must_use]
    pub fn spread(&self) -> Q {
        Q::from_base(self.greatest().base() - self.least().base())
    }
}
