//! `clause!` and `condition!`: one item that is a function, its printed formula and its citation.
//!
//! The expression sits in an inner `fn`, which captures nothing, so the compiler proves that every
//! name in the printed text is a listed input. Quantities become plain numbers at its door, in the
//! units in which the standard prints the formula.

/// A formula of a standard or of mechanics.
///
/// ```
/// use girderbook_core::{clause, quantity::*, units::mark::*, worksheet::*};
/// clause! {
///     /// Limiting unbraced length for the plastic moment.
///     pub fn l_p(r_t: Length [Inch], E: Stress [Ksi], F_yc: Stress [Ksi]) -> L_p: Length [Inch]
///     { 1.0 * r_t * sqrt(E / F_yc) }
///     cite "LRFD A6.3.3 (A6.3.3-4)"
///     what "unbraced length up to which the plastic moment is reached"
/// }
/// let mut sheet = Sheet::default();
/// let lp = l_p(&mut sheet, Val::bare(Length::from_inch(3.0)), Val::bare(Stress::from_ksi(29_000.0)),
///     Val::bare(Stress::from_ksi(36.0)));
/// assert!((lp.q.in_inch() - 85.147).abs() < 1e-3);
/// assert_eq!(sheet.lines.len(), 1);
/// ```
#[macro_export]
macro_rules! clause {
    ($(#[$doc:meta])* $vis:vis fn $name:ident($($in:ident: $q:ty [$unit:ident]),* $(,)?)
        -> $symbol:ident: $out:ty [$ounit:ident] { $body:expr }
        cite $cite:literal what $what:literal) => {
        $(#[$doc])*
        #[doc = ""]
        #[doc = concat!("`", stringify!($body), "`, ", $cite)]
        #[allow(non_snake_case, clippy::too_many_arguments)]
        $vis fn $name<R: $crate::worksheet::Recorder>(
            rec: &mut R, $($in: $crate::worksheet::Val<$q>),*
        ) -> $crate::worksheet::Val<$out> {
            #[allow(unused_imports, clippy::too_many_arguments)]
            fn eval($($in: f64),*) -> f64 {
                use $crate::worksheet::ops::{PI, max, min, pow, sqrt, tan_deg};
                $body
            }
            static CLAUSE: $crate::worksheet::Clause = $crate::worksheet::Clause {
                id: concat!(module_path!(), "::", stringify!($name)),
                cite: $cite,
                what: $what,
                symbol: stringify!($symbol),
                unit: <$ounit as $crate::units::Mark<$out>>::NAME,
                text: stringify!($body),
            };
            let figure = eval($(<$unit as $crate::units::Mark<$q>>::read($in.q)),*);
            let line = rec.write(|| $crate::worksheet::Line {
                symbol: CLAUSE.symbol.to_owned(),
                what: CLAUSE.what.to_owned(),
                figure,
                unit: CLAUSE.unit,
                dimension: <$out as $crate::quantity::Quantity>::DIMENSION,
                kind: $crate::worksheet::Kind::Formula {
                    clause: &CLAUSE,
                    inputs: vec![$($crate::worksheet::Input {
                        symbol: stringify!($in),
                        figure: <$unit as $crate::units::Mark<$q>>::read($in.q),
                        unit: <$unit as $crate::units::Mark<$q>>::NAME,
                        dimension: <$q as $crate::quantity::Quantity>::DIMENSION,
                        from: $in.line,
                    }),*],
                },
            });
            $crate::worksheet::Val { q: <$ounit as $crate::units::Mark<$out>>::make(figure), line }
        }
    };
}

/// A condition of a standard, with what follows either way.
#[macro_export]
macro_rules! condition {
    ($(#[$doc:meta])* $vis:vis fn $name:ident($($in:ident: $q:ty [$unit:ident]),* $(,)?) { $body:expr }
        cite $cite:literal yes $yes:literal no $no:literal) => {
        $(#[$doc])*
        #[doc = ""]
        #[doc = concat!("`", stringify!($body), "`, ", $cite)]
        #[allow(non_snake_case, clippy::too_many_arguments)]
        $vis fn $name<R: $crate::worksheet::Recorder>(
            rec: &mut R, $($in: $crate::worksheet::Val<$q>),*
        ) -> bool {
            #[allow(unused_imports)]
            fn eval($($in: f64),*) -> bool {
                use $crate::worksheet::ops::{PI, max, min, pow, sqrt, tan_deg};
                $body
            }
            static CLAUSE: $crate::worksheet::Clause = $crate::worksheet::Clause {
                id: concat!(module_path!(), "::", stringify!($name)),
                cite: $cite,
                what: "",
                symbol: "",
                unit: "",
                text: stringify!($body),
            };
            let holds = eval($(<$unit as $crate::units::Mark<$q>>::read($in.q)),*);
            rec.write(|| {
                let branch = if holds { $yes } else { $no };
                $crate::worksheet::Line {
                    symbol: String::new(),
                    what: branch.to_owned(),
                    figure: 0.0,
                    unit: "",
                    dimension: $crate::quantity::Dimension::Number,
                    kind: $crate::worksheet::Kind::Choice {
                        clause: &CLAUSE,
                        inputs: vec![$($crate::worksheet::Input {
                            symbol: stringify!($in),
                            figure: <$unit as $crate::units::Mark<$q>>::read($in.q),
                            unit: <$unit as $crate::units::Mark<$q>>::NAME,
                            dimension: <$q as $crate::quantity::Quantity>::DIMENSION,
                            from: $in.line,
                        }),*],
                        holds,
                        branch,
                    },
                }
            });
            holds
        }
    };
}
