//! What one girder takes of wheels and lanes across a roadway: pure placement and statics.
//!
//! No coefficient of a code stands here: gauge, distances and the number of lanes come from clauses,
//! and multiple presence is applied by them. Distances run from the left edge of the deck.
//!
//! - [`pattern`]: trucks side by side, and where they may stand;
//! - [`lever`]: the lever rule, with its worst placement found exactly;
//! - [`rigid`]: trucks as near to an outer girder as they may stand.

pub mod lever;
pub mod pattern;
pub mod rigid;

pub use pattern::{Lanes, Pattern, Placement, Roadway, Truck};
