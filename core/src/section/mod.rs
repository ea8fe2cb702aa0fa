//! Cross-sections as measured: what steel is there at a station, and what is left of it.
//!
//! - [`plate`]: the three plates of an I-shaped girder with their readings;
//! - [`rolled`]: published dimensions and properties of rolled shapes.

pub mod plate;
pub mod rolled;
