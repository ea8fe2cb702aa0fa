//! Helpers of the tests: reading reference data, evaluating formulas independently, vehicle tables.

pub mod evaluate;
pub mod vehicles;
