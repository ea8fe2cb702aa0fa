//! AASHTO Manual for Bridge Evaluation, 3rd edition (2018) with interims to 2020, part A; from memory
//! where a line does not say otherwise.

pub mod factors;
pub mod lanes;
pub mod legal_vehicles;
pub mod posting;
pub mod rating;
