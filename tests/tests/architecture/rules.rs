//! The rules of the house, as functions of sources and map, so that each can be seen to fail.

use std::collections::{BTreeMap, BTreeSet};

use crate::map::Map;
use crate::paths::{self, Names};

/// Longer files hold more than one idea.
const LONGEST: usize = 600;

/// Rooms whose parts keep apart: standards, and rule sets.
const APART: [&str; 2] = ["clauses", "basis"];

/// Rooms with serialised types: the saved book and rule-set files.
const SERIALISED: [&str; 2] = ["document", "basis"];

/// What core does not know, so that the same book gives the same answer everywhere.
const OUTSIDE: [&str; 6] = ["env", "fs", "net", "process", "thread", "time"];

/// A source file of core.
pub struct Source {
    /// Below `core/src`.
    path: String,
    /// Where it lies in the crate; nothing for the root.
    module: Vec<String>,
    names: Names,
}

impl Source {
    /// Reads a file by its path below `core/src`.
    pub fn read(path: &str, text: &str) -> Source {
        let stem = path.trim_end_matches(".rs");
        let mut module: Vec<String> = stem.split('/').map(str::to_string).collect();
        if ["lib", "mod"].contains(&module.last().map_or("", String::as_str)) {
            module.pop();
        }
        let names = paths::read(&module, text);
        Source { path: path.into(), module, names }
    }
}

/// The sources of core, and what must be known of all of them to judge one.
pub struct Core {
    pub sources: Vec<Source>,
    /// Exported macros stand at the root of the crate; here is the room they come from.
    macros: BTreeMap<String, String>,
    /// The folders in each room of [`APART`].
    parts: BTreeSet<(String, String)>,
}

impl Core {
    pub fn new(sources: impl Iterator<Item = Source>) -> Core {
        let sources: Vec<Source> = sources.collect();
        let mut macros = BTreeMap::new();
        let mut parts = BTreeSet::new();
        for source in &sources {
            let Some(room) = source.module.first() else { continue };
            for name in &source.names.exported_macros {
                macros.insert(name.clone(), room.clone());
            }
            let mut folders = source.path.split('/').skip(1);
            if let (true, Some(part), Some(_)) =
                (APART.contains(&room.as_str()), folders.next(), folders.next())
            {
                parts.insert((room.clone(), part.to_string()));
            }
        }
        Core { sources, macros, parts }
    }

    /// Everything that breaks a rule, one line each.
    pub fn violations(&self, map: &Map) -> Vec<String> {
        self.sources.iter().flat_map(|source| self.judge(source, map)).collect()
    }

    fn judge(&self, source: &Source, map: &Map) -> Vec<String> {
        let mut found = Vec::new();
        let mut blame = |line: usize, what: String| {
            found.push(format!("core/src/{}:{line}: {what}", source.path));
        };
        // The root of the crate only lists the rooms.
        let Some(room) = source.module.first() else { return found };
        let Some(allowed) = map.rooms.get(room) else {
            blame(1, format!("`{room}` is no room of DEVELOPERS.md"));
            return found;
        };
        for named in &source.names.paths {
            let first = named.path.first().map_or("", String::as_str);
            if named.std {
                if OUTSIDE.contains(&first) {
                    blame(named.line, format!("core does not know std::{first}"));
                }
                continue;
            }
            let used = self.macros.get(first).map_or(first, String::as_str);
            if used == room {
                if let Some(other) = self.other_part(source, &named.path) {
                    blame(named.line, format!("parts of `{room}` keep apart, this one uses `{other}`"));
                }
            } else if !map.rooms.contains_key(used) {
                blame(named.line, format!("`{used}` is no room of DEVELOPERS.md"));
            } else if !allowed.contains(used) {
                blame(named.line, format!("`{room}` may not use `{used}`"));
            }
        }
        if !SERIALISED.contains(&room.as_str()) {
            for (word, line) in &source.names.words {
                if word == "serde" || word.starts_with("serde_") {
                    blame(*line, format!("`{word}` belongs into `document`"));
                }
            }
        }
        found
    }

    /// The standard or rule set that a path of the same room leads to, if it is another one.
    fn other_part<'a>(&self, source: &Source, path: &'a [String]) -> Option<&'a str> {
        let part = |path: &[String]| path.get(..2).map(|p| (p[0].clone(), p[1].clone()));
        let (own, used) = (part(&source.module)?, part(path)?);
        let apart = self.parts.contains(&own) && self.parts.contains(&used) && own != used;
        apart.then(|| path[1].as_str())
    }
}

/// What is wrong with the head of a file.
pub fn module_docs(path: &str, text: &str) -> Option<String> {
    let first = text.lines().find(|line| !line.trim().is_empty()).unwrap_or_default();
    (!first.starts_with("//!")).then(|| format!("{path}: begins without saying what it is for (//!)"))
}

/// What is wrong with the length of a file.
pub fn length(path: &str, text: &str) -> Option<String> {
    let lines = text.lines().count();
    (lines > LONGEST).then(|| format!("{path}: {lines} lines, more than {LONGEST}"))
}

#[cfg(test)]
mod tests {
    use super::*;

    fn map() -> Map {
        let rooms = ["quantity", "worksheet", "load", "clauses", "basis", "document"];
        let uses: [&[&str]; 6] =
            [&[], &["quantity"], &["quantity"], &["load", "worksheet"], &["clauses"], &["load"]];
        let set = |list: &[&str]| list.iter().map(|name| name.to_string()).collect();
        let rooms = rooms.iter().zip(uses).map(|(room, list)| (room.to_string(), set(list))).collect();
        Map { folders: BTreeSet::new(), rooms }
    }

    /// The violations of a core made of these files.
    fn judge(files: &[(&str, &str)]) -> Vec<String> {
        Core::new(files.iter().map(|(path, text)| Source::read(path, text))).violations(&map())
    }

    #[test]
    fn a_good_core_passes() {
        let found = judge(&[
            ("lib.rs", "pub mod load; pub use crate::load::Lane;"),
            ("quantity.rs", "use std::fmt;"),
            ("worksheet/mod.rs", "#[macro_export] macro_rules! clause { () => { $crate::quantity::X } }"),
            ("load/mod.rs", "use crate::quantity::Force; use self::lane::X; mod tests { use super::*; }"),
            ("load/lane.rs", "use super::Train; use super::super::quantity::Force;"),
            ("clauses/mod.rs", "use crate::clauses::aashto::f;"),
            ("clauses/common.rs", "use crate::load::Lane;"),
            ("clauses/aashto/shear.rs", "use crate::{clause, clauses::common::g}; use super::flexure::h;"),
            ("clauses/csa/mod.rs", "use crate::load::Lane;"),
            ("document.rs", "use serde::Serialize; use crate::load::Lane;"),
        ]);
        assert_eq!(found, [""; 0]);
    }

    #[test]
    fn a_room_that_is_not_allowed_is_found_in_any_spelling() {
        for text in [
            "\nuse crate::load::Lane;",
            "\nuse crate::{quantity, load::Lane};",
            "\nfn f(x: crate::load::Lane) {}",
            "\nuse super::load::Lane;",
            "\nmod tests { use super::super::load::Lane; }",
            "\n#[cfg(test)] mod tests { fn f() { crate::load::go() } }",
            "\nmacro_rules! m { () => { $crate::load::go() } }",
        ] {
            let found = judge(&[("quantity.rs", text)]);
            assert_eq!(found, ["core/src/quantity.rs:2: `quantity` may not use `load`"], "{text}");
        }
        // A macro stands at the root and counts for the room it comes from.
        let exported = ("worksheet/mod.rs", "#[macro_export]\nmacro_rules! clause { () => {} }");
        let found = judge(&[exported, ("load.rs", "crate::clause!();")]);
        assert_eq!(found, ["core/src/load.rs:1: `load` may not use `worksheet`"]);
    }

    #[test]
    fn rooms_that_the_map_does_not_know_are_found() {
        assert_eq!(
            judge(&[("cellar.rs", "")]),
            ["core/src/cellar.rs:1: `cellar` is no room of DEVELOPERS.md"]
        );
        assert_eq!(
            judge(&[("load.rs", "use crate::cellar;")]),
            ["core/src/load.rs:1: `cellar` is no room of DEVELOPERS.md"]
        );
        assert_eq!(judge(&[("load.rs", "use crate::*;")]).len(), 1);
    }

    #[test]
    fn standards_and_rule_sets_keep_apart() {
        for (room, text) in [
            ("clauses", "use crate::clauses::csa::f;"),
            ("clauses", "use super::super::csa::f;"),
            ("basis", "use crate::basis::csa::f;"),
        ] {
            let (one, other) = (format!("{room}/aashto/a.rs"), format!("{room}/csa/b.rs"));
            let found = judge(&[(&one, text), (&other, "")]);
            assert_eq!(
                found,
                [format!("core/src/{one}:1: parts of `{room}` keep apart, this one uses `csa`")]
            );
        }
    }

    #[test]
    fn serialisation_and_the_outside_world_are_found() {
        for text in
            ["use serde::Serialize;", "#[derive(serde::Serialize)] struct S;", "fn f() { serde_json::x() }"]
        {
            assert_eq!(judge(&[("load.rs", text)]).len(), 1, "{text}");
        }
        for text in ["use std::fs;", "use std::{fmt, time::Instant};", "fn f() { std::env::var(\"X\"); }"] {
            assert_eq!(judge(&[("document.rs", text)]).len(), 1, "{text}");
        }
    }

    #[test]
    fn heads_and_lengths_are_judged() {
        assert!(module_docs("a.rs", "//! What it is for.\n").is_none());
        assert!(module_docs("a.rs", "\n#![forbid(unsafe_code)]\n//! Late.\n").is_some());
        assert!(module_docs("a.rs", "use x;\n").is_some());
        assert!(module_docs("a.rs", "").is_some());
        assert!(length("a.rs", &"\n".repeat(600)).is_none());
        assert!(length("a.rs", &"\n".repeat(601)).is_some());
    }
}
