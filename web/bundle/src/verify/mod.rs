//! `cargo verify`: every check in turn, each to its end, and a summary.

mod browser;
mod steps;

use std::time::{Duration, Instant};

/// How a step ended; the words are one line for the summary.
#[derive(Debug)]
pub enum End {
    Passed(String),
    Failed(String),
    Skipped(String),
}

/// A line of the summary.
struct Row {
    name: &'static str,
    end: End,
    took: Duration,
}

/// Runs everything; true when nothing failed.
pub fn run() -> bool {
    let mut rows: Vec<Row> = Vec::new();
    for step in steps::all() {
        println!("\n== {}", step.name);
        let start = Instant::now();
        let passed = |row: &Row| matches!(row.end, End::Passed(_));
        let lacking = rows.iter().find(|row| step.needs.contains(&row.name) && !passed(row));
        let end = match lacking {
            Some(row) => End::Skipped(format!("needs the step \"{}\"", row.name)),
            None => (step.run)(),
        };
        if let End::Failed(reason) | End::Skipped(reason) = &end {
            println!("{reason}");
        }
        rows.push(Row { name: step.name, end, took: start.elapsed() });
    }
    print!("\n{}", summary(&rows));
    !rows.iter().any(|row| matches!(row.end, End::Failed(_)))
}

fn summary(rows: &[Row]) -> String {
    let mut text = String::new();
    let mut counts = [0; 3];
    for Row { name, end, took } in rows {
        let (column, word, reason) = match end {
            End::Passed(note) => (0, "passed", note),
            End::Failed(reason) => (1, "failed", reason),
            End::Skipped(reason) => (2, "skipped", reason),
        };
        counts[column] += 1;
        let line = format!("{name:<14} {word:<8} {:>6.1} s  {reason}", took.as_secs_f64());
        text += line.trim_end();
        text.push('\n');
    }
    let [passed, failed, skipped] = counts;
    text + &format!("{passed} passed, {failed} failed, {skipped} skipped\n")
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn the_summary_counts_and_names() {
        let row = |name, end| Row { name, end, took: Duration::from_millis(1250) };
        let rows = [
            row("formatting", End::Passed(String::new())),
            row("lints", End::Failed("exit status: 101".into())),
            row("licences", End::Skipped("cargo-deny is not installed".into())),
        ];
        let text = summary(&rows);
        let lines: Vec<&str> = text.lines().collect();
        assert_eq!(lines[0], "formatting     passed      1.2 s");
        assert_eq!(lines[1], "lints          failed      1.2 s  exit status: 101");
        assert_eq!(lines[2], "licences       skipped     1.2 s  cargo-deny is not installed");
        assert_eq!(lines[3], "1 passed, 1 failed, 1 skipped");
    }
}
