//! The host tool behind the two commands of the project.
//!
//! `cargo serve` builds the page and serves it on localhost; `cargo verify` runs every check. Both
//! find the tree from where this crate lies, so they work from any subfolder.

mod dist;
mod hash;
mod http;
mod mime;
mod place;
mod policy;
mod serve;
mod shipped;
mod toolchain;
mod verify;
mod wasm;

use std::process::ExitCode;

/// What went wrong, in one line for the person at the keyboard.
type Outcome<T> = Result<T, String>;

const USAGE: &str = "usage: cargo serve [--build-only | --no-build] [--port N]\n       cargo verify";

/// What the command line asks for.
#[derive(Debug, PartialEq)]
enum Task {
    Serve { build: bool, serve: bool, port: Option<u16> },
    Verify,
}

fn main() -> ExitCode {
    let arguments: Vec<String> = std::env::args().skip(1).collect();
    let done = read(&arguments).and_then(|task| match task {
        Task::Serve { build, serve, port } => run_serve(build, serve, port).map(|()| true),
        Task::Verify => Ok(verify::run()),
    });
    match done {
        Ok(true) => ExitCode::SUCCESS,
        Ok(false) => ExitCode::FAILURE,
        Err(problem) => {
            eprintln!("{problem}");
            ExitCode::FAILURE
        }
    }
}

fn read(arguments: &[String]) -> Outcome<Task> {
    let mut words = arguments.iter().map(String::as_str);
    match words.next() {
        Some("serve") => {}
        Some("verify") if words.next().is_none() => return Ok(Task::Verify),
        _ => return Err(USAGE.into()),
    }
    let (mut build, mut serve, mut port) = (true, true, None);
    while let Some(word) = words.next() {
        match word {
            "--build-only" => serve = false,
            "--no-build" => build = false,
            "--port" => {
                let number = words.next().and_then(|n| n.parse().ok());
                port = Some(number.ok_or("--port needs a number from 0 to 65535")?);
            }
            _ => return Err(format!("unknown option {word}\n{USAGE}")),
        }
    }
    if !build && !serve {
        return Err("--build-only and --no-build together leave nothing to do".into());
    }
    Ok(Task::Serve { build, serve, port })
}

fn run_serve(build: bool, serve: bool, port: Option<u16>) -> Outcome<()> {
    if build {
        dist::build()?;
    } else if !place::dist().join("index.html").is_file() {
        return Err("dist/ is empty: run `cargo serve --build-only` first".into());
    }
    if serve { serve::run(&place::dist(), port) } else { Ok(()) }
}

#[cfg(test)]
mod tests {
    use super::*;

    fn task(line: &str) -> Outcome<Task> {
        read(&line.split_whitespace().map(String::from).collect::<Vec<_>>())
    }

    #[test]
    fn options_are_read() {
        let plain = Task::Serve { build: true, serve: true, port: None };
        assert_eq!(task("serve"), Ok(plain));
        let built = Task::Serve { build: true, serve: false, port: None };
        assert_eq!(task("serve --build-only"), Ok(built));
        let served = Task::Serve { build: false, serve: true, port: Some(0) };
        assert_eq!(task("serve --port 0 --no-build"), Ok(served));
        assert_eq!(task("verify"), Ok(Task::Verify));
    }

    #[test]
    fn what_is_not_understood_is_refused() {
        for line in ["", "paint", "serve --prot 1", "serve --port", "serve --port 70000", "verify --fast"] {
            assert!(task(line).is_err(), "{line}");
        }
        assert!(task("serve --no-build --build-only").is_err());
    }
}
