//! The open book as slots for the page.
//!
//! The page knows no bridge: it mounts nodes, sends what was typed, and takes back what changed. Here
//! stands which fields a page has, what they are called, how the drawings are made and what the
//! verdict shows; the words of the verdict and every figure come from `girderbook-core`.

pub mod desk;
pub mod drawing;
mod head;
pub mod key;
mod missing;
pub mod node;
pub mod open_book;
pub mod pages;
pub mod scene;
mod verdict;
