//! Edits by path, each with what takes it back.
//!
//! A path is the keys and ids from the top of the book to a field: `girders.g3.spacing`. It stays
//! the same when other items come and go.

use super::book::{Book, UnitSystem};
use super::entry::{Entry, Origin};
use super::fields::{self, Form, Group};
use super::part::{Leaf, Part, Value};
use super::read::{MOST_CHARACTERS, MOST_ITEMS, too_much};
use super::readings;
use super::structure::Items;
use crate::problem::Problem;

/// What takes a change of a book back: give it to [`Book::apply`].
#[derive(Clone, Debug, PartialEq)]
pub struct Edit(pub(super) Vec<Step>);

/// One step of an edit.
#[derive(Clone, Debug, PartialEq)]
pub(super) enum Step {
    /// What a leaf shall hold.
    Leaf(String, Value),
    /// What a list shall hold.
    List(Items),
}

/// A field as the page shows it.
#[derive(Clone, Debug, PartialEq, Eq)]
pub struct FieldView {
    /// What is written in it.
    pub text: String,
    /// Where it comes from; none for words and choices.
    pub from: Option<Origin>,
    /// What can be picked: names in the saved form, or ids. Empty where words or readings are written.
    pub options: Vec<String>,
}

impl Book {
    /// A field as it stands; none where the path leads to no field.
    #[must_use]
    pub fn text(&self, path: &str) -> Option<FieldView> {
        if path == COUNT {
            return Some(FieldView { text: self.girders.len().to_string(), from: None, options: Vec::new() });
        }
        let view = |text: &str, options| FieldView { text: text.to_string(), from: None, options };
        Some(match self.leaf(path)? {
            Leaf::Entry(entry) => {
                FieldView { text: entry.text(), from: Some(entry.from), options: Vec::new() }
            }
            Leaf::Words(text) => view(text, Vec::new()),
            Leaf::Choice(text, all) => view(text, all.iter().map(|t| (*t).to_string()).collect()),
            Leaf::Reference(text) => view(text, self.targets(path)),
        })
    }

    /// Writes a field or picks a choice. Readings are kept as they are typed, understood or not;
    /// changing the unit system writes the old unit behind every bare figure, so that no size
    /// changes its meaning.
    ///
    /// # Errors
    /// When there is no such field or no such choice, or the text is longer than a field; the book
    /// is as it was.
    pub fn set(&mut self, path: &str, text: &str) -> Result<Edit, Problem> {
        if path == COUNT {
            return self.act(&format!("{COUNT}:{text}"));
        }
        if text.chars().nth(MOST_CHARACTERS).is_some() {
            return Err(too_much(path));
        }
        let value = match self.leaf(path).ok_or_else(|| no_field(path))? {
            Leaf::Entry(entry) => {
                let read = match fields::form(path) {
                    Some(Form::Shape) if text.trim().is_empty() => Vec::new(),
                    Some(Form::Shape) => vec![text.trim().to_string()],
                    Some(Form::Quantity(measure)) => readings::split(text, Some(measure), self.system),
                    _ => readings::split(text, None, self.system),
                };
                if read.len() > MOST_ITEMS {
                    return Err(too_much(path));
                }
                Value::Entry(Entry { read, from: entry.from })
            }
            Leaf::Words(_) => Value::Words(text.to_string()),
            Leaf::Choice(_, all) => match all.contains(&text) {
                true => Value::Choice(text.to_string()),
                false => return Err(no_choice(path, text, &all.join(", "))),
            },
            Leaf::Reference(_) => {
                let all = self.targets(path);
                match all.iter().any(|id| id == text) {
                    true => Value::Words(text.to_string()),
                    false => return Err(no_choice(path, text, &all.join(", "))),
                }
            }
        };
        let becomes = UnitSystem::ALL.iter().copied().find(|system| system.text() == text);
        let mut steps = match becomes {
            Some(becomes) if path == "system" && becomes != self.system => self.units_written_out(becomes),
            _ => Vec::new(),
        };
        steps.push(Step::Leaf(path.to_string(), value));
        self.apply(Edit(steps))
    }

    /// Says where a field comes from.
    ///
    /// # Errors
    /// When there is no such field, or it is one of words or choices, or `from` is none of
    /// `measured`, `drawing`, `assumed`.
    pub fn provenance(&mut self, path: &str, from: &str) -> Result<Edit, Problem> {
        let Some(Leaf::Entry(entry)) = self.leaf(path) else { return Err(no_field(path)) };
        let Some(from) = Origin::ALL.iter().copied().find(|origin| origin.text() == from) else {
            return Err(no_choice(path, from, "measured, drawing, assumed"));
        };
        let entry = Entry { read: entry.read.clone(), from };
        self.apply(Edit(vec![Step::Leaf(path.to_string(), Value::Entry(entry))]))
    }

    /// Makes a change that was made before, or takes one back.
    ///
    /// # Errors
    /// When the book no longer has the field that the edit is about; the book is as it was.
    pub fn apply(&mut self, edit: Edit) -> Result<Edit, Problem> {
        let mut back = Vec::with_capacity(edit.0.len());
        let mut refused = None;
        for step in edit.0 {
            match self.step(step) {
                Ok(undo) => back.push(undo),
                Err(problem) => {
                    refused = Some(problem);
                    break;
                }
            }
        }
        back.reverse();
        match refused {
            None => Ok(Edit(back)),
            Some(problem) => {
                for step in back {
                    self.step(step)?;
                }
                Err(problem)
            }
        }
    }

    fn step(&mut self, step: Step) -> Result<Step, Problem> {
        match step {
            Step::List(items) => Ok(Step::List(items.swap(self))),
            Step::Leaf(path, value) => {
                let before = part_mut(self, &path).and_then(|part| part.put(value));
                match before {
                    Some(before) => Ok(Step::Leaf(path, before)),
                    None => Err(no_field(&path)),
                }
            }
        }
    }

    pub(super) fn leaf(&self, path: &str) -> Option<Leaf<'_>> {
        let mut part: &dyn Part = self;
        for key in path.split('.') {
            part = part.part(key)?;
        }
        part.leaf()
    }

    /// Visits every entry with its path, in the order of the saved form.
    pub fn entries(&self, see: &mut dyn FnMut(&str, &Entry)) {
        self.visit("", &mut |path, leaf| {
            if let Leaf::Entry(entry) = leaf {
                see(path, entry);
            }
        });
    }

    /// The readings at a path.
    pub(super) fn entry(&self, path: &str) -> Option<&Entry> {
        match self.leaf(path)? {
            Leaf::Entry(entry) => Some(entry),
            _ => None,
        }
    }

    /// Ids that the reference at a path can have.
    fn targets(&self, path: &str) -> Vec<String> {
        match fields::form(path) {
            Some(Form::Reference(Group::Members)) => self.members.iter().map(|m| m.id.0.clone()).collect(),
            Some(Form::Reference(Group::Girders)) => self.girders.iter().map(|g| g.id.0.clone()).collect(),
            _ => Vec::new(),
        }
    }

    /// Steps that write the unit behind every bare figure, before the system becomes another.
    fn units_written_out(&self, becomes: UnitSystem) -> Vec<Step> {
        let mut steps = Vec::new();
        self.visit("", &mut |path, leaf| {
            if let (Leaf::Entry(entry), Some(Form::Quantity(measure))) = (leaf, fields::form(path)) {
                let written = readings::written_out(&entry.read, measure, self.system, becomes);
                if written != entry.read {
                    let entry = Entry { read: written, from: entry.from };
                    steps.push(Step::Leaf(path.to_string(), Value::Entry(entry)));
                }
            }
        });
        steps
    }
}

/// Path of the number of girders, which is no field of the saved form.
pub(super) const COUNT: &str = "girders.count";

fn part_mut<'a>(book: &'a mut Book, path: &str) -> Option<&'a mut dyn Part> {
    let mut part: &mut dyn Part = book;
    for key in path.split('.') {
        part = part.part_mut(key)?;
    }
    Some(part)
}

fn no_field(path: &str) -> Problem {
    Problem::error(path, "there is no such field in this book", "open the page again")
}

fn no_choice(path: &str, text: &str, all: &str) -> Problem {
    Problem::error(path, format!("\"{text}\" is not one of the choices"), format!("choose one of: {all}"))
}
