//! Text to quantity and back: the only place (with `document`) that reads what people write.
//!
//! - [`mark`]: the units that formulas are printed in, as types;
//! - [`reading`]: what was read off a tape, with where it comes from;
//! - [`system`]: the unit system of a book and its default unit for each field.

pub mod mark;
pub mod reading;
pub mod system;

pub use mark::Mark;
pub use reading::{Entered, Provenance};
pub use system::{System, WeightUnit};
