//! What can be wrong, where, and how to mend it.
//!
//! A value and its problems travel together: a book with a wrong field still opens, keeps what was
//! typed and rates what it can. Messages name the field by its path in the saved document, so that
//! the page can open it and a command line can print it.

/// How much a problem weighs.
#[derive(Clone, Copy, Debug, PartialEq, Eq, PartialOrd, Ord)]
pub enum Severity {
    /// Worth knowing; nothing is withheld.
    Note,
    /// The answer stands but deserves a second look.
    Warning,
    /// Still to be entered; no rating is built on it.
    Missing,
    /// Wrong; no rating is built on it.
    Error,
}

/// One thing that is wrong or missing.
#[derive(Clone, Debug, PartialEq, Eq)]
pub struct Problem {
    /// How much it weighs.
    pub severity: Severity,
    /// Path of the field in the saved document, such as `span.length` or `girders[2].member`.
    pub path: String,
    /// What is wrong, in words for the engineer.
    pub message: String,
    /// How to mend it, in words.
    pub mend: String,
    /// A text that would mend the field if it were put there as it is.
    pub repair: Option<String>,
}

impl Problem {
    /// A problem that keeps a rating from being built.
    #[must_use]
    pub fn error(path: impl Into<String>, message: impl Into<String>, mend: impl Into<String>) -> Self {
        Self::new(Severity::Error, path, message, mend)
    }

    /// Something still to be entered.
    #[must_use]
    pub fn missing(path: impl Into<String>, message: impl Into<String>, mend: impl Into<String>) -> Self {
        Self::new(Severity::Missing, path, message, mend)
    }

    /// Something that deserves a second look.
    #[must_use]
    pub fn warning(path: impl Into<String>, message: impl Into<String>, mend: impl Into<String>) -> Self {
        Self::new(Severity::Warning, path, message, mend)
    }

    /// With the severity given.
    #[must_use]
    pub fn new(
        severity: Severity,
        path: impl Into<String>,
        message: impl Into<String>,
        mend: impl Into<String>,
    ) -> Self {
        Self { severity, path: path.into(), message: message.into(), mend: mend.into(), repair: None }
    }

    /// The same problem with a text that mends the field.
    #[must_use]
    pub fn with_repair(mut self, text: impl Into<String>) -> Self {
        self.repair = Some(text.into());
        self
    }

    /// Whether no rating may be built on the field.
    #[must_use]
    pub fn blocks(&self) -> bool {
        self.severity >= Severity::Missing
    }
}

/// The one gate between arithmetic and everything that is kept or shown: a result that is not a
/// finite number becomes a problem.
///
/// # Errors
/// When `value` is NaN or infinite; the problem names `what` and the field at `path`.
pub fn finite(value: f64, path: &str, what: &str) -> Result<f64, Problem> {
    if value.is_finite() {
        Ok(value)
    } else {
        Err(Problem::error(
            path,
            format!("{what} cannot be worked out from these entries"),
            "check the entries for sizes that cannot be right",
        ))
    }
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn the_gate_lets_only_finite_numbers_through() {
        assert_eq!(finite(1.5, "span", "the moment"), Ok(1.5));
        for bad in [f64::NAN, f64::INFINITY, f64::NEG_INFINITY] {
            let problem = finite(bad, "span", "the moment").expect_err("must be refused");
            assert!(problem.blocks());
            assert_eq!(problem.path, "span");
        }
    }
}
