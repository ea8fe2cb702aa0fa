//! From what was typed to figures and units.

use super::registry::{self, Unit};

/// One piece of a reading.
#[derive(Clone, Debug, PartialEq)]
pub(super) enum Token {
    /// A plain figure; `whole` when it has no decimals, `space` when white space stands before it.
    Figure {
        /// Its value.
        value: f64,
        /// Whether it is a whole number.
        whole: bool,
    },
    /// A fraction of two whole numbers.
    Fraction(f64),
    /// A unit.
    Unit(&'static Unit),
    /// A hyphen between two pieces.
    Hyphen,
    /// A minus sign before a figure.
    Minus,
    /// Semicolon, line end, or comma and space: another reading follows.
    Next,
}

/// What cannot be read.
#[derive(Clone, Debug, PartialEq)]
pub(super) enum Fault {
    /// A word that is no unit.
    Word(String),
    /// A figure that can be read in two ways, with one of them as a repair.
    Figure(String, String),
    /// A figure out of the range of numbers, or divided by nothing.
    Size(String),
    /// A bare ton.
    Ton,
}

/// Plain spellings for the signs that tablets and drawings use.
pub(super) fn plain(text: &str) -> String {
    let mut out = String::with_capacity(text.len());
    for c in text.chars() {
        match c {
            '\u{2032}' | '\u{2019}' | '\u{2018}' | '\u{b4}' | '`' => out.push('\''),
            '\u{2033}' | '\u{201c}' | '\u{201d}' => out.push('"'),
            '\u{2010}'..='\u{2015}' | '\u{2212}' => out.push('-'),
            '\u{2044}' | '\u{2215}' => out.push('/'),
            '\u{b2}' => out.push('2'),
            '\u{b3}' => out.push('3'),
            '\u{2074}' => out.push('4'),
            '\u{bd}' => out.push_str(" 1/2"),
            '\u{bc}' => out.push_str(" 1/4"),
            '\u{be}' => out.push_str(" 3/4"),
            '\u{215b}' => out.push_str(" 1/8"),
            '\u{215c}' => out.push_str(" 3/8"),
            '\u{215d}' => out.push_str(" 5/8"),
            '\u{215e}' => out.push_str(" 7/8"),
            '\n' | '\r' => out.push(';'),
            c if c.is_whitespace() => out.push(' '),
            c => out.push(c),
        }
    }
    out.replace("''", "\"")
}

/// Splits a plain text into pieces.
pub(super) fn tokens(text: &str) -> Result<Vec<Token>, Fault> {
    let mut out: Vec<Token> = Vec::new();
    let mut at = 0;
    while let Some(c) = text[at..].chars().next() {
        let rest = &text[at..];
        match c {
            ' ' => at += 1,
            ';' => {
                out.push(Token::Next);
                at += 1;
            }
            ',' => {
                out.push(Token::Next);
                at += 1;
            }
            '-' => {
                let before =
                    matches!(out.last(), Some(Token::Figure { .. } | Token::Fraction(_) | Token::Unit(_)));
                out.push(if before { Token::Hyphen } else { Token::Minus });
                at += 1;
            }
            '0'..='9' | '.' => {
                let (token, used) = figure(rest)?;
                out.push(token);
                at += used;
            }
            _ => {
                let (unit, used) = unit(rest)?;
                out.push(Token::Unit(unit));
                at += used;
            }
        }
    }
    Ok(out)
}

fn unit(rest: &str) -> Result<(&'static Unit, usize), Fault> {
    let word: String =
        rest.chars().take_while(|c| c.is_alphabetic() || matches!(c, '/' | '^' | '°')).collect();
    if ["ton", "tons"].iter().any(|t| word.eq_ignore_ascii_case(t)) {
        return Err(Fault::Ton);
    }
    match registry::leading(rest) {
        Some(found) => Ok(found),
        None if word.is_empty() => Err(Fault::Word(rest.chars().take(1).collect())),
        None => Err(Fault::Word(word)),
    }
}

/// A figure or a fraction at the front of a text, and how many bytes it takes.
fn figure(rest: &str) -> Result<(Token, usize), Fault> {
    let mut used = run(rest, |c| c.is_ascii_digit() || c == '.' || c == ',');
    // A comma before a space, or at the end, separates readings.
    while rest[..used].ends_with(',') {
        used -= 1;
    }
    let digits = &rest[..used];
    if let Some(below) = rest[used..].strip_prefix('/') {
        let n = run(below, |c| c.is_ascii_digit());
        if n > 0 && digits.bytes().all(|b| b.is_ascii_digit()) {
            let (top, bottom) = (number(digits)?, number(&below[..n])?);
            if bottom == 0.0 {
                return Err(Fault::Size(rest[..used + 1 + n].to_owned()));
            }
            return Ok((Token::Fraction(top / bottom), used + 1 + n));
        }
    }
    let mut text = decimal(digits)?;
    let power = exponent(&rest[used..]);
    text.push_str(&rest[used..used + power]);
    let value = number(&text)?;
    Ok((Token::Figure { value, whole: !text.contains(['.', 'e', 'E']) }, used + power))
}

/// Bytes of an exponent such as `e3` or `E-2`; `3 ft` has none.
fn exponent(rest: &str) -> usize {
    let mut bytes = rest.bytes();
    if !matches!(bytes.next(), Some(b'e' | b'E')) {
        return 0;
    }
    let sign = usize::from(matches!(rest.as_bytes().get(1), Some(b'+' | b'-')));
    let digits = run(&rest[1 + sign..], |c| c.is_ascii_digit());
    if digits == 0 { 0 } else { 1 + sign + digits }
}

fn run(text: &str, wanted: impl Fn(char) -> bool) -> usize {
    text.find(|c| !wanted(c)).unwrap_or(text.len())
}

/// Digits with their decimal point as the language reads it. Groups of three digits behind one comma
/// can be thousands or decimals: that is not guessed.
fn decimal(digits: &str) -> Result<String, Fault> {
    let (commas, points) = (digits.matches(',').count(), digits.matches('.').count());
    let groups = |separator: char, whole: &str| {
        let mut parts = whole.split(separator);
        let first = parts.next().unwrap_or("");
        !first.is_empty() && first.len() <= 3 && parts.all(|p| p.len() == 3)
    };
    let wrong = || Err(Fault::Word(digits.to_owned()));
    match (commas, points) {
        (0, 0 | 1) => Ok(digits.to_owned()),
        (1, 0) => {
            let (whole, part) = digits.split_once(',').unwrap_or((digits, ""));
            if part.len() == 3 && !whole.is_empty() && whole != "0" && whole.len() <= 3 {
                Err(Fault::Figure(digits.to_owned(), format!("{whole}{part}")))
            } else {
                Ok(format!("{whole}.{part}"))
            }
        }
        (_, 0) if groups(',', digits) => Ok(digits.replace(',', "")),
        (0, _) if groups('.', digits) => Ok(digits.replace('.', "")),
        (_, 1) if digits.rfind('.') > digits.rfind(',') => {
            let (whole, part) = digits.split_once('.').unwrap_or((digits, ""));
            if groups(',', whole) { Ok(format!("{}.{part}", whole.replace(',', ""))) } else { wrong() }
        }
        (1, _) => {
            let (whole, part) = digits.split_once(',').unwrap_or((digits, ""));
            if groups('.', whole) { Ok(format!("{}.{part}", whole.replace('.', ""))) } else { wrong() }
        }
        _ => wrong(),
    }
}

fn number(text: &str) -> Result<f64, Fault> {
    match text.parse::<f64>() {
        Ok(value) if value.is_finite() => Ok(value),
        Ok(_) => Err(Fault::Size(text.to_owned())),
        Err(_) => Err(Fault::Word(text.to_owned())),
    }
}
