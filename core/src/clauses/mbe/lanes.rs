//! How many lanes an existing roadway holds, whatever is painted on it.

use crate::quantity::Length;

/// Lanes on a roadway, and the width of each (MBE 6A.2.3.2 with LRFD 3.6.1.1.1): under 18 ft one lane;
/// from 18 to 24 ft two of half the width; from 24 ft on as many as 12 ft go into it.
///
/// Widths within a tenth of a millimetre of a limit are taken as on it.
#[must_use]
pub fn lanes(roadway: Length, full: Length) -> (u32, Length) {
    let width = roadway + Length::from_mm(0.1);
    if width < Length::from_ft(18.0) {
        (1, full.min(roadway))
    } else if width < full * 2.0 {
        (2, roadway / 2.0)
    } else {
        let mut count = 2;
        while full * f64::from(count + 1) <= width {
            count += 1;
        }
        (count, full)
    }
}

#[cfg(test)]
mod tests {
    use super::*;

    /// MBE 6A.2.3.2 and LRFD 3.6.1.1.1, from memory: limits at 18, 20 and 24 ft, then one lane every
    /// 12 ft.
    #[test]
    fn lanes_by_width() {
        let full = Length::from_ft(12.0);
        for (ft, count, lane) in [
            (10.0, 1, 10.0),
            (17.9, 1, 12.0),
            (18.0, 2, 9.0),
            (20.0, 2, 10.0),
            (23.9, 2, 11.95),
            (24.0, 2, 12.0),
            (28.0, 2, 12.0),
            (35.9, 2, 12.0),
            (36.0, 3, 12.0),
            (48.0, 4, 12.0),
        ] {
            let (n, w) = lanes(Length::from_ft(ft), full);
            assert_eq!(n, count, "{ft} ft");
            assert!((w.in_ft() - lane).abs() < 1e-9, "{ft} ft: {}", w.in_ft());
        }
    }
}
