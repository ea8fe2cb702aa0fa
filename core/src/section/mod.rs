//! Cross-sections as measured: what steel is there at a station, and what is left of it.
//!
//! - [`plate`]: the three plates of an I-shaped girder with their readings;
//! - [`rolled`]: published dimensions and properties of rolled shapes;
//! - [`parts`]: area, centroid and second moment of area as a take-off;
//! - [`plastic`]: plastic neutral axis and plastic modulus of the plates;
//! - [`effective`]: the steel section at a station, sound and as it is left;
//! - [`composite`]: steel and slab together, short-term and long-term, and stresses by stages.

pub mod composite;
pub mod effective;
pub mod parts;
pub mod plastic;
pub mod plate;
pub mod rolled;
