//! Every admissible range, named, with its reason. The same limits feed messages, forms and the
//! generators of tests.

use crate::problem::Problem;
use crate::units::System;
use crate::units::format::{fixed, significant};
use crate::units::registry;

/// What can be true of an entry.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Limit {
    /// What it is, in words.
    pub name: &'static str,
    /// Least admissible value, in base units.
    pub least: f64,
    /// Largest admissible value, in base units.
    pub most: f64,
    /// Whether the least value itself is refused.
    pub open: bool,
    /// Units in which the range is told, by system: m-kN, ft-kip.
    pub units: [&'static str; 2],
    /// Why the range ends where it does.
    pub reason: &'static str,
}

/// Years in which a bridge can have been built.
pub const YEARS: core::ops::RangeInclusive<i32> = 1800..=2100;

const fn limit(
    name: &'static str,
    (least, most): (f64, f64),
    per: f64,
    units: [&'static str; 2],
    reason: &'static str,
) -> Limit {
    Limit { name, least: least * per, most: most * per, open: false, units, reason }
}

const fn above(mut limit: Limit) -> Limit {
    limit.open = true;
    limit
}

const M: f64 = 10_000.0;
const MM: f64 = 10.0;
const LONG: [&str; 2] = ["m", "ft"];
const SMALL: [&str; 2] = ["mm", "in"];

macro_rules! limits {
    ($($(#[$doc:meta])* $name:ident = $limit:expr;)+) => {
        $($(#[$doc])* pub static $name: Limit = $limit;)+
        /// All of them.
        #[must_use]
        pub fn all() -> &'static [&'static Limit] {
            static ALL: &[&Limit] = &[$(&$name),+];
            ALL
        }
    };
}

limits! {
    /// Span from bearing to bearing.
    SPAN = limit("span", (2.0, 60.0), M, LONG, "short spans: the methods here are for 2 to 60 m");
    /// Skew of the supports.
    SKEW = limit("skew", (-75.0, 75.0), 1.0, ["°", "°"], "beyond 75 degrees the supports hardly cross the road");
    /// Width of the deck.
    DECK_WIDTH = limit("deck width", (2.0, 40.0), M, LONG, "from a footbridge to a dual carriageway");
    /// Clear roadway.
    ROADWAY = limit("roadway", (2.0, 40.0), M, LONG, "a truck is 2.4 m wide and cannot use less than 2 m");
    /// Distances at the edge of the deck.
    OFFSET = limit("distance at the edge", (0.0, 5.0), M, LONG, "longer overhangs need brackets of their own");
    /// Thickness of a layer.
    LAYER = limit("layer thickness", (0.0, 1000.0), MM, SMALL, "more than 1 m of fill is no wearing surface");
    /// Unit weight.
    UNIT_WEIGHT = limit("unit weight", (1.0, 40.0), 1e-9, ["kN/m3", "pcf"], "from light timber to dense stone");
    /// Thickness of a slab.
    SLAB = limit("slab thickness", (50.0, 600.0), MM, SMALL, "thinner slabs are planks, thicker ones are slab bridges");
    /// Strength of concrete.
    CONCRETE_STRENGTH =
        limit("concrete strength", (5.0, 100.0), 0.01, ["MPa", "ksi"], "from crumbling to high-strength concrete");
    /// Haunch.
    HAUNCH = limit("haunch", (0.0, 400.0), MM, SMALL, "a thicker haunch is a diaphragm or a wall");
    /// Width of a flange.
    FLANGE_WIDTH = limit("flange width", (30.0, 1500.0), MM, SMALL, "from light joists to plate girders");
    /// Weight of a strip.
    STRIP = limit("weight on a length", (0.0, 50.0), 0.1, ["kN/m", "lb/ft"], "heavier than 50 kN/m is a wall");
    /// Depth of a girder.
    DEPTH = limit("girder depth", (80.0, 4000.0), MM, SMALL, "from light joists to plate girders");
    /// Thickness of a sound plate.
    PLATE = limit("plate thickness", (2.0, 150.0), MM, SMALL, "from thin webs to heavy flanges");
    /// Yield strength.
    YIELD_STRENGTH = limit("yield strength", (150.0, 700.0), 0.01, ["MPa", "ksi"], "from wrought iron to high-strength steel");
    /// Distance between diaphragms.
    BRACE_SPACING = limit("distance between diaphragms", (0.3, 60.0), M, LONG, "not longer than the longest span");
    /// Length of bearing.
    BEARING_LENGTH = limit("bearing length", (10.0, 2000.0), MM, SMALL, "from a line bearing to a girder embedded in a wall");
    /// Spacing of girders.
    SPACING = limit("girder spacing", (0.2, 8.0), M, LONG, "beyond 8 m a deck is framed by floor beams");
    /// Place along a girder.
    STATION = limit("place along the girder", (0.0, 60.0), M, LONG, "not beyond the longest span");
    /// Thickness left.
    LEFT = limit("thickness left", (0.0, 150.0), MM, SMALL, "what is left is not thicker than a sound plate");
    /// Trucks a day.
    ADTT = limit("trucks a day", (0.0, 50_000.0), 1.0, ["", ""], "more than any road carries in one direction");
    /// A factor of the user's own.
    FACTOR = above(limit("factor", (0.0, 5.0), 1.0, ["", ""], "a factor of nothing, or of more than five, is no factor"));
    /// Weight of an axle.
    AXLE = above(limit("axle weight", (0.0, 1500.0), 1000.0, ["kN", "kip"], "heavier axles are no road vehicles"));
    /// Distance between axles.
    AXLE_SPACING = above(limit("axle spacing", (0.0, 60.0), M, LONG, "not beyond the longest span"));
}

impl Limit {
    /// Whether a value in base units is admissible.
    #[must_use]
    pub fn holds(&self, base: f64) -> bool {
        base.is_finite()
            && base <= self.most
            && if self.open { base > self.least } else { base >= self.least }
    }

    /// Refuses a value outside the range, naming the range in the user's units.
    ///
    /// # Errors
    /// When the value is outside.
    pub fn check(&self, path: &str, base: f64, written: &str, system: System) -> Result<(), Problem> {
        if self.holds(base) {
            return Ok(());
        }
        Err(Problem::error(
            path,
            format!("{} must be {}, not {written}", self.name, self.range(system)),
            format!("check the reading and its unit ({})", self.reason),
        ))
    }

    /// The range in words, in the units of a system.
    #[must_use]
    pub fn range(&self, system: System) -> String {
        let unit = self.units[usize::from(system == System::FootKip)];
        let per = registry::by_name(unit).map_or(1.0, |u| u.per);
        let told = |base: f64| {
            let figure = base / per;
            if figure.abs() >= 100.0 { fixed(figure, 0) } else { short(&significant(figure, 3)) }
        };
        let to = if self.open { "above" } else { "" };
        let (least, most) = (told(self.least), told(self.most));
        let behind = if unit.is_empty() { String::new() } else { format!(" {unit}") };
        if self.open {
            format!("{to} {least} and at most {most}{behind}")
        } else {
            format!("{least} to {most}{behind}")
        }
    }
}

fn short(figure: &str) -> String {
    if figure.contains('.') {
        figure.trim_end_matches('0').trim_end_matches('.').to_owned()
    } else {
        figure.to_owned()
    }
}
