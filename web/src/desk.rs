//! The open book: what was typed goes in, what changed on the page comes out.
//!
//! Nothing in here knows a browser; [`crate::open_book`] is its face for one.

use girderbook_core::basis::mbe_a::MbeA;
use girderbook_core::basis::{Basis, Case};
use girderbook_core::bridge::{Bridge, Site};
use girderbook_core::document::book::UnitSystem;
use girderbook_core::document::{self, Book, Edit, Opened};
use girderbook_core::problem::Problem;
use girderbook_core::rating::{Rater, Rating, work};
use girderbook_core::report::{SheetRow, Tone, rows};
use girderbook_core::worksheet::Sheet;

use crate::key::Key;
use crate::node::{Update, View};
use crate::pages::{self, Page};
use crate::scene::{Refused, Scene};
use crate::{drawing, head, verdict};

/// Edits that can be taken back.
const MOST_UNDO: usize = 200;

/// The open book.
#[derive(Debug)]
pub struct Desk {
    book: Book,
    opened: Opened,
    /// Problems of the book and of the rating.
    problems: Vec<Problem>,
    basis: MbeA,
    rater: Rater,
    rating: Option<Rating>,
    cases: Vec<Case>,
    page: Page,
    /// The check that was asked for; without one the governing check is shown.
    asked: Option<Key>,
    refused: Option<Refused>,
    notice: Option<Problem>,
    /// What takes edits back, the last one last, with the field that each was about.
    undo: Vec<(String, Edit)>,
    revision: u32,
    view: View,
}

/// Whether two bridges differ in nothing but the words about the site, of which none enters a figure.
/// Taken apart field by field, so that a new field has to say on which side it is.
fn same_but_words(a: &Bridge, b: &Bridge) -> bool {
    let Bridge { site, spans, skew, deck, members, lines, findings, traffic, vehicles, posting } = a;
    let Site {
        name: _,
        place: _,
        year_built,
        condition,
        rater: _,
        checker: _,
        posting_before: _,
        rating_before: _,
    } = site;
    (year_built, condition) == (&b.site.year_built, &b.site.condition)
        && (spans, skew, deck, members, lines) == (&b.spans, &b.skew, &b.deck, &b.members, &b.lines)
        && (findings, traffic, vehicles, posting) == (&b.findings, &b.traffic, &b.vehicles, &b.posting)
}

/// A line of the shelf.
#[derive(Clone, Debug, PartialEq, Eq)]
pub struct Summary {
    /// Title of the book.
    pub title: String,
    /// Where it is.
    pub place: String,
    /// Its span.
    pub span: String,
    /// The verdict in a sentence.
    pub verdict: String,
    /// How it stands.
    pub tone: Tone,
}

impl Desk {
    /// Opens a saved book.
    ///
    /// # Errors
    /// What keeps the file from being read.
    pub fn read(text: &str) -> Result<Self, Vec<Problem>> {
        document::read(text).map(Self::of)
    }

    /// A new book.
    #[must_use]
    pub fn empty(id: &str, system: UnitSystem) -> Self {
        Self::of(Book::empty(id, system))
    }

    fn of(book: Book) -> Self {
        let basis = MbeA::default();
        let opened = document::bridge(&book, &basis);
        let mut desk = Self {
            book,
            opened,
            problems: Vec::new(),
            basis,
            rater: Rater::default(),
            rating: None,
            cases: Vec::new(),
            page: Page::default(),
            asked: None,
            refused: None,
            notice: None,
            undo: Vec::new(),
            revision: 0,
            view: View::default(),
        };
        desk.rate();
        desk.view = desk.viewed();
        desk
    }

    /// Makes a page the open one.
    pub fn open(&mut self, page: &str) -> &View {
        self.page = Page::by_id(page).unwrap_or(self.page);
        self.notice = None;
        self.view = self.viewed();
        &self.view
    }

    /// Takes what was typed into a field or picked in a choice. What the book would not take stays
    /// beside the field, and the book as it was.
    pub fn edit(&mut self, path: &str, text: &str) -> Update {
        if let Some(part) = path.strip_prefix("sheet.") {
            self.choose(part, text);
            return self.update();
        }
        let result = self.book.set(path, text);
        self.took(path, text, result);
        self.update()
    }

    /// Says where a field comes from.
    pub fn provenance(&mut self, path: &str, from: &str) -> Update {
        let result = self.book.provenance(path, from);
        let text = self.book.text(path).map_or(String::new(), |view| view.text);
        self.took(path, &text, result);
        self.update()
    }

    /// Changes the structure of the book, shows another sheet, or takes the last edit back.
    pub fn act(&mut self, action: &str) -> Update {
        self.notice = None;
        if let Some(key) = action.strip_prefix("sheet.show:") {
            self.asked = Key::parse(key);
        } else if action == "undo" {
            self.take_back();
        } else {
            match self.book.act(action) {
                Ok(edit) => {
                    self.refused = None;
                    self.remember(String::new(), edit);
                    self.reopen();
                }
                Err(problem) => self.notice = Some(problem),
            }
        }
        self.update()
    }

    fn took(&mut self, path: &str, text: &str, result: Result<Edit, Problem>) {
        self.notice = None;
        match result {
            Ok(edit) => {
                self.refused = None;
                self.remember(path.to_owned(), edit);
                self.reopen();
            }
            Err(problem) => {
                self.refused = Some(Refused { path: path.to_owned(), text: text.to_owned(), problem });
            }
        }
    }

    /// Keeps what takes an edit back; keystrokes in one field are one edit.
    fn remember(&mut self, path: String, edit: Edit) {
        if !path.is_empty() && self.undo.last().is_some_and(|(last, _)| *last == path) {
            return;
        }
        if self.undo.len() == MOST_UNDO {
            self.undo.remove(0);
        }
        self.undo.push((path, edit));
    }

    fn take_back(&mut self) {
        if let Some((_, edit)) = self.undo.pop() {
            match self.book.apply(edit) {
                Ok(_) => self.refused = None,
                Err(problem) => self.notice = Some(problem),
            }
            self.reopen();
        }
    }

    fn reopen(&mut self) {
        let before = core::mem::replace(&mut self.opened, document::bridge(&self.book, &self.basis));
        match (&before.bridge, &self.opened.bridge) {
            // Names and notes enter no figure.
            (Some(before), Some(now)) if same_but_words(before, now) && self.rating.is_some() => {
                self.problems.clone_from(&self.opened.problems);
            }
            _ => self.rate(),
        }
    }

    fn rate(&mut self) {
        self.problems.clone_from(&self.opened.problems);
        self.rating = None;
        self.cases.clear();
        if let Some(bridge) = &self.opened.bridge {
            match self.rater.rate(bridge, &self.basis) {
                Ok(rating) => {
                    self.rating = Some(rating);
                    self.cases = self.basis.cases(bridge);
                }
                Err(problems) => self.problems.extend(problems),
            }
        }
    }

    /// Another vehicle, girder, action or station for the sheet.
    fn choose(&mut self, part: &str, value: &str) {
        let Some(mut key) = self.shown_key() else { return };
        // Where the worst place lies depends on everything else.
        key.x = None;
        match part {
            "load" => value.clone_into(&mut key.load),
            "girder" => value.clone_into(&mut key.girder),
            "kind" => value.clone_into(&mut key.kind),
            "x" => key.x = value.parse::<f64>().ok().filter(|x| x.is_finite()),
            _ => {}
        }
        self.asked = Some(key);
    }

    fn shown_key(&self) -> Option<Key> {
        let rating = self.rating.as_ref()?;
        let check = rating.checks.get(self.shown()?)?;
        Some(Key::of(&self.book, rating, check))
    }

    /// Index of the check whose sheet is shown.
    fn shown(&self) -> Option<usize> {
        let rating = self.rating.as_ref()?;
        self.asked.as_ref().and_then(|key| key.find(&self.book, rating)).or(rating.governing)
    }

    fn sheet(&self) -> Vec<SheetRow> {
        let sheet = || {
            let (bridge, rating) = (self.opened.bridge.as_ref()?, self.rating.as_ref()?);
            let check = rating.checks.get(self.shown()?)?;
            let mut sheet = Sheet::default();
            // Where there is no number the sheet itself says why.
            let _ = work(bridge, &self.basis, &check.key, &mut sheet);
            Some(rows(&sheet, self.book.system.into()))
        };
        sheet().unwrap_or_default()
    }

    fn update(&mut self) -> Update {
        self.revision = self.revision.wrapping_add(1);
        let view = self.viewed();
        let update = view.since(&self.view);
        self.view = view;
        update
    }

    fn viewed(&self) -> View {
        let sheet = if self.page == Page::Sheet { self.sheet() } else { Vec::new() };
        let scene = self.scene(&sheet);
        View::sealed(
            self.revision,
            [
                head::regions(&scene),
                drawing::regions(&scene),
                self.page.regions(&scene),
                verdict::regions(&scene),
            ],
        )
    }

    fn scene<'a>(&'a self, sheet: &'a [SheetRow]) -> Scene<'a> {
        let about = self.basis.about();
        Scene {
            book: &self.book,
            opened: &self.opened,
            problems: &self.problems,
            rating: self.rating.as_ref(),
            rules: about.name,
            editions: about.editions,
            cases: &self.cases,
            shown: self.shown(),
            sheet,
            refused: self.refused.as_ref(),
            notice: self.notice.as_ref(),
            undo: !self.undo.is_empty(),
        }
    }

    /// Index tabs: page and how many of its fields keep the bridge from being rated.
    #[must_use]
    pub fn pages(&self) -> Vec<(Page, usize)> {
        let blocked = |page| {
            let blocking = self.problems.iter().filter(|problem| problem.blocks());
            blocking.filter(|problem| pages::of(&problem.path) == Some(page)).count()
        };
        Page::ALL.into_iter().map(|page| (page, blocked(page))).collect()
    }

    /// Title of the book.
    #[must_use]
    pub fn title(&self) -> String {
        head::title(&self.book)
    }

    /// The saved form.
    #[must_use]
    pub fn text(&self) -> String {
        document::write(&self.book)
    }

    /// What the shelf says of it.
    #[must_use]
    pub fn summary(&self) -> Summary {
        let said = verdict::said(&self.scene(&[]));
        Summary {
            title: self.title(),
            place: head::place(&self.book),
            span: head::span(&self.book),
            verdict: said.headline,
            tone: said.tone,
        }
    }

    /// What is visible.
    #[must_use]
    pub fn view(&self) -> &View {
        &self.view
    }
}
