//! Figures as they are printed on a worksheet and in a verdict.

/// Significant digits on a worksheet: one more than a rating needs, so that a pocket calculator
/// that is fed the printed figures meets the printed result.
pub const DIGITS: usize = 5;

/// A figure with [`DIGITS`] significant digits. One that is exact in fewer is printed without the
/// zeros behind, so that `36` is 36 and `36.000` is a figure near it. Whole digits before the point
/// are never rounded away below ten million; beyond that, and below 0.001, powers of ten stand.
#[must_use]
pub fn figure(value: f64) -> String {
    figure_of(value, DIGITS)
}

/// The same with another number of significant digits, one at least.
#[must_use]
pub fn figure_of(value: f64, digits: usize) -> String {
    if value == 0.0 {
        return "0".to_owned();
    }
    if !value.is_finite() {
        return "no figure".to_owned();
    }
    // The standard library rounds the exact decimal expansion, on every device alike.
    let scientific = format!("{value:.*e}", digits.max(1) - 1);
    let (mantissa, exponent) = scientific.split_once('e').unwrap_or((&scientific, "0"));
    let exponent: i32 = exponent.parse().unwrap_or(0);
    let near = |text: &str| text.parse::<f64>().is_ok_and(|v| (v / value - 1.0).abs() < 1e-12);
    if (-3..7).contains(&exponent) {
        let decimals = usize::try_from(digits as i32 - 1 - exponent).unwrap_or(0);
        let full = format!("{value:.decimals$}");
        if near(&full) { trimmed(&full).to_owned() } else { full }
    } else {
        let mantissa = if near(&scientific) { trimmed(mantissa) } else { mantissa };
        format!("{mantissa} × 10{}", raised(exponent))
    }
}

fn trimmed(text: &str) -> &str {
    if text.contains('.') { text.trim_end_matches('0').trim_end_matches('.') } else { text }
}

/// A whole number as an exponent.
fn raised(exponent: i32) -> String {
    exponent
        .to_string()
        .chars()
        .map(|c| match c {
            '-' => '⁻',
            '1' => '¹',
            '2' => '²',
            '3' => '³',
            c => c.to_digit(10).and_then(|d| char::from_u32(0x2070 + d)).unwrap_or(c),
        })
        .collect()
}

/// A unit as it is printed: `in4` as `in⁴`, `kN/m2` as `kN/m²`.
#[must_use]
pub fn unit(name: &str) -> String {
    name.chars()
        .map(|c| match c {
            '2' => '²',
            '3' => '³',
            '4' => '⁴',
            c => c,
        })
        .collect()
}

/// A figure with its unit.
#[must_use]
pub fn with_unit(value: f64, name: &str) -> String {
    let number = figure(value);
    match name {
        "" => number,
        "°" => number + "°",
        name => format!("{number} {}", unit(name)),
    }
}

/// A rating factor with two decimals, to the nearest, but never up to a threshold that decides: see
/// [`crate::units::format::factor`].
#[must_use]
pub fn factor(value: f64) -> String {
    if !value.is_finite() || value < 0.0 {
        return "no figure".to_owned();
    }
    if value >= 100.0 {
        return "over 99".to_owned();
    }
    crate::units::format::factor(value)
}

/// A number with at most `decimals` decimals, without zeros behind.
#[must_use]
pub fn decimals(value: f64, decimals: usize) -> String {
    if !value.is_finite() {
        return "no figure".to_owned();
    }
    let text = format!("{value:.decimals$}");
    match trimmed(&text) {
        "-0" => "0".to_owned(),
        text => text.to_owned(),
    }
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn figures_have_five_digits_unless_fewer_are_exact() {
        for (value, text) in [
            (36.0, "36"),
            (36.000_3, "36.000"),
            (1.0 / 3.0, "0.33333"),
            (0.8, "0.8"),
            (29_000.0, "29000"),
            (4_123_456.7, "4123457"),
            (-12.344_96, "-12.345"),
            (4.708_66e9, "4.7087 × 10⁹"),
            (2.5e-5, "2.5 × 10⁻⁵"),
            (0.001_25, "0.00125"),
            (0.0, "0"),
            (9.999_996, "10.000"),
            (f64::NAN, "no figure"),
        ] {
            assert_eq!(figure(value), text, "{value}");
        }
    }

    #[test]
    fn a_factor_is_rounded_but_never_reaches_one_from_below() {
        for (value, text) in [
            (0.814_9, "0.81"),
            (0.29, "0.29"),
            (0.999_999_999_999, "0.99"),
            (1.0, "1.00"),
            (1.209_999, "1.21"),
            (0.0, "0.00"),
            (123.4, "over 99"),
            (f64::INFINITY, "no figure"),
        ] {
            assert_eq!(factor(value), text, "{value}");
        }
    }

    #[test]
    fn units_are_raised() {
        assert_eq!(with_unit(14_900.0, "in4"), "14900 in⁴");
        assert_eq!(with_unit(24.5, "kN/m3"), "24.5 kN/m³");
        assert_eq!(with_unit(12.5, "°"), "12.5°");
        assert_eq!(with_unit(1.25, ""), "1.25");
        assert_eq!(decimals(-0.000_1, 2), "0");
        assert_eq!(decimals(12.50, 2), "12.5");
    }
}
