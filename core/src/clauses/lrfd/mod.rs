//! AASHTO LRFD Bridge Design Specifications, 9th edition (2020), in the units of its US edition.

pub mod distribution;
pub mod effective_width;
pub mod hl93;
pub mod lanes;
pub mod steel;
