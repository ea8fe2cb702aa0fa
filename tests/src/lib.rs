//! Helpers of the tests: reading reference data.
