//! AASHTO LRFD Bridge Design Specifications, 9th edition (2020), in the units of its US edition.

pub mod steel;
