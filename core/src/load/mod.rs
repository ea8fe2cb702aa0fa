//! What acts on the bridge, without any factor of a code.

pub mod axle_train;
pub mod dead;
pub mod lane;

pub use axle_train::{AxleTrain, Spacing};
pub use lane::Lane;
