//! The span and the girder lines across the deck.

use super::member::Members;
use super::reader::{Reader, Wrong};
use crate::bridge::{Deck, GirderLine, MemberKind, Span, WebEnds};
use crate::document::book::{Girder, Looked};
use crate::problem::Problem;
use crate::quantity::Length;
use crate::units::Entered;

pub(super) fn span(reader: &mut Reader<'_>) -> Option<Span> {
    match reader.book.spans.as_slice() {
        [] => {
            reader.problems.push(Problem::missing("spans", "no span is entered yet", "begin a new book"));
            None
        }
        [span] => {
            let path = format!("spans.{}.length", span.id.0);
            let length = reader.needed(&path, "measure between the centres of the bearings")?;
            Some(Span { length })
        }
        [_, second, ..] => {
            reader.error(
                &format!("spans.{}.length", second.id.0),
                "a bridge of more than one span is not rated",
                "keep one span in the book",
            );
            None
        }
    }
}

pub(super) fn lines(
    reader: &mut Reader<'_>,
    members: &Members,
    deck: Option<&Deck>,
) -> Option<Vec<GirderLine>> {
    let book = reader.book;
    if book.girders.len() < 2 {
        reader.problems.push(Problem::missing(
            "girders",
            "the girders are not entered yet",
            "say how many there are; two at least",
        ));
        return None;
    }
    let overhang = reader.maybe::<Length>("overhang");
    let mut spacings: Vec<Option<Entered<Length>>> = Vec::new();
    let mut complete = true;
    for (i, girder) in book.girders.iter().enumerate() {
        let path = format!("girders.{}.spacing", girder.id.0);
        if i == 0 {
            if !girder.spacing.is_blank() {
                reader.warning(
                    &path,
                    "the first girder has none at its left, so its spacing is not used",
                    "clear it",
                );
            }
            spacings.push(None);
            continue;
        }
        let spacing = reader.needed(&path, "measure to the girder at its left, centre to centre");
        complete &= spacing.is_some();
        spacings.push(spacing);
    }
    let indices: Vec<Option<usize>> =
        book.girders.iter().map(|girder| member_of(reader, members, girder)).collect();
    let across: Length = spacings.iter().flatten().map(|spacing| spacing.value).sum();
    let first = match overhang {
        Err(Wrong) => None,
        Ok(Some(entered)) => Some(entered.value),
        Ok(None) => deck.filter(|deck| complete && deck.width.value >= across).map(|deck| {
            let half = (deck.width.value - across) / 2.0;
            reader.assume("overhang", half, "girders in the middle of the deck").value
        }),
    };
    if !complete {
        return None;
    }
    let last = first.unwrap_or(Length::ZERO) + across;
    if let Some(deck) = deck
        && last > deck.width.value
        && let Some(girder) = book.girders.last()
    {
        let path = format!("girders.{}.spacing", girder.id.0);
        let over = reader.told(&path, last - deck.width.value);
        reader.error(
            &path,
            format!("{} stands {over} outside the deck", named(girder, book.girders.len() - 1)),
            "check the spacings, the overhang at the left and the width of the deck",
        );
    }
    apart(reader, members, &spacings);
    let mut y = first?;
    let mut lines = Vec::with_capacity(spacings.len());
    for (i, ((girder, spacing), member)) in book.girders.iter().zip(spacings).zip(indices).enumerate() {
        y += spacing.as_ref().map_or(Length::ZERO, |spacing| spacing.value);
        lines.push(GirderLine {
            id: girder.id.0.clone(),
            name: named(girder, i),
            y,
            spacing,
            member: member?,
            ends: [girder.end_near, girder.end_far].map(|end| match end {
                Looked::Inspected => WebEnds::Inspected,
                Looked::NotInspected => WebEnds::NotInspected,
            }),
        });
    }
    Some(lines)
}

fn member_of(reader: &mut Reader<'_>, members: &Members, girder: &Girder) -> Option<usize> {
    let index = members.iter().position(|(id, _)| *id == girder.member.0);
    if index.is_none() {
        reader.error(
            &format!("girders.{}.member", girder.id.0),
            "the girder is of a kind that is not in the book",
            "choose its kind",
        );
    }
    index
}

/// Neighbours whose flanges would run through each other were measured wrongly.
fn apart(reader: &mut Reader<'_>, members: &Members, spacings: &[Option<Entered<Length>>]) {
    let book = reader.book;
    let half = |girder: &Girder| -> Option<Length> {
        let (_, member) = members.iter().find(|(id, _)| *id == girder.member.0)?;
        let MemberKind::Steel(steel) = &member.as_ref()?.kind;
        Some(steel.section.top.width.value.max(steel.section.bottom.width.value) / 2.0)
    };
    for (pair, spacing) in book.girders.windows(2).zip(spacings.iter().skip(1)) {
        if let (Some(left), Some(right), Some(spacing)) = (half(&pair[0]), half(&pair[1]), spacing)
            && spacing.value < left + right
        {
            reader.error(
                &spacing.path,
                "the girders would stand inside each other",
                "measure from the centre of one girder to the centre of the next",
            );
        }
    }
}

/// What a girder is called; by its place where it has no name.
fn named(girder: &Girder, index: usize) -> String {
    match girder.name.trim() {
        "" => format!("G{}", index + 1),
        name => name.to_string(),
    }
}
