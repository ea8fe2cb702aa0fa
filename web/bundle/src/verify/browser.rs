//! The page in a real browser: Node, its packages, the type checker, Chromium and the tests.

use std::path::{Path, PathBuf};

use super::End;
use super::steps::watch;
use crate::{Outcome, hash, place};

/// Node 20 is the oldest whose test runner and module loader the rig is written for.
const OLDEST_NODE: u32 = 20;

fn folder() -> PathBuf {
    place::root().join("tests/browser")
}

/// Installs the packages of `tests/browser` when they are not those of the lock.
pub fn packages() -> Outcome<String> {
    let node = node_version()?;
    let lock = std::fs::read_to_string(folder().join("package-lock.json"))
        .map_err(|e| format!("tests/browser/package-lock.json cannot be read: {e}"))?;
    names_no_host(&lock)?;
    let (modules, digest) = (folder().join("node_modules"), hash::hex(lock.as_bytes()));
    let stamp = modules.join(".installed-lock");
    if !std::fs::read_to_string(&stamp).is_ok_and(|installed| installed == digest) {
        let mut npm = place::command("npm");
        npm.current_dir(folder()).args(["ci", "--ignore-scripts", "--no-audit", "--no-fund"]);
        if let End::Failed(reason) = watch(&mut npm) {
            return Err(format!("npm ci in tests/browser: {reason}"));
        }
        std::fs::write(stamp, digest).map_err(|e| e.to_string())?;
    }
    Ok(format!("Node {node}"))
}

/// A lock that names the registry of whoever wrote it would send everybody there.
fn names_no_host(lock: &str) -> Outcome<()> {
    if lock.contains("\"resolved\"") {
        return Err("package-lock.json names download addresses; write it again with npm in \
                    tests/browser, whose .npmrc leaves them out"
            .into());
    }
    Ok(())
}

fn node_version() -> Outcome<String> {
    let missing = format!("Node {OLDEST_NODE} or newer is missing: install it from https://nodejs.org");
    let asked = place::command("node").arg("--version").output().map_err(|_| missing.clone())?;
    let version = String::from_utf8_lossy(&asked.stdout).trim().trim_start_matches('v').to_string();
    let major = version.split('.').next().and_then(|n| n.parse::<u32>().ok());
    match major {
        Some(major) if major >= OLDEST_NODE => Ok(version),
        Some(_) => Err(format!("{missing} (this is {version})")),
        None => Err(missing),
    }
}

/// The JSDoc types of the page.
pub fn types() -> End {
    let compiler = folder().join("node_modules/typescript/bin/tsc");
    watch(place::command("node").arg(compiler).arg("-p").arg(folder().join("tsconfig.json")))
}

/// Finds Chromium, or installs Debian's when this user may.
pub fn chromium() -> Outcome<String> {
    let named = std::env::var("CHROMIUM").ok();
    let path = named.clone().unwrap_or_else(|| "/usr/bin/chromium".into());
    if !Path::new(&path).exists() && named.is_none() && is_root() {
        // Why it failed is on the screen; whether it worked is what the next look tells.
        watch(place::command("apt-get").arg("update"));
        watch(
            place::command("apt-get")
                .args(["install", "-y", "chromium"])
                .env("DEBIAN_FRONTEND", "noninteractive"),
        );
    }
    if !Path::new(&path).exists() {
        return Err(format!(
            "{path} is missing: run `sudo apt-get install chromium`, or set CHROMIUM to the path of one"
        ));
    }
    let asked = place::command(path.as_str()).arg("--version").output();
    let asked = asked.map_err(|e| format!("{path} cannot be started: {e}"))?;
    Ok(String::from_utf8_lossy(&asked.stdout).trim().to_string())
}

fn is_root() -> bool {
    place::command("id").arg("-u").output().is_ok_and(|id| id.stdout.trim_ascii() == b"0")
}

/// Every `*.test.js` of the rig, one file after the other: they share two cores and one screen.
pub fn tests() -> End {
    let files = match test_files(&folder()) {
        Ok(files) => files,
        Err(problem) => return End::Failed(problem),
    };
    let mut node = place::command("node");
    node.args(["--test", "--test-concurrency=1", "--test-reporter=spec", "--test-timeout=300000"]);
    watch(node.args(files))
}

fn test_files(folder: &Path) -> Outcome<Vec<PathBuf>> {
    let entries = std::fs::read_dir(folder).map_err(|e| format!("{}: {e}", folder.display()))?;
    let mut files: Vec<PathBuf> = entries.flatten().map(|entry| entry.path()).collect();
    files.retain(|path| path.to_string_lossy().ends_with(".test.js"));
    files.sort();
    // Node would pass with nothing to run.
    if files.is_empty() { Err("there are no browser tests".into()) } else { Ok(files) }
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn a_lock_with_addresses_is_refused() {
        assert!(names_no_host(r#"{"packages": {"a": {"version": "1.0.0"}}}"#).is_ok());
        assert!(names_no_host(r#"{"a": {"resolved": "https://registry.example/a.tgz"}}"#).is_err());
    }

    #[test]
    fn only_tests_are_run_and_none_is_an_error() {
        let folder = crate::dist::tests::scratch("browser");
        assert!(test_files(&folder).is_err());
        for name in ["rig.js", "b.test.js", "a.test.js"] {
            std::fs::write(folder.join(name), "").unwrap();
        }
        assert_eq!(test_files(&folder).unwrap(), [folder.join("a.test.js"), folder.join("b.test.js")]);
    }
}
