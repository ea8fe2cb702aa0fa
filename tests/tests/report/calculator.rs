//! A calculator that reads what a worksheet prints, with every rounded figure as an interval. It
//! shares nothing with the program: it knows print, not clauses.

/// Everything that a printed figure can stand for.
#[derive(Clone, Copy, Debug)]
pub struct Interval {
    pub low: f64,
    pub high: f64,
}

/// What a printed line comes to.
#[derive(Clone, Copy, Debug)]
pub enum Answer {
    Figure(Interval),
    /// Whether a condition holds; none where the figures as printed leave it open.
    Holds(Option<bool>),
}

const UNITS: [&str; 29] = [
    "short tons",
    "kip ft",
    "kip in",
    "kip/ft",
    "kN m",
    "kN/m³",
    "kN/m²",
    "kN/m",
    "mm⁴",
    "mm³",
    "mm²",
    "mm",
    "in⁴",
    "in³",
    "in²",
    "in",
    "ft²",
    "ft",
    "ksi",
    "MPa",
    "kip",
    "kN",
    "pcf",
    "kcf",
    "m²",
    "m",
    "t",
    "°",
    "kNm",
];

struct Reader<'a> {
    rest: &'a str,
}

/// The printed figure at the beginning of a text.
pub fn figure_of(text: &str) -> Result<Interval, String> {
    Reader { rest: text }.number()
}

/// What a printed line comes to.
pub fn evaluate(text: &str) -> Result<Answer, String> {
    let mut reader = Reader { rest: text };
    let answer = reader.condition()?;
    reader.skip();
    if reader.rest.is_empty() { Ok(answer) } else { Err(format!("\"{}\" is left over", reader.rest)) }
}

fn spanned(values: &[f64]) -> Interval {
    Interval {
        low: values.iter().copied().fold(f64::INFINITY, f64::min),
        high: values.iter().copied().fold(f64::NEG_INFINITY, f64::max),
    }
}

fn corners(a: Interval, b: Interval, f: impl Fn(f64, f64) -> f64) -> Interval {
    spanned(&[f(a.low, b.low), f(a.low, b.high), f(a.high, b.low), f(a.high, b.high)])
}

fn power(a: Interval, b: Interval) -> Result<Interval, String> {
    if a.low >= 0.0 {
        return Ok(corners(a, b, libm::pow));
    }
    let whole = b.low.round();
    if (b.low - whole).abs() > 1e-6 || whole < 0.0 {
        return Err("a power of a negative figure".to_owned());
    }
    let mut out = Interval { low: 1.0, high: 1.0 };
    for _ in 0..whole as usize {
        out = corners(out, a, |x, y| x * y);
    }
    Ok(out)
}

impl Reader<'_> {
    fn skip(&mut self) {
        self.rest = self.rest.trim_start();
    }

    fn take(&mut self, text: &str) -> bool {
        self.skip();
        match self.rest.strip_prefix(text) {
            Some(rest) => {
                self.rest = rest;
                true
            }
            None => false,
        }
    }

    fn condition(&mut self) -> Result<Answer, String> {
        let mut all = self.comparison()?;
        loop {
            let both = if self.take("and ") {
                true
            } else if self.take("or ") {
                false
            } else {
                return Ok(all);
            };
            let next = self.comparison()?;
            let (Answer::Holds(a), Answer::Holds(b)) = (all, next) else {
                return Err("a figure where a condition should be".to_owned());
            };
            all = Answer::Holds(match (a, b) {
                (Some(a), Some(b)) => Some(if both { a && b } else { a || b }),
                (Some(a), None) | (None, Some(a)) if a != both => Some(a),
                _ => None,
            });
        }
    }

    fn comparison(&mut self) -> Result<Answer, String> {
        let left = self.sum()?;
        // Each as "left is below right", and whether the sides are to be changed.
        for (sign, turned) in [("≤", false), ("<", false), ("≥", true), (">", true)] {
            if self.take(sign) {
                let right = self.sum()?;
                let (low, high) = if turned { (right, left) } else { (left, right) };
                return Ok(Answer::Holds(if low.high < high.low {
                    Some(true)
                } else if low.low > high.high {
                    Some(false)
                } else {
                    None
                }));
            }
        }
        Ok(Answer::Figure(left))
    }

    fn sum(&mut self) -> Result<Interval, String> {
        let mut total = self.product()?;
        loop {
            if self.take("+") {
                total = corners(total, self.product()?, |a, b| a + b);
            } else if self.take("-") {
                total = corners(total, self.product()?, |a, b| a - b);
            } else {
                return Ok(total);
            }
        }
    }

    fn product(&mut self) -> Result<Interval, String> {
        let mut total = self.signed()?;
        loop {
            if self.take("·") {
                total = corners(total, self.signed()?, |a, b| a * b);
            } else if self.take("/") {
                let by = self.signed()?;
                if by.low <= 0.0 && by.high >= 0.0 {
                    return Err("divided by nothing".to_owned());
                }
                total = corners(total, by, |a, b| a / b);
            } else {
                return Ok(total);
            }
        }
    }

    fn signed(&mut self) -> Result<Interval, String> {
        if self.take("-") {
            let value = self.signed()?;
            return Ok(Interval { low: -value.high, high: -value.low });
        }
        let base = self.atom()?;
        if self.take("^") {
            let exponent = self.atom()?;
            return power(base, exponent);
        }
        Ok(base)
    }

    fn atom(&mut self) -> Result<Interval, String> {
        self.skip();
        if self.take("π") {
            return Ok(Interval { low: core::f64::consts::PI, high: core::f64::consts::PI });
        }
        for function in ["max", "min", "floor", "√", "tan", ""] {
            if self.take(&format!("{function}(")) {
                let mut arguments = vec![self.sum()?];
                while self.take(",") {
                    arguments.push(self.sum()?);
                }
                if !self.take(")") {
                    return Err(format!("a bracket is open at \"{}\"", self.rest));
                }
                let first = arguments[0];
                let fold = |f: fn(f64, f64) -> f64| {
                    arguments
                        .iter()
                        .skip(1)
                        .fold(first, |a, b| Interval { low: f(a.low, b.low), high: f(a.high, b.high) })
                };
                return Ok(match function {
                    "max" => fold(f64::max),
                    "min" => fold(f64::min),
                    "floor" => Interval { low: first.low.floor(), high: first.high.floor() },
                    "√" => Interval { low: first.low.sqrt(), high: first.high.sqrt() },
                    "tan" => Interval {
                        low: libm::tan(first.low.to_radians()),
                        high: libm::tan(first.high.to_radians()),
                    },
                    _ => first,
                });
            }
        }
        self.number()
    }

    /// A figure with five digits or more stands for all that rounds to it; a shorter one is exact.
    fn number(&mut self) -> Result<Interval, String> {
        self.skip();
        let sign = if self.take("-") { -1.0 } else { 1.0 };
        let end = self.rest.find(|c: char| !c.is_ascii_digit() && c != '.').unwrap_or(self.rest.len());
        let (digits, rest) = self.rest.split_at(end);
        let value: f64 = digits.parse().map_err(|_| format!("no figure at \"{}\"", self.rest))?;
        self.rest = rest;
        let significant = digits.trim_start_matches(['0', '.']).chars().filter(char::is_ascii_digit).count();
        let decimals = digits.split_once('.').map_or(0, |(_, d)| d.len());
        let mut half = if significant >= 5 { 0.5 * libm::pow(10.0, -(decimals as f64)) } else { 0.0 };
        half += value * 1e-11;
        let mut scale = sign;
        if self.rest.starts_with('e') {
            let end = self.rest[1..]
                .find(|c: char| !c.is_ascii_digit() && c != '-')
                .map_or(self.rest.len(), |i| i + 1);
            scale *= libm::pow(10.0, self.rest[1..end].parse().map_err(|_| "no exponent".to_owned())?);
            self.rest = &self.rest[end..];
        }
        if let Some(rest) = self.rest.strip_prefix(" × 10") {
            let digits: String = rest
                .chars()
                .map_while(|c| match c {
                    '⁻' => Some('-'),
                    '¹' => Some('1'),
                    '²' => Some('2'),
                    '³' => Some('3'),
                    c => char::from_digit((c as u32).checked_sub(0x2070).filter(|d| *d < 10)?, 10),
                })
                .collect();
            scale *= libm::pow(10.0, digits.parse().map_err(|_| "no exponent".to_owned())?);
            self.rest = &rest[rest.char_indices().nth(digits.len()).map_or(rest.len(), |(i, _)| i)..];
        }
        for unit in UNITS {
            let mark = if unit == "°" { unit.to_owned() } else { format!(" {unit}") };
            if let Some(rest) = self.rest.strip_prefix(mark.as_str())
                && !rest.starts_with(|c: char| c.is_alphabetic())
            {
                self.rest = rest;
                break;
            }
        }
        Ok(spanned(&[(value - half) * scale, (value + half) * scale]))
    }
}
