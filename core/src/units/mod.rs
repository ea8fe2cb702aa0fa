//! Text to quantity and back: the only place (with `document`) that reads what people write.
//!
//! - [`mark`]: the units that formulas are printed in, as types;
//! - [`registry`]: the units that people write, with their spellings;
//! - [`reading`]: what was read off a tape, with where it comes from;
//! - [`parse`]: readings as people write them; [`format`](mod@format): quantities as text;
//! - [`system`]: the unit system of a book and its default unit for each field.

pub mod format;
pub mod mark;
pub mod parse;
pub mod reading;
pub mod registry;
pub mod system;
mod token;

pub use mark::Mark;
pub use reading::{Entered, Provenance};
pub use system::{System, WeightUnit};
