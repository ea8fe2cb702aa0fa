//! Formula text with our own spacing: `stringify!` promises none.

/// The same formula with one space around binary operators and after commas, none elsewhere.
#[must_use]
pub fn spaced(text: &str) -> String {
    let mut out = String::with_capacity(text.len() + 16);
    let glyphs: Vec<char> = text.chars().filter(|c| !c.is_whitespace()).collect();
    let mut i = 0;
    while i < glyphs.len() {
        let c = glyphs[i];
        let pair = glyphs.get(i + 1).copied();
        match c {
            '<' | '>' | '=' | '!' | '&' | '|' => {
                out.push(' ');
                out.push(c);
                if matches!(pair, Some('=' | '&' | '|')) {
                    i += 1;
                    out.push(glyphs[i]);
                }
                out.push(' ');
            }
            '+' | '*' | '/' => {
                out.push(' ');
                out.push(c);
                out.push(' ');
            }
            '-' => {
                let binary = out.trim_end() == out
                    && out.ends_with(|p: char| p.is_alphanumeric() || p == '_' || p == ')');
                let exponent = binary
                    && i >= 2
                    && matches!(glyphs[i - 1], 'e' | 'E')
                    && (glyphs[i - 2].is_ascii_digit() || glyphs[i - 2] == '.');
                if binary && !exponent {
                    out.push_str(" - ");
                } else {
                    out.push('-');
                }
            }
            ',' => out.push_str(", "),
            _ => out.push(c),
        }
        i += 1;
    }
    out
}

#[cfg(test)]
mod tests {
    use super::spaced;

    #[test]
    fn spacing_does_not_depend_on_the_compiler() {
        assert_eq!(spaced("1.0*r_t*sqrt(E/F_yc)"), "1.0 * r_t * sqrt(E / F_yc)");
        assert_eq!(spaced("1.0  * r_t *\n sqrt( E / F_yc )"), "1.0 * r_t * sqrt(E / F_yc)");
        assert_eq!(spaced("-a-b"), "-a - b");
        assert_eq!(spaced("pow(a,-0.5)<=b"), "pow(a, -0.5) <= b");
        assert_eq!(spaced("1e-3-x"), "1e-3 - x");
    }
}
