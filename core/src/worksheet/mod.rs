//! The worksheet: results that carry their working.
//!
//! Every function that a checker would want to follow takes a [`Recorder`]. The silent one costs
//! nothing and is used for the thousands of checks of a rating; the check that somebody opens is
//! worked again with a [`Sheet`], which keeps a line for every step. [`clause!`] makes the printed
//! formula and the code that ran one and the same text.

mod clause;
mod line;
pub mod ops;
mod recorder;
mod text;

pub use line::{Clause, Input, Kind, Line, LineNo, Row};
pub use recorder::{Recorder, Sheet, Silent, Val};
pub use text::spaced;

pub use crate::{clause, condition};
