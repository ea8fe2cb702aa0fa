//! Where things lie in the tree.

use std::ffi::OsString;
use std::path::{Path, PathBuf};
use std::process::Command;

/// The folder of the workspace.
pub fn root() -> PathBuf {
    let bundle = Path::new(env!("CARGO_MANIFEST_DIR"));
    bundle.ancestors().nth(2).expect("web/bundle lies two folders below the root").to_path_buf()
}

/// What is served: the page as a static host would hold it.
pub fn dist() -> PathBuf {
    root().join("dist")
}

/// Cargo's target folder, absolute.
pub fn target() -> PathBuf {
    match std::env::var_os("CARGO_TARGET_DIR") {
        // Cargo reads a relative one from the folder where it was started, which is ours too.
        Some(set) => std::path::absolute(&set).unwrap_or_else(|_| PathBuf::from(set)),
        None => root().join("target"),
    }
}

/// A command in the root of the tree, without what the outer `cargo run` said about this crate.
pub fn command(program: impl Into<OsString>) -> Command {
    let mut command = Command::new(program.into());
    command.current_dir(root()).env("CARGO_TARGET_DIR", target());
    for (name, _) in std::env::vars_os() {
        let text = name.to_string_lossy();
        if text.starts_with("CARGO_PKG_") || text.starts_with("CARGO_MANIFEST_") {
            command.env_remove(&name);
        }
    }
    command
}

/// Cargo itself, the one that runs this tool.
pub fn cargo() -> Command {
    command(std::env::var_os("CARGO").unwrap_or_else(|| "cargo".into()))
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn the_root_holds_the_workspace() {
        let manifest = std::fs::read_to_string(root().join("Cargo.toml")).unwrap();
        assert!(manifest.contains("[workspace]"));
        assert!(target().is_absolute());
    }
}
