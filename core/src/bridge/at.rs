//! What is left of a girder at a place, with the findings there.

use super::{Bridge, Finding, MemberKind, Straightness};
use crate::quantity::Length;
use crate::section::plate::Left;

impl Finding {
    /// Whether a place lies in its range, ends included.
    #[must_use]
    pub fn covers(&self, x: Length) -> bool {
        self.from.value <= x && x <= self.to.value
    }
}

impl Bridge {
    /// The plates left of a girder line at `x`.
    ///
    /// Findings that overlap are combined by the least thickness left of each plate. A plate in
    /// bending or shear counts with the mean of its profile of readings; the lowest band of the web
    /// with its least reading, since one millimetre decides there. Where a finding has no reading of
    /// that band, the least reading of the web stands in for it.
    #[must_use]
    pub fn left_at(&self, line: usize, x: Length) -> Left {
        let MemberKind::Steel(girder) = &self.member(line).kind;
        let section = &girder.section;
        let mut left = Left {
            depth: section.depth.value,
            top: section.top.thickness.value,
            bottom: section.bottom.thickness.value,
            web: section.web.value,
            web_low: section.web.value,
        };
        for finding in self.findings_on(line).filter(|f| f.covers(x)) {
            let less = |sound: &mut Length, reading: Option<Length>| {
                if let Some(reading) = reading {
                    *sound = sound.min(reading);
                }
            };
            less(&mut left.top, finding.top.as_ref().map(|e| e.value));
            less(&mut left.bottom, finding.bottom.as_ref().map(|e| e.value));
            less(&mut left.web, finding.web.as_ref().map(|e| e.value));
            let band = finding.web_low.as_ref().or(finding.web.as_ref());
            less(&mut left.web_low, band.map(crate::units::Entered::least));
        }
        left
    }

    /// Whether any finding with measured loss covers the place.
    #[must_use]
    pub fn loss_measured_at(&self, line: usize, x: Length) -> bool {
        self.findings_on(line).any(|f| f.covers(x))
    }

    /// The finding that keeps the web there from being straight and whole, or from being known to be.
    #[must_use]
    pub fn crooked_web_at(&self, line: usize, x: Length) -> Option<&Finding> {
        self.findings_on(line).find(|f| f.covers(x) && f.straight != Straightness::Straight)
    }
}
