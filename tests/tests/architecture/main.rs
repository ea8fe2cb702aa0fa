//! The house is built as `DEVELOPERS.md` says: rooms use only the rooms listed for them, standards
//! and rule sets keep apart, every file says what it is for, and none grows too long.

mod map;
mod paths;
mod rules;

use std::collections::BTreeSet;
use std::path::{Path, PathBuf};

use map::Map;
use rules::{Core, Source};

fn root() -> &'static Path {
    Path::new(env!("CARGO_MANIFEST_DIR")).parent().expect("tests lies in the workspace")
}

fn map() -> Map {
    let text = std::fs::read_to_string(root().join("DEVELOPERS.md")).expect("DEVELOPERS.md is there");
    Map::read(&text).expect("DEVELOPERS.md holds the table of rooms and the list of folders")
}

/// Every file below a folder with one of the extensions; its path is relative to the root.
fn files(folder: &str, extensions: &[&str]) -> Vec<(String, String)> {
    fn walk(folder: &Path, found: &mut Vec<PathBuf>) {
        for entry in std::fs::read_dir(folder).expect("the folder can be read") {
            let path = entry.expect("the folder can be read").path();
            if path.is_dir() && !path.ends_with("node_modules") {
                walk(&path, found);
            } else {
                found.push(path);
            }
        }
    }
    let mut found = Vec::new();
    walk(&root().join(folder), &mut found);
    found.retain(|path| path.extension().is_some_and(|e| extensions.iter().any(|known| e == *known)));
    found.sort();
    let named = |path: PathBuf| {
        let name = path.strip_prefix(root()).expect("it lies below the root").to_string_lossy();
        let text = std::fs::read_to_string(&path).expect("sources are UTF-8");
        (name.replace('\\', "/"), text)
    };
    found.into_iter().map(named).collect()
}

fn report(violations: &[String]) {
    assert!(violations.is_empty(), "\n{}\n", violations.join("\n"));
}

#[test]
fn rooms_use_only_what_the_map_allows() {
    let core = Core::new(
        files("core/src", &["rs"])
            .iter()
            .map(|(path, text)| Source::read(path.strip_prefix("core/src/").expect("it lies there"), text)),
    );
    assert!(core.sources.len() > 5, "the sources of core are found");
    report(&core.violations(&map()));
}

#[test]
fn every_file_says_what_it_is_for_and_is_short() {
    let rust = ["core", "web", "tests"].into_iter().flat_map(|folder| files(folder, &["rs"]));
    let script = ["www", "tests/browser"].into_iter().flat_map(|folder| files(folder, &["js"]));
    let violations: Vec<String> = rust
        .flat_map(|(path, text)| [rules::module_docs(&path, &text), rules::length(&path, &text)])
        .chain(script.map(|(path, text)| rules::length(&path, &text)))
        .flatten()
        .collect();
    report(&violations);
}

#[test]
fn the_workspace_has_the_folders_of_the_map() {
    // What git does not keep is nobody's room: the folders that .gitignore anchors at the top.
    let ignore = std::fs::read_to_string(root().join(".gitignore")).expect(".gitignore is there");
    let ignored: BTreeSet<&str> = ignore.lines().filter_map(|line| line.strip_prefix('/')).collect();
    let found: BTreeSet<String> = std::fs::read_dir(root())
        .expect("the root can be read")
        .map(|entry| entry.expect("the root can be read"))
        .filter(|entry| entry.path().is_dir())
        .map(|entry| entry.file_name().to_string_lossy().into_owned())
        .filter(|name| name != ".git" && !ignored.contains(name.as_str()))
        .collect();
    assert_eq!(found, map().folders);
}
