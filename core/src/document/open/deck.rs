//! The deck, what lies on it and what stands along it.

use super::member::Members;
use super::reader::{Reader, Wrong};
use super::site::Year;
use crate::bridge::{Deck, Layer, Stage, Strip, StripSide};
use crate::document::book::{Placed, Side, Substance};
use crate::material::{Concrete, Defaults, weight};
use crate::quantity::Length;
use crate::units::{Entered, Provenance};

pub(super) fn deck(
    reader: &mut Reader<'_>,
    members: &Members,
    year: Year,
    defaults: &dyn Defaults,
) -> Option<Deck> {
    let width = reader.needed("deck.width", "measure the deck from edge to edge");
    let roadway = reader.needed("deck.roadway", "measure between the curbs or rails");
    let left_curb = left_curb(reader, width.as_ref(), roadway.as_ref());
    let slab = reader.needed("deck.slab", "drill, core, or take it from the drawing");
    let strength = reader.strength("deck.concrete_strength", "the strength of the concrete", year, |year| {
        defaults.concrete_strength(year)
    });
    let unit_weight =
        reader.or_assumed("deck.concrete_weight", || Some(weight::REINFORCED_CONCRETE), "enter it");
    let haunch = reader.needed("deck.haunch", "enter 0 if the slab rests on the flange");
    let haunch_width = haunch_width(reader, members);
    let layers = layers(reader);
    let strips = strips(reader);
    Some(Deck {
        width: width?,
        roadway: roadway?,
        left_curb: left_curb?,
        slab: slab?,
        concrete: Concrete { strength: strength?, unit_weight: unit_weight? },
        haunch: haunch?,
        haunch_width: haunch_width?,
        layers: layers?,
        strips: strips?,
    })
}

/// Offset of the left curb, in the middle of the deck unless entered.
fn left_curb(
    reader: &mut Reader<'_>,
    width: Option<&Entered<Length>>,
    roadway: Option<&Entered<Length>>,
) -> Option<Length> {
    let entered = reader.maybe::<Length>("deck.left_curb");
    let (width, roadway) = (width?.value, roadway?.value);
    if roadway > width {
        let over = reader.told("deck.roadway", roadway - width);
        reader.error(
            "deck.roadway",
            format!("the roadway is {over} wider than the deck"),
            "check the roadway between the curbs and the width of the deck",
        );
        return None;
    }
    match entered {
        Err(Wrong) => None,
        Ok(None) => Some(
            reader
                .assume("deck.left_curb", (width - roadway) / 2.0, "roadway in the middle of the deck")
                .value,
        ),
        Ok(Some(curb)) if curb.value + roadway > width => {
            let over = reader.told("deck.left_curb", curb.value + roadway - width);
            reader.error(
                "deck.left_curb",
                format!("the roadway ends {over} beyond the right edge of the deck"),
                "check the left curb, the roadway and the width of the deck",
            );
            None
        }
        Ok(Some(curb)) => Some(curb.value),
    }
}

/// As wide as the widest top flange unless entered.
fn haunch_width(reader: &mut Reader<'_>, members: &Members) -> Option<Entered<Length>> {
    match reader.maybe("deck.haunch_width") {
        Err(Wrong) => None,
        Ok(Some(width)) => Some(width),
        Ok(None) => {
            // Without a section there is no default, and the section is told as missing.
            let widest = members
                .iter()
                .filter_map(|(_, member)| member.as_ref())
                .map(|member| {
                    let crate::bridge::MemberKind::Steel(girder) = &member.kind;
                    girder.section.top.width.value
                })
                .reduce(Length::max)?;
            Some(reader.assume("deck.haunch_width", widest, "as wide as the top flange"))
        }
    }
}

fn layers(reader: &mut Reader<'_>) -> Option<Vec<Layer>> {
    if reader.book.layers.is_empty() {
        reader.warning(
            "layers",
            "no layer is entered: the deck counts as bare",
            "add what lies on the deck, if anything does",
        );
    }
    let all: Vec<Option<Layer>> = reader
        .book
        .layers
        .iter()
        .map(|layer| {
            let path = |field: &str| format!("layers.{}.{field}", layer.id.0);
            let thickness = reader.needed(&path("thickness"), "core or probe it, or take the layer out");
            let unit_weight = reader.or_assumed(
                &path("unit_weight"),
                || match layer.substance {
                    Substance::Asphalt => Some(weight::ASPHALT),
                    Substance::Concrete => Some(weight::REINFORCED_CONCRETE),
                    Substance::Gravel => Some(weight::GRAVEL),
                    Substance::Other => None,
                },
                "enter it, or say what the layer is made of",
            );
            let named = match layer.name.trim() {
                "" => layer.substance.text().to_string(),
                name => name.to_string(),
            };
            Some(Layer {
                id: layer.id.0.clone(),
                name: named,
                thickness: thickness?,
                unit_weight: unit_weight?,
            })
        })
        .collect();
    let measured = |layer: &Layer| layer.thickness.provenance == Provenance::Measured;
    for layer in all.iter().flatten().filter(|layer| !measured(layer)) {
        reader.note(
            &layer.thickness.path,
            format!("{} was not measured on this bridge", layer.name),
            "a core or a probe counts as measured",
        );
    }
    all.into_iter().collect()
}

fn strips(reader: &mut Reader<'_>) -> Option<Vec<Strip>> {
    if reader.book.strips.is_empty() {
        reader.warning(
            "strips",
            "no parapet, rail or curb is entered: nothing stands along the deck",
            "add what stands along the deck, if anything does",
        );
    }
    let all: Vec<Option<Strip>> = reader
        .book
        .strips
        .iter()
        .map(|strip| {
            let path = format!("strips.{}.weight", strip.id.0);
            let weight = reader.needed(&path, "enter the weight of one, or take it out");
            Some(Strip {
                id: strip.id.0.clone(),
                name: strip.name.trim().to_string(),
                weight: weight?,
                side: match strip.side {
                    Side::Both => StripSide::Both,
                    Side::Left => StripSide::Left,
                    Side::Right => StripSide::Right,
                },
                stage: match strip.placed {
                    Placed::Later => Stage::Later,
                    Placed::Bare => Stage::Bare,
                    Placed::Surface => Stage::Surface,
                },
            })
        })
        .collect();
    all.into_iter().collect()
}
