//! girderbook-web compiled for the browser, and wasm-bindgen run on it as a library.

use std::ffi::OsString;
use std::path::{Path, PathBuf};

use wasm_bindgen_cli_support::Bindgen;

use crate::{Outcome, place, toolchain};

/// Compiles and binds; the answer is a fresh folder with `girderbook_web.js`,
/// `girderbook_web.d.ts` and `girderbook_web_bg.wasm`.
pub fn build() -> Outcome<PathBuf> {
    toolchain::ensure_wasm()?;
    // A folder of its own: other flags than the native build, and no waiting for its lock.
    let target = place::target().join("page");
    let built = place::cargo()
        .args(["build", "-p", "girderbook-web", "--release", "--target", toolchain::WASM])
        .arg("--target-dir")
        .arg(&target)
        .env_remove("RUSTFLAGS")
        .env_remove("CARGO_BUILD_RUSTFLAGS")
        .env_remove("CARGO_TARGET_WASM32_UNKNOWN_UNKNOWN_RUSTFLAGS")
        .env("CARGO_ENCODED_RUSTFLAGS", flags())
        .status()
        .map_err(|e| format!("cargo cannot be started: {e}"))?;
    if !built.success() {
        return Err("girderbook-web did not build for the browser (see above)".into());
    }
    let bound = target.join("bindgen");
    bind(&target.join(toolchain::WASM).join("release/girderbook_web.wasm"), &bound)
        .map_err(|e| format!("wasm-bindgen: {e}"))?;
    Ok(bound)
}

/// Vector instructions, and no folder of this machine inside what ships: the same source then
/// gives the same bytes, hence the same version of the page, wherever it is built.
fn flags() -> OsString {
    let mut flags = OsString::from("-Ctarget-feature=+simd128");
    let home = std::env::var_os("CARGO_HOME").map(PathBuf::from).or_else(|| {
        let user = std::env::home_dir()?;
        Some(user.join(".cargo"))
    });
    let sources = home.map(|home| home.join("registry").join("src"));
    for folder in sources.iter().flat_map(std::fs::read_dir).flatten().flatten() {
        // The separator that CARGO_ENCODED_RUSTFLAGS prescribes.
        flags.push("\u{1f}--remap-path-prefix=");
        flags.push(folder.path());
        flags.push("=crates");
    }
    flags
}

fn bind(input: &Path, output: &Path) -> Outcome<()> {
    if output.exists() {
        std::fs::remove_dir_all(output).map_err(|e| e.to_string())?;
    }
    let mut bindgen = Bindgen::new();
    bindgen
        .input_path(input)
        .out_name("girderbook_web")
        .typescript(true)
        .remove_name_section(true)
        .remove_producers_section(true)
        // As a library the default would leave out where `init()` finds its module.
        .omit_default_module_path(false)
        // The page asks for a fresh instance after a panic.
        .reset_state_function(true);
    bindgen.web(true).and_then(|b| b.generate(output)).map_err(|e| format!("{e:#}"))
}
