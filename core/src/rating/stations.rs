//! Where a girder line is looked at.

use crate::bridge::Bridge;
use crate::quantity::{Length, Quantity};

/// Parts into which a span is divided: twentieths hold the tenth points of the trade.
const PARTS: u32 = 20;

/// Stations common to all girder lines: the twentieth points of the span, the two ends of every
/// finding, and the places where a vehicle reaches its absolute maximum moment. Midspan is not
/// enough: a finding near a bearing, a cut-off or the wheel beside midspan may govern.
#[must_use]
pub fn stations(bridge: &Bridge, span: Length, peaks: &[Length]) -> Vec<Length> {
    let mut all: Vec<Length> = (0..=PARTS).map(|i| span * (f64::from(i) / f64::from(PARTS))).collect();
    for finding in &bridge.findings {
        all.push(finding.from.value);
        all.push(finding.to.value);
    }
    all.extend_from_slice(peaks);
    all.retain(|x| *x >= Length::ZERO && *x <= span);
    all.sort_by(|a, b| a.base().total_cmp(&b.base()));
    // Nearer than a tenth of a millimetre is the same place.
    all.dedup_by(|a, b| (*a - *b).abs() < Length::from_mm(0.1));
    all
}
