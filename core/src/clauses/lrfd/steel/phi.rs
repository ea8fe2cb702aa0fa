//! Resistance factors (6.5.4.2).

use crate::units::mark::One;
use crate::worksheet::{Recorder, Val};

const CITE: &str = "AASHTO LRFD 9th ed. 6.5.4.2 (from memory)";

/// Flexure: 1.00.
pub fn flexure<R: Recorder>(rec: &mut R) -> Val<f64> {
    rec.look_up("phi_f", "resistance factor, flexure", 1.0, One, CITE, || "for flexure".to_owned())
}

/// Shear: 1.00.
pub fn shear<R: Recorder>(rec: &mut R) -> Val<f64> {
    rec.look_up("phi_v", "resistance factor, shear", 1.0, One, CITE, || "for shear".to_owned())
}

/// Bearing, taken for web local yielding by D6.5.2: 1.00.
pub fn bearing<R: Recorder>(rec: &mut R) -> Val<f64> {
    rec.look_up("phi_b", "resistance factor, web local yielding", 1.0, One, CITE, || {
        "for bearing, milled surfaces".to_owned()
    })
}

/// Web crippling: 0.80.
pub fn crippling<R: Recorder>(rec: &mut R) -> Val<f64> {
    rec.look_up("phi_w", "resistance factor, web crippling", 0.80, One, CITE, || {
        "for web crippling".to_owned()
    })
}
