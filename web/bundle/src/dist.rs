//! `dist/`: the page as a static host would hold it.
//!
//! Everything is gathered in memory first, checked, and only then written, so that a half-made
//! page is never left behind by a mistake in the sources.

use std::collections::BTreeMap;
use std::path::Path;

use crate::{Outcome, hash, mime, place, policy, wasm};

/// Files by their path below `dist/`.
pub type Files = BTreeMap<String, Vec<u8>>;

const PAGE: &str = "index.html";
const SERVICE_WORKER: &str = "sw.js";

/// Builds the wasm and writes `dist/` anew.
pub fn build() -> Outcome<()> {
    let mut files = Files::new();
    gather(&place::root().join("www"), "", &mut files)?;
    gather(&wasm::build()?, "", &mut files)?;
    gather_demos(&place::root().join("core/demos"), &mut files)?;
    complete(&mut files)?;
    write(&place::dist(), &files)
}

/// Adds every file below a folder; those that begin with a dot belong to editors and file managers.
fn gather(folder: &Path, below: &str, files: &mut Files) -> Outcome<()> {
    let shown = folder.display();
    let entries = std::fs::read_dir(folder).map_err(|e| format!("{shown} cannot be read: {e}"))?;
    for entry in entries {
        let entry = entry.map_err(|e| format!("{shown} cannot be read: {e}"))?;
        let name = entry.file_name().to_string_lossy().into_owned();
        if name.starts_with('.') {
            continue;
        }
        let path = format!("{below}{name}");
        let kind = entry.file_type().map_err(|e| format!("{path}: {e}"))?;
        if kind.is_dir() {
            gather(&entry.path(), &format!("{path}/"), files)?;
        } else if kind.is_file() {
            let bytes = std::fs::read(entry.path()).map_err(|e| format!("{path}: {e}"))?;
            add(path, bytes, files)?;
        } else {
            return Err(format!("{path} is neither a file nor a folder; the page holds only those"));
        }
    }
    Ok(())
}

/// The demo books of core, below `demos/`.
fn gather_demos(folder: &Path, files: &mut Files) -> Outcome<()> {
    let Ok(entries) = std::fs::read_dir(folder) else { return Ok(()) };
    for path in entries.flatten().map(|entry| entry.path()) {
        if path.extension().is_some_and(|e| e == "json") {
            let shown = path.display();
            let bytes = std::fs::read(&path).map_err(|e| format!("{shown} cannot be read: {e}"))?;
            let name = path.file_name().expect("it has an extension").to_string_lossy();
            add(format!("demos/{name}"), bytes, files)?;
        }
    }
    Ok(())
}

fn add(path: String, bytes: Vec<u8>, files: &mut Files) -> Outcome<()> {
    // Such a name means the same in an address, in a cache key and on every file system.
    let plain = |c: char| c.is_ascii_alphanumeric() || "._-/".contains(c);
    if !path.chars().all(plain) {
        return Err(format!("{path}: use letters, digits, dot, dash and underscore in file names"));
    }
    if mime::of(&path).is_none() {
        return Err(format!("{path}: no media type is known for this kind of file (mime.rs)"));
    }
    if files.contains_key(&path) {
        return Err(format!("{path} comes from two places"));
    }
    files.insert(path, bytes);
    Ok(())
}

/// Puts the policy into the page, and policy, list of files and version into the service worker.
fn complete(files: &mut Files) -> Outcome<()> {
    let page = text(files, PAGE)?;
    let page = replace(PAGE, &page, "<!-- policy -->", &policy::meta())?;
    files.insert(PAGE.into(), page.into_bytes());

    let template = text(files, SERVICE_WORKER)?;
    let listed: Vec<(&String, String, usize)> =
        precached(files).map(|(path, bytes)| (path, hash::integrity(bytes), bytes.len())).collect();
    let mut everything = format!("{}\n{template}\n", policy::POLICY);
    let mut list = String::from("const FILES = [\n");
    for (path, integrity, size) in &listed {
        everything += &format!("{path} {integrity}\n");
        // Neither a path (see `add`) nor base64 holds anything to escape.
        list += &format!("  {{ path: \"{path}\", integrity: \"{integrity}\", size: {size} }},\n");
    }
    list += "];";
    let version = &hash::hex(everything.as_bytes())[..16];

    let mut worker = replace(SERVICE_WORKER, &template, "const FILES = [];", &list)?;
    for (name, value) in [("VERSION", version), ("POLICY", policy::POLICY)] {
        let empty = format!("const {name} = \"\";");
        let line = format!("const {name} = \"{value}\";");
        worker = replace(SERVICE_WORKER, &worker, &empty, &line)?;
    }
    files.insert(SERVICE_WORKER.into(), worker.into_bytes());
    Ok(())
}

/// What the service worker keeps: all but itself and the declarations for the type checker.
pub fn precached(files: &Files) -> impl Iterator<Item = (&String, &Vec<u8>)> {
    files.iter().filter(|(path, _)| *path != SERVICE_WORKER && !path.ends_with(".d.ts"))
}

fn text(files: &Files, path: &str) -> Outcome<String> {
    let bytes = files.get(path).ok_or(format!("www/{path} is missing"))?;
    String::from_utf8(bytes.clone()).map_err(|_| format!("www/{path} is not UTF-8"))
}

fn replace(path: &str, text: &str, mark: &str, with: &str) -> Outcome<String> {
    match text.matches(mark).count() {
        1 => Ok(text.replacen(mark, with, 1)),
        n => Err(format!("www/{path} must hold `{mark}` once, not {n} times")),
    }
}

fn write(dist: &Path, files: &Files) -> Outcome<()> {
    let failed = |e: std::io::Error| format!("dist/ cannot be written: {e}");
    if dist.exists() {
        std::fs::remove_dir_all(dist).map_err(failed)?;
    }
    for (path, bytes) in files {
        let to = dist.join(path);
        std::fs::create_dir_all(to.parent().expect("a file lies in a folder")).map_err(failed)?;
        std::fs::write(to, bytes).map_err(failed)?;
    }
    Ok(())
}

/// `dist/` as it stands, for the checks of what ships.
pub fn read() -> Outcome<Files> {
    let mut files = Files::new();
    gather(&place::dist(), "", &mut files)?;
    Ok(files)
}

#[cfg(test)]
pub mod tests {
    use std::path::PathBuf;

    use super::*;

    /// A fresh folder for one test, below the target folder.
    pub fn scratch(name: &str) -> PathBuf {
        let folder = place::target().join("scratch").join(name);
        let _ = std::fs::remove_dir_all(&folder);
        std::fs::create_dir_all(&folder).unwrap();
        folder
    }

    const WORKER: &str = "const FILES = [];\nconst VERSION = \"\";\nconst POLICY = \"\";\nrun();\n";

    fn page() -> Files {
        let files = [("index.html", "<head><!-- policy --></head>"), ("sw.js", WORKER)];
        let more = [("app.js", "go();"), ("girderbook_web.d.ts", "export {}")];
        files.iter().chain(&more).map(|(p, t)| (p.to_string(), t.as_bytes().to_vec())).collect()
    }

    #[test]
    fn policy_list_and_version_are_filled_in() {
        let mut files = page();
        complete(&mut files).unwrap();
        assert!(text(&files, PAGE).unwrap().contains(&policy::meta()));
        let worker = text(&files, SERVICE_WORKER).unwrap();
        let row =
            format!("  {{ path: \"app.js\", integrity: \"{}\", size: 5 }},\n", hash::integrity(b"go();"));
        assert!(worker.contains(&row), "{worker}");
        // The hash is of the page with its policy, the one that is sent.
        assert!(worker.contains(&hash::integrity(&files[PAGE])));
        assert!(worker.contains("'wasm-unsafe-eval'"));
        assert!(!worker.contains("sw.js") && !worker.contains(".d.ts"));
        assert!(!worker.contains("VERSION = \"\"") && worker.ends_with("run();\n"));
    }

    #[test]
    fn any_change_gives_another_version() {
        let version = |files: &Files| {
            let mut files = files.clone();
            complete(&mut files).unwrap();
            let worker = text(&files, SERVICE_WORKER).unwrap();
            worker.lines().find(|l| l.contains("VERSION")).unwrap().to_string()
        };
        let before = page();
        let mut other_file = page();
        other_file.insert("app.js".into(), b"stop();".to_vec());
        let mut other_worker = page();
        other_worker.insert("sw.js".into(), format!("{WORKER}// more\n").into_bytes());
        assert_eq!(version(&before), version(&page()));
        assert_ne!(version(&before), version(&other_file));
        assert_ne!(version(&before), version(&other_worker));
    }

    #[test]
    fn a_missing_placeholder_is_an_error() {
        for (path, mark) in [
            ("index.html", "<!-- policy -->"),
            ("sw.js", "const FILES = [];"),
            ("sw.js", "const VERSION = \"\";"),
            ("sw.js", "const POLICY = \"\";"),
        ] {
            let mut files = page();
            let without = text(&files, path).unwrap().replace(mark, "");
            files.insert(path.into(), without.into_bytes());
            let problem = complete(&mut files).unwrap_err();
            assert!(problem.contains(path) && problem.contains(mark), "{problem}");
        }
        let mut files = page();
        files.remove("sw.js");
        assert_eq!(complete(&mut files), Err("www/sw.js is missing".into()));
    }

    #[test]
    fn folders_are_followed_and_odd_files_named() {
        let folder = scratch("gather");
        std::fs::create_dir_all(folder.join("parts/deep")).unwrap();
        std::fs::write(folder.join("parts/deep/a.js"), "a").unwrap();
        std::fs::write(folder.join(".hidden"), "x").unwrap();
        let mut files = Files::new();
        gather(&folder, "", &mut files).unwrap();
        assert_eq!(files.keys().collect::<Vec<_>>(), ["parts/deep/a.js"]);
        // The same file from a second place would silently win or lose.
        assert!(gather(&folder, "", &mut files).unwrap_err().contains("two places"));

        for odd in ["a b.js", "letter.doc", "naïve.js"] {
            std::fs::write(folder.join(odd), "").unwrap();
            assert!(gather(&folder, "", &mut Files::new()).unwrap_err().contains(odd));
            std::fs::remove_file(folder.join(odd)).unwrap();
        }
    }

    #[test]
    fn demos_are_the_books_only() {
        let folder = scratch("demos");
        std::fs::write(folder.join("mill_creek.json"), "{}").unwrap();
        std::fs::write(folder.join("notes.md"), "").unwrap();
        let mut files = Files::new();
        gather_demos(&folder, &mut files).unwrap();
        assert_eq!(files.keys().collect::<Vec<_>>(), ["demos/mill_creek.json"]);
        gather_demos(&folder.join("absent"), &mut files).unwrap();
        assert_eq!(files.len(), 1);
    }

    #[test]
    fn writing_leaves_nothing_old_behind() {
        let folder = scratch("write").join("dist");
        write(&folder, &page()).unwrap();
        let mut fewer = page();
        fewer.remove("app.js");
        write(&folder, &fewer).unwrap();
        assert!(!folder.join("app.js").exists() && folder.join("sw.js").exists());
    }
}
