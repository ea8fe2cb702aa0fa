//! Where the bridge is and what is known of it.

use super::reader::Reader;
use crate::bridge::{ConditionRating, Site};
use crate::document::book::Condition;
use crate::limits;

/// The year built, which strengths are assumed by.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub(super) enum Year {
    /// Entered.
    Built(i32),
    /// Not entered.
    NotEntered,
    /// Entered wrongly, which is told.
    Wrong,
}

impl Year {
    /// The year, where it is known.
    pub(super) fn known(self) -> Option<i32> {
        match self {
            Self::Built(year) => Some(year),
            Self::NotEntered | Self::Wrong => None,
        }
    }
}

pub(super) fn site(reader: &mut Reader<'_>, year: Year) -> Option<Site> {
    let saved = &reader.book.site;
    let rated = rating(reader);
    let chosen = match saved.condition {
        Condition::NotKnown => None,
        Condition::Good => Some(ConditionRating::Good),
        Condition::Fair => Some(ConditionRating::Fair),
        Condition::Poor => Some(ConditionRating::Poor),
    };
    if let (Some(Some(rated)), Some(chosen)) = (rated, chosen)
        && rated != chosen
    {
        reader.warning(
            "site.condition",
            "the condition does not agree with the condition rating; the condition is used",
            "6 and above is good, 5 is fair, 4 and below is poor",
        );
    }
    let crossing = [saved.road.trim(), saved.feature.trim()];
    let crossing: Vec<&str> = crossing.into_iter().filter(|text| !text.is_empty()).collect();
    let mut place = crossing.join(" over ");
    if !saved.county.trim().is_empty() {
        place = if place.is_empty() {
            saved.county.trim().to_string()
        } else {
            format!("{place}, {}", saved.county.trim())
        };
    }
    Some(Site {
        name: saved.name.trim().to_string(),
        place,
        year_built: year.known(),
        condition: chosen.or(rated?),
        rater: saved.rater.trim().to_string(),
        checker: saved.checker.trim().to_string(),
        posting_before: saved.posting_before.trim().to_string(),
        rating_before: saved.rating_before.trim().to_string(),
    })
}

pub(super) fn year(reader: &mut Reader<'_>) -> Year {
    let text = reader.book.site.year_built.trim();
    if text.is_empty() {
        return Year::NotEntered;
    }
    match text.parse::<i32>() {
        Ok(year) if limits::YEARS.contains(&year) => Year::Built(year),
        _ => {
            reader.error(
                "site.year_built",
                format!("\"{text}\" is not a year from {} to {}", limits::YEARS.start(), limits::YEARS.end()),
                "write the year in four figures, such as 1958",
            );
            Year::Wrong
        }
    }
}

/// Condition by the rating of the last inspection (0 to 9, National Bridge Inventory item 59).
fn rating(reader: &mut Reader<'_>) -> Option<Option<ConditionRating>> {
    let text = reader.book.site.condition_rating.trim();
    match text.parse::<u8>() {
        _ if text.is_empty() => Some(None),
        Ok(6..=9) => Some(Some(ConditionRating::Good)),
        Ok(5) => Some(Some(ConditionRating::Fair)),
        Ok(0..=4) => Some(Some(ConditionRating::Poor)),
        _ => {
            reader.error(
                "site.condition_rating",
                format!("\"{text}\" is not a condition rating"),
                "write a whole number from 0 to 9, or leave it empty",
            );
            None
        }
    }
}
