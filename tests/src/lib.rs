//! Helpers of the tests: reading reference data, evaluating formulas independently, bridges, vehicle tables.

pub mod bridges;
pub mod evaluate;
pub mod moving_reference;
pub mod reference_set;
pub mod steel;
pub mod two_span;
pub mod vehicles;
