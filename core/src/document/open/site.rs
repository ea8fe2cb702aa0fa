//! Where the bridge is and what is known of it.

use super::reader::Reader;
use crate::bridge::{ConditionRating, Site};
use crate::document::book::Condition;
use crate::limits;

pub(super) fn site(reader: &mut Reader<'_>) -> Option<Site> {
    let saved = &reader.book.site;
    let year_built = year(reader);
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
        year_built: year_built?,
        condition: chosen.or(rated?),
        rater: saved.rater.trim().to_string(),
        checker: saved.checker.trim().to_string(),
        posting_before: saved.posting_before.trim().to_string(),
        rating_before: saved.rating_before.trim().to_string(),
    })
}

/// The year, `Some(None)` where none was entered, `None` where it is wrong.
fn year(reader: &mut Reader<'_>) -> Option<Option<i32>> {
    let text = reader.book.site.year_built.trim();
    if text.is_empty() {
        return Some(None);
    }
    match text.parse::<i32>() {
        Ok(year) if limits::YEARS.contains(&year) => Some(Some(year)),
        _ => {
            reader.error(
                "site.year_built",
                format!("\"{text}\" is not a year from {} to {}", limits::YEARS.start(), limits::YEARS.end()),
                "write the year in four figures, such as 1958",
            );
            None
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
