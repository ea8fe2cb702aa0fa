//! Rolled I-shapes.
