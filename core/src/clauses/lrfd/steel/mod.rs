//! Steel I-girders: AASHTO LRFD 9th edition (2020), section 6 with appendices A6 and D6.
//!
//! Formulas and constants were written from memory of that edition and checked against published
//! worked examples where the tests name one; units are inches, kips and ksi.
//!
//! - [`material`]: moduli and the modular ratio; [`phi`]: resistance factors;
//! - [`proportions`]: limits within which the strength formulas hold;
//! - [`flange`]: which flange is pressed and which is pulled, and what holds the pressed one;
//! - [`web`]: web slenderness, web plastification and load shedding;
//! - [`local`]: flange local buckling; [`lateral`]: lateral-torsional buckling;
//! - [`noncomposite`] and [`composite`]: nominal flexural resistance;
//! - [`service`]: limits of Service II; [`shear`]: shear; [`bearing`]: the web over a bearing.

pub mod bearing;
pub mod composite;
pub mod flange;
pub mod lateral;
pub mod local;
pub mod material;
pub mod noncomposite;
pub mod phi;
pub mod proportions;
pub mod service;
pub mod shear;
pub mod web;
