//! Mechanics of resistance, without coefficients of any code.
//!
//! - [`plastic`]: plastic neutral axis and plastic moment of a steel section with a slab on it.

pub mod plastic;
