//! What acts on the bridge, without any factor of a code.

pub mod across;
pub mod axle_train;
pub mod dead;
pub mod lane;

pub use across::Across;
pub use axle_train::{AxleTrain, Spacing};
pub use dead::{DeadLoad, Sharing, TakeOff};
pub use lane::Lane;
