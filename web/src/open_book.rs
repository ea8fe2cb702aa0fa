//! The open book as the page sees it.

use girderbook_core::document::book::UnitSystem;
use girderbook_core::problem::Problem;
use serde::Serialize;
use serde_wasm_bindgen::Serializer;
use wasm_bindgen::prelude::*;

use crate::desk::Desk;
use crate::pages;

/// Tells the page's console where the program broke, before the page takes a fresh instance.
#[wasm_bindgen(start)]
pub fn start() {
    console_error_panic_hook::set_once();
}

/// Version of the program.
#[wasm_bindgen]
#[must_use]
pub fn version() -> String {
    env!("CARGO_PKG_VERSION").to_owned()
}

/// A book that is open.
#[wasm_bindgen]
pub struct OpenBook {
    desk: Desk,
}

/// Plain data as plain objects, strings and arrays.
fn plain<T: Serialize>(value: &T) -> Result<JsValue, JsValue> {
    value.serialize(&Serializer::json_compatible()).map_err(JsValue::from)
}

#[derive(Serialize)]
struct Tab {
    id: &'static str,
    title: &'static str,
    badge: String,
}

#[derive(Serialize)]
struct Line {
    title: String,
    place: String,
    span: String,
    verdict: String,
    tone: &'static str,
}

#[derive(Serialize)]
struct Refusal {
    path: String,
    message: String,
    mend: String,
}

impl From<Problem> for Refusal {
    fn from(problem: Problem) -> Self {
        Self { path: problem.path, message: problem.message, mend: problem.mend }
    }
}

#[wasm_bindgen]
impl OpenBook {
    /// Opens a saved book.
    ///
    /// # Errors
    /// An array of `{path, message, mend}` when the file is refused.
    #[wasm_bindgen(constructor)]
    pub fn new(json: &str) -> Result<OpenBook, JsValue> {
        match Desk::read(json) {
            Ok(desk) => Ok(Self { desk }),
            Err(problems) => {
                let refusals: Vec<Refusal> = problems.into_iter().map(Refusal::from).collect();
                Err(plain(&refusals)?)
            }
        }
    }

    /// A new book in `m-kN` or `ft-kip`.
    #[must_use]
    pub fn empty(id: &str, system: &str) -> OpenBook {
        let system = match system {
            "ft-kip" => UnitSystem::FootKip,
            _ => UnitSystem::MetreKilonewton,
        };
        Self { desk: Desk::empty(id, system) }
    }

    /// Index tabs, in order.
    ///
    /// # Errors
    /// Never with what is passed here; the border's own.
    pub fn pages(&self) -> Result<JsValue, JsValue> {
        let tabs: Vec<Tab> = self
            .desk
            .pages()
            .into_iter()
            .map(|(page, blocked)| Tab {
                id: page.id(),
                title: page.title(),
                badge: if blocked > 0 { blocked.to_string() } else { String::new() },
            })
            .collect();
        plain(&tabs)
    }

    /// Makes a page the open one; the whole structure.
    ///
    /// # Errors
    /// Never with what is passed here; the border's own.
    pub fn open(&mut self, page: &str) -> Result<JsValue, JsValue> {
        plain(self.desk.open(page))
    }

    /// What was typed into a field or picked in a choice.
    ///
    /// # Errors
    /// Never with what is passed here; the border's own.
    pub fn edit(&mut self, path: &str, text: &str) -> Result<JsValue, JsValue> {
        plain(&self.desk.edit(path, text))
    }

    /// Where a field comes from.
    ///
    /// # Errors
    /// Never with what is passed here; the border's own.
    pub fn provenance(&mut self, path: &str, from: &str) -> Result<JsValue, JsValue> {
        plain(&self.desk.provenance(path, from))
    }

    /// A change of structure, another sheet, or `undo`.
    ///
    /// # Errors
    /// Never with what is passed here; the border's own.
    pub fn act(&mut self, action: &str) -> Result<JsValue, JsValue> {
        plain(&self.desk.act(action))
    }

    /// The page that holds the field of a path; empty if none does.
    #[must_use]
    pub fn page_of(&self, path: &str) -> String {
        pages::of(path).map_or(String::new(), |page| page.id().to_owned())
    }

    /// Title of the book.
    #[must_use]
    pub fn title(&self) -> String {
        self.desk.title()
    }

    /// The saved form of the book.
    #[must_use]
    pub fn text(&self) -> String {
        self.desk.text()
    }

    /// What the shelf says of it.
    ///
    /// # Errors
    /// Never with what is passed here; the border's own.
    pub fn summary(&self) -> Result<JsValue, JsValue> {
        let summary = self.desk.summary();
        plain(&Line {
            title: summary.title,
            place: summary.place,
            span: summary.span,
            verdict: summary.verdict,
            tone: summary.tone.name(),
        })
    }
}
