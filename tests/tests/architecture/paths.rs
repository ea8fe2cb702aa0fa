//! The paths that a source file names, resolved to where they lie in its crate.
//!
//! Tokens are read, not lines: comments, texts and documentation name what they like, while the
//! bodies of macros count.

use proc_macro2::{Delimiter, Ident, TokenStream, TokenTree};

/// A path in the source, such as `clauses::aashto::shear` for `crate::clauses::aashto::shear`.
#[derive(Debug, Clone, PartialEq)]
pub struct Named {
    /// From the root of the crate, or from `std`.
    pub path: Vec<String>,
    /// Whether it begins with `std`.
    pub std: bool,
    pub line: usize,
}

/// What a file names.
#[derive(Debug, Default)]
pub struct Names {
    /// Paths that begin with `crate`, `self`, `super` or `std`.
    pub paths: Vec<Named>,
    /// Every identifier, with its line.
    pub words: Vec<(String, usize)>,
    /// Macros that the crate exports at its root.
    pub exported_macros: Vec<String>,
}

/// Reads a source file that is the given module of its crate.
pub fn read(module: &[String], text: &str) -> Names {
    let tokens: TokenStream = text.parse().expect("the compiler has read the file already");
    let mut names = Names::default();
    walk(tokens, module, &mut names);
    names
}

fn walk(tokens: TokenStream, module: &[String], names: &mut Names) {
    let tokens: Vec<TokenTree> = tokens.into_iter().collect();
    let mut exported = false;
    let mut i = 0;
    while i < tokens.len() {
        match &tokens[i] {
            TokenTree::Ident(word) => {
                names.words.push((word.to_string(), word.span().start().line));
                let after_colons = i >= 2 && is(&tokens, i - 1, ':') && is(&tokens, i - 2, ':');
                if *word == "mod"
                    && let (Some(TokenTree::Ident(name)), Some(TokenTree::Group(body))) =
                        (tokens.get(i + 1), tokens.get(i + 2))
                {
                    let inner: Vec<String> = module.iter().cloned().chain([name.to_string()]).collect();
                    walk(body.stream(), &inner, names);
                    i += 3;
                    continue;
                }
                if *word == "macro_rules" && exported {
                    if let Some(TokenTree::Ident(name)) = tokens.get(i + 2) {
                        names.exported_macros.push(name.to_string());
                    }
                    exported = false;
                }
                if !after_colons
                    && colons(&tokens, i + 1)
                    && let Some((base, std)) = start(word, module)
                {
                    branch(&tokens[i + 3..], base, std, &mut names.paths);
                }
            }
            TokenTree::Group(group) => {
                exported |= group.stream().to_string() == "macro_export";
                walk(group.stream(), module, names);
            }
            _ => {}
        }
        i += 1;
    }
}

/// Where a path that begins with this word begins, and whether in `std`.
fn start(word: &Ident, module: &[String]) -> Option<(Vec<String>, bool)> {
    match word.to_string().as_str() {
        "crate" => Some((Vec::new(), false)),
        "self" => Some((module.to_vec(), false)),
        "super" => Some((up(module.to_vec()), false)),
        "std" => Some((Vec::new(), true)),
        _ => None,
    }
}

fn up(mut module: Vec<String>) -> Vec<String> {
    module.pop();
    module
}

/// Follows a path, or a tree of them in braces, from just behind a double colon.
fn branch(mut tokens: &[TokenTree], mut path: Vec<String>, std: bool, found: &mut Vec<Named>) {
    let line = tokens.first().map_or(0, |token| token.span().start().line);
    loop {
        match tokens.first() {
            Some(TokenTree::Ident(word)) if *word == "super" => path = up(path),
            Some(TokenTree::Ident(word)) if *word == "self" => {}
            Some(TokenTree::Ident(word)) => path.push(word.to_string()),
            Some(TokenTree::Group(group)) if group.delimiter() == Delimiter::Brace => {
                let inner: Vec<TokenTree> = group.stream().into_iter().collect();
                for part in inner.split(|token| matches!(token, TokenTree::Punct(p) if p.as_char() == ',')) {
                    if !part.is_empty() {
                        branch(part, path.clone(), std, found);
                    }
                }
                return;
            }
            Some(TokenTree::Punct(star)) if star.as_char() == '*' => path.push("*".into()),
            // A turbofish: the path has ended.
            _ => break,
        }
        if !colons(tokens, 1) {
            break;
        }
        tokens = &tokens[3..];
    }
    found.push(Named { path, std, line });
}

fn is(tokens: &[TokenTree], i: usize, sign: char) -> bool {
    matches!(tokens.get(i), Some(TokenTree::Punct(punct)) if punct.as_char() == sign)
}

fn colons(tokens: &[TokenTree], i: usize) -> bool {
    is(tokens, i, ':') && is(tokens, i + 1, ':')
}

#[cfg(test)]
mod tests {
    use super::*;

    fn named(text: &str) -> Vec<String> {
        let module = ["section".to_string(), "plate".to_string()];
        let join =
            |named: &Named| format!("{}{}", if named.std { "std " } else { "" }, named.path.join("::"));
        read(&module, text).paths.iter().map(join).collect()
    }

    #[test]
    fn every_spelling_is_resolved() {
        assert_eq!(named("use crate::bridge::Span;"), ["bridge::Span"]);
        assert_eq!(
            named("pub use crate::{load, units::{self, mark::*}};"),
            ["load", "units", "units::mark::*"]
        );
        assert_eq!(named("use {crate::a, crate::b as c};"), ["a", "b"]);
        assert_eq!(named("use crate::*;"), ["*"]);
        assert_eq!(named("fn f() -> crate::a::B { crate::c::d::<u8>(1) }"), ["a::B", "c::d"]);
        assert_eq!(
            named("use super::Rolled; use super::super::load::Lane;"),
            ["section::Rolled", "load::Lane"]
        );
        assert_eq!(named("use self::inner::X;"), ["section::plate::inner::X"]);
        assert_eq!(
            named("mod tests { use super::*; use super::super::super::load; }"),
            ["section::plate::*", "load"]
        );
        assert_eq!(named("macro_rules! m { () => { $crate::rating::go() } }"), ["rating::go"]);
        assert_eq!(named("use std::{fs, collections::BTreeMap};"), ["std fs", "std collections::BTreeMap"]);
        assert_eq!(named("fn f(x: crate::a::B) { x.y(crate::C { d: crate::e::F }) }"), ["a::B", "C", "e::F"]);
    }

    #[test]
    fn what_is_no_path_is_left_out() {
        assert_eq!(named("// use crate::load;\n/* crate::load */\n/// [`crate::load`]\nfn f() {}"), [""; 0]);
        assert_eq!(named("const T: &str = \"crate::load\"; const R: &str = r#\"crate::load\"#;"), [""; 0]);
        assert_eq!(named("pub(crate) fn f(self, n: &Self) { self.x(); other::crate_name::y() }"), [""; 0]);
    }

    #[test]
    fn lines_and_exported_macros_are_known() {
        let names = read(&[], "\n\nuse crate::load;\n#[macro_export]\nmacro_rules! clause { () => {} }");
        assert_eq!(names.paths[0].line, 3);
        assert_eq!(names.exported_macros, ["clause"]);
        assert!(read(&[], "macro_rules! own { () => {} }").exported_macros.is_empty());
    }
}
