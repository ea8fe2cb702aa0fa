//! What stands there: spans, deck layers, girder lines, members, findings, traffic.
//!
//! Everything in here was parsed and found inside its range; the saved document holds the text.
//! Across the deck, `y` runs from the left edge to the right, looking ahead; along it, `x` runs from
//! the centre of the bearings at the near support.

mod at;
pub mod deck;
pub mod finding;
pub mod member;
pub mod posting;
pub mod site;

use crate::quantity::{Angle, Length};
use crate::units::Entered;

pub use deck::{Deck, Layer, Stage, Strip, StripSide};
pub use finding::{Finding, Straightness};
pub use member::{Bracing, Composite, Embedded, Member, MemberKind, SteelGirder, WebEnds};
pub use posting::{OwnVehicle, Posting};
pub use site::{ConditionRating, Overrides, Riding, Site, Traffic};

/// A bridge as it stands today.
#[derive(Clone, Debug, PartialEq)]
pub struct Bridge {
    /// Where it is and what is known of it.
    pub site: Site,
    /// Spans from bearing to bearing, in order.
    pub spans: Vec<Span>,
    /// Skew of the supports: 0 for a square bridge.
    pub skew: Entered<Angle>,
    /// The deck and what lies on it.
    pub deck: Deck,
    /// Kinds of member, which girder lines refer to.
    pub members: Vec<Member>,
    /// Girder lines from left to right.
    pub lines: Vec<GirderLine>,
    /// What was found on girders.
    pub findings: Vec<Finding>,
    /// Traffic that uses it.
    pub traffic: Traffic,
    /// Vehicles of one's own state or agency.
    pub vehicles: Vec<OwnVehicle>,
    /// How it is posted.
    pub posting: Posting,
}

/// One span.
#[derive(Clone, Debug, PartialEq)]
pub struct Span {
    /// Length from centre of bearing to centre of bearing.
    pub length: Entered<Length>,
}

/// One girder line.
#[derive(Clone, Debug, PartialEq)]
pub struct GirderLine {
    /// Id in the document.
    pub id: String,
    /// What it is called on site, such as G1.
    pub name: String,
    /// Distance from the left edge of the deck.
    pub y: Length,
    /// Spacing to the line at its left; none for the first.
    pub spacing: Option<Entered<Length>>,
    /// Index into [`Bridge::members`].
    pub member: usize,
    /// Whether the web at the near and far bearing was looked at.
    pub ends: [WebEnds; 2],
}

impl Bridge {
    /// The member of a girder line.
    #[must_use]
    pub fn member(&self, line: usize) -> &Member {
        &self.members[self.lines[line].member]
    }

    /// Whether a line is the first or the last.
    #[must_use]
    pub fn is_exterior(&self, line: usize) -> bool {
        line == 0 || line + 1 == self.lines.len()
    }

    /// Width of deck that a line carries: half the spacing at either side, or the overhang.
    #[must_use]
    pub fn tributary(&self, line: usize) -> Length {
        let left =
            if line == 0 { self.lines[0].y } else { (self.lines[line].y - self.lines[line - 1].y) / 2.0 };
        let right = if line + 1 == self.lines.len() {
            self.deck.width.value - self.lines[line].y
        } else {
            (self.lines[line + 1].y - self.lines[line].y) / 2.0
        };
        left + right
    }

    /// Findings on a girder line.
    pub fn findings_on(&self, line: usize) -> impl Iterator<Item = &Finding> {
        self.findings.iter().filter(move |f| f.line == line)
    }
}
