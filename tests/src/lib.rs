//! Helpers of the tests: reading reference data, evaluating formulas independently.

pub mod evaluate;
