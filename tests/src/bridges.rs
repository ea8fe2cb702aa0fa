//! Bridges for tests: steel I-girders under a concrete deck, from a few sizes in feet and inches.

use girderbook_core::bridge::{
    Bracing, Bridge, Composite, ConditionRating, Deck, Embedded, GirderLine, Layer, Member, MemberKind,
    Overrides, Posting, Riding, Site, Span, Stage, SteelGirder, Strip, StripSide, Traffic, WebEnds,
};
use girderbook_core::material::{Concrete, Steel};
use girderbook_core::quantity::{Angle, Length, LineLoad, Quantity, Stress, UnitWeight};
use girderbook_core::section::plate::{Flange, IShape};
use girderbook_core::units::{Entered, WeightUnit};

/// Sizes of a bridge in feet; slab and haunch in inches.
#[derive(Clone, Debug)]
pub struct Sizes {
    /// Spacings of the girder lines from left to right.
    pub spacings: Vec<f64>,
    /// Left edge of the deck to the first girder.
    pub overhang: f64,
    /// Width of the deck.
    pub width: f64,
    /// Left edge of the deck to the left curb.
    pub curb: f64,
    /// Clear roadway.
    pub roadway: f64,
    /// Span.
    pub span: f64,
    /// Slab.
    pub slab: f64,
    /// Haunch.
    pub haunch: f64,
    /// Skew in degrees.
    pub skew: f64,
    /// Whether diaphragms that work were measured.
    pub diaphragms: bool,
}

impl Sizes {
    /// Girders at equal spacings, deck and roadway about their middle.
    #[must_use]
    pub fn even(girders: usize, spacing: f64, roadway: f64, width: f64, span: f64) -> Self {
        Self {
            spacings: vec![spacing; girders - 1],
            overhang: (width - spacing * (girders - 1) as f64) / 2.0,
            width,
            curb: (width - roadway) / 2.0,
            roadway,
            span,
            slab: 8.0,
            haunch: 1.0,
            skew: 0.0,
            diaphragms: false,
        }
    }

    /// The same bridge seen from the other end.
    #[must_use]
    pub fn mirrored(&self) -> Self {
        let across: f64 = self.spacings.iter().sum();
        Self {
            spacings: self.spacings.iter().rev().copied().collect(),
            overhang: self.width - self.overhang - across,
            curb: self.width - self.curb - self.roadway,
            ..self.clone()
        }
    }

    /// The bridge: bare deck, one kind of girder.
    #[must_use]
    pub fn bridge(&self) -> Bridge {
        let ft = Length::from_ft;
        let mut y = self.overhang;
        let mut lines = vec![girder_line(0, ft(y), None)];
        for (i, &spacing) in self.spacings.iter().enumerate() {
            y += spacing;
            let path = format!("girders.g{}.spacing", i + 2);
            lines.push(girder_line(i + 1, ft(y), Some(Entered::measured(path, ft(spacing)))));
        }
        let spacing = self.diaphragms.then(|| entered("members.m1.bracing", ft(15.0)));
        Bridge {
            site: Site { condition: Some(ConditionRating::Fair), ..Site::default() },
            spans: vec![Span { length: entered("spans.s1.length", ft(self.span)) }],
            skew: entered("skew", Angle::from_deg(self.skew)),
            deck: Deck {
                width: entered("deck.width", ft(self.width)),
                roadway: entered("deck.roadway", ft(self.roadway)),
                left_curb: ft(self.curb),
                slab: entered("deck.slab", Length::from_inch(self.slab)),
                concrete: Concrete {
                    strength: entered("deck.concrete_strength", Stress::from_ksi(3.0)),
                    unit_weight: entered("deck.concrete_weight", UnitWeight::from_kcf(0.150)),
                },
                haunch: entered("deck.haunch", Length::from_inch(self.haunch)),
                haunch_width: entered("deck.haunch_width", ft(1.0)),
                layers: Vec::new(),
                strips: Vec::new(),
            },
            members: vec![Member {
                id: "m1".to_owned(),
                name: "stringer".to_owned(),
                kind: MemberKind::Steel(steel_girder(spacing)),
            }],
            lines,
            findings: Vec::new(),
            traffic: Traffic { adtt: None, riding: Riding::NotInspected, overrides: Overrides::default() },
            vehicles: Vec::new(),
            posting: Posting { sign: WeightUnit::ShortTons, service_governs: None },
        }
    }
}

/// A layer of the deck; thickness in inches, unit weight in kcf.
#[must_use]
pub fn layer(name: &str, thickness: Entered<Length>, kcf: f64) -> Layer {
    Layer {
        id: name.to_owned(),
        name: name.to_owned(),
        thickness,
        unit_weight: entered("layers.l1.unit_weight", UnitWeight::from_kcf(kcf)),
    }
}

/// A strip along the deck; weight of one in kip/ft.
#[must_use]
pub fn strip(name: &str, klf: f64, side: StripSide, stage: Stage) -> Strip {
    let weight = entered("strips.s1.weight", LineLoad::from_kip_ft(klf));
    Strip { id: name.to_owned(), name: name.to_owned(), weight, side, stage }
}

/// One measured value.
#[must_use]
pub fn entered<Q: Quantity>(path: &str, value: Q) -> Entered<Q> {
    Entered::measured(path, value)
}

fn girder_line(i: usize, y: Length, spacing: Option<Entered<Length>>) -> GirderLine {
    GirderLine {
        id: format!("g{}", i + 1),
        name: format!("G{}", i + 1),
        y,
        spacing,
        member: 0,
        ends: [WebEnds::NotInspected; 2],
    }
}

/// A girder of three plates; nothing of it enters a share or a take-off.
fn steel_girder(spacing: Option<Entered<Length>>) -> SteelGirder {
    let inch = |value: f64| entered("members.m1.section", Length::from_inch(value));
    let flange = || Flange { width: inch(12.0), thickness: inch(1.0) };
    SteelGirder {
        section: IShape {
            depth: inch(36.0),
            top: flange(),
            bottom: flange(),
            web: inch(0.7),
            fillet: inch(2.0),
            published: None,
        },
        steel: Steel { yield_strength: entered("members.m1.yield", Stress::from_ksi(33.0)) },
        composite: Composite::NotKnown,
        bracing: Bracing { spacing, embedded: Embedded::NotInspected },
        bearing_length: None,
        bearing_stiffeners: false,
    }
}
