//! Readings as people write them.
//!
//! Accepted, among others: `65`, `65 mm`, `7,1 cm`, `2 3/8 in`, `2-3/8"`, `12'-3 1/2"`, `12 ft 3.5 in`,
//! `18.3m`, `24.5 kN/m3`, `150 pcf`, `36 ksi`, `250 MPa`; several readings with `;`, a comma and a
//! space, or one after the other. What can be read in two ways is refused with a repair, never guessed.

use super::registry::{self, Unit, words};
use super::token::{Fault, Token, plain, tokens};
use crate::quantity::{Dimension, Quantity};

/// Longest text of a field, in characters.
pub const MOST_CHARACTERS: usize = 600;

/// Most readings in a field.
pub const MOST_READINGS: usize = 50;

/// Why a text cannot be read.
#[derive(Clone, Debug, PartialEq, Eq)]
pub struct Refusal {
    /// What is wrong.
    pub message: String,
    /// How to mend it.
    pub mend: String,
    /// A text that would mend it.
    pub repair: Option<String>,
}

impl Refusal {
    fn new(message: impl Into<String>, mend: impl Into<String>) -> Self {
        Self { message: message.into(), mend: mend.into(), repair: None }
    }

    fn with(mut self, repair: impl Into<String>) -> Self {
        self.repair = Some(repair.into());
        self
    }
}

/// Reads every reading in a text. `unit` is the printed name of the unit that a bare figure has in this
/// field; empty for pure numbers.
///
/// # Errors
/// When a part of the text is no reading of this kind, or could mean two things.
pub fn readings<Q: Quantity>(text: &str, unit: &str) -> Result<Vec<Q>, Refusal> {
    if text.chars().count() > MOST_CHARACTERS {
        return Err(Refusal::new(
            format!("this is longer than {MOST_CHARACTERS} characters"),
            "enter the readings only",
        ));
    }
    let field = Field { dimension: Q::DIMENSION, unit: registry::by_name(unit), text };
    let text = plain(text);
    let pieces = tokens(&text).map_err(|fault| field.fault(fault))?;
    let mut all = Vec::new();
    for part in pieces.split(|t| *t == Token::Next).filter(|p| !p.is_empty()) {
        field.group(part, &mut all)?;
    }
    if all.len() > MOST_READINGS {
        return Err(Refusal::new(format!("these are more than {MOST_READINGS} readings"), "enter fewer"));
    }
    field.one_unit(&all)?;
    all.iter()
        .map(|reading| {
            let base = reading.figure * reading.unit.or(field.unit).map_or(1.0, |u| u.per) + reading.more;
            if base.is_finite() {
                Ok(Q::from_base(base))
            } else {
                Err(field.fault(Fault::Size(field.text.to_owned())))
            }
        })
        .collect()
}

/// Splits a text into its readings, each as it was written. Texts that cannot be split stay whole.
#[must_use]
pub fn split(text: &str) -> Vec<String> {
    let text = text.trim();
    if text.is_empty() {
        return Vec::new();
    }
    text.split([';', '\n']).map(str::trim).filter(|t| !t.is_empty()).map(str::to_owned).collect()
}

/// One reading before its unit is applied: `figure` of `unit`, and `more` in base units.
#[derive(Clone, Copy, Debug, PartialEq)]
struct Reading {
    figure: f64,
    unit: Option<&'static Unit>,
    more: f64,
}

struct Field<'a> {
    dimension: Dimension,
    unit: Option<&'static Unit>,
    text: &'a str,
}

impl Field<'_> {
    /// Readings that stand beside each other without a separator.
    fn group(&self, mut rest: &[Token], all: &mut Vec<Reading>) -> Result<(), Refusal> {
        while !rest.is_empty() {
            let (reading, used) = self.reading(rest)?;
            rest = &rest[used..];
            if matches!(rest.first(), Some(Token::Hyphen)) {
                return Err(self.unclear());
            }
            if reading.unit.is_none() && !rest.is_empty() {
                self.lone_feet(&reading, rest)?;
            }
            all.push(reading);
        }
        Ok(())
    }

    /// One reading at the front, and how many pieces it takes.
    fn reading(&self, pieces: &[Token]) -> Result<(Reading, usize), Refusal> {
        let sign = usize::from(matches!(pieces.first(), Some(Token::Minus)));
        let (figure, n) = self.value(&pieces[sign..])?;
        let mut used = sign + n;
        let unit = match pieces.get(used) {
            Some(Token::Unit(unit)) => {
                used += 1;
                Some(self.fits(unit)?)
            }
            _ => None,
        };
        let mut more = 0.0;
        if unit.is_some_and(|u| u.name == "ft")
            && let Some((inches, n)) = self.inches(&pieces[used..])
        {
            more = inches;
            used += n;
        } else if unit.is_none()
            && self.unit.is_some_and(|u| u.name == "ft")
            && matches!(pieces.get(used), Some(Token::Hyphen))
        {
            // `12-6 1/2` in a field of feet: feet and inches, as the trade writes them.
            let (inches, n) = self.value(&pieces[used + 1..])?;
            let unit = registry::by_name("ft");
            let sign = if sign == 1 { -1.0 } else { 1.0 };
            return Ok((Reading { figure: sign * figure, unit, more: sign * inches * 254.0 }, used + 1 + n));
        }
        let sign = if sign == 1 { -1.0 } else { 1.0 };
        Ok((Reading { figure: sign * figure, unit, more: sign * more }, used))
    }

    /// Inches behind feet, with or without hyphen and unit; nothing if another reading of feet follows.
    fn inches(&self, pieces: &[Token]) -> Option<(f64, usize)> {
        let hyphen = usize::from(matches!(pieces.first(), Some(Token::Hyphen)));
        let (figure, n) = self.value(&pieces[hyphen..]).ok()?;
        let used = hyphen + n;
        match pieces.get(used) {
            Some(Token::Unit(unit)) if unit.name == "in" => Some((figure * 254.0, used + 1)),
            Some(Token::Unit(_)) => None,
            _ if hyphen == 1 || pieces.len() == used => Some((figure * 254.0, used)),
            _ => None,
        }
    }

    /// A figure, a fraction, or a whole number with a fraction.
    fn value(&self, pieces: &[Token]) -> Result<(f64, usize), Refusal> {
        match pieces {
            [Token::Figure { value, whole: true }, Token::Fraction(part), ..] => Ok((value + part, 2)),
            [Token::Figure { value, whole: true }, Token::Hyphen, Token::Fraction(part), ..] => {
                Ok((value + part, 3))
            }
            [Token::Figure { value, .. }, ..] => Ok((*value, 1)),
            [Token::Fraction(part), ..] => Ok((*part, 1)),
            _ => Err(self.unclear()),
        }
    }

    /// A bare figure in a field of feet, with another one behind it, may be feet and inches.
    fn lone_feet(&self, reading: &Reading, rest: &[Token]) -> Result<(), Refusal> {
        if self.unit.is_none_or(|u| u.name != "ft") {
            return Ok(());
        }
        let (first, second) = (reading.figure, self.value(rest).map(|v| v.0).unwrap_or_default());
        Err(Refusal::new(
            format!("\"{}\" can be feet and inches, or two readings", self.text.trim()),
            format!("write {first} ft {second} in, or {first}; {second}"),
        )
        .with(format!("{first} ft {second} in")))
    }

    /// The unit, if it measures what the field takes.
    fn fits(&self, unit: &'static Unit) -> Result<&'static Unit, Refusal> {
        if unit.dimension == self.dimension {
            return Ok(unit);
        }
        let ((is, _), (wanted, example)) = (words(unit.dimension), words(self.dimension));
        Err(Refusal::new(
            format!("{} is the unit of {is}; this field takes {wanted}", unit.name),
            format!("enter {wanted}, such as {example}"),
        ))
    }

    /// Bare figures before one with another unit than the field's: whose unit do they have?
    fn one_unit(&self, all: &[Reading]) -> Result<(), Refusal> {
        let Some(own) = self.unit else { return Ok(()) };
        let foreign = all.iter().rev().find_map(|r| r.unit).filter(|u| u.name != own.name);
        match (foreign, all.iter().any(|r| r.unit.is_none())) {
            (Some(unit), true) => {
                let each: Vec<String> = all
                    .iter()
                    .map(|r| format!("{} {}", r.figure, r.unit.map_or(unit.name, |u| u.name)))
                    .collect();
                Err(Refusal::new(
                    format!(
                        "some readings have no unit: are they {} like the field, or {}?",
                        own.name, unit.name
                    ),
                    "write the unit behind each reading",
                )
                .with(each.join("; ")))
            }
            _ => Ok(()),
        }
    }

    fn unclear(&self) -> Refusal {
        let (wanted, example) = words(self.dimension);
        Refusal::new(
            format!("\"{}\" cannot be read as {wanted}", self.text.trim()),
            format!("enter {wanted}, such as {example}"),
        )
    }

    fn fault(&self, fault: Fault) -> Refusal {
        let (wanted, example) = words(self.dimension);
        match fault {
            Fault::Word(word) => Refusal::new(
                format!("\"{word}\" is neither a figure nor a unit known here"),
                format!("enter {wanted}, such as {example}"),
            ),
            Fault::Figure(figure, repair) => Refusal::new(
                format!("{figure} can be {repair} or {}", figure.replace(',', ".")),
                "write it without the comma, or with a point",
            )
            .with(self.text.replacen(&figure, &repair, 1)),
            Fault::Size(figure) => Refusal::new(
                format!("{figure} is beyond what can be calculated with"),
                format!("enter {wanted}, such as {example}"),
            ),
            Fault::Ton => Refusal::new(
                "a ton can be a short ton of 2,000 lb or a tonne of 1,000 kg",
                "write short tons or t",
            )
            .with(replace_ton(self.text)),
        }
    }
}

fn replace_ton(text: &str) -> String {
    let lower = text.to_ascii_lowercase();
    match lower.find("ton") {
        Some(at) => {
            let end = at + 3 + usize::from(lower[at + 3..].starts_with('s'));
            format!("{}short tons{}", &text[..at], &text[end..])
        }
        None => text.to_owned(),
    }
}
