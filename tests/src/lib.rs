//! Helpers of the tests: evaluating formulas independently, sections made of plates.

pub mod evaluate;
pub mod steel;
