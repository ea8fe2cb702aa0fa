//! The saved form, format 1: what is in the file, in the order in which it is written.
//!
//! Every quantity is text as it was written. Names of keys are the paths by which the page, the
//! problems and the worksheet speak of a field: `girders.g3.spacing` is the spacing of the girder
//! whose id is `g3`.

use super::entry::{Entry, Id, Reference};
use super::part::{Item, choices, saved};

/// The format that this program writes.
pub const FORMAT: u64 = 1;

choices! {
    /// Which unit a bare figure has.
    UnitSystem {
        /// Metres, millimetres, kilonewtons.
        MetreKilonewton = "m-kN",
        /// Feet, inches, kips.
        FootKip = "ft-kip",
    }
    /// The rules by which the bridge is rated.
    RuleSet {
        /// AASHTO Manual for Bridge Evaluation, part A: load and resistance factors.
        MbeA = "mbe-a",
    }
    /// Condition of the superstructure at the last inspection.
    Condition {
        /// Not known.
        NotKnown = "not-known",
        /// Good or satisfactory.
        Good = "good",
        /// Fair.
        Fair = "fair",
        /// Poor.
        Poor = "poor",
    }
    /// What a layer is made of, for its default unit weight.
    Substance {
        /// Asphalt.
        Asphalt = "asphalt",
        /// Concrete.
        Concrete = "concrete",
        /// Rolled gravel or macadam.
        Gravel = "gravel",
        /// Something else: its unit weight has to be entered.
        Other = "other",
    }
    /// Which edge of the deck a strip stands along.
    Side {
        /// One along either edge.
        Both = "both",
        /// Along the left edge.
        Left = "left",
        /// Along the right edge.
        Right = "right",
    }
    /// When a strip came onto the girders.
    Placed {
        /// After the slab had hardened.
        Later = "later",
        /// With the wet slab, on the bare girders.
        Bare = "bare",
        /// With the wearing surface, or a utility.
        Surface = "surface",
    }
    /// The kind of a member.
    Kind {
        /// A steel I-girder under a concrete deck.
        SteelGirder = "steel-girder",
    }
    /// Whether the slab works together with the girder.
    Connectors {
        /// Nobody knows.
        NotKnown = "not-known",
        /// Seen, drawn or proved by test.
        Proved = "proved",
        /// Known to have none.
        None = "none",
    }
    /// Whether something is there.
    Presence {
        /// Not looked at.
        NotInspected = "not-inspected",
        /// It is there.
        Yes = "yes",
        /// It is not there.
        No = "no",
    }
    /// Whether something was looked at.
    Looked {
        /// Not looked at.
        NotInspected = "not-inspected",
        /// Looked at: sound, or with the loss that a finding tells.
        Inspected = "inspected",
    }
    /// Whether a web is straight and whole.
    Straight {
        /// Not looked at.
        NotInspected = "not-inspected",
        /// Plumb and whole.
        Straight = "straight",
        /// Out of plumb, or holed.
        Not = "not-straight",
    }
    /// Riding surface at the approaches, the joints and on the deck.
    Surface {
        /// Not looked at.
        NotInspected = "not-inspected",
        /// Smooth.
        Smooth = "smooth",
        /// Minor deviations or depressions.
        Minor = "minor",
        /// Anything worse.
        Rough = "rough",
    }
    /// Unit in which the sign is written.
    SignUnit {
        /// Short tons of 2,000 lb.
        ShortTons = "short-tons",
        /// Tonnes of 1,000 kg.
        Tonnes = "tonnes",
    }
    /// Whether yielding in service decides on posting as well.
    ServicePosting {
        /// As the rule set has it.
        RuleSet = "rule-set",
        /// It decides.
        Yes = "yes",
        /// It is shown apart.
        No = "no",
    }
}

saved! {
    /// A bridge's book.
    Book {
        must {
            /// Format of the file.
            format: u64,
            /// Id of the book, which tells it from every other.
            id: Id,
            /// Which unit a bare figure has: m and mm with kN, or ft and in with kip.
            system: UnitSystem,
        }
        may {
            /// The rules by which the bridge is rated.
            rule_set: RuleSet,
            /// The next number for an id; ids are never used again.
            next_id: u64,
            /// Where the bridge is and what is known of it.
            site: Site,
            /// Spans in order.
            spans: Vec<Span>,
            /// Skew of the supports; 0 for a square bridge.
            skew: Entry,
            /// The deck.
            deck: Deck,
            /// What lies on the roadway, from the top down.
            layers: Vec<Layer>,
            /// What stands along the deck.
            strips: Vec<Strip>,
            /// Kinds of girder.
            members: Vec<Member>,
            /// Distance from the left edge of the deck to the first girder.
            overhang: Entry,
            /// Girder lines from left to right, looking ahead.
            girders: Vec<Girder>,
            /// What was found on girders.
            findings: Vec<Finding>,
            /// Traffic and riding surface.
            traffic: Traffic,
            /// Factors set in place of the rule set's.
            overrides: Vec<Override>,
            /// Vehicles of one's own state or agency.
            vehicles: Vec<Vehicle>,
            /// How the bridge is posted.
            posting: Posting,
        }
    }
    /// Where the bridge is and what is known of it.
    Site {
        must {}
        may {
            /// Name of the bridge.
            name: String,
            /// Road that it carries.
            road: String,
            /// What it crosses.
            feature: String,
            /// County or place.
            county: String,
            /// Year built.
            year_built: String,
            /// Condition rating of the superstructure at the last inspection, 0 to 9.
            condition_rating: String,
            /// The same in words.
            condition: Condition,
            /// Notes of the last inspection.
            notes: String,
            /// Rating in force before this one.
            rating_before: String,
            /// Posting in force before this one.
            posting_before: String,
            /// Name of the rater.
            rater: String,
            /// Name of the checker.
            checker: String,
            /// Date of the readings.
            date: String,
        }
    }
    /// One span.
    Span {
        must {
            /// Id.
            id: Id,
        }
        may {
            /// Length from centre of bearing to centre of bearing.
            length: Entry,
        }
    }
    /// The deck across all girders.
    Deck {
        must {}
        may {
            /// Width out to out.
            width: Entry,
            /// Clear roadway between curbs or rails.
            roadway: Entry,
            /// Distance from the left edge of the deck to the left curb.
            left_curb: Entry,
            /// Thickness of the structural slab.
            slab: Entry,
            /// Compressive strength of the concrete.
            concrete_strength: Entry,
            /// Unit weight of the reinforced concrete.
            concrete_weight: Entry,
            /// Haunch: from the top of the flange to the soffit of the slab; 0 for none.
            haunch: Entry,
            /// Width of the haunch.
            haunch_width: Entry,
        }
    }
    /// A layer on the roadway.
    Layer {
        must {
            /// Id.
            id: Id,
        }
        may {
            /// What it is called.
            name: String,
            /// What it is made of.
            substance: Substance,
            /// Thickness.
            thickness: Entry,
            /// Unit weight.
            unit_weight: Entry,
        }
    }
    /// Something that stands along the whole deck.
    Strip {
        must {
            /// Id.
            id: Id,
        }
        may {
            /// What it is called.
            name: String,
            /// Weight on a length, of one.
            weight: Entry,
            /// Which edge.
            side: Side,
            /// When it came onto the girders.
            placed: Placed,
        }
    }
    /// A kind of girder.
    Member {
        must {
            /// Id.
            id: Id,
        }
        may {
            /// What it is called.
            name: String,
            /// What it is.
            kind: Kind,
            /// Name of a rolled shape; what is entered below takes its place.
            shape: Entry,
            /// Depth out to out.
            depth: Entry,
            /// Width of the top flange.
            top_width: Entry,
            /// Thickness of the top flange.
            top_thickness: Entry,
            /// Width of the bottom flange.
            bottom_width: Entry,
            /// Thickness of the bottom flange.
            bottom_thickness: Entry,
            /// Thickness of the web.
            web: Entry,
            /// From the outer face of a flange to the toe of the fillet or weld.
            fillet: Entry,
            /// Yield strength of the steel.
            yield_strength: Entry,
            /// Whether connectors join it to the slab.
            connectors: Connectors,
            /// Greatest distance between diaphragms that work.
            brace_spacing: Entry,
            /// Whether the top flange is embedded in, or connected to, the slab.
            embedded: Presence,
            /// Length of bearing along the girder.
            bearing_length: Entry,
            /// Whether stiffeners stand over the bearings.
            bearing_stiffeners: Presence,
        }
    }
    /// A girder line.
    Girder {
        must {
            /// Id.
            id: Id,
        }
        may {
            /// What it is called on site.
            name: String,
            /// Distance to the girder at its left; none for the first.
            spacing: Entry,
            /// Id of its member.
            member: Reference,
            /// Whether the web over the near bearing was looked at.
            end_near: Looked,
            /// Whether the web over the far bearing was looked at.
            end_far: Looked,
        }
    }
    /// What is left of a girder over a range along it.
    Finding {
        must {
            /// Id.
            id: Id,
        }
        may {
            /// What it is called.
            name: String,
            /// Id of its girder.
            girder: Reference,
            /// Start of the range, from the near bearing.
            from: Entry,
            /// End of the range, from the near bearing.
            to: Entry,
            /// Thickness left of the top flange.
            top: Entry,
            /// Thickness left of the bottom flange.
            bottom: Entry,
            /// Thickness left of the web, over its height.
            web: Entry,
            /// Thickness left in the lowest band of the web.
            web_low: Entry,
            /// Whether the web is straight and whole.
            straight: Straight,
        }
    }
    /// Traffic and riding surface.
    Traffic {
        must {}
        may {
            /// Trucks a day in one direction.
            adtt: Entry,
            /// Riding surface.
            riding: Surface,
        }
    }
    /// A factor set in place of the rule set's.
    Override {
        must {
            /// Id.
            id: Id,
        }
        may {
            /// Name of the factor, as the rule set calls it.
            factor: String,
            /// Its value.
            value: Entry,
            /// Why, as it is printed.
            reason: String,
        }
    }
    /// A vehicle of one's own state or agency.
    Vehicle {
        must {
            /// Id.
            id: Id,
        }
        may {
            /// What it is called.
            name: String,
            /// Weight of each axle, from the front.
            axles: Entry,
            /// Distance from each axle to the next.
            spacings: Entry,
        }
    }
    /// How the bridge is posted.
    Posting {
        must {}
        may {
            /// Unit in which the sign is written.
            unit: SignUnit,
            /// Whether yielding in service decides on posting as well.
            service: ServicePosting,
        }
    }
}

macro_rules! items {
    ($($name:ident)+) => { $( impl Item for $name { fn id(&self) -> &str { &self.id.0 } } )+ };
}
items! { Span Layer Strip Member Girder Finding Override Vehicle }

impl Book {
    /// A new book: one span, one kind of girder, asphalt and parapets to be entered or taken out,
    /// and no girders yet.
    #[must_use]
    pub fn empty(id: &str, system: UnitSystem) -> Self {
        let id_of = |text: &str| Id(text.to_string());
        Self {
            format: FORMAT,
            id: id_of(id),
            system,
            next_id: 2,
            spans: vec![Span { id: id_of("s1"), ..Span::default() }],
            layers: vec![Layer { id: id_of("l1"), name: "Asphalt".to_string(), ..Layer::default() }],
            strips: vec![Strip { id: id_of("p1"), name: "Parapet".to_string(), ..Strip::default() }],
            members: vec![Member { id: id_of("m1"), name: "Girder".to_string(), ..Member::default() }],
            posting: Posting {
                unit: match system {
                    UnitSystem::MetreKilonewton => SignUnit::Tonnes,
                    UnitSystem::FootKip => SignUnit::ShortTons,
                },
                service: ServicePosting::default(),
            },
            ..Self::default()
        }
    }
}
