//! The words: what is said of a rating, and how its tables and worksheets read.
//!
//! - [`mod@verdict`]: the least factor, what follows, why, and what it does not cover;
//! - [`sign`]: what stands on the sign;
//! - [`tables`]: rating by vehicle, girders, posting, what went into a check;
//! - [`sheet`]: the lines of a worksheet;
//! - [`diagram`]: demand against capacity along a girder;
//! - [`figure`], [`formula`], [`show`], [`names`]: figures, formulas, sizes and names as they are
//!   printed.

mod convert;
pub mod diagram;
pub mod figure;
pub mod formula;
pub mod names;
pub mod sheet;
pub mod show;
pub mod sign;
pub mod tables;
pub mod verdict;

pub use sheet::{SheetRow, rows};
pub use verdict::{Tone, Verdict, unrated, verdict};
