//! Numbers without meaning: no domain words in here.

mod cubic;
mod piecewise;
mod roots;

pub use cubic::Cubic;
pub use piecewise::{Piecewise, Run};
pub use roots::{Roots, quadratic};
