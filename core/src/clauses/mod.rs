//! Clauses of standards: small functions and tables, written once however many rule sets use them.
//!
//! One folder for each standard; standards never use each other.

pub mod lrfd;
pub mod mbe;
