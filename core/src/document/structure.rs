//! Items that come and go: girders, findings, layers, strips, members, overrides, vehicles.

use super::book::{
    Book, Finding, Girder, Layer, Member, Override, Placed, Side, Span, Strip, Substance, Vehicle,
};
use super::edit::{Edit, Step};
use super::entry::{Entry, Id, Reference};
use super::part::{Item, Part};
use super::read::{MOST_IDS, MOST_ITEMS};
use crate::problem::Problem;

/// Greatest number of girder lines that can be asked for at once.
const MOST_GIRDERS: usize = 40;

/// A list of the book with what it holds.
#[derive(Clone, Debug, PartialEq)]
pub(super) enum Items {
    Spans(Vec<Span>),
    Layers(Vec<Layer>),
    Strips(Vec<Strip>),
    Members(Vec<Member>),
    Girders(Vec<Girder>),
    Findings(Vec<Finding>),
    Overrides(Vec<Override>),
    Vehicles(Vec<Vehicle>),
}

impl Items {
    /// Puts the items into the book and gives back what was there.
    pub(super) fn swap(self, book: &mut Book) -> Self {
        use core::mem::replace;
        match self {
            Self::Spans(items) => Self::Spans(replace(&mut book.spans, items)),
            Self::Layers(items) => Self::Layers(replace(&mut book.layers, items)),
            Self::Strips(items) => Self::Strips(replace(&mut book.strips, items)),
            Self::Members(items) => Self::Members(replace(&mut book.members, items)),
            Self::Girders(items) => Self::Girders(replace(&mut book.girders, items)),
            Self::Findings(items) => Self::Findings(replace(&mut book.findings, items)),
            Self::Overrides(items) => Self::Overrides(replace(&mut book.overrides, items)),
            Self::Vehicles(items) => Self::Vehicles(replace(&mut book.vehicles, items)),
        }
    }
}

impl Book {
    /// Adds or takes out an item: `girders.add`, `findings.remove:f2`, `girders.count:5`,
    /// `girders.fill:spacing` (the first spacing that is entered goes into the empty ones).
    ///
    /// Items: `layers`, `strips`, `members`, `girders`, `findings`, `overrides`, `vehicles`;
    /// `findings.add:g2` adds a finding on girder `g2`.
    ///
    /// # Errors
    /// When there is no such action or item, or the item is in use; the book is as it was.
    pub fn act(&mut self, action: &str) -> Result<Edit, Problem> {
        let (name, argument) = action.split_once(':').unwrap_or((action, ""));
        let (group, verb) = name.split_once('.').unwrap_or((name, ""));
        match (group, verb) {
            (_, "add") => self.add(group, argument),
            (_, "remove") => self.remove(group, argument),
            ("girders", "count") => self.count_girders(argument),
            ("girders", "fill") if argument == "spacing" => self.fill_spacings(),
            _ => Err(no_action(action)),
        }
    }

    fn add(&mut self, group: &str, argument: &str) -> Result<Edit, Problem> {
        let full = |length: usize| match length < MOST_ITEMS {
            true => Ok(()),
            false => Err(Problem::error(group, "the list is full", "take out what is not needed")),
        };
        let items = match group {
            "layers" => {
                full(self.layers.len())?;
                let id = self.new_id("l")?;
                let asphalt = self.layers.iter().any(|l| l.substance == Substance::Asphalt);
                let substance = if asphalt { Substance::Other } else { Substance::Asphalt };
                let mut layers = self.layers.clone();
                let name = if asphalt { String::new() } else { "Asphalt".to_string() };
                layers.push(Layer { id, name, substance, ..Layer::default() });
                Items::Layers(layers)
            }
            "strips" => {
                full(self.strips.len())?;
                let id = self.new_id("p")?;
                let mut strips = self.strips.clone();
                strips.push(Strip { id, side: Side::Both, placed: Placed::Later, ..Strip::default() });
                Items::Strips(strips)
            }
            "members" => {
                full(self.members.len())?;
                let id = self.new_id("m")?;
                let mut members = self.members.clone();
                members.push(Member { id, name: "Girder".to_string(), ..Member::default() });
                Items::Members(members)
            }
            "girders" => {
                full(self.girders.len())?;
                let girder = self.next_girder(&self.girders.clone())?;
                let mut girders = self.girders.clone();
                girders.push(girder);
                Items::Girders(girders)
            }
            "findings" => {
                full(self.findings.len())?;
                let on = match argument {
                    "" => self.girders.first(),
                    id => self.girders.iter().find(|girder| girder.id.0 == id),
                };
                let Some(on) = on else {
                    return Err(Problem::error(
                        "findings",
                        "a finding is on a girder, and there is no such girder yet",
                        "enter the girders first",
                    ));
                };
                let girder = Reference(on.id.0.clone());
                let id = self.new_id("f")?;
                let mut findings = self.findings.clone();
                findings.push(Finding { id, girder, ..Finding::default() });
                Items::Findings(findings)
            }
            "overrides" => {
                full(self.overrides.len())?;
                let id = self.new_id("o")?;
                let mut overrides = self.overrides.clone();
                overrides.push(Override { id, ..Override::default() });
                Items::Overrides(overrides)
            }
            "vehicles" => {
                full(self.vehicles.len())?;
                let id = self.new_id("v")?;
                let mut vehicles = self.vehicles.clone();
                vehicles.push(Vehicle { id, ..Vehicle::default() });
                Items::Vehicles(vehicles)
            }
            _ => return Err(no_action(&format!("{group}.add"))),
        };
        self.apply(Edit(vec![Step::List(items)]))
    }

    fn remove(&mut self, group: &str, id: &str) -> Result<Edit, Problem> {
        let items = match group {
            "layers" => Items::Layers(without(&self.layers, group, id)?),
            "strips" => Items::Strips(without(&self.strips, group, id)?),
            "members" => {
                let members = without(&self.members, group, id)?;
                let users: Vec<&str> = self
                    .girders
                    .iter()
                    .filter(|girder| girder.member.0 == id)
                    .map(|girder| girder.name.as_str())
                    .collect();
                if !users.is_empty() {
                    return Err(Problem::error(
                        format!("members.{id}"),
                        format!("this kind of girder is in use at {}", users.join(", ")),
                        "give these girders another kind first",
                    ));
                }
                Items::Members(members)
            }
            "girders" => {
                let mut girders = without(&self.girders, group, id)?;
                self.free_of_findings(id)?;
                if let Some(next) = self.girders.iter().position(|girder| girder.id.0 == id)
                    && let Some(girder) = girders.get_mut(next)
                {
                    // Its spacing was taken to the girder that is no longer there.
                    girder.spacing = Entry::default();
                }
                Items::Girders(girders)
            }
            "findings" => Items::Findings(without(&self.findings, group, id)?),
            "overrides" => Items::Overrides(without(&self.overrides, group, id)?),
            "vehicles" => Items::Vehicles(without(&self.vehicles, group, id)?),
            _ => return Err(no_action(&format!("{group}.remove:{id}"))),
        };
        self.apply(Edit(vec![Step::List(items)]))
    }

    fn count_girders(&mut self, argument: &str) -> Result<Edit, Problem> {
        let count = argument.trim().parse::<usize>().ok().filter(|n| (2..=MOST_GIRDERS).contains(n));
        let Some(count) = count else {
            return Err(Problem::error(
                super::edit::COUNT,
                format!("\"{}\" is no number of girders", argument.trim()),
                format!("write a whole number from 2 to {MOST_GIRDERS}"),
            ));
        };
        for girder in self.girders.iter().skip(count) {
            self.free_of_findings(&girder.id.0)?;
        }
        let mut girders: Vec<Girder> = self.girders.iter().take(count).cloned().collect();
        while girders.len() < count {
            girders.push(self.next_girder(&girders)?);
        }
        self.apply(Edit(vec![Step::List(Items::Girders(girders))]))
    }

    /// A girder to the right of those given, like the last of them.
    fn next_girder(&mut self, girders: &[Girder]) -> Result<Girder, Problem> {
        let member = match (girders.last(), self.members.first()) {
            (Some(last), _) => last.member.clone(),
            (None, Some(first)) => Reference(first.id.0.clone()),
            (None, None) => {
                return Err(Problem::error("members", "there is no kind of girder yet", "add one first"));
            }
        };
        let spacing = match girders {
            [_, .., last] => last.spacing.clone(),
            _ => Entry::default(),
        };
        let number = (girders.len() + 1..)
            .find(|n| girders.iter().all(|girder| girder.name != format!("G{n}")))
            .unwrap_or(girders.len() + 1);
        let id = self.new_id("g")?;
        Ok(Girder { id, name: format!("G{number}"), spacing, member, ..Girder::default() })
    }

    fn fill_spacings(&mut self) -> Result<Edit, Problem> {
        let Some(spacing) =
            self.girders.iter().skip(1).map(|girder| &girder.spacing).find(|s| !s.is_blank()).cloned()
        else {
            return Err(Problem::error("girders", "no spacing is entered yet", "enter the first one"));
        };
        let mut girders = self.girders.clone();
        for girder in girders.iter_mut().skip(1).filter(|girder| girder.spacing.is_blank()) {
            girder.spacing = spacing.clone();
        }
        self.apply(Edit(vec![Step::List(Items::Girders(girders))]))
    }

    fn free_of_findings(&self, girder: &str) -> Result<(), Problem> {
        match self.findings.iter().find(|finding| finding.girder.0 == girder) {
            None => Ok(()),
            Some(finding) => Err(Problem::error(
                format!("findings.{}.girder", finding.id.0),
                "there is a finding on this girder",
                "take the finding out first, or give it to another girder",
            )),
        }
    }

    /// An id that no item has or had.
    fn new_id(&mut self, prefix: &str) -> Result<Id, Problem> {
        let mut next = self.next_id.max(1);
        self.lists("", &mut |_, ids| {
            for id in ids {
                let digits = id.trim_start_matches(|c: char| !c.is_ascii_digit());
                if let Some(number) = digits.parse::<u64>().ok().filter(|n| *n < MOST_IDS) {
                    next = next.max(number + 1);
                }
            }
        });
        if next >= MOST_IDS {
            return Err(Problem::error("next_id", "the counter of ids is used up", "begin a new book"));
        }
        self.next_id = next + 1;
        Ok(Id(format!("{prefix}{next}")))
    }
}

fn without<T: Item + Clone>(items: &[T], group: &str, id: &str) -> Result<Vec<T>, Problem> {
    let left: Vec<T> = items.iter().filter(|item| item.id() != id).cloned().collect();
    if left.len() < items.len() {
        Ok(left)
    } else {
        Err(Problem::error(format!("{group}.{id}"), "it is not in this book any more", "open the page again"))
    }
}

fn no_action(action: &str) -> Problem {
    Problem::error("", format!("there is no action \"{action}\""), "open the page again")
}
