//! Girderbook's engineering: what a short-span bridge carries as it stands today.
//!
//! Rooms, from the ground up (a test holds the order, see `DEVELOPERS.md`): quantities and
//! numerics know no bridge; sections, loads and influence lines know no code; clauses know no
//! rating; the report knows words. Nothing here reads a clock, a file, a network or a random
//! source, so that the same book gives the same answer on every device.
#![forbid(unsafe_code)]

pub mod basis;
pub mod bridge;
pub mod check;
pub mod clauses;
pub mod document;
pub mod influence;
pub mod limits;
pub mod load;
pub mod material;
pub mod moving;
pub mod numerics;
pub mod problem;
pub mod quantity;
pub mod rating;
pub mod report;
pub mod resistance;
pub mod section;
pub mod share;
pub mod units;
pub mod worksheet;
