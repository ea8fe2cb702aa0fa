//! What ships: the crates in the wasm, its instructions, and the size of the first load.

use std::collections::BTreeSet;
use std::io::Write;

use wasmparser::{Parser, Payload};

use crate::{Outcome, dist, place, toolchain};

/// The first load over the air, compressed as a static host would send it (Brotli 11), may be so
/// large: ten seconds at 400 kbit/s.
const LARGEST_FIRST_LOAD: usize = 500_000;

/// Few dependencies beat audited many.
const MOST_CRATES: usize = 59;

/// The opcode space of the vector proposal (WebAssembly 2.0, 5.4.10 "Vector Instructions").
const VECTOR_PREFIX: u8 = 0xFD;

/// Passes when few enough crates are compiled into the wasm, and says how many. Procedural macros
/// run in the compiler and do not count.
pub fn crates() -> Outcome<String> {
    let asked = place::cargo()
        .args(["tree", "-p", "girderbook-web", "--target", toolchain::WASM])
        .args(["--edges", "normal,no-proc-macro", "--prefix", "none", "--format", "{p}"])
        .output()
        .map_err(|e| format!("cargo cannot be started: {e}"))?;
    if !asked.status.success() {
        return Err(String::from_utf8_lossy(&asked.stderr).trim().to_string());
    }
    count_crates(&String::from_utf8_lossy(&asked.stdout))
}

fn count_crates(tree: &str) -> Outcome<String> {
    let crates: BTreeSet<&str> = tree.lines().map(|line| line.trim_end_matches(" (*)")).collect();
    match crates.len() {
        0..4 => Err(format!("cargo tree lists too few crates to be true:\n{tree}")),
        n if n > MOST_CRATES => Err(format!("{n} crates, more than {MOST_CRATES}")),
        n => Ok(format!("{n} crates")),
    }
}

/// Passes when the wasm holds vector instructions, and says how many.
///
/// The flag is easily lost (an environment variable, a profile), with nothing to see but speed.
pub fn vectors() -> Outcome<String> {
    let files = dist::read()?;
    let wasm = files.get("girderbook_web_bg.wasm").ok_or("dist/ holds no wasm")?;
    let (vector, all) = count_vectors(wasm)?;
    if vector == 0 {
        return Err(format!("none of {all} instructions of the wasm is a vector instruction"));
    }
    Ok(format!("{vector} of {all} instructions are vector instructions"))
}

/// Vector instructions and all instructions in the bodies of a module's functions.
fn count_vectors(wasm: &[u8]) -> Outcome<(usize, usize)> {
    let told = |e: wasmparser::BinaryReaderError| format!("the wasm cannot be read: {e}");
    let (mut vector, mut all) = (0, 0);
    for payload in Parser::new(0).parse_all(wasm) {
        let Payload::CodeSectionEntry(body) = payload.map_err(told)? else { continue };
        for instruction in body.get_operators_reader().map_err(told)?.into_iter_with_offsets() {
            let (_, offset) = instruction.map_err(told)?;
            all += 1;
            vector += usize::from(wasm[offset] == VECTOR_PREFIX);
        }
    }
    Ok((vector, all))
}

/// Passes when the first load is small enough, and says how large it is by kind of file.
pub fn first_load() -> Outcome<String> {
    let files = dist::read()?;
    let worker = files.iter().filter(|(path, _)| *path == "sw.js");
    let mut kinds: Vec<(&str, usize)> = vec![("wasm", 0), ("js", 0), ("css", 0), ("html", 0), ("other", 0)];
    for (path, bytes) in dist::precached(&files).chain(worker) {
        let extension = path.rsplit('.').next().unwrap_or_default();
        let row = kinds.iter().position(|(kind, _)| *kind == extension).unwrap_or(kinds.len() - 1);
        kinds[row].1 += compressed(bytes)?;
    }
    judge(&kinds)
}

fn judge(kinds: &[(&str, usize)]) -> Outcome<String> {
    let total: usize = kinds.iter().map(|(_, size)| size).sum();
    let parts: Vec<String> = kinds.iter().map(|(kind, size)| format!("{kind} {}", kilo(*size))).collect();
    let told = format!("{} kB in Brotli ({})", kilo(total), parts.join(", "));
    if total > LARGEST_FIRST_LOAD {
        return Err(format!("{told}, more than {} kB", kilo(LARGEST_FIRST_LOAD)));
    }
    Ok(told)
}

#[allow(clippy::cast_precision_loss)]
fn kilo(bytes: usize) -> String {
    format!("{:.1}", bytes as f64 / 1000.0)
}

fn compressed(bytes: &[u8]) -> Outcome<usize> {
    let mut writer = brotli::CompressorWriter::new(Vec::new(), 4096, 11, 22);
    writer.write_all(bytes).map_err(|e| e.to_string())?;
    Ok(writer.into_inner().len())
}

#[cfg(test)]
mod tests {
    use super::*;

    /// A module of one function with the given body, from memory of the binary format.
    fn module(body: &[u8]) -> Vec<u8> {
        let mut wasm = b"\0asm\x01\0\0\0".to_vec();
        // Type section: one function type without parameters and results; function section.
        wasm.extend([1, 4, 1, 0x60, 0, 0, 3, 2, 1, 0]);
        let length = u8::try_from(body.len()).unwrap();
        wasm.extend([10, length + 3, 1, length + 1, 0]);
        wasm.extend(body);
        wasm
    }

    #[test]
    fn vector_instructions_are_told_from_constants() {
        // i32.const 0xFD (as LEB128: FD 01); drop; end: the byte is there, the instruction is not.
        assert_eq!(count_vectors(&module(&[0x41, 0xFD, 0x01, 0x1A, 0x0B])), Ok((0, 3)));
        // i32.const 0; i8x16.splat; drop; end.
        assert_eq!(count_vectors(&module(&[0x41, 0, 0xFD, 0x0F, 0x1A, 0x0B])), Ok((1, 4)));
        assert!(count_vectors(b"no wasm").is_err());
    }

    #[test]
    fn crates_are_counted_once() {
        assert_eq!(count_crates("a v1\nb v1\nc v1\nd v1\nb v1 (*)\n"), Ok("4 crates".into()));
        let many: String = (0..60).map(|i| format!("c{i} v1\n")).collect();
        assert!(count_crates(&many).is_err());
        assert!(count_crates("").is_err());
    }

    #[test]
    fn a_large_first_load_fails() {
        assert_eq!(
            judge(&[("wasm", 400_000), ("js", 100_000)]),
            Ok("500.0 kB in Brotli (wasm 400.0, js 100.0)".into())
        );
        assert!(judge(&[("wasm", 400_000), ("js", 100_001)]).is_err());
    }

    #[test]
    fn brotli_compresses() {
        let size = compressed(&b"span ".repeat(1000)).unwrap();
        assert!(size > 5 && size < 100, "{size}");
    }
}
