//! Fields one by one, with the problems and defaults met on the way.

use super::Filled;
use super::site::Year;
use crate::document::book::Book;
use crate::document::fields::{self, Form};
use crate::document::readings;
use crate::problem::{Problem, Severity};
use crate::quantity::{Quantity, Stress};
use crate::units::{Entered, Provenance};

/// A field is wrong, and its problems are told.
pub(super) struct Wrong;

pub(super) struct Reader<'a> {
    pub(super) book: &'a Book,
    pub(super) problems: Vec<Problem>,
    pub(super) filled: Vec<Filled>,
    /// Strengths that could have been assumed, had the year been entered.
    lacking: Vec<&'static str>,
}

impl<'a> Reader<'a> {
    pub(super) fn new(book: &'a Book) -> Self {
        Self { book, problems: Vec::new(), filled: Vec::new(), lacking: Vec::new() }
    }

    /// The entry at a path, or none where nothing was entered.
    pub(super) fn maybe<Q: Quantity>(&mut self, path: &str) -> Result<Option<Entered<Q>>, Wrong> {
        match readings::value(self.book, path) {
            None => Ok(None),
            Some(Ok(entered)) => Ok(Some(entered)),
            Some(Err(problems)) => {
                self.problems.extend(problems);
                Err(Wrong)
            }
        }
    }

    /// The entry at a path, without which there is no rating.
    pub(super) fn needed<Q: Quantity>(&mut self, path: &str, mend: &str) -> Option<Entered<Q>> {
        match self.maybe(path) {
            Ok(Some(entered)) => Some(entered),
            Ok(None) => {
                self.missing(path, mend);
                None
            }
            Err(Wrong) => None,
        }
    }

    /// The entry at a path, or a default that the page shows as assumed.
    pub(super) fn or_assumed<Q: Quantity>(
        &mut self,
        path: &str,
        default: impl FnOnce() -> Option<(Q, &'static str)>,
        mend: &str,
    ) -> Option<Entered<Q>> {
        match self.maybe(path) {
            Ok(Some(entered)) => Some(entered),
            Err(Wrong) => None,
            Ok(None) => match default() {
                Some((value, source)) => Some(self.assume(path, value, source)),
                None => {
                    self.missing(path, mend);
                    None
                }
            },
        }
    }

    /// The strength at a path, or the one that is assumed by the year built.
    pub(super) fn strength(
        &mut self,
        path: &str,
        what: &'static str,
        year: Year,
        by_year: impl FnOnce(Option<i32>) -> Option<(Stress, &'static str)>,
    ) -> Option<Entered<Stress>> {
        match self.maybe(path) {
            Ok(Some(entered)) => Some(entered),
            Err(Wrong) => None,
            Ok(None) => match (by_year(year.known()), year) {
                (Some((value, source)), _) => Some(self.assume(path, value, source)),
                (None, Year::Built(_)) => {
                    self.missing(path, "enter it: none is known for that year");
                    None
                }
                (None, Year::NotEntered) => {
                    if !self.lacking.contains(&what) {
                        self.lacking.push(what);
                    }
                    None
                }
                (None, Year::Wrong) => None,
            },
        }
    }

    /// Asks once for the year built, where a strength waits for it.
    pub(super) fn tell_year(&mut self) {
        if !self.lacking.is_empty() {
            let mend = format!(
                "enter it: strengths that were not tested are assumed by the year; or enter {}",
                self.lacking.join(" and ")
            );
            self.missing("site.year_built", &mend);
        }
    }

    /// A default in force.
    pub(super) fn assume<Q: Quantity>(&mut self, path: &str, value: Q, source: &'static str) -> Entered<Q> {
        self.fill(path, value, source, Provenance::Assumed)
    }

    /// What stands for an empty field.
    pub(super) fn fill<Q: Quantity>(
        &mut self,
        path: &str,
        value: Q,
        source: &'static str,
        from: Provenance,
    ) -> Entered<Q> {
        let text = match fields::form(path) {
            Some(Form::Quantity(measure)) => readings::shown(value, measure, self.book.system),
            _ => String::new(),
        };
        self.filled.push(Filled { path: path.to_string(), text, from, source });
        Entered { provenance: from, ..Entered::assumed(path, value, source) }
    }

    /// Tells that a field is still to be entered.
    pub(super) fn missing(&mut self, path: &str, mend: &str) {
        let message = format!("{} is not entered yet", fields::label(path));
        self.problems.push(Problem::missing(path, message, mend));
    }

    pub(super) fn note(&mut self, path: &str, message: impl Into<String>, mend: impl Into<String>) {
        self.problems.push(Problem::new(Severity::Note, path, message, mend));
    }

    pub(super) fn error(&mut self, path: &str, message: impl Into<String>, mend: impl Into<String>) {
        self.problems.push(Problem::error(path, message, mend));
    }

    pub(super) fn warning(&mut self, path: &str, message: impl Into<String>, mend: impl Into<String>) {
        self.problems.push(Problem::warning(path, message, mend));
    }

    /// A quantity in the unit of the field at `path`, for a message about it.
    pub(super) fn told<Q: Quantity>(&self, path: &str, value: Q) -> String {
        match fields::form(path) {
            Some(Form::Quantity(measure)) => readings::told(value, measure, self.book.system),
            _ => String::new(),
        }
    }
}
