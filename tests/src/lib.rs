//! Helpers of the tests: reading reference data.

pub mod moving_reference;
pub mod reference_set;
pub mod two_span;
pub mod vehicles;
