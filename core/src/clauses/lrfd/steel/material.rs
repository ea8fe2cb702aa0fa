//! Moduli of steel and concrete, and their ratio.

use crate::clause;
use crate::problem::Problem;
use crate::quantity::{Stress, UnitWeight};
use crate::units::mark::{Kcf, Ksi, One};
use crate::worksheet::{Recorder, Val};

/// Modulus of elasticity of steel: 29,000 ksi.
pub fn steel_modulus<R: Recorder>(rec: &mut R) -> Val<Stress> {
    rec.look_up(
        "E",
        "modulus of elasticity of steel",
        Stress::from_ksi(29_000.0),
        Ksi,
        "AASHTO LRFD 9th ed. 6.4.1 (from memory)",
        || "all grades".to_owned(),
    )
}

clause! {
    /// Modulus of elasticity of concrete, ksi, with `K_1` = 1.0; for unit weights of 0.090 to
    /// 0.155 kcf and strengths up to 15 ksi. 0.145 kcf and 4 ksi: 3,987 ksi.
    pub fn concrete_modulus(w_c: UnitWeight [Kcf], f_c: Stress [Ksi]) -> E_c: Stress [Ksi]
    { 120000.0 * pow(w_c, 2.0) * pow(f_c, 0.33) }
    cite "AASHTO LRFD 9th ed. 5.4.2.4 (5.4.2.4-1), from memory" what "modulus of elasticity of concrete"
}

clause! {
    /// Ratio of the moduli.
    pub fn ratio_of_moduli(E: Stress [Ksi], E_c: Stress [Ksi]) -> n: f64 [One] { E / E_c }
    cite "AASHTO LRFD 9th ed. 6.10.1.1.1b (6.10.1.1.1b-1), from memory" what "modular ratio"
}

clause! {
    /// Modular ratio for loads that stay: three times that for loads that pass.
    pub fn long_term_ratio(n: f64 [One]) -> n_3: f64 [One] { 3.0 * n }
    cite "AASHTO LRFD 9th ed. 6.10.1.1.1b, from memory" what "modular ratio for permanent load"
}

/// A strength in ksi as it was entered: a table's limit must not be missed by the last digit of a
/// conversion.
fn figure(f_c: Val<Stress>) -> f64 {
    (f_c.q.in_ksi() * 1e9).round() / 1e9
}

/// Unit weight of plain normal-weight concrete, for its modulus: 0.145 kcf up to 5 ksi, above that
/// 0.140 + 0.001 f'c kcf (table 3.5.1-1, from memory).
pub fn concrete_weight<R: Recorder>(rec: &mut R, f_c: Val<Stress>) -> Val<UnitWeight> {
    const CITE: &str = "AASHTO LRFD 9th ed. table 3.5.1-1 (from memory)";
    let strength = figure(f_c);
    let (weight, row) = if strength <= 5.0 {
        (0.145, "normal weight, f'c up to 5.0 ksi")
    } else {
        (0.140 + 0.001 * strength, "normal weight, f'c above 5.0 ksi: 0.140 + 0.001 f'c")
    };
    rec.look_up("w_c", "unit weight of plain concrete", UnitWeight::from_kcf(weight), Kcf, CITE, || {
        row.to_owned()
    })
}

/// Modular ratio of normal-weight concrete: whole numbers by strength from 2.4 ksi, as the commentary
/// gives them; below that from the moduli, down to 1 ksi.
///
/// # Errors
/// For strengths outside 1 to 15 ksi, for which no modulus is given.
pub fn modular_ratio<R: Recorder>(rec: &mut R, f_c: Val<Stress>, path: &str) -> Result<Val<f64>, Problem> {
    const TABLE: [(f64, f64, &str); 5] = [
        (2.9, 10.0, "2.4 <= f'c < 2.9 ksi"),
        (3.6, 9.0, "2.9 <= f'c < 3.6 ksi"),
        (4.6, 8.0, "3.6 <= f'c < 4.6 ksi"),
        (6.0, 7.0, "4.6 <= f'c < 6.0 ksi"),
        (15.0, 6.0, "6.0 ksi <= f'c"),
    ];
    let strength = figure(f_c);
    if !(1.0..=15.0).contains(&strength) {
        return Err(Problem::error(
            path,
            "no modulus of elasticity is given for concrete below 1 or above 15 ksi",
            "check the strength of the concrete",
        ));
    }
    if strength < 2.4 {
        let w_c = concrete_weight(rec, f_c);
        let e = steel_modulus(rec);
        let e_c = concrete_modulus(rec, w_c, f_c);
        return Ok(ratio_of_moduli(rec, e, e_c));
    }
    let (_, n, row) = TABLE.into_iter().find(|(below, ..)| strength < *below).unwrap_or(TABLE[4]);
    Ok(rec.look_up("n", "modular ratio", n, One, "AASHTO LRFD 9th ed. C6.10.1.1.1b (from memory)", || {
        row.to_owned()
    }))
}
