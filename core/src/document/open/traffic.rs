//! What uses the bridge: traffic, the user's own factors, vehicles of one's own state.

use super::reader::{Reader, Wrong};
use crate::bridge::{Overrides, OwnVehicle, Riding, Traffic};
use crate::document::book::{self, Surface};
use crate::problem::Problem;
use crate::quantity::{Force, Length};

pub(super) fn traffic(reader: &mut Reader<'_>) -> Option<Traffic> {
    let adtt = reader.maybe("traffic.adtt");
    if let Ok(None) = adtt {
        reader.note(
            "traffic.adtt",
            "the truck traffic is not known: the highest factor is taken",
            "enter trucks a day in one direction",
        );
    }
    let overrides = overrides(reader);
    Some(Traffic {
        adtt: adtt.ok()?,
        riding: match reader.book.traffic.riding {
            Surface::Smooth => Riding::Smooth,
            Surface::Minor => Riding::Minor,
            Surface::Rough => Riding::Rough,
            Surface::NotInspected => Riding::NotInspected,
        },
        overrides: Overrides { factors: overrides? },
    })
}

fn overrides(reader: &mut Reader<'_>) -> Option<Vec<(String, crate::units::Entered<f64>, String)>> {
    let book = reader.book;
    let mut all = Some(Vec::new());
    for (i, saved) in book.overrides.iter().enumerate() {
        let path = |field: &str| format!("overrides.{}.{field}", saved.id.0);
        let (factor, reason) = (saved.factor.trim(), saved.reason.trim());
        if factor.is_empty() {
            reader.missing(&path("factor"), "choose the factor, or take the line out");
        } else if book.overrides[..i].iter().any(|other| other.factor.trim() == factor) {
            reader.error(&path("factor"), "this factor is set twice", "take one of the two out");
        }
        let value = reader.needed(&path("value"), "enter the value to use");
        if reason.is_empty() {
            reader.missing(&path("reason"), "say why; it is printed beside the factor");
        }
        match (value, &mut all) {
            (Some(value), Some(all)) => all.push((factor.to_string(), value, reason.to_string())),
            _ => all = None,
        }
    }
    all
}

pub(super) fn vehicles(reader: &mut Reader<'_>) -> Option<Vec<OwnVehicle>> {
    let book = reader.book;
    let all: Vec<Option<OwnVehicle>> = book.vehicles.iter().map(|saved| vehicle(reader, saved)).collect();
    all.into_iter().collect()
}

fn vehicle(reader: &mut Reader<'_>, saved: &book::Vehicle) -> Option<OwnVehicle> {
    let path = |field: &str| format!("vehicles.{}.{field}", saved.id.0);
    if saved.name.trim().is_empty() {
        reader.missing(&path("name"), "write what the vehicle is called");
    }
    let axles = reader.needed::<Force>(&path("axles"), "write the weight of each axle, from the front");
    let spacings = reader.maybe::<Length>(&path("spacings"));
    let axles = axles?.readings;
    let spacings = match spacings {
        Err(Wrong) => return None,
        Ok(spacings) => spacings.map(|entered| entered.readings).unwrap_or_default(),
    };
    if spacings.is_empty() && axles.len() > 1 {
        reader.missing(&path("spacings"), "write the distance from each axle to the next");
        return None;
    }
    if spacings.len() + 1 != axles.len() {
        let (has, needs) = (spacings.len(), axles.len() - 1);
        reader.problems.push(Problem::error(
            path("spacings"),
            format!("{} axles have {needs} distances between them, not {has}", axles.len()),
            "write one distance for each axle but the last",
        ));
        return None;
    }
    Some(OwnVehicle { id: saved.id.0.clone(), name: saved.name.trim().to_string(), axles, spacings })
}
