//! What the pages and drawings are made from, and how a field of the book becomes a node.

use girderbook_core::basis::Case;
use girderbook_core::bridge::Bridge;
use girderbook_core::document::fields::{self, Form, Group, Measure, Several};
use girderbook_core::document::{Book, FieldView, Opened, Origin, book, value};
use girderbook_core::problem::{Problem, Severity};
use girderbook_core::quantity::{Angle, Dimension, Force, Length, LineLoad, Quantity, Stress, UnitWeight};
use girderbook_core::rating::Rating;
use girderbook_core::report::SheetRow;
use girderbook_core::report::show::{quantity, readings};
use girderbook_core::units::{Provenance, System, WeightUnit};

use crate::node::Node;

/// A text that the book would not take, kept beside its field.
#[derive(Clone, Debug, PartialEq)]
pub struct Refused {
    /// The field.
    pub path: String,
    /// What was typed or picked.
    pub text: String,
    /// Why it was refused.
    pub problem: Problem,
}

/// The book as it stands, with everything that follows from it.
#[derive(Clone, Copy)]
pub struct Scene<'a> {
    /// The book.
    pub book: &'a Book,
    /// What it says.
    pub opened: &'a Opened,
    /// What keeps the bridge from being rated, or is worth knowing, from the book and the rating.
    pub problems: &'a [Problem],
    /// What comes out, where nothing is missing.
    pub rating: Option<&'a Rating>,
    /// Name of the rule set.
    pub rules: &'a str,
    /// Its standards and editions.
    pub editions: &'a str,
    /// The loads of the rule set with their axles.
    pub cases: &'a [Case],
    /// Index of the check whose sheet is open.
    pub shown: Option<usize>,
    /// The lines of that sheet; empty unless its page is open.
    pub sheet: &'a [SheetRow],
    /// What the book would not take.
    pub refused: Option<&'a Refused>,
    /// What an action could not do.
    pub notice: Option<&'a Problem>,
    /// Whether an edit can be taken back.
    pub undo: bool,
}

impl<'a> Scene<'a> {
    /// Units of the book.
    #[must_use]
    pub fn system(&self) -> System {
        self.book.system.into()
    }

    /// The bridge, where nothing is missing.
    #[must_use]
    pub fn bridge(&self) -> Option<&'a Bridge> {
        self.opened.bridge.as_ref()
    }

    /// Unit of the sign.
    #[must_use]
    pub fn sign_unit(&self) -> WeightUnit {
        match self.book.posting.unit {
            book::SignUnit::ShortTons => WeightUnit::ShortTons,
            book::SignUnit::Tonnes => WeightUnit::Tonnes,
        }
    }

    /// A field for readings, figures or words.
    #[must_use]
    pub fn field(&self, path: &str, label: &str, hint: &str) -> Node {
        let view = self.view(path);
        let mut text = view.text;
        let form = fields::form(path);
        let measure = match form {
            Some(Form::Quantity(measure)) => Some(measure),
            _ => None,
        };
        let filled = if text.is_empty() { self.opened.filled_at(path) } else { None };
        let from = match (filled, view.from) {
            (Some(filled), _) => provenance(filled.from),
            (None, Some(from)) if !text.is_empty() => from.text(),
            _ => "",
        };
        let unit = measure.map_or(String::new(), |measure| self.unit(measure));
        // What stands for an empty field shows inside it, so that it reads like an entry that waits.
        let ghost = filled.map_or(String::new(), |filled| {
            let text = raised(&filled.text);
            text.strip_suffix(&unit).unwrap_or(&text).trim().to_owned()
        });
        let echo = match (filled, measure) {
            (None, Some(measure)) => self.echo(path, measure),
            _ => String::new(),
        };
        let mut told = Told::of(self.problems_at(path));
        if let Some(refused) = self.refused_at(path) {
            text.clone_from(&refused.text);
            told = Told::of([&refused.problem].into_iter());
        }
        if let Some(filled) = filled {
            told.note.insert(0, filled.source.to_owned());
        }
        let node = Node::new("field")
            .named(field_id(path))
            .with("path", path)
            .with("label", label)
            .with("hint", hint)
            .with("unit", unit)
            .with("text", text)
            .with("ghost", ghost)
            .with("mode", mode(path, form))
            .with("from", from)
            .with("echo", echo);
        told.onto(node)
    }

    /// A field in which one of several is picked. `words` say what each is called; one that has no
    /// words is called by its name in the book.
    #[must_use]
    pub fn choice(&self, path: &str, label: &str, hint: &str, words: &[(&str, &str)]) -> Node {
        let view = self.view(path);
        let named = |value: &str| match words.iter().find(|(name, _)| *name == value) {
            Some((_, words)) => (*words).to_owned(),
            None => self.item(path, value).unwrap_or_else(|| value.to_owned()),
        };
        let mut told = Told::of(self.problems_at(path));
        if let Some(refused) = self.refused_at(path) {
            told = Told::of([&refused.problem].into_iter());
        }
        let options = view.options.iter().map(|value| option(value, &named(value)));
        let node = Node::new("choice")
            .named(field_id(path))
            .with("path", path)
            .with("label", label)
            .with("hint", hint)
            .with("value", view.text.clone())
            .all(options);
        told.onto(node)
    }

    /// A field of words in which one of several names is picked; `options` are names and words.
    #[must_use]
    pub fn pick(&self, path: &str, label: &str, hint: &str, options: &[(&str, &str)]) -> Node {
        let text = self.view(path).text;
        let known = options.iter().any(|(name, _)| *name == text);
        // A name that is none of them, from a file or not yet picked, stays to be seen.
        let own = (!known).then(|| option(&text, if text.is_empty() { "choose" } else { &text }));
        let node = Node::new("choice")
            .named(field_id(path))
            .with("path", path)
            .with("label", label)
            .with("hint", hint)
            .with("value", text.clone())
            .all(own)
            .all(options.iter().map(|(name, words)| option(name, words)));
        Told::of(self.problems_at(path)).onto(node)
    }

    /// Where a problem leads: its field, or the page of its list.
    #[must_use]
    pub fn go(&self, path: &str) -> String {
        match (self.book.text(path), crate::pages::of(path)) {
            _ if path == "girders" => "girders.count".to_owned(),
            (Some(_), _) => path.to_owned(),
            (None, Some(page)) => format!("page:{}", page.id()),
            (None, None) => String::new(),
        }
    }

    /// The readings at a path, where they can be understood.
    #[must_use]
    pub fn read<Q: Quantity>(&self, path: &str) -> Option<girderbook_core::units::Entered<Q>> {
        value::<Q>(self.book, path)?.ok()
    }

    /// What nobody measured or took from a drawing.
    #[must_use]
    pub fn assumed(&self) -> Vec<String> {
        let filled = self.opened.filled.iter().filter(|filled| filled.from == Provenance::Assumed);
        let mut all: Vec<String> = filled.map(|filled| fields::label(&filled.path).to_lowercase()).collect();
        self.book.entries(&mut |path, entry| {
            if entry.from == Origin::Assumed && !entry.is_blank() {
                all.push(fields::label(path).to_lowercase());
            }
        });
        all.dedup();
        all
    }

    fn view(&self, path: &str) -> FieldView {
        self.book.text(path).unwrap_or(FieldView { text: String::new(), from: None, options: Vec::new() })
    }

    fn problems_at(&self, path: &str) -> impl Iterator<Item = &'a Problem> {
        self.problems.iter().filter(move |problem| problem.path == path)
    }

    fn refused_at(&self, path: &str) -> Option<&'a Refused> {
        self.refused.filter(|refused| refused.path == path)
    }

    fn unit(&self, measure: Measure) -> String {
        girderbook_core::report::figure::unit(measure.unit(self.book.system))
    }

    /// The item that a reference means.
    fn item(&self, path: &str, id: &str) -> Option<String> {
        match fields::form(path) {
            Some(Form::Reference(Group::Members)) => {
                let member = self.book.members.iter().find(|member| member.id.0 == id)?;
                Some(member_name(member))
            }
            Some(Form::Reference(Group::Girders)) => {
                let index = self.book.girders.iter().position(|girder| girder.id.0 == id)?;
                Some(girder_name(self.book, index))
            }
            _ => None,
        }
    }

    /// What was understood, where that is not plain from the text: several readings, or a unit that
    /// is not the field's own.
    fn echo(&self, path: &str, measure: Measure) -> String {
        let unit = measure.unit(self.book.system);
        let Some((bases, mean, written)) = self.bases(path, measure.dimension) else {
            return String::new();
        };
        let shown = |base: f64| quantity(base, measure.dimension, unit);
        match (bases.as_slice(), measure.several) {
            (_, Several::Each) => {
                let all: Vec<String> = bases.iter().map(|base| shown(*base)).collect();
                format!("{}: {}", bases.len(), all.join(", "))
            }
            ([_, _, ..], Several::Mean) => readings(&bases, mean, measure.dimension, unit),
            // A bare figure, or one in the field's own unit, says all there is to say.
            _ => {
                let written = written.first().map_or("", |text| text.trim());
                let bare = written.strip_suffix(unit).unwrap_or(written).trim();
                let plain = bare.bytes().all(|b| b.is_ascii_digit() || matches!(b, b'.' | b',' | b'-'));
                if plain { String::new() } else { format!("= {}", shown(mean)) }
            }
        }
    }

    /// The readings at a path and their mean, in base units, and as they were written.
    fn bases(&self, path: &str, dimension: Dimension) -> Option<(Vec<f64>, f64, Vec<String>)> {
        fn of<Q: Quantity>(scene: &Scene, path: &str) -> Option<(Vec<f64>, f64, Vec<String>)> {
            let entered = scene.read::<Q>(path)?;
            let bases = entered.readings.iter().map(|q| q.base()).collect();
            Some((bases, entered.value.base(), entered.written))
        }
        match dimension {
            Dimension::Number => of::<f64>(self, path),
            Dimension::Angle => of::<Angle>(self, path),
            Dimension::Length => of::<Length>(self, path),
            Dimension::Force => of::<Force>(self, path),
            Dimension::LineLoad => of::<LineLoad>(self, path),
            Dimension::Stress => of::<Stress>(self, path),
            Dimension::UnitWeight => of::<UnitWeight>(self, path),
            // No field of a book is one of these.
            Dimension::Area | Dimension::Modulus | Dimension::Inertia | Dimension::Moment => None,
        }
    }
}

/// Id of the node of a field.
#[must_use]
pub fn field_id(path: &str) -> String {
    format!("f:{path}")
}

/// One of the options of a choice.
#[must_use]
pub fn option(value: &str, text: &str) -> Node {
    Node::new("option").with("value", value).with("text", text)
}

/// What a girder line is called; by its place where it has no name.
#[must_use]
pub fn girder_name(book: &Book, index: usize) -> String {
    match book.girders.get(index).map_or("", |girder| girder.name.trim()) {
        "" => format!("G{}", index + 1),
        name => name.to_owned(),
    }
}

/// What a kind of girder is called.
#[must_use]
pub fn member_name(member: &book::Member) -> String {
    match (member.name.trim(), member.shape.text().trim()) {
        ("", "") => "Girder".to_owned(),
        ("", shape) => shape.to_owned(),
        (name, "") => name.to_owned(),
        (name, shape) => format!("{name}, {shape}"),
    }
}

fn provenance(from: Provenance) -> &'static str {
    match from {
        Provenance::Measured => "measured",
        Provenance::Drawing => "drawing",
        Provenance::Assumed => "assumed",
    }
}

/// A size as the book shows it, with its unit as it is printed.
fn raised(text: &str) -> String {
    match text.split_once(' ') {
        Some((figure, unit)) => format!("{figure} {}", girderbook_core::report::figure::unit(unit)),
        None => text.to_owned(),
    }
}

fn mode(path: &str, form: Option<Form>) -> &'static str {
    match form {
        Some(Form::Quantity(Measure { dimension: Dimension::Length, .. })) => "length",
        Some(Form::Quantity(_)) => "number",
        None if path == "girders.count" => "number",
        _ => "words",
    }
}

/// What is told beside a field.
#[derive(Default)]
struct Told {
    problem: Vec<String>,
    mend: String,
    repair: String,
    note: Vec<String>,
}

impl Told {
    fn of<'p>(problems: impl Iterator<Item = &'p Problem>) -> Self {
        let mut told = Self::default();
        for problem in problems {
            match problem.severity {
                Severity::Error | Severity::Warning => {
                    told.problem.push(problem.message.clone());
                    if told.mend.is_empty() {
                        told.mend.clone_from(&problem.mend);
                        told.repair = problem.repair.clone().unwrap_or_default();
                    }
                }
                Severity::Missing => told.note.push("needed for a rating".to_owned()),
                Severity::Note => told.note.push(problem.message.clone()),
            }
        }
        told
    }

    fn onto(self, node: Node) -> Node {
        node.with("problem", self.problem.join("; "))
            .with("mend", self.mend)
            .with("repair", self.repair)
            .with("note", self.note.join("; "))
    }
}
