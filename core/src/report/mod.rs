//! The words: what is said of a rating, and how its tables and worksheets read.
//!
//! - [`figure`]: figures as they are printed;
//! - [`formula`]: the text of a clause as an engineer writes it;
//! - [`sheet`]: the lines of a worksheet;

mod convert;
pub mod figure;
pub mod formula;
pub mod sheet;
