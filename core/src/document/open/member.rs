//! Kinds of girder: the section as measured or as a table has it, the steel, the bracing.

use super::reader::{Reader, Wrong};
use super::site::Year;
use crate::bridge::{Bracing, Composite, Embedded, Member, MemberKind, SteelGirder};
use crate::document::book::{self, Connectors, Presence};
use crate::document::entry::Entry;
use crate::material::{Defaults, Steel};
use crate::quantity::Length;
use crate::section::plate::{Flange, IShape, Published};
use crate::section::rolled::{self, Rolled};
use crate::units::Entered;

/// Members by id, in the order of the book; none in the place of one that is wrong or incomplete.
pub(super) type Members = Vec<(String, Option<Member>)>;

/// Members that a girder refers to; all of them while there are no girders.
pub(super) fn members(reader: &mut Reader<'_>, year: Year, defaults: &dyn Defaults) -> Members {
    let book = reader.book;
    if book.members.is_empty() {
        reader.problems.push(crate::problem::Problem::missing(
            "members",
            "no kind of girder is entered yet",
            "add one and enter its section",
        ));
    }
    let mut members = Members::new();
    for saved in &book.members {
        let id = &saved.id.0;
        if book.girders.is_empty() || book.girders.iter().any(|girder| girder.member.0 == *id) {
            members.push((id.clone(), member(reader, saved, year, defaults)));
        } else {
            reader.note(
                &format!("members.{id}.name"),
                "no girder is of this kind, so it is not looked at",
                "choose it for a girder, or take it out",
            );
        }
    }
    members
}

fn member(
    reader: &mut Reader<'_>,
    saved: &book::Member,
    year: Year,
    defaults: &dyn Defaults,
) -> Option<Member> {
    let path = |field: &str| format!("members.{}.{field}", saved.id.0);
    let section = section(reader, saved);
    let yield_strength =
        reader.strength(&path("yield_strength"), "the yield strength of the steel", year, |year| {
            defaults.yield_strength(year)
        });
    let spacing = reader.maybe(&path("brace_spacing"));
    if let Ok(None) = spacing {
        reader.note(
            &path("brace_spacing"),
            "the distance between diaphragms is not entered: none counts as a brace",
            "measure the greatest distance between diaphragms that work",
        );
    }
    let bearing_length = reader.maybe(&path("bearing_length"));
    if let Ok(None) = bearing_length {
        reader.note(
            &path("bearing_length"),
            "the length of bearing is not entered: the web over the bearings is not rated",
            "measure it along the girder",
        );
    }
    let (Ok(spacing), Ok(bearing_length)) = (spacing, bearing_length) else { return None };
    Some(Member {
        id: saved.id.0.clone(),
        name: saved.name.trim().to_string(),
        kind: MemberKind::Steel(SteelGirder {
            section: section?,
            steel: Steel { yield_strength: yield_strength? },
            composite: match saved.connectors {
                Connectors::Proved => Composite::Proved,
                Connectors::None => Composite::None,
                Connectors::NotKnown => Composite::NotKnown,
            },
            bracing: Bracing {
                spacing,
                embedded: match saved.embedded {
                    Presence::Yes => Embedded::Yes,
                    Presence::No => Embedded::No,
                    Presence::NotInspected => Embedded::NotInspected,
                },
            },
            bearing_length,
            bearing_stiffeners: saved.bearing_stiffeners == Presence::Yes,
        }),
    })
}

/// The three plates: what was measured, else what the table says of the rolled shape.
fn section(reader: &mut Reader<'_>, saved: &book::Member) -> Option<IShape> {
    let path = |field: &str| format!("members.{}.{field}", saved.id.0);
    let plates = [
        &saved.depth,
        &saved.top_width,
        &saved.top_thickness,
        &saved.bottom_width,
        &saved.bottom_thickness,
        &saved.web,
    ];
    let measured = plates.iter().any(|entry| !entry.is_blank());
    let shape = match shape(reader, saved) {
        Err(Wrong) => return None,
        Ok(shape) => shape,
    };
    if shape.is_none() && !measured {
        reader.problems.push(crate::problem::Problem::missing(
            path("shape"),
            format!("the section of {} is not entered yet", named(saved)),
            "write the name of a rolled shape, such as W36x182, or measure the plates",
        ));
        return None;
    }
    let mut size = |field: &str, table: fn(&Rolled) -> Length| -> Option<Entered<Length>> {
        let path = path(field);
        match reader.maybe(&path) {
            Err(Wrong) => None,
            Ok(Some(entered)) => Some(entered),
            Ok(None) => match shape {
                Some(shape) => Some(tabulated(reader, &path, table(shape), shape, &saved.shape)),
                None => {
                    reader.missing(&path, "measure it, or write the name of the rolled shape");
                    None
                }
            },
        }
    };
    let depth = size("depth", |shape| shape.depth);
    let top_width = size("top_width", |shape| shape.width);
    let top_thickness = size("top_thickness", |shape| shape.flange);
    let bottom_width = size("bottom_width", |shape| shape.width);
    let bottom_thickness = size("bottom_thickness", |shape| shape.flange);
    let web = size("web", |shape| shape.web);
    let fillet = match reader.maybe(&path("fillet")) {
        Err(Wrong) => None,
        Ok(Some(entered)) => Some(entered),
        Ok(None) => match (shape, &bottom_thickness) {
            (Some(shape), _) => Some(tabulated(reader, &path("fillet"), shape.fillet, shape, &saved.shape)),
            (_, Some(flange)) => Some(reader.assume(
                &path("fillet"),
                flange.value,
                "thickness of the flange, without fillet or weld",
            )),
            _ => None,
        },
    };
    let shape_as_published = shape.filter(|_| !measured);
    let section = IShape {
        depth: depth?,
        top: Flange { width: top_width?, thickness: top_thickness? },
        bottom: Flange { width: bottom_width?, thickness: bottom_thickness? },
        web: web?,
        fillet: fillet?,
        published: shape_as_published.map(published),
    };
    fits(reader, saved, &section).then_some(section)
}

/// The rolled shape by its name.
fn shape(reader: &mut Reader<'_>, saved: &book::Member) -> Result<Option<&'static Rolled>, Wrong> {
    let name = saved.shape.text();
    if saved.shape.is_blank() {
        return Ok(None);
    }
    match rolled::find(name.trim()) {
        Some(shape) => Ok(Some(shape)),
        None => {
            reader.error(
                &format!("members.{}.shape", saved.id.0),
                format!("\"{}\" is not in the table of rolled shapes", name.trim()),
                "write it as W36x182, or leave it empty and measure the plates",
            );
            Err(Wrong)
        }
    }
}

/// A size out of the table, with the origin of the shape's name.
fn tabulated(
    reader: &mut Reader<'_>,
    path: &str,
    value: Length,
    shape: &'static Rolled,
    name: &Entry,
) -> Entered<Length> {
    reader.fill(path, value, shape.table, name.from.into())
}

fn published(shape: &'static Rolled) -> Published {
    Published {
        name: shape.name,
        source: shape.table,
        area: shape.area,
        inertia: shape.inertia,
        elastic: shape.elastic,
        plastic: shape.plastic,
    }
}

/// Whether the plates fit together.
fn fits(reader: &mut Reader<'_>, saved: &book::Member, section: &IShape) -> bool {
    let path = |field: &str| format!("members.{}.{field}", saved.id.0);
    let flanges = section.top.thickness.value + section.bottom.thickness.value;
    let mut fits = true;
    let mut misfit = |field: &str, message: &str, mend: &str| {
        reader.error(&path(field), message, mend);
        fits = false;
    };
    if section.depth.value <= flanges {
        misfit(
            "depth",
            "the girder is no deeper than its two flanges are thick",
            "check the depth and the thickness of the flanges",
        );
    }
    for (flange, field) in [(&section.top, "top_width"), (&section.bottom, "bottom_width")] {
        if flange.width.value <= section.web.value {
            misfit(field, "the flange is no wider than the web is thick", "check the flange and the web");
        }
    }
    let thickest = section.top.thickness.value.max(section.bottom.thickness.value);
    if section.fillet.value < thickest {
        misfit(
            "fillet",
            "the toe of the fillet lies inside the flange",
            "measure it from the outer face of the flange",
        );
    } else if section.fillet.value * 2.0 >= section.depth.value {
        misfit("fillet", "the two fillets meet", "measure it from the outer face of the flange");
    }
    fits
}

fn named(saved: &book::Member) -> String {
    match saved.name.trim() {
        "" => "the girder".to_string(),
        name => name.to_string(),
    }
}
