//! What things are called on the page and on paper.

use crate::check::{Action, Class, Level, LimitState};

/// What a girder is asked for.
#[must_use]
pub const fn action(action: Action) -> &'static str {
    match action {
        Action::Moment => "bending",
        Action::Shear => "shear",
        Action::Bearing => "web over the bearing",
        Action::Stress => "bending stress",
    }
}

/// The limit state as the standard names it.
#[must_use]
pub const fn state(state: LimitState) -> &'static str {
    match state {
        LimitState::StrengthI => "Strength I",
        LimitState::ServiceII => "Service II",
    }
}

/// The level of a rating.
#[must_use]
pub const fn level(level: Level) -> &'static str {
    match level {
        Level::Inventory => "inventory",
        Level::Operating => "operating",
        Level::Legal => "legal",
    }
}

/// The kind of vehicle as a sign names it, in small letters.
#[must_use]
pub const fn class(class: Class) -> &'static str {
    match class {
        Class::Design => "design load",
        Class::SingleUnit => "single-unit trucks",
        Class::Combination => "combinations",
        Class::Own => "own vehicles",
    }
}
