//! What was found on girders, held against the girder as it was built.

use super::member::Members;
use super::reader::{Reader, Wrong};
use crate::bridge::{Finding, MemberKind, Span, Straightness};
use crate::document::book::{self, Straight};
use crate::quantity::Length;
use crate::section::plate::IShape;
use crate::units::Entered;

pub(super) fn findings(
    reader: &mut Reader<'_>,
    members: &Members,
    span: Option<&Span>,
) -> Option<Vec<Finding>> {
    let book = reader.book;
    let all: Vec<Option<Finding>> =
        book.findings.iter().map(|saved| finding(reader, saved, members, span)).collect();
    all.into_iter().collect()
}

fn finding(
    reader: &mut Reader<'_>,
    saved: &book::Finding,
    members: &Members,
    span: Option<&Span>,
) -> Option<Finding> {
    let path = |field: &str| format!("findings.{}.{field}", saved.id.0);
    let line = reader.book.girders.iter().position(|girder| girder.id.0 == saved.girder.0);
    if line.is_none() {
        reader.error(
            &path("girder"),
            "the finding is on a girder that is not in the book",
            "choose the girder",
        );
    }
    let from = reader.needed(&path("from"), "measure from the near bearing; 0 at the bearing");
    let to = reader.needed(&path("to"), "measure from the near bearing to where the loss ends");
    let range = range(reader, saved, from.as_ref(), to.as_ref(), span);
    let sound = line.and_then(|line| section(reader, members, line));
    let mut left = |field: &str, sound: Option<&Entered<Length>>| left(reader, &path(field), sound);
    let top = left("top", sound.map(|s| &s.top.thickness));
    let bottom = left("bottom", sound.map(|s| &s.bottom.thickness));
    let web = left("web", sound.map(|s| &s.web));
    let web_low = left("web_low", sound.map(|s| &s.web));
    let (Ok(top), Ok(bottom), Ok(web), Ok(web_low)) = (top, bottom, web, web_low) else { return None };
    if top.is_none() && bottom.is_none() && web.is_none() && web_low.is_none() {
        let web = path("web");
        reader.problems.push(crate::problem::Problem::missing(
            web,
            "the finding does not say what is left",
            "enter a thickness left of a flange or of the web, or take the finding out",
        ));
    }
    range?;
    Some(Finding {
        id: saved.id.0.clone(),
        name: saved.name.trim().to_string(),
        line: line?,
        from: from?,
        to: to?,
        top,
        bottom,
        web,
        web_low,
        straight: match saved.straight {
            Straight::Straight => Straightness::Straight,
            Straight::Not => Straightness::Not,
            Straight::NotInspected => Straightness::NotInspected,
        },
    })
}

/// Whether the range runs forward and ends on the girder; none where it does not.
fn range(
    reader: &mut Reader<'_>,
    saved: &book::Finding,
    from: Option<&Entered<Length>>,
    to: Option<&Entered<Length>>,
    span: Option<&Span>,
) -> Option<()> {
    let (from, to) = (from?, to?);
    if to.value <= from.value {
        reader.error(
            &to.path,
            "the finding ends before it begins",
            "measure both ends from the near bearing; the end lies further along",
        );
        return None;
    }
    let length = &span?.length;
    if to.value > length.value {
        let over = reader.told(&to.path, to.value - length.value);
        reader.error(
            &to.path,
            format!("the finding ends {over} beyond the far bearing"),
            format!(
                "check it against the span of {}",
                reader.told(&format!("findings.{}.to", saved.id.0), length.value)
            ),
        );
        return None;
    }
    Some(())
}

/// A thickness left, which is not more than was there.
fn left(
    reader: &mut Reader<'_>,
    path: &str,
    sound: Option<&Entered<Length>>,
) -> Result<Option<Entered<Length>>, Wrong> {
    let entered = reader.maybe::<Length>(path)?;
    if let (Some(left), Some(sound)) = (&entered, sound)
        && left.value > sound.value
    {
        let (is, was) = (reader.told(path, left.value), reader.told(path, sound.value));
        reader.error(
            path,
            format!("{is} left is more than the {was} of the sound girder"),
            "enter what is left, not what is gone; if the girder is thicker than its table, measure its plates",
        );
        return Err(Wrong);
    }
    Ok(entered)
}

fn section<'m>(reader: &Reader<'_>, members: &'m Members, line: usize) -> Option<&'m IShape> {
    let id = &reader.book.girders[line].member.0;
    let (_, member) = members.iter().find(|(member, _)| member == id)?;
    let MemberKind::Steel(girder) = &member.as_ref()?.kind;
    Some(&girder.section)
}
