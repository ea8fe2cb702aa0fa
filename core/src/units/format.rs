//! Quantities as text: the same digits on every device, a point for decimals.

use super::registry;
use crate::quantity::{Length, Quantity};

/// Decimals that a unit is printed with.
const fn decimals(unit: &str) -> usize {
    match unit.as_bytes() {
        b"m" | b"ft" | b"in" | b"kN/m" | b"ksi" | b"in2" => 2,
        b"kip/ft" | b"kcf" => 3,
        b"mm" | b"cm" | b"kN" | b"kN m" | b"MPa" | b"kip" | b"kip ft" | b"kip in" | b"kN/m3" | b"kN/m2"
        | b"short tons" | b"t" | b"\xc2\xb0" | b"in3" => 1,
        _ => 0,
    }
}

/// A figure with a fixed number of decimals; never `-0`, and in words where it is not finite.
#[must_use]
pub fn fixed(figure: f64, decimals: usize) -> String {
    if !figure.is_finite() {
        return "no number".to_owned();
    }
    let text = format!("{figure:.decimals$}");
    let zero = text.bytes().all(|b| matches!(b, b'-' | b'0' | b'.'));
    if zero { text.trim_start_matches('-').to_owned() } else { text }
}

/// A figure to so many significant digits, without an exponent.
#[must_use]
pub fn significant(figure: f64, digits: usize) -> String {
    if figure == 0.0 || !figure.is_finite() {
        return fixed(figure, 0);
    }
    let magnitude = format!("{figure:e}");
    let exponent: i32 = magnitude.split('e').nth(1).and_then(|e| e.parse().ok()).unwrap_or(0);
    let wanted = i32::try_from(digits).unwrap_or(6) - 1 - exponent;
    fixed(figure, usize::try_from(wanted.clamp(0, 12)).unwrap_or(0))
}

/// The figure of a quantity in a unit, without the unit; empty for a unit of another kind.
#[must_use]
pub fn figure<Q: Quantity>(q: Q, unit: &str) -> String {
    match registry::by_name(unit) {
        Some(known) if known.dimension == Q::DIMENSION => fixed(q.base() / known.per, decimals(unit)),
        None if unit.is_empty() => trimmed(q.base()),
        _ => String::new(),
    }
}

/// A quantity in a unit, with the unit behind it.
#[must_use]
pub fn show<Q: Quantity>(q: Q, unit: &str) -> String {
    let figure = figure(q, unit);
    if unit.is_empty() { figure } else { format!("{figure} {unit}") }
}

fn trimmed(figure: f64) -> String {
    let text = fixed(figure, 3);
    if text.contains('.') { text.trim_end_matches('0').trim_end_matches('.').to_owned() } else { text }
}

/// A length in feet, inches and sixteenths: `12'-3 1/2"`.
#[must_use]
#[allow(clippy::cast_possible_truncation)]
pub fn feet_inches(length: Length) -> String {
    let sixteenths = libm::round(length.in_inch() * 16.0);
    if !sixteenths.is_finite() || sixteenths.abs() > 1e12 {
        return fixed(length.in_ft(), 2);
    }
    let whole = sixteenths.abs() as i64;
    let sign = if sixteenths < 0.0 { "-" } else { "" };
    let (feet, rest) = (whole / 192, whole % 192);
    let (inches, mut part, mut of) = (rest / 16, rest % 16, 16);
    while part != 0 && part % 2 == 0 {
        part /= 2;
        of /= 2;
    }
    let fraction = if part == 0 { String::new() } else { format!(" {part}/{of}") };
    format!("{sign}{feet}'-{inches}{fraction}\"")
}

/// A rating factor: two decimals, to the nearest, but never rounded up to or over a threshold that
/// decides: below 1 it prints 0.99 at most, below 0.3 it prints 0.29 at most.
#[must_use]
pub fn factor(rf: f64) -> String {
    for limit in [1.0, 0.3] {
        if rf < limit && rf > limit - 0.01 {
            return fixed(limit - 0.01, 2);
        }
    }
    fixed(rf, 2)
}
