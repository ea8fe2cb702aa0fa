//! From a bridge and a rule set to the rating: effects, capacities, their combination, what
//! governs, and the posting.
//!
//! Three pure stages: effects of each vehicle for a whole lane, capacity of each girder at each
//! station, and their combination. The check that somebody opens is worked again on a sheet by the
//! same functions.

pub mod combine;
pub mod effects;
mod govern;
mod line;
mod rater;
pub mod result;
mod sheet;
mod stations;

pub use crate::check::{Class, ClassLimit, Limit, Posting, SafeLoad, Sign};
pub use rater::Rater;
pub use result::{
    Capacity, Check, DeadEffects, Factors, Figures, Key, LineSummary, LiveLoad, Rating, VehicleResult,
};
pub use sheet::work;
