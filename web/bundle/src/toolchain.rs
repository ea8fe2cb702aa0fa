//! The compiler's wasm target: looked for, installed when it is missing, looked for again.

use std::path::Path;

use crate::{Outcome, place};

/// The target that browsers run.
pub const WASM: &str = "wasm32-unknown-unknown";

/// Makes sure that the compiler in use can build for [`WASM`].
pub fn ensure_wasm() -> Outcome<()> {
    if has_wasm()? {
        return Ok(());
    }
    println!("The compiler lacks {WASM}; adding it with rustup.");
    let added = place::command("rustup").args(["target", "add", WASM]).status();
    if has_wasm()? {
        return Ok(());
    }
    Err(match added {
        Err(_) => format!(
            "The compiler cannot build for {WASM} and rustup is not installed: \
             install Rust from https://rustup.rs, or your system's package for that target."
        ),
        Ok(_) => format!(
            "The compiler still cannot build for {WASM}: \
             run `rustup target add {WASM}` and read what it says."
        ),
    })
}

fn has_wasm() -> Outcome<bool> {
    let rustc = std::env::var_os("RUSTC").unwrap_or_else(|| "rustc".into());
    let asked = place::command(rustc)
        .args(["--print", "target-libdir", "--target", WASM])
        .output()
        .map_err(|e| format!("rustc cannot be started: {e}"))?;
    let folder = String::from_utf8_lossy(&asked.stdout);
    Ok(asked.status.success() && holds_core(Path::new(folder.trim())))
}

/// The compiler names the folder whether or not it is there; the core library inside is the proof.
fn holds_core(folder: &Path) -> bool {
    let Ok(entries) = std::fs::read_dir(folder) else { return false };
    entries.flatten().any(|entry| entry.file_name().to_string_lossy().starts_with("libcore-"))
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn an_empty_or_absent_folder_is_no_target() {
        let folder = crate::dist::tests::scratch("toolchain");
        assert!(!holds_core(&folder));
        assert!(!holds_core(&folder.join("absent")));
        std::fs::write(folder.join("libcore-1.rlib"), "").unwrap();
        assert!(holds_core(&folder));
    }
}
