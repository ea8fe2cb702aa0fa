//! AASHTO Manual for Bridge Evaluation, 3rd edition (2018) with interims to 2020, part A.
//!
//! From memory of that edition unless a function says otherwise.
//!
//! - [`lanes`]: traffic lanes of narrow roadways, distance between passing vehicles;
//! - [`factors`]: load, condition and system factors, dynamic load allowance;
//! - [`materials`]: default strengths by year built;
//! - [`legal_vehicles`]: vehicles as rows of data;
//! - [`rating`]: the rating equation;
//! - [`posting`]: safe posting loads, types that are not allowed, closure.

pub mod factors;
pub mod lanes;
pub mod legal_vehicles;
pub mod materials;
pub mod posting;
pub mod rating;
