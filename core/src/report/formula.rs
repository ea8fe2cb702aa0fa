//! The text of a clause as an engineer writes it, with symbols or with figures in their place.
//!
//! Nothing is interpreted: tokens keep their order, `pow(a, b)` becomes `a^b`, signs become those of
//! print. What stands there is the code that ran.

/// Rewrites the text of a clause; `name` says what stands for each symbol.
#[must_use]
pub fn printed(text: &str, name: &mut dyn FnMut(&str) -> String) -> String {
    let tokens = tokens(text);
    let mut at = 0;
    let mut out = String::new();
    while at < tokens.len() {
        // A stray bracket ends a run early; it is printed as it is.
        out.push_str(&run(&tokens, &mut at, name).0);
        if let Some(token) = tokens.get(at) {
            out.push_str(token);
            at += 1;
        }
    }
    out
}

fn tokens(text: &str) -> Vec<&str> {
    let mut out = Vec::new();
    let bytes = text.as_bytes();
    let mut i = 0;
    while i < bytes.len() {
        let start = i;
        let c = bytes[i];
        let word = |b: u8| b.is_ascii_alphanumeric() || b == b'_';
        if c.is_ascii_whitespace() {
            i += 1;
            continue;
        } else if c.is_ascii_digit() {
            while i < bytes.len()
                && (word(bytes[i])
                    || bytes[i] == b'.'
                    || (matches!(bytes[i], b'-' | b'+') && matches!(bytes[i - 1], b'e' | b'E')))
            {
                i += 1;
            }
        } else if word(c) {
            while i < bytes.len() && word(bytes[i]) {
                i += 1;
            }
        } else if matches!(bytes.get(i..i + 2), Some(b"<=" | b">=" | b"==" | b"!=" | b"&&" | b"||")) {
            i += 2;
        } else {
            i += 1;
            while !text.is_char_boundary(i) {
                i += 1;
            }
        }
        out.push(&text[start..i]);
    }
    out
}

/// Prints up to the bracket or comma that ends the run, or to the end. Says whether what it printed
/// is one thing that needs no brackets around it under a power.
fn run(tokens: &[&str], at: &mut usize, name: &mut dyn FnMut(&str) -> String) -> (String, bool) {
    let mut out = String::new();
    let (mut parts, mut operand_before, mut single) = (0, false, true);
    while let Some(&token) = tokens.get(*at) {
        let first = token.as_bytes()[0];
        if matches!(token, ")" | "," | "]" | "}") {
            break;
        }
        *at += 1;
        if first.is_ascii_alphabetic() || first == b'_' {
            if tokens.get(*at) == Some(&"(") {
                let (text, whole) = call(token, tokens, at, name);
                out.push_str(&text);
                single &= whole;
            } else if token == "PI" {
                out.push('π');
            } else {
                let text = name(token);
                single &= text.starts_with('(') || !text.contains([' ', '°', '-']);
                out.push_str(&text);
            }
        } else if first.is_ascii_digit() {
            out.push_str(&literal(token));
        } else if token == "(" {
            out.push('(');
            out.push_str(&run(tokens, at, name).0);
            out.push(')');
            if tokens.get(*at) == Some(&")") {
                *at += 1;
            }
        } else {
            match token {
                "-" if !operand_before => out.push('-'),
                "!" => out.push_str("not "),
                _ => {
                    out.push(' ');
                    out.push_str(sign(token));
                    out.push(' ');
                }
            }
            operand_before = false;
            single = false;
            continue;
        }
        operand_before = true;
        parts += 1;
    }
    (out, single && parts == 1)
}

fn sign(token: &str) -> &str {
    match token {
        "*" => "·",
        "-" => "-",
        "<=" => "≤",
        ">=" => "≥",
        "==" => "=",
        "!=" => "≠",
        "&&" => "and",
        "||" => "or",
        other => other,
    }
}

/// A function with what is in its brackets.
fn call(
    function: &str,
    tokens: &[&str],
    at: &mut usize,
    name: &mut dyn FnMut(&str) -> String,
) -> (String, bool) {
    let mut arguments = Vec::new();
    loop {
        *at += 1;
        arguments.push(run(tokens, at, name));
        if tokens.get(*at) != Some(&",") {
            break;
        }
    }
    if tokens.get(*at) == Some(&")") {
        *at += 1;
    }
    let wrapped = |(text, single): &(String, bool)| if *single { text.clone() } else { format!("({text})") };
    match (function, arguments.as_slice()) {
        ("pow", [base, exponent]) => (format!("{}^{}", wrapped(base), wrapped(exponent)), false),
        _ => {
            // A comma after the last argument is the compiler's own.
            let list: Vec<&str> =
                arguments.iter().map(|(text, _)| text.as_str()).filter(|text| !text.is_empty()).collect();
            let function = match function {
                "sqrt" => "√",
                "tan_deg" => "tan",
                other => other,
            };
            (format!("{function}({})", list.join(", ")), true)
        }
    }
}

/// A number of the text: `29_000.0` as `29000`, `1.50` as it is.
fn literal(token: &str) -> String {
    let plain = token.replace('_', "");
    plain.strip_suffix(".0").or(plain.strip_suffix('.')).unwrap_or(&plain).to_owned()
}

#[cfg(test)]
mod tests {
    use super::*;

    fn with_symbols(text: &str) -> String {
        printed(text, &mut |symbol| symbol.to_owned())
    }

    #[test]
    fn formulas_look_as_in_print() {
        for (code, print) in [
            ("1.0*r_t*sqrt(E/F_yc)", "1 · r_t · √(E / F_yc)"),
            ("t_fc * pow(b_fc, 3.0) / 12.0", "t_fc · b_fc^3 / 12"),
            ("pow(L_b / r_t, 2.0)", "(L_b / r_t)^2"),
            ("pow(pow(a, 2.0), -0.5)", "(a^2)^(-0.5)"),
            ("max(t_bot + D - y, 0.0)", "max(t_bot + D - y, 0)"),
            ("-a - -b", "-a - -b"),
            ("29_000.0 * 1e-3", "29000 · 1e-3"),
            ("L_b <= L_p && L_b > 0.0", "L_b ≤ L_p and L_b > 0"),
            ("1.0 - 0.25 * tan_deg(theta)", "1 - 0.25 · tan(theta)"),
            ("pow(PI, 2.0) * E", "π^2 · E"),
            ("min(\n a,\n b,\n)", "min(a, b)"),
            ("(a + b) * (c)", "(a + b) · (c)"),
        ] {
            assert_eq!(with_symbols(code), print, "{code}");
        }
    }

    #[test]
    fn figures_take_the_place_of_symbols() {
        let mut figures = |symbol: &str| match symbol {
            "b" => "12 in".to_owned(),
            "x" => "(-3)".to_owned(),
            other => other.to_owned(),
        };
        assert_eq!(printed("pow(b, 3.0) + y", &mut figures), "(12 in)^3 + y");
        assert_eq!(printed("pow(x, 2.0) * x", &mut figures), "(-3)^2 · (-3)");
    }

    #[test]
    fn a_text_that_is_no_formula_is_printed_and_does_not_hang() {
        for text in ["", ")", "a )) b", "f(", "f(a", "ä + ß", "pow(a)", "&", "1.2.3"] {
            let _ = with_symbols(text);
        }
        assert_eq!(with_symbols("a ) b"), "a)b");
    }
}
