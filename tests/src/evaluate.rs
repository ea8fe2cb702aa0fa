//! An evaluator that knows nothing of the program: works printed formulas again with `exmex`.

use exmex::BinOp;
use exmex::prelude::*;
use girderbook_core::worksheet::{Input, Kind, Line, Sheet, spaced};

/// Truth as a number, the way the operators below pass it on.
fn truth(holds: bool) -> f64 {
    f64::from(u8::from(holds))
}

const fn binary(apply: fn(f64, f64) -> f64, prio: i64, is_commutative: bool) -> BinOp<f64> {
    BinOp { apply, prio, is_commutative }
}

mod printed {
    use super::{binary, truth};
    use exmex::{MakeOperators, Operator, ops_factory};

    // No constant but PI: `E` and `e` are symbols of formulas.
    ops_factory!(
        Printed,
        f64,
        Operator::make_bin("||", binary(|a, b| truth(a != 0.0 || b != 0.0), -3, true)),
        Operator::make_bin("&&", binary(|a, b| truth(a != 0.0 && b != 0.0), -2, true)),
        Operator::make_bin("<=", binary(|a, b| truth(a <= b), -1, false)),
        Operator::make_bin(">=", binary(|a, b| truth(a >= b), -1, false)),
        Operator::make_bin("<", binary(|a, b| truth(a < b), -1, false)),
        Operator::make_bin(">", binary(|a, b| truth(a > b), -1, false)),
        Operator::make_bin("==", binary(|a, b| truth(a == b), -1, true)),
        Operator::make_bin_unary("+", binary(|a, b| a + b, 0, true), |a| a),
        Operator::make_bin_unary("-", binary(|a, b| a - b, 1, false), |a| -a),
        Operator::make_bin("*", binary(|a, b| a * b, 2, true)),
        Operator::make_bin("/", binary(|a, b| a / b, 3, false)),
        Operator::make_bin("pow", binary(f64::powf, 4, false)),
        Operator::make_bin("min", binary(f64::min, 4, false)),
        Operator::make_bin("max", binary(f64::max, 4, false)),
        Operator::make_unary("sqrt", f64::sqrt),
        Operator::make_unary("floor", f64::floor),
        Operator::make_unary("tan_deg", |a| a.to_radians().tan()),
        Operator::make_constant("PI", core::f64::consts::PI)
    );
}
use printed::Printed;

/// `min(a, b)` as `((a) min (b))`: the parser loses count of nested calls.
fn infix(text: &str) -> String {
    let call = ["pow(", "min(", "max("]
        .iter()
        .filter_map(|name| text.find(name).map(|at| (at, *name)))
        .min_by_key(|(at, _)| *at);
    let Some((at, name)) = call else { return text.to_owned() };
    let body = &text[at + name.len()..];
    let (mut depth, mut comma) = (0_usize, None);
    for (i, c) in body.char_indices() {
        match c {
            '(' => depth += 1,
            ',' if depth == 0 => comma = Some(i),
            ')' if depth == 0 => {
                let comma = comma.unwrap_or_else(|| panic!("{text}: {name} needs two arguments"));
                let (a, b) = (infix(&body[..comma]), infix(&body[comma + 1..i]));
                let op = name.trim_end_matches('(');
                return format!("{}(({a}) {op} ({b})){}", &text[..at], infix(&body[i + 1..]));
            }
            ')' => depth -= 1,
            _ => {}
        }
    }
    panic!("{text}: {name} is not closed")
}

/// The value of a printed formula; of a condition 1 where it holds, else 0.
///
/// # Panics
/// When the text cannot be read, or names a symbol that is not among the inputs.
#[must_use]
pub fn evaluate(text: &str, inputs: &[(&str, f64)]) -> f64 {
    let formula = FlatEx::<f64, Printed>::parse(&infix(text)).unwrap_or_else(|e| panic!("{text}: {e}"));
    let values: Vec<f64> = formula
        .var_names()
        .iter()
        .map(|name| {
            let known = inputs.iter().find(|(symbol, _)| symbol == name);
            known.unwrap_or_else(|| panic!("{text}: {name} is not among the inputs")).1
        })
        .collect();
    formula.eval(&values).unwrap_or_else(|e| panic!("{text}: {e}"))
}

/// Whether two figures agree to 12 digits.
fn same(a: f64, b: f64) -> bool {
    (a - b).abs() <= 1e-12 * a.abs().max(b.abs())
}

fn figures(inputs: &[Input]) -> Vec<(&'static str, f64)> {
    inputs.iter().map(|i| (i.symbol, i.figure)).collect()
}

/// Every input stands on an earlier line that shows the same value in the same unit.
fn stands(sheet: &Sheet, at: usize, inputs: &[Input]) -> Result<(), String> {
    for input in inputs {
        let no = input.from.0 as usize;
        if no == 0 || no > at {
            return Err(format!("{} does not stand on an earlier line", input.symbol));
        }
        let from = &sheet.lines[no - 1];
        if from.dimension != input.dimension || (from.unit == input.unit && !same(from.figure, input.figure))
        {
            return Err(format!(
                "{} differs from its line {no}: {} {}",
                input.symbol, from.figure, from.unit
            ));
        }
    }
    Ok(())
}

fn recheck_line(sheet: &Sheet, at: usize, line: &Line) -> Result<bool, String> {
    match &line.kind {
        Kind::Formula { clause, inputs } => {
            stands(sheet, at, inputs)?;
            let again = evaluate(&spaced(clause.text), &figures(inputs));
            if !same(again, line.figure) {
                return Err(format!("{} = {}: {again} instead of {}", line.symbol, clause.text, line.figure));
            }
            Ok(true)
        }
        Kind::Choice { clause, inputs, holds, .. } => {
            stands(sheet, at, inputs)?;
            let again = evaluate(&spaced(clause.text), &figures(inputs)) != 0.0;
            if again != *holds {
                return Err(format!("{}: {again} instead of {holds}", clause.text));
            }
            Ok(true)
        }
        Kind::Sum { rows } => {
            let again = rows.iter().map(|r| r.figure).fold(0.0, |a, b| a + b);
            let size = rows.iter().map(|r| r.figure.abs()).fold(0.0, f64::max);
            if (again - line.figure).abs() > 1e-12 * size {
                return Err(format!("{}: the rows add up to {again}", line.symbol));
            }
            Ok(true)
        }
        _ => Ok(false),
    }
}

/// Works every formula, condition and sum of a sheet again and follows every reference; returns how
/// many lines were worked.
///
/// # Errors
/// For the first line that does not come out the same.
pub fn recheck(sheet: &Sheet) -> Result<usize, String> {
    let mut worked = 0;
    for (at, line) in sheet.lines.iter().enumerate() {
        let again = recheck_line(sheet, at, line).map_err(|e| format!("line {}: {e}", at + 1))?;
        worked += usize::from(again);
    }
    Ok(worked)
}

#[cfg(test)]
mod tests {
    use super::evaluate;

    #[test]
    fn formulas_are_read_as_they_are_printed() {
        let near = |text: &str, inputs: &[(&str, f64)], value: f64| {
            assert!((evaluate(text, inputs) - value).abs() < 1e-12 * value.abs(), "{text}");
        };
        near(
            "1.0 * r_t * sqrt(E / F_yc)",
            &[("r_t", 3.0), ("E", 29_000.0), ("F_yc", 29.0)],
            94.868_329_805_051_38,
        );
        near("a - b + c", &[("a", 1.0), ("b", 2.0), ("c", 4.0)], 3.0);
        near("-a - b * pow(c, 2.0)", &[("a", 1.0), ("b", 2.0), ("c", 4.0)], -33.0);
        near("min(max(a, b) * 2.0, 9.0) / b", &[("a", 5.0), ("b", 4.0)], 2.25);
        near("min(a / pow(b, 2.0), min(a * b, b / 0.5)) - 1.0", &[("a", 64.0), ("b", 4.0)], 3.0);
        near("pow(PI, 2.0)", &[], 9.869_604_401_089_358);
        assert_eq!(evaluate("a + 1.0 <= b * 2.0 && b > a", &[("a", 1.0), ("b", 2.0)]), 1.0);
        assert_eq!(evaluate("a >= b || b < a", &[("a", 1.0), ("b", 2.0)]), 0.0);
    }

    #[test]
    #[should_panic(expected = "not among the inputs")]
    fn a_symbol_that_is_no_input_is_refused() {
        let _ = evaluate("a + b", &[("a", 1.0)]);
    }
}
