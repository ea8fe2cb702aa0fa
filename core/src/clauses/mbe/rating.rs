//! The rating equation of MBE part A and the factors on capacity.
//!
//! Source: AASHTO Manual for Bridge Evaluation, 3rd edition (2018), 6A.4.2; from memory.

use crate::clause;
use crate::quantity::{Force, Moment, Stress};
use crate::units::mark::{Kip, KipFt, Ksi, One};

clause! {
    /// Capacity for bending at the strength limit states. The product of condition and system factor
    /// is kept at 0.85 or more by its own clause.
    pub fn moment_capacity(phi_cs: f64 [One], phi: f64 [One], M_n: Moment [KipFt]) -> C: Moment [KipFt]
    { phi_cs * phi * M_n }
    cite "MBE 6A.4.2.1 (6A.4.2.1-2)" what "capacity in bending"
}

clause! {
    /// Capacity for shear and reactions at the strength limit states.
    pub fn force_capacity(phi_cs: f64 [One], phi: f64 [One], R_n: Force [Kip]) -> C: Force [Kip]
    { phi_cs * phi * R_n }
    cite "MBE 6A.4.2.1 (6A.4.2.1-2)" what "capacity in shear or bearing"
}

clause! {
    /// Capacity in service: the limit itself, without resistance, condition or system factor.
    pub fn service_capacity(f_R: Stress [Ksi]) -> C: Stress [Ksi]
    { f_R }
    cite "MBE 6A.4.2.1 (6A.4.2.1-4)" what "capacity in service"
}

clause! {
    /// Rating factor for bending.
    pub fn moment_factor(
        C: Moment [KipFt], gamma_DC: f64 [One], M_DC1: Moment [KipFt], M_DC2: Moment [KipFt],
        gamma_DW: f64 [One], M_DW: Moment [KipFt], gamma_LL: f64 [One], M_LL: Moment [KipFt],
    ) -> RF: f64 [One]
    { (C - gamma_DC * (M_DC1 + M_DC2) - gamma_DW * M_DW) / (gamma_LL * M_LL) }
    cite "MBE 6A.4.2.1 (6A.4.2.1-1)" what "rating factor"
}

clause! {
    /// Rating factor for shear and for reactions.
    pub fn force_factor(
        C: Force [Kip], gamma_DC: f64 [One], V_DC1: Force [Kip], V_DC2: Force [Kip],
        gamma_DW: f64 [One], V_DW: Force [Kip], gamma_LL: f64 [One], V_LL: Force [Kip],
    ) -> RF: f64 [One]
    { (C - gamma_DC * (V_DC1 + V_DC2) - gamma_DW * V_DW) / (gamma_LL * V_LL) }
    cite "MBE 6A.4.2.1 (6A.4.2.1-1)" what "rating factor"
}

clause! {
    /// Rating factor for bending stress in service.
    pub fn stress_factor(
        C: Stress [Ksi], gamma_DC: f64 [One], f_DC1: Stress [Ksi], f_DC2: Stress [Ksi],
        gamma_DW: f64 [One], f_DW: Stress [Ksi], gamma_LL: f64 [One], f_LL: Stress [Ksi],
    ) -> RF: f64 [One]
    { (C - gamma_DC * (f_DC1 + f_DC2) - gamma_DW * f_DW) / (gamma_LL * f_LL) }
    cite "MBE 6A.4.2.1 (6A.4.2.1-1)" what "rating factor"
}

clause! {
    /// Weight of a vehicle that the bridge rates at.
    pub fn rating_weight(RF: f64 [One], W: Force [Kip]) -> W_RF: Force [Kip]
    { RF * W }
    cite "MBE 6A.4.4.4 (6A.4.4.4-1)" what "rating as a weight"
}
