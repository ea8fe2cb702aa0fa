//! Helpers of the tests: reading reference data.

pub mod vehicles;
