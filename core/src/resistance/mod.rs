//! Mechanics of resistance without coefficients of any code.
