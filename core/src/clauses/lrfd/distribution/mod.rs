//! Share of live load of a girder: concrete deck on steel or concrete beams, cross-section (a) of
//! table 4.6.2.2.1-1 (LRFD 4.6.2.2.2 and 4.6.2.2.3). From memory, 9th edition (2020).
//!
//! Shares are lanes (whole axles) for each girder. The one-lane formulas contain the multiple presence
//! factor of 1.2; the lever rule and the rigid cross-section do not, so it is applied to them.
//!
//! - [`range`]: the range of use of every table;
//! - [`interior`] and [`exterior`]: the formulas;
//! - [`lever`] and [`rigid`]: placements worked out on the sheet;
//! - [`skew`]: corrections for skewed supports;
//! - [`policy`]: what a rule set chooses, and what comes out;
//! - [`girder`]: the governing share of one girder line.

pub mod exterior;
pub mod girder;
pub mod interior;
pub mod lever;
pub mod policy;
pub mod range;
pub mod rigid;
pub mod skew;

pub use girder::governing_share;
pub use policy::{Bands, Loading, Method, Policy, RigidRule, Share, Stiffness};
pub use skew::SkewShear;
