//! What the agency adds: vehicles of its own, and how it posts.

use crate::quantity::{Force, Length};
use crate::units::WeightUnit;

/// A vehicle of one's own state or agency, as an axle list.
#[derive(Clone, Debug, PartialEq)]
pub struct OwnVehicle {
    /// Id in the document.
    pub id: String,
    /// What it is called.
    pub name: String,
    /// Weight of each axle, from the front; one at least.
    pub axles: Vec<Force>,
    /// Distance from each axle to the next; one fewer than axles.
    pub spacings: Vec<Length>,
}

/// How the bridge is posted.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub struct Posting {
    /// Unit of the sign.
    pub sign: WeightUnit,
    /// Whether yielding in service decides as well; none leaves it to the rule set.
    pub service_governs: Option<bool>,
}
