//! The steps of `cargo verify`, in order.

use std::process::Command;

use super::End;
use super::browser;
use crate::{Outcome, dist, place, shipped};

/// One check.
pub struct Step {
    pub name: &'static str,
    /// The steps without which this one means nothing.
    pub needs: &'static [&'static str],
    pub run: fn() -> End,
}

/// All of them.
pub fn all() -> Vec<Step> {
    let step = |name, needs: &'static [&'static str], run| Step { name, needs, run };
    vec![
        step("formatting", &[], || cargo(&["fmt", "--all", "--check"])),
        step("lints", &[], || cargo(&["clippy", "--workspace", "--all-targets", "--", "-D", "warnings"])),
        step("documentation", &[], documentation),
        step("tests", &[], || cargo(&["test", "--workspace", "--no-fail-fast"])),
        step("page", &[], || settle(dist::build().map(|()| String::new()))),
        step("crates", &[], || settle(shipped::crates())),
        step("vectors", &["page"], || settle(shipped::vectors())),
        step("first load", &["page"], || settle(shipped::first_load())),
        step("node packages", &[], || settle(browser::packages())),
        step("page types", &["page", "node packages"], browser::types),
        step("chromium", &[], || settle(browser::chromium())),
        step("browser tests", &["page", "node packages", "chromium"], browser::tests),
        step("licences", &[], licences),
    ]
}

fn documentation() -> End {
    let mut doc = place::cargo();
    doc.args(["doc", "--workspace", "--no-deps"]).env("RUSTDOCFLAGS", "-D warnings");
    watch(&mut doc)
}

fn licences() -> End {
    let asked = place::cargo().args(["deny", "--version"]).output();
    if asked.is_ok_and(|answer| answer.status.success()) {
        cargo(&["deny", "check", "licenses", "bans", "sources"])
    } else {
        End::Skipped("cargo-deny is not installed (cargo install cargo-deny)".into())
    }
}

fn cargo(arguments: &[&str]) -> End {
    watch(place::cargo().args(arguments))
}

/// Runs a command whose output goes to the screen as it comes.
pub fn watch(command: &mut Command) -> End {
    let name = command.get_program().to_string_lossy().into_owned();
    match command.status() {
        Ok(status) if status.success() => End::Passed(String::new()),
        Ok(status) => End::Failed(status.to_string()),
        Err(e) => End::Failed(format!("{name} cannot be started: {e}")),
    }
}

fn settle(outcome: Outcome<String>) -> End {
    match outcome {
        Ok(note) => End::Passed(note),
        Err(problem) => End::Failed(problem),
    }
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn what_a_step_needs_comes_before_it() {
        let steps = all();
        for (i, step) in steps.iter().enumerate() {
            for needed in step.needs {
                assert!(steps[..i].iter().any(|earlier| earlier.name == *needed), "{needed}");
            }
        }
    }

    #[test]
    fn a_failing_command_fails_its_step() {
        assert!(matches!(watch(Command::new("rustc").arg("--version")), End::Passed(_)));
        assert!(matches!(watch(Command::new("rustc").arg("--no-such-option")), End::Failed(_)));
        assert!(matches!(watch(&mut Command::new("no-such-program-here")), End::Failed(_)));
    }
}
