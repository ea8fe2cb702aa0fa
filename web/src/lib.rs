//! The open book: pages as slots, drawings as data.
